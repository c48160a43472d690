/**
 * Where the cutter is parked, and where its height is touched off again after a change. Program frame, mm.
 *
 * In  : the task. Park: behind the blank on its left, high, within the travel where the zero's place is known. Touch: on metal
 *       of the wheel that is never cut, between bore and windows (or root), where nothing stands in the way.
 */
import { polar, type Point } from '../geometry/point.ts';
import type { Position } from '../motion/motion.ts';
import type { CutTask } from './cut-task.ts';
import { AIR_ROUND } from './in-the-way.ts';

/** How far beside the wheel a parked cutter stands, at most: a large sheet need not be left. */
const ASIDE = 10;
const DIRECTIONS = 24;

export function parkPlace({ job, machine, form, heights }: CutTask): Position {
  const { shape, zeroAt } = job.setup;
  const { travel } = machine.limits;
  const most = form.outsideRadius + ASIDE;
  const half = shape.kind === 'sheet' ? { x: shape.width / 2, y: shape.height / 2 } : { x: most, y: most };
  const within = (value: number, [low, high]: readonly [number, number], zero: number | undefined): number =>
    zero === undefined ? value : Math.min(Math.max(value, low - zero), high - zero);
  return {
    x: within(-Math.min(half.x, most), travel.x, zeroAt?.x),
    y: within(Math.min(half.y, most), travel.y, zeroAt?.y),
    z: heights.park,
  };
}

export function touchPlace({ job, form, crossings }: CutTask): Point {
  const inner = Math.max(job.wheel.bore, job.setup.bored) / 2;
  const outer = crossings?.windowInner ?? form.rootRadius;
  const rim = crossings === undefined ? outer : (crossings.windowOuter + form.rootRadius) / 2;
  const places = [(inner + outer) / 2, rim].flatMap((radius) =>
    Array.from({ length: DIRECTIONS }, (_, i) => polar(radius, (2 * Math.PI * i) / DIRECTIONS)),
  );
  const free = places.find((at) =>
    job.setup.obstacles.every((o) => Math.hypot(at.x - o.x, at.y - o.y) > o.radius + AIR_ROUND),
  );
  return free ?? (places[0] as Point);
}
