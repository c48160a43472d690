/** The built command as a process: exit codes, help, prove, new, machines, draw. `npm test` builds it first. */
import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { CHECK_CODES } from '../src/prove/check-codes.ts';
import { MACHINES, onMachine, SAMPLES, sampleText } from './support/cut-text.ts';
import { breaches, type Schema } from './support/json-schema.ts';
import {
  cutSmall,
  filesIn,
  folderWith,
  namesIn,
  newFolder,
  ogive,
  removeFolders,
  ROOT,
} from './support/run-command.ts';

afterAll(removeFolders);

describe('exit codes', { timeout: 60_000 }, () => {
  const folder = folderWith();
  writeFileSync(join(folder, 'large.yaml'), `# ${'x'.repeat(10_000_000)}\n`);
  writeFileSync(join(folder, 'binary.yaml'), Buffer.from([0x7f, 0x45, 0x4c, 0x46, 0, 1, 2, 0xff, 0xfe, 0]));
  writeFileSync(join(folder, 'latin.yaml'), Buffer.from([0x74, 0x69, 0xe9, 0x0a]));
  writeFileSync(join(folder, 'empty.yaml'), '');
  const text = readFileSync(join(folder, 'small-wheel.yaml'), 'utf8');
  writeFileSync(join(folder, 'bad.yaml'), text.replace('teeth: 7', 'teeth: seven\n  tooths: 3'));
  writeFileSync(join(folder, 'nowhere.yaml'), onMachine(text, 'bench-mil'));
  writeFileSync(join(folder, 'wide.yaml'), text.replace('diameter: 0.8,', 'diameter: 2.4,'));

  it.each([
    ['a job of 10 MB', ['cut', 'large.yaml'], /large\.yaml/],
    ['a binary job', ['cut', 'binary.yaml'], /binary\.yaml/],
    ['a job that is not UTF-8', ['cut', 'latin.yaml'], /latin\.yaml/],
    ['an empty job', ['cut', 'empty.yaml'], /empty\.yaml/],
    ['a job that is not there', ['cut', 'missing.yaml'], /missing\.yaml.*no such file/s],
    ['a folder in place of a job', ['cut', '.'], /folder/],
    ['every bad value at once', ['cut', 'bad.yaml'], /bad\.yaml:7:10 wheel\.teeth.*bad\.yaml:8:3 .*tooths/s],
    ['an unknown machine', ['cut', 'nowhere.yaml'], /bench-mil.*did you mean 'bench-mill'/s],
    ['an unknown option', ['cut', 'small-wheel.yaml', '--faster'], /--faster/],
    ['an unknown command', ['engrave', 'small-wheel.yaml'], /ogive --help/],
    ['no job', ['cut'], /job/],
    ['one argument too many', ['cut', 'small-wheel.yaml', 'bad.yaml'], /argument/],
    ['an option without its value', ['cut', 'small-wheel.yaml', '--out'], /--out/],
    ['prove without a job', ['prove', 'small-wheel.yaml'], /job/],
    ['a drawing of a bad job', ['draw', 'bad.yaml'], /wheel\.teeth/],
    ['a machine that is not there', ['machines', 'check', 'missing.yaml'], /missing\.yaml/],
    ['a machine file that is none', ['machines', 'check', 'small-wheel.yaml'], /small-wheel\.yaml/],
    ['new over a file', ['new', 'small-wheel.yaml'], /is there already/],
  ])('2: %s', (_, args, message) => {
    const { exit, out, err } = ogive(args, folder);
    expect([exit, out]).toEqual([2, '']);
    expect(err).toMatch(message);
    expect(err).not.toMatch(/at .*\.(js|ts):\d+|fault of Ogive/);
  });

  it('1: understood, but a cutter does not get in; the sheet says why, and no program is written', () => {
    const { exit, err } = ogive(['cut', 'wide.yaml'], folder);
    expect(exit).toBe(1);
    expect(err).toMatch(/wide\.yaml.*mm/);
    const names = namesIn(folder).filter((name) => name.startsWith('wide'));
    expect(names).toEqual(['wide.html', 'wide.json', 'wide.svg', 'wide.yaml']);
  });

  it('2 leaves nothing behind', () => {
    expect(namesIn(folder).filter((name) => !/^(wide\.|.*\.yaml$)/.test(name))).toEqual([]);
  });

  it('0: nothing asked for, help and version', () => {
    const { version } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8')) as { version: string };
    expect(ogive([], folder)).toMatchObject({ exit: 0, err: '' });
    expect(ogive(['--version'], folder)).toEqual({ exit: 0, out: `${version}\n`, err: '' });
  });

  it.each([[], ['cut'], ['prove'], ['draw'], ['machines'], ['new']])(
    'help of %s has examples',
    (...command) => {
      const { exit, out } = ogive([...command, '--help'], folder);
      expect(exit).toBe(0);
      expect(out).toMatch(/Examples:\n {2}ogive /);
    },
  );

  it('prints the notices of every library of package.json that runs', () => {
    const { dependencies } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8')) as {
      dependencies: Record<string, string>;
    };
    const { exit, out } = ogive(['--notices'], folder);
    expect(exit).toBe(0);
    for (const name of Object.keys(dependencies)) {
      expect(out).toMatch(new RegExp(`^${name.replaceAll('/', '\\/')} \\d`, 'm'));
    }
  });
});

