/**
 * Runs one part of the bundle on a sample and keeps the byte code of what it used beside it, for `load-part.ts`.
 * A process of its own for each part. Arguments: the part's file, the project's folder. Run by `bundle.mjs`.
 */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire, Module } from 'node:module';
import { tmpdir } from 'node:os';
import { basename, dirname, join } from 'node:path';
import { Script } from 'node:vm';
import { setFlagsFromString } from 'node:v8';
import { crc32 } from 'node:zlib';

// As in `load-part.ts`: byte code is taken only under the flags it was made with.
for (const flag of ['--interrupt-budget=800000', '--semi-space-growth-factor=16']) {
  setFlagsFromString(flag);
}

const [file, root] = process.argv.slice(2);
const sample = join(root, 'samples/third-wheel.yaml');
const folder = mkdtempSync(join(tmpdir(), 'ogive-code-'));

/** What each part is asked for, that what it does is compiled. */
const WORK = {
  'run-cut': ({ runCut }) => {
    writeFileSync(join(folder, 'wrong.yaml'), readFileSync(sample, 'utf8').replace('module', 'modul'));
    runCut(join(folder, 'wrong.yaml'), {}, '');
    runCut(sample, { out: folder, json: true }, '');
  },
  'run-prove': ({ runProve }) => {
    runProve([join(root, 'README.md')], { job: sample, json: true }, '');
    runProve([], { explain: true }, '');
  },
  'run-draw': ({ runDraw }) => {
    runDraw(sample, { out: '-' });
    runDraw(sample, { out: '-', dxf: true, asCut: true });
  },
  'run-machines': ({ listMachines, explainMachine, checkMachineFile }) => {
    listMachines();
    explainMachine('bench-mill');
    checkMachineFile('lines-only');
  },
  'run-new': ({ runNew }) => {
    runNew(undefined, {});
    runNew(undefined, { schema: true });
  },
};

const text = readFileSync(file, 'latin1');
const script = new Script(Module.wrap(text), { filename: file });
const module = { exports: {} };
script.runInThisContext()(module.exports, createRequire(file), module, file, dirname(file));
WORK[basename(file, '.js')]?.(module.exports);
rmSync(folder, { recursive: true, force: true });
const code = script.createCachedData();
const sum = Buffer.alloc(4);
sum.writeUInt32LE(crc32(code, crc32(text)));
writeFileSync(`${file}.code`, Buffer.concat([sum, code]));
