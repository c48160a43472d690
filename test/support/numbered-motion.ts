/** Random motions for every machine file: a start from the top, then any moves, each after a note that numbers it. */
import * as fc from 'fast-check';
import type { ArcStep, Motion, MoveStep, Position, Step } from '../../src/motion/motion.ts';

export interface NumberedMotion {
  readonly motion: Motion;
  /** The moves that were numbered, in order, and where each began. */
  readonly moves: readonly { readonly from: Position; readonly step: MoveStep }[];
}

interface Seed {
  readonly kind: 'rapid' | 'line' | 'arc' | 'circle' | 'nudge';
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly size: number;
  readonly turn: number;
  readonly angle: number;
  readonly feed: number;
  readonly climbs: boolean;
}

const real = (min: number, max: number): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const seed: fc.Arbitrary<Seed> = fc.record({
  kind: fc.constantFrom('rapid', 'line', 'arc', 'arc', 'arc', 'circle', 'nudge'),
  x: real(-60, 60),
  y: real(-60, 60),
  z: real(-3, 6),
  size: real(-5, 1.9).map((power) => 10 ** power),
  turn: fc.oneof(
    real(-2 * Math.PI, 2 * Math.PI),
    real(-0.05, 0.05),
    fc.constantFrom(Math.PI, -Math.PI, 6.2831),
  ),
  angle: real(0, 2 * Math.PI),
  feed: real(20, 700),
  climbs: fc.boolean(),
});

export function numberedMotion(clear: number): fc.Arbitrary<NumberedMotion> {
  return fc.array(seed, { minLength: 1, maxLength: 25 }).map((seeds) => motionOf(seeds, clear));
}

function motionOf(seeds: readonly Seed[], clear: number): NumberedMotion {
  let place: Position = { x: 0, y: 0, z: clear };
  const steps: Step[] = [
    { kind: 'top' },
    { kind: 'cutter', number: 3, say: [] },
    { kind: 'spindle', speed: 12000 },
    { kind: 'rapid', to: place },
  ];
  const moves: { from: Position; step: MoveStep }[] = [];
  for (const each of seeds) {
    const step = moveOf(each, place);
    steps.push({ kind: 'note', text: `step ${moves.length}` }, step);
    moves.push({ from: place, step });
    place = step.to;
  }
  steps.push({ kind: 'note', text: `step ${moves.length}` });
  steps.push({ kind: 'rapid', to: { ...place, z: clear } }, { kind: 'spindle', speed: 0 }, { kind: 'top' });
  return { motion: { steps }, moves };
}

function moveOf(of: Seed, from: Position): MoveStep {
  switch (of.kind) {
    case 'rapid':
      return { kind: 'rapid', to: { x: of.x, y: of.y, z: of.z } };
    case 'line':
      return { kind: 'line', to: { x: of.x, y: of.y, z: of.z }, feed: of.feed };
    case 'nudge': {
      const to = {
        x: from.x + of.size * Math.cos(of.angle),
        y: from.y + of.size * Math.sin(of.angle),
        z: from.z,
      };
      return { kind: 'line', to, feed: of.feed };
    }
    case 'arc':
      return arcOf(of, from, of.turn);
    case 'circle':
      return arcOf(of, from, of.turn < 0 ? -2 * Math.PI : 2 * Math.PI);
  }
}

function arcOf(of: Seed, from: Position, turn: number): ArcStep {
  const centre = { x: from.x - of.size * Math.cos(of.angle), y: from.y - of.size * Math.sin(of.angle) };
  const whole = Math.abs(turn) === 2 * Math.PI;
  const end = of.angle + turn;
  const to = {
    x: whole ? from.x : centre.x + of.size * Math.cos(end),
    y: whole ? from.y : centre.y + of.size * Math.sin(end),
    z: of.climbs ? from.z - (of.size * Math.abs(turn)) / 20 : from.z,
  };
  return { kind: 'arc', to, centre, turn, feed: of.feed };
}
