/** Epicycloids and hypocycloids against what is printed about them. */
import { describe, expect, it } from 'vitest';
import { curvatureOn, lengthOf } from '../../src/geometry/on-piece.ts';
import { cross, dot, norm, type Point } from '../../src/geometry/point.ts';
import {
  epicycloidArch,
  epicycloidNormal,
  epicycloidPoint,
  epicycloidRadius,
  wholeEpicycloid,
} from '../../src/tooth/epicycloid.ts';
import {
  hypocycloidArch,
  hypocycloidNormal,
  hypocycloidPoint,
  hypocycloidRadius,
  wholeHypocycloid,
} from '../../src/tooth/hypocycloid.ts';

/** Length and area of a closed curve by summing chords: no formula of ours in it. */
function measure(pointAt: (t: number) => Point, turns: number): { length: number; area: number } {
  const steps = 100_000 * turns;
  let length = 0;
  let area = 0;
  let last = pointAt(0);
  for (let i = 1; i <= steps; i++) {
    const next = pointAt((2 * Math.PI * turns * i) / steps);
    length += Math.hypot(next.x - last.x, next.y - last.y);
    area += cross(last, next) / 2;
    last = next;
  }
  return { length, area };
}

describe('epicycloid [Wikipedia, "Epicycloid"]', () => {
  it.each([1, 2, 3, 4, 5])('with R = %d r is (k+1)(k+2) pi r^2 in area and 8(k+1) r long', (k) => {
    const r = 1.5;
    const whole = wholeEpicycloid(k * r, r);
    expect(whole?.turns).toBe(1);
    expect(whole?.cusps).toBe(k);
    expect(whole?.area).toBeCloseTo((k + 1) * (k + 2) * Math.PI * r * r, 9);
    expect(whole?.length).toBeCloseTo(8 * (k + 1) * r, 9);
    const summed = measure((t) => epicycloidPoint(k * r, r, t), 1);
    expect(summed.length).toBeCloseTo(8 * (k + 1) * r, 5);
    expect(summed.area).toBeCloseTo((k + 1) * (k + 2) * Math.PI * r * r, 5);
  });

  it.each([1, 2, 3, 5])('has its %d cusps on the fixed circle and lies between R and R + 2r', (k) => {
    for (let i = 0; i < k; i++) {
      expect(norm(epicycloidPoint(30, 30 / k, (2 * Math.PI * i) / k))).toBeCloseTo(30, 9);
      expect(norm(epicycloidPoint(30, 30 / k, (2 * Math.PI * (i + 0.5)) / k))).toBeCloseTo(30 + 60 / k, 9);
    }
  });

  it('is x = (R+r)cos t - r cos((R+r)t/r), y likewise with sine', () => {
    const [R, r, t] = [7, 2.5, 0.83];
    const point = epicycloidPoint(R, r, t);
    expect(point.x).toBeCloseTo((R + r) * Math.cos(t) - r * Math.cos(((R + r) / r) * t), 12);
    expect(point.y).toBeCloseTo((R + r) * Math.sin(t) - r * Math.sin(((R + r) / r) * t), 12);
  });

  it('has an arch 17 long for R = 32, r = 2 [8 r (R + r)/R]', () => {
    expect(lengthOf(epicycloidArch(32, 2))).toBeCloseTo(17, 12);
  });
});

describe('hypocycloid [MathWorld, "Hypocycloid"]', () => {
  it.each([3, 4, 5, 6])('with %d cusps is 8R(n-1)/n long and pi R^2 (n-1)(n-2)/n^2 in area', (n) => {
    const R = 6;
    const whole = wholeHypocycloid(R, R / n);
    const length = (8 * R * (n - 1)) / n;
    const area = (Math.PI * R * R * (n - 1) * (n - 2)) / (n * n);
    expect(whole?.cusps).toBe(n);
    expect(whole?.length).toBeCloseTo(length, 9);
    expect(whole?.area).toBeCloseTo(area, 9);
    const summed = measure((t) => hypocycloidPoint(R, R / n, t), 1);
    expect(summed.length).toBeCloseTo(length, 5);
    expect(summed.area).toBeCloseTo(area, 5);
  });
});

describe('radius of curvature [Encyclopaedia Britannica, 11th ed., "Mechanics" sec. 50, eq. 28]', () => {
  const at = 0.6;

  it('of the epicycloid is 4 r sin(theta) (R+r)/(R+2r)', () => {
    const arch = epicycloidArch(32, 2);
    // The obliquity is R t / 2r, and u = t / (2 pi r / R): theta = pi u.
    expect(1 / curvatureOn(arch, at / Math.PI)).toBeCloseTo(epicycloidRadius(32, 2, at), 10);
    expect(epicycloidRadius(32, 2, at)).toBeCloseTo((4 * 2 * Math.sin(at) * 34) / 36, 12);
  });

  it('of the hypocycloid is 4 r sin(theta) (R-r)/(R-2r)', () => {
    const arch = hypocycloidArch(32, 2);
    expect(Math.abs(1 / curvatureOn(arch, at / Math.PI))).toBeCloseTo(hypocycloidRadius(32, 2, at), 10);
    expect(hypocycloidRadius(32, 2, at)).toBeCloseTo((4 * 2 * Math.sin(at) * 30) / 28, 12);
  });

  it.each([
    ['epicycloid', epicycloidPoint, epicycloidRadius],
    ['hypocycloid', hypocycloidPoint, hypocycloidRadius],
  ] as const)('of the %s is that of the circle through three near points', (_, pointAt, radius) => {
    const h = 1e-4;
    const t = (2 * 2 * at) / 32;
    const [a, b, c] = [pointAt(32, 2, t - h), pointAt(32, 2, t), pointAt(32, 2, t + h)];
    const sides = [norm({ x: a.x - b.x, y: a.y - b.y }), norm({ x: b.x - c.x, y: b.y - c.y })];
    const far = { x: c.x - a.x, y: c.y - a.y };
    const area = Math.abs(cross({ x: b.x - a.x, y: b.y - a.y }, far)) / 2;
    const circle = ((sides[0] ?? 0) * (sides[1] ?? 0) * norm(far)) / (4 * area);
    expect(circle / radius(32, 2, at)).toBeCloseTo(1, 5);
  });
});

