/** What the plan decides: reach, refusals, depth a lap, programs by the machine's way with cutters, keep-outs. */
import { describe, expect, it } from 'vitest';
import { turnPoint } from '../../src/geometry/point.ts';
import { pinion } from '../tooth/proportions.ts';
import { cutter, disc, inPass, makeCase, movesOf, planOf, problemsOf, type Wanted } from './make-job.ts';
import { distanceTo, planPiece, raster } from './swept.ts';

const stepOf = (wanted: Wanted): number =>
  planOf(wanted).passes.find(({ name }) => name === 'roughing')!.step;

describe('depth a lap', () => {
  const rough = (stickOut: number, step?: number): Wanted => ({
    crossings: null,
    cuts: {
      roughing: {
        cutter: cutter(2, 0.5, { stickOut, shank: 1 }),
        allowance: 0.03,
        ...(step === undefined ? {} : { step }),
      },
      finishing: { cutter: cutter(2, 0.5) },
    },
  });

  it('changes when only the stick-out changes', () => {
    expect(stepOf(rough(12))).toBeLessThan(stepOf(rough(10)));
  });

  it('is never more than the job asks, nor than a quarter of the diameter', () => {
    expect(stepOf(rough(10, 0.05))).toBeLessThanOrEqual(0.05);
    expect(stepOf(rough(10, 5))).toBeLessThanOrEqual(0.125);
  });
});

describe('reach', () => {
  it('agrees with the closed form r = Rr sin(s) / (1 - sin(s)) for radial flanks [plane trigonometry]', () => {
    const made = makeCase();
    const s = Math.PI / 120;
    const radius = (made.form.rootRadius * Math.sin(s)) / (1 - Math.sin(s));
    expect(planOf(made).reach.largestCutter).toBeCloseTo(2 * radius, 9);
  });

  it('names the largest cutter that would do when the working flank is out of reach', () => {
    const wide = cutter(1, 1);
    const problems = problemsOf({
      cuts: { roughing: { cutter: wide, allowance: 0.03 }, finishing: { cutter: wide } },
    });
    expect(problems.map(({ code }) => code)).toEqual(['reach.flank']);
    expect(problems[0]!.hint).toMatch(/largest cutter that would do for the working flank is 0\.\d+ mm/);
  });

  it('recommends the largest cutter of the list by the root width rule', () => {
    const made: Wanted = { setup: { cutters: [cutter(1, 1), cutter(2, 0.5), cutter(3, 0.6)] } };
    const plan = planOf(made);
    expect(plan.reach.roughingCutter).toBe(0.6);
    expect(plan.reach.remarks.join(' ')).toMatch(/cutter 3 of 0.6 mm would rough/);
  });

  it('says how much stays at a root that the cutter does not get to, at its thickest and in area', () => {
    const wide = cutter(2, 0.766);
    const { reach } = planOf({ cuts: { roughing: { cutter: wide }, finishing: { cutter: wide } } });
    expect(reach.largestCutter).toBeLessThan(0.766);
    expect(reach.remarks.join(' ')).toMatch(
      /does not reach the root: it leaves at most 0\.\d+ mm there \(0\.\d+ mm2 a space\)/,
    );
  });

  it('"use rounder corners" where a skin holds the slug and the corners leave no straight: says less round, and the width as it was given', () => {
    const round = { arms: 5, armAtHub: 2.4, armAtRim: 2.4, rim: 1.8, hub: 10, corner: 3.7 };
    const inch = cutter(1, 25.4 * 0.0393701);
    const [problem] = problemsOf({
      crossings: round,
      setup: { skin: 0.08 },
      cuts: { crossings: { cutter: inch } },
    });
    expect(problem).toMatchObject({ code: 'reach.corner' });
    expect(problem?.message).toMatch(/^cutter 1 of 1 mm is too wide/);
    expect(problem?.hint).toMatch(/less round/);
  });

  it.each<[string, string, Wanted]>([
    ['a bore narrower than the cutter', 'reach.space', { bore: 1, cuts: { bore: { cutter: cutter(1, 1) } } }],
    [
      'corners of windows sharper than the cutter',
      'reach.corner',
      { cuts: { crossings: { cutter: cutter(4, 2.5) } } },
    ],
    [
      'a finishing cutter wider than its slot',
      'toolpath.no-entry',
      { cuts: { roughing: { cutter: cutter(3, 0.4) } } },
    ],
    ['finishing before roughing', 'toolpath.no-entry', { order: ['bore', 'finishing', 'roughing'] }],
    [
      'a clamp in the path',
      'job.does-not-fit',
      { setup: { obstacles: [{ name: 'keep-out', x: 15, y: 0, radius: 2, fromZ: -1.5, toZ: 8 }] } },
    ],
    [
      'a cutter too slender for any depth',
      'toolpath.load',
      {
        cuts: {
          roughing: { cutter: cutter(2, 0.5, { reach: 40, flute: 40, stickOut: 60 }) },
          finishing: { cutter: cutter(2, 0.5) },
        },
      },
    ],
  ])('refuses %s', (_, code, wanted) => {
    expect(problemsOf(wanted).map((problem) => problem.code)).toContain(code);
  });
});

