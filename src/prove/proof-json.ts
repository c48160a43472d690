/** A proof as `ogive-proof/1`: plain JSON with lengths in mm, feeds in mm/min and times in s. */
import type { Machine } from '../machine/machine.ts';
import type { SetProof } from './prove-set.ts';
import type { TimeReport } from './time-report.ts';
import { roundingWords } from './time-words.ts';

export function proofJson(
  program: string,
  { proof, time }: SetProof,
  machine: Machine,
): Record<string, unknown> {
  const { acceleration, rapid, cornerAllowance } = machine.limits;
  return {
    format: 'ogive-proof/1',
    program,
    verdict: proof.verdict,
    blocks: proof.blocks,
    seconds: rounded(time.seconds),
    cuttingSeconds: rounded(time.feedSeconds),
    time: timeJson(time),
    machine: { name: machine.name, acceleration, rapid, cornerAllowance },
    extents: proof.extents,
    notChecked: proof.notChecked,
    findings: proof.findings,
  };
}

function timeJson(time: TimeReport): Record<string, unknown> {
  const { programs, passes, cutters, spent, feed, corners, rounding, changes, stops, unknown } = time;
  return roundedAll({
    programs,
    passes,
    cutters,
    spent,
    feed,
    corners,
    rounding: rounding.map((one) => ({ ...one, limit: one.limit ?? null, says: roundingWords(one) })),
    exactStop: time.exactStop,
    notCounted: { changes, stops, movesFromUnknownPlaces: unknown.moves, atMostSeconds: unknown.atMost },
  }) as Record<string, unknown>;
}

/** Every number in it to five decimals. */
function roundedAll(value: unknown): unknown {
  if (typeof value === 'number') {
    return rounded(value);
  }
  if (Array.isArray(value)) {
    return value.map(roundedAll);
  }
  return typeof value === 'object' && value !== null
    ? Object.fromEntries(Object.entries(value).map(([key, own]) => [key, roundedAll(own)]))
    : value;
}

/** A hundredth of a ms, of a mm/min: a thousandth of the shortest move that anybody times. */
function rounded(value: number): number {
  return Math.round(value * 1e5) / 1e5;
}
