/**
 * Programs as somebody names them, in the order they are run: those that cut are held together against what they are to
 * make; one that never leaves the air, as the walk-round, is proved by itself and cuts no part of it.
 */
import { offsetFindings } from './check-offset.ts';
import type { Extents } from './extents.ts';
import type { Finding, Proof, ProofInput } from './proof.ts';
import { proveTraces } from './prove-program.ts';
import { timeReport, type TimeReport } from './time-report.ts';
import { traceProgram, type Trace } from './trace-program.ts';

export interface SetProof {
  readonly proof: Proof;
  /** How many of them cut. */
  readonly cutting: number;
  readonly walks: number;
  readonly time: TimeReport;
}

export function proveSet(input: ProofInput): SetProof {
  const traces = input.programs.map(({ file, text }) => traceProgram(file, text, input.machine));
  const walks = traces.filter(isWalk);
  const cutting = traces.filter((trace) => !isWalk(trace));
  const { target: _, ...bare } = input;
  const proofs = [
    ...(cutting.length > 0 ? [proveTraces(input, cutting, traces)] : []),
    ...walks.map((trace) => proveTraces(bare, [trace], traces)),
  ];
  const proof = withStrays(proofs.reduce(joined), strayWalks(input, cutting, walks));
  const time = timeReport(traces, input.machine, input.setup);
  return { proof, cutting: cutting.length, walks: walks.length, time };
}

/** A walk-round from another zero than the cuts shows nothing of where they go. */
function strayWalks({ machine }: ProofInput, cutting: readonly Trace[], walks: readonly Trace[]): Finding[] {
  return walks.flatMap((walk) =>
    offsetFindings(machine, [...cutting, walk]).filter(
      ({ severity, file }) => severity === 'error' && file === walk.file,
    ),
  );
}

function withStrays(proof: Proof, strays: readonly Finding[]): Proof {
  return strays.length === 0
    ? proof
    : {
        ...proof,
        verdict: proof.verdict === 'pass' ? 'refuse' : proof.verdict,
        findings: [...proof.findings, ...strays],
      };
}

/** Read to its end, and nothing in it moves but fast. */
function isWalk({ complete, moves }: Trace): boolean {
  return complete && moves.length > 0 && moves.every(({ kind }) => kind === 'rapid');
}

/** The first speaks for all of what was not checked: a walk-round leaves nothing open that a cut does not. */
function joined(one: Proof, other: Proof): Proof {
  return {
    ...one,
    verdict: [one, other].some(({ verdict }) => verdict === 'unread')
      ? 'unread'
      : other.verdict === 'pass'
        ? one.verdict
        : other.verdict,
    findings: [...one.findings, ...other.findings],
    moves: [...one.moves, ...other.moves],
    blocks: one.blocks + other.blocks,
    extents: wider(one.extents, other.extents),
  };
}

function wider(one: Extents, other: Extents): Extents {
  const both = (axis: 'x' | 'y' | 'z'): readonly [number, number] => [
    Math.min(one[axis][0], other[axis][0]),
    Math.max(one[axis][1], other[axis][1]),
  ];
  return { x: both('x'), y: both('y'), z: both('z') };
}
