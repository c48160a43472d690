/**
 * What has to be looked at to offset one pitch of an outline that repeats round the origin, and the polygon that stands
 * for the solid on its far side.
 *
 * A pitch that is its own mirror image needs its first half only, up to the ray through the tooth's middle: the nearest
 * outline point of a place between two mirror lines lies between them too (reflected, any other is at least as near).
 * Any other pitch needs as many neighbours as the distance reaches. The polygon closes through the origin, or, where the
 * offset goes inward, round the outside; those edges bulge away from the wedge, never into it. mm.
 */
import { CLIP_SAG, SAME_POINT } from '../base/tolerances.ts';
import { mirrorPiece, turnChain, turnPiece } from './change-piece.ts';
import { pointOn } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import { distance as distanceOf, norm, ORIGIN, polar, type Point } from './point.ts';
import type { Neighbours } from './raw-offset.ts';
import { sampleChain, sampleLoop } from './sample-piece.ts';

export interface SectorGround {
  readonly kind: 'half' | 'wedge' | 'whole';
  readonly outline: Chain;
  /** What joins the outline at its ends, where a corner there matters. */
  readonly neighbours: Neighbours;
  /** What to clip, and the distance to grow it by: its size, but for a whole outline that shrinks. */
  readonly polygon: readonly Point[];
  readonly growth: number;
  /** Radius of the furthest point, mm. */
  readonly far: number;
}

export function sectorGround(sector: Chain, count: number, distance: number): SectorGround {
  const reach = Math.abs(distance);
  if (count > 2 && isMirrored(sector)) {
    return halfGround(sector, count, distance);
  }
  const radii = sampleChain(sector, CLIP_SAG).map(norm);
  const far = Math.max(...radii);
  const sides = neighboursNeeded(count, Math.min(...radii), reach);
  if (2 * sides + 1 >= count) {
    const outline = turned(sector, count, 0, count);
    const after = { piece: sector[0] as Piece, index: 0 };
    return {
      kind: 'whole',
      outline,
      neighbours: { after },
      far,
      polygon: sampleLoop(outline, CLIP_SAG),
      growth: distance,
    };
  }
  const outline = turned(sector, count, -sides, sides + 1);
  const half = (Math.PI / count) * (2 * sides + 1);
  const closing = distance > 0 ? [ORIGIN] : outside(-half, half, far + 2 * reach);
  const polygon = [...sampleChain(outline, CLIP_SAG), ...closing];
  return { kind: 'wedge', outline, neighbours: {}, far, polygon, growth: reach };
}

/** Up to the tooth's middle; a piece across it is taken whole, a corner on it is rounded. */
function halfGround(sector: Chain, count: number, distance: number): SectorGround {
  const outline = sector.slice(0, Math.ceil(sector.length / 2));
  const line = sampleChain(outline, CLIP_SAG);
  const far = line.reduce((most, point) => Math.max(most, norm(point)), 0);
  const end = line.at(-1) as Point;
  const closing =
    distance > 0
      ? [ORIGIN]
      : outside(-Math.PI / count, Math.atan2(end.y, end.x), far + 2 * Math.abs(distance));
  const last = sector.length - 1;
  const before = { piece: turnPiece(sector[last] as Piece, (-2 * Math.PI) / count), index: last };
  const after = { piece: sector[outline.length] as Piece, index: outline.length };
  const neighbours = sector.length % 2 === 0 ? { before, after } : { before };
  const polygon = [...line, ...closing];
  return { kind: 'half', outline, neighbours, far, polygon, growth: Math.abs(distance) };
}

function turned(sector: Chain, count: number, first: number, end: number): Chain {
  return countFrom(first, end).flatMap((k) => turnChain(sector, (2 * Math.PI * k) / count));
}

function countFrom(first: number, end: number): number[] {
  return Array.from({ length: end - first }, (_, i) => first + i);
}

/** On each side; half a turn or more of them means the whole outline. */
function neighboursNeeded(count: number, near: number, reach: number): number {
  return reach >= near ? count : Math.ceil((2 * Math.asin(reach / near) * count) / (2 * Math.PI)) + 1;
}

/** Each piece is the mirror image, across the X axis, of the one as far from the other end. */
function isMirrored(sector: Chain): boolean {
  for (let i = 0; 2 * i < sector.length; i++) {
    const piece = sector[i] as Piece;
    const image = mirrorPiece(sector[sector.length - 1 - i] as Piece);
    const same = (u: number): boolean => distanceOf(pointOn(piece, u), pointOn(image, 1 - u)) <= SAME_POINT;
    if (piece.kind !== image.kind || !same(0) || !same(0.5) || !same(1)) {
      return false;
    }
  }
  return true;
}

/** From the ray at `to` back round to the ray at `from`, at least `radius` from the origin everywhere. */
function outside(from: number, to: number, radius: number): Point[] {
  const steps = Math.max(1, Math.ceil((to - from) / (Math.PI / 3)));
  const corner = radius / Math.cos((to - from) / (2 * steps));
  return countFrom(0, steps + 1).map((i) => polar(corner, to - ((to - from) * i) / steps));
}
