/**
 * G0 to G3: from the words of a block to a traced move. Frame: the program's; mm, mm/min, radians.
 */
import { BIT, type Block } from './block.ts';
import { spindleOf } from './modes.ts';
import { sayAssumed } from './trace-assumed.ts';
import { readArc, type ReadArc } from './trace-arc.ts';
import { placeOf, placeRefused } from './trace-place.ts';
import { isLengthKnown, makeMove, remark, unread, type Refusal, type Run } from './trace-run.ts';
import type { Here } from './modes.ts';

/** What a cutting move needs beside its place. */
export function feedRefused(run: Run): Refusal | undefined {
  if (run.modes.feedMode === undefined) {
    return unread('a cutting move before G94 says that F is per minute');
  }
  return run.modes.feed === undefined
    ? unread('a cutting move without any F in the unit that is on')
    : undefined;
}

export function runMove(
  run: Run,
  block: Block,
  motion: 'G0' | 'G1' | 'G2' | 'G3',
  axes: number,
): Refusal | undefined {
  const refused = placeRefused(run) ?? (motion === 'G0' ? undefined : feedRefused(run));
  if (refused !== undefined) {
    return refused;
  }
  run.placed = true;
  sayAssumed(run, motion);
  // A height that is named without the cutter's length is a height nobody knows, fast or not.
  if (!run.lengthAsked && !isLengthKnown(run) && (motion !== 'G0' || (axes & BIT.Z) !== 0)) {
    run.lengthAsked = true;
    const what = motion === 'G0' ? 'a height is named' : 'a cutting move';
    remark(run, 'prove.length-offset', 'error', `${what} before G43 with the cutter's own H`, 'no H');
  }
  const to = placeOf(run, block, axes);
  if (motion === 'G0') {
    makeMove(run, 'rapid', to, null);
  } else if (motion === 'G1') {
    makeMove(run, 'line', to, run.modes.feed ?? null);
  } else {
    const arc = readArc(run, block, to, motion === 'G3' ? 1 : -1);
    if ('code' in arc) {
      return arc;
    }
    makeArc(run, to, arc);
  }
  return undefined;
}

function makeArc(run: Run, to: Here, { centre, turn }: ReadArc): void {
  const { file, line, here, modes } = run;
  const feed = arcFeed(run, to, { centre, turn });
  const kind = 'arc';
  run.moves.push({
    file, line, kind, from: here, to, centre, turn, feed, cutter: modes.cutter, spindle: spindleOf(modes),
  }); // prettier-ignore
  run.here = to;
}

/** Along the helix; where F holds along the circle below it, the helix is run faster by as much as it is longer. */
function arcFeed(run: Run, to: Here, { centre, turn }: ReadArc): number | null {
  const { here, modes } = run;
  const feed = modes.feed ?? null;
  if (run.machine.words.path.helixFeedAlong === 'helix' || feed === null || here.z === to.z) {
    return feed;
  }
  const circle = Math.abs(turn) * Math.hypot((to.x ?? 0) - centre.x, (to.y ?? 0) - centre.y);
  return feed * (Math.hypot(circle, (to.z ?? 0) - (here.z ?? 0)) / circle);
}
