import { describe, expect, it } from 'vitest';
import { fixedDecimals } from '../../src/base/fixed-decimals.ts';
import { figure, showLength } from '../../src/job/show-length.ts';
import { lengthInWords } from '../../src/post/belongs-text.ts';
import { fixed, plain } from '../../src/report/words.ts';

describe('a half is rounded away from zero, as on paper', () => {
  it.each([
    // A sixteenth of an inch, and the same with the noise of a conversion.
    [1.5875, 3, '1.588'],
    [0.0625 * 25.4, 3, '1.588'],
    [1.5874999999999997, 3, '1.588'],
    [1.5874, 3, '1.587'],
    [-1.5875, 3, '-1.588'],
    [0.5, 0, '1'],
    [2.5, 0, '3'],
    [1.005, 2, '1.01'],
    [-0.0004, 3, '0.000'],
    [0, 2, '0.00'],
    [12345.6785, 3, '12345.679'],
    [1e15, 1, '1000000000000000.0'],
  ])('%s with %s decimals', (value, decimals, text) => {
    expect(fixedDecimals(value, decimals)).toBe(text);
  });
  it('1.5875 prints as 1.587 nowhere', () => {
    expect(lengthInWords(1.5875, 'mm')).toBe('1.588 mm');
    expect(showLength(1.5875, 'inch')).toBe('0.0625 inch (1.588 mm)');
    expect(figure(1.5875, 3)).toBe('1.588');
    expect(fixed(1.5875, 3)).toBe('1.588');
    expect(plain(1.5875, 3)).toBe('1.588');
  });
});
