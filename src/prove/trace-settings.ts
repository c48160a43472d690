/**
 * Words that set without moving: feed mode, F, S, T, cutter change, spindle, coolant, overrides, dwell (Table 8, orders 2 to 10).
 */
import { BIT, has, valueOf, wholeOf, type Block, type Letter } from './block.ts';
import { G_GROUP, M_GROUP } from './modes-codes.ts';
import { spindleOf } from './modes.ts';
import { lengthOf } from './trace-place.ts';
import { happen, remark, unread, type Refusal, type Run } from './trace-run.ts';

/** G93 and G94 (order 2): an F of the one is no F of the other. */
export function changeFeedMode(run: Run, block: Block): undefined {
  const code = block.g[G_GROUP.feedMode] ?? -1;
  if (code >= 0) {
    const mode = code === 930 ? 'inverse-time' : 'per-minute';
    if (mode !== run.modes.feedMode && run.modes.feedMode !== undefined) {
      run.modes.feed = undefined;
    }
    run.modes.feedMode = mode;
  }
}

/** F in the unit that is on; it takes effect before a unit word of its own line would, so both together are refused. */
export function setFeed(run: Run, block: Block, dwellBit: number): Refusal | undefined {
  const unitCode = block.g[G_GROUP.unit] ?? -1;
  if (!has(block, BIT.F & ~dwellBit)) {
    return undefined;
  }
  const unitWord = unitCode < 0 ? run.modes.unit : unitCode === run.codes.inch ? 'inch' : 'mm';
  if (run.modes.unit === undefined || unitWord !== run.modes.unit) {
    return unread('F is given before the unit it counts in (a factor of 25.4)');
  }
  const value = valueOf(block, 'F');
  if (value <= 0) {
    return unread(`F${String(value)}: a feed must be more than zero`);
  }
  // Under G93 it is taken by the move of its own line, or by nothing.
  run.modes.feed = run.modes.feedMode === 'inverse-time' ? undefined : lengthOf(run, value);
  return undefined;
}

export function setSpeed(run: Run, block: Block, dwellBit: number): Refusal | undefined {
  if (!has(block, BIT.S & ~dwellBit)) {
    return undefined;
  }
  const value = valueOf(block, 'S');
  if (value < 0) {
    return unread(`S${String(value)}: a speed is not negative; M3 and M4 say which way round`);
  }
  const before = spindleOf(run.modes);
  run.modes.speed = value;
  const now = spindleOf(run.modes);
  if (now !== before && (block.m[M_GROUP.spindle] ?? -1) < 0) {
    happen(run, { kind: 'spindle', speed: now });
  }
  return undefined;
}

export function selectCutter(run: Run, block: Block): Refusal | undefined {
  if (!has(block, BIT.T)) {
    return undefined;
  }
  const { words, highest } = run.machine.words.cutters;
  const value = valueOf(block, 'T');
  const number = wholeOf(value);
  if (words === 'none') {
    return unread('T: this machine reads no cutter numbers');
  }
  if (number === undefined || number < 0 || number > highest) {
    return unread(`T${String(value)}: cutters are numbered 0 to ${String(highest)}`);
  }
  run.modes.selected = number;
  if (words === 'T-only') {
    loadCutter(run, number);
  }
  return undefined;
}

/** M6: the selected cutter comes, the spindle is still, coolant stays (§3.6.3). */
export function changeCutter(run: Run, block: Block): Refusal | undefined {
  if ((block.m[M_GROUP.change] ?? -1) < 0) {
    return undefined;
  }
  if (run.modes.selected === undefined) {
    return unread('M6 before any T says which cutter');
  }
  loadCutter(run, run.modes.selected);
  return undefined;
}

/** Another cutter has another length: where its tip stands is not known until a length offset or a word says. */
export function loadCutter(run: Run, number: number): void {
  const { modes } = run;
  if (spindleOf(modes) !== 0) {
    happen(run, { kind: 'spindle', speed: 0 });
  }
  modes.turning = 0;
  if (modes.cutter !== number) {
    run.here = { ...run.here, z: null };
  }
  modes.cutter = number;
  happen(run, { kind: 'cutter', number });
}

export function turnSpindle(run: Run, block: Block, moves: boolean): undefined {
  const { modes } = run;
  const code = block.m[M_GROUP.spindle] ?? -1;
  if (code >= 0) {
    modes.turning = code === 3 ? 1 : code === 4 ? -1 : 0;
    happen(run, { kind: 'spindle', speed: spindleOf(modes) });
  }
  const coolant = block.m[M_GROUP.coolant] ?? -1;
  if (coolant >= 0) {
    modes.mist = coolant === 7 || (coolant === 8 && modes.mist);
    modes.flood = coolant === 8 || (coolant === 7 && modes.flood);
  }
  const overrides = block.m[M_GROUP.overrides] ?? -1;
  if (overrides >= 0) {
    modes.overrides = overrides === 48 ? 'on' : 'off';
  }
  if (moves && (code === 5 || coolant === 9)) {
    remark(
      run,
      'prove.ambiguous',
      'warning',
      `M${String(code === 5 ? code : coolant)} on a line that moves: read as before the move (NISTIR 6556 Table 8); other controllers do it after`,
      'M with a move',
    );
  }
}

export function runDwell(
  run: Run,
  block: Block,
  isDwell: boolean,
  dwellBit: number,
  moves: boolean,
): Refusal | undefined {
  if (!isDwell) {
    return undefined;
  }
  const { letter, unit } = run.machine.words.dwell;
  if (letter === 'none') {
    return unread('G4: this machine has no dwell');
  }
  if (!has(block, dwellBit)) {
    return unread(`G4 without ${letter}`);
  }
  const value = valueOf(block, letter satisfies Letter);
  if (value < 0) {
    return unread(`G4 ${letter}${String(value)}: a wait is not negative`);
  }
  if (moves) {
    remark(
      run,
      'prove.ambiguous',
      'warning',
      'G4 on a line that moves: read as a wait before the move',
      'G4 with a move',
    );
  }
  happen(run, { kind: 'dwell', seconds: unit === 'seconds' ? value : value / 1000 });
  return undefined;
}
