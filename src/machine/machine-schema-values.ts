/**
 * The kinds of value a machine file holds, each with the phrase that says what would be right. That phrase is all a person
 * gets to read of a wrong value, so it names the range and the unit. Part of `machine-schema.ts`; knows zod with it.
 */
import * as z from 'zod';

export const GWORD = /^G\d{1,3}(\.\d)?$/;
export const WORDS = /^[A-Z]\d+(\.\d+)?( [A-Z]\d+(\.\d+)?)*$/;
export const MODE = /^(UNIT|G\d{1,3}(\.\d)?)$/;
/** A yes would be believed by whoever reads the head of a program: who, on what and when are asked for, with the year. */
export const PROVED =
  /^(unproved|(?!(?:un|not\b|no\b))(?=.*\b(?:19|20|21)\d\d\b)(?=.*[A-Za-z]{2,}.* )[ -~]{10,200})$/;
export const PROVED_WORDS =
  "unproved; or who proved this file, on which machine and when, with the year, like 'the evening class, mill by the window, March 2031'";
export const MODES = 'a list of G words, with UNIT for the unit';

/** A group that is left out is read as empty, so that each safety field in it is asked for by name. */
export function group<Shape extends z.ZodRawShape>(shape: Shape) {
  return plainGroup(shape).prefault({} as never);
}

export function plainGroup<Shape extends z.ZodRawShape>(shape: Shape) {
  return z.strictObject(shape, { error: () => `a group of ${Object.keys(shape).join(', ')}` });
}

export function oneOf<const Names extends readonly [string, ...string[]]>(...names: Names) {
  return z.enum(names, { error: names.length === 1 ? names[0] : `one of ${names.join(', ')}` });
}

export function text(pattern: RegExp, error: string) {
  return z.custom<string>((v) => typeof v === 'string' && pattern.test(v), { error });
}

export function number(least: number, greatest: number, unit: string) {
  const error = `a number from ${least} to ${greatest} ${unit}`;
  return z.custom<number>((v) => typeof v === 'number' && v >= least && v <= greatest, { error });
}

export function whole(least: number, greatest: number, unit = '') {
  const error = `a whole number from ${least} to ${greatest} ${unit}`.trimEnd();
  return z.custom<number>((v) => Number.isInteger(v) && Number(v) >= least && Number(v) <= greatest, {
    error,
  });
}

export function yesNo() {
  return z.preprocess((v) => YES_NO[String(v)] ?? v, z.boolean({ error: 'yes or no' }));
}

const YES_NO: Readonly<Record<string, boolean>> = { yes: true, no: false };

/** A key with nothing after it is not `none`: it may be one that was forgotten. */
export function orNone<Inner extends z.ZodType>(inner: Inner) {
  return z.preprocess((v) => (v === 'none' ? null : v === null ? '' : v), inner.nullable());
}

export function words(pattern: RegExp, error: string) {
  return z.array(text(pattern, error), { error }).max(20, { error });
}

export function axes<Inner extends z.ZodType>(axis: Inner) {
  return group({ x: axis, y: axis, z: axis });
}

export function travel() {
  const error = 'two ends of travel in mm, [lowest, highest], within 5000 of zero, the lowest first';
  return z.custom<readonly [number, number]>(
    (v) => Array.isArray(v) && v.length === 2 && isTravel(v[0], v[1]),
    {
      error,
    },
  );
}

function isTravel(low: unknown, high: unknown): boolean {
  return typeof low === 'number' && typeof high === 'number' && low >= -5000 && low < high && high <= 5000;
}
