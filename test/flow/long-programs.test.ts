/** A job of fifty hours says so, with what would shorten it. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { showProblem } from '../../src/base/show-problem.ts';
import { longPrograms } from '../../src/flow/long-programs.ts';
import { readJob } from '../../src/job/read-job.ts';
import type { SheetPass } from '../../src/report/facts.ts';
import { cutText } from '../support/cut-text.ts';

const TEXT = readFileSync(join(import.meta.dirname, '../golden/small-wheel.yaml'), 'utf8');

function wordsOf(edit: (text: string) => string, hours: number): string {
  const job = readJob('small-wheel.yaml', edit(TEXT));
  if (!job.ok) {
    return job.problems.map(showProblem).join('\n');
  }
  const pass = { cutter: 2, speed: 20000, plunge: 5, depth: 1.5, why: [] };
  const passes: readonly SheetPass[] = [
    { ...pass, name: 'roughing', feed: 5, step: 0.001, laps: [1500, 1500], seconds: (hours - 1) * 3600 },
    { ...pass, name: 'finishing', feed: 60, step: 1.5, laps: [1, 1], seconds: 3600 },
  ];
  const programs = [{ file: 'small-wheel-2.nc', seconds: hours * 3600, passes: ['roughing', 'finishing'] }];
  return longPrograms(job.value, programs, passes).map(showProblem).join('\n');
}

describe('a program that takes longer than a working day', () => {
  it('is warned of, with the pass that takes most of it and what the job itself slows down', () => {
    const slow = (text: string): string =>
      text.replace('roughing: { cutter: 2 }', 'roughing: { cutter: 2, feed: 5, step: 0.001 }');
    expect(wordsOf(slow, 51)).toBe(
      'small-wheel.yaml:29:13 cuts.roughing: warning: small-wheel-2.nc takes 51.0 h, longer than a working day of 8 h: somebody has to stay with it all the time.\n' +
        '  Most of it is roughing with cutter 2, 50.0 h: 1500 laps of 0.001 mm, 5 mm a minute. Leave step and feed of roughing out: they then follow from cutter, material and machine.',
    );
  });
  it('where the job slows nothing down, another cutter is the way out', () => {
    expect(wordsOf((text) => text, 9)).toMatch(
      /A thicker cutter, or one that sticks out less, takes deeper laps\.$/,
    );
  });
  it('one of eight hours is let be', () => {
    expect(wordsOf((text) => text, 8)).toBe('');
  });
});

it('a small wheel roughed at a crawl is warned of where it is cut, and on its sheet', () => {
  const slow = TEXT.replace(
    'roughing: { cutter: 2 }',
    'roughing: { cutter: 2, feed: 5, step: 0.002 }',
  ).replace('thickness: 0.15', 'thickness: 0.2');
  const made = cutText('slow', slow);
  expect(made.exit).toBe(0);
  expect(made.problems.map(({ code, severity }) => [code, severity])).toEqual([['toolpath.long', 'warning']]);
  expect(made.files.find(({ name }) => name === 'slow.html')?.text).toMatch(/longer than a working day/);
});
