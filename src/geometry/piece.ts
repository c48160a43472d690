/**
 * The exact pieces every outline and every path is made of: straight lines, circular arcs, and spans of
 * cycloids and their parallels. All three stay what they are when offset, turned, mirrored or cut short,
 * so nothing here is ever a cloud of points.
 *
 * A piece is travelled from its start to its end; u in [0, 1] says where (see `on-piece.ts`).
 * Outlines run counter-clockwise, the material on the left; lengths in mm, angles in radians.
 */
import type { Point } from './point.ts';

export interface LinePiece {
  readonly kind: 'line';
  readonly from: Point;
  readonly to: Point;
}

export interface ArcPiece {
  readonly kind: 'arc';
  readonly centre: Point;
  /** Never negative; zero is a corner that is turned on the spot (heading changes, place does not). */
  readonly radius: number;
  /** Polar angle of the first point, seen from the centre. */
  readonly start: number;
  /** Signed sweep: positive counter-clockwise; a whole circle is 2 pi. */
  readonly turn: number;
}

/**
 * A span of the curve traced by a point of a circle that rolls on a circle about the origin, or of a parallel of it.
 *
 * In the curve's own frame (cusp on +X, contact moving counter-clockwise), with R `fixed`, r `rolling`, t the polar
 * angle of the contact point:
 *     P(t) = (R + r) e^(it) - r e^(i(1 + R/r)t) + offset * n(t),   n(t) = -i e^(i(1 + R/2r)t)
 * r > 0 rolls outside (epicycloid), r < 0 inside (hypocycloid). n is the unit vector from the contact point to the
 * traced point (the rolling law: the normal passes through the contact point), so a positive `offset` lies on the
 * convex side of an epicycloid. `sense` -1 mirrors the frame across its X axis, then `cusp` turns it.
 */
export interface CycloidPiece {
  readonly kind: 'cycloid';
  readonly fixed: number;
  readonly rolling: number;
  /** Polar angle of the cusp (t = 0). */
  readonly cusp: number;
  readonly sense: 1 | -1;
  readonly offset: number;
  /** Roll parameter at the start and at the end of the span, of one sign (or zero). */
  readonly from: number;
  readonly to: number;
}

export type Piece = LinePiece | ArcPiece | CycloidPiece;

/** Pieces end to end. A chain may be open; a loop is a chain whose end is its start. */
export type Chain = readonly Piece[];
export type Loop = readonly Piece[];
