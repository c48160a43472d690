import { describe, expect, it } from 'vitest';
import { leafTip } from '../../src/tooth/leaf-tip.ts';
import { defaultDedendum, defaultLeaf, defaultTip, defaultTrundle } from '../../src/tooth/mate.ts';

describe('defaults of the mate [BS 978-2 as remembered; the standard was not at hand]', () => {
  it.each([
    [6, 1.05],
    [10, 1.05],
    [11, 1.25],
    [16, 1.25],
  ])('a leaf of %d is %d thick', (leaves, thickness) => {
    expect(defaultLeaf(leaves).value).toBe(thickness);
  });

  it('the tip is a third ogive, the dedendum the addendum and 0.40', () => {
    expect(defaultTip().value).toBe('third-ogive');
    expect(defaultDedendum(1.47).value).toBeCloseTo(1.87, 12);
  });

  it('each says that its standard was not at hand', () => {
    for (const { why } of [defaultLeaf(8), defaultLeaf(12), defaultTip(), defaultDedendum(1.4)]) {
      expect(why).toContain('the standard was not at hand');
    }
    expect(defaultTrundle().why).toContain('no printed proportion was at hand');
  });
});

it('a tip given by height and radius is taken as it is', () => {
  const tip = { height: 0.6, radius: 0.9 };
  expect(leafTip({ kind: 'pinion', leaves: 8, leaf: 1.05, tip, dedendum: 1.87 })).toEqual(tip);
});
