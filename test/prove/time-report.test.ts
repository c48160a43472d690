/** The time of programs as text: sums, where it goes, what is not known. Expected values by the closed forms of constant acceleration. */
import { readdirSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { Machine } from '../../src/machine/machine.ts';
import type { TracedMove } from '../../src/motion/traced-move.ts';
import { headingOf } from '../../src/prove/time-passes.ts';
import { timeReport, type TimeReport } from '../../src/prove/time-report.ts';
import { timeWords } from '../../src/prove/time-words.ts';
import { traceProgram, type Trace } from '../../src/prove/trace-program.ts';
import { SETUP } from '../support/good-program.ts';
import { MACHINE_NAMES, postMachine } from '../support/post-machines.ts';
import { stepAlong, type ChainMove } from '../support/step-along.ts';

const GOLDEN = resolve(import.meta.dirname, '../golden');

/** Accelerations 500 and 300 mm/s2, rapids 4000 and 3000 mm/min, corner allowance 0.005 mm; under G61 unless told otherwise. */
const bench: Machine = { ...postMachine('bench-mill') };
const still: Machine = { ...bench, limits: { ...bench.limits, blockSeconds: 0 } };

const HEAD = ['G21 G17 G40 G49 G61 G80 G90 G94', 'T1 M6', 'G43 H1', 'G0 X0 Y0 Z5'];

function reportOf(lines: readonly string[], machine = still, head: readonly string[] = HEAD): TimeReport {
  const text = `%\n${[...head, ...lines, 'M2', '%'].join('\n')}\n`;
  const trace = traceProgram('hand.ngc', text, machine);
  expect(trace.complete, JSON.stringify(trace.findings)).toBe(true);
  return timeReport([trace], machine, SETUP);
}

/** The line of `lines` in the program, 1-based. */
function lineOf(k: number): number {
  return 2 + HEAD.length + k;
}

/** Stop to stop. */
function alone(length: number, feed: number, a: number): number {
  const v = feed / 60;
  return length >= (v * v) / a ? length / v + v / a : 2 * Math.sqrt(length / a);
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}

describe('the time of a program', () => {
  it('is that of its moves, stop to stop [t = L/v + v/a]', () => {
    const report = reportOf(['G1 Z-1 F120', 'G4 P1', 'G1 X10 F600', 'G4 P2', 'G0 Z5']);
    const [down, along, up] = [alone(6, 120, 300), alone(10, 600, 500), alone(6, 3000, 300)];
    expect(report.seconds).toBeCloseTo(down + along + up + 3, 9);
    expect(report.feedSeconds).toBeCloseTo(down + along, 9);
    expect(report.spent.dwells).toBe(3);
    expect(report.spent.air).toBeCloseTo(up, 9);
    expect(report.spent.cutting).toBeCloseTo(3 + 1, 9);
    expect(report.spent.corners).toBeCloseTo(down + along - 4, 9);
  });

  it('knows a wait for the spindle from another wait', () => {
    const { spent } = reportOf(['S12000', 'M3', 'G4 P4', 'G4 P1', 'G1 X10 Z-1 F600', 'M5', 'G4 P2']);
    expect([spent.spinUp, spent.dwells]).toEqual([4, 3]);
  });

  it('tells an arc that is too tight from a corner [v = sqrt(a R)]', () => {
    const round = ['G1 X1 Z-1 F1500', ...Array.from({ length: 40 }, () => 'G3 X1 Y0 I-0.2')];
    const { spent, feed } = reportOf(round);
    const length = 40 * 2 * Math.PI * 0.2;
    expect(spent.limits).toBeCloseTo(length / Math.sqrt(500 * 0.2) - length / 25, 2);
    expect(feed.short).toBeGreaterThan(0.9);
  });

  it('counts what the controller reads longer than it moves', () => {
    const steps = Array.from({ length: 100 }, (_, k) => `X${((k + 1) * 0.01).toFixed(2)}`);
    const slow = { ...still, limits: { ...still.limits, blockSeconds: 0.05 } };
    const report = reportOf(['G1 Z-1 F600', 'G4 P0', ...steps], slow);
    expect(report.seconds - alone(6, 600, 300)).toBeCloseTo(100 * 0.05, 3);
    expect(report.spent.reading).toBeGreaterThan(4);
    expect(report.feed.worst?.reached).toBeCloseTo((0.01 / 0.05) * 60, 3);
  });

  it('stands still at the end of every block under exact stop', () => {
    const lines = ['G1 Z-1 F600', 'G4 P0', 'X10', 'X20', 'X30'];
    const through = reportOf(lines).seconds;
    const report = reportOf(['G61.1', ...lines]);
    expect(report.exactStop).toBe(true);
    expect(report.seconds - through).toBeCloseTo(2 * (10 / 500), 9);
    expect(timeWords(report).join('\n')).toMatch(/stands still at the end of every block/);
  });

  it('leaves out moves whose length nobody knows, and says how many and at most how long', () => {
    const { unknown, seconds } = reportOf([]);
    expect(seconds).toBe(0);
    expect(unknown).toMatchObject({ moves: 1, file: 'hand.ngc', line: 5 });
    // X is the longest way: 300 mm at 4000 mm/min, from rest to rest.
    expect(unknown.atMost).toBeCloseTo(alone(300, 4000, 500), 9);
    const words = timeWords(reportOf(['G53 G0 Z0', 'G0 X10', 'G1 Z-1 F100'])).join('\n');
    expect(words).toMatch(
      /3 moves from or to a place that the program does not tell, first at hand\.ngc:5; at most/,
    );
  });

  it('times a move of X while only the height is unknown', () => {
    expect(reportOf(['G53 G0 Z0', 'G0 X100']).seconds).toBeCloseTo(alone(100, 4000, 500), 9);
  });

  it('of one that was not read to its end is told as far as it was', () => {
    const trace = traceProgram('cut.ngc', ['%', ...HEAD, 'G1 X10 Z-1 F600', 'G1 Q5'].join('\n'), still);
    const [takes] = timeWords(timeReport([trace], still, SETUP));
    expect(takes).toMatch(/^Takes \S+ s as far as it was read: cutter 1/);
  });

  it('of nothing at all is nothing', () => {
    const report = reportOf([], still, []);
    expect(report.seconds).toBe(0);
    expect(timeWords(report)).toEqual(['Takes 0 s.']);
  });
});

describe('changes of cutter', () => {
  const two = [
    'G1 X10 Z-1 F600',
    'G4 P0',
    'G0 Z5',
    'M0',
    'T2 M6',
    'G43 H2',
    'G0 X0',
    'G0 Z5',
    'G1 X10 Z-1 F600',
  ];

  it('are counted, the ways to and from them summed, and the first cutter is none', () => {
    const report = reportOf(two);
    expect([report.changes, report.stops]).toEqual([1, 1]);
    expect(report.spent.changes).toBeCloseTo(alone(6, 3000, 300) + alone(10, 4000, 500), 9);
    expect(report.cutters.map(({ cutter }) => cutter)).toEqual([1, 2]);
    expect(timeWords(report).join('\n')).toMatch(
      /Not counted: how long 1 change of cutter and 1 stop for hands take/,
    );
  });
});

describe('passes', () => {
  it.each([
    ['Roughing, lap 3 of 12, down to height -0.3600 mm, tooth 5', 'Roughing'],
    ['CROSSING 2 FINISHING, LAP 1 OF 1', 'CROSSING FINISHING'],
    ['Tooth 5 of 60', 'Tooth'],
    ['tooth #5/60:', 'tooth'],
    ['MSG, change the cutter', 'change the cutter'],
    ['0.8 mm end mill', '0.8 mm end mill'],
    ['12', undefined],
    ['----', undefined],
    ['a\u0007b\u202ec', 'a b c'],
  ])('%j heads %j', (comment, name) => {
    expect(headingOf(comment)).toBe(name);
  });

  it('are headed by comments that stand alone, and the way to a pass counts with it', () => {
    const { passes } = reportOf([
      '(Bore, lap 1)',
      'G0 X10',
      'G1 Z-1 F600 (a remark)',
      '(Bore, lap 2)',
      'X20',
      '(Teeth)',
      'G0 Z5',
      'G0 X0',
      'G1 Z-1',
    ]);
    expect(passes.map(({ name, line }) => [name, line])).toEqual([
      ['Bore', lineOf(0)],
      ['Teeth', lineOf(5)],
    ]);
    expect(passes[1]!.seconds).toBeCloseTo(
      alone(6, 3000, 300) + alone(20, 4000, 500) + alone(6, 600, 300),
      1,
    );
  });

  it('are cutters where no comment heads anything, or too many do', () => {
    const plain = ['G1 X10 Z-1 F600', 'X20'];
    expect(reportOf(plain).passes.map(({ name }) => name)).toEqual(['cutter 1']);
    const names = [...'abcdefg'].flatMap((a) => [...'hijklmn'].map((b) => `${a}${b}`));
    const headed = names.flatMap((name, k) => [`(${name})`, `G1 X${k + 1} Z-1 F600`]);
    const { passes } = reportOf(headed);
    expect(passes.map(({ name }) => name)).toEqual(['cutter 1']);
  });
});

describe('slow corners', () => {
  it('are found with their line and speed [v = sqrt(a d s / (1 - s))]', () => {
    const { corners } = reportOf(['G1 X-10 Z-1 F600', 'G4 P0', 'X0', 'X10 Y0.5', 'Y10', 'X20']);
    // (0,-1) into (1,0): square. 500 mm/s2, 0.005 mm.
    const square = 60 * Math.sqrt(500 * 0.005 * (1 + Math.SQRT2));
    expect(corners.map(({ line }) => line)).toEqual([lineOf(5), lineOf(4)]);
    expect(corners[0]!.speed).toBeCloseTo(square, 6);
    expect(corners[0]!.seconds).toBeCloseTo((2 * (10 - square / 60) ** 2) / (2 * 500 * 10), 6);
  });

  it('keeps the slowest few', () => {
    const zigzag = Array.from({ length: 30 }, (_, k) => `X${k + 1} Y${(k % 2) * (1 + k / 10)}`);
    const { corners } = reportOf(['G1 Z-1 F600', ...zigzag]);
    const speeds = corners.map(({ speed }) => speed);
    expect(speeds).toHaveLength(5);
    expect(speeds).toEqual(speeds.toSorted((a, b) => a - b));
    // The sharpest are the last.
    expect(Math.min(...corners.map(({ line }) => line))).toBeGreaterThan(lineOf(20));
  });
});

describe('the feed that is reached', () => {
  it('is told by share of the length, and where it is furthest below', () => {
    const report = reportOf(['G1 X-5 Z-1 F600', 'G4 P0', 'X5', 'G4 P0', 'X5.1', 'G4 P0', 'X15']);
    // 0.1 mm from rest to rest at 500 mm/s2 reaches sqrt(a L).
    expect(report.feed.worst).toMatchObject({ line: lineOf(4), written: 600 });
    expect(report.feed.worst?.reached).toBeCloseTo(60 * Math.sqrt(500 * 0.1), 6);
    expect(report.feed.reached).toBeLessThan(report.feed.written);
  });

  it('is reached nearly everywhere on long moves', () => {
    const { feed } = reportOf(['G1 X-100 Z-1 F60', 'X100']);
    expect(feed.short).toBeLessThan(0.001);
    expect(feed.worst).toBeUndefined();
  });
});

describe('corners that a controller may round', () => {
  const corner = ['G1 X-10 Z-1 F600', 'G4 P0', 'X0', 'Y10'];
  const free: Machine = {
    ...still,
    words: { ...still.words, path: { ...still.words.path, roughingStrays: null } },
  };
  const tolerant: Machine = {
    ...still,
    words: { ...still.words, path: { ...still.words.path, roughing: 'G64 P0.01' } },
  };
  const first = (report: TimeReport) => report.rounding[0]!;

  it('add nothing under exact path', () => {
    const report = reportOf(corner);
    expect(first(report)).toMatchObject({ kind: 'exact', word: 'G61' });
    expect(timeWords(report).join('\n')).toMatch(
      /add nothing to the form error in cutter 1: G61 holds the path/,
    );
  });

  it('stray by v2/(4a) from a square corner under G64 where nothing says how far', () => {
    const report = reportOf(['G64', ...corner], free);
    expect(first(report)).toMatchObject({ kind: 'free', passes: [{ line: lineOf(4) }] });
    expect(first(report).passes[0]!.most).toBeCloseTo(10 ** 2 / (4 * 500), 9);
    expect(timeWords(report).join('\n')).toMatch(
      /nothing says how far; .* up to 50\.0 um in cutter 1 \(worst at/,
    );
  });

  it('stray by what the machine file says was measured', () => {
    expect(first(reportOf(['G64', ...corner])).passes[0]!.most).toBeCloseTo(0.02, 9);
  });

  it('stray less from a slighter corner', () => {
    // 60 degrees of turn: sin^2(30) is a quarter, half of what a square corner has.
    const slight = ['G64', 'G1 X-10 Z-1 F600', 'G4 P0', 'X0', `X5 Y${5 * Math.sqrt(3)}`];
    expect(first(reportOf(slight)).passes[0]!.most).toBeCloseTo(0.01, 6);
    expect(first(reportOf(slight, free)).passes[0]!.most).toBeCloseTo(10 ** 2 / (8 * 500), 6);
  });

  it.each([
    ['G64 P0.003', 'G21', 0.003],
    ['G64 P0.0001', 'G20', 0.00254],
    ['G64 P9', 'G21', 0.05],
  ])('%s under %s: within P in its unit, and no more than the feed makes', (word, unit, most) => {
    const inch = unit === 'G20';
    const lines = inch ? ['G20', word, 'G21', ...corner] : [word, ...corner];
    expect(first(reportOf(lines, tolerant)).passes[0]!.most).toBeCloseTo(most, 9);
  });

  it('stray by the corner allowance at most on a machine without such words', () => {
    const desk = postMachine('desk-three-axis');
    const text = ['G21 G17 G90 G94', '(Cutter 1)', 'G0 X0 Y0', 'G0 Z5', ...corner, 'M2'].join('\n');
    const report = timeReport([traceProgram('desk.nc', text, desk)], desk, SETUP);
    expect(first(report)).toMatchObject({ kind: 'wordless', limit: 0.01, passes: [{ line: 8 }] });
    expect(first(report).passes[0]!.most).toBeCloseTo(0.01, 9);
    expect(timeWords(report).join('\n')).toMatch(/no word for the exact path.*up to 10\.0 um/);
  });

  it('are none where the path is smooth', () => {
    const report = reportOf(['G64', 'G1 X-1 Z-1 F600', 'G4 P0', 'X0', 'G3 X1 Y1 J1', 'G1 Y2'], free);
    expect(timeWords(report).join('\n')).toMatch(/Rounded corners add less than 0\.1 um/);
  });

  it('are taken as if by feed where no word is on', () => {
    const head = HEAD.map((line) => line.replace(' G61', ''));
    expect(first(reportOf(corner, free, head))).toMatchObject({ kind: 'unsaid' });
  });
});

describe('every golden program', () => {
  const files = readdirSync(GOLDEN).filter((name) => /^small-wheel\..*\.(?:nc|ngc|gc|din)$/.test(name));

  it('is read', () => expect(files.length).toBeGreaterThan(MACHINE_NAMES.length));

  it.each(files)('%s: programs, passes, cutters and reasons each add up to the whole', (file) => {
    const name =
      MACHINE_NAMES.find((machine) => new RegExp(`^small-wheel\\.${machine}[-.]`).test(file)) ?? '';
    const machine = postMachine(name);
    const trace = traceProgram(file, readFileSync(join(GOLDEN, file), 'utf8'), machine);
    const report = timeReport([trace, trace], machine, SETUP);
    expect(report.seconds).toBeGreaterThan(1);
    for (const parts of [report.programs, report.passes, report.cutters]) {
      expect(sum(parts.map(({ seconds }) => seconds))).toBeCloseTo(report.seconds, 6);
    }
    expect(sum(Object.values(report.spent))).toBeCloseTo(report.seconds, 6);
    expect(Math.min(...Object.values(report.spent))).toBeGreaterThan(-1e-9);
  });

  it.each(files)('%s: takes what stepping along its moves takes, within 0.5 %%', (file) => {
    const machine = postMachine(machineOf(file));
    const trace = traceProgram(file, readFileSync(join(GOLDEN, file), 'utf8'), machine);
    const { seconds, spent } = timeReport([trace], machine, SETUP);
    const stepped = stepAlong(chainOf(trace, machine), machine.limits, 60);
    const moving = seconds - spent.dwells - spent.spinUp;
    expect(Math.abs(moving / stepped - 1)).toBeLessThan(0.005);
  });
});

function machineOf(file: string): string {
  return MACHINE_NAMES.find((name) => new RegExp(`^small-wheel\\.${name}[-.]`).test(file)) ?? '';
}

/** The moves whose ends are known, and where something happens between them; on the DIN machine G60 stops at every block. */
function chainOf({ moves, events }: Trace, machine: Machine): ChainMove[] {
  const isTold = ({ x, y, z }: TracedMove['to']): boolean => x !== null && y !== null && z !== null;
  return moves.flatMap((move, i) =>
    isTold(move.from) && isTold(move.to)
      ? [
          {
            ...(move as unknown as ChainMove),
            standsBefore:
              machine.words.path.finishing === 'G60' ||
              i === 0 ||
              !isTold(moves[i - 1]!.from) ||
              events.some(({ before, kind }) => before === i && kind !== 'message'),
          },
        ]
      : [],
  );
}
