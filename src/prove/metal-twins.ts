/** Paths that lie in the same place as one before: the laps of a descent, a spring pass. Told apart by exact comparison. */
import type { PathSet } from './metal-paths.ts';

/** The first path among `known` that path i repeats (-1 if none, and i is then known too). */
export function twinOf(set: PathSet, known: Map<number, number[]>, i: number): number {
  // Any mixture of the ends will do for a key: what shares it is compared in full.
  const key = set.x0[i]! + 7 * set.y1[i]!;
  const alike = known.get(key);
  if (alike === undefined) {
    known.set(key, [i]);
    return -1;
  }
  for (const k of alike) {
    if (samePath(set, i, k)) {
      return k;
    }
  }
  alike.push(i);
  return -1;
}

function samePath(set: PathSet, i: number, k: number): boolean {
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
