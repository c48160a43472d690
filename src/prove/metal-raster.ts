/**
 * The metal as squares seen from above, each with the height that is left: coarse, and only for what a line drawing can't tell, how
 * deep a cut bites into solid metal and which pieces have come loose. A square counts as cut when its middle is,
 * to an eighth of a square along arcs.
 */
import type { Setup } from '../cutting/setup.ts';
import { isInBlank } from './metal-cover.ts';
import type { PathSet } from './metal-paths.ts';

export interface Raster {
  readonly size: number;
  readonly columns: number;
  readonly rows: number;
  readonly x0: number;
  readonly y0: number;
  /** Height that is left; -Infinity where there never was metal. */
  readonly left: Float32Array;
  /** Squares that were cut down to here or below count as cut through. */
  readonly through: number;
  /** How many have been cut through. */
  opened: number;
}

/** Covers the blank within `reach` of the axis, in squares of `size`. */
export function blankRaster(setup: Setup, reach: number, size: number, through: number): Raster {
  const { shape } = setup;
  const halfX = Math.min(reach, shape.kind === 'disc' ? shape.diameter / 2 : shape.width / 2);
  const halfY = Math.min(reach, shape.kind === 'disc' ? shape.diameter / 2 : shape.height / 2);
  const columns = Math.max(1, Math.ceil((2 * halfX) / size));
  const rows = Math.max(1, Math.ceil((2 * halfY) / size));
  const [x0, y0] = [(-columns * size) / 2 + size / 2, (-rows * size) / 2 + size / 2];
  const left = new Float32Array(columns * rows).fill(setup.topZ);
  const raster = { size, columns, rows, x0, y0, left, through, opened: 0 };
  if (shape.kind === 'sheet' && setup.bored === 0) {
    return raster;
  }
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      if (!isInBlank(setup, x0 + column * size, y0 + row * size)) {
        left[row * columns + column] = -Infinity;
      }
    }
  }
  return raster;
}

/** A band round an arc is drawn as bands round chords that leave it by no more than these shares of a square and of the radius. */
const SAG = 1 / 8;
const SAG_RADIUS = 1 / 50;

/**
 * Takes away what path i cuts down to height z, and returns how deep it bit at most near its own axis, where the cutter is
 * in metal on both sides.
 */
export function cutRaster(raster: Raster, paths: PathSet, i: number, z: number): number {
  const radius = paths.radius[i]!;
  const arc = paths.arc[i]!;
  const x0 = paths.x0[i]!;
  const y0 = paths.y0[i]!;
  if (arc === 0) {
    return cutChord(raster, x0, y0, paths.x1[i]!, paths.y1[i]!, radius, z);
  }
  const cx = paths.cx[i]!;
  const cy = paths.cy[i]!;
  const turn = paths.turn[i]!;
  // A chord over the angle a leaves its arc by r a^2 / 8.
  const sag = Math.min(SAG * raster.size, SAG_RADIUS * radius);
  const chords = Math.max(1, Math.ceil(Math.abs(turn) / Math.sqrt((8 * sag) / arc)));
  const cos = Math.cos(turn / chords);
  const sin = Math.sin(turn / chords);
  let dx = x0 - cx;
  let dy = y0 - cy;
  let bite = 0;
  for (let k = 0; k < chords; k++) {
    const nextX = dx * cos - dy * sin;
    const nextY = dx * sin + dy * cos;
    const bites = cutChord(raster, cx + dx, cy + dy, cx + nextX, cy + nextY, radius, z);
    bite = bites > bite ? bites : bite;
    dx = nextX;
    dy = nextY;
  }
  return bite;
}

/** Row by row: the band round a straight path crosses each in one stretch. */
function cutChord(
  raster: Raster,
  ax: number,
  ay: number,
  bx: number,
  by: number,
  radius: number,
  z: number,
): number {
  const { size, columns, rows, x0, y0, left, through } = raster;
  const lowest = (ay < by ? ay : by) - radius;
  const highest = (ay < by ? by : ay) + radius;
  const firstRow = Math.max(0, Math.ceil((lowest - y0) / size));
  const lastRow = Math.min(rows - 1, Math.floor((highest - y0) / size));
  let bite = 0;
  for (let row = firstRow; row <= lastRow; row++) {
    const y = y0 + row * size;
    acrossBand(ax, ay, bx, by, radius, y);
    const first = Math.max(0, Math.ceil((stretch.from - x0) / size));
    const last = Math.min(columns - 1, Math.floor((stretch.to - x0) / size));
    acrossBand(ax, ay, bx, by, radius / 2, y);
    const nearFrom = (stretch.from - x0) / size;
    const nearTo = (stretch.to - x0) / size;
    for (let column = first; column <= last; column++) {
      const at = row * columns + column;
      const height = left[at]!;
      if (height > z) {
        left[at] = z;
        raster.opened += z <= through && height > through ? 1 : 0;
        bite = column > nearFrom && column < nearTo && height - z > bite ? height - z : bite;
      }
    }
  }
  return bite;
}

/** Scratch answer of `acrossBand`; nothing where `from` is greater. */
const stretch = { from: 0, to: 0 };

/** From where to where the row at y lies within `radius` of the line from a to b: at its ends' discs or its two long sides. */
function acrossBand(ax: number, ay: number, bx: number, by: number, radius: number, y: number): void {
  stretch.from = Infinity;
  stretch.to = -Infinity;
  acrossDisc(ax, y - ay, radius);
  acrossDisc(bx, y - by, radius);
  const dx = bx - ax;
  const dy = by - ay;
  const length = Math.sqrt(dx * dx + dy * dy);
  if (length > 0 && dy !== 0) {
    const sideX = (-dy * radius) / length;
    const sideY = (dx * radius) / length;
    acrossSide(ax + sideX, dx, y - ay - sideY, dy);
    acrossSide(ax - sideX, dx, y - ay + sideY, dy);
  }
}

function acrossDisc(x: number, off: number, radius: number): void {
  const square = radius * radius - off * off;
  if (square > 0) {
    const half = Math.sqrt(square);
    stretch.from = x - half < stretch.from ? x - half : stretch.from;
    stretch.to = x + half > stretch.to ? x + half : stretch.to;
  }
}

/** Where a side from x on, dx by dy long, is `off` above its start. */
function acrossSide(x: number, dx: number, off: number, dy: number): void {
  const u = off / dy;
  if (u >= 0 && u <= 1) {
    const at = x + u * dx;
    stretch.from = at < stretch.from ? at : stretch.from;
    stretch.to = at > stretch.to ? at : stretch.to;
  }
}
