/** Which way roughing runs round the wheel, and why: it climbs unless the slides' play would draw a slender cutter in. */
import type { Job } from '../job/job.ts';

/** Play of the slides above which climbing draws in a cutter more slender than that. Judgement, from general practice. */
const MUCH_PLAY = 0.03;
const SLENDER = 1;
/** With much play and a slender cutter, climbing would draw the work in: roughing runs against it, finishing climbs. */
export function roughsClimbing({ cuts }: Job): boolean {
  const { play, climb, roughing } = cuts;
  return climb && !(Math.max(play.x, play.y) > MUCH_PLAY && roughing.cutter.diameter < SLENDER);
}

export function directionWhy(job: Job): string {
  const { play, climb, roughing } = job.cuts;
  if (roughsClimbing(job)) {
    return 'climbing: clockwise round the wheel';
  }
  const way = 'conventional: counter-clockwise round the wheel';
  const most = Math.max(play.x, play.y);
  return climb
    ? `${way}, as ${most} mm of play would let climbing draw a ${roughing.cutter.diameter} mm cutter in; finishing climbs`
    : way;
}
