import { expect, it } from 'vitest';
import { joinTrees } from '../../src/machine/join-trees.ts';

it('joins groups key by key, the later on top, whatever their depth', () => {
  const under = { a: { b: 1, c: { d: 2, e: 3 } }, f: 4 };
  expect(joinTrees([under, { a: { c: { e: 5 } } }, { g: 6 }])).toEqual({
    a: { b: 1, c: { d: 2, e: 5 } },
    f: 4,
    g: 6,
  });
});

it('replaces lists, and groups by values and values by groups', () => {
  expect(
    joinTrees([
      { a: [1, 2], b: { c: 1 }, d: 1 },
      { a: [3], b: 'none', d: { e: 2 } },
    ]),
  ).toEqual({
    a: [3],
    b: 'none',
    d: { e: 2 },
  });
});

it('changes none of what it was given', () => {
  const under = { a: { b: 1 } };
  joinTrees([under, { a: { b: 2, c: 3 } }]);
  expect(under).toEqual({ a: { b: 1 } });
});
