/** `ogive prove`: programs read back from disk and held against the job they were made for; or the list of checks. */
import { basename, dirname, resolve } from 'node:path';
import { PROBLEM_CODES } from '../base/problem-codes.ts';
import { failure, type Outcome } from '../base/problem.ts';
import { showProblem } from '../base/show-problem.ts';
import { placeAt } from '../job/place-problems.ts';
import { readJob } from '../job/read-job.ts';
import type { Job } from '../job/job.ts';
import { targetOfJob } from '../job/target-of-job.ts';
import { readMachine } from '../machine/read-machine.ts';
import type { Machine } from '../machine/machine.ts';
import { CHECK_CODES } from '../prove/check-codes.ts';
import { proofJson } from '../prove/proof-json.ts';
import type { Proof, ProofInput } from '../prove/proof.ts';
import { proveSet, type SetProof } from '../prove/prove-set.ts';
import { sarifOf } from '../prove/sarif.ts';
import { timeWords } from '../prove/time-words.ts';
import { crossings } from '../tooth/crossings.ts';
import { wheelForm } from '../tooth/wheel-form.ts';
import { changeFolder, folderOf, isThere, readText } from './files.ts';
import { findMachine, ownMachine } from './own-machines.ts';
import { keepInputs } from './keep-inputs.ts';
import type { Exit } from './program.ts';
import { terminalOf, type Terminal } from './terminal.ts';

export interface ProveOptions {
  readonly job?: string;
  readonly moves?: string;
  readonly sarif?: string;
  readonly json?: boolean;
  readonly quiet?: boolean;
  readonly explain?: boolean;
}

export function runProve(files: readonly string[], options: ProveOptions, version: string): Exit {
  const terminal = terminalOf(options.quiet === true);
  if (options.explain === true) {
    process.stdout.write(explanation());
    return 0;
  }
  if (files.length === 0 || options.job === undefined) {
    const lacking = files.length === 0 ? 'no program is named' : 'the job they belong to is not named';
    process.stderr.write(`${lacking}; for example: ogive prove wheel.nc --job wheel.yaml\n`);
    return 2;
  }
  const texts = files.map((file) => ({ file: basename(file), text: readText(file) }));
  const unread = texts.flatMap(({ text }) => text.problems);
  const understood = understand(options.job);
  if (unread.length > 0 || !understood.ok) {
    terminal.problems([...unread, ...understood.problems]);
    return 2;
  }
  const programs = texts.map(({ file, text }) => ({ file, text: text.ok ? text.value : '' }));
  const { job, machine } = understood.value;
  const bare = { programs, machine, setup: job.setup };
  return answer(files, proveSet({ ...bare, ...targetOf(job) }), machine, options, { terminal, version });
}

function understand(jobFile: string): Outcome<{ job: Job; machine: Machine }> {
  const text = readText(jobFile);
  if (!text.ok) {
    return text;
  }
  const job = readJob(jobFile, text.value, (path) => readText(resolve(folderOf(jobFile), path)));
  if (!job.ok) {
    return job;
  }
  const found = findMachine(job.value.machine, { file: jobFile, folder: folderOf(jobFile) });
  if (!found.ok) {
    return failure(placeAt(found.problems, ['machine'], job.value));
  }
  const machine = readMachine(found.value.name, found.value.file, found.value.text, ownMachine);
  return machine.ok
    ? {
        ok: true,
        value: { job: job.value, machine: machine.value },
        problems: [...job.problems, ...machine.problems],
      }
    : machine;
}

function targetOf(job: Job): Pick<ProofInput, 'target'> {
  const form = wheelForm(job.wheel);
  if (!form.ok) {
    return {};
  }
  const windows = job.wheel.crossings && crossings(job.wheel.crossings, form.value.rootRadius);
  return {
    target: targetOfJob(job, {
      form: form.value,
      ...(windows?.ok === true ? { crossings: windows.value } : {}),
    }),
  };
}

