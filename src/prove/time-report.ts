/**
 * How long programs take on this machine, and where the time goes: by pass, by cutter, by reason. s, mm, mm/min.
 *
 * In  : the traces in the order they are run, the machine, the top of the blank. Out: sums and the worst places.
 * What nobody knows is counted, not guessed: moves from unknown places, and how long hands take at stops and changes.
 */
import type { Setup } from '../cutting/setup.ts';
import type { Machine } from '../machine/machine.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import { atMostSeconds, timeTrace, type TimedTrace } from './plan-trace.ts';
import { openCorners, takeCorner, type Corners, type SlowCorner } from './time-corners.ts';
import { feedReached, openFeed, takeFeed, type FeedReached, type FeedSums } from './time-feed.ts';
import { nothingSpent, spendCutting, type Pace, type TimeSpent } from './time-spent.ts';
import {
  cutterTimes,
  openPasses,
  passTimes,
  spendOnPass,
  type CutterTime,
  type PassSums,
  type PassTime,
} from './time-passes.ts';
import { openRounding, roundingOf, takeRounding, type Rounding, type RoundingSums } from './time-rounding.ts';
import type { Trace } from './trace-program.ts';
import type { TracedEvent } from './trace-run.ts';

export interface TimeReport {
  /** Every program was read to its end; else this is the time as far as they were. */
  readonly complete: boolean;
  readonly seconds: number;
  /** Of all moves that are not fast, in metal or above it. */
  readonly feedSeconds: number;
  readonly programs: readonly { readonly file: string; readonly seconds: number }[];
  readonly passes: readonly PassTime[];
  readonly cutters: readonly CutterTime[];
  readonly spent: Readonly<TimeSpent>;
  readonly feed: FeedReached;
  /** The slowest few. */
  readonly corners: readonly SlowCorner[];
  readonly rounding: readonly Rounding[];
  /** A word that makes the machine stand still at the end of every block was on. */
  readonly exactStop: boolean;
  readonly changes: number;
  readonly stops: number;
  /** Moves from or to places that nobody knows: not in `seconds`; the longest they can take together. */
  readonly unknown: {
    readonly moves: number;
    readonly atMost: number;
    readonly file: string;
    readonly line: number;
  };
}

/** Everything summed so far. */
interface Tally {
  readonly machine: Machine;
  readonly topZ: number;
  readonly spent: TimeSpent;
  readonly passes: PassSums;
  readonly feed: FeedSums;
  readonly corners: Corners;
  readonly rounding: RoundingSums;
  readonly programs: { readonly file: string; readonly seconds: number }[];
  readonly unknown: { moves: number; atMost: number; file: string; line: number };
  seconds: number;
  feedSeconds: number;
  exactStop: boolean;
  changes: number;
  stops: number;
  /** In the air and waiting since the last cut: it goes to the pass that is begun next. */
  way: number;
  wait: number;
  /** Since the last cut another cutter was loaded. */
  changed: boolean;
  loaded: number | undefined;
  spindle: number;
  /** The spindle was set going, and nothing has waited for it yet. */
  starting: boolean;
}

export function timeReport(traces: readonly Trace[], machine: Machine, setup: Setup): TimeReport {
  const tally = openTally(machine, setup.topZ);
  for (const trace of traces) {
    takeTrace(tally, timeTrace(trace, machine));
  }
  const { seconds, feedSeconds, programs, spent, exactStop, changes, stops, unknown } = tally;
  return {
    complete: traces.every((trace) => trace.complete),
    seconds,
    feedSeconds,
    programs,
    passes: passTimes(tally.passes),
    cutters: cutterTimes(tally.passes),
    spent,
    feed: feedReached(tally.feed),
    corners: tally.corners.slowest,
    rounding: roundingOf(tally.rounding),
    exactStop,
    changes,
    stops,
    unknown,
  };
}

function openTally(machine: Machine, topZ: number): Tally {
  return {
    machine,
    topZ,
    spent: nothingSpent(),
    passes: openPasses(),
    feed: openFeed(),
    corners: openCorners(),
    rounding: openRounding(),
    programs: [],
    unknown: { moves: 0, atMost: 0, file: '', line: 0 },
    seconds: 0,
    feedSeconds: 0,
    exactStop: false,
    changes: 0,
    stops: 0,
    way: 0,
    wait: 0,
    changed: false,
    loaded: undefined,
    spindle: 0,
    starting: false,
  };
}

