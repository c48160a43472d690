/**
 * The cutter's paths seen from above, for two heights at once: every part of every move whose cutter bottom lies at or below
 * the upper one, marked `deep` where it lies at or below the lower one too.
 *
 * A cutter takes everything above its bottom, so the paths at a greater height contain those at a lower one: metal cut
 * away (gouge) is worst at the top of the wheel, metal left is worst at its bottom, and two heights with equal figures
 * have the same figures everywhere between. Typed arrays, because every flank point is held against them.
 * In: moves with the radius of their cutter. Out: lines and arcs of the cutter's axis; mm, the program's frame.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import type { SolidMoves } from './metal-solids.ts';

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
  /** The move each path is part of. */
  readonly moves: readonly TracedMove[];
}

/** Whole moves, one path each, in their order; those that lie where an earlier one lies share its figures. */
export function wholePaths(solids: SolidMoves): PathSet {
  const { count, moves, x0, y0, x1, y1, cx, cy, turn, radius, twin } = solids;
  const [arc, mx, my, bound] = [room(count), room(count), room(count), room(count)];
  const deep = new Uint8Array(count).fill(1);
  const set = { count, moves, x0, y0, x1, y1, cx, cy, turn, radius, arc, mx, my, bound, deep };
  for (let i = 0; i < count; i++) {
    const k = twin[i]!;
    if (k === i) {
      place(set, i, solids, i, 0, 1);
    } else {
      arc[i] = arc[k]!;
      mx[i] = mx[k]!;
      my[i] = my[k]!;
      bound[i] = bound[k]!;
    }
  }
  return set;
}

function room(size: number): Float64Array {
  return new Float64Array(size);
}

/** A part of a move to be taken, and whether all of it: then its figures are there already. */
interface Parts {
  readonly solid: number[];
  readonly deep: (0 | 1)[];
  readonly whole: boolean[];
}

/** The parts of the moves at or below `upper`, cut in two where they cross `lower`; each place once, at its first move. */
export function pathsBelow(
  solids: SolidMoves,
  lower: number,
  upper: number,
  whole: PathSet = wholePaths(solids),
): PathSet {
  const parts = partsBelow(solids, lower, upper);
  const count = parts.solid.length;
  const set = emptySet(
    parts.solid.map((i) => solids.moves[i]!),
    Uint8Array.from(parts.deep),
  );
  for (let k = 0; k < count; k++) {
    const i = parts.solid[k]!;
    if (parts.whole[k]!) {
      copyPath(whole, i, set, k);
    } else {
      const [z0, z1] = [solids.z0[i]!, solids.z1[i]!];
      const low = parts.deep[k] === 1 ? -Infinity : lower;
      const high = parts.deep[k] === 1 ? lower : upper;
      place(set, k, solids, i, shareWithin(z0, z1, low, high), 1 - shareWithin(z1, z0, low, high));
    }
  }
  return set;
}

function partsBelow({ count, z0, z1, twin }: SolidMoves, lower: number, upper: number): Parts {
  const parts: Parts = { solid: [], deep: [], whole: [] };
  // Which places are there already: 1 above the lower height, 2 below it.
  const seen = new Uint8Array(count);
  for (let i = 0; i < count; i++) {
    const a = z0[i]!;
    const b = z1[i]!;
    const least = a < b ? a : b;
    if (least > upper) {
      continue;
    }
    const most = a < b ? b : a;
    if (least <= lower) {
      takePart(parts, seen, i, twin[i]!, 1, most <= lower);
    }
    if (most > lower && upper > lower) {
      takePart(parts, seen, i, twin[i]!, 0, least >= lower && most <= upper);
    }
  }
  return parts;
}

function takePart(
  { solid, deep, whole }: Parts,
  seen: Uint8Array,
  i: number,
  twin: number,
  isDeep: 0 | 1,
  isWhole: boolean,
): void {
  const mark = isDeep + 1;
  if (isWhole && (seen[twin]! & mark) !== 0) {
    return;
  }
  seen[twin]! |= isWhole ? mark : 0;
  solid.push(i);
  deep.push(isDeep);
  whole.push(isWhole);
}

/** Field by field: this runs for every place of every tooth. */
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

function emptySet(moves: readonly TracedMove[], deep: Uint8Array): PathSet {
  const field = (): Float64Array => new Float64Array(moves.length);
  return {
    count: moves.length,
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
    moves,
  };
}

/** The part of move i between u and v, as path k. */
function place(set: PathSet, k: number, solids: SolidMoves, i: number, u: number, v: number): void {
  set.radius[k] = solids.radius[i]!;
  if (solids.turn[i] === 0) {
    placeLine(set, k, solids, i, u, v);
  } else {
    placeArc(set, k, solids, i, u, v);
  }
}

function placeLine(set: PathSet, k: number, solids: SolidMoves, i: number, u: number, v: number): void {
  const x0 = solids.x0[i]!;
  const y0 = solids.y0[i]!;
  const x1 = solids.x1[i]!;
  const y1 = solids.y1[i]!;
  const dx = x1 - x0;
  const dy = y1 - y0;
  set.x0[k] = u === 0 ? x0 : x0 + u * dx;
  set.y0[k] = u === 0 ? y0 : y0 + u * dy;
  set.x1[k] = v === 1 ? x1 : x0 + v * dx;
  set.y1[k] = v === 1 ? y1 : y0 + v * dy;
  set.mx[k] = x0 + ((u + v) / 2) * dx;
  set.my[k] = y0 + ((u + v) / 2) * dy;
  set.bound[k] = (Math.sqrt(dx * dx + dy * dy) * (v - u)) / 2;
}

function placeArc(set: PathSet, k: number, solids: SolidMoves, i: number, u: number, v: number): void {
  const x0 = solids.x0[i]!;
  const y0 = solids.y0[i]!;
  const x1 = solids.x1[i]!;
  const y1 = solids.y1[i]!;
  const cx = solids.cx[i]!;
  const cy = solids.cy[i]!;
  const turn = solids.turn[i]!;
  const sx = x0 - cx;
  const sy = y0 - cy;
  // The ends were rounded apart; the middle of the two radii is never further off than half the rounding.
  const first = Math.sqrt(sx * sx + sy * sy);
  const arc = (first + Math.sqrt((x1 - cx) * (x1 - cx) + (y1 - cy) * (y1 - cy))) / 2;
  const even = first === 0 ? 0 : arc / first;
  set.x0[k] = x0;
  set.y0[k] = y0;
  set.x1[k] = x1;
  set.y1[k] = y1;
  set.cx[k] = cx;
  set.cy[k] = cy;
  set.arc[k] = arc;
  set.turn[k] = turn * (v - u);
  set.bound[k] = Math.min(2 * arc, (arc * Math.abs(turn) * (v - u)) / 2);
  turned(set, k, ((u + v) / 2) * turn, sx * even, sy * even, set.mx, set.my);
  if (u !== 0) {
    turned(set, k, u * turn, sx * even, sy * even, set.x0, set.y0);
  }
  if (v !== 1) {
    turned(set, k, v * turn, sx * even, sy * even, set.x1, set.y1);
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
