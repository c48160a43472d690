/**
 * Moves that lie in the same place in plan as one before: the laps of a descent, a spring pass. For each move the first one
 * in its place, itself where it is that. Told apart by exact comparison of every number; the mixture of a few of them only
 * finds what to compare (a table with open addressing: a map of numbers would cost more than what it saves).
 */
import type { SolidMove } from './metal-paths.ts';

export function twinsOf(solids: readonly SolidMove[]): Int32Array {
  const twin = new Int32Array(solids.length);
  let size = 16;
  while (size < 2 * solids.length) {
    size *= 2;
  }
  const table = new Int32Array(size).fill(-1);
  for (let i = 0; i < solids.length; i++) {
    const solid = solids[i]!;
    let at = mixtureOf(solid) & (size - 1);
    let k = table[at]!;
    while (k >= 0 && !samePlace(solid, solids[k]!)) {
      at = (at + 1) & (size - 1);
      k = table[at]!;
    }
    if (k < 0) {
      table[at] = i;
    }
    twin[i] = k < 0 ? i : k;
  }
  return twin;
}

/** Places are written to four or five decimals: as whole numbers they differ in their lowest bits. */
function mixtureOf({ x0, y0, x1, y1 }: SolidMove): number {
  const steps = (x0 * 31 + y0 * 1009 + x1 * 523 + y1 * 7919) * 1e5;
  const whole = (steps % 0x7fffffff) | 0;
  return whole ^ (whole >>> 15);
}

function samePlace(a: SolidMove, b: SolidMove): boolean {
  return (
    a.x0 === b.x0 &&
    a.y0 === b.y0 &&
    a.x1 === b.x1 &&
    a.y1 === b.y1 &&
    a.radius === b.radius &&
    a.move.turn === b.move.turn &&
    a.move.centre?.x === b.move.centre?.x &&
    a.move.centre?.y === b.move.centre?.y
  );
}
