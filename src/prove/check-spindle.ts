/**
 * Feed and spindle: no cutting move with the spindle still, turning the wrong way, or not yet up to speed; speeds and feeds within
 * the machine's limits; every cutting move by a cutter that the set-up has.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, type Said } from './finding-at.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';

/** A rule about one move; some hold only where it cuts low. */
interface Rule {
  readonly onlyLow: boolean;
  readonly judge: (evidence: Evidence, move: TracedMove) => Said | undefined;
}

const RULES: readonly Rule[] = [
  { onlyLow: true, judge: turning },
  { onlyLow: true, judge: speedOf },
  { onlyLow: false, judge: feedOf },
  { onlyLow: true, judge: unknownCutter },
];

export function checkSpindle(evidence: Evidence): Finding[] {
  return evidence.traces.flatMap((trace) => [
    ...firstOfEach(evidence, trace),
    ...notUp(evidence, trace),
    ...handsAtATurningCutter(evidence, trace),
  ]);
}

/** Only the first move against each rule: the rest are the same fault again. */
function firstOfEach(evidence: Evidence, { moves }: Trace): Finding[] {
  const found: (Finding | undefined)[] = RULES.map(() => undefined);
  let was: TracedMove | undefined;
  let wasLow = false;
  for (const move of moves) {
    if (move.kind === 'rapid') {
      continue;
    }
    const low = isLow(evidence, move);
    // Rules look at spindle, feed and cutter: most moves are made like the one before.
    const isAlike =
      was !== undefined &&
      move.spindle === was.spindle &&
      move.feed === was.feed &&
      move.cutter === was.cutter &&
      low === wasLow;
    if (!isAlike) {
      judgeMove(evidence, move, low, found);
    }
    was = move;
    wasLow = low;
  }
  return found.filter((finding) => finding !== undefined);
}

function judgeMove(evidence: Evidence, move: TracedMove, low: boolean, found: (Finding | undefined)[]): void {
  for (const [k, { onlyLow, judge }] of RULES.entries()) {
    const said = found[k] === undefined && (low || !onlyLow) ? judge(evidence, move) : undefined;
    if (said !== undefined) {
      found[k] = findingAt(move, said);
    }
  }
}

/** Below the clear height, or perhaps. */
function isLow({ input, lastDigit }: Evidence, { from, to }: TracedMove): boolean {
  return Math.min(from.z ?? -Infinity, to.z ?? -Infinity) < input.setup.clearZ - lastDigit;
}

function turning({ input }: Evidence, { spindle }: TracedMove): Said | undefined {
  const { forward } = input.machine.words.spindle;
  if (spindle === 0) {
    return {
      code: 'prove.spindle',
      message: 'a cutting move at 0 turns a minute: the spindle stands still',
      hint: 'Switch the spindle on, and let it come up, before this block.',
    };
  }
  return spindle > 0 === (forward === 'M3')
    ? undefined
    : {
        code: 'prove.spindle',
        message: `a cutting move at ${String(spindle)} turns a minute: the spindle turns backwards`,
        hint: `Use ${forward}.`,
      };
}

function speedOf({ input }: Evidence, { spindle }: TracedMove): Said | undefined {
  const { spindleLowest, spindleHighest } = input.machine.limits;
  const speed = Math.abs(spindle);
  return speed === 0 || (speed >= spindleLowest && speed <= spindleHighest)
    ? undefined
    : {
        code: 'prove.spindle-limits',
        message: `${String(speed)} turns a minute; this spindle runs ${String(spindleLowest)} to ${String(spindleHighest)}`,
        hint: 'Change S.',
      };
}

function feedOf({ input }: Evidence, { kind, feed }: TracedMove): Said | undefined {
  const { feedLowest, feedHighest } = input.machine.limits;
  // F is written rounded; a feed in inches comes back a little off.
  const slack = feedHighest * 1e-3;
  return kind === 'rapid' || feed === null || (feed >= feedLowest - slack && feed <= feedHighest + slack)
    ? undefined
    : {
        code: 'prove.feed-limits',
        message: `a feed of ${String(Number(feed.toFixed(2)))} mm/min; this machine runs ${String(feedLowest)} to ${String(feedHighest)}`,
        hint: 'Change F.',
      };
}

function unknownCutter(evidence: Evidence, move: TracedMove): Said | undefined {
  if (evidence.cutterOf(move) !== undefined) {
    return undefined;
  }
  const known = evidence.input.setup.cutters.map(({ number }) => String(number)).join(', ');
  return {
    code: 'prove.cutter',
    message:
      move.cutter === null
        ? `a cutting move before any cutter is named; the set-up has ${known}`
        : `a cutting move with cutter ${String(move.cutter)}; the set-up has ${known}`,
    hint: 'Name the cutter in the program, and list it in the job.',
  };
}

/** Time between the word that sets the spindle turning and the first cutting move after it. */
function notUp(evidence: Evidence, trace: Trace): Finding[] {
  const { spinUpSeconds, run } = evidence.input.machine.words.spindle;
  if (run === 'by-hand') {
    return [];
  }
  let speed = 0;
  return trace.events.flatMap((event, k) => {
    if (event.kind !== 'spindle') {
      return [];
    }
    const [was, now] = [speed, event.speed];
    speed = now;
    if (now === 0 || was === now) {
      return [];
    }
    const at = firstCut(trace, event.before);
    const move = trace.moves[at];
    if (move === undefined || move.spindle !== now || !isLow(evidence, move)) {
      return [];
    }
    const waited = waitBefore(trace, k, at);
    return waited >= spinUpSeconds - 1e-3
      ? []
      : [
          findingAt(move, {
            code: 'prove.spin-up',
            message: `a cutting move after a wait of ${String(waited)} s; the spindle needs ${String(spinUpSeconds)} s to come up`,
            hint: 'Dwell longer after the spindle word.',
          }),
        ];
  });
}

/** The first move from number `from` on that is not fast. */
function firstCut({ moves }: Trace, from: number): number {
  let at = from;
  while (at < moves.length && moves[at]!.kind === 'rapid') {
    at += 1;
  }
  return at;
}

function waitBefore({ events }: Trace, from: number, move: number): number {
  let waited = 0;
  for (const event of events.slice(from)) {
    if (event.before <= move && event.kind === 'dwell') {
      waited += event.seconds;
    }
  }
  return waited;
}

/** Where a cutter is changed or hands are asked for, the spindle must have been stopped by a word of its own before. */
function handsAtATurningCutter({ input }: Evidence, trace: Trace): Finding[] {
  if (input.machine.words.spindle.run === 'by-hand') {
    return [];
  }
  let turns = false;
  // A change of cutter stops the spindle by itself (NISTIR 6556 §3.6.3): that is too late, and is no word of its own.
  let stoppedAt = -1;
  for (const event of trace.events) {
    if (event.kind === 'spindle') {
      stoppedAt = turns && event.speed === 0 ? event.line : stoppedAt;
      turns = event.speed !== 0;
    } else if (
      (turns || stoppedAt === event.line) &&
      (event.kind === 'cutter' || (event.kind === 'stop' && !event.optional))
    ) {
      return [
        {
          code: 'prove.spindle',
          severity: 'error',
          message: `${event.kind === 'cutter' ? 'the cutter is changed' : 'hands are asked for'} while the spindle turns`,
          hint: 'Stop the spindle (M5) in a block before this one, with the cutter up.',
          file: trace.file,
          line: event.line,
        },
      ];
    }
  }
  return [];
}
