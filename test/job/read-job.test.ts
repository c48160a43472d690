import { placeInJob } from '../../src/job/place-problems.ts';
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { Bug } from '../../src/base/bug.ts';
import { failure, success } from '../../src/base/problem.ts';
import type { Job } from '../../src/job/job.ts';
import { showProblem } from '../../src/base/show-problem.ts';
import { readJob } from '../../src/job/read-job.ts';

const SAMPLES = new URL('../../samples/', import.meta.url);

const PLAIN = `
wheel:
  teeth: 60
  mate: { leaves: 8 }
  module: 0.5
  thickness: 1.5
  bore: 4.0
blank:
  material: leaded-brass
  shape: sheet
  size: [44, 44]
  holding: glue
machine: desk-three-axis
cutters:
  1: { diameter: 1.0, flutes: 2, reach: 4.0 }
  2: { diameter: 0.5, flutes: 2, reach: 2.0, flute: 1.7 }
`;

function jobOf(text: string): Job {
  const job = readJob('folder/some wheel.yaml', text);
  if (!job.ok) {
    throw new Bug(job.problems.map(({ message }) => message).join('\n'));
  }
  return job.value;
}

function change(from: string, to: string): string {
  if (!PLAIN.includes(from)) {
    throw new Bug(`${from} is not in the plain job`);
  }
  return PLAIN.replace(from, to);
}

describe('samples', () => {
  it.each(readdirSync(SAMPLES))('%s is read without a complaint', (name) => {
    const job = readJob(name, readFileSync(new URL(name, SAMPLES), 'utf8'));
    expect(job.problems).toEqual([]);
    expect(job.ok && job.value.misfits).toEqual([]);
  });
});

describe('what is derived', () => {
  it('module from a diametral pitch: 25.4 / 50.8 = 0.5 [definition of diametral pitch]', () => {
    const job = jobOf(change('module: 0.5', 'diametral-pitch: 50.8'));
    expect(job.wheel.module).toBe(0.5);
    expect(job.derived['module']?.why).toContain('50.8');
  });
  it('module from centres: 2 x 17 / (60 + 8) = 0.5 [C = m (N + z) / 2]', () => {
    expect(jobOf(change('module: 0.5', 'centres: 17')).wheel.module).toBe(0.5);
  });
  it('centres from the module: 0.5 x 68 / 2 = 17', () => {
    expect(jobOf(PLAIN).wheel.centres).toBe(17);
  });
  it('depth of the mate: addendum 1.47137 and 0.40 [table of theoretical addenda x 0.95; 0.40 from memory]', () => {
    const { mate } = jobOf(PLAIN).wheel;
    expect(mate.kind === 'pinion' && mate.dedendum).toBeCloseTo(1.87137, 5);
  });
  it('every value that is left out, with a why', () => {
    const { derived } = jobOf(PLAIN);
    expect(Object.keys(derived)).toEqual(
      expect.arrayContaining([
        'mate.leaf',
        'mate.tip',
        'mate.dedendum',
        'height',
        'centres',
        'blank.thickness',
        'zero',
        'cutters.1.flute',
        'cutters.1.shank',
        'cuts.order',
        'cuts.roughing.cutter',
        'cuts.below',
      ]),
    );
    expect(Object.values(derived).filter(({ why }) => why.length < 5)).toEqual([]);
  });
  it('nothing that is given', () => {
    const { derived } = jobOf(
      change('{ leaves: 8 }', '{ leaves: 8, leaf: 1.1, tip: semicircle, dedendum: 2 }'),
    );
    expect(Object.keys(derived).filter((key) => key.startsWith('mate'))).toEqual([]);
  });
  it('the name from the file, without folder and ending', () => {
    expect(jobOf(PLAIN)).toMatchObject({ name: 'some wheel', title: 'some wheel' });
  });
});

