/**
 * How long a machine takes for moves end to end: acceleration-limited, with look-ahead. mm, s, mm/s, mm/s2.
 *
 * Each move starts and ends at a speed that the corner allows and from which the next can be reached:
 * corner speed by a fictitious arc that stays within the corner allowance d of the corner (S. K. Jeon, 2011),
 * v = sqrt(a d s / (1 - s)) with s the sine of half the angle between the two moves; arcs v <= sqrt(a R); along a
 * heading the acceleration and the rapid rate are those of the axis that limits it. Then a backward and a forward pass,
 * v_i^2 <= v_(i+1)^2 + 2 a L, and a trapezoid (or triangle) for each move.
 */
import { shapeOf, type MoveShape, type ShapedMove, type Vector } from './move-shape.ts';

export interface TimedMove extends ShapedMove {
  /** mm/min; ignored for rapids. */
  readonly feed: number;
  /** The machine stands still before this move (spindle, dwell, stop, cutter). */
  readonly standsBefore?: boolean;
}

export interface MotionLimits {
  readonly acceleration: Vector;
  /** mm/min */
  readonly rapid: Vector;
  readonly cornerAllowance: number;
  /** Least time a block takes, s. */
  readonly blockSeconds: number;
}

export interface MoveTimes {
  /** Seconds of each move. */
  readonly seconds: readonly number[];
  readonly total: number;
  /** Highest speed really reached in each, mm/min. */
  readonly reached: readonly number[];
}

interface Plan {
  readonly length: number;
  readonly limit: number;
  readonly acceleration: number;
  entry: number;
}

export function timeMoves(moves: readonly TimedMove[], limits: MotionLimits): MoveTimes {
  const shapes = moves.map(shapeOf);
  const plans = moves.map((move, i) => planOf(move, shapes[i] as MoveShape, limits));
  for (let i = 1; i < plans.length; i++) {
    (plans[i] as Plan).entry = cornerSpeed(moves, shapes, plans, i, limits);
  }
  lookAhead(plans);
  const seconds: number[] = [];
  const reached: number[] = [];
  let total = 0;
  for (const [i, plan] of plans.entries()) {
    const result = trapezoid(
      plan.length,
      plan.limit,
      plan.entry,
      plans[i + 1]?.entry ?? 0,
      plan.acceleration,
    );
    const time = plan.length > 0 ? Math.max(result.seconds, limits.blockSeconds) : 0;
    seconds.push(time);
    reached.push(result.peak * 60);
    total += time;
  }
  return { seconds, total, reached };
}

function planOf(move: TimedMove, shape: MoveShape, limits: MotionLimits): Plan {
  const heading = shape.headingIn;
  const acceleration = Number.isFinite(shape.radius)
    ? Math.min(limits.acceleration.x, limits.acceleration.y, along(heading, limits.acceleration, 'z'))
    : along(heading, limits.acceleration, 'xyz');
  const rate = move.kind === 'rapid' ? along(heading, limits.rapid, 'xyz') / 60 : move.feed / 60;
  const onArc = Number.isFinite(shape.radius) ? Math.sqrt(acceleration * shape.radius) : Infinity;
  return { length: shape.length, limit: Math.min(rate, onArc), acceleration, entry: 0 };
}

/** The greatest value along a heading of which no axis takes more than its own. */
function along(heading: Vector, most: Vector, axes: 'xyz' | 'z'): number {
  const z = heading.z === 0 ? Infinity : most.z / Math.abs(heading.z);
  if (axes === 'z') {
    return z;
  }
  const x = heading.x === 0 ? Infinity : most.x / Math.abs(heading.x);
  const y = heading.y === 0 ? Infinity : most.y / Math.abs(heading.y);
  const least = Math.min(x, y, z);
  return Number.isFinite(least) ? least : most.x;
}

function cornerSpeed(
  moves: readonly TimedMove[],
  shapes: readonly MoveShape[],
  plans: readonly Plan[],
  i: number,
  limits: MotionLimits,
): number {
  const before = plans[i - 1] as Plan;
  const after = plans[i] as Plan;
  if (moves[i]?.standsBefore === true || before.length === 0 || after.length === 0) {
    return 0;
  }
  const a = (shapes[i - 1] as MoveShape).headingOut;
  const b = (shapes[i] as MoveShape).headingIn;
  const cosine = Math.min(Math.max(a.x * b.x + a.y * b.y + a.z * b.z, -1), 1);
  const halfSine = Math.sqrt((1 + cosine) / 2);
  const acceleration = Math.min(before.acceleration, after.acceleration);
  const speed =
    halfSine >= 1 ? Infinity : Math.sqrt((acceleration * limits.cornerAllowance * halfSine) / (1 - halfSine));
  return Math.min(speed, before.limit, after.limit);
}

function lookAhead(plans: Plan[]): void {
  let next = 0;
  for (let i = plans.length - 1; i >= 0; i--) {
    const plan = plans[i] as Plan;
    plan.entry = Math.min(plan.entry, Math.sqrt(next * next + 2 * plan.acceleration * plan.length));
    next = plan.entry;
  }
  for (let i = 0; i + 1 < plans.length; i++) {
    const plan = plans[i] as Plan;
    const after = plans[i + 1] as Plan;
    after.entry = Math.min(
      after.entry,
      Math.sqrt(plan.entry * plan.entry + 2 * plan.acceleration * plan.length),
    );
  }
}

/** Seconds and highest speed over `length`, entering at v0, leaving at v1, never above `limit`. */
export function trapezoid(
  length: number,
  limit: number,
  v0: number,
  v1: number,
  acceleration: number,
): { readonly seconds: number; readonly peak: number } {
  if (length === 0) {
    return { seconds: 0, peak: 0 };
  }
  const ramps = (2 * limit * limit - v0 * v0 - v1 * v1) / (2 * acceleration);
  if (ramps <= length) {
    const seconds = (2 * limit - v0 - v1) / acceleration + (length - ramps) / limit;
    return { seconds, peak: limit };
  }
  const peak = Math.sqrt((2 * acceleration * length + v0 * v0 + v1 * v1) / 2);
  return { seconds: (2 * peak - v0 - v1) / acceleration, peak };
}
