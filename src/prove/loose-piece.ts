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

/** One square or two may be a ridge between two cuts, which goes as a chip. */
const FEWEST = 3;

interface Run {
  readonly row: number;
  readonly from: number;
  /** One past the last. */
  readonly to: number;
}

/** The largest loose piece, if there is one. */
export function loosePiece(
  raster: Raster,
  body: WheelBody,
  through: number,
  isSheet: boolean,
): Piece | undefined {
  const runs = runsOf(raster, through);
  const root = joinRuns(runs);
  const count = new Map<number, number>();
  const held = new Set<number>();
  runs.forEach((run, k) => {
    const piece = root(k);
    count.set(piece, (count.get(piece) ?? 0) + run.to - run.from);
    if (isSheet && isAtEdge(raster, run)) {
      held.add(piece);
    }
  });
  runs.forEach((run, k) => {
    if (!held.has(root(k)) && isInWheel(raster, body, run)) {
      held.add(root(k));
    }
  });
  return largestOf(raster, runs, count, held);
}

function runsOf({ columns, rows, left }: Raster, through: number): Run[] {
  const runs: Run[] = [];
  for (let row = 0; row < rows; row++) {
    const base = row * columns;
    let from = -1;
    for (let column = 0; column <= columns; column++) {
      const solid = column < columns && left[base + column]! > through;
      if (solid && from < 0) {
        from = column;
      } else if (!solid && from >= 0) {
        runs.push({ row, from, to: column });
        from = -1;
      }
    }
  }
  return runs;
}

/** Which run stands for the piece a run belongs to: the first one in reading order. */
function joinRuns(runs: readonly Run[]): (k: number) => number {
  const parent = runs.map((_, k) => k);
  const root = (k: number): number => {
    let at = k;
    while (parent[at] !== at) {
      at = parent[at] = parent[parent[at]!]!;
    }
    return at;
  };
  let above = 0;
  runs.forEach((run, k) => {
    while (runs[above]!.row < run.row - 1 || (runs[above]!.row < run.row && runs[above]!.to < run.from)) {
      above++;
    }
    for (let other = above; other < k && runs[other]!.row < run.row && runs[other]!.from <= run.to; other++) {
      const [a, b] = [root(other), root(k)];
      parent[Math.max(a, b)] = Math.min(a, b);
    }
  });
  return root;
}

function isAtEdge({ rows, columns }: Raster, { row, from, to }: Run): boolean {
  return row === 0 || row === rows - 1 || from === 0 || to === columns;
}

function isInWheel({ size, x0, y0 }: Raster, body: WheelBody, { row, from, to }: Run): boolean {
  for (let column = from; column < to; column++) {
    if (isInsideWheel(body, x0 + column * size, y0 + row * size)) {
      return true;
    }
  }
  return false;
}

function largestOf(
  { size, x0, y0 }: Raster,
  runs: readonly Run[],
  count: ReadonlyMap<number, number>,
  held: ReadonlySet<number>,
): Piece | undefined {
  let worst: Piece | undefined;
  for (const [piece, squares] of count) {
    const area = squares * size * size;
    if (!held.has(piece) && squares >= FEWEST && area > (worst?.area ?? 0)) {
      const { row, from, to } = runs[piece]!;
      worst = { x: x0 + ((from + to - 1) / 2) * size, y: y0 + row * size, area };
    }
  }
  return worst;
}
