/** All metal that should go is turned to chips, by brute force on a raster: holes, bays, windows, the mouths of discs. */
import { describe, expect, it } from 'vitest';
import { nearestOnChain } from '../../src/geometry/nearest-on-piece.ts';
import { pointInLoop } from '../../src/geometry/point-in-loop.ts';
import { turnChain } from '../../src/geometry/change-piece.ts';
import { endOf, startOf } from '../../src/geometry/on-piece.ts';
import type { Loop } from '../../src/geometry/piece.ts';
import { norm, ORIGIN } from '../../src/geometry/point.ts';
import { pinion } from '../tooth/proportions.ts';
import { cutter, disc, inPass, makeCase, movesOf, planOf, pointsAlong, type Wanted } from './make-job.ts';
import { distanceTo, flatAt, planPiece, raster } from './swept.ts';

describe.each<[string, Wanted]>([
  ['4 mm bore, 1 mm cutter', {}],
  ['1.2 mm bore, 1 mm cutter', { bore: 1.2 }],
  ['6.5 mm bore, 0.5 mm cutter', { bore: 6.5, cuts: { bore: { cutter: cutter(2, 0.5), leave: 0.1 } } }],
  ['a hole of 3 mm that is there', { setup: { bored: 3 } }],
  ['conventional', { cuts: { climb: false } }],
])('bore: %s', (_, wanted) => {
  const made = makeCase({ ...wanted, order: ['bore'] });
  const { job } = made;
  const moves = movesOf(planOf(made));
  const r = job.cuts.bore.cutter.diameter / 2;
  const wall = (job.wheel.bore - job.cuts.bore.leave) / 2;
  const bottom = job.setup.plateZ - job.cuts.below;

  it('leaves no core', () => {
    const pieces = flatAt(inPass(moves, 'bore'), bottom).map(planPiece);
    const hole = raster({ x: [-wall, wall], y: [-wall, wall] }, 0.05).filter(
      (point) => norm(point) < wall - 0.1 && norm(point) > job.setup.bored / 2,
    );
    expect(hole.length).toBeGreaterThan(20);
    expect(Math.max(...hole.map((point) => distanceTo(pieces, point)))).toBeLessThanOrEqual(r);
  });

  it('finishes the wall to size: the path lies one cutter radius inside it, and nothing goes beyond', () => {
    const finishing = flatAt(inPass(moves, 'bore finishing'), bottom);
    const widest = Math.max(...finishing.map(({ step }) => norm(step.to)));
    expect(widest).toBeCloseTo(wall - r, 9);
    for (const { step } of inPass(moves, 'bore')) {
      expect(norm(step.to) + r).toBeLessThan(wall);
    }
  });
});

describe.each<[string, Wanted]>([
  ['five windows', {}],
  ['three windows', { crossings: { arms: 3, armAtHub: 2, armAtRim: 2, rim: 1.8, hub: 9, corner: 0.6 } }],
  [
    'eight windows to a point',
    { crossings: { arms: 8, armAtHub: 1.6, armAtRim: 1.2, rim: 1.8, hub: 6, corner: 0.55 } },
  ],
  ['a small cutter', { cuts: { crossings: { cutter: cutter(2, 0.6) } } }],
  ['conventional', { cuts: { climb: false } }],
  [
    'sides of arms that taper to a narrow wedge',
    { crossings: { arms: 6, armAtHub: 4, armAtRim: 1.2, rim: 1.8, hub: 9, corner: 0.6 } },
  ],
  [
    'four wide windows and a slender cutter: many rings',
    {
      crossings: { arms: 4, armAtHub: 2, armAtRim: 2, rim: 1.8, hub: 7, corner: 1.2 },
      cuts: { crossings: { cutter: cutter(2, 0.7) } },
    },
  ],
])('crossings: %s', (_, wanted) => {
  const made = makeCase({ ...wanted, order: ['crossings'] });
  const { job } = made;
  const window = made.crossings!.window;
  const moves = movesOf(planOf(made));
  const r = job.cuts.crossings.cutter.diameter / 2;
  const bottom = job.setup.plateZ - job.cuts.below;
  const outer = made.crossings!.windowOuter;
  const inside = raster({ x: [0, outer], y: [-1, outer] }, 0.12).filter(
    (point) => pointInLoop(window, point) && (nearestOnChain(window, point)?.distance ?? 0) > 1e-6,
  );

  it('turns the whole window to chips, at the first level and the last', () => {
    expect(inside.length).toBeGreaterThan(100);
    const cuts = inPass(moves, 'crossing 1');
    const finish = inPass(moves, 'crossing 1 finishing').map(planPiece);
    const depths = cuts.map(({ belongs }) => belongs!.depth!);
    for (const z of [Math.max(...depths), bottom]) {
      const pieces = [...flatAt(cuts, z).map(planPiece), ...finish];
      const missed = inside.filter((point) => distanceTo(pieces, point) > r + 1e-6);
      // What a round cutter cannot reach lies in corners as sharp as itself only: the corners here are rounder.
      expect(missed).toEqual([]);
    }
  });

  it('never cuts beyond the window', () => {
    const cuts = [...inPass(moves, 'crossing 1'), ...inPass(moves, 'crossing 1 finishing')];
    for (const move of cuts) {
      const points = move.step.kind === 'arc' ? [move.step.to] : [move.step.to, move.from];
      for (const point of points) {
        expect(nearestOnChain(window, point)!.distance).toBeGreaterThan(r - 1e-6);
        expect(pointInLoop(window, point)).toBe(true);
      }
    }
    expect(bottom).toBeLessThan(job.setup.plateZ);
  });
});

