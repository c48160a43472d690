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

/** `after`: the piece that follows the last, and its index, where there is one. Indexes run from 0 along the chain. */
export function rawOffset(
  chain: Chain,
  distance: number,
  after?: { readonly piece: Piece; readonly index: number },
): OffsetPiece[] {
  const raw: OffsetPiece[] = [];
  chain.forEach((piece, source) => {
    for (const { parallel, part } of parallelsOf(piece, distance)) {
      raw.push({ piece: parallel, source, part });
    }
    const inside = source + 1 < chain.length;
    const next = inside ? chain[source + 1] : after?.piece;
    const corner = next === undefined ? undefined : cornerArc(piece, next, distance);
    if (corner !== undefined) {
      const index = inside ? source + 1 : (after?.index ?? 0);
      raw.push({ piece: corner, source: 'corner', between: [source, index], part: [0, 1] });
    }
  });
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
