/**
 * Which paths can touch which copy of an outline that repeats round the axis: each path is put into the list of every
 * copy whose sector it may reach within `slack`.
 *
 * In : paths, number of copies, radii between which the outline lies. Out: for each copy the indices of its paths.
 */
import type { PathSet } from './metal-paths.ts';

/** The paths of one copy, the deep ones first. */
export interface NearList {
  readonly paths: Int32Array;
  readonly deep: number;
}

export interface Ring {
  readonly copies: number;
  readonly inner: number;
  readonly outer: number;
  /** Polar angle about which copy 0 lies; each copy reaches half a pitch to both sides. */
  readonly middle: number;
}

export function nearLists(set: PathSet, ring: Ring, slack: number): NearList[] {
  const pitch = (2 * Math.PI) / ring.copies;
  const lists: number[][] = Array.from({ length: ring.copies }, () => []);
  const deep = new Int32Array(ring.copies);
  // The deep ones are put in first.
  for (let round = 1; round >= 0; round--) {
    for (let i = 0; i < set.count; i++) {
      if (set.deep[i] === round) {
        putIn(set, i, ring, pitch, slack, lists);
      }
    }
    if (round === 1) {
      lists.forEach((list, copy) => (deep[copy] = list.length));
    }
  }
  return lists.map((list, copy) => ({ paths: Int32Array.from(list), deep: deep[copy]! }));
}

function putIn(set: PathSet, i: number, ring: Ring, pitch: number, slack: number, lists: number[][]): void {
  const mx = set.mx[i]!;
  const my = set.my[i]!;
  const rho = Math.sqrt(mx * mx + my * my);
  const reach = set.bound[i]! + set.radius[i]! + slack;
  if (rho - reach > ring.outer || rho + reach < ring.inner) {
    return;
  }
  const half = (reach < rho ? Math.asin(reach / rho) : Math.PI) + pitch / 2;
  const middle = Math.atan2(my, mx) - ring.middle;
  const first = Math.ceil((middle - half) / pitch);
  const last = Math.min(Math.floor((middle + half) / pitch), first + ring.copies - 1);
  for (let k = first; k <= last; k++) {
    lists[((k % ring.copies) + ring.copies) % ring.copies]!.push(i);
  }
}
