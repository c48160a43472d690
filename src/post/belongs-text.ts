/**
 * The lines that divide a program, so that a person with a broken cutter finds their place: pass, lap with its depth,
 * tooth. Made in this one place from what a step belongs to.
 *
 * In  : the step's `Belongs`, the program's unit. Out: `Roughing, lap 3 of 12, down to -0.3600 mm, tooth 5`.
 */
import { fixedDecimals } from '../base/fixed-decimals.ts';
import { millimetresPer, type LengthUnit } from '../base/units.ts';
import type { Belongs } from '../motion/motion.ts';

export function belongsText(belongs: Belongs, unit: LengthUnit): string {
  const parts = [belongs.pass.charAt(0).toUpperCase() + belongs.pass.slice(1)];
  if (belongs.ring !== undefined) {
    parts.push(`ring ${belongs.ring}${belongs.rings === undefined ? '' : ` of ${belongs.rings}`}`);
  }
  if (belongs.together === true) {
    parts.push(
      `tooth ${belongs.tooth ?? 1}`,
      belongs.laps === 1 ? 'in one level' : `in ${belongs.laps ?? 1} levels`,
    );
    return parts.join(', ');
  }
  if (belongs.lap !== undefined) {
    parts.push(`lap ${belongs.lap}${belongs.laps === undefined ? '' : ` of ${belongs.laps}`}`);
  }
  if (belongs.depth !== undefined) {
    parts.push(`down to height ${lengthInWords(belongs.depth, unit)}`);
  }
  if (belongs.tooth !== undefined) {
    parts.push(`tooth ${belongs.tooth}${belongs.again === true ? ' again' : ''}`);
  }
  return parts.join(', ');
}

export function belongsElsewhere(a: Belongs | undefined, b: Belongs): boolean {
  return (
    a === undefined ||
    a.pass !== b.pass ||
    a.tooth !== b.tooth ||
    (b.together !== true && (a.lap !== b.lap || a.depth !== b.depth)) ||
    a.ring !== b.ring ||
    a.again !== b.again
  );
}

/** A length with its unit as a word: three decimals of a millimetre, four of an inch. */
export function lengthInWords(mm: number, unit: LengthUnit): string {
  const decimals = unit === 'mm' ? 3 : 4;
  return `${fixedDecimals(mm / millimetresPer(unit), decimals)} ${unit}`;
}

/** A size that tells a wrong unit: in the program's unit first, then in the other. */
export function bothUnits(mm: number, unit: LengthUnit): string {
  return `${lengthInWords(mm, unit)} or ${lengthInWords(mm, unit === 'mm' ? 'inch' : 'mm')}`;
}

/** What a person holds a rule to: in the program's unit, and in the job's where that is another. */
export function lengthToMeasure(mm: number, unit: LengthUnit, jobUnit: LengthUnit | undefined): string {
  return jobUnit === undefined || jobUnit === unit ? lengthInWords(mm, unit) : bothUnits(mm, unit);
}
