/**
 * Distance from a point to a path, in closed form, and how far a point is from the metal taken by a list of paths:
 * the least of (distance to path - cutter radius). Negative is inside what the cutters sweep: the exact envelope of lines
 * (capsules) and arcs (bands with round ends), with no sampling along the moves.
 */
import type { PathSet } from './metal-paths.ts';

/** mm from (x, y) to path i of the cutter's axis. */
export function pathDistance(set: PathSet, i: number, x: number, y: number): number {
  const arc = set.arc[i]!;
  return arc === 0 ? lineDistance(set, i, x, y) : arcDistance(set, i, arc, x, y);
}

function lineDistance(set: PathSet, i: number, x: number, y: number): number {
  const x0 = set.x0[i]!;
  const y0 = set.y0[i]!;
  const dx = set.x1[i]! - x0;
  const dy = set.y1[i]! - y0;
  const length2 = dx * dx + dy * dy;
  let u = length2 === 0 ? 0 : ((x - x0) * dx + (y - y0) * dy) / length2;
  u = u < 0 ? 0 : u > 1 ? 1 : u;
  const px = x - x0 - u * dx;
  const py = y - y0 - u * dy;
  return Math.sqrt(px * px + py * py);
}

function arcDistance(set: PathSet, i: number, arc: number, x: number, y: number): number {
  const cx = set.cx[i]!;
  const cy = set.cy[i]!;
  const turn = set.turn[i]!;
  const px = x - cx;
  const py = y - cy;
  const sx = set.x0[i]! - cx;
  const sy = set.y0[i]! - cy;
  const ex = set.x1[i]! - cx;
  const ey = set.y1[i]! - cy;
  if (withinSweep(px, py, sx, sy, ex, ey, turn)) {
    return Math.abs(Math.sqrt(px * px + py * py) - arc);
  }
  const s2 = (px - sx) * (px - sx) + (py - sy) * (py - sy);
  const e2 = (px - ex) * (px - ex) + (py - ey) * (py - ey);
  return Math.sqrt(s2 < e2 ? s2 : e2);
}

/** Whether the direction p lies in the wedge swept from s to e; judged by cross products, no angles needed. */
function withinSweep(
  px: number,
  py: number,
  sx: number,
  sy: number,
  ex: number,
  ey: number,
  turn: number,
): boolean {
  const way = turn < 0 ? -1 : 1;
  const fromStart = way * (sx * py - sy * px);
  const toEnd = way * (px * ey - py * ex);
  const sweep = way * turn;
  if (sweep <= Math.PI) {
    return fromStart >= 0 && toEnd >= 0;
  }
  // More than half a turn: everything but the wedge from the end on to the start. A whole circle has none.
  return fromStart >= 0 || toEnd >= 0;
}

/** Scratch answer of `sweptGap`: which path was nearest. */
export interface Nearest {
  path: number;
}

/** Least (distance - cutter radius) over list[from] to list[to - 1]; the nearest one goes into `nearest`. */
export function sweptGap(
  set: PathSet,
  list: Int32Array,
  from: number,
  to: number,
  x: number,
  y: number,
  nearest: Nearest,
): number {
  let best = Infinity;
  let path = -1;
  for (let k = from; k < to; k++) {
    const i = list[k]!;
    const gap = pathDistance(set, i, x, y) - set.radius[i]!;
    if (gap < best) {
      best = gap;
      path = i;
    }
  }
  nearest.path = path;
  return best;
}

/** The point of path i nearest to (x, y). */
export function nearestOnPath(set: PathSet, i: number, x: number, y: number): { x: number; y: number } {
  const x0 = set.x0[i]!;
  const y0 = set.y0[i]!;
  const x1 = set.x1[i]!;
  const y1 = set.y1[i]!;
  const arc = set.arc[i]!;
  if (arc === 0) {
    const dx = x1 - x0;
    const dy = y1 - y0;
    const length2 = dx * dx + dy * dy;
    const u = length2 === 0 ? 0 : Math.min(1, Math.max(0, ((x - x0) * dx + (y - y0) * dy) / length2));
    return { x: x0 + u * dx, y: y0 + u * dy };
  }
  const cx = set.cx[i]!;
  const cy = set.cy[i]!;
  if (withinSweep(x - cx, y - cy, x0 - cx, y0 - cy, x1 - cx, y1 - cy, set.turn[i]!)) {
    const rho = Math.hypot(x - cx, y - cy) || 1;
    return { x: cx + ((x - cx) * arc) / rho, y: cy + ((y - cy) * arc) / rho };
  }
  return Math.hypot(x - x0, y - y0) < Math.hypot(x - x1, y - y1) ? { x: x0, y: y0 } : { x: x1, y: y1 };
}
