/**
 * What a round cutter can make of an outline: the exact outline opened by a disc, in closed form. The cutter's own arc takes
 * the place of what it cannot reach at the root (and in the hollow a single-arc addendum may have at the pitch point).
 *
 * In  : a form, and the diameter the cutter really cuts, mm.
 * Out : the outline of one pitch, laid out as `WheelForm.sector`, where its foot lies and what is left.
 * Where the cutter does not get to the root it is wedged between two sides, on the flanks or on the addenda; where it hangs on
 * the tip corners there is no outline.
 */
import { failure, success, type Outcome } from '../base/problem.ts';
import { areaOfChain } from '../geometry/area-of-chain.ts';
import { norm, turnPoint, type Point } from '../geometry/point.ts';
import { largestCutter } from './largest-cutter.ts';
import { leftInCorner } from './left-in-corner.ts';
import { restingDisc } from './resting-disc.ts';
import { mm, toothProblem } from './tooth-problem.ts';
import { toothSector } from './tooth-sector.ts';
import { toothSide, type ToothSide } from './tooth-side.ts';
import type { WheelForm, WheelPiece } from './wheel.ts';
import { floorRadius, rootCorner } from './wheel-form.ts';

export interface AsCut {
  readonly diameter: number;
  readonly sector: readonly WheelPiece[];
  /** Whether the cutter touches the exact outline's floor. */
  readonly reachesRoot: boolean;
  /** Lowest point of the space, from the wheel's axis. */
  readonly floorRadius: number;
  /** Where the arc at the root meets the flank (or the addendum), from the wheel's axis. The root corner itself where sharp. */
  readonly footRadius: number;
  /** Thickest metal left at the root beyond the exact outline: the greatest distance from it, and where (before tooth 1). */
  readonly leftAtRoot: number;
  readonly leftAt: Point;
  /** Metal left in one space, mm^2. */
  readonly areaLeft: number;
  /** Diameter of the largest cutter that gets to the root circle between two teeth. */
  readonly largestCutter: number;
}

export function asCut(form: WheelForm, diameter: number): Outcome<AsCut> {
  const made = toothSide(form.proportions);
  if (!made.ok) {
    return made;
  }
  const side = made.value;
  const corner = rootCorner(side, form.proportions.rootFillet);
  if (!corner.ok) {
    return corner;
  }
  const fillet = corner.value;
  const radius = diameter / 2;
  const cutter = restingDisc(side, radius);
  if (!cutter || !(radius > 0)) {
    return failure([hangs(side, diameter)]);
  }
  // A cutter no larger than the fillet rolls round it and leaves nothing; what stops it is the fillet itself.
  const stop = fillet && fillet.radius >= radius ? fillet : cutter;
  const sector = toothSector(side, { root: stop, rolling: radius });
  const left = stop === fillet ? undefined : leftInCorner(side, cutter, fillet);
  return success({
    diameter,
    sector,
    reachesRoot: stop === fillet || (cutter.onRoot && floorRadius(side, fillet) === side.rootRadius),
    floorRadius: floorRadius(side, stop),
    footRadius: norm(stop.foot.point),
    leftAtRoot: left?.thickness ?? 0,
    leftAt: turnPoint(left?.at ?? stop.foot.point, -Math.PI / side.teeth),
    areaLeft: Math.max(0, areaOf(sector) - areaOf(form.sector)),
    largestCutter: 2 * largestCutter(side),
  });
}

function areaOf(sector: readonly WheelPiece[]): number {
  return areaOfChain(sector.map(({ piece }) => piece));
}

function hangs(side: ToothSide, diameter: number) {
  const tip = side.outsideRadius * Math.sin(Math.PI / side.teeth - side.landAngle);
  return toothProblem({
    code: 'reach.space',
    key: [],
    message: `a cutter of ${mm(diameter)} does not enter the tooth spaces: their mouths are ${mm(2 * tip)} wide`,
    hint: `Use a smaller cutter; up to ${mm(2 * largestCutter(side))} reaches the root circle.`,
  });
}
