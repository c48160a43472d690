/** How each program leaves the machine: cutter up, spindle still, distances absolute, no compensation, no coolant running. */
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';

export function checkEnd(evidence: Evidence): Finding[] {
  return evidence.traces
    .filter(({ complete }) => complete)
    .flatMap((trace) =>
      leftovers(evidence, trace).map((message) =>
        findingAt(trace.moves.at(-1), {
          code: 'prove.left-on',
          message: `at the end of the program ${message}`,
          hint: 'End with the cutter up, the spindle off and the usual modes.',
        }),
      ),
    );
}

function leftovers(evidence: Evidence, trace: Trace): string[] {
  const modes = trace.finalModes;
  const said: string[] = [];
  if (modes.turning !== undefined && modes.turning !== 0 && modes.speed !== 0) {
    said.push('the spindle still turns');
  }
  if (modes.distance === 'incremental') {
    said.push('distances are still incremental (G91)');
  }
  if (modes.mist === true || modes.flood === true) {
    said.push('the coolant still runs');
  }
  const { clearZ } = evidence.input.setup;
  const z = lastHeight(trace);
  if (z !== null && z < clearZ - evidence.lastDigit) {
    said.push(`the cutter stays down at Z ${lengthText(z)}; the clear height is ${lengthText(clearZ)}`);
  }
  return said;
}

/** Null where it is not known, as after a move to the machine's own top. */
function lastHeight({ moves }: Trace): number | null {
  return moves.at(-1)?.to.z ?? null;
}
