/**
 * Forms that the sample does not have, each against what is true by construction: a cutter wedged between two flanks, root
 * fillets, an addendum of one arc, and a blank turned to the tips' diameter beforehand.
 */
import { describe, expect, it } from 'vitest';
import { toothFigures, type ToothFigures } from '../../src/prove/deviation-depths.ts';
import { REGION } from '../../src/prove/deviation-stations.ts';
import { pathsBelow } from '../../src/prove/metal-paths.ts';
import { solidMoves } from '../../src/prove/metal-solids.ts';
import type { WheelForm } from '../../src/tooth/wheel.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import { edited, errorsOf, findingOf, GOOD, lineOf, prove, withSetup } from '../support/damage.ts';
import { exactWheel } from '../support/exact-wheel.ts';
import { FORM as SMALL, TARGET } from '../support/good-program.ts';
import { loopMoves } from '../support/offset-path.ts';

/** 0.1 um, to which the proof is to find its figures. */
const FOUND_TO = 1e-4;
const HEIGHTS = { top: 0, bottom: -1.5, slack: 1e-4 };

/** One loop of a cutter of this radius, its axis `offset` off the exact outline; by the path of another form, where asked. */
function figuresOf(form: WheelForm, radius: number, offset: number, along = form): ToothFigures {
  const moves = loopMoves(along, offset, -1.6);
  const solids = solidMoves(moves, () => radius);
  const paths = pathsBelow(solids, HEIGHTS.bottom + HEIGHTS.slack, HEIGHTS.top - HEIGHTS.slack);
  return toothFigures(solids, paths, form, 2 * radius, HEIGHTS, 0.0011);
}

function near(value: number | undefined, expected: number): void {
  expect(Math.abs((value ?? Number.NaN) - expected)).toBeLessThan(FOUND_TO);
}

/** Half the angle between two flanks of 60 teeth that are as wide as their spaces. */
const HALF_SPACE = Math.PI / 120;

describe('a cutter wedged between two flanks [its axis is r / sin(half the angle between them) from the centre]', () => {
  const form = exactWheel(60, 0.5, 8);
  const radius = 0.385;
  const axis = radius / Math.sin(HALF_SPACE);

  /** The greatest distance to root circle or flank of any point of the cutter's own arc. */
  function thickest(): number {
    let most = 0;
    for (let k = 0; k <= 100_000; k++) {
      const along = (k / 100_000) * (Math.PI / 2);
      const [x, y] = [axis - radius * Math.cos(along), radius * Math.sin(along)];
      const rho = Math.hypot(x, y);
      most = Math.max(most, Math.min(rho - form.rootRadius, rho * Math.sin(HALF_SPACE - Math.atan2(y, x))));
    }
    return most;
  }

  it('leaves at the root what is below it, and nothing on the flanks it touches', () => {
    expect(axis).toBeGreaterThan(form.rootRadius + radius);
    const { atTop, atBottom } = figuresOf(form, radius, radius);
    near(atBottom.left[REGION.root]?.value, thickest());
    near(atBottom.left[REGION.flank]?.value, 0);
    near(atBottom.rootMiss.value, 0);
    near(atTop.gouge.value, 0);
  });

  it.each([0.0004, 0.001])(
    'that stands %f mm off the flanks stands off the root by that over the sine',
    (d) => {
      const { atBottom, rootFactor } = figuresOf(form, radius, radius + d);
      expect(rootFactor).toBeCloseTo(1 / Math.sin(HALF_SPACE), 6);
      const out = d / Math.sin(HALF_SPACE);
      near(atBottom.rootMiss.value, out);
      // At the flank's foot the cutter has gone out along the space by so much that its rim curves away from it.
      const lateral = out * Math.cos(HALF_SPACE);
      near(atBottom.left[REGION.flank]?.value, radius + d - Math.sqrt(radius ** 2 - lateral ** 2));
    },
  );

  it.each([0.002, 0.01])('that goes %f mm into the flanks is found', (d) => {
    near(figuresOf(form, radius, radius - d).atTop.gouge.value, d);
  });
});

describe("root fillets [fillet of 0.3 mm, cutter of radius 0.25: an arc of 0.05 round the fillet's centre]", () => {
  const form = exactWheel(60, 0.5, 8, 0.3);
  const radius = 0.25;

  it('are cut whole, with nothing left', () => {
    const { atTop, atBottom } = figuresOf(form, radius, radius);
    near(atBottom.left[REGION.root]?.value, 0);
    near(atBottom.left[REGION.flank]?.value, 0);
    near(atTop.gouge.value, 0);
  });

  it.each([0.0006, 0.004])('and keep %f mm where the path stands off by it', (d) => {
    const { atBottom } = figuresOf(form, radius, radius + d);
    near(atBottom.rootMiss.value, d);
    near(atBottom.left[REGION.root]?.value, d);
    near(atBottom.left[REGION.flank]?.value, d);
  });

  it.each([0.0006, 0.004])('and are seen to be cut into by %f mm', (d) => {
    near(figuresOf(form, radius, radius - d).atTop.gouge.value, d);
  });

  it('are missed by the path of a wheel with sharp corners: it cuts them away', () => {
    // Sharp: the axis is r off flank and root circle, where the fillet's own surface is (f - r)(sqrt 2 - 1) nearer, the flank
    // and root circle taken for straight.
    const { atTop } = figuresOf(form, radius, radius, exactWheel(60, 0.5, 8));
    expect(Math.abs(atTop.gouge.value - 0.05 * (Math.SQRT2 - 1))).toBeLessThan(0.001);
  });
});

