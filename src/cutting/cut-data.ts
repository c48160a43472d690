/**
 * Speed and feed for a cutter in a material, where the job leaves them out, each with the sentence that says where it
 * came from. n = 1000 vc / (pi D), vf = n z fz. 1/min, mm/min, mm, degrees.
 */
import { fixedDecimals } from '../base/fixed-decimals.ts';
import { EDGE_RADIUS, rubbingFeed } from './edge.ts';
import { thickestChip } from './engagement.ts';
import { chipLoad, type Material } from './materials.ts';
import type { Cutter } from './setup.ts';

export interface CutLimits {
  readonly feedLowest: number;
  readonly feedHighest: number;
  readonly spindleLowest: number;
  readonly spindleHighest: number;
}

export interface CutRequest {
  readonly material: Material;
  readonly cutter: Cutter;
  /** 'slot' for a full slot, or the radial depth of a wall in mm. */
  readonly radialDepth: 'slot' | number;
  readonly limits: CutLimits;
  /** What the job says; it goes before everything else. */
  readonly asked: {
    readonly speed?: number | undefined;
    readonly feed?: number | undefined;
    readonly plunge?: number | undefined;
  };
}

export interface CutData {
  readonly speed: number;
  readonly feed: number;
  readonly plunge: number;
  /** Steepest ramp, degrees. */
  readonly ramp: number;
  /** mm a tooth at `feed`. */
  readonly feedPerTooth: number;
  /** Feed below which the cutter would rub at this radial depth. */
  readonly floor: number;
  /** Lowest feed of the machine. */
  readonly lowest: number;
  readonly why: readonly string[];
}

/** Straight down at a quarter of the feed (from memory: 0.2 to 0.3 for centre-cutting cutters). */
const PLUNGE_SHARE = 0.25;
/** A thin wall makes a thin chip; the feed may be raised for it, at most so far (judgement). */
const MOST_THINNING = 1.5;

export function cutData(request: CutRequest): CutData {
  const { material, cutter, limits, asked } = request;
  const why: string[] = [];
  const speed = asked.speed ?? chooseSpeed(request, why);
  if (asked.speed !== undefined) {
    why.push(`spindle ${asked.speed} 1/min: the job says so`);
  }
  const share = request.radialDepth === 'slot' ? 1 : thickestChip(request.radialDepth, cutter.diameter);
  const feed = asked.feed ?? chooseFeed(request, speed, share, why);
  if (asked.feed !== undefined) {
    why.push(`feed ${asked.feed} mm/min: the job says so`);
  }
  const plunge = asked.plunge ?? Math.max(round(PLUNGE_SHARE * feed), Math.min(limits.feedLowest, feed));
  why.push(
    asked.plunge === undefined
      ? `ramp and plunge feed ${plunge} mm/min: a quarter of the feed`
      : `ramp and plunge feed ${plunge} mm/min: the job says so`,
  );
  return {
    speed,
    feed,
    plunge,
    ramp: material.ramp,
    feedPerTooth: feed / (speed * cutter.flutes),
    floor: rubbingFeed(share, cutter.flutes, speed),
    lowest: limits.feedLowest,
    why,
  };
}

function chooseSpeed({ material, cutter, limits }: CutRequest, why: string[]): number {
  const wanted = (1000 * material.cuttingSpeed) / (Math.PI * cutter.diameter);
  const speed = Math.round(Math.min(Math.max(wanted, limits.spindleLowest), limits.spindleHighest) / 10) * 10;
  const clamped = Math.min(Math.max(speed, limits.spindleLowest), limits.spindleHighest);
  why.push(
    wanted > limits.spindleHighest
      ? `spindle ${clamped} 1/min: the machine's highest (${material.words} would stand ${Math.round(wanted)})`
      : `spindle ${clamped} 1/min: ${material.cuttingSpeed} m/min in ${material.words}`,
  );
  return clamped;
}

function chooseFeed(
  { material, cutter, limits }: CutRequest,
  speed: number,
  share: number,
  why: string[],
): number {
  const load = chipLoad(material, cutter.diameter);
  const thinning = Math.min(1 / share, MOST_THINNING);
  const wanted = speed * cutter.flutes * load * thinning;
  const feed = round(Math.min(Math.max(wanted, limits.feedLowest), limits.feedHighest));
  const raised = thinning > 1 ? `, raised ${thinning.toFixed(2)} times since the wall's chip is thin` : '';
  const held = wanted > limits.feedHighest ? ', held to the highest feed of the machine' : '';
  why.push(
    `feed ${feed} mm/min: ${load.toFixed(4)} mm a tooth for a ${Number(fixedDecimals(cutter.diameter, 3))} mm cutter${raised}${held}`,
  );
  if ((feed / (speed * cutter.flutes)) * share < EDGE_RADIUS / 2) {
    why.push('the chip is thinner than half the edge radius: listen for rubbing, use a sharp cutter');
  }
  return feed;
}

/** Whole mm/min above ten, tenths below. */
function round(feed: number): number {
  return feed >= 10 ? Math.round(feed) : Math.round(feed * 10) / 10;
}
