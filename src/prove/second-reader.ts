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
