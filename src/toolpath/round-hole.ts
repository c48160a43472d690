/**
 * A round hole, all of its metal turned to chips: helices side by side from the middle outward, each with a flat turn at
 * the bottom, so that no core is left. Wall on the right of travel (climb) where it runs counter-clockwise.
 *
 * In  : centre, radius of the wall that is left, what hole is there already, cutter and depth a turn, mm.
 * Out : one run. Pitch of a turn: at most the step, and at most 2 pi rho tan(ramp).
 * A helix of radius rho <= r leaves no core; the next ones lie less than a cutter's radius apart.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { radians } from '../base/units.ts';
import { steppedArcFeed } from '../cutting/arc-feed.ts';
import type { Point } from '../geometry/point.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import type { Heights } from './heights.ts';
import { circleLegs, falling, flat, vertical, type Leg, type Run } from './leg.ts';
import { levelsFor, type Settings } from './settings.ts';

export interface RoundHole {
  readonly centre: Point;
  /** Of the wall that is left. */
  readonly radius: number;
  /** Radius of a hole that is there already, 0 for none. */
  readonly existing: number;
  readonly settings: Settings;
  readonly heights: Heights;
  /** +1 counter-clockwise. */
  readonly way: 1 | -1;
  readonly pass: string;
}

/** Radius of the first helix over the cutter's: no core is left, nor does the cutter's dead middle press on one. */
const FIRST_HELIX = 0.9;
/** Distance of the next helix over the cutter's radius. */
const NEXT_HELIX = 0.8;
/** A helix begins this far above the metal. Judgement: the waviness of a glued blank. */
const HELIX_ABOVE = 0.05;

export function roundHole(hole: RoundHole): Run {
  const { centre, settings, heights, pass } = hole;
  const r = settings.radius;
  const steps: MoveStep[] = [];
  const radii = helixRadii(hole);
  radii.forEach((radius, i) => {
    const inner = radii[i - 1];
    const start = { x: centre.x + radius, y: centre.y };
    const last = steps.at(-1)?.to;
    const laps = lapsOf(
      hole,
      radius,
      radii.length > 1 ? { pass, ring: i + 1, rings: radii.length } : { pass },
    );
    const first = laps[0] as Belongs;
    if (last !== undefined) {
      steps.push({ kind: 'rapid', to: { ...last, z: heights.approach }, belongs: first });
      steps.push(vertical(start, heights.approach, settings.data.feed, first));
    }
    const open = inner ?? hole.existing - r;
    steps.push(...helix(hole, laps, start, radius, open > 0 ? radius - open : 2 * r));
  });
  return {
    at: { x: centre.x + (radii[0] ?? 0), y: centre.y },
    fastTo: heights.approach,
    steps,
  };
}

/** Path radii, inner first; the last one makes the wall. */
export function helixRadii(hole: Pick<RoundHole, 'radius' | 'existing' | 'settings'>): number[] {
  const r = hole.settings.radius;
  const last = hole.radius - r;
  const open = hole.existing - r;
  const first = Math.min(last, open > 0 ? open + NEXT_HELIX * r : FIRST_HELIX * r);
  const more = Math.ceil((last - first) / (NEXT_HELIX * r) - SAME_POINT);
  return Array.from({ length: more + 1 }, (_, i) =>
    more === 0 ? last : first + ((last - first) * i) / more,
  );
}

/** The turns of a helix, each with the height it ends at. */
function lapsOf({ settings, heights }: RoundHole, radius: number, ring: Belongs): readonly Belongs[] {
  const top = heights.top + HELIX_ABOVE;
  const pitch = Math.min(settings.step, 2 * Math.PI * radius * Math.tan(radians(settings.data.ramp)));
  const laps = levelsFor(top - heights.bottom, pitch);
  return Array.from({ length: laps }, (_, i) => {
    const depth = i + 1 === laps ? heights.bottom : top + ((heights.bottom - top) * (i + 1)) / laps;
    return { ...ring, lap: i + 1, laps, depth };
  });
}

function helix(
  hole: RoundHole,
  laps: readonly Belongs[],
  start: Point,
  radius: number,
  radialDepth: number,
): MoveStep[] {
  const { centre, settings, heights, way } = hole;
  const { data } = settings;
  const top = heights.top + HELIX_ABOVE;
  const beside = steppedArcFeed({
    feed: data.feed,
    pathRadius: radius,
    cutterDiameter: 2 * settings.radius,
    radialDepth,
    flutes: settings.cutter.flutes,
    speed: data.speed,
    lowest: data.lowest,
  });
  const feed = radialDepth < 2 * settings.radius ? beside : Math.min(beside, data.plunge);
  const round = (at: number): Leg[] => circleLegs(centre, start, way * 2 * Math.PI, at);
  const steps: MoveStep[] = [vertical(start, top, data.plunge, laps[0] as Belongs)];
  let z = top;
  for (const belongs of laps) {
    const { depth = heights.bottom } = belongs;
    steps.push(...falling(start, round(feed), z, depth, belongs));
    z = depth;
  }
  steps.push(...flat(round(beside), heights.bottom, laps.at(-1) as Belongs));
  return steps;
}
