/**
 * Arcs by size: a radius this controller does not run, or a chord so short that it may take the arc for a whole circle. How the
 * centre fits the ends is judged where the arc is read.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, gathered, type Said } from './finding-at.ts';
import type { Finding } from './proof.ts';

export function checkArcs(evidence: Evidence): Finding[] {
  const { moves, solids } = evidence;
  // Where every move is placed, one of each place tells whether any arc is at fault.
  const some = solids.count === moves.length ? Array.from(solids.places, (i) => solids.moves[i]!) : moves;
  if (!some.some((move) => outOfSize(evidence, move) !== undefined)) {
    return [];
  }
  return gathered(
    moves.flatMap((move) => {
      const fault = outOfSize(evidence, move);
      return fault === undefined ? [] : [findingAt(move, fault)];
    }),
  );
}

function outOfSize({ input, lastDigit }: Evidence, move: TracedMove): Said | undefined {
  const { from, centre, turn } = move;
  if (centre === undefined || turn === undefined || from.x === null || from.y === null) {
    return undefined;
  }
  const { smallestRadius, largestRadius, shortestChord } = input.machine.words.arcs;
  const dx = from.x - centre.x;
  const dy = from.y - centre.y;
  const radius = Math.sqrt(dx * dx + dy * dy);
  // Both ends and the centre are rounded.
  const slack = 2 * lastDigit;
  if (radius < smallestRadius - slack || radius > largestRadius + slack) {
    return said(
      `an arc of radius ${text(radius)}; this machine runs ${text(smallestRadius)} to ${text(largestRadius)}`,
    );
  }
  const size = Math.abs(turn);
  // The sine of a quarter turn or less is at least its share of one: few arcs need the sine itself.
  if (size > Math.PI || (2 * radius * size) / Math.PI >= shortestChord - slack) {
    return undefined;
  }
  const chord = 2 * radius * Math.sin(size / 2);
  return chord < shortestChord - slack
    ? said(`an arc whose ends lie ${text(chord)} apart; this machine wants ${text(shortestChord)} at least`)
    : undefined;
}

function said(message: string): Said {
  return { code: 'prove.arc', message, hint: 'Write a straight move in its place.' };
}

function text(length: number): string {
  return `${String(Number(length.toFixed(4)))} mm`;
}
