import { describe, expect, it } from 'vitest';
import { drawDeviation } from '../../src/report/draw-deviation.ts';
import { allowedError } from '../../src/report/allowed-error.ts';
import { attributeOf, elementOf, textsOf } from '../support/svg-read.ts';
import { factsOf } from '../support/sheets.ts';

const facts = factsOf('third-wheel');
const figures = facts.proof?.figures;
const points = figures?.deviation ?? [];
const allowed = allowedError(facts.machine);

function plate(unit: 'mm' | 'inch'): string {
  return drawDeviation({
    points,
    allowed,
    leftAtRoot: figures?.leftAtRoot ?? 0,
    footRadius: facts.asCut?.footRadius ?? 0,
    pitchRadius: facts.form.pitchRadius,
    unit,
  });
}

describe.each(['mm', 'inch'] as const)(
  'the deviation of the flank, read back from the plate in %s',
  (unit) => {
    const svg = plate(unit);
    const curve = elementOf(svg, 'deviation');
    const number = (name: string): number => Number(attributeOf(curve, name));
    const spots = [...attributeOf(curve, 'd').matchAll(/(-?[\d.]+),(-?[\d.]+)/g)].map(([, x, y]) => ({
      along: (Number(x) - number('data-x-zero')) * number('data-mm-per-x'),
      deviation: ((number('data-y-zero') - Number(y)) * number('data-um-per-y')) / 1000,
      y: Number(y),
    }));

    it('shows every point of the proof that lies on the plate, and no other', () => {
      const shown = points.filter(({ deviation }) =>
        spots.some((spot) => Math.abs(spot.deviation - deviation) < 5e-6),
      );
      const foot = facts.asCut?.footRadius ?? 0;
      const flank = points.filter(({ radius }) => radius >= foot);
      expect(flank.length).toBeGreaterThan(20);
      for (const point of flank) {
        const spot = spots.reduce((best, one) =>
          Math.abs(one.along - point.along) < Math.abs(best.along - point.along) ? one : best,
        );
        expect(spot.along).toBeCloseTo(point.along, 3);
        expect(Math.abs(spot.deviation - point.deviation)).toBeLessThan(5e-6);
      }
      expect(shown.length).toBeGreaterThanOrEqual(flank.length);
    });

    it('leaves the plate where the cutter does not reach, and says how far', () => {
      expect(spots.every(({ y }) => y >= 9 - 1e-3 && y <= 56 + 1e-3)).toBe(true);
      expect(svg).toContain('fine-arrow');
      const root = ((figures?.leftAtRoot ?? 0) * 1000).toFixed(2);
      expect(textsOf(svg).some((text) => text.includes(root) && text.includes('corner'))).toBe(true);
    });

    it('says the worst of the flank, and draws what is allowed as wide as it is', () => {
      const worst = Math.abs(number('data-worst')) / 1000;
      expect(worst).toBeCloseTo(Math.max(figures?.flankGouge ?? 0, figures?.flankLeft ?? 0), 4);
      const band = elementOf(svg, 'allowed');
      expect((Number(attributeOf(band, 'height')) * number('data-um-per-y')) / 2000).toBeCloseTo(allowed, 5);
    });
  },
);

it('is nothing where the proof measured nothing', () => {
  expect(
    drawDeviation({ points: [], allowed, leftAtRoot: 0, footRadius: 1, pitchRadius: 2, unit: 'mm' }),
  ).toBe('');
});
