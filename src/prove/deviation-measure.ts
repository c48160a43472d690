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

/** Stations that are picked for together; first for some groups at once, so that most paths are looked at seldom. */
const GROUP = 4;
const GROUPS = 8 * GROUP;
const STEPS = 200;
const CLOSE = PROOF_RESOLUTION / 10;

export function readingsFor(count: number): Readings {
  return { low: new Float64Array(count), high: new Float64Array(count), path: new Int32Array(count) };
}

/** Fills `readings` for every station of the copy. */
export function measureCopy(field: Field, stations: Stations, readings: Readings): void {
  const { paths, deep } = field.near;
  const all = { paths, deep, count: paths.length, trusted: Infinity };
  const wide = pickingRoom(paths.length);
  const picked = pickingRoom(paths.length);
  for (let first = 0; first < stations.count; first += GROUP) {
    if (first % GROUPS === 0) {
      pickPaths(field, all, stations, first, Math.min(first + GROUPS, stations.count), wide);
    }
    const last = Math.min(first + GROUP, stations.count);
    pickPaths(field, wide, stations, first, last, picked);
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
  const { paths, deep } = field.near;
  const all = { paths, deep, count: paths.length, trusted: Infinity };
  const picked = pickingRoom(paths.length);
  pickPaths(field, all, stations, first, last + 1, picked);
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

/** Paths, the deep ones first, and up to which deviations they are enough. */
interface Choice {
  readonly paths: Int32Array;
  readonly deep: number;
  readonly count: number;
  readonly trusted: number;
}

/** The paths that can decide a group of neighbouring stations. */
interface Picked extends Choice {
  readonly gaps: Float64Array;
  deep: number;
  count: number;
  trusted: number;
  /** The deep path nearest to the last group, or -1. */
  best: number;
}

function pickingRoom(size: number): Picked {
  return {
    paths: new Int32Array(size),
    gaps: new Float64Array(size),
    deep: 0,
    count: 0,
    trusted: 0,
    best: -1,
  };
}

/**
 * Of those to choose from the ones whose gap at the group's middle is within twice the group's spread of the least deep
 * one, or of how far normals are followed: gaps change by no more than the spread from the middle to any station.
 */
function pickPaths(
  { set, cos, sin }: Field,
  from: Choice,
  stations: Stations,
  first: number,
  last: number,
  picked: Picked,
): void {
  const middle = (first + last) >> 1;
  const sx = stations.x[middle]!;
  const sy = stations.y[middle]!;
  const spread = spreadOf(stations, first, last, sx, sy);
  const x = sx * cos - sy * sin;
  const y = sx * sin + sy * cos;
  const { mx, my, bound, radius } = set;
  // The path that was nearest to the stations before is a good guess.
  let least = picked.best < 0 ? Infinity : pathDistance(set, picked.best, x, y) - radius[picked.best]!;
  let margin = (least > 0 ? 2 * least : 0) + 3 * spread;
  const { gaps } = picked;
  for (let k = 0; k < from.count; k++) {
    const i = from.paths[k]!;
    const dx = mx[i]! - x;
    const dy = my[i]! - y;
    const reach = bound[i]! + radius[i]! + margin;
    // What is surely further than the best so far and its margin need not be measured.
    if (dx * dx + dy * dy > reach * reach) {
      gaps[k] = Infinity;
      continue;
    }
    const gap = pathDistance(set, i, x, y) - radius[i]!;
    gaps[k] = gap;
    if (k < from.deep && gap < least) {
      least = gap;
      margin = (least > 0 ? 2 * least : 0) + 3 * spread;
      picked.best = i;
    }
  }
  const enough = 2 * Math.max(least, 0) + spread;
  picked.trusted = Math.min(enough, from.trusted);
  keepWithin(from, picked, enough + spread);
}

/** How far stations of a group are from a place at most. */
function spreadOf({ x, y }: Stations, first: number, last: number, sx: number, sy: number): number {
  let most = 0;
  for (let i = first; i < last; i++) {
    const dx = x[i]! - sx;
    const dy = y[i]! - sy;
    const away = dx * dx + dy * dy;
    most = away > most ? away : most;
  }
  return Math.sqrt(most);
}

function keepWithin(from: Choice, picked: Picked, limit: number): void {
  const { gaps, paths } = picked;
  let count = 0;
  let deep = 0;
  for (let k = 0; k < from.count; k++) {
    if (gaps[k]! <= limit) {
      paths[count++] = from.paths[k]!;
      deep = k < from.deep ? count : deep;
    }
  }
  picked.count = count;
  picked.deep = deep;
}
