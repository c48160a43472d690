/**
 * A machine as its file in `posts/` describes it: the words its controller reads, and what it can do.
 * Keys in the file are the same in kebab-case (`line-longest`). Lengths mm, feeds mm/min, seconds, degrees for angles
 * of the rotary axis. Where a field has a mm and an inch value it is by the unit of the program.
 * Fields marked S are safety fields: they must be given (by the file or the one it is `like`), never guessed.
 */
import type { LengthUnit } from '../base/units.ts';

export interface Machine {
  /** The file's name without ending: what the job file says. */
  readonly name: string;
  readonly description: string;
  readonly units: LengthUnit; // S  unit the programs are written in
  readonly words: Words;
  readonly limits: Limits;
  /** Who proved this file on a real machine, and when; 'unproved' adds a caution. */
  readonly proved: string;
}

export interface Words {
  readonly file: FileWords;
  readonly blocks: BlockWords;
  readonly numbers: NumberWords;
  readonly modes: ModeWords;
  readonly arcs: ArcWords;
  readonly holes: HoleWords;
  readonly dwell: DwellWords;
  readonly cutters: CutterWords;
  readonly spindle: SpindleWords;
  readonly positions: PositionWords;
  readonly path: PathWords;
  readonly rotary?: RotaryWords;
  readonly end: EndWords;
  readonly language: LanguageWords;
}

export interface FileWords {
  /** File ending with its dot, '.nc'. */
  readonly ending: string;
  readonly percentLines: 'none' | 'both';
  /** 'o-number': O0001 on its own line; 'percent-name': the name after the first %. S */
  readonly programLabel: 'none' | 'o-number' | 'percent-name';
  readonly labelDigits: number;
  readonly labelLowest: number;
  readonly labelHighest: number;
  readonly lineEnd: 'lf' | 'crlf';
  /** Characters of a line, end not counted. S */
  readonly lineLongest: number;
  readonly letterCase: 'upper' | 'any';
  readonly commentForm: 'brackets' | 'semicolon' | 'none'; // S
  readonly commentOwnLine: boolean;
  /** Letters a comment may hold, beside A-Z (and a-z where case is any), 0-9 and the blank. S */
  readonly commentLetters: string;
  /** Word that shows a comment's text to the operator: 'MSG,' or none. */
  readonly operatorNote: string | null;
  readonly gapBetweenWords: boolean;
  /** Bytes the controller can hold, or null. S */
  readonly fileLargest: number | null;
  /** Characters that act at once even inside comments; no byte of any program may be one. S */
  readonly bannedCharacters: string;
}

export interface BlockWords {
  readonly numbers: 'none' | 'all' | 'cutter-changes';
  readonly first: number;
  readonly step: number;
  readonly last: number;
  /** What the controller does with a leading /. S */
  readonly skipMark: 'honoured' | 'ignored' | 'forbidden';
}

export interface NumberWords {
  readonly lengthDecimals: { readonly mm: number; readonly inch: number };
  readonly angleDecimals: number;
  readonly feedDecimals: number;
  readonly secondsDecimals: number;
  readonly speedDecimals: number;
  /** S: on some controllers a length without a point counts thousandths. */
  readonly point: 'always' | 'as-needed';
  readonly trailingZeros: 'keep' | 'drop';
  readonly leadingZero: 'keep' | 'drop';
  /** Digits of G and M codes: 1 is G1, 2 is G01. */
  readonly codeWidth: 1 | 2;
  /** S  Largest length the controller holds, in the unit of the program. */
  readonly valueLargest: number;
}

export interface ModeWords {
  readonly millimetreWord: string; // S  'G21', 'G71'
  readonly inchWord: string; // S  'G20', 'G70'
  /** Written at the start, whole and in order, the work offset, feed mode and centre word among them; the unit word
   *  stands where 'UNIT' is said. S */
  readonly opening: readonly string[];
  readonly openingOnePerBlock: boolean;
  /** Words in force when the controller is switched on; empty where that is not known. Nothing written relies on them. */
  readonly powerOn: readonly string[];
  readonly modeRepeat: 'changed' | 'every-block';
  readonly axisRepeat: 'changed' | 'every-block';
}

export interface ArcWords {
  readonly planes: 'none' | 'xy' | 'xy-xz-yz'; // S
  /** S  I J from the start point, from zero, or radius R. */
  readonly centre: 'from-start' | 'from-zero' | 'radius';
  /** 'G91.1', 'G90.1' or none. */
  readonly centreWord: string | null;
  readonly zeroWords: 'write' | 'omit';
  readonly endWords: 'both' | 'changed';
  /** Degrees; an arc that turns more is split. */
  readonly longestSweep: number;
  /** Arcs stop at the axes (quadrants). */
  readonly quadrants: boolean;
  readonly wholeCircle: 'one-block' | 'split'; // S
  readonly helix: boolean; // S
  /** Least mm a turn of a helix. */
  readonly helixShallowest: number;
  /** Largest difference of start and end radius, mm and inch. */
  readonly missAbsolute: { readonly mm: number; readonly inch: number };
  /** Share of the radius that is allowed in addition, or null. A controller allows a miss below `missAbsolute`, or (where a share is given) below both `missAtMost` and the share. */
  readonly missShare: number | null;
  readonly missAtMost: number | null;
  /** Least chord that is written as an arc, mm. S */
  readonly shortestChord: number;
  readonly smallestRadius: number;
  readonly largestRadius: number;
  /** Where arcs become lines, mm. */
  readonly chordTolerance: number;
}

