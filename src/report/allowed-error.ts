/** The form error a program is allowed: the budget and one unit of the last digit, mm. */
import { FORM_ERROR } from '../base/tolerances.ts';
import { millimetresPer } from '../base/units.ts';
import type { Machine } from '../machine/machine.ts';

export function allowedError({ units, words }: Machine): number {
  return FORM_ERROR + 10 ** -words.numbers.lengthDecimals[units] * millimetresPer(units);
}
