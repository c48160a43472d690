/** The byte code beside each part of the built command is a help and nothing more: damaged, foreign or gone, the command does the same. */
import { spawnSync } from 'node:child_process';
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';

const DIST = resolve(import.meta.dirname, '../../dist');
const folder = mkdtempSync(join(tmpdir(), 'ogive-part-'));
const code = join(folder, 'dist/run-new.js.code');

cpSync(DIST, join(folder, 'dist'), { recursive: true });
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function runNew(flags: readonly string[] = []): { readonly status: number | null; readonly text: string } {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    [...flags, join(folder, 'dist/main.js'), 'new'],
    { encoding: 'utf8' },
  );
  return { status, text: stdout + stderr };
}

/** Whether V8 takes the kept code: asked of V8 itself, of the text and code as they lie in dist, under the flags load-part sets. */
function isTaken(): boolean {
  const program = `for (const flag of ['--interrupt-budget=800000', '--semi-space-growth-factor=16']) { require('node:v8').setFlagsFromString(flag); }
    const { readFileSync } = require('node:fs'); const { Script } = require('node:vm');
    const file = ${JSON.stringify(join(folder, 'dist/run-new.js'))};
    const cachedData = readFileSync(file + '.code').subarray(4);
    const script = new Script(require('node:module').wrap(readFileSync(file, 'latin1')), { cachedData });
    process.exitCode = script.cachedDataRejected ? 1 : 0;`;
  return spawnSync(process.execPath, ['-e', program]).status === 0;
}

function turned(bytes: Buffer, at: number): Buffer {
  return Buffer.from(bytes.map((byte, i) => (i === at ? byte ^ 0xff : byte)));
}

describe('byte code of a part', () => {
  const whole = readFileSync(code);
  const expected = runNew();
  const damages: readonly (readonly [string, Buffer])[] = [
    ['cut short', whole.subarray(0, 400)],
    ['empty', Buffer.alloc(0)],
    ['of another build', readFileSync(join(DIST, 'run-draw.js.code'))],
    ...[4, 9, 20, whole.length >> 2, whole.length >> 1, whole.length - 1].map(
      (at) => [`with byte ${at} turned`, turned(whole, at)] as const,
    ),
  ];

  it('is taken as the build left it', () => {
    expect(isTaken()).toBe(true);
    expect(expected).toMatchObject({ status: 0 });
    expect(expected.text).toContain('teeth:');
  });
  it.each(damages)('%s: the same text comes out', (_, bytes) => {
    writeFileSync(code, bytes);
    expect(runNew()).toEqual(expected);
  });
  it('made under other flags: the same text comes out', () => {
    writeFileSync(code, whole);
    expect(runNew(['--no-opt', '--stack-size=500'])).toEqual(expected);
  });
  it('gone: the same text comes out', () => {
    rmSync(code);
    expect(runNew()).toEqual(expected);
  });
});
