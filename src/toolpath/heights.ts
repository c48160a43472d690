/**
 * The heights that every pass moves between. Z as in the program (Z0 at the job's zero), mm.
 *
 * In  : the set-up (top, plate, clear height, what stands in the way), what the job cuts below the wheel, the travel.
 * Out : `bottom` the deepest cut, `approach` just above the metal, `clear` for moves over the blank, `over` for moves across
 *       what stands higher than that, `park` for stops, starts and ends.
 */
import type { Setup } from '../cutting/setup.ts';
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';

export interface Heights {
  readonly top: number;
  readonly bottom: number;
  readonly approach: number;
  readonly clear: number;
  readonly over: number;
  readonly park: number;
}

/** How far above the metal a fast move stops. Judgement: more than the blank's waviness and the error of touching off. */
const ABOVE_METAL = 0.5;
/** Air between a cutter that crosses something and its top. Judgement: a clamp's height is measured with a rule. */
const ABOVE_OBSTACLE = 2;
/** How much higher a parked cutter stands. Judgement: room for a hand and a spanner. */
const PARK_ABOVE = 15;

export function heightsOf(job: Job, machine: Machine): Heights {
  const { setup, cuts } = job;
  const top = setup.topZ;
  const over = setup.obstacles.reduce((z, o) => Math.max(z, o.toZ + ABOVE_OBSTACLE), setup.clearZ);
  const bottom = setup.skin > 0 ? setup.plateZ + setup.skin : setup.plateZ - cuts.below;
  return {
    top,
    bottom,
    approach: Math.min(top + ABOVE_METAL, setup.clearZ),
    clear: setup.clearZ,
    over,
    park: over + Math.max(0, Math.min(PARK_ABOVE, roomAbove(setup, machine, over, bottom))),
  };
}

/** Travel left above `over`: known where the zero's place is known, else half of what the cut does not need. */
function roomAbove(setup: Setup, machine: Machine, over: number, bottom: number): number {
  const [low, high] = machine.limits.travel.z;
  return setup.zeroAt === undefined ? (high - low - (over - bottom)) / 2 : high - setup.zeroAt.z - over;
}
