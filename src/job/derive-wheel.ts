/**
 * The wheel's proportions, with what the job leaves out. Module from centres: m = 2C / (N + z); from a diametral pitch: 25.4 / DP.
 * Out: proportions in mm (those of the mate in modules), or why there are none.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { MM_PER_INCH } from '../base/units.ts';
import { theoreticalAddendum } from '../tooth/addendum.ts';
import { defaultDedendum, defaultLeaf, defaultTip, defaultTrundle } from '../tooth/mate.ts';
import type { CrossingProportions, Mate } from '../tooth/wheel.ts';
import type { WheelText } from './job-schema.ts';
import type { WheelJob } from './job.ts';
import { jobProblem } from './job-problem.ts';
import type { Notes } from './notes.ts';
import { tidy } from './read-number.ts';

const REMEMBERED =
  'usual proportion of cycloidal clock wheels (BS 978-2, from memory: the standard was not at hand)';

export function deriveWheel(text: WheelText, notes: Notes): Outcome<WheelJob> {
  const problems = [...checkMate(text), ...checkSize(text)];
  if (problems.length > 0) {
    return failure(problems);
  }
  const leaves = text.mate.leaves ?? text.mate.trundles ?? 0;
  const module = moduleOf(text, leaves, notes);
  const height = notes.fill(text.height, 'height', 0.95, REMEMBERED);
  const tooth = notes.fill(text.tooth, 'tooth', 0.5, REMEMBERED);
  const nominal = tidy((module * (text.teeth + leaves)) / 2);
  const wheel: WheelJob = {
    teeth: text.teeth,
    module,
    mate: mateOf(text, height * theoreticalAddendum(text.teeth, leaves, tooth), notes),
    centres: notes.fill(text.centres, 'centres', nominal, 'nominal: half the module times teeth and leaves'),
    addendumForm: notes.fill(text.addendum, 'addendum', 'epicycloid', 'the exact curve for this mate'),
    height,
    tooth,
    dedendum: notes.fill(text.dedendum, 'dedendum', 1.5708, REMEMBERED),
    rootFillet: notes.fill(text.root, 'root', 0, 'sharp; what the cutter leaves is reckoned with'),
    thickness: text.thickness,
    bore: notes.fill(text.bore, 'bore', 0, 'none is asked for'),
  };
  return success(text.crossings === undefined ? wheel : { ...wheel, crossings: crossingsOf(text.crossings) });
}

function checkMate({ mate }: WheelText): Problem[] {
  if ((mate.leaves === undefined) === (mate.trundles === undefined)) {
    const both = mate.leaves !== undefined;
    return [
      jobProblem({
        path: ['wheel', 'mate', both ? 'trundles' : 'leaves'],
        code: both ? 'job.conflict' : 'job.invalid',
        message: both
          ? 'a mate has leaves or trundles, not both.'
          : 'how many leaves the mate has is not given.',
        hint: both
          ? 'Keep leaves: for a pinion cut from the solid; wheels for a lantern pinion come in a later version.'
          : 'Give leaves: of the pinion that the wheel drives.',
      }),
    ];
  }
  const stray = mate.trundles === undefined ? (['trundle'] as const) : (['leaf', 'tip', 'dedendum'] as const);
  return stray
    .filter((key) => mate[key] !== undefined)
    .map((key) =>
      jobProblem({
        path: ['wheel', 'mate', key],
        message: `${key} belongs to a ${mate.trundles === undefined ? 'lantern pinion' : 'pinion with leaves'}.`,
        hint: mate.trundles === undefined ? `Leave ${key} out.` : `Leave ${key} out, or say leaves.`,
      }),
    );
}

function checkSize(text: WheelText): Problem[] {
  const pitch = text['diametral-pitch'];
  if (text.module !== undefined && pitch !== undefined) {
    return [
      jobProblem({
        path: ['wheel', 'diametral-pitch'],
        message: `a diametral pitch of ${pitch} is a module of ${(MM_PER_INCH / pitch).toFixed(4)} mm; module says ${text.module} mm.`,
        hint: 'Keep one of them.',
      }),
    ];
  }
  if (text.module === undefined && pitch === undefined && text.centres === undefined) {
    return [
      jobProblem({
        path: ['wheel', 'module'],
        code: 'job.invalid',
        message: 'the size of the teeth is not known.',
        hint: 'Give module: (mm), or diametral-pitch:, or the distance of the pivots as centres:.',
      }),
    ];
  }
  return [];
}

function moduleOf(text: WheelText, leaves: number, notes: Notes): number {
  const pitch = text['diametral-pitch'];
  if (text.module === undefined && pitch !== undefined) {
    return notes.fill(
      undefined,
      'module',
      tidy(MM_PER_INCH / pitch),
      `25.4 over the diametral pitch ${pitch}`,
    );
  }
  const fromCentres = tidy((2 * (text.centres ?? 0)) / (text.teeth + leaves));
  const why = `twice the centres ${text.centres ?? 0} mm over ${text.teeth} teeth and ${leaves} leaves`;
  return notes.fill(text.module, 'module', fromCentres, why);
}

function mateOf({ mate }: WheelText, addendum: number, notes: Notes): Mate {
  if (mate.leaves === undefined) {
    const fallback = defaultTrundle();
    const trundle = notes.fill(mate.trundle, 'mate.trundle', fallback.value, fallback.why);
    return { kind: 'lantern', trundles: mate.trundles ?? 0, trundle };
  }
  const leaf = defaultLeaf(mate.leaves);
  const tip = defaultTip();
  const dedendum = defaultDedendum(addendum);
  return {
    kind: 'pinion',
    leaves: mate.leaves,
    leaf: notes.fill(mate.leaf, 'mate.leaf', leaf.value, leaf.why),
    tip: notes.fill(mate.tip, 'mate.tip', tip.value, tip.why),
    dedendum: notes.fill(mate.dedendum, 'mate.dedendum', dedendum.value, dedendum.why),
  };
}

function crossingsOf(text: NonNullable<WheelText['crossings']>): CrossingProportions {
  const { arms, arm, rim, hub, corner } = text;
  const widths = typeof arm === 'number' ? { 'at-hub': arm, 'at-rim': arm } : arm;
  return { arms, armAtHub: widths['at-hub'], armAtRim: widths['at-rim'], rim, hub, corner };
}
