/** Lines split into words, and what is not one. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emptyLineWords } from '../../src/prove/line-words.ts';
import { codesOf } from '../../src/prove/modes-codes.ts';
import { readLines, type ReadLine } from '../../src/prove/read-lines.ts';
import { secondReading, secondReadingAgrees } from '../../src/prove/second-reader.ts';
import { tokenizeLine } from '../../src/prove/tokenize.ts';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { post } from '../support/bench-program.ts';

const words = emptyLineWords();

function split(line: string, form: 'brackets' | 'semicolon' | 'none' = 'brackets'): string {
  tokenizeLine(line, 0, line.length, form, words);
  return words.fault === undefined
    ? Array.from(
        { length: words.count },
        (_, i) => String.fromCharCode(words.letters[i] ?? 0) + String(words.values[i]),
      ).join(' ')
    : `${String(words.faultColumn)}: ${words.fault}`;
}

describe('words', () => {
  it.each([
    ['g0x +0. 12 34y 7', 'G0 X0.1234 Y7'],
    ['X.5X5.X+.5X-0', 'X0.5 X5 X0.5 X0'],
    ['G91.1', 'G91.1'],
    ['X00012.50', 'X12.5'],
    ['X123456789012345678', 'X123456789012345680'],
    ['X0.00000000000000000000001', 'X1e-23'],
  ])('%s [NISTIR 6556 §3.3, §3.3.2.1]', (line, expected) => expect(split(line)).toBe(expected));

  it('reads a number as the nearest double, however it is written', () => {
    fc.assert(
      fc.property(
        fc.double({ noNaN: true, min: -1e5, max: 1e5 }),
        fc.integer({ min: 0, max: 12 }),
        (value, decimals) => {
          const text = value.toFixed(decimals);
          split(`X${text}`);
          expect(words.values[0]).toBe(Number(text) === 0 ? 0 : Number(text));
        },
      ),
      { seed: 20260, numRuns: 2000 },
    );
  });

  it.each([
    ['G1 X1 é', 7],
    ['G1 X1 [', 7],
    ['G1 X', 4],
    ['G1 X1 (a', 7],
    ['/N1 G1 /X1', 8],
    ['G1 N2', 4],
    ['%5 (x)', 0],
  ])('%s is faulted at column %i', (line, column) => {
    split(line);
    expect(words.faultColumn).toBe(column);
  });

  it('takes comments only in the form the machine has', () => {
    expect(split('G1 ; X5', 'semicolon')).toBe('G1');
    expect(words.comments).toEqual([' X5']);
    expect(split('G1 (X5)', 'semicolon')).toMatch(/^4: /);
    expect(split('G1 (X5)', 'none')).toMatch(/^4: /);
    expect(split('(a)G1(b ; c)X2')).toBe('G1 X2');
    expect(words.comments).toEqual(['a', 'b ; c']);
  });

  it('is linear: a line of a million comments or blanks is split in no time', () => {
    const begun = performance.now();
    split('()'.repeat(1_000_000));
    split(`X${' '.repeat(2_000_000)}1`);
    split('9'.repeat(1_000_000));
    split(`X${'9'.repeat(1_000_000)}`);
    expect(performance.now() - begun).toBeLessThan(3000);
  });
});

describe('the second reader', () => {
  const read = (line: string): string | undefined => {
    split(line);
    return secondReading(line, words);
  };
  it.each([
    'G1 X1 Y-2.5',
    'g0x +0. 12 34y 7',
    'N10 G1 (note) X1',
    '',
    '(only this)',
    'G1 X-0',
    'O1234',
    'T1M6G43H1',
  ])('agrees about %s', (line) => expect(read(line)).toBeUndefined());

  /** What the library drops or bends without a mark, measured line by line on gcode-parser 2.2.0. */
  it.each([
    'G1 X1,5Y2',
    'G1 X#1',
    'G1 X[1+2]',
    'XZ',
    'X1.2.3',
    'G1 X1 ) Y2',
    'G1 X1 *0',
    '$10=1',
    'G1 X−1',
    '/G1 X1',
    'X1_000',
    '{"gc":"g0 x1"}',
  ])('does not hold %s, whatever words are claimed for it [gcode-parser 2.2.0, measured]', (line) => {
    split('G1 X1');
    expect(secondReading(line, words)).toBeDefined();
  });

  it('contradicts a reader that finds other words', () => {
    split('G1 X1.5');
    expect(secondReading('G1 X1.50', words)).toBeUndefined();
    expect(secondReading('G1 X1.6', words)).toMatch(/reads X1.6 where ours reads X1.5/);
    expect(secondReading('G1 Y1.5', words)).toMatch(/Y1.5/);
    expect(secondReading('G1', words)).toMatch(/1 words, not 2/);
    expect(secondReading('N5 G1 X1.5', words)).toMatch(/number/);
  });
});

