/**
 * Every exact piece that the offset of a chain could be made of, before anything is cut away: the parallel of each piece,
 * and an arc of the distance round each corner that opens on that side. Distance positive to the right of travel. mm.
 *
 * What turns back on itself (an arc shrunk through its centre, the part of a cycloid that is bent tighter than the
 * distance) is nearer to the chain than the distance everywhere, so it is left out from the start.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { offsetPiece, partOf } from './change-piece.ts';
import { cycloidCusps } from './cycloid.ts';
import { endOf, headingOn, velocityOn } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import { angleOf, cross, dot, leftOf, type Point } from './point.ts';

export interface OffsetPiece {
  readonly piece: Piece;
  /** Index of the outline piece it is the parallel of, or a corner between two. */
  readonly source: number | 'corner';
  /** The corner's pieces, before and after. */
  readonly between?: readonly [number, number];
  /** Which part of the source, or of the corner's arc, in its own u. */
  readonly part: readonly [number, number];
}

/** A piece that joins the chain at one of its ends, for the corner there. */
export interface Neighbour {
  readonly piece: Piece;
  readonly index: number;
}

/** What comes before the first piece and after the last, where it matters. Indexes run from 0 along the chain. */
export interface Neighbours {
  readonly before?: Neighbour;
  readonly after?: Neighbour;
}

export function rawOffset(chain: Chain, distance: number, { before, after }: Neighbours): OffsetPiece[] {
  const raw: OffsetPiece[] = [];
  const joints = [before, ...chain.map((piece, index) => ({ piece, index })), after];
  for (let i = 1; i < joints.length; i++) {
    const [from, to] = [joints[i - 1], joints[i]];
    const corner = from && to && cornerArc(from.piece, to.piece, distance);
    if (from && to && corner) {
      raw.push({ piece: corner, source: 'corner', between: [from.index, to.index], part: [0, 1] });
    }
    if (to !== undefined && i + 1 < joints.length) {
      for (const { parallel, part } of parallelsOf(to.piece, distance)) {
        raw.push({ piece: parallel, source: to.index, part });
      }
    }
  }
  return raw;
}

function parallelsOf(piece: Piece, distance: number): { parallel: Piece; part: readonly [number, number] }[] {
  const parallel = offsetPiece(piece, distance);
  if (parallel === undefined) {
    return [];
  }
  if (parallel.kind !== 'cycloid') {
    return [{ parallel, part: [0, 1] }];
  }
  const span = parallel.to - parallel.from;
  const cuts = [0, ...cycloidCusps(parallel).map((t) => (t - parallel.from) / span), 1];
  return cuts.slice(1).flatMap((to, i) => {
    const from = cuts[i] as number;
    const middle = (from + to) / 2;
    // Past its cusp the parallel runs against the curve.
    const forward = dot(velocityOn(parallel, middle), headingOn(piece, middle)) > 0;
    return forward ? [{ parallel: partOf(parallel, from, to), part: [from, to] as const }] : [];
  });
}

function cornerArc(before: Piece, after: Piece, distance: number): Piece | undefined {
  const arriving = headingOn(before, 1);
  const leaving = headingOn(after, 0);
  const turn = Math.atan2(cross(arriving, leaving), dot(arriving, leaving));
  const opens = turn > 0 === distance > 0;
  if (!opens || Math.abs(turn * distance) <= SAME_POINT) {
    return undefined;
  }
  const side: Point = leftOf(arriving);
  const start = angleOf(distance > 0 ? { x: -side.x, y: -side.y } : side);
  return { kind: 'arc', centre: endOf(before), radius: Math.abs(distance), start, turn };
}
