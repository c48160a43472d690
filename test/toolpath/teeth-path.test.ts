/** The paths round the teeth: how near they come, how few their blocks are, how they are joined. */
import { describe, expect, it } from 'vitest';
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
];

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

describe.each(FORMS)('%s', (_, wanted) => {
  const made = makeCase(wanted);
  const { form, job, machine } = made;
  const plan = planOf(made);
  const moves = movesOf(plan);
  const outline = form.sector.map(({ piece }) => piece);
  const nearest = (pass: string): number =>
    Math.min(
      ...inPass(moves, pass)
        .filter(({ belongs }) => (belongs?.tooth ?? 0) <= 2 && belongs?.lap === 1)
        .flatMap((move) => pointsAlong(move, 0.01))
        .map((point) => fromOutline(form, outline, point)),
    );
  const linesOnly = machine.words.arcs.planes === 'none';

  it('keeps the allowance in roughing to a micrometre of the fit, 0.3 um where arcs are', () => {
    const kept = job.cuts.roughing.cutter.diameter / 2 + job.cuts.roughing.allowance;
    expect(nearest('roughing')).toBeGreaterThan(kept - MICROMETRE);
  });

  it('never comes nearer than the cutter radius in finishing, and follows the outline within a micrometre', () => {
    const r = job.cuts.finishing.cutter.diameter / 2;
    expect(nearest('finishing')).toBeGreaterThan(r - MICROMETRE);
    const lap = lapOf(moves, 'finishing', 2);
    const far = lap
      .flatMap((move) => pointsAlong(move, 0.01))
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
    const r = job.cuts.finishing.cutter.diameter / 2;
    const tips = form.sector
      .flatMap(({ role, piece }) => (role === 'addendum' ? [piece] : []))
      .flatMap((piece) => [startOf(piece), endOf(piece)])
      .filter((point) => Math.abs(norm(point) - form.outsideRadius) < 1e-9);
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
