/** The whole flow on a job's text, with the machine files of the project: what the command does, without a disk. */
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { failure, success } from '../../src/base/problem.ts';
import { cut, type CutResult } from '../../src/cut.ts';

const ROOT = resolve(import.meta.dirname, '../..');

export const SAMPLES: readonly string[] = readdirSync(join(ROOT, 'samples'))
  .filter((name) => name.endsWith('.yaml'))
  .map((name) => name.slice(0, -'.yaml'.length))
  .toSorted();

export const MACHINES: readonly string[] = readdirSync(join(ROOT, 'posts'))
  .filter((name) => name.endsWith('.yaml'))
  .map((name) => name.slice(0, -'.yaml'.length))
  .toSorted();

/** The machine a job names. */
export function machineOf(text: string): string {
  return /^machine:\s*(\S+)/m.exec(text)?.[1] ?? '';
}

export function sampleText(name: string): string {
  return readFileSync(join(ROOT, 'samples', `${name}.yaml`), 'utf8');
}

export function machineText(name: string): string | undefined {
  const path = join(ROOT, 'posts', `${name}.yaml`);
  return existsSync(path) ? readFileSync(path, 'utf8') : undefined;
}

export interface Beside {
  /** The file of cutters that a job may name. */
  readonly cutters?: string;
  /** What is changed in the machine's file. */
  readonly machine?: (text: string) => string;
}

/** A version that never changes, so that golden programs do not change with ours. */
export function cutText(
  name: string,
  text: string,
  version = 'golden',
  { cutters, machine: changed = (file) => file }: Beside = {},
): CutResult {
  return cut({
    file: `${name}.yaml`,
    text,
    version,
    findMachine: (machine) => {
      const found = machineText(machine);
      return found === undefined
        ? failure([
            {
              code: 'job.invalid',
              severity: 'error',
              message: `no machine ${machine}`,
              at: { kind: 'file', file: name },
            },
          ])
        : success({ name: machine, file: `posts/${machine}.yaml`, text: changed(found) });
    },
    loadMachine: machineText,
    readCutters: (path) =>
      cutters !== undefined
        ? success(cutters)
        : failure([
            {
              code: 'file.unreadable',
              severity: 'error',
              message: `no file ${path}`,
              at: { kind: 'file', file: path },
            },
          ]),
    hash: sumOf,
    stage: () => undefined,
  });
}

/** SHA-256 of a text's UTF-8 bytes. */
export function sumOf(content: string): string {
  return createHash('sha256').update(content, 'utf8').digest('hex');
}

/** The same job for another machine. */
export function onMachine(text: string, machine: string): string {
  return text.replace(/^machine:.*$/m, `machine: ${machine}`);
}
