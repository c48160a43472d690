import { describe, expect, it } from 'vitest';
import * as fc from 'fast-check';
import type { Machine } from '../../src/machine/machine.ts';
import { changedMachine, MACHINE_NAMES, postMachine } from '../support/post-machines.ts';
import { numberedMotion, type NumberedMotion } from '../support/numbered-motion.ts';
import { textFaults } from '../support/text-faults.ts';
import {
  arcFaults,
  limitFaults,
  placeFaults,
  stateFaults,
  writeRandom,
  type Written,
} from '../support/written-faults.ts';

const SEED = 1_066;
const CLEAR = 7;

/** Every machine file, and the forms of arcs and homing that none of them has. */
const bench = postMachine('bench-mill');
const coarse = { numbers: { lengthDecimals: { mm: 3, inch: 4 } } };
const machines: readonly (readonly [string, Machine])[] = [
  ...MACHINE_NAMES.map((name) => [name, postMachine(name)] as const),
  ['arcs by radius', changedMachine(bench, { arcs: { centre: 'radius', wholeCircle: 'split' } })],
  ['three decimals of a millimetre', changedMachine(bench, coarse)],
  ['four decimals of an inch', changedMachine(bench, coarse, {}, 'inch')],
  ['no helix', changedMachine(bench, { arcs: { helix: false } })],
  ['home of all axes', changedMachine(bench, { positions: { top: 'G28-all' } })],
];

/** What is wrong with any of some random motions, shrunk to the smallest of them. */
function check(
  machine: Machine,
  faults: (random: NumberedMotion, written: Written) => readonly string[],
): void {
  fc.assert(
    fc.property(numberedMotion(CLEAR), (random) => {
      expect(faults(random, writeRandom(machine, random))).toEqual([]);
    }),
    { seed: SEED, numRuns: 40 },
  );
}

describe.each(machines)('random motion, %s', (_, machine) => {
  it('reads back as it was meant: places, feeds, cutter, spindle, arcs on their circles, no circle by accident', () => {
    check(machine, (random, written) => [
      ...written.trace.findings.filter(({ severity }) => severity === 'error').map(({ message }) => message),
      ...(written.trace.complete ? [] : ['not read to its end']),
      ...placeFaults(machine, random, written),
      ...stateFaults(machine, random, written),
      ...arcFaults(machine, random, written),
    ]);
  });

  it('is sound as text, within every limit of the machine file, and the same text twice', () => {
    check(machine, (random, written) => [
      ...textFaults(machine, written.text),
      ...limitFaults(machine, written),
      ...(writeRandom(machine, random).text === written.text ? [] : ['another text the second time']),
    ]);
  });
});
