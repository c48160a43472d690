/**
 * Makes dist/: the command as one bundle with a chunk for each command, and the notices its libraries' licences ask for.
 * Run by `npm run build`.
 */
import { build } from 'esbuild';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = resolve(dirname(fileURLToPath(import.meta.url)), '../..');
const dist = join(root, 'dist');
const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
rmSync(dist, { recursive: true, force: true });
mkdirSync(dist, { recursive: true });

const result = await build({
  absWorkingDir: root,
  entryPoints: { main: 'src/cli/main.ts' },
  outdir: 'dist',
  bundle: true,
  splitting: true,
  format: 'esm',
  platform: 'node',
  target: 'node20',
  minify: true,
  legalComments: 'none',
  metafile: true,
  logLevel: 'warning',
  define: { OGIVE_VERSION: JSON.stringify(version) },
  banner: {
    js: "import { createRequire as ogiveRequire } from 'node:module'; const require = ogiveRequire(import.meta.url);",
  },
});

const packages = [
  ...new Set(
    Object.keys(result.metafile.inputs)
      .map((input) => /node_modules\/((?:@[^/]+\/)?[^/]+)\//.exec(input)?.[1])
      .filter((name) => name !== undefined),
  ),
].sort();
writeFileSync(join(dist, 'notices.txt'), packages.map(noticeOf).join('\n'));

/** Name, version and licence text of a bundled library; our own copy where its package has none. */
function noticeOf(name) {
  const folder = join(root, 'node_modules', name);
  const about = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8'));
  const found = readdirSync(folder).find((file) => /^licen[cs]e/i.test(file));
  const own = join(root, 'src/cli/licences', `${name.replace('/', '-')}.txt`);
  if (found === undefined && !existsSync(own)) {
    throw new Error(`no licence text for ${name}: put one at ${own}`);
  }
  const text = readFileSync(found === undefined ? own : join(folder, found), 'utf8');
  return `${name} ${about.version} (${about.license})\n${'-'.repeat(60)}\n${text.trim()}\n`;
}
