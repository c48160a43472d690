/**
 * Where loops round the teeth are joined and left: on the arc round a tip corner of tooth 1, from a bay in the waste.
 *
 * In  : a pitch path (its corner arc), allowance and radius of the widest cutter that uses the bay. Wheel frame, mm.
 * Out : the bay, a disc that touches the allowance's arc round the corner; and for each path the tangent arcs in and out.
 * The bay's middle stands on a normal of the corner close to the land's (the middle one where there is no land), so that it
 * lies outside the tip circle. Arcs in and out bend away from the corner; their circles lie within the bay's free room.
 */
import { addScaled, leftOf, polar, scale, type Point } from '../geometry/point.ts';
import { arcLeg, lineLeg, type Leg } from './leg.ts';
import type { PitchPath } from './pitch-path.ts';

export interface Bay {
  readonly middle: Point;
  /** Of the metal that is cleared. */
  readonly radius: number;
  /** Normal of the corner on which the middle stands, and half the angle between joining and leaving. */
  readonly normal: number;
  readonly half: number;
}

export interface Join {
  /** From the bay's middle to the join, and from where the loop is left back to the middle. */
  readonly joining: readonly Leg[];
  readonly leaving: readonly Leg[];
  /** Share of the corner arc at which the loop is joined, and at which it is left: more, so that the start is passed. */
  readonly from: number;
  readonly to: number;
}

/** Radius of the bay over the widest cutter's: room for arcs in and out of one cutter radius. */
const BAY = 2.6;
/** Radius of the arcs in and out over the cutter's (half a diameter and more leaves no mark), and over the free room. */
const LEAD = 1;
const LEAD_SHARE = 0.6;
/** Half the angle round the corner between joining and leaving, at most; and over the corner's sweep. */
const HALF = 0.15;
const HALF_SHARE = 0.2;

export function bayFor(path: PitchPath, allowance: number, widest: number): Bay {
  const { corner, land } = path;
  const sweep = Math.abs(corner.turn);
  const half = Math.min(HALF, HALF_SHARE * sweep);
  const along = land ? LAND_GAP * half : sweep / 2;
  const normal = corner.start + Math.sign(corner.turn) * along;
  const radius = BAY * widest;
  return { middle: addScaled(corner.centre, polar(1, normal), allowance + radius), radius, normal, half };
}

/** Joining stays this far (over `half`) from the land's end of the corner, the middle of the bay by one more. */
const LAND_GAP = 1.25;

/** `reach`: the cutter's radius; the path's own corner arc is larger by what it leaves. */
export function joinCorner(path: PitchPath, bay: Bay, reach: number, feed: number): Join {
  const { corner } = path;
  const way = Math.sign(corner.turn) as 1 | -1;
  const lead = Math.min(LEAD * reach, LEAD_SHARE * (bay.radius - reach));
  const end = (angle: number): { on: Point; centre: Point; heading: Point } => {
    const out = polar(1, angle);
    return {
      on: addScaled(corner.centre, out, corner.radius),
      centre: addScaled(corner.centre, out, corner.radius + lead),
      heading: scale(leftOf(out), way),
    };
  };
  const a = end(bay.normal - way * bay.half);
  const b = end(bay.normal + way * bay.half);
  const quarter = (-way * Math.PI) / 2;
  const share = (angle: number): number => (way * (angle - corner.start)) / Math.abs(corner.turn);
  return {
    joining: [lineLeg(addScaled(a.centre, a.heading, -lead), feed), arcLeg(a.on, a.centre, quarter, feed)],
    leaving: [
      arcLeg(addScaled(b.centre, b.heading, lead), b.centre, quarter, feed),
      lineLeg(bay.middle, feed),
    ],
    from: share(bay.normal - way * bay.half),
    to: share(bay.normal + way * bay.half),
  };
}
