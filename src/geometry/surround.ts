/** A circle round a whole piece, to leave out what is far away before anything is reckoned exactly. mm. */
import { SAME_POINT } from '../base/tolerances.ts';
import { partOf } from './change-piece.ts';
import { lengthOf, pointOn } from './on-piece.ts';
import type { Piece } from './piece.ts';
import { distance, type Point } from './point.ts';

export interface Surround {
  readonly centre: Point;
  readonly radius: number;
}

/** About the middle; the radius is the longer of the two ways from there to an end. */
export function surroundOf(piece: Piece): Surround {
  const radius =
    piece.kind === 'cycloid'
      ? Math.max(lengthOf(partOf(piece, 0, 0.5)), lengthOf(partOf(piece, 0.5, 1)))
      : lengthOf(piece) / 2;
  return { centre: pointOn(piece, 0.5), radius };
}

/** Whether the pieces inside may come within SAME_POINT of each other. */
export function surroundsTouch(a: Surround, b: Surround): boolean {
  return distance(a.centre, b.centre) <= a.radius + b.radius + SAME_POINT;
}
