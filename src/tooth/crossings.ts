/**
 * The windows between the arms of a wheel, with rounded corners, as one exact loop.
 *
 * Arm 1 is centred on +X; window 1 lies between it and the next arm counter-clockwise, its middle at pi/arms. The loop runs
 * counter-clockwise round the window: side of arm 1 outward, rim corner, rim arc, rim corner, side of arm 2 inward, hub
 * corner, hub arc (clockwise round the hub), hub corner. Where the arms meet before they reach the hub the window has three sides:
 * one corner takes the place of hub corners and hub arc.
 * An arm's widths are chords: across it where its sides cross the hub circle and the rim circle. mm, radians.
 */
import { failure, success, type Outcome } from '../base/problem.ts';
import { mirrorPiece, reversePiece, turnChain } from '../geometry/change-piece.ts';
import type { ArcPiece, Loop, Piece } from '../geometry/piece.ts';
import {
  addScaled,
  angleOf,
  dot,
  leftOf,
  norm,
  ORIGIN,
  subtract,
  unit,
  wrapAngle,
  type Point,
} from '../geometry/point.ts';
import { checkCrossings, cornerTooLarge } from './check-crossings.ts';
import type { CrossingProportions, Crossings } from './wheel.ts';

export function crossings(p: CrossingProportions, rootRadius: number): Outcome<Crossings> {
  const problems = checkCrossings(p, rootRadius);
  if (problems.length > 0) {
    return failure(problems);
  }
  const windowOuter = rootRadius - p.rim;
  const half = halfWindow(p, windowOuter, p.corner);
  if (!half) {
    const fits = (corner: number) => halfWindow(p, windowOuter, corner) !== undefined;
    return failure([cornerTooLarge(p.corner, fits)]);
  }
  return success({
    proportions: p,
    count: p.arms,
    window: turnChain(loopOf(half), Math.PI / p.arms),
    hubRadius: p.hub / 2,
    windowInner: half.inner,
    windowOuter,
  });
}

/** The lower half of a window whose middle lies on +X. */
interface HalfWindow {
  readonly side: Piece;
  readonly hub: Corner;
  readonly rim: Corner;
  /** Distance of the window's lowest point from the axis. */
  readonly inner: number;
  readonly hubRadius: number;
  readonly outer: number;
}

interface Corner {
  readonly centre: Point;
  readonly radius: number;
  /** On the arm's side, and on the circle (or on the middle line, where the hub has none left). */
  readonly onSide: Point;
  readonly onCircle: Point;
}

function halfWindow(p: CrossingProportions, outer: number, corner: number): HalfWindow | undefined {
  const hubRadius = p.hub / 2;
  const along = armSide(p, outer);
  const onLine = (reach: number) => discOnSide(along, corner, reach);
  const rimCentre = outer > corner ? onLine(outer - corner) : undefined;
  const besideHub = onLine(hubRadius + corner);
  if (!rimCentre || angleOf(rimCentre) > 0) {
    return undefined;
  }
  const threeSided = !besideHub || angleOf(besideHub) >= 0;
  const hubCentre = threeSided ? discOnMiddle(along, corner) : besideHub;
  const footOf = (centre: Point) => addScaled(centre, along.inward, -corner);
  const onSide = { hub: footOf(hubCentre), rim: footOf(rimCentre) };
  if (dot(subtract(onSide.rim, onSide.hub), along.outward) <= 0) {
    return undefined;
  }
  const towardsHub = addScaled(hubCentre, unit(hubCentre), -corner);
  const towardsRim = addScaled(rimCentre, unit(rimCentre), corner);
  return {
    side: { kind: 'line', from: onSide.hub, to: onSide.rim },
    hub: { centre: hubCentre, radius: corner, onSide: onSide.hub, onCircle: towardsHub },
    rim: { centre: rimCentre, radius: corner, onSide: onSide.rim, onCircle: towardsRim },
    inner: threeSided ? norm(towardsHub) : hubRadius,
    hubRadius,
    outer,
  };
}

interface ArmSide {
  readonly outward: Point;
  /** Into the window: to the left of outward. */
  readonly inward: Point;
  /** Distance of the side's line from the axis, along `inward`. */
  readonly offset: number;
}

/** The side of the arm below the window, through its ends on hub circle and rim circle. */
function armSide(p: CrossingProportions, outer: number): ArmSide {
  const arm = -Math.PI / p.arms;
  const end = (width: number, radius: number): Point => {
    const half = Math.asin(width / 2 / radius);
    return { x: radius * Math.cos(arm + half), y: radius * Math.sin(arm + half) };
  };
  const atHub = end(p.armAtHub, p.hub / 2);
  const outward = unit(subtract(end(p.armAtRim, outer), atHub));
  const inward = leftOf(outward);
  return { outward, inward, offset: dot(atHub, inward) };
}

/** The outer disc of a radius that touches the side and has its centre at a distance from the axis. */
function discOnSide({ outward, inward, offset }: ArmSide, radius: number, reach: number): Point | undefined {
  const off = offset + radius;
  if (Math.abs(off) > reach) {
    return undefined;
  }
  const on = Math.sqrt((reach - off) * (reach + off));
  return { x: on * outward.x + off * inward.x, y: on * outward.y + off * inward.y };
}

/** The disc that touches the sides of both arms. */
function discOnMiddle({ inward, offset }: ArmSide, radius: number): Point {
  return { x: (offset + radius) / inward.x, y: 0 };
}

function loopOf(half: HalfWindow): Loop {
  const { side, hub, rim } = half;
  const mirrored = (piece: Piece) => reversePiece(mirrorPiece(piece));
  const rimCorner = roundArc(rim, rim.onSide, rim.onCircle);
  const rimAngle = angleOf(rim.onCircle);
  const rimArc = roundAxis(half.outer, rimAngle, -2 * rimAngle);
  const hubAngle = -angleOf(hub.onCircle);
  if (hub.centre.y === 0) {
    const start = angleOf(subtract({ x: hub.onSide.x, y: -hub.onSide.y }, hub.centre));
    const turn = 2 * (Math.PI - start);
    const bottom: ArcPiece = { kind: 'arc', centre: hub.centre, radius: hub.radius, start, turn };
    return [side, rimCorner, rimArc, mirrored(rimCorner), mirrored(side), bottom];
  }
  const hubCorner = roundArc(hub, hub.onCircle, hub.onSide);
  const hubArc = roundAxis(half.hubRadius, hubAngle, -2 * hubAngle);
  return [
    side,
    rimCorner,
    rimArc,
    mirrored(rimCorner),
    mirrored(side),
    mirrored(hubCorner),
    hubArc,
    hubCorner,
  ];
}

/** A rounded corner, counter-clockwise. */
function roundArc(corner: Corner, from: Point, to: Point): ArcPiece {
  const start = angleOf(subtract(from, corner.centre));
  const turn = wrapAngle(angleOf(subtract(to, corner.centre)) - start);
  return { kind: 'arc', centre: corner.centre, radius: corner.radius, start, turn };
}

function roundAxis(radius: number, start: number, turn: number): ArcPiece {
  return { kind: 'arc', centre: ORIGIN, radius, start, turn };
}
