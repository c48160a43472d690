import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { areaOfChain } from '../../src/geometry/area-of-chain.ts';
import { boundsOfChain } from '../../src/geometry/bounds-of-chain.ts';
import { repeatRound } from '../../src/geometry/change-piece.ts';
import { pointOn } from '../../src/geometry/on-piece.ts';
import type { Loop } from '../../src/geometry/piece.ts';
import { pointInLoop } from '../../src/geometry/point-in-loop.ts';
import { distance, type Point } from '../../src/geometry/point.ts';
import { findRoot, leastOn } from '../../src/geometry/roots.ts';
import { distanceToRing, holdsPoint } from '../../src/geometry/ring.ts';
import { sampleLoop, sampleParameters, samplePiece } from '../../src/geometry/sample-piece.ts';
import { distanceToSleeve, sleeveOf, sleevesTouch } from '../../src/geometry/sleeve.ts';
import { nearestOnPiece } from '../../src/geometry/nearest-on-piece.ts';
import { arcPieces, cycloidPieces, pieces, points, SEED } from './random-pieces.ts';
import { toothSector } from './sample-wheel.ts';

const run = { seed: SEED, numRuns: 200, endOnFailure: true };

/** The wheel of the published set: m = 1, 64 teeth, 8 leaves, brought to a point, tooth half the pitch. */
const POINTED = { teeth: 64, module: 1, leaves: 8, height: 1, tooth: 0.5, dedendum: Math.PI / 2 };

describe('area', () => {
  it('of a pointed addendum above the pitch circle, N = 64, z = 8: 1.5230121898 [computed from first principles elsewhere]', () => {
    const sector = toothSector(POINTED);
    const sides = areaOfChain([sector[2], sector[3]].filter((piece) => piece !== undefined));
    const half = Math.PI / 128;
    expect(sides - 32 * 32 * half).toBeCloseTo(1.5230121898, 9);
  });

  it('of a ring sector: half the angle times the difference of squares', () => {
    const loop: Loop = [
      { kind: 'arc', centre: { x: 0, y: 0 }, radius: 5, start: 0.2, turn: 0.7 },
      { kind: 'line', from: pointAt(5, 0.9), to: pointAt(3, 0.9) },
      { kind: 'arc', centre: { x: 0, y: 0 }, radius: 3, start: 0.9, turn: -0.7 },
      { kind: 'line', from: pointAt(3, 0.2), to: pointAt(5, 0.2) },
    ];
    expect(areaOfChain(loop)).toBeCloseTo(0.35 * 16, 12);
  });
});

function pointAt(radius: number, angle: number): Point {
  return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
}

it('the box holds every point and is touched on each side', () => {
  fc.assert(
    fc.property(pieces, (piece) => {
      const box = boundsOfChain([piece]);
      const seen = Array.from({ length: 2001 }, (_, i) => pointOn(piece, i / 2000));
      const [xs, ys] = [seen.map(({ x }) => x), seen.map(({ y }) => y)];
      expect(Math.abs(Math.max(...xs) - box.maxX)).toBeLessThan(5e-3);
      expect(Math.abs(Math.min(...xs) - box.minX)).toBeLessThan(5e-3);
      expect(Math.abs(Math.max(...ys) - box.maxY)).toBeLessThan(5e-3);
      expect(Math.abs(Math.min(...ys) - box.minY)).toBeLessThan(5e-3);
      expect(box.maxX).toBeGreaterThanOrEqual(Math.max(...xs) - 1e-12);
      expect(box.minY).toBeLessThanOrEqual(Math.min(...ys) + 1e-12);
    }),
    run,
  );
});

it('inside a wheel is what a fine polygon of it says, away from the outline', () => {
  const loop = repeatRound(toothSector({ ...POINTED, teeth: 9, height: 0.8 }), 9);
  const ring = sampleLoop(loop, 1e-5);
  fc.assert(
    fc.property(points, (point) => {
      const near = { x: point.x / 4, y: point.y / 4 };
      fc.pre(distanceToRing(ring, near) > 1e-4);
      expect(pointInLoop(loop, near)).toBe(holdsPoint(ring, near));
    }),
    run,
  );
});

