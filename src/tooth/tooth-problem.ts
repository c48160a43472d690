/**
 * A problem of the form, placed at the value of the job that it comes from. The file's name and the line are filled in by
 * whoever read the job.
 */
import { fixedDecimals } from '../base/fixed-decimals.ts';
import type { Problem } from '../base/problem.ts';
import type { ProblemCode } from '../base/problem-codes.ts';

export interface ToothProblem {
  readonly code: ProblemCode;
  readonly severity?: Problem['severity'];
  /** Keys of the job file below `wheel`. */
  readonly key: readonly (string | number)[];
  readonly message: string;
  readonly hint: string;
}

export function toothProblem({ code, severity = 'error', key, message, hint }: ToothProblem): Problem {
  return { code, severity, message, hint, at: { kind: 'value', file: '', path: ['wheel', ...key] } };
}

/** A length in a message: 0.1 um is the finest that anyone measures. */
export function mm(length: number): string {
  return `${Number(fixedDecimals(length, 4))} mm`;
}
