/** Gathers what the report is made from: job, machine, shapes, plan, texts and proof, as far as a run came. */
import type { Problem } from '../base/problem.ts';
import type { Job } from '../job/job.ts';
import { isExactStop } from '../machine/exact-stop.ts';
import type { Machine } from '../machine/machine.ts';
import type { Motion } from '../motion/motion.ts';
import { timeProgram, type ProgramTime } from '../motion/time-program.ts';
import { cautions } from '../post/cautions.ts';
import { pathWordsFor } from '../post/path-words.ts';
import type { ProgramText } from '../post/write-program.ts';
import type { Proof } from '../prove/proof.ts';
import type { SheetFacts, SheetPass, SheetProgram } from '../report/facts.ts';
import { passPaths } from '../report/pass-paths.ts';
import type { CutPlan } from '../toolpath/plan.ts';
import { asCut } from '../tooth/as-cut.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { headerFacts } from './header-facts.ts';
import { lapsOf, mergedName } from './laps-of.ts';
import { longPrograms } from './long-programs.ts';

/** A job and a machine that were read without error. */
export interface Understood {
  readonly job: Job;
  readonly machine: Machine;
  readonly mark: string;
}

export interface Shapes {
  readonly form: WheelForm;
  readonly crossings?: Crossings;
}

/** As far as it came. */
export interface Made {
  readonly plan?: CutPlan;
  readonly written?: { readonly programs: readonly ProgramText[]; readonly walk: ProgramText };
  readonly proof?: Proof;
}

export interface Version {
  readonly version: string;
  readonly hash: (text: string) => string;
}

export function sheetFacts(
  { version, hash }: Version,
  understood: Understood,
  shapes: Shapes,
  problems: readonly Problem[],
  made: Made,
): SheetFacts {
  const { job, machine, mark } = understood;
  const { plan, proof, written } = made;
  const opened = asCut(shapes.form, job.cuts.finishing.cutter.diameter);
  const times = plan?.programs.map((program) => timeOf(program.motion, machine)) ?? [];
  const header = plan && headerFacts('cut', 'all', { ...understood, ...shapes, plan, version });
  const passed = proof?.verdict === 'pass';
  const programs = passed ? programsOf(made, machine, times, hash) : [];
  const passes = plan === undefined ? [] : passesOf(plan, times, job.setup.topZ);
  return {
    version,
    mark,
    verdict: proof?.verdict ?? 'refuse',
    job,
    machine,
    ...shapes,
    ...(opened.ok ? { asCut: opened.value } : {}),
    ...(plan === undefined ? {} : { reach: plan.reach, park: plan.park }),
    programs,
    ...(passed && written !== undefined
      ? { walkFile: written.walk.file, walkSha256: hash(written.walk.text) }
      : {}),
    motions: plan?.programs.map((program) => program.motion) ?? [],
    paths: passPaths(plan?.programs.map((program) => program.motion) ?? []),
    passes,
    ...(proof === undefined ? {} : { proof }),
    problems: [...problems, ...longPrograms(job, programs, passes)],
    again: header?.again ?? '',
    cautions: header === undefined ? [] : cautions(header, machine),
  };
}

function timeOf(motion: Motion, machine: Machine): ProgramTime {
  const { spinUpSeconds } = machine.words.spindle;
  return timeProgram(motion, machine.limits, spinUpSeconds, (pass) =>
    isExactStop(pathWordsFor(machine, pass)),
  );
}

function programsOf(
  { plan, written }: Made,
  machine: Machine,
  times: readonly ProgramTime[],
  hash: (text: string) => string,
): readonly SheetProgram[] {
  return (written?.programs ?? []).map(({ file, text, blocks }, i) => ({
    file,
    units: machine.units,
    blocks,
    bytes: text.length,
    sha256: hash(text),
    seconds: times[i]?.seconds ?? 0,
    cutters: plan?.programs[i]?.cutters ?? [],
    passes: plan?.programs[i]?.passes ?? [],
  }));
}

function passesOf(plan: CutPlan, times: readonly ProgramTime[], topZ: number): readonly SheetPass[] {
  const run = lapsOf(
    plan.programs.map(({ motion }) => motion),
    topZ,
  );
  return plan.passes.map((pass) => ({
    ...pass,
    ...(run.get(pass.name) ?? { laps: [pass.laps, pass.laps] as const, step: pass.step }),
    seconds: times.reduce((sum, { byPass }) => sum + secondsOf(pass.name, byPass), 0),
  }));
}

function secondsOf(name: string, byPass: ReadonlyMap<string, number>): number {
  let sum = 0;
  for (const [pass, seconds] of byPass) {
    sum += mergedName(pass) === name ? seconds : 0;
  }
  return sum;
}
