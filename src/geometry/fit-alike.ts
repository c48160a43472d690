/**
 * Arcs for cycloids of which some are mirror images of others (the two sides of a tooth): each shape is fitted once. mm.
 *
 * In  : how far an arc may lie from its span. Out: a fit that remembers, for as long as its caller keeps it.
 * A span travelled back, mirrored and turned about the origin is fitted as well by the arcs that went with it.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { mirrorPiece, reversePiece, turnPiece } from './change-piece.ts';
import { fitArcs } from './fit-arcs.ts';
import type { ArcPiece, CycloidPiece, LinePiece } from './piece.ts';

export type ArcFit = (piece: CycloidPiece) => readonly (ArcPiece | LinePiece)[];

export function fitAlike(tolerance: number): ArcFit {
  const fitted: { readonly piece: CycloidPiece; readonly arcs: readonly (ArcPiece | LinePiece)[] }[] = [];
  return (piece) => {
    const like = fitted.find((known) => mirrored(known.piece, piece));
    if (like !== undefined) {
      const angle = piece.cusp + like.piece.cusp;
      return like.arcs
        .toReversed()
        .map((arc) => turnPiece(reversePiece(mirrorPiece(arc)), angle) as ArcPiece | LinePiece);
    }
    const arcs = fitArcs(piece, tolerance);
    fitted.push({ piece, arcs });
    return arcs;
  };
}

function mirrored(a: CycloidPiece, b: CycloidPiece): boolean {
  return (
    a.sense === -b.sense &&
    a.fixed === b.fixed &&
    a.rolling === b.rolling &&
    near(a.offset, b.offset) &&
    near(a.from, b.to) &&
    near(a.to, b.from)
  );
}

/** Alike to a thousandth of what counts as the same point: the difference is rounding. */
function near(a: number, b: number): boolean {
  return Math.abs(a - b) <= SAME_POINT / 1000;
}
