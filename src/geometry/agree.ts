/**
 * Whether a clipped polygon and an exact chain tell the same story: no corner of the one lies further than CLIP_AGREEMENT
 * from the other, both ways. Where two curves meet at a sharp inside corner of angle a, the chords that stand for them
 * meet further out by 1 / sin(a/2), so that much is allowed near such a corner. mm.
 */
import { CLIP_AGREEMENT, CHORD_SAG } from '../base/tolerances.ts';
import { nearestOnPiece } from './nearest-on-piece.ts';
import { headingOn, startOf } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import { distance, dot, type Point } from './point.ts';
import { distanceToRing } from './ring.ts';
import { samplePiece } from './sample-piece.ts';
import { surroundOf, type Surround } from './surround.ts';

/** The corners of the polygon in question, the whole ring for the way back, and the exact pieces. */
export interface Agreement {
  readonly corners: readonly Point[];
  readonly rings: readonly (readonly Point[])[];
  readonly exact: Chain;
}

/** The greatest distance either way, and where; 0 where all is within CLIP_AGREEMENT of a corner's allowance. */
export function disagreement({ corners, rings, exact }: Agreement): {
  readonly worst: number;
  readonly at: Point;
} {
  const pieces = exact.map((piece) => ({ piece, round: surroundOf(piece) }));
  const sharp = sharpCorners(exact);
  let worst = 0;
  let at: Point = { x: 0, y: 0 };
  const look = (point: Point, off: number): void => {
    if (off > worst && off > allowance(sharp, point)) {
      worst = off;
      at = point;
    }
  };
  let hint = 0;
  for (const corner of corners) {
    const nearest = distanceToPieces(pieces, corner, hint);
    hint = nearest.index;
    look(corner, nearest.distance);
  }
  for (const piece of exact) {
    for (const point of samplePiece(piece, CHORD_SAG * 8)) {
      look(point, Math.min(...rings.map((ring) => distanceToRing(ring, point))));
    }
  }
  return { worst, at };
}

/** Tries the piece of the last answer first: corners follow one another. */
function distanceToPieces(
  pieces: readonly { readonly piece: Piece; readonly round: Surround }[],
  point: Point,
  hint: number,
): { readonly distance: number; readonly index: number } {
  let best = { distance: Infinity, index: hint };
  for (let i = 0; i < pieces.length && best.distance > CLIP_AGREEMENT; i++) {
    const index = (hint + i) % pieces.length;
    const { piece, round } = pieces[index] as { piece: Piece; round: Surround };
    if (distance(round.centre, point) - round.radius < best.distance) {
      const off = nearestOnPiece(piece, point).distance;
      best = off < best.distance ? { distance: off, index } : best;
    }
  }
  return best;
}

interface SharpCorner {
  readonly point: Point;
  /** 1 / sin of half the angle between its sides. */
  readonly stretch: number;
}

function sharpCorners(exact: Chain): SharpCorner[] {
  return exact.flatMap((piece, i) => {
    const next = exact[i + 1] ?? exact[0];
    if (next === undefined) {
      return [];
    }
    // The cosine of how far the heading turns; the half angle between the sides is what is left to a quarter turn.
    const turned = Math.min(1, Math.max(-1, dot(headingOn(piece, 1), headingOn(next, 0))));
    const stretch = 1 / Math.max(Math.cos(Math.acos(turned) / 2), 1e-3);
    return stretch > 1.01 ? [{ point: startOf(next), stretch }] : [];
  });
}

function allowance(sharp: readonly SharpCorner[], point: Point): number {
  const reach = sharp.reduce((most, corner) => {
    const limit = CLIP_AGREEMENT * corner.stretch;
    return distance(corner.point, point) <= 2 * limit ? Math.max(most, limit) : most;
  }, CLIP_AGREEMENT);
  return reach;
}
