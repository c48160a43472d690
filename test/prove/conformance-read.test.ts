/**
 * Lines whose meaning NISTIR 6556 (The NIST RS274NGC Interpreter, Version 3, August 2000) settles, as the reader must take
 * them. Numbers in mm; each row says where the report settles it.
 */
import { describe, expect, it } from 'vitest';
import { movesOf, post, traceLines, type BenchProgram } from '../support/bench-program.ts';

interface Row extends BenchProgram {
  readonly ref: string;
  /** Ends of the moves, 'x y z', ? where unknown. */
  readonly ends?: readonly string[];
  readonly turns?: readonly number[];
  readonly feeds?: readonly (number | null)[];
  readonly events?: readonly string[];
  readonly warns?: string;
}

const HALF = Math.PI;
const inch = post('inch-bench-mill');

const ROWS: readonly Row[] = [
  // words
  { ref: '§3.3 p15', lines: ['g0x +0. 12 34y 7'], ends: ['0.1234 7 0'] },
  { ref: '§3.3.2.1', lines: ['G0 X.5', 'X5.', 'X+.5', 'X-0'], ends: ['0.5 0 0', '5 0 0', '0.5 0 0', '0 0 0'] },
  { ref: '§3.3.1', lines: ['N00010 G1 X1'], ends: ['1 0 0'] },
  { ref: '§2.2.2, switch on', lines: ['/N10 G1 X1', 'X2'], start: { skipSwitch: 'on' }, ends: ['2 0 0'] },
  { ref: '§2.2.2, switch off', lines: ['/N10 G1 X1', 'X2'], start: { skipSwitch: 'off' }, ends: ['1 0 0', '2 0 0'] },
  { ref: '§3.3.5', lines: ['G1 (a) X1 (b) Y2'], ends: ['1 2 0'] },
  { ref: '§3.3.4', lines: ['( M sg , CHANGE TOOL)'], events: ['message CHANGE TOOL'] },
  { ref: '§3.3.4', lines: ['(G1 X99)'], ends: [] },
  { ref: '§3.1', lines: ['M2', 'G0 X9'], ends: [], warns: 'prove.end' },
  { ref: '§3.1', lines: ['%', 'G0 X9', 'not a word'], ends: [], warns: 'prove.end' },
  { ref: '§3.6.4', lines: ['M7', 'M8'], ends: [] },
  { ref: '§3.3', lines: ['\tg1\tx1', '', '   ', 'Y2'], ends: ['1 0 0', '1 2 0'] },
  { ref: '§3.3.2.1', lines: ['G43 H1.00005', 'G0 Z5'], ends: ['0 0 5'] },
  // modes and order
  { ref: '§3.3.7', lines: ['G1 X1 F100', 'Y2'], ends: ['1 0 0', '1 2 0'], feeds: [100, 100] },
  { ref: '§3.5.15', lines: ['G80', 'G28 X0'], ends: ['? ? ?'] },
  { ref: 'Table 8 p41', lines: ['S500 M3', 'G1 X10 M5'], ends: ['10 0 0'], events: ['spindle 500', 'spindle 0'], warns: 'prove.ambiguous' },
  { ref: 'Table 8 p41', lines: ['G1 X10 M0', 'G0 Z50'], ends: ['10 0 0', '10 0 50'], events: ['stop'] },
  { ref: 'Table 8 p41', lines: ['T2 M6 G43 H2 S900 M3 M8 G0 Z5'], ends: ['0 0 5'], events: ['cutter 2', 'spindle 900'] },
  { ref: '§3.7.3', lines: ['T1', 'T3', 'M6'], events: ['cutter 3'] },
  { ref: '§3.6.3, last selected', lines: ['M6'], events: ['cutter 1'] },
  { ref: '§3.6.3', lines: ['S900 M3', 'T2 M6', 'G0 Y1'], ends: ['0 1 ?'], events: ['spindle 900', 'spindle 0', 'cutter 2'] },
  { ref: '§3.6.2', lines: ['M3 S0', 'S500'], events: ['spindle 0', 'spindle 500'] },
  { ref: 'Table 8, §3.5.4', lines: ['G1 X1', 'G4 P1 X5'], ends: ['1 0 0', '5 0 0'], events: ['dwell 1'], warns: 'prove.ambiguous' },
  { ref: '§3.5.4', lines: ['G4 P0.5'], events: ['dwell 0.5'] },
  // places
  { ref: '§2.1.2.10', at: 'X25.4 Y0 Z0', lines: ['G20', 'G0 X1 Y1'], ends: ['25.4 25.4 0'] },
  { ref: '§3.5.17', lines: ['G91 G1 X1', 'X1', 'G90 X0'], ends: ['1 0 0', '2 0 0', '0 0 0'] },
  { ref: '§3.5.17, ten steps', lines: ['G91 G1 X0.1', ...Array.from({ length: 9 }, () => 'X0.1')], ends: Array.from({ length: 10 }, (_, i) => `${String((i + 1) / 10)} 0 0`) },
  { ref: '§3.5.17', lines: ['G91 G2 X0 Y10 J5'], ends: ['0 10 0'], turns: [-HALF] },
  { ref: '§3.5.12', lines: ['G53 G0 Z0', 'Z10'], ends: ['0 0 ?', '0 0 10'] },
  { ref: '§3.5.8', lines: ['G91 G28 Z0'], ends: ['? ? ?'] },
  { ref: '§3.5.8', lines: ['G28 Z50'], ends: ['0 0 50', '? ? ?'] },
  { ref: '§3.5.13', modes: 'G21 G17 G40 G61 G90 G94 G59.3', lines: ['G0 X1'], ends: ['1 0 0'] },
  // feed
  { ref: '§2.1.2.5', machine: inch, modes: 'G20 G17 G40 G61 G90 G94 G54', feed: 'F10', lines: ['G1 X1'], ends: ['25.4 0 0'], feeds: [254] },
  // arcs
  { ref: '§3.5.3.2 p24', at: 'X7 Y7 Z0', lines: ['G17 G2 X10 Y16 I3 J4 Z9'], ends: ['10 16 9'], turns: [-(HALF / 2 + Math.asin(0.8))] },
  { ref: '§3.5.3.2', lines: ['G2 X0 Y0 I5'], ends: ['0 0 0'], turns: [-2 * HALF] },
  { ref: 'App. C.1', at: 'X57.5 Y0 Z0', lines: ['G2 X57.5 J2.5'], ends: ['57.5 0 0'], turns: [-2 * HALF] },
  { ref: '§3.5.3.2, 0.0019 mm', lines: ['G2 X10.0019 Y0 I5'], ends: ['10.0019 0 0'], turns: [-HALF] },
  { ref: '§3.5.3.2, 0.00019 in', modes: 'G20 G17 G40 G61 G90 G94 G54', feed: 'F10', machine: inch, lines: ['G2 X1.00019 Y0 I0.5'], ends: ['25.404826 0 0'], turns: [-HALF] },
  { ref: '§3.5.3.1, half by R', lines: ['G2 X10 Y0 R5'], ends: ['10 0 0'], turns: [-HALF], warns: 'prove.ambiguous' },
  { ref: '§3.5.3.1, long way', lines: ['G2 X10 Y0 R-6'], ends: ['10 0 0'], turns: [-(2 * HALF - 2 * Math.asin(5 / 6))] },
  { ref: '§3.5.3.1, short way', lines: ['G3 X10 Y0 R6'], ends: ['10 0 0'], turns: [2 * Math.asin(5 / 6)] },
]; // prettier-ignore

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

