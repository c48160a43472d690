/**
 * Characters of the longest block a machine file may make: an arc in three axes with its centre and feed, every word at
 * its longest for this travel. A line that is longer than the controller holds is dropped or cut, so this is
 * reckoned before anything is written.
 */
import { millimetresPer } from '../base/units.ts';
import type { Machine } from './machine.ts';

export function longestBlock(machine: Machine): number {
  const { arcs, numbers } = machine.words;
  const length = lengthOfWord(largestLength(machine), numbers.lengthDecimals[machine.units]) + 1;
  const centres = arcs.planes === 'none' ? 0 : arcs.centre === 'radius' ? 1 : 2;
  const feed = lengthOfWord(machine.limits.feedHighest / millimetresPer(machine.units), numbers.feedDecimals);
  const words = [
    ...blockNumber(machine),
    1 + numbers.codeWidth,
    ...Array<number>(3 + centres).fill(length),
    feed,
  ];
  const gaps = machine.words.file.gapBetweenWords ? words.length - 1 : 0;
  return words.reduce((sum, word) => sum + word, gaps);
}

/** A coordinate cannot be farther from zero than the travel is long. */
function largestLength(machine: Machine): number {
  const { x, y, z } = machine.limits.travel;
  return Math.max(...[x, y, z].map(([low, high]) => high - low)) / millimetresPer(machine.units);
}

function blockNumber(machine: Machine): readonly number[] {
  const { numbers, last } = machine.words.blocks;
  return numbers === 'none' ? [] : [1 + String(last).length];
}

/** Letter, whole digits, point and decimals; a sign is the caller's. */
function lengthOfWord(largest: number, decimals: number): number {
  return 1 + String(Math.ceil(largest)).length + 1 + decimals;
}
