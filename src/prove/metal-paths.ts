/**
 * The cutter's paths seen from above, for two heights at once: every part of every move whose cutter bottom lies at or below
 * the upper one, marked `deep` where it lies at or below the lower one too.
 *
 * A cutter takes everything above its bottom, so the paths at a greater height contain those at a lower one: metal cut
 * away (gouge) is worst at the top of the wheel, metal left is worst at its bottom, and two heights with equal figures
 * have the same figures everywhere between. Typed arrays, because every flank point is held against them.
 * In: traced moves with the radius of their cutter. Out: lines and arcs of the cutter's axis; mm, the program's frame.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import { twinsOf } from './metal-twins.ts';

/** A move whose two ends and cutter are known. */
export interface SolidMove {
  readonly move: TracedMove;
  readonly x0: number;
  readonly y0: number;
  readonly z0: number;
  readonly x1: number;
  readonly y1: number;
  readonly z1: number;
  /** Of the cutter. */
  readonly radius: number;
}

export interface PathSet {
  readonly count: number;
  readonly x0: Float64Array;
  readonly y0: Float64Array;
  readonly x1: Float64Array;
  readonly y1: Float64Array;
  /** Of arcs; `arc` is their radius, 0 for lines. */
  readonly cx: Float64Array;
  readonly cy: Float64Array;
  readonly arc: Float64Array;
  readonly turn: Float64Array;
  /** A circle round the path: its middle, and how far its points are from it at most. */
  readonly mx: Float64Array;
  readonly my: Float64Array;
  readonly bound: Float64Array;
  /** Radius of the cutter. */
  readonly radius: Float64Array;
  /** 1 where the whole path lies at or below the lower height. */
  readonly deep: Uint8Array;
  /** For each path the first one in the same place: itself, where there was none. */
  readonly twin: Int32Array;
  /** The move each path is part of. */
  readonly solids: readonly SolidMove[];
}

/** The moves whose ends are known, with the cutter that makes them. */
export function solidMoves(
  moves: readonly TracedMove[],
  radiusOf: (move: TracedMove) => number | undefined,
): SolidMove[] {
  const solids: SolidMove[] = [];
  for (const move of moves) {
    const { from, to } = move;
    const radius = radiusOf(move);
    if (radius === undefined || from.x === null || from.y === null || from.z === null) {
      continue;
    }
    if (to.x === null || to.y === null || to.z === null) {
      continue;
    }
    solids.push({ move, x0: from.x, y0: from.y, z0: from.z, x1: to.x, y1: to.y, z1: to.z, radius });
  }
  return solids;
}

/** Whole moves, one path each, in their order; those that lie where an earlier one lies share its figures. */
export function wholePaths(solids: readonly SolidMove[]): PathSet {
  const twin = twinsOf(solids);
  const set = emptySet(solids, new Uint8Array(solids.length).fill(1), twin);
  for (let i = 0; i < set.count; i++) {
    if (twin[i] === i) {
      place(set, i, solids[i]!, 0, 1);
    } else {
      copyPath(set, twin[i]!, set, i);
    }
  }
  return set;
}

/** The parts of the moves at or below `upper`, cut in two where they cross `lower`; each place once, at its first move. */
export function pathsBelow(
  solids: readonly SolidMove[],
  lower: number,
  upper: number,
  whole: PathSet = wholePaths(solids),
): PathSet {
  const parts: SolidMove[] = [];
  const deep: number[] = [];
  const from: number[] = [];
  // Which places are there already: 1 above the lower height, 2 below it.
  const seen = new Uint8Array(solids.length);
  const take = (i: number, isDeep: 0 | 1, cut: boolean): void => {
    const mark = isDeep + 1;
    const twin = whole.twin[i]!;
    if (cut || (seen[twin]! & mark) === 0) {
      seen[twin]! |= cut ? 0 : mark;
      parts.push(solids[i]!);
      deep.push(isDeep);
      from.push(cut ? -1 : twin);
    }
  };
  for (let i = 0; i < solids.length; i++) {
    const { z0, z1 } = solids[i]!;
    const least = Math.min(z0, z1);
    const most = Math.max(z0, z1);
    if (least <= lower) {
      take(i, 1, most > lower);
    }
    if (most > lower && least <= upper && upper > lower) {
      take(i, 0, least < lower || most > upper);
    }
  }
  const set = emptySet(
    parts,
    Uint8Array.from(deep),
    Int32Array.from(parts, (_, k) => k),
  );
  for (let k = 0; k < set.count; k++) {
    if (from[k]! >= 0) {
      copyPath(whole, from[k]!, set, k);
    } else {
      const { z0, z1 } = parts[k]!;
      const low = deep[k] === 1 ? -Infinity : lower;
      const high = deep[k] === 1 ? lower : upper;
      place(set, k, parts[k]!, shareWithin(z0, z1, low, high), 1 - shareWithin(z1, z0, low, high));
    }
  }
  return set;
}

