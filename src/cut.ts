/**
 * The whole flow on one page: a job's text in, texts out. Touches no disk, clock or network, so it runs in a browser too.
 *
 *   job file > job > tooth > toolpath > post > program text > prove > report
 *
 * A program is handed out only if its own text, read back, passes the proof.
 */
import { markOf } from './base/mark.ts';
import type { Outcome, Problem } from './base/problem.ts';
import { withAllowanceOfMachine } from './flow/allowance-of-machine.ts';
import { headerFacts, type HeaderKind } from './flow/header-facts.ts';
import { refusedText } from './flow/refused-text.ts';
import { withRunoutOfMachine } from './flow/runout-of-machine.ts';
import { sheetFacts, type Made, type Shapes, type Understood } from './flow/sheet-facts.ts';
import { writableTitle } from './flow/writable-title.ts';
import { checkJobOnMachine } from './job/check-job.ts';
import { placeAt, placeInJob } from './job/place-problems.ts';
import { readJob } from './job/read-job.ts';
import { targetOfJob } from './job/target-of-job.ts';
import { readMachine } from './machine/read-machine.ts';
import { writeProgram, type ProgramText } from './post/write-program.ts';
import type { Proof } from './prove/proof.ts';
import { proveProgram } from './prove/prove-program.ts';
import { drawPlate } from './report/draw-plate.ts';
import type { SheetFacts } from './report/facts.ts';
import { sheetHtml } from './report/sheet.ts';
import { summaryOf } from './report/summary.ts';
import { planCuts } from './toolpath/plan-cuts.ts';
import type { CutPlan } from './toolpath/plan.ts';
import { crossings } from './tooth/crossings.ts';
import { wheelForm } from './tooth/wheel-form.ts';

export interface NamedText {
  readonly name: string;
  readonly file: string;
  readonly text: string;
}

export interface CutInput {
  readonly file: string;
  readonly text: string;
  readonly version: string;
  /** A machine file by the name or path the job gives. */
  readonly findMachine: (nameOrPath: string) => Outcome<NamedText>;
  /** A machine file of `posts/` by name, for `like:`. */
  readonly loadMachine: (name: string) => string | undefined;
  /** A file of cutters that the job names. */
  readonly readCutters: (path: string) => Outcome<string>;
  /** SHA-256 as hexadecimal digits. */
  readonly hash: (text: string) => string;
  /** Told what is being done, for whoever waits. */
  readonly stage: (what: string) => void;
}

export interface OutFile {
  readonly name: string;
  readonly text: string;
  /** A program a machine can run: what yesterday's are looked for among. */
  readonly runnable: boolean;
}

export interface CutResult {
  readonly exit: 0 | 1 | 2;
  readonly problems: readonly Problem[];
  readonly files: readonly OutFile[];
  readonly summary?: Record<string, unknown>;
  readonly facts?: SheetFacts;
}

export function cut(input: CutInput): CutResult {
  input.stage('reading the job');
  const job = readJob(input.file, input.text, input.readCutters);
  // Values that contradict each other, proportions of which no tooth follows and crossings that do not fit among them,
  // are wrong in the job itself, whatever it is cut on: 2, as for a value that breaks its own rule.
  if (!job.ok) {
    return { exit: 2, problems: job.problems, files: [] };
  }
  const found = input.findMachine(job.value.machine);
  if (!found.ok) {
    const problems = placeAt(found.problems, ['machine'], job.value);
    return { exit: 2, problems: [...job.problems, ...problems], files: [] };
  }
  const machine = readMachine(found.value.name, found.value.file, found.value.text, input.loadMachine);
  if (!machine.ok) {
    return { exit: 2, problems: [...job.problems, ...machine.problems], files: [] };
  }
  const problems = [...job.problems, ...machine.problems];
  const mark = markOf([input.version, input.text, found.value.text]);
  const onMachine = withAllowanceOfMachine(withRunoutOfMachine(job.value, machine.value), machine.value);
  return make(input, { job: onMachine, machine: machine.value, mark }, problems);
}

