import { expect, it } from 'vitest';
import { showProblem } from '../../src/base/show-problem.ts';
import type { Problem } from '../../src/base/problem.ts';

const problem: Problem = {
  code: 'job.invalid',
  severity: 'error',
  message: '5 is too small. Use 6 to 400.',
  at: { kind: 'value', file: 'a.yaml', path: ['blank', 'keep-out', 1, 'x'], line: 5, column: 10 },
};

it('gives file, line, column and path, lists counted from 1', () => {
  expect(showProblem(problem)).toBe('a.yaml:5:10 blank.keep-out[2].x: 5 is too small. Use 6 to 400.');
});

it('marks a warning and puts the hint beneath', () => {
  const shown = showProblem({ ...problem, severity: 'warning', hint: 'Count again.' });
  expect(shown).toBe(
    'a.yaml:5:10 blank.keep-out[2].x: warning: 5 is too small. Use 6 to 400.\n  Count again.',
  );
});

it.each<[Problem['at'], string]>([
  [{ kind: 'file', file: 'a.yaml' }, 'a.yaml: m'],
  [{ kind: 'program', file: 'a.nc', line: 7 }, 'a.nc:7: m'],
  [{ kind: 'part', x: 1, y: -2 }, 'at X1.000 Y-2.000: m'],
  [{ kind: 'value', file: 'a.yaml', path: [] }, 'a.yaml: m'],
])('%j', (at, shown) => {
  expect(showProblem({ ...problem, message: 'm', at })).toBe(shown);
});