describe('units', () => {
  it('plain lengths in inches become mm; the module stays mm; a value may say its own unit', () => {
    const inch = `length: inch\n${PLAIN}`
      .replace('thickness: 1.5', 'thickness: 1/16')
      .replace('bore: 4.0', 'bore: 4.0 mm')
      .replace('[44, 44]', '[1.75, 44.45 mm]')
      .replace('diameter: 1.0, flutes: 2, reach: 4.0', 'diameter: 0.04, flutes: 2, reach: 0.15')
      .replace(
        'diameter: 0.5, flutes: 2, reach: 2.0, flute: 1.7',
        'diameter: 0.02, flutes: 2, reach: 0.08, flute: 0.07',
      );
    const job = jobOf(`${inch}cuts: { roughing: { cutter: 2, feed: 6, plunge: 40 mm/min } }\n`);
    expect(job.wheel).toMatchObject({ module: 0.5, thickness: 1.5875, bore: 4 });
    expect(job.setup.shape).toEqual({ kind: 'sheet', width: 44.45, height: 44.45 });
    expect(job.cuts.roughing).toMatchObject({ feed: 152.4, plunge: 40 });
    expect(job.setup.cutters[0]?.diameter).toBe(1.016);
  });
});

describe('heights', () => {
  it('zero on top: the plate lies one thickness below', () => {
    expect(jobOf(PLAIN).setup).toMatchObject({ topZ: 0, plateZ: -1.5, clearZ: 5, intoPlate: 0.1 });
  });
  it('zero on the plate', () => {
    const { setup } = jobOf(change('machine:', 'zero: plate\nmachine:'));
    expect(setup).toMatchObject({ topZ: 1.5, plateZ: 0, clearZ: 6.5 });
  });
  it('a skin: the blank is thicker by it, and nothing is cut below', () => {
    const job = jobOf(
      change('holding: glue', 'holding: skin\n  skin: 0.08').replace('machine:', 'zero: plate\nmachine:'),
    );
    expect(job.setup).toMatchObject({ topZ: 1.58, plateZ: 0, skin: 0.08, intoPlate: 0 });
    expect(job.cuts.below).toBe(0);
  });
});

describe('order', () => {
  const crossed = change(
    'bore: 4.0',
    'bore: 4.0\n  crossings: { arms: 5, arm: 2.4, rim: 1.8, hub: 9.0, corner: 1.2 }',
  );
  it('glued: bore, teeth, crossings last, so that the rim is stiff', () => {
    expect(jobOf(crossed).cuts.order).toEqual(['bore', 'roughing', 'finishing', 'crossings']);
  });
  it('on an arbor with a rim of 3.6 modules: crossings before the teeth', () => {
    const job = jobOf(crossed.replace('holding: glue', 'bored: 4.0\n  holding: arbor'));
    expect(job.cuts.order).toEqual(['crossings', 'roughing', 'finishing']);
  });
  it('on an arbor with a thin rim: teeth first', () => {
    const job = jobOf(
      crossed.replace('holding: glue', 'bored: 4.0\n  holding: arbor').replace('rim: 1.8', 'rim: 1.2'),
    );
    expect(job.cuts.order).toEqual(['roughing', 'finishing', 'crossings']);
  });
});

describe('a file of cutters', () => {
  const shared = PLAIN.replace(/cutters:[^]*$/, 'cutters: shop.yaml\n');
  it('has its own unit', () => {
    const job = readJob('a.yaml', shared, () =>
      success(
        'format: ogive-cutters/1\nlength: inch\ncutters:\n  3: { diameter: 0.02, reach: 0.08, flute: 0.07 }\n',
      ),
    );
    expect(job.ok && job.value.setup.cutters).toMatchObject([{ number: 3, diameter: 0.508, reach: 2.032 }]);
  });
  it('has its own places', () => {
    const job = readJob('a.yaml', shared, () => success('cutters:\n  3: { diameter: 0,5 mm, flute: 1 }\n'));
    expect(job.problems[0]?.at).toMatchObject({
      file: 'shop.yaml',
      line: 2,
      path: ['cutters', '3', 'diameter'],
    });
    const long = readJob('a.yaml', shared, () =>
      success('cutters:\n  3: { diameter: 0.5, flute: 2, reach: 1 }\n'),
    );
    expect(long.problems[0]?.at).toMatchObject({
      file: 'shop.yaml',
      line: 2,
      path: ['cutters', '3', 'reach'],
    });
  });
  it('without its first key, or with a list, is told in words', () => {
    const said = (text: string): readonly string[] =>
      readJob('a.yaml', shared, () => success(text)).problems.map(showProblem);
    expect(said('3: { diameter: 0.5 }\n')).toContain(
      'shop.yaml:1:1 3: a file of cutters has no key 3.\n  Keys here: format, length, cutters.',
    );
    expect(said('cutters: [{ diameter: 0.5 }]\n')).toEqual([
      'shop.yaml:1:10 cutters: a list is not a group of keys.',
    ]);
  });
  it('that cannot be read is told why', () => {
    const unread = failure<string>([
      {
        code: 'file.unreadable',
        severity: 'error',
        message: 'it is a folder.',
        at: { kind: 'file', file: 'x' },
      },
    ]);
    expect(readJob('a.yaml', shared, () => unread).problems[0]?.message).toBe(
      'the file of cutters shop.yaml cannot be read: it is a folder.',
    );
  });
  it('that cannot be read is told at the key that names it', () => {
    const job = readJob('a.yaml', shared, () => failure([]));
    expect(job.problems).toMatchObject([{ code: 'file.unreadable', at: { path: ['cutters'] } }]);
  });
});

