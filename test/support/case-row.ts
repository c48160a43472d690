/** One row of the table of conformance cases: lines put to the reader, and what must come of them. Numbers in mm. */
import { expect } from 'vitest';
import type { FinalModes } from '../../src/prove/modes.ts';
import { FIRST_LINE, movesOf, traceLines, type BenchProgram } from './bench-program.ts';
import { reportMill } from './report-mill.ts';

export interface CaseRow extends Omit<BenchProgram, 'lines'> {
  /** Number in the table of cases. */
  readonly n: number;
  /** Where NISTIR 6556 settles it, or which other source does. */
  readonly ref: string;
  /** Lines that are all read to the end. */
  readonly lines?: readonly string[];
  /** Ends of the moves, 'x y z', ? where unknown. */
  readonly ends?: readonly string[];
  readonly turns?: readonly number[];
  readonly feeds?: readonly (number | null)[];
  readonly events?: readonly string[];
  readonly warns?: string;
  /** Modes as the program leaves them. */
  readonly leaves?: Partial<FinalModes>;
  /** Lines at each of which the reader must stop, each put by itself behind `before`. */
  readonly wrong?: readonly string[];
  readonly before?: readonly string[];
  readonly code?: string;
  /** What the refusal must say. */
  readonly says?: RegExp;
  /** The report prescribes a meaning; this reader does not follow it and stops at the line. */
  readonly beyond?: string;
}

function endOf(to: { x: number | null; y: number | null; z: number | null }): string {
  return [to.x, to.y, to.z].map((v) => (v === null ? '?' : String(Number(v.toFixed(9))))).join(' ');
}

function eventText(event: ReturnType<typeof traceLines>['events'][number]): string {
  switch (event.kind) {
    case 'spindle':
      return `spindle ${String(event.speed)}`;
    case 'cutter':
      return `cutter ${String(event.number)}`;
    case 'dwell':
      return `dwell ${String(event.seconds)}`;
    case 'message':
      return `message ${event.text}`;
    default:
      return event.kind;
  }
}

export function expectRead(row: CaseRow): void {
  const trace = traceLines({ machine: reportMill(), ...row, lines: row.lines ?? [] });
  expect(trace.findings.map(({ code, message }) => (code === row.warns ? code : message))).toEqual(
    row.warns === undefined ? [] : [row.warns],
  );
  expect(trace.complete).toBe(true);
  const moves = movesOf(trace);
  if (row.ends !== undefined) {
    expect(moves.map((move) => endOf(move.to))).toEqual(row.ends);
  }
  row.turns?.forEach((turn, i) => expect(moves[i]?.turn).toBeCloseTo(turn, 3));
  row.feeds?.forEach((feed, i) => expect(moves[i]?.feed ?? null).toBe(feed));
  if (row.events !== undefined) {
    const events = trace.events.filter(
      ({ line, kind }) => line >= FIRST_LINE && kind !== 'end' && kind !== 'machine-place',
    );
    expect(events.map(eventText)).toEqual(row.events);
  }
  expect(trace.finalModes).toMatchObject(row.leaves ?? {});
}

/** The reader stops at the line, says so there, and does nothing of what follows. */
export function expectStop(row: CaseRow, line: string): void {
  const before = row.before ?? [];
  const trace = traceLines({ machine: reportMill(), ...row, lines: [...before, line, 'G0 X77'] });
  expect(trace.complete).toBe(false);
  const errors = trace.findings.filter(({ severity }) => severity === 'error');
  expect(errors.map(({ code, line: at }) => [code, at])).toEqual([
    [row.code ?? 'prove.unread', FIRST_LINE + before.length],
  ]);
  if (row.says !== undefined) {
    expect(errors[0]?.message).toMatch(row.says);
  }
  expect(trace.moves.some((move) => move.to.x === 77)).toBe(false);
}
