/**
 * Proof of a program, or of several run one after the other: the list of checks, and the verdict.
 *
 * In  : texts, machine, set-up and (where known) what they are to make. Nothing of how the texts were made.
 * Out : findings, the figures of the cut wheel, and what could not be checked. 'unread' where a line could not be read
 *       for certain, 'refuse' where any check found an error.
 */
import { checkArcs } from './check-arcs.ts';
import { checkChip } from './check-chip.ts';
import { checkDepth } from './check-depth.ts';
import { checkEnd } from './check-end.ts';
import { checkEntry } from './check-entry.ts';
import { checkFast } from './check-fast.ts';
import { checkForm } from './check-form.ts';
import { checkLoose } from './check-loose.ts';
import { checkMissing } from './check-missing.ts';
import { checkObstacles } from './check-obstacles.ts';
import { checkOffset } from './check-offset.ts';
import { checkOrder } from './check-order.ts';
import { checkPlace } from './check-place.ts';
import { checkSpindle } from './check-spindle.ts';
import { checkStops } from './check-stops.ts';
import { checkTravel } from './check-travel.ts';
import { gatherEvidence, type Evidence } from './evidence.ts';
import { notChecked } from './not-checked.ts';
import type { Finding, Proof, ProofInput } from './proof.ts';
import { proofFigures } from './proof-figures.ts';
import { traceProgram, type Trace } from './trace-program.ts';

/** Every check, in the order its findings are given. */
const CHECKS: readonly ((evidence: Evidence) => readonly Finding[])[] = [
  checkMissing,
  checkForm,
  checkPlace,
  checkFast,
  checkEntry,
  checkObstacles,
  checkDepth,
  checkSpindle,
  checkStops,
  checkOffset,
  checkTravel,
  checkArcs,
  checkChip,
  checkLoose,
  checkOrder,
  checkEnd,
];

export function proveProgram(input: ProofInput): Proof {
  return proveTraces(
    input,
    input.programs.map(({ file, text }) => traceProgram(file, text, input.machine)),
  );
}

/** The same of programs that are read already; `named`: all that are spoken of together, in what was not checked. */
export function proveTraces(
  input: ProofInput,
  traces: readonly Trace[],
  named: readonly Trace[] = traces,
): Proof {
  const evidence = gatherEvidence(input, traces);
  const findings = [
    ...traces.flatMap((trace) => trace.findings),
    ...CHECKS.flatMap((check) => check(evidence)),
  ];
  const read = traces.every((trace) => trace.complete);
  const refused = findings.some(({ severity }) => severity === 'error');
  const figures = proofFigures(evidence);
  return {
    verdict: read ? (refused ? 'refuse' : 'pass') : 'unread',
    findings,
    notChecked: notChecked(evidence, named),
    moves: evidence.moves,
    blocks: traces.reduce((sum, trace) => sum + trace.blocks, 0),
    extents: evidence.extents,
    ...(figures === undefined ? {} : { figures }),
  };
}
