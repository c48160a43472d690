/**
 * Drilling and boring cycles as the moves they stand for (NISTIR 6556 §3.5.16): G81 to G86, G88, G89, and G73, which breaks
 * the chip without leaving the hole (not in the report). Frame: the program's; mm, mm/min, s.
 *
 * In  : X Y where, R the height to which it goes fast, Z the bottom, L how often; under G91 R counts from where Z stands,
 *       Z from R. R and Z hold on while the same cycle does; of P and Q the report does not say so, so they are asked for.
 * Out : if Z is below R up to it, once; then for each hole across, down to R, and the cycle's own moves up to the clear
 *       height: under G98 the height before, or R where that is higher; under G99 R.
 */
import { BIT, has, valueOf, wholeOf, type Block } from './block.ts';
import { MOST_MADE, MOST_PECKS } from './bounds.ts';
import type { CycleMode, Here } from './modes.ts';
import { sayAssumed } from './trace-assumed.ts';
import { drill, lettersOfCycle, peckCount, type Hole } from './trace-hole.ts';
import { feedRefused } from './trace-move.ts';
import { lengthOf, placeOf, placeRefused, stepFrom } from './trace-place.ts';
import { lostRefused } from './trace-zero.ts';
import { isLengthKnown, makeMove, remark, unread, type Refusal, type Run } from './trace-run.ts';

/** What holds on from hole to hole, in mm as it was written. */
export interface CycleSeries {
  readonly r: number;
  readonly z: number;
  /** They were given as steps (G91). */
  readonly isStep: boolean;
  /** Where Z stood before the first of them. */
  readonly initial: number;
}

export function runCycle(run: Run, block: Block, cycle: CycleMode, axes: number): Refusal | undefined {
  const { here } = run;
  const refused =
    placeRefused(run) ??
    lostRefused(run, axes | BIT.Z) ??
    cycleRefused(run, cycle) ??
    feedRefused(run, block);
  if (refused !== undefined) {
    return refused;
  }
  if (here.x === null || here.y === null || here.z === null || !isLengthKnown(run)) {
    return unread(`${cycle} where the place or the height is not known`);
  }
  const hole = holeOf(run, block, cycle, here.z);
  if ('code' in hole) {
    return hole;
  }
  const repeats = has(block, BIT.L) ? wholeOf(valueOf(block, 'L')) : 1;
  if (repeats === undefined || repeats < 1) {
    return unread(
      `L${String(valueOf(block, 'L'))}: a cycle is repeated a whole number of times, at least once`,
    );
  }
  const bounded = boundRefused(run, hole, repeats);
  if (bounded !== undefined) {
    return bounded;
  }
  run.placed = true;
  sayAssumed(run, 'cycle');
  drillAll(run, block, hole, axes, repeats);
  return undefined;
}

/** §3.5.16: what no cycle may be run under. */
function cycleRefused({ modes }: Run, cycle: CycleMode): Refusal | undefined {
  if (modes.plane !== 'XY') {
    return unread(
      modes.plane === undefined
        ? `${cycle} before G17 says the plane`
        : `${cycle} in the ${modes.plane} plane is not read`,
    );
  }
  if (modes.cycleReturn === undefined) {
    return unread(`${cycle} before G98 or G99 says how far it comes out`);
  }
  if (modes.feedMode === 'inverse-time') {
    return unread(`${cycle} under G93`);
  }
  const turning = modes.turning ?? 0;
  if (cycle === 'G84' && turning !== 1) {
    return unread('G84 taps with the spindle turning clockwise, and it does not');
  }
  return (cycle === 'G86' || cycle === 'G88') && turning === 0
    ? unread(`${cycle} stops the spindle and starts it again, and it does not turn`)
    : undefined;
}

