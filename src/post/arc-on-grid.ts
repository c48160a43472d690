/**
 * An arc as moves between places the program can name, safe after rounding: every arc is judged from its rounded words
 * as the controller will judge it.
 *
 * In  : the exact start, the start as written (counts), the arc step. Out: lines and arcs on the grid, in order.
 *       An arc that rounding would carry off by more than a count is halved.
 * Kept: start and end radius differ by less than the machine file's mismatch; ends that round together, chords too short
 *       and turns that rounding reverses become lines; chords lie within `chord-tolerance` inside the arc's circle.
 * Source of the mismatch rule: NISTIR 6556 section 3.5.3.2, and the two-part rule (absolute, or share of the radius).
 */
import { radians } from '../base/units.ts';
import type { ArcWords } from '../machine/machine.ts';
import type { ArcStep, Position } from '../motion/motion.ts';
import { arcCuts, isWholeTurn } from './arc-cuts.ts';
import { bestArc, strays } from './grid-arc.ts';
import { distance, type GridArc, type GridMove, type GridPlace, type Sweep } from './grid-move.ts';
import { toGrid, type Grid } from './program-grid.ts';

/** Chords under this many counts can round to nothing, and an arc whose ends meet is a full circle: from 1.5 counts none
 *  do, three leave room for both ends. */
const SAFE_CHORD_COUNTS = 3;

/** Counts along the arc beyond which rounding of both ends and the centre (under three counts) cannot turn it round. */
const FAR_FROM_ROUNDING = 16;

/** Radians; arcs that turn less are not halved for straying: no rounding shows in their middle that does not at their ends. */
const LEAST_HALVED = radians(20);

export function arcOnGrid(
  grid: Grid,
  words: ArcWords,
  from: Position,
  start: GridPlace,
  step: ArcStep,
): readonly GridMove[] {
  const sweep = sweepOf(grid, words, from, step);
  if (!fitsAsArc(sweep)) {
    return chords(sweep, start, 0, 1, []);
  }
  const endsMeet =
    Math.abs(sweep.turn) > Math.PI &&
    distance(step.to.x, step.to.y, from.x, from.y) * grid.perMm < sweep.shortest;
  const moves: GridMove[] = [];
  let place = start;
  let share = 0;
  for (const next of arcCuts(words, sweep.a0, sweep.turn, endsMeet)) {
    place = writePart(sweep, place, share, next, moves);
    share = next;
  }
  return moves;
}

function sweepOf(grid: Grid, words: ArcWords, from: Position, step: ArcStep): Sweep {
  const dx = from.x - step.centre.x;
  const dy = from.y - step.centre.y;
  return {
    grid,
    words,
    centre: step.centre,
    radius: distance(0, 0, dx, dy),
    a0: Math.atan2(dy, dx),
    turn: step.turn,
    from,
    to: step.to,
    shortest: Math.max(words.shortestChord * grid.perMm, SAFE_CHORD_COUNTS),
  };
}

/** Planes, radius, and whether the machine can climb on an arc as steeply as this. */
function fitsAsArc(sweep: Sweep): boolean {
  const { words, radius } = sweep;
  if (words.planes === 'none' || radius < words.smallestRadius || radius > words.largestRadius) {
    return false;
  }
  const rise = Math.abs(sweep.to.z - sweep.from.z);
  if (toGrid(sweep.grid, sweep.to.z) === toGrid(sweep.grid, sweep.from.z)) {
    return true;
  }
  return words.helix && rise / (Math.abs(sweep.turn) / (2 * Math.PI)) >= words.helixShallowest;
}

function gridPlaceAt(sweep: Sweep, share: number): GridPlace {
  const { grid, to, from } = sweep;
  if (share === 1) {
    return { x: toGrid(grid, to.x), y: toGrid(grid, to.y), z: toGrid(grid, to.z) };
  }
  const angle = sweep.a0 + share * sweep.turn;
  return {
    x: toGrid(grid, sweep.centre.x + sweep.radius * Math.cos(angle)),
    y: toGrid(grid, sweep.centre.y + sweep.radius * Math.sin(angle)),
    z: toGrid(grid, from.z + share * (to.z - from.z)),
  };
}

