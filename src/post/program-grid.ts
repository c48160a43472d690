/**
 * The grid a program can name: whole counts of the last digit of its lengths. Every place is kept in these counts, as
 * the controller will read it, so that rounding never adds up over a program.
 *
 * In  : mm. Out: counts; `perMm` of them to a millimetre, `perUnit` to a unit of the program (mm or inch).
 */
import { millimetresPer, type LengthUnit } from '../base/units.ts';
import type { Machine } from '../machine/machine.ts';

export interface Grid {
  readonly unit: LengthUnit;
  readonly decimals: number;
  readonly perUnit: number;
  readonly perMm: number;
}

export function programGrid(machine: Machine): Grid {
  const unit = machine.units;
  const decimals = machine.words.numbers.lengthDecimals[unit];
  const perUnit = 10 ** decimals;
  return { unit, decimals, perUnit, perMm: perUnit / millimetresPer(unit) };
}

/** The nearest count; `+ 0` turns -0 into 0. */
export function toGrid(grid: Grid, mm: number): number {
  return Math.round(mm * grid.perMm) + 0;
}
