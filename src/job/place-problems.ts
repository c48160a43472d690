/**
 * Problems with their file, line and column, in the order of the lines. A value that the job leaves out is shown at the key it
 * would stand under. Cutters may stand in a file of their own.
 */
import type { Problem } from '../base/problem.ts';
import type { YamlText } from '../base/read-yaml.ts';

export interface PlacedText {
  readonly file: string;
  readonly yaml: YamlText;
}

export function placeProblems(
  problems: readonly Problem[],
  job: PlacedText,
  cutters: PlacedText | undefined,
): readonly Problem[] {
  const placed = problems.map((problem) => placed1(problem, job, cutters));
  return placed.toSorted((a, b) => lineOf(a) - lineOf(b));
}

function placed1(problem: Problem, job: PlacedText, cutters: PlacedText | undefined): Problem {
  const { at } = problem;
  if (at.kind !== 'value' || at.file !== '') {
    return problem;
  }
  const inCutters = cutters !== undefined && at.path[0] === 'cutters' && at.path.length > 1;
  const { file, yaml } = inCutters ? cutters : job;
  const parent = at.path.slice(0, -1);
  const spot =
    problem.code === 'job.unknown-key'
      ? yaml.placeOfKey(parent, String(at.path.at(-1) ?? ''))
      : yaml.placeOf(at.path);
  const message = problem.message.endsWith('.') ? problem.message : `${problem.message}.`;
  return { ...problem, message, at: { ...at, file, ...spot } };
}

function lineOf({ at }: Problem): number {
  return at.kind === 'value' ? (at.line ?? 0) * COLUMNS + (at.column ?? 0) : 0;
}

/** More than any line has. */
const COLUMNS = 1e6;
