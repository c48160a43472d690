/**
 * What reading a program keeps while it goes through the lines, and what it hands out: moves, events, findings.
 *
 * Frame: the program's; mm, mm/min, 1/min (clockwise positive), s.
 */
import type { Machine } from '../machine/machine.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { CheckCode } from './check-codes.ts';
import type { Codes } from './modes-codes.ts';
import { spindleOf, type Here, type ModalState } from './modes.ts';
import type { Parameters } from './parameters.ts';
import type { Finding } from './proof.ts';
import type { CycleSeries } from './trace-cycle.ts';

export type AxisName = 'x' | 'y' | 'z';

/** What happens between moves. `before` is the index of the move that follows. */
export type TracedEvent = { readonly line: number; readonly before: number } & (
  | { readonly kind: 'spindle'; /** 1/min, signed; 0 still. */ readonly speed: number }
  | { readonly kind: 'cutter'; readonly number: number }
  /** `optional`: M1, which stops only where a switch says so. */
  | { readonly kind: 'stop'; readonly optional: boolean }
  | { readonly kind: 'dwell'; readonly seconds: number }
  /** The axes went to a place of the machine: its home, or `place` in its own coordinates. The move before made the way. */
  | {
      readonly kind: 'machine-place';
      readonly axes: readonly AxisName[];
      readonly place?: { readonly x?: number; readonly y?: number; readonly z?: number };
    }
  /** A comment that is shown to the operator. */
  | { readonly kind: 'message'; readonly text: string }
  | { readonly kind: 'end'; readonly word: 'M2' | 'M30' | '%' }
);

export type EventBody = TracedEvent extends infer E
  ? E extends unknown
    ? Omit<E, 'line' | 'before'>
    : never
  : never;

/** A comment that stands alone, as a heading does; of several before the same move the last. */
export interface Title {
  readonly line: number;
  /** Index of the move that follows. */
  readonly before: number;
  readonly text: string;
}

/** How the path is to be followed from a move on. */
export interface PathMode {
  readonly before: number;
  /** 'G61', 'G64', ... */
  readonly word: string;
  /** How far it may be left, where the program says so with P, mm. */
  readonly tolerance: number | undefined;
}

/** Why the reader stops at a line. */
export interface Refusal {
  readonly code: CheckCode;
  readonly message: string;
}

/** Which program of how many this is, and the line that says so. */
export interface Part {
  readonly number: number;
  readonly of: number;
  readonly line: number;
}

export interface Shift {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export const NO_SHIFT: Shift = { x: 0, y: 0, z: 0 };

export interface Run {
  readonly file: string;
  readonly machine: Machine;
  readonly codes: Codes;
  readonly modes: ModalState;
  here: Here;
  line: number;
  /** Where a comment at its head tells. */
  part: Part | undefined;
  /** Where the zero that the program counts from lies in its frame, mm: not at its zero once G92 has shifted it. */
  shift: Shift;
  /** What G92.3 would bring back; undefined while this program has not said it. */
  keptShift: Shift | undefined;
  /** Axes, as bits of their letters, whose zero G10 has put where nobody knows. */
  lost: number;
  /** The series of holes that is on. */
  cycle: CycleSeries | undefined;
  readonly parameters: Parameters;
  /** Moves that cycles and chords have made, at most. */
  made: number;
  /** A place in the program's own frame has been named. */
  placed: boolean;
  /** By modal group of G codes: the line that last set it, 1-based; 0 where none has. */
  readonly setAt: number[];
  /** Modes that no move has hung on yet, as bits of their groups. */
  unasked: number;
  /** It has been said that a move hangs on a length that is not on. */
  lengthAsked: boolean;
  readonly moves: TracedMove[];
  readonly events: TracedEvent[];
  readonly titles: Title[];
  readonly paths: PathMode[];
  readonly findings: Finding[];
  /** By kind of remark: which finding says it, and on how many more lines it was met. */
  readonly remarks: Map<string, { readonly at: number; more: number }>;
}

export function unread(message: string): Refusal {
  return { code: 'prove.unread', message };
}

export function badArc(message: string): Refusal {
  return { code: 'prove.arc', message };
}

export function happen(run: Run, body: EventBody): void {
  run.events.push({ line: run.line, before: run.moves.length, ...body });
}

/** A finding that doesn't stop the reader: said at its first line, and counted after. */
export function remark(
  run: Run,
  code: CheckCode,
  severity: Finding['severity'],
  message: string,
  kind: string = code,
): void {
  const known = run.remarks.get(kind);
  if (known !== undefined) {
    known.more += 1;
    return;
  }
  run.remarks.set(kind, { at: run.findings.length, more: 0 });
  run.findings.push({ code, severity, message, file: run.file, line: run.line });
}

/** Adds to each remark on how many more lines it holds. */
export function countRemarks(run: Run): void {
  for (const { at, more } of run.remarks.values()) {
    const finding = run.findings[at];
    if (more > 0 && finding !== undefined) {
      const message = `${finding.message} (and on ${String(more)} more line${more === 1 ? '' : 's'})`;
      run.findings[at] = { ...finding, message };
    }
  }
}

/** Whether Z of the program is Z of the cutter's tip. */
export function isLengthKnown(run: Run): boolean {
  return (
    run.machine.words.cutters.lengthOffset !== 'G43-H' ||
    (run.modes.cutter !== null && run.modes.length === run.modes.cutter)
  );
}

/** Writes the move down and stands at its end. */
export function makeMove(run: Run, kind: 'rapid' | 'line', to: Here, feed: number | null): void {
  const { file, line, here, modes } = run;
  run.moves.push({ file, line, kind, from: here, to, feed, cutter: modes.cutter, spindle: spindleOf(modes) });
  run.here = to;
}
