/**
 * From the bytes of a program to what the machine would do: the prover's only way in.
 *
 * In  : the program's text and the machine file; nothing of how the program was made.
 * Out : moves and events in order, the modes at the end, and findings. At a line that can't be read for certain the
 *       reader stops (`complete` is false): what follows would be a guess.
 * Source: NISTIR 6556 §3 (RS274/NGC), as far as the machine file does not say otherwise.
 */
import type { Machine } from '../machine/machine.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Block } from './block.ts';
import type { FormulaLine } from './formula-line.ts';
import { codesOf, G_GROUPS, M_GROUP } from './modes-codes.ts';
import { NOWHERE, powerOn, type FinalModes } from './modes.ts';
import { noParameters } from './parameters.ts';
import type { Finding } from './proof.ts';
import { readLines, type ReadLine } from './read-lines.ts';
import { blockOfFormula } from './run-formula.ts';
import { runCall } from './run-call.ts';
import { openFlow, runFlow } from './run-flow.ts';
import { modesAsked } from './trace-assumed.ts';
import { runBlock } from './trace-block.ts';
import { handsDone, readComments, readTitle, type ByHand } from './trace-comments.ts';
import { checkEnd, checkLine, checkNumber, readLabel, readPercent, type FileState } from './trace-file.ts';
import {
  countRemarks,
  NO_SHIFT,
  unread,
  type Part,
  type PathMode,
  type Refusal,
  type Run,
  type Title,
  type TracedEvent,
} from './trace-run.ts';

export interface Trace {
  readonly file: string;
  readonly moves: readonly TracedMove[];
  readonly events: readonly TracedEvent[];
  readonly titles: readonly Title[];
  readonly paths: readonly PathMode[];
  readonly findings: readonly Finding[];
  /** Lines that held words and were run. */
  readonly blocks: number;
  /** As the program leaves them, before its end word itself resets any. */
  readonly finalModes: FinalModes;
  /** By modal group of G codes (`G_GROUP`): the line that last set it, 1-based; 0 where none has. */
  readonly setAt: readonly number[];
  /** Every line up to the program's end was read. */
  readonly complete: boolean;
  /** Which program of a set this is, where its head says so. */
  readonly part: Part | undefined;
  /** Lines that the second reader could not hold, and lines that begin with / and were passed over. */
  readonly alone: number;
  /** Lines with parameters, expressions or flow words that were run: the second reader knows none of them. */
  readonly reckoned: number;
  /** Lines were not run one after the other. */
  readonly jumps: boolean;
  readonly passedOver: number;
  /** The line at which reading ended or stopped. */
  readonly lastRead: number;
}

/** What may be known before the program's first line. */
export interface TraceStart {
  /** The cutter in the spindle, where one program runs for one cutter. */
  readonly cutter?: number;
  /** How the switch stands that makes the controller pass over lines that begin with /. */
  readonly skipSwitch?: 'on' | 'off';
}

export function traceProgram(file: string, text: string, machine: Machine, start: TraceStart = {}): Trace {
  const run = openRun(file, machine, start);
  const lines = readLines(text, machine, run.codes);
  const state: FileState = {
    blocks: 0, percents: 0, labelled: false, ended: false, alone: 0, passedOver: 0,
    reckoned: new Set(), next: -1, flow: openFlow(lines),
  }; // prettier-ignore
  const complete = runLines(run, lines, start, state);
  countRemarks(run);
  const { moves, events, titles, paths, findings, modes } = run;
  return {
    file,
    moves,
    events,
    titles,
    paths,
    findings,
    blocks: state.blocks,
    finalModes: { ...modes },
    setAt: run.setAt,
    complete,
    part: run.part,
    alone: state.alone,
    reckoned: state.reckoned.size,
    jumps: state.flow.costs !== undefined,
    passedOver: state.passedOver,
    lastRead: run.line,
  };
}

function openRun(file: string, machine: Machine, start: TraceStart): Run {
  const codes = codesOf(machine);
  return {
    file,
    machine,
    codes,
    modes: powerOn(machine, codes, start.cutter ?? null),
    here: NOWHERE,
    line: 0,
    part: undefined,
    shift: NO_SHIFT,
    keptShift: undefined,
    lost: 0,
    cycle: undefined,
    parameters: noParameters(),
    made: 0,
    placed: false,
    setAt: Array.from({ length: G_GROUPS }, () => 0),
    unasked: modesAsked(machine, codes),
    lengthAsked: false,
    moves: [],
    events: [],
    titles: [],
    paths: [],
    findings: [],
    remarks: new Map(),
  };
}

