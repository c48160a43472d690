import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CLIP_AGREEMENT } from '../../src/base/tolerances.ts';
import { areaOfChain } from '../../src/geometry/area-of-chain.ts';
import { mirrorPiece, repeatRound, reverseChain, turnPiece } from '../../src/geometry/change-piece.ts';
import { disagreement } from '../../src/geometry/agree.ts';
import { nearestOnChain } from '../../src/geometry/nearest-on-piece.ts';
import { offsetLoop, offsetSector, type OffsetPiece } from '../../src/geometry/offset-chain.ts';
import { endOf, pointOn, startOf } from '../../src/geometry/on-piece.ts';
import type { Chain, Loop } from '../../src/geometry/piece.ts';
import { distance, norm, polar, turnPoint, type Point } from '../../src/geometry/point.ts';
import { SEED } from './random-pieces.ts';
import { THIRD_WHEEL, toothSector } from './sample-wheel.ts';

const line = (from: Point, to: Point): Chain[number] => ({ kind: 'line', from, to });

function sectorOffset(sector: Chain, count: number, by: number): readonly OffsetPiece[] {
  const offset = offsetSector(sector, count, by);
  expect(offset.problems).toEqual([]);
  return offset.ok ? offset.value.chain : [];
}

function loopOffset(loop: Loop, by: number): readonly Loop[] {
  const offset = offsetLoop(loop, by);
  expect(offset.problems).toEqual([]);
  return offset.ok ? offset.value : [];
}

/** Every point lies the distance from the outline, none nearer; pieces join. */
function expectOffset(chain: Chain, outline: Chain, by: number): void {
  chain.forEach((piece, i) => {
    for (let k = 0; k <= 10; k++) {
      const off = nearestOnChain(outline, pointOn(piece, k / 10))?.distance ?? 0;
      expect(Math.abs(off - Math.abs(by))).toBeLessThan(2e-9);
    }
    const next = chain[i + 1];
    if (next !== undefined) {
      expect(distance(endOf(piece), startOf(next))).toBeLessThan(5e-9);
    }
  });
}

/** Cut at the rays of the pitch, so that turned copies go on from one another. */
function expectOnePitch(chain: Chain, count: number): void {
  const [first, last] = [chain[0], chain.at(-1)] as [Chain[number], Chain[number]];
  const start = startOf(first);
  expect(Math.atan2(start.y, start.x)).toBeCloseTo(-Math.PI / count, 8);
  expect(distance(turnPoint(start, (2 * Math.PI) / count), endOf(last))).toBeLessThan(5e-9);
}

const pitchOf = (found: readonly OffsetPiece[]): Chain => found.map(({ piece }) => piece);

describe('a 60-tooth wheel, module 0.5', () => {
  const sector = toothSector(THIRD_WHEEL);
  const around = repeatRound(sector, 60);
  const near = [
    ...sector,
    ...sector.flatMap((piece) => [-2, -1, 1, 2].map((k) => turnPiece(piece, (k * Math.PI) / 30))),
  ];

  it.each([0.05, 0.25, 0.37, 0.39, 0.42, 0.6, 1, 3, -0.05, -0.2, -0.45, -2])('at %f mm', (by) => {
    const chain = pitchOf(sectorOffset(sector, 60, by));
    expectOffset(chain, Math.abs(by) > 1 ? around : near, by);
    expectOnePitch(chain, 60);
  });

  it('a cutter that fits leaves nine pieces, each told where it comes from', () => {
    const found = sectorOffset(sector, 60, 0.25);
    expect(found.map(({ piece }) => piece.kind)).toEqual([
      'arc',
      'line',
      'cycloid',
      'arc',
      'arc',
      'arc',
      'cycloid',
      'line',
      'arc',
    ]);
    expect(found.map(({ source }) => source)).toEqual([0, 1, 2, 'corner', 3, 'corner', 4, 5, 6]);
    expect(found.map(({ between }) => between)[3]).toEqual([2, 3]);
    expect(found.map(({ between }) => between)[5]).toEqual([3, 4]);
    const flank = found[1]?.part ?? [1, 0];
    const other = found[7]?.part ?? [1, 0];
    expect(flank[0] + other[1]).toBeCloseTo(1, 12);
  });

  it('root and flank meet where sin(angle) = d / (root + d) beside the flank [triangle of flank and cutter centre]', () => {
    const [root] = pitchOf(sectorOffset(sector, 60, 0.25));
    const end = endOf(root as Chain[number]);
    const rootRadius = 15 - Math.PI / 4;
    expect(norm(end)).toBeCloseTo(rootRadius + 0.25, 10);
    expect(Math.atan2(end.y, end.x)).toBeCloseTo(-Math.PI / 120 - Math.asin(0.25 / (rootRadius + 0.25)), 10);
  });

  it('is its own mirror image', () => {
    const chain = pitchOf(sectorOffset(sector, 60, 0.25));
    const mirrored = reverseChain(chain.map(mirrorPiece));
    chain.forEach((piece, i) => {
      expect(distance(pointOn(piece, 0.3), pointOn(mirrored[i] as Chain[number], 0.3))).toBeLessThan(1e-9);
    });
  });

  it('the whole outline offset as a loop says the same as its pitch turned round', () => {
    const few = { ...THIRD_WHEEL, teeth: 14 };
    const pitch = toothSector(few);
    for (const by of [0.2, 0.5, -0.15]) {
      const [loop] = loopOffset(repeatRound(pitch, 14), by) as [Loop];
      const turned = repeatRound(pitchOf(sectorOffset(pitch, 14, by)), 14);
      expect(areaOfChain(loop)).toBeCloseTo(areaOfChain(turned), 9);
    }
  });

  it('nothing is left of a wheel that shrinks by more than its radius', () => {
    expect(sectorOffset(sector, 60, -16)).toEqual([]);
  });

  it('a distance of nothing is the outline itself', () => {
    expect(pitchOf(sectorOffset(sector, 60, 0))).toEqual(sector);
  });
});

