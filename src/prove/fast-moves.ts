/**
 * Every fast move in the order it is run, with what is asked of it: its path among the known ones, how many were run
 * before it, and whether the spindle stood at the machine's top when its Z is not known.
 */
import type { Machine } from '../machine/machine.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import { goesToTop } from './at-top.ts';
import type { SolidMoves } from './metal-solids.ts';
import type { Trace } from './trace-program.ts';

export interface FastMove {
  readonly move: TracedMove;
  /** How many moves of known place were run before this one. */
  readonly before: number;
  /** Its own among them, or -1. */
  readonly path: number;
  /** Z was last taken to a place of the machine itself, above everything. */
  readonly atTop: boolean;
}

export function fastMoves(
  traces: readonly Trace[],
  { moves: solids }: SolidMoves,
  machine: Machine,
): FastMove[] {
  const moves: FastMove[] = [];
  let before = 0;
  for (const { moves: own, events } of traces) {
    let atTop = false;
    let next = 0;
    for (let k = 0; k < own.length; k++) {
      const move = own[k]!;
      for (; next < events.length && events[next]!.before <= k; next++) {
        const event = events[next]!;
        if (event.kind === 'machine-place' && event.axes.includes('z')) {
          atTop = goesToTop(event, machine);
        }
      }
      const path = solids[before] === move ? before : -1;
      if (move.kind === 'rapid') {
        moves.push({ move, before, path, atTop: atTop && move.from.z === null });
      }
      before += path < 0 ? 0 : 1;
      atTop = atTop && move.to.z === null;
    }
  }
  return moves;
}
