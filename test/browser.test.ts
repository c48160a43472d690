/** `src/cut.ts` needs nothing of Node: bundled for a browser and run without a single global of Node, it writes the same bytes. */
import { build, type Plugin } from 'esbuild';
import { builtinModules } from 'node:module';
import { join } from 'node:path';
import { runInNewContext } from 'node:vm';
import { expect, it } from 'vitest';
import type { CutResult } from '../src/cut.ts';
import { cutText, machineOf, machineText, sampleText, sumOf } from './support/cut-text.ts';

/** Modules of Node that were asked for, with who asked. */
const asked: { readonly path: string; readonly by: string }[] = [];

/**
 * The second reader's library streams files too, and imports what it needs for that. We call none of it: an empty module in
 * the place of each of Node's must leave nothing behind.
 */
const withoutNode: Plugin = {
  name: 'without-node',
  setup({ onResolve, onLoad }) {
    onResolve({ filter: new RegExp(`^(node:)?(${builtinModules.join('|')})$`) }, ({ path, importer }) => {
      asked.push({ path, by: importer.replaceAll('\\', '/') });
      return { path, namespace: 'nothing', sideEffects: false };
    });
    onLoad({ filter: /./, namespace: 'nothing' }, () => ({
      contents: 'export default {}; export class Transform {}',
    }));
  },
};

const bundle = await build({
  entryPoints: [join(import.meta.dirname, '../src/cut.ts')],
  bundle: true,
  write: false,
  outdir: 'nowhere',
  platform: 'browser',
  format: 'iife',
  globalName: 'ogive',
  metafile: true,
  logLevel: 'silent',
  plugins: [withoutNode],
});
const code = bundle.outputFiles[0]?.text ?? '';

it('is bundled without anything of Node', () => {
  expect(bundle.errors).toEqual([]);
  expect(bundle.warnings.map(({ text }) => text)).toEqual([]);
  expect(asked.filter(({ by }) => !by.includes('/node_modules/gcode-parser/'))).toEqual([]);
  const [output] = Object.values(bundle.metafile.outputs);
  expect(output?.imports).toEqual([]);
  const stubs = Object.entries(output?.inputs ?? {}).filter(([name]) => name.startsWith('nothing:'));
  expect(stubs.filter(([, { bytesInOutput }]) => bytesInOutput > 0)).toEqual([]);
});

/**
 * The language's own globals as parameters. Why: as names of a context of their own each is looked up through the context's
 * owner every time, which makes sums slow.
 */
const LANGUAGE = 'Math, Number, Array, Object, Map, Set, String, Infinity, NaN, Float64Array, Uint8Array';

it.each(['inch-wheel', 'third-wheel'])('cuts %s to the same bytes as here', { timeout: 60_000 }, (sample) => {
  const text = sampleText(sample);
  const machine = machineText(machineOf(text)) ?? '';
  const run = runInNewContext(
    `((${LANGUAGE}) => {
      ${code};
      return (file, text, name, machine, others, hash) => ogive.cut({
        file, text, version: 'golden', hash,
        findMachine: () => ({ ok: true, value: { name, file: 'posts/' + name + '.yaml', text: machine }, problems: [] }),
        loadMachine: others,
        readCutters: () => ({ ok: false, problems: [] }),
        stage: () => undefined,
      });
    })(${LANGUAGE})`,
    {},
  ) as (...args: readonly unknown[]) => CutResult;
  const there = run(`${sample}.yaml`, text, machineOf(text), machine, machineText, sumOf);
  const here = cutText(sample, text);
  expect(there.exit).toBe(here.exit);
  expect(there.files.map(({ name }) => name)).toEqual(here.files.map(({ name }) => name));
  here.files.forEach((file, i) => {
    expect(there.files[i]?.text === file.text, file.name).toBe(true);
  });
});
