/**
 * Moves that lie in the same place in plan as one before: the laps of a descent, a spring pass. For each move the first one
 * in its place, itself where it is that, and the next one there. Told apart by exact comparison of every number; the
 * mixture of a few of them only finds what to compare (a table with open addressing: a map of numbers would cost more
 * than what it saves).
 */
import type { SolidMoves } from './metal-solids.ts';

/** To a millimetre. */
const STEPS = 1e5;

export type Twins = Pick<SolidMoves, 'twin' | 'next' | 'places'>;

export function twinsOf(solids: Omit<SolidMoves, keyof Twins>): Twins {
  const { count, x0, y0, x1, y1, cx, cy, turn, radius } = solids;
  const twin = new Int32Array(count);
  const next = new Int32Array(count).fill(-1);
  const last = new Int32Array(count);
  const places = new Int32Array(count);
  let placed = 0;
  let size = 16;
  while (size < 2 * count) {
    size *= 2;
  }
  const table = new Int32Array(size).fill(-1);
  for (let i = 0; i < count; i++) {
    // Places are written to four or five decimals: as whole numbers they differ in their lowest bits.
    const mixture = Math.imul((x1[i]! * STEPS) | 0, 0x9e3779b1) ^ Math.imul((y1[i]! * STEPS) | 0, 0x85ebca6b);
    let at = (mixture ^ (mixture >>> 15)) & (size - 1);
    let k = table[at]!;
    while (
      k >= 0 &&
      (x1[i] !== x1[k] ||
        y1[i] !== y1[k] ||
        x0[i] !== x0[k] ||
        y0[i] !== y0[k] ||
        turn[i] !== turn[k] ||
        cx[i] !== cx[k] ||
        cy[i] !== cy[k] ||
        radius[i] !== radius[k])
    ) {
      at = (at + 1) & (size - 1);
      k = table[at]!;
    }
    if (k < 0) {
      table[at] = i;
      places[placed++] = i;
      twin[i] = i;
      last[i] = i;
    } else {
      twin[i] = k;
      next[last[k]!] = i;
      last[k] = i;
    }
  }
  return { twin, next, places: places.subarray(0, placed) };
}