describe('lines', () => {
  const bench = post('bench-mill');
  const codes = codesOf(bench);
  const read = (text: string): readonly ReadLine[] => readLines(text, bench, codes);
  const text = ['N10 G1 X1', 'Y2 X-0.5', '', 'N30G2 X4I5', 'N40', '  Z 1. 5 '].join('\n');
  const theirs = text.split('\n').map((line) => {
    const into = emptyLineWords();
    tokenizeLine(line, 0, line.length, 'brackets', into);
    return into;
  });

  it('are theirs one by one and agreed about together', () => {
    expect(read(text).map(({ differs, fault }) => [differs, fault])).toEqual(
      theirs.map(() => [undefined, undefined]),
    );
    expect(secondReadingAgrees(text.split('\n'), theirs)).toBe(true);
  });

  it.each([
    ['a place', 'X-0.5', 'X-0.6'],
    ['a letter', 'Y2', 'Z2'],
    ['a number of a line', 'N30', 'N31'],
    ['the first number of a line', 'N10', 'N11'],
    ['a word more', 'I5', 'I5J1'],
    ['a word less', 'X4', '  '],
    ['what is no word', 'X4', '[4'],
  ])('%s read otherwise is seen', (_, ours, other) => {
    expect(secondReadingAgrees(text.replace(ours, other).split('\n'), theirs)).toBe(false);
  });

  /** Beyond all numbers: ours reads Infinity, which the second reader's check does not take. */
  const DOUBTFUL = `G1 X${'9'.repeat(400)}`;

  it('name each line on which the readers differ, also where its text was met before', () => {
    const lines = read(`${'G1 X1\n'.repeat(40)}${DOUBTFUL}\n${DOUBTFUL}\nG1 X3`);
    expect(lines.flatMap(({ differs }, i) => (differs === undefined ? [] : [i]))).toEqual([40, 41]);
    expect(lines[40]?.differs).toMatch(/Infinity/);
    expect(lines[41]).toBe(lines[40]);
  });

  it('are reported with the number of every line on which a text stands, though it is read once', () => {
    const long = `G1 X1 Y1 Z1 (${'A'.repeat(bench.words.file.lineLongest)})`;
    const head = ['%', 'G21 G17 G90 G94 G54', 'T1 M6', 'G43 H1', 'F100'];
    const repeated = [...head, 'G1 X1 Y1 Z1', long, 'X2', long, 'X2', long, 'M2', '%'];
    const trace = traceProgram('a', repeated.join('\n'), bench);
    const said = trace.findings.filter(({ code }) => code === 'prove.file');
    expect(said.map(({ line, message }) => [line, / \(and on (.*)\)/.exec(message)?.[1]])).toEqual([
      [7, '2 more lines'],
    ]);
    const moves = traceProgram('a', [...head, 'G1 X1', 'X2', 'X2', 'X1', 'X2', 'B1', 'X2'].join('\n'), bench);
    expect(moves.moves.map(({ line, to }) => [line, to.x])).toEqual([
      [6, 1],
      [7, 2],
      [8, 2],
      [9, 1],
      [10, 2],
    ]);
    expect(moves.findings.at(-1)).toMatchObject({ code: 'prove.unread', line: 11 });
  });

  it('make the same arc where they repeat from the same place, and another from another', () => {
    const head = ['%', 'G21 G17 G90 G94 G54', 'T1 M6', 'G43 H1', 'F100', 'G0 X0 Y0', 'Z0'];
    const arc = 'G2 X10 Y0 I5 J0';
    const trace = traceProgram(
      'a',
      [...head, arc, 'G1 X0', arc, 'G3 X0 Y0 I-5 J0', arc, 'G91', arc, 'G90 G1 Y0.5', 'X0', arc].join('\n'),
      bench,
    );
    const arcs = trace.moves.filter(({ kind }) => kind === 'arc');
    expect(arcs.map(({ line, centre, turn }) => [line, centre?.x, Math.round((turn ?? 0) * 1000)])).toEqual([
      [8, 5, -3142],
      [10, 5, -3142],
      [11, 5, 3142],
      [12, 5, -3142],
      [14, 15, -3142],
    ]);
    expect(trace.findings.at(-1)).toMatchObject({ code: 'prove.arc', line: 17 });
  });

  it('are all there, however many and however they end', () => {
    const lines = Array.from({ length: 100 }, (_, i) => `X${String(i)}`);
    for (const end of ['\n', '\r\n', '\r']) {
      for (const last of ['', end]) {
        const found = read(lines.join(end) + last);
        expect(found.map(({ text: one }) => one)).toEqual(lines);
      }
    }
  });
});
