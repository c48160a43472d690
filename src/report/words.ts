/** How the report writes numbers, times and names: every figure with its unit, the same in every country. */
import { fixedDecimals } from '../base/fixed-decimals.ts';

/** Text as it may stand between tags or in a quoted attribute. */
export function escapeText(text: string): string {
  return text
    .replaceAll(/[\p{Cc}\p{Cs}]/gu, (letter) => (letter === '\n' || letter === '\t' ? ' ' : ''))
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');
}

/** A number without an exponent, without -0, with at most so many decimals and no trailing noughts. */
export function plain(value: number, decimals: number): string {
  const text = fixedDecimals(value, decimals);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** A place on a drawing, mm: four decimals, quickly. */
export function coordinate(value: number): string {
  return String(Math.round(value * 1e4) / 1e4);
}

/** A number with just so many decimals, without -0. */
export function fixed(value: number, decimals: number): string {
  return fixedDecimals(value, decimals);
}

/** "0.1 min", "9.4 min", "61 min": minutes only, as the dial counts them, a decimal where they are few. */
export function duration(seconds: number): string {
  return `${inMinutes(seconds, seconds < FEW ? 1 : 0)} min`;
}

/** "0.1", "61.0": a column of minutes. What takes any time at all takes a tenth of a minute. */
export function inMinutes(seconds: number, decimals = 1): string {
  const least = seconds > 0 ? 0.1 : 0;
  return Math.max(seconds / 60, least).toFixed(decimals);
}

/** Below this a decimal tells something; s. */
const FEW = 570;

const NUMERALS: readonly (readonly [number, string])[] = [
  [10, 'X'],
  [9, 'IX'],
  [5, 'V'],
  [4, 'IV'],
  [1, 'I'],
];

/** 1 is I, 4 is IV, 12 is XII: what stands on a dial. */
export function numeral(count: number): string {
  let rest = count;
  let text = '';
  for (const [value, letters] of NUMERALS) {
    while (rest >= value) {
      text += letters;
      rest -= value;
    }
  }
  return text;
}

/** Numerals of a rising list of counts, neighbours drawn together: "I, III-V". */
export function numeralList(counts: readonly number[]): string {
  const parts: string[] = [];
  for (let i = 0; i < counts.length; i++) {
    const first = counts[i] ?? 0;
    let last = first;
    while (counts[i + 1] === last + 1) {
      last++;
      i++;
    }
    parts.push(
      last > first + 1
        ? `${numeral(first)}–${numeral(last)}`
        : last > first
          ? `${numeral(first)}, ${numeral(last)}`
          : numeral(first),
    );
  }
  return parts.join(', ');
}

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** With a capital and a full stop, where it has neither. */
export function sentence(text: string): string {
  const trimmed = capitalised(text.trim());
  return /[.!?]$/.test(trimmed) ? trimmed : `${trimmed}.`;
}
