/**
 * Exact pieces and moves as SVG path data, arcs as arcs. Coordinates in mm, Y up: the group that holds them turns them
 * over. A cycloid becomes chords within half a micrometre, finer than any printer.
 */
import { CHORD_SAG } from '../base/tolerances.ts';
import { endOf, pointOn, startOf } from '../geometry/on-piece.ts';
import type { ArcPiece, Chain } from '../geometry/piece.ts';
import type { Point } from '../geometry/point.ts';
import { samplePiece } from '../geometry/sample-piece.ts';
import type { ArcStep, MoveStep, Position } from '../motion/motion.ts';
import { plain } from './words.ts';

const DECIMALS = 4;

function pair(point: Point): string {
  return `${plain(point.x, DECIMALS)} ${plain(point.y, DECIMALS)}`;
}

/** A chain of pieces, closed or not. */
export function chainPath(chain: Chain, close: boolean): string {
  const first = chain[0];
  if (first === undefined) {
    return '';
  }
  const parts = [`M${pair(startOf(first))}`];
  for (const piece of chain) {
    switch (piece.kind) {
      case 'line':
        parts.push(`L${pair(piece.to)}`);
        break;
      case 'arc':
        parts.push(arcPath(piece));
        break;
      case 'cycloid':
        parts.push(`L${samplePiece(piece, CHORD_SAG).slice(1).map(pair).join(' ')}`);
        break;
    }
  }
  return parts.join('') + (close ? 'Z' : '');
}

/** SVG draws no whole circle in one arc: halves. */
function arcPath(arc: ArcPiece): string {
  const halves = Math.abs(arc.turn) > Math.PI ? [0.5, 1] : [1];
  return halves
    .map((u) => {
      const to = u === 1 ? endOf(arc) : pointOn(arc, u);
      return `A${plain(arc.radius, DECIMALS)} ${plain(arc.radius, DECIMALS)} 0 0 ${arc.turn > 0 ? 1 : 0} ${pair(to)}`;
    })
    .join('');
}

/** The path of a tool's centre in plan, from `from` on; rapids are left out. */
export function movesPath(from: Position, moves: readonly MoveStep[]): string {
  const parts: string[] = [];
  let at: Position = from;
  let drawing = false;
  for (const move of moves) {
    if (move.kind === 'rapid') {
      drawing = false;
    } else {
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

function arcMove(from: Position, move: ArcStep): string {
  const radius = Math.hypot(from.x - move.centre.x, from.y - move.centre.y);
  const start = Math.atan2(from.y - move.centre.y, from.x - move.centre.x);
  return arcPath({ kind: 'arc', centre: move.centre, radius, start, turn: move.turn });
}
