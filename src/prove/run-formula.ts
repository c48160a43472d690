/**
 * Reckons a line with parameters: all its values first, with what the parameters held before it; then its settings, from
 * left to right (NISTIR 6556 §3.3.3, §3.3.5); what is left is a block like any other.
 */
import { sortWords, type Block } from './block.ts';
import { evaluate, keyOf } from './evaluate.ts';
import type { FormulaLine } from './formula-line.ts';
import { clearLineWords, emptyLineWords } from './line-words.ts';
import type { Codes } from './modes-codes.ts';
import { setParameter, type ParameterKey, type Parameters } from './parameters.ts';

const words = emptyLineWords();

/** The block, or what is wrong. */
export function blockOfFormula(line: FormulaLine, codes: Codes, parameters: Parameters): Block | string {
  clearLineWords(words);
  for (const { letter, value, column } of line.words) {
    const number = evaluate(value, parameters);
    if (typeof number === 'string') {
      return `column ${String(column)}: ${number}`;
    }
    const n = words.count;
    words.letters[n] = letter;
    words.values[n] = number;
    words.columns[n] = column;
    words.pointed[n] = value.kind === 'number' && !value.pointed ? 0 : 1;
    words.count = n + 1;
  }
  return settle(line, parameters) ?? sortWords(words, codes);
}

function settle(line: FormulaLine, parameters: Parameters): string | undefined {
  const found: (readonly [key: ParameterKey, value: number, column: number])[] = [];
  for (const { target, value, column } of line.settings) {
    const key = keyOf(target, parameters);
    const number = evaluate(value, parameters);
    if (typeof key === 'object' || typeof number === 'string') {
      return `column ${String(column)}: ${typeof key === 'object' ? key.fault : String(number)}`;
    }
    found.push([key, number, column]);
  }
  for (const [key, value, column] of found) {
    const fault = setParameter(parameters, key, value);
    if (fault !== undefined) {
      return `column ${String(column)}: ${fault}`;
    }
  }
  return undefined;
}
