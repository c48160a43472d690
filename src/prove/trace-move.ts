/**
 * G0 to G3: from the words of a block to a traced move. Frame: the program's; mm, mm/min, radians.
 */
import { BIT, type Block } from './block.ts';
import { feedAlong, inverseRefused } from './inverse-time.ts';
import { spindleOf } from './modes.ts';
import { sayAssumed } from './trace-assumed.ts';
import { readArc, type ReadArc } from './trace-arc.ts';
import { runPlaneArc } from './trace-plane-arc.ts';
import { placeOf, placeRefused } from './trace-place.ts';
import { lostRefused } from './trace-zero.ts';
import { isLengthKnown, makeMove, remark, unread, type Refusal, type Run } from './trace-run.ts';
import type { Here } from './modes.ts';

/** What a cutting move needs beside its place. */
export function feedRefused(run: Run, block: Block): Refusal | undefined {
  if (run.modes.feedMode === undefined) {
    return unread('a cutting move before G94 says that F is per minute');
  }
  if (run.modes.feedMode === 'inverse-time') {
    return inverseRefused(run, block);
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
  const refused =
    placeRefused(run) ??
    (run.lost === 0 ? undefined : lostRefused(run, axes)) ??
    (motion === 'G0' ? undefined : feedRefused(run, block));
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
    const feed = feedAlong(run, block, to);
    if (typeof feed === 'object' && feed !== null) {
      return feed;
    }
    makeMove(run, 'line', to, feed);
  } else if (run.modes.plane === 'XZ' || run.modes.plane === 'YZ') {
    return runPlaneArc(run, block, to, motion === 'G3' ? 1 : -1, run.modes.plane);
  } else {
    const arc = readArc(run, block, to, motion === 'G3' ? 1 : -1);
    if ('code' in arc) {
      return arc;
    }
    const feed = feedAlong(run, block, to, arc);
    if (typeof feed === 'object' && feed !== null) {
      return feed;
    }
    makeArc(run, to, arc, feed);
  }
  return undefined;
}

function makeArc(run: Run, to: Here, { centre, turn }: ReadArc, said: number | null): void {
  const { file, line, here, modes } = run;
  const feed = helixFeed(run, to, { centre, turn }, said);
  const kind = 'arc';
  run.moves.push({
    file, line, kind, from: here, to, centre, turn, feed, cutter: modes.cutter, spindle: spindleOf(modes),
  }); // prettier-ignore
  run.here = to;
}

/** Along the helix; where F holds along the circle below it, the helix is run faster by as much as it is longer. */
export function helixFeed(run: Run, to: Here, { centre, turn }: ReadArc, feed: number | null): number | null {
  const { here, modes } = run;
  const isAlong = run.machine.words.path.helixFeedAlong === 'helix' || modes.feedMode === 'inverse-time';
  if (isAlong || feed === null || here.z === to.z) {
    return feed;
  }
  const circle = Math.abs(turn) * Math.hypot((to.x ?? 0) - centre.x, (to.y ?? 0) - centre.y);
  return feed * (Math.hypot(circle, (to.z ?? 0) - (here.z ?? 0)) / circle);
}
