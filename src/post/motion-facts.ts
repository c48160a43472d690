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

export function motionFacts(motion: Motion): MotionFacts {
  const low = [Infinity, Infinity, Infinity] as [number, number, number];
  const high = [-Infinity, -Infinity, -Infinity] as [number, number, number];
  const reach = (x: number, y: number, z: number): void => {
    low[0] = Math.min(low[0], x);
    low[1] = Math.min(low[1], y);
    low[2] = Math.min(low[2], z);
    high[0] = Math.max(high[0], x);
    high[1] = Math.max(high[1], y);
    high[2] = Math.max(high[2], z);
  };
  const speeds = new Set<number>();
  const cutters = new Set<number>();
  let from: Position | undefined;
  for (const step of motion.steps) {
    if (isMove(step)) {
      reach(step.to.x, step.to.y, step.to.z);
      if (step.kind === 'arc' && from !== undefined) {
        reachArc(step, from, reach);
      }
      from = step.to;
    } else if (step.kind === 'spindle' && step.speed > 0) {
      speeds.add(step.speed);
    } else if (step.kind === 'cutter') {
      cutters.add(step.number);
    }
  }
  return {
    x: [low[0], high[0]],
    y: [low[1], high[1]],
    z: [low[2], high[2]],
    speeds: [...speeds].sort((a, b) => a - b),
    cutters: [...cutters],
  };
}

/** The arc's own extreme points, where it passes an axis of its circle. */
function reachArc(step: ArcStep, from: Position, reach: (x: number, y: number, z: number) => void): void {
  const { centre, turn, to } = step;
  const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  for (let quarter = 0; quarter < 4; quarter++) {
    const angle = (quarter * Math.PI) / 2;
    const away = turn > 0 ? wholeAngle(angle - start) : wholeAngle(start - angle);
    if (away <= Math.abs(turn)) {
      reach(centre.x + radius * Math.cos(angle), centre.y + radius * Math.sin(angle), to.z);
    }
  }
}
