/**
 * The flank's figures over every height of the wheel.
 *
 * Gouge grows with height and metal left shrinks (see `metal-paths.ts`), so the wheel's top edge gives the worst gouge and its
 * bottom edge the worst metal left; both are always measured. Where the two edges agree within the proof's
 * resolution, so does everything between. Where they do not, the levels at which the cutter ran are measured too.
 */
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import { measureContour, type ContourFigures } from './deviation-contour.ts';
import type { Field, Readings } from './deviation-measure.ts';
import { pointsAlong, worseTooth, type WorstTooth } from './deviation-plot.ts';
import { REGION } from './deviation-stations.ts';
import { rootFactor, toothRing, toothStations } from './deviation-tooth.ts';
import { pathsBelow, type PathSet } from './metal-paths.ts';
import type { SolidMoves } from './metal-solids.ts';
import type { DepthFigures, DeviationPoint } from './proof.ts';
import { NO_ROLLING, readRollingLaw, rollingLaw, type RollingReading } from './rolling-law.ts';

export interface Heights {
  /** Of the wheel. */
  readonly top: number;
  readonly bottom: number;
  /** What rounding may do to a Z: heights closer than this are one. */
  readonly slack: number;
}

export interface ToothFigures {
  /** With every move that goes below the wheel's top. */
  readonly atTop: ContourFigures;
  /** With those that go to its bottom. */
  readonly atBottom: ContourFigures;
  readonly byDepth: readonly DepthFigures[];
  readonly rolling: RollingReading;
  /** Which copy, from 0, and the deviation along its worse flank. */
  readonly worst: { readonly copy: number; readonly points: readonly DeviationPoint[] } | undefined;
  /** How much further a cutter stands off in the root corner when it stands off its two sides by one. */
  readonly rootFactor: number;
}

const LEVELS = 4;

export function toothFigures(
  solids: SolidMoves,
  /** Their paths below the wheel's top and bottom. */
  set: PathSet,
  form: WheelForm,
  cutterDiameter: number,
  heights: Heights,
  formError: number,
): ToothFigures {
  const stations = toothStations(form, cutterDiameter);
  const ring = toothRing(form);
  const farthest = (Math.PI * form.pitchRadius) / form.proportions.teeth;
  const law = rollingLaw(stations, cutterDiameter / 2, formError);
  let rolling = NO_ROLLING;
  let worst: WorstTooth | undefined;
  const readCopy = (copy: number, field: Field, readings: Readings): void => {
    rolling = readRollingLaw(law, rolling, copy, field, stations, readings);
    worst = worseTooth(worst, copy, stations, readings);
  };
  const bottom = heights.bottom + heights.slack;
  const top = heights.top - heights.slack;
  const edges = measureContour(set, stations, ring, farthest, readCopy);
  const at = (z: number): ContourFigures =>
    measureContour(pathsBelow(solids, z, z), stations, ring, farthest).low;
  const low = depthFigures(heights.bottom, edges.low);
  const high = depthFigures(heights.top, edges.high);
  const between = agree(low, high)
    ? [{ ...low, z: (heights.top + heights.bottom) / 2 }]
    : levelsBetween(solids, bottom, top).map((z) => depthFigures(z, at(z)));
  return {
    atTop: edges.high,
    atBottom: edges.low,
    byDepth: [low, ...between, high],
    rolling,
    worst: worst && { copy: worst.copy, points: pointsAlong(stations, worst) },
    rootFactor: rootFactor(form, cutterDiameter),
  };
}

function depthFigures(z: number, figures: ContourFigures): DepthFigures {
  return {
    z,
    flankGouge: figures.gouge.value,
    flankLeft: figures.left[REGION.flank]!.value,
    leftAtRoot: figures.left[REGION.root]!.value,
  };
}

function agree(a: DepthFigures, b: DepthFigures): boolean {
  return (
    Math.abs(a.flankGouge - b.flankGouge) <= PROOF_RESOLUTION &&
    Math.abs(a.flankLeft - b.flankLeft) <= PROOF_RESOLUTION &&
    Math.abs(a.leftAtRoot - b.leftAtRoot) <= PROOF_RESOLUTION
  );
}

/** A few of the heights at which the cutter ran level, spread over the wheel. */
function levelsBetween({ count, z0, z1 }: SolidMoves, bottom: number, top: number): number[] {
  const levels = new Set<number>();
  for (let i = 0; i < count; i++) {
    const z = z1[i]!;
    if (z0[i] === z && z > bottom && z < top) {
      levels.add(z);
    }
  }
  const sorted = [...levels].toSorted((a, b) => a - b);
  const every = Math.max(1, Math.ceil(sorted.length / LEVELS));
  return sorted.filter((_, k) => k % every === 0);
}
