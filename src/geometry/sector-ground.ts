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
import { mirrorPiece, partOf, turnChain, turnPiece } from './change-piece.ts';
import { headingOn, pointOn } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import { addScaled, distance as distanceOf, dot, norm, ORIGIN, polar, unit, type Point } from './point.ts';
import type { Neighbours } from './raw-offset.ts';
import { sampleChain, sampleLoop } from './sample-piece.ts';

export interface SectorGround {
  readonly kind: 'half' | 'wedge' | 'whole';
  readonly outline: Chain;
  /** What joins the outline at its ends, where a corner there matters. */
  readonly neighbours: Neighbours;
  /** What to clip, and the distance to grow it by: negative where air, or a whole outline, shrinks. */
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
  const odd = sector.length % 2 === 1;
  const outline = sector.slice(0, Math.ceil(sector.length / 2));
  const middle = outline.at(-1) as Piece;
  const half = odd ? [...outline.slice(0, -1), partOf(middle, 0, 0.5)] : outline;
  const line = sampleChain(half, CLIP_SAG);
  const far = line.reduce((most, point) => Math.max(most, norm(point)), 0);
  const last = sector.length - 1;
  const before = { piece: turnPiece(sector[last] as Piece, (-2 * Math.PI) / count), index: last };
  const after = { piece: sector[outline.length] as Piece, index: outline.length };
  const neighbours = odd ? { before } : { before, after };
  const polygon = distance > 0 ? airPolygon(half, line, far, distance) : undefined;
  if (polygon !== undefined) {
    return { kind: 'half', outline, neighbours, far, polygon, growth: -distance };
  }
  const closing = distance > 0 ? [ORIGIN] : outside(-Math.PI / count, 0, far - 2 * distance);
  return {
    kind: 'half',
    outline,
    neighbours,
    far,
    polygon: [...line, ...closing],
    growth: Math.abs(distance),
  };
}

/**
 * The air outside a half pitch that crosses both rays squarely, to be shrunk: no corner of its far side is rounded then,
 * which spares most of the clipping. Beyond the rays the outline goes straight on, where it is nearer to nothing between
 * them than its own end is.
 */
function airPolygon(half: Chain, line: readonly Point[], far: number, distance: number): Point[] | undefined {
  const [start, end] = [line[0] as Point, line.at(-1) as Point];
  const arriving = headingOn(half[0] as Piece, 0);
  const leaving = headingOn(half.at(-1) as Piece, 1);
  if (!squareTo(arriving, start) || !squareTo(leaving, end)) {
    return undefined;
  }
  const before = addScaled(start, arriving, -2 * distance);
  const after = addScaled(end, leaving, 2 * distance);
  const height = far - Math.min(norm(start), norm(end)) + 3 * distance;
  const above = (point: Point, foot: Point): Point => addScaled(point, unit(foot), height);
  return [before, ...line, after, above(after, end), above(before, start)];
}

function squareTo(heading: Point, spoke: Point): boolean {
  return Math.abs(dot(heading, spoke)) <= SAME_POINT;
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
