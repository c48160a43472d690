import { expect, it } from 'vitest';
import { longestBlock } from '../../src/machine/longest-block.ts';
import { postMotions } from '../../src/post/post-motions.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { headerFacts } from '../support/header-facts.ts';
import { changedMachine, postMachine } from '../support/post-machines.ts';
import { POSTS } from './read-posts.ts';

it('counts every sign of the longest arc [counted by hand: G2 X-200.0000 Y-200.0000 Z-200.0000 I-200.0000 J-200.0000 F800.0]', () => {
  expect(longestBlock(postMachine('desk-three-axis'))).toBe(
    'G2 X-200.0000 Y-200.0000 Z-200.0000 I-200.0000 J-200.0000 F800.0'.length,
  );
});

it('counts the block number and leaves out centres and blanks where there are none', () => {
  const lines = postMachine('lines-only');
  expect(longestBlock(lines)).toBe('G01X-300.0000Y-300.0000Z-300.0000F600.'.length);
  expect(
    longestBlock(changedMachine(lines, { blocks: { ...lines.words.blocks, numbers: 'all', last: 9999 } })),
  ).toBe('N9999G01X-300.0000Y-300.0000Z-300.0000F600.'.length);
});

it.each(POSTS)('no move that is written in %s is longer', (name) => {
  const machine = postMachine(name);
  for (const { motion } of postMotions(machine)) {
    const written = writeProgram({
      machine,
      name: 'x',
      suffix: '',
      label: 1,
      motion,
      header: headerFacts(motion),
    });
    const lines = written.ok
      ? written.value.text.split(/\r?\n/).filter((line) => /^[^(;]*[XYZ]/.test(line))
      : [];
    expect(lines.length).toBeGreaterThan(3);
    expect(Math.max(...lines.map((line) => line.length))).toBeLessThanOrEqual(longestBlock(machine));
  }
});
