/**
 * The moves of a program as columns of numbers, for the time model: of each its length, the speed and acceleration it may
 * have, and the speed at which it may begin. mm, mm/s, mm/s2. A program has tens of thousands of moves and is timed once:
 * columns are filled and swept several times faster than as many small objects.
 *
 * A corner is taken as fast as an arc of radius R that touches both moves and passes the corner at the allowance d: with s the
 * sine of half the angle between the moves the arc's centre is R / s from the corner, so R / s - R = d and
 * v = sqrt(a R) = sqrt(a d s / (1 - s)); on arcs v <= sqrt(a R), R of the circle also on a helix, whose own curve is a little
 * wider; along a heading the acceleration and the greatest rate are those of the axis that limits it, at a feed as at a rapid.
 * A move of no length is passed over: what comes after it meets what came before.
 */
import type { Position } from './motion.ts';

export interface AxisValues {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export interface MotionLimits {
  readonly acceleration: AxisValues;
  /** mm/min */
  readonly rapid: AxisValues;
  readonly cornerAllowance: number;
  /** Least time a block takes, s. */
  readonly blockSeconds: number;
}

export interface MovePlan {
  readonly limits: MotionLimits;
  count: number;
  readonly length: Float64Array;
  readonly limit: Float64Array;
  readonly acceleration: Float64Array;
  readonly entry: Float64Array;
  /** Sine of half the angle between a move and the one before it: 1 straight on (and where the machine stands), 0 straight back. */
  readonly halfSine: Float64Array;
  /** The last move of any length, -1 for none. */
  last: number;
  /** Heading at the end of that move, then into and out of the one being added: nine numbers. */
  readonly headings: Float64Array;
}

export interface PlannedMove {
  readonly kind: 'rapid' | 'line' | 'arc';
  readonly to: Position;
  readonly centre?: { readonly x: number; readonly y: number } | undefined;
  readonly turn?: number | undefined;
  /** mm/min; of no matter for a rapid. */
  readonly feed?: number | null | undefined;
}

const IN = 3;
const OUT = 6;

/** Room for so many moves. */
export function openPlan(most: number, limits: MotionLimits): MovePlan {
  return {
    limits,
    count: 0,
    length: new Float64Array(most),
    limit: new Float64Array(most),
    acceleration: new Float64Array(most),
    entry: new Float64Array(most),
    halfSine: new Float64Array(most),
    last: -1,
    headings: new Float64Array(9),
  };
}

/** `stands`: the machine stands still before this move. */
export function planMove(plan: MovePlan, from: Position, move: PlannedMove, stands: boolean): void {
  const i = plan.count++;
  if (move.kind === 'arc' && move.centre !== undefined && move.turn !== undefined) {
    planArc(plan, i, from, move, move.centre, move.turn);
  } else {
    planLine(plan, i, from, move);
  }
  plan.halfSine[i] = 1;
  if (stands || i === 0) {
    plan.entry[i] = 0;
  } else if (plan.length[i] === 0) {
    // As fast as what follows allows: looking ahead finds it.
    plan.entry[i] = Infinity;
  } else {
    plan.entry[i] = plan.last < 0 ? 0 : cornerSpeed(plan, plan.last, i);
  }
  if ((plan.length[i] as number) > 0) {
    plan.last = i;
    plan.headings.copyWithin(0, OUT, OUT + 3);
  }
}

/** A move of which nobody knows the length: it takes a place in the columns and no time, and the machine stands before it. */
export function planUnknown(plan: MovePlan): void {
  const i = plan.count++;
  plan.acceleration[i] = plan.limits.acceleration.x;
  plan.halfSine[i] = 1;
}

function planLine(plan: MovePlan, i: number, from: Position, move: PlannedMove): void {
  const dx = move.to.x - from.x;
  const dy = move.to.y - from.y;
  const dz = move.to.z - from.z;
  const length = Math.sqrt(dx * dx + dy * dy + dz * dz);
  const share = length > 0 ? 1 / length : 0;
  const { headings, limits } = plan;
  headings[IN] = headings[OUT] = dx * share;
  headings[IN + 1] = headings[OUT + 1] = dy * share;
  headings[IN + 2] = headings[OUT + 2] = dz * share;
  plan.length[i] = length;
  plan.acceleration[i] = along(headings, limits.acceleration);
  plan.limit[i] = rateOf(headings, limits, move);
}

function planArc(
  plan: MovePlan,
  i: number,
  from: Position,
  move: PlannedMove,
  centre: { readonly x: number; readonly y: number },
  turn: number,
): void {
  const { headings, limits } = plan;
  const { acceleration } = limits;
  const rise = move.to.z - from.z;
  const dx = from.x - centre.x;
  const dy = from.y - centre.y;
  const radius = Math.sqrt(dx * dx + dy * dy);
  const flat = radius * Math.abs(turn);
  const length = rise === 0 ? flat : Math.sqrt(flat * flat + rise * rise);
  const way = length > 0 ? (Math.sign(turn) * flat) / length : 0;
  const climb = length > 0 ? rise / length : 0;
  tangent(headings, IN, dx, dy, way, climb);
  tangent(headings, OUT, move.to.x - centre.x, move.to.y - centre.y, way, climb);
  const most = alongArc(climb, acceleration);
  const feed = Math.min(move.feed ?? 0, alongArc(climb, limits.rapid)) / 60;
  plan.length[i] = length;
  plan.acceleration[i] = most;
  plan.limit[i] = Math.min(feed, Math.sqrt(most * radius));
}

/** The greatest value along an arc of which no axis takes more than its own: it turns through every heading in the plane. */
function alongArc(climb: number, most: AxisValues): number {
  const across = Math.min(most.x, most.y);
  return climb === 0 ? across : Math.min(across, most.z / Math.abs(climb));
}

/** The heading of an arc at a place `dx`, `dy` from its centre. */
function tangent(
  headings: Float64Array,
  at: number,
  dx: number,
  dy: number,
  way: number,
  climb: number,
): void {
  const spoke = Math.sqrt(dx * dx + dy * dy) || 1;
  headings[at] = (-way * dy) / spoke;
  headings[at + 1] = (way * dx) / spoke;
  headings[at + 2] = climb;
}

/** mm/s: no axis is driven faster by a feed than by a rapid. */
function rateOf(headings: Float64Array, limits: MotionLimits, move: PlannedMove): number {
  const most = along(headings, limits.rapid);
  return (move.kind === 'rapid' ? most : Math.min(move.feed ?? 0, most)) / 60;
}

/** The greatest value along the heading of which no axis takes more than its own. */
function along(headings: Float64Array, most: AxisValues): number {
  const least = Math.min(
    most.x / Math.abs(headings[IN] as number),
    most.y / Math.abs(headings[IN + 1] as number),
    most.z / Math.abs(headings[IN + 2] as number),
  );
  return Number.isFinite(least) ? least : most.x;
}

function cornerSpeed(plan: MovePlan, before: number, i: number): number {
  const { headings: h, limit, acceleration } = plan;
  const cosine =
    (h[0] as number) * (h[IN] as number) +
    (h[1] as number) * (h[IN + 1] as number) +
    (h[2] as number) * (h[IN + 2] as number);
  const halfSine = Math.sqrt(Math.min(1, Math.max(0, (1 + cosine) / 2)));
  plan.halfSine[i] = halfSine;
  const least = Math.min(limit[before] as number, limit[i] as number);
  if (halfSine >= 1) {
    return least;
  }
  const a = Math.min(acceleration[before] as number, acceleration[i] as number);
  return Math.min(least, Math.sqrt((a * plan.limits.cornerAllowance * halfSine) / (1 - halfSine)));
}
