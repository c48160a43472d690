/**
 * A number as people write it: `0.5`, `1e-2`, `3/64`, `2 23/32`, with a unit of length behind it or not.
 * In: a value of the job file (YAML leaves what is no plain number as text). Out: the number and the unit it says,
 * or what is wrong with it and how to write it.
 */
import { MM_PER_INCH } from '../base/units.ts';

export type Said =
  | { readonly ok: true; readonly number: number; readonly unit: string | undefined }
  | { readonly ok: false; readonly message: string; readonly hint: string | undefined };

const DECIMAL_COMMA = /^[-+]?\d+,\d+/;
const PLAIN = /^([-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?)\s*([a-z"/µ]*)$/i;
const FRACTION = /^([-+]?)(?:(\d+)\s+)?(\d+)\s*\/\s*(\d+)\s*([a-z"/µ]*)$/i;

export function readNumber(value: unknown): Said {
  if (typeof value === 'number') {
    return { ok: true, number: value, unit: undefined };
  }
  if (typeof value !== 'string') {
    return { ok: false, message: `${showValue(value)} is not a number.`, hint: undefined };
  }
  const text = value.trim();
  if (DECIMAL_COMMA.test(text)) {
    const hint = `Write ${text.replace(',', '.')}: decimals follow a point.`;
    return { ok: false, message: `${text} has a decimal comma.`, hint };
  }
  const plain = PLAIN.exec(text);
  if (plain !== null) {
    return { ok: true, number: Number(plain[1]), unit: unitOf(plain[2]) };
  }
  const fraction = FRACTION.exec(text);
  if (fraction !== null && Number(fraction[4]) !== 0) {
    const size = Number(fraction[2] ?? 0) + Number(fraction[3]) / Number(fraction[4]);
    return { ok: true, number: fraction[1] === '-' ? -size : size, unit: unitOf(fraction[5]) };
  }
  return { ok: false, message: `${showValue(value)} is not a number.`, hint: undefined };
}

function unitOf(text: string | undefined): string | undefined {
  return text === undefined || text === '' ? undefined : text.toLowerCase();
}

/** Millimetres in one of a unit that a job file may say. */
export const LENGTH_UNITS: Readonly<Record<string, number>> = {
  mm: 1,
  inch: MM_PER_INCH,
  inches: MM_PER_INCH,
  in: MM_PER_INCH,
  '"': MM_PER_INCH,
};

/** A converted value as it would be written: 3/16 inch is 4.7625 mm, not 4.762499999999999. Fifteen digits are kept. */
export function tidy(value: number): number {
  return Number(value.toPrecision(15));
}

/** A value as a message shows it: never long, never more than one line. */
export function showValue(value: unknown): string {
  if (Array.isArray(value)) {
    return 'a list';
  }
  if (typeof value === 'object' && value !== null) {
    return 'a group of keys';
  }
  if (typeof value === 'string' && value.trim() === '') {
    return 'an empty text';
  }
  const text = typeof value === 'string' ? value.replaceAll(/\s+/g, ' ') : String(value);
  return text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text;
}

const LONGEST = 40;
