/**
 * A root between two ends of opposite sign, and the least value on a span.
 *
 * The root finder is Newton-free: false position kept honest by bisection (the Illinois rule, Dowell and Jarratt 1971).
 * The minimum is looked for on a grid first, then by golden section, so that one dip among several is the deepest.
 */
import { Bug } from '../base/bug.ts';

/** x in [a, b] with |f(x)| <= `enough`, or to the last bits of x; f(a) and f(b) must not share a sign. */
export function findRoot(f: (x: number) => number, a: number, b: number, enough = 0): number {
  let low = a;
  let high = b;
  let fLow = f(low);
  let fHigh = f(high);
  if (fLow === 0 || fHigh === 0) {
    return fLow === 0 ? low : high;
  }
  if (fLow > 0 === fHigh > 0) {
    throw new Bug(`no root is bracketed between ${a} and ${b}`);
  }
  for (let step = 0; step < 200; step++) {
    const guess = low + ((high - low) * fLow) / (fLow - fHigh);
    // Every fourth step halves, so that a flat end cannot hold the bracket open.
    const x =
      step % 4 === 3 || !(guess > Math.min(low, high)) || !(guess < Math.max(low, high))
        ? (low + high) / 2
        : guess;
    const value = f(x);
    if (Math.abs(value) <= enough || x === low || x === high) {
      return x;
    }
    if (value > 0 === fHigh > 0) {
      high = x;
      fHigh = value;
      fLow /= 2;
    } else {
      low = x;
      fLow = value;
      fHigh /= 2;
    }
  }
  return (low + high) / 2;
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Where f is least on [a, b]: the best of a grid of `cells`, closed in on to `width`. */
export function leastOn(
  f: (x: number) => number,
  a: number,
  b: number,
  cells: number,
  width: number,
): { readonly x: number; readonly value: number } {
  let best = 0;
  const values = Array.from({ length: cells + 1 }, (_, i) => f(a + ((b - a) * i) / cells));
  values.forEach((value, i) => {
    best = value < (values[best] as number) ? i : best;
  });
  let low = a + ((b - a) * Math.max(best - 1, 0)) / cells;
  let high = a + ((b - a) * Math.min(best + 1, cells)) / cells;
  let left = high - GOLDEN * (high - low);
  let right = low + GOLDEN * (high - low);
  let fLeft = f(left);
  let fRight = f(right);
  while (Math.abs(high - low) > width && left < right === low < high && left !== right) {
    if (fLeft < fRight) {
      high = right;
      right = left;
      fRight = fLeft;
      left = high - GOLDEN * (high - low);
      fLeft = f(left);
    } else {
      low = left;
      left = right;
      fLeft = fRight;
      right = low + GOLDEN * (high - low);
      fRight = f(right);
    }
  }
  const inside = fLeft < fRight ? { x: left, value: fLeft } : { x: right, value: fRight };
  const onGrid = { x: a + ((b - a) * best) / cells, value: values[best] as number };
  return onGrid.value <= inside.value ? onGrid : inside;
}
