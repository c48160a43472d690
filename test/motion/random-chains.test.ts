/** 1,000 random chains of moves: the time model against a step-by-step integration that shares nothing with it, within 0.5 %. */
import { expect, it } from 'vitest';
import { timeMoves } from '../../src/motion/move-time.ts';
import { randomChain, randomNumbers } from '../support/random-chain.ts';
import { stepAlong } from '../support/step-along.ts';

const SEED = Number(process.env['OGIVE_SEED'] ?? 31);
const RUNS = Number(process.env['OGIVE_RUNS'] ?? 1000);

it(`agrees with a step-by-step integration within 0.5 % on ${RUNS} random chains [seed ${SEED}]`, () => {
  const random = randomNumbers(SEED);
  const kinds = new Set<string>();
  const off: string[] = [];
  for (let i = 0; i < RUNS; i++) {
    const { moves, limits } = randomChain(random);
    const model = timeMoves(moves, limits).total;
    const stepped = stepAlong(moves, limits, 100);
    moves.forEach(({ kind, from, to }) => kinds.add(kind === 'arc' && from.z !== to.z ? 'helix' : kind));
    if (Math.abs(model - stepped) > 0.005 * stepped) {
      off.push(`chain ${i}: ${model} s against ${stepped} s`);
    }
  }
  expect([...kinds].toSorted()).toEqual(['arc', 'helix', 'line', 'rapid']);
  expect(off).toEqual([]);
});
