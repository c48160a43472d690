/**
 * Everything the sheet, the drawing and the summary are made from, gathered by `cut.ts`. mm, radians, s inside;
 * the report writes units. Plain data: the report computes nothing that was decided elsewhere.
 */
import type { Problem } from '../base/problem.ts';
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';
import type { Motion } from '../motion/motion.ts';
import type { Proof } from '../prove/proof.ts';
import type { PassPath } from './pass-paths.ts';
import type { AsCut } from '../tooth/as-cut.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';

export interface SheetPass {
  readonly name: string;
  readonly cutter: number;
  readonly speed: number;
  readonly feed: number;
  readonly plunge: number;
  /** How much deeper a lap goes at most. */
  readonly step: number;
  /** Least and most: a hole cleared in rings makes its own count of laps in each. */
  readonly laps: readonly [number, number];
  readonly depth: number;
  readonly seconds: number;
  readonly why: readonly string[];
}

export interface SheetProgram {
  readonly file: string;
  readonly units: 'mm' | 'inch';
  readonly blocks: number;
  readonly bytes: number;
  readonly sha256: string;
  readonly seconds: number;
  readonly cutters: readonly number[];
  readonly passes: readonly string[];
}

export interface SheetReach {
  readonly largestCutter: number;
  readonly leftAtRoot: number;
  readonly leftArea: number;
  readonly roughingCutter: number | null;
  readonly remarks: readonly string[];
}

export interface SheetFacts {
  readonly version: string;
  /** Eight digits that stand in the programs' headers too. */
  readonly mark: string;
  readonly verdict: 'pass' | 'refuse' | 'unread';
  readonly job: Job;
  readonly machine: Machine;
  readonly form: WheelForm;
  readonly crossings?: Crossings;
  /** The outline the finishing cutter leaves. */
  readonly asCut?: AsCut;
  readonly reach?: SheetReach;
  readonly programs: readonly SheetProgram[];
  readonly walkFile?: string;
  readonly walkSha256?: string;
  /** The motion of each program, for what hands do at its stops. */
  readonly motions: readonly Motion[];
  /** The way of the cutter's centre in each pass, from those motions. */
  readonly paths: readonly PassPath[];
  readonly passes: readonly SheetPass[];
  /** Where to park before starting. */
  readonly park?: { readonly x: number; readonly y: number; readonly z: number };
  readonly proof?: Proof;
  /** Everything found on the way that is not in the proof: warnings, and reasons where nothing was made. */
  readonly problems: readonly Problem[];
  /** A sentence: where zero of X and Y can be found again. As in the programs' headers. */
  readonly again: string;
  /** The same sentences as in the programs' headers. */
  readonly cautions: readonly string[];
}
