/**
 * Where the cutter may go on its table, where it is parked, and where its height is touched off again after a change.
 * Program frame, mm.
 *
 * In  : the task. Park: behind the blank on its left, high, within the travel. Touch: on metal
 *       of the wheel that is never cut, between bore and windows (or root), where nothing stands in the way.
 */
import { polar, type Point } from '../geometry/point.ts';
import type { Position } from '../motion/motion.ts';
import type { CutTask } from './cut-task.ts';
import { AIR_ROUND } from './in-the-way.ts';

/** How far beside the wheel a parked cutter stands, at most: a large sheet need not be left. */
const ASIDE = 10;
const DIRECTIONS = 24;

export interface Box {
  readonly x: readonly [number, number];
  readonly y: readonly [number, number];
}

/**
 * What the travel lets the cutter's middle get to. Where zero's place is not known only the size of the travel counts: what the
 * work leaves of it is shared out to both sides, so that nothing beside the work takes it twice.
 */
export function withinTravel({ job, machine, form }: CutTask): Box {
  const { zeroAt } = job.setup;
  const { travel } = machine.limits;
  const { cutter, allowance } = job.cuts.roughing;
  const ring = form.outsideRadius + allowance + cutter.diameter / 2;
  const bay = form.outsideRadius + allowance + (BAY_ROOM * cutter.diameter) / 2;
  const ends = (
    [from, to]: readonly [number, number],
    zero: number | undefined,
    [low, high]: readonly [number, number],
  ): readonly [number, number] => {
    const spare = Math.max(0, to - from - (high - low)) / 2;
    return zero === undefined ? [low - spare, high + spare] : [from - zero, to - zero];
  };
  return { x: ends(travel.x, zeroAt?.x, [-ring, bay]), y: ends(travel.y, zeroAt?.y, [-ring, ring]) };
}

/** How far out of the tip circle the cutter's middle goes in the bay, over its radius. */
const BAY_ROOM = 4.2;

/** The place of the box that is nearest. */
export function nearestIn(box: Box, { x, y }: Point): Point {
  return {
    x: Math.min(Math.max(x, box.x[0]), box.x[1]),
    y: Math.min(Math.max(y, box.y[0]), box.y[1]),
  };
}

export function parkPlace(task: CutTask): Position {
  const { shape } = task.job.setup;
  const most = task.form.outsideRadius + ASIDE;
  const half = shape.kind === 'sheet' ? { x: shape.width / 2, y: shape.height / 2 } : { x: most, y: most };
  const aside = { x: -Math.min(half.x, most), y: Math.min(half.y, most) };
  return { ...nearestIn(withinTravel(task), aside), z: task.heights.park };
}

export function touchPlace({ job, machine, form, crossings }: CutTask): Point {
  const inner = Math.max(job.wheel.bore, job.setup.bored) / 2;
  const outer = crossings?.windowInner ?? form.rootRadius;
  const rim = crossings === undefined ? outer : (crossings.windowOuter + form.rootRadius) / 2;
  const places = [(inner + outer) / 2, rim].flatMap((radius) =>
    Array.from({ length: DIRECTIONS }, (_, i) => polar(radius, (2 * Math.PI * i) / DIRECTIONS)),
  );
  // A hand brings the cutter down there: shank and cutter must pass everything that stands; the nut is higher than all of it
  // only by its stick-out, so it is counted where it is not.
  const widest = (toZ: number): number =>
    Math.max(
      ...job.setup.cutters.map(({ diameter, shank, stickOut }) =>
        Math.max(diameter, shank, toZ - job.setup.topZ > stickOut ? machine.limits.nut.diameter : 0),
      ),
    ) / 2;
  const free = places.find((at) =>
    job.setup.obstacles.every(
      (o) => Math.hypot(at.x - o.x, at.y - o.y) > o.radius + widest(o.toZ) + AIR_ROUND,
    ),
  );
  return free ?? (places[0] as Point);
}
