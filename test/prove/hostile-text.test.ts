/** Whatever the bytes are: no exception, no hang, and never a place that isn't a finite number. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { traceProgram, type Trace } from '../../src/prove/trace-program.ts';
import { POSTS } from '../machine/read-posts.ts';
import { post } from '../support/bench-program.ts';

const SEED = 6556;
const MACHINES = POSTS.map(post);
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
    ]) {
      expectSound(traceProgram('h', text, MACHINES[0] ?? post('bench-mill')));
    }
    expect(performance.now() - begun).toBeLessThan(15_000);
  });
});
