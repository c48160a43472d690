/**
 * The exact box round pieces: their ends, their cusps and the places where they run along or across the axes. mm.
 * The heading of a cycloid at t is cusp +- (1 + R/2r) t, so those places are closed form.
 */
import { cycloidCusps, solutionsInside } from './cycloid.ts';
import { pointOn } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import type { Point } from './point.ts';

export interface Box {
  readonly minX: number;
  readonly maxX: number;
  readonly minY: number;
  readonly maxY: number;
}

export function boundsOfChain(chain: Chain): Box {
  return boundsOfPoints(
    chain.flatMap((piece) => [
      pointOn(piece, 0),
      ...turningParameters(piece).map((u) => pointOn(piece, u)),
      pointOn(piece, 1),
    ]),
  );
}

export function boundsOfPoints(points: readonly Point[]): Box {
  let [minX, maxX, minY, maxY] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { x, y } of points) {
    minX = Math.min(minX, x);
    maxX = Math.max(maxX, x);
    minY = Math.min(minY, y);
    maxY = Math.max(maxY, y);
  }
  return { minX, maxX, minY, maxY };
}

/** Where the piece runs along X or along Y, or has a cusp, strictly inside, in the order of travel. */
export function turningParameters(piece: Piece): number[] {
  switch (piece.kind) {
    case 'line':
      return [];
    case 'arc': {
      const found: number[] = [];
      const low = Math.min(piece.start, piece.start + piece.turn);
      const high = Math.max(piece.start, piece.start + piece.turn);
      for (let n = Math.ceil(low / (Math.PI / 2)); (n * Math.PI) / 2 < high; n++) {
        const u = ((n * Math.PI) / 2 - piece.start) / piece.turn;
        if (u > 0 && u < 1) {
          found.push(u);
        }
      }
      return found.sort((a, b) => a - b);
    }
    case 'cycloid': {
      const bend = 1 + piece.fixed / (2 * piece.rolling);
      const span = piece.to - piece.from;
      const quarters = bend === 0 ? [] : solutionsInside(piece, bend, -piece.sense * piece.cusp, Math.PI / 2);
      return [...quarters, ...cycloidCusps(piece)].map((t) => (t - piece.from) / span).sort((a, b) => a - b);
    }
  }
}
