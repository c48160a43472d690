/**
 * A line whose numbers are reckoned: words with values that are expressions, and settings of parameters, in any order
 * (NISTIR 6556 §3.3, §3.3.3). Plain lines never come here.
 *
 * In  : the text, how this machine writes comments, and what of parameters its controller has.
 * Out : what stands on the line, or the first thing that does not belong there, with its column.
 */
import { faultAt, readParameter, readValue, takes, type Cursor, type Expression } from './expression.ts';
import { readFlow, type FlowForm, type FlowLine } from './flow-words.ts';
import type { CommentForm } from './tokenize.ts';

export interface FormulaWord {
  /** Its capital's character code. */
  readonly letter: number;
  readonly value: Expression;
  readonly column: number;
}

export interface Setting {
  readonly target: Expression;
  readonly value: Expression;
  readonly column: number;
}

export interface FormulaLine {
  readonly skipped: boolean;
  readonly number: number;
  readonly numberDigits: number;
  readonly small: boolean;
  readonly comments: readonly string[];
  readonly words: readonly FormulaWord[];
  readonly settings: readonly Setting[];
  /** Where it says which line is run next; then it holds nothing else. */
  readonly flow: FlowLine | undefined;
}

export interface FormulaForm {
  readonly comments: CommentForm;
  readonly named: boolean;
  readonly flow: FlowForm;
}

export type FormulaReading =
  | { readonly ok: true; readonly line: FormulaLine }
  | { readonly ok: false; readonly fault: string; readonly column: number };

/** NISTIR 6556 §3.3. No line is longer, so no expression is deeper. */
const LONGEST = 256;

/** Stands where a comment stood: it may not split a word (App. E.2). */
const COMMENT = '\u0001';

export function readFormula(text: string, form: FormulaForm): FormulaReading {
  if (text.length > LONGEST) {
    const fault = `a line with parameters or expressions of ${String(text.length)} characters; ${String(LONGEST)} are read`;
    return { ok: false, fault, column: 1 };
  }
  const { signs, columns, comments, fault } = compact(text, form.comments);
  if (fault !== undefined) {
    return { ok: false, ...fault };
  }
  const cursor: Cursor = { text: signs.toUpperCase(), at: 0, fault: undefined, named: form.named, comparisons: form.flow.loops || form.flow.subprograms }; // prettier-ignore
  const line = readItems(cursor, columns, form.flow);
  return cursor.fault === undefined
    ? { ok: true, line: { ...line, comments, small: /[a-z]/.test(signs) } }
    : { ok: false, fault: cursor.fault, column: columns[cursor.at] ?? text.length + 1 };
}

interface Compact {
  readonly signs: string;
  readonly columns: readonly number[];
  readonly comments: readonly string[];
  readonly fault?: { readonly fault: string; readonly column: number };
}

/** Blanks gone, each comment one sign. */
function compact(text: string, form: CommentForm): Compact {
  const comments: string[] = [];
  const columns: number[] = [];
  let signs = '';
  for (let at = 0; at < text.length; at++) {
    const sign = text.charAt(at);
    if (sign === ' ' || sign === '\t') {
      continue;
    }
    columns.push(at + 1);
    if (sign === '(' && form === 'brackets') {
      const close = text.indexOf(')', at);
      const comment = text.slice(at + 1, Math.max(close, at + 1));
      if (close < 0 || comment.includes('(')) {
        const fault =
          close < 0 ? 'the comment is not closed on its line' : 'a bracket opens inside a comment';
        return { signs, columns, comments, fault: { fault, column: at + 1 } };
      }
      comments.push(comment);
      signs += COMMENT;
      at = close;
    } else if (sign === ';' && form === 'semicolon') {
      comments.push(text.slice(at + 1));
      signs += COMMENT;
      break;
    } else {
      signs += sign;
    }
  }
  return { signs, columns, comments };
}

type Items = Omit<FormulaLine, 'comments' | 'small'>;

function readItems(cursor: Cursor, columns: readonly number[], form: FlowForm): Items {
  const words: FormulaWord[] = [];
  const settings: Setting[] = [];
  let flow: FlowLine | undefined;
  const skipped = takes(cursor, '/');
  const label = /^N(\d+)(?![\d.])/.exec(cursor.text.slice(cursor.at));
  cursor.at += label?.[0].length ?? 0;
  while (cursor.at < cursor.text.length && cursor.fault === undefined) {
    const column = columns[cursor.at]!;
    if (takes(cursor, COMMENT)) {
      continue;
    }
    if (flow !== undefined) {
      faultAt(cursor, 'words behind those that say which line is run next');
    } else if ((form.loops || form.subprograms) && isFlow(cursor, words, settings)) {
      flow = readFlow(cursor, form);
    } else if (takes(cursor, '#')) {
      readSetting(cursor, column, settings);
    } else {
      readWord(cursor, column, words);
    }
  }
  const digits = label?.[1] ?? '';
  return {
    skipped,
    number: label === null ? -1 : Number(digits),
    numberDigits: digits.length,
    words,
    settings,
    flow,
  };
}

function isFlow({ text, at }: Cursor, words: readonly FormulaWord[], settings: readonly Setting[]): boolean {
  return words.length === 0 && settings.length === 0 && /^O(?:\d+|<[^>]*>)[A-Z]/.test(text.slice(at));
}

function readSetting(cursor: Cursor, column: number, settings: Setting[]): void {
  const target = readParameter(cursor);
  if (target !== undefined && !takes(cursor, '=')) {
    faultAt(cursor, 'a parameter stands alone, without a letter before it or = behind it');
    return;
  }
  const value = target && readValue(cursor);
  if (target !== undefined && value !== undefined) {
    settings.push({ target, value, column });
  }
}

function readWord(cursor: Cursor, column: number, words: FormulaWord[]): void {
  const letter = cursor.text.charCodeAt(cursor.at);
  if (letter < 65 || letter > 90 || letter === LETTER_N) {
    const sign = cursor.text.charAt(cursor.at);
    faultAt(
      cursor,
      letter === LETTER_N ? 'a line number must stand first, once' : `"${sign}" may not stand here`,
    );
    return;
  }
  cursor.at += 1;
  const value = readValue(cursor);
  if (value !== undefined) {
    words.push({ letter, value, column });
  }
}

const LETTER_N = 78;
