/** Place, heading, curvature and length of any piece; u in [0, 1] runs from its start to its end. mm, radians. */
import { cycloidDirection, cycloidLength, cycloidPoint, cycloidRadius, cycloidRate } from './cycloid.ts';
import type { Chain, CycloidPiece, Piece } from './piece.ts';
import { addScaled, distance, polar, scale, subtract, unit, type Point } from './point.ts';

export function pointOn(piece: Piece, u: number): Point {
  switch (piece.kind) {
    case 'line':
      return u === 1 ? piece.to : addScaled(piece.from, subtract(piece.to, piece.from), u);
    case 'arc': {
      const spoke = polar(piece.radius, piece.start + u * piece.turn);
      return { x: piece.centre.x + spoke.x, y: piece.centre.y + spoke.y };
    }
    case 'cycloid':
      return cycloidPoint(piece, rollAt(piece, u));
  }
}

export function startOf(piece: Piece): Point {
  return pointOn(piece, 0);
}

export function endOf(piece: Piece): Point {
  return pointOn(piece, 1);
}

/** Roll parameter of a cycloid span at u. */
export function rollAt(piece: CycloidPiece, u: number): number {
  return u === 1 ? piece.to : piece.from + u * (piece.to - piece.from);
}

/** Unit vector of travel. On a cusp (rate zero) the limit from inside the span. */
export function headingOn(piece: Piece, u: number): Point {
  switch (piece.kind) {
    case 'line':
      return unit(subtract(piece.to, piece.from));
    case 'arc': {
      const angle = piece.start + u * piece.turn;
      const way = piece.turn < 0 ? -1 : 1;
      return { x: -way * Math.sin(angle), y: way * Math.cos(angle) };
    }
    case 'cycloid':
      return scale(cycloidDirection(piece, rollAt(piece, u)), travelSign(piece, u));
  }
}

/** +1 where travelling the span follows `cycloidDirection`. */
function travelSign(piece: CycloidPiece, u: number): number {
  const t = rollAt(piece, u);
  const rate = cycloidRate(piece, t) || cycloidRate(piece, rollAt(piece, u < 0.5 ? u + 1e-6 : u - 1e-6));
  return Math.sign(rate) * (piece.to < piece.from ? -1 : 1);
}

/** Signed curvature, 1/mm, positive turning left; infinite on a cusp. */
export function curvatureOn(piece: Piece, u: number): number {
  switch (piece.kind) {
    case 'line':
      return 0;
    case 'arc':
      return (piece.turn < 0 ? -1 : 1) / piece.radius;
    case 'cycloid': {
      const radius = Math.abs(cycloidRadius(piece, rollAt(piece, u)));
      // dh/dt > 0 for r > 0 and for r < -R/2; the heading turns with it whichever way the rate points.
      const bend = Math.sign(1 + piece.fixed / (2 * piece.rolling));
      return (bend * piece.sense * (piece.to < piece.from ? -1 : 1)) / radius;
    }
  }
}

export function lengthOf(piece: Piece): number {
  switch (piece.kind) {
    case 'line':
      return distance(piece.from, piece.to);
    case 'arc':
      return piece.radius * Math.abs(piece.turn);
    case 'cycloid':
      return Math.abs(cycloidLength(piece, piece.to) - cycloidLength(piece, piece.from));
  }
}

export function lengthOfChain(chain: Chain): number {
  return chain.reduce((sum, piece) => sum + lengthOf(piece), 0);
}