function holeOf(run: Run, block: Block, cycle: CycleMode, stands: number): Hole | Refusal {
  const { modes, machine } = run;
  const series = run.cycle;
  const r = has(block, BIT.R) ? lengthOf(run, valueOf(block, 'R')) : series?.r;
  const z = has(block, BIT.Z) ? lengthOf(run, valueOf(block, 'Z')) : series?.z;
  if (r === undefined || z === undefined) {
    return unread(`${cycle} without ${r === undefined ? 'R' : 'Z'}`);
  }
  const isStep = modes.distance === 'incremental';
  const isHeld = !has(block, BIT.R) || !has(block, BIT.Z);
  if (isHeld && series !== undefined && series.isStep !== isStep) {
    return unread(`${cycle}: R and Z were given before G90 and G91 changed; give both again`);
  }
  if (isHeld && isStep) {
    const message = `${cycle} under G91 without R or Z of its own: the step is taken anew from where Z stands (NISTIR 6556 §3.5.16); other controllers keep the heights`;
    remark(run, 'prove.ambiguous', 'warning', message, 'held step');
  }
  const fromStart = isStep || machine.words.holes.clearMeaning === 'from-start-level';
  const top = fromStart ? stepFrom(run, stands, r) : r + run.shift.z;
  const bottom = isStep ? stepFrom(run, top, z) : z + run.shift.z;
  if (top < bottom) {
    return unread(`${cycle}: R at ${show(top)} mm lies below the bottom at ${show(bottom)} mm`);
  }
  const initial = series?.initial ?? stands;
  const clear = modes.cycleReturn === 'G99' ? top : Math.max(stands, top);
  if (modes.cycleReturn === 'G98' && Math.max(initial, top) !== clear) {
    return unread(
      `${cycle} under G98 after G99: whether it comes out to ${show(Math.max(initial, top))} or to ${show(clear)} mm, controllers differ`,
    );
  }
  const letters = lettersOf(run, block, cycle);
  if ('code' in letters) {
    return letters;
  }
  run.cycle = { r, z, initial, isStep };
  return { cycle, top, bottom, clear, ...letters };
}

/** P and Q, where the cycle wants them. */
function lettersOf(
  run: Run,
  block: Block,
  cycle: CycleMode,
): { readonly seconds: number; readonly peck: number } | Refusal {
  const wanted = lettersOfCycle(cycle);
  const missing = wanted & ~block.given;
  if (missing !== 0) {
    return unread(
      `${cycle} without ${missing & BIT.P ? 'P' : 'Q'} on its own line; whether one given before holds on is not settled`,
    );
  }
  const wait = wanted & BIT.P ? valueOf(block, 'P') : 0;
  const peck = wanted & BIT.Q ? lengthOf(run, valueOf(block, 'Q')) : 0;
  if (wait < 0) {
    return unread(`${cycle} P${String(wait)}: a wait is not negative`);
  }
  if ((wanted & BIT.Q) !== 0 && peck <= 0) {
    return unread(`${cycle} Q${String(valueOf(block, 'Q'))}: a peck must be more than zero`);
  }
  return { seconds: run.machine.words.dwell.unit === 'seconds' ? wait : wait / 1000, peck };
}

/** Before anything is moved. */
function boundRefused(run: Run, hole: Hole, repeats: number): Refusal | undefined {
  const pecks = peckCount(hole) * repeats;
  if (pecks > MOST_PECKS) {
    return unread(
      `${hole.cycle} goes down ${String(Math.min(pecks, Number.MAX_SAFE_INTEGER))} times; ${String(MOST_PECKS)} are followed`,
    );
  }
  run.made += 4 * pecks;
  if (run.made > MOST_MADE) {
    return unread(
      `cycles and chords up to here make more than the ${String(MOST_MADE)} moves that are followed`,
    );
  }
  return hole.cycle === 'G88' && repeats > 1
    ? unread('G88 with L: hands draw the cutter out, and where it stands for the next hole is not known')
    : undefined;
}

function drillAll(run: Run, block: Block, hole: Hole, axes: number, repeats: number): void {
  const across = axes & (BIT.X | BIT.Y);
  if ((run.here.z ?? 0) < hole.top) {
    rapid(run, { ...run.here, z: hole.top });
  }
  for (let k = 0; k < repeats; k++) {
    rapid(run, placeOf(run, block, across));
    rapid(run, { ...run.here, z: hole.top });
    drill(run, hole);
  }
}

/** A way of no length is none. */
function rapid(run: Run, to: Here): void {
  const { here } = run;
  if (to.x !== here.x || to.y !== here.y || to.z !== here.z) {
    makeMove(run, 'rapid', to, null);
  }
}

function show(length: number): string {
  return String(Number(length.toFixed(5)));
}