/** From a job and a machine that are understood on. */
function make(input: CutInput, understood: Understood, before: readonly Problem[]): CutResult {
  const { job, machine } = understood;
  const form = wheelForm(job.wheel);
  if (!form.ok) {
    return { exit: 1, problems: [...before, ...form.problems], files: [] };
  }
  const windows = job.wheel.crossings && crossings(job.wheel.crossings, form.value.rootRadius);
  if (windows !== undefined && !windows.ok) {
    return { exit: 1, problems: [...before, ...windows.problems], files: [] };
  }
  const shapes: Shapes = { form: form.value, ...(windows === undefined ? {} : { crossings: windows.value }) };
  const onMachine = checkJobOnMachine(job, machine);
  const problems = [...before, ...writableTitle(job, machine).problems, ...onMachine];
  if (onMachine.some(({ severity }) => severity === 'error')) {
    return refuse(input, understood, shapes, problems);
  }
  input.stage('planning the cuts');
  const plan = planCuts({ job, machine, ...shapes });
  problems.push(...plan.problems.map((problem) => placeInJob(problem, job)));
  if (!plan.ok) {
    return refuse(input, understood, shapes, problems);
  }
  input.stage('writing the programs');
  const written = writeAll(input, understood, shapes, plan.value);
  problems.push(...written.problems);
  if (!written.ok) {
    return refuse(input, understood, shapes, problems, plan.value);
  }
  input.stage('proving them');
  return proved(input, understood, shapes, plan.value, written.value, problems);
}

function writeAll(
  input: CutInput,
  understood: Understood,
  shapes: Shapes,
  plan: CutPlan,
): Outcome<NonNullable<Made['written']>> {
  const { job, machine } = understood;
  const write = (kind: HeaderKind, i: number): Outcome<ProgramText> => {
    const program = plan.programs[i];
    const motion = kind === 'walk' ? plan.walk : (program?.motion ?? plan.walk);
    return writeProgram({
      machine,
      name: job.name,
      suffix: kind === 'walk' ? '-walk' : (program?.suffix ?? ''),
      label: machine.words.file.labelLowest + (kind === 'walk' ? 0 : i + 1),
      motion,
      header: headerFacts(kind, i, { ...understood, ...shapes, plan, version: input.version }),
    });
  };
  const programs = plan.programs.map((_, i) => write('cut', i));
  const walk = write('walk', 0);
  const problems = [...programs, walk].flatMap((outcome) => outcome.problems);
  const texts = programs.flatMap((outcome) => (outcome.ok ? [outcome.value] : []));
  return walk.ok && texts.length === programs.length
    ? { ok: true, value: { programs: texts, walk: walk.value }, problems }
    : { ok: false, problems };
}

function proved(
  input: CutInput,
  understood: Understood,
  shapes: Shapes,
  plan: CutPlan,
  written: NonNullable<Made['written']>,
  problems: readonly Problem[],
): CutResult {
  const { job, machine } = understood;
  const proof = proveProgram({
    programs: written.programs.map(({ file, text }) => ({ file, text })),
    machine,
    setup: job.setup,
    target: targetOfJob(job, shapes),
  });
  // The walk is read back too: nothing reaches the disk that was not.
  const walked = proveProgram({
    programs: [{ file: written.walk.file, text: written.walk.text }],
    machine,
    setup: job.setup,
  });
  const verdict =
    walked.verdict === 'pass' ? proof.verdict : proof.verdict === 'pass' ? 'refuse' : proof.verdict;
  const whole: Proof = { ...proof, verdict, findings: [...proof.findings, ...walked.findings] };
  input.stage('drawing the sheet');
  const facts = sheetFacts(input, understood, shapes, problems, { plan, written, proof: whole });
  const report = reportFiles(facts);
  if (verdict !== 'pass') {
    return {
      exit: 1,
      problems,
      files: [
        { name: `${job.name}.refused.txt`, text: refusedText(written.programs, whole), runnable: false },
        ...report,
      ],
      summary: summaryOf(facts),
      facts,
    };
  }
  const runnable = [...written.programs, written.walk].flatMap(({ file, text, headerFile }) => [
    { name: file, text, runnable: true },
    ...(headerFile === undefined ? [] : [{ name: headerFile.file, text: headerFile.text, runnable: false }]),
  ]);
  return {
    exit: 0,
    problems: facts.problems,
    files: [...runnable, ...report],
    summary: summaryOf(facts),
    facts,
  };
}

/** Nothing runnable: the sheet and the summary that say why. */
function refuse(
  input: CutInput,
  understood: Understood,
  shapes: Shapes,
  problems: readonly Problem[],
  plan?: CutPlan,
): CutResult {
  const facts = sheetFacts(input, understood, shapes, problems, plan === undefined ? {} : { plan });
  return { exit: 1, problems, files: reportFiles(facts), summary: summaryOf(facts), facts };
}

function reportFiles(facts: SheetFacts): readonly OutFile[] {
  const name = facts.job.name;
  return [
    { name: `${name}.html`, text: sheetHtml(facts), runnable: false },
    { name: `${name}.svg`, text: drawPlate(facts), runnable: false },
    { name: `${name}.json`, text: `${JSON.stringify(summaryOf(facts), null, 2)}\n`, runnable: false },
  ];
}
