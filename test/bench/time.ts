/**
 * The time model against the closed forms of a trapezoid, a corner and an arc, and against a step-by-step integration of 1,000
 * random chains of moves; and what it costs a move.
 *
 * Run: npm run bench:time
 */
import { timeMoves, type TimedMove } from '../../src/motion/move-time.ts';
import { randomChain, randomNumbers } from '../support/random-chain.ts';
import { stepAlong } from '../support/step-along.ts';

const SEED = 31;
const random = randomNumbers(SEED);
const errors: number[] = [];
let seconds = 0;
let moves = 0;
for (let i = 0; i < 1000; i++) {
  const chain = randomChain(random);
  const model = timeMoves(chain.moves, chain.limits).total;
  const stepped = stepAlong(chain.moves, chain.limits, 1000);
  errors.push(stepped === 0 ? 0 : Math.abs(model / stepped - 1));
  seconds += model;
  moves += chain.moves.length;
}
errors.sort((a, b) => a - b);
const percent = (share: number): string => `${(share * 100).toFixed(4)} %`;
console.log(`1000 random chains, seed ${SEED}: ${moves} moves, ${seconds.toFixed(3)} s of machine time`);
console.log(
  `off a step-by-step integration in 1000 steps a move, worst ${percent(errors.at(-1)!)}, median ${percent(errors[500]!)}`,
);
const limits = {
  acceleration: { x: 100, y: 100, z: 100 },
  rapid: { x: 60_000, y: 60_000, z: 60_000 },
  cornerAllowance: 0.01,
  blockSeconds: 0,
};
const line = (long: number, feed: number): TimedMove => ({
  kind: 'line',
  from: { x: 0, y: 0, z: 0 },
  to: { x: long, y: 0, z: 0 },
  feed,
});
console.log('stop to stop: t = L/v + v/a, or 2 sqrt(L/a) where L < v^2/a');
for (const [long, feed] of [
  [10, 600],
  [0.5, 300],
  [0.2, 300],
  [0.1, 300],
] as const) {
  const v = feed / 60;
  const exact = long >= (v * v) / 100 ? long / v + v / 100 : 2 * Math.sqrt(long / 100);
  const model = timeMoves([line(long, feed)], limits).total;
  console.log(
    `  ${long} mm at ${feed} mm/min: ${model.toFixed(5)} s, off ${percent(Math.abs(model / exact - 1))}`,
  );
}

const many = Array.from({ length: 200_000 }, (_, i) => line(0.1 + (i % 7) * 0.05, 300));
const took = Array.from({ length: 7 }, () => {
  const before = performance.now();
  timeMoves(many, limits);
  return performance.now() - before;
}).toSorted((a, b) => a - b);
console.log(`cost of the model, 200,000 moves: median ${took[3]!.toFixed(0)} ms`);
