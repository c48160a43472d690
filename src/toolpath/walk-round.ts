/**
 * The walk-round program: round the extents of everything that is cut and over what stands in the way, with the spindle off.
 *
 * In  : the runs, heights, obstacles, park. Out: one motion, rapids at clear height (over an obstacle: above it).
 */
import type { Motion, MoveStep, Position, Step } from '../motion/motion.ts';
import type { CutTask } from './cut-task.ts';
import type { PassCuts } from './pass-cuts.ts';

interface Box {
  readonly x: readonly [number, number];
  readonly y: readonly [number, number];
}

export function walkRound({ job, heights }: CutTask, passes: readonly PassCuts[], park: Position): Motion {
  const first = passes[0];
  const z = heights.over;
  const { x, y } = boxOf(passes);
  const corners: readonly (readonly [number, number])[] = [
    [x[0], y[0]],
    [x[1], y[0]],
    [x[1], y[1]],
    [x[0], y[1]],
    [x[0], y[0]],
  ];
  const over = job.setup.obstacles.map((o): readonly [number, number] => [o.x, o.y]);
  const steps: Step[] = [
    { kind: 'note', text: 'walk-round: the spindle stays still; watch the cutter, the clamps and the nut' },
    { kind: 'top' },
    ...(first === undefined ? [] : [{ kind: 'cutter', number: first.cutter.number, say: [] } as const]),
    { kind: 'rapid', to: park },
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
    { kind: 'top' },
    { kind: 'rapid', to: park },
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
