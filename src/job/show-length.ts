/** Lengths in the messages of a job: in mm, and for a job in inches with inches first. */
import { fixedDecimals } from '../base/fixed-decimals.ts';
import { MM_PER_INCH, type LengthUnit } from '../base/units.ts';

export function showLength(mm: number, unit: LengthUnit): string {
  return unit === 'mm' ? `${figure(mm, 4)} mm` : `${figure(mm / MM_PER_INCH, 5)} inch (${figure(mm, 3)} mm)`;
}

/** A range in the job's unit: `0.05 to 25 mm`. */
export function showRange(least: number, most: number, unit: LengthUnit): string {
  return unit === 'mm'
    ? `${figure(least, 4)} to ${figure(most, 4)} mm`
    : `${figure(least / MM_PER_INCH, 4)} to ${figure(most / MM_PER_INCH, 3)} inch`;
}

/** At most so many decimals, without zeros at the end. */
export function figure(value: number, decimals: number): string {
  return String(Number(fixedDecimals(value, decimals)));
}
