/**
 * How each program leaves the machine: cutter up, spindle still, distances absolute, no compensation, no coolant running, and the
 * modes that the machine file wants written back. A mode is said at the line that set it.
 */
import { endsAtTop } from './at-top.ts';
import type { Evidence } from './evidence.ts';
import { lengthText } from './finding-at.ts';
import { codeOf, codesOf, G_GROUP, type Codes } from './modes-codes.ts';
import { motionOfCode, type FinalModes } from './modes.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';

interface Leftover {
  readonly message: string;
  /** Where it was set; else the last move or, without one, the end. */
  readonly line?: number | undefined;
  readonly severity?: Finding['severity'];
}

export function checkEnd(evidence: Evidence): Finding[] {
  const codes = codesOf(evidence.input.machine);
  return evidence.traces
    .filter(({ complete }) => complete)
    .flatMap((trace) =>
      [...stillOn(trace), ...heights(evidence, trace), ...notRestored(evidence, trace, codes)].map(
        ({ message, line, severity = 'error' }) => ({
          code: 'prove.left-on' as const,
          severity,
          message: `at the end of the program ${message}`,
          hint: 'End with the cutter up, the spindle off and the usual modes.',
          file: trace.file,
          line: line ?? trace.moves.at(-1)?.line ?? trace.events.at(-1)?.line ?? 1,
        }),
      ),
    );
}

function stillOn({ finalModes: modes, setAt }: Trace): Leftover[] {
  const said: Leftover[] = [];
  if (modes.turning !== undefined && modes.turning !== 0 && modes.speed !== 0) {
    said.push({ message: 'the spindle still turns' });
  }
  if (modes.distance === 'incremental') {
    said.push({ message: 'distances are still incremental (G91)', line: setAt[G_GROUP.distance] });
  }
  if (modes.feedMode === 'inverse-time') {
    said.push({ message: 'F still counts how long a move takes (G93)', line: setAt[G_GROUP.feedMode] });
  }
  if (modes.mist === true || modes.flood === true) {
    said.push({ message: 'the coolant still runs' });
  }
  return said;
}

/** Above the clear height, or at the machine's own top; where that cannot be told it is not taken to be so. */
function heights(evidence: Evidence, trace: Trace): Leftover[] {
  const { clearZ } = evidence.input.setup;
  const last = trace.moves.at(-1);
  if (last === undefined) {
    return [];
  }
  const { z } = last.to;
  if (z === null) {
    return endsAtTop(trace, evidence.input.machine)
      ? []
      : [{ message: 'nobody knows how high the cutter stands' }];
  }
  return z < clearZ - evidence.lastDigit
    ? [{ message: `the cutter stays down at Z ${lengthText(z)}; the clear height is ${lengthText(clearZ)}` }]
    : [];
}

/** What the machine file wants back and is not in force. A length that stays on would move the next program's cuts. */
function notRestored({ input }: Evidence, { finalModes, setAt }: Trace, codes: Codes): Leftover[] {
  const { end, cutters } = input.machine.words;
  const said: Leftover[] = [];
  if (cutters.lengthCancel === 'G49-at-end' && typeof finalModes.length === 'number') {
    said.push({
      message: `the length offset H${String(finalModes.length)} is still on (no G49)`,
      line: setAt[G_GROUP.length],
    });
  }
  for (const word of end.restore) {
    const code = codeOf(word.split(' ')[0] ?? '');
    const group = (codes.g[code] ?? 0) - 1;
    // G91 and a length have been said.
    if (group !== G_GROUP.distance && group !== G_GROUP.length && isOut(finalModes, word, code, group)) {
      said.push({
        message: `${word} is not in force, which the machine file wants written back`,
        line: (setAt[group] ?? 0) > 0 ? setAt[group] : undefined,
        severity: 'warning',
      });
    }
  }
  return said;
}

function isOut(modes: FinalModes, word: string, code: number, group: number): boolean {
  switch (group) {
    case G_GROUP.motion:
      return modes.motion !== undefined && modes.motion !== motionOfCode(code);
    case G_GROUP.path:
      return modes.path !== undefined && modes.path !== word;
    case G_GROUP.plane:
      return modes.plane !== undefined && modes.plane !== 'XY';
    default:
      return false;
  }
}
