/**
 * The walk-round program: round the extents of everything that is cut and over what stands in the way, with the spindle off.
 *
 * In  : the runs, heights, obstacles, park. Out: one motion, rapids at clear height (over an obstacle: above it).
 */
import type { Motion, MoveStep, Position, Step } from '../motion/motion.ts';
import type { CutTask } from './cut-task.ts';
import type { PassCuts } from './pass-cuts.ts';
import { nearestIn, withinTravel, type Box } from './places.ts';
import { sayAtCutter } from './say-cutter.ts';

export function walkRound(task: CutTask, passes: readonly PassCuts[], park: Position): Motion {
  const { job, heights } = task;
  const first = passes[0]?.cutter;
  const z = heights.over;
  const { x, y } = boxOf(passes);
  const corners: readonly (readonly [number, number])[] = [
    [x[0], y[0]],
    [x[1], y[0]],
    [x[1], y[1]],
    [x[0], y[1]],
    [x[0], y[0]],
  ];
  // A clamp beyond the travel is looked at from the nearest place.
  const reach = withinTravel(task);
  const over = job.setup.obstacles.map((obstacle): readonly [number, number] => {
    const at = nearestIn(reach, obstacle);
    return [at.x, at.y];
  });
  const from = corners[0] as readonly [number, number];
  const last = over.at(-1) ?? from;
  const steps: Step[] = [
    { kind: 'note', text: 'walk-round: the spindle stays still; watch the cutter, the clamps and the nut' },
    { kind: 'top' },
    ...(first === undefined
      ? []
      : [{ kind: 'cutter', number: first.number, say: sayAtCutter(task, first) } as const]),
    { kind: 'rapid', to: park },
    // Height and the rest never change together: who watches sees one thing at a time.
    { kind: 'rapid', to: { x: from[0], y: from[1], z: park.z }, belongs: { pass: 'round the extents' } },
    ...corners.map(([px, py]): MoveStep => ({
      kind: 'rapid',
      to: { x: px, y: py, z },
      belongs: { pass: 'round the extents' },
    })),
    ...over.map(([px, py]): MoveStep => ({
      kind: 'rapid',
      to: { x: px, y: py, z },
      belongs: { pass: 'over what stands in the way' },
    })),
    { kind: 'rapid', to: { x: last[0], y: last[1], z: park.z } },
    { kind: 'rapid', to: park },
    { kind: 'top' },
  ];
  return { steps };
}

/** Of all ends of moves: arcs between them bulge by less than the cutter is wide. */
function boxOf(passes: readonly PassCuts[]): Box {
  let [x0, x1, y0, y1] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { runs } of passes) {
    for (const { steps } of runs) {
      for (const { to } of steps) {
        x0 = to.x < x0 ? to.x : x0;
        x1 = to.x > x1 ? to.x : x1;
        y0 = to.y < y0 ? to.y : y0;
        y1 = to.y > y1 ? to.y : y1;
      }
    }
  }
  return x0 > x1 ? { x: [0, 0], y: [0, 0] } : { x: [x0, x1], y: [y0, y1] };
}
