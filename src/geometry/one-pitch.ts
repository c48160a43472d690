/** The rays between which one pitch, or half of a mirrored one, lies; and the way from the first ray to the last. mm. */
import { SAME_POINT } from '../base/tolerances.ts';
import { linkUntil, samePlace } from './link-offset.ts';
import { nearestOnPiece } from './nearest-on-piece.ts';
import { pointOn } from './on-piece.ts';
import type { LinePiece } from './piece.ts';
import { norm, ORIGIN, polar, turnPoint, type Point } from './point.ts';
import type { SectorGround } from './sector-ground.ts';
import type { Remaining } from './trim-offset.ts';

/** From the origin out: the first at -pi/count, the last at the tooth's middle or at +pi/count. */
export function pitchRays(reach: number, count: number, kind: SectorGround['kind']): LinePiece[] {
  const last = kind === 'half' ? 0 : Math.PI / count;
  return [-Math.PI / count, last].map((angle) => ({ kind: 'line', from: ORIGIN, to: polar(reach, angle) }));
}

export function withinRays(part: Remaining, rays: readonly LinePiece[]): boolean {
  const middle = pointOn(part.piece, 0.5);
  return across(middle, rays[0] as LinePiece) > 0 && across(middle, rays[1] as LinePiece) < 0;
}

function startsPitch(part: Remaining, rays: readonly LinePiece[]): boolean {
  return touches(part.from, rays[0] as LinePiece);
}

/** From the outermost crossing of the first ray (the innermost where the distance is negative) to the last ray. */
export function linkPitch(
  parts: readonly Remaining[],
  rays: readonly LinePiece[],
  count: number,
  kind: SectorGround['kind'],
  distance: number,
): Remaining[] | undefined {
  const outward = Math.sign(distance);
  const starts = parts
    .filter((part) => startsPitch(part, rays))
    .sort((a, b) => outward * (norm(b.from) - norm(a.from)));
  for (const first of starts) {
    const image = turnPoint(first.from, (2 * Math.PI) / count);
    const way = linkUntil(parts, first, (end) =>
      kind === 'half' ? touches(end, rays[1] as LinePiece) : samePlace(end, image),
    );
    if (way !== undefined) {
      return way;
    }
  }
  return undefined;
}

/** A part of this pitch that is neither on the way nor on the way of a neighbour: the wall of a hollow. */
export function liesApart(
  part: Remaining,
  way: readonly Remaining[],
  rays: readonly LinePiece[],
  count: number,
): boolean {
  if (way.includes(part) || !withinRays(part, rays)) {
    return false;
  }
  const middle = pointOn(part.piece, 0.5);
  const images = [-1, 0, 1].map((k) => turnPoint(middle, (2 * Math.PI * k) / count));
  return !way.some(({ piece }) =>
    images.some((image) => nearestOnPiece(piece, image).distance <= SAME_POINT),
  );
}

/** Signed distance to the ray's line, positive on its left. */
function across(point: Point, { to }: LinePiece): number {
  return (to.x * point.y - to.y * point.x) / norm(to);
}

function touches(point: Point, ray: LinePiece): boolean {
  return Math.abs(across(point, ray)) <= 2 * SAME_POINT && ray.to.x * point.x + ray.to.y * point.y > 0;
}
