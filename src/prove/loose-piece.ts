/**
 * Pieces of metal that are cut free: squares that are not cut through, joined along sides and corners. The sheet's edge and
 * what lies inside the exact wheel are not loose.
 *
 * Row by row, squares that lie side by side are one run; runs of neighbouring rows that touch are joined (union-find).
 */
import { isInsideWheel, type WheelBody } from './metal-inside.ts';
import type { Raster } from './metal-raster.ts';

export interface Piece {
  /** A place in it. */
  readonly x: number;
  readonly y: number;
  /** mm2 */
  readonly area: number;
}

/** Runs of squares in reading order, as columns of numbers. */
interface Runs {
  readonly row: number[];
  readonly from: number[];
  /** One past the last. */
  readonly to: number[];
}

/** The largest loose piece of `fewest` squares or more, if there is one. */
export function loosePiece(
  raster: Raster,
  body: WheelBody,
  isSheet: boolean,
  fewest: number,
): Piece | undefined {
  const runs = runsOf(raster);
  const piece = joinRuns(runs);
  const squares = new Int32Array(piece.length);
  const held = new Uint8Array(piece.length);
  for (let k = 0; k < piece.length; k++) {
    squares[piece[k]!]! += runs.to[k]! - runs.from[k]!;
    if (isSheet && isAtEdge(raster, runs, k)) {
      held[piece[k]!] = 1;
    }
  }
  for (let k = 0; k < piece.length; k++) {
    if (held[piece[k]!] === 0 && isInWheel(raster, body, runs, k)) {
      held[piece[k]!] = 1;
    }
  }
  return largestOf(raster, runs, squares, held, fewest);
}

function runsOf({ columns, rows, left, through }: Raster): Runs {
  const runs: Runs = { row: [], from: [], to: [] };
  for (let row = 0; row < rows; row++) {
    const end = (row + 1) * columns;
    const base = row * columns;
    let at = base;
    while (at < end) {
      while (at < end && left[at]! <= through) {
        at += 1;
      }
      const from = at;
      while (at < end && left[at]! > through) {
        at += 1;
      }
      if (at > from) {
        runs.row.push(row);
        runs.from.push(from - base);
        runs.to.push(at - base);
      }
    }
  }
  return runs;
}

/** Which run stands for the piece a run belongs to: the first one in reading order. */
function joinRuns({ row, from, to }: Runs): Int32Array {
  const parent = new Int32Array(row.length);
  let above = 0;
  for (let k = 0; k < parent.length; k++) {
    parent[k] = k;
    while (row[above]! < row[k]! - 1 || (row[above]! < row[k]! && to[above]! < from[k]!)) {
      above += 1;
    }
    for (let other = above; other < k && row[other]! < row[k]! && from[other]! <= to[k]!; other++) {
      const a = rootOf(parent, other);
      const b = rootOf(parent, k);
      parent[a > b ? a : b] = a > b ? b : a;
    }
  }
  for (let k = 0; k < parent.length; k++) {
    parent[k] = rootOf(parent, k);
  }
  return parent;
}

function rootOf(parent: Int32Array, k: number): number {
  let at = k;
  while (parent[at] !== at) {
    at = parent[at] = parent[parent[at]!]!;
  }
  return at;
}

function isAtEdge({ rows, columns }: Raster, { row, from, to }: Runs, k: number): boolean {
  return row[k] === 0 || row[k] === rows - 1 || from[k] === 0 || to[k] === columns;
}

function isInWheel({ size, x0, y0 }: Raster, body: WheelBody, { row, from, to }: Runs, k: number): boolean {
  for (let column = from[k]!; column < to[k]!; column++) {
    if (isInsideWheel(body, x0 + column * size, y0 + row[k]! * size)) {
      return true;
    }
  }
  return false;
}

function largestOf(
  { size, x0, y0 }: Raster,
  { row, from, to }: Runs,
  squares: Int32Array,
  held: Uint8Array,
  fewest: number,
): Piece | undefined {
  let worst: Piece | undefined;
  for (let k = 0; k < squares.length; k++) {
    const area = squares[k]! * size * size;
    if (held[k] === 0 && squares[k]! >= fewest && area > (worst?.area ?? 0)) {
      worst = { x: x0 + ((from[k]! + to[k]! - 1) / 2) * size, y: y0 + row[k]! * size, area };
    }
  }
  return worst;
}
