/** How wide cutters, spaces and leaves are, by formulas of the tests' own, with nothing of `src/`. mm, radians. */
import type { RandomCutter, RandomJob } from './random-job.ts';

export function width({ diameter, cuts }: RandomCutter): number {
  return cuts ?? diameter;
}

export function fluteOf(cutter: RandomCutter): number {
  return cutter.flute ?? Math.min(cutter.reach, 2 * cutter.diameter);
}

/** Half the angle of a space between its radial flanks. */
export function spaceAngle(job: RandomJob): number {
  return ((1 - job.tooth) * Math.PI) / job.teeth;
}

/** Between the flanks at the pitch circle. */
export function spaceWidth(job: RandomJob): number {
  return job.module * job.teeth * Math.sin(spaceAngle(job));
}

/** Metal left beside a roughing cutter: what the job says, or a twentieth of it, which is the least that is usual. */
export function leftBeside(job: RandomJob, cutter: RandomCutter): number {
  return job.allowance ?? 0.05 * width(cutter);
}

/** Does a roughing cutter get between the flanks at the pitch circle at all, with what it leaves beside it? */
export function fitsSpace(job: RandomJob, cutter: RandomCutter): boolean {
  return width(cutter) + 2 * leftBeside(job, cutter) < spaceWidth(job);
}

/** Does a finishing cutter go through the slot that another roughed, without slotting itself? */
export function goesThrough(job: RandomJob, slot: RandomCutter, finishing: RandomCutter): boolean {
  return width(finishing) <= width(slot) + leftBeside(job, slot);
}

/** The widest cutter that goes round in the bore. */
export function boreRoom({ bore, leave }: RandomJob): number {
  return (bore - (leave ?? 0)) / 1.1;
}

/** Height of a leaf's tip in modules: two arcs of 2/3 of its thickness about points of the pitch circle, meeting on the leaf's axis. */
export function thirdOgive(job: RandomJob): number {
  const leaf = job.leaf ?? (job.leaves > 10 ? 1.25 : 1.05);
  const pitch = job.leaves / 2;
  const radius = (2 / 3) * leaf;
  // The arc's centre lies a chord `radius` away from the pitch point along the pitch circle, past the axis.
  const centre = 2 * Math.asin(radius / (2 * pitch)) - leaf / (2 * pitch);
  const [cx, cy] = [pitch * Math.cos(centre), pitch * Math.sin(centre)];
  return cx + Math.sqrt(radius * radius - cy * cy) - pitch;
}
