/**
 * A small good program, written by hand rules and nothing of the maker's: an eight-toothed wheel in a glued sheet 1 mm thick, bored
 * by a helix and two rings, its teeth cut in one descent that falls on the flanks, then finished. For a bench mill of RS274/NGC.
 */
import type { Setup } from '../../src/cutting/setup.ts';
import type { Machine } from '../../src/machine/machine.ts';
import type { ProofInput, Target } from '../../src/prove/proof.ts';
import { exactWheel } from './exact-wheel.ts';
import { offsetPath, pathStart, type PathMove, type PathOptions } from './offset-path.ts';
import { postMachine } from './post-machines.ts';

export const DIAMETER = 0.6;
export const FORM = exactWheel(8, 1, 8);

export const SETUP: Setup = {
  material: 'leaded-brass',
  shape: { kind: 'sheet', width: 24, height: 24 },
  topZ: 0,
  plateZ: -1,
  clearZ: 5,
  intoPlate: 0.1,
  bored: 0,
  holding: ['glue'],
  skin: 0,
  obstacles: [],
  cutters: [
    {
      number: 1,
      diameter: DIAMETER,
      nominal: 0.6,
      flutes: 2,
      reach: 3,
      flute: 2,
      shank: 3,
      stickOut: 14,
      runout: 0.005,
      plunges: false,
    },
  ],
};

export const TARGET: Target = {
  form: FORM,
  thickness: 1,
  bore: 2,
  finishingDiameter: DIAMETER,
  slugsHeld: false,
};

export interface GoodOptions extends PathOptions {
  /** Added to the offset of the finishing path. */
  readonly error?: number;
  readonly deepest?: number;
}

export function goodInput(lines: readonly string[], changes: Partial<ProofInput> = {}): ProofInput {
  return {
    programs: [{ file: 'good.ngc', text: `${lines.join('\n')}\n` }],
    machine: machine(),
    setup: SETUP,
    target: TARGET,
    ...changes,
  };
}

let bench: Machine | undefined;

export function machine(): Machine {
  bench ??= postMachine('bench-mill');
  return bench;
}

export function goodLines(options: GoodOptions = {}): string[] {
  const deepest = options.deepest ?? -1.1;
  const finish = DIAMETER / 2 + (options.error ?? 0);
  const rough = DIAMETER / 2 + 0.03;
  const pen = makePen();
  const start = pathStart(FORM, rough);
  return [
    '%',
    'G21 G17 G40 G49 G54 G61 G80 G90 G94 G98',
    'G53 G0 Z0',
    'T1 M6',
    'G43 H1',
    'S12000',
    'M3',
    'G4 P4',
    '(BORE)',
    ...pen.rapid({ x: 0.25, y: 0, z: 5 }),
    ...pen.rapid({ z: 0.2 }),
    ...Array.from({ length: BORE_LEVELS }, (_, k) =>
      boreLevel(pen, 0.2 + ((deepest - 0.2) * (k + 1)) / BORE_LEVELS),
    ).flat(),
    pen.ring(deepest),
    ...pen.rapid({ z: 5 }),
    '(ROUGHING)',
    ...pen.rapid({ x: start.x, y: start.y }),
    ...pen.rapid({ z: 0.2 }),
    ...descent(pen, offsetPath(FORM, rough, options), 0.2, deepest, 13),
    ...offsetPath(FORM, rough, options).map((move) => pen.move(move)),
    '(FINISHING)',
    pen.line(pathStart(FORM, finish)),
    ...offsetPath(FORM, finish, options).map((move) => pen.move(move)),
    ...pen.rapid({ z: 5 }),
    'M5',
    'G53 G0 Z0',
    'G49',
    'G90 G94 G40 G80 G61',
    'M2',
    '%',
  ];
}

const BORE_LEVELS = 20;

/** Down by a turn of the inner ring, once round the outer one, and back. */
function boreLevel(pen: Pen, z: number): string[] {
  const inner = pen.ring(z);
  return [inner, pen.line({ x: 0.7, y: 0 }), pen.ring(z), pen.line({ x: 0.25, y: 0 })];
}

/** Laps that fall on the straight flanks only. */
function descent(pen: Pen, lap: readonly PathMove[], from: number, to: number, laps: number): string[] {
  const falls = lap.filter((move) => move.centre === undefined).length * laps;
  const lines: string[] = [];
  let fallen = 0;
  for (let k = 0; k < laps; k++) {
    for (const move of lap) {
      if (move.centre === undefined) {
        fallen += 1;
        lines.push(pen.line({ ...move.to, z: from + ((to - from) * fallen) / falls }));
      } else {
        lines.push(pen.move(move));
      }
    }
  }
  return lines;
}

interface Pen {
  readonly rapid: (to: Partial<Record<'x' | 'y' | 'z', number>>) => string[];
  readonly line: (to: { x: number; y: number; z?: number }) => string;
  readonly move: (move: PathMove) => string;
  readonly ring: (z: number) => string;
}

/** Writes words and knows where it stands, rounded as the words are. */
function makePen(): Pen {
  const at = { x: 0, y: 0, z: 0 };
  const round = (value: number): number => Math.round(value * 1e4) / 1e4;
  const word = (letter: string, value: number): string => `${letter}${round(value).toFixed(4)}`;
  const go = (to: Partial<typeof at>): string => {
    Object.assign(at, Object.fromEntries(Object.entries(to).map(([key, value]) => [key, round(value)])));
    return Object.entries(to)
      .map(([key, value]) => word(key.toUpperCase(), value))
      .join(' ');
  };
  const arc = (centre: { x: number; y: number }, turn: number, to: Partial<typeof at>): string => {
    const spoke = `${word('I', centre.x - at.x)} ${word('J', centre.y - at.y)}`;
    return `G${turn > 0 ? '3' : '2'} ${go(to)} ${spoke} F150`;
  };
  return {
    rapid: (to) => [`G0 ${go(to)}`],
    line: (to) => `G1 ${go(to)} F150`,
    move: ({ to, centre, turn }) => (centre === undefined ? `G1 ${go(to)} F150` : arc(centre, turn ?? 0, to)),
    ring: (z) => arc({ x: 0, y: 0 }, 1, { x: at.x, y: at.y, z }),
  };
}
