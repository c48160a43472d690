/**
 * How long a machine takes for moves end to end: acceleration-limited, with look-ahead. mm, s, mm/s, mm/s2.
 *
 * Each move starts and ends at a speed that the corner allows (`move-plan.ts`) and from which the next can be reached: a
 * backward and a forward pass, v_i^2 <= v_(i+1)^2 + 2 a L, and a trapezoid (or triangle) for each move.
 */
import type { Position } from './motion.ts';
import { openPlan, planMove, type MotionLimits, type MovePlan, type PlannedMove } from './move-plan.ts';

export interface TimedMove extends PlannedMove {
  readonly from: Position;
  /** The machine stands still before this move (spindle, dwell, stop, cutter). */
  readonly standsBefore?: boolean;
}

export interface MoveTimes {
  /** Seconds of each move. */
  readonly seconds: Float64Array;
  readonly total: number;
  /** Highest speed really reached in each, mm/min. */
  readonly reached: Float64Array;
}

export function timeMoves(moves: readonly TimedMove[], limits: MotionLimits): MoveTimes {
  const plan = openPlan(moves.length, limits);
  for (const move of moves) {
    planMove(plan, move.from, move, move.standsBefore === true);
  }
  return timePlan(plan);
}

export function timePlan(plan: MovePlan): MoveTimes {
  const { count, length, limit, entry, acceleration } = plan;
  const { blockSeconds } = plan.limits;
  lookAhead(plan);
  const seconds = new Float64Array(count);
  const reached = new Float64Array(count);
  let total = 0;
  for (let i = 0; i < count; i++) {
    const long = length[i] as number;
    const v0 = entry[i] as number;
    const v1 = i + 1 < count ? (entry[i + 1] as number) : 0;
    const a = acceleration[i] as number;
    const peak = peakSpeed(long, limit[i] as number, v0, v1, a);
    const time = long > 0 ? Math.max(secondsAt(peak, long, v0, v1, a), blockSeconds) : 0;
    seconds[i] = time;
    reached[i] = peak * 60;
    total += time;
  }
  return { seconds, total, reached };
}

function lookAhead({ count, length, entry, acceleration }: MovePlan): void {
  let v = 0;
  for (let i = count - 1; i >= 0; i--) {
    v = Math.min(
      entry[i] as number,
      Math.sqrt(v * v + 2 * (acceleration[i] as number) * (length[i] as number)),
    );
    entry[i] = v;
  }
  for (let i = 0; i + 1 < count; i++) {
    v = Math.min(
      entry[i + 1] as number,
      Math.sqrt(v * v + 2 * (acceleration[i] as number) * (length[i] as number)),
    );
    entry[i + 1] = v;
  }
}

/** Highest speed over `length`, entering at v0, leaving at v1, never above `limit`. */
function peakSpeed(length: number, limit: number, v0: number, v1: number, acceleration: number): number {
  if (length === 0) {
    return 0;
  }
  const square = (2 * acceleration * length + v0 * v0 + v1 * v1) / 2;
  return square < limit * limit ? Math.sqrt(square) : limit;
}

/** Up to `peak`, along at it for what is left, and down. */
function secondsAt(peak: number, length: number, v0: number, v1: number, acceleration: number): number {
  const ramps = (2 * peak * peak - v0 * v0 - v1 * v1) / (2 * acceleration);
  return (2 * peak - v0 - v1) / acceleration + Math.max(0, length - ramps) / peak;
}

/** Seconds and highest speed of one move. */
export function trapezoid(
  length: number,
  limit: number,
  v0: number,
  v1: number,
  acceleration: number,
): { readonly seconds: number; readonly peak: number } {
  const peak = peakSpeed(length, limit, v0, v1, acceleration);
  return { peak, seconds: length > 0 ? secondsAt(peak, length, v0, v1, acceleration) : 0 };
}
