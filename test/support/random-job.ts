/**
 * Jobs as a person would write them, drawn at random: a machine from posts/, a wheel that it holds, a plate by its module,
 * cutters from a catalogue's row of diameters, a blank about 30 % larger; now and then a slip (too large, too short, too small).
 * Nothing here asks the program what it can reach. Lengths in mm here, whatever unit the job is written in.
 */
import * as fc from 'fast-check';
import { MACHINES } from './cut-text.ts';

export interface RandomCutter {
  readonly diameter: number;
  readonly flutes: number;
  readonly reach: number;
  readonly flute?: number;
  readonly shank?: number;
  readonly stickOut?: number;
  readonly helix?: number;
  readonly cuts?: number;
  readonly plunges?: boolean;
}

export interface RandomCrossings {
  readonly arms: number;
  readonly atHub: number;
  readonly atRim: number;
  readonly rim: number;
  readonly hub: number;
  readonly corner: number;
}

export interface RandomClamp {
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  readonly height: number;
}

export type RandomPass = 'bore' | 'crossings' | 'roughing' | 'finishing';

export interface RandomJob {
  readonly inch: boolean;
  readonly machine: string;
  readonly teeth: number;
  readonly leaves: number;
  readonly leaf?: number;
  readonly module: number;
  readonly says: 'module' | 'diametral-pitch' | 'centres' | 'module-and-centres';
  readonly centres: number;
  readonly form: 'epicycloid' | 'arc';
  readonly height: number;
  readonly tooth: number;
  readonly dedendum: number;
  readonly root: number;
  readonly thickness: number;
  readonly bore: number;
  readonly crossings?: RandomCrossings;
  readonly material: string;
  /** Of a sheet, the shorter side and the longer; of a disc its diameter, or nothing said. */
  readonly sheet?: readonly [number, number];
  readonly disc?: number;
  readonly bored: number;
  readonly holding: 'glue' | 'tape' | 'arbor' | 'skin' | 'glue-and-screw';
  readonly skin: number;
  readonly screw: { readonly head: number; readonly height: number; readonly thread: number };
  readonly clamps: readonly RandomClamp[];
  readonly zero?: 'top' | 'plate';
  readonly clear?: number;
  readonly cutters: readonly RandomCutter[];
  /** Numbers of cutters, from 1, where the job names them. */
  readonly named: Partial<Record<RandomPass, number>>;
  readonly allowance?: number;
  readonly step?: number;
  readonly finishingStep?: number;
  readonly speed?: number;
  readonly feed?: number;
  readonly below?: number;
  readonly leave?: number;
  readonly climb?: boolean;
  readonly spring?: number;
  readonly passes?: number;
}

const INCH = 25.4;
/** A catalogue's row of small end mills, and of plates. */
const DIAMETERS = [
  0.05, 0.08, 0.1, 0.15, 0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 1, 1.2, 1.5, 1.8, 2, 2.5, 3,
];
const PLATES = [0.15, 0.2, 0.3, 0.4, 0.5, 0.6, 0.8, 1, 1.2, 1.5, 2, 2.5, 3];
const MODULES = [
  0.1, 0.12, 0.15, 0.18, 0.2, 0.25, 0.3, 0.35, 0.4, 0.45, 0.5, 0.55, 0.6, 0.7, 0.75, 0.8, 0.9, 1, 1.25, 1.5,
  2,
];
/** The shorter side of each table's travel, from the machine files' own words, as their owners know them. */
const TABLES: Readonly<Record<string, number>> = {
  'bench-mill': 160,
  'desk-four-axis': 120,
  'desk-three-axis': 150,
  'din-66025': 220,
  'inch-bench-mill': 203,
  'lines-only': 180,
  'machining-centre': 200,
};

/** A stream of choices (fewer teeth where there is less time), shrunk by fast-check as one list of numbers from 0 to 1. */
export function randomJob(mostTeeth = 400): fc.Arbitrary<RandomJob> {
  return fc
    .array(fc.noBias(fc.integer({ min: 0, max: FINE - 1 })), {
      minLength: CHOICES,
      maxLength: CHOICES,
      size: 'max',
    })
    .map((stream) => writeJob(chooser(stream.map((choice) => choice / FINE)), mostTeeth));
}

