/**
 * Pieces of metal by squares that touch along a side or a corner, of all that is not cut through. The sheet's edge and what
 * lies inside the exact wheel are not loose.
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

/** One square may be a ridge between two cuts, which goes as a chip. */
const FEWEST = 3;

/** The largest loose piece, if there is one. */
export function loosePiece(
  raster: Raster,
  body: WheelBody,
  through: number,
  isSheet: boolean,
): Piece | undefined {
  const { size, columns, left } = raster;
  const seen = new Uint8Array(left.length);
  const stack = new Int32Array(left.length);
  let worst: Piece | undefined;
  for (let start = 0; start < left.length; start++) {
    if (seen[start] === 1 || left[start]! <= through) {
      continue;
    }
    const { count, held } = flood(raster, body, through, isSheet, start, seen, stack);
    const area = count * size * size;
    if (!held && count >= FEWEST && area > (worst?.area ?? 0)) {
      const column = start % columns;
      worst = { x: raster.x0 + column * size, y: raster.y0 + ((start - column) / columns) * size, area };
    }
  }
  return worst;
}

function flood(
  raster: Raster,
  body: WheelBody,
  through: number,
  isSheet: boolean,
  start: number,
  seen: Uint8Array,
  stack: Int32Array,
): { count: number; held: boolean } {
  const { size, columns, rows, x0, y0, left } = raster;
  let [count, top, held] = [0, 0, false];
  stack[top++] = start;
  seen[start] = 1;
  while (top > 0) {
    const at = stack[--top]!;
    const column = at % columns;
    const row = (at - column) / columns;
    count += 1;
    const edge = column === 0 || row === 0 || column === columns - 1 || row === rows - 1;
    held ||= (isSheet && edge) || isInsideWheel(body, x0 + column * size, y0 + row * size);
    for (let r = Math.max(0, row - 1); r <= Math.min(rows - 1, row + 1); r++) {
      for (let c = Math.max(0, column - 1); c <= Math.min(columns - 1, column + 1); c++) {
        const next = r * columns + c;
        if (seen[next] === 0 && left[next]! > through) {
          seen[next] = 1;
          stack[top++] = next;
        }
      }
    }
  }
  return { count, held };
}
