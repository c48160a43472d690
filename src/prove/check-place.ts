/** Every cutting move begins and ends at a place that the program has named: else nothing can be said of what it cuts. */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, gathered } from './finding-at.ts';
import type { Finding } from './proof.ts';

export function checkPlace({ moves, solids }: Evidence): Finding[] {
  // Where every move's place is known there is nothing to look for.
  const lost = solids.count === moves.length ? [] : moves.filter(isLost);
  return gathered(
    lost.map((move) =>
      findingAt(move, {
        code: 'prove.unknown-place',
        message: `a cutting move before ${missing(move)} was named`,
        hint: 'Go to X, Y and Z by name, high above the blank, before the first cut.',
      }),
    ),
  );
}

function isLost({ kind, from, to }: TracedMove): boolean {
  return (
    kind !== 'rapid' &&
    (from.x === null || from.y === null || from.z === null || to.x === null || to.y === null || to.z === null)
  );
}

function missing({ from, to }: TracedMove): string {
  return (['x', 'y', 'z'] as const)
    .filter((axis) => from[axis] === null || to[axis] === null)
    .map((axis) => axis.toUpperCase())
    .join(' and ');
}
