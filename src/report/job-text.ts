/**
 * Sentences of other stages, which speak millimetres, as the sheet of an inch job says them: every length and feed in inches
 * first, the millimetres beside it. A text of a metric job stays as it is.
 */
import { MM_PER_INCH, type LengthUnit } from '../base/units.ts';
import { withMinus } from './lengths.ts';
import { fixed } from './words.ts';

export function jobText(text: string, unit: LengthUnit): string {
  return unit === 'mm'
    ? text
    : text.replace(LENGTH, (written: string, figure: string, rate: string | undefined) => {
        const decimals = Math.max((figure.split('.')[1] ?? '').length + 1, rate === undefined ? 4 : 1);
        const inches = withMinus(fixed(Number(figure) / MM_PER_INCH, decimals));
        return `${inches}\u00a0in${rate ?? ''} (${withMinus(written).replace(' ', '\u00a0')})`;
      });
}

/** A figure and its unit, where no other unit stands beside it already and it is no area. */
const LENGTH = /(?<!inch \(|[\d.-])(-?\d+(?:\.\d+)?) mm(\/min)?(?![\w²/]|\s*(?:\(|or\b))/g;
