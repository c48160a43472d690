/** Place, heading, curvature and length of any piece; u in [0, 1] runs from its start to its end. mm, radians. */
import { cycloidCusps, cycloidDirection, cycloidLength, cycloidPoint, cycloidRate } from './cycloid.ts';
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

/** So near a cusp (as a share of the greatest rate) rounding decides the rate's sign; it is asked for so far inside instead. */
const AT_CUSP = 1e-9;
const INSIDE = 1e-6;

/** +1 where travelling the span follows `cycloidDirection`. */
function travelSign(piece: CycloidPiece, u: number): number {
  const way = piece.to < piece.from ? -1 : 1;
  const rate = cycloidRate(piece, rollAt(piece, u));
  const greatest = Math.abs(2 * (piece.fixed + piece.rolling)) + Math.abs(piece.offset);
  return Math.abs(rate) > AT_CUSP * greatest
    ? Math.sign(rate) * way
    : Math.sign(cycloidRate(piece, rollAt(piece, u < 0.5 ? u + INSIDE : u - INSIDE))) * way;
}

/** dP/du, mm: along the heading, or against it past a cusp of a cycloid's parallel; nothing on the cusp itself. */
export function velocityOn(piece: Piece, u: number): Point {
  switch (piece.kind) {
    case 'line':
      return subtract(piece.to, piece.from);
    case 'arc': {
      const spoke = polar(piece.radius * piece.turn, piece.start + u * piece.turn);
      return { x: -spoke.y, y: spoke.x };
    }
    case 'cycloid': {
      const t = rollAt(piece, u);
      return scale(cycloidDirection(piece, t), cycloidRate(piece, t) * (piece.to - piece.from));
    }
  }
}

/** How far the heading turns from start to end, radians, never negative (cusps not counted). */
export function turnOf(piece: Piece): number {
  switch (piece.kind) {
    case 'line':
      return 0;
    case 'arc':
      return Math.abs(piece.turn);
    case 'cycloid':
      return Math.abs((1 + piece.fixed / (2 * piece.rolling)) * (piece.to - piece.from));
  }
}

/** Signed curvature, 1/mm, positive turning left; infinite on a cusp. */
export function curvatureOn(piece: Piece, u: number): number {
  switch (piece.kind) {
    case 'line':
      return 0;
    case 'arc':
      return (piece.turn < 0 ? -1 : 1) / piece.radius;
    case 'cycloid': {
      // The heading turns by (1 + R/2r) for each radian of roll, whichever way the rate points; where that is nothing
      // (a point of a circle rolling in one of twice its size), the curve is a straight line to its very end.
      const bend = 1 + piece.fixed / (2 * piece.rolling);
      const way = piece.sense * (piece.to < piece.from ? -1 : 1);
      return bend === 0 ? 0 : (way * bend) / Math.abs(cycloidRate(piece, rollAt(piece, u)));
    }
  }
}

export function lengthOf(piece: Piece): number {
  switch (piece.kind) {
    case 'line':
      return distance(piece.from, piece.to);
    case 'arc':
      return piece.radius * Math.abs(piece.turn);
    case 'cycloid': {
      // Back and forth are both length: measured between the cusps, where the rate changes its sign.
      let sum = 0;
      let from = piece.from;
      for (const to of [...cycloidCusps(piece), piece.to]) {
        sum += Math.abs(cycloidLength(piece, to) - cycloidLength(piece, from));
        from = to;
      }
      return sum;
    }
  }
}

export function lengthOfChain(chain: Chain): number {
  return chain.reduce((sum, piece) => sum + lengthOf(piece), 0);
}
