/**
 * The crossings: every window cleared whole (or its slug cut round where a skin holds it), then its wall finished.
 *
 * In  : the task's crossings and cutter. Out: the passes 'crossings' and 'crossings finishing', or why the cutter does not do.
 * Window 1 is planned and turned for the others. Wheel frame, mm.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { showLength } from '../job/show-length.ts';
import type { Crossings } from '../tooth/wheel.ts';
import { clearWindow } from './clear-window.ts';
import type { CutTask } from './cut-task.ts';
import { finishWindow } from './finish-window.ts';
import type { Run } from './leg.ts';
import { passCuts, type PassCuts } from './pass-cuts.ts';
import { levelsFor, settingsFor } from './settings.ts';
import { turnRun } from './turn-run.ts';
import { windowRings } from './window-rings.ts';

/** Metal left on the walls for finishing, over the diameter. Judgement: 0.04 to 0.1 is usual for walls in brass. */
const WALL_SHARE = 0.05;

export function crossingsCuts(task: CutTask, crossings: Crossings): Outcome<readonly PassCuts[]> {
  const { job, machine, heights } = task;
  const { cutter } = job.cuts.crossings;
  const r = cutter.diameter / 2;
  const wall = WALL_SHARE * cutter.diameter;
  if (r > crossings.proportions.corner) {
    return failure([
      tooWide(
        task,
        `the corners of the windows have a radius of ${showLength(crossings.proportions.corner, job.length)}`,
      ),
    ]);
  }
  const slot = settingsFor(job, machine, 'crossings', 'slot', wall);
  const side = settingsFor(job, machine, 'crossings', wall, wall);
  if (!slot.ok || !side.ok) {
    return failure([...slot.problems, ...side.problems]);
  }
  const held = job.setup.skin > 0;
  const rings = windowRings(crossings, r + wall, r, held ? 1 : Infinity);
  if (rings.length === 0) {
    return failure([tooWide(task, 'the windows are too narrow for it somewhere')]);
  }
  const way = job.cuts.climb ? 1 : -1;
  const cleared = clearWindow({ rings, settings: slot.value, heights, way, pass: 'crossing 1' });
  const finished = finishWindow({
    window: crossings.window,
    settings: side.value,
    heights,
    way,
    pass: 'crossing 1 finishing',
    radialDepth: wall,
    open: held ? 'slot' : 'window',
  });
  if (finished === undefined) {
    const hint = held ? LESS_ROUND : undefined;
    return failure([tooWide(task, 'there is no room to join the wall on an arc', hint)]);
  }
  const depth = heights.top - heights.bottom;
  const laps = levelsFor(depth, slot.value.step);
  const levels = levelsFor(depth, cutter.flute);
  return success([
    passCuts(
      {
        name: 'crossings',
        settings: slot.value,
        heights,
        laps,
        step: depth / laps,
        why: [
          held
            ? `a skin of ${job.setup.skin} mm holds the slugs: only their outline is cut`
            : 'every window is turned to chips, so that no slug comes loose',
          ...(held || rings.length === 1
            ? []
            : [
                `${rings.length} rings a level, as wide apart as leaves nothing between them: a level is as shallow as a full slot`,
              ]),
        ],
      },
      everyWindow(crossings.count, cleared, ''),
    ),
    passCuts(
      {
        name: 'crossings finishing',
        settings: side.value,
        heights,
        laps: levels,
        step: depth / levels,
        why: [`${wall.toFixed(3)} mm left on the walls by the pass before; slower in the corners`],
      },
      everyWindow(crossings.count, [finished], ' finishing'),
    ),
  ]);
}

function everyWindow(count: number, runs: readonly Run[], suffix: string): readonly Run[] {
  return Array.from({ length: count }, (_, k) =>
    k === 0 ? runs : runs.map((run) => turnRun(run, (2 * Math.PI * k) / count, `crossing ${k + 1}${suffix}`)),
  ).flat();
}

/** In the slot round a slug the wall is joined on its straight, which rounder corners make shorter. */
const LESS_ROUND =
  'make the corners of the windows less round, so that their sides have a straight to join on, or use a smaller cutter';

function tooWide(
  { job }: CutTask,
  reason: string,
  hint = 'use a smaller cutter for the crossings, or rounder corners',
): Problem {
  const { cutter } = job.cuts.crossings;
  return {
    code: 'reach.corner',
    severity: 'error',
    message: `cutter ${cutter.number} of ${showLength(cutter.diameter, job.length)} is too wide for the crossings: ${reason}`,
    hint,
    at: { kind: 'value', file: job.file, path: ['cuts', 'crossings', 'cutter'] },
  };
}