it('"keep-out at x 27.94" of a job that says x: 1.1: a clamp in the path is told in the unit of the job', () => {
  const clamp = { name: 'keep-out', x: 15.24, y: 0, radius: 2.54, fromZ: -1.5, toZ: 8 } as const;
  const [problem] = problemsOf({ length: 'inch', setup: { obstacles: [clamp] } });
  expect(problem?.message).toContain('at x 0.6 inch (15.24 mm), y 0 inch (0 mm), radius 0.1 inch (2.54 mm)');
});

describe('programs', () => {
  it('is one for each uninterrupted run of a cutter where the machine takes one cutter a program', () => {
    const plan = planOf({ machine: 'desk-three-axis' });
    expect(plan.programs.map(({ suffix, cutters }) => [suffix, cutters])).toEqual([
      ['-1', [1]],
      ['-2', [2]],
      ['-3', [1]],
    ]);
  });

  it('is one where the machine changes cutters', () => {
    const plan = planOf({ machine: 'bench-mill' });
    expect(plan.programs.map(({ suffix, cutters }) => [suffix, cutters])).toEqual([['', [1, 2, 1]]]);
  });

  it('has no suffix where one cutter does everything', () => {
    const one = cutter(2, 0.5);
    const plan = planOf({
      cuts: {
        bore: { cutter: one },
        crossings: { cutter: one },
        roughing: { cutter: one },
        finishing: { cutter: one },
      },
    });
    expect(plan.programs.map(({ suffix }) => suffix)).toEqual(['']);
  });

  it('follows the order of the job', () => {
    const plan = planOf({ order: ['crossings', 'bore', 'roughing', 'finishing'] });
    expect(plan.passes.map(({ name }) => name)).toEqual([
      'crossings',
      'crossings finishing',
      'bore',
      'bore finishing',
      'bay',
      'roughing',
      'finishing',
      'spring',
    ]);
  });

  it('is the same twice', () => {
    expect(planOf({})).toEqual(planOf({}));
  });

  it('grows in proportion to the teeth', () => {
    const steps = (teeth: number): number =>
      inPass(
        movesOf(
          planOf({
            wheel: { teeth },
            crossings: null,
            setup: { shape: { kind: 'sheet', width: 300, height: 300 } },
          }),
        ),
        'roughing',
      ).length;
    expect(steps(240) / steps(60)).toBeLessThan(4.1);
  });
});

describe('what stands in the way', () => {
  const clamp = { name: 'keep-out', x: 0, y: -20, radius: 1.5, fromZ: -1.5, toZ: 9 } as const;

  it('is crossed above its top, never at the clear height', () => {
    const plan = planOf({ setup: { obstacles: [clamp] } });
    for (const { from, step } of movesOf(plan)) {
      const dx = step.to.x - from.x;
      const dy = step.to.y - from.y;
      const length = Math.hypot(dx, dy);
      if (step.kind !== 'rapid' || length === 0) {
        continue;
      }
      const u = Math.min(1, Math.max(0, ((clamp.x - from.x) * dx + (clamp.y - from.y) * dy) / length ** 2));
      const off = Math.hypot(from.x + u * dx - clamp.x, from.y + u * dy - clamp.y);
      if (off < clamp.radius + 1.5) {
        expect(Math.min(from.z, step.to.z)).toBeGreaterThan(clamp.toZ);
      }
    }
  });

  it('is walked over with the spindle off', () => {
    const { walk } = planOf({ setup: { obstacles: [clamp] } });
    expect(
      walk.steps.some((step) => step.kind === 'spindle' || step.kind === 'line' || step.kind === 'arc'),
    ).toBe(false);
    expect(walk.steps).toContainEqual({
      kind: 'rapid',
      to: { x: 0, y: -20, z: 11 },
      belongs: { pass: 'over what stands in the way' },
    });
  });
});