const CHOICES = 120;
const FINE = 1_000_000;

interface Chooser {
  readonly share: () => number;
  readonly between: (low: number, high: number, decimals?: number) => number;
  readonly one: <T>(list: readonly T[]) => T;
  readonly chance: (share: number) => boolean;
}

function chooser(stream: readonly number[]): Chooser {
  let i = 0;
  const share = (): number => stream[i++ % stream.length] ?? 0;
  return {
    share,
    between: (low, high, decimals = 3) => round(low + (high - low) * share(), decimals),
    one: <T>(list: readonly T[]): T => list[Math.floor(share() * list.length)] as T,
    chance: (part) => share() > 1 - part,
  };
}

function round(value: number, decimals: number): number {
  return Number(value.toFixed(decimals));
}

/** The kind of wheel, then what the machine can hold of it. */
function writeJob(c: Chooser, mostTeeth: number): RandomJob {
  const machine = c.one(MACHINES);
  const inch = machine === 'inch-bench-mill' ? c.chance(0.8) : c.chance(0.15);
  const most = (high: number): number => Math.min(high, mostTeeth);
  const teeth = Math.round(
    c.one([
      c.between(30, most(96)),
      c.between(30, most(96)),
      c.between(6, most(30)),
      c.between(most(96), most(180)),
      c.between(most(180), mostTeeth),
    ]),
  );
  const leaves = Math.round(c.between(6, 20));
  const table = TABLES[machine] ?? 150;
  const largest = (c.chance(0.03) ? 1.3 : 0.75) * table;
  const fits = MODULES.filter((module) => module * (teeth + 4) <= largest);
  const module = c.one(fits.length > 0 ? fits : MODULES.slice(0, 1));
  const says = c.one([
    'module',
    'module',
    'module',
    'diametral-pitch',
    'centres',
    'module-and-centres',
  ] as const);
  const nominal = (module * (teeth + leaves)) / 2;
  const tooth = c.chance(0.2) ? c.between(0.44, 0.54, 2) : 0.5;
  const form = c.chance(0.12) ? 'arc' : 'epicycloid';
  const shape = {
    inch,
    machine,
    teeth,
    leaves,
    ...(c.chance(0.2) ? { leaf: c.between(0.9, 1.4, 2) } : {}),
    module:
      says === 'diametral-pitch'
        ? INCH / round(INCH / module, 2)
        : says === 'centres'
          ? (2 * round(nominal, 3)) / (teeth + leaves)
          : module,
    says,
    centres: says === 'module-and-centres' ? round(nominal + module * c.between(-0.1, 0.3), 3) : nominal,
    form,
    height: c.chance(0.25) ? c.between(0.75, 1, 2) : 0.95,
    tooth,
    dedendum: c.chance(0.25) ? c.between(1.3, 1.9, 2) : 1.5708,
    root: c.chance(0.15) ? round(module * c.between(0.05, 0.3), 3) : 0,
  } as const;
  return withPlate(c, shape);
}

type Shape = Pick<
  RandomJob,
  | 'inch'
  | 'machine'
  | 'teeth'
  | 'leaves'
  | 'leaf'
  | 'module'
  | 'says'
  | 'centres'
  | 'form'
  | 'height'
  | 'tooth'
  | 'dedendum'
  | 'root'
>;

function withPlate(c: Chooser, shape: Shape): RandomJob {
  const { module, teeth, dedendum } = shape;
  const wanted = module * c.between(1.6, 3);
  const thickness = PLATES.findLast((plate) => plate <= wanted) ?? 0.15;
  const rootDiameter = module * (teeth - 2 * dedendum);
  const bore = c.chance(0.85)
    ? round(Math.max(rootDiameter * c.between(0.1, 0.3), 0.3), rootDiameter > 10 ? 1 : 2)
    : 0;
  const small = smallCutter(c, module, thickness);
  const cutters = [small, ...largeCutters(c, thickness, bore)];
  // Nobody clears large windows with the cutter that goes into the spaces.
  const stout = Math.max(...cutters.map(({ diameter }) => diameter)) > 0.02 * rootDiameter;
  const crossings =
    rootDiameter > 14 && c.chance(stout ? 0.5 : 0.1)
      ? windows(c, shape, rootDiameter, bore, cutters)
      : undefined;
  return {
    ...shape,
    thickness,
    ...held(c, shape, bore),
    cutters,
    ...(crossings === undefined ? {} : { crossings }),
    ...passes(c, cutters, small, thickness),
  };
}

