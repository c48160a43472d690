/**
 * Beside the table of cases (cases-112.test.ts): lines that NISTIR 6556 calls errors, lines on which it is silent and
 * controllers differ, and lines of the language that a machine file does not have. At each of them it stops, with the line,
 * rather than guess.
 */
import { describe, expect, it } from 'vitest';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { plainMill } from '../support/report-mill.ts';
import { FIRST_LINE, post, traceLines, type BenchProgram } from '../support/bench-program.ts';

interface Row extends Partial<BenchProgram> {
  readonly ref: string;
  /** Each stands for the last of `before`'s lines plus this one. */
  readonly wrong: readonly string[];
  readonly before?: readonly string[];
  readonly code?: string;
}

const ERRORS: readonly Row[] = [
  { ref: '§3.3', wrong: ['G0 X1,5', '"G0 X1"', 'G0 X\u22121', 'G0 X1\u00a0'] },
  { ref: '§3.5.2', wrong: ['G0', 'G2'] },
]; // prettier-ignore

const SILENT: readonly Row[] = [
  { ref: 'skip switch not said', wrong: ['/G0 X1'] },
  { ref: 'zero of another offset', wrong: ['G55'] },
  { ref: 'words that nothing uses', wrong: ['G0 X1 P2', 'H1', 'D3', 'G0 X1 Q1', 'I5', 'G1 X1 R5'] },
]; // prettier-ignore

/** Of the language, and of many controllers, but not of one whose machine file has none of it. */
const NOT_THERE: readonly Row[] = [
  { ref: '§3.5.5', wrong: ['G10 L2 P1 X5'] },
  { ref: '§3.5.9', wrong: ['G38.2 Z-1'] },
  { ref: '§3.5.16', wrong: ['G81 X1 Y1 Z-1 R2', 'G82 X1 Z-1 R2 P0.5', 'G83 X1 Z-1 R2 Q1', 'G87 X1', 'G89 X1'] },
  { ref: '§3.5.18', wrong: ['G92 X7', 'G92', 'G92.1', 'G92.2', 'G92.3'] },
  { ref: '§3.5.19', wrong: ['G93', 'G93 G1 X1 F2'] },
  { ref: '§3.3.3', wrong: ['#3=6 G1 X#3', '#3=15 #3=6'] },
  { ref: '§3.3.2', wrong: ['G0 X[2.0/3*1.5-5.5/11.0]', 'G[2*5] L[1+1] P1 X5', 'G0 X##2', 'G0 X[ATAN[1]/[1]]'] },
  { ref: '§3.6.1', wrong: ['M60'] },
  { ref: 'subprograms', wrong: ['O100 sub', 'o<bore> call [1]', 'M98 P100'] },
].map((row) => ({ ...row, machine: plainMill() })); // prettier-ignore

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

describe('what a machine does not have', () => {
  it.each(all(NOT_THERE))('%s [NISTIR 6556 %s]', (line, _, row) => expectStop(line, row));
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
  it('says on how many more lines it is so', () => {
    const found = traceLines({ lines: [`(${'x'.repeat(150)})`, `(${'x'.repeat(150)})`] }).findings;
    expect(found).toHaveLength(1);
    expect(found[0]?.message).toContain('1 more line)');
  });
});
