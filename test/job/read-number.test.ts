import { describe, expect, it } from 'vitest';
import { readNumber, tidy } from '../../src/job/read-number.ts';

describe('numbers as people write them', () => {
  it.each<[unknown, number, string | undefined]>([
    [0.5, 0.5, undefined],
    ['0.5', 0.5, undefined],
    ['.5', 0.5, undefined],
    ['1e-2', 0.01, undefined],
    ['0.5mm', 0.5, 'mm'],
    ['0.5 mm', 0.5, 'mm'],
    ['3/64 inch', 3 / 64, 'inch'],
    ['3/64"', 3 / 64, '"'],
    ['2 23/32', 2.71875, undefined],
    ['-1/4', -0.25, undefined],
    ['6 Inch/Min', 6, 'inch/min'],
  ])('%s', (written, number, unit) => {
    expect(readNumber(written)).toEqual({ ok: true, number, unit });
  });
  it('shows how a decimal comma is written', () => {
    expect(readNumber('12,5 mm')).toMatchObject({
      ok: false,
      hint: 'Write 12.5 mm: decimals follow a point.',
    });
  });
  it.each([['half'], ['1/0'], ['1 2'], [''], [true], [['1']], [{}], ['1-2']])('refuses %j', (written) => {
    expect(readNumber(written).ok).toBe(false);
  });
});

it('keeps a converted value as it would be written (25.4 x 3/16 = 4.7625 by hand)', () => {
  expect(tidy((25.4 * 3) / 16)).toBe(4.7625);
});
