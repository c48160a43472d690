/**
 * The curve traced by a point of a circle of radius r that rolls outside a circle of radius R about the origin.
 *
 * t is the polar angle of the contact point, the first cusp lies on +X. The formulas stand in `geometry/cycloid.ts`;
 * here are the names of the trade, the single arch and the whole curve.
 * Whole curve: length 8 r (R + r)/R for each cusp, area (R + r)(R + 2r) pi for each turn (Wikipedia, "Epicycloid").
 */
import { cycloidNormal, cycloidPoint } from '../geometry/cycloid.ts';
import type { CycloidPiece } from '../geometry/piece.ts';
import type { Point } from '../geometry/point.ts';
import { ratioOf, type WholeCurve } from './rolled-curve.ts';

/** One arch, from cusp to cusp. */
export function epicycloidArch(fixed: number, rolling: number, cusp = 0): CycloidPiece {
  const to = (2 * Math.PI * rolling) / fixed;
  return { kind: 'cycloid', fixed, rolling, cusp, sense: 1, offset: 0, from: 0, to };
}

export function epicycloidPoint(fixed: number, rolling: number, t: number): Point {
  return cycloidPoint(epicycloidArch(fixed, rolling), t);
}

/** Unit normal, away from the contact point: to the convex side. On the first arch. */
export function epicycloidNormal(fixed: number, rolling: number, t: number): Point {
  return cycloidNormal(epicycloidArch(fixed, rolling), t);
}

/** Radius of curvature at an obliquity: 4 r sin(theta) (R + r)/(R + 2r). EB 11th ed., "Mechanics" sec. 50, eq. 28. */
export function epicycloidRadius(fixed: number, rolling: number, obliquity: number): number {
  return (4 * rolling * Math.sin(obliquity) * (fixed + rolling)) / (fixed + 2 * rolling);
}

/** `undefined` where the curve never closes. */
export function wholeEpicycloid(fixed: number, rolling: number): WholeCurve | undefined {
  const ratio = ratioOf(fixed, rolling);
  return (
    ratio && {
      ...ratio,
      length: (ratio.cusps * 8 * rolling * (fixed + rolling)) / fixed,
      area: ratio.turns * Math.PI * (fixed + rolling) * (fixed + 2 * rolling),
    }
  );
}
