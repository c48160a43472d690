/** Runs a TypeScript bench of this folder: `node test/bench/run.mjs figures [arguments]`. */
import { build } from 'esbuild';
import { mkdtempSync, rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

const name = process.argv[2];
const root = resolve(import.meta.dirname, '../..');
const folder = mkdtempSync(join(root, 'node_modules/.ogive-bench-'));
try {
  const outfile = join(folder, `${name}.mjs`);
  await build({
    entryPoints: [join(root, 'test/bench', `${name}.ts`)],
    outfile,
    bundle: true,
    format: 'esm',
    platform: 'node',
    packages: 'external',
    logLevel: 'warning',
    define: { 'import.meta.dirname': JSON.stringify(join(root, 'test/support')) },
  });
  process.argv.splice(1, 2, outfile);
  await import(pathToFileURL(outfile).href);
} finally {
  rmSync(folder, { recursive: true, force: true });
}
