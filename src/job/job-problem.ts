/** A problem of the job at one of its values; the file and the line are filled in by `place-problems.ts`. */
import type { Problem } from '../base/problem.ts';
import type { ProblemCode } from '../base/problem-codes.ts';

export interface JobProblem {
  readonly path: readonly (string | number)[];
  readonly message: string;
  readonly hint: string;
  /** Left out: two values contradict each other. */
  readonly code?: ProblemCode;
  readonly severity?: Problem['severity'];
}

export function jobProblem(problem: JobProblem): Problem {
  const { path, message, hint, code = 'job.conflict', severity = 'error' } = problem;
  return { code, severity, message, hint, at: { kind: 'value', file: '', path } };
}
