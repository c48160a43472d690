/**
 * The form of the file around its blocks: line length, letters, % lines, program number, block numbers, and the end
 * (NISTIR 6556 §3.1 and §3.3; the rest by the machine file).
 *
 * What the controller would not load is an error that doesn't stop the reader; what changes the meaning does.
 */
import { BIT, valueOf, wholeOf, type Block } from './block.ts';
import type { ReadLine } from './read-lines.ts';
import type { Flow } from './run-flow.ts';
import { sayWhatFollows } from './trace-after-end.ts';
import { happen, remark, unread, type Refusal, type Run } from './trace-run.ts';

export interface FileState {
  /** Lines that held words and were run. */
  blocks: number;
  /** % lines so far. */
  percents: number;
  /** A program number has been read. */
  labelled: boolean;
  ended: boolean;
  /** Lines that the second reader could not hold. */
  alone: number;
  /** Lines, 1-based, with parameters, expressions or flow words that were run. */
  readonly reckoned: Set<number>;
  /** The line that is run next, counted from 0; -1 for the one that follows. */
  next: number;
  readonly flow: Flow;
  /** Lines that began with / and were passed over. */
  passedOver: number;
}

/** NISTIR 6556 §3.3.1, where the machine file numbers no blocks itself. */
const LAST_NUMBER = 99999;

/** What the controller could not load of this line as it is written. */
export function checkLine(run: Run, line: ReadLine): void {
  const { length } = line.text;
  const { file } = run.machine.words;
  if (length > file.lineLongest) {
    const message = `a line of ${String(length)} characters; this machine holds ${String(file.lineLongest)}`;
    remark(run, 'prove.file', 'error', message, 'long line');
  }
  if (line.small && file.letterCase === 'upper') {
    remark(run, 'prove.file', 'error', 'small letters in words; this machine reads capitals only', 'small');
  }
  if (line.comments.length > 0) {
    checkComments(run, line);
  }
}

function checkComments(run: Run, line: ReadLine): void {
  const { text } = line;
  const { file } = run.machine.words;
  if (file.commentOwnLine && (line.count > 0 || line.number >= 0)) {
    remark(
      run,
      'prove.file',
      'error',
      'a comment beside words; this machine reads it on a line of its own only',
      'beside',
    );
  }
  const at = text.search(run.codes.dangerous);
  if (at >= 0) {
    const code = text.charCodeAt(at);
    const shown = code > 32 && code < 127 ? `"${text.charAt(at)}"` : `character ${String(code)}`;
    remark(run, 'prove.file', 'error', `${shown} in a comment: some controllers act on it at once`, 'letter');
  }
}

/** A number of the line that this controller can't hold. */
export function checkNumber(run: Run, line: ReadLine): Refusal | undefined {
  const { numbers, last } = run.machine.words.blocks;
  const highest = numbers === 'none' ? LAST_NUMBER : last;
  if (line.number > highest || line.numberDigits > String(highest).length) {
    return unread(
      `line number ${String(line.number)} in ${String(line.numberDigits)} digits; this machine counts to ${String(highest)}`,
    );
  }
  return undefined;
}

/** A % line begins the file, or ends it: what follows is not run. */
export function readPercent(run: Run, name: string, state: FileState): Refusal | undefined {
  const { percentLines, programLabel } = run.machine.words.file;
  if (percentLines === 'none') {
    return unread('a % line; this machine reads none');
  }
  if (state.percents > 0) {
    state.ended = true;
    happen(run, { kind: 'end', word: '%' });
    return name === '' ? undefined : unread('words on the closing % line');
  }
  if (state.blocks > 0 || state.labelled) {
    return unread('a first % line after blocks');
  }
  state.percents = 1;
  if (name === '') {
    return undefined;
  }
  return programLabel === 'percent-name' && /^[A-Za-z0-9]+$/.test(name)
    ? undefined
    : unread('words on the opening % line');
}

/** Whether the line is a program number, alone and before everything else; a wrong one is refused. */
export function readLabel(run: Run, line: ReadLine, block: Block, state: FileState): Refusal | boolean {
  if ((block.given & BIT.O) === 0) {
    return false;
  }
  if (run.machine.words.language.subprograms === 'M98' && state.blocks > 0) {
    return unread('the program runs into a subprogram (O) that it has not called');
  }
  const { programLabel, labelLowest, labelHighest } = run.machine.words.file;
  if (programLabel !== 'o-number') {
    return unread('O: this machine reads no program number');
  }
  const number = wholeOf(valueOf(block, 'O'));
  if (line.count > 1 || state.blocks > 0 || state.labelled) {
    return unread('O: a program number stands alone, once, before all blocks');
  }
  if (number === undefined || number < labelLowest || number > labelHighest) {
    return unread(`O: programs are numbered ${String(labelLowest)} to ${String(labelHighest)} here`);
  }
  state.labelled = true;
  return true;
}

/** What is missing at the end. */
export function checkEnd(run: Run, state: FileState, lines: readonly ReadLine[]): void {
  const { percentLines, programLabel } = run.machine.words.file;
  const last = run.events.at(-1);
  if (!state.ended) {
    remark(run, 'prove.end', 'error', 'the program has no end (M2, M30 or a closing % line)');
  } else if (
    last?.kind === 'end' &&
    last.word !== '%' &&
    state.percents === 1 &&
    !lines.slice(run.line).some(({ text }) => /^[ \t]*%[ \t]*$/.test(text))
  ) {
    remark(run, 'prove.end', 'error', 'the program begins with % and has no closing % line');
  }
  if (state.ended) {
    sayWhatFollows(run, lines, last?.kind === 'end' && last.word === '%');
  }
  if (percentLines === 'both' && state.percents === 0) {
    lacksAtTheTop(run, 'this machine wants the program between two % lines');
  }
  if (programLabel === 'o-number' && !state.labelled) {
    lacksAtTheTop(run, 'this machine wants a program number (O)');
  }
}

/** What should have stood at the head of the file. */
function lacksAtTheTop(run: Run, message: string): void {
  run.findings.push({ code: 'prove.file', severity: 'error', message, file: run.file, line: 1 });
}
