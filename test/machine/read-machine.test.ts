import { expect, it } from 'vitest';
import { showProblem } from '../../src/base/show-problem.ts';
import { POSTS, readPost } from './read-posts.ts';

it.each(POSTS)('%s is read without an error or a warning', (name) => {
  const outcome = readPost(name);
  expect(outcome.problems.map(showProblem)).toEqual([]);
  expect(outcome.ok).toBe(true);
});
