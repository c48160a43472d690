/** Brute force for the tests of the tooth: an outline as many short chords, and distances to them. Shares no formula with src. */
import { partOf } from '../../src/geometry/change-piece.ts';
import { pointOn } from '../../src/geometry/on-piece.ts';
import { turnPoint, type Point } from '../../src/geometry/point.ts';
import type { WheelPiece } from '../../src/tooth/wheel.ts';

export interface Samples {
  readonly x: Float64Array;
  readonly y: Float64Array;
}

export function pointsOf(sector: readonly WheelPiece[], each: number): Point[] {
  return sector.flatMap(({ piece }) => Array.from({ length: each + 1 }, (_, i) => pointOn(piece, i / each)));
}

/** From the middle of the space before tooth 1 to the middle of its tip. */
export function risingHalf(sector: readonly WheelPiece[]): readonly WheelPiece[] {
  const half = sector.slice(0, sector.length >> 1);
  const middle = sector[half.length];
  return sector.length % 2 === 0 || !middle
    ? half
    : [...half, { role: middle.role, piece: partOf(middle.piece, 0, 0.5) }];
}

/** The space before tooth 1 with both its sides, tip to tip: all that is near to a point in it. */
export function spaceOf(sector: readonly WheelPiece[], teeth: number, each: number): Samples {
  const rising = pointsOf(risingHalf(sector), each);
  const falling = rising.map(({ x, y }) => turnPoint({ x, y: -y }, (-2 * Math.PI) / teeth)).toReversed();
  const all = [...falling, ...rising];
  return { x: Float64Array.from(all, ({ x }) => x), y: Float64Array.from(all, ({ y }) => y) };
}

/** To the nearest chord. */
export function distanceTo({ x, y }: Samples, point: Point): number {
  let least = Infinity;
  for (let i = 1; i < x.length; i++) {
    const [ax, ay] = [x[i - 1] as number, y[i - 1] as number];
    const [dx, dy] = [(x[i] as number) - ax, (y[i] as number) - ay];
    const square = dx * dx + dy * dy;
    const along = square === 0 ? 0 : ((point.x - ax) * dx + (point.y - ay) * dy) / square;
    const u = Math.min(1, Math.max(0, along));
    const away = (ax + u * dx - point.x) ** 2 + (ay + u * dy - point.y) ** 2;
    least = Math.min(least, away);
  }
  return Math.sqrt(least);
}

/** Whether a point lies in the metal: inside the sides of the space closed over the wheel's axis. */
export function inMetal({ x, y }: Samples, point: Point): boolean {
  let inside = false;
  const count = x.length;
  for (let i = 0; i <= count; i++) {
    const [ax, ay] = i === 0 ? [0, 0] : [x[i - 1] as number, y[i - 1] as number];
    const [bx, by] = i === count ? [0, 0] : [x[i] as number, y[i] as number];
    if (ay > point.y !== by > point.y && point.x < ((bx - ax) * (point.y - ay)) / (by - ay) + ax) {
      inside = !inside;
    }
  }
  return inside;
}
