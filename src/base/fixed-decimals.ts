/**
 * A number with just so many decimals, halves away from zero as on paper: 1.5875 is 1.588, though the nearest double lies
 * under it and `toFixed` says 1.587. What a sum left in the last digits of a double is not taken for a part of the figure.
 */
export function fixedDecimals(value: number, decimals: number): string {
  const scaled = Number((Math.abs(value) * 10 ** decimals).toPrecision(SOUND_DIGITS));
  if (!(scaled < LARGEST)) {
    return value.toFixed(decimals);
  }
  const text = (Math.round(scaled) / 10 ** decimals).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? `-${text}` : text;
}

/** Digits of a double that a few sums and conversions leave sound, of some 15.9. */
const SOUND_DIGITS = 13;
/** Beyond it the last digit that is asked for is not among the sound ones. */
const LARGEST = 1e12;
