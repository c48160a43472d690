/**
 * Loops and subprograms, where the machine file has them. NISTIR 6556 has none (App. E.3); O-words by the published reference
 * of a controller that descends from it, M98 and M99 as is common (both from memory).
 */
import { describe, expect, it } from 'vitest';
import { MOST_DEPTH, MOST_RUN } from '../../src/prove/bounds.ts';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { movesOf, traceLines } from '../support/bench-program.ts';
import { expectStop } from '../support/case-row.ts';
import { callingMill, loopingMill, reportMill } from '../support/report-mill.ts';

const machine = loopingMill();

function places(lines: readonly string[], on = machine): string {
  const trace = traceLines({ machine: on, lines });
  expect(trace.findings).toEqual([]);
  expect(trace.complete).toBe(true);
  return movesOf(trace)
    .map(({ to }) => `${String(to.x)},${String(to.y)}`)
    .join(' ');
}

describe('loops', () => {
  it.each([
    ['while', ['#1=0', 'o1 while [#1 LT 3]', '#1=[#1+1]', 'G0 X#1', 'o1 endwhile', 'Y9'], '1,0 2,0 3,0 3,9'],
    ['while, never', ['o1 while [0]', 'G0 X1', 'o1 endwhile', 'G0 Y9'], '0,9'],
    ['do', ['#1=5', 'o1 do', '#1=[#1+1]', 'G0 X#1', 'o1 while [#1 LT 3]', 'Y9'], '6,0 6,9'],
    ['do, again', ['#1=0', 'o1 do', '#1=[#1+1]', 'G0 X#1', 'o1 while [#1 LT 3]'], '1,0 2,0 3,0'],
    ['repeat', ['G91', 'o1 repeat [3]', 'X1', 'o1 endrepeat', 'Y9'], '1,0 2,0 3,0 3,9'],
    ['repeat, none', ['o1 repeat [0]', 'G0 X1', 'o1 endrepeat', 'G0 Y9'], '0,9'],
    [
      'one in another',
      ['G91', 'o1 repeat [2]', 'o2 repeat [2]', 'X1', 'o2 endrepeat', 'Y1', 'o1 endrepeat'],
      '1,0 2,0 2,1 3,1 4,1 4,2',
    ],
    [
      'break',
      [
        '#1=0',
        'o1 while [1]',
        '#1=[#1+1]',
        'o2 if [#1 EQ 3]',
        'o1 break',
        'o2 endif',
        'G0 X#1',
        'o1 endwhile',
        'Y9',
      ],
      '1,0 2,0 2,9',
    ],
    [
      'continue',
      [
        '#1=0',
        'o1 repeat [3]',
        '#1=[#1+1]',
        'o2 if [#1 EQ 2]',
        'o1 continue',
        'o2 endif',
        'G0 X#1',
        'o1 endrepeat',
      ],
      '1,0 3,0',
    ],
    ['by name', ['g91', 'O<laps> Repeat [2] (twice)', 'x1', 'n5 o<LAPS> endrepeat'], '1,0 2,0'],
  ])('%s', (_, lines, expected) => expect(places(lines)).toBe(expected));

  it.each([
    [1, '1,0'],
    [2, '2,0'],
    [3, '3,0'],
  ])('if %i', (n, expected) => {
    const lines = [
      `#1=${String(n)}`,
      'o1 if [#1 EQ 1]',
      'G0 X1',
      'o1 elseif [#1 EQ 2]',
      'G0 X2',
      'o1 else',
      'G0 X3',
      'o1 endif',
    ];
    expect(places(lines)).toBe(expected);
  });

  it('make the same moves as the lines written out', () => {
    const written = Array.from({ length: 6 }, (_, k) => `G0 X${String(k)} Y${String(k * k)}`);
    expect(places(['#1=0', 'o1 repeat [6]', 'G0 X#1 Y[#1*#1]', '#1=[#1+1]', 'o1 endrepeat'])).toBe(
      places(written),
    );
  });
});

