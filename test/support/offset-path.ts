/**
 * The path of a round cutter round an exact wheel, as plain lines and arcs, made from the pieces' own parallels and nothing of
 * the maker's: root arc, flank, addendum (arcs through points of the exact parallel), round the tip corner, tip land.
 * `rolled` 'sharp' leaves the addendum as chords, to show what facets do.
 */
import { headingOn, pointOn } from '../../src/geometry/on-piece.ts';
import { offsetPiece } from '../../src/geometry/change-piece.ts';
import {
  addScaled,
  angleOf,
  cross,
  distance,
  norm,
  ORIGIN,
  polar,
  subtract,
  turnPoint,
  type Point,
} from '../../src/geometry/point.ts';
import type { WheelForm } from '../../src/tooth/wheel.ts';

export interface PathMove {
  readonly to: Point;
  readonly centre?: Point;
  /** Positive counter-clockwise. */
  readonly turn?: number;
}

export interface PathOptions {
  /** How many arcs (or chords) stand for an addendum. */
  readonly parts?: number;
  readonly facets?: boolean;
}

/** One loop, counter-clockwise, from the middle of the space before tooth 1. */
export function offsetPath(form: WheelForm, offset: number, options: PathOptions = {}): PathMove[] {
  const { teeth } = form.proportions;
  const moves: PathMove[] = [];
  for (let k = 0; k < teeth; k++) {
    const angle = (2 * Math.PI * k) / teeth;
    for (const move of toothPath(form, offset, options)) {
      moves.push({
        ...move,
        to: turnPoint(move.to, angle),
        ...(move.centre === undefined ? {} : { centre: turnPoint(move.centre, angle) }),
      });
    }
  }
  return moves;
}

export function pathStart(form: WheelForm, offset: number): Point {
  return polar(form.rootRadius + offset, -Math.PI / form.proportions.teeth);
}

function toothPath(form: WheelForm, offset: number, options: PathOptions): PathMove[] {
  const half = Math.PI / form.proportions.teeth;
  const floor = form.rootRadius + offset;
  const [, flank, face, land] = form.sector;
  const rising = offsetPiece(flank!.piece, offset)!;
  const beta = Math.abs(angleOf(pointOn(flank!.piece, 0)));
  const corner = pointOn(face!.piece, 1);
  const low = beta + Math.asin(offset / floor);
  const side: PathMove[] = [
    aroundAxis(polar(floor, -low), half - low),
    { to: pointOn(rising, 1) },
    ...facePath(face!.piece, offset, options),
  ];
  const end = addScaled(corner, outward(face!.piece, 1), offset);
  const onto = addScaled(corner, outward(land!.piece, 0), offset);
  const round: PathMove = { to: onto, centre: corner, turn: sweep(corner, end, onto) };
  const tip = Math.abs(angleOf(corner));
  const over = aroundAxis(polar(form.outsideRadius + offset, tip), 2 * tip);
  const up = [...side, round];
  return [...up, over, ...mirrored(up, polar(floor, -half))];
}

/** The same moves mirrored across X and travelled the other way. */
function mirrored(moves: readonly PathMove[], start: Point): PathMove[] {
  const flip = (p: Point): Point => ({ x: p.x, y: -p.y });
  return moves
    .map((move, k) => ({
      to: flip(k === 0 ? start : moves[k - 1]!.to),
      ...(move.centre === undefined ? {} : { centre: flip(move.centre), turn: move.turn! }),
    }))
    .toReversed();
}

function facePath(piece: Parameters<typeof pointOn>[0], offset: number, options: PathOptions): PathMove[] {
  const parts = options.parts ?? 24;
  const at = (u: number): Point => addScaled(pointOn(piece, u), outward(piece, u), offset);
  return Array.from({ length: parts }, (_, k) => {
    const [from, to] = [at(k / parts), at((k + 1) / parts)];
    return options.facets ? { to } : arcThrough(from, at((k + 0.5) / parts), to);
  });
}

function outward(piece: Parameters<typeof pointOn>[0], u: number): Point {
  const heading = headingOn(piece, u);
  return { x: heading.y, y: -heading.x };
}

function aroundAxis(to: Point, turn: number): PathMove {
  return { to, centre: ORIGIN, turn };
}

function sweep(centre: Point, from: Point, to: Point): number {
  const [a, b] = [subtract(from, centre), subtract(to, centre)];
  return Math.asin(cross(a, b) / (norm(a) * norm(b)));
}

function arcThrough(a: Point, b: Point, c: Point): PathMove {
  const d = 2 * cross(subtract(b, a), subtract(c, a));
  const [ab, ac] = [subtract(b, a), subtract(c, a)];
  const [b2, c2] = [distance(a, b) ** 2, distance(a, c) ** 2];
  const centre = { x: a.x + (ac.y * b2 - ab.y * c2) / d, y: a.y + (ab.x * c2 - ac.x * b2) / d };
  return { to: c, centre, turn: sweep(centre, a, c) };
}
