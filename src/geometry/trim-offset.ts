/**
 * From raw offset pieces to the ones that remain: every piece is cut where it meets another, and a part stays if the
 * clipped polygon runs along it and no point of the outline is nearer to its middle than the distance. Distances are to
 * the outline's exact pieces, so the choice is right down to rounding; the polygon says which rings there are. mm.
 */
import { CLIP_AGREEMENT, OFFSET_NOISE, SAME_POINT, TANGENT } from '../base/tolerances.ts';
import { partOf } from './change-piece.ts';
import { intersectNearPieces } from './intersect-pieces.ts';
import { nearestOnPiece } from './nearest-on-piece.ts';
import { endOf, headingOn, lengthOf, pointOn, startOf, turnOf } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import { cross, distance as distanceOf, type Point } from './point.ts';
import type { OffsetPiece } from './raw-offset.ts';
import { distanceToSegment, distanceToSleeve, sleeveOf, sleevesTouch, type Sleeve } from './sleeve.ts';

/** A part that remains. `raw` and `at` tell it from the other parts of its piece; ends are kept for the linking. */
export interface Remaining extends OffsetPiece {
  readonly raw: number;
  readonly at: readonly [number, number];
  readonly from: Point;
  readonly to: Point;
}

export interface Trim {
  readonly raw: readonly OffsetPiece[];
  readonly outline: Chain;
  readonly distance: number;
  /** Pieces that cut without being part of the offset: the rays between which one pitch lies. */
  readonly knives: Chain;
  readonly rings: readonly (readonly Point[])[];
}

export function trimOffset({ raw, outline, distance, knives, rings }: Trim): Remaining[] {
  const cuts = cutsOf(raw, knives);
  const near = outline.map((piece) => ({ piece, sleeve: sleeveOf(piece) }));
  const limit = Math.abs(distance) - OFFSET_NOISE;
  const parts: Remaining[] = [];
  raw.forEach((offset, index) => {
    const places = cleanCuts(offset.piece, cuts[index] as number[]);
    for (let i = 1; i < places.length; i++) {
      const [from, to] = [places[i - 1] as number, places[i] as number];
      const middle = pointOn(offset.piece, (from + to) / 2);
      if (rings.some((ring) => runsAlong(ring, middle)) && !nearerThan(near, middle, limit)) {
        parts.push(remainingPart(offset, index, from, to));
      }
    }
  });
  return parts;
}

function runsAlong(ring: readonly Point[], point: Point): boolean {
  let before = ring.at(-1) as Point;
  for (const corner of ring) {
    if (distanceToSegment(point, before, corner) <= CLIP_AGREEMENT) {
      return true;
    }
    before = corner;
  }
  return false;
}

/** For each raw piece the parameters at which it is cut, unsorted. */
function cutsOf(raw: readonly OffsetPiece[], knives: Chain): number[][] {
  const cuts: number[][] = raw.map(() => [0, 1]);
  const sleeves = raw.map(({ piece }) => sleeveOf(piece));
  const knifeSleeves = knives.map(sleeveOf);
  raw.forEach((a, i) => {
    knives.forEach((knife, k) => {
      if (sleevesTouch(sleeves[i] as Sleeve, knifeSleeves[k] as Sleeve)) {
        cuts[i]?.push(...intersectNearPieces(a.piece, knife).map(({ u }) => u));
      }
    });
    for (let j = i + 1; j < raw.length; j++) {
      const b = raw[j] as OffsetPiece;
      const far = !sleevesTouch(sleeves[i] as Sleeve, sleeves[j] as Sleeve);
      if (far || tangentNeighbours(a.piece, b.piece) || tangentNeighbours(b.piece, a.piece)) {
        continue;
      }
      for (const { u, v } of intersectNearPieces(a.piece, b.piece)) {
        cuts[i]?.push(u);
        cuts[j]?.push(v);
      }
    }
  });
  return cuts;
}

/** Pieces that go on from one another without a bend, and turn by less than half a circle together, meet nowhere else. */
function tangentNeighbours(a: Piece, b: Piece): boolean {
  const joined = distanceOf(endOf(a), startOf(b)) <= SAME_POINT;
  return (
    joined && Math.abs(cross(headingOn(a, 1), headingOn(b, 0))) < TANGENT && turnOf(a) + turnOf(b) < Math.PI
  );
}

/** In order, without cuts that leave nothing between them. */
function cleanCuts(piece: Piece, cuts: readonly number[]): number[] {
  const length = lengthOf(piece);
  if (length <= SAME_POINT) {
    return [];
  }
  const least = SAME_POINT / length;
  const kept = [0];
  for (const u of cuts.toSorted((a, b) => a - b)) {
    if (u - (kept.at(-1) as number) > least && 1 - u > least) {
      kept.push(u);
    }
  }
  return [...kept, 1];
}

function remainingPart(offset: OffsetPiece, raw: number, from: number, to: number): Remaining {
  const whole = from === 0 && to === 1;
  const piece = whole ? offset.piece : partOf(offset.piece, from, to);
  const { source, between } = offset;
  const [u0, u1] = offset.part;
  const part = whole ? offset.part : ([u0 + from * (u1 - u0), u0 + to * (u1 - u0)] as const);
  const ends = { from: startOf(piece), to: endOf(piece) };
  return between === undefined
    ? { piece, source, part, raw, at: [from, to], ...ends }
    : { piece, source, between, part, raw, at: [from, to], ...ends };
}

function nearerThan(
  outline: readonly { readonly piece: Piece; readonly sleeve: Sleeve }[],
  point: Point,
  limit: number,
): boolean {
  return outline.some(
    ({ piece, sleeve }) =>
      distanceToSleeve(point, sleeve) < limit && nearestOnPiece(piece, point).distance < limit,
  );
}
