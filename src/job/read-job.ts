/**
 * A job file's text to a Job: read, checked value by value, filled in, and checked as a whole. Every problem is found that can be
 * told without mending another first, each with its line and column.
 * In: the file's name and text, and how to get the text of a file of cutters. Out: the job in mm with the why of all it left
 * out; what is understood but does not fit (`misfits`) is left to `check-job.ts`, so that a sheet can say why.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { readYaml, YAML_LARGEST } from '../base/read-yaml.ts';
import type { LengthUnit } from '../base/units.ts';
import { crossings } from '../tooth/crossings.ts';
import { toothSide, type ToothSide } from '../tooth/tooth-side.ts';
import { wheelForm } from '../tooth/wheel-form.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { checkClearance } from './check-clearance.ts';
import { checkCutters, checkOrder } from './check-cutters.ts';
import { checkFit } from './check-fit.ts';
import { checkHolding } from './check-holding.ts';
import { checkWheel } from './check-wheel.ts';
import { deriveCuts } from './derive-cuts.ts';
import { deriveCutters } from './derive-cutters.ts';
import { deriveSetup, skinOf } from './derive-setup.ts';
import { deriveWheel } from './derive-wheel.ts';
import { jobProblem } from './job-problem.ts';
import { jobSchema, type CutterText, type JobText, type WheelText } from './job-schema.ts';
import { issueProblem, readTree } from './job-schema-issues.ts';
import type { Job, WheelJob } from './job.ts';
import { takeNotes, type Notes } from './notes.ts';
import { placeProblems, spotsOf, type PlacedText } from './place-problems.ts';
import { readCutters } from './read-cutters.ts';
import { unitOf } from './unit-of.ts';

export function readJob(
  file: string,
  text: string,
  readCutterFile?: (path: string) => Outcome<string>,
): Outcome<Job> {
  const yaml = readYaml(file, text, YAML_LARGEST, 'job.syntax');
  if (!yaml.ok) {
    return yaml;
  }
  const placed: PlacedText = { file, yaml: yaml.value };
  const unit = unitOf(yaml.value.value);
  const tree = readTree(jobSchema(unit), yaml.value.value);
  if (!tree.ok) {
    return failure(placeProblems(tree.issues.map(issueProblem), placed, undefined));
  }
  const cutters = readCutters(tree.value.cutters, placed, readCutterFile);
  if (!cutters.ok) {
    return cutters;
  }
  const job = understand(file, tree.value, unit, cutters.value.cutters);
  const place = (problems: readonly Problem[]) => placeProblems(problems, placed, cutters.value.placed);
  if (!job.ok) {
    return failure(place(job.problems));
  }
  const misfits = place(job.value.misfits ?? []);
  return success({ ...job.value, misfits, spots: spotsOf(placed) }, place(job.problems));
}

function understand(
  file: string,
  text: JobText,
  unit: LengthUnit,
  cutterTexts: Readonly<Record<string, CutterText>>,
): Outcome<Job> {
  const part = checkPart(text);
  if (text.wheel === undefined || part.length > 0) {
    return failure(part);
  }
  const notes = takeNotes();
  const cutters = deriveCutters(cutterTexts, notes);
  const wheel = deriveWheel(text.wheel, notes);
  const alone = [
    ...checkHolding(text, text.wheel),
    ...checkCutters(text, cutters, notes.all()),
    ...(wheel.ok ? checkOrder(text, wheel.value) : wheel.problems),
  ];
  const ground = { file, text, unit, cutters, notes };
  return wheel.ok ? together(ground, wheel.value, alone) : failure(alone);
}

/** One part a job. */
function checkPart({ wheel, pinion }: { wheel?: WheelText | undefined; pinion?: unknown }): Problem[] {
  if (pinion !== undefined) {
    const message = 'pinions cannot be cut yet; they come in a later version.';
    const hint = 'This version cuts wheels: say wheel:, with the pinion as its mate.';
    return [jobProblem({ path: ['pinion'], code: 'job.invalid', message, hint })];
  }
  if (wheel === undefined) {
    const message = 'there is no wheel: such a job is only for proving programs.';
    return [
      jobProblem({
        path: ['wheel'],
        code: 'job.invalid',
        message,
        hint: 'Give wheel: with its teeth and mate.',
      }),
    ];
  }
  return [];
}

interface Ground {
  readonly file: string;
  readonly text: JobText;
  readonly unit: LengthUnit;
  readonly cutters: ReturnType<typeof deriveCutters>;
  readonly notes: Notes;
}

/** What needs the tooth's form. */
function together(ground: Ground, wheel: WheelJob, before: readonly Problem[]): Outcome<Job> {
  const form = wheelForm(wheel);
  const side = toothSide(wheel);
  if (!form.ok || !side.ok) {
    return failure([...before, ...form.problems]);
  }
  const windows = wheel.crossings && crossings(wheel.crossings, form.value.rootRadius);
  const found = [
    ...before,
    ...form.problems,
    ...checkWheel(ground.text, wheel, form.value),
    ...(windows?.problems ?? []),
  ];
  if (found.some(({ severity }) => severity === 'error')) {
    return failure(found);
  }
  const shapes = {
    wheel,
    form: form.value,
    side: side.value,
    windows: windows?.ok === true ? windows.value : undefined,
  };
  return success(fillIn(ground, shapes), found);
}

interface Shapes {
  readonly wheel: WheelJob;
  readonly form: WheelForm;
  readonly side: ToothSide;
  readonly windows: Crossings | undefined;
}

/** All that the job leaves open, from what is sound by now. */
function fillIn({ file, text, unit, cutters, notes }: Ground, shapes: Shapes): Job {
  const skin = skinOf(text);
  const why = skin > 0 ? 'the skin is not cut' : 'clears the burr at the underside';
  const below = notes.fill(text.cuts?.below, 'cuts.below', skin > 0 ? 0 : BELOW, why);
  const ground = { text, ...shapes, cutters, below };
  const setup = deriveSetup(ground, notes);
  const cuts = deriveCuts(ground, notes);
  const fit = { unit, ...shapes, setup, cuts, derived: notes.all() };
  return {
    name: nameOf(file),
    file,
    title: notes.fill(text.title, 'title', nameOf(file), "the file's name"),
    length: notes.fill(text.length, 'length', unit, 'usual where nothing is said'),
    wheel: shapes.wheel,
    setup,
    zero: text.zero ?? 'top',
    machine: text.machine,
    cuts,
    derived: notes.all(),
    misfits: [...checkFit(fit), ...checkClearance(fit)],
  };
}

/** How far under the wheel a cutter goes where nothing is said. Why: into what the blank is held on, past the burr. */
const BELOW = 0.1;

function nameOf(file: string): string {
  const last = file.split(/[/\\]/).at(-1) ?? file;
  return last.replace(/\.[^.]*$/, '') || last;
}