export interface HoleWords {
  /** Which cycles the controller has. S */
  readonly cycles: readonly CycleWord[];
  readonly returnWord: 'none' | 'G98' | 'G99'; // S
  /** S  how R is meant. */
  readonly clearMeaning: 'absolute' | 'from-start-level';
  readonly endWord: string; // S 'G80'
  /** How far G83 comes out between two pecks: to the clear height (NISTIR 6556 §3.5.16.4), or to R. */
  readonly peckReturn: 'clear-height' | 'R';
}

export type CycleWord = 'G73' | 'G81' | 'G82' | 'G83' | 'G84' | 'G85' | 'G86' | 'G88' | 'G89';

export interface DwellWords {
  /** S  After a dwell with F or S the feed or speed is to be written again, for a reader that takes it as one. */
  readonly letter: 'P' | 'X' | 'F' | 'S' | 'none';
  readonly unit: 'seconds' | 'milliseconds'; // S
}

export interface CutterWords {
  /** S  automatic changer; stop in the program for hands; or one program for each cutter. */
  readonly change: 'automatic' | 'by-hand' | 'one-program';
  readonly words: 'T-and-M6' | 'T-then-M6' | 'T-only' | 'none';
  readonly highest: number;
  /** S  'with-T': the controller takes the cutter's length with T, and nothing more is written. */
  readonly lengthOffset: 'none' | 'G43-H' | 'with-T';
  readonly lengthCancel: 'none' | 'G49-at-end'; // S
}

export interface SpindleWords {
  readonly run: 'program' | 'by-hand'; // S
  readonly forward: 'M3' | 'M4'; // S
  readonly spinUpSeconds: number; // S
  /** 'S-first': S in the block before M3; 'together': S and M3 in one block. */
  readonly speedWord: 'S-first' | 'together';
}

export interface PositionWords {
  readonly workOffset: string; // S 'G54', 'none' where the controller has one zero only
  /** S  how the spindle gets to its top: not at all, G53 Z, G28 of named axes (G91 G28 Z0), or G28 that moves every axis. */
  readonly top: 'none' | 'G53-Z' | 'G28-named' | 'G28-all';
  /** Machine Z of the top for G53, mm. S where top is G53-Z. */
  readonly topMachineZ: number | null;
  /** S  whether a rapid of two axes is a straight line. */
  readonly rapidShape: 'straight' | 'dog-leg';
}

export interface PathWords {
  /** Words for exact path, and for roughing, or none. S */
  readonly finishing: string | null;
  readonly roughing: string | null;
  /** Farthest that the roughing words let the slides stray from the path, mm; null where there are no such words. */
  readonly roughingStrays: number | null;
  readonly feedMode: string | null; // 'G94' or null where the controller has no such word
  readonly helixFeedAlong: 'helix' | 'circle';
  /** The reader stops at a feed move without any F before it. */
  readonly feedDemanded: boolean;
}

export interface RotaryWords {
  readonly letter: 'A' | 'B' | 'C';
  readonly about: 'X' | 'Y' | 'Z'; // S
  readonly sense: 'plus' | 'minus'; // S
  readonly count: 'endless' | 'shortest-way' | 'sign-is-direction'; // S
  readonly mostPerBlock: number;
}

export interface EndWords {
  readonly end: 'M2' | 'M30'; // S
  /** Modes written back before the end. */
  readonly restore: readonly string[];
}

/** What a program may hold beside plain blocks. Nothing of it is ever written; it is for reading programs of other makers. */
export interface LanguageWords {
  /** #1 to #5399, [expressions] and functions as NISTIR 6556 §3.3.2 has them; and names like #<depth>. */
  readonly parameters: 'none' | 'numbered' | 'numbered-and-named';
  /** Words by which it moves the zero itself: G10 L2, and G92 with G92.1 to G92.3. */
  readonly setZero: readonly ('G10' | 'G92')[];
  /** G93: F says how long a move takes. */
  readonly inverseTime: boolean;
  /** Called by M98 P, from O and its number to M99, in the same file; or `o100 sub` to `o100 endsub`, called by `o100 call`. */
  readonly subprograms: 'none' | 'M98' | 'O-words';
  /** `o100 while`, `o100 repeat`, `o100 if` and their like. */
  readonly loops: 'none' | 'O-words';
}

export interface Limits {
  /** Length of each axis' travel, mm; with the job's `zero-at` the machine coordinates of its ends. S */
  readonly travel: {
    readonly x: readonly [number, number];
    readonly y: readonly [number, number];
    readonly z: readonly [number, number];
  };
  readonly feedLowest: number;
  readonly feedHighest: number;
  readonly rapid: { readonly x: number; readonly y: number; readonly z: number };
  readonly spindleLowest: number; // S
  readonly spindleHighest: number; // S
  /** mm/s2 */
  readonly acceleration: { readonly x: number; readonly y: number; readonly z: number };
  /** Corner allowance of the corner speed rule, mm. */
  readonly cornerAllowance: number;
  readonly smallestStep: number;
  /** Least time a block takes to be read, s. */
  readonly blockSeconds: number;
  /** Total indicated runout of the spindle, mm, where a cutter says nothing. */
  readonly runout: number;
  /** S  Diameter of the collet nut, mm, and its height above the cutter's collet end. */
  readonly nut: { readonly diameter: number; readonly length: number };
  /** Watts at the cutter. */
  readonly power: number;
}
