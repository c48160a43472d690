/**
 * What a caliper would find on a part whose cutter made these moves: from the traced moves alone, by elementary geometry, without
 * the prover's measuring. mm, the program's frame. Samples are 1 um apart at most near what is measured.
 */
import type { Point } from '../../src/geometry/point.ts';
import type { TracedMove } from '../../src/motion/traced-move.ts';

const STEP = 0.001;
/** A turn and a little, for the ways in and out. */
const ONCE_ROUND = 2 * Math.PI * 1.02;

/** Points of the last loop round the axis of one cutter at its lowest, those that lie between two radii. Roughing stays out of it. */
export function lowestPoints(
  moves: readonly TracedMove[],
  cutter: number,
  radii: readonly [number, number],
): Point[] {
  const own = moves.filter((move) => move.cutter === cutter && move.kind !== 'rapid');
  const low = Math.min(...own.map(({ to }) => to.z ?? Infinity));
  const lowest = own.filter(({ from, to }) => from.z === low && to.z === low && from.x !== null);
  let turned = 0;
  const loop = lowest.toReversed().filter(({ from, to }) => {
    const before = turned;
    turned += turnBetween(Math.atan2(to.y ?? 0, to.x ?? 0), Math.atan2(from.y ?? 0, from.x ?? 0));
    return Math.abs(before) < ONCE_ROUND;
  });
  return loop.flatMap((move) => {
    return along(move).filter(({ x, y }) => {
      const radius = Math.hypot(x, y);
      return radius >= radii[0] && radius <= radii[1];
    });
  });
}

function along({ from, to, centre, turn }: TracedMove): Point[] {
  const [x0, y0, x1, y1] = [from.x ?? 0, from.y ?? 0, to.x ?? 0, to.y ?? 0];
  if (centre === undefined || turn === undefined) {
    const count = Math.ceil(Math.hypot(x1 - x0, y1 - y0) / STEP) + 1;
    return Array.from({ length: count + 1 }, (_, i) => ({
      x: x0 + ((x1 - x0) * i) / count,
      y: y0 + ((y1 - y0) * i) / count,
    }));
  }
  const radius = Math.hypot(x0 - centre.x, y0 - centre.y);
  const start = Math.atan2(y0 - centre.y, x0 - centre.x);
  const count = Math.ceil((Math.abs(turn) * radius) / STEP) + 1;
  return Array.from({ length: count + 1 }, (_, i) => ({
    x: centre.x + radius * Math.cos(start + (turn * i) / count),
    y: centre.y + radius * Math.sin(start + (turn * i) / count),
  }));
}

/** Over two opposite tips, `points` the finishing path: it passes over a tip at a cutter's radius from the land. */
export function overTipsOf(points: readonly Point[], teeth: number, cutterRadius: number): number {
  const pitch = (2 * Math.PI) / teeth;
  const at = (tooth: number): number => {
    const angle = tooth * pitch;
    const near = points.filter(
      ({ x, y }) =>
        x * Math.cos(angle) + y * Math.sin(angle) > 0 &&
        Math.abs(y * Math.cos(angle) - x * Math.sin(angle)) < 2 * STEP,
    );
    return Math.min(...near.map(({ x, y }) => Math.hypot(x, y))) - cutterRadius;
  };
  // Off the joint at tooth 1.
  const tooth = Math.round(teeth / 5);
  return at(tooth) + at(tooth + teeth / 2);
}

/** Between jaws over k teeth, from the pitch circle up: each rests where the path, less the cutter's radius, goes furthest its way. */
export function spanOf(
  points: readonly Point[],
  teeth: number,
  k: number,
  pitchRadius: number,
  cutterRadius: number,
): number {
  const pitch = (2 * Math.PI) / teeth;
  const first = Math.round(teeth / 5);
  const middle = (first + (k - 1) / 2) * pitch;
  const across = { x: -Math.sin(middle), y: Math.cos(middle) };
  const jaw = (tooth: number, side: 1 | -1): number => {
    let most = -Infinity;
    for (const { x, y } of points) {
      const off = side * turnBetween(Math.atan2(y, x), tooth * pitch);
      if (off > 0 && off < pitch / 2 && Math.hypot(x, y) > pitchRadius) {
        most = Math.max(most, side * (x * across.x + y * across.y) - cutterRadius);
      }
    }
    return most;
  };
  return jaw(first + k - 1, 1) + jaw(first, -1);
}

/** From one angle to another the short way. */
function turnBetween(angle: number, from: number): number {
  return Math.atan2(Math.sin(angle - from), Math.cos(angle - from));
}

/** A hole finished from inside: twice the furthest place of the path, and the cutter's diameter. */
export function boreOf(points: readonly Point[], cutterRadius: number): number {
  return 2 * (Math.max(...points.map(({ x, y }) => Math.hypot(x, y))) + cutterRadius);
}
