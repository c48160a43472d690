/** What a cutter covers in plan: brute force on a raster of points. mm. */
import { nearestOnPiece } from '../../src/geometry/nearest-on-piece.ts';
import type { Piece } from '../../src/geometry/piece.ts';
import type { Point } from '../../src/geometry/point.ts';
import type { PlannedMove } from './make-job.ts';

export function planPiece({ from, step }: Pick<PlannedMove, 'from' | 'step'>): Piece {
  if (step.kind !== 'arc') {
    return { kind: 'line', from, to: step.to };
  }
  const { centre, turn } = step;
  return {
    kind: 'arc',
    centre,
    radius: Math.hypot(from.x - centre.x, from.y - centre.y),
    start: Math.atan2(from.y - centre.y, from.x - centre.x),
    turn,
  };
}

/** Moves that run flat at a height. */
export function flatAt(moves: readonly PlannedMove[], z: number): readonly PlannedMove[] {
  return moves.filter(({ from, step }) => step.kind !== 'rapid' && from.z === z && step.to.z === z);
}

export function distanceTo(pieces: readonly Piece[], point: Point): number {
  let best = Infinity;
  for (const piece of pieces) {
    best = Math.min(best, nearestOnPiece(piece, point).distance);
  }
  return best;
}

/** A square raster over a box. */
export function raster(
  box: { x: readonly [number, number]; y: readonly [number, number] },
  cell: number,
): Point[] {
  const points: Point[] = [];
  for (let x = box.x[0]; x <= box.x[1]; x += cell) {
    for (let y = box.y[0]; y <= box.y[1]; y += cell) {
      points.push({ x, y });
    }
  }
  return points;
}
