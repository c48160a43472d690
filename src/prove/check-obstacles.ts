/**
 * What stands in the way is solid: keep-outs and screw heads against cutter, shank and collet nut, at the heights each
 * of them has; a fast move may go anywhere between its ends where the machine does not run it straight.
 */
import type { Cutter, Obstacle } from '../cutting/setup.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import { pathDistance } from './metal-distance.ts';
import { lowOf } from './metal-solids.ts';
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
    for (let i = 0; i < evidence.solids.count; i++) {
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
  const low = lowOf(evidence.solids, i);
  if (low >= obstacle.toZ) {
    return undefined;
  }
  const cutter = evidence.cutterOf(evidence.solids.moves[i]!);
  if (cutter === undefined) {
    return undefined;
  }
  const away = distanceTo(evidence, i, obstacle) - obstacle.radius;
  let worst: { readonly found: Finding; readonly depth: number } | undefined;
  for (const part of spindleParts(evidence, cutter)) {
    const depth = part.radius - away;
    if (low + part.from < obstacle.toZ && depth > evidence.lastDigit && depth > (worst?.depth ?? 0)) {
      worst = { found: hit(evidence, i, part, obstacle, away), depth };
    }
  }
  return worst;
}

function hit({ solids }: Evidence, i: number, part: SpindlePart, obstacle: Obstacle, away: number): Finding {
  const { name, toZ, x, y } = obstacle;
  return findingAt(solids.moves[i], {
    code: 'prove.obstacle',
    message:
      `the ${part.name} (radius ${lengthText(part.radius)}) passes ${lengthText(Math.max(0, away))} from the ${name} at ` +
      `X ${lengthText(x)} Y ${lengthText(y)}, which stands up to Z ${lengthText(toZ)}`,
    hint: `Move the ${name}, or go round or over it.`,
    x: solids.x1[i]!,
    y: solids.y1[i]!,
  });
}

function distanceTo(evidence: Evidence, i: number, { x, y }: Obstacle): number {
  const { x0, y0, x1, y1, rapid } = evidence.solids;
  if (rapid[i] === 1 && evidence.input.machine.words.positions.rapidShape === 'dog-leg') {
    const dx = Math.max(Math.min(x0[i]!, x1[i]!) - x, 0, x - Math.max(x0[i]!, x1[i]!));
    const dy = Math.max(Math.min(y0[i]!, y1[i]!) - y, 0, y - Math.max(y0[i]!, y1[i]!));
    return Math.hypot(dx, dy);
  }
  return pathDistance(evidence.paths, i, x, y);
}
