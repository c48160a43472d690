import * as fc from 'fast-check';
import { expect, it } from 'vitest';
import { spread } from '../../src/report/spread.ts';

const SEED = 20;

it(`keeps order and distance, and moves nothing that has room (seed ${SEED})`, () => {
  fc.assert(
    fc.property(
      fc.array(fc.double({ min: -50, max: 50, noNaN: true }), { maxLength: 12 }),
      fc.double({ min: 0.1, max: 9, noNaN: true }),
      (places, gap) => {
        const wished = places.toSorted((a, b) => a - b);
        const found = spread(wished, gap);
        found.forEach((place, i) => {
          const before = found[i - 1];
          expect(before === undefined || place - before >= gap - 1e-9).toBe(true);
        });
        const roomy = wished.every((place, i) => i === 0 || place - (wished[i - 1] as number) >= gap);
        if (roomy) {
          expect(found).toEqual(wished);
        }
      },
    ),
    { seed: SEED },
  );
});

it('centres two that touch on the middle of what they wished', () => {
  expect(spread([10, 10], 4)).toEqual([8, 12]);
});

it('stays between the ends where there is room', () => {
  expect(spread([0, 0, 0], 4, 0, 20)).toEqual([0, 4, 8]);
  expect(spread([20, 20], 4, 0, 20)).toEqual([16, 20]);
});
