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
import type { TracedMove } from '../../src/motion/traced-move.ts';
import type { Piece } from '../../src/geometry/piece.ts';
import type { PieceRole, WheelForm } from '../../src/tooth/wheel.ts';

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

/** The same loop as traced moves of cutter 1 at one height, as if each stood on a line of its own. */
export function loopMoves(
  form: WheelForm,
  offset: number,
  z: number,
  options: PathOptions = {},
): TracedMove[] {
  let at = pathStart(form, offset);
  return offsetPath(form, offset, options).map(({ to, centre, turn }, k) => {
    const from = at;
    at = to;
    return {
      file: 'a',
      line: k + 1,
      kind: centre === undefined ? 'line' : 'arc',
      from: { ...from, z },
      to: { ...to, z },
      ...(centre === undefined || turn === undefined ? {} : { centre, turn }),
      feed: 100,
      cutter: 1,
      spindle: 10000,
    };
  });
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

/** In the middle of the space: on the root circle's parallel, or where those of the two flanks meet above it. */
export function pathStart(form: WheelForm, offset: number): Point {
  const half = Math.PI / form.proportions.teeth;
  return polar(Math.max(form.rootRadius + offset, wedgedAt(form, offset)), -half);
}

/** How far out the parallels of two flanks meet. */
function wedgedAt(form: WheelForm, offset: number): number {
  const half = Math.PI / form.proportions.teeth;
  return offset / Math.sin(half + angleOf(pointOn(pieceOf(form, 'flank'), 0)));
}

/** The first one of the sector. */
function pieceOf(form: WheelForm, role: PieceRole): Piece {
  const found = form.sector.find((each) => each.role === role);
  if (found === undefined) {
    throw new Error(`no ${role} in this outline`);
  }
  return found.piece;
}

function toothPath(form: WheelForm, offset: number, options: PathOptions): PathMove[] {
  const rising = offsetPiece(pieceOf(form, 'flank'), offset)!;
  const face = pieceOf(form, 'addendum');
  const corner = pointOn(face, 1);
  const side: PathMove[] = [...rootPath(form, offset), ...sidePath(rising, face, offset, options)];
  const end = addScaled(corner, outward(face, 1), offset);
  const down = mirrored(side, pathStart(form, offset));
  const land = form.sector.find(({ role }) => role === 'land')?.piece;
  if (land === undefined) {
    // The two sides meet on the tooth's middle line.
    const over = { x: end.x, y: -end.y };
    return [...side, { to: over, centre: corner, turn: sweep(corner, end, over) }, ...down];
  }
  const onto = addScaled(corner, outward(land, 0), offset);
  const round: PathMove = { to: onto, centre: corner, turn: sweep(corner, end, onto) };
  const tip = Math.abs(angleOf(corner));
  const over = aroundAxis(polar(form.outsideRadius + offset, tip), 2 * tip);
  const up = [...side, round];
  return [...up, over, ...mirrored(up, pathStart(form, offset))];
}

/** From the middle of the space to where the flank's parallel begins: nothing where the cutter is wedged. */
function rootPath(form: WheelForm, offset: number): PathMove[] {
  const half = Math.PI / form.proportions.teeth;
  const floor = form.rootRadius + offset;
  if (wedgedAt(form, offset) > floor) {
    return [];
  }
  if (form.proportions.rootFillet > offset) {
    const fillet = pieceOf(form, 'fillet');
    const round = offsetPiece(fillet, offset)!;
    const to = pointOn(round, 0);
    return fillet.kind === 'arc'
      ? [
          aroundAxis(to, half + angleOf(to)),
          { to: pointOn(round, 1), centre: fillet.centre, turn: fillet.turn },
        ]
      : [];
  }
  const beta = Math.abs(angleOf(pointOn(pieceOf(form, 'flank'), 0)));
  const low = beta + Math.asin(offset / floor);
  return [aroundAxis(polar(floor, -low), half - low)];
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

/** Up the flank and along the addendum; one arc leaves the flank at a corner, round which the cutter turns. */
function sidePath(rising: Piece, face: Piece, offset: number, options: PathOptions): PathMove[] {
  const top = { to: pointOn(rising, 1) };
  if (face.kind !== 'arc') {
    return [top, ...facePath(face, offset, options)];
  }
  const along = offsetPiece(face, offset)!;
  const [onto, to, corner] = [pointOn(along, 0), pointOn(along, 1), pointOn(face, 0)];
  const round = { to: onto, centre: corner, turn: sweep(corner, top.to, onto) };
  return [top, round, { to, centre: face.centre, turn: face.turn }];
}

function facePath(piece: Piece, offset: number, options: PathOptions): PathMove[] {
  const parts = options.parts ?? 24;
  const at = (u: number): Point => addScaled(pointOn(piece, u), outward(piece, u), offset);
  return Array.from({ length: parts }, (_, k) => {
    const [from, to] = [at(k / parts), at((k + 1) / parts)];
    return options.facets ? { to } : arcThrough(from, at((k + 0.5) / parts), to);
  });
}

function outward(piece: Piece, u: number): Point {
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
