/**
 * What stands in the way is solid: keep-outs and screw heads against cutter, shank and collet nut, at the heights each
 * of them has; a fast move may go anywhere between its ends where the machine does not run it straight.
 */
import type { Cutter, Obstacle } from '../cutting/setup.ts';
import type { TracedMove } from '../motion/traced-move.ts';
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

/** Each obstacle once, at the first move that meets it: there the cutter breaks. */
export function checkObstacles(evidence: Evidence): Finding[] {
  const { obstacles } = evidence.input.setup;
  const descents = obstacles.length === 0 ? [] : descentsOf(evidence);
  return obstacles.flatMap((obstacle) => {
    const { count } = evidence.solids;
    let met: Finding | undefined;
    let at = 0;
    for (; at < count && met === undefined; at++) {
      met = meet(evidence, at, obstacle);
    }
    for (const { move, before } of descents) {
      const landed = before < at || met === undefined ? land(evidence, move, obstacle) : undefined;
      if (landed !== undefined) {
        return [landed];
      }
    }
    return met === undefined ? [] : [met];
  });
}

/** A move that comes from a height or place that is not known, as from the machine's top, to one that is. */
interface Descent {
  readonly move: TracedMove;
  /** How many moves of known places were made before it. */
  readonly before: number;
}

function descentsOf({ moves, solids }: Evidence): Descent[] {
  const descents: Descent[] = [];
  if (solids.count === moves.length) {
    return descents;
  }
  let before = 0;
  for (const move of moves) {
    if (solids.moves[before] === move) {
      before += 1;
    } else if (move.to.x !== null && move.to.y !== null && move.to.z !== null) {
      descents.push({ move, before });
    }
  }
  return descents;
}

export function spindleParts(evidence: Evidence, cutter: Cutter): readonly SpindlePart[] {
  const { nut } = evidence.input.machine.limits;
  return [
    { name: 'cutter', radius: cutter.diameter / 2, from: 0 },
    { name: 'shank', radius: cutter.shank / 2, from: cutter.reach },
    { name: 'collet nut', radius: nut.diameter / 2, from: cutter.stickOut },
  ];
}

function meet(evidence: Evidence, i: number, obstacle: Obstacle): Finding | undefined {
  const low = lowOf(evidence.solids, i);
  return low < obstacle.toZ
    ? deepest(evidence, evidence.solids.moves[i]!, obstacle, low, distanceTo(evidence, i, obstacle))
    : undefined;
}

/** Of a descent only its end is known: where it comes down. */
function land(evidence: Evidence, move: TracedMove, obstacle: Obstacle): Finding | undefined {
  const { x, y, z } = move.to;
  return z !== null && z < obstacle.toZ
    ? deepest(evidence, move, obstacle, z, Math.hypot((x ?? 0) - obstacle.x, (y ?? 0) - obstacle.y))
    : undefined;
}

/** The part of the spindle that goes deepest into an obstacle, whose middle the axis passes at a distance. */
function deepest(
  evidence: Evidence,
  move: TracedMove,
  obstacle: Obstacle,
  low: number,
  distance: number,
): Finding | undefined {
  const cutter = evidence.cutterOf(move);
  if (cutter === undefined) {
    return undefined;
  }
  const away = distance - obstacle.radius;
  const widest = Math.max(cutter.diameter, cutter.shank, evidence.input.machine.limits.nut.diameter) / 2;
  if (widest - away <= evidence.lastDigit) {
    return undefined;
  }
  let worst: SpindlePart | undefined;
  for (const part of spindleParts(evidence, cutter)) {
    const isIn = low + part.from < obstacle.toZ && part.radius - away > evidence.lastDigit;
    worst = isIn && part.radius > (worst?.radius ?? 0) ? part : worst;
  }
  return worst === undefined ? undefined : hit(move, worst, obstacle, away);
}

function hit(move: TracedMove, part: SpindlePart, obstacle: Obstacle, away: number): Finding {
  const { name, toZ, x, y } = obstacle;
  return findingAt(move, {
    code: 'prove.obstacle',
    message:
      `the ${part.name} (radius ${lengthText(part.radius)}) passes ${lengthText(Math.max(0, away))} from the ${name} at ` +
      `X ${lengthText(x)} Y ${lengthText(y)}, which stands up to Z ${lengthText(toZ)}`,
    hint: `Move the ${name}, or go round or over it.`,
    ...(move.to.x === null || move.to.y === null ? {} : { x: move.to.x, y: move.to.y }),
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
