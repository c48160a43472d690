/**
 * The flank's figures against what is true by construction: a path that stands d further out than the exact offset leaves d
 * everywhere, one that stands d further in cuts d deep, and one tooth that differs is found among the others.
 */
import { describe, expect, it } from 'vitest';
import type { TracedMove } from '../../src/motion/traced-move.ts';
import { toothFigures, type ToothFigures } from '../../src/prove/deviation-depths.ts';
import { REGION } from '../../src/prove/deviation-stations.ts';
import { pathsBelow } from '../../src/prove/metal-paths.ts';
import { solidMoves } from '../../src/prove/metal-solids.ts';
import { asCut } from '../../src/tooth/as-cut.ts';
import { exactWheel } from '../support/exact-wheel.ts';
import { loopMoves, type PathOptions } from '../support/offset-path.ts';

const FORM = exactWheel(60, 0.5, 8);
const DIAMETER = 0.5;
const RADIUS = DIAMETER / 2;
/** 0.1 um, to which the proof is to find its figures. */
const FOUND_TO = 1e-4;

function loop(offset: number, z: number, options: PathOptions = {}, form = FORM): TracedMove[] {
  return loopMoves(form, offset, z, options);
}

function figuresOf(moves: readonly TracedMove[], form = FORM): ToothFigures {
  const heights = { top: 0, bottom: -1.5, slack: 1e-4 };
  const solids = solidMoves(moves, () => RADIUS);
  return toothFigures(
    solids,
    pathsBelow(solids, heights.bottom + heights.slack, heights.top - heights.slack),
    form,
    DIAMETER,
    heights,
    0.0011,
  );
}

describe('a path at a set distance from the exact offset [by construction]', () => {
  it.each([0, 0.0004, 0.003])('leaves %f mm on every flank and tip, and cuts into none', (d) => {
    const { atTop, atBottom } = figuresOf(loop(RADIUS + d, -1.6));
    expect(Math.abs(atBottom.left[REGION.flank]!.value - d)).toBeLessThan(FOUND_TO);
    expect(Math.abs(atBottom.left[REGION.land]!.value - d)).toBeLessThan(FOUND_TO);
    expect(atTop.gouge.value).toBeLessThan(FOUND_TO);
  });

  it.each([0.0004, 0.003, 0.02])('cuts %f mm deep and leaves nothing', (d) => {
    const { atTop, atBottom } = figuresOf(loop(RADIUS - d, -1.6));
    expect(Math.abs(atTop.gouge.value - d)).toBeLessThan(FOUND_TO);
    expect(atBottom.left[REGION.flank]!.value).toBeLessThan(FOUND_TO);
  });

  it('leaves at the root what the as-cut outline says [closed form of the opened outline]', () => {
    const made = asCut(FORM, DIAMETER);
    expect(made.ok).toBe(true);
    const { atBottom } = figuresOf(loop(RADIUS, -1.6));
    expect(Math.abs(atBottom.left[REGION.root]!.value - (made.ok ? made.value.leftAtRoot : 0))).toBeLessThan(
      FOUND_TO,
    );
    expect(atBottom.rootMiss.value).toBeLessThan(FOUND_TO);
  });
});

describe('one tooth among sixty', () => {
  const good = loop(RADIUS, -1.6);
  const perTooth = good.length / 60;
  const shifted = good.map((move, k) =>
    Math.floor(k / perTooth) === 22
      ? {
          ...move,
          from: { ...move.from, x: move.from.x! + 0.002 },
          to: { ...move.to, x: move.to.x! + 0.002 },
          ...(move.centre === undefined ? {} : { centre: { x: move.centre.x + 0.002, y: move.centre.y } }),
        }
      : move,
  );
  const figures = figuresOf(shifted);

  it('is found by number, and by how far it was moved [by construction: 2 um along X]', () => {
    expect(figures.worst?.copy).toBe(22);
    expect(figures.atTop.gouge.copy).toBe(22);
    expect(figures.atTop.gouge.value).toBeGreaterThan(0.0015);
    expect(figures.atTop.gouge.value).toBeLessThan(0.002 + FOUND_TO);
  });

  it('shows in the plot from the middle of the root to the tip', () => {
    const points = figures.worst!.points;
    expect(points[0]!.along).toBe(0);
    expect(points[0]!.radius).toBeCloseTo(FORM.rootRadius, 6);
    expect(points.at(-1)!.radius).toBeCloseTo(FORM.outsideRadius, 6);
    expect(points.every((point, k) => k === 0 || point.along >= points[k - 1]!.along)).toBe(true);
  });
});

describe('facets', () => {
  it('leave the sag of their chord, found between the stations [sag c^2 / 8 rho, second order]', () => {
    const parts = 12;
    const { atBottom, atTop } = figuresOf(loop(RADIUS, -1.6, { parts, facets: true }));
    const round = figuresOf(loop(RADIUS, -1.6, { parts }));
    const half = figuresOf(loop(RADIUS, -1.6, { parts: 2 * parts, facets: true }));
    expect(atTop.gouge.value).toBeGreaterThan(2 * round.atTop.gouge.value);
    const ratio = atTop.gouge.value / half.atTop.gouge.value;
    expect(ratio).toBeGreaterThan(3.4);
    expect(ratio).toBeLessThan(4.6);
    expect(atBottom.left[REGION.flank]!.value).toBeLessThan(FOUND_TO);
  });

  it('turn the normal by half the angle between two of them at most', () => {
    const fine = figuresOf(loop(RADIUS, -1.6, { parts: 48, facets: true }));
    const coarse = figuresOf(loop(RADIUS, -1.6, { parts: 4, facets: true }));
    expect(fine.rolling.share).toBeLessThan(1);
    expect(coarse.rolling.share).toBeGreaterThan(1);
  });
});

describe('heights', () => {
  it('says the metal left where the finishing loop stops short of the bottom [by construction]', () => {
    const rough = loop(RADIUS + 0.03, -1.6);
    const finish = loop(RADIUS, -0.8);
    const { byDepth } = figuresOf([...rough, ...finish]);
    expect(byDepth[0]!.flankLeft).toBeGreaterThan(0.03 - FOUND_TO);
    // At the foot the corner of the stand-off path adds a little.
    expect(byDepth[0]!.flankLeft).toBeLessThan(0.033);
    expect(byDepth.at(-1)!.flankLeft).toBeLessThan(FOUND_TO);
    expect(byDepth.map(({ z }) => z)).toContain(-0.8);
  });

  it('sees a gouge that reaches only the top edge', () => {
    const finish = loop(RADIUS, -1.6);
    const slip = loop(RADIUS - 0.01, -0.2);
    const { byDepth } = figuresOf([...finish, ...slip.slice(0, 40)]);
    expect(byDepth[0]!.flankGouge).toBeLessThan(FOUND_TO);
    expect(byDepth.at(-1)!.flankGouge).toBeCloseTo(0.01, 4);
  });
});
