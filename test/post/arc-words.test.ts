import { describe, expect, it } from 'vitest';
import { failure } from '../../src/base/problem.ts';
import type { ArcStep, Position } from '../../src/motion/motion.ts';
import { arcOnGrid } from '../../src/post/arc-on-grid.ts';
import { programGrid } from '../../src/post/program-grid.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { headerFacts } from '../support/header-facts.ts';
import { changedMachine, postMachine } from '../support/post-machines.ts';
import { blocksOf } from '../support/post-text.ts';

const drop = { trailingZeros: 'drop' } as const;
const bench = changedMachine(postMachine('bench-mill'), { numbers: drop });
const three = changedMachine(bench, { numbers: { lengthDecimals: { mm: 3, inch: 4 } } });

function arc(
  from: Position,
  centre: { x: number; y: number },
  degrees: number,
  to?: Partial<Position>,
): ArcStep {
  const turn = (degrees * Math.PI) / 180;
  const [dx, dy] = [from.x - centre.x, from.y - centre.y];
  return {
    kind: 'arc',
    to: {
      x: centre.x + dx * Math.cos(turn) - dy * Math.sin(turn),
      y: centre.y + dx * Math.sin(turn) + dy * Math.cos(turn),
      z: from.z,
      ...to,
    },
    centre,
    turn,
    feed: 100,
  };
}

/** Of arcs by their centre from the start: how far a controller that goes from radius to radius gets off a circle. */
function farthestOff(
  blocks: readonly string[],
  at: { readonly x: number; readonly y: number },
  centre: { readonly x: number; readonly y: number },
  radius: number,
): number {
  let { x, y } = at;
  let worst = 0;
  for (const block of blocks) {
    const word = (letter: string, other: number): number =>
      Number(new RegExp(`${letter}(-?[\\d.]+)`).exec(block)?.[1] ?? other);
    const about = { x: x + word('I', 0), y: y + word('J', 0) };
    const end = { x: word('X', x), y: word('Y', y) };
    const [r0, r1] = [Math.hypot(x - about.x, y - about.y), Math.hypot(end.x - about.x, end.y - about.y)];
    const a0 = Math.atan2(y - about.y, x - about.x);
    const a1 = Math.atan2(end.y - about.y, end.x - about.x);
    const way = /G2/.test(blocks[0] ?? '') ? -1 : 1;
    const whole = 2 * Math.PI;
    const swept = (way * (a1 - a0) + 2 * whole) % whole || whole;
    for (let u = 0; u <= 1; u += 1 / 256) {
      const [r, angle] = [r0 + u * (r1 - r0), a0 + way * u * swept];
      const place = { x: about.x + r * Math.cos(angle), y: about.y + r * Math.sin(angle) };
      worst = Math.max(worst, Math.abs(Math.hypot(place.x - centre.x, place.y - centre.y) - radius));
    }
    ({ x, y } = end);
  }
  return worst;
}

const start: Position = { x: 3, y: 0, z: -1 };
const about = { x: 0, y: 0 };

