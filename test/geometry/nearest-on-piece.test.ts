import * as fc from 'fast-check';
import { expect, it } from 'vitest';
import { nearestOnChain, nearestOnPiece } from '../../src/geometry/nearest-on-piece.ts';
import { pointOn } from '../../src/geometry/on-piece.ts';
import type { CycloidPiece } from '../../src/geometry/piece.ts';
import { distance } from '../../src/geometry/point.ts';
import { pieces, points, SEED } from './random-pieces.ts';

it('no point of the piece is nearer, wherever the question is asked from', () => {
  fc.assert(
    fc.property(
      pieces,
      points,
      fc.double({ min: 0, max: 1, noNaN: true }),
      fc.boolean(),
      (piece, far, u, close) => {
        const on = pointOn(piece, u);
        const asked = close ? { x: on.x + far.x / 50, y: on.y + far.y / 50 } : far;
        const nearest = nearestOnPiece(piece, asked);
        expect(distance(nearest.point, pointOn(piece, nearest.u))).toBe(0);
        expect(distance(nearest.point, asked)).toBe(nearest.distance);
        for (let i = 0; i <= 200; i++) {
          expect(distance(pointOn(piece, i / 200), asked)).toBeGreaterThanOrEqual(nearest.distance - 1e-12);
        }
      },
    ),
    { seed: SEED, numRuns: 300, endOnFailure: true },
  );
});

it('a point on the piece finds itself', () => {
  fc.assert(
    fc.property(pieces, fc.double({ min: 0, max: 1, noNaN: true }), (piece, u) => {
      expect(nearestOnPiece(piece, pointOn(piece, u)).distance).toBeLessThan(1e-12);
    }),
    { seed: SEED, numRuns: 300, endOnFailure: true },
  );
});

it('from the centre of a whole circle any point is as near as the radius', () => {
  const circle = { kind: 'arc', centre: { x: 1, y: 2 }, radius: 3, start: 0.5, turn: 2 * Math.PI } as const;
  expect(nearestOnPiece(circle, { x: 1, y: 2 }).distance).toBeCloseTo(3, 12);
  expect(nearestOnPiece(circle, { x: 10, y: 2 }).point.x).toBeCloseTo(4, 12);
});

it('at the cusp of a parallel that turns back the cusp itself can be the nearest', () => {
  const parallel: CycloidPiece = {
    kind: 'cycloid',
    fixed: 15,
    rolling: 1,
    cusp: 0,
    sense: 1,
    offset: -0.5,
    from: 0,
    to: 0.1,
  };
  const grid = Array.from({ length: 20001 }, (_, i) => pointOn(parallel, i / 20000));
  for (const asked of [
    { x: 15.2, y: 0.6 },
    { x: 15.6, y: 0.2 },
    { x: 14.5, y: 0.3 },
  ]) {
    const least = Math.min(...grid.map((point) => distance(point, asked)));
    expect(nearestOnPiece(parallel, asked).distance).toBeLessThanOrEqual(least + 1e-12);
    expect(nearestOnPiece(parallel, asked).distance).toBeGreaterThan(least - 1e-6);
  }
});

it('of a chain the nearest piece is named', () => {
  const chain = [
    { kind: 'line', from: { x: 0, y: 0 }, to: { x: 2, y: 0 } },
    { kind: 'line', from: { x: 2, y: 0 }, to: { x: 2, y: 2 } },
  ] as const;
  expect(nearestOnChain(chain, { x: 2.5, y: 1 })).toEqual({
    u: 0.5,
    point: { x: 2, y: 1 },
    distance: 0.5,
    index: 1,
  });
  expect(nearestOnChain([], { x: 0, y: 0 })).toBeUndefined();
});
