/**
 * An arc as moves between places the program can name, safe after rounding: every arc is judged from its rounded words
 * as the controller will judge it.
 *
 * In  : the exact start, the start as written (counts), the arc step. Out: lines and arcs on the grid, in order.
 * Kept: start and end radius differ by less than the machine file's mismatch; ends that round together, chords too short
 *       and turns that rounding reverses become lines; chords lie within `chord-tolerance` inside the arc's circle.
 * Source of the mismatch rule: NISTIR 6556 section 3.5.3.2, and the two-part rule (absolute, or share of the radius).
 */
import { millimetresPer } from '../base/units.ts';
import type { ArcWords } from '../machine/machine.ts';
import type { ArcStep, Position } from '../motion/motion.ts';
import { arcCuts, isWholeTurn } from './arc-cuts.ts';
import { toGrid, type Grid } from './program-grid.ts';

export interface GridPlace {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export interface GridLine extends GridPlace {
  readonly kind: 'line';
}

/** `cx`, `cy` in counts from zero; `radius` in counts for the radius form. */
export interface GridArc extends GridPlace {
  readonly kind: 'arc';
  readonly cx: number;
  readonly cy: number;
  readonly radius: number;
  readonly counterClockwise: boolean;
  /** Difference of start and end radius as written, in counts. */
  readonly miss: number;
}

/** An arc that no centre on the grid makes acceptable. */
export interface GridMiss {
  readonly kind: 'miss';
  readonly radius: number;
  readonly miss: number;
}

export type GridMove = GridLine | GridArc | GridMiss;

/** Chords under this many counts can round to nothing, and an arc whose ends meet is a full circle: from 1.5 counts none
 *  do, three leave room for both ends. */
const SAFE_CHORD_COUNTS = 3;

/** The whole arc, exact; `a0` its start angle. */
interface Sweep {
  readonly grid: Grid;
  readonly words: ArcWords;
  readonly centre: { readonly x: number; readonly y: number };
  readonly radius: number;
  readonly a0: number;
  readonly turn: number;
  readonly from: Position;
  readonly to: Position;
  /** The smallest chord written as an arc, in counts. */
  readonly shortest: number;
}

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
    Math.hypot(step.to.x - from.x, step.to.y - from.y) * grid.perMm < sweep.shortest;
  const moves: GridMove[] = [];
  let place = start;
  let share = 0;
  for (const next of arcCuts(words, sweep.a0, sweep.turn, endsMeet)) {
    writePart(sweep, place, share, next, moves);
    place = gridPlaceAt(sweep, next);
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
    radius: Math.hypot(dx, dy),
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

/** The part between two shares of the turn: an arc where that is safe, chords where it is not, nothing where it is no move. */
function writePart(sweep: Sweep, start: GridPlace, share0: number, share1: number, moves: GridMove[]): void {
  const turn = (share1 - share0) * sweep.turn;
  const end = gridPlaceAt(sweep, share1);
  if (isWholeTurn(turn)) {
    // Both ends are one place: a unit apart, a controller might run the unit instead of the circle.
    moves.push(bestCentre(sweep, start, { ...start, z: end.z }));
    return;
  }
  const chord = Math.hypot(end.x - start.x, end.y - start.y);
  if (chord < sweep.shortest || isFlat(sweep, turn)) {
    chords(sweep, start, share0, share1, moves);
    return;
  }
  const arc = bestCentre(sweep, start, end);
  if (arc.kind === 'arc' && sweep.words.centre !== 'radius' && isReversed(arc, start, turn)) {
    chords(sweep, start, share0, share1, moves);
    return;
  }
  moves.push(arc);
}

/** The arc stands above its chord by less than a count: no controller could tell. */
function isFlat(sweep: Sweep, turn: number): boolean {
  return Math.abs(turn) < Math.PI && sweep.radius * (1 - Math.cos(turn / 2)) * sweep.grid.perMm < 1;
}

/** Rounding has changed the turn by more than half a turn. */
function isReversed(arc: GridArc, start: GridPlace, turn: number): boolean {
  const a = Math.atan2(start.y - arc.cy, start.x - arc.cx);
  const b = Math.atan2(arc.y - arc.cy, arc.x - arc.cx);
  const whole = 2 * Math.PI;
  const swept = arc.counterClockwise ? (b - a + whole) % whole : (a - b + whole) % whole;
  return Math.abs(swept - Math.abs(turn)) > Math.PI;
}

/** The rounded centre, or the best of its eight neighbours where the controller would refuse it. */
function bestCentre(sweep: Sweep, start: GridPlace, end: GridPlace): GridArc | GridMiss {
  const { grid, words } = sweep;
  const cx = toGrid(grid, sweep.centre.x);
  const cy = toGrid(grid, sweep.centre.y);
  const first = arcAbout(sweep, start, end, cx, cy);
  if (words.centre === 'radius' || mayMiss(words, grid, first)) {
    return first;
  }
  let best = first;
  for (let dx = -1; dx <= 1; dx++) {
    for (let dy = -1; dy <= 1; dy++) {
      const other = arcAbout(sweep, start, end, cx + dx, cy + dy);
      best = other.miss < best.miss ? other : best;
    }
  }
  return mayMiss(words, grid, best)
    ? best
    : { kind: 'miss', radius: sweep.radius, miss: best.miss / grid.perMm };
}

function arcAbout(sweep: Sweep, start: GridPlace, end: GridPlace, cx: number, cy: number): GridArc {
  const r1 = Math.hypot(start.x - cx, start.y - cy);
  const r2 = Math.hypot(end.x - cx, end.y - cy);
  const exactX = sweep.centre.x * sweep.grid.perMm;
  const exactY = sweep.centre.y * sweep.grid.perMm;
  return {
    kind: 'arc',
    ...end,
    cx,
    cy,
    // The mean distance of the written ends from the exact centre keeps the radius form's own centre nearest to it.
    radius: Math.round(
      (Math.hypot(start.x - exactX, start.y - exactY) + Math.hypot(end.x - exactX, end.y - exactY)) / 2,
    ),
    counterClockwise: sweep.turn > 0,
    miss: Math.abs(r1 - r2),
  };
}

/** The controller's own test: below the absolute limit, or below both the outer limit and the share of the radius. */
function mayMiss(words: ArcWords, grid: Grid, arc: GridArc): boolean {
  const miss = arc.miss / grid.perUnit;
  if (miss < words.missAbsolute[grid.unit]) {
    return true;
  }
  if (words.missShare === null) {
    return false;
  }
  const outer = words.missAtMost === null ? Infinity : words.missAtMost / millimetresPer(grid.unit);
  const radius = Math.hypot(arc.x - arc.cx, arc.y - arc.cy) / grid.perUnit;
  return miss < outer && miss < words.missShare * radius;
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
      moves.push({ kind: 'line', ...next });
      place = next;
    }
  }
  return moves;
}
