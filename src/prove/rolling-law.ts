/**
 * The rolling law, held against the cut metal: at every point of the addendum the normal must pass through the point where
 * the two circles touch. The cut flank's normal is that of the sweep: from the flank to the nearest point of the cutter's axis.
 *
 * The angle that a path within the form error may still show follows from facets: a chord with sag e on a path of radius
 * rho ends at an angle sqrt(2 e / rho) to it; arcs that fit better show less. Twice that is allowed.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import { contactPoint, cycloidNormal, cycloidRadius } from '../geometry/cycloid.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Field, Readings } from './deviation-measure.ts';
import type { Stations } from './deviation-stations.ts';
import { nearestOnPath } from './metal-distance.ts';

/** Directions from the contact point to each rolled station, and the angle allowed there; NaN elsewhere. */
export interface RollingLaw {
  readonly dx: Float64Array;
  readonly dy: Float64Array;
  readonly allowed: Float64Array;
}

export interface RollingReading {
  /** Largest angle, radians. */
  readonly angle: number;
  /** Largest share of what is allowed, and the angle, limit, place and move there. */
  readonly share: number;
  readonly shareAngle: number;
  readonly shareAllowed: number;
  readonly copy: number;
  readonly x: number;
  readonly y: number;
  readonly move: TracedMove | undefined;
}

export const NO_ROLLING: RollingReading = {
  angle: 0,
  share: 0,
  shareAngle: 0,
  shareAllowed: 0,
  copy: 0,
  x: 0,
  y: 0,
  move: undefined,
};

export function rollingLaw(stations: Stations, cutterRadius: number, formError: number): RollingLaw {
  const field = (): Float64Array => new Float64Array(stations.count).fill(Number.NaN);
  const law = { dx: field(), dy: field(), allowed: field() };
  for (let i = 0; i < stations.count; i++) {
    const { piece, rolled } = stations.pieces[stations.piece[i]!]!;
    // At the tip corner the cutter rolls through every direction: only inside the span is there one normal.
    if (!rolled || piece.kind !== 'cycloid' || stations.u[i] === 0 || stations.u[i] === 1) {
      continue;
    }
    const t = piece.from + stations.u[i]! * (piece.to - piece.from);
    const touch = contactPoint(piece, t);
    const [dx, dy] = [stations.x[i]! - touch.x, stations.y[i]! - touch.y];
    const length = Math.hypot(dx, dy);
    // On the pitch circle itself the two points fall together and the direction is the limit of the law.
    const along = length > FORM_ERROR ? { x: dx / length, y: dy / length } : cycloidNormal(piece, t);
    law.dx[i] = along.x;
    law.dy[i] = along.y;
    law.allowed[i] = 2 * Math.sqrt((2 * formError) / (Math.abs(cycloidRadius(piece, t)) + cutterRadius));
  }
  return law;
}

/** The worse of what is known and this copy. */
export function readRollingLaw(
  law: RollingLaw,
  known: RollingReading,
  copy: number,
  field: Field,
  stations: Stations,
  readings: Readings,
): RollingReading {
  let worst = known;
  const { cos, sin, set } = field;
  const { dx, dy, allowed } = law;
  for (let i = 0; i < stations.count; i++) {
    // Not a number where the law does not hold.
    if (!(allowed[i]! > 0)) {
      continue;
    }
    const path = readings.path[i]!;
    if (path < 0 || readings.low[i]! >= field.farthest) {
      continue;
    }
    const out = readings.low[i]!;
    const sx = stations.x[i]! + out * stations.nx[i]!;
    const sy = stations.y[i]! + out * stations.ny[i]!;
    const x = sx * cos - sy * sin;
    const y = sx * sin + sy * cos;
    const axis = nearestOnPath(set, path, x, y);
    const ax = axis.x - x;
    const ay = axis.y - y;
    const lx = dx[i]! * cos - dy[i]! * sin;
    const ly = dx[i]! * sin + dy[i]! * cos;
    const across = Math.abs(lx * ay - ly * ax);
    const along = lx * ax + ly * ay;
    // An angle is no larger than its tangent: few need the angle itself.
    if (across <= along * Math.min(worst.angle, worst.share * allowed[i]!)) {
      continue;
    }
    const angle = Math.atan2(across, along);
    const share = angle / allowed[i]!;
    if (angle > worst.angle || share > worst.share) {
      worst = {
        ...(share > worst.share
          ? {
              share,
              shareAngle: angle,
              shareAllowed: allowed[i]!,
              copy,
              x,
              y,
              move: set.moves[path],
            }
          : worst),
        angle: Math.max(angle, worst.angle),
      };
    }
  }
  return worst;
}
