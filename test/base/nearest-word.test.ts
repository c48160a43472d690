import { expect, it } from 'vitest';
import { nearestWord } from '../../src/base/nearest-word.ts';

const KEYS = ['teeth', 'mate', 'module', 'diametral-pitch', 'centres', 'thickness', 'bore', 'stick-out'];

it.each([
  ['modul', 'module'],
  ['theeth', 'teeth'],
  ['tetth', 'teeth'],
  ['weight', undefined],
  ['Bore', 'bore'],
  ['stickout', 'stick-out'],
  ['stick_out', 'stick-out'],
  ['center', 'centres'],
  ['colour', undefined],
  ['x', undefined],
])('%s is meant for %s (judged by reading)', (word, meant) => {
  expect(nearestWord(word, KEYS)).toBe(meant);
});

it('has nothing to offer without a list', () => {
  expect(nearestWord('bore', [])).toBeUndefined();
});
