/**
 * One side of a tooth without its root fillet: what the outline, the resting cutter and the sizes are all taken from.
 *
 * Frame: the middle of a tooth space on +X, the tooth that follows counter-clockwise centred at pi/N. The side runs
 * outward: root circle, radial flank at `spaceAngle`, addendum, land to the tooth's centre line. mm, radians.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { endOf } from '../geometry/on-piece.ts';
import type { ArcPiece, CycloidPiece } from '../geometry/piece.ts';
import { angleOf, distance, norm, polar, subtract } from '../geometry/point.ts';
import { obliquityAtRadius, pointedHeight, pointedObliquity, type Rolling } from './addendum.ts';
import { checkProportions } from './check-proportions.ts';
import { mm, toothProblem } from './tooth-problem.ts';
import type { WheelProportions } from './wheel.ts';

export interface ToothSide {
  readonly teeth: number;
  readonly pitchRadius: number;
  readonly rootRadius: number;
  readonly outsideRadius: number;
  readonly generatingRadius: number;
  readonly pointedAddendum: number;
  /** Half the angle of the space below the pitch circle: the polar angle of the flank. */
  readonly spaceAngle: number;
  /** From the pitch circle to the tip corner. */
  readonly addendum: CycloidPiece | ArcPiece;
  /** Half the angle of the tip land; 0 where the tooth is pointed. */
  readonly landAngle: number;
}

export function toothSide(p: WheelProportions): Outcome<ToothSide> {
  const problems = checkProportions(p);
  if (p.mate.kind !== 'pinion' || problems.length > 0) {
    return failure(problems);
  }
  const pitchRadius = (p.module * p.teeth) / 2;
  const generatingRadius = (p.module * p.mate.leaves) / 4;
  const rolling: Rolling = { fixed: pitchRadius, rolling: generatingRadius };
  const pointedAddendum = pointedHeight(rolling, (p.tooth * Math.PI) / p.teeth);
  const spaceAngle = ((1 - p.tooth) * Math.PI) / p.teeth;
  const frame = {
    teeth: p.teeth,
    pitchRadius,
    rootRadius: pitchRadius - p.dedendum * p.module,
    outsideRadius: pitchRadius + p.height * pointedAddendum,
    generatingRadius,
    pointedAddendum,
    spaceAngle,
  };
  if (p.addendumForm === 'arc') {
    const arc = addendumArc(frame, Math.PI / p.teeth);
    return arc.ok ? success({ ...frame, addendum: arc.value, landAngle: 0 }) : arc;
  }
  return success({ ...frame, ...rolledAddendum(frame, rolling, p) });
}

function rolledAddendum(
  { spaceAngle, outsideRadius }: Pick<ToothSide, 'spaceAngle' | 'outsideRadius'>,
  rolling: Rolling,
  p: WheelProportions,
): Pick<ToothSide, 'addendum' | 'landAngle' | 'outsideRadius'> {
  const halfAngle = (p.tooth * Math.PI) / p.teeth;
  const upTo = (obliquity: number): CycloidPiece => ({
    kind: 'cycloid',
    ...rolling,
    cusp: spaceAngle,
    sense: 1,
    offset: 0,
    from: 0,
    to: (2 * rolling.rolling * obliquity) / rolling.fixed,
  });
  const kept = upTo(obliquityAtRadius(rolling, outsideRadius));
  const landAngle = Math.PI / p.teeth - angleOf(endOf(kept));
  if (p.height < 1 && 2 * landAngle * outsideRadius > SAME_POINT) {
    return { addendum: kept, landAngle, outsideRadius };
  }
  const pointed = upTo(pointedObliquity(rolling, halfAngle));
  return { addendum: pointed, landAngle: 0, outsideRadius: norm(endOf(pointed)) };
}

/** Radius of the single-arc addendum over its height: remembered from BS 978-2, which was not at hand. */
export const ARC_SHARE = 1.4;

/** One arc through the pitch point and the point of the tooth's centre line at the outside radius. */
function addendumArc(
  side: Pick<ToothSide, 'pitchRadius' | 'outsideRadius' | 'spaceAngle'>,
  toothCentre: number,
): Outcome<ArcPiece> {
  const pitchPoint = polar(side.pitchRadius, side.spaceAngle);
  const tip = polar(side.outsideRadius, toothCentre);
  const radius = ARC_SHARE * (side.outsideRadius - side.pitchRadius);
  const chord = distance(pitchPoint, tip);
  if (chord > 2 * radius) {
    return failure([arcTooShort(chord, radius)]);
  }
  const turn = 2 * Math.asin(chord / (2 * radius));
  // The first heading lies half the turn to the right of the chord; the centre is a quarter turn to its left.
  const start = angleOf(subtract(tip, pitchPoint)) - turn / 2 - Math.PI / 2;
  const spoke = polar(radius, start);
  return success({ kind: 'arc', centre: subtract(pitchPoint, spoke), radius, start, turn });
}

function arcTooShort(chord: number, radius: number): Problem {
  return toothProblem({
    code: 'tooth.no-form',
    key: ['addendum'],
    message: `an arc of radius ${mm(radius)} cannot span the ${mm(chord)} from the pitch point to the tip`,
    hint: 'Keep more of the height, make the tooth thinner, or use addendum: epicycloid.',
  });
}
