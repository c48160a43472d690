/**
 * Does it fit: the wheel on its blank, the cutters into the depth, the corners and the slots. A job that is understood and fails
 * here gets its sheet, but no program.
 */
import type { Problem } from '../base/problem.ts';
import { WRITTEN_LENGTH } from '../base/tolerances.ts';
import type { Cutter, Setup } from '../cutting/setup.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import { jobProblem, type JobProblem } from './job-problem.ts';
import type { CutSettings, Cuts, Derived, Job, PassKind, WheelJob } from './job.ts';
import { showLength } from './show-length.ts';
import type { LengthUnit } from '../base/units.ts';

export interface FitGround {
  readonly unit: LengthUnit;
  readonly wheel: WheelJob;
  readonly form: WheelForm;
  readonly setup: Setup;
  readonly cuts: Cuts;
  /** What the job left out, by its key: a length that was only assumed is not told as if it had been said. */
  readonly derived: Job['derived'];
}

export function checkFit(ground: FitGround): Problem[] {
  const show = (mm: number): string => showLength(mm, ground.unit);
  return [
    ...blank(ground, show),
    ...reach(ground, show),
    ...ground.cuts.order.flatMap((pass) => flute(pass, ground, show)),
    ...corners(ground, show),
    ...slot(ground, show),
  ].map((problem) => jobProblem({ code: 'job.does-not-fit', ...problem }));
}

type Show = (mm: number) => string;

/** What must be left of a sheet outside the slot round the wheel. Why: less breaks off and is thrown about. */
const SHEET_WEB = 1;
/** How far a turned disc may be from the tip circle, on the radius. Why: the aim for tip radii of mantel clocks. */
const DISC_ERROR = 0.03;

function blank({ form, setup, cuts }: FitGround, show: Show): JobProblem[] {
  const path = ['blank', 'size'];
  const tip = 2 * form.outsideRadius;
  if (setup.shape.kind === 'disc') {
    const error = (setup.shape.diameter - tip) / 2;
    if (Math.abs(error) <= DISC_ERROR) {
      return [];
    }
    const message = `the disc of ${show(setup.shape.diameter)} is ${error > 0 ? 'larger' : 'smaller'} than the tip circle, ${show(tip)}.`;
    const hint =
      error > 0
        ? 'Turn it to the tip circle, or say shape: sheet.'
        : 'Turn another; the teeth would be short.';
    return [{ path, message, hint }];
  }
  const { width, height } = setup.shape;
  const slotWidth = cuts.roughing.cutter.diameter + cuts.roughing.allowance;
  const wanted = tip + 2 * (slotWidth + SHEET_WEB);
  if (Math.min(width, height) >= wanted) {
    return [];
  }
  const message =
    `a sheet of ${show(Math.min(width, height))} is too small: the tip circle is ${show(tip)}, the slot round it ` +
    `${show(slotWidth)} wide, and ${show(SHEET_WEB)} must be left outside.`;
  return [
    { path, message, hint: `Take at least ${show(Math.ceil(wanted * 10) / 10)} each way, or turn a disc.` },
  ];
}

/** From the top of the blank to the deepest cut: no cutter rubs above its reach. */
function reach({ wheel, cuts, derived }: FitGround, show: Show): JobProblem[] {
  const deep = wheel.thickness + cuts.below;
  const short = cuts.order.filter((pass) => cuts[pass].cutter.reach < deep - WRITTEN_LENGTH);
  const numbers = [...new Set(short.map((pass) => cuts[pass].cutter.number))];
  return numbers.map((number) => {
    const passes = short.filter((pass) => cuts[pass].cutter.number === number);
    const reaches = show(cuts[passes[0] ?? 'roughing'].cutter.reach);
    const assumed = derived[`cutters.${number}.reach`];
    const message = `cutter ${number} reaches ${reaches}${asAssumed(assumed)}; ${passes.join(' and ')} ${passes.length > 1 ? 'are' : 'is'} ${deepOf({ wheel, cuts }, show)}.`;
    const hint =
      assumed === undefined
        ? 'Take a cutter with a longer neck or flute; this one would rub above its reach.'
        : 'If it is longer, write its reach (what fits beside a wall) and its flute (what cuts); else take a longer one.';
    return { path: ['cutters', String(number), 'reach'], message, hint };
  });
}

