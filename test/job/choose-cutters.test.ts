import { describe, expect, it } from 'vitest';
import { Bug } from '../../src/base/bug.ts';
import type { Cutter } from '../../src/cutting/setup.ts';
import {
  chooseBore,
  chooseCrossings,
  chooseFinishing,
  chooseRoughing,
  rootWidth,
  usualAllowance,
} from '../../src/job/choose-cutters.ts';
import { crossings } from '../../src/tooth/crossings.ts';
import { toothSide } from '../../src/tooth/tooth-side.ts';

/** N 60, z 8, m 0.5: root radius 15 - 0.7854 = 14.2146, half the space pi/120. */
const side = toothSide({
  teeth: 60,
  module: 0.5,
  mate: { kind: 'pinion', leaves: 8, leaf: 1.05, tip: 'third-ogive', dedendum: 1.87 },
  centres: 17,
  addendumForm: 'epicycloid',
  height: 0.95,
  tooth: 0.5,
  dedendum: 1.5708,
  rootFillet: 0,
});

function sideOf() {
  if (!side.ok) {
    throw new Bug('the tooth has no form');
  }
  return side.value;
}

function cutters(...sizes: readonly [diameter: number, reach: number, flute?: number][]): Cutter[] {
  return sizes.map(([diameter, reach, flute = reach], i) => ({
    number: i + 1,
    diameter,
    nominal: diameter,
    flutes: 2,
    reach,
    flute,
    shank: 3,
    stickOut: 14,
    runout: 0.01,
    plunges: false,
  }));
}

function choosing(...sizes: readonly [number, number, number?][]) {
  return { cutters: cutters(...sizes), depth: 1.6, side: sideOf(), workingRadius: 14.7 };
}

it('the root is 0.7442 mm wide (2 x 14.2146 x 0.0261769 by hand)', () => {
  expect(rootWidth(sideOf())).toBeCloseTo(0.7442, 4);
});

describe('roughing: root width at least D + 2 allowance + 0.05', () => {
  it('takes 0.6 (0.6 + 0.06 + 0.05 = 0.71) and not 0.65 (0.766)', () => {
    expect(chooseRoughing(choosing([0.5, 2], [0.6, 2], [0.65, 2]), undefined).cutter.diameter).toBe(0.6);
  });
  it('leaves out what does not reach', () => {
    expect(chooseRoughing(choosing([0.5, 2], [0.6, 1.5]), undefined).cutter.diameter).toBe(0.5);
  });
  it('is at least as wide as a finishing cutter that is named', () => {
    const list = choosing([0.4, 2], [0.5, 2]);
    expect(chooseRoughing(list, undefined, list.cutters[1]).cutter.diameter).toBe(0.5);
  });
  it('says so where none fits', () => {
    expect(chooseRoughing(choosing([1, 4], [2, 4]), undefined)).toMatchObject({
      cutter: { diameter: 1 },
      why: 'the smallest: none of the list fits',
    });
  });
  it('takes one that leaves metal at the root rather than one too short, but none wider than the space, 0.785', () => {
    expect(chooseRoughing(choosing([0.5, 1.5], [0.7, 4], [2, 4]), undefined)).toMatchObject({
      cutter: { diameter: 0.7 },
      why: 'the smallest that goes deep enough and in: none of the list fits',
    });
    expect(chooseRoughing(choosing([0.5, 1.5], [1, 4], [2, 4]), undefined).cutter.diameter).toBe(0.5);
  });
});

describe('finishing: gets to the root, where 2 Rr s / (1 - s) = 0.764 mm fits', () => {
  it('takes the largest in the slot', () => {
    expect(chooseFinishing(choosing([0.4, 2], [0.5, 2], [0.6, 2]), 0.53).cutter.diameter).toBe(0.5);
    expect(chooseFinishing(choosing([0.7, 2], [0.8, 2]), 1).cutter.diameter).toBe(0.7);
  });
  it('would rather cut in one depth than with a larger cutter', () => {
    expect(chooseFinishing(choosing([0.4, 2, 2], [0.5, 2, 1]), 0.53).cutter.diameter).toBe(0.4);
  });
});

it('a bore has room to go round: at most 0.8 of it', () => {
  expect(chooseBore(choosing([1, 4], [2, 4], [3, 4]), 3).cutter.diameter).toBe(2);
});

it('crossings: smaller than twice the corner', () => {
  const windows = crossings(
    { arms: 5, armAtHub: 2.4, armAtRim: 2.4, rim: 1.8, hub: 9, corner: 0.9 },
    14.2146,
  );
  if (!windows.ok) {
    throw new Bug('the crossings have no form');
  }
  expect(chooseCrossings(choosing([1, 4], [1.5, 4], [1.8, 4]), windows.value).cutter.diameter).toBe(1.5);
});

it('"no room to join the wall" beside a smaller cutter that has it: where a skin holds the slug, the straight of the wall counts', () => {
  // Sides of an arm between corners of 3.69: feet at sqrt(8.72^2 - 4.89^2) and sqrt(8.69^2 - 4.89^2), so 0.036 mm straight.
  const windows = crossings(
    { arms: 5, armAtHub: 2.4, armAtRim: 2.4, rim: 1.8, hub: 10, corner: 3.69 },
    14.2146,
  );
  if (!windows.ok) {
    throw new Bug('the crossings have no form');
  }
  const list = choosing([0.2, 4], [1, 4], [2, 4]);
  expect(chooseCrossings(list, windows.value).cutter.diameter).toBe(2);
  expect(chooseCrossings(list, windows.value, true).cutter.diameter).toBe(0.2);
});

it.each([
  [0.05, 0.005],
  [0.1, 0.01],
  [0.3, 0.02],
  [0.5, 0.025],
  [1, 0.05],
  [3, 0.1],
])(
  'allowance for a cutter of %f mm is %f mm (judgement: a tenth up to 0.2, 0.02 to 0.03 at 0.3 to 0.5, 0.05 at 1, 0.1 at 3)',
  (d, a) => {
    expect(usualAllowance(d)).toBe(a);
  },
);
