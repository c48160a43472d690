/**
 * The words at the head of a program: what this is with its mark, some ten lines of set-up, then the cautions.
 *
 * In  : facts as plain data (mm, 1/min), the machine. Out: sentences, one a line, in ordinary letters; the writer turns them
 *       into the machine's comment letters and line length. Lengths are printed in the program's unit, by its name.
 */
import type { Machine } from '../machine/machine.ts';
import { bothUnits, lengthInWords, lengthToMeasure } from './belongs-text.ts';
import { cautions } from './cautions.ts';
import type { HeaderFacts } from './header-facts.ts';
import type { Span } from './motion-facts.ts';

const KINDS = {
  cut: 'Cutting program',
  walk: 'Walk-round program, to be run first, spindle still',
  check: 'Trial of a machine file, in the air only',
} as const;

/** Everything, in order. */
export function headerLines(facts: HeaderFacts, machine: Machine): readonly string[] {
  return [...setUpLines(facts, machine), ...cautions(facts, machine), 'End of the cautions'];
}

export function setUpLines(facts: HeaderFacts, machine: Machine): readonly string[] {
  const length = (mm: number): string => lengthInWords(mm, machine.units);
  const measured = (mm: number): string => lengthToMeasure(mm, machine.units, facts.jobUnit);
  const span = ([low, high]: Span): string => `from ${length(low)} to ${length(high)}`;
  const { park, check, extents } = facts;
  return [
    `Title: ${facts.title}`,
    `Mark ${facts.mark}, made by Ogive, version ${facts.version}`,
    KINDS[facts.kind] + placeInOrder(facts),
    ...facts.part.map((line) => `Part: ${line}`),
    `Machine file ${machine.name}, ${machine.proved === 'unproved' ? 'not yet proved on a machine' : `proved: ${machine.proved}`}`,
    `Units: ${machine.units === 'mm' ? 'MILLIMETRES' : 'INCHES'}. To check: ${check.what} is ${bothUnits(check.size, machine.units)}`,
    `Blank: ${facts.blank}. Material: ${facts.material}. Held by ${facts.holding}`,
    ...facts.cutters.map(
      (cutter) =>
        `Cutter ${cutter.number}: cuts ${measured(cutter.diameter)} wide, ${cutter.flutes} flutes, sticking out ${measured(cutter.stickOut)}`,
    ),
    spindleLine(facts, machine),
    `Zero of X and Y: the axis of the wheel. Zero of height: ${facts.zero === 'top' ? 'the top of the blank' : 'the plate under the blank'}. ${zeroPlace(machine)}. To find it again: ${facts.again}`,
    `The middle of the cutter reaches in X ${span(extents.x)}, in Y ${span(extents.y)}, in height ${span(extents.z)}. Clear height ${length(facts.clear)}`,
    `Park before the start: X ${length(park.x)}, Y ${length(park.y)}, height ${length(park.z)}`,
    ...facts.proved.map((line) => `Proved: ${line}`),
    ...facts.notProved.map((line) => `Not proved: ${line}`),
  ];
}

/** In words: a letter with its number could be taken for one that acts, were the marks of the comment lost. */
function zeroPlace({ words }: Machine): string {
  const { workOffset } = words.positions;
  const place = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth', 'ninth'];
  const index = ['G54', 'G55', 'G56', 'G57', 'G58', 'G59', 'G59.1', 'G59.2', 'G59.3'].indexOf(workOffset);
  return index < 0
    ? 'The controller has this one zero'
    : `All three are kept in the ${place[index] ?? ''} work offset`;
}

/** Where this is one of the programs that are run in order; a walk-round and a sheet are none. */
function placeInOrder({ program }: HeaderFacts): string {
  return program.number === 0
    ? ''
    : program.of === 1
      ? ', the only one'
      : `, number ${program.number} of ${program.of}`;
}

function spindleLine(facts: HeaderFacts, machine: Machine): string {
  if (facts.speeds.length === 0) {
    return 'Spindle: stays still';
  }
  const way = machine.words.spindle.forward === 'M3' ? 'clockwise' : 'counter-clockwise';
  const hand = machine.words.spindle.run === 'by-hand' ? ', switched by hand at the stops' : '';
  return `Spindle: ${way} seen from above the work, ${facts.speeds.map((speed) => Math.round(speed)).join(' and ')} turns a minute${hand}`;
}