describe.each<[string, Wanted]>([
  [
    '30 teeth, module 1, cutter 0.6',
    {
      wheel: { teeth: 30, module: 1, mate: pinion(10) },
      cuts: { roughing: { cutter: cutter(2, 0.6), allowance: 0.03 }, finishing: { cutter: cutter(2, 0.6) } },
    },
  ],
  [
    '30 teeth, module 1, cutter 1.0',
    {
      wheel: { teeth: 30, module: 1, mate: pinion(10) },
      cuts: { roughing: { cutter: cutter(1, 1), allowance: 0.05 }, finishing: { cutter: cutter(1, 1) } },
    },
  ],
  ['60 teeth, module 0.5, cutter 0.5', {}],
  [
    '60 teeth, module 0.5, cutter 0.4',
    {
      cuts: { roughing: { cutter: cutter(3, 0.4), allowance: 0.02 }, finishing: { cutter: cutter(3, 0.4) } },
    },
  ],
  [
    '35 teeth, module 1.44, cutter 0.53: many dips',
    {
      wheel: { teeth: 35, module: 1.44, mate: pinion(6) },
      cuts: {
        roughing: { cutter: cutter(2, 0.53), allowance: 0.03 },
        finishing: { cutter: cutter(2, 0.53) },
      },
    },
  ],
])('disc: %s', (_, wanted) => {
  const made = makeCase({ ...wanted, crossings: null, setup: disc(wanted.wheel), order: ['roughing'] });
  const { form, job } = made;
  const moves = movesOf(planOf(made));
  const r = job.cuts.roughing.cutter.diameter / 2;
  const bottom = job.setup.plateZ - job.cuts.below;
  const pitch = form.sector.map(({ piece }) => piece);
  // The teeth about the space after tooth 1, and as a loop through the axis: what lies further away says nothing about it.
  const near = [-2, -1, 0, 1, 2].flatMap((k) => turnChain(pitch, (2 * Math.PI * k) / form.proportions.teeth));
  const outline: Loop = [
    { kind: 'line', from: ORIGIN, to: startOf(near[0]!) },
    ...near,
    { kind: 'line', from: endOf(near.at(-1)!), to: ORIGIN },
  ];
  const half = Math.PI / form.proportions.teeth;
  // The space after tooth 1, from root to tip, well inside the two teeth beside it.
  const space = raster({ x: [-2.5, 2.5], y: [-4, 0.2] }, 0.02)
    .map(({ x, y }) => ({ along: form.outsideRadius + y, across: x }))
    .map(({ along, across }) => ({
      x: along * Math.cos(half) - across * Math.sin(half),
      y: along * Math.sin(half) + across * Math.cos(half),
    }))
    .filter((point) => {
      const seen = Math.atan2(point.y, point.x);
      return norm(point) < form.outsideRadius && norm(point) > form.rootRadius && seen > 0 && seen < 2 * half;
    })
    .filter((point) => !pointInLoop(outline, point));

  const cutBy = (passes: readonly string[]): ((point: { x: number; y: number }) => boolean) => {
    const pieces = passes
      .flatMap((pass) => flatAt(inPass(moves, pass), bottom))
      .map(planPiece)
      .filter(
        (piece) =>
          distanceTo([piece], {
            x: form.outsideRadius * Math.cos(half),
            y: form.outsideRadius * Math.sin(half),
          }) < 4,
      );
    return (point) => distanceTo(pieces, point) <= r;
  };

  it('leaves no loose pillar in a mouth: what roughing leaves lies on a tooth or in the corners of the root', () => {
    expect(space.length).toBeGreaterThan(100);
    const cut = cutBy(['mouths', 'roughing']);
    const loose = space
      .filter((point) => !cut(point))
      .filter((point) => nearestOnChain(near, point)!.distance > 1.2 * r);
    expect(loose).toEqual([]);
  });

  it('keeps the allowance in the mouths', () => {
    const kept = r + job.cuts.roughing.allowance;
    const pass = inPass(moves, 'mouths').filter(({ belongs }) => belongs?.tooth === 1 && belongs.lap === 1);
    for (const point of pass.flatMap((move) => pointsAlong(move, 0.05))) {
      expect(pointInLoop(outline, point)).toBe(false);
      expect(nearestOnChain(near, point)!.distance).toBeGreaterThan(kept - 0.0003);
    }
  });

  it('comes down beside the disc in air only', () => {
    const beside = [...inPass(moves, 'mouths'), ...inPass(moves, 'roughing')];
    const down = beside.filter(
      ({ from, step }) => step.to.z < from.z && from.x === step.to.x && from.y === step.to.y,
    );
    expect(down.length).toBeGreaterThan(0);
    expect(Math.min(...down.map(({ step }) => norm(step.to)))).toBeGreaterThan(form.outsideRadius + r);
  });
});
