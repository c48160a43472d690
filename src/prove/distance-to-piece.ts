/** Distance from a point to an exact piece, mm: closed form for lines and arcs, a search along a cycloid span. */
import { pointOn } from '../geometry/on-piece.ts';
import type { Piece } from '../geometry/piece.ts';
import { wholeAngle } from '../geometry/point.ts';
import { highestOf } from './highest-of.ts';

const LOOKS = 32;

export function distanceToPiece(piece: Piece, x: number, y: number): number {
  const at = (u: number): number => {
    const point = pointOn(piece, u);
    return Math.hypot(point.x - x, point.y - y);
  };
  const ends = Math.min(at(0), at(1));
  switch (piece.kind) {
    case 'line': {
      const [dx, dy] = [piece.to.x - piece.from.x, piece.to.y - piece.from.y];
      const length = Math.hypot(dx, dy);
      const u = ((x - piece.from.x) * dx + (y - piece.from.y) * dy) / (length * length);
      return u > 0 && u < 1 ? Math.abs((x - piece.from.x) * dy - (y - piece.from.y) * dx) / length : ends;
    }
    case 'arc': {
      const angle = Math.atan2(y - piece.centre.y, x - piece.centre.x);
      const way = piece.turn < 0 ? -1 : 1;
      const within = wholeAngle(way * (angle - piece.start)) <= Math.abs(piece.turn);
      return within ? Math.abs(Math.hypot(x - piece.centre.x, y - piece.centre.y) - piece.radius) : ends;
    }
    case 'cycloid': {
      let best = 0;
      for (let k = 1; k <= LOOKS; k++) {
        best = at(k / LOOKS) < at(best) ? k / LOOKS : best;
      }
      const low = Math.max(0, best - 1 / LOOKS);
      const high = Math.min(1, best + 1 / LOOKS);
      return Math.min(ends, at(highestOf((u) => -at(u), low, high)));
    }
  }
}
