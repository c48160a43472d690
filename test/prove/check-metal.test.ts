/** Loose metal, slots too deep, holding and order, bore and inside cuts: programs spoiled one way each. */
import { describe, expect, it } from 'vitest';
import type { Crossings } from '../../src/tooth/wheel.ts';
import { TARGET } from '../support/good-program.ts';
import { edited, errorsOf, findingOf, GOOD, lineOf, prove, withSetup } from '../support/damage.ts';

const bore = lineOf('(BORE)');
const roughing = lineOf('(ROUGHING)');
const finishing = lineOf('(FINISHING)');

/** A ring round the axis, down in gentle turns to the bottom, and round once more. */
function ring(radius: number, x = 0, deepest = -1.1): string[] {
  const at = x + radius;
  const turn = (z: number): string =>
    `G3 X${at.toFixed(4)} Y0 Z${z.toFixed(4)} I${(-radius).toFixed(4)} J0 F100`;
  const levels = Array.from({ length: 40 }, (_, k) => turn(0.2 + ((deepest - 0.2) * (k + 1)) / 40));
  return [`G0 X${at.toFixed(4)} Y0`, 'G0 Z0.2', ...levels, turn(deepest), 'G0 Z5'];
}

describe('loose metal', () => {
  it('refuses a core left in the bore [ring of radius 0.7 with a cutter of 0.6: core of radius 0.4]', () => {
    const proof = prove(edited(bore + 1, roughing - bore - 1, ...ring(0.7)));
    expect(errorsOf(proof)).toEqual(['prove.loose']);
    const area = Number(/([\d.]+) mm2/.exec(findingOf(proof, 'prove.loose').message)![1]);
    expect(Math.abs(area - Math.PI * 0.16)).toBeLessThan(0.05);
  });

  it('refuses a slug cut free in the sheet beside the wheel', () => {
    const proof = prove(edited(roughing, 0, ...ring(0.6, 7.2)));
    expect(errorsOf(proof)).toContain('prove.loose');
  });

  it('lets a core stand on a skin', () => {
    const raised = edited(bore + 1, roughing - bore - 1, ...ring(0.7, 0, -0.92));
    const skin = withSetup({ holding: ['skin'], skin: 0.08 });
    expect(errorsOf(prove(raised, skin))).not.toContain('prove.loose');
  });
});

describe('load', () => {
  it('refuses finishing before roughing: a slot 1.1 mm deep for a cutter of 0.6', () => {
    const lines = edited(roughing, 0, 'G0 X2.8 Y-1.1600', 'G0 Z0.2').filter((line) => line !== '');
    const first = lines.slice(0, roughing);
    const start = GOOD[roughing + 1]!;
    const proof = prove([...first, start, 'G0 Z0.2', 'G1 Z-1.1 F20', ...GOOD.slice(finishing + 1)]);
    expect(errorsOf(proof)).toContain('prove.load');
    expect(errorsOf(proof)).toContain('prove.plunge');
  });
});

describe('holding and order', () => {
  it('refuses a wheel that only a screw holds', () => {
    expect(errorsOf(prove(GOOD, withSetup({ holding: ['screw'] })))).toEqual(['prove.holding']);
  });

  it('refuses the bore after the teeth, in one program or in two run the wrong way round', () => {
    const head = GOOD.slice(0, bore);
    const end = GOOD.slice(lineOf('M5'));
    const boring = GOOD.slice(bore, roughing);
    const teeth = GOOD.slice(roughing, lineOf('M5'));
    expect(errorsOf(prove([...head, ...teeth, ...boring, ...end]))).toEqual(['prove.order']);
    const programs = [teeth, boring].map((part, k) => ({
      file: `part-${String(k + 1)}.ngc`,
      text: [...head, ...part, ...end].join('\n'),
    }));
    expect(errorsOf(prove([], { programs }))).toEqual(['prove.order']);
    expect(errorsOf(prove([], { programs: programs.toReversed() }))).toEqual([]);
  });
});

describe('the bore', () => {
  it('is refused where the last ring is 5 um too wide [by construction]', () => {
    const at = roughing - 2;
    expect(GOOD[at]).toMatch(/^G3 X0.2500/);
    const wide = ['G1 X0.7050 Y0 F100', 'G3 X0.7050 Y0 I-0.7050 J0 F100', 'G1 X0.25 Y0 F100'];
    const proof = prove(edited(at, 1, GOOD[at]!, ...wide));
    expect(errorsOf(proof)).toEqual(['prove.bore']);
    expect(proof.figures!.boreError).toBeCloseTo(0.005, 4);
  });

  it('is refused where metal was to be left for a reamer and none is', () => {
    const proof = prove(GOOD, { target: { ...TARGET, bore: 1.9 } });
    expect(errorsOf(proof)).toEqual(['prove.bore']);
    expect(proof.figures!.boreError).toBeCloseTo(0.05, 4);
  });
});

describe('cuts deep inside the wheel', () => {
  it('are seen where they touch no outline', () => {
    const wide = { ...TARGET, bore: 0.9 };
    const small = prove(edited(roughing, 0, ...ring(0.05, 1.6)), { target: wide });
    expect(errorsOf(small)).toContain('prove.gouge');
    expect(findingOf(small, 'prove.gouge').message).toMatch(/axis goes inside/);
  });
});

describe('crossings', () => {
  /** A round window is a crossing like any other: radius 0.45 at 1.6 from the axis would touch the bore, so the bore is small. */
  const window: Crossings = {
    proportions: { arms: 3, armAtHub: 0.5, armAtRim: 0.5, rim: 0.3, hub: 2, corner: 0.4 },
    count: 1,
    window: [{ kind: 'arc', centre: { x: 1.7, y: 0 }, radius: 0.4, start: 0, turn: 2 * Math.PI }],
    hubRadius: 1,
    windowInner: 1.3,
    windowOuter: 2.1,
  };
  const target = { ...TARGET, bore: 2, crossings: window };
  const round = (radius: number): string[] => ring(radius, 1.7);
  const end = lineOf('M5');

  it('pass where they are cut as drawn [by construction: window 0.4, cutter 0.3, path 0.1]', () => {
    const proof = prove(edited(end, 0, ...round(0.1)), { target });
    expect(errorsOf(proof)).toEqual([]);
    expect(proof.figures!.crossingGouge).toBeLessThan(1e-4);
    expect(proof.figures!.crossingLeft).toBeLessThan(1e-4);
  });

  it('are refused where they are 5 um too wide, too narrow, or not cut', () => {
    const wide = prove(edited(end, 0, ...round(0.105)), { target });
    expect(errorsOf(wide)).toEqual(['prove.crossing']);
    expect(wide.figures!.crossingGouge).toBeCloseTo(0.005, 4);
    const narrow = prove(edited(end, 0, ...round(0.095)), { target });
    expect(narrow.figures!.crossingLeft).toBeCloseTo(0.005, 4);
    const uncut = prove(GOOD, { target });
    expect(errorsOf(uncut)).toEqual(['prove.missing', 'prove.crossing']);
    expect(findingOf(uncut, 'prove.missing').message).toBe('nothing here cuts the crossings');
  });

  it('come last, or a warning says so', () => {
    const proof = prove(edited(roughing, 0, ...round(0.1)), { target });
    expect(errorsOf(proof)).toEqual([]);
    expect(findingOf(proof, 'prove.order').severity).toBe('warning');
  });
});
