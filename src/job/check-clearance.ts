/**
 * Do clamps, keep-outs and screw heads leave the cutters their way? Each pass goes round the wheel in a ring; at its deepest
 * the cutter, its shank and what holds it stand there at known heights. A thing in the way is taken as it stands, a cylinder.
 * In: the job's rings and obstacles, and what there is above the shank (a collet nut), if known. mm.
 */
import type { Problem } from '../base/problem.ts';
import type { LengthUnit } from '../base/units.ts';
import type { Cutter, Obstacle, Setup } from '../cutting/setup.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { jobProblem, type JobProblem } from './job-problem.ts';
import type { Cuts, PassKind, WheelJob } from './job.ts';
import { showLength } from './show-length.ts';

export interface ClearanceGround {
  readonly unit: LengthUnit;
  readonly wheel: WheelJob;
  readonly form: WheelForm;
  readonly windows: Crossings | undefined;
  readonly setup: Setup;
  readonly cuts: Cuts;
}

/** Air between the cutter and what stands in the way. Why: a clamp's place is measured with a rule. */
const AIR = 0.5;

/** A part of the tool: a cylinder from this height above the tip upward. */
interface Part {
  readonly name: string;
  readonly radius: number;
  readonly above: number;
}

export function checkClearance(ground: ClearanceGround): Problem[] {
  return clashes(ground, (cutter) => [
    { name: 'cutter', radius: cutter.diameter / 2, above: 0 },
    { name: 'shank', radius: cutter.shank / 2, above: cutter.reach },
  ]);
}

/** The collet nut, once the machine is known. */
export function checkNut(ground: ClearanceGround, diameter: number): Problem[] {
  return clashes(ground, (cutter) => [{ name: 'collet nut', radius: diameter / 2, above: cutter.stickOut }]);
}

function clashes(ground: ClearanceGround, partsOf: (cutter: Cutter) => readonly Part[]): Problem[] {
  return ground.setup.obstacles.flatMap((obstacle, i) => {
    const found = ground.cuts.order.flatMap((pass) =>
      partsOf(ground.cuts[pass].cutter).flatMap((part) => clash(ground, obstacle, pass, part)),
    );
    const first = found[0];
    return first === undefined ? [] : [jobProblem({ ...first, path: pathOf(ground.setup, obstacle, i) })];
  });
}

function clash(
  ground: ClearanceGround,
  obstacle: Obstacle,
  pass: PassKind,
  part: Part,
): Omit<JobProblem, 'path'>[] {
  const show = (mm: number): string => showLength(mm, ground.unit);
  const { setup, cuts } = ground;
  const deepest = setup.skin > 0 ? setup.plateZ + setup.skin : setup.plateZ - cuts.below;
  const [inner, outer] = ringOf(ground, pass);
  const away = Math.hypot(obstacle.x, obstacle.y);
  const room = Math.max(away - outer, inner - away) - obstacle.radius;
  const needed = part.radius + AIR;
  if (deepest + part.above >= obstacle.toZ || room >= needed) {
    return [];
  }
  const message =
    `the ${obstacle.name} leaves ${show(Math.max(0, room))} beside the path of ${pass}; the ${part.name} of cutter ` +
    `${cuts[pass].cutter.number} needs ${show(needed)}.`;
  const hint =
    obstacle.name === 'keep-out'
      ? 'Clamp further out or lower, or take a cutter that sticks out further.'
      : 'Take a smaller or lower head, or a cutter that sticks out further.';
  return [{ code: 'job.does-not-fit', message, hint }];
}

/** Least and greatest distance of the cutter's middle from the axis in a pass. */
function ringOf({ wheel, form, windows, cuts }: ClearanceGround, pass: PassKind): readonly [number, number] {
  const radius = cuts[pass].cutter.diameter / 2;
  switch (pass) {
    case 'bore':
      return [0, Math.max(0, (wheel.bore - cuts.bore.leave) / 2 - radius)];
    case 'crossings':
      return windows === undefined ? [0, 0] : [windows.windowInner + radius, windows.windowOuter - radius];
    default:
      return [form.rootRadius + radius, form.outsideRadius + radius + cuts.roughing.allowance];
  }
}

function pathOf({ obstacles }: Setup, obstacle: Obstacle, i: number): (string | number)[] {
  const clamps = obstacles.slice(0, i).filter((one) => one.name === 'keep-out').length;
  return obstacle.name === 'keep-out' ? ['blank', 'keep-out', clamps] : ['blank', 'holding'];
}
