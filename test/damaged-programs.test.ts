/**
 * Damaged programs: each a good one with one thing broken, refused for its own reason, at its line. A check that is left
 * out makes its test fail: what it says is asserted by code, and no other check says it.
 */
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { targetOfJob } from '../src/job/target-of-job.ts';
import { CHECK_CODES } from '../src/prove/check-codes.ts';
import { gatherEvidence, type Evidence } from '../src/prove/evidence.ts';
import type { Finding, ProofInput } from '../src/prove/proof.ts';
import { proveProgram } from '../src/prove/prove-program.ts';
import { traceProgram } from '../src/prove/trace-program.ts';
import { cutText, onMachine } from './support/cut-text.ts';
import { damage, readRecipe, type Damaged, type Recipe } from './support/damage-recipe.ts';

const FOLDER = join(import.meta.dirname, 'damaged-programs');
const GOLDEN = join(import.meta.dirname, 'golden');
/** Jobs whose programs are damaged: those of the golden programs, and some that have what these lack. */
const JOB_FOLDERS = [GOLDEN, join(FOLDER, 'jobs')];

const RECIPES: readonly (readonly [string, Recipe])[] = readdirSync(FOLDER)
  .filter((name) => name.endsWith('.yaml'))
  .toSorted()
  .map((name) => [name.slice(0, -'.yaml'.length), readRecipe(readFileSync(join(FOLDER, name), 'utf8'))]);

/** Codes that no text alone can cause, with where they are tested. */
const NOT_BY_TEXT: Readonly<Record<string, string>> = {
  'prove.holding': 'follows from the set-up: test/prove/check-metal.test.ts',
};

interface Check {
  readonly name: string;
  readonly run: (evidence: Evidence) => readonly Finding[];
}

const CHECKS: readonly Check[] = await Promise.all(
  readdirSync(join(import.meta.dirname, '../src/prove'))
    .filter((name) => /^check-(?!codes).*\.ts$/.test(name))
    .map(async (name) => {
      const loaded = (await import(`../src/prove/${name.slice(0, -3)}.ts`)) as Record<string, Check['run']>;
      const word = name.slice(0, -3).replace(/-(.)/g, (_, letter: string) => letter.toUpperCase());
      const run = loaded[word];
      if (run === undefined) {
        throw new Error(`${name} does not export ${word}`);
      }
      return { name, run };
    }),
);

const goods = new Map<string, ProofInput>();

function goodInput({ job, machine }: Recipe): ProofInput {
  const known = goods.get(`${job} ${machine}`);
  if (known !== undefined) {
    return known;
  }
  const folder = JOB_FOLDERS.find((each) => readdirSync(each).includes(`${job}.yaml`));
  const { exit, files, facts, problems } = cutText(
    job,
    onMachine(readFileSync(join(folder ?? '', `${job}.yaml`), 'utf8'), machine),
  );
  if (exit !== 0 || facts === undefined) {
    const said = [...problems, ...(facts?.proof?.findings ?? [])].map(({ message }) => message);
    throw new Error(`${job} on ${machine} is refused: ${said.join('; ')}`);
  }
  const texts = new Map(files.map(({ name, text }) => [name, text]));
  const programs = facts.programs.map(({ file }) => ({ file, text: texts.get(file) ?? '' }));
  const target = targetOfJob(facts.job, facts);
  const input = { programs, machine: facts.machine, setup: facts.job.setup, target };
  goods.set(`${job} ${machine}`, input);
  return input;
}

function damaged(recipe: Recipe): { readonly input: ProofInput; readonly file: string } & Damaged {
  const good = goodInput(recipe);
  const { machine, programs } = good;
  const program = programs[recipe.program - 1];
  if (program === undefined) {
    throw new Error(`there is no program ${recipe.program}`);
  }
  const done = damage(program.text, recipe.edits, machine.words.numbers.lengthDecimals[machine.units]);
  expect(done.text === program.text).toBe(false);
  const input = {
    ...good,
    programs: programs.map((each) => (each === program ? { file: each.file, text: done.text } : each)),
  };
  return { input, file: program.file, ...done };
}

