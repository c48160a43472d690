/**
 * One line's words sorted: at most one code of each modal group, at most one value of each other letter
 * (NISTIR 6556 §3.3.5). Used again for every line.
 */
import { WHOLE_NUMBER } from '../base/tolerances.ts';
import { G_GROUPS, M_GROUPS, type Codes } from './modes-codes.ts';
import type { LineWords } from './line-words.ts';

export interface Block {
  /** By group: ten times the G code, or -1. */
  readonly g: Int16Array;
  /** By group: the M code, or -1. */
  readonly m: Int16Array;
  /** Bits of the letters that are given, A = 1; G, M and N not among them. */
  given: number;
  /** By letter, A = 0. */
  readonly values: Float64Array;
  /** Any code or word at all. */
  words: number;
}

export function emptyBlock(): Block {
  return {
    g: new Int16Array(G_GROUPS),
    m: new Int16Array(M_GROUPS),
    given: 0,
    values: new Float64Array(26),
    words: 0,
  };
}

export type Letter =
  | 'A' | 'B' | 'C' | 'D' | 'E' | 'F' | 'H' | 'I' | 'J' | 'K' | 'L' | 'O' | 'P'
  | 'Q' | 'R' | 'S' | 'T' | 'U' | 'V' | 'W' | 'X' | 'Y' | 'Z'; // prettier-ignore

export function bitOf(letter: Letter): number {
  return 1 << (letter.charCodeAt(0) - 65);
}

export const BIT = {
  F: bitOf('F'), H: bitOf('H'), I: bitOf('I'), J: bitOf('J'), K: bitOf('K'), O: bitOf('O'), P: bitOf('P'), R: bitOf('R'),
  S: bitOf('S'), T: bitOf('T'), X: bitOf('X'), Y: bitOf('Y'), Z: bitOf('Z'),
} as const; // prettier-ignore

/** Letters whose number is a length. */
const LENGTHS = BIT.X | BIT.Y | BIT.Z | BIT.I | BIT.J | BIT.K | BIT.R;

export const AXES = BIT.X | BIT.Y | BIT.Z;

export function valueOf(block: Block, letter: Letter): number {
  return block.values[letter.charCodeAt(0) - 65] ?? 0;
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

/** Sorts the words; answers what is wrong with them, if anything. */
export function sortWords(words: LineWords, codes: Codes, block: Block): string | undefined {
  block.g.fill(-1);
  block.m.fill(-1);
  block.given = 0;
  block.words = words.count;
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
  return undefined;
}

function sortValue(
  letter: number,
  value: number,
  pointed: boolean,
  codes: Codes,
  block: Block,
): string | undefined {
  const bit = 1 << (letter - 65);
  const name = String.fromCharCode(letter);
  if (block.given & bit) {
    return `${name} is given twice on one line`;
  }
  const isLength = (LENGTHS & bit) !== 0;
  if (!Number.isFinite(value) || (isLength && Math.abs(value) > codes.valueLargest)) {
    return `${name}${String(value)} is more than the ${String(codes.valueLargest)} this machine reads`;
  }
  if (codes.pointAlways && !pointed && value !== 0 && isLength) {
    return `${name}${String(value)} has no decimal point; this machine would count it in thousandths`;
  }
  block.given |= bit;
  block.values[letter - 65] = value;
  return undefined;
}

function sortG(value: number, codes: Codes, block: Block): string | undefined {
  const code = wholeOf(value * 10) ?? -1;
  const group = (codes.g[code] ?? 0) - 1;
  if (group < 0) {
    return `G${String(value)} is no word of this machine file that can be read`;
  }
  if ((block.g[group] ?? -1) >= 0) {
    return `G${String(value)} and G${String((block.g[group] ?? 0) / 10)} exclude each other on one line`;
  }
  block.g[group] = code;
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
