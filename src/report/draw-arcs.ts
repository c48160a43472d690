/**
 * A cycloid as a few arcs for a drawing: each through three points of the curve, twice as many until none lies further from it
 * than the sag. Quick, and nearly tangent; programs and exchange files have arcs that are tangent.
 */
import { pointOn } from '../geometry/on-piece.ts';
import type { ArcPiece, Chain, CycloidPiece, LinePiece } from '../geometry/piece.ts';
import { angleOf, cross, distance, subtract, wholeAngle, type Point } from '../geometry/point.ts';

/** In lines and arcs only. */
export function drawnChain(chain: Chain, sag: number): readonly (ArcPiece | LinePiece)[] {
  return chain.flatMap((piece) => (piece.kind === 'cycloid' ? drawnArcs(piece, sag) : [piece]));
}

function drawnArcs(piece: CycloidPiece, sag: number): readonly (ArcPiece | LinePiece)[] {
  for (let count = 2; count < MOST_ARCS; count *= 2) {
    const arcs = Array.from({ length: count }, (_, i) => arcOn(piece, i / count, (i + 1) / count));
    if (arcs.every((arc, i) => near(arc, piece, i / count, (i + 1) / count, sag))) {
      return arcs;
    }
  }
  return Array.from({ length: MOST_ARCS }, (_, i) => arcOn(piece, i / MOST_ARCS, (i + 1) / MOST_ARCS));
}

/** Why: at a cusp the radius is nothing and no count would do; so many are finer than any printer. */
const MOST_ARCS = 128;

/** Through the curve at both ends and in the middle; straight where these stand in a line. */
function arcOn(piece: CycloidPiece, u0: number, u1: number): ArcPiece | LinePiece {
  const [from, middle, to] = [pointOn(piece, u0), pointOn(piece, (u0 + u1) / 2), pointOn(piece, u1)];
  const [a, b] = [subtract(middle, from), subtract(to, from)];
  const twice = 2 * cross(a, b);
  const [aa, bb] = [a.x * a.x + a.y * a.y, b.x * b.x + b.y * b.y];
  const offset = { x: (b.y * aa - a.y * bb) / twice, y: (a.x * bb - b.x * aa) / twice };
  const radius = Math.hypot(offset.x, offset.y);
  if (!(radius < STRAIGHT)) {
    return { kind: 'line', from, to };
  }
  const centre: Point = { x: from.x + offset.x, y: from.y + offset.y };
  const start = angleOf(subtract(from, centre));
  const swept = wholeAngle(angleOf(subtract(to, centre)) - start);
  return { kind: 'arc', centre, radius, start, turn: twice > 0 ? swept : swept - 2 * Math.PI };
}

/** mm. Why: a larger arc is straight to a thousandth of a micrometre over the length of any tooth. */
const STRAIGHT = 1e6;

/** A quarter and three quarters of the way an arc through ends and middle errs most. */
function near(arc: ArcPiece | LinePiece, piece: CycloidPiece, u0: number, u1: number, sag: number): boolean {
  return [0.25, 0.75].every((share) => {
    const point = pointOn(piece, u0 + share * (u1 - u0));
    return arc.kind === 'arc'
      ? Math.abs(distance(point, arc.centre) - arc.radius) <= sag
      : offLine(point, arc) <= sag;
  });
}

function offLine(point: Point, { from, to }: LinePiece): number {
  return Math.abs(cross(subtract(to, from), subtract(point, from))) / distance(from, to);
}
