/**
 * The curve traced by a point of a circle of radius r that rolls inside a circle of radius R about the origin, r < R.
 *
 * t is the polar angle of the contact point, the first cusp lies on +X. The formulas are those of the epicycloid with -r
 * for r (`geometry/cycloid.ts`); with R = 2r the point runs along a diameter: the radial flank.
 * Whole curve: length 8 r (R - r)/R for each cusp, area (R - r)(R - 2r) pi for each turn (MathWorld, "Hypocycloid").
 */
import { cycloidNormal, cycloidPoint } from '../geometry/cycloid.ts';
import type { CycloidPiece } from '../geometry/piece.ts';
import type { Point } from '../geometry/point.ts';
import { ratioOf, type WholeCurve } from './rolled-curve.ts';

/** One arch, from cusp to cusp. */
export function hypocycloidArch(fixed: number, rolling: number, cusp = 0): CycloidPiece {
  const to = (2 * Math.PI * rolling) / fixed;
  return { kind: 'cycloid', fixed, rolling: -rolling, cusp, sense: 1, offset: 0, from: 0, to };
}

export function hypocycloidPoint(fixed: number, rolling: number, t: number): Point {
  return cycloidPoint(hypocycloidArch(fixed, rolling), t);
}

/** Unit normal, away from the contact point: towards the inside. On the first arch. */
export function hypocycloidNormal(fixed: number, rolling: number, t: number): Point {
  return cycloidNormal(hypocycloidArch(fixed, rolling), t);
}

/**
 * Radius of curvature at an obliquity: 4 r sin(theta) (R - r)/(R - 2r), infinite for R = 2r; negative where the rolling
 * circle is larger than that, for the curve then bends the other way. EB 11th ed., "Mechanics" sec. 50, eq. 28.
 */
export function hypocycloidRadius(fixed: number, rolling: number, obliquity: number): number {
  return (4 * rolling * Math.sin(obliquity) * (fixed - rolling)) / (fixed - 2 * rolling);
}

/** `undefined` where the curve never closes. */
export function wholeHypocycloid(fixed: number, rolling: number): WholeCurve | undefined {
  const ratio = ratioOf(fixed, rolling);
  return (
    ratio && {
      ...ratio,
      length: (ratio.cusps * 8 * rolling * (fixed - rolling)) / fixed,
      area: ratio.turns * Math.PI * (fixed - rolling) * (fixed - 2 * rolling),
    }
  );
}