function takeTrace(tally: Tally, timed: TimedTrace): void {
  const { trace, unknown, times } = timed;
  const { moves, events } = trace;
  const before = tally.seconds;
  tally.exactStop ||= timed.exactStop;
  tally.spindle = 0;
  tally.starting = false;
  let event = 0;
  let wasCut = false;
  for (let i = 0; i < moves.length; i++) {
    while (event < events.length && events[event]!.before <= i) {
      takeEvent(tally, events[event]!);
      event += 1;
    }
    const move = moves[i] as TracedMove;
    const seconds = times.seconds[i] as number;
    tally.seconds += seconds;
    tally.feedSeconds += move.kind === 'rapid' ? 0 : seconds;
    if (unknown[i] === 1) {
      takeUnknown(tally, move);
    }
    const isCut = unknown[i] === 0 && !isInAir(move, tally.topZ);
    if (isCut) {
      takeCut(tally, timed, i, wasCut);
    } else {
      tally.way += seconds;
    }
    // A move of no length changes nothing between its neighbours.
    wasCut = timed.plan.length[i] === 0 && unknown[i] === 0 ? wasCut : isCut;
  }
  for (; event < events.length; event++) {
    takeEvent(tally, events[event]!);
  }
  if (tally.way + tally.wait > 0) {
    arrive(tally, spendOnPass(tally.passes, trace, moves.length, tally.loaded ?? null));
  }
  tally.programs.push({ file: trace.file, seconds: tally.seconds - before });
}

function takeEvent(tally: Tally, event: TracedEvent): void {
  switch (event.kind) {
    case 'dwell':
      tally.seconds += event.seconds;
      tally.wait += event.seconds;
      tally.spent[tally.starting ? 'spinUp' : 'dwells'] += event.seconds;
      tally.starting = false;
      break;
    case 'spindle':
      tally.starting = event.speed !== 0 && event.speed !== tally.spindle;
      tally.spindle = event.speed;
      break;
    case 'cutter':
      if (tally.loaded !== undefined && tally.loaded !== event.number) {
        tally.changes += 1;
        tally.changed = true;
      }
      tally.loaded = event.number;
      break;
    case 'stop':
      tally.stops += event.optional ? 0 : 1;
      break;
  }
}

function takeUnknown({ unknown, machine }: Tally, move: TracedMove): void {
  if (unknown.moves === 0) {
    unknown.file = move.file;
    unknown.line = move.line;
  }
  unknown.moves += 1;
  unknown.atMost += atMostSeconds(move, machine);
}

/** Fast, or above the blank: it can meet no metal. */
function isInAir({ kind, from, to }: TracedMove, topZ: number): boolean {
  return kind === 'rapid' || (from.z !== null && to.z !== null && from.z >= topZ && to.z >= topZ);
}

/** Filled anew for every move: programs have hundreds of thousands. */
const pace: Pace = {
  length: 0,
  seconds: 0,
  feed: 1,
  limit: 1,
  acceleration: 1,
  enters: 0,
  leaves: 0,
  peak: 1,
  reading: 0,
};

function takeCut(tally: Tally, timed: TimedTrace, i: number, wasCut: boolean): void {
  const { plan, trace, times } = timed;
  const move = trace.moves[i] as TracedMove;
  const pass = spendOnPass(tally.passes, trace, i, move.cutter);
  arrive(tally, pass);
  const seconds = times.seconds[i] as number;
  pass.seconds += seconds;
  pass.cutting += seconds;
  if (plan.length[i] === 0) {
    return;
  }
  pace.length = plan.length[i] as number;
  pace.seconds = seconds;
  pace.feed = (move.feed ?? 0) / 60;
  pace.limit = plan.limit[i] as number;
  pace.acceleration = plan.acceleration[i] as number;
  pace.enters = plan.entry[i] as number;
  pace.leaves = i + 1 < plan.count ? (plan.entry[i + 1] as number) : 0;
  pace.peak = (times.reached[i] as number) / 60;
  spendCutting(tally.spent, pace);
  takeFeed(tally.feed, pace, move);
  if (wasCut) {
    takeCorner(tally.corners, timed, i);
  }
  takeRounding(tally.rounding, tally.machine, timed, i, wasCut, pass.name);
}

/** The way to a pass, and the waits on it, count with it. */
function arrive(tally: Tally, pass: { seconds: number }): void {
  pass.seconds += tally.way + tally.wait;
  tally.spent[tally.changed ? 'changes' : 'air'] += tally.way;
  tally.way = 0;
  tally.wait = 0;
  tally.changed = false;
  tally.starting = false;
}
