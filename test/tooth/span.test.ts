import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { headingOn, pointOn } from '../../src/geometry/on-piece.ts';
import { addScaled, leftOf, norm, turnPoint } from '../../src/geometry/point.ts';
import { bestSpan, overTips, SPAN_SENSITIVITY, spanOver, toothChord } from '../../src/tooth/span.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import type { WheelForm } from '../../src/tooth/wheel.ts';
import { pointsOf } from './outline-samples.ts';
import { proportions, value } from './proportions.ts';
import { anyProportions } from './random-proportions.ts';

/** The furthest that the block's last tooth reaches from the block's middle line, with metal left on its flanks. */
function jaw(form: WheelForm, teeth: number, left = 0): { reading: number; radius: number } {
  const block = ((teeth - 1) * Math.PI) / form.proportions.teeth;
  let best = { reading: 0, radius: 0 };
  for (const { role, piece } of form.sector) {
    if (role !== 'addendum' && role !== 'flank') {
      continue;
    }
    for (let i = 0; i <= 20_000; i++) {
      const u = i / 20_000;
      const bare = pointOn(piece, u);
      const point = left === 0 ? bare : addScaled(bare, leftOf(headingOn(piece, u)), -left);
      const { y } = turnPoint(point, block);
      best = 2 * y > best.reading ? { reading: 2 * y, radius: norm(bare) } : best;
    }
  }
  return best;
}

describe('span over k teeth', () => {
  const arc = value(wheelForm(proportions({ addendumForm: 'arc' })));

  it.each([
    [4, 5.475],
    [5, 7.024],
    [6, 8.559],
  ])(
    'of 60 teeth for 8 leaves, module 0.5, single-arc addendum: over %d, %d mm [computed elsewhere from the outline; not published]',
    (k, reading) => {
      expect(spanOver(arc, k)?.reading).toBeCloseTo(reading, 3);
    },
  );

  it.each([4, 5, 6])('over %d the jaws rest 0.18 to 0.39 module above the pitch circle [as above]', (k) => {
    const height = (spanOver(arc, k)?.height ?? 0) / 0.5;
    expect(height).toBeGreaterThan(0.175);
    expect(height).toBeLessThan(0.395);
  });

  it('is the breadth of the outline itself', () => {
    fc.assert(
      fc.property(anyProportions(), fc.integer({ min: 2, max: 12 }), (p, k) => {
        const form = value(wheelForm(p));
        const span = spanOver(form, k);
        fc.pre(span !== undefined);
        const brute = jaw(form, k);
        expect(Math.abs(span!.reading - brute.reading)).toBeLessThan(1e-6 * p.module);
        expect(Math.abs(span!.height + form.pitchRadius - brute.radius)).toBeLessThan(2e-3 * p.module);
      }),
      { numRuns: 25, seed: 41 },
    );
  });

  it('is not given where the jaws would rest on tips, or on fewer than two teeth', () => {
    expect(spanOver(arc, 1)).toBeUndefined();
    expect(spanOver(arc, 29)).toBeUndefined();
    expect(spanOver(arc, 40)).toBeUndefined();
  });

  it('grows by twice the metal that is left on every flank', () => {
    const form = value(wheelForm(proportions()));
    const grown = jaw(form, 6, 0.01).reading - jaw(form, 6).reading;
    expect(grown / 0.01).toBeCloseTo(SPAN_SENSITIVITY, 5);
  });

  it('is best where the jaws rest about half-way up the addendum', () => {
    fc.assert(
      fc.property(anyProportions(), (p) => {
        const form = value(wheelForm(p));
        const best = bestSpan(form);
        fc.pre(best !== undefined);
        for (let k = 2; k <= p.teeth; k++) {
          const other = spanOver(form, k);
          if (other) {
            expect(Math.abs(best!.height - form.addendum / 2)).toBeLessThanOrEqual(
              Math.abs(other.height - form.addendum / 2) + 1e-12,
            );
          }
        }
      }),
      { numRuns: 50, seed: 42 },
    );
  });
});

describe('over the tips', () => {
  it('reads the diameter with an even count', () => {
    const form = value(wheelForm(proportions()));
    const { diameter, reading, most } = overTips(form);
    expect(diameter).toBeCloseTo(31.4714, 4);
    expect([reading, most]).toEqual([diameter, diameter]);
  });

  it.each([
    [7, 0.0495],
    [15, 0.0109],
    [45, 0.0012],
  ])(
    'pointed and odd, %d teeth: flat jaws across two tips and on one read low by %d [(1 - cos(pi/N))/2]',
    (teeth, low) => {
      const { diameter, reading } = overTips(value(wheelForm(proportions({ teeth, height: 1 }))));
      expect(1 - reading / diameter).toBeCloseTo(low, 4);
      expect(1 - reading / diameter).toBeCloseTo((1 - Math.cos(Math.PI / teeth)) / 2, 12);
    },
  );

  it.each([7, 15, 45])(
    'is the least and greatest breadth of %d teeth, whichever way the jaws lie',
    (teeth) => {
      const form = value(wheelForm(proportions({ teeth, height: 0.9 })));
      const lands = pointsOf(
        form.sector.filter(({ role }) => role === 'land'),
        40,
      );
      const tips = Array.from({ length: teeth }, (_, k) =>
        lands.map((point) => turnPoint(point, (2 * Math.PI * k) / teeth)),
      ).flat();
      const breadths = Array.from({ length: 401 }, (_, i) => {
        const way = (Math.PI / teeth) * (i / 400);
        const along = tips.map(({ x, y }) => x * Math.cos(way) + y * Math.sin(way));
        return Math.max(...along) - Math.min(...along);
      });
      expect(Math.max(...breadths) / overTips(form).most).toBeCloseTo(1, 6);
      expect(Math.min(...breadths) / overTips(form).reading).toBeCloseTo(1, 6);
    },
  );
});

it("one tooth's chord at the pitch circle, and the tip above it [chord 2R sin(t/2R); arc less chord is 0.0001 mm here]", () => {
  const form = value(wheelForm(proportions()));
  const { thickness, height } = toothChord(form);
  expect(form.toothThickness - thickness).toBeCloseTo(0.0001, 4);
  expect(thickness).toBeCloseTo(2 * 15 * Math.sin(Math.PI / 120), 12);
  expect(height).toBeCloseTo(form.addendum + 15 * (1 - Math.cos(Math.PI / 120)), 12);
});
