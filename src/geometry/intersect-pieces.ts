/**
 * Every place where two pieces meet, as the parameters on each: u on the first, v on the second, in the order of u.
 *
 * Lines and arcs in closed form; wherever a cycloid takes part, both pieces are halved until they cross at a clear angle
 * and Newton's method finishes. An end that lies on the other piece (within SAME_POINT) is a meeting too, so pieces that
 * touch, or lie on one another, answer with the ends of what they share. mm.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { meetByHalving } from './meet-by-halving.ts';
import { nearestOnPiece } from './nearest-on-piece.ts';
import { pointOn } from './on-piece.ts';
import type { ArcPiece, LinePiece, Piece } from './piece.ts';
import { addScaled, cross, distance, dot, subtract, unit, type Point } from './point.ts';
import { sleeveOf, sleevesTouch } from './sleeve.ts';

export interface Meeting {
  readonly u: number;
  readonly v: number;
}

export function intersectPieces(a: Piece, b: Piece): Meeting[] {
  return sleevesTouch(sleeveOf(a), sleeveOf(b)) ? intersectNearPieces(a, b) : [];
}

/** The same for pieces whose sleeves are known to touch. */
export function intersectNearPieces(a: Piece, b: Piece): Meeting[] {
  // Ends first: of two answers for one place the exact end is kept.
  const found = [...endsOnOther(a, b), ...crossingsOf(a, b)];
  const kept = found.filter((meeting, i) => !found.slice(0, i).some((other) => same(a, meeting, other)));
  return kept.sort((p, q) => p.u - q.u);
}

function same(a: Piece, p: Meeting, q: Meeting): boolean {
  return distance(pointOn(a, p.u), pointOn(a, q.u)) <= 2 * SAME_POINT;
}

function endsOnOther(a: Piece, b: Piece): Meeting[] {
  const found: Meeting[] = [];
  for (const end of [0, 1]) {
    const onB = touchAt(b, pointOn(a, end));
    if (onB !== undefined) {
      found.push({ u: end, v: onB });
    }
  }
  for (const end of [0, 1]) {
    const onA = touchAt(a, pointOn(b, end));
    if (onA !== undefined) {
      found.push({ u: onA, v: end });
    }
  }
  return found;
}

/** Where a point lies on a piece, if it does; an end of it where that is as good. */
function touchAt(piece: Piece, point: Point): number | undefined {
  const { u, distance: off } = nearestOnPiece(piece, point);
  if (off > SAME_POINT) {
    return undefined;
  }
  const end = u < 0.5 ? 0 : 1;
  return distance(pointOn(piece, end), point) <= SAME_POINT ? end : u;
}

function crossingsOf(a: Piece, b: Piece): Meeting[] {
  if (a.kind === 'cycloid' || b.kind === 'cycloid') {
    return meetByHalving(a, b);
  }
  return onBoth(a, b, meetingPoints(a, b));
}

/** Where the whole line or circle of each meets that of the other. */
function meetingPoints(a: LinePiece | ArcPiece, b: LinePiece | ArcPiece): Point[] {
  if (a.kind === 'line') {
    return b.kind === 'line' ? lineWithLine(a, b) : lineWithCircle(a, b);
  }
  return b.kind === 'line' ? lineWithCircle(b, a) : circleWithCircle(a, b);
}

function onBoth(a: Piece, b: Piece, points: readonly Point[]): Meeting[] {
  return points.flatMap((point) => {
    const onA = nearestOnPiece(a, point);
    const onB = nearestOnPiece(b, point);
    return onA.distance <= SAME_POINT && onB.distance <= SAME_POINT ? [{ u: onA.u, v: onB.u }] : [];
  });
}

function lineWithLine(a: LinePiece, b: LinePiece): Point[] {
  const along = subtract(a.to, a.from);
  const other = subtract(b.to, b.from);
  const turn = cross(along, other);
  if (turn === 0) {
    return [];
  }
  return [addScaled(a.from, along, cross(subtract(b.from, a.from), other) / turn)];
}

function lineWithCircle(line: LinePiece, arc: ArcPiece): Point[] {
  if (distance(line.from, line.to) === 0) {
    return [];
  }
  const along = unit(subtract(line.to, line.from));
  const toCentre = subtract(arc.centre, line.from);
  const foot = addScaled(line.from, along, dot(toCentre, along));
  return pairAbout(foot, along, arc.radius, Math.abs(cross(along, toCentre)));
}

function circleWithCircle(a: ArcPiece, b: ArcPiece): Point[] {
  const apartBy = distance(a.centre, b.centre);
  if (apartBy === 0) {
    return [];
  }
  const towards = unit(subtract(b.centre, a.centre));
  // From a's centre to the common chord; written as a product so that nearly equal radii lose no digits.
  const sag = (apartBy * apartBy + (a.radius - b.radius) * (a.radius + b.radius)) / (2 * apartBy);
  const foot = addScaled(a.centre, towards, sag);
  return pairAbout(foot, { x: -towards.y, y: towards.x }, a.radius, Math.abs(sag));
}

/** The two points of a chord at `height` from the centre of a circle; one where it only touches, within SAME_POINT. */
function pairAbout(foot: Point, along: Point, radius: number, height: number): Point[] {
  const square = (radius - height) * (radius + height);
  if (square <= 0) {
    return height - radius <= SAME_POINT ? [foot] : [];
  }
  const half = Math.sqrt(square);
  return [addScaled(foot, along, -half), addScaled(foot, along, half)];
}
