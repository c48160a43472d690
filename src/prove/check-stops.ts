/**
 * Stops: below the clear height, once cutting has begun, no spindle is stopped, no cutter changed and no hands asked for. A
 * cutter that stands still in metal breaks, or marks the flank when it comes up again.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { lengthText } from './finding-at.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';
import type { TracedEvent } from './trace-run.ts';

export function checkStops(evidence: Evidence): Finding[] {
  return evidence.traces.flatMap((trace) => lowStops(evidence, trace));
}

/** Each kind of stop once in a program: the rest are the same fault again. */
function lowStops({ input, lastDigit }: Evidence, { events, moves, file }: Trace): Finding[] {
  const clear = input.setup.clearZ - lastDigit;
  const first = firstCut(moves);
  const said = new Map<string, Finding>();
  let turned = 0;
  let changedAt = -1;
  for (const event of events) {
    const what = stopOf(event, turned);
    if (event.kind === 'spindle') {
      turned = event.speed;
    }
    if (what === undefined || event.before <= first) {
      continue;
    }
    // A change stops the spindle by itself: one fault, not two.
    const z = moves[event.before - 1]?.to.z ?? null;
    if (z === null || z >= clear || said.has(what) || changedAt === event.line) {
      continue;
    }
    changedAt = event.line;
    said.set(what, {
      code: 'prove.stopped-low',
      severity: 'error',
      message: `${what} while the cutter stands at Z ${lengthText(z)}; the clear height is ${lengthText(input.setup.clearZ)}`,
      hint: 'Bring the cutter up to the clear height in a block before this one.',
      file,
      line: event.line,
    });
  }
  return [...said.values()];
}

/** The number of the first move that is not fast; Infinity where there is none. */
function firstCut(moves: readonly TracedMove[]): number {
  const at = moves.findIndex(({ kind }) => kind !== 'rapid');
  return at < 0 ? Infinity : at;
}

function stopOf(event: TracedEvent, turned: number): string | undefined {
  switch (event.kind) {
    case 'spindle':
      return turned !== 0 && event.speed * turned <= 0 ? 'the spindle is stopped' : undefined;
    case 'cutter':
      return 'the cutter is changed';
    case 'stop':
      return event.optional ? 'the program may stop for hands' : 'the program stops for hands';
    default:
      return undefined;
  }
}
