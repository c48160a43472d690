/** The pointed tooth's height and the end of its action, over leaves 6 to 16 and ratios 3 to 12, and the rack's limit. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import {
  angleFromCusp,
  obliquityAtRadius,
  pointedObliquity,
  theoreticalAddendum,
} from '../../src/tooth/addendum.ts';

const SOURCE = 'computed: closed form and two direct roots, agreeing to 1.5e-14';

const rows = readFileSync(join(import.meta.dirname, 'theoretical-addendum.csv'), 'utf8')
  .split('\n')
  .filter((line) => /^\d/.test(line))
  .map((line) => line.trim().split(','));

/** Half a unit of the last printed digit. */
function half(printed: string): number {
  return 0.5 * 10 ** -(printed.split('.')[1] ?? '').length * (1 + 1e-6);
}

function near(value: number, printed: string): void {
  expect(Math.abs(value - Number(printed)), `${value} for ${printed}`).toBeLessThanOrEqual(half(printed));
}

describe(`theoretical addendum, every printed digit [${SOURCE}]`, () => {
  it('has all 110 cells', () => {
    expect(rows).toHaveLength(110);
  });

  it.each(rows)(
    '%s leaves, ratio %s',
    (leaves, ratio, teeth, f, ha, arc, roll, end, endKept, pitch, contact) => {
      const z = Number(leaves);
      const N = Number(teeth);
      expect(N).toBeCloseTo(z * Number(ratio), 9);
      const height = theoreticalAddendum(N, z);
      near(height, f as string);
      near(0.95 * height, ha as string);
      near(1.4 * 0.95 * height, arc as string);
      const circles = { fixed: N / 2, rolling: z / 4 };
      const obliquity = pointedObliquity(circles, Math.PI / (2 * N));
      const degrees = 180 / Math.PI;
      near(((z * obliquity) / N) * degrees, roll as string);
      near(obliquity * degrees, end as string);
      const kept = obliquityAtRadius(circles, N / 2 + 0.95 * height);
      near(kept * degrees, endKept as string);
      near(360 / z, pitch as string);
      near((kept * z) / (2 * Math.PI), contact as string);
    },
  );
});

/** Printed to five decimals: leaves 6 to 16 across. */
const TABLE: readonly (readonly number[])[] = [
  [3, 1.32538, 1.40531, 1.47711, 1.54258, 1.60296, 1.65913, 1.71177, 1.76137, 1.80836, 1.85303, 1.89567],
  [4, 1.34731, 1.43037, 1.50498, 1.57301, 1.63573, 1.69408, 1.74875, 1.80026, 1.84904, 1.89541, 1.93967],
  [5, 1.36147, 1.44657, 1.52301, 1.59271, 1.65698, 1.71675, 1.77274, 1.8255, 1.87546, 1.92295, 1.96826],
  [6, 1.37138, 1.45791, 1.53565, 1.60652, 1.67187, 1.73265, 1.78958, 1.84322, 1.894, 1.94228, 1.98833],
  [7, 1.3787, 1.46629, 1.54499, 1.61674, 1.68289, 1.74442, 1.80205, 1.85634, 1.90774, 1.9566, 2.00321],
  [7.5, 1.38169, 1.46972, 1.54881, 1.62091, 1.68739, 1.74923, 1.80714, 1.8617, 1.91335, 1.96245, 2.00929],
  [8, 1.38433, 1.47274, 1.55218, 1.62461, 1.69138, 1.75348, 1.81165, 1.86645, 1.91833, 1.96764, 2.01468],
  [9, 1.38879, 1.47786, 1.55789, 1.63085, 1.69812, 1.76068, 1.81928, 1.87448, 1.92673, 1.97641, 2.02379],
  [10, 1.39242, 1.48202, 1.56252, 1.63593, 1.7036, 1.76653, 1.82548, 1.88101, 1.93357, 1.98354, 2.0312],
  [12, 1.39795, 1.48837, 1.56961, 1.64368, 1.71197, 1.77548, 1.83496, 1.89099, 1.94403, 1.99444, 2.04253],
];

it.each(TABLE)(`theoretical addendum at ratio %d to 1e-5 [${SOURCE}]`, (ratio, ...heights) => {
  heights.forEach((height, i) => {
    expect(Math.abs(theoreticalAddendum((6 + i) * ratio, 6 + i) - height)).toBeLessThan(1e-5);
  });
});

it.each([
  [8, 1.60747],
  [9, 1.68516],
  [10, 1.75678],
  [11, 1.82339],
  [12, 1.88576],
])(`the rack's limit with %d leaves is %d [${SOURCE}]`, (leaves, height) => {
  // The last figure is cut, not rounded, in the row for 10 and 12 leaves.
  expect(Math.abs(theoreticalAddendum(leaves * 1e5, leaves) - height)).toBeLessThan(1e-5);
});

it.each([
  [8, 0.803],
  [9, 0.66],
  [10, 0.551],
  [11, 0.465],
  [12, 0.398],
])(
  'with %d leaves, ratio 8, no approach needs a tooth %d of the pitch [computed from the same law]',
  (z, share) => {
    // Action after the line of centres must last a whole pitch of the pinion: 2 pi / z of obliquity.
    const circles = { fixed: 4 * z, rolling: z / 4 };
    expect((angleFromCusp(circles, (2 * Math.PI) / z) * 8 * z) / Math.PI).toBeCloseTo(share, 3);
    expect(pointedObliquity(circles, (share * Math.PI) / (8 * z))).toBeCloseTo((2 * Math.PI) / z, 2);
  },
);

it.each([
  [10, 381.71],
  [11, 54.48],
  [12, 31.73],
  [13, 23.43],
  [14, 19.13],
  [15, 16.5],
  [16, 14.72],
  [17, 13.44],
  [18, 12.48],
  [19, 11.73],
  [20, 11.12],
])(
  '%d leaves are driven after the line of centres alone by %d teeth or more [computed; 13 to 19 round up to the row of R. Willis as remembered]',
  (z, teeth) => {
    const after = (N: number) => pointedObliquity({ fixed: N / 2, rolling: z / 4 }, Math.PI / (2 * N)) * z;
    expect(after(teeth - 0.006)).toBeLessThan(2 * Math.PI);
    expect(after(teeth + 0.006)).toBeGreaterThan(2 * Math.PI);
  },
);
