/**
 * Few arcs, tangent to one another, in place of a span of a cycloid or of a parallel of it. mm.
 *
 * In  : the span, and how far an arc may lie from it.
 * Out : arcs end to end on the span's exact ends and headings, no further from it than the tolerance (measured).
 * Maths: joints lie on the curve, headings there are free, so an arc crosses the curve once between its joints and errs as
 *        much to one side as to the other: by kappa' L^3 / 125, a third of what a biarc of two such arcs errs (the least
 *        sup norm of a monospline of degree 3 is that of the Bernoulli polynomial). In the measure d(sigma) =
 *        |kappa'|^(1/3) ds the joints are evenly spread; on a cycloid that is |(1 + k) rate'|^(1/3) dt, free of offset and
 *        finite on a cusp. First and last arcs, whose end headings are given, are 1/sqrt 2 as long. One number more, by
 *        which neighbouring arcs are made longer and shorter in turn, brings the last heading home.
 */
import { arcDeviation, arcThrough } from './arc-through.ts';
import { SAME_POINT } from '../base/tolerances.ts';
import { cycloidCusps, cycloidVertices } from './cycloid.ts';
import { endOf, headingOn, lengthOf, pointOn, startOf } from './on-piece.ts';
import type { ArcPiece, CycloidPiece, LinePiece } from './piece.ts';
import { cross, dot, type Point } from './point.ts';
import { findRoot } from './roots.ts';

/** Straight where the span is straight (a point of a circle rolling in one of twice its size). */
export function fitArcs(piece: CycloidPiece, tolerance: number): readonly (ArcPiece | LinePiece)[] {
  const length = lengthOf(piece);
  if (length <= SAME_POINT || 1 + piece.fixed / (2 * piece.rolling) === 0) {
    return length > 0 ? [{ kind: 'line', from: startOf(piece), to: endOf(piece) }] : [];
  }
  return spirals(piece).flatMap((spiral) => fitSpiral(spiral, tolerance));
}

/** Cut at cusps and where the curvature turns, but not so near another end that nothing would lie between. */
function spirals(piece: CycloidPiece): CycloidPiece[] {
  const cuts = [...cycloidCusps(piece), ...cycloidVertices(piece)].sort((a, b) =>
    piece.to < piece.from ? b - a : a - b,
  );
  const found: CycloidPiece[] = [];
  let from = piece.from;
  for (const to of cuts) {
    const part = { ...piece, from, to };
    if (lengthOf(part) > SAME_POINT && lengthOf({ ...piece, from: to }) > SAME_POINT) {
      found.push(part);
      from = to;
    }
  }
  return [...found, { ...piece, from }];
}

/** More arcs than any span needs: at this many the answer is taken as it is. */
const MOST_ARCS = 400;

/** The fewest arcs that keep the tolerance on a span whose curvature only grows or only falls. */
function fitSpiral(spiral: CycloidPiece, tolerance: number): ArcPiece[] {
  const measure = spiralMeasure(spiral);
  const longest = Math.cbrt(LEVEL * tolerance);
  const expected = Math.ceil(measure.whole / longest + ENDS_SHORT);
  for (let count = Math.max(2, expected - 1); count <= MOST_ARCS; count++) {
    const best = balanced(spiral, measure, count, tolerance);
    if (best.worst <= tolerance || count === MOST_ARCS) {
      return best.arcs;
    }
  }
  return [];
}

/** kappa' L^3 over the error of an arc between two joints on the curve: 216 / sqrt 3. */
const LEVEL = 216 / Math.sqrt(3);
/** What the two shorter end arcs lack of two whole ones. */
const ENDS_SHORT = 2 - Math.SQRT2;

interface Fit {
  readonly arcs: ArcPiece[];
  readonly errors: readonly number[];
  readonly worst: number;
}

/** Where the first guess errs more than this many tolerances, another arc is tried at once. */
const HOPELESS = 1.8;
/** Shares are tried this much longer and shorter, then half as much, down to the last. */
const STEPS = [0.16, 0.08, 0.04] as const;

