/**
 * Exact pieces and moves as SVG path data, arcs as arcs. Coordinates in mm, Y up: the group that holds them turns them
 * over. A cycloid becomes arcs within a fifth of a micrometre, finer than any printer.
 */
import { CHORD_SAG } from '../base/tolerances.ts';
import { repeatRound } from '../geometry/change-piece.ts';
import { endOf, pointOn, startOf } from '../geometry/on-piece.ts';
import type { ArcPiece, Chain } from '../geometry/piece.ts';
import type { Point } from '../geometry/point.ts';
import type { ArcStep, MoveStep, Position } from '../motion/motion.ts';
import type { WheelPiece } from '../tooth/wheel.ts';
import { drawnChain } from './draw-arcs.ts';
import { coordinate } from './words.ts';

/** All teeth, one fitted and turned round. */
export function teethPath(sector: readonly WheelPiece[], teeth: number): string {
  return chainPath(repeatRound(drawable(sector), teeth), true);
}

/** One pitch in lines and arcs. */
export function drawable(sector: readonly WheelPiece[]): Chain {
  return drawnChain(
    sector.map(({ piece }) => piece),
    CHORD_SAG,
  );
}

function pair(point: Point): string {
  return `${coordinate(point.x)} ${coordinate(point.y)}`;
}

/** A chain of pieces, closed or not. */
export function chainPath(chain: Chain, close: boolean): string {
  const first = chain[0];
  if (first === undefined) {
    return '';
  }
  const pieces = drawnChain(chain, CHORD_SAG);
  const parts = pieces.map((piece) => (piece.kind === 'line' ? `L${pair(piece.to)}` : arcPath(piece)));
  return `M${pair(startOf(first))}${parts.join('')}${close ? 'Z' : ''}`;
}

/** SVG draws no whole circle in one arc: halves. */
function arcPath(arc: ArcPiece): string {
  const radius = coordinate(arc.radius);
  const sweep = arc.turn > 0 ? 1 : 0;
  const half =
    Math.abs(arc.turn) > Math.PI ? `A${radius} ${radius} 0 0 ${sweep} ${pair(pointOn(arc, 0.5))}` : '';
  return `${half}A${radius} ${radius} 0 0 ${sweep} ${pair(endOf(arc))}`;
}

export function circlePath(radius: number): string {
  const r = coordinate(radius);
  return `M${r} 0A${r} ${r} 0 0 1 -${r} 0A${r} ${r} 0 0 1 ${r} 0Z`;
}

/** The path of a tool's centre in plan, from `from` on; rapids are left out, and so is what goes straight down. */
export function movesPath(from: Position, moves: readonly MoveStep[]): string {
  const parts: string[] = [];
  let at: Position = from;
  let drawing = false;
  for (const move of moves) {
    const still = move.kind === 'line' && move.to.x === at.x && move.to.y === at.y;
    if (move.kind === 'rapid') {
      drawing = false;
    } else if (!still) {
      if (!drawing) {
        parts.push(`M${pair(at)}`);
        drawing = true;
      }
      parts.push(move.kind === 'arc' ? arcMove(at, move) : `L${pair(move.to)}`);
    }
    at = move.to;
  }
  return parts.join('');
}

/** Its ends as they are written, so that neighbours meet. */
function arcMove(from: Position, move: ArcStep): string {
  const radius = Math.hypot(from.x - move.centre.x, from.y - move.centre.y);
  if (Math.abs(move.turn) > Math.PI) {
    const start = Math.atan2(from.y - move.centre.y, from.x - move.centre.x);
    return arcPath({ kind: 'arc', centre: move.centre, radius, start, turn: move.turn });
  }
  const r = coordinate(radius);
  return `A${r} ${r} 0 0 ${move.turn > 0 ? 1 : 0} ${pair(move.to)}`;
}
