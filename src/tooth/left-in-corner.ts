/**
 * The thickest metal a cutter leaves at the root, as distance from the exact outline.
 *
 * Along the cutter's arc the distance grows from the floor and from the side, and is greatest where both are equal: at the
 * centre of a smaller disc that rests in the same space and whose centre lies on the cutter's rim. In a fillet the
 * nearest metal is the fillet's, and the greatest distance lies on the line through the two centres.
 */
import { addScaled, distance, polar, subtract, unit, type Point } from '../geometry/point.ts';
import { findRoot } from '../geometry/roots.ts';
import { restingDisc, type RestingDisc } from './resting-disc.ts';
import type { ToothSide } from './tooth-side.ts';

export function leftInCorner(
  side: ToothSide,
  cutter: RestingDisc,
  fillet: RestingDisc | undefined,
): { readonly thickness: number; readonly at: Point } {
  // Positive for a disc whose centre lies deeper in the corner than the cutter's rim.
  const beyondRim = (size: number) => {
    const disc = size === 0 ? undefined : restingDisc(side, size);
    const centre = disc?.centre ?? polar(side.rootRadius, side.spaceAngle);
    return distance(centre, cutter.centre) - cutter.radius;
  };
  if (fillet && beyondRim(fillet.radius) <= 0) {
    const apart = subtract(fillet.centre, cutter.centre);
    const thickness = fillet.radius - cutter.radius + Math.hypot(apart.x, apart.y);
    return { thickness, at: addScaled(cutter.centre, unit(apart), cutter.radius) };
  }
  const thickness = findRoot(beyondRim, fillet?.radius ?? 0, cutter.radius);
  return { thickness, at: restingDisc(side, thickness)?.centre ?? cutter.centre };
}