/** Shares changed one by one as long as the worst error falls, until the tolerance is kept. */
function balanced(spiral: CycloidPiece, measure: Measure, count: number, tolerance: number): Fit {
  let shares = Array.from({ length: count }, (_, i) => (i === 0 || i === count - 1 ? Math.SQRT1_2 : 1));
  let best = closed(spiral, jointsOf(shares, measure));
  if (count === 2 || best.worst > HOPELESS * tolerance) {
    return best;
  }
  for (const step of STEPS) {
    for (let i = 0; i < 2 * count && best.worst > tolerance; i++) {
      const factor = i % 2 === 0 ? 1 + step : 1 / (1 + step);
      const tried = shares.map((share, at) => (at === i >> 1 ? share * factor : share));
      const fit = closed(spiral, jointsOf(tried, measure));
      if (fit.worst < best.worst) {
        best = fit;
        shares = tried;
      }
    }
  }
  return best;
}

/** Parameters of the joints, ends included, where the measure reaches the running total of the shares. */
function jointsOf(shares: readonly number[], { table, whole }: Measure): number[] {
  const total = shares.reduce((sum, share) => sum + share, 0);
  let sum = 0;
  let cell = 0;
  const inner = shares.slice(0, -1).map((share) => {
    sum += share;
    const wanted = (whole * sum) / total;
    while (cell + 1 < CELLS && (table[cell + 1] as number) < wanted) {
      cell++;
    }
    const from = table[cell] as number;
    return (cell + (wanted - from) / ((table[cell + 1] as number) - from)) / CELLS;
  });
  return [0, ...inner, 1];
}

/** With the joints shifted forward and back in turn by the one amount that makes the last heading right. */
function closed(spiral: CycloidPiece, joints: readonly number[]): Fit {
  const shifted = (amount: number): number[] =>
    joints.map((u, i) => (i === 0 || i === joints.length - 1 ? u : u + (i % 2 === 0 ? amount : -amount)));
  const miss = (amount: number): number => headingMiss(spiral, shifted(amount));
  const room = 0.49 * Math.min(...joints.slice(1).map((u, i) => u - (joints[i] as number)));
  const reach = bracket(miss, room);
  const ends = shifted(reach === undefined ? 0 : findRoot(miss, -reach, reach, SAME_POINT));
  const arcs = arcsThrough(spiral, ends);
  const errors = arcs.map((arc, i) => arcDeviation(arc, spiral, ends[i] as number, ends[i + 1] as number));
  return { arcs, errors, worst: reach === undefined ? Infinity : Math.max(...errors) };
}

/** The smallest of a few reaches over which the miss changes its sign. */
function bracket(miss: (amount: number) => number, room: number): number | undefined {
  for (const share of [1 / 64, 1 / 16, 1 / 4, 1]) {
    if (miss(-share * room) > 0 !== miss(share * room) > 0) {
      return share * room;
    }
  }
  return undefined;
}

function headingMiss(spiral: CycloidPiece, joints: readonly number[]): number {
  const last = arcsThrough(spiral, joints).at(-1) as ArcPiece;
  const wanted = headingOn(spiral, 1);
  const got = headingOn(last, 1);
  return Math.atan2(cross(got, wanted), dot(got, wanted));
}

/** From joint to joint, each arc leaving as the one before arrived. */
function arcsThrough(spiral: CycloidPiece, joints: readonly number[]): ArcPiece[] {
  let heading: Point = headingOn(spiral, 0);
  let from = pointOn(spiral, 0);
  return joints.slice(1).map((u) => {
    const to = pointOn(spiral, u);
    const arc = arcThrough(from, heading, to);
    heading = headingOn(arc, 1);
    from = to;
    return arc;
  });
}

/** Cells of the table by which the measure is summed (midpoint rule; only the first guess of the joints hangs on it). */
const CELLS = 32;

/** The measure from the start to each of CELLS + 1 evenly spaced parameters. */
interface Measure {
  readonly table: readonly number[];
  readonly whole: number;
}

/** The integral of |cos(R t / 2r)|^(1/3) |2 (R + r) k (1 + k)|^(1/3) dt. */
function spiralMeasure(spiral: CycloidPiece): Measure {
  const { fixed: R, rolling: r } = spiral;
  const k = R / (2 * r);
  const step = Math.abs(spiral.to - spiral.from) / CELLS;
  const scale = Math.cbrt(Math.abs(2 * (R + r) * k * (1 + k)));
  const table = [0];
  for (let i = 0; i < CELLS; i++) {
    const t = spiral.from + ((i + 0.5) / CELLS) * (spiral.to - spiral.from);
    table.push((table[i] as number) + scale * Math.cbrt(Math.abs(Math.cos(k * t))) * step);
  }
  return { table, whole: table[CELLS] as number };
}
