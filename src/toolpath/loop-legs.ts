/**
 * The whole loop from one pitch: its pieces turned round by whole pitches, once, with feeds, teeth and falls.
 *
 * In  : a pitch path, the number of teeth, where its corner is joined and left (shares of the corner arc), feeds by piece.
 * Out : legs from the join once round to the place where the loop closes, and on to where it is left. Wheel frame, mm.
 */
import { partOf } from '../geometry/change-piece.ts';
import { endOf } from '../geometry/on-piece.ts';
import type { ArcPiece, LinePiece } from '../geometry/piece.ts';
import type { Leg } from './leg.ts';
import { chords, type PathPiece, type PathRole, type PitchPath } from './pitch-path.ts';

export interface LoopLeg extends Leg {
  /** 1-based, counter-clockwise from +X. */
  readonly tooth: number;
  /** Whether a descent may fall on it: a straight flank. */
  readonly falls: boolean;
}

export interface LoopLegs {
  /** From the join once round to the join. */
  readonly round: readonly LoopLeg[];
  /** From the join on to where the loop is left. */
  readonly past: readonly LoopLeg[];
}

export type FeedOf = (role: PathRole, piece: LinePiece | ArcPiece) => number;

export function loopLegs(
  path: PitchPath,
  teeth: number,
  ends: { readonly from: number; readonly to: number },
  feedOf: FeedOf,
): LoopLegs {
  const legs: LoopLeg[] = [];
  const step = (path.way * 2 * Math.PI) / teeth;
  const corners = path.made === 'lines' ? chords(path.corner, 'corner', path) : [path.corner];
  const pitch = [
    ...corners.map((piece) => template({ piece, role: 'corner', next: false }, feedOf('corner', piece))),
    ...path.rest.map((part) => template(part, feedOf(part.role, part.piece))),
  ];
  for (let k = 0; k < teeth; k++) {
    turnLegs(pitch, k, step, teeth, path.way, legs);
  }
  const { corner } = path;
  const feed = feedOf('corner', corner);
  const cut = (from: number, to: number): LoopLeg[] => {
    const arc = partOf(corner, from, to);
    const pieces = path.made === 'lines' ? chords(arc, 'corner', path) : [arc];
    return pieces.map((piece) => ({
      to: endOf(piece),
      centre: piece.kind === 'arc' ? piece.centre : undefined,
      turn: piece.kind === 'arc' ? piece.turn : 0,
      feed,
      tooth: 1,
      falls: false,
    }));
  };
  return {
    round: [...cut(ends.from, 1), ...legs.slice(corners.length), ...cut(0, ends.from)],
    past: cut(ends.from, ends.to),
  };
}

interface Template {
  readonly x: number;
  readonly y: number;
  readonly arc: ArcPiece | undefined;
  readonly feed: number;
  readonly next: boolean;
  readonly falls: boolean;
}

function template({ piece, role, next }: PathPiece, feed: number): Template {
  const end = endOf(piece);
  const arc = piece.kind === 'arc' ? piece : undefined;
  return { x: end.x, y: end.y, arc, feed, next, falls: role === 'flank' && arc === undefined };
}

function turnLegs(
  pitch: readonly Template[],
  k: number,
  step: number,
  teeth: number,
  way: 1 | -1,
  legs: LoopLeg[],
): void {
  const c = Math.cos(k * step);
  const s = Math.sin(k * step);
  const here = toothAt(k, way, teeth);
  const after = toothAt(k + 1, way, teeth);
  for (const { x, y, arc, feed, next, falls } of pitch) {
    const to = { x: x * c - y * s, y: x * s + y * c };
    const tooth = next ? after : here;
    if (arc === undefined) {
      legs.push({ to, centre: undefined, turn: 0, feed, tooth, falls });
    } else {
      const { x: cx, y: cy } = arc.centre;
      legs.push({
        to,
        centre: { x: cx * c - cy * s, y: cx * s + cy * c },
        turn: arc.turn,
        feed,
        tooth,
        falls,
      });
    }
  }
}

function toothAt(k: number, way: 1 | -1, teeth: number): number {
  return ((((way * k) % teeth) + teeth) % teeth) + 1;
}