function answer(
  files: readonly string[],
  set: SetProof,
  machine: Machine,
  options: ProveOptions,
  { terminal, version }: { readonly terminal: Terminal; readonly version: string },
): Exit {
  const { proof } = set;
  const moves = (): string => proof.moves.map((move) => `${JSON.stringify(move)}\n`).join('');
  const pathOf = (name: string): string => files.find((file) => basename(file) === name) ?? name;
  const sarif = (): string => `${JSON.stringify(sarifOf(proof, version, pathOf), null, 2)}\n`;
  const inputs = [...files, ...(options.job === undefined ? [] : [options.job])];
  const wrote =
    writeBeside(options.moves, { what: 'moves', ending: '.jsonl', text: moves }, inputs, terminal) &&
    writeBeside(options.sarif, { what: 'findings', ending: '.sarif', text: sarif }, inputs, terminal);
  if (!wrote) {
    return 2;
  }
  if (options.json === true) {
    process.stdout.write(
      `${JSON.stringify(proofJson(files.map((file) => basename(file)).join(' '), set, machine), null, 2)}\n`,
    );
  }
  for (const finding of proof.findings) {
    const at = { kind: 'program' as const, file: finding.file, line: finding.line };
    const text = showProblem({ ...finding, code: 'post.cannot-say', at });
    process.stderr.write(`${finding.severity === 'error' ? terminal.danger(text) : text}\n`);
  }
  terminal.say(verdictWords(set, machine));
  return proof.verdict === 'pass' ? 0 : 1;
}

/** Writes what was asked for beside the answer, where that overwrites nothing but an earlier one; says whether it may go on. */
function writeBeside(
  path: string | undefined,
  { what, ending, text }: { readonly what: string; readonly ending: string; readonly text: () => string },
  inputs: readonly string[],
  terminal: Terminal,
): boolean {
  if (path === undefined) {
    return true;
  }
  if (isThere(path) && !path.toLowerCase().endsWith(ending)) {
    process.stderr.write(
      `${path}: is there already and its name does not end in ${ending}; it is kept as it is.\n`,
    );
    return false;
  }
  const lost = keepInputs(dirname(path), [basename(path)], inputs, `Give the ${what} another name.`);
  if (lost.length > 0) {
    terminal.problems(lost);
    return false;
  }
  const write = [{ name: basename(path), text: text() }];
  const done = changeFolder(dirname(path), { folder: 'there', write, rename: [] });
  terminal.problems(done.problems);
  return done.ok;
}

function verdictWords({ proof, cutting, walks, time }: SetProof, machine: Machine): string {
  const words = {
    pass: 'Passed.',
    refuse: 'Refused: do not run it.',
    unread: 'Not read to its end: do not run it.',
  };
  const counted = (count: number): string => (count === 1 ? '1 program' : `${count} programs`);
  const beside = walks === 1 ? ' and 1 that cuts nothing' : ` and ${walks} that cut nothing`;
  const programs = cutting === 0 ? counted(walks) : `${counted(cutting)}${walks === 0 ? '' : beside}`;
  return [
    words[proof.verdict],
    `${programs} for ${machine.name}, ${proof.blocks} blocks, ${figureWords(proof)}`,
    ...timeWords(time),
    'Not checked:',
    ...proof.notChecked.map((line) => `  ${line}`),
  ].join('\n');
}

function figureWords({ figures, verdict }: Proof): string {
  if (verdict === 'unread') {
    return 'held against nothing, as the rest was not read.';
  }
  const um = (mm: number): string => `${(mm * 1000).toFixed(2)} um`;
  return figures === undefined
    ? 'held against travel, clear ways and the words of the machine only: it cuts no wheel.'
    : `the flank ${um(figures.flankGouge)} inside and ${um(figures.flankLeft)} outside the exact curve at worst.`;
}

function explanation(): string {
  const checks = Object.entries(CHECK_CODES).map(
    ([code, { guards, blind }]) => `${code}\n  guards against  ${guards}\n  cannot see      ${blind}\n`,
  );
  const others = Object.entries(PROBLEM_CODES).map(([code, sentence]) => `${code}\n  ${sentence}\n`);
  return `What the proof checks\n\n${checks.join('\n')}\nWhat else is said with a code\n\n${others.join('\n')}`;
}
