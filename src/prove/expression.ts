/**
 * Values that are reckoned: numbers, [expressions], #parameters and functions, as NISTIR 6556 §3.3.2 writes them.
 *
 * In  : a line without its blanks, in capitals, and where in it a value begins.
 * Out : a tree, its operations bound as §3.3.2.3 says: ** first, then * / MOD, then + - OR XOR AND, each from left to right.
 * Comparisons (EQ NE GT GE LT LE) are not in the report; controllers that have loops have them. These bind them, and OR XOR
 * AND, otherwise than each other, so where the two kinds or a sum stand side by side brackets are asked for.
 */
import { emptyReading, readNumber } from './tokenize-number.ts';

export type Binary =
  | '**' | '*' | '/' | 'MOD' | '+' | '-' | 'OR' | 'XOR' | 'AND' | 'EQ' | 'NE' | 'GT' | 'GE' | 'LT' | 'LE'; // prettier-ignore
export type Unary =
  | 'ABS' | 'ACOS' | 'ASIN' | 'COS' | 'EXP' | 'FIX' | 'FUP' | 'LN' | 'ROUND' | 'SIN' | 'SQRT' | 'TAN'; // prettier-ignore

export type Expression =
  | { readonly kind: 'number'; readonly value: number; readonly pointed: boolean }
  | { readonly kind: 'parameter'; readonly of: Expression }
  | { readonly kind: 'named'; readonly name: string }
  | { readonly kind: 'unary'; readonly name: Unary; readonly of: Expression }
  | { readonly kind: 'atan'; readonly over: Expression; readonly under: Expression }
  | { readonly kind: 'binary'; readonly op: Binary; readonly left: Expression; readonly right: Expression };

/** Where reading stands; `fault` is the first thing that is wrong, at `at`. */
export interface Cursor {
  readonly text: string;
  at: number;
  fault: string | undefined;
  /** Names like #<depth> are read. */
  readonly named: boolean;
  /** EQ and its like are read. */
  readonly comparisons: boolean;
}

const UNARIES: readonly (Unary | 'ATAN')[] = [
  'ABS', 'ACOS', 'ASIN', 'ATAN', 'COS', 'EXP', 'FIX', 'FUP', 'LN', 'ROUND', 'SIN', 'SQRT', 'TAN',
]; // prettier-ignore

/** Each with how tightly it binds; ** before *. */
const BINARIES: readonly (readonly [Binary, number])[] = [
  ['**', 3], ['*', 2], ['/', 2], ['MOD', 2], ['+', 1], ['-', 1], ['OR', 1], ['XOR', 1], ['AND', 1],
]; // prettier-ignore
const COMPARISONS: readonly (readonly [Binary, number])[] = [
  ['EQ', 0], ['NE', 0], ['GT', 0], ['GE', 0], ['LT', 0], ['LE', 0],
]; // prettier-ignore
const LOGIC: ReadonlySet<Binary> = new Set(['OR', 'XOR', 'AND']);
const SUMS: ReadonlySet<Binary> = new Set(['+', '-']);

const reading = emptyReading();

export function faultAt(cursor: Cursor, why: string): undefined {
  cursor.fault ??= why;
  return undefined;
}

export function takes(cursor: Cursor, sign: string): boolean {
  if (!cursor.text.startsWith(sign, cursor.at)) {
    return false;
  }
  cursor.at += sign.length;
  return true;
}

/** §3.3.2: what may follow a letter or an equals sign. */
export function readValue(cursor: Cursor): Expression | undefined {
  if (takes(cursor, '[')) {
    return readBracket(cursor);
  }
  if (takes(cursor, '#')) {
    return readParameter(cursor);
  }
  const name = UNARIES.find((unary) => cursor.text.startsWith(`${unary}[`, cursor.at));
  return name === undefined ? readPlain(cursor) : readUnary(cursor, name);
}

function readPlain(cursor: Cursor): Expression | undefined {
  readNumber(cursor.text, cursor.at, cursor.text.length, reading);
  if (reading.fault !== undefined) {
    return faultAt(cursor, reading.fault);
  }
  cursor.at = reading.end;
  return { kind: 'number', value: reading.value, pointed: reading.pointed };
}

/** What follows #: a value that is its number, or a name where the controller has them. */
export function readParameter(cursor: Cursor): Expression | undefined {
  if (!takes(cursor, '<')) {
    const of = readValue(cursor);
    return of && { kind: 'parameter', of };
  }
  const end = cursor.text.indexOf('>', cursor.at);
  const name = cursor.text.slice(cursor.at, Math.max(end, cursor.at));
  if (!cursor.named || !/^[A-Z0-9_]+$/.test(name)) {
    return faultAt(
      cursor,
      cursor.named ? 'a name in < > of letters, digits and _' : 'names of parameters are not read',
    );
  }
  cursor.at = end + 1;
  return { kind: 'named', name };
}

function readUnary(cursor: Cursor, name: Unary | 'ATAN'): Expression | undefined {
  cursor.at += name.length + 1;
  const of = readBracket(cursor);
  if (name !== 'ATAN') {
    return of && { kind: 'unary', name, of };
  }
  if (of === undefined || !takes(cursor, '/[')) {
    return faultAt(cursor, 'ATAN wants two expressions, ATAN[ ]/[ ]');
  }
  const under = readBracket(cursor);
  return under && { kind: 'atan', over: of, under };
}

/** After [ and up to its ]. */
function readBracket(cursor: Cursor): Expression | undefined {
  const values: Expression[] = [];
  const ops: (readonly [Binary, number])[] = [];
  for (;;) {
    const value = readValue(cursor);
    if (value === undefined) {
      return undefined;
    }
    values.push(value);
    if (takes(cursor, ']')) {
      break;
    }
    const op = takeBinary(cursor);
    if (op === undefined) {
      return faultAt(cursor, 'an operation or ] must follow a value in brackets');
    }
    ops.push(op);
  }
  if (cursor.comparisons && isBoundDifferently(ops.map(([op]) => op))) {
    return faultAt(cursor, 'controllers bind these operations differently: put brackets round each of them');
  }
  return bind(values, ops);
}

function takeBinary(cursor: Cursor): readonly [Binary, number] | undefined {
  return (
    BINARIES.find(([op]) => takes(cursor, op)) ??
    (cursor.comparisons ? COMPARISONS.find(([op]) => takes(cursor, op)) : undefined)
  );
}

function isBoundDifferently(ops: readonly Binary[]): boolean {
  const compares = ops.filter((op) => COMPARISONS.some(([name]) => name === op)).length;
  const logic = ops.filter((op) => LOGIC.has(op));
  return (
    compares > 1 ||
    new Set(logic).size > 1 ||
    (logic.length > 0 && (compares > 0 || ops.some((op) => SUMS.has(op))))
  );
}

/** The tightest first, each kind from left to right. */
function bind(values: Expression[], ops: (readonly [Binary, number])[]): Expression {
  for (let tight = 3; tight >= 0; tight--) {
    let kept = 0;
    for (let k = 0; k < ops.length; k++) {
      const [op, binds] = ops[k]!;
      if (binds === tight) {
        values[kept] = { kind: 'binary', op, left: values[kept]!, right: values[k + 1]! };
      } else {
        ops[kept] = ops[k]!;
        kept += 1;
        values[kept] = values[k + 1]!;
      }
    }
    ops.length = kept;
  }
  return values[0]!;
}
