/**
 * One number of a word, as NISTIR 6556 §3.3.2.1 has it: an optional sign, digits with at most one point among them and at
 * least one digit; blanks may stand anywhere in it (§3.3). No exponent, no second point, no second sign.
 *
 * The digits are gathered as a whole number and divided once by a power of ten: exact doubles both, so the quotient is
 * the double nearest to what is written. Longer numbers go through the language's own reading.
 */
export interface NumberReading {
  value: number;
  /** Index after the number's last character. */
  end: number;
  pointed: boolean;
  signed: boolean;
  /** A blank stands between its characters. */
  spaced: boolean;
  digits: number;
  fault: string | undefined;
}

/** Powers of ten that are exact doubles. */
const TENS = Array.from({ length: 23 }, (_, power) => Number(`1e${String(power)}`));
/** Digits that surely fit a double's 53 bits. */
const EXACT_DIGITS = 15;

const BLANK = 32;
const TAB = 9;
const PLUS = 43;
const MINUS = 45;
const POINT = 46;
const ZERO = 48;
const NINE = 57;

export function emptyReading(): NumberReading {
  return { value: 0, end: 0, pointed: false, signed: false, spaced: false, digits: 0, fault: undefined };
}

/** Reads the number that starts at or after `start` into `into`; blanks before it are passed over. */
export function readNumber(text: string, start: number, end: number, into: NumberReading): void {
  let at = start;
  let code = at < end ? text.charCodeAt(at) : 0;
  while (at < end && (code === BLANK || code === TAB)) {
    code = text.charCodeAt(++at);
  }
  const first = at;
  const negative = at < end && code === MINUS;
  const signed = negative || (at < end && code === PLUS);
  if (signed) {
    at += 1;
  }
  let last = at;
  let digits = 0;
  let decimals = 0;
  let pointed = false;
  let gap = false;
  let mantissa = 0;
  into.spaced = false;
  into.fault = undefined;
  for (; at < end; at++) {
    code = text.charCodeAt(at);
    if (code === BLANK || code === TAB) {
      gap = true;
      continue;
    }
    if (code >= ZERO && code <= NINE) {
      mantissa = mantissa * 10 + (code - ZERO);
      digits += 1;
      decimals += pointed ? 1 : 0;
    } else if (code !== POINT) {
      break;
    } else if (pointed) {
      into.fault = 'a number may hold one point';
      break;
    } else {
      pointed = true;
    }
    into.spaced ||= gap;
    last = at + 1;
  }
  if (digits === 0) {
    into.fault ??= 'a number must follow the letter';
  }
  into.value =
    digits <= EXACT_DIGITS
      ? sized(mantissa / (TENS[decimals] ?? 1), negative)
      : longNumber(text, first, last);
  into.end = last;
  into.pointed = pointed;
  into.signed = signed;
  into.digits = digits;
}

/** Never -0: a place has no sign at zero. */
function sized(size: number, negative: boolean): number {
  return negative && size !== 0 ? -size : size;
}

function longNumber(text: string, first: number, last: number): number {
  const value = Number(text.slice(first, last).replace(/[ \t]/g, ''));
  return value === 0 ? 0 : value;
}
