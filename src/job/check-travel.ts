/**
 * Does the travel hold the work? Without the place of zero only sizes can be compared; with `zero-at` both ends.
 * Counts the cutter's middle: round the tips with room for the bay beside tooth 1, down to the deepest cut, up to clear. mm.
 */
import type { Problem } from '../base/problem.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import { jobProblem } from './job-problem.ts';
import type { Job } from './job.ts';
import { showLength } from './show-length.ts';

type Ends = readonly [number, number];

export interface Travel {
  readonly x: Ends;
  readonly y: Ends;
  readonly z: Ends;
}

/** How far out of the tip circle the cutter's middle goes, over its radius. Why: the bay is 2.6 radii wide. */
const BAY_ROOM = 4.2;

export function checkTravel(
  job: Job,
  form: WheelForm,
  machine: { readonly name: string; readonly limits: { readonly travel: Travel } },
): Problem[] {
  const { setup, cuts } = job;
  const radius = cuts.roughing.cutter.diameter / 2;
  const ring = form.outsideRadius + cuts.roughing.allowance + radius;
  const bay = form.outsideRadius + cuts.roughing.allowance + BAY_ROOM * radius;
  const highest = setup.obstacles.reduce((z, one) => Math.max(z, one.toZ), setup.clearZ);
  const needs: Travel = { x: [-ring, bay], y: [-ring, ring], z: [setup.plateZ - setup.intoPlate, highest] };
  return (['x', 'y', 'z'] as const).flatMap((axis) => checkAxis(axis, needs[axis], job, machine));
}

function checkAxis(
  axis: 'x' | 'y' | 'z',
  [low, high]: Ends,
  { setup, length }: Job,
  { name, limits }: { readonly name: string; readonly limits: { readonly travel: Travel } },
): Problem[] {
  const show = (mm: number): string => showLength(mm, length);
  const [start, end] = limits.travel[axis];
  const letter = axis.toUpperCase();
  if (high - low > end - start) {
    const message = `the work needs ${show(high - low)} of travel in ${letter}; ${name} has ${show(end - start)}.`;
    const hint =
      axis === 'z'
        ? 'Take a larger machine, a smaller clear height, or lower clamps.'
        : 'Take a larger machine, or a smaller module.';
    return [travelProblem(['machine'], message, hint)];
  }
  if (setup.zeroAt === undefined) {
    return [];
  }
  const zero = setup.zeroAt[axis];
  if (zero + low >= start && zero + high <= end) {
    return [];
  }
  const message =
    `with zero at ${letter} ${show(zero)} the work goes from ${show(zero + low)} to ${show(zero + high)} in the machine's ` +
    `coordinates; ${name} goes from ${show(start)} to ${show(end)}.`;
  const hint = `Set the blank so that zero lies between ${letter} ${show(start - low)} and ${show(end - high)}.`;
  return [travelProblem(['zero-at'], message, hint)];
}

function travelProblem(path: readonly string[], message: string, hint: string): Problem {
  return jobProblem({ path, code: 'job.does-not-fit', message, hint });
}
