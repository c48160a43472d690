/**
 * The deviation along the worst tooth, from the middle of the root to the tip: of its two sides the worse one. Signed,
 * metal left positive; below the foot, where no cutter follows, the distance to the nearest place that was cut.
 */
import type { Readings } from './deviation-measure.ts';
import { REGION, type Stations } from './deviation-stations.ts';
import type { DeviationPoint } from './proof.ts';

export interface WorstTooth {
  /** From 0. */
  readonly copy: number;
  /** Greatest deviation from the exact flank at a station, either way, mm. */
  readonly most: number;
  /** The station it is at. */
  readonly at: number;
  readonly readings: Readings;
}

/** Metal cut away shows at the upper height, metal left at the lower. */
function signed({ low, high }: Readings, i: number): number {
  return high[i]! < 0 ? high[i]! : low[i]!;
}

/** The worse of what is known and this tooth. */
export function worseTooth(
  known: WorstTooth | undefined,
  copy: number,
  { region, count }: Stations,
  readings: Readings,
): WorstTooth {
  const { low, high, path } = readings;
  let most = -1;
  let at = 0;
  for (let i = 0; i < count; i++) {
    if (region[i] !== REGION.flank) {
      continue;
    }
    const size = high[i]! < 0 ? -high[i]! : Math.abs(low[i]!);
    if (size > most) {
      most = size;
      at = i;
    }
  }
  if (known !== undefined && most <= known.most) {
    return known;
  }
  // The readings are used again for the next tooth.
  return { copy, most, at, readings: { low: low.slice(), high: high.slice(), path: path.slice() } };
}

export function pointsAlong(stations: Stations, { readings, at }: WorstTooth): DeviationPoint[] {
  return sidePoints(stations, readings, at);
}

/** Up to the land, or down from it, by the side on which `at` lies. */
function sidePoints(stations: Stations, readings: Readings, at: number): DeviationPoint[] {
  const outline: number[] = [];
  for (let i = 0; i < stations.count && stations.region[i] !== REGION.root; i++) {
    outline.push(i);
  }
  const land = stations.region.indexOf(REGION.land);
  const tip = land < 0 ? outline.length / 2 : land;
  const side =
    at < tip
      ? outline.filter((i) => i < tip)
      : outline.filter((i) => i >= tip && stations.region[i] !== REGION.land).toReversed();
  const start = stations.along[side[0] ?? 0] ?? 0;
  return side.map((i) => ({
    along: Math.abs(stations.along[i]! - start),
    radius: Math.hypot(stations.x[i]!, stations.y[i]!),
    deviation: signed(readings, i),
  }));
}
