/** The built command given bad names, empty words and odd places: exit 2, a sentence that says what to do, and nothing written. */
import { spawnSync } from 'node:child_process';
import { chmodSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { onMachine } from './support/cut-text.ts';
import { folderWith, namesIn, newFolder, ogive, removeFolders, ROOT } from './support/run-command.ts';

afterAll(removeFolders);

describe('a machine that the job names and nobody finds', { timeout: 60_000 }, () => {
  const folder = folderWith();
  mkdirSync(join(folder, 'a-folder'));
  const text = readFileSync(join(folder, 'small-wheel.yaml'), 'utf8');
  const line = text.split('\n').findIndex((one) => one.startsWith('machine:')) + 1;
  it.each([
    [
      'a path that leads nowhere',
      'sub/mine.yaml',
      /the machine file sub\/mine\.yaml cannot be read: there is no/,
    ],
    ['a folder', './a-folder', /the machine file a-folder cannot be read: it is a folder, not a file\./],
    ['a device', '/dev/null', /cannot be read: it is no file but a pipe or a device\./],
    [
      'one that came along, with an ending',
      'bench-mill.yaml',
      /bench-mill is a machine that came along: write its name/,
    ],
    [
      'one that came along, with folder and capitals',
      'posts/Bench-Mill.YAML',
      /without folder and ending: bench-mill\./,
    ],
    ['a name with a NUL', '"a\\0b.yaml"', /no file can have such a name/],
    ['a name that would colour the screen', '"\\e[31mred"', /there is no machine ' \[31mred'/],
    ['a mistyped name', 'bench-mil', /did you mean 'bench-mill'/],
  ])('%s is told at its line of the job', (_, machine, message) => {
    writeFileSync(join(folder, 'job.yaml'), onMachine(text, machine));
    const { exit, err } = ogive(['cut', 'job.yaml'], folder);
    expect(exit).toBe(2);
    expect(err).toMatch(message);
    expect(err.startsWith(`job.yaml:${line}:10 machine: `)).toBe(true);
    // oxlint-disable-next-line no-control-regex -- control characters are what must not be printed
    expect(err).not.toMatch(/E[A-Z]{3,}|[\u0000-\u0009\u000b-\u001f]/);
  });
  it('is told at its line to whoever proves a program too', () => {
    writeFileSync(join(folder, 'job.yaml'), onMachine(text, 'mine.yaml'));
    const { err } = ogive(['prove', 'job.yaml', '--job', 'job.yaml'], folder);
    expect(err).toMatch(new RegExp(`^job\\.yaml:${line}:10 machine: the machine file mine\\.yaml`));
  });
  it('and a file of another kind is not taken for one with everything missing', () => {
    writeFileSync(join(folder, 'job.yaml'), onMachine(text, './small-wheel.yaml'));
    const { err } = ogive(['cut', 'job.yaml'], folder);
    expect(err).toBe(
      'small-wheel.yaml:2:9 format: ogive-job/1 is not right here.\n  Give ogive-machine/1.\n',
    );
  });
});

describe('a job that is no file', { timeout: 60_000 }, () => {
  const folder = folderWith();
  it.each([
    ['a folder', '.', /^\.: it is a folder, not a file\.\n/],
    ['a device', '/dev/null', /^\/dev\/null: it is no file but a pipe or a device\.\n/],
    ['not there', 'sub/job.yaml', /^sub\/job\.yaml: there is no such file or folder\.\n/],
  ])('%s', (_, job, message) => {
    const { exit, err } = ogive(['cut', job], folder);
    expect([exit, namesIn(folder)]).toEqual([2, ['small-wheel.yaml']]);
    expect(err).toMatch(message);
  });
  it('a pipe that nobody writes to does not hold it up', () => {
    const made = spawnSync('mkfifo', [join(folder, 'pipe.yaml')]);
    if (made.status === 0) {
      expect(ogive(['cut', 'pipe.yaml'], folder)).toMatchObject({
        exit: 2,
        err: expect.stringMatching(/a pipe/),
      });
    }
  });
  it.runIf(process.getuid?.() !== 0)('one that may not be read', () => {
    const other = folderWith();
    chmodSync(join(other, 'small-wheel.yaml'), 0);
    expect(ogive(['cut', 'small-wheel.yaml'], other).err).toMatch(/permission is denied/);
  });
  it('standard input lies in no folder: nothing is written into /dev', () => {
    const run = (args: readonly string[]) =>
      spawnSync(process.execPath, [join(ROOT, 'dist/main.js'), ...args], {
        cwd: folder,
        input: readFileSync(join(folder, 'small-wheel.yaml')),
        encoding: 'utf8',
      });
    for (const command of ['cut', 'draw']) {
      const { status, stderr } = run([command, '/dev/stdin']);
      expect(status).toBe(2);
      expect(stderr).toMatch(/lies in no folder.*Nothing was written\.\n {2}Say where: --out/);
    }
    expect(run(['cut', '/dev/stdin', '--out', 'out']).status).toBe(0);
    expect(namesIn(join(folder, 'out'))).toContain('stdin-1.nc');
  });
});

describe(
  'what was not understood is said in our words, with the help of the command',
  { timeout: 60_000 },
  () => {
    const folder = folderWith();
    it.each([
      [['cut', '--faster', 'a.yaml'], "there is no option '--faster' (ogive cut --help tells more)"],
      [
        ['cut', '--forse', 'a.yaml'],
        "there is no option '--forse'; did you mean '--force'? (ogive cut --help tells more)",
      ],
      [
        ['cut', '--json=yes', 'a.yaml'],
        '--json takes no value: write --json alone (ogive cut --help tells more)',
      ],
      [['cut'], 'the job is missing: ogive cut JOB (ogive cut --help tells more)'],
      [
        ['machines', 'check'],
        'the file is missing: ogive machines check FILE (ogive machines check --help tells more)',
      ],
      [
        ['cut', 'a.yaml', '--out'],
        'nothing stands behind --out: write --out DIR (ogive cut --help tells more)',
      ],
      [
        ['cut', 'my', 'wheel.yaml'],
        'ogive cut takes only one argument, the job; a name with blanks in it goes between quotes (ogive cut --help tells more)',
      ],
      [
        ['cut', 'small-wheel.yaml', '--out', ''],
        'an empty text stands behind --out: was a name left out? (ogive cut --help tells more)',
      ],
      [
        ['cut', 'small-wheel.yaml', '--out='],
        'an empty text stands behind --out: was a name left out? (ogive cut --help tells more)',
      ],
      [
        ['cut', ''],
        'an empty text stands in place of a name: was a name left out? (ogive cut --help tells more)',
      ],
      [['help', 'engrave'], "there is no command 'engrave' (ogive --help tells more)"],
    ])('%j', (args, words) => {
      expect(ogive(args, folder)).toEqual({ exit: 2, out: '', err: `${words}\n` });
      expect(namesIn(folder)).toEqual(['small-wheel.yaml']);
    });
  },
);

describe('what was read is not written over', { timeout: 60_000 }, () => {
  it.each(['wheel.json', 'wheel.html', 'wheel.svg', 'wheel-1.nc', 'wheel.nc'])('a job named %s', (name) => {
    const folder = folderWith();
    const text = readFileSync(join(folder, 'small-wheel.yaml'), 'utf8');
    const job = name === 'wheel.json' ? JSON.stringify(parse(text)) : text;
    writeFileSync(join(folder, name), job);
    const { exit, err } = ogive(['cut', name], folder);
    expect([exit, readFileSync(join(folder, name), 'utf8')]).toEqual([2, job]);
    expect(err).toMatch(
      /^(wheel\S*): would be lost: \1 is to be written or renamed here.*Nothing was changed\.\n/,
    );
    expect(namesIn(folder)).toEqual(['small-wheel.yaml', name]);
    expect(ogive(['cut', name, '--out', 'out'], folder).exit).toBe(0);
  });
  it('a file of cutters that has the name of the summary', () => {
    const folder = folderWith((text) =>
      text.replace(/^cutters:\n(?: {2}.*\n)+/m, 'cutters: small-wheel.json\n'),
    );
    const cutters = JSON.stringify({
      cutters: { 1: { diameter: 1, reach: 3 }, 2: { diameter: 0.8, reach: 2 } },
    });
    writeFileSync(join(folder, 'small-wheel.json'), cutters);
    expect(ogive(['cut', 'small-wheel.yaml'], folder)).toMatchObject({
      exit: 2,
      err: expect.stringMatching(/would be lost/),
    });
    expect(readFileSync(join(folder, 'small-wheel.json'), 'utf8')).toBe(cutters);
  });
  it('a job that a drawing or a list of moves is named after', () => {
    const folder = folderWith();
    const text = readFileSync(join(folder, 'small-wheel.yaml'), 'utf8');
    writeFileSync(join(folder, 'w.svg'), text);
    writeFileSync(join(folder, 'w.jsonl'), text);
    expect(ogive(['draw', 'w.svg', '--out', 'w.svg'], folder).exit).toBe(2);
    expect(
      ogive(['prove', 'w.jsonl', '--job', 'small-wheel.yaml', '--moves', './w.jsonl'], folder).exit,
    ).toBe(2);
    expect(readFileSync(join(folder, 'w.svg'), 'utf8') + readFileSync(join(folder, 'w.jsonl'), 'utf8')).toBe(
      text + text,
    );
  });
});

describe('a drawing under a name of another kind', { timeout: 60_000 }, () => {
  it.each([['wheel.png'], ['wheel'], ['wheel.dxf']])('%s is not written', (name) => {
    const folder = folderWith();
    const { exit, err } = ogive(['draw', 'small-wheel.yaml', '--out', name], folder);
    expect([exit, namesIn(folder)]).toEqual([2, ['small-wheel.yaml']]);
    expect(err).toMatch(
      /a drawing is written as SVG, with --dxf as DXF, and this name does not end in \.svg/,
    );
  });
});

describe('folders that are not there', { timeout: 60_000 }, () => {
  it.each([
    ['new', ['new', 'wheels/third.yaml']],
    ['draw', ['draw', 'small-wheel.yaml', '--out', 'wheels/third.svg']],
  ])('are not made by ogive %s, where a name may be mistyped', (_, args) => {
    const folder = folderWith();
    const { exit, err } = ogive(args, folder);
    expect([exit, err]).toEqual([
      2,
      'wheels: there is no such folder. Nothing was written.\n  Make it first, or look whether its name is right.\n',
    ]);
  });
  it('are no name of a starter job', () => {
    expect(ogive(['new', 'wheels/'], newFolder()).err).toMatch(/wheels\/: is the name of a folder\./);
  });
});

it('counts one thing to mend as one', () => {
  const folder = newFolder();
  writeFileSync(join(folder, 'mine.yaml'), 'like: bench-mill\nproved: yes\n');
  expect(ogive(['machines', 'check', 'mine.yaml'], folder).err).toMatch(/as it is: 1 thing to mend\.\n/);
});
