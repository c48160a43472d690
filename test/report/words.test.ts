import { describe, expect, it } from 'vitest';
import { sheetHtml } from '../../src/report/sheet.ts';
import { factsOf } from '../support/sheets.ts';
import { jobText } from '../../src/report/job-text.ts';
import { bareLength, lengthBoth, lengthOnly, sizeOnly, tinyLength } from '../../src/report/lengths.ts';
import {
  coordinate,
  duration,
  escapeText,
  fixed,
  numeral,
  numeralList,
  plain,
} from '../../src/report/words.ts';

const NB = '\u00a0';

describe('numbers as the report writes them', () => {
  it.each([
    [0.1 + 0.2, 3, '0.3'],
    [1e-9, 4, '0'],
    [-1e-9, 4, '0'],
    [40, 4, '40'],
    [-2.5, 3, '-2.5'],
  ])('plain(%f, %i) is %s', (value, decimals, text) => {
    expect(plain(value, decimals)).toBe(text);
  });

  it('never writes -0 nor an exponent for anything a wheel has', () => {
    for (const value of [-0, -1e-7, 1e-7, 0.00004, -0.00004, 123456.78901]) {
      expect(coordinate(value)).not.toMatch(/e|^-0$/);
      expect(fixed(value, 3)).not.toMatch(/e|^-0\.0*$/);
    }
  });

  it('keeps a coordinate within half of its last digit', () => {
    for (let i = 0; i < 2000; i++) {
      const value = Math.sin(i) * 50;
      expect(Math.abs(Number(coordinate(value)) - value)).toBeLessThanOrEqual(0.5001e-4);
    }
  });
});

describe('lengths, the job first', () => {
  it('says millimetres first in a metric job and inches first in an inch job [1 inch = 25.4 mm, international yard, 1959]', () => {
    expect(lengthBoth(25.4, 'mm')).toBe(`25.400${NB}mm (1.0000${NB}in)`);
    expect(lengthBoth(25.4, 'inch')).toBe(`1.0000${NB}in (25.400${NB}mm)`);
    expect(sizeOnly(25.4 / 16, 'inch')).toBe(`0.0625${NB}in`);
    expect(lengthOnly(-1.5, 'mm')).toBe(`\u22121.500${NB}mm`);
    expect(bareLength(-0.00001, 'mm')).toBe('0.000');
  });

  it('says what is tiny in micrometres, in an inch job in millionths of an inch first', () => {
    expect(tinyLength(0.00056, 'mm')).toBe(`0.56${NB}µm`);
    expect(tinyLength(0.00254, 'inch')).toBe(`100${NB}µin (2.54${NB}µm)`);
  });
});

describe('times and numerals', () => {
  it.each([
    [0, '0.0 min'],
    [0.4, '0.1 min'],
    [85, '1.4 min'],
    [569, '9.5 min'],
    [570, '10 min'],
    [3660, '61 min'],
  ])('%f s is %s', (seconds, text) => {
    expect(duration(seconds)).toBe(text);
  });

  it('"72 s, 22 min and 1 h 05 min in one table": every time of the sheet is in minutes', () => {
    const page = sheetHtml(factsOf('third-wheel')).replace(/<style>[\s\S]*?<\/style>/, '');
    expect(page).not.toMatch(/[>\s][\d.]+ (?:s|h|seconds|hours)\b/);
    expect(page).toMatch(/[>\s][\d.]+ min\b/);
  });

  it('writes numerals [Roman numerals with subtraction, common practice]', () => {
    expect([1, 4, 9, 12, 14, 19, 39].map(numeral)).toEqual(['I', 'IV', 'IX', 'XII', 'XIV', 'XIX', 'XXXIX']);
  });

  it('draws neighbours of a list together', () => {
    expect(numeralList([1, 2, 3, 5, 7, 8])).toBe('I\u2013III, V, VII, VIII');
    expect(numeralList([])).toBe('');
  });
});

it('lets no letter of a text become a tag or end an attribute', () => {
  expect(escapeText(`<b a="x" c='y'>&amp;`)).toBe('&lt;b a=&quot;x&quot; c=&#39;y&#39;&gt;&amp;amp;');
});

describe('sentences of other stages in an inch job', () => {
  it('say inches first [1 inch = 25.4 mm]', () => {
    expect(jobText('feed 254 mm/min, 2.54 mm a lap', 'inch')).toBe(
      `feed 10.0${NB}in/min (254${NB}mm/min), 0.1000${NB}in (2.54${NB}mm) a lap`,
    );
    expect(jobText('down to -25.4 mm', 'inch')).toBe(`down to \u22121.0000${NB}in (\u221225.4${NB}mm)`);
  });

  it('leave alone what is no length, what has inches already, and every metric job', () => {
    for (const text of [
      '0.0261 mm2 a space',
      '3.5 modules',
      '25.4 mm or 1 inch',
      '25.4 mm (1 in)',
      '1 inch (25.4 mm)',
    ]) {
      expect(jobText(text, 'inch')).toBe(text);
    }
    expect(jobText('2.54 mm', 'mm')).toBe('2.54 mm');
  });
});
