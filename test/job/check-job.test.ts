import { describe, expect, it } from 'vitest';
import { Bug } from '../../src/base/bug.ts';
import { checkJobOnMachine, type MachineFacts } from '../../src/job/check-job.ts';
import { readJob } from '../../src/job/read-job.ts';

/** A wheel of 31.47 mm over its tips, roughed by 0.5 mm at 0.03 mm: 32.03 mm of travel in Y. */
const TEXT = `
wheel: { teeth: 60, mate: { leaves: 8 }, module: 0.5, thickness: 1.5, bore: 4.0 }
blank: { material: leaded-brass, shape: sheet, size: [44, 44], holding: glue }
machine: any
cutters:
  1: { diameter: 1.0, flutes: 2, reach: 4.0 }
  30: { diameter: 0.5, flutes: 2, reach: 2.0, flute: 1.7, stick-out: 14 }
`;
const CUTS = 'cuts: { roughing: { cutter: 30, allowance: 0.03 }, finishing: { cutter: 30 } }\n';

const MACHINE: MachineFacts = {
  name: 'the machine',
  limits: {
    travel: { x: [0, 100], y: [0, 100], z: [-50, 0] },
    feedLowest: 5,
    feedHighest: 800,
    spindleLowest: 5000,
    spindleHighest: 24000,
    nut: { diameter: 19 },
  },
  words: { cutters: { change: 'by-hand', highest: 99 }, path: { roughingStrays: null } },
};

function problemsOf(more: string, machine: MachineFacts = MACHINE) {
  const job = readJob('a.yaml', TEXT + more);
  if (!job.ok) {
    throw new Bug(job.problems.map(({ message }) => message).join('\n'));
  }
  return checkJobOnMachine(job.value, machine);
}

function travel(axis: 'x' | 'y' | 'z', ends: readonly [number, number]): MachineFacts {
  return { ...MACHINE, limits: { ...MACHINE.limits, travel: { ...MACHINE.limits.travel, [axis]: ends } } };
}

it('finds nothing wrong with a job that fits', () => {
  expect(problemsOf(CUTS)).toEqual([]);
});

it('a machine that strays as far as the allowance is told of, a little less is not', () => {
  const straying = (roughingStrays: number): MachineFacts => ({
    ...MACHINE,
    words: { ...MACHINE.words, path: { roughingStrays } },
  });
  expect(problemsOf(CUTS, straying(0.029))).toEqual([]);
  expect(problemsOf(CUTS, straying(0.03))).toMatchObject([
    {
      severity: 'warning',
      message: expect.stringMatching(/strays up to 0\.03 mm .* only 0\.03 mm is left/) as unknown,
    },
  ]);
});

describe('travel', () => {
  it('is just enough, and just not (31.471 + 2 x 0.03 + 0.5 = 32.031 by hand)', () => {
    expect(problemsOf(CUTS, travel('y', [0, 32.04]))).toEqual([]);
    expect(problemsOf(CUTS, travel('y', [0, 32.02]))).toMatchObject([{ code: 'job.does-not-fit' }]);
  });
  it('in Z: from 0.1 below a sheet of 1.5 to 5 above it', () => {
    expect(problemsOf(CUTS, travel('z', [-6.6, 0]))).toEqual([]);
    expect(problemsOf(CUTS, travel('z', [-6.59, 0])).length).toBe(1);
  });
  it('counts from where zero is said to lie', () => {
    expect(problemsOf(`${CUTS}zero-at: [50, 50, -20]\n`)).toEqual([]);
    expect(problemsOf(`${CUTS}zero-at: [50, 90, -20]\n`)).toMatchObject([
      { at: { path: ['zero-at'], line: 9 } },
    ]);
    expect(problemsOf(`${CUTS}zero-at: [50, 50, -4]\n`).length).toBe(1);
  });
});

describe('what the job asks of spindle and slides', () => {
  it.each([
    ['roughing: { speed: 24000 }', 0],
    ['roughing: { speed: 24001 }', 1],
    ['roughing: { speed: 4999 }', 1],
    ['finishing: { feed: 800, plunge: 5 }', 0],
    ['finishing: { feed: 801, plunge: 4 }', 2],
  ])('%s', (asked, count) => {
    expect(problemsOf(`cuts: { ${asked} }\n`).length).toBe(count);
  });
});

describe('numbers of cutters', () => {
  const few: MachineFacts = {
    ...MACHINE,
    words: { ...MACHINE.words, cutters: { change: 'automatic', highest: 20 } },
  };
  it('do not go beyond the changer', () => {
    expect(problemsOf(CUTS, few)).toMatchObject([{ at: { path: ['cutters', '30'], line: 7 } }]);
  });
  it('do not matter where every cutter has a program of its own', () => {
    const single: MachineFacts = {
      ...MACHINE,
      words: { ...MACHINE.words, cutters: { change: 'one-program', highest: 20 } },
    };
    expect(problemsOf(CUTS, single)).toEqual([]);
  });
});

describe('the collet nut, 19 mm across', () => {
  // The path of roughing goes out to 16.02 mm; nut and air need 10 mm beside it: a clamp of radius 4 from 30.02 mm on.
  const clamp = (x: number, height: number): string =>
    TEXT.replace(
      'holding: glue',
      `holding: glue, keep-out: [{ x: ${x}, y: 0, radius: 4, height: ${height} }]`,
    );
  const found = (x: number, height: number) => {
    const job = readJob('a.yaml', clamp(x, height) + CUTS);
    return job.ok ? checkJobOnMachine(job.value, MACHINE).length : -1;
  };
  it('passes beside a high clamp that is far enough', () => {
    expect(found(30.1, 20)).toBe(0);
    expect(found(29.9, 20)).toBe(1);
  });
  it('passes over a clamp below it: 14 mm of stick-out less 0.1 under the plate', () => {
    expect(found(25, 13.8)).toBe(0);
    expect(found(25, 14)).toBe(1);
  });
});

it('hands on what did not fit before', () => {
  const small = readJob('a.yaml', TEXT.replace('[44, 44]', '[33, 33]'));
  expect(small.ok && checkJobOnMachine(small.value, MACHINE)).toMatchObject([
    { at: { path: ['blank', 'size'] } },
  ]);
});
