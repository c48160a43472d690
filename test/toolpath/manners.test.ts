/** The manners of every program (a rapid moves no metal, nothing plunges, loops are joined on tips), over several jobs. */
import { describe, expect, it } from 'vitest';
import { distance } from '../../src/geometry/point.ts';
import { isMove } from '../../src/motion/motion.ts';
import { pinion } from '../tooth/proportions.ts';
import { cutter, disc, inPass, makeCase, movesOf, planOf, type Case, type Wanted } from './make-job.ts';

const GREAT: Wanted = {
  wheel: { teeth: 96, module: 0.8, mate: pinion(12) },
  thickness: 2.5,
  bore: 6,
  crossings: { arms: 6, armAtHub: 5, armAtRim: 4, rim: 3, hub: 16, corner: 2 },
  setup: { plateZ: -2.5, shape: { kind: 'sheet', width: 90, height: 90 } },
  cuts: {
    roughing: { cutter: cutter(3, 0.8), allowance: 0.04 },
    finishing: { cutter: cutter(3, 0.8), passes: 2, spring: 1 },
  },
};
const SMALL: Wanted['wheel'] = { teeth: 30, module: 0.4, mate: pinion(7) };
const JOBS: readonly (readonly [string, Wanted])[] = [
  ['third wheel in sheet', {}],
  ['great wheel, six windows, two passes', GREAT],
  [
    'small disc, no windows',
    {
      wheel: SMALL,
      crossings: null,
      bore: 2,
      setup: disc(SMALL),
      cuts: { roughing: { cutter: cutter(3, 0.4), allowance: 0.02 }, finishing: { cutter: cutter(3, 0.4) } },
    },
  ],
  [
    'wheel of a module-1 pair in a disc',
    {
      wheel: { teeth: 30, module: 1, mate: pinion(10) },
      setup: disc({ teeth: 30, module: 1, mate: pinion(10) }),
    },
  ],
  ['conventional, automatic changer', { machine: 'bench-mill', cuts: { climb: false } }],
  ['lines only', { machine: 'lines-only' }],
  ['an addendum of one arc', { wheel: { addendumForm: 'arc' } }],
  ['a filleted root', { wheel: { rootFillet: 0.3 } }],
  ['roughed by a larger cutter', { cuts: { roughing: { cutter: cutter(3, 0.6), allowance: 0.03 } } }],
  [
    'held by a skin, zero on the plate',
    { setup: { holding: ['skin'], skin: 0.08, topZ: 1.58, plateZ: 0, clearZ: 6.58 }, cuts: { below: 0 } },
  ],
];

