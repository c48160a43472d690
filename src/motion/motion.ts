/**
 * What a machine is told to do: the one type that `toolpath` makes, `post` writes, `prove` reads back and the time
 * model runs. Frame of the program: X0 Y0 on the wheel's axis, Z0 at the job's zero; mm, mm/min, 1/min, s, radians.
 */
export interface Position {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** What a step is for; a change of it is where the program gets a comment, so that a person finds their place. */
export interface Belongs {
  /** 'bore', 'bore finishing', 'bay', 'mouths', 'roughing', 'finishing', 'spring', 'crossing 2', ... */
  readonly pass: string;
  /** 1-based; tooth 1 is centred on +X, counted counter-clockwise. */
  readonly tooth?: number;
  /** 1-based lap or level of the pass, of how many. */
  readonly lap?: number;
  readonly laps?: number;
  /** Z at the end of that lap. */
  readonly depth?: number;
  /** 1-based helix of a hole cleared ring by ring, inner first, of how many. */
  readonly ring?: number;
  readonly rings?: number;
  /** All laps at this tooth follow each other: they are one place to whoever looks for it. */
  readonly together?: true;
  /** The tooth a lap began at, come back to where it closes. */
  readonly again?: true;
}

export interface RapidStep {
  readonly kind: 'rapid';
  readonly to: Position;
  readonly belongs?: Belongs;
}

export interface LineStep {
  readonly kind: 'line';
  readonly to: Position;
  readonly feed: number;
  readonly belongs?: Belongs;
}

/** Arc in XY, a helix where Z changes. `turn` is signed (counter-clockwise positive), a whole circle is 2 pi; never more. */
export interface ArcStep {
  readonly kind: 'arc';
  readonly to: Position;
  readonly centre: { readonly x: number; readonly y: number };
  readonly turn: number;
  readonly feed: number;
  readonly belongs?: Belongs;
}

export type MoveStep = RapidStep | LineStep | ArcStep;

/** What is not a move. */
export type EventStep =
  /** To the machine's own top, straight up, by whatever way the machine file gives; nothing where it gives none. */
  | { readonly kind: 'top' }
  /** Load this cutter: automatic, by hand at a stop, or (one program a cutter) only said in the header. */
  | { readonly kind: 'cutter'; readonly number: number; readonly say: readonly string[] }
  /** Spindle on at this speed (clockwise unless the machine file says otherwise) and wait until it is there; 0 stops it. */
  | { readonly kind: 'spindle'; readonly speed: number }
  | { readonly kind: 'dwell'; readonly seconds: number }
  /** Stop and wait for the person; the spindle is still. */
  | { readonly kind: 'stop'; readonly say: readonly string[] }
  | { readonly kind: 'note'; readonly text: string };

export type Step = MoveStep | EventStep;

/** One program's worth of steps. Where the machine stands before the first move is not known. */
export interface Motion {
  readonly steps: readonly Step[];
}

export function isMove(step: Step): step is MoveStep {
  return step.kind === 'rapid' || step.kind === 'line' || step.kind === 'arc';
}
