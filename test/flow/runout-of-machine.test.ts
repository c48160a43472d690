/** A cutter whose runout nobody measured is no truer than the spindle it sits in. */
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { withRunoutOfMachine } from '../../src/flow/runout-of-machine.ts';
import { readJob } from '../../src/job/read-job.ts';
import type { Machine } from '../../src/machine/machine.ts';
import { postMachine } from '../support/post-machines.ts';

const SAMPLE = readFileSync(new URL('../../samples/third-wheel.yaml', import.meta.url), 'utf8');

function machineOf(runout: number): Machine {
  const machine = postMachine('desk-three-axis');
  return { ...machine, limits: { ...machine.limits, runout } };
}

function runouts(text: string, runout: number): Record<string, unknown> {
  const read = readJob('a.yaml', text);
  if (!read.ok) {
    throw new Error(read.problems.map(({ message }) => message).join());
  }
  const job = withRunoutOfMachine(read.value, machineOf(runout));
  const { bore, crossings, roughing, finishing } = job.cuts;
  return {
    listed: job.setup.cutters.map((cutter) => cutter.runout),
    used: [bore, crossings, roughing, finishing].map(({ cutter }) => [cutter.number, cutter.runout]),
    said: job.derived['cutters.2.runout']?.value,
  };
}

it('takes the machine file’s where it is the greater and the job says nothing', () => {
  const [one, two] = [
    [1, 0.02],
    [2, 0.02],
  ];
  expect(runouts(SAMPLE, 0.02)).toEqual({ listed: [0.02, 0.02], used: [one, one, two, two], said: 0.02 });
});

it('keeps the cautious default where the spindle is said to run truer', () => {
  expect(runouts(SAMPLE, 0.003)).toMatchObject({ listed: [0.01, 0.01], said: 0.01 });
});

it('keeps what the job says', () => {
  const said = SAMPLE.replace(/^( +2: \{)/m, '$1 runout: 0.004,');
  expect(said).not.toBe(SAMPLE);
  expect(runouts(said, 0.02)).toMatchObject({ listed: [0.02, 0.004], said: undefined });
});
