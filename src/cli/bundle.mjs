/**
 * Makes dist/: the command, a part for each of its commands with its byte code beside it, and the notices its libraries'
 * licences ask for. Run by `npm run build`.
 *
 * dist/ is CommonJS: that starts sooner than an ES module, and takes byte code.
 */
import { build } from 'esbuild';
import { spawnSync } from 'node:child_process';
import { chmodSync, existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = dirname(fileURLToPath(import.meta.url));
const root = resolve(here, '../..');
const dist = join(root, 'dist');
const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));

const parts = readdirSync(here)
  .filter((file) => /^run-[a-z]+\.ts$/.test(file))
  .map((file) => file.slice(0, -'.ts'.length));

rmSync(dist, { recursive: true, force: true });
mkdirSync(dist, { recursive: true });
writeFileSync(join(dist, 'package.json'), '{ "type": "commonjs" }\n');

const shared = {
  absWorkingDir: root,
  outdir: 'dist',
  bundle: true,
  format: 'cjs',
  platform: 'node',
  target: 'node20',
  minify: true,
  charset: 'ascii',
  legalComments: 'none',
  metafile: true,
  logLevel: 'warning',
  define: { OGIVE_VERSION: JSON.stringify(version), 'import.meta.url': 'ogiveUrl' },
  banner: { js: "const ogiveUrl=require('node:url').pathToFileURL(__filename).href;" },
};

/** In the command, a part is loaded by `load-part.ts` where it is asked for. */
const partsByLoader = {
  name: 'parts',
  setup({ onResolve, onLoad }) {
    onResolve({ filter: /^\.\/run-[a-z]+\.ts$/ }, ({ path, kind }) =>
      kind === 'dynamic-import'
        ? { path: path.slice('./'.length, -'.ts'.length), namespace: 'part' }
        : undefined,
    );
    onLoad({ filter: /./, namespace: 'part' }, ({ path }) => ({
      contents: `module.exports = require('./load-part.ts').loadPart(${JSON.stringify(path)});`,
      resolveDir: here,
    }));
  },
};

/** commander can start other programs as its commands; ours has none such, and loading what it would need takes time. */
const noOtherPrograms = {
  name: 'no other programs',
  setup({ onResolve, onLoad }) {
    onResolve({ filter: /^node:child_process$/ }, () => ({ path: 'none', namespace: 'none' }));
    onLoad({ filter: /./, namespace: 'none' }, () => ({ contents: 'module.exports = {};' }));
  },
};

const command = await build({
  ...shared,
  entryPoints: { main: 'src/cli/main.ts' },
  // So that the shell knows what runs it: `npx ogive`.
  banner: { js: `#!/usr/bin/env node\n${shared.banner.js}` },
  plugins: [partsByLoader, noOtherPrograms],
});
const commands = await build({
  ...shared,
  entryPoints: Object.fromEntries(parts.map((part) => [part, `src/cli/${part}.ts`])),
});
for (const part of parts) {
  escapeLetters(join(dist, `${part}.js`));
}
chmodSync(join(dist, 'main.js'), 0o755);
const inputs = [command, commands].flatMap(({ metafile }) => Object.keys(metafile.inputs));
const packages = [
  ...new Set(
    inputs
      .map((input) => /node_modules\/((?:@[^/]+\/)?[^/]+)\//.exec(input)?.[1])
      .filter((name) => name !== undefined),
  ),
].sort();
writeFileSync(join(dist, 'notices.txt'), packages.map(noticeOf).join('\n'));
for (const part of parts) {
  keepCode(part);
}

/** Pure ASCII, which needs no decoding. esbuild writes it but for patterns, where an escape means the same. */
function escapeLetters(file) {
  const text = readFileSync(file, 'utf8').replace(
    /[^\0-\x7f]/g,
    (letter) => `\\u${letter.charCodeAt(0).toString(16).padStart(4, '0')}`,
  );
  writeFileSync(file, text);
}

/** The part's functions as byte code, taken after it has worked once: a function is compiled when it is first called. */
function keepCode(part) {
  const { status, stderr } = spawnSync(
    process.execPath,
    [join(here, 'keep-code.mjs'), join(dist, `${part}.js`), root],
    { encoding: 'utf8', stdio: ['ignore', 'ignore', 'pipe'] },
  );
  if (status !== 0) {
    throw new Error(`no byte code for ${part}:\n${stderr}`);
  }
}

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
