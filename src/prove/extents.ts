/** How far a program's moves reach along each axis, arcs included. mm; nought for an axis whose place is never known. */
import type { TracedMove } from '../motion/traced-move.ts';

export type Range = readonly [number, number];

export interface Extents {
  readonly x: Range;
  readonly y: Range;
  readonly z: Range;
}

export function extentsOf(moves: Iterable<TracedMove>): Extents {
  const low = [Infinity, Infinity, Infinity];
  const high = [-Infinity, -Infinity, -Infinity];
  const take = (axis: number, value: number | null): void => {
    if (value !== null) {
      low[axis] = Math.min(low[axis]!, value);
      high[axis] = Math.max(high[axis]!, value);
    }
  };
  const isWithin = (left: number, right: number, front: number, back: number): boolean =>
    left >= low[0]! && right <= high[0]! && front >= low[1]! && back <= high[1]!;
  for (const move of moves) {
    for (const { x, y, z } of [move.from, move.to]) {
      take(0, x);
      take(1, y);
      take(2, z);
    }
    if (move.turn !== undefined) {
      takeArc(move, take, isWithin);
    }
  }
  const range = (axis: number): Range => (low[axis]! > high[axis]! ? [0, 0] : [low[axis]!, high[axis]!]);
  return { x: range(0), y: range(1), z: range(2) };
}

/** The quarters that an arc passes: there it reaches furthest. */
function takeArc(
  { from, centre, turn }: TracedMove,
  take: (axis: number, value: number) => void,
  isWithin: (left: number, right: number, low: number, high: number) => boolean,
): void {
  if (centre === undefined || turn === undefined || from.x === null || from.y === null) {
    return;
  }
  const radius = Math.sqrt((from.x - centre.x) ** 2 + (from.y - centre.y) ** 2);
  if (isWithin(centre.x - radius, centre.x + radius, centre.y - radius, centre.y + radius)) {
    return;
  }
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  const [low, high] = turn < 0 ? [start + turn, start] : [start, start + turn];
  const quarter = Math.PI / 2;
  for (let k = Math.ceil(low / quarter); k * quarter <= high; k++) {
    const across = ((k % 4) + 4) % 4;
    take(across % 2, (across % 2 === 0 ? centre.x : centre.y) + (across < 2 ? radius : -radius));
  }
}
