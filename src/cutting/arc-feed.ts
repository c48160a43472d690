/**
 * Feed of the cutter's centre on an inside arc, so that the edge keeps its feed and the chip does not grow.
 *
 * The edge at the wall moves R / (R - r) times as fast as the centre on a hole of radius R: Fc = F (R - r) / R. Inside a
 * curve the same stock engages more of the cutter; the chip is kept by F sin(straight) / sin(curved). The smaller of the
 * two holds, but never below the feed at which the cutter rubs, nor below the lowest the machine runs. mm, mm/min.
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
  /** Lowest feed of the machine. */
  readonly lowest: number;
}

export function insideArcFeed(arc: InsideArc): number {
  const { wanted, floor } = wantedAndFloor(arc);
  return Math.max(wanted, floor);
}

/** One step of feed. Judgement: neither a machine nor an ear tells two feeds apart that lie closer. */
const STEP = 1.02;

/** The same in steps of the straight feed, rounded down: a program's arcs share few feeds, none above what was reckoned. */
export function steppedArcFeed(arc: InsideArc): number {
  const { wanted, floor } = wantedAndFloor(arc);
  const steps = Math.ceil(Math.log(arc.feed / wanted) / Math.log(STEP));
  return Math.max(wanted >= arc.feed ? arc.feed : arc.feed / STEP ** steps, floor);
}

function wantedAndFloor(arc: InsideArc): { readonly wanted: number; readonly floor: number } {
  const r = arc.cutterDiameter / 2;
  const wall = arc.pathRadius + r;
  const byEdge = (arc.feed * arc.pathRadius) / wall;
  const straight = thickestChip(arc.radialDepth, arc.cutterDiameter);
  const curved = thickestChip(radialDepthInside(arc.radialDepth, wall, r), arc.cutterDiameter);
  const byChip = curved > 0 ? (arc.feed * straight) / curved : arc.feed;
  const floor = Math.min(Math.max(rubbingFeed(curved, arc.flutes, arc.speed), arc.lowest), arc.feed);
  return { wanted: Math.min(byEdge, byChip), floor };
}