describe('common practice, no source', () => {
  it('ratio 1 is the cardioid: its polar equation from the cusp is 2a(1 - cos)', () => {
    for (const t of [0.3, 1.1, 2.7, 4]) {
      const point = epicycloidPoint(1, 1, t);
      const rho = Math.hypot(point.x - 1, point.y);
      const angle = Math.atan2(point.y, point.x - 1);
      expect(rho).toBeCloseTo(2 * (1 - Math.cos(angle)), 12);
    }
  });

  it('ratio 2 is the nephroid: (x^2 + y^2 - 4a^2)^3 = 108 a^4 y^2', () => {
    for (const t of [0.2, 1, 2.5, 5]) {
      const { x, y } = epicycloidPoint(2, 1, t);
      expect((x * x + y * y - 4) ** 3).toBeCloseTo(108 * y * y, 9);
    }
  });

  it('the hypocycloid of ratio 2 runs along a diameter', () => {
    for (const t of [0, 0.4, 1.3, 2.9]) {
      const point = hypocycloidPoint(10, 5, t);
      expect(point.y).toBeCloseTo(0, 12);
      expect(point.x).toBeCloseTo(10 * Math.cos(t), 12);
    }
    expect(wholeHypocycloid(10, 5)?.area).toBe(0);
    expect(hypocycloidRadius(10, 5, 0.4)).toBe(Infinity);
  });

  it('ratio 3 is the deltoid: (x^2+y^2)^2 + 18 a^2 (x^2+y^2) - 27 a^4 = 8a(x^3 - 3xy^2)', () => {
    for (const t of [0.2, 1, 2.5, 5]) {
      const { x, y } = hypocycloidPoint(3, 1, t);
      const square = x * x + y * y;
      expect(square * square + 18 * square - 27).toBeCloseTo(8 * (x ** 3 - 3 * x * y * y), 9);
    }
  });

  it('ratio 4 is the astroid: x^(2/3) + y^(2/3) = R^(2/3)', () => {
    for (const t of [0.2, 1, 2.5, 5]) {
      const { x, y } = hypocycloidPoint(4, 1, t);
      expect(Math.cbrt(x * x) + Math.cbrt(y * y)).toBeCloseTo(Math.cbrt(16), 9);
    }
  });

  it.each([
    [5, 2, 2, 5],
    [2.1, 1, 10, 21],
    [3.8, 1, 5, 19],
    [7.2, 1, 5, 36],
    [16, 15, 15, 16],
  ])('R = %d, r = %d closes after %d turns with %d cusps', (R, r, turns, cusps) => {
    expect(wholeEpicycloid(R, r)).toMatchObject({ turns, cusps });
    const end = epicycloidPoint(R, r, 2 * Math.PI * turns);
    expect(Math.hypot(end.x - R, end.y)).toBeLessThan(1e-9 * R);
    for (let early = 1; early < turns; early++) {
      const there = epicycloidPoint(R, r, 2 * Math.PI * early);
      expect(Math.hypot(there.x - R, there.y)).toBeGreaterThan(1e-3);
    }
    const summed = measure((t) => epicycloidPoint(R, r, t), turns);
    expect(summed.length / (wholeEpicycloid(R, r)?.length ?? 0)).toBeCloseTo(1, 6);
    expect(summed.area / (wholeEpicycloid(R, r)?.area ?? 0)).toBeCloseTo(1, 6);
  });

  it.each([Math.SQRT2, Math.PI, (1 + Math.sqrt(5)) / 2, Math.E])('a ratio of %d never closes', (ratio) => {
    expect(wholeEpicycloid(ratio, 1)).toBeUndefined();
    expect(wholeHypocycloid(ratio, 1)).toBeUndefined();
  });
});

it('the normal passes through the contact point and is square to the curve [EB 9th ed., "Clocks": the law of rolling]', () => {
  const h = 1e-6;
  for (const [pointAt, normalAt] of [
    [epicycloidPoint, epicycloidNormal],
    [hypocycloidPoint, hypocycloidNormal],
  ] as const) {
    for (const t of [0.05, 0.2, 0.35]) {
      const point = pointAt(32, 2, t);
      const normal = normalAt(32, 2, t);
      const contact = { x: 32 * Math.cos(t), y: 32 * Math.sin(t) };
      const spoke = { x: point.x - contact.x, y: point.y - contact.y };
      expect(norm(normal)).toBeCloseTo(1, 12);
      expect(cross(spoke, normal)).toBeCloseTo(0, 10);
      expect(dot(spoke, normal)).toBeGreaterThan(0);
      const [a, b] = [pointAt(32, 2, t - h), pointAt(32, 2, t + h)];
      expect(dot({ x: b.x - a.x, y: b.y - a.y }, normal) / h).toBeCloseTo(0, 5);
    }
  }
});
