/**
 * The area a chain sweeps as seen from the origin, positive counter-clockwise: of a loop, its area. mm2, exact.
 *
 * Green: half the integral of P x dP. On a cycloid P x P' = rate (R sin kt + 2r sin kt + offset), k = R/2r, because P is
 * the contact point plus (2r sin kt + offset) n; its integral is closed form.
 * Check: one piece from a cusp gives (1/2)(R + r)(R + 2r)(t - (r/R) sin(R t/r)), Wikipedia "Epicycloid" over an arch.
 */
import { endOf, startOf } from './on-piece.ts';
import type { Chain, CycloidPiece, Piece } from './piece.ts';
import { cross, subtract } from './point.ts';

export function areaOfChain(chain: Chain): number {
  return chain.reduce((sum, piece) => sum + sweptArea(piece), 0);
}

function sweptArea(piece: Piece): number {
  switch (piece.kind) {
    case 'line':
      return cross(piece.from, piece.to) / 2;
    case 'arc': {
      const chord = subtract(endOf(piece), startOf(piece));
      return (cross(piece.centre, chord) + piece.radius * piece.radius * piece.turn) / 2;
    }
    case 'cycloid':
      return piece.sense * (sweptTo(piece, piece.to) - sweptTo(piece, piece.from));
  }
}

/** Half the integral of (a sin kt + offset bend)(b sin kt + offset), up to a constant. */
function sweptTo(piece: CycloidPiece, t: number): number {
  const { fixed: R, rolling: r, offset } = piece;
  const k = R / (2 * r);
  const a = 2 * (R + r);
  const b = R + 2 * r;
  const bend = 1 + k;
  const squares = t / 2 - Math.sin(2 * k * t) / (4 * k);
  const sines = -Math.cos(k * t) / k;
  return (a * b * squares + offset * (a + bend * b) * sines + offset * offset * bend * t) / 2;
}
