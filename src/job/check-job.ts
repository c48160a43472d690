/**
 * A job against the machine it is to be cut on: travel, speeds, feeds, cutter numbers, and the collet nut against what stands
 * in the way. What did not fit already without a machine is handed on, so that one list says why no program is written.
 * The machine is known only by the few figures that are asked of it. mm, 1/min, mm/min.
 */
import type { Problem } from '../base/problem.ts';
import { crossings } from '../tooth/crossings.ts';
import { wheelForm } from '../tooth/wheel-form.ts';
import { checkNut, type ClearanceGround } from './check-clearance.ts';
import { checkTravel, type Travel } from './check-travel.ts';
import { jobProblem, type JobProblem } from './job-problem.ts';
import type { Job, PassKind } from './job.ts';
import { placeInJob } from './place-problems.ts';
import { showLength } from './show-length.ts';

/** What a job asks of a machine; the limits and words of a machine file have all of it. */
export interface MachineFacts {
  readonly name: string;
  readonly limits: {
    readonly travel: Travel;
    readonly feedLowest: number;
    readonly feedHighest: number;
    readonly spindleLowest: number;
    readonly spindleHighest: number;
    readonly nut: { readonly diameter: number };
  };
  readonly words: {
    readonly cutters: { readonly change: string; readonly highest: number };
    /** How far the slides leave the path while roughing, where the machine file says it. */
    readonly path: { readonly roughingStrays: number | null };
  };
}

export function checkJobOnMachine(job: Job, machine: MachineFacts): Problem[] {
  const form = wheelForm(job.wheel);
  const found = [
    ...job.cuts.order.flatMap((pass) => settings(job, machine, pass)),
    ...strays(job, machine),
    ...numbers(job, machine),
  ];
  const problems = found.map((problem) => jobProblem({ code: 'job.does-not-fit', ...problem }));
  if (form.ok) {
    const windows = job.wheel.crossings && crossings(job.wheel.crossings, form.value.rootRadius);
    const ground: ClearanceGround = {
      unit: job.length,
      wheel: job.wheel,
      form: form.value,
      windows: windows?.ok === true ? windows.value : undefined,
      setup: job.setup,
      cuts: job.cuts,
    };
    problems.push(...checkTravel(job, form.value, machine), ...checkNut(ground, machine.limits.nut.diameter));
  }
  return [...(job.misfits ?? []), ...problems.map((problem) => placeInJob(problem, job))];
}

function settings(job: Job, { name, limits }: MachineFacts, pass: PassKind): JobProblem[] {
  const { speed, feed, plunge } = job.cuts[pass];
  const problems: JobProblem[] = [];
  if (speed !== undefined && (speed < limits.spindleLowest || speed > limits.spindleHighest)) {
    const message = `${speed} a minute is not in the range of the spindle of ${name}, ${limits.spindleLowest} to ${limits.spindleHighest}.`;
    const hint = 'Give another speed, or leave it out: it then follows from cutter, material and machine.';
    problems.push({ path: ['cuts', pass, 'speed'], message, hint });
  }
  for (const [key, value] of Object.entries({ feed, plunge })) {
    if (value !== undefined && (value < limits.feedLowest || value > limits.feedHighest)) {
      const show = (mm: number): string => showLength(mm, job.length);
      const message = `${show(value)} a minute is not in the range of ${name}, ${show(limits.feedLowest)} to ${show(limits.feedHighest)} a minute.`;
      problems.push({ path: ['cuts', pass, key], message, hint: `Give another ${key}, or leave it out.` });
    }
  }
  return problems;
}

/** The proof holds the words of a program; how far a machine rounds what they say is known to its machine file alone. */
function strays(job: Job, { name, words }: MachineFacts): JobProblem[] {
  const { roughingStrays } = words.path;
  const { allowance } = job.cuts.roughing;
  if (roughingStrays === null || roughingStrays < allowance || !job.cuts.order.includes('roughing')) {
    return [];
  }
  const show = (mm: number): string => showLength(mm, job.length);
  const message = `${name} strays up to ${show(roughingStrays)} from the path while it roughs, and only ${show(allowance)} is left for finishing: roughing may mark the finished teeth.`;
  const hint = `Leave more, allowance: ${show(1.5 * roughingStrays)} or so, or rough with the words for finishing.`;
  return [{ path: ['cuts', 'roughing', 'allowance'], severity: 'warning', message, hint }];
}

function numbers(job: Job, { name, words }: MachineFacts): JobProblem[] {
  if (words.cutters.change === 'one-program') {
    return [];
  }
  const used = new Set(job.cuts.order.map((pass) => job.cuts[pass].cutter.number));
  return [...used]
    .filter((number) => number > words.cutters.highest)
    .map((number) => ({
      path: ['cutters', String(number)],
      message: `${name} has cutters up to number ${words.cutters.highest}; this is ${number}.`,
      hint: 'Give it a smaller number.',
    }));
}
