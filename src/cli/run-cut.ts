/** `ogive cut`: reads the job, runs the flow, and puts its files in place; or says why there are none. */
import { basename, join, resolve } from 'node:path';
import type { Problem } from '../base/problem.ts';
import { showProblem } from '../base/show-problem.ts';
import { cut, type CutResult } from '../cut.ts';
import { changeFolder, folderOf, isStandardInput, noPlace, readText } from './files.ts';
import { sha256 } from './hash.ts';
import { keepInputs } from './keep-inputs.ts';
import { findMachine, ownMachine } from './own-machines.ts';
import { keepOldPrograms, programsIn } from './old-programs.ts';
import type { Exit } from './program.ts';
import { duration } from '../report/words.ts';
import { terminalOf, type Terminal } from './terminal.ts';

export interface CutOptions {
  readonly out?: string;
  readonly json?: boolean;
  readonly quiet?: boolean;
  readonly force?: boolean;
}

export function runCut(jobFile: string, options: CutOptions, version: string): Exit {
  const terminal = terminalOf(options.quiet === true);
  if (options.out === undefined && isStandardInput(jobFile)) {
    terminal.problems([noPlace(jobFile, 'FOLDER; they are called stdin-1 and so on')]);
    return 2;
  }
  const job = readText(jobFile);
  if (!job.ok) {
    terminal.problems(job.problems);
    return 2;
  }
  const read = [jobFile];
  const result = cut({
    file: jobFile,
    text: job.value,
    version,
    findMachine: (name) => {
      const found = findMachine(name, { file: jobFile, folder: folderOf(jobFile) });
      read.push(...(found.ok && ownMachine(name) === undefined ? [found.value.file] : []));
      return found;
    },
    loadMachine: ownMachine,
    readCutters: (path) => {
      const file = resolve(folderOf(jobFile), path);
      read.push(file);
      return readText(file);
    },
    hash: sha256,
    stage: terminal.progress,
  });
  terminal.progressDone();
  terminal.problems(result.problems);
  const folder = options.out ?? folderOf(jobFile);
  if (result.exit === 2) {
    sayOfOldOnes(folder, jobFile, terminal);
    return 2;
  }
  const put = putInPlace(folder, read, result, options.force === true, terminal);
  if (put !== undefined) {
    terminal.problems(put);
    return 2;
  }
  report(result, folder, options, terminal);
  return result.exit;
}

/** A job that cannot be read changes nothing on disk; that programs of an earlier one lie there must be said. */
function sayOfOldOnes(folder: string, jobFile: string, terminal: Terminal): void {
  const old = programsIn(folder, nameOf(jobFile));
  if (old.length > 0) {
    terminal.say(
      `Nothing was changed in ${folder === '.' ? 'this folder' : folder}. There, from an earlier run and not of this job as it stands: ${old.join(', ')}. Do not run them.`,
    );
  }
}

/** Everything of a run at once; problems where nothing was changed. */
function putInPlace(
  folder: string,
  read: readonly string[],
  result: CutResult,
  force: boolean,
  terminal: Terminal,
): readonly Problem[] | undefined {
  if (result.facts === undefined) {
    return undefined;
  }
  const { job, machine } = result.facts;
  const old = keepOldPrograms(folder, job.name, machine.words.file.ending, result.files, force);
  if (!old.ok) {
    return old.problems;
  }
  const names = [...result.files.map(({ name }) => name), ...old.value.map(({ from }) => from)];
  const lost = keepInputs(
    folder,
    names,
    read,
    'Name another folder with --out, or give this file another name.',
  );
  if (lost.length > 0) {
    return lost;
  }
  const done = changeFolder(folder, { write: result.files, rename: old.value });
  if (!done.ok) {
    return done.problems;
  }
  for (const { from, to } of old.value) {
    terminal.say(`${join(folder, from)} is from an earlier run; it is now ${to}`);
  }
  return undefined;
}

function report(result: CutResult, folder: string, options: CutOptions, terminal: Terminal): void {
  const { facts } = result;
  if (options.json === true && result.summary !== undefined) {
    process.stdout.write(`${JSON.stringify(result.summary, null, 2)}\n`);
  }
  if (facts === undefined) {
    return;
  }
  if (result.exit === 1) {
    for (const finding of (facts.proof?.findings ?? []).slice(0, 12)) {
      const at = { kind: 'program' as const, file: finding.file, line: finding.line };
      const text = showProblem({ ...finding, code: 'post.cannot-say', at });
      process.stderr.write(`${finding.severity === 'error' ? terminal.danger(text) : text}\n`);
    }
    const sheet = result.files.find(({ name }) => name.endsWith('.html'))?.name;
    terminal.say(
      sheet === undefined
        ? 'Refused; no program was written.'
        : `Refused; no program was written. The sheet says why: ${join(folder, sheet)}`,
    );
    return;
  }
  terminal.say(doneWords(result, folder));
}

/** The one thing that matters first, then the files in the order they are used. */
function doneWords(result: CutResult, folder: string): string {
  const { facts } = result;
  const figures = facts?.proof?.figures;
  if (facts === undefined || figures === undefined) {
    return '';
  }
  const um = (mm: number): string => `${(mm * 1000).toFixed(2)} um`;
  const times = facts.programs.map(({ seconds }) => duration(seconds));
  const counts = facts.programs.map(({ blocks }) => String(blocks));
  const column = (texts: readonly string[], i: number): string =>
    (texts[i] ?? '').padStart(Math.max(...texts.map((text) => text.length)));
  const files = [
    [facts.walkFile ?? '', 'run first: round the work at clear height, spindle still'],
    ...facts.programs.map(({ file, cutters }, i) => [
      file,
      `cutter ${cutters.join(', ')}, ${column(times, i)}, ${column(counts, i)} blocks`,
    ]),
    [`${facts.job.name}.html`, 'the sheet to read beside the machine'],
    [`${facts.job.name}.svg`, 'the drawing'],
    [`${facts.job.name}.json`, 'the summary'],
  ].map(([name = '', words = '']) => [join(folder, name), words] as const);
  const width = Math.max(...files.map(([path]) => path.length));
  const rows = files.map(([path, words]) => `${path.padEnd(width)}  ${words}`);
  return [
    `Proved. The cut flank lies ${um(figures.flankGouge)} inside and ${um(figures.flankLeft)} outside the exact curve at worst; ${um(figures.leftAtRoot)} stay at the root.`,
    ...rows,
    `Not checked: ${facts.proof?.notChecked.length ?? 0} things, listed on the sheet. Read it and the head of each program before the spindle turns.`,
  ].join('\n');
}

export function nameOf(file: string): string {
  return basename(file).replace(/\.[^.]*$/, '');
}
