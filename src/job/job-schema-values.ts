/**
 * The kinds of single values a job file may hold, each as a zod schema that says itself what is wrong: the value, the
 * range and its unit. Plain lengths and feeds are in the job's unit, a value may say its own; what comes out is mm and
 * mm/min. Descriptions and examples go into the schema, for the starter job and for editors.
 * Split off `job-schema.ts`; with it the only file of job/ that knows zod.
 */
import * as z from 'zod';
import { millimetresPer, type LengthUnit } from '../base/units.ts';
import { LENGTH_UNITS, readNumber, showValue, tidy } from './read-number.ts';
import { figure, showRange } from './show-length.ts';

/** What a value is, in a few words, and one as it would be written. */
export interface Words {
  readonly says: string;
  readonly example: string | number;
}

export interface Range {
  readonly least: number;
  readonly most: number;
}

export type Read<T> =
  { readonly value: T } | { readonly message: string; readonly hint?: string | undefined };

/** A value that is read by `read`, whatever stands there; missing and empty are said the same way for all. */
export function valueOf<T>(words: Words, json: Record<string, unknown>, read: (value: unknown) => Read<T>) {
  return z
    .transform((value: unknown, context): T => {
      const result = value === undefined || value === null ? absent(value, words) : read(value);
      if ('value' in result) {
        return result.value;
      }
      context.addIssue({
        code: 'custom',
        message: result.message,
        params: { hint: result.hint ?? (words.says.endsWith('?') ? words.says : `${words.says}.`) },
      });
      return z.NEVER;
    })
    .register(z.globalRegistry, { description: words.says, examples: [words.example], ...json });
}

function absent(value: unknown, words: Words): { message: string; hint: string } {
  return {
    message: value === null ? 'nothing stands behind the colon.' : 'is missing.',
    hint: `${words.says}; for example ${words.example}.`,
  };
}

/** mm; plain numbers in the job's unit. */
export function lengthOf(words: Words, range: Range, unit: LengthUnit) {
  return valueOf(words, { type: ['number', 'string'] }, (value) =>
    measured(value, { ...range, per: '', unit }),
  );
}

/** mm/min; plain numbers in the job's unit a minute. */
export function feedOf(words: Words, range: Range, unit: LengthUnit) {
  return valueOf(words, { type: ['number', 'string'] }, (value) =>
    measured(value, { ...range, per: '/min', unit }),
  );
}

/** The same outside a schema, for values that may also be something else. */
export function lengthIn(value: unknown, range: Range, unit: LengthUnit): Read<number> {
  return measured(value, { ...range, per: '', unit });
}

/** A list of lengths, as many as the example has. */
export function pointIn(
  value: unknown,
  example: string,
  range: Range,
  unit: LengthUnit,
): Read<readonly number[]> {
  const count = example.split(',').length;
  if (!Array.isArray(value) || value.length !== count) {
    const held = Array.isArray(value) ? `a list of ${value.length}` : showValue(value);
    const message = `${held} is not a list of ${count} numbers. Use the form ${example}.`;
    const more = Array.isArray(value) && value.length > count;
    return { message, hint: more ? 'Decimals follow a point: 44.5, not 44,5.' : undefined };
  }
  const numbers: number[] = [];
  for (const one of value) {
    const read = lengthIn(one, range, unit);
    if (!('value' in read)) {
      return read;
    }
    numbers.push(read.value);
  }
  return { value: numbers };
}

interface Measure extends Range {
  readonly per: '' | '/min';
  readonly unit: LengthUnit;
}

function measured(value: unknown, { least, most, per, unit }: Measure): Read<number> {
  const said = readNumber(value);
  const range = `${showRange(least, most, unit)}${per}`;
  if (!said.ok) {
    return { message: `${said.message} Use ${range}.`, hint: said.hint };
  }
  const name =
    said.unit?.endsWith(per) === true ? said.unit.slice(0, said.unit.length - per.length) : said.unit;
  const factor = name === undefined ? millimetresPer(unit) : LENGTH_UNITS[name];
  if (factor === undefined) {
    const hint = `Units are mm${per} and inch${per}: "0.5 mm${per}", "3/64 inch${per}".`;
    return { message: `${showValue(value)} has a unit that is not known here.`, hint };
  }
  const inMm = unit === 'inch' && name === undefined && said.number >= least && said.number <= most;
  const result = bounded(tidy(said.number * factor), showValue(value), { least, most }, range);
  return 'message' in result && inMm
    ? { ...result, hint: `In mm? Then write ${showValue(value)} mm${per}.` }
    : result;
}

/** A number without unit, or in modules. */
export function numberOf(words: Words, range: Range, unit: '' | ' modules' | ' degrees' | ' a minute' = '') {
  const json = { type: 'number', minimum: range.least, maximum: range.most };
  return valueOf(words, json, (value) => {
    const said = readNumber(value);
    const shown = `${range.least} to ${range.most}${unit}`;
    if (!said.ok) {
      return { message: `${said.message} Use ${shown}.`, hint: said.hint };
    }
    if (said.unit !== undefined) {
      return { message: `${showValue(value)}: no unit belongs here. Use ${shown}.` };
    }
    return bounded(said.number, showValue(value), range, shown);
  });
}

export function countOf(words: Words, range: Range) {
  const json = { type: 'integer', minimum: range.least, maximum: range.most };
  return valueOf(words, json, (value) => {
    const shown = `${range.least} to ${range.most}`;
    const said = readNumber(value);
    if (!said.ok || said.unit !== undefined || typeof value !== 'number') {
      const hint =
        said.ok && said.unit === undefined ? `Write ${figure(said.number, 4)} without quotes.` : undefined;
      return { message: `${showValue(value)} is not a whole number. Use ${shown}.`, hint };
    }
    return Number.isInteger(value)
      ? bounded(value, String(value), range, shown)
      : { message: `${value} is not a whole number. Use ${shown}.` };
  });
}

function bounded(value: number, written: string, { least, most }: Range, shown: string): Read<number> {
  if (value < least || value > most) {
    return { message: `${written} is too ${value < least ? 'small' : 'large'}. Use ${shown}.` };
  }
  return { value: value === 0 ? 0 : value };
}

/** yes or no; YAML's own true and false too. */
export function yesNo(words: Words) {
  return valueOf(words, { enum: [true, false, 'yes', 'no'] }, (value): Read<boolean> => {
    const answer =
      value === true || value === 'yes' ? true : value === false || value === 'no' ? false : undefined;
    return answer === undefined
      ? { message: `${showValue(value)} is neither yes nor no.` }
      : { value: answer };
  });
}

export function choiceOf<const T extends string>(words: Words, choices: readonly T[]) {
  return valueOf(words, { enum: choices }, (value): Read<T> => {
    const choice = choices.find((one) => one === value);
    return choice === undefined
      ? { message: `${showValue(value)} is not known here. Use ${listed(choices)}.` }
      : { value: choice };
  });
}

export function textOf(words: Words, longest: number) {
  return valueOf(words, { type: 'string', maxLength: longest }, (value): Read<string> => {
    if (typeof value === 'object' || value === '') {
      return { message: `${value === '' ? 'an empty text' : showValue(value)} is no text to be used here.` };
    }
    const text = String(value);
    return text.length > longest
      ? { message: `the text is too long: ${text.length} letters, at most ${longest}.` }
      : { value: text };
  });
}

/** `a, b or c` */
export function listed(words: readonly string[]): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} or ${words.at(-1) ?? ''}`;
}
