import { expect, it } from 'vitest';
import { listFields } from '../../src/machine/list-fields.ts';
import { postMachine } from '../support/post-machines.ts';
import { leavesOf, treeOf } from './machine-tree.ts';

it('lists every field that the file gives, by its path there', () => {
  const paths = listFields(postMachine('desk-four-axis')).map((line) => line.split(' ')[0]);
  const given = leavesOf(treeOf('desk-four-axis')).map((path) => path.join('.'));
  expect(given.filter((path) => !paths.includes(path))).toEqual(['format', 'description']);
});

it('writes values as a file would', () => {
  const text = listFields(postMachine('desk-four-axis')).join('\n');
  expect(text).toMatch(/^words\.arcs\.quadrants +no$/m);
  expect(text).toMatch(/^words\.positions\.top-machine-z +none$/m);
  expect(text).toMatch(/^limits\.travel\.x +\[0, 180\]$/m);
});
