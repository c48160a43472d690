/**
 * One arc in rounded words: the centre, or the radius, that keeps what the controller makes of it nearest to the arc meant.
 */
import { millimetresPer, radians } from '../base/units.ts';
import type { ArcWords } from '../machine/machine.ts';
import { distance, type GridArc, type GridMiss, type GridPlace, type Sweep } from './grid-move.ts';
import { toGrid, type Grid } from './program-grid.ts';

/** An arc of less cannot stray by more than a count: at its middle the roundings (each under 0.71 counts) of its ends
 *  and, by 1 - cos of half its turn, of its centre add up to 0.86, and half a count of its height goes across. */
const SURE_TURN = radians(75);

/** Counts an arc may stray. Why: what is read back shall lie within one unit of the last digit of what was meant, and
 *  between the places looked at it may be half a percent greater. */
const MOST_STRAY = 0.99;

/** Between the places at which a stray is looked for: it varies as a sine, of whose top that misses half a percent. */
const LOOK_STEP = radians(12);

/**
 * About the rounded centre, or that of its eight neighbours which strays least where the controller would refuse it or it
 * strays too far. `turn` is of the part between `start` and `end`.
 */
export function bestArc(sweep: Sweep, start: GridPlace, end: GridPlace, turn: number): GridArc | GridMiss {
  const { grid, words } = sweep;
  const cx = toGrid(grid, sweep.centre.x);
  const cy = toGrid(grid, sweep.centre.y);
  const first = arcAbout(sweep, start, end, cx, cy);
  const fits = mayMiss(words, grid, first);
  const sure = words.centre !== 'radius' && Math.abs(turn) <= SURE_TURN;
  let best = fits ? { ...first, stray: sure ? 0 : strayOf(sweep, start, first, turn) } : undefined;
  if (words.centre === 'radius' || (best !== undefined && !strays(best))) {
    return best ?? first;
  }
  let miss = first.miss;
  for (let k = 0; k < 9; k++) {
    const other = arcAbout(sweep, start, end, cx + (k % 3) - 1, cy + Math.floor(k / 3) - 1);
    miss = Math.min(miss, other.miss);
    const stray = mayMiss(words, grid, other) ? strayOf(sweep, start, other, turn) : Infinity;
    if (stray < (best?.stray ?? Infinity)) {
      best = { ...other, stray };
    }
  }
  return best ?? { kind: 'miss', radius: sweep.radius, miss: miss / grid.perMm };
}

/** Whether the arc, as the controller will make it, lies further off than it may. */
export function strays(arc: GridArc): boolean {
  return arc.stray > MOST_STRAY;
}

/** How far it lies off the exact arc, between its ends, at worst; counts. */
function strayOf(sweep: Sweep, start: GridPlace, arc: GridArc, turn: number): number {
  const centre = sweep.words.centre === 'radius' ? centreByRadius(start, arc) : { x: arc.cx, y: arc.cy };
  const { perMm } = sweep.grid;
  const a = Math.atan2(start.y - centre.y, start.x - centre.x);
  const b = Math.atan2(arc.y - centre.y, arc.x - centre.x);
  const r0 = distance(start.x, start.y, centre.x, centre.y);
  const r1 = distance(arc.x, arc.y, centre.x, centre.y);
  const swept = turn + nearZero(b - a - turn);
  const looks = Math.ceil(Math.abs(turn) / LOOK_STEP);
  let worst = 0;
  for (let k = 1; k < looks; k++) {
    const angle = a + (swept * k) / looks;
    const r = r0 + ((r1 - r0) * k) / looks;
    const x = centre.x + r * Math.cos(angle) - sweep.centre.x * perMm;
    const y = centre.y + r * Math.sin(angle) - sweep.centre.y * perMm;
    worst = Math.max(worst, Math.abs(Math.sqrt(x * x + y * y) - sweep.radius * perMm));
  }
  return Math.hypot(worst, heightOff(sweep));
}

/** How far rounding moves its height, in counts; at worst half a count on a helix, whose parts end anywhere. */
function heightOff({ grid, from, to }: Sweep): number {
  return from.z === to.z ? Math.abs(toGrid(grid, from.z) - from.z * grid.perMm) : 0.5;
}

/** The same angle between -pi and pi. */
function nearZero(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));
}

/** Where a controller finds the centre of an arc given by its ends and radius, less than half a turn. */
function centreByRadius(
  start: GridPlace,
  { x, y, radius, counterClockwise }: GridArc,
): { readonly x: number; readonly y: number } {
  const dx = (x - start.x) / 2;
  const dy = (y - start.y) / 2;
  const half = distance(0, 0, dx, dy);
  const height = Math.sqrt(Math.max(0, radius * radius - half * half)) / (counterClockwise ? half : -half);
  return { x: start.x + dx - dy * height, y: start.y + dy + dx * height };
}

function arcAbout(sweep: Sweep, start: GridPlace, end: GridPlace, cx: number, cy: number): GridArc {
  const { x, y, z } = end;
  const counterClockwise = sweep.turn > 0;
  if (sweep.words.centre === 'radius') {
    return {
      kind: 'arc',
      x,
      y,
      z,
      cx,
      cy,
      radius: meanRadius(sweep, start, end),
      counterClockwise,
      miss: 0,
      stray: 0,
    };
  }
  const r1 = distance(start.x, start.y, cx, cy);
  return {
    kind: 'arc',
    x,
    y,
    z,
    cx,
    cy,
    radius: r1,
    counterClockwise,
    miss: Math.abs(r1 - distance(x, y, cx, cy)),
    stray: 0,
  };
}

/** The mean distance of the written ends from the exact centre keeps the radius form's own centre nearest to it. */
function meanRadius(sweep: Sweep, start: GridPlace, end: GridPlace): number {
  const x = sweep.centre.x * sweep.grid.perMm;
  const y = sweep.centre.y * sweep.grid.perMm;
  return Math.round((distance(start.x, start.y, x, y) + distance(end.x, end.y, x, y)) / 2);
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
  return miss < outer && miss < words.missShare * (arc.radius / grid.perUnit);
}
