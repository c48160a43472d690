/**
 * Random motions that a program can be asked to write: lines, arcs from a hundredth of the last digit to metres round,
 * whole circles, helices, feeds, speeds, waits, stops, cutter changes, notes that want to be words. mm, radians.
 */
import * as fc from 'fast-check';
import type { Machine } from '../../src/machine/machine.ts';
import type { Motion, Position, Step } from '../../src/motion/motion.ts';

const CLEAR = 5;

interface LineSeed {
  readonly kind: 'line' | 'rapid';
  readonly to: Position;
  readonly feed: number;
}

interface ArcSeed {
  readonly kind: 'arc';
  readonly size: number;
  readonly angle: number;
  readonly turn: number;
  /** mm, or the share of the arc's length that is less. */
  readonly rise: number;
  readonly feed: number;
}

interface Interruption {
  readonly kind: 'stop' | 'cutter' | 'top';
  readonly number: number;
  readonly text: string;
}

type Seed =
  | LineSeed
  | ArcSeed
  | Interruption
  | { readonly kind: 'spindle'; readonly part: number }
  | { readonly kind: 'dwell'; readonly seconds: number }
  | { readonly kind: 'note'; readonly text: string };

const real = (min: number, max: number): fc.Arbitrary<number> => fc.double({ min, max, noNaN: true });
const place = fc.record({ x: real(-60, 60), y: real(-60, 60), z: real(-3, 6) });
/** Ten to the power: sizes spread over all decades. */
const size = real(-5.5, 1.7).map((power) => 10 ** power);
const turn = fc.oneof(
  { weight: 3, arbitrary: real(0.01, 2 * Math.PI) },
  { weight: 1, arbitrary: fc.constantFrom(Math.PI / 2, Math.PI, 1.5 * Math.PI) },
  { weight: 1, arbitrary: fc.constant(2 * Math.PI) },
  { weight: 1, arbitrary: real(2 * Math.PI - 0.01, 2 * Math.PI) },
);

/** Texts that would move the machine if one got out of its comment. */
const note = fc.oneof(
  fc.constantFrom('G0 Z-50', ') G1 X99 (', '; M3 S9000', '%', '/G1 X5', 'x\nG0 Z-99', 'N10 G28', 'Z-5', 'MSG, G0 X1', '#1=5', 'é – ½ ⌀', '(((', 'T5 M6', 'O1234'),
  fc.string({ unit: 'grapheme', maxLength: 60 }),
  fc.string({ unit: 'binary-ascii', maxLength: 60 }),
); // prettier-ignore

const feed = fc.oneof(real(10, 600), fc.constantFrom(60, 120, 150));

const seed: fc.Arbitrary<Seed> = fc.oneof(
  { weight: 5, arbitrary: fc.record({ kind: fc.constantFrom('line', 'rapid'), to: place, feed }) },
  {
    weight: 8,
    arbitrary: fc.record({
      kind: fc.constant('arc' as const),
      size,
      angle: real(-Math.PI, Math.PI),
      turn: fc.tuple(turn, fc.constantFrom(1, -1)).map(([t, way]) => t * way),
      rise: fc.oneof({ weight: 2, arbitrary: fc.constant(0) }, { weight: 1, arbitrary: real(-1, 1) }),
      feed,
    }),
  },
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('spindle' as const), part: real(0, 1) }) },
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('dwell' as const), seconds: real(0.001, 9) }) },
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('note' as const), text: note }) },
  {
    weight: 1,
    arbitrary: fc.record({
      kind: fc.constantFrom('stop', 'cutter', 'top'),
      number: fc.integer({ min: 1, max: 20 }),
      text: note,
    }),
  },
);

export function randomMotion(machine: Machine): fc.Arbitrary<Motion> {
  return fc
    .tuple(fc.array(seed, { minLength: 1, maxLength: 24 }), place)
    .map(([seeds, begin]) => motionOf(machine, seeds, begin));
}

function motionOf(machine: Machine, seeds: readonly Seed[], begin: Position): Motion {
  const { spindleLowest, spindleHighest } = machine.limits;
  let speed = Math.round((spindleLowest + spindleHighest) / 2);
  const steps: Step[] = [
    { kind: 'top' },
    { kind: 'cutter', number: 1, say: ['fit it'] },
    { kind: 'spindle', speed },
  ];
  let at: Position | undefined;
  const stand = (): Position => {
    if (at === undefined) {
      at = { ...begin, z: CLEAR };
      steps.push({ kind: 'rapid', to: at });
    }
    return at;
  };
  for (const one of seeds) {
    if (one.kind === 'spindle') {
      speed = Math.round(spindleLowest + one.part * (spindleHighest - spindleLowest));
      steps.push({ kind: 'spindle', speed });
      at = machine.words.spindle.run === 'by-hand' ? undefined : at;
    } else if (one.kind === 'note') {
      steps.push({ kind: 'note', text: one.text });
    } else if (one.kind === 'dwell') {
      steps.push(
        ...(machine.words.dwell.letter === 'none' ? [] : [{ kind: 'dwell', seconds: one.seconds } as const]),
      );
    } else if (one.kind === 'stop' || one.kind === 'cutter' || one.kind === 'top') {
      const changed = interrupt(machine, one, steps, speed);
      at = changed ? undefined : at;
    } else if (one.kind === 'arc' || one.kind === 'line' || one.kind === 'rapid') {
      at = moved(steps, stand(), one);
    }
  }
  stand();
  steps.push({ kind: 'spindle', speed: 0 }, { kind: 'top' });
  return { steps };
}

/** After it the place is not known; the spindle is started again. */
function interrupt(machine: Machine, one: Interruption, steps: Step[], speed: number): boolean {
  if (one.kind === 'cutter' && machine.words.cutters.change === 'one-program') {
    return false;
  }
  if (one.kind === 'top') {
    steps.push({ kind: 'top' });
    return true;
  }
  steps.push(
    one.kind === 'stop'
      ? { kind: 'stop', say: [one.text] }
      : { kind: 'cutter', number: one.number, say: [one.text] },
  );
  steps.push({ kind: 'spindle', speed });
  return true;
}

function moved(steps: Step[], from: Position, one: LineSeed | ArcSeed): Position {
  if (one.kind !== 'arc') {
    steps.push(
      one.kind === 'line' ? { kind: 'line', to: one.to, feed: one.feed } : { kind: 'rapid', to: one.to },
    );
    return one.to;
  }
  const centre = { x: from.x - one.size * Math.cos(one.angle), y: from.y - one.size * Math.sin(one.angle) };
  const end = one.angle + one.turn;
  const z = from.z + one.rise * Math.min(1, one.size * Math.abs(one.turn));
  const isWhole = Math.abs(one.turn) === 2 * Math.PI;
  const to = isWhole
    ? { ...from, z }
    : { x: centre.x + one.size * Math.cos(end), y: centre.y + one.size * Math.sin(end), z };
  steps.push({ kind: 'arc', to, centre, turn: one.turn, feed: one.feed });
  return to;
}