/** For the spaces: near a module wide, and as long as the plate asks, mostly. */
function smallCutter(c: Chooser, module: number, thickness: number): RandomCutter {
  const wanted = module * (c.chance(0.06) ? c.between(1.2, 2.2) : c.between(0.65, 1.05));
  const diameter = DIAMETERS.findLast((size) => size <= wanted) ?? 0.05;
  return cutterOf(c, diameter, thickness + 0.1);
}

function cutterOf(c: Chooser, diameter: number, deep: number): RandomCutter {
  const long = [3, 3.5, 4, 5, 6].find((times) => times * diameter >= deep) ?? 8;
  const reach = round(diameter * (c.chance(0.06) ? c.between(1.5, 3) : long), 2);
  const flute = c.chance(0.8)
    ? Math.min(reach, Math.max(round(1.5 * diameter, 2), c.chance(0.9) ? reach : 0))
    : undefined;
  return {
    diameter,
    flutes: c.chance(0.2) ? 3 : 2,
    reach,
    ...(flute === undefined ? {} : { flute }),
    ...(c.chance(0.6) ? { shank: c.one(diameter < 3 ? [3, 3.175, 4] : [4, 6]) } : {}),
    ...(c.chance(0.6) ? { stickOut: round(reach + c.between(8, 14, 1), 2) } : {}),
    ...(c.chance(0.7) ? { helix: c.one([20, 25, 30, 30, 35, 40]) } : {}),
    ...(c.chance(0.1) ? { cuts: round(diameter * c.between(0.99, 1.03, 3), 3) } : {}),
    ...(c.chance(0.15) ? { plunges: true } : {}),
  };
}

/** For bore and windows, perhaps one more. */
function largeCutters(c: Chooser, thickness: number, bore: number): readonly RandomCutter[] {
  const count = c.one([0, 1, 1, 1, 2, 3]);
  return Array.from({ length: count }, () => {
    const most = bore > 0 && c.chance(0.8) ? 0.7 * bore : 3;
    const choice = DIAMETERS.filter((size) => size >= 0.3 && size <= most);
    return cutterOf(c, c.one(choice.length > 0 ? choice.slice(-5) : [1]), thickness + 0.1);
  });
}

function windows(
  c: Chooser,
  { module }: Shape,
  rootDiameter: number,
  bore: number,
  cutters: readonly RandomCutter[],
): RandomCrossings {
  const arms = c.one([3, 4, 4, 5, 5, 6, 6, 8]);
  const arm = round(rootDiameter * c.between(0.05, 0.1), 2);
  const hub = round(Math.max(2 * bore, rootDiameter * c.between(0.22, 0.4)), 1);
  const rim = round(Math.max(2 * module, rootDiameter * 0.05) * c.between(0.9, 1.5), 2);
  const biggest = c.chance(0.85)
    ? Math.max(...cutters.map(({ diameter }) => diameter))
    : c.one(cutters).diameter;
  return {
    arms,
    atHub: c.chance(0.4) ? round(arm * 1.3, 2) : arm,
    atRim: arm,
    rim,
    hub,
    corner: round(Math.max(biggest * c.between(0.55, 1), 0.2), 2),
  };
}

/** The blank: how it is held, which holes it has, what stands beside it. */
function held(
  c: Chooser,
  shape: Shape,
  bore: number,
): Pick<
  RandomJob,
  | 'bore'
  | 'material'
  | 'sheet'
  | 'disc'
  | 'bored'
  | 'holding'
  | 'skin'
  | 'screw'
  | 'clamps'
  | 'zero'
  | 'clear'
