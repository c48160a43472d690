/**
 * Lines that NISTIR 6556 calls errors, lines on which it is silent and controllers differ, and lines of the language that
 * this reader does not follow: at each of them it stops, with the line, rather than guess.
 */
import { describe, expect, it } from 'vitest';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { FIRST_LINE, post, traceLines, type BenchProgram } from '../support/bench-program.ts';

interface Row extends Partial<BenchProgram> {
  readonly ref: string;
  /** Each stands for the last of `before`'s lines plus this one. */
  readonly wrong: readonly string[];
  readonly before?: readonly string[];
  readonly code?: string;
}

const inch = { machine: post('inch-bench-mill'), modes: 'G20 G17 G40 G61 G90 G94 G54', feed: 'F10' };

const ERRORS: readonly Row[] = [
  { ref: '§3.3.2.1, App. E', wrong: ['G0 X.', 'G0 X--5', 'G0 X1e-3', 'G0 X1.2.3'] },
  { ref: '§3.3.1, six digits', wrong: ['N000009 G0 X1'] },
  { ref: '§3.3, §3.3.1', wrong: ['G1 N10 X1', 'N1.5 X1', 'N-1'] },
  { ref: '§3.3, / not first', wrong: ['N10 /G1 X1'] },
  { ref: '§3.3.4', wrong: ['(a (b) c)', 'G1 X1 (open', 'G1 X1 )'] },
  { ref: 'App. E.2', wrong: ['G0 X(note)1'] },
  { ref: 'App. E', wrong: ['G1 X1 ; note'] },
  { ref: '§3.3.5', wrong: ['G0 X1 X2', 'G1 G0 X1', 'G17 G18'] },
  { ref: '§3.3.5, §3.6.4', wrong: ['M3 M4', 'M7 M8', 'M0 M3 M6 M7 M48'] },
  { ref: 'App. E.3', wrong: ['O1000', 'U1', 'E1'] },
  { ref: '§3.3.2.1, whole number', wrong: ['G43 H1.001'] },
  { ref: '§3.3', wrong: ['G5', 'M47', 'G0 X1,5', 'G0 X#1', '"G0 X1"', 'G0 X\u22121', 'G0 X1\u00a0'] },
  { ref: '§3.5.15', before: ['G80'], wrong: ['X5'] },
  { ref: '§3.5.2', wrong: ['G1'] },
  { ref: '§3.3.5', wrong: ['T1 T2 M6'] },
  { ref: '§3.7.2, §3.7.3, §3.5.4', wrong: ['S-1', 'T-1', 'G4 P-1', 'T99999'] },
  { ref: '§3.5 intro', wrong: ['G4'] },
  { ref: '§3.4', wrong: ['G1 G28 X5'] },
  { ref: '§3.5.12', before: ['G80'], wrong: ['G53 X0', 'G53 G2 X1 Y0 I0.5'] },
  { ref: '§3.5.13', wrong: ['G59.4'] },
  { ref: '§3.5.3.2', code: 'prove.arc', wrong: ['G2 X10 Y0', 'G2 X10 Y0 I0 J0', 'G2 Z1 I5'] },
  { ref: '§3.5.3.2, no axis words', wrong: ['G2 I5'] },
  { ref: '§3.5.3.2, 0.0021 mm', code: 'prove.arc', wrong: ['G2 X10.0021 Y0 I5'] },
  { ref: '§3.5.3.2, 0.00021 in', code: 'prove.arc', wrong: ['G2 X1.00021 Y0 I0.5'], ...inch },
  { ref: '§3.5.3.1', code: 'prove.arc', wrong: ['G2 X10 Y0 R4.999', 'G2 X0 Y0 R5'] },
]; // prettier-ignore

const SILENT: readonly Row[] = [
  { ref: 'feed never given', feed: '', wrong: ['G1 X1'] },
  { ref: 'feed not above zero', wrong: ['F0 G1 X1', 'F-5'] },
  { ref: 'feed before its unit, Table 8', wrong: ['G20 G1 X1 F10'] },
  { ref: 'feed of the old unit', before: ['G20'], wrong: ['G1 X1'] },
  { ref: 'G53 in G91', before: ['G91'], wrong: ['G53 G0 Z0'] },
  { ref: 'zero radius', code: 'prove.arc', wrong: ['G2 X0 Y0 I0 J0'] },
  { ref: 'radius and centre', code: 'prove.arc', wrong: ['G2 X10 Y0 R6 I5'] },
  { ref: 'K in the XY plane', wrong: ['G2 X10 Y0 I5 K1'] },
  { ref: 'skip switch not said', wrong: ['/G0 X1'] },
  { ref: 'zero of another offset', wrong: ['G55'] },
  { ref: 'words that nothing uses', wrong: ['G0 X1 P2', 'H1', 'D3', 'G0 X1 Q1', 'I5', 'G1 X1 R5'] },
]; // prettier-ignore

