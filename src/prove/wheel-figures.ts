/**
 * The figures of design and drawing, measured on the cut metal: teeth over every height, bore, windows, what is cut inside the
 * wheel away from every outline, and the deviation along the worst tooth.
 *
 * The wheel fills the blank from its top down, its thickness or to the skin that stays under it.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import type { Setup } from '../cutting/setup.ts';
import { measureContour, NOWHERE, type ContourFigures, type Worst } from './deviation-contour.ts';
import { toothFigures, type Heights, type ToothFigures } from './deviation-depths.ts';
import { boreWall, windowWall, type Wall } from './deviation-walls.ts';
import { deepestInside, type WheelBody } from './metal-inside.ts';
import { pathsBelow, type PathSet } from './metal-paths.ts';
import type { SolidMoves } from './metal-solids.ts';
import type { Target } from './proof.ts';

export interface WheelFigures {
  readonly heights: Heights;
  /** What gouge and metal left may be: the form error and one unit of the last digit. */
  readonly allowed: number;
  readonly teeth: ToothFigures;
  readonly bore: WallFigures | undefined;
  readonly window: WallFigures | undefined;
  /** Deepest cut whose axis lies inside the wheel. */
  readonly inside: Worst;
}

export interface WallFigures {
  readonly gouge: Worst;
  readonly left: Worst;
}

export function wheelFigures(
  target: Target,
  body: WheelBody,
  setup: Setup,
  solids: SolidMoves,
  whole: PathSet,
  lastDigit: number,
): WheelFigures {
  const { form, crossings, finishingDiameter } = target;
  const heights: Heights = {
    top: setup.topZ,
    bottom: Math.max(setup.topZ - target.thickness, setup.plateZ + setup.skin),
    slack: lastDigit,
  };
  const allowed = FORM_ERROR + lastDigit;
  const cutterRadius = finishingDiameter / 2;
  const farthest = (Math.PI * form.pitchRadius) / form.proportions.teeth;
  const set = pathsBelow(solids, heights.bottom + heights.slack, heights.top - heights.slack, whole);
  const wall = (made: Wall): WallFigures => wallFigures(set, made, farthest);
  const isBored = setup.bored >= target.bore;
  return {
    heights,
    allowed,
    teeth: toothFigures(solids, set, form, finishingDiameter, heights, allowed),
    bore: isBored ? undefined : wall(boreWall(target.bore, cutterRadius)),
    window: crossings === undefined ? undefined : wall(windowWall(crossings, cutterRadius)),
    inside: deepestInside(body, solids, heights.top - heights.slack) ?? NOWHERE,
  };
}

function wallFigures(set: PathSet, { stations, ring }: Wall, farthest: number): WallFigures {
  const { low, high } = measureContour(set, stations, ring, farthest);
  return { gouge: high.gouge, left: mostLeft(low) };
}

function mostLeft(figures: ContourFigures): Worst {
  return figures.left.reduce((most, worst) => (worst.value > most.value ? worst : most), NOWHERE);
}
