/**
 * Problems with their file, line and column, in the order of the lines. A value that the job leaves out is shown at the key it
 * would stand under. Cutters may stand in a file of their own.
 */
import type { Problem } from '../base/problem.ts';
import type { Spot, YamlPath, YamlText } from '../base/read-yaml.ts';
import { showPath } from '../base/show-problem.ts';
import type { Job } from './job.ts';

export interface PlacedText {
  readonly file: string;
  readonly yaml: YamlText;
}

export function placeProblems(
  problems: readonly Problem[],
  job: PlacedText,
  cutters: PlacedText | undefined,
): readonly Problem[] {
  const placed = problems.map((problem) => placedOne(problem, job, cutters));
  return placed.toSorted((a, b) => lineOf(a) - lineOf(b));
}

function placedOne(problem: Problem, job: PlacedText, cutters: PlacedText | undefined): Problem {
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

/** The places of all values of a file, for problems that are found when its text is no longer at hand. */
export function spotsOf({ yaml }: PlacedText): Readonly<Record<string, Spot>> {
  const spots: Record<string, Spot> = {};
  const walk = (value: unknown, path: YamlPath): void => {
    spots[showPath(path)] = yaml.placeOf(path);
    if (typeof value === 'object' && value !== null) {
      for (const [key, inner] of Object.entries(value)) {
        walk(inner, [...path, Array.isArray(value) ? Number(key) : key]);
      }
    }
  };
  walk(yaml.value, []);
  return spots;
}

/** A problem at a value of the job, with its line; a value that is left out is shown at the group it belongs to. */
export function placeInJob(problem: Problem, job: Pick<Job, 'file' | 'spots'>): Problem {
  const { at } = problem;
  if (at.kind !== 'value' || at.line !== undefined || (at.file !== '' && at.file !== job.file)) {
    return problem;
  }
  const groups = at.path.map((_, left) => at.path.slice(0, at.path.length - left));
  // A job that leaves the cuts out altogether has them follow from its cutters.
  for (const path of [...groups, ...(at.path[0] === 'cuts' ? [['cutters']] : []), []]) {
    const spot = job.spots?.[showPath(path)];
    if (spot !== undefined) {
      return { ...problem, at: { ...at, file: job.file, ...spot } };
    }
  }
  return { ...problem, at: { ...at, file: job.file } };
}

/** Problems of something that a value of the job names, at the line that names it. */
export function placeAt(
  problems: readonly Problem[],
  path: readonly string[],
  job: Pick<Job, 'file' | 'spots'>,
): readonly Problem[] {
  return problems.map((problem) =>
    problem.at.kind === 'file'
      ? placeInJob({ ...problem, at: { kind: 'value', file: '', path } }, job)
      : problem,
  );
}