/** Of the language, and not followed by this reader. */
const NOT_FOLLOWED: readonly Row[] = [
  { ref: '§3.5.5', wrong: ['G10 L2 P1 X5'] },
  { ref: '§3.5.10', wrong: ['G41 D1', 'G42'] },
  { ref: '§3.5.9', wrong: ['G38.2 Z-1'] },
  { ref: '§3.5.16', wrong: ['G81 X1 Y1 Z-1 R2', 'G82 X1 Z-1 R2 P0.5', 'G83 X1 Z-1 R2 Q0', 'G89 X1'] },
  { ref: '§3.5.18', wrong: ['G92 X7', 'G92', 'G92.1', 'G92.2', 'G92.3', 'G1 G92 X5'] },
  { ref: '§3.5.19', wrong: ['G93', 'G93 G1 X1 F2'] },
  { ref: '§3.3.3', wrong: ['#3=6 G1 X#3', '#3=15 #3=6', '#0=1', '#5400=1'] },
  { ref: '§3.3.2', wrong: ['X[2.0/3*1.5-5.5/11.0]', 'G[2*5] L[1+1] P1 X5', 'X[1+2', 'G0 X##2', 'G0 X[ATAN[1]/[1]]'] },
  { ref: '§3.6.1', wrong: ['M60'] },
  { ref: 'rotary words', wrong: ['A350', 'G1 A90 F360', 'G94 G1 X0.1 A36 F100'] },
  { ref: 'arcs outside XY', before: ['G18'], wrong: ['G2 X1 Z1 I1'] },
  { ref: 'subprograms', wrong: ['O100 sub', 'o<bore> call [1]', 'M98 P100'] },
]; // prettier-ignore

const all = (rows: readonly Row[]): [string, string, Row][] =>
  rows.flatMap((row) => row.wrong.map((line) => [line, row.ref, row] as [string, string, Row]));

function expectStop(line: string, row: Row): void {
  const before = row.before ?? [];
  const trace = traceLines({ ...row, lines: [...before, line, 'G0 X77'] });
  expect(trace.complete).toBe(false);
  const errors = trace.findings.filter((finding) => finding.severity === 'error');
  expect(errors.map(({ code, line: at }) => [code, at])).toEqual([
    [row.code ?? 'prove.unread', FIRST_LINE + before.length],
  ]);
  expect(trace.moves.some((move) => move.to.x === 77)).toBe(false);
}

describe('errors of the language', () => {
  it.each(all(ERRORS))('%s [NISTIR 6556 %s]', (line, _, row) => expectStop(line, row));
});

describe('where the report is silent or controllers differ', () => {
  it.each(all(SILENT))('%s [%s]', (line, _, row) => expectStop(line, row));
});

describe('what this reader does not follow', () => {
  it.each(all(NOT_FOLLOWED))('%s [NISTIR 6556 %s]', (line, _, row) => expectStop(line, row));
});

describe('modes that nothing has said', () => {
  const bench = post('bench-mill');
  it.each([
    ['unit', 'G17 G90 G94 G54', 'G0 X1'],
    ['distance', 'G21 G17 G94 G54', 'G0 X1'],
    ['feed mode', 'G21 G17 G90 G54', 'F100 G1 X1'],
    ['plane', 'G21 G90 G94 G54', 'G2 X1 Y0 I0.5'],
    ['motion', 'G21 G17 G90 G94 G54', 'X5'],
    ['cutter', 'G21 G17 G90 G94 G54', 'M6'],
  ])(
    '%s is refused at the line that needs it [NISTIR 6556 §3.4: defaults are not tabulated]',
    (_, modes, line) => {
      const place = line.startsWith('G2') ? 'G0 X0 Y0 F100' : '';
      const trace = traceProgram('m.ngc', ['%', modes, place, line, 'M2', '%'].join('\n'), bench);
      expect(trace.complete).toBe(false);
      expect(trace.findings.at(-1)).toMatchObject({ code: 'prove.unread', line: 4 });
    },
  );
});

describe('the form of the file', () => {
  const ends = (text: string): string[] =>
    traceProgram('f.ngc', text, post('bench-mill')).findings.map(({ code }) => code);
  it('wants the closing % after an opening one [NISTIR 6556 §3.1]', () => {
    expect(ends('%\nG21\nM2\n')).toEqual(['prove.end']);
    expect(ends('%\nG21\n')).toEqual(['prove.end']);
    expect(ends('%\nG21\n%\n')).toEqual([]);
  });
  it('wants an end without % too [NISTIR 6556 §3.1]', () => {
    expect(ends('G21\n')).toContain('prove.end');
    expect(ends('')).toContain('prove.end');
  });
  it('holds no more than the machine file says on a line [NISTIR 6556 §3.3]', () => {
    const machine = post('bench-mill');
    const wide = {
      ...machine,
      words: { ...machine.words, file: { ...machine.words.file, lineLongest: 256 } },
    };
    const line = (length: number): string => `(${'x'.repeat(length - 2)})`;
    expect(traceLines({ machine: wide, lines: [line(256)] }).findings).toEqual([]);
    expect(traceLines({ machine: wide, lines: [line(257)] }).findings.map(({ code }) => code)).toEqual([
      'prove.file',
    ]);
  });
  it('says on how many more lines it is so', () => {
    const found = traceLines({ lines: [`(${'x'.repeat(150)})`, `(${'x'.repeat(150)})`] }).findings;
    expect(found).toHaveLength(1);
    expect(found[0]?.message).toContain('1 more line)');
  });
});
