/** Arbitrary pieces, points and outlines for property tests. mm, radians. */
import * as fc from 'fast-check';
import type { ArcPiece, CycloidPiece, LinePiece, Piece } from '../../src/geometry/piece.ts';
import type { Point } from '../../src/geometry/point.ts';

/** Printed by fast-check with every failure; fixed, so that a run can be repeated. */
export const SEED = 19_520_124;

const between = (min: number, max: number): fc.Arbitrary<number> => fc.double({ min, max, noNaN: true });

export const points: fc.Arbitrary<Point> = fc
  .tuple(between(-25, 25), between(-25, 25))
  .map(([x, y]) => ({ x, y }));

export const linePieces: fc.Arbitrary<LinePiece> = fc
  .tuple(points, points)
  .filter(([from, to]) => Math.hypot(from.x - to.x, from.y - to.y) > 0.01)
  .map(([from, to]) => ({ kind: 'line', from, to }));

export const arcPieces: fc.Arbitrary<ArcPiece> = fc
  .tuple(points, between(0.05, 20), between(-4, 4), fc.oneof(between(0.01, 6.2), between(-6.2, -0.01)))
  .map(([centre, radius, start, turn]) => ({ kind: 'arc', centre, radius, start, turn }));

/** Inside one arch, epicycloid or hypocycloid, either way, with an offset or none. */
export const cycloidPieces: fc.Arbitrary<CycloidPiece> = fc
  .record({
    fixed: between(2, 20),
    ratio: fc.oneof(between(0.03, 0.8), between(-0.9, -0.05)),
    cusp: between(-3, 3),
    sense: fc.constantFrom(1 as const, -1 as const),
    offset: fc.oneof(fc.constant(0), between(-2, 2)),
    ends: fc.tuple(between(0, 1), between(0, 1)),
  })
  .filter(({ ends }) => Math.abs(ends[0] - ends[1]) > 0.02)
  .map(({ fixed, ratio, cusp, sense, offset, ends }) => {
    const rolling = fixed * ratio;
    const arch = 2 * Math.PI * Math.abs(ratio);
    return {
      kind: 'cycloid' as const,
      fixed,
      rolling,
      cusp,
      sense,
      offset,
      from: ends[0] * arch,
      to: ends[1] * arch,
    };
  });

export const pieces: fc.Arbitrary<Piece> = fc.oneof(linePieces, arcPieces, cycloidPieces);
