/**
 * Lines only in place of a chain, never on the metal's side of it: `away` says on which side of travel the cutter may
 * stray, by no more than the tolerance. mm.
 *
 * Where a piece bulges away, the lines are tangents and their corners stand out (a cutter that follows them leaves metal,
 * never takes too much); the first and last tangents go on straight from what comes before and after. Where it bulges
 * towards the metal, the lines are chords. Ends of the chain and real corners stay where they are.
 */
import { SAME_POINT, TANGENT } from '../base/tolerances.ts';
import { partOf } from './change-piece.ts';
import { cycloidCusps } from './cycloid.ts';
import { nearestOnPiece } from './nearest-on-piece.ts';
import { curvatureOn, endOf, headingOn, lengthOf, pointOn, startOf, turnOf } from './on-piece.ts';
import type { Chain, LinePiece, Piece } from './piece.ts';
import { addScaled, cross, distance, subtract, type Point } from './point.ts';
import { sampleParameters } from './sample-piece.ts';

export function fitLines(chain: Chain, tolerance: number, away: 'left' | 'right'): readonly LinePiece[] {
  const corners: Point[] = [];
  for (const piece of chain.flatMap(betweenCusps)) {
    const points = lengthOf(piece) > SAME_POINT ? cornersOf(piece, tolerance, away) : [];
    const from = corners.length > 0 && points.length > 0 ? 1 : 0;
    corners.push(...points.slice(from));
  }
  return straightened(corners).flatMap((to, i, all) => {
    const from = all[i - 1];
    return from === undefined ? [] : [{ kind: 'line' as const, from, to }];
  });
}

/** A heading that flips inside a piece is a corner. */
function betweenCusps(piece: Piece): Piece[] {
  if (piece.kind !== 'cycloid') {
    return [piece];
  }
  const ends = [0, ...cycloidCusps(piece).map((t) => (t - piece.from) / (piece.to - piece.from)), 1];
  return ends.slice(1).map((to, i) => partOf(piece, ends[i] as number, to));
}

/** From the start of the piece to its end. */
function cornersOf(piece: Piece, tolerance: number, away: 'left' | 'right'): Point[] {
  const bend = curvatureOn(piece, 0.5);
  if (bend === 0) {
    return [startOf(piece), endOf(piece)];
  }
  // Turning left it bulges to the right.
  const bulgesAway = bend > 0 === (away === 'right');
  return bulgesAway
    ? [startOf(piece), ...tangentCorners(piece, tolerance), endOf(piece)]
    : sampleParameters(piece, tolerance).map((u) => pointOn(piece, u));
}

/**
 * Where the tangents at neighbouring parameters cross. A corner between tangents that turn by a stands out as far as
 * their chord sags, to third order, and less than rho (1 / cos(a/2) - 1); it is held under the tolerance by measure.
 */
function tangentCorners(piece: Piece, tolerance: number): Point[] {
  const least = Math.ceil(turnOf(piece) / MOST_TURN);
  const sampled = sampleParameters(piece, tolerance).length - 1;
  for (let count = Math.max(least, sampled); ; count++) {
    const touching = spreadBy(piece, count);
    const corners = touching.slice(1).map((u, i) => tangentsMeet(piece, touching[i] as number, u));
    if (corners.every(({ standsOut }) => standsOut <= tolerance) || count > 50 * (sampled + least)) {
      return corners.map(({ corner }) => corner);
    }
  }
}

/** Tangents that turn by more than this stand out too far to be a good shape at any tolerance. */
const MOST_TURN = Math.PI / 3;

/** Parameters at which `count` steps stand out alike: those of the sampling to the sag that needs so many. */
function spreadBy(piece: Piece, count: number): number[] {
  let [coarse, fine] = [lengthOf(piece), 0];
  let best = sampleParameters(piece, coarse);
  for (let step = 0; step < 60 && best.length - 1 !== count; step++) {
    const sag = fine === 0 ? coarse / 2 : Math.sqrt(coarse * fine);
    best = sampleParameters(piece, sag);
    if (best.length - 1 > count) {
      fine = sag;
    } else {
      coarse = sag;
    }
  }
  return best;
}

function tangentsMeet(piece: Piece, u0: number, u1: number): { corner: Point; standsOut: number } {
  const a = pointOn(piece, u0);
  const b = pointOn(piece, u1);
  const along = headingOn(piece, u0);
  const other = headingOn(piece, u1);
  const turn = cross(along, other);
  const corner = turn === 0 ? b : addScaled(a, along, cross(subtract(b, a), other) / turn);
  const foot = nearestOnPiece(partOf(piece, u0, u1), corner);
  return { corner, standsOut: foot.distance };
}

/** Without corners that lie on the line of their neighbours, and without repeated ones. */
function straightened(corners: readonly Point[]): Point[] {
  const kept: Point[] = [];
  corners.forEach((corner, i) => {
    const before = kept.at(-1);
    const after = corners[i + 1];
    if (before === undefined || after === undefined) {
      kept.push(corner);
    } else if (distance(before, corner) > SAME_POINT && !goesStraight(before, corner, after)) {
      kept.push(corner);
    }
  });
  return kept;
}

function goesStraight(a: Point, b: Point, c: Point): boolean {
  const first = subtract(b, a);
  const second = subtract(c, b);
  const off = cross(first, second) / (distance(a, c) || 1);
  return Math.abs(off) <= SAME_POINT * TANGENT && first.x * second.x + first.y * second.y >= 0;
}
