/** The built command where files cannot go, where nobody reads on, and where words are mistyped. */
import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import {
  cutSmall,
  folderWith,
  namesIn,
  newFolder,
  ogive,
  removeFolders,
  ROOT,
} from '../support/run-command.ts';

afterAll(removeFolders);

describe('places that take no file', { timeout: 60_000 }, () => {
  const folder = folderWith();
  it.each([
    ['a file in place of a folder', 'small-wheel.yaml', /a part of the path is a file/],
    ['a folder below a file', 'small-wheel.yaml/out', /a part of the path is a file/],
    ...(existsSync('/proc/self')
      ? ([['a folder that takes none', '/proc/ogive', /cannot be written/]] as const)
      : []),
  ] as const)('%s: 2, said in a sentence, nothing changed', (_, out, message) => {
    const { exit, err } = ogive(['cut', 'small-wheel.yaml', '--out', out], folder);
    expect(exit).toBe(2);
    expect(err).toMatch(message);
    expect(err).not.toContain('fault of Ogive');
    expect(namesIn(folder)).toEqual(['small-wheel.yaml']);
  });

  it('makes folders within folders, with blanks in their names', () => {
    const { exit } = ogive(['cut', 'small-wheel.yaml', '--out', 'one two/three'], folder);
    expect(exit).toBe(0);
    expect(namesIn(join(folder, 'one two/three'))).toContain('small-wheel.html');
  });
});

describe('ogive prove', { timeout: 60_000 }, () => {
  it('holds a walk-round, which cuts no wheel, against the machine alone', () => {
    const folder = folderWith();
    cutSmall(folder);
    const walk = namesIn(folder).find((name) => name.includes('-walk')) ?? '';
    const { exit, err } = ogive(['prove', walk, '--job', 'small-wheel.yaml'], folder);
    expect(err).toMatch(/Passed\.\n1 program for .*it cuts no wheel/);
    expect(exit).toBe(0);
  });
});

it('"it cuts no wheel" of a program that could not be read to its end: says that the rest was not read', () => {
  const folder = folderWith();
  cutSmall(folder);
  const names = namesIn(folder).filter((one) => /-\d\.nc$/.test(one));
  const path = join(folder, names[0] ?? '');
  writeFileSync(path, readFileSync(path, 'utf8').replace(/^M0?5\b/m, 'G2 X1 Y1 I9 J0\nM5'));
  const { exit, err } = ogive(['prove', ...names, '--job', 'small-wheel.yaml'], folder);
  expect(exit).toBe(1);
  expect(err).toContain('Not read to its end: do not run it.');
  expect(err).not.toContain('it cuts no wheel');
});

it.runIf(existsSync('/dev/full'))('printed to a full disk is no fault of ours', () => {
  const shell = `${process.execPath} ${join(ROOT, 'dist/main.js')} new > /dev/full`;
  const { status, stderr } = spawnSync('bash', ['-c', shell], { encoding: 'utf8' });
  expect([status, stderr]).toEqual([2, 'what is printed cannot be written: the disk is full.\n']);
});

it('ends quietly where nobody reads on', () => {
  const shell = `${process.execPath} ${join(ROOT, 'dist/main.js')} machines | head -1`;
  const { stdout, stderr } = spawnSync('bash', ['-c', `${shell}; exit \${PIPESTATUS[0]}`], {
    encoding: 'utf8',
  });
  expect(stderr).toBe('');
  expect(stdout).toMatch(/^bench-mill: .*\n$/);
});

it('names the nearest command within a group', () => {
  const { exit, err } = ogive(['machines', 'chek', 'x.yaml'], newFolder());
  expect([exit, err]).toEqual([
    2,
    "there is no command 'machines chek'; did you mean 'machines check'? (ogive machines --help tells more)\n",
  ]);
});

it.each([['help', 'machines'], ['machines', 'help'], ['help']])('%s %s is help', (...words) => {
  const { exit, out } = ogive(words.filter(Boolean), newFolder());
  expect(exit).toBe(0);
  expect(out).toMatch(/^Usage: ogive/);
});
