/**
 * Whether the cutter, standing somewhere at some height, stands clear of metal: every point of its disc is outside the blank, in the
 * hole that was there, or was cut at least that deep by an earlier move. Points on rings stand for the disc; its rim is
 * drawn in by a few micrometres, so that a cutter fits where it has just been.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import type { Setup } from '../cutting/setup.ts';
import { pathDistance } from './metal-distance.ts';
import type { PathSet } from './metal-paths.ts';

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

/** `before`: how many of the paths (one a move, in order) have been run. */
export function isCleared(
  paths: PathSet,
  before: number,
  setup: Setup,
  at: Standing,
  slack: number,
): boolean {
  if (at.z >= setup.topZ - slack) {
    return true;
  }
  const near = cutsNear(paths, before, at, slack);
  for (const ring of RINGS) {
    const rho = ring * Math.max(0, at.radius - DRAWN_IN);
    const spokes = ring === 0 ? 1 : SPOKES;
    for (let k = 0; k < spokes; k++) {
      const angle = (2 * Math.PI * k) / spokes;
      const x = at.x + rho * Math.cos(angle);
      const y = at.y + rho * Math.sin(angle);
      if (isInBlank(setup, x, y) && !near.some((i) => pathDistance(paths, i, x, y) <= paths.radius[i]!)) {
        return false;
      }
    }
  }
  return true;
}

function cutsNear(paths: PathSet, before: number, at: Standing, slack: number): number[] {
  const near: number[] = [];
  const { mx, my, bound, radius } = paths;
  for (let i = 0; i < before; i++) {
    const dx = mx[i]! - at.x;
    const dy = my[i]! - at.y;
    const reach = bound[i]! + radius[i]! + at.radius;
    if (dx * dx + dy * dy <= reach * reach) {
      const { z0, z1, move } = paths.solids[i]!;
      if (Math.max(z0, z1) <= at.z + slack && move.kind !== 'rapid') {
        near.push(i);
      }
    }
  }
  return near;
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
