/** Turned, mirrored, reversed, shortened and offset pieces: each stays an exact piece of its own kind. */
import { headingOn } from './on-piece.ts';
import type { Chain, Piece } from './piece.ts';
import { addScaled, leftOf, turnPoint, type Point } from './point.ts';

/** Turned about the origin. */
export function turnPiece(piece: Piece, angle: number): Piece {
  switch (piece.kind) {
    case 'line':
      return { kind: 'line', from: turnPoint(piece.from, angle), to: turnPoint(piece.to, angle) };
    case 'arc':
      return { ...piece, centre: turnPoint(piece.centre, angle), start: piece.start + angle };
    case 'cycloid':
      return { ...piece, cusp: piece.cusp + angle };
  }
}

export function turnChain(chain: Chain, angle: number): Chain {
  return chain.map((piece) => turnPiece(piece, angle));
}

/** The chain of one pitch, `count` times round the origin, the first where it stands. */
export function repeatRound(chain: Chain, count: number): Chain {
  return Array.from({ length: count }, (_, k) => turnChain(chain, (2 * Math.PI * k) / count)).flat();
}

function mirrorPoint(point: Point): Point {
  return { x: point.x, y: -point.y };
}

/** Mirrored across the X axis; travel keeps its start, so what ran counter-clockwise now runs clockwise. */
export function mirrorPiece(piece: Piece): Piece {
  switch (piece.kind) {
    case 'line':
      return { kind: 'line', from: mirrorPoint(piece.from), to: mirrorPoint(piece.to) };
    case 'arc':
      return { ...piece, centre: mirrorPoint(piece.centre), start: -piece.start, turn: -piece.turn };
    case 'cycloid':
      return { ...piece, cusp: -piece.cusp, sense: piece.sense === 1 ? -1 : 1 };
  }
}

export function reversePiece(piece: Piece): Piece {
  switch (piece.kind) {
    case 'line':
      return { kind: 'line', from: piece.to, to: piece.from };
    case 'arc':
      return { ...piece, start: piece.start + piece.turn, turn: -piece.turn };
    case 'cycloid':
      return { ...piece, from: piece.to, to: piece.from };
  }
}

export function reverseChain(chain: Chain): Chain {
  return chain.toReversed().map(reversePiece);
}

/** Mirrored across the X axis and travelled the other way, so that it runs the same way round as before. */
export function mirrorChain(chain: Chain): Chain {
  return reverseChain(chain.map(mirrorPiece));
}

/** The part of a piece between u0 and u1 (u0 < u1). */
export function partOf(piece: Piece, u0: number, u1: number): Piece {
  switch (piece.kind) {
    case 'line': {
      const along = { x: piece.to.x - piece.from.x, y: piece.to.y - piece.from.y };
      return {
        kind: 'line',
        from: u0 === 0 ? piece.from : addScaled(piece.from, along, u0),
        to: u1 === 1 ? piece.to : addScaled(piece.from, along, u1),
      };
    }
    case 'arc':
      return { ...piece, start: piece.start + u0 * piece.turn, turn: (u1 - u0) * piece.turn };
    case 'cycloid': {
      const span = piece.to - piece.from;
      return {
        ...piece,
        from: u0 === 0 ? piece.from : piece.from + u0 * span,
        to: u1 === 1 ? piece.to : piece.from + u1 * span,
      };
    }
  }
}

/**
 * The parallel at `distance` to the RIGHT of travel: outward of an outline that runs counter-clockwise.
 * An arc that would shrink through its centre is undefined (`undefined`): the piece has no offset on that side.
 */
export function offsetPiece(piece: Piece, offset: number): Piece | undefined {
  switch (piece.kind) {
    case 'line': {
      const right = leftOf(headingOn(piece, 0));
      return {
        kind: 'line',
        from: addScaled(piece.from, right, -offset),
        to: addScaled(piece.to, right, -offset),
      };
    }
    case 'arc': {
      const radius = piece.radius + (piece.turn < 0 ? -offset : offset);
      return radius < 0 ? undefined : { ...piece, radius };
    }
    case 'cycloid':
      return { ...piece, offset: piece.offset + offset * rightSign(piece) };
  }
}

/** +1 where the right of travel is the side of n, judged on the curve itself (no offset), inside the span. */
function rightSign(piece: Piece & { kind: 'cycloid' }): number {
  const curve = { ...piece, offset: 0 };
  const heading = headingOn(curve, 0.5);
  const t = (piece.from + piece.to) / 2;
  const h = (1 + piece.fixed / (2 * piece.rolling)) * t;
  const n = turnPoint({ x: Math.sin(h), y: -piece.sense * Math.cos(h) }, piece.cusp);
  return heading.y * n.x - heading.x * n.y > 0 ? 1 : -1;
}
