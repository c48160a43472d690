/** Lines split into words, and what is not one. */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emptyLineWords } from '../../src/prove/line-words.ts';
import { emptyAhead, readAhead } from '../../src/prove/read-ahead.ts';
import { secondReading, secondReadingAgrees } from '../../src/prove/second-reader.ts';
import { tokenizeLine } from '../../src/prove/tokenize.ts';

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

describe('lines read ahead', () => {
  const text = ['N10 G1 X1', 'Y2 X-0.5', '', 'N30G2 X4I5', 'N40', '  Z 1. 5 '].join('\n');

  it('are split one by one and agreed about together', () => {
    const ahead = emptyAhead();
    expect(readAhead(text, 0, 'brackets', ahead)).toBeGreaterThanOrEqual(text.length);
    expect([ahead.count, ahead.differs]).toEqual([6, -1]);
    expect(secondReadingAgrees(text.split('\n'), ahead.lines.slice(0, 6))).toBe(true);
  });

  it.each([
    ['a place', 'X-0.5', 'X-0.6'],
    ['a letter', 'Y2', 'Z2'],
    ['a number of a line', 'N30', 'N31'],
    ['the first number of a line', 'N10', 'N11'],
    ['a word more', 'I5', 'I5J1'],
    ['a word less', 'X4', '  '],
    ['what is no word', 'X4', '[4'],
  ])('%s read otherwise is seen', (_, ours, theirs) => {
    const ahead = emptyAhead();
    const end = readAhead(text, 0, 'brackets', ahead);
    expect(end).toBeGreaterThan(0);
    const other = text.replace(ours, theirs);
    const last = ahead.lines[5];
    if (last !== undefined) {
      last.end += other.length - text.length;
    }
    expect(secondReadingAgrees(other.split('\n'), ahead.lines.slice(0, 6))).toBe(false);
  });

  it('name each line on which the readers differ, also where its text was met before', () => {
    const ahead = emptyAhead();
    const good = 'G1 X1\n'.repeat(40);
    const bad = `G1 X${'9'.repeat(400)}\n`;
    let at = 0;
    let lines = 0;
    while (ahead.differs < 0) {
      lines += at === 0 ? 0 : ahead.count;
      at = readAhead(good + bad + bad, at, 'brackets', ahead);
    }
    expect(lines + ahead.differs).toBe(40);
    expect([...ahead.agreed]).toEqual(['G1 X1']);
  });

  it('say which line the readers differ about: a number beyond all numbers', () => {
    const ahead = emptyAhead();
    readAhead(`G1 X1\nG1 X${'9'.repeat(400)}\nG1 X3`, 0, 'brackets', ahead);
    expect(ahead.differs).toBe(1);
    expect(ahead.how).toMatch(/Infinity/);
  });

  it('are all there, however many', () => {
    const lines = Array.from({ length: 100 }, (_, i) => `X${String(i)}`).join('\r\n');
    const ahead = emptyAhead();
    let at = 0;
    const values: number[] = [];
    while (at < lines.length) {
      at = readAhead(lines, at, 'brackets', ahead);
      values.push(...ahead.lines.slice(0, ahead.count).map((line) => line.values[0] ?? NaN));
    }
    expect(values).toEqual(Array.from({ length: 100 }, (_, i) => i));
  });
});
