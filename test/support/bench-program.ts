/** A program for the bench mill round some lines of interest: modes, cutter 1 with its length, feed, a place to start from. */
import { traceProgram, type Trace, type TraceStart } from '../../src/prove/trace-program.ts';
import type { Machine } from '../../src/machine/machine.ts';
import { readPost } from '../machine/read-posts.ts';

export function post(name: string): Machine {
  const read = readPost(name);
  if (!read.ok) {
    throw new Error(`posts/${name}.yaml: ${JSON.stringify(read.problems)}`);
  }
  return read.value;
}

/** The line number that the first of the lines gets. */
export const FIRST_LINE = 6;

export interface BenchProgram {
  readonly lines: readonly string[];
  /** Where it stands before the first of them. */
  readonly at?: string;
  /** Words in place of `G21 G17 G40 G61 G90 G94 G54`. */
  readonly modes?: string;
  readonly feed?: string;
  readonly machine?: Machine;
  readonly start?: TraceStart;
}

export function traceLines({ lines, at, modes, feed, machine, start }: BenchProgram): Trace {
  const read = machine ?? post('bench-mill');
  const text = [
    '%',
    modes ?? 'G21 G17 G40 G61 G90 G94 G54',
    'T1 M6',
    `G43 H1 ${feed ?? 'F100'}`,
    `G0 ${at ?? 'X0 Y0 Z0'}`,
    ...lines,
    read.words.end.end,
    '%',
  ];
  return traceProgram('case.ngc', text.join('\n'), read, start);
}

/** The moves of the lines of interest. */
export function movesOf(trace: Trace): Trace['moves'] {
  return trace.moves.filter((move) => move.line >= FIRST_LINE);
}