describe('what the reader takes as the report says', () => {
  it.each(ROWS.map((row) => [row.lines.join(' | '), row.ref, row] as const))(
    '%s [NISTIR 6556 %s]',
    (_, __, row) => {
      const trace = traceLines(row);
      expect(trace.findings.map((finding) => finding.code)).toEqual(
        row.warns === undefined ? [] : [row.warns],
      );
      expect(trace.complete).toBe(true);
      const moves = movesOf(trace);
      if (row.ends !== undefined) {
        expect(moves.map((move) => endOf(move.to))).toEqual(row.ends);
      }
      row.turns?.forEach((turn, i) => expect(moves[i]?.turn).toBeCloseTo(turn, 3));
      row.feeds?.forEach((feed, i) => expect(moves[i]?.feed).toBe(feed));
      if (row.events !== undefined) {
        const events = trace.events.filter(
          ({ line, kind }) => line > 5 && kind !== 'end' && kind !== 'machine-place',
        );
        expect(events.map(eventText)).toEqual(row.events);
      }
    },
  );

  it("gives the centre and the radius of the report's own arc [NISTIR 6556 §3.5.3.2 p24]", () => {
    const arc = movesOf(traceLines({ at: 'X7 Y7 Z0', lines: ['G17 G2 X10 Y16 I3 J4 Z9'] }))[0];
    expect(arc?.centre).toEqual({ x: 10, y: 11 });
  });
});
