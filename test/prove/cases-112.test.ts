/**
 * The 112 cases of the project's table of conformance, each with its reference in NISTIR 6556 (The NIST RS274NGC Interpreter,
 * Version 3, August 2000) or the source that settles it: what the report prescribes is done, what it calls an error stops the
 * reader at that line, and so does what it is silent about.
 */
import { describe, expect, it } from 'vitest';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { movesOf, post, traceLines } from '../support/bench-program.ts';
import { expectRead, expectStop, type CaseRow } from '../support/case-row.ts';
import { reportMill } from '../support/report-mill.ts';
import { ARCS } from './cases/arcs.ts';
import { COMPENSATION } from './cases/compensation.ts';
import { FEED } from './cases/feed.ts';
import { HOLES } from './cases/holes.ts';
import { MODES } from './cases/modes.ts';
import { PARAMETERS } from './cases/parameters.ts';
import { PLACES } from './cases/places.ts';
import { SYNTAX } from './cases/syntax.ts';

const TABLE: readonly CaseRow[] = [
  ...SYNTAX, ...MODES, ...PLACES, ...FEED, ...ARCS, ...HOLES, ...COMPENSATION, ...PARAMETERS,
]; // prettier-ignore

/** Prescribed by the report, and beyond this reader: it stops at the line. */
const BEYOND = [28, 45, 58, 65, 66, 97, 98, 99];

describe('read as the report prescribes', () => {
  it.each(
    TABLE.flatMap((row) =>
      row.lines === undefined ? [] : [[row.n, row.lines.join(' | '), row.ref, row] as const],
    ),
  )('case %i: %s [NISTIR 6556 %s]', (_, __, ___, row) => expectRead(row));
});

describe('refused at the line', () => {
  it.each(TABLE.flatMap((row) => (row.wrong ?? []).map((line) => [row.n, line, row.ref, row] as const)))(
    'case %i: %s [NISTIR 6556 %s]',
    (_, line, __, row) => expectStop(row, line),
  );
});

const codes = (text: string): string[] =>
  traceProgram('f.ngc', text, post('bench-mill')).findings.map(({ code }) => code);

it('case 15: % first and no second one [NISTIR 6556 §3.1]', () => {
  expect(codes('%\nG21\nM2\n')).toEqual(['prove.end']);
  expect(codes('%\nG21\n')).toEqual(['prove.end']);
  expect(codes('%\nG21\n%\n')).toEqual([]);
});

it('case 16: neither % nor M2 nor M30 [NISTIR 6556 §3.1]', () => {
  expect(codes('G21\n')).toContain('prove.end');
  expect(codes('')).toContain('prove.end');
});

it("case 68: centre and radius of the report's own arc [NISTIR 6556 §3.5.3.2 p24]", () => {
  const arc = movesOf(traceLines({ at: 'X7 Y7 Z0', lines: ['G17 G2 X10 Y16 I3 J4 Z9'] }))[0];
  expect(arc?.centre).toEqual({ x: 10, y: 11 });
});

it('case 51: G92 takes a centre that is counted from zero with it, the same words twice [NISTIR 6556 §3.5.18]', () => {
  const mill = reportMill();
  const arcs = { ...mill.words.arcs, centre: 'from-zero' } as const;
  const machine = { ...mill, words: { ...mill.words, arcs } };
  const half = 'G3 Y10 I0 J5';
  const trace = traceLines({ machine, lines: [half, 'G0 Y0', 'G92 X1', half, 'G92.1'] });
  expect(trace.findings).toEqual([]);
  const centres = movesOf(trace).flatMap(({ centre }) => (centre === undefined ? [] : [centre]));
  expect(centres).toEqual([
    { x: 0, y: 5 },
    { x: -1, y: 5 },
  ]);
});

describe('case 82: clockwise in XZ is as seen from the plus end of Y [NISTIR 6556 §3.5.3]', () => {
  // From Z to X is counter-clockwise from there: a quarter about (1, 0) from (0, 0) to (1, 1) goes by (0.29, 0.71).
  const [near, far] = [1 - Math.SQRT1_2, 1 + Math.SQRT1_2];
  it.each([
    ['G3 X1 Z1 I1', near, 0, Math.SQRT1_2],
    ['G3 X1 Z1 R1', near, 0, Math.SQRT1_2],
    ['G2 X1 Z1 R-1', far, 0, -Math.SQRT1_2],
    ['G2 X1 Z1 I1 Y2', far, 1, -Math.SQRT1_2],
  ])('%s', (words, x, y, z) => {
    const trace = traceLines({ machine: reportMill(), lines: ['G18', words] });
    expect(trace.findings).toEqual([]);
    const moves = movesOf(trace);
    for (const { from, to, kind, feed } of moves) {
      expect([kind, feed]).toEqual(['line', 100]);
      expect(Math.hypot((to.x ?? 0) - 1, to.z ?? 0)).toBeCloseTo(1, 9);
      const sag = 1 - Math.hypot(((from.x ?? 0) + (to.x ?? 0)) / 2 - 1, ((from.z ?? 0) + (to.z ?? 0)) / 2);
      expect(sag).toBeLessThan(1.01e-4);
    }
    expect(moves.at(-1)?.to).toMatchObject({ x: 1, z: 1 });
    const miss = moves.map(({ to }) => Math.hypot((to.x ?? 0) - x, (to.y ?? 0) - y, (to.z ?? 0) - z));
    expect(Math.min(...miss)).toBeLessThan(0.02);
  });

  it('and in YZ from the plus end of X', () => {
    const trace = traceLines({ machine: reportMill(), lines: ['G19', 'G3 Y1 Z1 K1'] });
    const miss = movesOf(trace).map(({ to }) => Math.hypot((to.y ?? 0) - Math.SQRT1_2, (to.z ?? 0) - near));
    expect(Math.min(...miss)).toBeLessThan(0.02);
    expectStop({ n: 82, ref: '', before: ['G19'] }, 'G2 Y1 Z1 I1');
  });
  it('is bounded', () => {
    const before = ['G18', ...Array.from({ length: 99 }, () => 'G3 X0 Z0 I9000')];
    expectStop({ n: 82, ref: '', before: ['G18'], says: /chords/ }, 'G3 X0 Z0 I9000');
    const many = traceLines({
      machine: reportMill(),
      lines: before.map((line) => line.replace('9000', '2000')),
    });
    expect(many.complete).toBe(false);
    expect(many.findings.at(-1)?.message).toMatch(/of a program/);
  });
});

it('case 34: M6 before any T; the report is silent [NISTIR 6556 §3.6.3]', () => {
  const trace = traceProgram('t.ngc', '%\nG21\nM6\nM2\n%\n', post('bench-mill'));
  expect(trace.complete).toBe(false);
  expect(trace.findings.at(-1)).toMatchObject({ code: 'prove.unread', line: 3 });
});

it('holds every case of the table', () => {
  const held = new Set([...TABLE.map(({ n }) => n), 15, 16]);
  expect(Array.from({ length: 112 }, (_, i) => i + 1).filter((n) => !held.has(n))).toEqual([]);
});

it('says which cases are beyond this reader, and no more of them', () => {
  expect(TABLE.filter(({ beyond }) => beyond !== undefined).map(({ n }) => n)).toEqual(BEYOND);
});
