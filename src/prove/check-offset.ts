/**
 * Work offsets: the programs of one job must all count from one zero, since the metal carries over from one to the next. A
 * change within a program is refused by the reader.
 */
import type { Machine } from '../machine/machine.ts';
import type { Evidence } from './evidence.ts';
import { G_GROUP } from './modes-codes.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';

export function checkOffset({ input, traces }: Evidence): Finding[] {
  return offsetFindings(input.machine, traces);
}

/** Also asked of programs that are not proved together, as a walk-round and those it is to make safe. */
export function offsetFindings(machine: Machine, traces: readonly Trace[]): Finding[] {
  const ours = machine.words.positions.workOffset;
  const used = traces.filter(({ moves, finalModes }) => moves.length > 0 && finalModes.work !== undefined);
  // The zero that was touched off is the machine file's, where any of them uses it; else that of the first.
  const wanted = used.find(({ finalModes }) => finalModes.work === ours) ?? used[0];
  if (wanted === undefined) {
    return [];
  }
  const zero = wanted.finalModes.work ?? '';
  const strays = used.filter(({ finalModes }) => finalModes.work !== zero);
  if (strays.length > 0) {
    return strays.map((trace) => stray(trace, zero, wanted.file));
  }
  return zero === ours || ours === 'none' ? [] : [another(wanted, ours)];
}

function stray(trace: Trace, zero: string, file: string): Finding {
  return {
    code: 'prove.work-offset',
    severity: 'error',
    message: `${workOf(trace)} here, and ${zero} in ${file}: the wheel would be cut from two different zeros`,
    hint: `Use ${zero} in every program of the job.`,
    file: trace.file,
    line: lineOf(trace),
  };
}

function another(trace: Trace, ours: string): Finding {
  return {
    code: 'prove.work-offset',
    severity: 'warning',
    message: `the zero is that of ${workOf(trace)}; the machine file works from ${ours}`,
    hint: `See that zero is set in ${workOf(trace)}, or use ${ours}.`,
    file: trace.file,
    line: lineOf(trace),
  };
}

function workOf({ finalModes }: Trace): string {
  return finalModes.work ?? '';
}

function lineOf({ setAt }: Trace): number {
  return Math.max(1, setAt[G_GROUP.work] ?? 1);
}
