/** Travel: where zero lies in the machine's own coordinates every place must be within its ends; else only the size is judged. */
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Finding } from './proof.ts';

export function checkTravel(evidence: Evidence): Finding[] {
  return (['x', 'y', 'z'] as const).flatMap((axis) => axisFindings(evidence, axis));
}

function axisFindings({ input, moves, extents, lastDigit }: Evidence, axis: 'x' | 'y' | 'z'): Finding[] {
  const [low, high] = extents[axis];
  const [first, last] = input.machine.limits.travel[axis];
  const zero = input.setup.zeroAt?.[axis];
  const name = axis.toUpperCase();
  const way = zero === undefined ? undefined : zero + high > last + lastDigit ? 1 : -1;
  const said = (message: string, hint: string): Finding[] => [
    findingAt(furthest(moves, axis, way), { code: 'prove.travel', message, hint }),
  ];
  if (zero === undefined) {
    return high - low > last - first + lastDigit
      ? said(
          `${name} runs over ${lengthText(high - low)}; this machine's travel is ${lengthText(last - first)}`,
          'Use a machine with more travel.',
        )
      : [];
  }
  if (zero + low >= first - lastDigit && zero + high <= last + lastDigit) {
    return [];
  }
  return said(
    `${name} runs from ${lengthText(zero + low)} to ${lengthText(zero + high)} of the machine; its travel is ${lengthText(first)} to ${lengthText(last)}`,
    'Set the blank elsewhere on the table, or correct zero-at.',
  );
}

/** The move that ends furthest up (1) or down (-1) an axis; up, where neither end alone is to blame. */
function furthest(
  moves: readonly TracedMove[],
  axis: 'x' | 'y' | 'z',
  way: 1 | -1 | undefined,
): TracedMove | undefined {
  let worst: TracedMove | undefined;
  for (const move of moves) {
    const at = move.to[axis];
    const most = worst?.to[axis] ?? null;
    if (at !== null && (most === null || at * (way ?? 1) > most * (way ?? 1))) {
      worst = move;
    }
  }
  return worst ?? moves[0];
}