describe('an addendum of one arc', () => {
  const made = wheelForm({ ...exactWheel(60, 0.5, 8).proportions, addendumForm: 'arc', height: 0.8 });
  if (!made.ok) {
    throw new Error(JSON.stringify(made.problems));
  }
  const form = made.value;
  const radius = 0.25;

  it('is followed by one arc of the cutter, with nothing left and nothing cut into', () => {
    expect(form.sector.some(({ role, piece }) => role === 'addendum' && piece.kind === 'arc')).toBe(true);
    const { atTop, atBottom, rolling } = figuresOf(form, radius, radius);
    near(atBottom.left[REGION.flank]?.value, 0);
    near(atTop.gouge.value, 0);
    // It is not rolled, and is not held against the rolling law.
    expect(rolling.share).toBe(0);
  });

  it.each([0.0006, 0.004])('keeps and loses %f mm as the path stands off and in by it', (d) => {
    near(figuresOf(form, radius, radius + d).atBottom.left[REGION.flank]?.value, d);
    near(figuresOf(form, radius, radius - d).atTop.gouge.value, d);
  });

  it('is said not to follow the rolling law', () => {
    const target = {
      ...TARGET,
      form: { ...SMALL, proportions: { ...SMALL.proportions, addendumForm: 'arc' } },
    } as const;
    expect(prove(GOOD, { target }).notChecked.join(' ')).toMatch(/one arc/);
    expect(prove(GOOD).notChecked.join(' ')).not.toMatch(/one arc/);
  });
});

describe('a blank turned to the tips beforehand', () => {
  const turned = withSetup({ shape: { kind: 'disc', diameter: 2 * SMALL.outsideRadius } });

  it('lets what is left between two paths in a space come loose, which in a sheet its edge holds', () => {
    expect(errorsOf(prove(GOOD))).toEqual([]);
    const proof = prove(GOOD, turned);
    expect(errorsOf(proof)).toEqual(['prove.loose']);
    const { x, y } = findingOf(proof, 'prove.loose');
    const spaces = Math.atan2(y ?? 0, x ?? 0) / (Math.PI / 4) - 0.5;
    // A space is half a pitch wide.
    expect(Math.abs(spaces - Math.round(spaces))).toBeLessThan(0.25);
  });

  it('keeps its tips without a word where the path stands off them, as a sheet may not', () => {
    const over = GOOD.flatMap((line) => overTips(line, SMALL.outsideRadius + 0.3, 0.1));
    expect(over.length).toBeGreaterThan(GOOD.length);
    expect(errorsOf(prove(over))).toEqual(['prove.left']);
    expect(findingOf(prove(over), 'prove.left').message).toMatch(/the tip of tooth/);
    expect(errorsOf(prove(over, turned))).toEqual(['prove.loose']);
  });

  it('may be gone down beside, fast, where a sheet is still metal', () => {
    const beside = edited(lineOf('(ROUGHING)'), 0, 'G0 X8 Y0', 'G0 Z-0.5', 'G0 Z5');
    expect(errorsOf(prove(beside, turned))).not.toContain('prove.fast-move');
    const proof = prove(beside);
    expect(errorsOf(proof)).toEqual(['prove.fast-move']);
    expect(findingOf(proof, 'prove.fast-move').line).toBe(lineOf('(ROUGHING)') + 2);
  });

  it('is metal up to its edge: going down over the tips is refused', () => {
    const tip = `G0 X${SMALL.outsideRadius.toFixed(3)} Y0`;
    const over = edited(lineOf('(ROUGHING)'), 0, tip, 'G0 Z-0.5', 'G0 Z5');
    expect(errorsOf(prove(over, turned))).toContain('prove.fast-move');
  });
});

/** An arc round the axis at this radius, run straight by way of a place `out` beyond the middle of its land. */
function overTips(line: string, radius: number, out: number): string[] {
  const word = (letter: string): number =>
    Number(new RegExp(`${letter}(-?[\\d.]+)`).exec(line)?.[1] ?? Number.NaN);
  const end = { x: word('X'), y: word('Y') };
  if (!line.startsWith('G3') || Math.abs(Math.hypot(word('I'), word('J')) - radius) > 1e-3) {
    return [line];
  }
  const pitch = Math.PI / 4;
  const tooth = Math.round(Math.atan2(end.y, end.x) / pitch) * pitch;
  const far = { x: (radius + out) * Math.cos(tooth), y: (radius + out) * Math.sin(tooth) };
  return [far, end].map(({ x, y }) => `G1 X${x.toFixed(4)} Y${y.toFixed(4)} F150`);
}
