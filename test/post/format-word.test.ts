import { describe, expect, it } from 'vitest';
import * as fc from 'fast-check';
import { formatCode, formatCount, formatValue, type NumberStyle } from '../../src/post/format-word.ts';

const plain: NumberStyle = { point: 'as-needed', trailingZeros: 'drop', leadingZero: 'keep' };
const keep: NumberStyle = { ...plain, trailingZeros: 'keep' };
const pointed: NumberStyle = { ...plain, point: 'always' };
const bare: NumberStyle = { point: 'always', trailingZeros: 'drop', leadingZero: 'drop' };

describe('numbers as words hold them [NISTIR 6556 section 3.3.2.1: sign, digits, at most one point, no exponent]', () => {
  it.each([
    // count, decimals, plain, trailing zeros kept, point always, leading zero dropped
    [0, 3, '0', '0.000', '0.', '0.'],
    [-0, 3, '0', '0.000', '0.', '0.'],
    [5, 4, '0.0005', '0.0005', '0.0005', '.0005'],
    [-5, 4, '-0.0005', '-0.0005', '-0.0005', '-.0005'],
    [500, 3, '0.5', '0.500', '0.5', '.5'],
    [12000, 3, '12', '12.000', '12.', '12.'],
    [-12345, 3, '-12.345', '-12.345', '-12.345', '-12.345'],
    [120, 0, '120', '120', '120.', '120.'],
    [99999999999, 4, '9999999.9999', '9999999.9999', '9999999.9999', '9999999.9999'],
  ])('%d units of %d decimals', (count, decimals, a, b, c, d) => {
    expect(formatCount(count, decimals, plain)).toBe(a);
    expect(formatCount(count, decimals, keep)).toBe(b);
    expect(formatCount(count, decimals, pointed)).toBe(c);
    expect(formatCount(count, decimals, bare)).toBe(d);
  });

  it('rounds a value to its last digit and never to minus zero', () => {
    expect(formatValue(-0.0004, 3, plain)).toBe('0');
    expect(formatValue(1e-7, 4, plain)).toBe('0');
    expect(formatValue(2.0005, 3, keep)).toBe('2.001');
  });

  it.each([NaN, Infinity, -Infinity, 0.5, 2 ** 60])('refuses %d as a count', (count) => {
    expect(() => formatCount(count, 3, plain)).toThrow('no whole count');
  });

  it('means what it was given, whatever the style', () => {
    const style = fc.record<NumberStyle>({
      point: fc.constantFrom('always', 'as-needed'),
      trailingZeros: fc.constantFrom('keep', 'drop'),
      leadingZero: fc.constantFrom('keep', 'drop'),
    });
    fc.assert(
      fc.property(fc.integer({ min: -(10 ** 9), max: 10 ** 9 }), fc.nat(6), style, (count, decimals, how) => {
        const text = formatCount(count, decimals, how);
        expect(text).toMatch(/^-?(\d+\.?\d*|\.\d+)$/);
        expect(text).not.toMatch(/^-0*\.?0*$/);
        expect(Math.round(Number(text) * 10 ** decimals)).toBe(count + 0);
      }),
      { seed: 20_240_301 },
    );
  });
});

it('pads codes to the width the machine file asks for, and nothing else', () => {
  expect(['G1', 'G01', 'G17', 'M6', 'G91.1', 'T1', 'X1'].map((word) => formatCode(word, 2))).toEqual([
    'G01',
    'G01',
    'G17',
    'M06',
    'G91.1',
    'T1',
    'X1',
  ]);
  expect(formatCode('G1', 1)).toBe('G1');
});
