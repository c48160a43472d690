/**
 * The second reader: gcode-parser, a library of other people's making, reads every line again, and both must find the
 * same words. It passes over what it doesn't know without a mark, so it never judges alone: its compacted line must
 * consist of words and nothing else, every value must be a finite number, and commands, checksums and repeated line
 * numbers are not taken.
 */
import { parseLine } from 'gcode-parser';
import type { LineWords } from './line-words.ts';

const COMPACT = { lineMode: 'compact' } as const;
const ONLY_WORDS = /^(?:[A-Za-z][+-]?(?:\d+(?:\.\d*)?|\.\d+))*$/;

/**
 * How the second reader differs about a line that ours could read, or undefined where they agree.
 * `line` is without its line end and without a leading /; % lines are not its business.
 */
export function secondReading(line: string, words: LineWords): string | undefined {
  const second = parseLine(line, COMPACT);
  if (!ONLY_WORDS.test(second.line) || second.cmds !== undefined || second.err !== undefined) {
    return `a second reader finds more than words in it: "${shorten(second.line)}"`;
  }
  if ((second.ln ?? -1) !== words.number) {
    return `a second reader reads its number as ${String(second.ln ?? 'none')}`;
  }
  if (second.words.length !== words.count) {
    return `a second reader finds ${String(second.words.length)} words, not ${String(words.count)}`;
  }
  for (let i = 0; i < words.count; i++) {
    const [letter, value] = second.words[i] ?? ['', Number.NaN];
    if (
      letter.charCodeAt(0) !== words.letters[i] ||
      typeof value !== 'number' ||
      !same(value, words.values[i])
    ) {
      return `a second reader reads ${letter}${String(value)} where ours reads ${nameOf(words, i)}`;
    }
  }
  return undefined;
}

/**
 * Whether the second reader finds, in these lines put one after the other, the very words that ours found, in order. Every
 * line begins with a letter, so none can lend a digit to another; only lines without comments, / and % are read so.
 */
export function secondReadingAgrees(texts: readonly string[], lines: readonly LineWords[]): boolean {
  const second = parseLine(texts.join('\n'), COMPACT);
  if (!ONLY_WORDS.test(second.line) || second.cmds !== undefined || second.err !== undefined) {
    return false;
  }
  let at = 0;
  let numbered = false;
  for (const words of lines) {
    if (words.number >= 0) {
      // Of several line numbers the library keeps the first apart and hands out the others as words.
      if (numbered ? !isWord(second.words[at++], LETTER_N, words.number) : second.ln !== words.number) {
        return false;
      }
      numbered = true;
    }
    for (let k = 0; k < words.count; k++) {
      if (!isWord(second.words[at++], words.letters[k], words.values[k])) {
        return false;
      }
    }
  }
  return at === second.words.length && (numbered || second.ln === undefined);
}

const LETTER_N = 78;

function isWord(
  word: readonly [letter: string, value: number | string] | undefined,
  letter: number | undefined,
  value: number | undefined,
): boolean {
  return (
    word !== undefined &&
    word[0].charCodeAt(0) === letter &&
    typeof word[1] === 'number' &&
    same(word[1], value)
  );
}

/** Equal and finite; 0 and -0 are one place. */
function same(a: number, b: number | undefined): boolean {
  return a === b && Number.isFinite(a);
}

function nameOf(words: LineWords, i: number): string {
  return `${String.fromCharCode(words.letters[i] ?? 0)}${String(words.values[i])}`;
}

function shorten(text: string): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}
