import { expect, it } from 'vitest';
import { describeMachine } from '../../src/machine/describe-machine.ts';
import { changedMachine, postMachine } from '../support/post-machines.ts';
import { POSTS } from './read-posts.ts';

it('says what a controller manual would be searched for', () => {
  const text = describeMachine(postMachine('din-66025')).join('\n');
  expect(text).toContain('G71 G17 G40 G54 G60 G80 G90 G94, one a block');
  expect(text).toContain('I J from zero');
  expect(text).toContain('G04 F in seconds');
  expect(text).toContain('changed by hand at a stop');
  expect(text).toContain('name after %');
});

it('writes the unit word of the unit that programs are in', () => {
  expect(describeMachine(postMachine('inch-bench-mill')).join('\n')).toContain('G20 G17 G40');
  expect(describeMachine(postMachine('bench-mill')).join('\n')).toContain('G21 G17 G40');
});

it.each(POSTS)('aligns what it says of %s and fits a terminal', (name) => {
  const [first, ...rows] = describeMachine(postMachine(name));
  expect(first).toMatch(new RegExp(`^${name}: `));
  expect(new Set(rows.map((row) => /^ {2}\S.*?\s{2,}(?=\S)/.exec(row)?.[0].length)).size).toBe(1);
  expect(rows.filter((row) => row.length > 100)).toEqual([]);
});

it('says what programs of other makers may hold', () => {
  expect(describeMachine(postMachine('bench-mill')).join('\n')).toContain(
    'parameters numbered, G10, G92, G93',
  );
  const looping = {
    parameters: 'numbered',
    setZero: [],
    inverseTime: false,
    subprograms: 'M98',
    loops: 'O-words',
  } as const;
  const text = describeMachine(changedMachine(postMachine('lines-only'), { language: looping })).join('\n');
  expect(text).toContain('parameters numbered, subprograms by M98, loops by O-words');
  expect(describeMachine(postMachine('lines-only')).join('\n')).toMatch(/reads too +nothing more/);
});

it('says what is not there', () => {
  const bare = changedMachine(postMachine('lines-only'), { dwell: { letter: 'none', unit: 'seconds' } });
  const text = describeMachine(bare).join('\n');
  for (const line of [
    'no dwell',
    'no cycles',
    'one zero only',
    'no %',
    'none: chords within 0.0005 mm',
    'by hand, 8000',
  ]) {
    expect(text).toContain(line);
  }
});
