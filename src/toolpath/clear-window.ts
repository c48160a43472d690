/**
 * All of a window turned to chips, level by level: into the metal by a helix (or a ramp along the ring where there is
 * no room for one), then ring by ring outward.
 *
 * In  : the rings, cutter, heights. Wheel frame, mm. Out: runs, top level first.
 * A point of the innermost ring lies `distance` from the wall, so a helix of `distance - outermost` round it stays inside
 * the outermost ring.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { radians } from '../base/units.ts';
import { steppedArcFeed } from '../cutting/arc-feed.ts';
import { partOf } from '../geometry/change-piece.ts';
import { nearestOnChain } from '../geometry/nearest-on-piece.ts';
import { endOf, lengthOf, lengthOfChain, startOf } from '../geometry/on-piece.ts';
import type { Loop, Piece } from '../geometry/piece.ts';
import { addScaled, leftOf, scale, subtract, unit, type Point } from '../geometry/point.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import type { Heights } from './heights.ts';
import { arcLeg, circleLegs, falling, flat, lineLeg, vertical, type Leg, type Run } from './leg.ts';
import { levelsFor, type Settings } from './settings.ts';
import type { Ring } from './window-rings.ts';

export interface WindowTask {
  /** Outermost first. */
  readonly rings: readonly Ring[];
  readonly settings: Settings;
  readonly heights: Heights;
  /** +1 counter-clockwise. */
  readonly way: 1 | -1;
  readonly pass: string;
}

interface Level {
  readonly task: WindowTask;
  readonly from: number;
  readonly to: number;
  readonly belongs: Belongs;
}

const FIRST_HELIX = 0.9;
/** A helix smaller than this share of the cutter's radius is a plunge in all but name; a ramp along the ring is taken. */
const LEAST_HELIX = 0.3;
const ABOVE_FLOOR = 0.05;

export function clearWindow(task: WindowTask): readonly Run[] {
  const { heights, settings, pass } = task;
  const depth = heights.top - heights.bottom;
  const laps = levelsFor(depth, settings.step);
  return Array.from({ length: laps }, (_, i) => {
    const to = i === laps - 1 ? heights.bottom : heights.top - (depth * (i + 1)) / laps;
    const from = heights.top - (depth * i) / laps;
    return clearLevel({ task, from, to, belongs: { pass, lap: i + 1, laps, depth: to } });
  });
}

/** Into the innermost ring, then outward; each ring begins where it lies nearest to the end of the one before. */
function clearLevel(level: Level): Run {
  const { task, to, belongs } = level;
  const run = enter(level, task.rings.at(-1) as Ring);
  const steps = [...run.steps];
  for (const ring of task.rings.slice(0, -1).toReversed()) {
    const legs = ringFrom(ring.loop, (steps.at(-1) as MoveStep).to, task);
    steps.push(...flat([lineLeg(legs.start, task.settings.data.feed), ...legs.round], to, belongs));
  }
  return { ...run, steps };
}

/** Down to the level on a helix round a point of the ring, or along the ring itself, then once round it. */
function enter({ task, from, to, belongs }: Level, ring: Ring): Run {
  const { settings, heights, way } = task;
  const r = settings.radius;
  const outer = task.rings[0]?.distance ?? ring.distance;
  const middle = startOf(ring.loop[0] as Piece);
  const { round } = ringFrom(ring.loop, middle, task);
  const top = from + ABOVE_FLOOR;
  const fastTo = Math.min(from + heights.approach - heights.top, heights.clear);
  const ramp = Math.tan(radians(settings.data.ramp));
  const room = Math.min(FIRST_HELIX * r, ring.distance - outer);
  const slow = Math.min(settings.data.plunge, settings.data.feed);
  if (room >= LEAST_HELIX * r) {
    // From behind: the way from the helix to the ring goes on along the ring, and needs no turn back.
    const heading = headingOf(middle, round[0]);
    const at = addScaled(middle, heading, -room);
    const straightOn = round[0]?.centre === undefined;
    const legs = circleLegs(middle, at, way * 2 * Math.PI, slow);
    const floor = legs.map((leg) => ({ ...leg, feed: arcFeed(settings, room) }));
    const turns = levelsFor(top - to, Math.min(2 * Math.PI * room * ramp, settings.step));
    const down = Array.from({ length: turns }, () => legs).flat();
    const steps = [
      vertical(at, top, settings.data.plunge, belongs),
      ...falling(at, down, top, to, belongs),
      ...flat(
        [...floor, ...(straightOn ? [] : [lineLeg(middle, settings.data.feed)]), ...round],
        to,
        belongs,
      ),
    ];
    return { at, fastTo, steps };
  }
  const laps = levelsFor(top - to, Math.max(lengthOfChain(ring.loop) * ramp, SAME_POINT));
  const slowRound = round.map((leg) => ({ ...leg, feed: slow }));
  const down = Array.from({ length: laps }, () => slowRound).flat();
  const steps = [
    vertical(middle, top, settings.data.plunge, belongs),
    ...falling(middle, down, top, to, belongs),
    ...flat(round, to, belongs),
  ];
  return { at: middle, fastTo, steps };
}

/** The way a leg sets out. */
function headingOf(from: Point, leg: Leg | undefined): Point {
  if (leg?.centre === undefined) {
    return unit(subtract(leg?.to ?? from, from));
  }
  return scale(leftOf(unit(subtract(from, leg.centre))), Math.sign(leg.turn));
}

/** Once round a ring from its point nearest to `at`, the way of the pass. */
function ringFrom(
  loop: Loop,
  at: Point,
  task: WindowTask,
): { readonly start: Point; readonly round: readonly Leg[] } {
  const { settings, way } = task;
  const nearest = nearestOnChain(loop, at);
  const index = nearest?.index ?? 0;
  const u = nearest?.u ?? 0;
  const first = loop[index] as Piece;
  const turned = [
    partOf(first, u, 1),
    ...loop.slice(index + 1),
    ...loop.slice(0, index),
    partOf(first, 0, u),
  ];
  const pieces = turned.filter((piece) => lengthOf(piece) > SAME_POINT);
  const travelled = way === 1 ? pieces : pieces.toReversed();
  const legs = travelled.map((piece): Leg => {
    const to = way === 1 ? endOf(piece) : startOf(piece);
    if (piece.kind !== 'arc') {
      return lineLeg(to, settings.data.feed);
    }
    const inside = piece.turn > 0;
    return arcLeg(
      to,
      piece.centre,
      way * piece.turn,
      inside ? arcFeed(settings, piece.radius) : settings.data.feed,
    );
  });
  return { start: startOf(turned[0] as Piece), round: legs };
}

function arcFeed({ data, cutter }: Settings, pathRadius: number): number {
  return steppedArcFeed({
    feed: data.feed,
    pathRadius,
    cutterDiameter: cutter.diameter,
    radialDepth: cutter.diameter / 2,
    flutes: cutter.flutes,
    speed: data.speed,
    lowest: data.lowest,
  });
}
