/**
 * The words of one line, in arrays that are used again for every line, so that reading makes no garbage.
 *
 * A word is a letter (its capital's character code) and a number; `columns` are 1-based, of the letter.
 */

/** No line may hold more words: a controller's line of 256 characters holds 128. */
const MOST_WORDS = 192;

export interface LineWords {
  /** The line's span in the text, line end not in it. */
  start: number;
  end: number;
  count: number;
  readonly letters: Uint8Array;
  readonly values: Float64Array;
  readonly columns: Uint32Array;
  /** 1 where the number is written with a decimal point. */
  readonly pointed: Uint8Array;
  /** A / stands first. */
  skipped: boolean;
  /** What follows a % that stands first, or undefined. */
  percent: string | undefined;
  /** The line's own number, or -1. */
  number: number;
  /** Digits that number is written with. */
  numberDigits: number;
  /** Small letters were used in words. */
  small: boolean;
  /** Spaces stand inside a number. */
  spaced: boolean;
  /** Comments in order, without their marks. */
  comments: string[];
  /** Why the line can't be split into words, and where, or undefined. */
  fault: string | undefined;
  faultColumn: number;
}

export function emptyLineWords(): LineWords {
  return {
    start: 0,
    end: 0,
    count: 0,
    letters: new Uint8Array(MOST_WORDS),
    values: new Float64Array(MOST_WORDS),
    columns: new Uint32Array(MOST_WORDS),
    pointed: new Uint8Array(MOST_WORDS),
    skipped: false,
    percent: undefined,
    number: -1,
    numberDigits: 0,
    small: false,
    spaced: false,
    comments: [],
    fault: undefined,
    faultColumn: 0,
  };
}

export function clearLineWords(words: LineWords): void {
  words.count = 0;
  words.skipped = false;
  words.percent = undefined;
  words.number = -1;
  words.numberDigits = 0;
  words.small = false;
  words.spaced = false;
  if (words.comments.length > 0) {
    words.comments = [];
  }
  words.fault = undefined;
  words.faultColumn = 0;
}
