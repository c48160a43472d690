/**
 * A derived value as a person reads it: lengths with their unit, the job's first; counts, shares and words as they are.
 * The keys are those of the job file, so the unit of each is known from its name.
 */
import type { LengthUnit } from '../base/units.ts';
import { sizeOnly } from './lengths.ts';
import { plain } from './words.ts';

/** Last words of keys whose values are lengths. */
const LENGTHS =
  /(?:^|\.)(?:cuts|flute|shank|stick-out|runout|reach|centres|root|below|thickness|clear|bored|allowance|leave|skin|at-hub|at-rim|corner|diameter|x|y)$/;
/** Of the mate and of the dedendum, in modules. */
const MODULES = /^(?:wheel\.)?(?:mate\.(?:leaf|dedendum|trundle)|dedendum)$/;
const MODULE = /(?:^|\.)module$/;

export function displayed(key: string, value: number | string, unit: LengthUnit): string {
  if (typeof value === 'string') {
    return value;
  }
  if (MODULES.test(key)) {
    return `${plain(value, 4)} modules`;
  }
  if (MODULE.test(key)) {
    return `${plain(value, 5)} mm`;
  }
  return LENGTHS.test(key) ? sizeOnly(value, unit) : plain(value, 5);
}