> {
  const { module, teeth } = shape;
  const isDisc = c.chance(0.3);
  const across = module * (teeth + 3);
  const holding = isDisc
    ? c.one(bore > 0 ? (['arbor', 'glue', 'tape'] as const) : (['glue', 'tape'] as const))
    : c.one(
        bore >= 1 && bore <= 25
          ? (['glue', 'glue', 'tape', 'skin', 'glue-and-screw'] as const)
          : (['glue', 'tape', 'skin'] as const),
      );
  const side = Math.max(round(across * c.between(1.25, 1.4), 0), Math.ceil(across + 8));
  const size = c.chance(0.04) ? Math.ceil(across + 1) : side;
  const through = holding === 'arbor' || holding === 'glue-and-screw';
  const clamps = !isDisc && c.chance(0.25) ? corners(size, c) : [];
  return {
    bore,
    material: c.one([
      'leaded-brass',
      'leaded-brass',
      'leaded-brass',
      'brass',
      'aluminium',
      'acetal',
      'free-cutting-steel',
      'silver-steel',
    ]),
    ...(isDisc ? {} : { sheet: [size, c.chance(0.2) ? size + 10 : size] as const }),
    bored: through ? bore : bore > 1 && c.chance(0.15) ? round(bore * 0.7, 1) : 0,
    holding,
    skin: c.one([0.05, 0.08, 0.1, 0.15]),
    screw: {
      head: round(bore * 1.5 + 0.5, 1),
      height: c.between(1, 4, 1),
      thread: round(Math.max(bore * 0.8, 0.2), 2),
    },
    clamps,
    ...(holding === 'skin'
      ? { zero: 'plate' as const }
      : c.chance(0.5)
        ? { zero: c.one(['top', 'plate'] as const) }
        : {}),
    ...(c.chance(0.2) ? { clear: c.between(3, 10, 1) } : {}),
  };
}

/** Two clamps in opposite corners of the sheet, reaching a little in. */
function corners(size: number, c: Chooser): readonly RandomClamp[] {
  const at = round(size / 2, 2);
  const radius = c.between(2, 5, 1);
  const height = c.between(3, 10, 1);
  return [
    { x: at, y: at, radius, height },
    { x: -at, y: -at, radius, height },
  ];
}

function passes(
  c: Chooser,
  cutters: readonly RandomCutter[],
  small: RandomCutter,
  thickness: number,
): Pick<
  RandomJob,
  | 'named'
  | 'allowance'
  | 'step'
  | 'finishingStep'
  | 'speed'
  | 'feed'
  | 'below'
  | 'leave'
  | 'climb'
  | 'spring'
  | 'passes'
> {
  const naming = c.chance(0.4);
  const flute = small.flute ?? Math.min(small.reach, 2 * small.diameter);
  return {
    named: naming
      ? { roughing: 1, finishing: 1, ...(cutters.length > 1 && c.chance(0.5) ? { bore: 2 } : {}) }
      : {},
    ...(c.chance(0.3)
      ? { allowance: round(Math.max(0.005, small.diameter * c.between(0.03, 0.08)), 3) }
      : {}),
    ...(c.chance(0.15) ? { step: round(small.diameter * c.between(0.1, 0.3), 3) } : {}),
    ...(flute < thickness + 0.1 && c.chance(0.8) ? { finishingStep: round(flute * 0.9, 3) } : {}),
    ...(c.chance(0.12) ? { speed: c.one([6000, 10000, 15000, 18000, 20000, 24000]) } : {}),
    ...(c.chance(0.1) ? { feed: Math.max(20, Math.round(small.diameter * c.between(200, 400))) } : {}),
    ...(c.chance(0.1) ? { below: c.between(0.05, 0.2, 2) } : {}),
    ...(c.chance(0.08) ? { leave: c.one([0.05, 0.1]) } : {}),
    ...(c.chance(0.4) ? { climb: c.chance(0.6) } : {}),
    ...(c.chance(0.2) ? { spring: c.one([0, 1, 2]) } : {}),
    ...(c.chance(0.1) ? { passes: 2 } : {}),
  };
}

