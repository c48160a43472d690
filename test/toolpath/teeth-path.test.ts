/** The paths round the teeth: how near they come, how few their blocks are, how they are joined. */
import { describe, expect, it } from 'vitest';
import { LINE_FIT_INSIDE } from '../../src/base/tolerances.ts';
import { nearestOnChain } from '../../src/geometry/nearest-on-piece.ts';
import { endOf, headingOn, startOf } from '../../src/geometry/on-piece.ts';
import type { Chain } from '../../src/geometry/piece.ts';
import { norm, turnPoint, type Point } from '../../src/geometry/point.ts';
import type { WheelForm } from '../../src/tooth/wheel.ts';
import { pinion } from '../tooth/proportions.ts';
import {
  cutter,
  disc,
  inPass,
  makeCase,
  movesOf,
  planOf,
  pointsAlong,
  type PlannedMove,
  type Wanted,
} from './make-job.ts';
import { planPiece } from './swept.ts';

const MICROMETRE = 0.001;

const FORMS: readonly (readonly [string, Wanted])[] = [
  ['60 teeth, module 0.5', {}],
  ['conventional', { cuts: { climb: false } }],
  [
    '96 teeth, module 0.8, cutter 1.0',
    {
      wheel: { teeth: 96, module: 0.8, mate: pinion(12) },
      setup: { shape: { kind: 'sheet', width: 90, height: 90 } },
      crossings: null,
      cuts: { roughing: { cutter: cutter(1, 1), allowance: 0.05 }, finishing: { cutter: cutter(1, 1) } },
    },
  ],
  ['12 teeth, module 1', { wheel: { teeth: 12, module: 1, mate: pinion(8) }, crossings: null, bore: 2 }],
  ['one arc', { wheel: { addendumForm: 'arc' } }],
  ['filleted', { wheel: { rootFillet: 0.3 } }],
  ['disc', { setup: disc() }],
  ['lines only', { machine: 'lines-only' }],
  ['much play: roughing against the climb', { cuts: { play: { x: 0.05, y: 0 } } }],
  [
    '200 teeth, module 2',
    {
      wheel: { teeth: 200, module: 2, mate: pinion(8) },
      crossings: null,
      setup: { shape: { kind: 'sheet', width: 450, height: 450 } },
      cuts: {
        roughing: { cutter: cutter(1, 1), allowance: 0.05, step: 0.25 },
        finishing: { cutter: cutter(1, 1) },
      },
    },
  ],
  [
    'lines only, 96 teeth, module 1',
    {
      machine: 'lines-only',
      wheel: { teeth: 96, module: 1, mate: pinion(12) },
      crossings: null,
      setup: { shape: { kind: 'sheet', width: 110, height: 110 } },
      cuts: { roughing: { cutter: cutter(1, 0.8), allowance: 0.04 }, finishing: { cutter: cutter(1, 0.8) } },
    },
  ],
];

const tipsOf = (form: WheelForm): readonly Point[] =>
  form.sector
    .flatMap(({ role, piece }) => (role === 'addendum' ? [piece] : []))
    .flatMap((piece) => [startOf(piece), endOf(piece)])
    .filter((point) => Math.abs(norm(point) - form.outsideRadius) < 1e-9);

/** Distance of a point from the exact outline, by turning it into the nearest pitch. */
function fromOutline(form: WheelForm, outline: Chain, point: Point): number {
  const pitch = (2 * Math.PI) / form.proportions.teeth;
  const k = Math.round(Math.atan2(point.y, point.x) / pitch);
  return Math.min(
    ...[-1, 0, 1].map(
      (d) => nearestOnChain(outline, turnPoint(point, -(k + d) * pitch))?.distance ?? Infinity,
    ),
  );
}

/** Whether the nearest of the outline is a tip corner. */
function aboutTip(form: WheelForm, outline: Chain, point: Point): boolean {
  const pitch = (2 * Math.PI) / form.proportions.teeth;
  const seen = turnPoint(point, -Math.round(Math.atan2(point.y, point.x) / pitch) * pitch);
  const off = Math.min(...tipsOf(form).map((tip) => Math.hypot(seen.x - tip.x, seen.y - tip.y)));
  return off < fromOutline(form, outline, point) + 1e-9;
}

