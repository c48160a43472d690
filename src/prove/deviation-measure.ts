/**
 * Signed deviation of the cut metal from one copy of an outline, at every station and at two heights: positive is metal left
 * along the outward normal (the least distance at which the swept region is met), negative how deep a cutter goes in.
 *
 * The gap to the swept region never changes faster than the place it is taken at. So stepping along the normal by the gap
 * itself never steps over metal that was cut; and paths that only the upper height has change nothing at a station from
 * which they are further than the deviation found without them.
 */
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import { pathDistance, sweptGap, type Nearest } from './metal-distance.ts';
import type { NearList } from './metal-near.ts';
import type { PathSet } from './metal-paths.ts';
import { REGION, stationAt, type Stations } from './deviation-stations.ts';

/** What one copy of the outline is measured against. */
export interface Field {
  readonly set: PathSet;
  /** Paths that may touch this copy. */
  readonly near: NearList;
  readonly cos: number;
  readonly sin: number;
  /** Metal left is followed out to here and no further. */
  readonly farthest: number;
}

/** Reused from copy to copy. */
export interface Readings {
  /** At the lower and at the upper height. */
  readonly low: Float64Array;
  readonly high: Float64Array;
  /** Path that decides the lower one; -1 for none. */
  readonly path: Int32Array;
}

export type Height = 'low' | 'high';

const GROUP = 8;
const STEPS = 200;
const CLOSE = PROOF_RESOLUTION / 10;

export function readingsFor(count: number): Readings {
  return { low: new Float64Array(count), high: new Float64Array(count), path: new Int32Array(count) };
}

/** Fills `readings` for every station of the copy. */
export function measureCopy(field: Field, stations: Stations, readings: Readings): void {
  const { paths, deep } = field.near;
  const picked = pickingRoom(paths.length);
  for (let first = 0; first < stations.count; first += GROUP) {
    const last = Math.min(first + GROUP, stations.count);
    pickPaths(field, stations, first, last, picked);
    for (let i = first; i < last; i++) {
      const follow = stations.region[i]! !== REGION.bare;
      place(field, stations.x[i]!, stations.y[i]!, stations.nx[i]!, stations.ny[i]!);
      let low = deviationAt(field, picked.paths, 0, picked.deep, follow);
      if (low > picked.trusted) {
        low = deviationAt(field, paths, 0, deep, follow);
      }
      readings.low[i] = low;
      readings.path[i] = nearest.path;
      readings.high[i] = highFrom(field, picked, low, follow);
    }
  }
}

/** Deviation between stations, at u of a piece. */
export function deviationOn(
  field: Field,
  stations: Stations,
  piece: number,
  u: number,
  height: Height,
): number {
  const { piece: exact, region } = stations.pieces[piece]!;
  const at = stationAt(exact, u);
  place(field, at.x, at.y, at.nx, at.ny);
  const count = height === 'low' ? field.near.deep : field.near.paths.length;
  return deviationAt(field, field.near.paths, 0, count, region !== REGION.bare);
}

/** The same field with only the paths that can decide deviations up to `trusted` between two stations. */
export function narrowed(
  field: Field,
  stations: Stations,
  first: number,
  last: number,
): { readonly field: Field; readonly trusted: number } {
  const picked = pickingRoom(field.near.paths.length);
  pickPaths(field, stations, first, last + 1, picked);
  const near = { paths: picked.paths.subarray(0, picked.count), deep: picked.deep };
  return { field: { ...field, near }, trusted: picked.trusted };
}

const nearest: Nearest = { path: -1 };

/** The path that decided the last deviation. */
export function decidingPath(): number {
  return nearest.path;
}

/** Station and normal in the program's frame: scratch, so that the hot loop makes no objects. */
const spot = { x: 0, y: 0, nx: 0, ny: 0 };

function place(field: Field, x: number, y: number, nx: number, ny: number): void {
  const { cos, sin } = field;
  spot.x = x * cos - y * sin;
  spot.y = x * sin + y * cos;
  spot.nx = nx * cos - ny * sin;
  spot.ny = nx * sin + ny * cos;
}

function deviationAt(field: Field, list: Int32Array, from: number, to: number, follow: boolean): number {
  const { set, farthest } = field;
  let gap = sweptGap(set, list, from, to, spot.x, spot.y, nearest);
  let out = gap;
  const steps = follow ? STEPS : 0;
  for (let step = 0; step < steps && gap > CLOSE && out < farthest; step++) {
    gap = sweptGap(set, list, from, to, spot.x + out * spot.nx, spot.y + out * spot.ny, nearest);
    out += gap;
  }
  return Math.min(out, farthest);
}

/** The upper height's deviation, where the lower one's is known. */
function highFrom(field: Field, picked: Picked, low: number, follow: boolean): number {
  if (low <= picked.trusted) {
    const gap = sweptGap(field.set, picked.paths, picked.deep, picked.count, spot.x, spot.y, nearest);
    if (gap > Math.max(low, 0) + CLOSE) {
      return low;
    }
  }
  const { paths } = field.near;
  return deviationAt(field, paths, 0, paths.length, follow);
}

/** The paths that can decide a group of neighbouring stations, the deep ones first. */
interface Picked {
  readonly paths: Int32Array;
  readonly gaps: Float64Array;
  deep: number;
  count: number;
  /** Deviations up to this are decided by `paths`. */
  trusted: number;
}

function pickingRoom(size: number): Picked {
  return { paths: new Int32Array(size), gaps: new Float64Array(size), deep: 0, count: 0, trusted: 0 };
}

/**
 * Those whose gap at the group's middle is within twice the group's spread of the least deep one, or of how far
 * normals are followed: gaps change by no more than the spread from the middle to any station.
 */
function pickPaths(field: Field, stations: Stations, first: number, last: number, picked: Picked): void {
  const { set, near, cos, sin } = field;
  const middle = (first + last) >> 1;
  const sx = stations.x[middle]!;
  const sy = stations.y[middle]!;
  let spread2 = 0;
  for (let i = first; i < last; i++) {
    const dx = stations.x[i]! - sx;
    const dy = stations.y[i]! - sy;
    spread2 = Math.max(spread2, dx * dx + dy * dy);
  }
  const spread = Math.sqrt(spread2);
  const x = sx * cos - sy * sin;
  const y = sx * sin + sy * cos;
  let least = Infinity;
  for (let k = 0; k < near.paths.length; k++) {
    const i = near.paths[k]!;
    const dx = set.mx[i]! - x;
    const dy = set.my[i]! - y;
    const bound = Math.sqrt(dx * dx + dy * dy) - set.bound[i]! - set.radius[i]!;
    // What is surely further than the best so far and its margin need not be measured.
    const gap =
      bound > 2 * Math.max(least, 0) + 3 * spread ? bound : pathDistance(set, i, x, y) - set.radius[i]!;
    picked.gaps[k] = gap;
    least = k < near.deep && gap < least ? gap : least;
  }
  picked.trusted = 2 * Math.max(least, 0) + spread;
  keepWithin(near, picked, picked.trusted + spread);
}

function keepWithin(near: NearList, picked: Picked, limit: number): void {
  let count = 0;
  for (let k = 0; k < near.paths.length; k++) {
    if (k === near.deep) {
      picked.deep = count;
    }
    if (picked.gaps[k]! <= limit) {
      picked.paths[count++] = near.paths[k]!;
    }
  }
  picked.count = count;
  if (near.deep === near.paths.length) {
    picked.deep = count;
  }
}
