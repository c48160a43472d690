/** Parameters and expressions beside those of the table of cases. NISTIR 6556 §3.3.2, §3.3.3; App. C.2 is the report's own test. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { notChecked } from '../../src/prove/not-checked.ts';
import { movesOf, post, traceLines } from '../support/bench-program.ts';
import { expectStop } from '../support/case-row.ts';
import { reportMill } from '../support/report-mill.ts';

const machine = reportMill();
const SEED = 6556;

/** What X comes to. */
function valueOf(expression: string, before: readonly string[] = []): number | null | undefined {
  const trace = traceLines({ machine, lines: [...before, `G0 X${expression}`] });
  expect(trace.findings).toEqual([]);
  return movesOf(trace).at(-1)?.to.x;
}

describe('what an expression comes to', () => {
  it.each([
    ['[2 + 3 * 4]', 14],
    ['[2 * 3 + 4]', 10],
    ['[10 - 4 - 3]', 3],
    ['[64 / 4 / 2]', 8],
    ['[2 * 3 ** 2]', 18],
    ['[2 ** 3 ** 2]', 64],
    ['[[2 + 3] * 4]', 20],
    ['[17 MOD 5 * 2]', 4],
    ['[1 + 1 AND 1]', 1],
    ['[0 AND 0 + 5]', 5],
    ['[0 OR 0]', 0],
    ['[3 XOR 0]', 1],
    ['[-2 ** 2]', 4],
    ['ABS[-3]', 3],
    ['SQRT[9]', 3],
    ['ROUND[SIN[90]]', 1],
    ['ROUND[COS[180]]', -1],
    ['ROUND[TAN[45]]', 1],
    ['ROUND[ASIN[1]]', 90],
    ['ROUND[ACOS[0]]', 90],
    ['EXP[0]', 1],
    ['LN[1]', 0],
    ['FIX[2.8]', 2],
    ['FUP[2.2]', 3],
    ['ROUND[ATAN[-1]/[-1]]', -135],
    ['#[#1 + 1]', 8],
    ['##[1]', 8],
  ])('X%s is %f [NISTIR 6556 §3.3.2.3, §3.3.2.4]', (expression, expected) =>
    expect(valueOf(expression, ['#1=2 #2=8 #3=8'])).toBe(expected),
  );

  it('reckons every setting of a line with what was there before it [NISTIR 6556 §3.3.3]', () => {
    expect(valueOf('#2', ['#1=1 #2=2', '#1=#2 #2=#1'])).toBe(1);
    expect(valueOf('#[#1]', ['#1=5', '#1=6 #[#1]=7', '#6=9', 'G0 X#5'])).toBe(9);
  });

  it('reads words, settings, comments and a line number in any order [NISTIR 6556 §3.3.6]', () => {
    const trace = traceLines({ machine, lines: ['n12 #1 = 4 (a [#) x [ 1 ] g 0 #2 = 3', 'Y#1 X#2'] });
    expect(trace.findings).toEqual([]);
    expect(movesOf(trace).map(({ to }) => [to.x, to.y])).toEqual([
      [1, 0],
      [3, 4],
    ]);
  });

  it(`agrees with plain arithmetic (seed ${String(SEED)})`, () => {
    const tree = fc.letrec<{ node: readonly [string, number] }>((tie) => ({
      node: fc.oneof(
        { depthSize: 'small', withCrossShrink: true },
        fc.integer({ min: -9, max: 9 }).map((n) => [String(n), n] as const),
        fc.tuple(tie('node'), fc.constantFrom('+', '-', '*'), tie('node')).map(([a, op, b]) => {
          const value = op === '+' ? a[1] + b[1] : op === '-' ? a[1] - b[1] : a[1] * b[1];
          return [`[${a[0]} ${op} ${b[0]}]`, value] as const;
        }),
      ),
    })).node;
    fc.assert(
      fc.property(tree, ([text, value]) => {
        fc.pre(text.length < 100 && Math.abs(value) < 9e4);
        expect(valueOf(text)).toBe(value === 0 ? 0 : value);
      }),
      { seed: SEED, numRuns: 300 },
    );
  });
});

