/**
 * The largest disc that gets to the root circle between two teeth, and the largest whose foot lies low enough to leave the
 * working flank whole. Radii, mm. Closed form where the disc touches the radial flanks, which is nearly always.
 */
import { norm } from '../geometry/point.ts';
import { largestWhere } from './largest-where.ts';
import { restingDisc } from './resting-disc.ts';
import type { ToothSide } from './tooth-side.ts';

/** Touching the root circle and both sides: (rootRadius + r) sin(spaceAngle) = r. */
export function largestCutter(side: ToothSide): number {
  const sine = Math.sin(side.spaceAngle);
  const between = (side.rootRadius * sine) / (1 - sine);
  const reach = Math.sqrt(side.rootRadius * (side.rootRadius + 2 * between));
  const getsThere = (radius: number) => restingDisc(side, radius)?.onRoot === true;
  // Just below, lest rounding decides; a hump on the addendum or the tip corners may stop it earlier.
  if (reach <= side.pitchRadius && getsThere(between * (1 - ROUNDING))) {
    return between;
  }
  return largestWhere(getsThere, 0, side.outsideRadius);
}

/** The largest whose foot is no further from the axis than `radius`. */
export function largestCutterBelow(side: ToothSide, radius: number): number {
  const low = (size: number) => {
    const disc = restingDisc(side, size);
    return disc !== undefined && norm(disc.foot.point) <= radius;
  };
  return largestWhere(low, 0, side.outsideRadius);
}

const ROUNDING = 8 * Number.EPSILON;
