/**
 * Roughing the teeth as one continuous descent round the outline's offset: a full slot, never a plunge, no air.
 *
 * In  : the path at cutter radius and allowance, where it is joined, depth a lap, heights.
 * Out : one run from the bay. Each lap falls by one step, only on the straight flanks, so that arcs stay flat; the lap
 *       before lies one step above at every place. A last lap is flat. Where the path has no straight flank the cutter
 *       goes down in the bay between laps, and each lap is flat.
 */
import type { Belongs, MoveStep } from '../motion/motion.ts';
import type { Bay, Join } from './bay.ts';
import type { Heights } from './heights.ts';
import { flat, legStep, vertical, type Run } from './leg.ts';
import type { LoopLeg, LoopLegs } from './loop-legs.ts';
import { levelsFor, type Settings } from './settings.ts';

export interface RoughTask {
  readonly loop: LoopLegs;
  readonly join: Join;
  readonly bay: Bay;
  readonly settings: Settings;
  readonly heights: Heights;
}

/** A way of roughing: what it cuts, and how many laps it makes. */
export type RoughingStrategy = (task: RoughTask) => {
  readonly run: Run;
  readonly laps: number;
  readonly why: string;
};

const PASS = 'roughing';

export const descent: RoughingStrategy = (task) => {
  const { loop, heights, settings } = task;
  const laps = levelsFor(heights.top - heights.bottom, settings.step);
  const spiral = loop.round.some(({ falls }) => falls);
  return {
    run: {
      at: task.bay.middle,
      fastTo: heights.approach,
      steps: spiral ? falling(task, laps) : byLevels(task, laps),
    },
    laps: spiral ? laps + 1 : laps,
    why: spiral
      ? 'one continuous descent that falls on the straight flanks only, and a last flat lap'
      : 'level by level from the bay, as the path has no straight flank to fall on',
  };
};

/** `laps` falling laps and a flat one. */
function falling({ loop, join, bay, settings, heights }: RoughTask, laps: number): MoveStep[] {
  const { top, bottom } = heights;
  const drop = (top - bottom) / laps;
  const falls = loop.round.filter((leg) => leg.falls).length;
  const first: Belongs = { pass: PASS, lap: 1, laps: laps + 1, depth: top - drop };
  const steps: MoveStep[] = [
    vertical(bay.middle, top, settings.data.plunge, first),
    ...flat(join.joining, top, first),
  ];
  for (let lap = 1; lap <= laps; lap++) {
    const end = lap === laps ? bottom : top - drop * lap;
    const heightAt = (gone: number): number =>
      gone === falls ? end : top - drop * (lap - 1) - (drop * gone) / falls;
    pushLap(steps, loop.round, { pass: PASS, lap, laps: laps + 1, depth: end }, heightAt);
  }
  const last: Belongs = { pass: PASS, lap: laps + 1, laps: laps + 1, depth: bottom };
  pushLap(steps, loop.round, last, () => bottom);
  steps.push(...flat([...loop.past, ...join.leaving], bottom, last));
  return steps;
}

function byLevels({ loop, join, bay, settings, heights }: RoughTask, laps: number): MoveStep[] {
  const { top, bottom } = heights;
  const steps: MoveStep[] = [];
  for (let lap = 1; lap <= laps; lap++) {
    const z = lap === laps ? bottom : top - ((top - bottom) * lap) / laps;
    const belongs: Belongs = { pass: PASS, lap, laps, depth: z };
    steps.push(vertical(bay.middle, z, settings.data.plunge, belongs), ...flat(join.joining, z, belongs));
    pushLap(steps, loop.round, belongs, () => z);
    steps.push(...flat([...loop.past, ...join.leaving], z, belongs));
  }
  return steps;
}

/** One time round; `heightAt` says the height after so many falling flanks. */
export function pushLap(
  steps: MoveStep[],
  round: readonly LoopLeg[],
  lap: Belongs,
  heightAt: (gone: number) => number,
): void {
  let gone = 0;
  let z = heightAt(0);
  let belongs: Belongs = lap;
  const first = round[0]?.tooth;
  for (const leg of round) {
    if (leg.falls) {
      gone += 1;
      z = heightAt(gone);
    }
    if (belongs.tooth !== leg.tooth) {
      const again = belongs.tooth !== undefined && leg.tooth === first;
      belongs = again ? { ...lap, tooth: leg.tooth, again } : { ...lap, tooth: leg.tooth };
    }
    steps.push(legStep(leg, z, belongs));
  }
}
