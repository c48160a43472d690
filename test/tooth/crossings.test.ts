import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { endOf, headingOn, pointOn, startOf } from '../../src/geometry/on-piece.ts';
import { cross, distance, dot, norm, type Point } from '../../src/geometry/point.ts';
import { crossings } from '../../src/tooth/crossings.ts';
import type { CrossingProportions, Crossings } from '../../src/tooth/wheel.ts';
import { value } from './proportions.ts';

const ROOT = 14.2146;

function crossed(change: Partial<CrossingProportions> = {}): CrossingProportions {
  return { arms: 5, armAtHub: 2.4, armAtRim: 2.4, rim: 1.8, hub: 9, corner: 1.2, ...change };
}

function anyCrossings(): fc.Arbitrary<{ p: CrossingProportions; root: number; made: Crossings }> {
  const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  return fc
    .record({
      arms: fc.integer({ min: 3, max: 8 }),
      root: between(5, 80),
      rim: between(0.05, 0.2),
      hub: between(0.2, 1),
      armAtHub: between(0.05, 0.3),
      armAtRim: between(0.05, 0.3),
      corner: between(0.01, 0.1),
    })
    .map(({ root, arms, ...shares }) => {
      const scaled = Object.fromEntries(Object.entries(shares).map(([key, share]) => [key, share * root]));
      const p = { arms, ...scaled } as unknown as CrossingProportions;
      return { p, root, made: crossings(p, root) };
    })
    .filter(({ made }) => made.ok)
    .map(({ p, root, made }) => ({ p, root, made: value(made) }));
}

function pointsAlong({ window }: Crossings, each: number): Point[] {
  return window.flatMap((piece) => Array.from({ length: each }, (_, i) => pointOn(piece, i / each)));
}

describe('a window of five even arms', () => {
  const made = value(crossings(crossed(), ROOT));

  it('is two lines, two arcs about the axis and four corners', () => {
    expect(made.window.map(({ kind }) => kind).join(' ')).toBe('line arc arc arc line arc arc arc');
    const radii = made.window.map((piece) => (piece.kind === 'arc' ? piece.radius : 0));
    expect(radii).toEqual([0, 1.2, ROOT - 1.8, 1.2, 0, 1.2, 4.5, 1.2]);
    expect(made).toMatchObject({ count: 5, hubRadius: 4.5, windowInner: 4.5, windowOuter: ROOT - 1.8 });
  });

  it('leaves arm 1 centred on +X and 2.4 wide all along', () => {
    const side = made.window[0]!;
    expect(startOf(side).y).toBeCloseTo(1.2, 12);
    expect(endOf(side).y).toBeCloseTo(1.2, 12);
    expect(endOf(side).x).toBeGreaterThan(startOf(side).x);
  });
});

