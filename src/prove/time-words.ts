/** The time of a program in sentences, as the terminal and the page say it: what takes how long, and why. */
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import { timeText } from '../base/time-text.ts';
import { micronText } from './finding-at.ts';
import { cutterName } from './time-passes.ts';
import type { TimeReport } from './time-report.ts';
import type { Rounding } from './time-rounding.ts';
import type { TimeSpent } from './time-spent.ts';

/** What each part of the time is called. */
export const SPENT_NAMES: Readonly<Record<keyof TimeSpent, string>> = {
  cutting: 'cutting at the feed as written',
  corners: 'slowing for corners and stops',
  limits: 'arcs too tight or axes too slow for the feed',
  reading: 'blocks shorter than their reading',
  air: 'in the air',
  changes: 'to and from changes of cutter',
  dwells: 'dwells',
  spinUp: 'the spindle coming up',
};

/** Lines of a sentence or two. */
export function timeWords(report: TimeReport): readonly string[] {
  return [
    takesWords(report),
    ...(report.passes.length > report.cutters.length ? [passWords(report)] : []),
    ...spentWords(report),
    ...feedWords(report),
    ...cornerWords(report),
    ...(report.exactStop
      ? ['A word for exact stop is on: the machine stands still at the end of every block.']
      : []),
    ...report.rounding.map((rounding) => roundingWords(rounding)),
    ...notCountedWords(report),
  ];
}

function takesWords({ complete, seconds, cutters }: TimeReport): string {
  const each = cutters.map((own) => `${cutterName(own.cutter)} ${timeText(own.seconds)}`).join(', ');
  return `Takes ${timeText(seconds)}${complete ? '' : ' as far as it was read'}${each === '' ? '' : `: ${each}`}.`;
}

function passWords({ passes }: TimeReport): string {
  return `By pass: ${passes.map(({ name, seconds }) => `${name} ${timeText(seconds)}`).join(', ')}.`;
}

/** Largest first; less than half a hundredth of the whole is not worth a word. */
function spentWords({ seconds, spent }: TimeReport): readonly string[] {
  const parts = (Object.keys(SPENT_NAMES) as (keyof TimeSpent)[])
    .map((part) => ({ part, share: spent[part] / seconds }))
    .filter(({ share }) => share >= 0.005)
    .toSorted((a, b) => b.share - a.share)
    .map(({ part, share }) => `${hundredths(share)} ${SPENT_NAMES[part]}`);
  return parts.length === 0 ? [] : [`Of that: ${parts.join(', ')}.`];
}

function feedWords({ feed }: TimeReport): readonly string[] {
  if (feed.written === 0) {
    return [];
  }
  const { worst } = feed;
  if (worst === undefined && feed.short < 0.005) {
    return ['The feed is reached all along the cuts.'];
  }
  return [
    `The feed is not reached on ${hundredths(feed.short)} of the cutting length: the mean is ${feedText(feed.reached)} of ${feedText(feed.written)}` +
      (worst === undefined
        ? '.'
        : `; furthest below at ${worst.file}:${String(worst.line)}, ${feedText(worst.reached)} of ${feedText(worst.written)}.`),
  ];
}

function cornerWords({ corners }: TimeReport): readonly string[] {
  const [slowest] = corners;
  return slowest === undefined
    ? []
    : [
        `Slowest corner${corners.length === 1 ? '' : 's'}: ${corners
          .map(({ file, line, speed }) => `${file}:${String(line)} ${feedText(speed)}`)
          .join(', ')}.`,
      ];
}

/** What rounding corners adds to the form error. */
export function roundingWords({ kind, word, limit, passes }: Rounding): string {
  const all = `in ${listed(passes.map(({ name }) => name))}`;
  if (kind === 'exact') {
    return `Rounded corners add nothing to the form error ${all}: ${word} holds the path.`;
  }
  const rounded = passes.filter(({ most }) => most >= PROOF_RESOLUTION);
  if (rounded.length === 0) {
    return `Rounded corners add less than ${micronText(PROOF_RESOLUTION)} to the form error ${all}.`;
  }
  const still = passes.filter(({ most }) => most < PROOF_RESOLUTION).map(({ name }) => name);
  const parts = rounded.map(
    ({ name, most, file, line }) => `${micronText(most)} in ${name} (worst at ${file}:${String(line)})`,
  );
  const added = `That adds to the form error wherever a flank is finished so${still.length === 0 ? '' : `; in ${listed(still)} it is less than ${micronText(PROOF_RESOLUTION)}`}.`;
  return `${whyRounded(kind, word, limit)} it may leave the path by up to ${listed(parts)}. ${added}`;
}

function whyRounded(kind: Rounding['kind'], word: string, limit: number | undefined): string {
  switch (kind) {
    case 'limited':
      return `${word} with P lets the controller round corners within ${micronText(limit ?? 0)}:`;
    case 'free':
      return limit === undefined
        ? `${word} without P lets the controller round corners, and nothing says how far; by feed and acceleration`
        : `${word} lets the controller round corners; by what the machine file says`;
    case 'unsaid':
    case 'exact':
      return 'No word says how the path is followed; if the controller rounds corners, by feed and acceleration';
    case 'wordless':
      return `This machine has no word for the exact path; where its controller rounds corners within its allowance of ${micronText(limit ?? 0)}`;
  }
}

function listed(words: readonly string[]): string {
  const more = words.length - SHOWN;
  return `${words.slice(0, SHOWN).join(', ')}${more > 0 ? ` and ${String(more)} more` : ''}`;
}

const SHOWN = 12;

function notCountedWords({ changes, stops, unknown }: TimeReport): readonly string[] {
  const hands = [
    ...(changes > 0 ? [`${String(changes)} change${changes === 1 ? '' : 's'} of cutter`] : []),
    ...(stops > 0 ? [`${String(stops)} stop${stops === 1 ? '' : 's'} for hands`] : []),
  ];
  const { moves, atMost, file, line } = unknown;
  const ways = moves === 1 ? '1 move' : `${String(moves)} moves`;
  return [
    ...(hands.length > 0 ? [`Not counted: how long ${hands.join(' and ')} take.`] : []),
    ...(moves > 0
      ? [
          `Not counted: ${ways} from or to a place that the program does not tell, first at ${file}:${String(line)}; at most ${timeText(atMost)} more.`,
        ]
      : []),
  ];
}

function feedText(feed: number): string {
  return `${feed >= 10 ? feed.toFixed(0) : String(Number(feed.toFixed(1)))} mm/min`;
}

function hundredths(share: number): string {
  return `${(share * 100).toFixed(0)} %`;
}
