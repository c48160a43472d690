/**
 * The moves of a program as the time model wants them: one place in its columns for each traced move, and where the machine
 * stands still. mm, s.
 *
 * In  : a trace. Out: the plan, timed, and which moves take a time that nobody can tell, as where they begin or end is not known.
 * An axis whose place is not known is taken to stand where the move changes another one: words of places name what they move.
 */
import { isExactStop } from '../machine/exact-stop.ts';
import type { Machine } from '../machine/machine.ts';
import type { Position } from '../motion/motion.ts';
import { openPlan, planMove, planUnknown, type MovePlan } from '../motion/move-plan.ts';
import { timePlan, type MoveTimes } from '../motion/move-time.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Trace } from './trace-program.ts';
import type { PathMode, TracedEvent } from './trace-run.ts';

export interface TimedTrace {
  readonly trace: Trace;
  readonly plan: MovePlan;
  readonly times: MoveTimes;
  /** By move: 1 where its length is not known. */
  readonly unknown: Uint8Array;
  /** A word that makes the machine stand still at the end of every block was on. */
  readonly exactStop: boolean;
}

type Known = TracedMove & { readonly from: Position; readonly to: Position };

export function timeTrace(trace: Trace, machine: Machine): TimedTrace {
  const { moves } = trace;
  const plan = openPlan(moves.length, machine.limits);
  const unknown = new Uint8Array(moves.length);
  const halts = new Uint8Array(moves.length);
  haltAtEvents(halts, trace);
  const exactStop = haltAtBlocks(halts, trace, machine);
  let stands = true;
  // Most moves begin at the very place where the one before them ended.
  let stood: TracedMove['to'] | undefined;
  let isStoodKnown = false;
  for (let i = 0; i < moves.length; i++) {
    const move = moves[i] as TracedMove;
    const isFromKnown = move.from === stood ? isStoodKnown : isKnown(move.from);
    stood = move.to;
    isStoodKnown = isKnown(stood);
    const known = isFromKnown && isStoodKnown ? (move as Known) : withoutUnknown(move);
    if (known === undefined) {
      unknown[i] = 1;
      planUnknown(plan);
      stands = true;
      continue;
    }
    planMove(plan, known.from, known, stands || halts[i] === 1);
    stands = false;
  }
  return { trace, plan, times: timePlan(plan), unknown, exactStop };
}

/** In `halts`, by move: 1 where the machine stands still before it. */
function haltAtEvents(halts: Uint8Array, { events }: Trace): void {
  for (const { kind, before } of events) {
    if (STILL.has(kind)) {
      halts[before] = 1;
    }
  }
}

/** The same where an exact stop is on; says whether it ever is. */
function haltAtBlocks(halts: Uint8Array, { paths }: Trace, machine: Machine): boolean {
  let isOn = isExactStop(firstPathWord(machine));
  let from = 0;
  let ever = false;
  for (const path of [...paths, END]) {
    const to = Math.min(path.before, halts.length);
    if (isOn && to > from) {
      halts.fill(1, from, to);
      ever = true;
    }
    from = path.before;
    isOn = isExactStop(path.word);
  }
  return ever;
}

const STILL: ReadonlySet<TracedEvent['kind']> = new Set(['spindle', 'cutter', 'stop', 'dwell', 'end']);
const END: PathMode = { before: Infinity, word: '', tolerance: undefined };

/** Of those in force when the controller is switched on, the one that says how the path is followed. */
export function firstPathWord(machine: Machine): string | undefined {
  return machine.words.modes.powerOn.find((word) => /^G(?:60|61|61\.1|64)$/.test(word));
}

function isKnown({ x, y, z }: TracedMove['to']): boolean {
  return x !== null && y !== null && z !== null;
}

/** The move of the known axes, where they tell its whole length. */
function withoutUnknown(move: TracedMove): Known | undefined {
  const { from, to } = move;
  const isTold = AXES.every((axis) => (from[axis] === null) === (to[axis] === null));
  const moves = AXES.some((axis) => from[axis] !== to[axis]);
  return isTold && moves && (move.kind !== 'arc' || (from.x !== null && from.y !== null))
    ? { ...move, from: seen(from), to: seen(to) }
    : undefined;
}

const AXES = ['x', 'y', 'z'] as const;

function seen({ x, y, z }: TracedMove['from']): Position {
  return { x: x ?? 0, y: y ?? 0, z: z ?? 0 };
}

/** The longest that a move of unknown length can take: each axis that may move the whole of its travel, from rest to rest. */
export function atMostSeconds({ from, to, feed }: TracedMove, { limits }: Machine): number {
  let seconds = 0;
  for (const axis of AXES) {
    if (from[axis] !== null && to[axis] !== null) {
      continue;
    }
    const [low, high] = limits.travel[axis];
    const speed = Math.min(feed ?? Infinity, limits.rapid[axis]) / 60;
    const alone = (high - low) / speed + speed / limits.acceleration[axis];
    // A feed holds along the way: its axes add up at most; rapids go together.
    seconds = feed === null ? Math.max(seconds, alone) : seconds + alone;
  }
  return seconds;
}
