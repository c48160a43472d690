/**
 * The bore: cleared whole, then its wall finished as one circle that is joined and left on half circles from the middle.
 *
 * In  : the job's bore (less what is left for broaching), the hole that is there already, cutter and depth a turn.
 * Out : the passes 'bore' and 'bore finishing', or why the cutter does not do. Centre X0 Y0, mm.
 */
import { failure, success, type Outcome } from '../base/problem.ts';
import { steppedArcFeed } from '../cutting/arc-feed.ts';
import { ORIGIN, polar } from '../geometry/point.ts';
import { showLength } from '../job/show-length.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import type { CutTask } from './cut-task.ts';
import { arcLeg, circleLegs, flat, vertical, type Leg, type Run } from './leg.ts';
import { passCuts, type PassCuts } from './pass-cuts.ts';
import { helixRadii, roundHole } from './round-hole.ts';
import { levelsFor, settingsFor, type Settings } from './settings.ts';

/** Metal left on the wall for the finishing circle, over the diameter. Judgement: 0.04 to 0.1 is usual for walls in brass. */
const WALL_SHARE = 0.05;
/** Smallest path radius over the cutter's radius that a helix can be cut on. Judgement: less is a plunge in all but name. */
const LEAST_HELIX = 0.1;
/** How far the finishing circle runs past its start, mm. Judgement: no step shows where it was joined. */
const OVERLAP = 0.2;

export function bore(task: CutTask): Outcome<readonly PassCuts[]> {
  const { job, machine, heights } = task;
  const radius = (job.wheel.bore - job.cuts.bore.leave) / 2;
  const existing = job.setup.bored / 2;
  const { cutter } = job.cuts.bore;
  const r = cutter.diameter / 2;
  if (radius <= existing) {
    return success([]);
  }
  if (radius - r < LEAST_HELIX * r) {
    return failure([
      {
        code: 'reach.space',
        severity: 'error',
        message: `cutter ${cutter.number} of ${showLength(cutter.diameter, job.length)} is too wide for a hole of ${(2 * radius).toFixed(3)} mm`,
        hint: `use a cutter of ${((2 * radius) / (1 + LEAST_HELIX)).toFixed(2)} mm or less for the bore, or drill it and say bored:`,
        at: { kind: 'value', file: job.file, path: ['cuts', 'bore', 'cutter'] },
      },
    ]);
  }
  const wall = Math.min(WALL_SHARE * cutter.diameter, (radius - r) / 2, (radius - existing) / 2);
  const slot = settingsFor(job, machine, 'bore', 'slot', wall);
  const side = settingsFor(job, machine, 'bore', wall, wall);
  if (!slot.ok || !side.ok) {
    return failure([...slot.problems, ...side.problems]);
  }
  const way = job.cuts.climb ? 1 : -1;
  const hole = {
    centre: ORIGIN,
    radius: radius - wall,
    existing,
    settings: slot.value,
    heights,
    way,
    pass: 'bore',
  } as const;
  const turns = levelsFor(heights.top - heights.bottom, slot.value.step);
  const cleared = passCuts(
    {
      name: 'bore',
      settings: slot.value,
      heights,
      laps: helixRadii(hole).length,
      step: (heights.top - heights.bottom) / turns,
      why: [
        clearedWords(helixRadii(hole).length),
        ...(existing > 0 ? [`begins in the hole of ${job.setup.bored} mm that is there`] : []),
      ],
    },
    [roundHole(hole)],
  );
  return success([cleared, finishing(task, side.value, radius, wall, way)]);
}

function clearedWords(helices: number): string {
  const by = helices === 1 ? 'one helix' : `${helices} helices side by side`;
  return `cleared whole by ${by}, so that no core comes loose`;
}

function finishing(task: CutTask, settings: Settings, radius: number, wall: number, way: 1 | -1): PassCuts {
  const { heights, job } = task;
  const rho = radius - settings.radius;
  const depth = heights.top - heights.bottom;
  const levels = levelsFor(
    depth,
    job.cuts.bore.step === undefined
      ? settings.cutter.flute
      : Math.min(settings.cutter.flute, Math.max(job.cuts.bore.step, settings.radius)),
  );
  const feed = steppedArcFeed({
    feed: settings.data.feed,
    pathRadius: rho,
    cutterDiameter: settings.cutter.diameter,
    radialDepth: wall,
    flutes: settings.cutter.flutes,
    speed: settings.data.speed,
    lowest: settings.data.lowest,
  });
  const steps: MoveStep[] = [];
  for (let level = 1; level <= levels; level++) {
    const z = heights.top - (depth * level) / levels;
    const belongs: Belongs = { pass: 'bore finishing', lap: level, laps: levels, depth: z };
    steps.push(
      vertical(ORIGIN, z, settings.data.feed, belongs),
      ...flat(circleFromMiddle(rho, way, feed), z, belongs),
    );
  }
  const run: Run = { at: ORIGIN, fastTo: heights.approach, steps };
  const why = [
    `${wall.toFixed(3)} mm left on the wall by the pass before`,
    `feed of the centre ${feed.toFixed(1)} mm/min, so that the edge keeps its feed inside the hole`,
    ...(job.cuts.bore.leave > 0 ? [`${job.cuts.bore.leave} mm of the diameter left for broaching`] : []),
  ];
  return passCuts({ name: 'bore finishing', settings, heights, laps: levels, step: depth / levels, why }, [
    run,
  ]);
}

/** From the middle on a half circle, once round and a little more, back to the middle on a half circle. */
function circleFromMiddle(rho: number, way: 1 | -1, feed: number): Leg[] {
  const join = polar(rho, 0);
  const past = (way * OVERLAP) / rho;
  const leave = polar(rho, past);
  return [
    arcLeg(join, polar(rho / 2, 0), way * Math.PI, feed),
    ...circleLegs(ORIGIN, join, way * 2 * Math.PI, feed),
    arcLeg(leave, ORIGIN, past, feed),
    arcLeg(ORIGIN, polar(rho / 2, past), way * Math.PI, feed),
  ];
}
