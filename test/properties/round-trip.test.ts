/** Property one: for every machine file, what is read back from a program is what was meant. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Machine } from '../../src/machine/machine.ts';
import type { Motion } from '../../src/motion/motion.ts';
import type { HeaderFacts } from '../../src/post/header-facts.ts';
import { postMotions } from '../../src/post/post-motions.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { traceProgram, type Trace } from '../../src/prove/trace-program.ts';
import { POSTS } from '../machine/read-posts.ts';
import { post } from '../support/bench-program.ts';
import { compareMotion } from '../../src/flow/compare-motion.ts';
import { randomMotion } from '../support/random-motion.ts';

const SEED = 66025;
const RUNS = 60;

const HEADER: HeaderFacts = {
  kind: 'cut',
  title: 'A wheel (for the ; clock) % of G0 Z-99',
  mark: '1A2B3C4D',
  version: '0',
  part: ['Wheel'],
  program: { number: 1, of: 1 },
  blank: 'sheet',
  holding: 'glue',
  material: 'leaded-brass',
  cutters: [{ number: 1, diameter: 1, flutes: 2, stickOut: 12, shank: 3 }],
  speeds: [10000],
  extents: { x: [-60, 60], y: [-60, 60], z: [-3, 6] },
  clear: 5,
  topZ: 0,
  plateZ: -2,
  park: { x: 0, y: 0, z: 30 },
  zero: 'top',
  again: 'the edges',
  check: { what: 'outside', size: 30 },
  proved: [],
  notProved: [],
};

function readBack(machine: Machine, motion: Motion): { readonly text: string; readonly trace: Trace } {
  const written = writeProgram({
    machine,
    name: 'p',
    suffix: '',
    label: machine.words.file.labelLowest,
    motion,
    header: HEADER,
  });
  expect(written.problems).toEqual([]);
  if (!written.ok) {
    throw new Error('not written');
  }
  return { text: written.value.text, trace: traceProgram(written.value.file, written.value.text, machine) };
}

function expectAsMeant(machine: Machine, motion: Motion): void {
  const { text, trace } = readBack(machine, motion);
  const numbered = (): string =>
    text
      .split(/\r?\n/)
      .map((line, i) => `${String(i + 1)} ${line}`)
      .slice(-24)
      .join('\n');
  const findings = trace.findings.map(({ line, code, message }) => `${String(line)} ${code} ${message}`);
  expect(findings, numbered()).toEqual([]);
  expect(compareMotion(motion, trace, machine), numbered()).toEqual([]);
}

/** Words that no machine file of posts/ has, or not in this company. */
function variants(): readonly (readonly [string, Machine])[] {
  const bench = post('bench-mill');
  const desk = post('desk-three-axis');
  const vary = (
    machine: Machine,
    words: { [G in keyof Machine['words']]?: Partial<Machine['words'][G]> },
  ): Machine => ({
    ...machine,
    words: Object.fromEntries(
      Object.entries(machine.words).map(([group, value]) => [
        group,
        { ...value, ...words[group as keyof Machine['words']] },
      ]),
    ) as unknown as Machine['words'],
  });
  return [
    ['arcs by radius', vary(bench, { arcs: { centre: 'radius', longestSweep: 120, wholeCircle: 'split' } })],
    ['centres from zero', vary(bench, { arcs: { centre: 'from-zero', centreWord: 'G90.1' } })],
    ['circle feed, no helix', vary(bench, { arcs: { helix: false }, path: { helixFeedAlong: 'circle' } })],
    ['home of all axes', vary(bench, { positions: { top: 'G28-all', topMachineZ: null } })],
    [
      'T alone, length with it',
      vary(bench, { cutters: { words: 'T-only', lengthOffset: 'with-T', lengthCancel: 'none' } }),
    ],
    [
      'T then M6, left-hand cutters',
      vary(bench, { cutters: { words: 'T-then-M6' }, spindle: { forward: 'M4' } }),
    ],
    ['three decimals', vary(desk, { numbers: { lengthDecimals: { mm: 3, inch: 4 } } })],
    ['no comments', vary(desk, { file: { commentForm: 'none' } })],
    ['dwell by X', vary(desk, { dwell: { letter: 'X', unit: 'seconds' } })],
    ['dwell by S', vary(desk, { dwell: { letter: 'S', unit: 'seconds' } })],
  ];
}

const MACHINES: readonly (readonly [string, Machine])[] = [
  ...POSTS.map((name) => [name, post(name)] as const),
  ...variants(),
];

describe.each(MACHINES)('%s', (_, machine) => {
  it.each(postMotions(machine))('$name: $what', ({ motion }) => expectAsMeant(machine, motion));

  it(`random motions come back (seed ${String(SEED)})`, () => {
    fc.assert(
      fc.property(randomMotion(machine), (motion) => expectAsMeant(machine, motion)),
      { seed: SEED, numRuns: RUNS },
    );
  }, 60_000);
});

describe('the comparison itself', () => {
  const machine = post('bench-mill');
  const lines = postMotions(machine).find(({ name }) => name === 'lines')?.motion ?? { steps: [] };
  const changed = (change: (text: string) => string): readonly string[] => {
    const text = readBack(machine, lines).text;
    expect(change(text)).not.toBe(text);
    return compareMotion(lines, traceProgram('p', change(text), machine), machine);
  };
  it.each([
    ['a place', (text: string) => text.replace('X5.0000', 'X5.0002')],
    ['a feed', (text: string) => text.replace(/F\d+\.\d+/, 'F77.00')],
    ['a speed', (text: string) => text.replace(/S\d+/, 'S333')],
    ['a rapid', (text: string) => text.replace(/\nG1/, '\nG0')],
    ['a lost line', (text: string) => text.replace(/\nX5.0000.*/, '')],
    ['a lost wait', (text: string) => text.replace(/G4 P0.25/, '')],
  ])('sees %s', (_, change) => expect(changed(change)).not.toEqual([]));
});
