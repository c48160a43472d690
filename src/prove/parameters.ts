/**
 * The parameters of a program, #1 to #5399 (NISTIR 6556 §3.2.1, §3.3.2.2), and named ones where the controller has them.
 * A controller keeps them from one program to the next: what this program has not set itself is not known, and is not read.
 */
import { wholeOf } from './block.ts';

const LAST = 5399;

/** Of NISTIR 6556 Table 2, by memory: homes, the shift of G92, which work offset is on, and where all nine lie. */
const FIRST_KEPT = 5161;
const LAST_KEPT = 5386;

export interface Parameters {
  readonly numbered: Map<number, number>;
  readonly named: Map<string, number>;
}

/** Which parameter: its number, or its name. */
export type ParameterKey = number | string;

export function noParameters(): Parameters {
  return { numbered: new Map(), named: new Map() };
}

/** The number that a value means, or why it means none. */
export function parameterNumber(value: number): number | string {
  const number = wholeOf(value);
  return number === undefined || number < 1 || number > LAST
    ? `#${String(value)}: parameters are numbered 1 to ${String(LAST)}`
    : number;
}

/** What it holds, or why that is not known. */
export function parameterValue({ numbered, named }: Parameters, key: ParameterKey): number | string {
  const value = typeof key === 'number' ? numbered.get(key) : named.get(key);
  return (
    value ??
    `${nameOf(key)} is read before this program sets it: what the controller keeps there is not known`
  );
}

/** Sets it; answers why not, if so. */
export function setParameter(
  { numbered, named }: Parameters,
  key: ParameterKey,
  value: number,
): string | undefined {
  if (typeof key === 'string') {
    named.set(key, value);
    return undefined;
  }
  if (key >= FIRST_KEPT && key <= LAST_KEPT) {
    return `#${String(key)} keeps where a zero or a home lies; setting it here is not followed`;
  }
  numbered.set(key, value);
  return undefined;
}

export function nameOf(key: ParameterKey): string {
  return typeof key === 'number' ? `#${String(key)}` : `#<${key.toLowerCase()}>`;
}