/** Whether a finding stands at its line (1-based): among the edited ones, or on one that reads as was said. */
function isAtItsLine({ at }: Recipe, { text, first, last }: Damaged, line: number): boolean {
  return at === undefined
    ? line >= first + 1 && line <= last + 1
    : new RegExp(at).test(text.split(/\r?\n/)[line - 1] ?? '');
}

function codesOf(findings: readonly Finding[], severity: Finding['severity']): readonly string[] {
  return [
    ...new Set(findings.filter((each) => each.severity === severity).map(({ code }) => code)),
  ].toSorted();
}

describe('an undamaged program', { timeout: 60_000 }, () => {
  const pairs = [...new Set(RECIPES.map(([, { job, machine }]) => `${job} on ${machine}`))].toSorted();
  it.each(pairs)('%s raises nothing', (pair) => {
    const [job = '', machine = ''] = pair.split(' on ');
    const proof = proveProgram(
      goodInput({ ...readRecipe(`# prove.end: ${pair}, -\nedits: []`), job, machine }),
    );
    expect(proof.findings).toEqual([]);
    expect(proof.verdict).toBe('pass');
  });
});

describe.each(RECIPES)('%s', { timeout: 60_000 }, (_, recipe) => {
  const { code, severity, also, what } = recipe;
  it(`${severity === 'error' ? 'is refused' : 'is warned of'} by ${code} alone: ${what}`, () => {
    const { input, file, ...done } = damaged(recipe);
    const proof = proveProgram(input);
    expect(codesOf(proof.findings, 'error')).toEqual(
      severity === 'error' ? [...new Set([code, ...also])].toSorted() : also.toSorted(),
    );
    const found = proof.findings.filter((each) => each.code === code && each.severity === severity);
    const places = found.map((each) => `${each.file}:${each.line} ${each.message}`);
    const isIt = (each: Finding): boolean =>
      each.file === file &&
      isAtItsLine(recipe, done, each.line) &&
      new RegExp(recipe.says ?? '').test(each.message);
    expect(found.some(isIt), `${places.join('\n')}; ${done.first + 1} to ${done.last + 1} are edited`).toBe(
      true,
    );
    expect(proof.verdict === 'pass').toBe(codesOf(proof.findings, 'error').length === 0);

    // Left out, the check that says it leaves nobody who does.
    const traces = input.programs.map((each) => traceProgram(each.file, each.text, input.machine));
    const byReader = traces.flatMap(({ findings }) => findings);
    const evidence = gatherEvidence(input, traces);
    const sayers = [
      ...(byReader.some((each) => each.code === code) ? ['the reader'] : []),
      ...CHECKS.filter(({ run }) => run(evidence).some((each) => each.code === code)).map(({ name }) => name),
    ];
    expect(sayers).toHaveLength(1);
  });
});

it('has a damaged program for every code that a text can cause', () => {
  const missing = Object.keys(CHECK_CODES).filter(
    (code) => !(code in NOT_BY_TEXT) && !RECIPES.some(([, recipe]) => recipe.code === code),
  );
  expect(missing).toEqual([]);
});

it('has a damaged program for every check', { timeout: 60_000 }, () => {
  const said = new Map(CHECKS.map(({ name, run }) => [name, run]));
  for (const [, recipe] of RECIPES) {
    const { input } = damaged(recipe);
    const evidence = gatherEvidence(
      input,
      input.programs.map((each) => traceProgram(each.file, each.text, input.machine)),
    );
    for (const [name, run] of said) {
      if (run(evidence).length > 0) {
        said.delete(name);
      }
    }
  }
  expect([...said.keys()]).toEqual([]);
});
