/** How the report writes numbers, times and names: every figure with its unit, the same in every country. */
import { MM_PER_INCH } from '../base/units.ts';

/** Text as it may stand between tags or in a quoted attribute. */
export function escapeText(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');
}

/** A number without an exponent, without -0, with at most so many decimals and no trailing noughts. */
export function plain(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}

/** A number with just so many decimals. */
export function fixed(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  return Number(text) === 0 ? text.replace('-', '') : text;
}

export function millimetres(value: number, decimals = 3): string {
  return `${fixed(value, decimals)} mm`;
}

/** In mm, and in inches beside it. */
export function bothUnits(value: number): string {
  return `${fixed(value, 3)} mm (${fixed(value / MM_PER_INCH, 4)} in)`;
}

export function micrometres(value: number, decimals = 2): string {
  return `${fixed(value * 1000, decimals)} µm`;
}

/** "45 s", "12 min", "1 h 05 min". */
export function duration(seconds: number): string {
  if (seconds < 90) {
    return `${Math.max(Math.round(seconds), 0)} s`;
  }
  const minutes = Math.round(seconds / 60);
  return minutes < 90
    ? `${minutes} min`
    : `${Math.floor(minutes / 60)} h ${String(minutes % 60).padStart(2, '0')} min`;
}

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

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
