/**
 * Every file of test/bad-jobs: a job with one thing wrong, named after it, and beside it the message a person gets, word for word.
 * A new pair is picked up by lying there.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { failure } from '../../src/base/problem.ts';
import { showProblem } from '../../src/base/show-problem.ts';
import { checkJobOnMachine } from '../../src/job/check-job.ts';
import { readJob } from '../../src/job/read-job.ts';
import { readMachine } from '../../src/machine/read-machine.ts';

const FOLDER = new URL('../bad-jobs/', import.meta.url);
const names = readdirSync(FOLDER)
  .filter((name) => name.endsWith('.yaml'))
  .map((name) => name.slice(0, -'.yaml'.length));

function textOf(name: string): string {
  return readFileSync(new URL(name, FOLDER), 'utf8');
}

function machineNamed(name: string): string | undefined {
  return readFileSync(new URL(`../../posts/${name}.yaml`, import.meta.url), 'utf8');
}

/** Everything that is said of a job before anything is cut. */
function problemsOf(name: string) {
  const job = readJob(`${name}.yaml`, textOf(`${name}.yaml`), () => failure([]));
  if (!job.ok) {
    return job.problems;
  }
  const machine = readMachine(
    job.value.machine,
    'posts/machine.yaml',
    machineNamed(job.value.machine) ?? '',
    machineNamed,
  );
  return [...job.problems, ...(machine.ok ? checkJobOnMachine(job.value, machine.value) : machine.problems)];
}

describe('bad jobs', () => {
  it.each(names)('%s', (name) => {
    const problems = problemsOf(name);
    expect(problems.map(showProblem).join('\n')).toBe(textOf(`${name}.txt`).trimEnd());
    expect(problems.some(({ severity }) => severity === 'error')).toBe(true);
    for (const { at } of problems) {
      expect(at.kind === 'value' && at.line).toBeGreaterThan(0);
    }
  });
  it('are more than forty', () => {
    expect(names.length).toBeGreaterThan(40);
  });
  it('have no message that nothing says any more', () => {
    const texts = readdirSync(FOLDER).filter((name) => name.endsWith('.txt'));
    expect(
      texts.map((name) => name.slice(0, -'.txt'.length)).filter((name) => !names.includes(name)),
    ).toEqual([]);
  });
});
