/**
 * G2 and G3 in the XY plane: from the words of an arc to centre and turn (NISTIR 6556 §3.5.3).
 *
 * Centre form: I J from the start, or from zero where the machine says so. Radius form: R positive up to half a turn,
 * negative beyond. Start and end radius may differ by what the machine file allows; the radius then runs from one to the
 * other. An end equal to the start is a whole circle. Angles in radians, counter-clockwise positive.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { wholeAngle, type Point } from '../geometry/point.ts';
import { BIT, has, valueOf, type Block } from './block.ts';
import type { Here, ModalState } from './modes.ts';
import { arcMissAllowed, arcOutOfLimits } from './trace-arc-limits.ts';
import { lengthOf } from './trace-place.ts';
import { badArc, remark, unread, type Refusal, type Run, type Shift } from './trace-run.ts';

export interface ReadArc {
  readonly centre: Point;
  readonly turn: number;
}

/** An arc, and everything it follows from beside its own words. */
export interface ArcMemo {
  readonly from: Here;
  readonly to: Here;
  readonly sense: 1 | -1;
  readonly plane: ModalState['plane'];
  readonly mode: ModalState['centre'];
  readonly unit: ModalState['unit'];
  /** A centre that is counted from zero lies elsewhere once G92 has shifted it. */
  readonly shift: Shift;
  readonly arc: ReadArc;
}

/**
 * The arc from where the machine stands to `to`, or why it can't be run. Laps repeat each other: the same words between
 * the same places, with the same modes, are the same arc.
 */
export function readArc(run: Run, block: Block, to: Here, sense: 1 | -1): ReadArc | Refusal {
  const { here, modes } = run;
  const { plane, centre: mode, unit } = modes;
  const was = block.arc;
  if (
    was !== undefined &&
    was.from.x === here.x &&
    was.from.y === here.y &&
    was.to.x === to.x &&
    was.to.y === to.y &&
    (was.from.z === was.to.z) === (here.z === to.z) &&
    was.sense === sense &&
    was.plane === plane &&
    was.mode === mode &&
    was.unit === unit &&
    was.shift === run.shift
  ) {
    return was.arc;
  }
  const arc = workOut(run, block, to, sense);
  // Where arcs have been remarked on, each is looked at anew: it may have to be counted.
  if (!('code' in arc) && !run.remarks.has(HALF)) {
    block.arc = { from: here, to, sense, plane, mode, unit, shift: run.shift, arc };
  }
  return arc;
}

function workOut(run: Run, block: Block, to: Here, sense: 1 | -1): ReadArc | Refusal {
  const { here, modes } = run;
  if (modes.plane !== 'XY') {
    return unread(
      modes.plane === undefined
        ? 'an arc before any of G17, G18, G19'
        : `arcs in the ${modes.plane} plane are not read`,
    );
  }
  if (!has(block, BIT.X | BIT.Y)) {
    return badArc('an arc needs X or Y, also where it ends at its start');
  }
  if (here.x === null || here.y === null || to.x === null || to.y === null) {
    return unread('an arc starts where the place is not known');
  }
  const from = { x: here.x, y: here.y };
  const end = { x: to.x, y: to.y };
  const centre = has(block, BIT.R)
    ? centreByRadius(run, block, from, end, sense)
    : centreByWords(run, block, from);
  if ('code' in centre) {
    return centre;
  }
  const turn = turnOf(run, from, end, centre, sense);
  if (typeof turn !== 'number') {
    return turn;
  }
  const arc = { centre, turn };
  return arcOutOfLimits(run.machine, modes.unit ?? 'mm', here, to, arc) ?? arc;
}

/** Kind of the remark that has to be made, and counted, of every such arc. */
const HALF = 'half by R';

function centreByWords(run: Run, block: Block, from: Point): Point | Refusal {
  const mode = run.modes.centre;
  if (mode === undefined) {
    return badArc('this machine file gives arcs by R; what I and J are counted from is not known');
  }
  const words = block.given & (BIT.I | BIT.J);
  if (words === 0) {
    return badArc('an arc needs its centre (I or J) or its radius (R)');
  }
  const i = has(block, BIT.I) ? lengthOf(run, valueOf(block, 'I')) : 0;
  const j = has(block, BIT.J) ? lengthOf(run, valueOf(block, 'J')) : 0;
  if (mode === 'from-start') {
    return { x: from.x + i, y: from.y + j };
  }
  return words === (BIT.I | BIT.J)
    ? { x: i + run.shift.x, y: j + run.shift.y }
    : badArc('a centre counted from zero needs both I and J');
}

/** The centre lies on the bisector of the chord, left of it for a short counter-clockwise arc. */
function centreByRadius(run: Run, block: Block, from: Point, end: Point, sense: 1 | -1): Point | Refusal {
  if (has(block, BIT.I | BIT.J)) {
    return badArc('an arc has both a centre (I, J) and a radius (R)');
  }
  const radius = lengthOf(run, valueOf(block, 'R'));
  const chord = Math.hypot(end.x - from.x, end.y - from.y);
  if (chord === 0) {
    return badArc('an arc by R ends at its start, so its centre could be anywhere');
  }
  if (chord > 2 * Math.abs(radius) + SAME_POINT) {
    return badArc(`R ${show(Math.abs(radius))} mm does not reach over a chord of ${show(chord)} mm`);
  }
  const height = Math.sqrt(Math.max(0, radius * radius - (chord * chord) / 4));
  if (height <= SAME_POINT) {
    remark(
      run,
      'prove.ambiguous',
      'warning',
      'half a circle by R: the last digit decides where its centre lies',
      HALF,
    );
  }
  const left = (sense * Math.sign(radius) * height) / chord;
  return {
    x: (from.x + end.x) / 2 - left * (end.y - from.y),
    y: (from.y + end.y) / 2 + left * (end.x - from.x),
  };
}

function turnOf(run: Run, from: Point, end: Point, centre: Point, sense: 1 | -1): number | Refusal {
  const startRadius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const endRadius = Math.hypot(end.x - centre.x, end.y - centre.y);
  if (startRadius <= SAME_POINT) {
    return badArc('the centre of an arc lies on its start: its radius is zero');
  }
  const miss = Math.abs(endRadius - startRadius);
  const allowed = arcMissAllowed(run.machine, run.modes.unit ?? 'mm', startRadius);
  if (miss > allowed) {
    return badArc(
      `the radius is ${show(startRadius)} mm at the start of the arc and ${show(endRadius)} mm at its end; ` +
        `they differ by ${show(miss)} mm, this machine allows ${show(allowed)} mm. A number was changed, or rounded too far: put it back`,
    );
  }
  if (from.x === end.x && from.y === end.y) {
    return sense * 2 * Math.PI;
  }
  const startAngle = Math.atan2(from.y - centre.y, from.x - centre.x);
  const endAngle = Math.atan2(end.y - centre.y, end.x - centre.x);
  const turn = wholeAngle(sense * (endAngle - startAngle));
  if (Math.min(turn, 2 * Math.PI - turn) * startRadius <= SAME_POINT) {
    return badArc('an arc ends straight above or below its start: nothing, or a whole circle');
  }
  return sense * turn;
}

function show(length: number): string {
  return String(Number(length.toFixed(5)));
}
