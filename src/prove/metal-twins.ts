/**
 * Paths that lie in the same place as one before: the laps of a descent, a spring pass. For each path the first one in its
 * place, itself where it is that. Told apart by exact comparison; the mixture of ends only finds what to compare.
 */
import type { PathSet } from './metal-paths.ts';

export function twinsOf(set: Omit<PathSet, 'twin'>): Int32Array {
  const twin = new Int32Array(set.count);
  const newest = new Map<number, number>();
  const older = new Int32Array(set.count).fill(-1);
  for (let i = 0; i < set.count; i++) {
    const key = set.x0[i]! + 7 * set.y1[i]! + 3 * set.deep[i]!;
    const last = newest.get(key) ?? -1;
    let k = last;
    while (k >= 0 && !samePath(set, i, k)) {
      k = older[k]!;
    }
    twin[i] = k < 0 ? i : k;
    if (k < 0) {
      older[i] = last;
      newest.set(key, i);
    }
  }
  return twin;
}

function samePath(set: Omit<PathSet, 'twin'>, i: number, k: number): boolean {
  return (
    set.x0[i] === set.x0[k] &&
    set.y0[i] === set.y0[k] &&
    set.x1[i] === set.x1[k] &&
    set.y1[i] === set.y1[k] &&
    set.cx[i] === set.cx[k] &&
    set.cy[i] === set.cy[k] &&
    set.turn[i] === set.turn[k] &&
    set.deep[i] === set.deep[k] &&
    set.radius[i] === set.radius[k]
  );
}