describe('blanks and holdings', () => {
  it('opens a bay in sheet and the mouths of a disc, and cuts no land of a disc', () => {
    const wide: Wanted['wheel'] = { teeth: 30, module: 1, mate: pinion(10) };
    const names = (wanted: Wanted): readonly string[] => planOf(wanted).passes.map(({ name }) => name);
    expect(names({ crossings: null })).toContain('bay');
    const inDisc = names({ wheel: wide, crossings: null, setup: disc(wide) });
    expect(inDisc).toContain('mouths');
    expect(inDisc).not.toContain('bay');
  });

  it('cuts only round the slugs where a skin holds them', () => {
    const held = planOf({ setup: { holding: ['skin'], skin: 0.08 }, cuts: { below: 0 } });
    const whole = planOf({});
    const count = (plan: typeof held): number => inPass(movesOf(plan), 'crossing 1').length;
    expect(count(held)).toBeLessThan(count(whole) / 2);
    expect(Math.min(...movesOf(held).map(({ step }) => step.to.z))).toBeCloseTo(-1.42, 9);
  });

  it('roughs conventionally where play would draw a slender cutter in, finishes climbing, and says why', () => {
    const round = (wanted: Wanted, pass: string): number =>
      inPass(movesOf(planOf(wanted)), pass)
        .filter(({ belongs }) => belongs?.tooth !== undefined)
        .reduce((sum, { from, step }) => sum + Math.sign(from.x * step.to.y - from.y * step.to.x), 0);
    const loose: Wanted = { cuts: { play: { x: 0.01, y: 0.05 } } };
    expect(round(loose, 'roughing')).toBeGreaterThan(0);
    expect(round(loose, 'finishing')).toBeLessThan(0);
    const why = planOf(loose)
      .passes.find(({ name }) => name === 'roughing')!
      .why.join(' ');
    expect(why).toMatch(/conventional.*0\.05 mm of play/);
    const stout = { cutter: cutter(1, 1), allowance: 0.03 };
    const wide: Wanted = {
      wheel: { teeth: 30, module: 1, mate: pinion(10) },
      cuts: { play: { x: 0.05, y: 0.05 }, roughing: stout, finishing: { cutter: cutter(1, 1) } },
    };
    expect(round(wide, 'roughing')).toBeLessThan(0);
    expect(round({ cuts: { play: { x: 0.02, y: 0.03 } } }, 'roughing')).toBeLessThan(0);
  });

  it('climbs clockwise round the wheel and counter-clockwise in the bore', () => {
    const turns = (climb: boolean, pass: string): number =>
      inPass(movesOf(planOf({ cuts: { climb } })), pass)
        .filter(({ belongs }) => pass === 'bore' || belongs?.tooth !== undefined)
        .reduce((sum, { from, step }) => sum + Math.sign(from.x * step.to.y - from.y * step.to.x), 0);
    expect(turns(true, 'roughing')).toBeLessThan(0);
    expect(turns(true, 'bore')).toBeGreaterThan(0);
    expect(turns(false, 'roughing')).toBeGreaterThan(0);
    expect(turns(false, 'bore')).toBeLessThan(0);
  });
});

describe('a thin fin left standing between the two slots of a space', () => {
  const wheel: Wanted['wheel'] = { teeth: 189, module: 0.84, mate: pinion(12) };
  const slender = cutter(1, 0.59);
  const fin: Wanted = {
    wheel,
    crossings: null,
    setup: { shape: { kind: 'sheet', width: 180, height: 180 } },
    cuts: { roughing: { cutter: slender, allowance: 0.03 }, finishing: { cutter: slender } },
  };

  it.each<[string, Wanted]>([
    ['189 teeth, module 0.84, cutter 0.59', fin],
    ['on a machine without arcs', { ...fin, machine: 'lines-only' }],
    ['conventional', { ...fin, cuts: { ...fin.cuts, climb: false } }],
  ])('is cut away in sheet: %s', (_, wanted) => {
    const made = makeCase(wanted);
    const { form } = made;
    const lap = inPass(movesOf(planOf(made)), 'roughing').filter(
      ({ belongs, from, step }) =>
        belongs?.lap === belongs?.laps && (belongs?.tooth ?? 9) <= 3 && from.z === step.to.z,
    );
    const half = Math.PI / form.proportions.teeth;
    const pieces = lap.map(planPiece);
    // Across the space at each radius: nothing stands there, or what stands is thick.
    const thick = [];
    for (let x = form.rootRadius + 0.1; x < form.outsideRadius; x += 0.05) {
      const across = raster({ x: [x, x], y: [-0.5, 0.5] }, 0.02).map((point) => turnPoint(point, half));
      const standing = across.filter((point) => distanceTo(pieces, point) > slender.diameter / 2);
      thick.push(0.02 * standing.length);
    }
    expect(thick.slice(0, 20).every((width) => width === 0)).toBe(true);
    // The end of what stands may be pointed, but bluntly.
    const thin = thick.filter((width) => width > 0 && width < 0.3 * slender.diameter);
    expect(thin.length * 0.05).toBeLessThanOrEqual(0.1);
  });

  it('does not cost blocks where the slots meet anyway, or where what stands is stout', () => {
    const says = (wanted: Wanted): string =>
      planOf(wanted)
        .passes.find(({ name }) => name === 'roughing')!
        .why.join(' ');
    expect(says(fin)).toContain('thin fin');
    expect(says({})).not.toContain('thin fin');
    const small = cutter(2, 0.4);
    const stout = { roughing: { cutter: small, allowance: 0.03 }, finishing: { cutter: small } };
    expect(says({ ...fin, cuts: stout })).not.toContain('thin fin');
  });
});

describe('windows with corners as sharp as the cutter', () => {
  const windows = { arms: 5, armAtHub: 2.4, armAtRim: 2.4, rim: 1.8, hub: 9, corner: 0.5 };
  const feeds = (corner: number): number[] =>
    inPass(movesOf(planOf({ crossings: { ...windows, corner } })), 'crossing 1 finishing').flatMap(
      ({ step }) => (step.kind === 'line' && step.to.z < 0 ? [step.feed] : []),
    );

  it('are finished slower before the corner; wide corners are not', () => {
    expect(new Set(feeds(0.5)).size).toBe(2);
    expect(new Set(feeds(1.2)).size).toBe(1);
  });
});