it('tells centres that are a little off, and goes on', () => {
  const job = readJob('a.yaml', change('module: 0.5', 'module: 0.5\n  centres: 17.1'));
  expect(job.ok).toBe(true);
  expect(job.problems).toMatchObject([
    { code: 'job.conflict', severity: 'warning', at: { path: ['wheel', 'centres'] } },
  ]);
});

it('"rim: 0.05" written without a word: tells arms, rim and hub that are thinner than a module, and goes on', () => {
  const crossed = (arm: string, rim: string, hub: string) =>
    readJob(
      'a.yaml',
      change(
        'bore: 4.0',
        `bore: 4.0\n  crossings: { arms: 5, arm: ${arm}, rim: ${rim}, hub: ${hub}, corner: 1.2 }`,
      ),
    );
  expect(crossed('0.5', '0.5', '5.0').problems).toEqual([]);
  const thin = crossed('{ at-hub: 2, at-rim: 0.4 }', '0.05', '4.1');
  expect(thin.ok).toBe(true);
  expect(thin.problems.map(({ severity, message }) => `${severity}: ${message}`)).toEqual([
    'warning: an arm is 0.4 mm wide, less than a module (0.5 mm): it bends under the cutter.',
    'warning: the rim is 0.05 mm wide, less than a module (0.5 mm): it bends under the cutter.',
    'warning: the hub round the bore is 0.05 mm wide, less than a module (0.5 mm): it bends under the cutter.',
  ]);
});

it('"holding: arbor" with a nut that nobody named: tells that nothing says how high it stands, and is still once it is named', () => {
  const held = (more: string) =>
    readJob('a.yaml', change('holding: glue', `holding: arbor\n  bored: 4.0${more}`)).problems;
  expect(held('')).toMatchObject([{ severity: 'warning', at: { path: ['blank', 'holding'] } }]);
  expect(held('\n  keep-out: [{ x: 15, y: 0, radius: 1, height: 2 }]')).toContainEqual(
    expect.objectContaining({ severity: 'warning' }),
  );
  expect(
    held('\n  keep-out: [{ x: 0, y: 0, radius: 4, height: 6 }]').filter(
      ({ severity }) => severity === 'warning',
    ),
  ).toEqual([]);
});

it('hands on what does not fit, so that a sheet can say why', () => {
  const job = readJob('a.yaml', change('[44, 44]', '[33, 33]'));
  expect(job.ok && job.value.misfits).toMatchObject([
    { code: 'job.does-not-fit', at: { file: 'a.yaml', line: 11 } },
  ]);
});

it('knows where each value stands', () => {
  expect(jobOf(PLAIN).spots?.['wheel.teeth']).toEqual({ line: 3, column: 10 });
});

it('a refused cutter of a job without cuts stands at its cutters, not at the first line', () => {
  const job = jobOf(PLAIN.replace(/^cuts:[\s\S]*/m, ''));
  const at = { kind: 'value', file: '', path: ['cuts', 'finishing', 'cutter'] } as const;
  const problem = { code: 'reach.flank', severity: 'error', message: 'too wide', at } as const;
  expect(placeInJob(problem, job).at).toMatchObject(job.spots?.['cutters'] ?? { line: 'none' });
});
