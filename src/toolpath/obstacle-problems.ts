/** Whether any cut would touch what stands on the plate: one problem for each obstacle, at the first move that would. */
import type { Problem } from '../base/problem.ts';
import type { Obstacle } from '../cutting/setup.ts';
import { showLength } from '../job/show-length.ts';
import type { Position } from '../motion/motion.ts';
import type { CutTask } from './cut-task.ts';
import { inTheWay } from './in-the-way.ts';
import type { PassCuts } from './pass-cuts.ts';

export function obstacleProblems({ job, machine }: CutTask, passes: readonly PassCuts[]): readonly Problem[] {
  const { obstacles } = job.setup;
  const hit = new Map<Obstacle, Problem>();
  if (obstacles.length === 0) {
    return [];
  }
  for (const { runs, cutter, facts } of passes) {
    for (const run of runs) {
      let at: Position = { ...run.at, z: run.fastTo };
      for (const step of run.steps) {
        const obstacle = inTheWay(at, step, obstacles, cutter, machine);
        if (obstacle !== undefined && !hit.has(obstacle)) {
          hit.set(obstacle, problemOf(job, obstacle, facts.name, step.to));
        }
        at = step.to;
      }
    }
  }
  return [...hit.values()];
}

function problemOf(
  { file, length }: CutTask['job'],
  obstacle: Obstacle,
  pass: string,
  at: Position,
): Problem {
  const show = (mm: number): string => showLength(mm, length);
  return {
    code: 'job.does-not-fit',
    severity: 'error',
    message:
      `${pass}: the cutter or what holds it would touch the ${obstacle.name} at x ${show(obstacle.x)}, y ${show(obstacle.y)}, ` +
      `radius ${show(obstacle.radius)}, near x ${show(at.x)}, y ${show(at.y)}`,
    hint: 'Move it out of the path, or let the cutter stand out more.',
    at: {
      kind: 'value',
      file,
      path: obstacle.name === 'keep-out' ? ['blank', 'keep-out'] : ['blank', 'holding'],
    },
  };
}
