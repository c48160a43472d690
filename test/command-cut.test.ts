/** `ogive cut` as a process: where it writes, what it leaves of earlier runs, what it says. `npm test` builds the command first. */
import { createHash } from 'node:crypto';
import { appendFileSync, chmodSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { terminalOf } from '../src/cli/terminal.ts';
import { onMachine } from './support/cut-text.ts';
import {
  boreLast,
  cutSmall,
  filesIn,
  folderWith,
  namesIn,
  newFolder,
  ogive,
  removeFolders,
  ROOT,
  smallJob,
} from './support/run-command.ts';

afterAll(removeFolders);

const WRITTEN = [
  'small-wheel-1.nc',
  'small-wheel-2.nc',
  'small-wheel-walk.nc',
  'small-wheel.html',
  'small-wheel.json',
  'small-wheel.svg',
];

describe('ogive cut, where it writes', { timeout: 60_000 }, () => {
  it('writes beside the job, whole files only, and says what they are', () => {
    const folder = folderWith();
    const { exit, out, err } = cutSmall(folder);
    expect([exit, out]).toEqual([0, '']);
    expect(namesIn(folder)).toEqual([...WRITTEN, 'small-wheel.yaml'].toSorted());
    expect(readdirSync(folder).filter((name) => name.includes('.part'))).toEqual([]);
    for (const name of WRITTEN) {
      expect(err).toContain(name);
    }
    expect(err).toMatch(/Not checked/);
    // As the sheet has it: half a minute is no "1 min".
    const minutes = /cutter 1, +(0\.\d) min, /.exec(err)?.[1];
    expect(minutes).toBeDefined();
    expect(filesIn(folder).get('small-wheel.html')).toContain(`${minutes} min`);
  });

  it('runs from an empty folder, into one that is not there yet', () => {
    const job = join(folderWith(), 'small-wheel.yaml');
    const empty = newFolder();
    expect(ogive(['cut', job, '--out', 'new/deep'], empty).exit).toBe(0);
    expect(namesIn(join(empty, 'new/deep'))).toEqual(WRITTEN);
  });

  it('runs in a folder with spaces and letters of other alphabets', () => {
    const folder = newFolder('räder für die Uhr — Ω 1');
    smallJob(folder);
    expect(cutSmall(folder).exit).toBe(0);
    expect(
      ogive(['cut', join(folder, 'small-wheel.yaml'), '--out', join(folder, 'to here')], ROOT).exit,
    ).toBe(0);
    expect(namesIn(join(folder, 'to here'))).toEqual(WRITTEN);
  });

  it('leaves a folder it may not write to as it is, and exits 2', () => {
    const folder = folderWith();
    writeFileSync(join(folder, 'file'), 'kept');
    const { exit, err } = cutSmall(folder, '--out', 'file/below');
    expect(exit).toBe(2);
    expect(err).toMatch(/cannot be written.*a part of the path is a file.*Nothing was changed/s);
    expect(namesIn(folder)).toEqual(['file', 'small-wheel.yaml']);
    expect(readFileSync(join(folder, 'file'), 'utf8')).toBe('kept');
  });

  it.runIf(process.getuid?.() !== 0)('leaves a read-only folder as it is, and exits 2', () => {
    const folder = folderWith();
    chmodSync(folder, 0o555);
    const { exit, err } = cutSmall(folder);
    chmodSync(folder, 0o755);
    expect(exit).toBe(2);
    expect(err).toMatch(/permission is denied/);
    expect(namesIn(folder)).toEqual(['small-wheel.yaml']);
  });

  it('takes its place back where a file cannot take its own', () => {
    const folder = folderWith();
    mkdirSync(join(folder, 'small-wheel.svg'));
    writeFileSync(join(folder, 'small-wheel.svg', 'in the way'), '');
    expect(cutSmall(folder).exit).toBe(2);
    expect(readdirSync(folder).filter((name) => name.includes('.part'))).toEqual([]);
  });

  it('writes the same bytes twice', () => {
    const [one, two] = [folderWith(), folderWith()];
    cutSmall(one);
    cutSmall(two);
    expect(namesIn(one)).toEqual(namesIn(two));
    for (const [name, bytes] of filesIn(one)) {
      expect(filesIn(two).get(name) === bytes, name).toBe(true);
    }
  });

  it('writes the programs of the shown sample whose sums are golden', () => {
    const folder = newFolder();
    expect(ogive(['cut', 'samples/third-wheel.yaml', '--out', folder], ROOT).exit).toBe(0);
    const sums = [...filesIn(folder)]
      .filter(([name]) => name.endsWith('.nc'))
      .map(([name, bytes]) => `${createHash('sha256').update(bytes, 'latin1').digest('hex')}  ${name}`);
    const golden = readFileSync(join(ROOT, 'test/golden/third-wheel.sha256'), 'utf8');
    expect(sums.toSorted()).toEqual(golden.trimEnd().split('\n').toSorted());
  });
});

describe('ogive cut, programs that are there already', { timeout: 60_000 }, () => {
  it('does not write over one that was edited by hand, and changes nothing', () => {
    const folder = folderWith();
    cutSmall(folder);
    appendFileSync(join(folder, 'small-wheel-2.nc'), '(MY OWN LINE)\n');
    writeFileSync(
      join(folder, 'small-wheel.yaml'),
      readFileSync(join(folder, 'small-wheel.yaml'), 'utf8').replace('toy clock', 'small clock'),
    );
    const before = filesIn(folder);
    const { exit, err } = cutSmall(folder);
    expect(exit).toBe(2);
    expect(err).toMatch(/small-wheel-2\.nc.*edited by hand.*--force/s);
    expect(filesIn(folder)).toEqual(before);
  });

  it('keeps the edited one beside where it is forced', () => {
    const folder = folderWith();
    cutSmall(folder);
    const good = readFileSync(join(folder, 'small-wheel-2.nc'), 'utf8');
    appendFileSync(join(folder, 'small-wheel-2.nc'), '(MY OWN LINE)\n');
    expect(cutSmall(folder, '--force').exit).toBe(0);
    expect(readFileSync(join(folder, 'small-wheel-2.nc'), 'utf8')).toBe(good);
    expect(readFileSync(join(folder, 'small-wheel-2.nc.edited.txt'), 'utf8')).toContain('(MY OWN LINE)');
  });

  it('keeps an edited one that it would not write again too', () => {
    const folder = folderWith();
    cutSmall(folder);
    appendFileSync(join(folder, 'small-wheel-2.nc'), '(MY OWN LINE)\n');
    const job = join(folder, 'small-wheel.yaml');
    writeFileSync(job, onMachine(readFileSync(job, 'utf8'), 'bench-mill'));
    expect(cutSmall(folder).exit).toBe(0);
    expect(namesIn(folder)).toContain('small-wheel-2.nc.edited.txt');
  });

  it("renames an earlier run's programs that this run did not write", () => {
    const folder = folderWith();
    cutSmall(folder);
    const job = join(folder, 'small-wheel.yaml');
    writeFileSync(job, onMachine(readFileSync(job, 'utf8'), 'bench-mill'));
    const { exit, err } = cutSmall(folder);
    expect(exit).toBe(0);
    expect(err).toMatch(/small-wheel-1\.nc is from an earlier run; it is now small-wheel-1\.nc\.old\.txt/);
    expect(namesIn(folder).filter((name) => name.includes('.nc'))).toEqual(
      ['1', '2', 'walk'].map((part) => `small-wheel-${part}.nc.old.txt`),
    );
    expect(namesIn(folder)).toContain('small-wheel.ngc');
  });

  it('leaves the programs of other jobs alone', () => {
    const folder = folderWith();
    for (const name of ['small-wheel-extra.nc', 'small-wheels.nc', 'other.nc']) {
      writeFileSync(join(folder, name), 'M2\n');
    }
    expect(cutSmall(folder).exit).toBe(0);
    expect(namesIn(folder)).toEqual(
      expect.arrayContaining(['small-wheel-extra.nc', 'small-wheels.nc', 'other.nc']),
    );
  });

  it("leaves another job's one program alone that is called like this one's first", () => {
    const folder = folderWith();
    const text = onMachine(readFileSync(join(folder, 'small-wheel.yaml'), 'utf8'), 'inch-bench-mill');
    writeFileSync(join(folder, 'small-wheel-1.yaml'), text);
    writeFileSync(join(folder, 'small-wheel.yaml'), text);
    expect(ogive(['cut', 'small-wheel-1.yaml'], folder).exit).toBe(0);
    expect(ogive(['cut', 'small-wheel.yaml'], folder).exit).toBe(0);
    expect(namesIn(folder)).toEqual(expect.arrayContaining(['small-wheel-1.nc', 'small-wheel.nc']));
  });
});

describe('ogive cut, a program that fails its own proof', { timeout: 60_000 }, () => {
  const folder = folderWith();
  cutSmall(folder);
  const job = join(folder, 'small-wheel.yaml');
  writeFileSync(job, boreLast(readFileSync(job, 'utf8')));
  const ran = cutSmall(folder);

  it('is refused with its reason, exit 1', () => {
    expect(ran.exit).toBe(1);
    expect(ran.err).toMatch(/the bore is still being cut here/);
    expect(ran.err).toMatch(/no program was written/);
  });

  it("leaves nothing that runs, nor an earlier run's", () => {
    expect(namesIn(folder).filter((name) => /\.(nc|ngc|gc|tap|din)$/.test(name))).toEqual([]);
    expect(namesIn(folder).filter((name) => name.endsWith('.old.txt'))).toHaveLength(3);
  });

  it('is kept with every line behind a comment mark, the reasons on top', () => {
    const lines = readFileSync(join(folder, 'small-wheel.refused.txt'), 'latin1').trimEnd().split('\n');
    expect(lines.filter((line) => !/^; \([^()%;]*\)$/.test(line))).toEqual([]);
    expect(lines.slice(0, 2).join()).toMatch(/REFUSED.*prove\.order/s);
    expect(lines.length).toBeGreaterThan(100);
  });

  it('has a sheet and a summary that say so', () => {
    const summary = JSON.parse(readFileSync(join(folder, 'small-wheel.json'), 'utf8')) as {
      verdict: string;
      programs: unknown[];
    };
    expect(summary).toMatchObject({ verdict: 'refuse', programs: [] });
    expect(readFileSync(join(folder, 'small-wheel.html'), 'utf8')).toMatch(/bore is still being cut/);
  });

  it('is renamed once the job is mended', () => {
    const mended = folderWith(boreLast);
    expect(cutSmall(mended).exit).toBe(1);
    smallJob(mended);
    expect(cutSmall(mended).exit).toBe(0);
    expect(namesIn(mended)).toContain('small-wheel.refused.txt.old.txt');
    expect(namesIn(mended)).not.toContain('small-wheel.refused.txt');
  });
});

describe('ogive cut, what it says', { timeout: 60_000 }, () => {
  it('--json puts the summary on stdout and nothing else', () => {
    const folder = folderWith();
    const { exit, out } = cutSmall(folder, '--json');
    expect(exit).toBe(0);
    const summary = JSON.parse(out) as { format: string; programs: { file: string; sha256: string }[] };
    expect(summary).toMatchObject({ format: 'ogive-summary/1', verdict: 'pass', part: { teeth: 7 } });
    expect(out).toBe(readFileSync(join(folder, 'small-wheel.json'), 'utf8'));
    for (const { file, sha256 } of summary.programs) {
      const bytes = readFileSync(join(folder, file));
      expect(createHash('sha256').update(bytes).digest('hex')).toBe(sha256);
    }
  });

  it('--json has a summary of a refused run too', () => {
    const { exit, out } = cutSmall(folderWith(boreLast), '--json');
    expect(exit).toBe(1);
    expect(JSON.parse(out)).toMatchObject({ verdict: 'refuse', programs: [] });
  });

  it('--quiet says nothing where nothing is wrong, and what is wrong where it is', () => {
    expect(cutSmall(folderWith(), '--quiet')).toEqual({ exit: 0, out: '', err: '' });
    const { exit, out, err } = cutSmall(
      folderWith((text) => text.replace('teeth: 7', 'teeth: 3')),
      '--quiet',
    );
    expect([exit, out]).toEqual([2, '']);
    expect(err).toMatch(/small-wheel\.yaml:7:10 wheel\.teeth/);
  });

  it('writes no colours into a pipe', () => {
    for (const edit of [boreLast, (text: string) => text.replace('teeth: 7', 'teeth: 3')]) {
      const { err } = cutSmall(folderWith(edit));
      expect(err).not.toBe('');
      expect(err).not.toContain('\u001b');
    }
  });

  it('obeys NO_COLOR on a terminal [no-color.org: any value that is not empty]', () => {
    const { isTTY } = process.stderr;
    const { NO_COLOR, TERM } = process.env;
    process.stderr.isTTY = true;
    process.env['TERM'] = 'xterm';
    const shown = (value: string): string => {
      process.env['NO_COLOR'] = value;
      return terminalOf(false).danger('no');
    };
    const [plain, red] = [shown('1'), shown('')];
    process.stderr.isTTY = isTTY;
    Object.assign(process.env, { NO_COLOR: NO_COLOR ?? '', TERM: TERM ?? '' });
    expect(plain).toBe('no');
    expect(red).toBe('\u001b[31mno\u001b[0m');
  });
});
