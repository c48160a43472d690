/**
 * The cutters at hand, with what the job does not say of them filled in on the cautious side. mm, degrees.
 */
import type { Cutter } from '../cutting/setup.ts';
import type { CutterText } from './job-schema.ts';
import type { Notes } from './notes.ts';

export function deriveCutters(text: Readonly<Record<string, CutterText>>, notes: Notes): readonly Cutter[] {
  return Object.entries(text)
    .map(([number, cutter]) => deriveCutter(Number(number), cutter, notes))
    .toSorted((a, b) => a.number - b.number);
}

function deriveCutter(number: number, text: CutterText, notes: Notes): Cutter {
  const fill = <T>(given: T | undefined, key: string, value: T, why: string): T =>
    notes.fill(given, `cutters.${number}.${key}`, value, why);
  const { diameter } = text;
  const lengths = lengthsOf(text, fill);
  const cutter = {
    number,
    nominal: diameter,
    diameter: fill(text.cuts, 'cuts', diameter, 'the size on the box; a test slot shows what it really cuts'),
    flutes: fill(text.flutes, 'flutes', 2, 'usual for end mills of this size'),
    ...lengths,
    shank: fill(
      text.shank,
      'shank',
      shankOf(diameter),
      'the thickest that is usual, so that it strikes nothing',
    ),
    runout: fill(text.runout, 'runout', RUNOUT, 'usual for small collets; measure it with a dial gauge'),
    plunges: fill(text.plunges, 'plunges', false, 'it may not cut over its centre'),
  };
  return text.helix === undefined ? cutter : { ...cutter, helix: text.helix };
}

type Fill = (given: number | undefined, key: string, value: number, why: string) => number;

function lengthsOf(text: CutterText, fill: Fill): Pick<Cutter, 'reach' | 'flute' | 'stickOut'> {
  const usual = FLUTE_SHARE * text.diameter;
  const reach = fill(
    text.reach,
    'reach',
    text.flute ?? usual,
    text.flute === undefined
      ? 'twice the diameter, as end mills have it'
      : 'no neck is known above the flute',
  );
  return {
    reach,
    flute: fill(
      text.flute,
      'flute',
      Math.min(reach, usual),
      'twice the diameter, or the reach where that is shorter',
    ),
    stickOut: fill(
      text['stick-out'],
      'stick-out',
      reach + ABOVE_REACH,
      `${ABOVE_REACH} mm above the reach: set it so in the collet`,
    ),
  };
}

/** Short, so that not more is asked of a cutter than it has. */
const FLUTE_SHARE = 2;
const ABOVE_REACH = 12;
/** From memory: 5 to 20 um at the collets of small spindles. */
const RUNOUT = 0.01;

/** Shanks as they are sold: 1/8 inch is a little thicker than 3 mm, 1/4 inch than 6 mm. */
const SHANKS = [3.175, 4, 6.35, 8, 10, 12];

function shankOf(diameter: number): number {
  return SHANKS.find((shank) => shank >= diameter) ?? diameter;
}
