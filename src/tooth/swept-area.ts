/**
 * The area that the spoke from the wheel's axis sweeps along a piece, positive counter-clockwise: half the integral of
 * x dy - y dx, in closed form. Summed round a loop it is the loop's area. mm^2.
 *
 * On a cycloid, with k = R/2r, s = sin kt:  dA = [2 (R + r) s + d (1 + k)] [(R + 2r) s + d] dt / 2.
 */
import type { CycloidPiece, Piece } from '../geometry/piece.ts';
import { cross, polar } from '../geometry/point.ts';

export function sweptArea(piece: Piece): number {
  switch (piece.kind) {
    case 'line':
      return cross(piece.from, piece.to) / 2;
    case 'arc': {
      const { centre, radius, start, turn } = piece;
      const first = polar(radius, start);
      const last = polar(radius, start + turn);
      const moved = { x: last.x - first.x, y: last.y - first.y };
      return (radius * radius * turn + cross(centre, moved)) / 2;
    }
    case 'cycloid':
      return piece.sense * (sweptTo(piece, piece.to) - sweptTo(piece, piece.from));
  }
}

function sweptTo({ fixed: R, rolling: r, offset: d }: CycloidPiece, t: number): number {
  const k = R / (2 * r);
  const squares = t / 2 - Math.sin(2 * k * t) / (4 * k);
  const sines = (1 - Math.cos(k * t)) / k;
  return (
    (2 * (R + r) * (R + 2 * r) * squares +
      d * (2 * (R + r) + (1 + k) * (R + 2 * r)) * sines +
      (1 + k) * d * d * t) /
    2
  );
}

export function sweptAreaOf(pieces: readonly Piece[]): number {
  return pieces.reduce((sum, piece) => sum + sweptArea(piece), 0);
}
