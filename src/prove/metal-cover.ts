/**
 * Whether the cutter, standing somewhere at some height, stands clear of metal: every point of its disc is outside the blank, in the
 * hole that was there, or was cut at least that deep by an earlier move. Points on rings stand for the disc; its rim is
 * drawn in by a few micrometres, so that a cutter fits where it has just been.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import type { Setup } from '../cutting/setup.ts';
import { pathDistance } from './metal-distance.ts';
import type { PathSet } from './metal-paths.ts';
import type { SolidMoves } from './metal-solids.ts';

/** Rounding, and the allowance that is left on walls it has just roughed, must not read as metal in the way. */
const DRAWN_IN = 5 * FORM_ERROR;
const RINGS = [0, 0.4, 0.75, 1];
const SPOKES = 32;

export interface Standing {
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly radius: number;
}

/** The moves and their paths. */
export interface Run {
  readonly paths: PathSet;
  readonly solids: SolidMoves;
}

/** `before`: how many of the moves (one path each, in order) have been run. */
export function isCleared(
  { paths, solids }: Run,
  before: number,
  setup: Setup,
  at: Standing,
  slack: number,
): boolean {
  if (at.z >= setup.topZ - slack) {
    return true;
  }
  const near = cutsNear(paths, solids, before, at, slack);
  for (const ring of RINGS) {
    const rho = ring * Math.max(0, at.radius - DRAWN_IN);
    const spokes = ring === 0 ? 1 : SPOKES;
    for (let k = 0; k < spokes; k++) {
      const angle = (2 * Math.PI * k) / spokes;
      const x = at.x + rho * Math.cos(angle);
      const y = at.y + rho * Math.sin(angle);
      if (!isCutAt(paths, near, x, y) && isInBlank(setup, x, y)) {
        return false;
      }
    }
  }
  return true;
}

/** Asks the one that answered last first, and keeps it in front. */
function isCutAt(paths: PathSet, near: number[], x: number, y: number): boolean {
  for (let k = 0; k < near.length; k++) {
    const i = near[k]!;
    if (pathDistance(paths, i, x, y) <= paths.radius[i]!) {
      near[k] = near[0]!;
      near[0] = i;
      return true;
    }
  }
  return false;
}

/** Cuts that came near enough by then, and deep enough; of several in one place the first. */
function cutsNear(paths: PathSet, solids: SolidMoves, before: number, at: Standing, slack: number): number[] {
  const near: number[] = [];
  const { mx, my, bound, radius } = paths;
  const { places } = solids;
  for (let k = 0; k < places.length && places[k]! < before; k++) {
    const i = places[k]!;
    const dx = mx[i]! - at.x;
    const dy = my[i]! - at.y;
    const reach = bound[i]! + radius[i]! + at.radius;
    if (dx * dx + dy * dy <= reach * reach && wentDown(solids, i, before, at.z + slack)) {
      near.push(i);
    }
  }
  return near;
}

/** Whether a cut in this place went down to `z` by then, all of it. */
function wentDown({ z0, z1, rapid, next }: SolidMoves, place: number, before: number, z: number): boolean {
  for (let i = place; i >= 0 && i < before; i = next[i]!) {
    if (z0[i]! <= z && z1[i]! <= z && rapid[i] === 0) {
      return true;
    }
  }
  return false;
}

/** Whether there was metal here before anything was cut. */
export function isInBlank(setup: Setup, x: number, y: number): boolean {
  const { shape, bored } = setup;
  const rho = Math.hypot(x, y);
  if (rho < bored / 2) {
    return false;
  }
  return shape.kind === 'disc'
    ? rho <= shape.diameter / 2
    : Math.abs(x) <= shape.width / 2 && Math.abs(y) <= shape.height / 2;
}
