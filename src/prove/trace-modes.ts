/**
 * Modal G codes of a block: plane, unit, compensation, length offset, work offset, path, distance, cycle return, arc
 * centres (Table 8, orders 11 to 18).
 */
import { BIT, has, valueOf, wholeOf, type Block } from './block.ts';
import { G_GROUP, G_GROUPS } from './modes-codes.ts';
import { wordOfCode } from './modes.ts';
import { lengthOf } from './trace-place.ts';
import { remark, unread, type Refusal, type Run } from './trace-run.ts';

export function changeModes(run: Run, block: Block): Refusal | undefined {
  const { modes } = run;
  const { g } = block;
  for (let group = G_GROUP.motion + 1; group < G_GROUPS; group++) {
    if (g[group]! >= 0) {
      run.setAt[group] = run.line;
    }
  }
  const plane = g[G_GROUP.plane] ?? -1;
  if (plane >= 0) {
    modes.plane = plane === 170 ? 'XY' : plane === 180 ? 'XZ' : 'YZ';
  }
  changeUnit(run, g[G_GROUP.unit] ?? -1);
  if ((g[G_GROUP.compensation] ?? -1) >= 0) {
    modes.compensation = 'off';
  }
  const refused = changeLength(run, block, g[G_GROUP.length] ?? -1) ?? changeWork(run, g[G_GROUP.work] ?? -1);
  if (refused !== undefined) {
    return refused;
  }
  const path = g[G_GROUP.path] ?? -1;
  if (path >= 0) {
    const word = wordOfCode(path);
    const given = has(block, BIT.P) && run.codes.pathTolerance ? valueOf(block, 'P') : undefined;
    modes.path = word + (given === undefined ? '' : ` P${String(given)}`);
    const tolerance = given === undefined ? undefined : lengthOf(run, given);
    run.paths.push({ before: run.moves.length, word, tolerance });
  }
  const distance = g[G_GROUP.distance] ?? -1;
  if (distance >= 0) {
    modes.distance = distance === 900 ? 'absolute' : 'incremental';
  }
  const cycleReturn = g[G_GROUP.cycleReturn] ?? -1;
  if (cycleReturn >= 0) {
    modes.cycleReturn = wordOfCode(cycleReturn);
  }
  const centre = g[G_GROUP.centre] ?? -1;
  if (centre >= 0) {
    modes.centre = centre === 901 ? 'from-zero' : 'from-start';
  }
  return undefined;
}

/** A feed is a number in the old unit: after a change it must be given again. */
function changeUnit(run: Run, code: number): void {
  if (code < 0) {
    return;
  }
  const unit = code === run.codes.inch ? 'inch' : 'mm';
  if (run.modes.unit !== unit) {
    run.modes.unit = unit;
    run.modes.feed = undefined;
  }
}

/** The tip's place is known again when a word names it under this cutter's own length offset. */
function changeLength(run: Run, block: Block, code: number): Refusal | undefined {
  const { modes } = run;
  if (code < 0) {
    return undefined;
  }
  let next: number | 'off' = 'off';
  if (code === 430) {
    const number = has(block, BIT.H) ? wholeOf(valueOf(block, 'H')) : undefined;
    if (number === undefined || number < 0) {
      return unread('G43 needs H with a whole number');
    }
    next = number;
    if (number !== modes.cutter) {
      const loaded = modes.cutter === null ? 'no known cutter' : `cutter ${String(modes.cutter)}`;
      remark(
        run,
        'prove.length-offset',
        'error',
        `G43 H${String(number)} while ${loaded} is in the spindle`,
        'wrong H',
      );
    }
  }
  if (next !== modes.length && run.machine.words.cutters.lengthOffset === 'G43-H') {
    run.here = { ...run.here, z: null };
  }
  modes.length = next;
  return undefined;
}

/** The frame of the program is that of the first work offset it selects; where another one lies is not known. */
function changeWork(run: Run, code: number): Refusal | undefined {
  const { modes } = run;
  if (code < 0 || modes.work === wordOfCode(code)) {
    return undefined;
  }
  if (run.placed) {
    return unread(
      `${wordOfCode(code)} after places were named in ${modes.work ?? 'whichever offset was on'}: where its zero lies is not known`,
    );
  }
  modes.work = wordOfCode(code);
  return undefined;
}
