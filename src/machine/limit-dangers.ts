/** Dangers of limits: ranges turned round, figures in another unit, numbers that round to nothing. */
import { millimetresPer } from '../base/units.ts';
import { caution, danger, those, type Danger } from './danger.ts';
import type { Machine } from './machine.ts';

/** mm of the least travel that any wheel can be made in. Why: less is a travel given in inches or metres. */
const LEAST_TRAVEL = 20;
/** mm of a step above which flanks show it. Why: ten times what a flank may miss. */
const COARSE_STEP = 0.01;

export function limitDangers(machine: Machine): readonly Danger[] {
  return [...travelDangers(machine), ...speedDangers(machine)];
}

function travelDangers(machine: Machine): readonly Danger[] {
  const { travel, smallestStep } = machine.limits;
  const axes = ['x', 'y', 'z'] as const;
  const short = axes.filter((axis) => travel[axis][1] - travel[axis][0] < LEAST_TRAVEL);
  const longest = Math.max(...axes.map((axis) => travel[axis][1] - travel[axis][0]));
  const held = machine.words.numbers.valueLargest * millimetresPer(machine.units);
  return those(
    ...short.map((axis) =>
      danger(
        `limits.travel.${axis}`,
        `${travel[axis][1] - travel[axis][0]} mm is too little for any wheel; every job would seem to run over the end.`,
        'Travel is in mm, whatever the unit of the programs.',
      ),
    ),
    held < longest &&
      danger(
        'words.numbers.value-largest',
        `${held} mm is less than the travel, ${longest} mm: a longer coordinate overflows, loses its sign or first digit, and the machine goes elsewhere.`,
        'Give the largest length that the controller reads, in the unit of its programs.',
      ),
    smallestStep > COARSE_STEP &&
      caution(
        'limits.smallest-step',
        `The slides step ${smallestStep} mm: the flanks will be no better than that, whatever the proof says of the program.`,
        'Finer steps are worth more than finer programs.',
      ),
  );
}

function speedDangers(machine: Machine): readonly Danger[] {
  const { feedLowest, feedHighest, rapid, spindleLowest, spindleHighest } = machine.limits;
  const { feedDecimals } = machine.words.numbers;
  const least = feedLowest / millimetresPer(machine.units);
  const slowest = Math.min(rapid.x, rapid.y);
  return those(
    feedLowest >= feedHighest &&
      danger(
        'limits.feed-lowest',
        `The lowest feed, ${feedLowest} mm/min, is not below the highest, ${feedHighest} mm/min: no feed is left to cut with.`,
        'Feeds are in mm a minute.',
      ),
    feedHighest > slowest &&
      danger(
        'limits.feed-highest',
        `A feed of ${feedHighest} mm/min is faster than the slides can go, ${slowest} mm/min: the machine would fall behind or lose steps.`,
        'Give the feed at which it still cuts, at most the rapid.',
      ),
    least < 10 ** -feedDecimals / 2 &&
      danger(
        'words.numbers.feed-decimals',
        `The lowest feed would be written as F0: the machine stands still in the cut, or takes it as no limit.`,
        'Give more decimals, or a higher feed-lowest.',
      ),
    spindleLowest >= spindleHighest &&
      danger(
        'limits.spindle-lowest',
        `The lowest speed, ${spindleLowest}, is not below the highest, ${spindleHighest}: no speed is left, or the spindle is driven over its limit.`,
        'Turns a minute, from the plate of the spindle.',
      ),
  );
}
