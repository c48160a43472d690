/**
 * What a controller holds between two lines: its modes, where it stands, what turns. Unknown is said, never assumed:
 * only what the machine file says of a controller is known when it is switched on.
 *
 * Frame: the program's; mm, mm/min, 1/min (clockwise positive).
 */
import type { LengthUnit } from '../base/units.ts';
import type { Machine } from '../machine/machine.ts';
import { codeOf, G_GROUP, type Codes } from './modes-codes.ts';

export type CycleMode = 'G73' | 'G81' | 'G82' | 'G83' | 'G84' | 'G85' | 'G86' | 'G88' | 'G89';

/** Motion mode 'none' is after G80; codes as written otherwise. */
export type MotionMode = 'G0' | 'G1' | 'G2' | 'G3' | CycleMode | 'none';

export interface ModalState {
  motion: MotionMode | undefined;
  plane: 'XY' | 'XZ' | 'YZ' | undefined;
  distance: 'absolute' | 'incremental' | undefined;
  feedMode: 'per-minute' | 'inverse-time' | undefined;
  unit: LengthUnit | undefined;
  compensation: 'off' | undefined;
  /** H of the length offset that is on; 'off' after G49. */
  length: number | 'off' | undefined;
  cycleReturn: string | undefined;
  work: string | undefined;
  path: string | undefined;
  centre: 'from-start' | 'from-zero' | undefined;
  /** mm/min; undefined until F is given in the unit that is on, and under G93, where it holds for one move. */
  feed: number | undefined;
  /** S as last given. */
  speed: number | undefined;
  /** +1 clockwise, -1 counter-clockwise, 0 still; undefined before any word. */
  turning: 1 | -1 | 0 | undefined;
  mist: boolean | undefined;
  flood: boolean | undefined;
  overrides: 'on' | 'off' | undefined;
  selected: number | undefined;
  cutter: number | null;
}

export interface Here {
  readonly x: number | null;
  readonly y: number | null;
  readonly z: number | null;
}

export const NOWHERE: Here = { x: null, y: null, z: null };

/** What is known without a word having been read: what the machine file says is in force, and what its controller has only one of. */
export function powerOn(machine: Machine, codes: Codes, cutter: number | null): ModalState {
  const state = unknown(machine, cutter);
  for (const word of machine.words.modes.powerOn) {
    putOn(state, word, codes);
  }
  return state;
}

function unknown(machine: Machine, cutter: number | null): ModalState {
  const { arcs, path } = machine.words;
  return {
    motion: undefined,
    plane: arcs.planes === 'xy-xz-yz' ? undefined : 'XY',
    distance: undefined,
    feedMode: path.feedMode === null ? 'per-minute' : undefined,
    unit: undefined,
    compensation: undefined,
    length: undefined,
    cycleReturn: undefined,
    work: undefined,
    path: undefined,
    centre: arcs.centre === 'radius' ? undefined : arcs.centre,
    feed: undefined,
    speed: undefined,
    turning: undefined,
    mist: undefined,
    flood: undefined,
    overrides: undefined,
    selected: undefined,
    cutter,
  };
}

const MOTIONS: Readonly<Record<number, MotionMode>> = {
  0: 'G0', 10: 'G1', 20: 'G2', 30: 'G3', 800: 'none',
  730: 'G73', 810: 'G81', 820: 'G82', 830: 'G83', 840: 'G84', 850: 'G85', 860: 'G86', 880: 'G88', 890: 'G89',
}; // prettier-ignore

/** Ten times a G code of motion, as its mode. */
export function motionOfCode(code: number): MotionMode | undefined {
  return MOTIONS[code];
}

export function isCycle(motion: MotionMode | undefined): motion is CycleMode {
  return motion !== undefined && motion.length > 2 && motion !== 'none';
}

export function wordOfCode(code: number): string {
  return `G${String(code / 10)}`;
}

/** One word of those in force when the controller is switched on. */
function putOn(state: ModalState, word: string, codes: Codes): void {
  const code = codeOf(word);
  switch ((codes.g[code] ?? 0) - 1) {
    case G_GROUP.motion:
      state.motion = motionOfCode(code);
      break;
    case G_GROUP.plane:
      state.plane = code === 170 ? 'XY' : code === 180 ? 'XZ' : 'YZ';
      break;
    case G_GROUP.distance:
      state.distance = code === 900 ? 'absolute' : 'incremental';
      break;
    case G_GROUP.feedMode:
      state.feedMode = 'per-minute';
      break;
    case G_GROUP.unit:
      state.unit = code === codes.inch ? 'inch' : 'mm';
      break;
    case G_GROUP.compensation:
      state.compensation = 'off';
      break;
    case G_GROUP.length:
      state.length = 'off';
      break;
    case G_GROUP.cycleReturn:
      state.cycleReturn = wordOfCode(code);
      break;
    case G_GROUP.work:
      state.work = wordOfCode(code);
      break;
    case G_GROUP.path:
      state.path = wordOfCode(code);
      break;
  }
}

/** Signed speed of the spindle now. */
export function spindleOf(modes: ModalState): number {
  return (modes.turning ?? 0) * (modes.speed ?? 0);
}

export type FinalModes = Readonly<ModalState>;
