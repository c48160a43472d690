/**
 * Where blocks and comments are gathered: block numbers, the gap between words, comment marks, the longest line.
 *
 * In  : words of a block, texts of comments. Out: the program's lines and the problems met on the way.
 */
import type { Place, Problem } from '../base/problem.ts';
import type { ProblemCode } from '../base/problem-codes.ts';
import type { BlockWords, Machine } from '../machine/machine.ts';
import { commentCleaner, foldText, withoutOrders, type Cleaner } from './clean-comment.ts';
import { formatCode } from './format-word.ts';

export interface Sink {
  readonly machine: Machine;
  readonly file: string;
  readonly lines: string[];
  readonly gap: string;
  readonly longest: number;
  readonly numbers: BlockWords['numbers'];
  readonly clean: Cleaner;
  readonly problems: Map<string, Problem>;
  blocks: number;
  /** The next block number, where blocks are numbered. */
  number: number;
  /** The next block begins a cutter's part of the program. */
  cutterBegins: boolean;
}

export function openSink(machine: Machine, file: string): Sink {
  return {
    machine,
    file,
    lines: [],
    gap: machine.words.file.gapBetweenWords ? ' ' : '',
    longest: machine.words.file.lineLongest,
    numbers: machine.words.blocks.numbers,
    clean: commentCleaner(machine.words.file),
    problems: new Map(),
    blocks: 0,
    number: machine.words.blocks.first,
    cutterBegins: true,
  };
}

/** Codes in the machine file's width; other words pass. */
export function codeWords(sink: Sink, words: readonly string[]): string[] {
  const width = sink.machine.words.numbers.codeWidth;
  return words.map((word) => formatCode(word, width));
}

/** A block of codes, S, T, H and the like, given as they are in trade and machine file. */
export function writeCodes(sink: Sink, ...words: readonly string[]): void {
  writeBlock(sink, codeWords(sink, words).join(sink.gap));
}

/**
 * One block of finished words with their gaps, the last of which (`apart`) may stand in a block of its own before the others
 * where the line would be too long.
 */
export function writeBlock(sink: Sink, body: string, apart = ''): void {
  if (apart === '') {
    putBlock(sink, body);
    return;
  }
  const whole = body + sink.gap + apart;
  if (numberText(sink).length + whole.length <= sink.longest) {
    putBlock(sink, whole);
    return;
  }
  putBlock(sink, apart);
  putBlock(sink, body);
}

function putBlock(sink: Sink, body: string): void {
  const line = numberText(sink) + body;
  if (line.length > sink.longest) {
    complain(sink, 'post.cannot-say', 'line', {
      message: `the block ${body} takes ${line.length} characters and the machine file allows ${sink.longest} a line`,
      hint: 'give a larger line-longest, fewer length-decimals, or no gap-between-words',
    });
  }
  sink.lines.push(line);
  sink.blocks++;
  countOn(sink);
}

function numberText(sink: Sink): string {
  return sink.numbers === 'none' || (sink.numbers === 'cutter-changes' && !sink.cutterBegins)
    ? ''
    : `N${sink.number}${sink.gap}`;
}

function countOn(sink: Sink): void {
  if (sink.numbers === 'all' || (sink.numbers === 'cutter-changes' && sink.cutterBegins)) {
    const { first, step, last } = sink.machine.words.blocks;
    sink.number = sink.number + step > last ? first : sink.number + step;
  }
  sink.cutterBegins = false;
}

/** Whose a comment is: only the writer's own may say what a reader takes for done (`Cutter 5`). */
export type Whose = 'own' | "anyone's";

/** Texts as comments, each on lines of its own; nothing where the machine reads none. */
export function writeComments(sink: Sink, texts: readonly string[], whose: Whose = "anyone's"): void {
  for (const text of texts) {
    putComment(sink, text, '', whose);
  }
}

/** A comment the operator is shown, where the machine can. */
export function writeOperatorNotes(sink: Sink, texts: readonly string[], whose: Whose = "anyone's"): void {
  for (const text of texts) {
    putComment(sink, text, sink.machine.words.file.operatorNote ?? '', whose);
  }
}

function putComment(sink: Sink, text: string, before: string, whose: Whose): void {
  const { commentForm, lineLongest } = sink.machine.words.file;
  if (commentForm === 'none') {
    return;
  }
  const [open, close] = commentForm === 'brackets' ? [`(${before}`, ')'] : [`;${before}`, ''];
  const width = lineLongest - open.length - close.length;
  for (const line of foldText(sink.clean(text), width)) {
    sink.lines.push(open + (whose === 'own' ? line : withoutOrders(line, width)) + close);
  }
}

/** The same complaint is made once, where it is first met. */
export function complain(
  sink: Sink,
  code: ProblemCode,
  key: string,
  text: { readonly message: string; readonly hint: string },
): void {
  if (!sink.problems.has(key)) {
    const at: Place = { kind: 'program', file: sink.file, line: sink.lines.length + 1 };
    sink.problems.set(key, { code, severity: 'error', ...text, at });
  }
}
