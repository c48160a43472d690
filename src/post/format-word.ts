/**
 * Numbers and codes as a controller reads them. A value comes as a whole count of its last digit's unit, so nothing is
 * rounded here and nothing but digits, one point and a minus sign can come out: no exponent, no `-0`, no NaN.
 *
 * In  : a count (an integer), the decimals its unit stands for, the machine file's number style.
 * Out : text such as `1.5`, `1.5000`, `.5`, `2.`, `-12`.
 */
import { Bug } from '../base/bug.ts';
import type { NumberWords } from '../machine/machine.ts';

export type NumberStyle = Pick<NumberWords, 'point' | 'trailingZeros' | 'leadingZero'>;

/** A count of units of the last of `decimals` digits, as text. */
export function formatCount(count: number, decimals: number, style: NumberStyle): string {
  if (!Number.isSafeInteger(count)) {
    throw new Bug(`no whole count of the last digit: ${count}`);
  }
  let digits = count < 0 ? -count : count;
  let places = decimals;
  if (style.trailingZeros === 'drop') {
    while (places > 0 && digits % 10 === 0) {
      digits /= 10;
      places--;
    }
  }
  const sign = count < 0 ? '-' : '';
  const whole = String(digits);
  if (places === 0) {
    // -0 is not below zero, and String(-0) is '0'.
    return style.point === 'always' ? `${sign}${whole}.` : sign + whole;
  }
  const padded = whole.length > places ? whole : whole.padStart(places + 1, '0');
  const split = padded.length - places;
  const before = padded.slice(0, split);
  return `${sign}${before === '0' && style.leadingZero === 'drop' ? '' : before}.${padded.slice(split)}`;
}

/** A value rounded to its last digit, as text. */
export function formatValue(value: number, decimals: number, style: NumberStyle): string {
  return formatCount(Math.round(value * 10 ** decimals) + 0, decimals, style);
}

/** `G1` as the machine file's code width has it: `G1` or `G01`. Other words pass. */
export function formatCode(word: string, width: 1 | 2): string {
  return width === 2 ? word.replace(/^([GM])(\d)(?=\.|$)/, '$10$2') : word;
}
