/** What the head of a program and the sheet tell about it: plain data, filled by the caller. mm, 1/min. */
import type { LengthUnit } from '../base/units.ts';
import type { Position } from '../motion/motion.ts';
import type { Span } from './motion-facts.ts';

export interface HeaderCutter {
  readonly number: number;
  /** The diameter it cuts. */
  readonly diameter: number;
  readonly flutes: number;
  readonly stickOut: number;
  /** Of the shank above what it cuts with. */
  readonly shank: number;
}

export interface HeaderFacts {
  /** 'walk': round the extents with the spindle still; 'check': a trial of a machine file, in the air. */
  readonly kind: 'cut' | 'walk' | 'check';
  readonly title: string;
  readonly mark: string;
  readonly version: string;
  /** What is made, a line each: "Wheel, 60 teeth, module 0.5, 1.500 mm thick". */
  readonly part: readonly string[];
  /** This program's place in the order they are run, 1-based; 0 for the walk-round and for all of them together. */
  readonly program: { readonly number: number; readonly of: number };
  readonly blank: string;
  /** Unit of the job, where the machine's is another: what a person measures is then told in both. */
  readonly jobUnit?: LengthUnit;
  readonly holding: string;
  /** The job's word for it: 'leaded-brass', 'steel'. */
  readonly material: string;
  readonly cutters: readonly HeaderCutter[];
  /** Rising; empty where the spindle stays still. */
  readonly speeds: readonly number[];
  readonly extents: { readonly x: Span; readonly y: Span; readonly z: Span };
  /** Height at which the cutter may go anywhere where nothing stands. */
  readonly clear: number;
  /** Height of the blank's top, and of the plate under it. */
  readonly topZ: number;
  readonly plateZ: number;
  /** Where to leave the cutter before the start. */
  readonly park: Position;
  readonly zero: 'top' | 'plate';
  /** Where X and Y zero can be found again once the bore is cut: a sentence: "touch the edges of the sheet at X -22 and Y -22". */
  readonly again: string;
  /** A size to measure that tells a wrong unit at once; mm. */
  readonly check: { readonly what: string; readonly size: number };
  readonly proved: readonly string[];
  readonly notProved: readonly string[];
}
