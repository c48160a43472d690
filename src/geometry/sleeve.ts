/**
 * The chord of a piece and how far the piece may stray from it: to leave out what is far away before anything is reckoned
 * exactly. A curve that turns one way strays furthest where it runs along its chord. mm.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { cycloidCusps, cycloidPoint } from './cycloid.ts';
import { endOf, lengthOf, startOf, turnOf } from './on-piece.ts';
import type { CycloidPiece, Piece } from './piece.ts';
import { cross, distance, norm, subtract, type Point } from './point.ts';

export interface Sleeve {
  readonly from: Point;
  readonly to: Point;
  readonly width: number;
}

export function sleeveOf(piece: Piece): Sleeve {
  const from = startOf(piece);
  const to = endOf(piece);
  return { from, to, width: widthOf(piece, from, to) };
}

function widthOf(piece: Piece, from: Point, to: Point): number {
  if (piece.kind === 'line') {
    return 0;
  }
  const turn = turnOf(piece);
  if (piece.kind === 'arc') {
    return turn <= Math.PI ? piece.radius * (1 - Math.cos(turn / 2)) : 2 * piece.radius;
  }
  if (turn < Math.PI / 2 && cycloidCusps(piece).length === 0) {
    return turn === 0 ? 0 : furthestFromChord(piece, from, to);
  }
  // No point of a curve is further than half its length from the nearer end.
  return lengthOf(piece) / 2;
}

/** Where the curve runs along its chord it is furthest from it; the heading's direction is sense (1 + R/2r) t + cusp. */
function furthestFromChord(piece: CycloidPiece, from: Point, to: Point): number {
  const chord = subtract(to, from);
  const bend = piece.sense * (1 + piece.fixed / (2 * piece.rolling));
  const start = bend * piece.from + piece.cusp;
  // From the first heading to the chord's, as lines: less than a quarter turn.
  const turned = Math.atan2(chord.y, chord.x) - start;
  const t = piece.from + (turned - Math.PI * Math.round(turned / Math.PI)) / bend;
  return Math.abs(cross(subtract(cycloidPoint(piece, t), from), chord)) / (norm(chord) || 1) + SAME_POINT;
}

/** Whether the pieces inside may come within SAME_POINT of each other. */
export function sleevesTouch(a: Sleeve, b: Sleeve): boolean {
  const least = a.width + b.width + SAME_POINT;
  const across = (distance(a.from, a.to) + distance(b.from, b.to)) / 2;
  const apart = { x: a.from.x + a.to.x - b.from.x - b.to.x, y: a.from.y + a.to.y - b.from.y - b.to.y };
  if (norm(apart) / 2 > across + least) {
    return false;
  }
  return (
    distanceToSegment(a.from, b.from, b.to) <= least ||
    distanceToSegment(a.to, b.from, b.to) <= least ||
    distanceToSegment(b.from, a.from, a.to) <= least ||
    distanceToSegment(b.to, a.from, a.to) <= least ||
    segmentsCross(a, b)
  );
}

/** Never more than the distance from the point to the piece inside. */
export function distanceToSleeve(point: Point, sleeve: Sleeve): number {
  return distanceToSegment(point, sleeve.from, sleeve.to) - sleeve.width;
}

export function distanceToSegment(point: Point, from: Point, to: Point): number {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const ox = point.x - from.x;
  const oy = point.y - from.y;
  const along = (ox * dx + oy * dy) / (dx * dx + dy * dy || 1);
  const u = along <= 0 ? 0 : along >= 1 ? 1 : along;
  const ex = ox - u * dx;
  const ey = oy - u * dy;
  return Math.sqrt(ex * ex + ey * ey);
}

function segmentsCross(a: Sleeve, b: Sleeve): boolean {
  const along = subtract(a.to, a.from);
  const other = subtract(b.to, b.from);
  const parted = cross(along, subtract(b.from, a.from)) > 0 !== cross(along, subtract(b.to, a.from)) > 0;
  return parted && cross(other, subtract(a.from, b.from)) > 0 !== cross(other, subtract(a.to, b.from)) > 0;
}