describe.each(JOBS)('%s', (_, wanted) => {
  const made: Case = makeCase(wanted);
  const plan = planOf(made);
  const moves = movesOf(plan);
  const { setup } = made.job;

  it('moves fast below the clear height only straight up, or straight down to just above the top or a floor', () => {
    for (const { from, step } of moves) {
      if (step.kind !== 'rapid' || Math.min(from.z, step.to.z) >= setup.clearZ) {
        continue;
      }
      expect(distance(from, step.to)).toBe(0);
      if (step.to.z < from.z) {
        const floors = moves.filter(({ step: cut }) => cut.kind !== 'rapid').map(({ step: cut }) => cut.to.z);
        const below = [setup.topZ, ...floors].some((z) => step.to.z - z > 0.3 && step.to.z - z < 0.7);
        expect(below).toBe(true);
      }
    }
  });

  it('cuts only with the spindle at speed, and stops it at every change and end', () => {
    for (const { motion } of plan.programs) {
      let speed = 0;
      let loaded = 0;
      for (const step of motion.steps) {
        if (step.kind === 'spindle') {
          speed = step.speed;
        } else if (step.kind === 'cutter') {
          expect(speed).toBe(0);
          loaded = step.number;
        } else if (isMove(step) && step.kind !== 'rapid') {
          expect(speed).toBeGreaterThan(0);
          expect(loaded).toBeGreaterThan(0);
          expect(step.feed).toBeGreaterThan(0);
        }
      }
      expect(speed).toBe(0);
      expect(motion.steps.at(-1)).toMatchObject({ kind: 'rapid', to: plan.park });
      expect(plan.park.z).toBeGreaterThanOrEqual(setup.clearZ);
    }
  });

  it('goes to the top and lifts Z first after every change', () => {
    for (const { motion } of plan.programs) {
      motion.steps.forEach((step, i) => {
        if (step.kind === 'cutter') {
          expect(motion.steps[i - 1]?.kind).toBe('top');
          expect(motion.steps[i + 1]).toMatchObject({ kind: 'rapid', to: { z: plan.park.z } });
        }
      });
    }
  });

  it('has arcs whose ends lie on their circle and whose sweep leads from one to the other', () => {
    for (const { from, step } of moves) {
      if (step.kind !== 'arc') {
        continue;
      }
      const radius = distance(from, step.centre);
      expect(Math.abs(distance(step.to, step.centre) - radius)).toBeLessThan(1e-9);
      const c = Math.cos(step.turn);
      const s = Math.sin(step.turn);
      const x = step.centre.x + (from.x - step.centre.x) * c - (from.y - step.centre.y) * s;
      const y = step.centre.y + (from.x - step.centre.x) * s + (from.y - step.centre.y) * c;
      expect(Math.hypot(step.to.x - x, step.to.y - y)).toBeLessThan(1e-8);
      expect(Math.abs(step.turn)).toBeLessThanOrEqual(2 * Math.PI);
    }
  });

  it('never stands still and never goes below the deepest cut', () => {
    const bottom = setup.skin > 0 ? setup.plateZ + setup.skin : setup.plateZ - made.job.cuts.below;
    for (const { from, step } of moves) {
      expect(step.to.z).toBeGreaterThanOrEqual(bottom);
      if (step.kind !== 'rapid') {
        const still = distance(from, step.to) === 0 && from.z === step.to.z;
        expect(still && step.kind === 'line').toBe(false);
      }
    }
  });

  it('falls along the teeth only on straight pieces, less than a step a lap', () => {
    const roughing = inPass(moves, 'roughing');
    expect(roughing.length).toBeGreaterThan(made.form.proportions.teeth);
    for (const { from, step } of roughing) {
      if (step.to.z < from.z && distance(from, step.to) > 0) {
        expect(step.kind).toBe('line');
      }
    }
    const facts = plan.passes.find(({ name }) => name === 'roughing')!;
    expect(facts.step).toBeLessThanOrEqual(made.job.cuts.roughing.cutter.diameter / 4 + 1e-12);
    const depths = [...new Set(roughing.map(({ belongs }) => belongs!.depth!))].sort((a, b) => b - a);
    [setup.topZ, ...depths].forEach((z, i, all) => {
      expect(z - (all[i + 1] ?? z)).toBeLessThanOrEqual(facts.step + 1e-9);
    });
  });

  it('enters metal straight down only where a cutter may plunge: elsewhere it ramps', () => {
    for (const { from, step, belongs } of moves) {
      const down = step.kind !== 'rapid' && distance(from, step.to) === 0 && step.to.z < from.z;
      // Down in air: to the surface, in the cleared bay or hole, or beside the disc.
      const open = ['roughing', 'finishing', 'spring', 'mouths', 'bore finishing'].includes(
        belongs?.pass ?? '',
      );
      if (down && !open && !belongs?.pass.endsWith('finishing')) {
        expect(from.z - step.to.z).toBeLessThan(0.6);
      }
    }
  });

  it('marks every cut with its pass, and teeth from 1 to N', () => {
    const { teeth } = made.form.proportions;
    const seen = new Set<number>();
    for (const { step, belongs } of moves) {
      if (step.kind !== 'rapid') {
        expect(belongs?.pass).toBeTruthy();
      }
      if (belongs?.pass === 'finishing' && belongs.tooth !== undefined) {
        seen.add(belongs.tooth);
      }
    }
    expect([...seen].sort((a, b) => a - b)).toEqual(Array.from({ length: teeth }, (_unused, i) => i + 1));
  });
});
