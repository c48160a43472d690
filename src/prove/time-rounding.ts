/**
 * Where a controller may round corners between cuts, and how far from the path that takes the cutter. mm.
 *
 * G60, G61 and G61.1 hold the path. G64 begins a move before the last is done: at the feed v, where the heading turns by t, the
 * change of speed 2 v sin(t/2) takes that over a, and half way through the cutter is v^2 sin^2(t/2) / (2 a) inside the corner
 * (v^2 / (4 a) on a square one); never more than P says, and what the machine file says was measured holds before this.
 * A machine without such words may round as far as its corner speed asks for: v^2 / a (1 / s - 1), s = cos(t/2), which is its
 * corner allowance at most (the geometry of `motion/move-plan.ts`).
 */
import { TANGENT } from '../base/tolerances.ts';
import { isExactStop } from '../machine/exact-stop.ts';
import type { Machine } from '../machine/machine.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import { firstPathWord, type TimedTrace } from './plan-trace.ts';
import { lastOfLength } from './time-corners.ts';
import type { Trace } from './trace-program.ts';

export interface Rounding {
  /** `exact`: held to the path; `limited`: G64 with P; `free`: G64 without; `unsaid`: no such word is on; `wordless`: the machine has none. */
  readonly kind: 'exact' | 'limited' | 'free' | 'unsaid' | 'wordless';
  readonly word: string;
  /** How far, at most: P, or what the machine file says; undefined where nothing does. */
  readonly limit: number | undefined;
  /** The passes that cut under it, worst first. */
  readonly passes: readonly RoundedPass[];
}

export interface RoundedPass {
  readonly name: string;
  /** The worst, mm, and the line whose move leaves that corner; 0 and line 0 where nothing is rounded. */
  readonly most: number;
  readonly file: string;
  readonly line: number;
}

interface Sums extends Omit<Rounding, 'passes'> {
  readonly passes: Map<string, PassSums>;
}

type PassSums = { -readonly [K in keyof RoundedPass]: RoundedPass[K] };

export interface RoundingSums {
  readonly byWord: Map<string, Sums>;
  trace: Trace | undefined;
  /** Path words of the trace that stand before the last cut. */
  passed: number;
  now: Sums | undefined;
  /** Of the pass of the last cut, under the words of now. */
  worst: PassSums | undefined;
}

export function openRounding(): RoundingSums {
  return { byWord: new Map(), trace: undefined, passed: 0, now: undefined, worst: undefined };
}

/** The cut of move `i`, and the corner before it where the move before was a cut too. */
export function takeRounding(
  sums: RoundingSums,
  machine: Machine,
  timed: TimedTrace,
  i: number,
  wasCut: boolean,
  pass: string,
): void {
  const now = sumsNow(sums, machine, timed.trace, i);
  if (sums.worst === undefined || sums.worst.name !== pass) {
    sums.worst = worstOf(now, pass);
  }
  const { worst } = sums;
  const s = timed.plan.halfSine[i] as number;
  if (!wasCut || now.kind === 'exact' || s >= STRAIGHT || s === 0) {
    return;
  }
  const most = strayAt(now, timed, i, s);
  if (most > worst.most) {
    const { file, line } = timed.trace.moves[i] as TracedMove;
    worst.most = most;
    worst.file = file;
    worst.line = line;
  }
}

/** From the corner before move `i`, `s` the sine of half its angle. */
function strayAt({ kind, limit }: Sums, timed: TimedTrace, i: number, s: number): number {
  if (kind === 'free' && limit !== undefined) {
    // Measured on a square corner, where sin^2(t/2) is a half.
    return limit * Math.min(1, 2 * (1 - s * s));
  }
  return Math.min(limit ?? Infinity, kind === 'wordless' ? byCorner(timed, i, s) : byFeed(timed, i, s));
}

function worstOf({ passes }: Sums, name: string): PassSums {
  let worst = passes.get(name);
  if (worst === undefined) {
    worst = { name, most: 0, file: '', line: 0 };
    passes.set(name, worst);
  }
  return worst;
}

/** Headings that differ by less are one. */
const STRAIGHT = Math.cos(TANGENT / 2);

function byCorner({ plan }: TimedTrace, i: number, s: number): number {
  return ((plan.entry[i] as number) ** 2 / slowest(plan.acceleration, plan.length, i)) * (1 / s - 1);
}

function byFeed({ plan }: TimedTrace, i: number, s: number): number {
  const b = lastOfLength(plan.length, i);
  const v = Math.min(plan.limit[b] as number, plan.limit[i] as number);
  return (v * v * (1 - s * s)) / (2 * slowest(plan.acceleration, plan.length, i));
}

function slowest(acceleration: Float64Array, length: Float64Array, i: number): number {
  return Math.min(acceleration[lastOfLength(length, i)] as number, acceleration[i] as number);
}

function sumsNow(sums: RoundingSums, machine: Machine, trace: Trace, i: number): Sums {
  const { paths } = trace;
  let passed = sums.trace === trace ? sums.passed : 0;
  while (passed < paths.length && paths[passed]!.before <= i) {
    passed += 1;
  }
  if (sums.now === undefined || sums.trace !== trace || sums.passed !== passed) {
    const path = paths[passed - 1];
    sums.trace = trace;
    sums.passed = passed;
    sums.worst = undefined;
    sums.now = sumsOf(sums, machine, path?.word ?? firstPathWord(machine), path?.tolerance);
  }
  return sums.now;
}

function sumsOf(
  sums: RoundingSums,
  { words, limits }: Machine,
  word: string | undefined,
  tolerance: number | undefined,
): Sums {
  const { finishing, roughing, roughingStrays } = words.path;
  const isOwn = word !== undefined && roughing?.split(' ')[0] === word;
  const kind =
    word === undefined
      ? finishing === null && roughing === null
        ? 'wordless'
        : 'unsaid'
      : word === 'G61' || isExactStop(word)
        ? 'exact'
        : tolerance === undefined
          ? 'free'
          : 'limited';
  const limit = {
    exact: 0,
    limited: tolerance,
    free: isOwn ? (roughingStrays ?? undefined) : undefined,
    unsaid: undefined,
    wordless: limits.cornerAllowance,
  }[kind];
  const key = `${kind} ${word ?? ''} ${String(limit)}`;
  let known = sums.byWord.get(key);
  if (known === undefined) {
    known = { kind, word: word ?? '', limit, passes: new Map() };
    sums.byWord.set(key, known);
  }
  return known;
}

export function roundingOf({ byWord }: RoundingSums): readonly Rounding[] {
  return [...byWord.values()].map(({ kind, word, limit, passes }) => ({
    kind,
    word,
    limit,
    passes: [...passes.values()].toSorted((a, b) => b.most - a.most),
  }));
}
