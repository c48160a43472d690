/** A proof as `ogive-proof/1`: plain JSON with lengths in mm and times in s. */
import type { Machine } from '../machine/machine.ts';
import { timeMoves } from '../motion/move-time.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Proof } from './proof.ts';

export function proofJson(program: string, proof: Proof, machine: Machine): Record<string, unknown> {
  const { acceleration, rapid, cornerAllowance } = machine.limits;
  const known = proof.moves.flatMap(knownMove);
  const times = timeMoves(known, machine.limits);
  const cutting = times.seconds.reduce(
    (sum, seconds, i) => (known[i]?.kind === 'rapid' ? sum : sum + seconds),
    0,
  );
  return {
    format: 'ogive-proof/1',
    program,
    verdict: proof.verdict,
    blocks: proof.blocks,
    seconds: hundredths(times.total),
    cuttingSeconds: hundredths(cutting),
    machine: { name: machine.name, acceleration, rapid, cornerAllowance },
    extents: proof.extents,
    notChecked: proof.notChecked,
    findings: proof.findings,
  };
}

function hundredths(seconds: number): number {
  return Math.round(seconds * 100) / 100;
}

/** A move of which every place is known; others take a time nobody can tell. */
function knownMove(move: TracedMove): Parameters<typeof timeMoves>[0][number][] {
  const { from, to, kind, feed, centre, turn } = move;
  if (
    from.x === null ||
    from.y === null ||
    from.z === null ||
    to.x === null ||
    to.y === null ||
    to.z === null
  ) {
    return [];
  }
  return [
    {
      kind,
      from: { x: from.x, y: from.y, z: from.z },
      to: { x: to.x, y: to.y, z: to.z },
      feed: feed ?? 0,
      centre,
      turn,
    },
  ];
}
