/**
 * Runs a flow word: which line comes next, counted from 0, or why that is not followed. Every way that is taken is paid
 * for with the lines gone over, so that no program goes round without end.
 *
 * A subprogram has #1 to #30 and every name without a leading _ to itself; they are the caller's again after it.
 */
import { wholeOf } from './block.ts';
import { LINE_COST, MOST_DEPTH, MOST_RUN } from './bounds.ts';
import { evaluate } from './evaluate.ts';
import type { Expression } from './expression.ts';
import { mapFlow, type FlowBlock, type FlowMap } from './flow-map.ts';
import { MOST_ARGUMENTS, type FlowLine } from './flow-words.ts';
import type { ReadLine } from './read-lines.ts';
import { unread, type Refusal, type Run } from './trace-run.ts';

interface Frame {
  /** The subprogram, where one has been called by O. */
  readonly block: FlowBlock | undefined;
  /** Where it begins, where it goes back to, and how often it is run again before. */
  readonly start: number;
  readonly back: number;
  again: number;
  readonly numbered: readonly (number | undefined)[];
  readonly named: ReadonlyMap<string, number>;
  /** Rounds that are left of the loops that are on. */
  readonly rounds: Map<FlowBlock, number>;
}

export interface Flow {
  readonly lines: readonly ReadLine[];
  map: FlowMap | undefined;
  numbers: ReadonlyMap<number, number> | undefined;
  /** What all lines before each one cost. */
  costs: Float64Array | undefined;
  /** The line that was jumped to last, and what has been paid. */
  landed: number;
  paid: number;
  readonly frames: Frame[];
  readonly rounds: Map<FlowBlock, number>;
}

export function openFlow(lines: readonly ReadLine[]): Flow {
  return { lines, map: undefined, numbers: undefined, costs: undefined, landed: 0, paid: 0, frames: [], rounds: new Map() }; // prettier-ignore
}

/** Runs the flow word on line `k`. */
export function runFlow(run: Run, flow: Flow, k: number, line: FlowLine): number | Refusal {
  const map = (flow.map ??= mapFlow(flow.lines));
  if (line.word === 'call') {
    return callSub(run, flow, map, k, line);
  }
  const block = map.at.get(k);
  if (block === undefined || block.end < 0) {
    const why = map.fault;
    const first =
      why === undefined
        ? `o${line.label} ${line.word} is not closed`
        : `line ${String(why.line + 1)}: ${why.why}`;
    return unread(first);
  }
  const next = follow(run, flow, k, line, block);
  return typeof next === 'number' && next !== k + 1 ? jump(flow, k, next) : next;
}

function follow(run: Run, flow: Flow, k: number, line: FlowLine, block: FlowBlock): number | Refusal {
  const rounds = flow.frames.at(-1)?.rounds ?? flow.rounds;
  switch (line.word) {
    case 'if':
      return takeBranch(run, flow, k, block);
    case 'elseif':
    case 'else':
      return block.end + 1;
    case 'while':
      return when(
        run,
        line.values[0]!,
        block.kind === 'do' ? [block.start + 1, k + 1] : [k + 1, block.end + 1],
      );
    case 'endwhile':
      return block.start;
    case 'repeat':
      return beginRounds(run, rounds, k, line, block);
    case 'endrepeat':
      return nextRound(rounds, block);
    case 'break':
      return block.end + 1;
    case 'continue':
      return block.kind === 'while' ? block.start : block.end;
    case 'sub':
      return block.end + 1;
    case 'endsub':
    case 'return':
      return goBack(run, flow, block);
    default:
      return k + 1;
  }
}

/** The first branch whose condition holds. */
function takeBranch(run: Run, flow: Flow, k: number, block: FlowBlock): number | Refusal {
  for (const at of [k, ...block.branches]) {
    const { text, formula } = flow.lines[at]!;
    const { word, values } = formula!.flow!;
    flow.paid += costOf(text);
    const value = word === 'else' ? 1 : evaluate(values[0]!, run.parameters);
    if (typeof value === 'string') {
      return unread(at === k ? value : `line ${String(at + 1)}: ${value}`);
    }
    if (value !== 0) {
      return at + 1;
    }
  }
  return block.end + 1;
}

