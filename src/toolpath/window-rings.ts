/**
 * The rings that clear a window: offsets of its wall inward, each less than a cutter's radius inside the one before.
 *
 * In  : the crossings, distance of the outermost ring from the wall, cutter radius, how many rings at most. mm.
 * Out : loops of window 1, outermost first, counter-clockwise, as far in as there is room.
 * Below the corners' radius a ring is the parallel of every piece. Beyond it, it lies between the circles hub + d and rim - d
 * and the two sides moved in by d; where the sides meet before the hub's circle it has three sides. Where two sides meet at an
 * angle a, rings a step s apart lie s / sin(a / 2) apart along the bisector; the cutter must span that too.
 */
import { mirrorPiece, offsetPiece, reversePiece, turnChain } from '../geometry/change-piece.ts';
import type { LinePiece, Loop, Piece } from '../geometry/piece.ts';
import {
  addScaled,
  angleOf,
  dot,
  leftOf,
  ORIGIN,
  subtract,
  turnPoint,
  unit,
  type Point,
} from '../geometry/point.ts';
import type { Crossings } from '../tooth/wheel.ts';

export interface Ring {
  readonly loop: Loop;
  /** Of the ring from the wall. */
  readonly distance: number;
}

/** Step over the cutter's diameter: side milling of brass takes 0.2 to 0.4; a little more, as the depth is a slot's. Judgement. */
const STEP = 0.45;
/** Share of the cutter's diameter that ring may lie from ring along a bisector. */
const BISECTOR = 0.9;

export function windowRings(
  crossings: Crossings,
  outermost: number,
  cutterRadius: number,
  most: number,
): readonly Ring[] {
  const side = sideOf(crossings);
  // The side is below the middle line, and its inclination to it is half the angle between the sides.
  const half = Math.abs(angleOf(subtract(side.to, side.from)));
  const step = 2 * cutterRadius * Math.min(STEP, BISECTOR * Math.sin(half));
  const rings: Ring[] = [];
  while (rings.length < most) {
    const distance = outermost + rings.length * step;
    const loop = ringAt(crossings, side, distance);
    if (loop === undefined) {
      break;
    }
    rings.push({ loop, distance });
  }
  return rings;
}

/** Side of arm 1, turned so that the window's middle line is +X. */
function sideOf(crossings: Crossings): LinePiece {
  const side = crossings.window.find(({ kind }) => kind === 'line') as LinePiece;
  const middle = -Math.PI / crossings.count;
  return { kind: 'line', from: turnPoint(side.from, middle), to: turnPoint(side.to, middle) };
}

function ringAt(crossings: Crossings, side: LinePiece, distance: number): Loop | undefined {
  const { proportions, window, count } = crossings;
  if (distance < proportions.corner) {
    return window.map((piece) => offsetPiece(piece, -distance) as Piece);
  }
  const half = halfRing(crossings, side, distance);
  return half === undefined ? undefined : turnChain(half, Math.PI / count);
}

/** The ring beyond the corners, its middle line on +X. */
function halfRing(
  { hubRadius, windowOuter }: Crossings,
  side: LinePiece,
  distance: number,
): Loop | undefined {
  const outward = unit(subtract(side.to, side.from));
  const foot = addScaled(side.from, leftOf(outward), distance);
  const [inner, outer] = [hubRadius + distance, windowOuter - distance];
  const rim = outer > 0 ? onCircle(foot, outward, outer) : undefined;
  if (inner >= outer || rim === undefined || rim.y >= 0) {
    return undefined;
  }
  const hub = onCircle(foot, outward, inner);
  const meet = addScaled(foot, outward, -foot.y / outward.y);
  const pointed = hub === undefined || hub.y >= 0;
  const from = pointed ? meet : hub;
  const line: LinePiece = { kind: 'line', from, to: rim };
  const rimArc: Piece = {
    kind: 'arc',
    centre: ORIGIN,
    radius: outer,
    start: angleOf(rim),
    turn: -2 * angleOf(rim),
  };
  const back = reversePiece(mirrorPiece(line));
  const hubArc: Piece = {
    kind: 'arc',
    centre: ORIGIN,
    radius: inner,
    start: -angleOf(from),
    turn: 2 * angleOf(from),
  };
  return pointed ? [line, rimArc, back] : [line, rimArc, back, hubArc];
}

/** Where a line that runs outward leaves a circle about the axis. */
function onCircle(on: Point, outward: Point, radius: number): Point | undefined {
  const along = dot(on, outward);
  const across = on.x * outward.y - on.y * outward.x;
  const square = (radius - across) * (radius + across);
  return square < 0 ? undefined : addScaled(on, outward, -along + Math.sqrt(square));
}
