/**
 * The metal as squares seen from above, each with the height that is left: coarse, and only for what a line drawing can't tell, how
 * deep a cut bites into solid metal and which pieces have come loose. A square counts as cut when its middle is.
 */
import type { Setup } from '../cutting/setup.ts';
import { pathDistance } from './metal-distance.ts';
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

/**
 * Takes away what path i cuts down to height z, and returns how deep it bit at most near its own axis, where the cutter is
 * in metal on both sides.
 */
export function cutRaster(raster: Raster, paths: PathSet, i: number, z: number): number {
  const { size, columns, rows, x0, y0, left, through } = raster;
  const radius = paths.radius[i]!;
  const reach = paths.bound[i]! + radius;
  const [mx, my] = [paths.mx[i]!, paths.my[i]!];
  const firstColumn = Math.max(0, Math.ceil((mx - reach - x0) / size));
  const lastColumn = Math.min(columns - 1, Math.floor((mx + reach - x0) / size));
  const firstRow = Math.max(0, Math.ceil((my - reach - y0) / size));
  const lastRow = Math.min(rows - 1, Math.floor((my + reach - y0) / size));
  let bite = 0;
  for (let row = firstRow; row <= lastRow; row++) {
    for (let column = firstColumn; column <= lastColumn; column++) {
      const at = row * columns + column;
      const height = left[at]!;
      if (height <= z) {
        continue;
      }
      const away = pathDistance(paths, i, x0 + column * size, y0 + row * size);
      if (away < radius) {
        left[at] = z;
        raster.opened += z <= through && height > through ? 1 : 0;
        bite = away < radius / 2 ? Math.max(bite, height - z) : bite;
      }
    }
  }
  return bite;
}
