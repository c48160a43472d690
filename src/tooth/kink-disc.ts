/**
 * A disc in the hollow that a single-arc addendum may make with the radial flank at the pitch point (with many leaves the
 * arc leans outward). It touches both and leaves the hollow's bottom standing. Frame and units of `tooth-side.ts`.
 */
import { pointOn, headingOn } from '../geometry/on-piece.ts';
import {
  addScaled,
  angleOf,
  cross,
  dot,
  leftOf,
  polar,
  subtract,
  wrapAngle,
  type Point,
} from '../geometry/point.ts';
import type { ToothSide } from './tooth-side.ts';

export interface KinkDisc {
  readonly centre: Point;
  readonly radius: number;
  /** Distance of the lower touch from the wheel's axis, and the touches. */
  readonly flankReach: number;
  readonly flankPoint: Point;
  readonly addendumPoint: Point;
  /** Share of the addendum at the upper touch. */
  readonly u: number;
}

export function kinkDisc(side: ToothSide, radius: number): KinkDisc | undefined {
  const curve = side.addendum;
  const outward = polar(1, side.spaceAngle);
  // The cycloid starts along the flank; an arc is hollow there only where it sets off to the right, into the space.
  if (curve.kind === 'cycloid' || cross(outward, headingOn(curve, 0)) >= 0) {
    return undefined;
  }
  const left = leftOf(outward);
  const above = dot(curve.centre, left) + radius;
  const reach = curve.radius + radius;
  // The arc bulges into the space above the pitch point, so the disc lies below the arc's centre.
  const flankReach = dot(curve.centre, outward) - Math.sqrt(reach * reach - above * above);
  const flankPoint = polar(flankReach, side.spaceAngle);
  const centre = addScaled(flankPoint, left, -radius);
  const u = wrapAngle(angleOf(subtract(centre, curve.centre)) - curve.start) / curve.turn;
  return { centre, radius, flankReach, flankPoint, addendumPoint: pointOn(curve, u), u };
}
