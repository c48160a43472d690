/** Whatever the bytes are: no exception, no hang, and never a place that isn't a finite number. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { traceProgram, type Trace } from '../../src/prove/trace-program.ts';
import { POSTS } from '../machine/read-posts.ts';
import { post } from '../support/bench-program.ts';
import { callingMill, loopingMill, reportMill } from '../support/report-mill.ts';

const SEED = 6556;
const MACHINES = [...POSTS.map(post), reportMill(), loopingMill(), callingMill()];
/** Those that read more than plain blocks. */
const WIDE = MACHINES.slice(-3);
const GOOD = [
  '%', 'G21 G17 G90 G94 G54', 'T1 M6', 'G43 H1 F100', 'S1000', 'M3', 'G4 P2', 'G0 X0 Y0', 'Z5', 'G1 Z-1', 'G2 X10 Y0 I5 J0',
  'G3 X0 Y0 R6 (note)', 'G91 G1 X1 Y1', 'G90', 'G28 Z5', 'G53 G0 Z0', 'M5', 'M2', '%',
]; // prettier-ignore

function expectSound(trace: Trace): void {
  for (const move of trace.moves) {
    for (const place of [move.from, move.to]) {
      for (const value of [place.x, place.y, place.z]) {
        expect(value === null || Number.isFinite(value)).toBe(true);
      }
    }
    expect(move.feed === null || (Number.isFinite(move.feed) && move.feed > 0)).toBe(true);
    expect(Number.isFinite(move.turn ?? 0)).toBe(true);
    expect(Number.isFinite(move.spindle)).toBe(true);
  }
  expect(trace.complete || trace.findings.some(({ severity }) => severity === 'error')).toBe(true);
  expect(trace.complete || trace.lastRead > 0).toBe(true);
}

const machine = fc.constantFrom(...MACHINES);

describe(`hostile text (seed ${String(SEED)})`, () => {
  it('random characters', () => {
    fc.assert(
      fc.property(machine, fc.string({ unit: 'binary', maxLength: 300 }), (m, text) =>
        expectSound(traceProgram('h', text, m)),
      ),
      { seed: SEED, numRuns: 1500 },
    );
  });

  it('random words', () => {
    const word = fc
      .tuple(
        fc.constantFrom(...'GGGMXYZIJKRFSTHPNO'),
        fc.oneof(fc.integer({ min: -2, max: 100 }).map(String), fc.double().map(String)),
      )
      .map(([letter, number]) => letter + number);
    const line = fc.array(word, { maxLength: 6 }).map((all) => all.join(' '));
    fc.assert(
      fc.property(machine, fc.array(line, { maxLength: 30 }), (m, lines) =>
        expectSound(traceProgram('h', [...GOOD.slice(0, 8), ...lines].join('\n'), m)),
      ),
      { seed: SEED, numRuns: 1500 },
    );
  });

  it('a good program with characters changed, dropped, doubled', () => {
    const good = GOOD.join('\n');
    const change = fc.tuple(
      fc.nat(good.length - 1),
      fc.constantFrom(...' \n.-+()%;/#[]GXZ09eE\u0000\u00a0', ''),
      fc.boolean(),
    );
    fc.assert(
      fc.property(machine, fc.array(change, { minLength: 1, maxLength: 8 }), (m, changes) => {
        const text = changes.reduce(
          (now, [at, letter, keep]) => now.slice(0, at) + letter + now.slice(keep ? at : at + 1),
          good,
        );
        expectSound(traceProgram('h', text, m));
      }),
      { seed: SEED, numRuns: 3000 },
    );
  });

  it('a program with cycles, parameters, loops and calls, its pieces in any order', () => {
    const piece = fc.constantFrom(
      'G98', 'G99', 'G81 X1 Z-1 R2', 'G83 X2 Z-1 R2 Q0.3', 'X3', 'G80', 'G0 X1', 'G1 X2 Y1', 'G91', 'G90', 'G93 G1 X3 F2', 'G94 F100',
      'G92 X1', 'G92 X#1 Y2', 'G92.1', 'G92.2', 'G92.3', 'G10 L2 P1 X5', 'G20', 'G21', '#1=2', '#1=[#1+1]', '#2=[#1/0]', 'G0 X#1',
      'G1 X[#1*2] Y-1', '#[#1]=3', 'o1 while [#1 LT 6]', 'o1 endwhile', 'o1 do', 'o2 repeat [3]', 'o2 endrepeat', 'o3 if [#1 GT 2]',
      'o3 else', 'o3 endif', 'o1 break', 'o2 continue', 'o4 sub', 'o4 endsub', 'o4 call [1] [2]', 'o4 return', 'M98 P5 L2', 'M98 P6',
      'O5', 'O6', 'M99', 'M2', '/X1', 'G2 X1 Y1 I1 J0', 'G28', 'T2 M6', 'G43 H2',
    ); // prettier-ignore
    fc.assert(
      fc.property(fc.constantFrom(...WIDE), fc.array(piece, { maxLength: 25 }), (m, pieces) =>
        expectSound(traceProgram('h', [...GOOD.slice(0, 10), ...pieces, 'M2', '%'].join('\n'), m)),
      ),
      { seed: SEED, numRuns: 3000 },
    );
  });

  it('expressions of any characters', () => {
    const sign = fc.constantFrom(
      ...'#[]=+-*/.0123456789 ()<>XYG',
      'MOD',
      'SIN[',
      'ATAN[',
      ']/[',
      '**',
      ' GT ',
      'O1',
      '#1',
    );
    fc.assert(
      fc.property(fc.constantFrom(...WIDE), fc.array(sign, { maxLength: 30 }), (m, signs) =>
        expectSound(
          traceProgram(
            'h',
            [...GOOD.slice(0, 8), '#1=2', `G0 X${signs.join('')}`, signs.join('')].join('\n'),
            m,
          ),
        ),
      ),
      { seed: SEED, numRuns: 3000 },
    );
  });

  it('huge lines and files', () => {
    const begun = performance.now();
    for (const text of [
      '('.repeat(2e6),
      '()'.repeat(1e6),
      'G1'.repeat(1e6),
      'X1 '.repeat(1e6),
      '\n'.repeat(2e6),
      '9'.repeat(2e6),
      `X${'9'.repeat(2e6)}`,
      '%'.repeat(1e6),
      'N1 '.repeat(1e6),
      `(${'a'.repeat(2e6)})\n`.repeat(3),
      '['.repeat(2e6),
      `X${'#'.repeat(2e6)}`,
      `${' '.repeat(2e6)}(#`,
      'O'.repeat(2e6),
      `${'N1 '.repeat(7e5)}O1 if`,
      'o1 if [1]\n'.repeat(2e5),
      'o1 while [1]\no1 endwhile\n'.repeat(1e5),
      '#1=1\n'.repeat(2e5),
    ]) {
      expectSound(traceProgram('h', text, MACHINES[0] ?? post('bench-mill')));
      expectSound(traceProgram('h', text, loopingMill()));
    }
    expect(performance.now() - begun).toBeLessThan(25_000);
  });
});
