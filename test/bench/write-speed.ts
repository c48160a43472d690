/**
 * What it takes to write 15,300 moves, over what it takes to print their numbers: the least processor time of each, in a process
 * of its own, where nothing else has shaped the code. Prints the ratio. Run by `test/post/write-speed.test.ts`.
 */
import type { Position, Step } from '../../src/motion/motion.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { headerFacts } from '../support/header-facts.ts';
import { postMachine } from '../support/post-machines.ts';

/** Laps round sixty teeth: 15,300 moves, three of four of them arcs, a comment for each tooth of each lap. */
function laps(): readonly Step[] {
  const steps: Step[] = [
    { kind: 'top' },
    { kind: 'cutter', number: 1, say: [] },
    { kind: 'spindle', speed: 12000 },
    { kind: 'rapid', to: { x: 15, y: 0, z: 5 } },
    { kind: 'line', to: { x: 15, y: 0, z: -1 }, feed: 100 },
  ];
  const turn = (2 * Math.PI) / 1020;
  for (let i = 1; i <= 15_300; i++) {
    const tooth = 1 + Math.floor(((i - 1) % 1020) / 17);
    const lap = 1 + Math.floor((i - 1) / 1020);
    const belongs = { pass: 'roughing', tooth, lap, laps: 15, depth: -lap / 10 };
    const to: Position = { x: 15 * Math.cos(i * turn), y: 15 * Math.sin(i * turn), z: -1 };
    const feed = 100 + (i % 3) * 7;
    steps.push(
      i % 4 === 0
        ? { kind: 'line', to, feed, belongs }
        : { kind: 'arc', to, centre: { x: 0, y: 0 }, turn, feed, belongs },
    );
  }
  return steps;
}

/** Four numbers a line, each to four decimals, and the lines put together: what no writer can do without. */
function yardstick(): number {
  const lines: string[] = [];
  for (let i = 0; i < 15_300; i++) {
    const words = [i / 7, i / 11, i / 13, i / 17].map((value) => value.toFixed(4));
    lines.push(words.join(' '));
  }
  return lines.join('\n').length;
}

/** Least processor time of one call, ms. */
function least(call: () => unknown): number {
  let best = Infinity;
  for (let run = 0; run < 20; run++) {
    const before = process.cpuUsage().user;
    call();
    best = Math.min(best, (process.cpuUsage().user - before) / 1000);
  }
  return best;
}

const motion = { steps: laps() };
const input = {
  machine: postMachine('desk-three-axis'),
  name: 'laps',
  suffix: '',
  label: 1,
  motion,
  header: headerFacts(motion),
};
const outcome = writeProgram(input);
const writing = least(() => writeProgram(input));
const printing = least(yardstick);
console.log(JSON.stringify({ blocks: outcome.ok ? outcome.value.blocks : 0, ratio: writing / printing }));
