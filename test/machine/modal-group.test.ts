import { expect, it } from 'vitest';
import { modalGroup, movesAtOnce } from '../../src/machine/modal-group.ts';

it.each([
  ['G17 G18 G19'],
  ['G90 G91'],
  ['G93 G94'],
  ['G20 G21'],
  ['G40 G41 G42'],
  ['G43 G49'],
  ['G98 G99'],
  ['G54 G55 G56 G57 G58 G59 G59.1 G59.2 G59.3'],
  ['G61 G61.1 G64'],
])('%s are one group [NISTIR 6556 §3.4, table 4]', (words) => {
  const groups = new Set(words.split(' ').map(modalGroup));
  expect(groups.size).toBe(1);
  expect(groups.has(undefined)).toBe(false);
});

it('knows no group for what sets no mode [NISTIR 6556 §3.4, table 4, group 0]', () => {
  expect(['G4', 'G10', 'G28', 'G53', 'G92', 'G80'].map(modalGroup)).toEqual(Array(6).fill(undefined));
});

it('knows what moves or shifts [NISTIR 6556 §3.4, table 4, groups 0 and 1 without G80]', () => {
  const words =
    'G0 G1 G2 G3 G01 G38.2 G81 G82 G83 G84 G85 G86 G87 G88 G89 G4 G10 G28 G30 G53 G92 G92.1'.split(' ');
  expect(words.filter((word) => !movesAtOnce(word))).toEqual([]);
  expect(['G17', 'G21', 'G40', 'G49', 'G54', 'G61', 'G80', 'G90', 'G94', 'UNIT'].filter(movesAtOnce)).toEqual(
    [],
  );
});
