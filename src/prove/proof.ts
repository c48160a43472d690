/** What the prover is given and what it answers. It is given texts, never a toolpath. */
import type { Setup } from '../cutting/setup.ts';
import type { Machine } from '../machine/machine.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import type { CheckCode } from './check-codes.ts';

/** What the program is meant to make. */
export interface Target {
  readonly form: WheelForm;
  readonly thickness: number;
  /** Diameter of the bore, less what is left for broaching; 0 for none. */
  readonly bore: number;
  readonly crossings?: Crossings;
  /** The diameter the finishing cutter cuts: the as-cut outline follows from it. */
  readonly finishingDiameter: number;
  /** Slugs of the crossings may stay on the skin. */
  readonly slugsHeld: boolean;
}

export interface ProofInput {
  /** In the order they are run; the metal carries over. */
  readonly programs: readonly { readonly file: string; readonly text: string }[];
  readonly machine: Machine;
  readonly setup: Setup;
  readonly target?: Target;
}

export interface Finding {
  readonly code: CheckCode;
  readonly severity: 'error' | 'warning';
  /** What is wrong, with both numbers and units. */
  readonly message: string;
  /** What to change. */
  readonly hint?: string;
  readonly file: string;
  /** 1-based. */
  readonly line: number;
  readonly x?: number;
  readonly y?: number;
}

/** One height at which the flank was held against the exact curve. */
export interface DepthFigures {
  readonly z: number;
  readonly flankGouge: number;
  readonly flankLeft: number;
  readonly leftAtRoot: number;
}

/** A point of the deviation plot along the worst tooth's flank, root to tip: signed, positive is metal left. */
export interface DeviationPoint {
  /** Along the flank from the middle of the root, mm. */
  readonly along: number;
  readonly radius: number;
  readonly deviation: number;
}

export interface Proof {
  readonly verdict: 'pass' | 'refuse' | 'unread';
  readonly findings: readonly Finding[];
  /** Sentences: what could not be, or was not, checked. Never empty. */
  readonly notChecked: readonly string[];
  readonly moves: readonly TracedMove[];
  readonly blocks: number;
  readonly extents: {
    readonly x: readonly [number, number];
    readonly y: readonly [number, number];
    readonly z: readonly [number, number];
  };
  /** With a target: how far the cut wheel is from its exact outline, worst over every height. */
  readonly figures?: {
    readonly flankGouge: number;
    readonly flankLeft: number;
    readonly leftAtRoot: number;
    readonly byDepth: readonly DepthFigures[];
    readonly boreError: number;
    readonly crossingGouge: number;
    readonly crossingLeft: number;
    /** Largest angle between the cut addendum's normal and the line to the point where the circles touch, radians. */
    readonly rollingLaw: number;
    readonly worstTooth: number;
    readonly deviation: readonly DeviationPoint[];
  };
}
