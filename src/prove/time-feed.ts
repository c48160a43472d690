/** The feed that cutting moves really reach, against the one that is written. mm, s; feeds mm/min in what is handed out. */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Pace } from './time-spent.ts';

/** Nearer than this the feed counts as reached. Judgement: no ear and no chip tells one hundredth. */
const REACHED = 0.99;

/** Share of a move's time that counts as none. Why: far above the rounding of its sums. */
const REST = 1e-6;

export interface FeedReached {
  /** Share of the cutting length on which the feed is below the written one, 0 to 1. */
  readonly short: number;
  /** Mean over the cutting length, as written and as run, mm/min; 0 where nothing is cut. */
  readonly written: number;
  readonly reached: number;
  /** The move that stays furthest below its feed. */
  readonly worst?: SlowFeed;
}

export interface SlowFeed {
  readonly file: string;
  readonly line: number;
  readonly written: number;
  readonly reached: number;
}

export interface FeedSums {
  length: number;
  short: number;
  wanted: number;
  seconds: number;
  worstShare: number;
  worst: SlowFeed | undefined;
}

export function openFeed(): FeedSums {
  return { length: 0, short: 0, wanted: 0, seconds: 0, worstShare: REACHED, worst: undefined };
}

export function takeFeed(sums: FeedSums, pace: Pace, move: TracedMove): void {
  const { length, seconds, feed, acceleration, enters, leaves, reading } = pace;
  // Where reading holds it up the machine cannot run faster than blocks come in.
  const peak = reading > seconds * REST ? length / seconds : pace.peak;
  const high = feed * REACHED;
  const ramps = Math.max(0, high * high - enters * enters) + Math.max(0, high * high - leaves * leaves);
  const short = peak < high ? length : Math.min(length, ramps / (2 * acceleration));
  sums.length += length;
  sums.short += short;
  sums.wanted += length / feed;
  sums.seconds += seconds;
  if (peak < sums.worstShare * feed) {
    sums.worstShare = peak / feed;
    sums.worst = { file: move.file, line: move.line, written: feed * 60, reached: peak * 60 };
  }
}

export function feedReached({ length, short, wanted, seconds, worst }: FeedSums): FeedReached {
  return length === 0
    ? { short: 0, written: 0, reached: 0 }
    : {
        short: short / length,
        written: (length / wanted) * 60,
        reached: (length / seconds) * 60,
        ...(worst === undefined ? {} : { worst }),
      };
}
