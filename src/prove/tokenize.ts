/**
 * Our own strict reader of a line's words: letter and number, comments, a leading / ; % and N (NISTIR 6556 §3.3).
 *
 * In  : the text and the span of one line (line end not in it), and how this machine writes comments.
 * Out : the words, or the first thing that is not one of them, with its column. Nothing is passed over in silence.
 */
import { clearLineWords, type LineWords } from './line-words.ts';
import { emptyReading, readNumber, type NumberReading } from './tokenize-number.ts';

export type CommentForm = 'brackets' | 'semicolon' | 'none';

const BLANK = 32;
const TAB = 9;
const PERCENT = 37;
const OPEN = 40;
const CLOSE = 41;
const SLASH = 47;
const SEMICOLON = 59;
const LETTER_A = 65;
const LETTER_N = 78;
const LETTER_Z = 90;
const SMALL_A = 97;
const SMALL_Z = 122;

const reading: NumberReading = emptyReading();

/** Splits the line `text[start, end)` into `into`. */
export function tokenizeLine(
  text: string,
  start: number,
  end: number,
  comments: CommentForm,
  into: LineWords,
): void {
  clearLineWords(into);
  into.start = start;
  into.end = end;
  let at = start;
  if (at < end && text.charCodeAt(at) === SLASH) {
    into.skipped = true;
    at += 1;
  }
  while (at < end) {
    const code = text.charCodeAt(at);
    if (code === BLANK || code === TAB) {
      at += 1;
    } else if (code >= LETTER_A && code <= LETTER_Z) {
      at = takeWord(text, start, at, end, code, into);
    } else if (code >= SMALL_A && code <= SMALL_Z) {
      into.small = true;
      at = takeWord(text, start, at, end, code - SMALL_A + LETTER_A, into);
    } else if (code === OPEN || code === SEMICOLON) {
      at = takeComment(text, start, at, end, comments, into);
    } else if (code === PERCENT && isFirst(into)) {
      into.percent = text.slice(at + 1, end).trim();
      return;
    } else {
      at = fault(into, at - start, end, strange(code));
    }
  }
}

function isFirst(words: LineWords): boolean {
  return words.count === 0 && words.number < 0 && !words.skipped && words.comments.length === 0;
}

/** Notes what is wrong; the rest of the line is not read. */
function fault(into: LineWords, offset: number, end: number, why: string): number {
  into.fault = why;
  into.faultColumn = offset + 1;
  return end;
}

function takeWord(
  text: string,
  start: number,
  at: number,
  end: number,
  letter: number,
  into: LineWords,
): number {
  readNumber(text, at + 1, end, reading);
  if (reading.fault !== undefined) {
    return fault(into, at - start, end, `${String.fromCharCode(letter)}: ${reading.fault}`);
  }
  into.spaced ||= reading.spaced;
  if (letter === LETTER_N) {
    return takeLineNumber(start, at, end, into);
  }
  const n = into.count;
  if (n >= into.letters.length) {
    return fault(into, at - start, end, 'no line can hold so many words');
  }
  into.letters[n] = letter;
  into.values[n] = reading.value;
  into.columns[n] = at - start + 1;
  into.pointed[n] = reading.pointed ? 1 : 0;
  into.count = n + 1;
  return reading.end;
}

/** §3.3.1: digits only, before every other word. */
function takeLineNumber(start: number, at: number, end: number, into: LineWords): number {
  if (into.count > 0 || into.number >= 0) {
    return fault(into, at - start, end, 'a line number must stand first, once');
  }
  if (reading.pointed || reading.signed) {
    return fault(into, at - start, end, 'a line number is written with digits alone');
  }
  into.number = reading.value;
  into.numberDigits = reading.digits;
  return reading.end;
}

/** §3.3.4: from ( to the first ), closed on the line, none inside another; or from ; to the end of the line. */
function takeComment(
  text: string,
  start: number,
  at: number,
  end: number,
  form: CommentForm,
  into: LineWords,
): number {
  const isBracket = text.charCodeAt(at) === OPEN;
  if (form !== (isBracket ? 'brackets' : 'semicolon')) {
    return fault(
      into,
      at - start,
      end,
      `this machine reads no comment in ${isBracket ? 'brackets' : 'this form, after ;'}`,
    );
  }
  let close = end;
  if (isBracket) {
    close = at + 1;
    while (close < end && text.charCodeAt(close) !== CLOSE) {
      if (text.charCodeAt(close) === OPEN) {
        return fault(into, close - start, end, 'a bracket opens inside a comment');
      }
      close += 1;
    }
    if (close === end) {
      return fault(into, at - start, end, 'the comment is not closed on its line');
    }
  }
  into.comments.push(text.slice(at + 1, close));
  return close + 1;
}

function strange(code: number): string {
  switch (String.fromCharCode(code)) {
    case '#':
    case '[':
    case ']':
    case '=':
      return 'parameters and expressions are not read';
    case '/':
      return '/ may only be the first character of a line';
    case ')':
      return 'a bracket closes that was not opened';
    case ',':
      return 'a comma; numbers are written with a point';
    default:
      return code > 32 && code < 127
        ? `"${String.fromCharCode(code)}" is no letter of the language`
        : `character ${code.toString(16).toUpperCase().padStart(4, '0')} (hexadecimal) is no letter of the language`;
  }
}
