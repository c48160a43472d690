/**
 * The kinds of value a machine file holds, each with the phrase that says what would be right. That phrase is all a person
 * gets to read of a wrong value, so it names the range and the unit. Part of `machine-schema.ts`; knows zod with it.
 */
import { z } from 'zod';

export const GWORD = /^G\d{1,3}(\.\d)?$/;
export const WORDS = /^[A-Z]\d+(\.\d+)?( [A-Z]\d+(\.\d+)?)*$/;
export const MODE = /^(UNIT|G\d{1,3}(\.\d)?)$/;
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
  return z.string({ error }).regex(pattern, { error });
}

export function number(least: number, greatest: number, unit: string) {
  const error = `a number from ${least} to ${greatest} ${unit}`;
  return z.number({ error }).min(least, { error }).max(greatest, { error });
}

export function whole(least: number, greatest: number, unit = '') {
  const error = `a whole number from ${least} to ${greatest} ${unit}`.trimEnd();
  return z.number({ error }).refine((n) => Number.isInteger(n) && n >= least && n <= greatest, { error });
}

const YES_NO: Readonly<Record<string, boolean>> = { yes: true, no: false };

export function yesNo() {
  return z.preprocess((v) => YES_NO[String(v)] ?? v, z.boolean({ error: 'yes or no' }));
}

export function orNone<Inner extends z.ZodType>(inner: Inner) {
  return z.preprocess((v) => (v === 'none' ? null : v), inner.nullable());
}

export function words(pattern: RegExp, error: string) {
  return z.array(text(pattern, error), { error }).max(20, { error });
}

export function axes<Inner extends z.ZodType>(inner: () => Inner) {
  return group({ x: inner(), y: inner(), z: inner() });
}

export function travel() {
  const error = 'two ends of travel in mm, [lowest, highest], within 5000 of zero, the lowest first';
  const end = z.number({ error }).min(-5000, { error }).max(5000, { error });
  return z.tuple([end, end], { error }).refine(([low, high]) => low < high, { error });
}
