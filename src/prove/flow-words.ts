/**
 * Lines that say which line is run next, on controllers that have them: O and a number or a name, then a word, as
 * `o100 while [#1 LT 5]`. Not in NISTIR 6556 (App. E.3); by the published reference of a controller that descends from it.
 *
 * In  : a line without its blanks, in capitals, at its O. Out : label, word and expressions, or what is wrong.
 */
import { faultAt, readValue, takes, type Cursor, type Expression } from './expression.ts';

export type FlowWord =
  | 'sub' | 'endsub' | 'return' | 'call' | 'if' | 'elseif' | 'else' | 'endif' | 'while' | 'endwhile' | 'do' | 'repeat' | 'endrepeat'
  | 'break' | 'continue'; // prettier-ignore

export interface FlowLine {
  /** Its number, or its name in capitals. */
  readonly label: string;
  readonly word: FlowWord;
  readonly values: readonly Expression[];
}

/** What of it the controller has. */
export interface FlowForm {
  readonly subprograms: boolean;
  readonly loops: boolean;
}

/** #1 to #30 are a subprogram's own. */
export const MOST_ARGUMENTS = 30;

/** Each with the fewest and the most expressions behind it; those that begin like another one before it. */
const WORDS: readonly (readonly [FlowWord, number, number])[] = [
  ['sub', 0, 0], ['endsub', 0, 0], ['return', 0, 0], ['call', 0, MOST_ARGUMENTS],
  ['if', 1, 1], ['elseif', 1, 1], ['else', 0, 0], ['endif', 0, 0], ['while', 1, 1], ['endwhile', 0, 0], ['do', 0, 0],
  ['repeat', 1, 1], ['endrepeat', 0, 0], ['break', 0, 0], ['continue', 0, 0],
]; // prettier-ignore
const OF_SUBPROGRAMS: ReadonlySet<FlowWord> = new Set(['sub', 'endsub', 'return', 'call']);

export function readFlow(cursor: Cursor, form: FlowForm): FlowLine | undefined {
  const label = /^O(?:(\d{1,9})|<([A-Z0-9_]+)>)/.exec(cursor.text.slice(cursor.at));
  if (label === null) {
    return faultAt(cursor, 'O wants a number or a name in < >');
  }
  cursor.at += label[0].length;
  const found = WORDS.find(([name]) => takes(cursor, name.toUpperCase()));
  if (found === undefined) {
    return faultAt(cursor, 'after O and its label no word follows that says which line is run next');
  }
  const [word, fewest, most] = found;
  if (!(OF_SUBPROGRAMS.has(word) ? form.subprograms : form.loops)) {
    return faultAt(
      cursor,
      `${word}: by its machine file this controller has no ${OF_SUBPROGRAMS.has(word) ? 'subprograms of this kind' : 'loops'}`,
    );
  }
  const values: Expression[] = [];
  while (cursor.text.startsWith('[', cursor.at)) {
    const value = readValue(cursor);
    if (value === undefined) {
      return undefined;
    }
    values.push(value);
  }
  if (values.length < fewest || values.length > most) {
    return faultAt(
      cursor,
      `${word} with ${String(values.length)} expressions; it takes ${fewest === most ? String(most) : `at most ${String(most)}`}`,
    );
  }
  return { label: label[2] ?? String(Number(label[1])), word, values };
}
