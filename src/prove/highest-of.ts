/** Where a function with one peak between two places is greatest, by golden section: a kink is as good to it as a crown. */
const GOLDEN = (Math.sqrt(5) - 1) / 2;
/** Cuts the span to a two-hundredth: from a few hundredths of a millimetre to a fraction of a micrometre. */
const CUTS = 11;

export function highestOf(f: (u: number) => number, low: number, high: number): number {
  let [a, b] = [low, high];
  let [c, d] = [b - GOLDEN * (b - a), a + GOLDEN * (b - a)];
  let [fc, fd] = [f(c), f(d)];
  for (let k = 0; k < CUTS; k++) {
    if (fc > fd) {
      [b, d, fd] = [d, c, fc];
      c = b - GOLDEN * (b - a);
      fc = f(c);
    } else {
      [a, c, fc] = [c, d, fd];
      d = a + GOLDEN * (b - a);
      fd = f(d);
    }
  }
  return (a + b) / 2;
}
