/**
 * The lines of a program, each split into words by our own reader and by a second one.
 *
 * Both readers look at a line's text alone, and so do the rules about single lines. The laps of a wheel repeat themselves:
 * every text is read once by both, however many lines it stands on, and what was found holds for each of these lines.
 * The second reader is quicker over many lines at once, so texts are handed to it some dozens together.
 */
import type { Machine } from '../machine/machine.ts';
import { sortWords, type Block } from './block.ts';
import { readFormula, type FormulaLine } from './formula-line.ts';
import { emptyLineWords, type LineWords } from './line-words.ts';
import type { Codes } from './modes-codes.ts';
import { secondReading, secondReadingAgrees } from './second-reader.ts';
import { tokenizeLine } from './tokenize.ts';

export interface ReadLine {
  readonly text: string;
  /** How many words stand on it, its own number not among them. */
  readonly count: number;
  /** The line's own number, or -1, and how many digits that is written with. */
  readonly number: number;
  readonly numberDigits: number;
  /** A / stands first. */
  readonly skipped: boolean;
  /** What follows a % that stands first, or undefined. */
  readonly percent: string | undefined;
  readonly small: boolean;
  readonly comments: readonly string[];
  /** Why our reader can't split it, or undefined. */
  readonly fault: string | undefined;
  /** How the second reader differs, or undefined. */
  differs: string | undefined;
  /** Its words sorted, or what is wrong with them; undefined where it holds none. */
  readonly block: Block | string | undefined;
  /** Where its numbers are reckoned: what stands on it. Then it has no block before it is run. */
  readonly formula: FormulaLine | undefined;
  /** A move and nothing else: no rule about lines has anything to say of it. */
  readonly onlyMoves: boolean;
}

const NO_COMMENTS: readonly string[] = [];

/** Texts handed to the second reader at a time. */
const TOGETHER = 32;

/** Texts on which the second reader is still to be heard, and room for their words. */
interface Waiting {
  count: number;
  readonly lines: ReadLine[];
  readonly words: LineWords[];
}

export function readLines(text: string, machine: Machine, codes: Codes): ReadLine[] {
  const known = new Map<string, ReadLine>();
  const waiting: Waiting = { count: 0, lines: [], words: [] };
  const lines: ReadLine[] = [];
  for (const line of splitLines(text)) {
    let read = known.get(line);
    if (read === undefined) {
      read = readFirst(line, machine, codes, waiting);
      known.set(line, read);
    }
    lines.push(read);
  }
  hearSecond(waiting);
  return lines;
}

/** CR LF is one line end; the last line has one or not. */
function splitLines(text: string): string[] {
  const lines = text.includes('\r') ? text.split(/\r\n|\r|\n/) : text.split('\n');
  if (lines.at(-1) === '') {
    lines.pop();
  }
  return lines;
}

/** A text that was not met before. */
function readFirst(text: string, machine: Machine, codes: Codes, waiting: Waiting): ReadLine {
  const { file } = machine.words;
  if (waiting.count === TOGETHER) {
    hearSecond(waiting);
  }
  const words = (waiting.words[waiting.count] ??= emptyLineWords());
  tokenizeLine(text, 0, text.length, file.commentForm, words);
  const { count, number, numberDigits, skipped, percent, small, comments, fault } = words;
  if (fault !== undefined && (/[#[]/.test(text) || /^[ \t/nN\d]*[oO]/.test(text))) {
    return reckonedLine(text, machine, fault, words.faultColumn);
  }
  const isWhole = fault === undefined && percent === undefined;
  const block = isWhole && count > 0 ? sortWords(words, codes) : undefined;
  const line: ReadLine = {
    text,
    count,
    number,
    numberDigits,
    skipped,
    percent,
    small,
    comments: comments.length === 0 ? NO_COMMENTS : comments,
    fault: fault === undefined ? undefined : `column ${String(words.faultColumn)}: ${fault}`,
    differs: undefined,
    block,
    formula: undefined,
    onlyMoves:
      typeof block === 'object' &&
      block.onlyMoves &&
      number < 0 &&
      !skipped &&
      comments.length === 0 &&
      text.length <= file.lineLongest &&
      !(small && file.letterCase === 'upper'),
  };
  if (isWhole) {
    waiting.lines[waiting.count] = line;
    waiting.count += 1;
  }
  return line;
}

/** A line that is no row of plain words, and holds a # or a [, or begins with O. The second reader knows nothing of either. */
function reckonedLine(text: string, { words }: Machine, plainFault: string, column: number): ReadLine {
  const { parameters, subprograms, loops } = words.language;
  const flow = { subprograms: subprograms === 'O-words', loops: loops === 'O-words' };
  const hasNone = parameters === 'none' && (holds(text, /#/) || (!flow.subprograms && !flow.loops));
  const reading = hasNone
    ? ({ ok: false, fault: holds(text, /[#[]/) ? NO_PARAMETERS : plainFault, column } as const)
    : readFormula(text, {
        comments: words.file.commentForm,
        named: parameters === 'numbered-and-named',
        flow,
      });
  const line = reading.ok ? reading.line : undefined;
  const fault = reading.ok
    ? parameters === 'none' && line?.flow === undefined
      ? NO_PARAMETERS
      : undefined
    : `column ${String(reading.column)}: ${reading.fault}`;
  return {
    text,
    count:
      line === undefined ? 0 : line.words.length + line.settings.length + (line.flow === undefined ? 0 : 1),
    number: line?.number ?? -1,
    numberDigits: line?.numberDigits ?? 0,
    skipped: line?.skipped ?? false,
    percent: undefined,
    small: line?.small ?? false,
    comments: line?.comments ?? NO_COMMENTS,
    fault,
    differs: undefined,
    block: undefined,
    formula: line,
    onlyMoves: false,
  };
}

const NO_PARAMETERS = 'parameters and expressions; by its machine file this controller reads none';

/** Whether it holds such a sign as more than text; a comment that is not closed is text to its end. */
function holds(text: string, sign: RegExp): boolean {
  return sign.test(text.replace(/\([^)]*(?:\)|$)|;.*/g, ''));
}

/** Together, where all agree; one by one where that must be found, or where the second reader takes no lines together. */
function hearSecond(waiting: Waiting): void {
  const { lines, words, count } = waiting;
  const texts: string[] = [];
  const theirs: LineWords[] = [];
  for (let i = 0; i < count; i++) {
    const line = lines[i]!;
    if (line.skipped || line.text.includes(';')) {
      hearAlone(line, words[i]!);
    } else {
      texts.push(line.text);
      theirs.push(words[i]!);
    }
  }
  waiting.count = 0;
  if (texts.length > 0 && !secondReadingAgrees(texts, theirs)) {
    for (let i = 0; i < count; i++) {
      hearAlone(lines[i]!, words[i]!);
    }
  }
}

function hearAlone(line: ReadLine, words: LineWords): void {
  line.differs ??= secondReading(line.skipped ? line.text.slice(1) : line.text, words);
}