it('a pointed tooth is rounded on its axis by one arc', () => {
  const sector = toothSector({ ...THIRD_WHEEL, height: 1 });
  const found = sectorOffset(sector, 60, 0.25);
  expect(found.map(({ source }) => source)).toEqual([0, 1, 2, 'corner', 3, 4, 5]);
  expect(found[3]?.part).toEqual([0, 1]);
  expectOffset(pitchOf(found), sector, 0.25);
});

describe('a sawtooth, which is no mirror image', () => {
  const count = 12;
  const sector: Chain = [
    line(polar(10, -Math.PI / count), polar(13, -0.25)),
    line(polar(13, -0.25), polar(10, Math.PI / count)),
  ];
  it.each([0.1, 0.5, 1, 3, 20, -0.1, -0.5, -1, -3])('at %f mm', (by) => {
    const chain = pitchOf(sectorOffset(sector, count, by));
    expectOffset(chain, repeatRound(sector, count), by);
    expectOnePitch(chain, count);
  });
});

it('spaces that are wider below than at their mouth are left as pockets', () => {
  const count = 8;
  const [half, bottom, mouth] = [0.3, polar(8, 0), polar(12, 0)];
  const space: Chain = [
    line(polar(12, -Math.PI / count), { x: mouth.x, y: -half }),
    line({ x: mouth.x, y: -half }, { x: bottom.x, y: -2 }),
    line({ x: bottom.x, y: -2 }, { x: bottom.x, y: 2 }),
    line({ x: bottom.x, y: 2 }, { x: mouth.x, y: half }),
    line({ x: mouth.x, y: half }, polar(12, Math.PI / count)),
  ];
  const offset = offsetSector(space, count, 0.4);
  expect(offset.problems).toEqual([]);
  expect(offset.ok && offset.value.pockets).toBe(true);
  expectOffset(offset.ok ? pitchOf(offset.value.chain) : [], space, 0.4);
});

