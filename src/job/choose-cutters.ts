/**
 * Which cutter of the list does which pass where the job does not say. The largest that fits is the quickest and the
 * stiffest: rough a space with the largest it lets in, finish with the largest that gets to the root, bore and cross out
 * with the largest that the hole and the corners allow. Only cutters that reach deep enough. Where none fits, the
 * smallest that goes deep enough and in, which leaves more metal; else the smallest, so that what is wrong can be said of a
 * real cutter.
 * Widths and rules of roughing: the root of a space is as wide as D + 2 allowance + room for the chips. mm.
 */
import { Bug } from '../base/bug.ts';
import { WRITTEN_LENGTH } from '../base/tolerances.ts';
import type { Cutter } from '../cutting/setup.ts';
import { lengthOf } from '../geometry/on-piece.ts';
import { norm } from '../geometry/point.ts';
import { largestCutter } from '../tooth/largest-cutter.ts';
import { restingDisc } from '../tooth/resting-disc.ts';
import type { ToothSide } from '../tooth/tooth-side.ts';
import type { Crossings } from '../tooth/wheel.ts';
import { figure } from './show-length.ts';

export interface Choice {
  readonly cutter: Cutter;
  readonly why: string;
}

/**
 * Straight of a window's wall over the cutter, where only a slot round the slug is open: there the wall is joined and left.
 * Why: a twentieth of the cutter is left on the wall, each of the two arcs takes as much, and a quarter goes to the overlap.
 */
const JOINING_STRAIGHT = 0.14;
/** Room for chips beside a roughing cutter at the root. Why: without it both sides of the cutter rub. */
export const CHIP_ROOM = 0.05;
/** Largest cutter over the hole it clears, so that there is a ring to go round. */
const HOLE_SHARE = 0.8;

/**
 * Metal left for finishing: a twentieth of the cutter, at least what covers bending, at most what is cut in one pass; of the
 * finest cutters no more than a tenth, lest their finishing become a slot in the corners of the root.
 */
export function usualAllowance(diameter: number): number {
  const least = Math.max(0.05 * diameter, Math.min(0.02, 0.1 * diameter));
  return Math.min(0.1, Number(least.toFixed(3)));
}

/** Width of a tooth space at the root circle. */
export function rootWidth({ rootRadius, spaceAngle }: ToothSide): number {
  return 2 * rootRadius * Math.sin(spaceAngle);
}

/** Width of a tooth space at the pitch circle, where its flanks are furthest apart. */
function pitchWidth({ pitchRadius, spaceAngle }: ToothSide): number {
  return 2 * pitchRadius * Math.sin(spaceAngle);
}

export interface Choosing {
  readonly cutters: readonly Cutter[];
  /** From the top of the blank to the deepest cut. */
  readonly depth: number;
  readonly side: ToothSide;
  /** Radius from which the mate's tip works: a finishing cutter must leave the flank whole from there out. */
  readonly workingRadius: number;
}

export function chooseRoughing(
  { cutters, depth, side }: Choosing,
  allowance: number | undefined,
  finishing?: Cutter,
): Choice {
  const width = rootWidth(side);
  const slot = (cutter: Cutter): number =>
    cutter.diameter + 2 * (allowance ?? usualAllowance(cutter.diameter));
  const enters = (cutter: Cutter): boolean =>
    cutter.reach >= depth - WRITTEN_LENGTH && slot(cutter) < pitchWidth(side);
  const fits = (cutter: Cutter): boolean =>
    enters(cutter) &&
    width >= slot(cutter) + CHIP_ROOM &&
    (finishing === undefined ||
      finishing.diameter <= cutter.diameter + (allowance ?? usualAllowance(cutter.diameter)));
  return largest(
    cutters,
    fits,
    enters,
    `the largest that roughs a space ${width.toFixed(3)} mm wide at the root`,
  );
}

export function chooseFinishing({ cutters, depth, side, workingRadius }: Choosing, slot: number): Choice {
  const reaches = 2 * largestCutter(side);
  const enters = (cutter: Cutter): boolean =>
    cutter.reach >= depth - WRITTEN_LENGTH && cutter.diameter <= Math.min(slot, pitchWidth(side));
  const fits = (cutter: Cutter): boolean =>
    enters(cutter) && cutter.diameter <= reaches && footOf(side, cutter) <= workingRadius;
  const why = `the largest that gets to the root, where ${reaches.toFixed(3)} mm would fit, in the slot that was roughed`;
  const full = cutters.filter((cutter) => cutter.flute >= depth - WRITTEN_LENGTH);
  return largest(full.some(fits) ? full : cutters, fits, enters, why);
}

/** Where the flank begins that a cutter makes. */
function footOf(side: ToothSide, { diameter }: Cutter): number {
  const disc = restingDisc(side, diameter / 2);
  return disc === undefined ? Infinity : norm(disc.foot.point);
}

export function chooseBore({ cutters, depth }: Choosing, bore: number): Choice {
  const enters = (cutter: Cutter): boolean =>
    cutter.reach >= depth - WRITTEN_LENGTH && cutter.diameter < bore;
  const fits = (cutter: Cutter): boolean => enters(cutter) && cutter.diameter <= HOLE_SHARE * bore;
  return largest(
    cutters,
    fits,
    enters,
    `the largest that has room to go round in a bore of ${figure(bore, 3)} mm`,
  );
}

export function chooseCrossings({ cutters, depth }: Choosing, windows: Crossings, held = false): Choice {
  const { corner } = windows.proportions;
  const straight = Math.max(
    0,
    ...windows.window.map((piece) => (piece.kind === 'line' ? lengthOf(piece) : 0)),
  );
  const joins = ({ diameter }: Cutter): boolean => !held || straight >= JOINING_STRAIGHT * diameter;
  const room = HOLE_SHARE * (windows.windowOuter - windows.windowInner);
  const enters = (cutter: Cutter): boolean =>
    cutter.reach >= depth - WRITTEN_LENGTH && cutter.diameter <= 2 * corner;
  const fits = (cutter: Cutter): boolean =>
    enters(cutter) && cutter.diameter < 2 * corner && cutter.diameter <= room && joins(cutter);
  return largest(
    cutters,
    fits,
    enters,
    `the largest that goes round corners of ${figure(corner, 3)} mm radius`,
  );
}

function largest(
  cutters: readonly Cutter[],
  fits: (cutter: Cutter) => boolean,
  enters: (cutter: Cutter) => boolean,
  why: string,
): Choice {
  const bySize = cutters.toSorted((a, b) => b.diameter - a.diameter || a.number - b.number);
  const chosen = bySize.find(fits);
  if (chosen !== undefined) {
    return { cutter: chosen, why };
  }
  const smallest = bySize.at(-1);
  const last = bySize.findLast(enters) ?? smallest;
  if (last === undefined) {
    throw new Bug('A job without cutters came to the choice of cutters.');
  }
  return {
    cutter: last,
    why: `the smallest${last === smallest ? '' : ' that goes deep enough and in'}: none of the list fits`,
  };
}