describe.each(FORMS)('%s', (_, wanted) => {
  const made = makeCase(wanted);
  const { form, job, machine } = made;
  const plan = planOf(made);
  const moves = movesOf(plan);
  const outline = form.sector.map(({ piece }) => piece);
  const distances = (pass: string): number[] =>
    inPass(moves, pass)
      .filter(({ belongs }) => (belongs?.tooth ?? 0) <= 2 && belongs?.lap === 1)
      .flatMap((move) => pointsAlong(move, 0.01))
      .map((point) => fromOutline(form, outline, point));
  const nearest = (pass: string): number => Math.min(...distances(pass));
  const linesOnly = machine.words.arcs.planes === 'none';

  it('keeps the allowance in roughing: 0.3 um less at worst, a quarter and as much more', () => {
    const { allowance, cutter: rough } = job.cuts.roughing;
    const kept = rough.diameter / 2 + allowance;
    expect(nearest('roughing')).toBeGreaterThan(kept - 0.0003 * 1.001);
    expect(nearest('roughing')).toBeLessThan(kept + 0.25 * allowance);
  });

  it('goes round a tip in roughing with the allowance once more on its land, at most', () => {
    const { allowance, cutter: rough } = job.cuts.roughing;
    const far = inPass(moves, 'roughing')
      .filter(({ belongs }) => belongs?.tooth === 2 && belongs.lap === 1)
      .flatMap((move) => pointsAlong(move, 0.01))
      .map(({ x, y }) => Math.hypot(x, y));
    const most = form.outsideRadius + rough.diameter / 2 + 2.5 * allowance;
    expect(Math.max(...far)).toBeLessThan(most);
  });

  it('roughs a pitch in few blocks: 12 with arcs, and more only where a tooth is large or has no straight flank', () => {
    const facts = plan.passes.find(({ name }) => name === 'roughing')!;
    const blocks = inPass(moves, 'roughing').length / form.proportions.teeth / facts.laps;
    expect(blocks).toBeLessThanOrEqual((linesOnly ? 32 : 14) + 12 / form.proportions.teeth);
  });

  it('never comes nearer than the cutter radius in finishing, and follows the outline within a micrometre', () => {
    const r = job.cuts.finishing.cutter.diameter / 2;
    expect(nearest('finishing')).toBeGreaterThan(r - MICROMETRE);
    const lap = lapOf(moves, 'finishing', 2);
    const far = lap
      .flatMap((move) => pointsAlong(move, 0.01))
      // Lines turn about a tip corner at a little more than its distance: a burr on the corner, no flank hangs on it.
      .filter((point) => !linesOnly || !aboutTip(form, outline, point))
      .map((point) => fromOutline(form, outline, point))
      .filter((d) => d > r + MICROMETRE);
    // Over the land of a disc the cutter runs clear; everywhere else it touches.
    const clear = job.setup.shape.kind === 'disc' ? 0.05 : 0;
    expect(Math.max(r, ...far)).toBeLessThanOrEqual(r + MICROMETRE + clear);
  });

  it('has few blocks a pitch: 16 with arcs, 40 with lines only', () => {
    const { teeth } = form.proportions;
    const blocks = inPass(moves, 'spring').length / teeth;
    expect(blocks).toBeLessThanOrEqual((linesOnly ? 40 : 16) + 12 / teeth);
  });

  it('is tangent within 0.1 degree (lines only: 20) except at the corners of the root', () => {
    const lap = lapOf(moves, 'finishing', 2);
    lap.forEach((move, i) => {
      const next = lap[i + 1];
      if (next === undefined) {
        return;
      }
      const a = headingOn(planPiece(move), 1);
      const b = headingOn(planPiece(next), 0);
      const turned = (Math.abs(Math.atan2(a.x * b.y - a.y * b.x, a.x * b.x + a.y * b.y)) * 180) / Math.PI;
      const low = norm(endOf(planPiece(move))) < form.pitchRadius;
      if (!low && job.wheel.addendumForm !== 'arc') {
        expect(turned).toBeLessThan(linesOnly ? 20 : 0.1);
      }
    });
  });

  it('is joined and left on the arc round a tip corner of tooth 1, on tangents', () => {
    const r = job.cuts.finishing.cutter.diameter / 2 - (linesOnly ? LINE_FIT_INSIDE : 0);
    const tips = tipsOf(form);
    const finishing = inPass(moves, 'finishing').filter(
      ({ step }) => step.kind === 'arc' || step.kind === 'line',
    );
    const joins = finishing.filter(({ belongs, step, from }, i) => {
      const next = finishing[i + 1];
      return (
        belongs?.tooth === undefined &&
        next?.belongs?.tooth === 1 &&
        step.kind === 'arc' &&
        from.z === step.to.z
      );
    });
    expect(joins.length).toBeGreaterThan(0);
    for (const join of joins) {
      const off = Math.min(
        ...tips.map((tip) => Math.abs(Math.hypot(join.step.to.x - tip.x, join.step.to.y - tip.y) - r)),
      );
      expect(off).toBeLessThan(1e-9);
      const next = finishing[finishing.indexOf(join) + 1] as PlannedMove;
      const a = headingOn(planPiece(join), 1);
      const b = headingOn(planPiece(next), 0);
      expect(a.x * b.x + a.y * b.y).toBeGreaterThan(linesOnly ? 0.98 : 1 - 1e-9);
    }
  });
});

/** The moves of one tooth in the first lap of a pass. */
function lapOf(moves: readonly PlannedMove[], pass: string, tooth: number): readonly PlannedMove[] {
  return inPass(moves, pass).filter(({ belongs }) => belongs?.lap === 1 && belongs.tooth === tooth);
}
