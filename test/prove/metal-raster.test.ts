/** The coarse metal against the distance from every square's middle to the path, over random lines and arcs with a fixed seed. */
import * as fc from 'fast-check';
import { expect, it } from 'vitest';
import type { TracedMove } from '../../src/motion/traced-move.ts';
import { pathDistance } from '../../src/prove/metal-distance.ts';
import { wholePaths } from '../../src/prove/metal-paths.ts';
import { blankRaster, cutRaster } from '../../src/prove/metal-raster.ts';
import { solidMoves } from '../../src/prove/metal-solids.ts';
import { SETUP } from '../support/good-program.ts';

const SIZE = 0.1;
/** A square's middle this near the edge of the band may be told to either side: rounding. */
const DOUBT = 1e-9;

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const place = fc.record({ x: real(-4, 4), y: real(-4, 4) });
const turns = fc.oneof(real(-6.28, 6.28), fc.constantFrom(0, Math.PI, -Math.PI, 2 * Math.PI, -2 * Math.PI));

function moveOf(from: { x: number; y: number }, other: { x: number; y: number }, turn: number): TracedMove {
  const [dx, dy] = [from.x - other.x, from.y - other.y];
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  const to = turn === 0 ? other : { x: other.x + dx * c - dy * s, y: other.y + dx * s + dy * c };
  const shape = turn === 0 ? ({ kind: 'line' } as const) : ({ kind: 'arc', centre: other, turn } as const);
  const common = { file: 'a', line: 1, feed: 100, cutter: 1, spindle: 1000 } as const;
  return { ...common, ...shape, from: { ...from, z: -0.5 }, to: { ...to, z: -0.5 } };
}

it('takes away the squares whose middle the cutter passes over, and no other', () => {
  fc.assert(
    fc.property(place, place, turns, real(0.05, 1.5), (from, other, turn, radius) => {
      const paths = wholePaths(solidMoves([moveOf(from, other, turn)], () => radius));
      const raster = blankRaster(SETUP, 6, SIZE, -1);
      const bite = cutRaster(raster, paths, 0, -0.5);
      let deepest = 0;
      let wrong = 0;
      for (let row = 0; row < raster.rows; row++) {
        for (let column = 0; column < raster.columns; column++) {
          const away = pathDistance(paths, 0, raster.x0 + column * SIZE, raster.y0 + row * SIZE);
          const cut = raster.left[row * raster.columns + column]! < 0;
          wrong += Math.abs(away - radius) > DOUBT && cut !== away < radius ? 1 : 0;
          deepest = away < radius / 2 - DOUBT ? 0.5 : deepest;
        }
      }
      expect(wrong).toBe(0);
      expect(bite).toBeGreaterThanOrEqual(deepest);
      expect(cutRaster(raster, paths, 0, -0.5)).toBe(0);
    }),
    { seed: 12, numRuns: 60 },
  );
});

it('counts a square as cut through once', () => {
  const paths = wholePaths(solidMoves([moveOf({ x: -1, y: 0 }, { x: 1, y: 0 }, 0)], () => 0.5));
  const raster = blankRaster(SETUP, 6, SIZE, -1);
  cutRaster(raster, paths, 0, -1);
  const opened = raster.opened;
  expect(opened * SIZE * SIZE).toBeCloseTo(2 + Math.PI / 4, 1);
  cutRaster(raster, paths, 0, -1.1);
  expect(raster.opened).toBe(opened);
});

it('a fine cutter does not bite beyond half its radius on an arc', () => {
  const paths = wholePaths(solidMoves([moveOf({ x: 2, y: 0 }, { x: 0, y: 0 }, 3)], () => 0.1));
  const raster = blankRaster(SETUP, 6, 0.067, -1);
  // All but what lies further from the arc than half the radius is open already.
  for (let row = 0; row < raster.rows; row++) {
    for (let column = 0; column < raster.columns; column++) {
      const away = pathDistance(paths, 0, raster.x0 + column * raster.size, raster.y0 + row * raster.size);
      raster.left[row * raster.columns + column] = away <= 0.05 + DOUBT ? -0.5 : 0;
    }
  }
  expect(cutRaster(raster, paths, 0, -0.5)).toBe(0);
});