/** Field by field: this runs for every lap of every tooth. */
function copyPath(source: PathSet, i: number, target: PathSet, k: number): void {
  target.x0[k] = source.x0[i]!;
  target.y0[k] = source.y0[i]!;
  target.x1[k] = source.x1[i]!;
  target.y1[k] = source.y1[i]!;
  target.cx[k] = source.cx[i]!;
  target.cy[k] = source.cy[i]!;
  target.arc[k] = source.arc[i]!;
  target.turn[k] = source.turn[i]!;
  target.mx[k] = source.mx[i]!;
  target.my[k] = source.my[i]!;
  target.bound[k] = source.bound[i]!;
  target.radius[k] = source.radius[i]!;
}

/** Share of the way from z0 to z1 after which the height is between low and high. */
function shareWithin(z0: number, z1: number, low: number, high: number): number {
  if (z0 >= low && z0 <= high) {
    return 0;
  }
  return z0 === z1 ? 0 : ((z0 < low ? low : high) - z0) / (z1 - z0);
}

function emptySet(solids: readonly SolidMove[], deep: Uint8Array, twin: Int32Array): PathSet {
  const field = (): Float64Array => new Float64Array(solids.length);
  return {
    count: solids.length,
    x0: field(),
    y0: field(),
    x1: field(),
    y1: field(),
    cx: field(),
    cy: field(),
    arc: field(),
    turn: field(),
    mx: field(),
    my: field(),
    bound: field(),
    radius: field(),
    deep,
    twin,
    solids,
  };
}

/** The part of the move between u and v, as path i. */
function place(set: PathSet, i: number, solid: SolidMove, u: number, v: number): void {
  set.radius[i] = solid.radius;
  if (solid.move.turn === undefined) {
    placeLine(set, i, solid, u, v);
  } else {
    placeArc(set, i, solid, u, v);
  }
}

function placeLine(set: PathSet, i: number, solid: SolidMove, u: number, v: number): void {
  const { x0, y0, x1, y1 } = solid;
  const dx = x1 - x0;
  const dy = y1 - y0;
  set.x0[i] = u === 0 ? x0 : x0 + u * dx;
  set.y0[i] = u === 0 ? y0 : y0 + u * dy;
  set.x1[i] = v === 1 ? x1 : x0 + v * dx;
  set.y1[i] = v === 1 ? y1 : y0 + v * dy;
  set.mx[i] = x0 + ((u + v) / 2) * dx;
  set.my[i] = y0 + ((u + v) / 2) * dy;
  set.bound[i] = (Math.sqrt(dx * dx + dy * dy) * (v - u)) / 2;
}

function placeArc(set: PathSet, i: number, solid: SolidMove, u: number, v: number): void {
  const { x0, y0, x1, y1 } = solid;
  const turn = solid.move.turn ?? 0;
  const { x: cx, y: cy } = solid.move.centre ?? { x: 0, y: 0 };
  const sx = x0 - cx;
  const sy = y0 - cy;
  // The ends were rounded apart; the middle of the two radii is never further off than half the rounding.
  const first = Math.sqrt(sx * sx + sy * sy);
  const arc = (first + Math.sqrt((x1 - cx) * (x1 - cx) + (y1 - cy) * (y1 - cy))) / 2;
  const even = first === 0 ? 0 : arc / first;
  set.x0[i] = x0;
  set.y0[i] = y0;
  set.x1[i] = x1;
  set.y1[i] = y1;
  set.cx[i] = cx;
  set.cy[i] = cy;
  set.arc[i] = arc;
  set.turn[i] = turn * (v - u);
  set.bound[i] = Math.min(2 * arc, (arc * Math.abs(turn) * (v - u)) / 2);
  turned(set, i, ((u + v) / 2) * turn, sx * even, sy * even, set.mx, set.my);
  if (u !== 0) {
    turned(set, i, u * turn, sx * even, sy * even, set.x0, set.y0);
  }
  if (v !== 1) {
    turned(set, i, v * turn, sx * even, sy * even, set.x1, set.y1);
  }
}

/** The spoke (x, y) of path i's arc, turned: where its end lies. */
function turned(
  set: PathSet,
  i: number,
  angle: number,
  x: number,
  y: number,
  xs: Float64Array,
  ys: Float64Array,
): void {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  xs[i] = set.cx[i]! + x * c - y * s;
  ys[i] = set.cy[i]! + x * s + y * c;
}
