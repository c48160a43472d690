/**
 * Whether a move into the machine's own frame takes the cutter to its top, above everything: home, or a height at least
 * that of the top the machine file names.
 */
import type { Machine } from '../machine/machine.ts';
import type { Trace } from './trace-program.ts';
import type { TracedEvent } from './trace-run.ts';

export function goesToTop(event: TracedEvent, { words, limits }: Machine): boolean {
  if (event.kind !== 'machine-place' || !event.axes.includes('z')) {
    return false;
  }
  const z = event.place?.z;
  return z === undefined || z >= Math.min(words.positions.topMachineZ ?? Infinity, limits.travel.z[1]);
}

/** Of the last move, whose height in the program's frame is not known: whether the way up was the last word on it. */
export function endsAtTop({ events, moves }: Trace, machine: Machine): boolean {
  let known = moves.length - 1;
  while (known >= 0 && moves[known]!.to.z === null) {
    known -= 1;
  }
  const ups = events.filter((event) => event.kind === 'machine-place' && event.axes.includes('z'));
  const last = ups.at(-1);
  return last !== undefined && last.before > known + 1 && goesToTop(last, machine);
}