function deepOf({ wheel, cuts }: Pick<FitGround, 'wheel' | 'cuts'>, show: Show): string {
  const deep = show(wheel.thickness + cuts.below);
  return cuts.below > 0
    ? `${deep} deep (${show(wheel.thickness)} and ${show(cuts.below)} below)`
    : `${deep} deep`;
}

/** For a length that the job does not say. */
function asAssumed(derived: Derived | undefined): string {
  return derived === undefined ? '' : ` (assumed, as the job does not say: ${derived.why})`;
}

function flute(pass: PassKind, { wheel, cuts, derived }: FitGround, show: Show): JobProblem[] {
  const { cutter, step }: CutSettings = cuts[pass];
  const deep = wheel.thickness + cuts.below - WRITTEN_LENGTH;
  const assumed = derived[`cutters.${cutter.number}.flute`];
  const longer = assumed === undefined ? '' : 'If its flute is longer, write it; else g';
  if (step !== undefined && step > cutter.flute) {
    const message = `a step of ${show(step)} is more than the flute of cutter ${cutter.number}, ${show(cutter.flute)}${asAssumed(assumed)}.`;
    const hint = `${longer || 'G'}ive a step of at most ${show(cutter.flute)}.`;
    return [{ path: ['cuts', pass, 'step'], message, hint }];
  }
  if (pass === 'finishing' && step === undefined && cutter.flute < deep && cutter.reach >= deep) {
    const message = `finishing is ${deepOf({ wheel, cuts }, show)}, but cutter ${cutter.number} cuts only ${show(cutter.flute)} of its length${asAssumed(assumed)}.`;
    const hint = `${longer || 'G'}ive finishing a step of at most ${show(cutter.flute)}, or take a cutter with a longer flute.`;
    return [{ path: ['cutters', String(cutter.number), 'flute'], message, hint }];
  }
  return [];
}

function corners({ wheel, cuts }: FitGround, show: Show): JobProblem[] {
  const problems: JobProblem[] = [];
  const tooLarge = (cutter: Cutter, pass: PassKind, message: string, hint: string): void => {
    problems.push({
      path: ['cuts', pass, 'cutter'],
      code: 'reach.corner',
      message: `cutter ${cutter.number} cuts ${show(cutter.diameter)}; ${message}`,
      hint,
    });
  };
  const bore = wheel.bore - cuts.bore.leave;
  if (cuts.order.includes('bore') && cuts.bore.cutter.diameter >= bore) {
    tooLarge(
      cuts.bore.cutter,
      'bore',
      `the bore it has to make is ${show(bore)}.`,
      'Take a smaller cutter for the bore.',
    );
  }
  const corner = wheel.crossings?.corner ?? Infinity;
  if (cuts.order.includes('crossings') && cuts.crossings.cutter.diameter > 2 * corner) {
    const message = `the corners of the windows have a radius of ${show(corner)}.`;
    tooLarge(
      cuts.crossings.cutter,
      'crossings',
      message,
      `Take a cutter of at most ${show(2 * corner)}, or larger corners.`,
    );
  }
  return problems;
}

/** The finishing cutter goes at full depth through the slot that was roughed. */
function slot({ cuts }: FitGround, show: Show): JobProblem[] {
  const { roughing, finishing } = cuts;
  const width = roughing.cutter.diameter + roughing.allowance;
  if (finishing.cutter.diameter <= width) {
    return [];
  }
  const message =
    `cutter ${finishing.cutter.number} (${show(finishing.cutter.diameter)}) is wider than the slot that cutter ` +
    `${roughing.cutter.number} roughs, ${show(width)} with the allowance.`;
  return [
    {
      path: ['cuts', 'finishing', 'cutter'],
      message,
      hint: 'Finish with a cutter no larger than the roughing one.',
    },
  ];
}
