/**
 * The point of a piece that is nearest to a given point: closed form on lines and arcs, to the last bits on cycloids.
 * u runs from 0 at the start of the piece to 1 at its end; mm.
 */
import { nearestRoll } from './nearest-roll.ts';
import { pointOn } from './on-piece.ts';
import type { ArcPiece, Chain, LinePiece, Piece } from './piece.ts';
import { distance, wholeAngle, type Point } from './point.ts';

export interface Nearest {
  readonly u: number;
  readonly point: Point;
  readonly distance: number;
}

export function nearestOnPiece(piece: Piece, point: Point): Nearest {
  const u = nearestParameter(piece, point);
  const foot = pointOn(piece, u);
  return { u, point: foot, distance: distance(foot, point) };
}

/** The nearest of a chain, and which piece it lies on; the first where several are as near. */
export function nearestOnChain(
  chain: Chain,
  point: Point,
): (Nearest & { readonly index: number }) | undefined {
  let best: (Nearest & { readonly index: number }) | undefined;
  chain.forEach((piece, index) => {
    const nearest = nearestOnPiece(piece, point);
    if (best === undefined || nearest.distance < best.distance) {
      best = { ...nearest, index };
    }
  });
  return best;
}

function nearestParameter(piece: Piece, point: Point): number {
  switch (piece.kind) {
    case 'line':
      return alongLine(piece, point);
    case 'arc':
      return alongArc(piece, point);
    case 'cycloid':
      return (nearestRoll(piece, point) - piece.from) / (piece.to - piece.from || 1);
  }
}

function alongLine(line: LinePiece, point: Point): number {
  const dx = line.to.x - line.from.x;
  const dy = line.to.y - line.from.y;
  const square = dx * dx + dy * dy;
  const u = square === 0 ? 0 : ((point.x - line.from.x) * dx + (point.y - line.from.y) * dy) / square;
  return u <= 0 ? 0 : u >= 1 ? 1 : u;
}

function alongArc(arc: ArcPiece, point: Point): number {
  const sweep = Math.abs(arc.turn);
  if (sweep === 0) {
    return 0;
  }
  const seen = Math.atan2(point.y - arc.centre.y, point.x - arc.centre.x);
  // How far along the travel the point is seen, from 0 to a whole turn.
  const ahead = wholeAngle(arc.turn < 0 ? arc.start - seen : seen - arc.start);
  if (ahead <= sweep) {
    return ahead / sweep;
  }
  // Off the arc: the end that is seen at the smaller angle is the nearer one.
  return ahead - sweep < 2 * Math.PI - ahead ? 1 : 0;
}
