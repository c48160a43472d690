/**
 * Words that move the zero: G92 and its kind shift the frame that the program counts in (NISTIR 6556 §3.5.18), G10 L2 says where
 * a work offset lies on the machine (§3.5.5). Neither moves an axis. Places stay in the frame of the first zero; mm.
 *
 * By G92 X7 at X4 the program's zero lies at -3. Axes that are not named keep theirs, and G91 makes no difference. Where G10
 * puts the zero that is on, and another place was counted from it before, the two are not known from each other: the next
 * place of that axis is refused.
 */
import { AXES, BIT, has, valueOf, wholeOf, type Block } from './block.ts';
import { wordOfCode } from './modes.ts';
import { lengthOf } from './trace-place.ts';
import { NO_SHIFT, remark, unread, type Refusal, type Run, type Shift } from './trace-run.ts';

export const SET_ZERO = 100;
export const SHIFT = 920;
const CLEAR = 921;
const PUT_OFF = 922;
const PUT_ON = 923;

/** Of G54 to G59.3 in the order of P (§3.5.13). */
const WORK_CODES = [540, 550, 560, 570, 580, 590, 591, 592, 593];

/** The word of group 0 on the block, if it is one of these. */
export function runZero(run: Run, block: Block, axes: number, other: number): Refusal | undefined {
  switch (other) {
    case SET_ZERO:
      return setZero(run, block, axes);
    case SHIFT:
      return shiftHere(run, block, axes);
    case CLEAR:
      run.shift = NO_SHIFT;
      run.keptShift = NO_SHIFT;
      return undefined;
    case PUT_OFF:
      run.shift = NO_SHIFT;
      return undefined;
    case PUT_ON:
      if (run.keptShift === undefined) {
        return unread('G92.3 brings back a shift that an earlier program left: how far is not known');
      }
      run.shift = run.keptShift;
      return undefined;
    default:
      return undefined;
  }
}

function shiftHere(run: Run, block: Block, axes: number): Refusal | undefined {
  if (axes === 0) {
    return unread('G92 without X, Y or Z');
  }
  if (run.modes.unit === undefined) {
    return unread('G92 names a place before the unit is said (a factor of 25.4)');
  }
  const { here } = run;
  const x = has(block, axes & BIT.X) ? lengthOf(run, valueOf(block, 'X')) : undefined;
  const y = has(block, axes & BIT.Y) ? lengthOf(run, valueOf(block, 'Y')) : undefined;
  const z = has(block, axes & BIT.Z) ? lengthOf(run, valueOf(block, 'Z')) : undefined;
  const isLost =
    (x !== undefined && here.x === null) ||
    (y !== undefined && here.y === null) ||
    (z !== undefined && here.z === null);
  if (isLost && run.placed) {
    return unread('G92 where it is not known where the axis stands');
  }
  if (isLost) {
    const message =
      'G92 takes its zero from wherever the cutter happens to stand when the program is started';
    remark(run, 'prove.work-offset', 'warning', message, 'G92 at the start');
  }
  // With nothing known before, this place is what the program's frame hangs on.
  run.here = {
    x: here.x ?? x ?? null,
    y: here.y ?? y ?? null,
    z: here.z ?? z ?? null,
  };
  run.shift = {
    x: shifted(run.shift.x, run.here.x, x),
    y: shifted(run.shift.y, run.here.y, y),
    z: shifted(run.shift.z, run.here.z, z),
  };
  run.keptShift = run.shift;
  run.lost &= ~axes;
  return undefined;
}

/** -0 is no place. */
function shifted(was: number, stands: number | null, named: number | undefined): number {
  return named === undefined || stands === null || stands === named
    ? named === undefined
      ? was
      : 0
    : stands - named;
}

function setZero(run: Run, block: Block, axes: number): Refusal | undefined {
  const l = has(block, BIT.L) ? wholeOf(valueOf(block, 'L')) : undefined;
  const code = has(block, BIT.P) ? WORK_CODES[(wholeOf(valueOf(block, 'P')) ?? 0) - 1] : undefined;
  if (l !== 2 || code === undefined) {
    return unread('G10 is read as L2 with P1 to P9 alone: it says where a work offset lies');
  }
  const word = wordOfCode(code);
  if (axes !== 0 && (run.modes.work === undefined || run.modes.work === word)) {
    run.lost |= run.placed ? axes : 0;
  }
  remark(
    run,
    'prove.work-offset',
    'warning',
    `G10 puts the zero of ${word} to a place on the machine: what was touched off before no longer counts`,
    'G10',
  );
  return undefined;
}

/** What keeps places of these axes from being read since G10. Steps are read: where an axis stands has not changed. */
export function lostRefused(run: Run, axes: number): Refusal | undefined {
  return (run.lost & axes & AXES) !== 0 && run.modes.distance === 'absolute'
    ? unread('a place is named after G10 moved its zero: by how much is not known')
    : undefined;
}

/** A shift that the program leaves. */
export function sayShiftLeft(run: Run): void {
  const { x, y, z }: Shift = run.shift;
  if (x !== 0 || y !== 0 || z !== 0) {
    const message =
      'the shift of G92 is still on at the end: NISTIR 6556 §3.6.1 takes it off, other controllers keep it for the next program';
    remark(run, 'prove.ambiguous', 'warning', message, 'G92 at the end');
  }
}
