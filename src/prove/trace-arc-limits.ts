/**
 * What a controller can't run, or runs otherwise, of the arcs that can be written: by the machine file's `arcs`.
 *
 * Frame: the program's; mm, radians. A turn may pass a limit by what rounding to the last digit does to its ends.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { millimetresPer, degrees, radians, type LengthUnit } from '../base/units.ts';
import type { Point } from '../geometry/point.ts';
import type { Machine } from '../machine/machine.ts';
import type { Here } from './modes.ts';
import { badArc, type Refusal } from './trace-run.ts';

/** Largest difference of start and end radius, mm: the absolute one, or where a share of the radius is given the larger of both rules. */
export function arcMissAllowed(machine: Machine, unit: LengthUnit, radius: number): number {
  const { missAbsolute, missShare, missAtMost } = machine.words.arcs;
  const absolute = missAbsolute[unit] * millimetresPer(unit) + SAME_POINT;
  if (missShare === null) {
    return absolute;
  }
  return Math.max(absolute, Math.min(missShare * radius, missAtMost ?? Infinity));
}

/**
 * Rounding of an arc's ends, centre or radius, in units of the last digit. Why: in radius form at 120 degrees, the worst that
 * is written, a chord sqrt(2) units off and a radius half a unit off turn it by sqrt(2) / cos 60 + tan 60 = 4.6 units.
 */
const ROUNDED_TURN_UNITS = 5;

/** That rounding as an angle, seen from the centre. */
function slack(machine: Machine, unit: LengthUnit, radius: number): number {
  const last = millimetresPer(unit) * 10 ** -machine.words.numbers.lengthDecimals[unit];
  return (ROUNDED_TURN_UNITS * last) / radius;
}

export function arcOutOfLimits(
  machine: Machine,
  unit: LengthUnit,
  from: Here,
  to: Here,
  arc: { readonly centre: Point; readonly turn: number },
): Refusal | undefined {
  const { arcs } = machine.words;
  const size = Math.abs(arc.turn);
  const start = { x: (from.x ?? 0) - arc.centre.x, y: (from.y ?? 0) - arc.centre.y };
  const loose = slack(machine, unit, Math.hypot(start.x, start.y));
  if (!arcs.helix && from.z !== to.z) {
    return badArc('an arc that changes Z; this machine has none');
  }
  if (size === 2 * Math.PI && arcs.wholeCircle === 'split') {
    return badArc('an arc ends at its start; this machine takes it for nothing');
  }
  if (size > radians(arcs.longestSweep) + loose && arcs.longestSweep < 360) {
    return badArc(
      `an arc turns ${degrees(size).toFixed(2)} degrees; this machine runs ${String(arcs.longestSweep)} at most`,
    );
  }
  if (arcs.quadrants && crossesQuadrant(Math.atan2(start.y, start.x), arc.turn, loose)) {
    return badArc('an arc runs over the end of its quadrant; this machine runs quadrants only');
  }
  return undefined;
}

/** Whether a multiple of a quarter turn lies inside the arc, away from both ends by more than `loose`. */
function crossesQuadrant(start: number, turn: number, loose: number): boolean {
  const quarter = Math.PI / 2;
  const low = Math.min(start, start + turn) + loose;
  const high = Math.max(start, start + turn) - loose;
  return Math.ceil(low / quarter) * quarter < high;
}
