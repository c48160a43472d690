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
import { emptyBlock, sortWords, type Block } from './block.ts';
import type { LineWords } from './line-words.ts';
import { codesOf, M_GROUP } from './modes-codes.ts';
import { NOWHERE, powerOn, type FinalModes } from './modes.ts';
import type { Finding } from './proof.ts';
import { emptyAhead, readAhead } from './read-ahead.ts';
import { runBlock } from './trace-block.ts';
import { handsDone, readComments, type ByHand } from './trace-comments.ts';
import { checkEnd, checkLine, checkNumber, readLabel, readPercent, type FileState } from './trace-file.ts';
import { countRemarks, unread, type Refusal, type Run, type TracedEvent } from './trace-run.ts';

export interface Trace {
  readonly file: string;
  readonly moves: readonly TracedMove[];
  readonly events: readonly TracedEvent[];
  readonly findings: readonly Finding[];
  /** Lines that held words and were run. */
  readonly blocks: number;
  /** As the program leaves them, before its end word itself resets any. */
  readonly finalModes: FinalModes;
  /** Every line up to the program's end was read. */
  readonly complete: boolean;
  readonly notChecked: readonly string[];
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
  const state: FileState = { blocks: 0, percents: 0, labelled: false, ended: false, alone: 0, passedOver: 0 };
  const complete = readLines(run, text, start, state);
  countRemarks(run);
  const { moves, events, findings, modes } = run;
  const notChecked = notCheckedOf(run, state, complete);
  return {
    file,
    moves,
    events,
    findings,
    blocks: state.blocks,
    finalModes: { ...modes },
    complete,
    notChecked,
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
    placed: false,
    cutting: false,
    moves: [],
    events: [],
    findings: [],
    remarks: new Map(),
  };
}

/** Reads until the program ends or a line is refused; says whether it came to the end. */
function readLines(run: Run, text: string, start: TraceStart, state: FileState): boolean {
  const ahead = emptyAhead();
  const block = emptyBlock();
  const byHand: ByHand = { cutter: undefined, speed: undefined };
  const { commentForm } = run.machine.words.file;
  let at = 0;
  let rest = 0;
  while (at < text.length && !state.ended) {
    at = readAhead(text, at, commentForm, ahead);
    for (let i = 0; i < ahead.count && !state.ended; i++) {
      const words = ahead.lines[i];
      if (words === undefined) {
        break;
      }
      run.line += 1;
      rest = words.end;
      const refused =
        checkWords(run, text, words, state, ahead.differs === i ? ahead.how : undefined) ??
        readLine(run, words, block, start, state, byHand);
      if (refused !== undefined) {
        run.findings.push({ ...refused, severity: 'error', file: run.file, line: run.line });
        return false;
      }
    }
  }
  checkEnd(run, state, text.slice(rest));
  return true;
}

/** Whether the line's words are certain: ours could split it, the file may hold it, and a second reader agrees. */
function checkWords(
  run: Run,
  text: string,
  words: LineWords,
  state: FileState,
  differs: string | undefined,
): Refusal | undefined {
  if (words.fault !== undefined) {
    return unread(`column ${String(words.faultColumn)}: ${words.fault}`);
  }
  if (words.percent !== undefined) {
    state.alone += 1;
    return undefined;
  }
  checkLine(run, text, words);
  if (words.number >= 0) {
    const refused = checkNumber(run, words);
    if (refused !== undefined) {
      return refused;
    }
  }
  return differs === undefined ? undefined : { code: 'prove.readers-disagree', message: differs };
}

/** Runs a line whose words are certain. */
function readLine(
  run: Run,
  words: LineWords,
  block: Block,
  start: TraceStart,
  state: FileState,
  byHand: ByHand,
): Refusal | undefined {
  if (words.percent !== undefined) {
    return readPercent(run, words.percent, state);
  }
  if (words.skipped) {
    const passes = passesOver(run, start);
    if (passes !== false) {
      state.passedOver += 1;
      return passes === true ? undefined : passes;
    }
  }
  if (words.comments.length > 0) {
    readComments(run, words.comments, byHand);
  }
  if (words.count === 0) {
    return undefined;
  }
  const wrong = sortWords(words, run.codes, block);
  if (wrong !== undefined) {
    return unread(wrong);
  }
  const label = readLabel(run, words, block, state);
  if (label !== false) {
    return label === true ? undefined : label;
  }
  state.blocks += 1;
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

function notCheckedOf(run: Run, state: FileState, complete: boolean): readonly string[] {
  const said = ['what the controller itself does otherwise than its machine file says'];
  if (state.alone > 0) {
    said.push(
      `${String(state.alone)} % line${state.alone === 1 ? '' : 's'}: the second reader cannot hold them`,
    );
  }
  if (state.passedOver > 0) {
    said.push(
      `${String(state.passedOver)} lines that begin with /: passed over, as the switch was said to be on`,
    );
  }
  if (!complete) {
    said.push(`everything from line ${String(run.line)} on`);
  }
  return said;
}
