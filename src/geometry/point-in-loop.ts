/**
 * Whether a point lies inside a loop of exact pieces: a ray to +X is crossed an odd number of times.
 * Each piece is taken in spans that only rise or only fall; a span counts its lower end and not its upper, so that a ray
 * through a joint counts once. Points nearer to the loop than rounding may be called either way. mm.
 */
import { boundsOfPoints, turningParameters } from './bounds-of-chain.ts';
import { pointOn } from './on-piece.ts';
import type { Loop, Piece } from './piece.ts';
import type { Point } from './point.ts';
import { findRoot } from './roots.ts';

export function pointInLoop(loop: Loop, point: Point): boolean {
  let inside = false;
  for (const piece of loop) {
    inside = crossings(piece, point) % 2 === 1 ? !inside : inside;
  }
  return inside;
}

function crossings(piece: Piece, point: Point): number {
  const cuts = [0, ...turningParameters(piece), 1];
  let count = 0;
  for (let i = 1; i < cuts.length; i++) {
    count += spanCrosses(piece, cuts[i - 1] as number, cuts[i] as number, point) ? 1 : 0;
  }
  return count;
}

function spanCrosses(piece: Piece, u0: number, u1: number, point: Point): boolean {
  const a = pointOn(piece, u0);
  const b = pointOn(piece, u1);
  if (a.y > point.y === b.y > point.y) {
    return false;
  }
  // Between two quarters the span stays in the box of its ends.
  const box = boundsOfPoints([a, b]);
  if (point.x >= box.maxX || point.x < box.minX) {
    return point.x < box.minX;
  }
  const u = findRoot((at) => pointOn(piece, at).y - point.y, u0, u1);
  return pointOn(piece, u).x > point.x;
}
