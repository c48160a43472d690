/**
 * The passes: their order, cutters and allowances where the job leaves them out. Speeds, feeds and depths a lap stay open;
 * they follow from cutter, material and machine. mm.
 */
import type { Cutter } from '../cutting/setup.ts';
import type { ToothSide } from '../tooth/tooth-side.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import {
  chooseBore,
  chooseCrossings,
  chooseFinishing,
  chooseRoughing,
  usualAllowance,
  type Choice,
  type Choosing,
} from './choose-cutters.ts';
import { holdingOf, skinOf } from './derive-setup.ts';
import type { CutsText, JobText } from './job-schema.ts';
import type { Cuts, CutSettings, PassKind, WheelJob } from './job.ts';
import type { Notes } from './notes.ts';

export interface CutsGround {
  readonly text: JobText;
  readonly wheel: WheelJob;
  readonly form: WheelForm;
  readonly side: ToothSide;
  readonly windows: Crossings | undefined;
  readonly cutters: readonly Cutter[];
  readonly below: number;
}

export function deriveCuts(ground: CutsGround, notes: Notes): Cuts {
  const { text, wheel, cutters, below } = ground;
  const cuts: CutsText = text.cuts ?? {};
  const { side, form } = ground;
  const choosing = { cutters, depth: wheel.thickness + below, side, workingRadius: form.workingRadius };
  const leave = cuts.bore?.leave ?? 0;
  const teeth = toothCutters(ground, choosing, notes);
  const bore = pick(cuts.bore?.cutter, 'bore', () => chooseBore(choosing, wheel.bore - leave), {
    cutters,
    notes,
  });
  const windows = ground.windows;
  const crossings =
    windows === undefined
      ? teeth.roughing
      : pick(
          cuts.crossings?.cutter,
          'crossings',
          () => chooseCrossings(choosing, windows, skinOf(text) > 0),
          {
            cutters,
            notes,
          },
        );
  return {
    order: notes.fill(cuts.order, 'cuts.order', ...usualOrder(ground)),
    bore: { ...settings(cuts.bore, bore), leave },
    crossings: settings(cuts.crossings, crossings),
    roughing: { ...settings(cuts.roughing, teeth.roughing), allowance: teeth.allowance },
    finishing: {
      ...settings(cuts.finishing, teeth.finishing),
      passes: notes.fill(
        cuts.finishing?.passes,
        'cuts.finishing.passes',
        1,
        'the allowance comes off at once',
      ),
      spring: notes.fill(cuts.finishing?.spring, 'cuts.finishing.spring', 1, 'takes what bending left'),
    },
    below,
    climb: notes.fill(cuts.climb, 'cuts.climb', true, 'leaves the straighter wall and the smaller burr'),
    play: cuts.play ?? { x: 0, y: 0 },
  };
}

function toothCutters({ text, cutters }: CutsGround, choosing: Choosing, notes: Notes) {
  const cuts: CutsText = text.cuts ?? {};
  const given = (number: number | undefined): Cutter | undefined =>
    cutters.find((cutter) => cutter.number === number);
  const asked = cuts.roughing?.allowance;
  const roughing = pick(
    cuts.roughing?.cutter,
    'roughing',
    () => chooseRoughing(choosing, asked, given(cuts.finishing?.cutter)),
    { cutters, notes },
  );
  const allowance = notes.fill(
    asked,
    'cuts.roughing.allowance',
    usualAllowance(roughing.diameter),
    'a twentieth of the roughing cutter, from 0.02 mm to 0.1 mm',
  );
  const finishing = pick(
    cuts.finishing?.cutter,
    'finishing',
    () => chooseFinishing(choosing, roughing.diameter + allowance),
    { cutters, notes },
  );
  return { roughing, allowance, finishing };
}

/** The cutter that the job names, or the chosen one, noted. One that is not in the list was refused before. */
function pick(
  number: number | undefined,
  pass: PassKind,
  choose: () => Choice,
  { cutters, notes }: { readonly cutters: readonly Cutter[]; readonly notes: Notes },
): Cutter {
  const named = cutters.find((cutter) => cutter.number === number);
  if (named !== undefined) {
    return named;
  }
  const choice = choose();
  notes.fill(undefined, `cuts.${pass}.cutter`, choice.cutter.number, choice.why);
  return choice.cutter;
}

type PassText = {
  readonly [K in keyof CutSettings]?: K extends 'cutter' ? unknown : CutSettings[K] | undefined;
};

function settings(text: PassText | undefined, cutter: Cutter): CutSettings {
  const { step, speed, feed, plunge } = text ?? {};
  return {
    cutter,
    ...(step === undefined ? {} : { step }),
    ...(speed === undefined ? {} : { speed }),
    ...(feed === undefined ? {} : { feed }),
    ...(plunge === undefined ? {} : { plunge }),
  };
}

/** Rims narrower than this, in modules, are cut before the crossings. Why: about one depth of tooth stands by itself. */
export const STIFF_RIM = 3;

/** Which passes there are to make at all: a bore that is there already and crossings that are not asked for fall away. */
export function neededPasses(text: JobText, wheel: WheelJob): readonly PassKind[] {
  const bored = text.blank.bored ?? 0;
  const hole = wheel.bore - (text.cuts?.bore?.leave ?? 0);
  return [
    ...(wheel.bore > 0 && hole > bored ? (['bore'] as const) : []),
    'roughing',
    'finishing',
    ...(wheel.crossings === undefined ? [] : (['crossings'] as const)),
  ];
}

function usualOrder({ text, wheel }: CutsGround): [PassKind[], string] {
  const needed = neededPasses(text, wheel);
  const bore = needed.filter((kind) => kind === 'bore');
  const windows = needed.filter((kind) => kind === 'crossings');
  const teeth: PassKind[] = ['roughing', 'finishing'];
  const centred = holdingOf(text).some((one) => one === 'arbor' || one === 'screw');
  const rim = wheel.crossings === undefined ? Infinity : wheel.crossings.rim / wheel.module;
  if (centred && rim >= STIFF_RIM && windows.length > 0) {
    const why = `held at the middle, and the rim of ${rim.toFixed(1)} modules bears the teeth being cut`;
    return [[...bore, ...windows, ...teeth], why];
  }
  const why =
    windows.length > 0 ? 'teeth before crossings, while the rim is stiff' : 'bore first, then the teeth';
  return [[...bore, ...teeth, ...windows], why];
}
