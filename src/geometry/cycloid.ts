/**
 * Place, heading, normal, curvature and arc length of a cycloid span, in closed form.
 *
 * With h = (1 + R/2r) t:  P'(t) = [2 (R + r) sin(R t / 2r) + offset (1 + R/2r)] e^(ih)  and  n(t) = -i e^(ih),
 * so the heading is e^(ih) up to sign, n' = (1 + R/2r) e^(ih), and the curvature is (1 + R/2r) over the bracket.
 * Sources: the parametrisation is that of Wikipedia "Epicycloid"; arc length of a partial arch from cusp,
 * s(t) = 4 r (R + r) / R (1 - cos(R t / 2r)), is standard (J. D. Lawrence, A Catalog of Special Plane Curves).
 */
import type { CycloidPiece } from './piece.ts';
import { turnPoint, type Point } from './point.ts';

/** From the curve's own frame to the frame of the piece. */
function place(piece: CycloidPiece, x: number, y: number): Point {
  return turnPoint({ x, y: piece.sense * y }, piece.cusp);
}

/** The point at roll parameter t. */
export function cycloidPoint(piece: CycloidPiece, t: number): Point {
  const { fixed: R, rolling: r, offset } = piece;
  const spoke = (1 + R / r) * t;
  const h = (1 + R / (2 * r)) * t;
  return place(
    piece,
    (R + r) * Math.cos(t) - r * Math.cos(spoke) + offset * Math.sin(h),
    (R + r) * Math.sin(t) - r * Math.sin(spoke) - offset * Math.cos(h),
  );
}

/** n(t): the unit vector from the contact point of the two circles to the traced point. */
export function cycloidNormal(piece: CycloidPiece, t: number): Point {
  const h = (1 + piece.fixed / (2 * piece.rolling)) * t;
  return place(piece, Math.sin(h), -Math.cos(h));
}

/** e^(ih): the direction of growing t wherever `cycloidRate` is positive. */
export function cycloidDirection(piece: CycloidPiece, t: number): Point {
  const h = (1 + piece.fixed / (2 * piece.rolling)) * t;
  return place(piece, Math.cos(h), Math.sin(h));
}

/** Signed speed dP/dt along `cycloidDirection`, mm per radian. */
export function cycloidRate(piece: CycloidPiece, t: number): number {
  const { fixed: R, rolling: r, offset } = piece;
  return 2 * (R + r) * Math.sin((R * t) / (2 * r)) + offset * (1 + R / (2 * r));
}

/** Signed radius of curvature dP/dt / dh/dt: positive turns with the sense of the piece along growing t. */
export function cycloidRadius(piece: CycloidPiece, t: number): number {
  return cycloidRate(piece, t) / (1 + piece.fixed / (2 * piece.rolling));
}

/** Where the rate changes its sign inside the span: cusps of the curve or of its parallel, in the order of travel. */
export function cycloidCusps(piece: CycloidPiece): number[] {
  const { fixed: R, rolling: r, offset } = piece;
  const level = (-offset * (1 + R / (2 * r))) / (2 * (R + r));
  if (Math.abs(level) >= 1 || R + r === 0) {
    return [];
  }
  const slope = R / (2 * r);
  if (level <= 0 && withinArch(slope * piece.from) && withinArch(slope * piece.to)) {
    return [];
  }
  const rising = Math.asin(level);
  const found = [
    ...solutionsInside(piece, slope, rising, 2 * Math.PI),
    ...solutionsInside(piece, slope, Math.PI - rising, 2 * Math.PI),
  ];
  return found.sort((a, b) => (piece.to < piece.from ? b - a : a - b));
}

/** Within an arch sin R t / 2r is not negative: the common case, answered without looking further. */
function withinArch(angle: number): boolean {
  return angle >= 0 && angle <= Math.PI;
}

/** Where the curvature is greatest or least inside the span (R t / 2r an odd quarter turn), in the order of travel. */
export function cycloidVertices(piece: CycloidPiece): number[] {
  const found = solutionsInside(piece, piece.fixed / (2 * piece.rolling), Math.PI / 2, Math.PI);
  return found.sort((a, b) => (piece.to < piece.from ? b - a : a - b));
}

/** Every t strictly inside the span where slope * t is `target` plus a whole number of periods. */
export function solutionsInside(
  piece: CycloidPiece,
  slope: number,
  target: number,
  period: number,
): number[] {
  const ends = [piece.from * slope, piece.to * slope];
  const low = Math.min(...ends);
  const high = Math.max(...ends);
  const found: number[] = [];
  for (let n = Math.ceil((low - target) / period); target + n * period < high; n++) {
    const value = target + n * period;
    if (value > low) {
      found.push(value / slope);
    }
  }
  return found;
}

/** Signed length from t = 0 to t (exact while the rate keeps its sign). */
export function cycloidLength(piece: CycloidPiece, t: number): number {
  const { fixed: R, rolling: r, offset } = piece;
  return ((4 * r * (R + r)) / R) * (1 - Math.cos((R * t) / (2 * r))) + offset * (1 + R / (2 * r)) * t;
}

/** The point where the two circles touch at t, on the fixed circle: every normal of every parallel passes through it. */
export function contactPoint(piece: CycloidPiece, t: number): Point {
  return place(piece, piece.fixed * Math.cos(t), piece.fixed * Math.sin(t));
}
