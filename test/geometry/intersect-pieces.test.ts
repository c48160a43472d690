import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { intersectPieces } from '../../src/geometry/intersect-pieces.ts';
import { headingOn, pointOn } from '../../src/geometry/on-piece.ts';
import type { ArcPiece, CycloidPiece, LinePiece, Piece } from '../../src/geometry/piece.ts';
import { cross, distance, subtract, type Point } from '../../src/geometry/point.ts';
import { pieces, SEED } from './random-pieces.ts';

const line = (x0: number, y0: number, x1: number, y1: number): LinePiece => ({
  kind: 'line',
  from: { x: x0, y: y0 },
  to: { x: x1, y: y1 },
});
const circle = (x: number, y: number, radius: number): ArcPiece => ({
  kind: 'arc',
  centre: { x, y },
  radius,
  start: 0.1,
  turn: 2 * Math.PI,
});

describe('closed forms', () => {
  it('the 3-4-5 triangle: a circle of 5 and the line x = 3 meet at y = 4 and -4', () => {
    const found = intersectPieces(line(3, -9, 3, 9), circle(0, 0, 5)).map(
      ({ u }) => pointOn(line(3, -9, 3, 9), u).y,
    );
    expect(found[0]).toBeCloseTo(-4, 12);
    expect(found[1]).toBeCloseTo(4, 12);
  });

  it('two circles of 5 whose centres are 8 apart share a chord of 6', () => {
    const [a, b] = intersectPieces(circle(0, 0, 5), circle(8, 0, 5)).map(({ u }) =>
      pointOn(circle(0, 0, 5), u),
    );
    expect(distance(a as Point, b as Point)).toBeCloseTo(6, 12);
  });

  it('a tangent line touches once, a hair further off not at all', () => {
    expect(intersectPieces(line(-3, 2, 3, 2), circle(0, 0, 2))).toHaveLength(1);
    expect(intersectPieces(line(-3, 2 + 1e-7, 3, 2 + 1e-7), circle(0, 0, 2))).toHaveLength(0);
    expect(intersectPieces(line(-3, 2 - 1e-7, 3, 2 - 1e-7), circle(0, 0, 2))).toHaveLength(2);
  });

  it('lines on one another answer with the ends of what they share', () => {
    const found = intersectPieces(line(0, 0, 3, 0), line(1, 0, 5, 0));
    expect(found.map(({ u }) => 3 * u)).toEqual([expect.closeTo(1, 12), expect.closeTo(3, 12)]);
  });

  it('concentric circles and parallel lines never meet', () => {
    expect(intersectPieces(circle(0, 0, 5), circle(0, 0, 4))).toEqual([]);
    expect(intersectPieces(line(0, 0, 3, 0), line(0, 1, 3, 1))).toEqual([]);
  });
});

describe('cycloids', () => {
  const flank: CycloidPiece = {
    kind: 'cycloid',
    fixed: 15,
    rolling: 1,
    cusp: -0.026,
    sense: 1,
    offset: 0,
    from: 0,
    to: 0.09,
  };

  it('a tooth comes to its point on its own axis, where both sides and the axis meet', () => {
    const other: CycloidPiece = { ...flank, cusp: 0.026, sense: -1 };
    const [both] = intersectPieces(flank, other);
    const [axis] = intersectPieces(flank, line(14, 0, 17, 0));
    expect(both?.u).toBeCloseTo(both?.v ?? 0, 12);
    expect(both?.u).toBeCloseTo(axis?.u ?? 0, 12);
    expect(pointOn(flank, axis?.u ?? 0).y).toBeCloseTo(0, 13);
  });

  it('the radial flank that runs into it is tangent at the cusp and meets it nowhere else', () => {
    const radial = line(
      14 * Math.cos(-0.026),
      14 * Math.sin(-0.026),
      15 * Math.cos(-0.026),
      15 * Math.sin(-0.026),
    );
    const found = intersectPieces(radial, flank);
    expect(found).toHaveLength(1);
    expect(found[0]?.u).toBeCloseTo(1, 9);
  });

  it('a line that touches from outside touches once', () => {
    const u = 0.6;
    const [at, along] = [pointOn(flank, u), headingOn(flank, u)];
    const tangent = (off: number): LinePiece => {
      const x = at.x + off * along.y;
      const y = at.y - off * along.x;
      return line(x - along.x, y - along.y, x + 1.1 * along.x, y + 1.1 * along.y);
    };
    expect(intersectPieces(flank, tangent(0)).map((meeting) => meeting.u)).toEqual([expect.closeTo(u, 3)]);
    expect(intersectPieces(flank, tangent(1e-7))).toEqual([]);
    expect(intersectPieces(flank, tangent(-1e-7))).toHaveLength(2);
  });

  it('a curve on itself answers with its ends', () => {
    expect(intersectPieces(flank, flank)).toEqual([
      { u: 0, v: 0 },
      { u: 1, v: 1 },
    ]);
  });
});

/** Crossings of two fine polygons: as many changes of side as a dense look can see. */
function crossingsSeen(a: Piece, b: Piece): Point[] {
  const n = 120;
  const p = Array.from({ length: n + 1 }, (_, i) => pointOn(a, i / n));
  const q = Array.from({ length: n + 1 }, (_, i) => pointOn(b, i / n));
  const found: Point[] = [];
  for (let i = 0; i < n; i++) {
    const [p0, p1] = [p[i] as Point, p[i + 1] as Point];
    const reach = distance(p0, p1);
    for (let k = 0; k < n; k++) {
      const [q0, q1] = [q[k] as Point, q[k + 1] as Point];
      if (distance(p0, q0) > reach + distance(q0, q1)) {
        continue;
      }
      const along = subtract(p1, p0);
      const other = subtract(q1, q0);
      const turn = cross(along, other);
      const s = cross(subtract(q0, p0), other) / turn;
      const t = cross(subtract(q0, p0), along) / turn;
      const clear = Math.abs(turn) > 0.2 * reach * distance(q0, q1);
      if (clear && s > 0.01 && s < 0.99 && t > 0.01 && t < 0.99) {
        found.push({ x: p0.x + s * along.x, y: p0.y + s * along.y });
      }
    }
  }
  return found;
}

it('finds every crossing that a fine polygon shows, and only points that lie on both', () => {
  fc.assert(
    fc.property(pieces, pieces, (a, b) => {
      const meetings = intersectPieces(a, b);
      for (const { u, v } of meetings) {
        expect(distance(pointOn(a, u), pointOn(b, v))).toBeLessThan(2e-9);
      }
      for (const seen of crossingsSeen(a, b)) {
        const off = Math.min(...meetings.map(({ u }) => distance(pointOn(a, u), seen)));
        expect(off).toBeLessThan(0.1);
      }
    }),
    { seed: SEED, numRuns: 200, endOnFailure: true },
  );
});