/** Runs line after line until the program ends or a line is refused; says whether it came to the end. */
function runLines(run: Run, lines: readonly ReadLine[], start: TraceStart, state: FileState): boolean {
  const byHand: ByHand = { cutter: undefined, speed: undefined };
  let k = 0;
  while (k < lines.length && !state.ended) {
    const line = lines[k]!;
    run.line = k + 1;
    const refused = line.onlyMoves
      ? runMoves(run, line, state, byHand)
      : (checkWords(run, line, state) ?? runLine(run, line, start, state, byHand));
    if (refused !== undefined) {
      run.findings.push({ ...refused, severity: 'error', file: run.file, line: run.line });
      return false;
    }
    k = state.next < 0 ? k + 1 : state.next;
    state.next = -1;
  }
  checkEnd(run, state, lines);
  return true;
}

/** Whether the line's words are certain: ours could split it, the file may hold it, and a second reader agrees. */
function checkWords(run: Run, line: ReadLine, state: FileState): Refusal | undefined {
  if (line.fault !== undefined) {
    return unread(line.fault);
  }
  if (line.percent !== undefined) {
    state.alone += 1;
    return undefined;
  }
  checkLine(run, line);
  return (line.number >= 0 ? checkNumber(run, line) : undefined) ?? disagreement(line);
}

function disagreement({ differs }: ReadLine): Refusal | undefined {
  return differs === undefined ? undefined : { code: 'prove.readers-disagree', message: differs };
}

/** A line that holds a move and nothing else: most of any program. */
function runMoves(run: Run, line: ReadLine, state: FileState, byHand: ByHand): Refusal | undefined {
  state.blocks += 1;
  byHand.cutter = undefined;
  byHand.speed = undefined;
  return disagreement(line) ?? runBlock(run, line.block as Block);
}

/** Runs a line whose words are certain. */
function runLine(
  run: Run,
  line: ReadLine,
  start: TraceStart,
  state: FileState,
  byHand: ByHand,
): Refusal | undefined {
  if (line.percent !== undefined) {
    return readPercent(run, line.percent, state);
  }
  if (line.skipped) {
    const passes = passesOver(run, start);
    if (passes !== false) {
      state.passedOver += 1;
      return passes === true ? undefined : passes;
    }
  }
  if (line.comments.length > 0) {
    readComments(run, line.comments, byHand);
    if (line.count === 0) {
      readTitle(run, line.comments);
    }
  }
  if (line.formula?.flow !== undefined) {
    return goOn(state, runFlow(run, state.flow, run.line - 1, line.formula.flow), run);
  }
  const block = line.formula === undefined ? line.block : reckoned(run, line.formula, state);
  if (typeof block !== 'object') {
    return block === undefined ? undefined : unread(block);
  }
  const label = readLabel(run, line, block, state);
  if (label !== false) {
    return label === true ? undefined : label;
  }
  state.blocks += 1;
  if ((block.m[M_GROUP.call] ?? -1) >= 0) {
    return goOn(state, runCall(state.flow, run.line - 1, block));
  }
  const moves = run.moves.length;
  const refused = runBlock(run, block);
  if (run.moves.length > moves) {
    byHand.cutter = undefined;
    byHand.speed = undefined;
  }
  const stop = block.m[M_GROUP.stop] ?? -1;
  if (stop === 0) {
    handsDone(run, byHand);
  }
  state.ended = stop === 2 || stop === 30;
  return refused;
}

/** Notes which line is run next. */
function goOn(state: FileState, next: number | Refusal, run?: Run): Refusal | undefined {
  if (run !== undefined) {
    state.blocks += 1;
    state.reckoned.add(run.line);
  }
  if (typeof next !== 'number') {
    return next;
  }
  state.next = next;
  return undefined;
}

function reckoned(run: Run, formula: FormulaLine, state: FileState): Block | string {
  state.reckoned.add(run.line);
  return blockOfFormula(formula, run.codes, run.parameters);
}

/** Whether a line that begins with / is passed over, by the machine and its switch. */
function passesOver(run: Run, start: TraceStart): boolean | Refusal {
  const { skipMark } = run.machine.words.blocks;
  if (skipMark === 'forbidden') {
    return unread('a line that begins with /; this machine reads none');
  }
  if (skipMark === 'ignored') {
    return false;
  }
  return start.skipSwitch === undefined
    ? unread('a line that begins with /: whether it is run depends on a switch of the machine')
    : start.skipSwitch === 'on';
}
