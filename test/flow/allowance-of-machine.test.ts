/** Where the job says no allowance, roughing leaves more than the machine strays from the path meanwhile. */
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { withAllowanceOfMachine } from '../../src/flow/allowance-of-machine.ts';
import { readJob } from '../../src/job/read-job.ts';
import { cutText } from '../support/cut-text.ts';
import { postMachine } from '../support/post-machines.ts';

const SAMPLE = readFileSync(new URL('../../samples/third-wheel.yaml', import.meta.url), 'utf8');
const GIVEN = SAMPLE.replace('roughing: { cutter: 2 }', 'roughing: { cutter: 2, allowance: 0.022 }');

function allowance(text: string, strays: number | null): number {
  const read = readJob('a.yaml', text);
  if (!read.ok) {
    throw new Error(read.problems.map(({ message }) => message).join());
  }
  const machine = postMachine('bench-mill');
  const path = { ...machine.words.path, roughingStrays: strays };
  const changed = withAllowanceOfMachine(read.value, { ...machine, words: { ...machine.words, path } });
  return changed.cuts.roughing.allowance;
}

it('half again what it strays, where the usual allowance is less', () => {
  expect(allowance(SAMPLE, 0.02)).toBeCloseTo(0.03, 12);
  expect(allowance(SAMPLE, 0.01)).toBe(0.025);
  expect(allowance(SAMPLE, null)).toBe(0.025);
});

it('what the job itself says stays, and is warned of', () => {
  expect(allowance(GIVEN, 0.02)).toBe(0.022);
});

it('a fine cutter on a machine that rounds its corners needs no warning', () => {
  const onMill = (text: string): string => text.replace(/^machine: .*/m, 'machine: bench-mill');
  const codes = (text: string): readonly string[] =>
    cutText('third-wheel', text).problems.map(({ severity, at }) =>
      at.kind === 'value' ? `${severity} ${at.path.join('.')}` : severity,
    );
  expect(codes(onMill(SAMPLE))).toEqual([]);
  expect(codes(onMill(GIVEN.replace('0.022', '0.019')))).toEqual(['warning cuts.roughing.allowance']);
});