describe('ogive prove', { timeout: 60_000 }, () => {
  const folder = folderWith();
  cutSmall(folder);
  const programs = ['small-wheel-1.nc', 'small-wheel-2.nc'];

  it('reads written programs back from disk and passes them', () => {
    const { exit, out, err } = ogive(['prove', ...programs, '--job', 'small-wheel.yaml'], folder);
    expect([exit, out]).toEqual([0, '']);
    expect(err).toMatch(
      /Passed\.\n2 programs for .* blocks, the flank .*\nTakes \S+ (?:s|min): cutter 1 [^]*\nNot checked:\n {2}\S/,
    );
  });

  it('answers in JSON, and writes each move as a line', () => {
    const args = ['prove', ...programs, '--job', 'small-wheel.yaml', '--json', '--moves', 'moves.jsonl'];
    const { exit, out } = ogive(args, folder);
    expect(exit).toBe(0);
    const proof = JSON.parse(out) as {
      notChecked: string[];
      seconds: number;
      cuttingSeconds: number;
      time: {
        cutters: { cutter: number }[];
        passes: { name: string }[];
        spent: Record<string, number>;
        rounding: { says: string }[];
      };
    };
    expect(proof).toMatchObject({ format: 'ogive-proof/1', verdict: 'pass', findings: [] });
    expect(proof.notChecked.length).toBeGreaterThan(0);
    expect(proof.seconds).toBeGreaterThan(proof.cuttingSeconds);
    const { cutters, passes, spent, rounding } = proof.time;
    expect(cutters.map(({ cutter }) => cutter)).toEqual([1, 2]);
    expect(passes.map(({ name }) => name)).toContain('ROUGHING');
    const parts = Object.values(spent).reduce((sum, seconds) => sum + seconds, 0);
    expect(Math.abs(parts - proof.seconds)).toBeLessThan(0.001);
    expect(rounding[0]?.says).toMatch(/no word for the exact path/);
    const moves = readFileSync(join(folder, 'moves.jsonl'), 'utf8').trimEnd().split('\n');
    const kinds = new Set(moves.map((line) => (JSON.parse(line) as { kind: string }).kind));
    expect([...kinds].toSorted()).toEqual(['arc', 'line', 'rapid']);
    rmSync(join(folder, 'moves.jsonl'));
  });

  it('refuses one that was damaged, at its line', () => {
    const lines = readFileSync(join(folder, 'small-wheel-1.nc'), 'utf8').split('\n');
    const at = lines.findIndex((line) => /^S\d+ M3$/.test(line));
    writeFileSync(join(folder, 'damaged.nc'), lines.toSpliced(at, 1).join('\n'));
    const args = ['prove', 'damaged.nc', 'small-wheel-2.nc', '--job', 'small-wheel.yaml'];
    const { exit, err } = ogive(args, folder);
    expect(exit).toBe(1);
    expect(err).toMatch(/^damaged\.nc:\d+: .*spindle stands still/m);
    expect(err).toMatch(/Refused: do not run it/);
  });

  it('explains every check', () => {
    const { exit, out } = ogive(['prove', '--explain'], folder);
    expect(exit).toBe(0);
    for (const code of Object.keys(CHECK_CODES)) {
      expect(out).toContain(`${code}\n  guards against  `);
    }
  });
});

