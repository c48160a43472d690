/**
 * What a motion does as a whole, for headers and sheets: how far it goes, how fast the spindle turns, which cutters.
 * mm in the program's frame, 1/min. Arcs count with their true extent.
 */
import { wholeAngle } from '../geometry/point.ts';
import { isMove, type ArcStep, type Motion, type Position } from '../motion/motion.ts';

export type Span = readonly [number, number];

export interface MotionFacts {
  readonly x: Span;
  readonly y: Span;
  readonly z: Span;
  /** Rising, each once; empty where the spindle stays still. */
  readonly speeds: readonly number[];
  /** In the order they are first used. */
  readonly cutters: readonly number[];
}

/** Least and greatest so far. */
interface Box {
  x0: number;
  x1: number;
  y0: number;
  y1: number;
  z0: number;
  z1: number;
}

export function motionFacts(motion: Motion): MotionFacts {
  const box: Box = { x0: Infinity, x1: -Infinity, y0: Infinity, y1: -Infinity, z0: Infinity, z1: -Infinity };
  const speeds = new Set<number>();
  const cutters = new Set<number>();
  let from: Position | undefined;
  for (const step of motion.steps) {
    if (isMove(step)) {
      reach(box, step.to.x, step.to.y);
      const { z } = step.to;
      box.z0 = z < box.z0 ? z : box.z0;
      box.z1 = z > box.z1 ? z : box.z1;
      if (step.kind === 'arc' && from !== undefined) {
        reachArc(box, step, from);
      }
      from = step.to;
    } else if (step.kind === 'spindle' && step.speed > 0) {
      speeds.add(step.speed);
    } else if (step.kind === 'cutter') {
      cutters.add(step.number);
    }
  }
  return {
    x: [box.x0, box.x1],
    y: [box.y0, box.y1],
    z: [box.z0, box.z1],
    speeds: [...speeds].sort((a, b) => a - b),
    cutters: [...cutters],
  };
}

function reach(box: Box, x: number, y: number): void {
  box.x0 = x < box.x0 ? x : box.x0;
  box.x1 = x > box.x1 ? x : box.x1;
  box.y0 = y < box.y0 ? y : box.y0;
  box.y1 = y > box.y1 ? y : box.y1;
}

/** The arc's own extreme points, where it passes an axis of its circle; of most arcs the whole circle lies in the box already. */
function reachArc(box: Box, { centre, turn }: ArcStep, from: Position): void {
  const dx = from.x - centre.x;
  const dy = from.y - centre.y;
  const radius = Math.sqrt(dx * dx + dy * dy);
  if (
    centre.x - radius >= box.x0 &&
    centre.x + radius <= box.x1 &&
    centre.y - radius >= box.y0 &&
    centre.y + radius <= box.y1
  ) {
    return;
  }
  const start = Math.atan2(dy, dx);
  for (let quarter = 0; quarter < 4; quarter++) {
    const angle = (quarter * Math.PI) / 2;
    const away = turn > 0 ? wholeAngle(angle - start) : wholeAngle(start - angle);
    if (away <= Math.abs(turn)) {
      reach(box, centre.x + radius * Math.cos(angle), centre.y + radius * Math.sin(angle));
    }
  }
}
