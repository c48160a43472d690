/**
 * The cautions that belong to one program, with its own numbers: sentences in ordinary letters, for the program's head
 * and for the sheet beside the machine.
 *
 * In  : the header's facts (mm), the machine. Out: sentences, the most urgent first.
 * Topics: ISO 12100 (risk reduction), 29 CFR 1910.212 (guards), .133 (eyes), .95 (noise), .1024 (beryllium), .1025 (lead),
 * ISO 13850 (emergency stop), NISTIR 6556 App. A (a controller checks neither travel nor collisions). Wording is our own.
 */
import type { Machine } from '../machine/machine.ts';
import { bothUnits, lengthInWords, lengthToMeasure } from './belongs-text.ts';
import type { HeaderFacts } from './header-facts.ts';
import { materialCautions } from './material-cautions.ts';

export function cautions(facts: HeaderFacts, machine: Machine): readonly string[] {
  return [
    ...whoAnswers(machine),
    ...(facts.kind === 'cut' ? [] : stillSpindle(facts, machine)),
    ...beforeTheStart(facts, machine),
    ...(facts.kind === 'cut' ? [...atTheCutter(facts, machine), ...materialCautions(facts.material)] : []),
    ...whenItStops(facts, machine),
  ];
}

function whoAnswers(machine: Machine): readonly string[] {
  return [
    'CAUTION. A mill can maim. Only a trained person runs this, and the rules of the place and the book of the machine come before every word here',
    'Whoever presses start answers for it: the writer of this program has not seen your machine, your cutters or your set-up. Read it through first',
    'That a controller takes a program says nothing of its safety: few check their travel, and none sees a clamp',
    ...(machine.proved === 'unproved'
      ? [
          'The machine file has not been proved on a real machine: run this in the air, block by block, before anything else',
        ]
      : []),
  ];
}

function stillSpindle(facts: HeaderFacts, machine: Machine): readonly string[] {
  const lowest = lengthInWords(facts.extents.z[0], machine.units);
  return facts.kind === 'walk'
    ? [
        `This program turns no spindle and goes round at height ${lowest}, never below it. Switch off the power of the spindle, have the first cutter in and its height touched off, a hand on feed hold: watch that the cutter passes over or round everything that stands on the table`,
      ]
    : ['This program is for the air: no blank, no cutter near anything'];
}

function beforeTheStart(facts: HeaderFacts, machine: Machine): readonly string[] {
  const length = (mm: number): string => lengthInWords(mm, machine.units);
  const measured = (mm: number): string => lengthToMeasure(mm, machine.units, facts.jobUnit);
  const { extents, clear, park } = facts;
  const deepest = extents.z[0];
  return [
    `Before the start park the cutter at X ${length(park.x)}, Y ${length(park.y)}, at height ${length(park.z)} or above, with nothing between it and the clear height ${length(clear)}`,
    `Set zero with care, then move by hand to X 0, Y 0 and the clear height ${length(clear)} and look whether the place is right. Take off shifts, turns, scales and mirrors left by earlier work`,
    ...(facts.kind === 'cut' ? [airRun(facts, length)] : []),
    `The lowest point is height ${length(deepest)}${underTheBlank(facts, length)}. Compare all the reaches above with clamps, screws, vice, table edges and the ends of travel${besideTheCutter(facts, machine)}`,
    `The words are in ${machine.units === 'mm' ? 'MILLIMETRES' : 'INCHES'}. A part that measures anything but ${bothUnits(facts.check.size, machine.units)} at ${facts.check.what} is in the wrong unit or badly set: stop`,
    ...facts.cutters.map(
      (cutter) =>
        `Cutter ${cutter.number} must be the one of ${measured(cutter.diameter)}, clean in its collet, sticking out ${measured(cutter.stickOut)} and no more, its length measured again after fitting`,
    ),
    `The blank is held by ${facts.holding}: pull at it before the start, and keep every clamp outside the reaches above or named in the job`,
  ];
}

function airRun(facts: HeaderFacts, length: (mm: number) => string): string {
  return `First run: raise the zero of height by ${length(raise(facts))}, and parking with it, so that everything happens in the air, rapid override low, a hand on feed hold. Then put the zero back and go block by block down to the first cut`;
}

/** From the lowest point to above the blank, with a clear height to spare. */
function raise(facts: HeaderFacts): number {
  return Math.max(0, facts.topZ - facts.extents.z[0]) + Math.max(0, facts.clear - facts.topZ);
}

function underTheBlank(facts: HeaderFacts, length: (mm: number) => string): string {
  const under = facts.plateZ - facts.extents.z[0];
  return under > 0 ? `, which is ${length(under)} into what lies under the blank: let that be waste` : '';
}

function atTheCutter(facts: HeaderFacts, machine: Machine): readonly string[] {
  const highest = facts.speeds.at(-1);
  return [
    `The spindle goes up to ${highest === undefined ? 'no speed' : `${Math.round(highest)} turns a minute`}: see that cutter, collet and nut are made for it, that it turns the way the cutter cuts, the nut tight and the key out`,
    ...(machine.words.spindle.run === 'by-hand'
      ? [
          'The program cannot switch this spindle: at each stop do what it says, and never go on with the spindle still',
        ]
      : []),
    'Guards shut and their switches working. Never reach in, and take the power off the spindle before hands go near a cutter. No gloves, loose cuffs, long hair, rings or chains near a turning spindle',
    'Cutting fluid, where any is used: kept clean, off the skin, its mist out of the lungs',
    'Wear glasses made for impact, as small cutters break and fly, and ear protection where the noise asks for it',
    'Know where the emergency stop is and try it first. After using it find the machine zero and the work zero anew: the place may be lost',
    'Stay with it. Listen, and stop when the sound changes: a broken cutter tells nobody, and the rest of the program cuts air or worse',
  ];
}

/** What goes beyond the reaches of the cutter's middle: the thicker of cutter and shank low down, the collet nut above. */
function besideTheCutter(
  { cutters, extents }: Pick<HeaderFacts, 'cutters' | 'extents'>,
  { limits, units }: Machine,
): string {
  if (cutters.length === 0) {
    return '';
  }
  const wide = Math.max(...cutters.map(({ diameter, shank }) => Math.max(diameter, shank))) / 2;
  const nut = extents.z[0] + Math.min(...cutters.map(({ stickOut }) => stickOut));
  const length = (mm: number): string => lengthInWords(mm, units);
  return `. The reaches are those of the middle of the cutter: cutter and shank go ${length(wide)} further to every side, and above height ${length(nut)} the collet nut goes ${length(limits.nut.diameter / 2)} further`;
}

function whenItStops(facts: HeaderFacts, machine: Machine): readonly string[] {
  const change = machine.words.cutters.change;
  return [
    ...(facts.kind !== 'cut' || change === 'automatic' || facts.program.of + facts.cutters.length <= 2
      ? []
      : [
          'After every change of cutter touch off height anew where the program and the sheet say, as no two cutters stick out alike',
        ]),
    ...(facts.kind === 'cut'
      ? [
          'Do not start in the middle of a program: a start there lacks units, feed, spindle and offset. After a stop or a broken cutter check zero and length and run the whole program again from its first line, through the air it has cut already',
          'Measure with the spindle still and the machine held, burrs taken off first',
        ]
      : []),
  ];
}
