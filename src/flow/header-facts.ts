/** What a program's header and the sheet's set-up say, gathered from job, machine, shapes and plan. mm. */
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';
import type { HeaderCutter, HeaderFacts } from '../post/header-facts.ts';
import { motionFacts } from '../post/motion-facts.ts';
import type { CutPlan } from '../toolpath/plan.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { materialNamed } from '../cutting/materials.ts';

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

/** Of the i-th program, or of all of them together for the sheet. */
export function headerFacts(kind: HeaderKind, i: number | 'all', sources: HeaderSources): HeaderFacts {
  const { job, mark, version, form, plan } = sources;
  const programs = plan.programs.filter((_, k) => i === 'all' || k === i);
  const motions = kind === 'walk' ? [plan.walk] : programs.map(({ motion }) => motion);
  const { x, y, z, speeds } = motionFacts({ steps: motions.flatMap(({ steps }) => steps) });
  const numbers = kind === 'walk' ? [] : programs.flatMap(({ cutters }) => cutters);
  return {
    kind,
    title: job.title,
    mark,
    version,
    part: partLines(sources),
    program: { number: kind === 'walk' || i === 'all' ? 0 : i + 1, of: plan.programs.length },
    blank: blankWords(job),
    holding: job.setup.holding.join(' and '),
    material: job.setup.material,
    cutters: job.setup.cutters.filter(({ number }) => numbers.includes(number)).map(headerCutter),
    speeds,
    extents: { x, y, z },
    clear: job.setup.clearZ,
    topZ: job.setup.topZ,
    plateZ: job.setup.plateZ,
    park: plan.park,
    zero: job.zero,
    again: againWords(job),
    check: { what: 'the diameter over the tips', size: 2 * form.outsideRadius },
    proved: [
      'read back from this text: the flanks against the exact curve at every depth, bore and crossings, travel, fast moves, keep-outs, feeds and spindle, loose metal',
    ],
    notProved: [
      'bending, wear and true running of the cutter, play of the slides, the holding, and whether zero is set where it says',
    ],
  };
}

function headerCutter({ number, diameter, flutes, stickOut }: Job['setup']['cutters'][number]): HeaderCutter {
  return { number, diameter, flutes, stickOut };
}

function partLines({ job, form, crossings }: HeaderSources): readonly string[] {
  const { teeth, module, mate } = form.proportions;
  const mateWords =
    mate.kind === 'pinion' ? `pinion of ${mate.leaves} leaves` : `lantern of ${mate.trundles} trundles`;
  const holes = [
    job.wheel.bore > 0 ? `bore ${decimal(job.wheel.bore)} mm` : 'no bore',
    crossings === undefined ? 'no crossings' : `${crossings.count} crossings`,
  ];
  return [
    `wheel of ${teeth} teeth, module ${decimal(module)}, for a ${mateWords}, ${decimal(job.wheel.thickness)} mm thick, ${holes.join(', ')}`,
  ];
}

function blankWords(job: Job): string {
  const { shape, topZ, plateZ } = job.setup;
  const thick = `${decimal(topZ - plateZ)} mm thick`;
  const words =
    shape.kind === 'sheet'
      ? `sheet ${decimal(shape.width)} by ${decimal(shape.height)} mm, ${thick}, its middle at zero`
      : `disc ${decimal(shape.diameter)} mm across, ${thick}, its axis at zero`;
  const material = materialNamed(job.setup.material)?.words;
  return material === undefined ? words : `${words}, ${material}`;
}

/** Zero may be bored away: a place that stays. */
function againWords(job: Job): string {
  const { shape, bored } = job.setup;
  if (shape.kind === 'disc') {
    return bored > 0
      ? 'run a dial gauge round the hole, which is the axis'
      : 'run a dial gauge round the rim of the disc before the teeth are cut, and mark two edges of the plate';
  }
  return `the edges of the sheet lie at X ${decimal(-shape.width / 2)} and Y ${decimal(-shape.height / 2)} mm, and stay there; touch them and write down what the machine shows`;
}

function decimal(value: number): string {
  return value.toFixed(4).replace(/\.?0+$/, '');
}