describe('loops', () => {
  const square: Loop = [
    line({ x: 0, y: 0 }, { x: 4, y: 0 }),
    line({ x: 4, y: 0 }, { x: 4, y: 4 }),
    line({ x: 4, y: 4 }, { x: 0, y: 4 }),
    line({ x: 0, y: 4 }, { x: 0, y: 0 }),
  ];

  it('outside, a square has area a2 + 4ad + pi d2 to the last digits [Steiner formula]', () => {
    const [loop] = loopOffset(square, 0.7) as [Loop];
    expect(loop).toHaveLength(8);
    expect(areaOfChain(loop)).toBeCloseTo(16 + 4 * 4 * 0.7 + Math.PI * 0.49, 10);
  });

  it('inside, it is a smaller square; past its middle it is nothing', () => {
    const [loop] = loopOffset(square, -0.7) as [Loop];
    expect(areaOfChain(loop)).toBeCloseTo(2.6 * 2.6, 10);
    expect(loopOffset(square, -2.1)).toEqual([]);
  });

  it('travelled the other way, right is inside', () => {
    const [loop] = loopOffset(reverseChain(square), 0.7) as [Loop];
    expect(areaOfChain(loop)).toBeCloseTo(-2.6 * 2.6, 10);
  });

  it('a fillet as small as the cutter comes down to a corner, a smaller one is not followed', () => {
    const filleted = (r: number): Loop => [
      line({ x: r, y: 0 }, { x: 4, y: 0 }),
      line({ x: 4, y: 0 }, { x: 4, y: 4 }),
      line({ x: 4, y: 4 }, { x: 0, y: 4 }),
      line({ x: 0, y: 4 }, { x: 0, y: r }),
      { kind: 'arc', centre: { x: r, y: r }, radius: r, start: Math.PI, turn: Math.PI / 2 },
    ];
    for (const [r, pieces] of [
      [0.5, 4],
      [0.4, 4],
      [0.6, 5],
    ] as const) {
      const [loop] = loopOffset(filleted(r), -0.5) as [Loop];
      expect(loop).toHaveLength(pieces);
      expect(areaOfChain(loop)).toBeCloseTo(9 - (1 - Math.PI / 4) * Math.max(r - 0.5, 0) ** 2, 9);
    }
  });

  it('a waist narrower than the cutter parts the loop in two', () => {
    const dumbbell: Loop = [
      [0, 0],
      [3, 0],
      [3, 1.2],
      [5, 1.2],
      [5, 0],
      [8, 0],
      [8, 3],
      [5, 3],
      [5, 1.8],
      [3, 1.8],
      [3, 3],
      [0, 3],
    ].map(([x, y], i, all) => {
      const [nx, ny] = all[(i + 1) % all.length] as [number, number];
      return line({ x: x as number, y: y as number }, { x: nx, y: ny });
    });
    const loops = loopOffset(dumbbell, -0.4);
    expect(loops).toHaveLength(2);
    for (const loop of loops) {
      expectOffset(loop, dumbbell, -0.4);
    }
    expect(loopOffset(dumbbell, -0.2)).toHaveLength(1);
  });
});

it('holds for wheels of any size and any cutter: a random pitch is offset exactly or refused, never wrong', () => {
  const shapes = fc.tuple(
    fc.integer({ min: 6, max: 400 }),
    fc.double({ min: 0.1, max: 2, noNaN: true }),
    fc.integer({ min: 6, max: 20 }),
    fc.double({ min: 0.5, max: 1, noNaN: true }),
    fc.double({ min: 0.4, max: 0.6, noNaN: true }),
    fc.double({ min: 0.02, max: 1.5, noNaN: true }),
    fc.constantFrom(1, 1, 1, -0.3),
  );
  let made = 0;
  fc.assert(
    fc.property(shapes, ([teeth, module, leaves, height, tooth, cutter, side]) => {
      fc.pre(leaves <= teeth);
      const sector = toothSector({ teeth, module, leaves, height, tooth, dedendum: Math.PI / 2 });
      const by = side * cutter * module;
      const offset = offsetSector(sector, teeth, by);
      expect(offset.problems).toEqual([]);
      if (offset.ok && offset.value.chain.length > 0) {
        const chain = pitchOf(offset.value.chain);
        const around = [-2, -1, 0, 1, 2].flatMap((k) =>
          sector.map((piece) => turnPiece(piece, (2 * k * Math.PI) / teeth)),
        );
        expectOffset(chain, around, by);
        expectOnePitch(chain, teeth);
        made++;
      }
    }),
    { seed: SEED, numRuns: 120, endOnFailure: true },
  );
  expect(made).toBeGreaterThan(100);
});

it('a polygon and a chain that differ are told apart, both ways', () => {
  const chain: Chain = [line({ x: 0, y: 0 }, { x: 2, y: 0 }), line({ x: 2, y: 0 }, { x: 2, y: 2 })];
  const ring = [
    { x: 0, y: 0 },
    { x: 2, y: 0 },
    { x: 2, y: 2 },
    { x: 0, y: 2 },
  ];
  const agreed = { corners: ring.slice(0, 3), rings: [ring], chains: [chain] };
  expect(disagreement(agreed).worst).toBe(0);
  const off = { x: 1, y: 4 * CLIP_AGREEMENT };
  expect(disagreement({ ...agreed, corners: [off] }).worst).toBeCloseTo(4 * CLIP_AGREEMENT, 12);
  const longer: Chain = [...chain, line({ x: 2, y: 2 }, { x: 2, y: 2.1 })];
  expect(disagreement({ ...agreed, chains: [longer] }).worst).toBeCloseTo(0.1, 12);
});
