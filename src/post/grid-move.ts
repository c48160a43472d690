/** Moves between places a program can name, and the exact arc they are made from. Counts of the last digit; mm and radians where exact. */
import type { ArcWords } from '../machine/machine.ts';
import type { Position } from '../motion/motion.ts';
import type { Grid } from './program-grid.ts';

export interface GridPlace {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export interface GridLine extends GridPlace {
  readonly kind: 'line';
}

/** `cx`, `cy` in counts from zero. */
export interface GridArc extends GridPlace {
  readonly kind: 'arc';
  readonly cx: number;
  readonly cy: number;
  /** In counts: as the word of the radius form, or from the written centre to the written start. */
  readonly radius: number;
  readonly counterClockwise: boolean;
  /** Difference of start and end radius as written, in counts. */
  readonly miss: number;
  /** How far it lies off the exact circle at worst, in counts; 0 where it turns too little to stray. */
  readonly stray: number;
}

/** An arc that no centre on the grid makes acceptable. */
export interface GridMiss {
  readonly kind: 'miss';
  readonly radius: number;
  readonly miss: number;
}

export type GridMove = GridLine | GridArc | GridMiss;

/** The whole arc, exact; `a0` its start angle. */
export interface Sweep {
  readonly grid: Grid;
  readonly words: ArcWords;
  readonly centre: { readonly x: number; readonly y: number };
  readonly radius: number;
  readonly a0: number;
  readonly turn: number;
  readonly from: Position;
  readonly to: Position;
  /** The smallest chord written as an arc, in counts. */
  readonly shortest: number;
}

/** Twice as quick as Math.hypot, whose care for huge and tiny numbers nothing on the grid needs. */
export function distance(x0: number, y0: number, x1: number, y1: number): number {
  return Math.sqrt((x0 - x1) * (x0 - x1) + (y0 - y1) * (y0 - y1));
}
