/** Distances to lines and arcs against dense points of the same moves, over random ones with a fixed seed. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TracedMove } from '../../src/motion/traced-move.ts';
import { extentsOf } from '../../src/prove/extents.ts';
import { pathDistance } from '../../src/prove/metal-distance.ts';
import { pathsBelow } from '../../src/prove/metal-paths.ts';
import { solidMoves } from '../../src/prove/metal-solids.ts';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const at = fc.record({ x: real(-3, 3), y: real(-3, 3) });
const POINTS = 4000;

interface Shape {
  readonly from: { readonly x: number; readonly y: number };
  readonly centre: { readonly x: number; readonly y: number };
  readonly turn: number;
  readonly straight: boolean;
}

const shapes: fc.Arbitrary<Shape> = fc.record({
  from: at,
  centre: at,
  turn: fc.oneof(real(-6.28, 6.28), fc.constantFrom(Math.PI, -Math.PI, 2 * Math.PI, -2 * Math.PI)),
  straight: fc.boolean(),
});

function pointOf({ from, centre, turn, straight }: Shape, u: number): { x: number; y: number } {
  if (straight) {
    return { x: from.x + u * (centre.x - from.x), y: from.y + u * (centre.y - from.y) };
  }
  const [dx, dy] = [from.x - centre.x, from.y - centre.y];
  const [c, s] = [Math.cos(u * turn), Math.sin(u * turn)];
  return { x: centre.x + dx * c - dy * s, y: centre.y + dx * s + dy * c };
}

function moveOf(shape: Shape, z0: number, z1: number): TracedMove {
  const end = pointOf(shape, 1);
  return {
    file: 'a',
    line: 1,
    kind: shape.straight ? 'line' : 'arc',
    from: { ...shape.from, z: z0 },
    to: { ...end, z: z1 },
    ...(shape.straight ? {} : { centre: shape.centre, turn: shape.turn }),
    feed: 100,
    cutter: 1,
    spindle: 1000,
  };
}

describe('the distance to a path [the nearest of 4000 points of it]', () => {
  it('is that of the nearest point, for the whole move and for the part below a height', () => {
    fc.assert(
      fc.property(shapes, at, real(-1, 0.99), (shape, point, z) => {
        fc.pre(Math.hypot(shape.from.x - shape.centre.x, shape.from.y - shape.centre.y) > 0.05);
        const solids = solidMoves([moveOf(shape, 1, -1)], () => 0.25);
        const share = (1 - z) / 2;
        const near = (from: number): number =>
          Math.min(
            ...Array.from({ length: POINTS + 1 }, (_, k) => {
              const { x, y } = pointOf(shape, from + ((1 - from) * k) / POINTS);
              return Math.hypot(x - point.x, y - point.y);
            }),
          );
        expect(pathDistance(pathsBelow(solids, 2, 2), 0, point.x, point.y)).toBeCloseTo(near(0), 4);
        expect(pathDistance(pathsBelow(solids, z, z), 0, point.x, point.y)).toBeCloseTo(near(share), 4);
      }),
      { seed: 7, numRuns: 150 },
    );
  });

  it('never lies outside the circle round the path by which far moves are left out', () => {
    fc.assert(
      fc.property(shapes, real(0, 1), (shape, u) => {
        const set = pathsBelow(
          solidMoves([moveOf(shape, 0, 0)], () => 0.25),
          1,
          1,
        );
        const { x, y } = pointOf(shape, u);
        expect(Math.hypot(x - set.mx[0]!, y - set.my[0]!)).toBeLessThanOrEqual(set.bound[0]! + 1e-9);
      }),
      { seed: 8, numRuns: 300 },
    );
  });
});

describe('how far moves reach', () => {
  it('holds every point of an arc, and no more [dense points]', () => {
    fc.assert(
      fc.property(shapes, (shape) => {
        const xs = Array.from({ length: POINTS + 1 }, (_, k) => pointOf(shape, k / POINTS).x);
        const { x } = extentsOf([moveOf(shape, 0, 0)]);
        expect(x[0]).toBeCloseTo(Math.min(...xs), 4);
        expect(x[1]).toBeCloseTo(Math.max(...xs), 4);
      }),
      { seed: 9, numRuns: 150 },
    );
  });
});
