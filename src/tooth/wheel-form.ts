/**
 * The exact outline of a wheel from its proportions: radial flanks, an addendum rolled by half the mate's pitch circle (or
 * one arc in its place), kept height, root corner sharp or filleted.
 *
 * A root fillet is tangent to root circle and flank. Where the two of a space do not fit beside each other, one disc sits
 * between the flanks and its lowest point is the floor: `rootRadius` and `dedendum` then say where that really is, and a
 * warning says so. A fillet that would reach above the pitch circle is refused with the largest that does not.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { norm } from '../geometry/point.ts';
import { leafTip } from './leaf-tip.ts';
import { restingDisc, type RestingDisc } from './resting-disc.ts';
import { mm, toothProblem } from './tooth-problem.ts';
import { toothSector } from './tooth-sector.ts';
import { toothSide, type ToothSide } from './tooth-side.ts';
import type { WheelForm, WheelProportions } from './wheel.ts';

export function wheelForm(p: WheelProportions): Outcome<WheelForm> {
  const side = toothSide(p);
  if (!side.ok) {
    return side;
  }
  const corner = rootCorner(side.value, p.rootFillet);
  if (!corner.ok) {
    return corner;
  }
  const { pitchRadius, outsideRadius, pointedAddendum, generatingRadius } = side.value;
  const floor = floorRadius(side.value, corner.value);
  const form: WheelForm = {
    proportions: p,
    pitchRadius,
    outsideRadius,
    rootRadius: floor,
    addendum: p.height * pointedAddendum,
    dedendum: floor === side.value.rootRadius ? p.dedendum * p.module : pitchRadius - floor,
    pointedAddendum,
    toothThickness: p.tooth * Math.PI * p.module,
    generatingRadius,
    workingRadius: workingRadius(p),
    sector: toothSector(side.value, { root: corner.value, rolling: 0 }),
  };
  return success(form, corner.problems);
}

/** Radius of the lowest point of a space that a disc rests in; the root circle where there is none. */
export function floorRadius(side: ToothSide, disc: RestingDisc | undefined): number {
  return !disc || disc.onRoot ? side.rootRadius : disc.centre.x - disc.radius;
}

/** The root fillet as the disc that fills the corner; none where the corner is sharp. */
export function rootCorner(side: ToothSide, fillet: number): Outcome<RestingDisc | undefined> {
  if (fillet === 0) {
    return success(undefined);
  }
  const disc = restingDisc(side, fillet);
  if (!disc || disc.foot.on !== 'flank' || norm(disc.foot.point) > side.pitchRadius) {
    return failure([filletTooLarge(fillet, largestFillet(side))]);
  }
  return success(disc, disc.onRoot ? [] : [filletsMeet(side, disc)]);
}

/** The largest whose foot stays on the radial flank. */
function largestFillet(side: ToothSide): number {
  const { pitchRadius: pitch, rootRadius: root, spaceAngle } = side;
  const beside = ((pitch - root) * (pitch + root)) / (2 * root);
  return (root + beside) * Math.sin(spaceAngle) >= beside ? beside : pitch * Math.tan(spaceAngle);
}

function filletTooLarge(fillet: number, largest: number): Problem {
  return toothProblem({
    code: 'tooth.no-form',
    key: ['root'],
    message: `a root fillet of ${mm(fillet)} reaches above the pitch circle; the largest that does not is ${mm(largest)}`,
    hint: `Give root: at most ${mm(largest)}, or 0 for a sharp corner.`,
  });
}

function filletsMeet(side: ToothSide, disc: RestingDisc): Problem {
  const floor = floorRadius(side, disc);
  return toothProblem({
    code: 'tooth.no-form',
    severity: 'warning',
    key: ['root'],
    message:
      `the two root fillets of ${mm(disc.radius)} do not fit beside each other: one rounds the whole space, and the floor lies ` +
      `${mm(side.pitchRadius - floor)} below the pitch circle instead of ${mm(side.pitchRadius - side.rootRadius)}`,
    hint: 'Give a smaller root to reach the full dedendum.',
  });
}

/** What the tip of a leaf on the line of centres leaves of them. */
function workingRadius({ mate, module, centres }: WheelProportions): number {
  const reach =
    mate.kind === 'pinion' ? mate.leaves / 2 + leafTip(mate).height : mate.trundles / 2 + mate.trundle / 2;
  return centres - module * reach;
}
