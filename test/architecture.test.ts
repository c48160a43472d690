/** The rules of the house, held by a test: who may import whom, who owns each library, how a file begins, how long it is. */
import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

const SRC = resolve(import.meta.dirname, '../src');

/** Folder to the folders it may import, besides base and itself. */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  base: [],
  geometry: [],
  motion: ['geometry'],
  cutting: ['geometry'],
  tooth: ['geometry'],
  machine: [],
  job: ['tooth', 'cutting', 'machine', 'geometry'],
  pair: ['tooth', 'geometry'],
  toolpath: ['job', 'machine', 'tooth', 'cutting', 'motion', 'geometry'],
  post: ['machine', 'motion', 'geometry'],
  prove: ['machine', 'motion', 'tooth', 'cutting', 'geometry'],
  report: ['job', 'machine', 'tooth', 'pair', 'prove', 'motion', 'cutting', 'geometry'],
};

/** Library to the files that may import it. */
const DOORMEN: Readonly<Record<string, RegExp>> = {
  zod: /^(job|machine)\/[a-z-]*schema[a-z-]*\.ts$/,
  yaml: /^base\/read-yaml\.ts$/,
  'clipper-lib': /^geometry\/offset-polygon\.ts$/,
  'gcode-parser': /^prove\/second-reader\.ts$/,
  commander: /^cli\/program\.ts$/,
  'd3-scale': /^report\/plot\.ts$/,
  'd3-shape': /^report\/plot\.ts$/,
  '@tarikjabiri/dxf': /^report\/draw-dxf\.ts$/,
  'node:fs': /^cli\/files\.ts$/,
  'node:crypto': /^cli\/[a-z-]+\.ts$/,
  'node:path': /^cli\/[a-z-]+\.ts$/,
  'node:url': /^cli\/[a-z-]+\.ts$/,
  'node:module': /^cli\/load-part\.ts$/,
  'node:zlib': /^cli\/load-part\.ts$/,
  'node:v8': /^cli\/load-part\.ts$/,
  'node:vm': /^cli\/load-part\.ts$/,
};

const files = readdirSync(SRC, { recursive: true, encoding: 'utf8' })
  .filter((file) => file.endsWith('.ts') && !file.endsWith('.d.ts'))
  .map((file) => file.replaceAll('\\', '/'))
  .toSorted();

function textOf(file: string): string {
  return readFileSync(join(SRC, file), 'utf8');
}

function importsOf(file: string): readonly string[] {
  return [...textOf(file).matchAll(/(?:from|import)\s*\(?\s*'([^']+)'/g)].map((match) => match[1] ?? '');
}

function folderOf(file: string): string {
  return file.includes('/') ? (file.split('/')[0] ?? '') : '';
}

describe('the import table', () => {
  it.each(files)('%s imports only what its folder may', (file) => {
    const from = folderOf(file);
    const allowed = MAY_IMPORT[from];
    if (allowed === undefined) {
      expect(['cli', 'flow', '']).toContain(from);
      return;
    }
    const strangers = importsOf(file)
      .filter((name) => name.startsWith('.'))
      .map((name) => folderOf(relative(SRC, resolve(SRC, dirname(file), name)).replaceAll('\\', '/')))
      .filter((folder) => folder !== from && folder !== 'base' && !allowed.includes(folder));
    expect(strangers).toEqual([]);
  });
});

describe('the doormen', () => {
  it.each(files)('%s talks only to libraries it is the doorman of', (file) => {
    const strangers = importsOf(file).filter(
      (name) => !name.startsWith('.') && !(DOORMEN[name]?.test(file) ?? false),
    );
    expect(strangers).toEqual([]);
  });
});

describe('how a file reads', () => {
  it.each(files)('%s begins with what it is and holds at most 300 lines', (file) => {
    const text = textOf(file);
    expect(text.startsWith('/**')).toBe(true);
    expect(text.split('\n').length).toBeLessThanOrEqual(301);
  });
  it('has real .ts names in imports and no default export', () => {
    for (const file of files) {
      const bad = importsOf(file).filter((name) => name.startsWith('.') && !/\.(ts|mjs)$/.test(name));
      expect(bad, file).toEqual([]);
      expect(/^export default/m.test(textOf(file)), file).toBe(false);
    }
  });
  it('keeps the clock, chance, the locale and the environment out of everything but cli', () => {
    const banned = /\bDate\b|Math\.random|toLocale|localeCompare|process\.|Intl\./;
    const found = files.filter((file) => folderOf(file) !== 'cli' && banned.test(textOf(file)));
    expect(found).toEqual([]);
  });
});
