/** About how long roughing takes with a cutter, by feed and length only: to compare cutters, not to plan an evening. Seconds. */
import type { Cutter } from '../cutting/setup.ts';
import { lengthOfChain } from '../geometry/on-piece.ts';
import type { CutTask } from './cut-task.ts';
import { levelsFor, settingsFor } from './settings.ts';

export function roughingSeconds(task: CutTask, cutter: Cutter): number | undefined {
  const { job, machine, form, heights } = task;
  const { allowance } = job.cuts.roughing;
  const own = cutter.number === job.cuts.roughing.cutter.number;
  // What the job says of speed and feed is meant for its own cutter.
  const roughing = own ? job.cuts.roughing : { cutter, allowance };
  const settings = settingsFor(
    { ...job, cuts: { ...job.cuts, roughing } },
    machine,
    'roughing',
    'slot',
    allowance,
  );
  if (!settings.ok) {
    return undefined;
  }
  const laps = levelsFor(heights.top - heights.bottom, settings.value.step) + 1;
  const round = form.proportions.teeth * lengthOfChain(form.sector.map(({ piece }) => piece));
  return (60 * laps * round) / settings.value.data.feed;
}
