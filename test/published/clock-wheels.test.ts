/** Wheels worked out whole: lengths, areas and curvature of one tooth, and five lost wheels with all their sizes. */
import { describe, expect, it } from 'vitest';
import { curvatureOn, lengthOf } from '../../src/geometry/on-piece.ts';
import { areaOfChain } from '../../src/geometry/area-of-chain.ts';
import { pointedObliquity, theoreticalAddendum } from '../../src/tooth/addendum.ts';
import { leafTip } from '../../src/tooth/leaf-tip.ts';
import { toothSide } from '../../src/tooth/tooth-side.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import { pinion, proportions, value } from '../tooth/proportions.ts';

describe('64 teeth, 8 leaves, module 1 [computed from the partial-arc formulas of J. D. Lawrence, A Catalog of Special Plane Curves]', () => {
  const side = value(toothSide(proportions({ teeth: 64, module: 1, height: 1 })));
  const curve = side.addendum;

  it('comes to a point 1.552181 above the pitch circle, at an obliquity of 37.71 degrees', () => {
    expect(side.pointedAddendum).toBeCloseTo(1.552181, 6);
    expect((pointedObliquity({ fixed: 32, rolling: 2 }, Math.PI / 128) * 180) / Math.PI).toBeCloseTo(
      37.71,
      2,
    );
  });

  it('has an addendum 1.7751980807 long', () => {
    expect(lengthOf(curve)).toBeCloseTo(1.7751980807, 10);
  });

  it('has a radius of curvature of 4.6211143242 at the point', () => {
    expect(1 / curvatureOn(curve, 1)).toBeCloseTo(4.6211143242, 10);
  });

  it('has an addendum of 1.5230121898 in area', () => {
    const swept = areaOfChain([curve]);
    const pitchSector = (32 * 32 * (Math.PI / 128)) / 2;
    expect(2 * (swept - pitchSector)).toBeCloseTo(1.5230121898, 10);
  });
});

interface LostWheel {
  readonly teeth: number;
  readonly leaves: number;
  readonly centres: number;
  readonly module: number;
  readonly f: number;
  readonly ha: number;
  readonly tip: number;
  readonly root: number;
  readonly arc: number;
}

const LOST: readonly LostWheel[] = [
  {
    teeth: 64,
    leaves: 8,
    centres: 18,
    module: 0.5,
    f: 1.55218,
    ha: 1.47457,
    tip: 33.4746,
    root: 30.4292,
    arc: 1.0322,
  },
  {
    teeth: 60,
    leaves: 8,
    centres: 17,
    module: 0.5,
    f: 1.54881,
    ha: 1.47137,
    tip: 31.4714,
    root: 28.4292,
    arc: 1.03,
  },
  {
    teeth: 96,
    leaves: 8,
    centres: 41.6,
    module: 0.8,
    f: 1.56961,
    ha: 1.49113,
    tip: 79.1858,
    root: 74.2867,
    arc: 1.6701,
  },
  {
    teeth: 80,
    leaves: 10,
    centres: 27,
    module: 0.6,
    f: 1.69138,
    ha: 1.60681,
    tip: 49.9282,
    root: 46.115,
    arc: 1.3497,
  },
  {
    teeth: 72,
    leaves: 6,
    centres: 19.5,
    module: 0.5,
    f: 1.39795,
    ha: 1.32806,
    tip: 37.3281,
    root: 34.4292,
    arc: 0.9296,
  },
];

describe('five lost wheels [computed on 0.95, pi/2 and 1.40, rules of BS 978-2 as remembered; the standard was not at hand]', () => {
  it.each(LOST)('$teeth teeth for $leaves leaves at $centres mm', (lost) => {
    const p = proportions({ ...lost, mate: pinion(lost.leaves) });
    expect((2 * lost.centres) / (lost.teeth + lost.leaves)).toBeCloseTo(lost.module, 12);
    const form = value(wheelForm(p));
    expect(theoreticalAddendum(lost.teeth, lost.leaves)).toBeCloseTo(lost.f, 5);
    expect(form.pointedAddendum / lost.module).toBeCloseTo(lost.f, 5);
    expect(form.addendum / lost.module).toBeCloseTo(lost.ha, 5);
    expect(2 * form.outsideRadius).toBeCloseTo(lost.tip, 4);
    expect(2 * form.rootRadius).toBeCloseTo(lost.root, 4);
    const arc = value(toothSide({ ...p, addendumForm: 'arc' })).addendum;
    expect(arc.kind === 'arc' && arc.radius).toBeCloseTo(lost.arc, 4);
  });
});

/** The arc's centre: from the tooth's centre line (far side negative) and above the pitch circle; kink at the pitch point. */
const ARCS: readonly (readonly [number, number, number, number, number, number, number])[] = [
  [6, 36, 1.3028, 1.8239, -1.0293, -0.2029, 8.35],
  [8, 64, 1.4746, 2.0644, -1.2743, -0.1496, 5.29],
  [10, 80, 1.6068, 2.2495, -1.4622, -0.1027, 3.55],
  [12, 96, 1.7211, 2.4095, -1.6236, -0.0593, 2.2],
  [16, 128, 1.9139, 2.6795, -1.894, 0.0186, 0.2],
];

describe('the single arc of radius 1.40 [computed on a flat pitch line; factor of BS 978-2 as remembered]', () => {
  it.each(ARCS)('%d leaves, %d teeth', (leaves, teeth, ha, radius, across, above) => {
    const p = proportions({ teeth, module: 1, mate: pinion(leaves), addendumForm: 'arc' });
    const side = value(toothSide(p));
    const arc = side.addendum;
    if (arc.kind !== 'arc') {
      throw new Error('the addendum is an arc');
    }
    expect(side.outsideRadius - side.pitchRadius).toBeCloseTo(ha, 4);
    expect(arc.radius).toBeCloseTo(radius, 4);
    // The source bends the pitch circle straight; on the wheel itself the centre moves by about (pi/4)^2 / 2R.
    const middle = Math.PI / teeth;
    const along = arc.centre.x * Math.cos(middle) + arc.centre.y * Math.sin(middle);
    const aside = arc.centre.y * Math.cos(middle) - arc.centre.x * Math.sin(middle);
    expect(Math.abs(-aside - across)).toBeLessThan(0.7 / teeth + 1e-4);
    expect(Math.abs(along - teeth / 2 - above)).toBeLessThan(0.7 / teeth + 1e-4);
  });
});

/** Leaf thickness, tip, leaves, height; arcs centred on the pitch circle. */
const TIPS = [
  [1.05, 'semicircle', 8, 0.525],
  [1.25, 'semicircle', 12, 0.625],
  [1.05, 'third-ogive', 6, 0.6722],
  [1.05, 'third-ogive', 7, 0.6731],
  [1.05, 'third-ogive', 8, 0.6737],
  [1.05, 'third-ogive', 10, 0.6746],
  [1.05, 'full-ogive', 6, 0.861],
  [1.05, 'full-ogive', 7, 0.8683],
  [1.05, 'full-ogive', 8, 0.8737],
  [1.05, 'full-ogive', 10, 0.881],
] as const;

it.each(TIPS)(
  'a leaf %d thick, %s, of %d leaves, is %d high [computed; within 0.02 of BS 978-2 as remembered: 0.525, 0.67, 0.855]',
  (leaf, tip, leaves, height) => {
    expect(leafTip({ kind: 'pinion', leaves, leaf, tip, dedendum: 1.87 }).height).toBeCloseTo(height, 3);
  },
);
