/**
 * Where a disc comes to rest when it is pushed to the bottom of a tooth space and then against the tooth: on the root
 * circle and one side, or wedged between both sides. In closed form; only a disc wedged between two cycloids needs a root.
 *
 * In  : the side of a tooth (frame of `tooth-side.ts`: space on +X) and the disc's radius.
 * Out : centre, and the foot: the point of the side that is touched. `undefined` where it hangs on the tip corners.
 * Why it serves three masters: a fillet is a resting disc, so is a cutter, and so is each point that lies equally far from
 * root and side (the thickest place of what a cutter leaves).
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { endOf, pointOn, startOf } from '../geometry/on-piece.ts';
import type { ArcPiece } from '../geometry/piece.ts';
import { angleOf, norm, polar, subtract, wrapAngle, type Point } from '../geometry/point.ts';
import { angleFromCusp, radiusAtObliquity, sineAtRadius, type Rolling } from './addendum.ts';
import { largestWhere } from './largest-where.ts';
import type { ToothSide } from './tooth-side.ts';

export interface RestingDisc {
  readonly centre: Point;
  readonly radius: number;
  /** False where it is wedged between two sides above the root circle. */
  readonly onRoot: boolean;
  readonly foot: Foot;
}

export interface Foot {
  readonly on: 'flank' | 'addendum' | 'tip';
  /** Along the addendum; 0 on the flank. */
  readonly u: number;
  readonly point: Point;
}

/** A place of the disc's centre (polar angle on the root's parallel, or distance along the axis) and what it touches. */
interface Touch {
  readonly at: number;
  readonly foot: Foot;
}

export function restingDisc(side: ToothSide, radius: number): RestingDisc | undefined {
  const onAxis = axisTouches(side, radius).reduce((a, b) => (b.at > a.at ? b : a), ROOT);
  const lowest = side.rootRadius + radius;
  if (onAxis.at > lowest) {
    const centre = { x: onAxis.at, y: 0 };
    return onAxis.foot.on === 'tip' ? undefined : { centre, radius, onRoot: false, foot: onAxis.foot };
  }
  const touches = rootTouches(side, radius);
  const first = touches.reduce((a, b) => (b.at < a.at ? b : a));
  if (first.foot.on === 'tip') {
    return undefined;
  }
  // A root arc too short to be there would only be a block of no length.
  const angle = first.at * lowest > SAME_POINT ? first.at : 0;
  return { centre: polar(lowest, angle), radius, onRoot: true, foot: first.foot };
}

const ROOT: Touch = { at: -Infinity, foot: { on: 'flank', u: 0, point: { x: 0, y: 0 } } };

function flankFoot(side: ToothSide, reach: number): Foot {
  return { on: 'flank', u: 0, point: polar(reach, side.spaceAngle) };
}

function addendumFoot(side: ToothSide, u: number): Foot {
  return { on: 'addendum', u, point: pointOn(side.addendum, u) };
}

function corners(side: ToothSide): readonly Foot[] {
  return [
    { on: 'addendum', u: 0, point: startOf(side.addendum) },
    { on: 'tip', u: 1, point: endOf(side.addendum) },
  ];
}

/** Share of the addendum at an obliquity, and the obliquity of its tip. */
function rollingOf(side: ToothSide): Rolling {
  return { fixed: side.pitchRadius, rolling: side.generatingRadius };
}

function tipObliquity(side: ToothSide, to: number): number {
  return (side.pitchRadius * to) / (2 * side.generatingRadius);
}

/** The disc's centre on the circle of radius rootRadius + radius: the polar angle at which each thing is met. */
function rootTouches(side: ToothSide, radius: number): readonly Touch[] {
  const orbit = side.rootRadius + radius;
  const touches: Touch[] = [];
  const reach = Math.sqrt(side.rootRadius * (side.rootRadius + 2 * radius));
  if (reach <= side.pitchRadius) {
    touches.push({ at: side.spaceAngle - Math.asin(radius / orbit), foot: flankFoot(side, reach) });
  }
  const curve = side.addendum;
  if (curve.kind === 'cycloid') {
    const s = sineAtRadius(rollingOf(side), orbit, radius);
    const tip = tipObliquity(side, curve.to);
    if (s >= 0 && s <= Math.sin(tip)) {
      const theta = Math.asin(s);
      const at = side.spaceAngle + angleFromCusp(rollingOf(side), theta, radius);
      touches.push({ at, foot: addendumFoot(side, theta / tip) });
    }
  } else {
    const at = meet(orbit, curve.centre, curve.radius + radius);
    const u = at === undefined ? -1 : shareOfArc(curve, polar(orbit, at));
    if (at !== undefined && u >= 0 && u <= 1) {
      touches.push({ at, foot: addendumFoot(side, u) });
    }
  }
  for (const foot of corners(side)) {
    const at = meet(orbit, foot.point, radius);
    if (at !== undefined) {
      touches.push({ at, foot });
    }
  }
  return touches;
}

/** The smaller polar angle at which a circle about the origin meets another, if it does. */
function meet(orbit: number, centre: Point, radius: number): number | undefined {
  const away = norm(centre);
  const cosine = (orbit * orbit + away * away - radius * radius) / (2 * orbit * away);
  return Math.abs(cosine) > 1 ? undefined : angleOf(centre) - Math.acos(cosine);
}

function shareOfArc(arc: ArcPiece, towards: Point): number {
  return wrapAngle(angleOf(subtract(towards, arc.centre)) - arc.start) / arc.turn;
}

/** The disc's centre on the axis of the space: how far out each thing stops it. */
function axisTouches(side: ToothSide, radius: number): readonly Touch[] {
  const touches: Touch[] = [];
  const reach = radius / Math.tan(side.spaceAngle);
  if (reach <= side.pitchRadius) {
    touches.push({ at: radius / Math.sin(side.spaceAngle), foot: flankFoot(side, reach) });
  }
  const curve = side.addendum;
  if (curve.kind === 'arc') {
    const at = outermost(curve.centre, curve.radius + radius);
    const u = at === undefined ? -1 : shareOfArc(curve, { x: at, y: 0 });
    if (at !== undefined && u >= 0 && u <= 1) {
      touches.push({ at, foot: addendumFoot(side, u) });
    }
  } else if (reach > side.pitchRadius) {
    const tip = tipObliquity(side, curve.to);
    const below = (theta: number) => side.spaceAngle + angleFromCusp(rollingOf(side), theta, radius) <= 0;
    if (!below(tip)) {
      const theta = largestWhere(below, 0, tip);
      const at = radiusAtObliquity(rollingOf(side), theta, radius);
      touches.push({ at, foot: addendumFoot(side, theta / tip) });
    }
  }
  for (const foot of corners(side)) {
    const at = outermost(foot.point, radius);
    if (at !== undefined) {
      touches.push({ at, foot });
    }
  }
  return touches;
}

/** The outer of the two places where a circle crosses the axis. */
function outermost(centre: Point, radius: number): number | undefined {
  return Math.abs(centre.y) > radius
    ? undefined
    : centre.x + Math.sqrt(radius * radius - centre.y * centre.y);
}