describe('forms of an arc [NISTIR 6556 section 3.5.3]', () => {
  it('centre from the start, one block, a helix with Z', () => {
    const steps = [arc(start, about, 90), arc({ x: 0, y: 3, z: -1 }, about, -90, { z: -2 })];
    expect(blocksOf(bench, start, steps)).toEqual(['G3 X0 Y3 I-3 F100', 'G2 X3 Y0 Z-2 J-3']);
  });

  it('from (7,7) about (10,11), radius 5 [NISTIR 6556 section 3.5.3.2, its example, turned counter-clockwise]', () => {
    const from: Position = { x: 7, y: 7, z: 0 };
    const to = { x: 10, y: 16 };
    const turn = (Math.atan2(5, 0) - Math.atan2(-4, -3)) * (180 / Math.PI) - 360;
    expect(blocksOf(bench, from, [arc(from, { x: 10, y: 11 }, turn, to)])).toEqual(['G2 X10 Y16 I3 J4 F100']);
  });

  it('a whole circle in one block names both ends and both centre words where zeros are written', () => {
    const machine = changedMachine(bench, { arcs: { zeroWords: 'write', endWords: 'changed' } });
    expect(blocksOf(machine, start, [arc(start, about, 360, start)])).toEqual(['G3 X3 Y0 I-3 J0 F100']);
  });

  it('a whole circle split where the machine takes one for nothing', () => {
    const machine = changedMachine(bench, { arcs: { wholeCircle: 'split' } });
    expect(blocksOf(machine, start, [arc(start, about, -360, start)])).toEqual([
      'G2 X-3 Y0 I-3 F100',
      'X3 Y0 I3',
    ]);
  });

  it('radius form in pieces of 120 degrees, never one of more than half a turn', () => {
    const machine = changedMachine(bench, { arcs: { centre: 'radius' } });
    const blocks = blocksOf(machine, start, [arc(start, about, 360, start)]);
    expect(blocks).toEqual(['G3 X-1.5 Y2.5981 R3 F100', 'X-1.5 Y-2.5981 R3', 'X3 Y0 R3']);
  });

  it('quadrants end on the axes of the circle', () => {
    const machine = changedMachine(bench, { arcs: { quadrants: true } });
    expect(blocksOf(machine, start, [arc(start, about, 200, {})])).toEqual([
      'G3 X0 Y3 I-3 F100',
      'X-3 Y0 J-3',
      'X-2.8191 Y-1.0261 I3',
    ]);
  });

  it('longest sweep cuts in equal parts', () => {
    const machine = changedMachine(bench, { arcs: { longestSweep: 90 } });
    const blocks = blocksOf(machine, start, [arc(start, about, 180, {})]);
    expect(blocks).toEqual(['G3 X0 Y3 I-3 F100', 'X-3 Y0 J-3']);
  });

  it('a helix where there is none becomes a ramp of chords that ends where it should, within the chord tolerance', () => {
    const machine = changedMachine(bench, { arcs: { helix: false, chordTolerance: 0.01 } });
    const blocks = blocksOf(machine, start, [arc(start, about, 360, { ...start, z: -2 })]);
    // Sag of a chord over t radians: r (1 - cos(t/2)); 2 pi over 2 acos(1 - 0.01/3) is 38.5 chords.
    expect(blocks).toHaveLength(39);
    expect(blocks.every((block) => !/G[23]/.test(block))).toBe(true);
    expect(blocks.at(-1)).toBe('X3 Y0 Z-2');
  });
});

