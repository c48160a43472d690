/**
 * Dangers of arcs: centres that round away, circles that turn into nothing or nothing into circles.
 * Maths: with start, end and centre each rounded to a unit u of the last digit, start and end radius differ by at most
 * 2 sqrt(2) u (half circle at 45 degrees); with the best of the centre's nine nearest roundings, 1.22 u was the most seen.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import { millimetresPer } from '../base/units.ts';
import { danger, those, caution, type Danger } from './danger.ts';
import type { Machine } from './machine.ts';

/** Units of the last digit by which rounding alone can make the radii differ. */
const MISS_OF_ROUNDING = 2 * Math.SQRT2;
/** The same where the centre is chosen from its nine nearest roundings.
 *  Why: 1.22 was seen in two million random arcs, and a little is added. */
const MISS_AFTER_REPAIR = 1.3;
/** Units of the last digit that an arc's ends must lie apart. Why: up to 1.5 they can round together, and a whole circle is cut. */
const ENDS_APART = 10;
/** Units of the last digit of the least radius. Why: a rounded centre must still lie inside. */
const RADIUS_UNITS = 3;
/** Degrees of the longest arc in radius form. Why: a unit too little in the chord of a half circle moves its centre a hundredfold. */
const RADIUS_SWEEP = 120;

export function arcDangers(machine: Machine): readonly Danger[] {
  const { arcs } = machine.words;
  if (arcs.planes === 'none') {
    return those(
      arcs.helix &&
        danger(
          'words.arcs.helix',
          'A helix on a controller without arcs would be an alarm, or a straight line down through the part.',
          'Say helix: no.',
        ),
      arcs.chordTolerance > FORM_ERROR &&
        danger(
          'words.arcs.chord-tolerance',
          `Chords that miss the curve by ${arcs.chordTolerance} mm would leave facets on the flanks; ${FORM_ERROR} mm is what a flank may miss.`,
          `Give at most ${FORM_ERROR} mm; 0.0005 is usual.`,
        ),
    );
  }
  return [...roundingDangers(machine), ...formDangers(machine), ...circleDangers(machine)];
}

function roundingDangers(machine: Machine): readonly Danger[] {
  const { arcs, numbers } = machine.words;
  const { units } = machine;
  const unit = 10 ** -numbers.lengthDecimals[units];
  const unitMm = unit * millimetresPer(units);
  const miss = arcs.missAbsolute[units];
  const path = `words.arcs.miss-absolute.${units}`;
  const hint = `Give one more decimal (length-decimals), or the true limit of the controller.`;
  return those(
    miss < MISS_AFTER_REPAIR * unit &&
      danger(
        path,
        `${miss} ${units} is less than rounding to ${numbers.lengthDecimals[units]} decimals can keep to: the controller would stop with an arc alarm in the cut.`,
        hint,
      ),
    miss >= MISS_AFTER_REPAIR * unit &&
      miss < MISS_OF_ROUNDING * unit &&
      caution(
        path,
        `Rounding to ${numbers.lengthDecimals[units]} decimals can miss by ${(MISS_OF_ROUNDING * unit).toPrecision(2)} ${units}, more than ${miss}: about one arc in some thousands needs another centre to pass.`,
        hint,
      ),
    arcs.shortestChord < ENDS_APART * unitMm &&
      danger(
        'words.arcs.shortest-chord',
        `An arc as short as ${arcs.shortestChord} mm may start and end on the same rounded point, and the controller would cut a whole circle there.`,
        `Give at least ${ENDS_APART} units of the last digit: ${(ENDS_APART * unitMm).toPrecision(2)} mm.`,
      ),
    arcs.smallestRadius < RADIUS_UNITS * unitMm &&
      danger(
        'words.arcs.smallest-radius',
        `At a radius of ${arcs.smallestRadius} mm rounding turns the arc's direction at will.`,
        `Give at least ${(RADIUS_UNITS * unitMm).toPrecision(2)} mm.`,
      ),
    (arcs.missShare === null) !== (arcs.missAtMost === null) &&
      danger(
        'words.arcs.miss-share',
        'miss-share and miss-at-most make one rule together; with one alone an arc might be written that the controller stops at.',
        'Give both, or none for both.',
      ),
  );
}

function formDangers(machine: Machine): readonly Danger[] {
  const { centre, centreWord, zeroWords, longestSweep } = machine.words.arcs;
  const against = { 'from-start': 'G90.1', 'from-zero': 'G91.1', radius: '' }[centre];
  return those(
    centreWord === against &&
      danger(
        'words.arcs.centre-word',
        `${centreWord} says the opposite of centre: ${centre}; every arc would have its centre in the wrong place, with a huge sweep through part and clamps.`,
        'G91.1 goes with from-start, G90.1 with from-zero.',
      ),
    centre === 'from-zero' &&
      zeroWords === 'omit' &&
      danger(
        'words.arcs.zero-words',
        'With centres from zero a word that is left out is an alarm, or is taken from the start point: a wrong arc.',
        'Say zero-words: write.',
      ),
    centre === 'radius' &&
      longestSweep > RADIUS_SWEEP &&
      danger(
        'words.arcs.longest-sweep',
        `In radius form an arc of ${longestSweep} degrees moves its centre by tenths of a millimetre when a chord rounds short, or cannot be drawn at all.`,
        `Give at most ${RADIUS_SWEEP} degrees.`,
      ),
  );
}

function circleDangers(machine: Machine): readonly Danger[] {
  const { centre, wholeCircle, endWords, longestSweep, quadrants } = machine.words.arcs;
  const oneBlock = wholeCircle === 'one-block';
  return those(
    oneBlock &&
      centre === 'radius' &&
      danger(
        'words.arcs.whole-circle',
        'A whole circle in radius form starts where it ends, and is no move at all, or an alarm.',
        'Say whole-circle: split.',
      ),
    oneBlock &&
      centre !== 'radius' &&
      endWords === 'changed' &&
      danger(
        'words.arcs.end-words',
        'A whole circle ends where it starts; without its end words some controllers stop and some make no move.',
        'Say end-words: both, or whole-circle: split.',
      ),
    oneBlock &&
      (longestSweep < 360 || quadrants) &&
      danger(
        'words.arcs.whole-circle',
        `A whole circle in one block turns more than the controller's longest arc: it would stop, or cut the wrong part of it.`,
        'Say whole-circle: split.',
      ),
  );
}