/** The job file a person would write of it. */
export function jobText(job: RandomJob): string {
  const n = (mm: number): string => String(job.inch ? round(mm / INCH, 7) : mm);
  const list = (fields: Readonly<Record<string, string | number | undefined>>): string =>
    `{ ${Object.entries(fields)
      .filter(([, value]) => value !== undefined)
      .map(([key, value]) => `${key}: ${String(value)}`)
      .join(', ')} }`;
  const maybe = (mm: number | undefined): string | undefined => (mm === undefined ? undefined : n(mm));
  const { crossings: w, named } = job;
  const size = {
    module: `  module: ${String(job.module)}`,
    'diametral-pitch': `  diametral-pitch: ${String(round(INCH / job.module, 2))}`,
    centres: `  centres: ${n(job.centres)}`,
    'module-and-centres': `  module: ${String(job.module)}\n  centres: ${n(job.centres)}`,
  }[job.says];
  const pass = (
    which: RandomPass,
    more: Readonly<Record<string, string | number | undefined>> = {},
  ): string[] => {
    const fields = list({ cutter: named[which], ...more });
    return fields === '{  }' ? [] : [`  ${which}: ${fields}`];
  };
  const cuts = [
    ...(job.bore > 0 && job.bored < job.bore ? pass('bore', { leave: maybe(job.leave) }) : []),
    ...pass('roughing', {
      allowance: maybe(job.allowance),
      step: maybe(job.step),
      speed: job.speed,
      feed: maybe(job.feed),
    }),
    ...pass('finishing', { step: maybe(job.finishingStep), spring: job.spring, passes: job.passes }),
    ...(job.below === undefined || job.holding === 'skin' ? [] : [`  below: ${n(job.below)}`]),
    ...(job.climb === undefined ? [] : [`  climb: ${job.climb ? 'yes' : 'no'}`]),
  ];
  return [
    'format: ogive-job/1',
    'title: A wheel drawn at random',
    `length: ${job.inch ? 'inch' : 'mm'}`,
    'wheel:',
    `  teeth: ${String(job.teeth)}`,
    `  mate: ${list({ leaves: job.leaves, leaf: job.leaf })}`,
    size,
    `  addendum: ${job.form}`,
    `  height: ${String(job.height)}`,
    `  tooth: ${String(job.tooth)}`,
    `  dedendum: ${String(job.dedendum)}`,
    ...(job.root > 0 ? [`  root: ${n(job.root)}`] : []),
    `  thickness: ${n(job.thickness)}`,
    ...(job.bore > 0 ? [`  bore: ${n(job.bore)}`] : []),
    ...(w === undefined
      ? []
      : [
          `  crossings: ${list({ arms: w.arms, arm: w.atHub === w.atRim ? n(w.atRim) : list({ 'at-hub': n(w.atHub), 'at-rim': n(w.atRim) }), rim: n(w.rim), hub: n(w.hub), corner: n(w.corner) })}`,
        ]),
    'blank:',
    `  material: ${job.material}`,
    `  shape: ${job.sheet === undefined ? 'disc' : 'sheet'}`,
    ...(job.sheet === undefined
      ? job.disc === undefined
        ? []
        : [`  size: ${n(job.disc)}`]
      : [`  size: [${n(job.sheet[1])}, ${n(job.sheet[0])}]`]),
    ...(job.bored > 0 ? [`  bored: ${n(job.bored)}`] : []),
    job.holding === 'glue-and-screw'
      ? `  holding: [glue, { screw: ${list({ head: n(job.screw.head), height: n(job.screw.height), thread: n(job.screw.thread) })} }]`
      : `  holding: ${job.holding}`,
    ...(job.holding === 'skin' ? [`  skin: ${n(job.skin)}`] : []),
    ...(job.clamps.length > 0
      ? [
          '  keep-out:',
          ...job.clamps.map(
            ({ x, y, radius, height }) =>
              `    - ${list({ x: n(x), y: n(y), radius: n(radius), height: n(height) })}`,
          ),
        ]
      : []),
    ...(job.zero === undefined ? [] : [`zero: ${job.zero}`]),
    ...(job.clear === undefined ? [] : [`clear: ${n(job.clear)}`]),
    `machine: ${job.machine}`,
    'cutters:',
    ...job.cutters.map(
      (cutter, i) =>
        `  ${String(i + 1)}: ${list({ diameter: n(cutter.diameter), flutes: cutter.flutes, reach: n(cutter.reach), flute: maybe(cutter.flute), shank: maybe(cutter.shank), 'stick-out': maybe(cutter.stickOut), helix: cutter.helix, cuts: maybe(cutter.cuts), plunges: cutter.plunges === true ? 'yes' : undefined })}`,
    ),
    ...(cuts.length > 0 ? ['cuts:', ...cuts] : []),
    '',
  ].join('\n');
}