describe('any window', () => {
  it('is a closed loop, tangent all round, counter-clockwise', () => {
    fc.assert(
      fc.property(anyCrossings(), ({ root, made }) => {
        let turned = 0;
        made.window.forEach((piece, i) => {
          const next = made.window[(i + 1) % made.window.length]!;
          expect(distance(endOf(piece), startOf(next))).toBeLessThan(1e-12 * Math.max(1, root));
          expect(Math.abs(cross(headingOn(piece, 1), headingOn(next, 0)))).toBeLessThan(1e-6);
          expect(dot(headingOn(piece, 1), headingOn(next, 0))).toBeGreaterThan(0);
          turned += piece.kind === 'arc' ? piece.turn : 0;
        });
        expect(turned).toBeCloseTo(2 * Math.PI, 9);
      }),
      { numRuns: 300, seed: 31 },
    );
  });

  it('keeps off hub, rim and arms, and touches each', () => {
    fc.assert(
      fc.property(anyCrossings(), ({ p, root, made }) => {
        const points = pointsAlong(made, 40);
        const radii = points.map(norm);
        const slack = 1e-9 * root;
        expect(Math.min(...radii)).toBeGreaterThan(p.hub / 2 - slack);
        expect(Math.max(...radii)).toBeLessThan(root - p.rim + slack);
        expect(Math.max(...radii)).toBeCloseTo(root - p.rim, 9);
        // The side of arm 1 runs from half its width on the hub circle to half its width on the rim circle.
        const end = (width: number, r: number) => ({
          x: Math.sqrt(r * r - (width * width) / 4),
          y: width / 2,
        });
        const [a, b] = [end(p.armAtHub, p.hub / 2), end(p.armAtRim, root - p.rim)];
        const offs = points.map((point) =>
          cross({ x: b.x - a.x, y: b.y - a.y }, { x: point.x - a.x, y: point.y - a.y }),
        );
        expect(Math.min(...offs)).toBeGreaterThan(-slack * root);
        expect(Math.min(...offs)).toBeLessThan(slack * root);
      }),
      { numRuns: 200, seed: 32 },
    );
  });

  it('is its own mirror image about the middle between two arms', () => {
    fc.assert(
      fc.property(anyCrossings(), ({ p, root, made }) => {
        const middle = (2 * Math.PI) / p.arms;
        const [side, , , , other] = made.window;
        const here = pointOn(side!, 0.3);
        const there = pointOn(other!, 0.7);
        const mirrored = {
          x: here.x * Math.cos(middle) + here.y * Math.sin(middle),
          y: here.x * Math.sin(middle) - here.y * Math.cos(middle),
        };
        expect(distance(mirrored, there)).toBeLessThan(1e-9 * root);
      }),
      { numRuns: 100, seed: 33 },
    );
  });
});

it('has three sides where the arms meet before they reach the hub', () => {
  const made = value(crossings(crossed({ arms: 8, armAtHub: 4.4 }), ROOT));
  expect(made.window.map(({ kind }) => kind).join(' ')).toBe('line arc arc arc line arc');
  expect(made.windowInner).toBeGreaterThan(4.5);
  expect(Math.min(...pointsAlong(made, 200).map(norm))).toBeCloseTo(made.windowInner, 4);
});

it('tapers from hub to rim', () => {
  const made = value(crossings(crossed({ armAtHub: 3, armAtRim: 2.2 }), ROOT));
  const side = made.window[0]!;
  expect(startOf(side).y).toBeGreaterThan(endOf(side).y);
});

describe('what cannot be crossed out', () => {
  it.each([
    [{ arms: 2 }, 'arms', '2 arms'],
    [{ arms: 9 }, 'arms', '9 arms'],
    [{ rim: 0 }, 'rim', '0 mm'],
    [{ corner: 0 }, 'corner', '0 mm'],
    [{ armAtRim: -1 }, 'arm', '-1 mm'],
    [{ hub: 25 }, 'hub', '12.5 mm'],
    [{ armAtHub: 9.5 }, 'arm', '9 mm'],
    [{ arms: 8, armAtRim: 9.6 }, 'arm', '9.5017 mm'],
    [{ corner: 4 }, 'corner', 'the largest that do are'],
  ] as const)('%j', (change, key, words) => {
    const outcome = crossings(crossed(change), ROOT);
    expect(outcome.ok).toBe(false);
    expect(outcome.problems[0]).toMatchObject({
      code: 'tooth.crossings',
      at: { path: ['wheel', 'crossings', key] },
    });
    expect(outcome.problems[0]?.message).toContain(words);
  });

  it('names the largest corner that does fit, to the last figure', () => {
    const message = crossings(crossed({ corner: 4 }), ROOT).problems[0]?.message ?? '';
    const largest = Number(/largest that do are ([\d.]+) mm/.exec(message)?.[1]);
    expect(crossings(crossed({ corner: largest }), ROOT).ok).toBe(true);
    expect(crossings(crossed({ corner: largest + 0.0002 }), ROOT).ok).toBe(false);
  });
});