/** The part between two shares of the turn: an arc where that is safe, chords where not, nothing where it is no move. Its end. */
function writePart(
  sweep: Sweep,
  start: GridPlace,
  share0: number,
  share1: number,
  moves: GridMove[],
): GridPlace {
  const turn = (share1 - share0) * sweep.turn;
  const end = gridPlaceAt(sweep, share1);
  if (isWholeTurn(turn)) {
    // Both ends are one place: a unit apart, a controller might run the unit instead of the circle.
    const circle = bestArc(sweep, start, { x: start.x, y: start.y, z: end.z }, turn);
    if (circle.kind === 'miss' || !strays(circle)) {
      moves.push(circle);
      return end;
    }
    return writeHalves(sweep, start, share0, share1, moves);
  }
  const chord = distance(end.x, end.y, start.x, start.y);
  if (chord < sweep.shortest || isFlat(sweep, turn, chord)) {
    chords(sweep, start, share0, share1, moves);
    return end;
  }
  const arc = bestArc(sweep, start, end, turn);
  if (arc.kind === 'arc' && strays(arc) && Math.abs(turn) > LEAST_HALVED) {
    return writeHalves(sweep, start, share0, share1, moves);
  }
  const centred = arc.kind === 'arc' && sweep.words.centre !== 'radius';
  if (centred && isReversed(arc, start, turn, sweep.radius * sweep.grid.perMm)) {
    chords(sweep, start, share0, share1, moves);
  } else {
    moves.push(arc);
  }
  return end;
}

/** The less an arc turns, the less the rounding of its centre shows. */
function writeHalves(
  sweep: Sweep,
  start: GridPlace,
  share0: number,
  share1: number,
  moves: GridMove[],
): GridPlace {
  const middle = (share0 + share1) / 2;
  return writePart(sweep, writePart(sweep, start, share0, middle, moves), middle, share1, moves);
}

/** The arc stands above its chord by less than a count (sag s, chord c: c^2 = 8 r s - 4 s^2): no controller could tell. */
function isFlat(sweep: Sweep, turn: number, chord: number): boolean {
  return Math.abs(turn) < Math.PI && chord * chord < 8 * sweep.radius * sweep.grid.perMm - 4;
}

/** Rounding has changed the turn by more than half a turn: possible only where the arc, or what it lacks to a circle, is tiny. */
function isReversed(arc: GridArc, start: GridPlace, turn: number, radius: number): boolean {
  const whole = 2 * Math.PI;
  if (Math.min(Math.abs(turn), whole - Math.abs(turn)) * radius > FAR_FROM_ROUNDING) {
    return false;
  }
  const a = Math.atan2(start.y - arc.cy, start.x - arc.cx);
  const b = Math.atan2(arc.y - arc.cy, arc.x - arc.cx);
  const swept = arc.counterClockwise ? (b - a + whole) % whole : (a - b + whole) % whole;
  return Math.abs(swept - Math.abs(turn)) > Math.PI;
}

/** Chords of equal turn from the part's start to its end, none longer than the chord tolerance allows. */
function chords(
  sweep: Sweep,
  start: GridPlace,
  share0: number,
  share1: number,
  moves: GridMove[],
): GridMove[] {
  const sag = Math.min(1, sweep.words.chordTolerance / sweep.radius);
  const turn = Math.abs((share1 - share0) * sweep.turn);
  const count = Math.max(1, Math.ceil(turn / (2 * Math.acos(1 - sag))));
  let place = start;
  for (let k = 1; k <= count; k++) {
    const next = gridPlaceAt(sweep, k === count ? share1 : share0 + ((share1 - share0) * k) / count);
    if (next.x !== place.x || next.y !== place.y || next.z !== place.z) {
      moves.push({ kind: 'line', x: next.x, y: next.y, z: next.z });
      place = next;
    }
  }
  return moves;
}