function when(run: Run, condition: Expression, [yes, no]: readonly [number, number]): number | Refusal {
  const value = evaluate(condition, run.parameters);
  return typeof value === 'string' ? unread(value) : value !== 0 ? yes : no;
}

function beginRounds(
  run: Run,
  rounds: Map<FlowBlock, number>,
  k: number,
  line: FlowLine,
  block: FlowBlock,
): number | Refusal {
  const value = evaluate(line.values[0]!, run.parameters);
  const count = typeof value === 'number' ? wholeOf(value) : undefined;
  if (count === undefined || count < 0) {
    return unread(typeof value === 'string' ? value : `repeat [${String(value)}]: a whole number of times`);
  }
  rounds.set(block, count);
  return count === 0 ? block.end + 1 : k + 1;
}

function nextRound(rounds: Map<FlowBlock, number>, block: FlowBlock): number {
  const left = (rounds.get(block) ?? 1) - 1;
  rounds.set(block, left);
  return left > 0 ? block.start + 1 : block.end + 1;
}

function callSub(run: Run, flow: Flow, map: FlowMap, k: number, line: FlowLine): number | Refusal {
  const block = map.subs.get(line.label);
  if (block === undefined || block.end < 0 || block.start > k) {
    return unread(
      block === undefined
        ? `o${line.label} is no subprogram of this file`
        : `o${line.label} is not closed, or stands below its call, where controllers differ`,
    );
  }
  const given: number[] = [];
  for (const value of line.values) {
    const number = evaluate(value, run.parameters);
    if (typeof number === 'string') {
      return unread(number);
    }
    given.push(number);
  }
  const { numbered, named } = run.parameters;
  const own = new Map([...named].filter(([name]) => !name.startsWith('_')));
  const kept = Array.from({ length: MOST_ARGUMENTS }, (_, i) => numbered.get(i + 1));
  flow.paid += LINE_COST * (1 + named.size);
  const next = enter(flow, k, { block, start: block.start + 1, back: k + 1, again: 0, numbered: kept, named: own, rounds: new Map() }); // prettier-ignore
  if (typeof next === 'number') {
    own.forEach((_, name) => named.delete(name));
    kept.forEach((_, i) => putBack(numbered, i + 1, given[i]));
  }
  return next;
}

function putBack(numbered: Map<number, number>, key: number, value: number | undefined): void {
  if (value === undefined) {
    numbered.delete(key);
  } else {
    numbered.set(key, value);
  }
}

function goBack(run: Run, flow: Flow, block: FlowBlock): number | Refusal {
  const frame = flow.frames.at(-1);
  if (frame === undefined || frame.block !== block) {
    return unread(`o${block.label} ends without having been called`);
  }
  flow.frames.pop();
  const { numbered, named } = run.parameters;
  frame.numbered.forEach((value, i) => putBack(numbered, i + 1, value));
  for (const name of named.keys()) {
    if (!name.startsWith('_')) {
      named.delete(name);
    }
  }
  frame.named.forEach((value, name) => named.set(name, value));
  return frame.back;
}

/** Into a subprogram. */
export function enter(flow: Flow, k: number, frame: Frame): number | Refusal {
  if (flow.frames.length >= MOST_DEPTH) {
    return unread(`subprograms call each other more than ${String(MOST_DEPTH)} deep`);
  }
  flow.frames.push(frame);
  return jump(flow, k, frame.start);
}

/** From line `k` to another: paid for with what has been gone over since the last jump. */
export function jump(flow: Flow, k: number, to: number): number | Refusal {
  const costs = (flow.costs ??= costsOf(flow.lines));
  flow.paid += costs[k + 1]! - costs[flow.landed]!;
  flow.landed = to;
  return flow.paid > MOST_RUN * LINE_COST
    ? unread(
        `loops and subprograms run more than ${String(MOST_RUN)} lines up to here; that many are followed`,
      )
    : to;
}

function costsOf(lines: readonly ReadLine[]): Float64Array {
  const costs = new Float64Array(lines.length + 1);
  lines.forEach(({ text }, k) => {
    costs[k + 1] = costs[k]! + costOf(text);
  });
  return costs;
}

function costOf(text: string): number {
  return Math.max(LINE_COST, text.length);
}
