/** The slowest corners between cutting moves: those that are slow of themselves, not for the sake of another. mm, s; mm/min. */
import type { TracedMove } from '../motion/traced-move.ts';
import type { TimedTrace } from './plan-trace.ts';
import { rampLoss } from './time-spent.ts';

export interface SlowCorner {
  readonly file: string;
  /** Of the move that leaves it. */
  readonly line: number;
  readonly x: number | null;
  readonly y: number | null;
  /** mm/min, through the corner and as written after it. */
  readonly speed: number;
  readonly written: number;
  /** What slowing down and coming up again costs. */
  readonly seconds: number;
}

export interface Corners {
  readonly slowest: SlowCorner[];
  /** mm/s; a corner that is no slower is not kept. */
  least: number;
}

const KEPT = 5;

/** A corner whose own limit is within this of the speed there is the reason for it. */
const OWN = 0.999;

export function openCorners(): Corners {
  return { slowest: [], least: Infinity };
}

/** The corner before move `i`. */
export function takeCorner(corners: Corners, { plan, trace, times }: TimedTrace, i: number): void {
  const v = plan.entry[i] as number;
  const s = plan.halfSine[i] as number;
  if (v >= corners.least || s >= 1) {
    return;
  }
  const b = lastOfLength(plan.length, i);
  const acceleration = Math.min(plan.acceleration[b] as number, plan.acceleration[i] as number);
  const own = Math.sqrt((acceleration * plan.limits.cornerAllowance * s) / (1 - s));
  if (v < own * OWN) {
    return;
  }
  const before = (times.reached[b] as number) / 60;
  const after = (times.reached[i] as number) / 60;
  const seconds =
    rampLoss(before, v, plan.acceleration[b] as number) + rampLoss(after, v, plan.acceleration[i] as number);
  if (seconds === 0) {
    return;
  }
  const { file, line, from, feed } = trace.moves[i] as TracedMove;
  const corner = { file, line, x: from.x, y: from.y, speed: v * 60, written: feed ?? 0, seconds };
  const { slowest } = corners;
  const at = slowest.findIndex(({ speed }) => speed > corner.speed);
  slowest.splice(at < 0 ? slowest.length : at, 0, corner);
  if (slowest.length > KEPT) {
    slowest.pop();
  }
  corners.least = slowest.length < KEPT ? Infinity : (slowest.at(-1)?.speed ?? 0) / 60;
}

/** The move before `i` that has any length. */
export function lastOfLength(length: Float64Array, i: number): number {
  let b = i - 1;
  while (b > 0 && length[b] === 0) {
    b -= 1;
  }
  return b;
}
