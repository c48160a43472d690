/**
 * The places of an exact outline at which the cut metal is held against it: points with outward normals, spread so that the
 * cutter's axis passes them evenly (a corner or a cusp, where the outline is short but the path is not, gets its share).
 *
 * In : a chain with the material on its left, and what each piece is. Out: typed arrays; mm, the frame of the chain.
 * Both ends of every piece are stations, each with its own piece's normal, so corners are held from both sides.
 */
import { headingOn, lengthOf, pointOn } from '../geometry/on-piece.ts';
import type { Piece } from '../geometry/piece.ts';

/**
 * root: what the cutter makes below the flank's foot; flank: foot to tip; land: the tip's; wall: bore or crossing; bare: the
 * exact outline below the foot, which no cutter may enter and none can follow into its corners.
 */
export const REGION = { root: 0, flank: 1, land: 2, wall: 3, bare: 4 } as const;
export const REGIONS = 5;

export interface StationPiece {
  readonly piece: Piece;
  readonly region: number;
  /** Held against the rolling law. */
  readonly rolled: boolean;
  /** Where the piece is not the exact outline: how far a place is from that. */
  readonly beyond?: (x: number, y: number) => number;
}

export interface Stations {
  readonly pieces: readonly StationPiece[];
  readonly count: number;
  readonly x: Float64Array;
  readonly y: Float64Array;
  /** Outward unit normal. */
  readonly nx: Float64Array;
  readonly ny: Float64Array;
  readonly u: Float64Array;
  readonly piece: Int32Array;
  readonly region: Uint8Array;
  /** Length along the chain from its start. */
  readonly along: Float64Array;
  /** How far the station itself is from the exact outline: 0 unless its piece stands for what a cutter leaves. */
  readonly beyond: Float64Array;
}

/** mm of cutter path from one station to the next along a cycloid: several to each arc or facet of a fitted path. */
const SPACING = 0.025;
/** Lines and arcs are cut by lines and arcs; only where a machine has no arcs are there facets, and those are longer. */
const PLAIN_SPACING = 0.06;
const FEWEST = 5;
const MOST = 400;

export function placeStations(pieces: readonly StationPiece[], cutterRadius: number): Stations {
  const counts = pieces.map((entry) => stationCount(entry, cutterRadius));
  const count = counts.reduce((sum, n) => sum + n, 0);
  const field = (): Float64Array => new Float64Array(count);
  const stations = {
    x: field(),
    y: field(),
    nx: field(),
    ny: field(),
    u: field(),
    along: field(),
    beyond: field(),
  };
  const piece = new Int32Array(count);
  const region = new Uint8Array(count);
  let at = 0;
  let start = 0;
  pieces.forEach((entry, p) => {
    const n = counts[p]!;
    const length = lengthOf(entry.piece);
    for (let k = 0; k < n; k++, at++) {
      const u = k / (n - 1);
      const place = stationAt(entry.piece, u);
      stations.x[at] = place.x;
      stations.y[at] = place.y;
      stations.nx[at] = place.nx;
      stations.ny[at] = place.ny;
      stations.u[at] = u;
      stations.along[at] = start + u * length;
      stations.beyond[at] = entry.beyond?.(place.x, place.y) ?? 0;
      piece[at] = p;
      region[at] = entry.region;
    }
    start += length;
  });
  return { pieces, count, ...stations, piece, region };
}

/** Point and outward normal (right of travel) at u of a piece. */
export function stationAt(piece: Piece, u: number): { x: number; y: number; nx: number; ny: number } {
  const point = pointOn(piece, u);
  const heading = headingOn(piece, u);
  return { x: point.x, y: point.y, nx: heading.y, ny: -heading.x };
}

function stationCount({ piece }: StationPiece, cutterRadius: number): number {
  const spacing = piece.kind === 'cycloid' ? SPACING : PLAIN_SPACING;
  const path = lengthOf(piece) + cutterRadius * turningOf(piece);
  return Math.min(MOST, Math.max(FEWEST, Math.ceil(path / spacing) + 1));
}

/** How far the heading turns along a piece, radians. */
function turningOf(piece: Piece): number {
  switch (piece.kind) {
    case 'line':
      return 0;
    case 'arc':
      return Math.abs(piece.turn);
    case 'cycloid':
      return Math.abs((1 + piece.fixed / (2 * piece.rolling)) * (piece.to - piece.from));
  }
}