describe('subprograms by O', () => {
  it('have #1 to #30 and plain names to themselves, and nothing else', () => {
    const sub = ['o9 sub', 'G0 X#1 Y#2', '#1=77', '#31=5', '#<own>=1', '#<_all>=8', 'o9 endsub'];
    expect(places([...sub, '#1=3', '#<own>=4', 'o9 call [1] [2]', 'G0 X#1 Y#31', 'X#<own> Y#<_all>'])).toBe(
      '1,2 3,5 4,8',
    );
    expectStop(
      {
        n: 0,
        ref: '',
        machine,
        before: [...sub.slice(0, 1), 'G0 X#2', 'o9 endsub'],
        says: /not in|#2|known/,
      },
      'G0 X#2',
    );
  });

  it('end early by return, and call each other', () => {
    const lines = [
      'o1 sub',
      'o2 if [#1 GT 1]',
      'o1 return',
      'o2 endif',
      'G0 X#1',
      'o1 endsub',
      'o3 sub',
      'o1 call [#1]',
      'o1 call [1]',
      'o3 endsub',
    ];
    expect(places([...lines, 'o3 call [2]', 'o3 call [0]'])).toBe('1,0 0,0 1,0');
  });
});

describe('subprograms by M98', () => {
  const calls = callingMill();
  const text = (lines: readonly string[], behind: readonly string[]): string =>
    [
      '%',
      'G21 G17 G40 G61 G90 G94 G54',
      'T1 M6',
      'G43 H1',
      'G0 X0 Y0 Z5',
      ...lines,
      'M2',
      ...behind,
      '%',
    ].join('\n');
  const read = (lines: readonly string[], behind: readonly string[]): ReturnType<typeof traceProgram> =>
    traceProgram('m.ngc', text(lines, behind), calls);

  it('run from O and their number to M99, as often as L says', () => {
    const trace = read(
      ['G91', 'M98 P100 L3', 'M98 P200', 'G90'],
      ['O100', 'G0 X1', 'M99', 'O200', 'M98 P100', 'Y1', 'M99'],
    );
    expect(trace.findings).toEqual([]);
    expect(trace.moves.slice(1).map(({ to }) => [to.x, to.y])).toEqual([
      [1, 0],
      [2, 0],
      [3, 0],
      [4, 0],
      [4, 1],
    ]);
  });

  it.each([
    ['of another file', ['M98 P300'], [], /not in this file/],
    ['that stands twice', ['M98 P100'], ['O100', 'M99', 'O100', 'M99'], /twice/],
    [
      'that calls itself',
      ['M98 P100'],
      ['O100', 'M98 P100', 'M99'],
      new RegExp(`${String(MOST_DEPTH)} deep`),
    ],
    ['with words beside it', ['M98 P100 X5'], ['O100', 'M99'], /beside/],
    ['without a number', ['M98'], [], /P/],
    ['not so often', ['M98 P100 L0'], ['O100', 'M99'], /how often/],
    ['run into', ['O100', 'G0 X1', 'M99'], [], /runs into/],
    ['ended outside', ['M99'], [], /outside/],
    ['without end', ['M98 P100 L99999999'], ['O100', 'G0 X1', 'M99'], /lines/],
  ])('are not run: one %s', (_, lines, behind, says) => {
    const trace = read(lines, behind);
    expect(trace.complete).toBe(false);
    expect(trace.findings.at(-1)?.message).toMatch(says);
    expect(trace.findings.at(-1)?.code).toBe('prove.unread');
  });

  it('are not taken for words behind the end, and what follows them is', () => {
    expect(read([], ['O100', 'G0 X1', 'M99']).findings).toEqual([]);
    expect(
      read([], ['O100', 'G0 X1', 'M99', 'G0 X9']).findings.map(({ code, line }) => [code, line]),
    ).toEqual([['prove.end', 10]]);
  });
});

