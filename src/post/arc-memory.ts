/**
 * Arcs that were written before: laps go round the same line at other heights, so that most arcs of a program come again
 * with the same words. A flat arc that starts at the same counts and is the same to the last bit has the same block.
 *
 * In  : the arc meant, where it starts (exact, and in counts as written). Out: its block as it was written, if it was.
 */
import type { ArcStep, Position } from '../motion/motion.ts';
import type { GridArc } from './grid-move.ts';

export interface KnownArc {
  readonly from: Position;
  readonly step: ArcStep;
  /** Counts. */
  readonly startX: number;
  readonly startY: number;
  readonly arc: GridArc;
  /** All words but motion and feed. */
  readonly body: string;
}

export interface ArcMemory {
  readonly arcs: KnownArc[];
  /** By the place they start at, the last one there. */
  readonly byStart: Map<number, number>;
  /** Laps repeat in order: the arc that is looked for first. */
  next: number;
}

export function openArcMemory(): ArcMemory {
  return { arcs: [], byStart: new Map(), next: 0 };
}

export function recallArc(
  memory: ArcMemory,
  from: Position,
  startX: number,
  startY: number,
  step: ArcStep,
): KnownArc | undefined {
  if (step.to.z !== from.z) {
    return undefined;
  }
  const guess = memory.arcs[memory.next];
  if (guess !== undefined && isSame(guess, from, startX, startY, step)) {
    memory.next++;
    return guess;
  }
  const at = memory.byStart.get(keyOf(startX, startY));
  const known = at === undefined ? undefined : memory.arcs[at];
  if (at === undefined || known === undefined || !isSame(known, from, startX, startY, step)) {
    return undefined;
  }
  memory.next = at + 1;
  return known;
}

export function keepArc(memory: ArcMemory, arc: KnownArc): void {
  memory.byStart.set(keyOf(arc.startX, arc.startY), memory.arcs.length);
  memory.arcs.push(arc);
}

function isSame(known: KnownArc, from: Position, startX: number, startY: number, step: ArcStep): boolean {
  return (
    known.startX === startX &&
    known.startY === startY &&
    known.step.turn === step.turn &&
    known.step.to.x === step.to.x &&
    known.step.to.y === step.to.y &&
    known.step.centre.x === step.centre.x &&
    known.step.centre.y === step.centre.y &&
    known.from.x === from.x &&
    known.from.y === from.y
  );
}

/** Of no harm where two places share a key: every word of a known arc is compared. */
function keyOf(startX: number, startY: number): number {
  return startX * 0x4000_0000 + startY;
}
