/**
 * Whole processes against bare node, all in one run, each kind in turn so that a busy machine is busy for all of them.
 * Prints the median of each, and the ratios asked for. Needs `npm run build`.
 */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';

const ROUNDS = Number(process.argv[2] ?? 15);
const root = resolve(import.meta.dirname, '../..');
const main = join(root, 'dist/main.js');
const folder = mkdtempSync(join(tmpdir(), 'ogive-bench-'));

const sample = readFileSync(join(root, 'samples/third-wheel.yaml'), 'utf8');
const wide = sample
  .replace('teeth: 60', 'teeth: 240')
  .replace('size: [44, 44]', 'size: [134, 134]')
  .replace('hub: 9.0', 'hub: 24.0');
writeFileSync(join(folder, 'sixty.yaml'), sample);
writeFileSync(join(folder, 'many.yaml'), wide);
writeFileSync(join(folder, 'bad.yaml'), sample.replace('teeth: 60', 'teeth: 3').replace('module', 'modul'));

const KINDS = {
  bare: { args: ['-e', '0'], exit: 0 },
  help: { args: [main, '--help'], exit: 0 },
  bad: { args: [main, 'cut', join(folder, 'bad.yaml'), '--out', join(folder, 'o')], exit: 2 },
  sixty: { args: [main, 'cut', join(folder, 'sixty.yaml'), '--out', join(folder, 'o')], exit: 0 },
  many: { args: [main, 'cut', join(folder, 'many.yaml'), '--out', join(folder, 'o')], exit: 0 },
};

const times = Object.fromEntries(Object.keys(KINDS).map((kind) => [kind, []]));
for (let round = 0; round < ROUNDS; round++) {
  for (const [kind, { args, exit }] of Object.entries(KINDS)) {
    const start = process.hrtime.bigint();
    const run = spawnSync(process.execPath, args, { encoding: 'utf8' });
    times[kind].push(Number(process.hrtime.bigint() - start) / 1e6);
    if (run.status !== exit) {
      throw new Error(`${kind} ended with ${run.status}, not ${exit}:\n${run.stderr}`);
    }
  }
}
rmSync(folder, { recursive: true, force: true });

const median = (list) => list.toSorted((a, b) => a - b)[Math.floor(list.length / 2)];
const m = Object.fromEntries(Object.entries(times).map(([kind, list]) => [kind, median(list)]));
for (const [kind, value] of Object.entries(m)) {
  console.log(`${kind.padEnd(6)} ${value.toFixed(0).padStart(6)} ms`);
}
console.log(`cut of 60 teeth / bare node           ${(m.sixty / m.bare).toFixed(2)}  (6 or less)`);
console.log(
  `(240 - bare) / (60 - bare)            ${((m.many - m.bare) / (m.sixty - m.bare)).toFixed(2)}  (4.4 or less)`,
);
console.log(`--help / bare node                    ${(m.help / m.bare).toFixed(2)}  (1.3 or less)`);
console.log(`bad job reported / bare node          ${(m.bad / m.bare).toFixed(2)}  (2.5 or less)`);
