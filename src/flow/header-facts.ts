/** What a program's header and the sheet's set-up say, gathered from job, machine, shapes and plan. mm. */
import { fixedDecimals } from '../base/fixed-decimals.ts';
import { millimetresPer, type LengthUnit } from '../base/units.ts';
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';
import type { HeaderCutter, HeaderFacts } from '../post/header-facts.ts';
import type { Motion } from '../motion/motion.ts';
import { motionFacts, type MotionFacts, type Span } from '../post/motion-facts.ts';
import type { CutPlan } from '../toolpath/plan.ts';
import { overTips } from '../tooth/span.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { materialNamed } from '../cutting/materials.ts';
import { writableTitle } from './writable-title.ts';

export type HeaderKind = 'cut' | 'walk';

export interface HeaderSources {
  readonly job: Job;
  readonly machine: Machine;
  readonly mark: string;
  readonly version: string;
  readonly form: WheelForm;
  readonly crossings?: Crossings;
  readonly plan: CutPlan;
}

const PROVED = {
  cut: 'read back from its own text, all programs of this mark together: the flanks against the exact curve at every depth, bore and crossings, travel, fast moves, keep-outs, feeds and spindle, loose metal',
  walk: 'read back from its own text: travel, keep-outs, nothing below the clear height, spindle still',
} as const;

const NOT_PROVED = {
  cut: 'bending, wear and true running of the cutter, play of the slides, the holding, and whether zero is set where it says',
  walk: 'whether zero is set where it says, and what stands on the table without being named in the job',
} as const;

/** A disc's tips are not cut: over them it measures what it was turned to. */
function turnedTo({ setup: { shape } }: Job): number | undefined {
  return shape.kind === 'disc' ? shape.diameter : undefined;
}

/** Of the i-th program, or of all of them together for the sheet. */
export function headerFacts(kind: HeaderKind, i: number | 'all', sources: HeaderSources): HeaderFacts {
  const { job, mark, version, form, plan } = sources;
  const programs = plan.programs.filter((_, k) => i === 'all' || k === i);
  const motions = kind === 'walk' ? [plan.walk] : programs.map(({ motion }) => motion);
  const { x, y, z, speeds } = together(motions.map(factsOf));
  const title = writableTitle(job, sources.machine);
  const numbers = kind === 'walk' ? [] : programs.flatMap(({ cutters }) => cutters);
  // A program speaks its machine's unit, with the job's beside it where a person measures; the sheet speaks the job's.
  const unit = i === 'all' ? job.length : sources.machine.units;
  const jobs = job.length === sources.machine.units ? {} : { jobUnit: job.length };
  return {
    kind,
    title: title.ok ? title.value : job.title,
    mark,
    version,
    part: partLines(sources, unit),
    program: { number: kind === 'walk' || i === 'all' ? 0 : i + 1, of: plan.programs.length },
    blank: blankWords(job, unit, i === 'all'),
    holding: job.setup.holding.join(' and '),
    ...jobs,
    material: job.setup.material,
    cutters: job.setup.cutters.filter(({ number }) => numbers.includes(number)).map(headerCutter),
    speeds,
    extents: { x, y, z },
    clear: job.setup.clearZ,
    topZ: job.setup.topZ,
    plateZ: job.setup.plateZ,
    park: plan.park,
    zero: job.zero,
    again: againWords(job, unit),
    check: { what: 'the diameter over the tips', size: overTips(form, turnedTo(job)).most },
    proved: [PROVED[kind]],
    notProved: [NOT_PROVED[kind]],
  };
}

/** Reckoned once for each motion. Why: a program is long, and its head and the sheet both ask. */
const KNOWN = new WeakMap<Motion, MotionFacts>();

function factsOf(motion: Motion): MotionFacts {
  const facts = KNOWN.get(motion) ?? motionFacts(motion);
  KNOWN.set(motion, facts);
  return facts;
}

type Reach = Pick<MotionFacts, 'x' | 'y' | 'z' | 'speeds'>;

function together(all: readonly Reach[]): Reach {
  const span = (pick: (facts: Reach) => Span): Span => [
    Math.min(...all.map((facts) => pick(facts)[0])),
    Math.max(...all.map((facts) => pick(facts)[1])),
  ];
  const speeds = new Set(all.flatMap((facts) => facts.speeds));
  return {
    x: span((facts) => facts.x),
    y: span((facts) => facts.y),
    z: span((facts) => facts.z),
    speeds: [...speeds].sort((a, b) => a - b),
  };
}

function headerCutter({
  number,
  diameter,
  flutes,
  stickOut,
  shank,
}: Job['setup']['cutters'][number]): HeaderCutter {
  return { number, diameter, flutes, stickOut, shank };
}

function partLines({ job, form, crossings }: HeaderSources, unit: LengthUnit): readonly string[] {
  const { teeth, module, mate } = form.proportions;
  const mateWords =
    mate.kind === 'pinion' ? `pinion of ${mate.leaves} leaves` : `lantern of ${mate.trundles} trundles`;
  const both = (mm: number): string =>
    unit === job.length ? size(mm, unit) : `${size(mm, unit)} or ${size(mm, job.length)}`;
  const holes = [
    job.wheel.bore > 0 ? `bore ${both(job.wheel.bore)}` : 'no bore',
    crossings === undefined ? 'no crossings' : `${crossings.count} crossings`,
  ];
  return [
    `wheel of ${teeth} teeth, module ${decimal(module)}, for a ${mateWords}, ${both(job.wheel.thickness)} thick, ${holes.join(', ')}`,
  ];
}

/** Alloys with their numbers for the sheet only: in a program C353 would read as a word that moves. */
function blankWords(job: Job, unit: LengthUnit, alloys: boolean): string {
  const { shape, topZ, plateZ } = job.setup;
  const sizes = shape.kind === 'sheet' ? [shape.width, shape.height] : [shape.diameter];
  const bare = [...sizes, topZ - plateZ].map((mm) => size(mm, job.length).replace(/ .*/, ''));
  const asInJob = unit === job.length ? '' : `, in ${job.length} ${bare.join(' by ')}`;
  const thick = `${size(topZ - plateZ, unit)} thick${asInJob}`;
  const words =
    shape.kind === 'sheet'
      ? `sheet ${size(shape.width, unit)} by ${size(shape.height, unit)}, ${thick}, its middle at zero`
      : `disc ${size(shape.diameter, unit)} across, ${thick}, its axis at zero`;
  const material = materialNamed(job.setup.material)?.words;
  return material === undefined || !alloys ? words : `${words}, ${material}`;
}

/** Zero may be bored away: a place that stays. */
function againWords(job: Job, unit: LengthUnit): string {
  const { shape, bored, holding } = job.setup;
  if (shape.kind === 'disc') {
    if (holding.includes('arbor')) {
      return 'run a dial gauge round the arbor where it shows, or round the rim of the disc before the teeth are cut';
    }
    return bored > 0
      ? 'run a dial gauge round the hole, which is the axis'
      : 'run a dial gauge round the rim of the disc before the teeth are cut, and mark two edges of the plate';
  }
  return `the edges of the sheet lie at X ${size(-shape.width / 2, unit)} and Y ${size(-shape.height / 2, unit)}, and stay there; touch them and write down what the machine shows`;
}

/** A size as it is said: "44 mm", "0.0625 inch". */
function size(mm: number, unit: LengthUnit): string {
  return `${decimal(mm / millimetresPer(unit), unit === 'mm' ? 4 : 5)} ${unit}`;
}

function decimal(value: number, decimals = 4): string {
  return fixedDecimals(value, decimals).replace(/\.?0+$/, '');
}
