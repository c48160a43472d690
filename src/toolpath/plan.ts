/**
 * What `toolpath` hands on: the programs as motion, what was decided for each pass and why, and what the cutters reach.
 */
import type { Motion } from '../motion/motion.ts';

/** A pass as the sheet shows it; the steps themselves are in the programs, each marked with its pass. */
export interface PassFacts {
  readonly name: string;
  readonly cutter: number;
  /** 1/min */
  readonly speed: number;
  /** mm/min, along the straight */
  readonly feed: number;
  readonly plunge: number;
  /** mm a lap or level; the whole depth where it is one. */
  readonly step: number;
  readonly laps: number;
  /** Z of the deepest cut. */
  readonly depth: number;
  /** Where the figures come from, one sentence each: "feed: 0.004 mm a tooth, brass, 0.5 mm cutter", ... */
  readonly why: readonly string[];
}

/** One program: the file's suffix ('' or '-1', '-2', ...), its motion, and its cutters in order. */
export interface ProgramPlan {
  readonly suffix: string;
  readonly motion: Motion;
  readonly cutters: readonly number[];
  readonly passes: readonly string[];
}

export interface Reach {
  /** The largest cutter that gets to the root between two teeth, mm. */
  readonly largestCutter: number;
  /** Thickest metal the finishing cutter leaves at the root beyond the exact outline, and its area a space, mm and mm2. */
  readonly leftAtRoot: number;
  readonly leftArea: number;
  /** The largest cutter of the job's list that could rough the spaces (root width >= D + 2 allowance + 0.05). */
  readonly roughingCutter: number | null;
  /** Sentences for the sheet: what a larger roughing cutter would save, and so on. */
  readonly remarks: readonly string[];
}

export interface CutPlan {
  readonly programs: readonly ProgramPlan[];
  /** Round the extents and over the keep-outs at clear height with the spindle off. */
  readonly walk: Motion;
  readonly passes: readonly PassFacts[];
  readonly reach: Reach;
  /** Where the cutter is to be parked before the start, and where zero can be found again. */
  readonly park: { readonly x: number; readonly y: number; readonly z: number };
}
