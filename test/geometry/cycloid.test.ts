import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { areaOfChain } from '../../src/geometry/area-of-chain.ts';
import { offsetPiece, partOf, reversePiece } from '../../src/geometry/change-piece.ts';
import {
  contactPoint,
  cycloidCusps,
  cycloidNormal,
  cycloidPoint,
  cycloidRadius,
} from '../../src/geometry/cycloid.ts';
import {
  curvatureOn,
  endOf,
  headingOn,
  lengthOf,
  pointOn,
  startOf,
  velocityOn,
} from '../../src/geometry/on-piece.ts';
import type { CycloidPiece } from '../../src/geometry/piece.ts';
import { cross, distance, dot, norm, subtract } from '../../src/geometry/point.ts';
import { cycloidPieces, SEED } from './random-pieces.ts';

/** The closed curve, arch by arch. */
function arches(fixed: number, rolling: number, count: number): CycloidPiece[] {
  const arch = (2 * Math.PI * Math.abs(rolling)) / fixed;
  return Array.from({ length: count }, (_, i) => ({
    kind: 'cycloid',
    fixed,
    rolling,
    cusp: 0,
    sense: 1,
    offset: 0,
    from: i * arch,
    to: (i + 1) * arch,
  }));
}

describe('closed curves', () => {
  it.each([1, 2, 3, 5, 16])(
    'R = %i r has area (k+1)(k+2) pi r2 and length 8 (k+1) r [Wikipedia "Epicycloid"]',
    (k) => {
      const r = 1.3;
      const whole = arches(k * r, r, k);
      expect(areaOfChain(whole)).toBeCloseTo((k + 1) * (k + 2) * Math.PI * r * r, 9);
      expect(whole.reduce((sum, piece) => sum + lengthOf(piece), 0)).toBeCloseTo(8 * (k + 1) * r, 10);
    },
  );

  it.each([3, 4, 7])(
    'hypocycloid of %i cusps: length 8R(n-1)/n, area pi R2 (n-1)(n-2)/n2 [MathWorld "Hypocycloid"]',
    (n) => {
      const R = 2.5;
      const whole = arches(R, -R / n, n);
      expect(Math.abs(areaOfChain(whole))).toBeCloseTo((Math.PI * R * R * (n - 1) * (n - 2)) / (n * n), 9);
      expect(whole.reduce((sum, piece) => sum + lengthOf(piece), 0)).toBeCloseTo((8 * R * (n - 1)) / n, 10);
    },
  );

  it('ratio 2 inside runs along a diameter: heading and curvature to the very end [common knowledge]', () => {
    const line: CycloidPiece = { ...(arches(4, -2, 1)[0] as CycloidPiece), to: 2 };
    for (const u of [0, 0.3, 1]) {
      expect(curvatureOn(line, u)).toBe(0);
      expect(pointOn(line, u).y).toBeCloseTo(0, 12);
      expect(Math.abs(headingOn(line, u).x)).toBeCloseTo(1, 12);
    }
  });

  it('cardioid in its known equation 2a(1 - cos) about the cusp [Wikipedia "Cardioid"]', () => {
    const [cardioid] = arches(1, 1, 1) as [CycloidPiece];
    for (const u of [0.1, 0.35, 0.5, 0.8]) {
      const seen = subtract(pointOn(cardioid, u), { x: 1, y: 0 });
      expect(norm(seen)).toBeCloseTo(2 * (1 - Math.cos(Math.atan2(seen.y, seen.x))), 10);
    }
  });
});

describe('a partial arc', () => {
  const flank: CycloidPiece = {
    ...(arches(32, 2, 1)[0] as CycloidPiece),
    to: (2 * 2 * ((37.71 / 180) * Math.PI)) / 32,
  };

  it('has radius of curvature 4 r sin(theta) (R+r)/(R+2r) [Encyclopaedia Britannica 11th, "Mechanics" 50, eq. 28]', () => {
    const theta = (32 * flank.to) / 4;
    expect(cycloidRadius(flank, flank.to)).toBeCloseTo((8 * Math.sin(theta) * 34) / 36, 12);
    expect(1 / curvatureOn(flank, 1)).toBeCloseTo(4.6211, 3);
  });

  it('has sector area (1/2)(R+r)(R+2r)(t - (r/R) sin(R t/r)) [Green, by hand]', () => {
    const t = flank.to;
    expect(areaOfChain([flank])).toBeCloseTo(0.5 * 34 * 36 * (t - (2 / 32) * Math.sin(16 * t)), 10);
  });
});

