/**
 * The addendum rolled by a circle of radius r on the pitch circle of radius R, in terms of the obliquity theta of the
 * common normal (which, for a pinion with radial flanks, is also how far the pinion has turned past the line of centres).
 *
 * With t = 2 r theta / R, s = sin theta, and the parallel at distance d on the outer side, seen from the cusp's spoke:
 *     P = e^(it) [R - i (2 r s + d) e^(i theta)],   |P|^2 = R^2 + 4 r (R + r) s^2 + 2 d (R + 2 r) s + d^2
 * Both follow from P = contact + (2 r s + d) n of `geometry/cycloid.ts`. The tooth comes to a point where the curve has
 * turned through half the tooth's angle. Design of the form: E. Beckett, "Clocks", Encyclopaedia Britannica, 9th ed., p. 32.
 */
import { findRoot } from '../geometry/roots.ts';

/** Radii of the two circles, mm: r rolls outside R. */
export interface Rolling {
  readonly fixed: number;
  readonly rolling: number;
}

/** Polar angle of the curve (or its parallel at `offset`) from the spoke of its cusp. Grows with theta. */
export function angleFromCusp({ fixed, rolling }: Rolling, obliquity: number, offset = 0): number {
  const s = Math.sin(obliquity);
  const reach = 2 * rolling * s + offset;
  return (2 * rolling * obliquity) / fixed - Math.atan2(reach * Math.cos(obliquity), fixed + reach * s);
}

/** Polar radius of the curve, or of its parallel at `offset`. */
export function radiusAtObliquity({ fixed, rolling }: Rolling, obliquity: number, offset = 0): number {
  const s = Math.sin(obliquity);
  return Math.sqrt(
    fixed * fixed +
      4 * rolling * (fixed + rolling) * s * s +
      2 * offset * (fixed + 2 * rolling) * s +
      offset * offset,
  );
}

/**
 * Sine of the obliquity at which the parallel at `offset` crosses a circle about the wheel's axis: the positive root of
 * the quadratic above. Negative where the circle lies below the parallel's lowest point.
 */
export function sineAtRadius({ fixed, rolling }: Rolling, radius: number, offset = 0): number {
  const a = 4 * rolling * (fixed + rolling);
  const half = offset * (fixed + 2 * rolling);
  const c = (fixed - radius) * (fixed + radius) + offset * offset;
  const root = Math.sqrt(Math.max(0, half * half - a * c));
  // The form without cancellation: the other root is (-half - root) / a, and their product is c / a.
  return half > 0 ? -c / (half + root) : root / a;
}

export function obliquityAtRadius(rolling: Rolling, radius: number): number {
  return Math.asin(Math.min(1, sineAtRadius(rolling, radius)));
}

/**
 * Obliquity at the point of a tooth that spans `halfAngle` each side of its centre line at the pitch circle. The two curves
 * always meet before the tops of their arches while the tooth is thinner than half the leaf count of pitches.
 */
export function pointedObliquity(rolling: Rolling, halfAngle: number): number {
  return findRoot((theta) => angleFromCusp(rolling, theta) - halfAngle, 0, Math.PI / 2);
}

/** Height of the pointed tooth above the pitch circle, in the unit of the radii. */
export function pointedHeight(rolling: Rolling, halfAngle: number): number {
  const s = Math.sin(pointedObliquity(rolling, halfAngle));
  const lift = 4 * rolling.rolling * (rolling.fixed + rolling.rolling) * s * s;
  // sqrt(R^2 + lift) - R without cancellation.
  return lift / (Math.sqrt(rolling.fixed * rolling.fixed + lift) + rolling.fixed);
}

/**
 * Theoretical addendum in modules for a pinion mate with radial flanks: generating circle half its pitch circle.
 * `tooth` is the tooth thickness over the circular pitch. The count of teeth need not be whole.
 */
export function theoreticalAddendum(teeth: number, leaves: number, tooth = 0.5): number {
  return pointedHeight({ fixed: teeth / 2, rolling: leaves / 4 }, (tooth * Math.PI) / teeth);
}
