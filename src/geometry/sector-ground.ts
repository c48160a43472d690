/**
 * What has to be looked at to offset one pitch of an outline that repeats round the origin: the pieces of the pitch and
 * of as many neighbours as the distance reaches, and the polygon that stands for the solid on their far side.
 *
 * A pitch that is its own mirror image needs no neighbour: the nearest point of a place between two mirror lines lies
 * between them too (reflected, any other is at least as near). The polygon closes through the origin, or, where the
 * offset goes inward, round the outside; those edges bulge away from the pitch, never into it. mm.
 */
import { CHORD_SAG, SAME_POINT } from '../base/tolerances.ts';
import { mirrorPiece, turnChain } from './change-piece.ts';
import { pointOn } from './on-piece.ts';
import type { Chain } from './piece.ts';
import { distance as distanceOf, norm, ORIGIN, polar, type Point } from './point.ts';
import { sampleChain, sampleLoop } from './sample-piece.ts';

export interface SectorGround {
  readonly outline: Chain;
  /** For each piece of `outline`, its index within one pitch. */
  readonly indexes: readonly number[];
  /** Whether `outline` goes all the way round. */
  readonly closed: boolean;
  /** What to clip, and the distance to grow it by: its size, but for a whole outline that shrinks. */
  readonly polygon: readonly Point[];
  readonly growth: number;
  /** Radius of the furthest point, mm. */
  readonly far: number;
}

export function sectorGround(sector: Chain, count: number, distance: number): SectorGround {
  const points = sampleChain(sector, CHORD_SAG);
  const radii = points.map(norm);
  const far = Math.max(...radii);
  const near = Math.min(...radii);
  const sides = neighboursNeeded(sector, count, near, distance);
  const closed = 2 * sides + 1 >= count && !(sides === 0 && count > 2);
  const turns = closed ? countFrom(0, count) : countFrom(-sides, sides + 1);
  const outline = turns.flatMap((k) => turnChain(sector, (2 * Math.PI * k) / count));
  const indexes = turns.flatMap(() => sector.map((_, index) => index));
  const line =
    turns.length === 1 ? points : closed ? sampleLoop(outline, CHORD_SAG) : sampleChain(outline, CHORD_SAG);
  if (closed) {
    return { outline, indexes, closed, far, polygon: line, growth: distance };
  }
  const half = (Math.PI / count) * (2 * sides + 1);
  const closing = distance > 0 ? [ORIGIN] : outside(half, far + 2 * Math.abs(distance));
  return { outline, indexes, closed, far, polygon: [...line, ...closing], growth: Math.abs(distance) };
}

function countFrom(first: number, end: number): number[] {
  return Array.from({ length: end - first }, (_, i) => first + i);
}

/** On each side; half a turn or more of them means the whole outline. */
function neighboursNeeded(sector: Chain, count: number, near: number, distance: number): number {
  if (count > 2 && isMirrored(sector)) {
    return 0;
  }
  const reach = Math.abs(distance);
  return reach >= near ? count : Math.ceil((2 * Math.asin(reach / near) * count) / (2 * Math.PI)) + 1;
}

/** Each piece is the mirror image, across the X axis, of the one as far from the other end. */
function isMirrored(sector: Chain): boolean {
  return sector.every((piece, i) => {
    const image = mirrorPiece(sector[sector.length - 1 - i] as Chain[number]);
    return [0, 0.5, 1].every(
      (u) => distanceOf(pointOn(piece, u), pointOn(image, 1 - u)) <= SAME_POINT && image.kind === piece.kind,
    );
  });
}

/** From the end of the wedge round to its start, at least `radius` from the origin everywhere. */
function outside(half: number, radius: number): Point[] {
  const steps = Math.max(1, Math.ceil((2 * half) / (Math.PI / 3)));
  const corner = radius / Math.cos(half / steps);
  return countFrom(0, steps + 1).map((i) => polar(corner, half - (2 * half * i) / steps));
}
