/**
 * What stands in the way is solid: keep-outs and screw heads against cutter, shank and collet nut, at the heights each
 * of them has; a fast move may go anywhere between its ends where the machine does not run it straight.
 */
import type { Cutter, Obstacle } from '../cutting/setup.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import { pathDistance } from './metal-distance.ts';
import type { SolidMove } from './metal-paths.ts';
import type { Finding } from './proof.ts';

interface SpindlePart {
  readonly name: 'cutter' | 'shank' | 'collet nut';
  readonly radius: number;
  /** Above the cutter's tip. */
  readonly from: number;
}

export function checkObstacles(evidence: Evidence): Finding[] {
  return evidence.input.setup.obstacles.flatMap((obstacle) => {
    let worst: { readonly found: Finding; readonly depth: number } | undefined;
    for (let i = 0; i < evidence.solids.length; i++) {
      const met = meet(evidence, i, obstacle);
      worst = met !== undefined && met.depth > (worst?.depth ?? 0) ? met : worst;
    }
    return worst === undefined ? [] : [worst.found];
  });
}

export function spindleParts(evidence: Evidence, cutter: Cutter): readonly SpindlePart[] {
  const { nut } = evidence.input.machine.limits;
  return [
    { name: 'cutter', radius: cutter.diameter / 2, from: 0 },
    { name: 'shank', radius: cutter.shank / 2, from: cutter.reach },
    { name: 'collet nut', radius: nut.diameter / 2, from: cutter.stickOut },
  ];
}

/** How far the spindle and what it holds go into an obstacle on one move. */
function meet(evidence: Evidence, i: number, obstacle: Obstacle) {
  const solid = evidence.solids[i]!;
  const low = Math.min(solid.z0, solid.z1);
  const cutter = evidence.cutterOf(solid.move);
  if (cutter === undefined || low >= obstacle.toZ) {
    return undefined;
  }
  const away = distanceTo(evidence, i, solid, obstacle) - obstacle.radius;
  let worst: { readonly found: Finding; readonly depth: number } | undefined;
  for (const part of spindleParts(evidence, cutter)) {
    const depth = part.radius - away;
    if (low + part.from < obstacle.toZ && depth > evidence.lastDigit && depth > (worst?.depth ?? 0)) {
      worst = { found: hit(solid, part, obstacle, away), depth };
    }
  }
  return worst;
}

function hit(solid: SolidMove, part: SpindlePart, obstacle: Obstacle, away: number): Finding {
  const { name, toZ, x, y } = obstacle;
  return findingAt(solid.move, {
    code: 'prove.obstacle',
    message:
      `the ${part.name} (radius ${lengthText(part.radius)}) passes ${lengthText(Math.max(0, away))} from the ${name} at ` +
      `X ${lengthText(x)} Y ${lengthText(y)}, which stands up to Z ${lengthText(toZ)}`,
    hint: `Move the ${name}, or go round or over it.`,
    x: solid.x1,
    y: solid.y1,
  });
}

function distanceTo(evidence: Evidence, i: number, solid: SolidMove, { x, y }: Obstacle): number {
  if (solid.move.kind === 'rapid' && evidence.input.machine.words.positions.rapidShape === 'dog-leg') {
    const dx = Math.max(Math.min(solid.x0, solid.x1) - x, 0, x - Math.max(solid.x0, solid.x1));
    const dy = Math.max(Math.min(solid.y0, solid.y1) - y, 0, y - Math.max(solid.y0, solid.y1));
    return Math.hypot(dx, dy);
  }
  return pathDistance(evidence.paths, i, x, y);
}
