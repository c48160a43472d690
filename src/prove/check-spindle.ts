/**
 * Feed and spindle: no cutting move with the spindle still, turning the wrong way, or not yet up to speed; speeds and feeds within
 * the machine's limits; every cutting move by a cutter that the set-up has.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, type Said } from './finding-at.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';

export function checkSpindle(evidence: Evidence): Finding[] {
  return evidence.traces.flatMap((trace) => {
    const cutting = trace.moves.filter((move) => move.kind !== 'rapid' && isLow(evidence, move));
    return [
      ...first(cutting, (move) => turning(evidence, move)),
      ...first(cutting, (move) => speedOf(evidence, move)),
      ...first(trace.moves, (move) => feedOf(evidence, move)),
      ...first(cutting, (move) => unknownCutter(evidence, move)),
      ...notUp(evidence, trace),
    ];
  });
}

/** Only the first of each kind: the rest are the same fault again. */
function first(moves: readonly TracedMove[], judge: (move: TracedMove) => Said | undefined): Finding[] {
  for (const move of moves) {
    const said = judge(move);
    if (said !== undefined) {
      return [findingAt(move, said)];
    }
  }
  return [];
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
    const move = trace.moves.slice(event.before).find(({ kind }) => kind !== 'rapid');
    if (now === 0 || was === now || move === undefined || move.spindle !== now || !isLow(evidence, move)) {
      return [];
    }
    const waited = waitBefore(trace, k, trace.moves.indexOf(move));
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

function waitBefore({ events }: Trace, from: number, move: number): number {
  let waited = 0;
  for (const event of events.slice(from)) {
    if (event.before <= move && event.kind === 'dwell') {
      waited += event.seconds;
    }
  }
  return waited;
}
