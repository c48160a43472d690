/**
 * Feed of the cutter's centre on an inside arc, so that the edge keeps its feed and the chip does not grow.
 *
 * The edge at the wall moves R / (R - r) times as fast as the centre on a hole of radius R: Fc = F (R - r) / R. Inside a
 * curve the same stock engages more of the cutter; the chip is kept by F sin(straight) / sin(curved). The smaller of the
 * two holds, but never below the feed at which the cutter rubs. mm, mm/min.
 */
import { rubbingFeed } from './edge.ts';
import { radialDepthInside, thickestChip } from './engagement.ts';

export interface InsideArc {
  readonly feed: number;
  /** Radius of the centre's path. */
  readonly pathRadius: number;
  readonly cutterDiameter: number;
  /** Stock on the wall; the diameter in a full slot. */
  readonly radialDepth: number;
  readonly flutes: number;
  readonly speed: number;
}

export function insideArcFeed(arc: InsideArc): number {
  const r = arc.cutterDiameter / 2;
  const wall = arc.pathRadius + r;
  const byEdge = (arc.feed * arc.pathRadius) / wall;
  const straight = thickestChip(arc.radialDepth, arc.cutterDiameter);
  const curved = thickestChip(radialDepthInside(arc.radialDepth, wall, r), arc.cutterDiameter);
  const byChip = curved > 0 ? (arc.feed * straight) / curved : arc.feed;
  const floor = Math.min(rubbingFeed(curved, arc.flutes, arc.speed), arc.feed);
  return Math.max(Math.min(byEdge, byChip), floor);
}
