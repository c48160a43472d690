/**
 * What a job leaves out and what was taken for it, with the why: gathered while a job is filled in, shown on the sheet and
 * in the summary. Keys are the job's own, those of the wheel without `wheel.`: `mate.leaf`, `cutters.2.shank`.
 */
import type { Derived } from './job.ts';

export interface Notes {
  /** The given value, or the default, noted with its why. */
  readonly fill: <T>(given: T | undefined, key: string, value: T, why: string) => T;
  readonly all: () => Readonly<Record<string, Derived>>;
}

export function takeNotes(): Notes {
  const all: Record<string, Derived> = {};
  return {
    fill: (given, key, value, why) => {
      if (given !== undefined) {
        return given;
      }
      all[key] = { value: shown(value), why };
      return value;
    },
    all: () => all,
  };
}

function shown(value: unknown): number | string {
  if (typeof value === 'number') {
    return value;
  }
  return Array.isArray(value)
    ? value.join(', ')
    : typeof value === 'boolean'
      ? value
        ? 'yes'
        : 'no'
      : String(value);
}