describe('arcs after rounding', () => {
  it('is never a full circle by accident: ends that round together are a line or nothing', () => {
    const tiny = arc(start, { x: 2.99999, y: 0 }, 170);
    expect(blocksOf(bench, start, [tiny])).toEqual([]);
    const small = arc(start, { x: 2.9999, y: 0 }, 170);
    expect(blocksOf(bench, start, [small])).toEqual(['G1 X2.9998 F100']);
  });

  it('does not drift when a thousand arcs too small to write follow each other', () => {
    const steps: ArcStep[] = [];
    let from = start;
    for (let i = 0; i < 1000; i++) {
      const step = arc(from, { x: from.x + 0.00002, y: from.y }, -90);
      steps.push(step);
      from = step.to;
    }
    const blocks = blocksOf(bench, start, steps);
    const last = (letter: string): string =>
      blocks.findLast((block) => block.includes(letter))?.match(new RegExp(`${letter}(\\S+)`))?.[1] ?? '';
    expect(Number(last('X'))).toBeCloseTo(from.x, 4);
    expect(Number(last('Y'))).toBeCloseTo(from.y, 4);
  });

  it('is a line where the start, as written, has passed the end: the controller would turn nearly all the way round', () => {
    const step = arc(start, about, 0.01);
    const past = { x: 30000, y: 25, z: -10000 };
    const moves = arcOnGrid(programGrid(bench), bench.words.arcs, start, past, step);
    expect(moves).toEqual([{ kind: 'line', x: 30000, y: 5, z: -10000 }]);
  });

  it('almost a whole circle is halved where its ends nearly meet', () => {
    const blocks = blocksOf(bench, start, [arc(start, about, 359.99)]);
    expect(blocks).toHaveLength(2);
    expect(blocks[0]).toMatch(/^G3 X-3 /);
  });

  it('an arc of 0.1 degree on 500 mm that stands above its chord by less than the last digit is a line', () => {
    const from: Position = { x: 500, y: 0, z: 0 };
    // Sag 500 (1 - cos 0.05 deg) = 0.00019 mm [the sagitta of a circle]: three decimals cannot show it.
    expect(blocksOf(three, from, [arc(from, about, 0.1)])).toEqual(['G1 X499.999 Y0.873 F100']);
    expect(blocksOf(bench, from, [arc(from, about, 0.1)])[0]).toMatch(/^G3 /);
  });

  it('moves the centre by a digit where three decimals would miss by more than 0.002 mm [NISTIR 6556 section 3.5.3.2]', () => {
    // Half a circle at 45 degrees is the worst: start, end and centre all rounded half a digit the wrong way.
    const half = 0.000499;
    const centre = { x: half, y: half };
    const reach = 1 - half * 2;
    const from: Position = { x: centre.x + reach, y: centre.y + reach, z: 0 };
    const step = arc(from, centre, 180);
    const [x0, y0] = [from.x, from.y].map((mm) => Math.round(mm * 1000));
    const [x1, y1] = [step.to.x, step.to.y].map((mm) => Math.round(mm * 1000));
    const plainMiss = Math.abs(Math.hypot(x0 ?? 0, y0 ?? 0) - Math.hypot(x1 ?? 0, y1 ?? 0)) / 1000;
    expect(plainMiss).toBeGreaterThan(0.001);
    const machine = changedMachine(three, { arcs: { missAbsolute: { mm: plainMiss * 0.9, inch: 0.0001 } } });
    const block = blocksOf(machine, from, [step])[0] ?? '';
    const [, x, y, i, j] = /X(\S+) Y(\S+) I(\S+) J(\S+)/.exec(block)?.map(Number) ?? [];
    const [cx, cy] = [(x0 ?? 0) / 1000 + (i ?? NaN), (y0 ?? 0) / 1000 + (j ?? NaN)];
    const miss = Math.abs(Math.hypot(i ?? NaN, j ?? NaN) - Math.hypot((x ?? NaN) - cx, (y ?? NaN) - cy));
    expect(miss).toBeLessThan(plainMiss * 0.9);
    expect(Math.hypot(cx - centre.x, cy - centre.y)).toBeLessThan(0.002);
  });

  it.each([180, 200, 270, 355, 360, -270])(
    '%d degrees stay within a unit of the last digit, start and centre rounded apart as far as can be',
    (degrees) => {
      const centre = { x: 0.000499, y: 0.000499 };
      // Half a unit of its height is lost too, which leaves less room across.
      const from: Position = { x: 2.000501, y: 2.000501, z: 0.000499 };
      const step = arc(from, centre, degrees, degrees === 360 ? from : {});
      const rounded = { x: 2.001, y: 2.001 };
      // About the plainly rounded centre the far side would lie off by twice its rounding and that of the start: 2.1 units.
      const plain = Math.hypot(rounded.x, rounded.y) + Math.hypot(centre.x, centre.y);
      expect(plain - Math.hypot(from.x - centre.x, from.y - centre.y)).toBeGreaterThan(0.0019);
      const blocks = blocksOf(three, from, [step]);
      expect(blocks.every((block) => !block.startsWith('G1'))).toBe(true);
      const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
      expect(Math.hypot(farthestOff(blocks, rounded, centre, radius), from.z)).toBeLessThan(0.001);
    },
  );

  it('says so where no centre on the grid will do', () => {
    const machine = changedMachine(bench, {
      numbers: { lengthDecimals: { mm: 1, inch: 2 } },
      arcs: { missAbsolute: { mm: 0.00001, inch: 0.000001 } },
    });
    const motion = { steps: [{ kind: 'rapid', to: start } as const, arc(start, { x: 0.321, y: 0.123 }, 77)] };
    const outcome = writeProgram({
      machine,
      name: 'a',
      suffix: '',
      label: 1,
      motion,
      header: headerFacts(motion),
    });
    expect(outcome).toEqual(failure([expect.objectContaining({ code: 'post.arc', severity: 'error' })]));
  });

  it('judges by the share of the radius too, where the controller does', () => {
    const strict = { missAbsolute: { mm: 0.00001, inch: 0.000001 } };
    const steps = [arc(start, { x: 0.32121, y: 0.12347 }, 77)];
    const shared = changedMachine(three, { arcs: { ...strict, missShare: 0.001, missAtMost: 0.5 } });
    expect(blocksOf(shared, start, steps)[0]).toMatch(/^G3 /);
    expect(() => blocksOf(changedMachine(three, { arcs: strict }), start, steps)).toThrow('off its circle');
  });
});