describe('against finite differences', () => {
  const step = 1e-6;

  it('heading, velocity and curvature of any span, offset or not, run with the points', () => {
    fc.assert(
      fc.property(cycloidPieces, fc.double({ min: 0.05, max: 0.95, noNaN: true }), (piece, u) => {
        const along = subtract(pointOn(piece, u + step), pointOn(piece, u - step));
        const speed = norm(along) / (2 * step);
        fc.pre(speed > 0.05);
        expect(
          distance(velocityOn(piece, u), { x: along.x / (2 * step), y: along.y / (2 * step) }),
        ).toBeLessThan(1e-5 * (1 + speed));
        const heading = headingOn(piece, u);
        expect(dot(heading, along)).toBeCloseTo(norm(along), 9);
        const turn = cross(headingOn(piece, u - step), headingOn(piece, u + step)) / norm(along);
        expect(Math.abs(curvatureOn(piece, u) - turn)).toBeLessThan(1e-4 * (1 + Math.abs(turn)));
      }),
      { seed: SEED, numRuns: 500, endOnFailure: true },
    );
  });

  it('every normal passes through the point where the circles touch (the rolling law)', () => {
    fc.assert(
      fc.property(cycloidPieces, (piece) => {
        const t = (piece.from + piece.to) / 2;
        const spoke = subtract(cycloidPoint(piece, t), contactPoint(piece, t));
        expect(Math.abs(cross(spoke, cycloidNormal(piece, t)))).toBeLessThan(1e-11);
        expect(dot(spoke, headingOn(piece, 0.5))).toBeCloseTo(0, 10);
      }),
      { seed: SEED, numRuns: 300, endOnFailure: true },
    );
  });

  it('length and area agree with a fine polygon, cusps of the parallel included', () => {
    fc.assert(
      fc.property(cycloidPieces, (piece) => {
        let [length, area] = [0, 0];
        const n = 4000;
        for (let i = 0; i < n; i++) {
          const [a, b] = [pointOn(piece, i / n), pointOn(piece, (i + 1) / n)];
          length += distance(a, b);
          area += cross(a, b) / 2;
        }
        expect(Math.abs(lengthOf(piece) - length)).toBeLessThan(2e-4);
        expect(Math.abs(areaOfChain([piece]) - area)).toBeLessThan(2e-3);
      }),
      { seed: SEED, numRuns: 100, endOnFailure: true },
    );
  });
});

it('the parallel lies to the right of travel, whichever way the span runs', () => {
  fc.assert(
    fc.property(cycloidPieces, fc.double({ min: 0.01, max: 0.4, noNaN: true }), (piece, offset) => {
      const curve = { ...piece, offset: 0 };
      for (const span of [curve, reversePiece(curve)]) {
        const parallel = offsetPiece(span, offset);
        const heading = headingOn(span, 0.5);
        const moved = subtract(pointOn(parallel ?? span, 0.5), pointOn(span, 0.5));
        expect(cross(heading, moved)).toBeCloseTo(-offset, 9);
      }
    }),
    { seed: SEED, numRuns: 200, endOnFailure: true },
  );
});

it('a part has the points of the whole, and headings that hold at a cusp', () => {
  fc.assert(
    fc.property(cycloidPieces, (piece) => {
      const cuts = cycloidCusps(piece).map((t) => (t - piece.from) / (piece.to - piece.from));
      const ends = [0, ...cuts, 1];
      ends.slice(1).forEach((to, i) => {
        const from = ends[i] as number;
        fc.pre(to - from > 1e-4);
        const part = partOf(piece, from, to);
        expect(distance(startOf(part), pointOn(piece, from))).toBeLessThan(1e-11);
        expect(distance(endOf(part), pointOn(piece, to))).toBeLessThan(1e-11);
        // Between cusps the heading never jumps: from end to end it turns as far as the roll says.
        expect(dot(headingOn(part, 0), headingOn(part, 1e-5))).toBeGreaterThan(0.99);
        expect(dot(headingOn(part, 1), headingOn(part, 1 - 1e-5))).toBeGreaterThan(0.99);
      });
    }),
    { seed: SEED, numRuns: 300, endOnFailure: true },
  );
});
