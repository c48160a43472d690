/**
 * How long a program takes, and each of its passes: the moves by the time model, spin-up and dwells as they are written.
 * Stops for hands and cutter changes count nothing: nobody knows how long a person takes. s.
 */
import { isMove, type Motion, type Position } from './motion.ts';
import { openPlan, planMove, type MotionLimits } from './move-plan.ts';
import { timePlan } from './move-time.ts';

export interface ProgramTime {
  readonly seconds: number;
  /** Seconds by `belongs.pass`; moves that belong to none (to and from, clear of the work) under ''. */
  readonly byPass: ReadonlyMap<string, number>;
}

/** `stopsIn`: the passes in which the machine stands still at the end of every block. */
export function timeProgram(
  motion: Motion,
  limits: MotionLimits,
  spinUpSeconds: number,
  stopsIn: (pass: string) => boolean,
): ProgramTime {
  const plan = openPlan(motion.steps.length, limits);
  /** Where a pass begins: the number of its first move. */
  const runs: { readonly pass: string; readonly first: number }[] = [];
  let waiting = 0;
  let stands = true;
  let exact = false;
  let pass: string | undefined;
  let at: Position | undefined;
  for (const step of motion.steps) {
    if (!isMove(step)) {
      waiting +=
        step.kind === 'dwell' ? step.seconds : step.kind === 'spindle' && step.speed > 0 ? spinUpSeconds : 0;
      stands = stands || step.kind !== 'note';
      continue;
    }
    const now = step.belongs?.pass ?? '';
    if (now !== pass) {
      runs.push({ pass: now, first: plan.count });
      pass = now;
      exact = stopsIn(now);
    }
    planMove(plan, at ?? step.to, step, stands || exact);
    at = step.to;
    stands = false;
  }
  const { seconds, total } = timePlan(plan);
  const byPass = new Map<string, number>();
  for (const [k, run] of runs.entries()) {
    let sum = byPass.get(run.pass) ?? 0;
    const end = runs[k + 1]?.first ?? plan.count;
    for (let i = run.first; i < end; i++) {
      sum += seconds[i] as number;
    }
    byPass.set(run.pass, sum);
  }
  return { seconds: total + waiting, byPass };
}
