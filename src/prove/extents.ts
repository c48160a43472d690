/** How far a program's moves reach along each axis, arcs included. mm; nought for an axis whose place is never known. */
import type { TracedMove } from '../motion/traced-move.ts';

export type Range = readonly [number, number];

export interface Extents {
  readonly x: Range;
  readonly y: Range;
  readonly z: Range;
}

/** So far. */
interface Reach {
  left: number;
  right: number;
  front: number;
  back: number;
  low: number;
  high: number;
}

/** `below`: only of moves that go lower than this; from an unknown height a program only rises. */
export function extentsOf(moves: readonly TracedMove[], below = Infinity): Extents {
  const reach: Reach = {
    left: Infinity,
    right: -Infinity,
    front: Infinity,
    back: -Infinity,
    low: Infinity,
    high: -Infinity,
  };
  let stood: TracedMove['to'] | undefined;
  for (const move of moves) {
    if (below !== Infinity && !goesBelow(move, below)) {
      continue;
    }
    if (move.from !== stood) {
      takePlace(reach, move.from);
    }
    takePlace(reach, move.to);
    if (move.kind === 'arc') {
      takeArc(reach, move);
    }
    stood = move.to;
  }
  const range = (low: number, high: number): Range => (low > high ? [0, 0] : [low, high]);
  return {
    x: range(reach.left, reach.right),
    y: range(reach.front, reach.back),
    z: range(reach.low, reach.high),
  };
}

function goesBelow({ from, to }: TracedMove, z: number): boolean {
  return (to.z !== null && to.z < z) || (from.z !== null && from.z < z);
}

function takePlace(reach: Reach, { x, y, z }: TracedMove['to']): void {
  if (x !== null) {
    takeX(reach, x);
  }
  if (y !== null) {
    takeY(reach, y);
  }
  if (z !== null) {
    reach.low = z < reach.low ? z : reach.low;
    reach.high = z > reach.high ? z : reach.high;
  }
}

function takeX(reach: Reach, x: number): void {
  reach.left = x < reach.left ? x : reach.left;
  reach.right = x > reach.right ? x : reach.right;
}

function takeY(reach: Reach, y: number): void {
  reach.front = y < reach.front ? y : reach.front;
  reach.back = y > reach.back ? y : reach.back;
}

/** The quarters that an arc passes: there it reaches furthest. */
function takeArc(reach: Reach, { from, centre, turn }: TracedMove): void {
  if (centre === undefined || turn === undefined || from.x === null || from.y === null) {
    return;
  }
  const { x, y } = centre;
  const radius = Math.sqrt((from.x - x) ** 2 + (from.y - y) ** 2);
  if (
    x - radius >= reach.left &&
    x + radius <= reach.right &&
    y - radius >= reach.front &&
    y + radius <= reach.back
  ) {
    return;
  }
  const start = Math.atan2(from.y - y, from.x - x);
  const low = turn < 0 ? start + turn : start;
  const high = turn < 0 ? start : start + turn;
  const quarter = Math.PI / 2;
  for (let k = Math.ceil(low / quarter); k * quarter <= high; k++) {
    const across = ((k % 4) + 4) % 4;
    const out = across < 2 ? radius : -radius;
    if (across % 2 === 0) {
      takeX(reach, x + out);
    } else {
      takeY(reach, y + out);
    }
  }
}
