/**
 * Lines are split, and read a second time, some dozens ahead of being run: the second reader is quicker over many lines at
 * once, and no line is run before both have agreed about it. Both readers look at a line's text alone, so a text on which
 * they have agreed once (the laps of a wheel repeat themselves) is agreed on for good.
 */
import { emptyLineWords, type LineWords } from './line-words.ts';
import { secondReading, secondReadingAgrees } from './second-reader.ts';
import { tokenizeLine, type CommentForm } from './tokenize.ts';

/** Lines a time. */
const AHEAD = 32;

const LINE_FEED = 10;
const RETURN = 13;

export interface Ahead {
  readonly lines: readonly LineWords[];
  count: number;
  /** Which of the lines the readers differ about first, and how; -1 for none. */
  differs: number;
  how: string;
  /** Texts of plain lines on which both readers have agreed. */
  readonly agreed: Set<string>;
}

export function emptyAhead(): Ahead {
  return {
    lines: Array.from({ length: AHEAD }, emptyLineWords),
    count: 0,
    differs: -1,
    how: '',
    agreed: new Set(),
  };
}

/** Reads the next lines from `at`; answers where the ones after them begin. */
export function readAhead(text: string, at: number, comments: CommentForm, ahead: Ahead): number {
  let next = at;
  ahead.count = 0;
  ahead.differs = -1;
  while (next < text.length && ahead.count < AHEAD) {
    const words = ahead.lines[ahead.count];
    if (words === undefined) {
      break;
    }
    const end = lineEnd(text, next);
    tokenizeLine(text, next, end, comments, words);
    next = afterLineEnd(text, end);
    ahead.count += 1;
    if (words.fault !== undefined) {
      break;
    }
  }
  readAgain(text, ahead);
  return next;
}

function lineEnd(text: string, from: number): number {
  let at = from;
  while (at < text.length) {
    const code = text.charCodeAt(at);
    if (code === LINE_FEED || code === RETURN) {
      break;
    }
    at += 1;
  }
  return at;
}

/** CR LF is one line end. */
function afterLineEnd(text: string, end: number): number {
  return text.charCodeAt(end) === RETURN && text.charCodeAt(end + 1) === LINE_FEED ? end + 2 : end + 1;
}

/** Plain lines at once, as far as they are new; line by line where one of them must be found, or is not plain. */
function readAgain(text: string, ahead: Ahead): void {
  const texts: string[] = [];
  const lines: LineWords[] = [];
  for (let i = 0; i < ahead.count; i++) {
    const words = ahead.lines[i]!;
    if (isPlain(words)) {
      const line = text.slice(words.start, words.end);
      if (!ahead.agreed.has(line)) {
        texts.push(line);
        lines.push(words);
      }
    }
  }
  if (texts.length > 0 && !secondReadingAgrees(texts, lines)) {
    readSingly(text, ahead, 0, ahead.count);
    return;
  }
  for (const line of texts) {
    ahead.agreed.add(line);
  }
  for (let i = 0; i < ahead.count && ahead.differs < 0; i++) {
    if (!isPlain(ahead.lines[i]!)) {
      readSingly(text, ahead, i, i + 1);
    }
  }
}

function isPlain(words: LineWords): boolean {
  return (
    words.fault === undefined && words.percent === undefined && !words.skipped && words.comments.length === 0
  );
}

function readSingly(text: string, ahead: Ahead, from: number, to: number): void {
  const several = to > from + 1;
  for (let i = from; i < to; i++) {
    const words = ahead.lines[i];
    if (words === undefined || words.fault !== undefined || words.percent !== undefined) {
      continue;
    }
    const how = secondReading(text.slice(words.skipped ? words.start + 1 : words.start, words.end), words);
    if (how !== undefined) {
      ahead.differs = i;
      ahead.how = how;
      return;
    }
  }
  if (several) {
    ahead.differs = from;
    ahead.how = 'a second reader finds other words in this line and those after it, taken together';
  }
}
