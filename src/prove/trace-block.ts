/**
 * Runs one block: what its words claim, then NISTIR 6556 §3.8, Table 8, in its order.
 *
 * A word that nothing on its line uses, a move without what it needs, a mode that isn't known: the block is refused
 * before any of it is run, or at the latest before it moves.
 */
import { AXES, BIT, bitOf, lettersOf, type Block } from './block.ts';
import { G_GROUP, M_GROUP } from './modes-codes.ts';
import { isCycle, motionOfCode, wordOfCode, type MotionMode } from './modes.ts';
import { runCycle } from './trace-cycle.ts';
import { lettersOfCycle } from './trace-hole.ts';
import { goHome, moveInMachine } from './trace-home.ts';
import { runMove } from './trace-move.ts';
import { runZero, sayShiftLeft, SET_ZERO, SHIFT } from './trace-zero.ts';
import {
  changeCutter,
  changeFeedMode,
  runDwell,
  selectCutter,
  setFeed,
  setSpeed,
  turnSpindle,
} from './trace-settings.ts';
import { changeModes } from './trace-modes.ts';
import { happen, remark, unread, type Refusal, type Run } from './trace-run.ts';

const DWELL = 40;
const HOME = 280;
const SECOND_HOME = 300;
const MACHINE_PLACE = 530;
const CANCEL = 800;
const ROTARY = bitOf('A') | bitOf('B') | bitOf('C');

/** Runs the block; answers why it can't be run, if so. */
export function runBlock(run: Run, block: Block): Refusal | undefined {
  if ((block.given & ROTARY) !== 0) {
    return unread(
      `${lettersOf(block.given & ROTARY)}: rotary words are not followed, so where the cutter meets the work is not known`,
    );
  }
  const other = block.g[G_GROUP.other] ?? -1;
  const dwellBit = other === DWELL ? dwellLetterBit(run) : 0;
  const axes = block.given & AXES & ~dwellBit;
  const wantsAxes = other === HOME || other === SECOND_HOME || other === SET_ZERO || other === SHIFT;
  const motion = motionOf(run, block, axes, wantsAxes);
  if (motion !== undefined && typeof motion !== 'string') {
    return motion;
  }
  return (
    leftOver(run, block, motion, axes, dwellBit, wantsAxes) ??
    (block.onlyMoves ? undefined : settings(run, block, motion, dwellBit, other === DWELL)) ??
    moveAs(run, block, motion, axes, other) ??
    stop(run, block)
  );
}

/** What comes before the move. */
function settings(
  run: Run,
  block: Block,
  motion: MotionMode | undefined,
  dwellBit: number,
  isDwell: boolean,
): Refusal | undefined {
  return (
    changeFeedMode(run, block) ??
    setFeed(run, block, dwellBit) ??
    setSpeed(run, block, dwellBit) ??
    selectCutter(run, block) ??
    changeCutter(run, block) ??
    turnSpindle(run, block, motion !== undefined) ??
    runDwell(run, block, isDwell, dwellBit, motion !== undefined) ??
    changeModes(run, block)
  );
}

function dwellLetterBit(run: Run): number {
  const { letter } = run.machine.words.dwell;
  return letter === 'none' ? 0 : BIT[letter];
}

/** The motion that this line makes, undefined for none; sets nothing. */
function motionOf(
  run: Run,
  block: Block,
  axes: number,
  wantsAxes: boolean,
): MotionMode | undefined | Refusal {
  const code = block.g[G_GROUP.motion] ?? -1;
  const written = code >= 0 ? motionOfCode(code) : undefined;
  if (wantsAxes) {
    return code >= 0 && code !== CANCEL
      ? unread(
          `${String(written)} and ${wordOfCode(block.g[G_GROUP.other] ?? 0)} on one line both want the axis words`,
        )
      : undefined;
  }
  if (axes === 0) {
    return code < 0 || code === CANCEL ? undefined : unread(`${String(written)} without X, Y or Z`);
  }
  const motion = written ?? run.modes.motion;
  if (motion === undefined) {
    return unread('axis words before any word of motion');
  }
  return motion === 'none' ? unread('axis words while G80 has ended all motion') : motion;
}

/** Every letter must be used by something on its line. */
function leftOver(
  run: Run,
  block: Block,
  motion: MotionMode | undefined,
  axes: number,
  dwellBit: number,
  wantsAxes: boolean,
): Refusal | undefined {
  let used = BIT.F | BIT.S | BIT.T | dwellBit;
  if (motion !== undefined || wantsAxes) {
    used |= axes;
  }
  if (motion === 'G2' || motion === 'G3') {
    used |= BIT.R | centreLetters(block, run);
  }
  if (block.g[G_GROUP.other] === SET_ZERO) {
    used |= BIT.L | BIT.P;
  }
  if (isCycle(motion)) {
    used |= BIT.R | BIT.L | lettersOfCycle(motion);
  }
  if (block.g[G_GROUP.length] === 430) {
    used |= BIT.H;
  }
  if ((block.g[G_GROUP.path] ?? -1) >= 0 && run.codes.pathTolerance) {
    used |= BIT.P;
  }
  const left = block.given & ~used;
  return left === 0 ? undefined : unread(`nothing on the line uses ${lettersOf(left).split('').join(', ')}`);
}

/** I J K that count in the plane of the block; before any plane is known the arc itself is refused. */
function centreLetters(block: Block, run: Run): number {
  const code = block.g[G_GROUP.plane] ?? -1;
  const isXZ = code === 180 || (code < 0 && run.modes.plane === 'XZ');
  const isYZ = code === 190 || (code < 0 && run.modes.plane === 'YZ');
  return isXZ ? BIT.I | BIT.K : isYZ ? BIT.J | BIT.K : BIT.I | BIT.J;
}

function moveAs(
  run: Run,
  block: Block,
  motion: MotionMode | undefined,
  axes: number,
  other: number,
): Refusal | undefined {
  const code = block.g[G_GROUP.motion] ?? -1;
  const written = code >= 0 ? motionOfCode(code) : undefined;
  if (written !== undefined) {
    run.cycle = written === run.modes.motion ? run.cycle : undefined;
    run.modes.motion = written;
    run.setAt[G_GROUP.motion] = run.line;
  }
  if (other === HOME || other === SECOND_HOME) {
    return goHome(run, block, axes);
  }
  if (other === MACHINE_PLACE) {
    return moveInMachine(run, block, motion, axes);
  }
  const refused = other < SET_ZERO ? undefined : runZero(run, block, axes, other);
  if (refused !== undefined || motion === undefined || motion === 'none') {
    return refused;
  }
  return isCycle(motion) ? runCycle(run, block, motion, axes) : runMove(run, block, motion, axes);
}

function stop(run: Run, block: Block): undefined {
  const code = block.m[M_GROUP.stop] ?? -1;
  if (code === 0 || code === 1) {
    happen(run, { kind: 'stop', optional: code === 1 });
  } else if (code >= 0) {
    sayShiftLeft(run);
    const word = code === 2 ? 'M2' : 'M30';
    const { end } = run.machine.words.end;
    if (word !== end) {
      remark(
        run,
        'prove.ambiguous',
        'warning',
        `the program ends with ${word}; this machine's word is ${end}`,
        'end word',
      );
    }
    happen(run, { kind: 'end', word });
  }
}
