/**
 * One line's words sorted: at most one code of each modal group, at most one value of each other letter
 * (NISTIR 6556 §3.3.5). Made once of every text that stands in the program, however often it stands there; plain arrays,
 * because thousands of them are made and a typed array takes longer to make than to fill.
 */
import { WHOLE_NUMBER } from '../base/tolerances.ts';
import { G_GROUP, G_GROUPS, M_GROUPS, type Codes } from './modes-codes.ts';
import type { LineWords } from './line-words.ts';
import { whyNoCode } from './not-followed.ts';
import type { ArcMemo } from './trace-arc.ts';

export interface Block {
  /** By group: ten times the G code, or -1. */
  readonly g: number[];
  /** By group: the M code, or -1. */
  readonly m: number[];
  /** Bits of the letters that are given, A = 1; G, M and N not among them. */
  given: number;
  /** By letter, A = 0; NaN where it is not given. */
  readonly values: number[];
  /** Nothing but a word of motion and words of places. */
  onlyMoves: boolean;
  /** The arc that it made last, and from where. */
  arc: ArcMemo | undefined;
}

const NO_G: readonly number[] = Array.from({ length: G_GROUPS }, () => -1);
const NO_M: readonly number[] = Array.from({ length: M_GROUPS }, () => -1);
const NO_VALUES: readonly number[] = Array.from({ length: 26 }, () => Number.NaN);

function emptyBlock(): Block {
  return {
    g: NO_G.slice(),
    m: NO_M.slice(),
    given: 0,
    values: NO_VALUES.slice(),
    onlyMoves: true,
    arc: undefined,
  };
}

export type Letter =
  | 'A' | 'B' | 'C' | 'D' | 'E' | 'F' | 'H' | 'I' | 'J' | 'K' | 'L' | 'O' | 'P'
  | 'Q' | 'R' | 'S' | 'T' | 'U' | 'V' | 'W' | 'X' | 'Y' | 'Z'; // prettier-ignore

export function bitOf(letter: Letter): number {
  return 1 << (letter.charCodeAt(0) - 65);
}

export const BIT = {
  F: bitOf('F'), H: bitOf('H'), I: bitOf('I'), J: bitOf('J'), K: bitOf('K'), L: bitOf('L'), O: bitOf('O'), P: bitOf('P'),
  Q: bitOf('Q'), R: bitOf('R'),
  S: bitOf('S'), T: bitOf('T'), X: bitOf('X'), Y: bitOf('Y'), Z: bitOf('Z'),
} as const; // prettier-ignore

/** Letters of a move. */
const PLACES = BIT.X | BIT.Y | BIT.Z | BIT.I | BIT.J | BIT.K | BIT.R;

/** Letters whose number is a length. */
const LENGTHS = PLACES | BIT.Q;

export const AXES = BIT.X | BIT.Y | BIT.Z;

/** Of a letter that is given. */
export function valueOf(block: Block, letter: Letter): number {
  return block.values[letter.charCodeAt(0) - 65]!;
}

export function has(block: Block, bit: number): boolean {
  return (block.given & bit) !== 0;
}

/** The letters of a mask: 'AB'. */
export function lettersOf(mask: number): string {
  return Array.from({ length: 26 }, (_, i) => ((mask >> i) & 1 ? String.fromCharCode(65 + i) : '')).join('');
}

/** §3.3.5. */
const MOST_M = 4;

/** The whole number that is meant, or undefined. */
export function wholeOf(value: number): number | undefined {
  const whole = Math.round(value);
  return Math.abs(value - whole) <= WHOLE_NUMBER ? whole : undefined;
}

/** The words sorted, or what is wrong with them. */
export function sortWords(words: LineWords, codes: Codes): Block | string {
  const block = emptyBlock();
  let mCount = 0;
  for (let i = 0; i < words.count; i++) {
    const letter = words.letters[i] ?? 0;
    const value = words.values[i] ?? 0;
    let wrong: string | undefined;
    if (letter === 71) {
      wrong = sortG(value, codes, block);
    } else if (letter === 77) {
      mCount += 1;
      wrong = sortM(value, mCount, codes, block);
    } else {
      wrong = sortValue(letter, value, words.pointed[i] === 1, codes, block);
    }
    if (wrong !== undefined) {
      return `column ${String(words.columns[i])}: ${wrong}`;
    }
  }
  block.onlyMoves &&= (block.given & ~PLACES) === 0 && mCount === 0;
  return block;
}

function sortValue(
  letter: number,
  value: number,
  pointed: boolean,
  codes: Codes,
  block: Block,
): string | undefined {
  const bit = 1 << (letter - 65);
  if (block.given & bit) {
    return `${String.fromCharCode(letter)} is given twice on one line`;
  }
  const isLength = (LENGTHS & bit) !== 0;
  if (!Number.isFinite(value) || (isLength && Math.abs(value) > codes.valueLargest)) {
    return `${String.fromCharCode(letter)}${String(value)} is more than the ${String(codes.valueLargest)} this machine reads`;
  }
  if (codes.pointAlways && !pointed && value !== 0 && isLength) {
    return `${String.fromCharCode(letter)}${String(value)} has no decimal point; this machine would count it in thousandths`;
  }
  block.given |= bit;
  block.values[letter - 65] = value;
  return undefined;
}

function sortG(value: number, codes: Codes, block: Block): string | undefined {
  const code = wholeOf(value * 10) ?? -1;
  const group = (codes.g[code] ?? 0) - 1;
  if (group < 0) {
    return whyNoCode(code, value);
  }
  if ((block.g[group] ?? -1) >= 0) {
    return `G${String(value)} and G${String((block.g[group] ?? 0) / 10)} exclude each other on one line`;
  }
  block.g[group] = code;
  block.onlyMoves &&= group === G_GROUP.motion;
  return undefined;
}

function sortM(value: number, count: number, codes: Codes, block: Block): string | undefined {
  const code = wholeOf(value) ?? -1;
  const group = (codes.m[code] ?? 0) - 1;
  if (group < 0) {
    return `M${String(value)} is no word of this machine file that can be read`;
  }
  if ((block.m[group] ?? -1) >= 0) {
    return `M${String(value)} and M${String(block.m[group])} exclude each other on one line`;
  }
  if (count > MOST_M) {
    return `more than ${String(MOST_M)} M words on one line`;
  }
  block.m[group] = code;
  return undefined;
}
