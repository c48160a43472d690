/**
 * What is common to the two curves of a rolling circle: when they close, and what the whole curve then measures.
 *
 * With R/r = p/q in lowest terms the traced point is back on its first cusp after the contact has gone round q times, and the
 * curve has p cusps. A ratio that no fraction of small whole numbers equals never closes.
 */

/** The whole closed curve, from the first cusp back to it. */
export interface WholeCurve {
  /** How often the contact goes round the fixed circle. */
  readonly turns: number;
  readonly cusps: number;
  /** mm. */
  readonly length: number;
  /** Swept about the centre of the fixed circle, mm^2: the area enclosed where `turns` is 1. */
  readonly area: number;
}

/**
 * R/r as a fraction in lowest terms, by continued fractions; `undefined` where no denominator up to MOST_TURNS gives R/r
 * to the rounding of doubles.
 */
export function ratioOf(fixed: number, rolling: number): { cusps: number; turns: number } | undefined {
  const ratio = fixed / Math.abs(rolling);
  let [p0, q0, p1, q1] = [0, 1, 1, 0];
  let rest = ratio;
  while (Number.isFinite(rest)) {
    const whole = Math.floor(rest);
    [p0, q0, p1, q1] = [p1, q1, whole * p1 + p0, whole * q1 + q0];
    if (q1 > MOST_TURNS) {
      return undefined;
    }
    if (Math.abs(ratio * q1 - p1) <= ROUNDINGS * Number.EPSILON * p1) {
      return { cusps: p1, turns: q1 };
    }
    rest = 1 / (rest - whole);
  }
  return undefined;
}

/** Far below the 1e8 turns after which every double seems to close, far above any count of teeth. */
const MOST_TURNS = 100_000;

/** Of the two radii, of the division and of the product. */
const ROUNDINGS = 4;
