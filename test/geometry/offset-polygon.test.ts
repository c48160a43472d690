import ClipperLib from 'clipper-lib';
import { describe, expect, it } from 'vitest';
import { Bug } from '../../src/base/bug.ts';
import { CLIPPER_STEP } from '../../src/base/tolerances.ts';
import { offsetPolygon, type Ring } from '../../src/geometry/offset-polygon.ts';
import { distance, polar, type Point } from '../../src/geometry/point.ts';
import { distanceToRing, ringArea } from '../../src/geometry/ring.ts';

const SAG = 0.0005;
const square = (half: number): Point[] => [
  { x: -half, y: -half },
  { x: half, y: -half },
  { x: half, y: half },
  { x: -half, y: half },
];

function grown(rings: readonly Ring[], by: number, sag = SAG): Ring[] {
  const outcome = offsetPolygon(rings, by, sag);
  expect(outcome.ok).toBe(true);
  return outcome.ok ? outcome.value : [];
}

it('a square grows by quarter circles: area a2 + 4 a d + pi d2 [Steiner formula]', () => {
  const [ring] = grown([square(1)], 0.5) as [Ring];
  expect(ringArea(ring)).toBeCloseTo(4 + 4 + Math.PI * 0.25, 2);
  expect(Math.max(...ring.map(({ x }) => x))).toBeCloseTo(1.5, 8);
});

describe('guards of clipper-lib 6.4.2, one by one', () => {
  it('a coordinate or distance that is no number is our fault, not an empty answer', () => {
    expect(() => offsetPolygon([[...square(1), { x: Number.NaN, y: 0 }]], 0.1, SAG)).toThrow(Bug);
    expect(() => offsetPolygon([[...square(1), { x: Infinity, y: 0 }]], 0.1, SAG)).toThrow(Bug);
    expect(() => offsetPolygon([square(1)], Number.NaN, SAG)).toThrow(Bug);
    expect(() => offsetPolygon([square(1)], 0.1, 0)).toThrow(Bug);
  });

  it('what grows past its fast exact range is refused, though the input still fits', () => {
    const limit = 47_453_132 * CLIPPER_STEP;
    expect(offsetPolygon([square(limit - 5)], 4, 0.1).ok).toBe(true);
    const outcome = offsetPolygon([square(limit - 5)], 6, 0.1);
    expect(outcome.ok).toBe(false);
    expect(outcome.problems.map(({ code }) => code)).toEqual(['reach.too-large']);
  });

  it('nothing left is an answer', () => {
    expect(grown([square(1)], -1.1)).toEqual([]);
    expect(grown([], 1)).toEqual([]);
  });

  it('arcs keep the sag that was asked for, which clipper-lib itself overshoots', () => {
    const sagOf = (ring: readonly Point[], radius: number): number =>
      Math.max(
        ...ring.map((a, i) => {
          const b = ring[(i + 1) % ring.length] as Point;
          const middle = { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
          const corner = { x: Math.sign(middle.x), y: Math.sign(middle.y) };
          return distance(a, b) < 0.9 * radius ? radius - distance(middle, corner) : 0;
        }),
      );
    let [worst, bare] = [0, 0];
    for (let radius = 0.1; radius < 0.5; radius += 0.01) {
      const ring = grown([square(1)], radius, 0.0001)[0] as Ring;
      worst = Math.max(worst, sagOf(ring, radius));
      const offset = new ClipperLib.ClipperOffset(2, 0.0001 / CLIPPER_STEP);
      const path = square(1).map(({ x, y }) => ({ X: x / CLIPPER_STEP, Y: y / CLIPPER_STEP }));
      offset.AddPath(path, ClipperLib.JoinType.jtRound, ClipperLib.EndType.etClosedPolygon);
      const out: { X: number; Y: number }[][] = [];
      offset.Execute(out, radius / CLIPPER_STEP);
      bare = Math.max(
        bare,
        sagOf(
          (out[0] ?? []).map(({ X, Y }) => ({ x: X * CLIPPER_STEP, y: Y * CLIPPER_STEP })),
          radius,
        ),
      );
    }
    expect(bare).toBeGreaterThan(0.0001);
    expect(worst).toBeLessThan(0.0001 + CLIPPER_STEP);
  });

  it('a hole is kept whichever way round it was given', () => {
    for (const hole of [square(1), square(1).toReversed()]) {
      for (const outer of [square(2), square(2).toReversed()]) {
        const rings = grown([hole, outer], 0.25);
        expect(rings.map((ring) => Math.sign(ringArea(ring))).sort()).toEqual([-1, 1]);
        expect(rings.reduce((sum, ring) => sum + ringArea(ring), 0)).toBeCloseTo(
          16 + 4 + Math.PI / 16 - 2.25,
          2,
        );
      }
    }
  });

  it('an island in a hole grows outward', () => {
    const rings = grown([square(3), square(2), square(1)], 0.1);
    expect(rings).toHaveLength(3);
    expect(rings.filter((ring) => ringArea(ring) > 0)).toHaveLength(2);
  });

  it('rings begin near where the given one began, not at the lowest corner', () => {
    const turned = [...square(1).slice(2), ...square(1).slice(0, 2)];
    const [first] = grown([turned], 0.2)[0] as Ring;
    expect(distance(first as Point, { x: 1, y: 1 })).toBeLessThan(0.21);
  });

  it('no corner turns straight back, nor repeats the one before', () => {
    const wavy = Array.from({ length: 4000 }, (_, i) =>
      polar(5 + 0.3 * Math.sin(i / 20), (2 * Math.PI * i) / 4000),
    );
    for (const ring of grown([wavy], 0.4, 0.0001)) {
      ring.forEach((corner, i) => {
        const before = ring[(i + ring.length - 1) % ring.length] as Point;
        const after = ring[(i + 1) % ring.length] as Point;
        const [a, b] = [distance(before, corner), distance(corner, after)];
        expect(a).toBeGreaterThan(0);
        const back =
          (corner.x - before.x) * (after.x - corner.x) + (corner.y - before.y) * (after.y - corner.y);
        expect(back < -0.5 * a * b && Math.min(a, b) < 3 * CLIPPER_STEP).toBe(false);
      });
    }
  });

  it('a last point that repeats the first is no corner', () => {
    const closed = [...square(1), square(1)[0] as Point];
    expect(grown([closed], 0.2)[0]).toHaveLength(grown([square(1)], 0.2)[0]?.length ?? 0);
  });

  it('rings of fewer than three corners are nothing', () => {
    expect(
      grown(
        [
          [
            { x: 0, y: 0 },
            { x: 1, y: 1 },
          ],
        ],
        0.2,
      ),
    ).toEqual([]);
  });
});

it('every corner of the grown ring lies the distance from the given one', () => {
  const star = Array.from({ length: 20 }, (_, i) => polar(i % 2 === 0 ? 3 : 1.5, (2 * Math.PI * i) / 20));
  for (const by of [0.05, 0.3, 1, 4]) {
    for (const corner of grown([star], by).flat()) {
      expect(Math.abs(distanceToRing(star, corner) - by)).toBeLessThan(SAG);
    }
  }
});
