/**
 * How the report writes lengths: the job's own unit first, and the other beside it where a person measures.
 *
 * In  : mm, and the unit of the job. Out: text with its unit, three decimals of a millimetre, four of an inch.
 */
import { MM_PER_INCH, millimetresPer, type LengthUnit } from '../base/units.ts';
import { fixed, plain } from './words.ts';

/** "31.471", "1.2390": on a drawing, whose caption says the unit. */
export function bareLength(mm: number, unit: LengthUnit): string {
  return withMinus(fixed(mm / millimetresPer(unit), unit === 'mm' ? 3 : 4));
}

/** "31.471 mm", "1.2390 in". */
export function lengthOnly(mm: number, unit: LengthUnit): string {
  return `${bareLength(mm, unit)}${NO_BREAK}${shortUnit(unit)}`;
}

/** "31.471 mm (1.2390 in)", "1.2390 in (31.471 mm)". */
export function lengthBoth(mm: number, unit: LengthUnit): string {
  return `${lengthOnly(mm, unit)} (${lengthOnly(mm, other(unit))})`;
}

/** A size as it is said, not measured: "1.5 mm", "1/16 in" is "0.0625 in". */
export function sizeOnly(mm: number, unit: LengthUnit): string {
  return `${withMinus(plain(mm / millimetresPer(unit), unit === 'mm' ? 4 : 5))}${NO_BREAK}${shortUnit(unit)}`;
}

/** What is read in micrometres; in an inch job with the millionths of an inch first. */
export function tinyLength(mm: number, unit: LengthUnit, decimals = 2): string {
  const micrometres = `${fixed(mm * 1000, decimals)}${NO_BREAK}µm`;
  return unit === 'mm' ? micrometres : `${fixed((mm / MM_PER_INCH) * 1e6, 0)}${NO_BREAK}µin (${micrometres})`;
}

export function shortUnit(unit: LengthUnit): string {
  return unit === 'mm' ? 'mm' : 'in';
}

export function unitInWords(unit: LengthUnit): string {
  return unit === 'mm' ? 'millimetres' : 'inches';
}

/** Between a figure and its unit. */
const NO_BREAK = '\u00a0';

/** A minus as wide as the figures. */
export function withMinus(figure: string): string {
  return figure.replace('-', '\u2212');
}

function other(unit: LengthUnit): LengthUnit {
  return unit === 'mm' ? 'inch' : 'mm';
}