it('a ray through a joint counts once', () => {
  const diamond: Loop = [0, 1, 2, 3].map((k) => ({
    kind: 'line',
    from: pointAt(1, (k * Math.PI) / 2),
    to: pointAt(1, ((k + 1) * Math.PI) / 2),
  }));
  expect(pointInLoop(diamond, { x: 0.1, y: 0 })).toBe(true);
  expect(pointInLoop(diamond, { x: -2, y: 0 })).toBe(false);
  expect(pointInLoop(diamond, { x: -2, y: 1 })).toBe(false);
});

describe('samples', () => {
  it('no chord sags more than asked, and few are finer than half of it asks for', () => {
    fc.assert(
      fc.property(fc.oneof(arcPieces, cycloidPieces), fc.constantFrom(0.001, 0.05), (piece, sag) => {
        const cuts = sampleParameters(piece, sag);
        expect(cuts[0]).toBe(0);
        expect(cuts.at(-1)).toBe(1);
        const places = samplePiece(piece, sag);
        for (let i = 1; i < cuts.length; i++) {
          const [from, to] = [cuts[i - 1] as number, cuts[i] as number];
          const chord = { kind: 'line', from: places[i - 1] as Point, to: places[i] as Point } as const;
          for (const share of [0.25, 0.5, 0.75]) {
            const off = nearestOnPiece(chord, pointOn(piece, from + share * (to - from))).distance;
            expect(off).toBeLessThanOrEqual(sag * 1.001);
          }
        }
      }),
      run,
    );
  });

  it('an arc has the fewest chords there can be', () => {
    const arc = { kind: 'arc', centre: { x: 0, y: 0 }, radius: 5, start: 0, turn: 1 } as const;
    const step = 2 * Math.acos(1 - 0.001 / 5);
    expect(samplePiece(arc, 0.001)).toHaveLength(Math.ceil(1 / step) + 1);
  });
});

it('what a sleeve leaves out is really far', () => {
  fc.assert(
    fc.property(pieces, pieces, points, (a, b, point) => {
      expect(distanceToSleeve(point, sleeveOf(a))).toBeLessThanOrEqual(
        nearestOnPiece(a, point).distance + 1e-9,
      );
      if (!sleevesTouch(sleeveOf(a), sleeveOf(b))) {
        for (let i = 0; i <= 20; i++) {
          expect(nearestOnPiece(b, pointOn(a, i / 20)).distance).toBeGreaterThan(0);
        }
      }
    }),
    run,
  );
});

describe('roots', () => {
  it('of x3 - 2 is its cube root', () => {
    expect(findRoot((x) => x ** 3 - 2, 0, 2)).toBeCloseTo(Math.cbrt(2), 15);
    expect(findRoot((x) => x ** 3 - 2, 2, 0)).toBeCloseTo(Math.cbrt(2), 15);
  });
  it('a flat end does not hold the bracket open', () => {
    expect(findRoot((x) => x ** 15 - 1e-9, 0, 3)).toBeCloseTo(1e-9 ** (1 / 15), 10);
  });
  it('no change of sign is our fault', () => {
    expect(() => findRoot((x) => x * x + 1, -1, 1)).toThrow('bracketed');
  });
  it('the deepest of several dips is found', () => {
    const f = (x: number): number => Math.cos(7 * x) + 0.1 * x;
    const { x, value } = leastOn(f, 0, 3, 40, 1e-9);
    expect(x).toBeCloseTo((Math.PI - Math.asin(0.1 / 7)) / 7, 4);
    expect(value).toBeLessThan(f(Math.PI / 7 + 0.01));
    expect(distance({ x, y: value }, { x, y: f(x) })).toBeLessThan(1e-12);
  });
});
