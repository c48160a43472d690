/**
 * Whether a clipped polygon and an exact chain tell the same story: no point of the one lies further than CLIP_AGREEMENT
 * from the other, both ways (the chain stands in chords to CLIP_SAG, which the agreement has room for). Where two curves
 * meet at a sharp inside corner of angle a, the chords that stand for them meet further out by 1 / sin(a/2), so that much
 * is allowed near such a corner. Both run the same way round, so each search begins where the last one ended. mm.
 */
import { CLIP_SAG, CLIP_AGREEMENT } from '../base/tolerances.ts';
import { endOf, headingOn, startOf } from './on-piece.ts';
import type { Chain } from './piece.ts';
import { distance, dot, type Point } from './point.ts';
import { sampleChain } from './sample-piece.ts';
import { distanceToSegment } from './sleeve.ts';

export interface Agreement {
  /** Corners of the polygon that must lie on one of the chains. */
  readonly corners: readonly Point[];
  /** Closed rings on which the chains must lie. */
  readonly rings: readonly (readonly Point[])[];
  readonly chains: readonly Chain[];
}

/** The greatest distance either way beyond what is allowed, and where; 0 where there is none. */
export function disagreement({ corners, rings, chains }: Agreement): {
  readonly worst: number;
  readonly at: Point;
} {
  const lines = chains.map((chain) => sampleChain(chain, CLIP_SAG));
  const closed = rings.map((ring) => [...ring, ring[0] as Point]);
  const sharp = chains.flatMap(sharpCorners);
  let worst = 0;
  let at: Point = { x: 0, y: 0 };
  const look = (points: readonly Point[], on: readonly (readonly Point[])[]): void => {
    const nearest = nearestInOrder(on);
    for (const point of points) {
      const off = nearest(point);
      if (off > CLIP_AGREEMENT && off > worst && off > allowance(sharp, point)) {
        worst = off;
        at = point;
      }
    }
  };
  look(corners, lines);
  for (const line of lines) {
    look(line, closed);
  }
  return { worst, at };
}

/** Asked for points in order: goes on from the last edge while that is near enough, and looks everywhere where it isn't. */
function nearestInOrder(lines: readonly (readonly Point[])[]): (point: Point) => number {
  let line = 0;
  let edge = 1;
  const off = (point: Point, on: readonly Point[], i: number): number =>
    distanceToSegment(point, on[i - 1] as Point, on[i] as Point);
  return (point) => {
    const on = lines[line] ?? [];
    for (let step = 0; step < FORWARD && edge + step < on.length; step++) {
      const here = off(point, on, edge + step);
      if (here <= CLIP_AGREEMENT) {
        edge += step;
        return here;
      }
    }
    let best = Infinity;
    lines.forEach((other, index) => {
      for (let i = 1; i < other.length; i++) {
        const here = off(point, other, i);
        if (here < best) {
          [best, line, edge] = [here, index, i];
        }
      }
    });
    return best;
  };
}

/** Edges looked at ahead before everything is searched. */
const FORWARD = 12;

interface SharpCorner {
  readonly point: Point;
  /** 1 / sin of half the angle between its sides. */
  readonly stretch: number;
}

/** Below this the stretch is nothing beside the agreement; above the other a corner is a slit. */
const LEAST_STRETCH = 1.01;
const MOST_STRETCH = 1000;

function sharpCorners(exact: Chain): SharpCorner[] {
  return exact.flatMap((piece, i) => {
    const next = exact[i + 1] ?? (exact[0] as Chain[number]);
    if (distance(endOf(piece), startOf(next)) > CLIP_AGREEMENT) {
      return [];
    }
    // The cosine of how far the heading turns; the half angle between the sides is what is left to a quarter turn.
    const turned = Math.min(1, Math.max(-1, dot(headingOn(piece, 1), headingOn(next, 0))));
    const stretch = Math.min(1 / Math.cos(Math.acos(turned) / 2), MOST_STRETCH);
    return stretch > LEAST_STRETCH ? [{ point: startOf(next), stretch }] : [];
  });
}

function allowance(sharp: readonly SharpCorner[], point: Point): number {
  return sharp.reduce((most, corner) => {
    const limit = CLIP_AGREEMENT * corner.stretch;
    return distance(corner.point, point) <= 2 * limit ? Math.max(most, limit) : most;
  }, CLIP_AGREEMENT);
}
