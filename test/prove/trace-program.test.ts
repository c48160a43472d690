/** The reader's plain programs: what a bench mill of RS274/NGC would do. */
import { describe, expect, it } from 'vitest';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { readPost } from '../machine/read-posts.ts';
import { post } from '../support/bench-program.ts';

const bench = readPost('bench-mill');

describe('a plain program', () => {
  if (!bench.ok) {
    throw new Error(JSON.stringify(bench.problems));
  }
  const lines = [
    '%',
    'G21 G17 G40 G61 G90 G94 G54',
    'T1 M6',
    'G43 H1',
    'S1000',
    'M3',
    'G0 X0 Y0',
    'Z5',
    'G1 Z-1 F100',
  ];
  const end = ['M5', 'G53 G0 Z0', 'M2', '%'];
  const trace = traceProgram('p.nc', [...lines, 'G2 X10 Y0 I5', ...end].join('\n'), bench.value);

  it('gives every move with place, feed, cutter and spindle [NISTIR 6556 §3.5.1 to §3.5.3]', () => {
    expect(trace.findings).toEqual([]);
    expect(trace.complete).toBe(true);
    expect(trace.moves.map(({ line, kind, to }) => [line, kind, to.x, to.y, to.z])).toEqual([
      [7, 'rapid', 0, 0, null],
      [8, 'rapid', 0, 0, 5],
      [9, 'line', 0, 0, -1],
      [10, 'arc', 10, 0, -1],
      [12, 'rapid', 10, 0, null],
    ]);
    expect(trace.moves[3]).toMatchObject({
      centre: { x: 5, y: 0 },
      turn: -Math.PI,
      feed: 100,
      cutter: 1,
      spindle: 1000,
    });
  });

  it('gives what happens between the moves, in order', () => {
    expect(trace.events.map(({ kind, line, before }) => [kind, line, before])).toEqual([
      ['cutter', 3, 0],
      ['spindle', 6, 0],
      ['spindle', 11, 4],
      ['machine-place', 12, 5],
      ['end', 13, 5],
    ]);
  });
});

describe('what hands do, said in comments', () => {
  const cuttersOf = (machine: string, lines: readonly string[]): (number | null)[] =>
    traceProgram('h', lines.join('\n'), post(machine)).moves.map(({ cutter }) => cutter);

  it('holds at once where one program runs for one cutter, the last word before anything moves', () => {
    const lines = ['(CUTTER 5)', '(CUTTER 2)', 'G90 G21 G54', 'G0 X1', '(CUTTER 7)', 'X2', 'M2'];
    expect(cuttersOf('desk-three-axis', lines)).toEqual([2, 2]);
  });

  it('holds from the stop for hands, if nothing moves before it', () => {
    const lines = [
      '%1',
      '(CUTTER 3)',
      'N1 G71',
      'N2 G90',
      'N3 G54',
      'N4 M00',
      'N5 G00 X1.',
      '(CUTTER 9)',
      'N6 X2.',
      'N7 M00',
      'N8 X3.',
      'N9 M30',
      '%',
    ];
    expect(cuttersOf('din-66025', lines)).toEqual([3, 3, 3]);
  });

  it('sets the speed where hands do', () => {
    const lines = [
      ';SET THE SPINDLE TO 12000 TURNS A MINUTE',
      'M00',
      'G90',
      'G21',
      'G00X1.',
      ';SWITCH THE SPINDLE OFF',
      'M00',
      'X2.',
      'M02',
    ];
    const trace = traceProgram('h', lines.join('\n'), post('lines-only'));
    expect(trace.findings).toEqual([]);
    expect(trace.moves.map(({ spindle }) => spindle)).toEqual([12000, 0]);
  });
});