describe('what is not followed', () => {
  const says = (pattern: RegExp, ...before: string[]) => ({ n: 0, ref: '', machine, says: pattern, before });
  it.each([
    ['o1 while [1]', /not closed/, []],
    ['o1 endwhile', /nothing that is open/, []],
    ['o1 else', /no if/, []],
    ['o1 break', /nothing of its label/, []],
    ['o1 call', /no subprogram/, []],
    ['o1 jump', /no word follows/, []],
    ['o1 if', /expressions/, []],
    ['o1 repeat [1.5]', /not closed|whole/, []],
    ['o1 if [1] G0', /behind/, []],
    ['o[1] if [1]', /./, []],
    ['o1 if [1 LT 2 AND 2 LT 3]', /bind/, []],
    ['o1 if [1 + 1 AND 1]', /bind/, []],
  ] as const)('%s', (line, pattern, before) => expectStop(says(pattern, ...before), line));

  const stops = (...lines: string[]): string => {
    const trace = traceLines({ machine, lines });
    expect(trace.complete).toBe(false);
    return trace.findings.at(-1)?.message ?? '';
  };
  it('loops without end, however they are made', () => {
    expect(stops('o1 while [1]', 'o1 endwhile')).toContain(String(MOST_RUN));
    expect(stops('o1 do', 'o1 while [1]')).toContain(String(MOST_RUN));
    expect(stops('o1 repeat [9999999999]', 'o1 endrepeat')).toContain(String(MOST_RUN));
    expect(stops('o1 sub', 'o1 endsub', 'o2 while [1]', 'o1 call', 'o2 endwhile')).toContain(
      String(MOST_RUN),
    );
    expect(stops('o1 while [1]', `(${'x'.repeat(100_000)})`, 'o1 endwhile')).toContain(String(MOST_RUN));
  });
  it('a subprogram that calls itself', () => {
    expect(stops('o1 sub', 'o1 call', 'o1 endsub', 'o1 call')).toContain(`${String(MOST_DEPTH)} deep`);
  });
  it('one that stands below its call, is run into or stands twice', () => {
    expect(stops('o1 call', 'o1 sub', 'o1 endsub')).toMatch(/below/);
    expect(stops('o1 sub', 'o1 endsub', 'o1 sub', 'o1 endsub')).toMatch(/twice/);
    expect(stops('o1 if [1]', 'o2 sub', 'o2 endsub', 'o1 endif')).toMatch(/inside|closed/);
  });
  it('loops inside each other without end', () => {
    const lines = Array.from({ length: 200_000 }, (_, k) => `o${String(k)} if [1]`);
    expect(traceLines({ machine, lines }).findings.at(-1)?.message).toMatch(/inside each other/);
  });
  it('numbers so near each other that controllers differ', () => {
    expect(
      stops('#1=0', 'o1 repeat [10]', '#1=[#1+0.1]', 'o1 endrepeat', 'o2 if [#1 LT 1]', 'o2 endif'),
    ).toMatch(/so near/);
  });
  it('a flow word that a switch may pass over', () => {
    const trace = traceLines({ machine, start: { skipSwitch: 'off' }, lines: ['/o1 if [1]', 'o1 endif'] });
    expect(trace.complete).toBe(false);
  });
  it('parameters on a machine that has loops and none of them', () => {
    const language = { ...machine.words.language, parameters: 'none' } as const;
    const bare = { ...machine, words: { ...machine.words, language } };
    expect(places(['G91', 'o1 repeat [2]', 'X1', 'o1 endrepeat'], bare)).toBe('1,0 2,0');
    for (const line of ['#1=2', 'G0 X[1]', 'o1 if [#1]']) {
      expectStop({ n: 0, ref: '', machine: bare, says: /parameters and expressions/ }, line);
    }
  });
  it('lines that nothing comes to, which is said', () => {
    expect(traceLines({ machine, lines: ['o1 if [0]', 'not a word', 'o1 endif'] })).toMatchObject({
      complete: true,
      jumps: true,
    });
    expect(traceLines({ machine, lines: ['G0 X1'] }).jumps).toBe(false);
  });
  it('anything of it on a machine without it', () => {
    for (const line of ['o1 if [1]', 'o1 call', 'M98 P1', 'M99']) {
      expectStop({ n: 0, ref: '', machine: reportMill() }, line);
    }
    expectStop({ n: 0, ref: '', machine: callingMill() }, 'o1 if [1]');
  });
});
