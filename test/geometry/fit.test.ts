import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { FIT_ERROR, FORM_ERROR, LINE_FIT_ERROR } from '../../src/base/tolerances.ts';
import { offsetPiece, reverseChain, reversePiece } from '../../src/geometry/change-piece.ts';
import { fitArcs } from '../../src/geometry/fit-arcs.ts';
import { fitChain } from '../../src/geometry/fit-chain.ts';
import { fitLines } from '../../src/geometry/fit-lines.ts';
import { nearestOnChain, nearestOnPiece } from '../../src/geometry/nearest-on-piece.ts';
import { offsetSector } from '../../src/geometry/offset-chain.ts';
import { endOf, headingOn, pointOn, startOf } from '../../src/geometry/on-piece.ts';
import type { Chain, CycloidPiece, Piece } from '../../src/geometry/piece.ts';
import { cross, distance, dot } from '../../src/geometry/point.ts';
import { cycloidPieces, SEED } from './random-pieces.ts';
import { THIRD_WHEEL, toothSector } from './sample-wheel.ts';

const sector = toothSector(THIRD_WHEEL);
const addendum = sector[2] as CycloidPiece;

/** Greatest distance of either from the other. */
function apart(fit: Chain, curve: Piece, steps = 60): number {
  let worst = 0;
  for (let i = 0; i <= steps; i++) {
    worst = Math.max(worst, nearestOnChain(fit, pointOn(curve, i / steps))?.distance ?? Infinity);
    for (const piece of fit) {
      worst = Math.max(worst, nearestOnPiece(curve, pointOn(piece, i / steps)).distance);
    }
  }
  return worst;
}

/** The greatest break of heading from piece to piece, radians; the gap counts as a break. */
function greatestBreak(chain: Chain): number {
  let worst = 0;
  chain.forEach((piece, i) => {
    const next = chain[i + 1];
    if (next !== undefined) {
      const turned = Math.atan2(
        cross(headingOn(piece, 1), headingOn(next, 0)),
        dot(headingOn(piece, 1), headingOn(next, 0)),
      );
      worst = Math.max(worst, Math.abs(turned), distance(endOf(piece), startOf(next)));
    }
  });
  return worst;
}

describe('arcs for an addendum', () => {
  it.each([0, 0.1, 0.25, 0.5, -0.001])(
    'offset by %f mm: within the tolerance, tangent, on both ends',
    (by) => {
      for (const tolerance of [0.0001, FIT_ERROR, FORM_ERROR, 0.005]) {
        for (const span of [addendum, reversePiece(addendum)]) {
          const curve = offsetPiece(span, span === addendum ? by : -by) as CycloidPiece;
          const arcs = fitArcs(curve, tolerance);
          expect(apart(arcs, curve)).toBeLessThanOrEqual(tolerance * 1.000001);
          expect(distance(startOf(arcs[0] as Piece), startOf(curve))).toBeLessThan(1e-11);
          expect(distance(endOf(arcs.at(-1) as Piece), endOf(curve))).toBeLessThan(1e-11);
          expect(dot(headingOn(arcs[0] as Piece, 0), headingOn(curve, 0))).toBeCloseTo(1, 12);
          expect(dot(headingOn(arcs.at(-1) as Piece, 1), headingOn(curve, 1))).toBeCloseTo(1, 12);
          if (by >= 0) {
            expect(greatestBreak(arcs)).toBeLessThan(1e-9);
          }
        }
      }
    },
  );

  it('takes no more than six at 1 um with a 0.5 mm cutter, as biarcs would', () => {
    const curve = offsetPiece(addendum, 0.25) as CycloidPiece;
    expect(fitArcs(curve, FORM_ERROR).length).toBeLessThanOrEqual(6);
  });

  it('errs to both sides alike', () => {
    const curve = offsetPiece(addendum, 0.25) as CycloidPiece;
    const [out, inside] = [1, -1].map((side) =>
      Math.max(
        ...fitArcs(curve, FORM_ERROR).flatMap((arc) =>
          Array.from({ length: 101 }, (_, i) => {
            const point = pointOn(arc, i / 100);
            const { u, point: foot } = nearestOnPiece(curve, point);
            const heading = headingOn(curve, u);
            return side * cross(heading, { x: point.x - foot.x, y: point.y - foot.y });
          }),
        ),
      ),
    ) as [number, number];
    expect(out / inside).toBeGreaterThan(0.4);
    expect(out / inside).toBeLessThan(2.5);
  });
});

