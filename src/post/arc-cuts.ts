/**
 * Where an arc is cut into the arcs a controller takes: its longest sweep, quadrants, whole circles, radius form.
 *
 * In  : start angle and signed turn (radians), the machine file's arc words.
 * Out : ends of the parts as shares of the turn, rising, the last one 1.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { radians } from '../base/units.ts';
import type { ArcWords } from '../machine/machine.ts';

const WHOLE = 2 * Math.PI;
const QUARTER = Math.PI / 2;

/** In radius form a chord that rounding leaves 0.001 mm short moves the centre of a 120 degree arc by less than that, of
 *  a half circle by a hundred times as much (dh/dc = -c/4h). */
const RADIUS_FORM_SWEEP = radians(120);

const ONE_PART: readonly number[] = [1];

/** Angles closer than SAME_POINT are one angle: on any radius a machine holds that is far below the last digit. */
export function isWholeTurn(turn: number): boolean {
  return Math.abs(turn) > WHOLE - SAME_POINT;
}

export function arcCuts(words: ArcWords, start: number, turn: number, endsMeet: boolean): readonly number[] {
  const most = mostSweep(words, turn, endsMeet);
  const sweep = Math.abs(turn);
  if (!words.quadrants && sweep <= most + SAME_POINT) {
    return ONE_PART;
  }
  const ends = words.quadrants ? [...quadrantCrossings(start, turn), sweep] : [sweep];
  const cuts: number[] = [];
  let from = 0;
  for (const to of ends) {
    const parts = Math.max(1, Math.ceil((to - from - SAME_POINT) / most));
    for (let part = 1; part <= parts; part++) {
      cuts.push((from + ((to - from) * part) / parts) / sweep);
    }
    from = to;
  }
  cuts[cuts.length - 1] = 1;
  return cuts;
}

/** A circle that is not quite whole is halved where its ends (nearly) meet: in one block rounding could make it nothing. */
function mostSweep(words: ArcWords, turn: number, endsMeet: boolean): number {
  const most =
    words.centre === 'radius'
      ? Math.min(radians(words.longestSweep), RADIUS_FORM_SWEEP)
      : radians(words.longestSweep);
  const halve = isWholeTurn(turn) ? words.wholeCircle === 'split' : endsMeet;
  return halve ? Math.min(most, Math.PI) : most;
}

/** Angles travelled, between the ends, at which the arc passes a quadrant's border. */
function quadrantCrossings(start: number, turn: number): readonly number[] {
  const sweep = Math.abs(turn);
  const along = turn < 0 ? -start : start;
  const first = (Math.floor((along + SAME_POINT) / QUARTER) + 1) * QUARTER - along;
  const crossings: number[] = [];
  for (let at = first; at < sweep - SAME_POINT; at += QUARTER) {
    crossings.push(at);
  }
  return crossings;
}
