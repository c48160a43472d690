/**
 * Offsets of exact outlines: lines stay lines, arcs arcs, cycloids become their parallels, opening corners arcs of the
 * distance. Positive distances lie to the RIGHT of travel, outside a counter-clockwise outline. mm.
 *
 * A polygon that stands for the outline is clipped once; it says what remains of each exact piece. Exact pieces then take
 * the place of its chords, cut where they really meet; both must agree within CLIP_AGREEMENT or the answer is a failure.
 */
import { failure, success, type Outcome } from '../base/problem.ts';
import { CHORD_SAG, CLIP_AGREEMENT, SAME_POINT } from '../base/tolerances.ts';
import { disagreement } from './agree.ts';
import { areaOfChain } from './area-of-chain.ts';
import { linkLoops, linkUntil, mergeParts } from './link-offset.ts';
import { offsetPolygon, type Ring } from './offset-polygon.ts';
import type { Chain, LinePiece, Loop } from './piece.ts';
import { ORIGIN, polar, turnPoint, type Point } from './point.ts';
import { rawOffset, type OffsetPiece } from './raw-offset.ts';
import { distanceToRing } from './ring.ts';
import { sampleLoop } from './sample-piece.ts';
import { sectorGround, type SectorGround } from './sector-ground.ts';
import { trimOffset, type Remaining } from './trim-offset.ts';

export type { OffsetPiece } from './raw-offset.ts';

export interface OffsetSector {
  /** One pitch, counter-clockwise, from the ray at -pi/count; empty where nothing remains. */
  readonly chain: readonly OffsetPiece[];
  /** Hollows that the cutter can't get into from outside, closed off by the offset: how many touch this pitch. */
  readonly pockets: number;
}

/**
 * The offset of an outline that repeats `count` times round the origin, given as one pitch that runs counter-clockwise
 * from the ray at -pi/count to the ray at +pi/count; cut at the same rays. Of several crossings of the ray (hollows) the
 * outermost counts, or the innermost where the distance is negative.
 */
export function offsetSector(sector: Chain, count: number, distance: number): Outcome<OffsetSector> {
  if (distance === 0) {
    return success({
      chain: sector.map((piece, source) => ({ piece, source, part: [0, 1] as const })),
      pockets: 0,
    });
  }
  const ground = sectorGround(sector, count, distance);
  const clipped = offsetPolygon([ground.polygon], ground.growth, CHORD_SAG);
  if (!clipped.ok) {
    return clipped;
  }
  const rings = clipped.value;
  const raw = rawOffset(ground.outline, distance, ground.closed);
  const knives = raysOf(ground, count, distance);
  const parts = trimOffset({ raw, outline: ground.outline, distance, knives, rings });
  const way = onePitch(parts, knives, count, distance);
  if (way === undefined) {
    return parts.some((part) => touches(part.from, knives[0] as LinePiece))
      ? disagrees(distance, Infinity, ORIGIN)
      : success({ chain: [], pockets: 0 });
  }
  const chain = mergeParts(way, raw, false).map((piece) => named(piece, ground));
  const main = nearestRing(rings, (way[0] as Remaining).from);
  const { worst, at } = disagreement({
    corners: main.filter((corner) => within(corner, count, ground.far + 1.5 * Math.abs(distance))),
    rings: [main],
    chains: [chain.map(({ piece }) => piece)],
  });
  const pockets = rings.length - 1;
  return worst > 0 ? disagrees(distance, worst, at) : success({ chain, pockets });
}

/**
 * The offset of a closed loop, either side: none where nothing remains, several where it falls apart. Each loop travels
 * as the given one does, but for hollows that the offset closes off, which turn the other way.
 */
export function offsetLoop(loop: Loop, distance: number): Outcome<readonly Loop[]> {
  if (distance === 0) {
    return success([loop]);
  }
  const turns = areaOfChain(loop) > 0 ? 1 : -1;
  const clipped = offsetPolygon([sampleLoop(loop, CHORD_SAG)], turns * distance, CHORD_SAG);
  if (!clipped.ok) {
    return clipped;
  }
  const rings = clipped.value;
  const raw = rawOffset(loop, distance, true);
  const parts = trimOffset({ raw, outline: loop, distance, knives: [], rings });
  const { loops, broken } = linkLoops(parts);
  const exact = loops.map((way) => mergeParts(way, raw, true).map(({ piece }) => piece));
  const { worst, at } = disagreement({ corners: rings.flat(), rings, chains: exact });
  return worst > 0 || broken > 0 ? disagrees(distance, worst, at) : success(exact);
}

/** The two rays between which one pitch lies, long enough to cross everything. */
function raysOf({ far }: SectorGround, count: number, distance: number): LinePiece[] {
  const reach = far + 2 * Math.abs(distance);
  return [-1, 1].map((side) => ({ kind: 'line', from: ORIGIN, to: polar(reach, (side * Math.PI) / count) }));
}

/** From the outermost crossing of the first ray to its image on the second. */
function onePitch(
  parts: readonly Remaining[],
  knives: readonly LinePiece[],
  count: number,
  distance: number,
): Remaining[] | undefined {
  const ray = knives[0] as LinePiece;
  const starts = parts
    .filter((part) => touches(part.from, ray))
    .toSorted(
      (a, b) => Math.sign(distance) * (Math.hypot(b.from.x, b.from.y) - Math.hypot(a.from.x, a.from.y)),
    );
  for (const first of starts) {
    const way = linkUntil(parts, first, turnPoint(first.from, (2 * Math.PI) / count));
    if (way !== undefined) {
      return way;
    }
  }
  return undefined;
}

function touches(point: Point, ray: LinePiece): boolean {
  const length = Math.hypot(ray.to.x, ray.to.y);
  const across = (ray.to.x * point.y - ray.to.y * point.x) / length;
  return Math.abs(across) <= 2 * SAME_POINT && ray.to.x * point.x + ray.to.y * point.y > 0;
}

function nearestRing(rings: readonly Ring[], point: Point): Ring {
  const off = rings.map((ring) => distanceToRing(ring, point));
  return rings[off.indexOf(Math.min(...off))] as Ring;
}

/** Inside one pitch and not on the polygon's far side; a little off the rays, so that no neighbour's piece is asked for. */
function within(point: Point, count: number, far: number): boolean {
  if (Math.hypot(point.x, point.y) > far) {
    return false;
  }
  const edge = polar(1, Math.PI / count);
  const inward = edge.y * point.x - edge.x * Math.abs(point.y);
  return inward > 2 * CLIP_AGREEMENT || (count === 1 && point.x !== 0);
}

function named(piece: OffsetPiece, { indexes }: SectorGround): OffsetPiece {
  const { source, between } = piece;
  const index = (at: number): number => indexes[at] as number;
  if (source !== 'corner') {
    return { ...piece, source: index(source) };
  }
  return between === undefined ? piece : { ...piece, between: [index(between[0]), index(between[1])] };
}

function disagrees(distance: number, worst: number, at: Point): Outcome<never> {
  const off = Number.isFinite(worst) ? `are ${(worst * 1000).toFixed(2)} um apart` : 'do not close';
  return failure([
    {
      code: 'reach.disagrees',
      severity: 'error',
      message:
        `The clipped polygon and the exact offset at ${Math.abs(distance).toFixed(4)} mm ${off}; ` +
        `${(CLIP_AGREEMENT * 1000).toFixed(2)} um is allowed.`,
      at: { kind: 'part', x: at.x, y: at.y },
    },
  ]);
}
