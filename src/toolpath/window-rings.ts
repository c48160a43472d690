/**
 * The rings that clear a window: offsets of its wall inward, from the outermost to where what is left inside is open.
 *
 * In  : the crossings, distance of the outermost ring from the wall, cutter radius, how many rings at most. mm.
 * Out : loops of window 1, outermost first, counter-clockwise, evenly spaced.
 * Below the corners' radius a ring is the parallel of every piece. Beyond it, it lies between the circles hub + d and rim - d
 * and the two sides moved in by d; where the sides meet before the hub's circle it has three sides.
 * Maths: two sides meet at 2a. A ring opens the bisector up to r / sin a from its corner, the next ring's corner, s / sin a
 * inside, opens r before itself: nothing stands between them where s <= r (1 + sin a). The innermost ring opens all that is
 * left where no place inside lies further than r from it.
 */
import { mirrorPiece, offsetPiece, reversePiece, turnChain } from '../geometry/change-piece.ts';
import { headingOn } from '../geometry/on-piece.ts';
import type { LinePiece, Loop, Piece } from '../geometry/piece.ts';
import {
  addScaled,
  angleOf,
  cross,
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

/**
 * Greatest step from ring to ring over the cutter's diameter. Levels are as deep as a full slot may be, so that load allows
 * any; the rest is for a wall that bends away. Judgement.
 */
const STEP = 0.8;
/** Share of what would just leave nothing standing. Judgement: the cutter is worn, and bends. */
const OVERLAPPING = 0.94;
/** Halvings by which the middle of a window is found: to a millionth of it. */
const HALVINGS = 20;

export function windowRings(
  crossings: Crossings,
  outermost: number,
  cutterRadius: number,
  most: number,
): readonly Ring[] {
  const side = sideOf(crossings);
  const at = (distance: number): Ring | undefined => {
    const loop = ringAt(crossings, side, distance);
    return loop && { loop, distance };
  };
  const first = at(outermost);
  if (first === undefined) {
    return [];
  }
  const innermost = middleDistance(crossings, at, outermost) - OVERLAPPING * cutterRadius;
  const last = at(Math.max(innermost, outermost)) ?? first;
  const step = cutterRadius * Math.min(2 * STEP, OVERLAPPING * (1 + Math.sin(sharpestHalf(last.loop))));
  const more = Math.max(0, Math.ceil((innermost - outermost) / step));
  const inner = Array.from({ length: Math.min(more, most - 1) }, (_, i) =>
    at(outermost + ((innermost - outermost) * (i + 1)) / more),
  );
  return [first, ...inner.filter((ring) => ring !== undefined)];
}

/** Half the sharpest angle of a ring: the corners at the rim grow sharper inward, so the innermost ring has it. */
function sharpestHalf(loop: Loop): number {
  return loop.reduce((least, piece, i) => {
    const before = headingOn(loop.at(i - 1) as Piece, 1);
    const after = headingOn(piece, 0);
    return Math.min(least, (Math.PI - Math.atan2(cross(before, after), dot(before, after))) / 2);
  }, Math.PI / 2);
}

/** How far the place furthest inside lies from the wall. */
function middleDistance(
  { hubRadius, windowOuter }: Crossings,
  at: (distance: number) => Ring | undefined,
  outermost: number,
): number {
  let inside = outermost;
  let beyond = outermost + windowOuter - hubRadius;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (inside + beyond) / 2;
    if (at(middle) === undefined) {
      beyond = middle;
    } else {
      inside = middle;
    }
  }
  return beyond;
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
