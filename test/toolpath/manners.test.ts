/** The manners of every program (a rapid moves no metal, nothing plunges, loops are joined on tips), over several jobs. */
import { describe, expect, it } from 'vitest';
import { isMove } from '../../src/motion/motion.ts';
import { distance } from '../../src/geometry/point.ts';
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
  const cuts = moves.filter(({ step }) => step.kind !== 'rapid');

  it('moves fast below the clear height only straight up, or straight down to just above the top or a floor', () => {
    const floors = [...new Set([setup.topZ, ...cuts.map(({ step }) => step.to.z)])];
    const low = moves.filter(
      ({ from, step }) => step.kind === 'rapid' && Math.min(from.z, step.to.z) < setup.clearZ,
    );
    expect(low.filter(({ from, step }) => distance(from, step.to) > 0)).toEqual([]);
    const down = low.filter(({ from, step }) => step.to.z < from.z);
    expect(down.length).toBeGreaterThan(0);
    const blind = down.filter(({ step }) => !floors.some((z) => step.to.z - z > 0.3 && step.to.z - z < 0.7));
    expect(blind).toEqual([]);
  });

  it('cuts only with the spindle at speed, and stops it at every change and end', () => {
    expect(
      cuts.filter(
        ({ spindle, cutter: loaded, step }) =>
          !(spindle > 0 && loaded > 0 && step.kind !== 'rapid' && step.feed > 0),
      ),
    ).toEqual([]);
    for (const { motion } of plan.programs) {
      let speed = 0;
      for (const step of motion.steps) {
        if (step.kind === 'spindle') {
          speed = step.speed;
        } else if (step.kind === 'cutter') {
          expect(speed).toBe(0);
        }
      }
      expect(speed).toBe(0);
      expect(motion.steps.findLast(isMove)).toMatchObject({ kind: 'rapid', to: plan.park });
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
    const wrong = moves.filter(({ from, step }) => {
      if (step.kind !== 'arc') {
        return false;
      }
      const end = { x: from.x - step.centre.x, y: from.y - step.centre.y };
      const c = Math.cos(step.turn);
      const s = Math.sin(step.turn);
      const x = step.centre.x + end.x * c - end.y * s;
      const y = step.centre.y + end.x * s + end.y * c;
      return Math.hypot(step.to.x - x, step.to.y - y) > 1e-8 || Math.abs(step.turn) > 2 * Math.PI;
    });
    expect(wrong).toEqual([]);
  });

  it('never stands still at feed and never goes below the deepest cut', () => {
    const bottom = setup.skin > 0 ? setup.plateZ + setup.skin : setup.plateZ - made.job.cuts.below;
    expect(Math.min(...new Set(moves.map(({ step }) => step.to.z)))).toBeCloseTo(bottom, 12);
    const still = cuts.filter(
      ({ from, step }) => step.kind === 'line' && distance(from, step.to) === 0 && from.z === step.to.z,
    );
    expect(still).toEqual([]);
  });

  it('falls along the teeth only on straight pieces, at most a step a lap', () => {
    const roughing = inPass(moves, 'roughing');
    expect(roughing.length).toBeGreaterThan(made.form.proportions.teeth);
    const bent = roughing.filter(({ from, step }) => step.to.z < from.z && step.kind !== 'line');
    expect(bent).toEqual([]);
    const facts = plan.passes.find(({ name }) => name === 'roughing')!;
    expect(facts.step).toBeLessThanOrEqual(made.job.cuts.roughing.cutter.diameter / 4 + 1e-12);
    const depths = [...new Set(roughing.map(({ belongs }) => belongs!.depth!))].sort((a, b) => b - a);
    [setup.topZ, ...depths].forEach((z, i, all) => {
      expect(z - (all[i + 1] ?? z)).toBeLessThanOrEqual(facts.step + 1e-9);
    });
  });

  it('goes straight down at feed only in air: to the top or a floor, in the bay, beside the disc, in a cleared hole', () => {
    const open = ['roughing', 'finishing', 'spring', 'mouths'];
    const plunges = cuts.filter(
      ({ from, step, belongs }) =>
        distance(from, step.to) === 0 &&
        step.to.z < from.z - 0.6 &&
        !open.includes(belongs!.pass) &&
        !belongs!.pass.endsWith('finishing'),
    );
    expect(plunges).toEqual([]);
  });

  it('marks every cut with its pass, and teeth from 1 to N', () => {
    const { teeth } = made.form.proportions;
    expect(cuts.filter(({ belongs }) => !belongs?.pass)).toEqual([]);
    const seen = new Set(inPass(moves, 'finishing').flatMap(({ belongs }) => belongs?.tooth ?? []));
    expect([...seen].sort((a, b) => a - b)).toEqual(Array.from({ length: teeth }, (_unused, i) => i + 1));
  });
});
