/**
 * The moves whose two ends and cutter are known, as columns of numbers: every check goes through all of them, and numbers
 * in columns are read several times faster than fields of as many objects. mm, radians, the program's frame.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import { twinsOf } from './metal-twins.ts';

/** A column each; index i is one move, in the order they are run. */
export interface SolidMoves {
  readonly count: number;
  readonly moves: readonly TracedMove[];
  readonly x0: Float64Array;
  readonly y0: Float64Array;
  readonly z0: Float64Array;
  readonly x1: Float64Array;
  readonly y1: Float64Array;
  readonly z1: Float64Array;
  /** Of the cutter. */
  readonly radius: Float64Array;
  /** Of arcs; 0 for lines. */
  readonly cx: Float64Array;
  readonly cy: Float64Array;
  readonly turn: Float64Array;
  /** 1 for a fast move. */
  readonly rapid: Uint8Array;
  /** The first move that lies in the same place in plan: itself, where there was none. */
  readonly twin: Int32Array;
  /** The next move in the same place, or -1. */
  readonly next: Int32Array;
  /** The first move of each place. */
  readonly places: Int32Array;
}

export function solidMoves(
  all: readonly TracedMove[],
  radiusOf: (move: TracedMove) => number | undefined,
): SolidMoves {
  const moves: TracedMove[] = [];
  const room = (): Float64Array => new Float64Array(all.length);
  const [x0, y0, z0, x1, y1, z1] = [room(), room(), room(), room(), room(), room()];
  const [radius, cx, cy, turn] = [room(), room(), room(), room()];
  const rapid = new Uint8Array(all.length);
  let cutter: number | null | undefined;
  let its: number | undefined;
  let n = 0;
  for (let k = 0; k < all.length; k++) {
    const move = all[k]!;
    const { from, to } = move;
    if (move.cutter !== cutter) {
      cutter = move.cutter;
      its = radiusOf(move);
    }
    if (
      its === undefined ||
      from.x === null ||
      from.y === null ||
      from.z === null ||
      to.x === null ||
      to.y === null ||
      to.z === null
    ) {
      continue;
    }
    x0[n] = from.x;
    y0[n] = from.y;
    z0[n] = from.z;
    x1[n] = to.x;
    y1[n] = to.y;
    z1[n] = to.z;
    radius[n] = its;
    if (move.kind === 'arc' && move.centre !== undefined) {
      cx[n] = move.centre.x;
      cy[n] = move.centre.y;
      turn[n] = move.turn ?? 0;
    } else if (move.kind === 'rapid') {
      rapid[n] = 1;
    }
    moves.push(move);
    n += 1;
  }
  const columns = { count: n, moves, x0, y0, z0, x1, y1, z1, radius, cx, cy, turn, rapid };
  return { ...columns, ...twinsOf(columns) };
}

/** Lowest point of a move. */
export function lowOf({ z0, z1 }: SolidMoves, i: number): number {
  return Math.min(z0[i]!, z1[i]!);
}