describe('what is not reckoned', () => {
  it.each([
    ['G0 X#7', /not known/],
    ['G0 X[1/0]', /zero/],
    ['G0 X[9**999]', /no number holds/],
    ['G0 X[[0-8]**0.5]', /power/],
    ['G0 XSQRT[-1]', /zero or more/],
    ['G0 XLN[0]', /more than zero/],
    ['G0 XASIN[2]', /-1 to 1/],
    ['G0 XATAN[0]/[0]', /no angle/],
    ['G0 XATAN[1]', /two expressions/],
    ['G0 XROUND[2.5]', /half/],
    ['G0 X[-5 MOD 3]', /differ/],
    ['G0 X-#1', /number/],
    ['G0 X-[1]', /number/],
    ['G0 X[1 GT 0]', /operation/],
    ['#<depth>=1', /names/],
    ['#5220=2', /zero/],
    ['#5161=2', /home/],
    ['G0 X[1] X[2]', /twice/],
    ['G[1.23] X1', /G1.23/],
    ['G0 X[1] ; note', /";"/],
    ['G0 X[1] N5', /first/],
    ['N123456 #1=1', /digits/],
    ['G0 X[1 (note) + 2]', /operation/],
    ['G0 X[1] (open', /closed/],
    ['G0 X[1] (a (b)', /opens/],
    ['#1', /alone/],
    ['#1=', /number/],
    ['G0 X[1] ]', /may not stand/],
    ['G0 X[1] %', /may not stand/],
    ['M[3] M[4]', /exclude/],
    [`G0 X${'['.repeat(100)}1${']'.repeat(99)}`, /operation/],
    [`#1=${'['.repeat(200)}1${']'.repeat(200)}`, /characters/],
  ])('%s', (line, says) => expectStop({ n: 0, ref: '', before: ['#1=2'], says }, line));

  it('a length without its point, where the machine would count thousandths', () => {
    const numbers = { ...machine.words.numbers, point: 'always' } as const;
    const pointed = { ...machine, words: { ...machine.words, numbers } };
    const at = 'X0. Y0. Z0.';
    expectStop({ n: 0, ref: '', machine: pointed, at, before: ['#1=2'], says: /point/ }, 'X5 Y#1');
    expect(movesOf(traceLines({ machine: pointed, at, lines: ['#1=2', 'X5. Y#1'] }))).toHaveLength(1);
  });

  it('anything of it, on a machine that has none', () => {
    for (const line of ['#1=2', 'G0 X[1+2]', 'G0 X#1', '(a [) G0 X#1']) {
      expectStop(
        {
          n: 0,
          ref: '',
          machine: post('inch-bench-mill'),
          modes: 'G20 G17 G40 G61 G90 G94 G54',
          feed: 'F10',
          says: /parameters and expressions/,
        },
        line,
      );
    }
  });
});

it('says how many lines one reader alone has read', () => {
  const trace = traceLines({ machine, lines: ['#1=2', 'G0 X#1', 'Y1'] });
  expect(trace.reckoned).toBe(2);
  const said = notChecked({ input: { programs: [], machine, setup: {} } } as never, [trace]).join('\n');
  expect(said).toMatch(/2 lines with parameters, expressions/);
});

it('warns of words behind the end that would be reckoned', () => {
  const trace = traceLines({ machine, lines: ['M2', 'G0 X[1]'] });
  expect(trace.findings.map(({ code, severity }) => [code, severity])).toEqual([['prove.end', 'error']]);
});

it('names are read where the machine has them', () => {
  const language = { ...machine.words.language, parameters: 'numbered-and-named' } as const;
  const named = { ...machine, words: { ...machine.words, language } };
  const trace = traceLines({ machine: named, lines: ['#<depth 1>=2', 'G0 X#<DEPTH1>'] });
  expect(movesOf(trace)[0]?.to.x).toBe(2);
  expectStop({ n: 0, ref: '', machine: named, says: /#<none> is read/ }, 'G0 X#<none>');
  expectStop({ n: 0, ref: '', machine: named, says: /letters, digits/ }, '#<open=1');
});
