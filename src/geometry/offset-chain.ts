/**
 * Offsets of exact outlines: lines stay lines, arcs arcs, cycloids become their parallels, opening corners arcs of the
 * distance. Positive distances lie to the RIGHT of travel, outside a counter-clockwise outline. mm.
 *
 * A polygon that stands for the outline is clipped once; it says what remains of each exact piece. Exact pieces then take
 * the place of its chords, cut where they really meet; both must agree within CLIP_AGREEMENT or the answer is a failure.
 */
import { failure, success, type Outcome } from '../base/problem.ts';
import { CLIP_AGREEMENT, CLIP_SAG } from '../base/tolerances.ts';
import { disagreement } from './agree.ts';
import { areaOfChain } from './area-of-chain.ts';
import { linkLoops, mergeParts } from './link-offset.ts';
import { offsetPolygon, type Ring } from './offset-polygon.ts';
import { liesApart, linkPitch, pitchRays, withinRays } from './one-pitch.ts';
import { pointOn } from './on-piece.ts';
import type { Chain, LinePiece, Loop } from './piece.ts';
import { ORIGIN, unit, type Point } from './point.ts';
import { rawOffset, type OffsetPiece } from './raw-offset.ts';
import { distanceToRing } from './ring.ts';
import { sampleLoop } from './sample-piece.ts';
import { sectorGround } from './sector-ground.ts';
import { trimOffset } from './trim-offset.ts';
import { unfolded, withinPitch } from './unfold-pitch.ts';

export type { OffsetPiece } from './raw-offset.ts';

export interface OffsetSector {
  /** One pitch, counter-clockwise, from the ray at -pi/count; empty where nothing remains. */
  readonly chain: readonly OffsetPiece[];
  /** Whether the offset closes off hollows, which the cutter can't get into from outside. */
  readonly pockets: boolean;
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
      pockets: false,
    });
  }
  const ground = sectorGround(sector, count, distance);
  const clipped = offsetPolygon([ground.polygon], ground.growth, CLIP_SAG);
  if (!clipped.ok) {
    return clipped;
  }
  const rings = clipped.value;
  const { outline, kind, far } = ground;
  const raw = rawOffset(outline, distance, ground.neighbours);
  const knives = pitchRays(far + 2 * Math.abs(distance), count, kind);
  const all = trimOffset({ raw, outline, distance, knives, rings });
  const parts = kind === 'half' ? all.filter((part) => withinRays(part, knives)) : all;
  const way = linkPitch(parts, knives, count, kind, distance);
  if (way === undefined) {
    return parts.length > 0
      ? disagrees(distance, Infinity, parts[0]?.from ?? ORIGIN)
      : success({ chain: [], pockets: false });
  }
  const found = mergeParts(way, raw, false);
  const walls = parts.filter((part) => liesApart(part, way, knives, count));
  const nearest = nearestRing(rings, way[0]?.from ?? ORIGIN);
  // What stands on the far side of the outline, its rings run the other way along it.
  const main = ground.growth > 0 === distance > 0 ? nearest : nearest.toReversed();
  const { worst, at } = disagreement({
    corners: cornersBetween(main, knives, far + 1.5 * Math.abs(distance)),
    rings: [main],
    chains: [found.map(({ piece }) => piece), ...wallsOn(main, walls)],
  });
  if (worst > 0) {
    return disagrees(distance, worst, at);
  }
  const chain = kind === 'half' ? unfolded(found, sector.length) : withinPitch(found, sector.length);
  return success({ chain, pockets: walls.length > 0 });
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
  const clipped = offsetPolygon([sampleLoop(loop, CLIP_SAG)], turns * distance, CLIP_SAG);
  if (!clipped.ok) {
    return clipped;
  }
  const rings = clipped.value;
  const first = loop[0];
  const raw = rawOffset(loop, distance, first ? { after: { piece: first, index: 0 } } : {});
  const parts = trimOffset({ raw, outline: loop, distance, knives: [], rings });
  const { loops, broken } = linkLoops(parts);
  const exact = loops.map((way) => mergeParts(way, raw, true).map(({ piece }) => piece));
  const { worst, at } = disagreement({ corners: rings.flat(), rings, chains: exact });
  return worst > 0 || broken > 0 ? disagrees(distance, worst || Infinity, at) : success(exact);
}

function nearestRing(rings: readonly Ring[], point: Point): Ring {
  if (rings.length === 1) {
    return rings[0] as Ring;
  }
  const off = rings.map((ring) => distanceToRing(ring, point));
  return rings[off.indexOf(Math.min(...off))] as Ring;
}

/** Walls of hollows that the same ring runs along, where the polygon of a half leaves hollows open. */
function wallsOn(ring: Ring, walls: readonly OffsetPiece[]): Chain[] {
  return walls
    .filter(({ piece }) => distanceToRing(ring, pointOn(piece, 0.5)) <= CLIP_AGREEMENT)
    .map(({ piece }) => [piece]);
}

/** Between the rays and not on the polygon's far side; a little off the rays, so that nothing beyond them is asked for. */
function cornersBetween(ring: Ring, knives: readonly LinePiece[], far: number): Point[] {
  const [first, last] = knives.map(({ to }) => unit(to)) as [Point, Point];
  const off = 2 * CLIP_AGREEMENT;
  return ring.filter((point) => {
    const { x, y } = point;
    const between = first.x * y - first.y * x > off && last.x * y - last.y * x < -off;
    return between && x * x + y * y < far * far;
  });
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
