/** What happens between the moves, as meant and as read back: waits, stops, cutters; in order. s, 1/min. */
import type { Machine } from '../machine/machine.ts';
import type { Motion } from '../motion/motion.ts';
import type { Trace } from '../prove/trace-program.ts';

export function compareEvents(motion: Motion, trace: Trace, machine: Machine): readonly string[] {
  const differences: string[] = [];
  const dwells = trace.events.filter((event) => event.kind === 'dwell').map((event) => event.seconds);
  const last = machine.words.dwell.unit === 'seconds' ? 10 ** -machine.words.numbers.secondsDecimals : 0.001;
  for (const step of motion.steps) {
    if (step.kind !== 'dwell') {
      continue;
    }
    const found = dwells.findIndex(
      (seconds) => seconds >= step.seconds - 1e-9 && seconds <= step.seconds + last,
    );
    if (found < 0) {
      differences.push(`a wait of ${String(step.seconds)} s is not made`);
    }
    dwells.splice(0, found + 1);
  }
  const stops = trace.events.filter((event) => event.kind === 'stop' && !event.optional).length;
  const meantStops = motion.steps.filter((step) => step.kind === 'stop').length;
  if (stops < meantStops) {
    differences.push(`${String(stops)} stops where at least ${String(meantStops)} were meant`);
  }
  const cutters = trace.events.filter((event) => event.kind === 'cutter').map((event) => event.number);
  const meant = motion.steps.filter((step) => step.kind === 'cutter').map((step) => step.number);
  if (cutters.join() !== meant.join() && machine.words.file.commentForm !== 'none') {
    differences.push(
      `${cutters.length === 0 ? 'no cutter is named' : `cutters ${cutters.join(', ')}`} where ${meant.join(', ')} ${meant.length > 1 ? 'were' : 'was'} meant`,
    );
  }
  if (trace.events.at(-1)?.kind !== 'end') {
    differences.push('the program does not end');
  }
  return differences;
}
