/**
 * The whole plan: what the cutters reach, every pass in the job's order, programs as the machine takes cutters, the walk-round.
 *
 * In  : job, machine, form, crossings. Out: the plan, or every reason there is none. Program frame, mm.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import type { Job, PassKind } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { bore } from './bore.ts';
import { crossingsCuts } from './crossings-cuts.ts';
import type { CutTask } from './cut-task.ts';
import { heightsOf } from './heights.ts';
import { layProgram, type LayTask } from './lay-program.ts';
import { obstacleProblems } from './obstacle-problems.ts';
import type { PassCuts } from './pass-cuts.ts';
import { parkPlace } from './places.ts';
import type { CutPlan, ProgramPlan } from './plan.ts';
import { reach } from './reach.ts';
import { axisWords, sayAtCutter, touchWords } from './say-cutter.ts';
import { teethCuts } from './teeth-cuts.ts';
import { walkRound } from './walk-round.ts';

export interface CutRequest {
  readonly job: Job;
  readonly machine: Machine;
  readonly form: WheelForm;
  readonly crossings?: Crossings | undefined;
}

export function planCuts({ job, machine, form, crossings }: CutRequest): Outcome<CutPlan> {
  const task: CutTask = { job, machine, form, crossings, heights: heightsOf(job, machine) };
  const reached = reach(task);
  if (!reached.ok) {
    return reached;
  }
  const passes = passesInOrder(task);
  if (!passes.ok) {
    return passes;
  }
  const inTheWay = obstacleProblems(task, passes.value);
  if (inTheWay.length > 0) {
    return failure(inTheWay);
  }
  const park = parkPlace(task);
  const plan: CutPlan = {
    programs: programsOf(task, passes.value),
    walk: walkRound(task, passes.value, park),
    passes: passes.value.map(({ facts }) => facts),
    reach: reached.value,
    park,
  };
  return success(plan, [...reached.problems, ...passes.problems]);
}

function passesInOrder(task: CutTask): Outcome<readonly PassCuts[]> {
  const { order } = task.job.cuts;
  const problems: Problem[] = [];
  const take = <T>(outcome: Outcome<T>): T | undefined => {
    problems.push(...outcome.problems);
    return outcome.ok ? outcome.value : undefined;
  };
  const wanted = (kind: PassKind): boolean => order.includes(kind);
  const cuts: Partial<Record<PassKind, readonly PassCuts[]>> = {};
  if (wanted('bore') && task.job.wheel.bore > 0) {
    cuts.bore = take(bore(task)) ?? [];
  }
  if (wanted('crossings') && task.crossings !== undefined) {
    cuts.crossings = take(crossingsCuts(task, task.crossings)) ?? [];
  }
  const teeth = wanted('roughing') || wanted('finishing') ? take(teethCuts(task)) : undefined;
  if (teeth !== undefined) {
    cuts.roughing = teeth.roughing;
    cuts.finishing = teeth.finishing;
  }
  const stuck = finishingBeforeRoughing(task);
  const all = [...problems, ...(stuck === undefined ? [] : [stuck])];
  return all.some(({ severity }) => severity === 'error')
    ? failure(all)
    : success(
        order.flatMap((kind) => cuts[kind] ?? []),
        all,
      );
}

function finishingBeforeRoughing({ job }: CutTask): Problem | undefined {
  const roughing = job.cuts.order.indexOf('roughing');
  const finishing = job.cuts.order.indexOf('finishing');
  if (finishing < 0 || (roughing >= 0 && roughing < finishing)) {
    return undefined;
  }
  return {
    code: 'toolpath.no-entry',
    severity: 'error',
    message: 'the teeth are finished before they are roughed: no slot is open for the finishing cutter',
    hint: 'put roughing before finishing in cuts.order',
    at: { kind: 'value', file: job.file, path: ['cuts', 'order'] },
  };
}

/** One program, or one for each uninterrupted run of a cutter where the machine takes one cutter a program. */
function programsOf(task: CutTask, passes: readonly PassCuts[]): readonly ProgramPlan[] {
  const groups = task.machine.words.cutters.change === 'one-program' ? byCutter(passes) : [passes];
  return groups.map((group, i) => ({
    suffix: groups.length === 1 ? '' : `-${i + 1}`,
    motion: { steps: layProgram(layTask(task, i), group) },
    cutters: group.map(({ cutter }) => cutter.number).filter((number, k, all) => number !== all[k - 1]),
    passes: group.map(({ facts }) => facts.name),
  }));
}

function byCutter(passes: readonly PassCuts[]): readonly (readonly PassCuts[])[] {
  const groups: PassCuts[][] = [];
  for (const pass of passes) {
    const last = groups.at(-1);
    if (last?.[0]?.cutter.number === pass.cutter.number) {
      last.push(pass);
    } else {
      groups.push([pass]);
    }
  }
  return groups;
}

function layTask(task: CutTask, index: number): LayTask {
  const { job, machine, heights } = task;
  return {
    job,
    machine,
    heights,
    park: parkPlace(task),
    sayAtChange: (cutter) => sayAtCutter(task, cutter),
    notes: [
      ...(job.setup.bored > 0 ? [axisWords(task)] : []),
      ...(index > 0 ? [`a new cutter: ${touchWords(task)}; X and Y stay as they were`] : []),
    ],
  };
}
