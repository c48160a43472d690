/**
 * A stretch of the cutter centre's path in plan, and the steps it becomes at a height. mm, mm/min, radians.
 * A run is what is cut between one descent from the clear height and the next rise to it.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import type { Point } from '../geometry/point.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';

export interface Leg {
  readonly to: Point;
  /** Of an arc; undefined where straight. */
  readonly centre: Point | undefined;
  /** Signed sweep of an arc, 0 where straight. */
  readonly turn: number;
  readonly feed: number;
}

export interface Run {
  /** Where the cutter comes straight down. */
  readonly at: Point;
  /** The height down to which it may come fast: just above metal that is there. */
  readonly fastTo: number;
  readonly steps: readonly MoveStep[];
}

export function lineLeg(to: Point, feed: number): Leg {
  return { to, centre: undefined, turn: 0, feed };
}

export function arcLeg(to: Point, centre: Point, turn: number, feed: number): Leg {
  return { to, centre, turn, feed };
}

/** A whole turn and more as half turns, so that no arc ends where it began. */
export function circleLegs(centre: Point, from: Point, turn: number, feed: number): Leg[] {
  const parts = Math.ceil(Math.abs(turn) / Math.PI - SAME_POINT);
  const legs: Leg[] = [];
  const spoke = { x: from.x - centre.x, y: from.y - centre.y };
  for (let i = 1; i <= parts; i++) {
    const angle = (turn * i) / parts;
    const c = Math.cos(angle);
    const s = Math.sin(angle);
    const to = { x: centre.x + spoke.x * c - spoke.y * s, y: centre.y + spoke.x * s + spoke.y * c };
    legs.push(arcLeg(to, centre, turn / parts, feed));
  }
  return legs;
}

export function legStep(leg: Leg, z: number, belongs: Belongs): MoveStep {
  const to = { x: leg.to.x, y: leg.to.y, z };
  return leg.centre === undefined
    ? { kind: 'line', to, feed: leg.feed, belongs }
    : { kind: 'arc', to, centre: leg.centre, turn: leg.turn, feed: leg.feed, belongs };
}

/** All legs at one height. */
export function flat(legs: readonly Leg[], z: number, belongs: Belongs): MoveStep[] {
  return legs.map((leg) => legStep(leg, z, belongs));
}

/** All legs, falling evenly by their plan length from `from` to `to`. */
export function falling(
  start: Point,
  legs: readonly Leg[],
  from: number,
  to: number,
  belongs: Belongs,
): MoveStep[] {
  const lengths = legs.map((leg, i) => legLength(legs[i - 1]?.to ?? start, leg));
  const whole = lengths.reduce((sum, length) => sum + length, 0);
  let gone = 0;
  return legs.map((leg, i) => {
    gone += lengths[i] ?? 0;
    const z = i === legs.length - 1 ? to : from + ((to - from) * gone) / whole;
    return legStep(leg, z, belongs);
  });
}

export function legLength(from: Point, leg: Leg): number {
  return leg.centre === undefined
    ? Math.hypot(leg.to.x - from.x, leg.to.y - from.y)
    : Math.hypot(leg.to.x - leg.centre.x, leg.to.y - leg.centre.y) * Math.abs(leg.turn);
}

/** Straight down (or up) at feed. */
export function vertical(at: Point, z: number, feed: number, belongs: Belongs): MoveStep {
  return { kind: 'line', to: { x: at.x, y: at.y, z }, feed, belongs };
}