describe('ogive new', { timeout: 60_000 }, () => {
  it('writes a job that runs as it is', () => {
    const folder = newFolder();
    expect(ogive(['new', 'my-wheel.yaml'], folder)).toMatchObject({ exit: 0, out: '' });
    expect(ogive(['cut', 'my-wheel.yaml'], folder).exit).toBe(0);
    expect(namesIn(folder)).toContain('my-wheel.html');
    expect(readFileSync(join(folder, 'my-wheel.yaml'), 'utf8')).toBe(ogive(['new'], folder).out);
  });

  it('prints a JSON Schema that the samples keep to, and bad jobs do not', () => {
    const schema = JSON.parse(ogive(['new', '--schema'], ROOT).out) as Schema;
    expect(schema).toMatchObject({ type: 'object', additionalProperties: false });
    for (const sample of SAMPLES) {
      expect(breaches(schema, parse(sampleText(sample))), sample).toEqual([]);
    }
    const good = parse(sampleText('third-wheel')) as { wheel: object };
    expect(breaches(schema, { ...good, wheels: 2 })).toEqual(['job.wheels: unknown']);
    expect(breaches(schema, { ...good, wheel: { ...good.wheel, teeth: 3 } })).toEqual([
      'job.wheel.teeth: below 6',
    ]);
    expect(breaches(schema, { ...good, blank: undefined })).not.toEqual([]);
  });
});

describe('ogive machines', { timeout: 60_000 }, () => {
  it('lists them all', () => {
    const { exit, out } = ogive(['machines'], newFolder());
    expect(exit).toBe(0);
    for (const machine of MACHINES) {
      expect(out).toContain(machine);
    }
  });

  it.each(MACHINES)('finds nothing to mend in %s', (machine) => {
    const { exit, out, err } = ogive(['machines', 'check', join(ROOT, `posts/${machine}.yaml`)], newFolder());
    expect([exit, err]).toEqual([0, '']);
    expect(out).toMatch(/came back as they were meant/);
  });

  it('explains every field of one', () => {
    const { exit, out } = ogive(['machines', 'explain', 'desk-three-axis'], newFolder());
    expect(exit).toBe(0);
    expect(out).toMatch(/spin-up-seconds/);
  });
});

describe('ogive draw', { timeout: 60_000 }, () => {
  it('draws the outline of the sample as it was accepted', () => {
    const { exit, out, err } = ogive(['draw', 'samples/third-wheel.yaml', '--out', '-'], ROOT);
    expect([exit, err]).toEqual([0, '']);
    expect(out === readFileSync(join(ROOT, 'test/golden/third-wheel-outline.svg'), 'utf8')).toBe(true);
  });

  it('writes SVG and DXF beside the job', () => {
    const folder = folderWith();
    expect(ogive(['draw', 'small-wheel.yaml'], folder)).toMatchObject({ exit: 0, out: '' });
    expect(ogive(['draw', 'small-wheel.yaml', '--dxf'], folder)).toMatchObject({ exit: 0, out: '' });
    expect(ogive(['draw', 'small-wheel.yaml', '--as-cut', '--out', 'cut.svg'], folder).exit).toBe(0);
    expect(namesIn(folder)).toEqual(
      ['cut.svg', 'small-wheel-outline.dxf', 'small-wheel-outline.svg', 'small-wheel.yaml'].toSorted(),
    );
    const dxf = filesIn(folder).get('small-wheel-outline.dxf') ?? '';
    expect(dxf).toMatch(/^ *0\r?\nSECTION\r?\n/);
    // Group 42 of a polyline's corner is its bulge: an arc (DXF reference, LWPOLYLINE; from memory).
    expect(dxf).toMatch(/LWPOLYLINE[\s\S]*\n *42\r?\n-?0?\.\d/);
  });
});
