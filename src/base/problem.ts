/**
 * What goes wrong is a value: a code of the closed list, a sentence with both numbers and their units, a
 * place to look, and a way out.
 */
import type { ProblemCode } from './problem-codes.ts';

export interface Problem {
  readonly code: ProblemCode;
  readonly severity: 'error' | 'warning';
  /** What is wrong, with the value, the limit and their unit. */
  readonly message: string;
  /** What to change. */
  readonly hint?: string;
  readonly at: Place;
}

/** Where to look: a file, a value in the job or machine file, a line of a program, or a spot on the part. */
export type Place =
  | { readonly kind: 'file'; readonly file: string }
  | {
      readonly kind: 'value';
      readonly file: string;
      /** Keys as they are written in the file, from the root: ['wheel', 'teeth']. */
      readonly path: readonly (string | number)[];
      /** 1-based; filled in by whoever knows the text. */
      readonly line?: number;
      readonly column?: number;
    }
  | {
      readonly kind: 'program';
      readonly file: string;
      readonly line: number;
      readonly x?: number;
      readonly y?: number;
    }
  | { readonly kind: 'part'; readonly x: number; readonly y: number };

/** Either a value (perhaps with warnings) or the reasons there is none. */
export type Outcome<T> =
  | { readonly ok: true; readonly value: T; readonly problems: readonly Problem[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };

export function success<T>(value: T, problems: readonly Problem[] = []): Outcome<T> {
  return { ok: true, value, problems };
}

export function failure<T>(problems: readonly Problem[]): Outcome<T> {
  return { ok: false, problems };
}
