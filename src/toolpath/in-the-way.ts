/**
 * What stands on the plate against the moves: cutter, neck, shank and collet nut at their heights.
 *
 * In  : a move, the set-up's obstacles, the cutter, the machine's nut. Program frame, mm.
 * Out : the first obstacle that the move would touch. A rapid at a height above an obstacle passes over it.
 */
import type { Cutter, Obstacle } from '../cutting/setup.ts';
import { nearestOnPiece } from '../geometry/nearest-on-piece.ts';
import type { MoveStep, Position } from '../motion/motion.ts';
import type { Machine } from '../machine/machine.ts';

/** Air kept round everything that stands on the plate. Judgement: a clamp's place is measured with a rule. */
export const AIR_ROUND = 0.5;

export function inTheWay(
  from: Position,
  step: MoveStep,
  obstacles: readonly Obstacle[],
  cutter: Cutter,
  machine: Machine,
): Obstacle | undefined {
  const tip = Math.min(from.z, step.to.z);
  return obstacles.find((obstacle) => {
    const wide = widthBelow(obstacle.toZ + AIR_ROUND - tip, cutter, machine);
    return wide > 0 && distanceTo(from, step, obstacle) < obstacle.radius + wide / 2 + AIR_ROUND;
  });
}

/** The same for a move across whose way between its ends is not known: anywhere in the box between them. */
export function inTheBox(
  from: Position,
  to: Position,
  obstacle: Obstacle,
  cutter: Cutter,
  machine: Machine,
): boolean {
  const wide = widthBelow(obstacle.toZ + AIR_ROUND - Math.min(from.z, to.z), cutter, machine);
  const outside = (value: number, a: number, b: number): number =>
    Math.max(Math.min(a, b) - value, 0, value - Math.max(a, b));
  const off = Math.hypot(outside(obstacle.x, from.x, to.x), outside(obstacle.y, from.y, to.y));
  return wide > 0 && off < obstacle.radius + wide / 2 + AIR_ROUND;
}

/** Widest diameter of what hangs within `height` above the tip; 0 where the tip is above. */
export function widthBelow(height: number, cutter: Cutter, machine: Machine): number {
  if (height <= 0) {
    return 0;
  }
  const widths = [cutter.diameter];
  if (height > cutter.reach) {
    widths.push(cutter.shank);
  }
  if (height > cutter.stickOut) {
    widths.push(machine.limits.nut.diameter);
  }
  return Math.max(...widths);
}

function distanceTo(from: Position, step: MoveStep, obstacle: Obstacle): number {
  const at = { x: obstacle.x, y: obstacle.y };
  if (step.kind !== 'arc') {
    return nearestOnPiece({ kind: 'line', from, to: step.to }, at).distance;
  }
  const { centre, turn } = step;
  const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  return nearestOnPiece({ kind: 'arc', centre, radius, start, turn }, at).distance;
}
