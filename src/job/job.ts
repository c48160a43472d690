/**
 * A job, understood: everything in mm, everything that could be derived filled in, with its why.
 * Made by `read-job.ts`; nothing deeper checks it again.
 */
import type { Problem } from '../base/problem.ts';
import type { LengthUnit } from '../base/units.ts';
import type { Cutter, Setup } from '../cutting/setup.ts';
import type { CrossingProportions, WheelProportions } from '../tooth/wheel.ts';

export interface Job {
  /** The job file's name without folder and ending: NAME of every output. */
  readonly name: string;
  readonly file: string;
  readonly title: string;
  /** Unit the job file is written in: sheet and messages show it beside mm. */
  readonly length: LengthUnit;
  readonly wheel: WheelJob;
  readonly setup: Setup;
  /** Where zero lies. */
  readonly zero: 'top' | 'plate';
  /** A machine file's name, or a path. */
  readonly machine: string;
  readonly cuts: Cuts;
  readonly derived: Readonly<Record<string, Derived>>;
  /** Line and column of each value of the job file, by its path (`cuts.roughing.speed`): places of problems found later. */
  readonly spots?: Readonly<Record<string, { readonly line: number; readonly column: number }>>;
  /** What was understood and still cannot be made: with an error among them only the sheet is written, not a program. */
  readonly misfits?: readonly Problem[];
}

export interface WheelJob extends WheelProportions {
  readonly thickness: number;
  /** Diameter; 0 where there is none. */
  readonly bore: number;
  readonly crossings?: CrossingProportions;
}

/** A value the job file left out: what was taken, and why. */
export interface Derived {
  readonly value: number | string;
  readonly why: string;
}

export type PassKind = 'bore' | 'crossings' | 'roughing' | 'finishing';

/** What the job says of its cuts; what it leaves out is undefined and follows from cutter and material (cutting/). */
export interface Cuts {
  readonly order: readonly PassKind[];
  readonly bore: CutSettings & { readonly leave: number };
  readonly crossings: CutSettings;
  readonly roughing: CutSettings & { readonly allowance: number };
  readonly finishing: CutSettings & { readonly passes: number; readonly spring: number };
  /** How far under the wheel the cutter goes. */
  readonly below: number;
  readonly climb: boolean;
  readonly play: { readonly x: number; readonly y: number };
  /** Metal or path error known to be left on every flank, for `depth`; mm. */
}

export interface CutSettings {
  readonly cutter: Cutter;
  readonly step?: number;
  readonly speed?: number;
  readonly feed?: number;
  readonly plunge?: number;
}