it('arcs keep the tolerance on any span of any cycloid, cusps and all', () => {
  fc.assert(
    fc.property(cycloidPieces, fc.constantFrom(0.0006, 0.003), (piece, tolerance) => {
      const arcs = fitArcs(piece, tolerance);
      expect(apart(arcs, piece, 20)).toBeLessThanOrEqual(tolerance * 1.0001);
      expect(arcs.length).toBeLessThan(150);
    }),
    { seed: SEED, numRuns: 80, endOnFailure: true },
  );
});

it('a point of a circle that rolls in one of twice its size runs straight, and is fitted by a line', () => {
  const straight: CycloidPiece = { ...addendum, fixed: 4, rolling: -2, from: 0, to: 1 };
  expect(fitArcs(straight, FIT_ERROR).map(({ kind }) => kind)).toEqual(['line']);
});

function pathOf(by: number): Chain {
  const offset = offsetSector(sector, THIRD_WHEEL.teeth, by);
  return offset.ok ? offset.value.chain.map(({ piece }) => piece) : [];
}

describe('a whole pitch of the path', () => {
  it.each([0.1, 0.2, 0.25, 0.3, 0.37])('cutter radius %f: at most 16 blocks of lines and arcs', (by) => {
    const path = fitChain(pathOf(by), FIT_ERROR);
    expect(path.length).toBeLessThanOrEqual(16);
    // Only root and flank meet at a corner.
    const kinks = path.filter((piece, i) => i > 0 && greatestBreak([path[i - 1] as Piece, piece]) > 1e-6);
    expect(kinks).toHaveLength(2);
  });

  it('cutter radius 0.25: at most 40 lines', () => {
    expect(fitLines(pathOf(0.25), LINE_FIT_ERROR, 'right').length).toBeLessThanOrEqual(40);
  });
});

describe('lines', () => {
  it.each([0.1, 0.25, 0.38])(
    'cutter radius %f: never too near the tooth, never further than the tolerance',
    (by) => {
      for (const [path, away] of [
        [pathOf(by), 'right'],
        [reverseChain(pathOf(by)), 'left'],
      ] as const) {
        for (const tolerance of [0.0002, LINE_FIT_ERROR, 0.01]) {
          const lines = fitLines(path, tolerance, away);
          let [least, most] = [Infinity, 0];
          for (const line of lines) {
            for (let i = 0; i <= 40; i++) {
              const off = (nearestOnChain(sector, pointOn(line, i / 40))?.distance ?? 0) - by;
              [least, most] = [Math.min(least, off), Math.max(most, off)];
            }
          }
          expect(least).toBeGreaterThan(-2e-9);
          expect(most).toBeLessThanOrEqual(tolerance * 1.000001);
          expect(distance(startOf(lines[0] as Piece), startOf(path[0] as Piece))).toBe(0);
          expect(distance(endOf(lines.at(-1) as Piece), endOf(path.at(-1) as Piece))).toBeLessThan(1e-12);
        }
      }
    },
  );

  it('on a hollow arc are chords, on a bulging one tangents: a window ring stays out of the metal', () => {
    const arc: Piece = { kind: 'arc', centre: { x: 0, y: 0 }, radius: 5, start: 0, turn: 1 };
    const radii = (away: 'left' | 'right'): number[] =>
      fitLines([arc], 0.01, away).flatMap((line) =>
        [0, 0.25, 0.5, 0.75, 1].map((u) => Math.hypot(...Object.values(pointOn(line, u)))),
      );
    expect(Math.min(...radii('right'))).toBeGreaterThan(5 - 1e-12);
    expect(Math.max(...radii('right'))).toBeLessThanOrEqual(5.01);
    expect(Math.max(...radii('left'))).toBeLessThan(5 + 1e-12);
    expect(Math.min(...radii('left'))).toBeGreaterThanOrEqual(4.99);
  });

  it('leave straight pieces as they are and nothing of nothing', () => {
    const line: Piece = { kind: 'line', from: { x: 0, y: 0 }, to: { x: 1, y: 0 } };
    expect(fitLines([line], 0.001, 'left')).toEqual([line]);
    expect(fitLines([], 0.001, 'left')).toEqual([]);
  });
});
