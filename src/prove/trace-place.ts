/**
 * From axis words to a place. In: the words, the unit and distance mode, where the machine stands. Out: mm, null for an
 * axis that is not known.
 *
 * Steps are added as whole multiples of 1e-9 of the program's unit, so that ten steps of 0.1 end exactly where 1 does
 * and a circle that closes on paper closes here.
 */
import { millimetresPer } from '../base/units.ts';
import { BIT, valueOf, type Block } from './block.ts';
import type { Here } from './modes.ts';
import { isLengthKnown, unread, type Refusal, type Run } from './trace-run.ts';

/** Steps of the program's unit: whole numbers of them are exact doubles up to 9 million units. */
const STEPS = 1e9;

/** What keeps a place from being read: no unit or no distance mode yet. */
export function placeRefused(run: Run): Refusal | undefined {
  if (run.modes.unit === undefined) {
    return unread('a place is named before the unit is (a factor of 25.4)');
  }
  if (run.modes.distance === undefined) {
    return unread('a place is named before G90 or G91 says whether it is a place or a step');
  }
  return undefined;
}

/** Millimetres of a length word. */
export function lengthOf(run: Run, value: number): number {
  return value * millimetresPer(run.modes.unit ?? 'mm');
}

/** Where the axis words lead; axes that are not given stay. `placeRefused` has been asked. */
export function placeOf(run: Run, block: Block, axes: number): Here {
  const { here, modes } = run;
  const given = axes & block.given;
  const unit = millimetresPer(modes.unit ?? 'mm');
  const isAbsolute = modes.distance === 'absolute';
  const { x, y, z } = here;
  const { shift } = run;
  return {
    x: given & BIT.X ? axisPlace(x, valueOf(block, 'X'), unit, isAbsolute, shift.x) : x,
    y: given & BIT.Y ? axisPlace(y, valueOf(block, 'Y'), unit, isAbsolute, shift.y) : y,
    z: !isLengthKnown(run)
      ? null
      : given & BIT.Z
        ? axisPlace(z, valueOf(block, 'Z'), unit, isAbsolute, shift.z)
        : z,
  };
}

/** A step from a place, both in mm, as a step of the program's unit. */
export function stepFrom(run: Run, from: number, step: number): number {
  const unit = millimetresPer(run.modes.unit ?? 'mm');
  return ((Math.round((from / unit) * STEPS) + Math.round((step / unit) * STEPS)) / STEPS) * unit;
}

function axisPlace(
  from: number | null,
  value: number,
  unit: number,
  isAbsolute: boolean,
  shift: number,
): number | null {
  if (isAbsolute) {
    return value * unit + shift;
  }
  return from === null
    ? null
    : ((Math.round((from / unit) * STEPS) + Math.round(value * STEPS)) / STEPS) * unit;
}
