/** The machine files: those that came with the program, found beside the bundle, and those a job names by path. */
import { isAbsolute, join } from 'node:path';
import type { Outcome } from '../base/problem.ts';
import { failure, success } from '../base/problem.ts';
import { nearestWord } from '../base/nearest-word.ts';
import { namesInOwn, readOwn, readText } from './files.ts';

/** `posts/` stands beside `dist/`. */
const POSTS = new URL('../posts/', import.meta.url);

export interface MachineText {
  readonly name: string;
  /** As it is shown in messages. */
  readonly file: string;
  readonly text: string;
}

export function ownMachineNames(): readonly string[] {
  return namesInOwn(POSTS)
    .filter((name) => name.endsWith('.yaml'))
    .map((name) => name.slice(0, -'.yaml'.length));
}

export function ownMachine(name: string): string | undefined {
  return /^[a-z0-9-]+$/.test(name) ? readOwn(new URL(`${name}.yaml`, POSTS)) : undefined;
}

/** A machine by the name of a file of `posts/`, or by a path. What is wrong with it is told at `namedIn`. */
export function findMachine(nameOrPath: string, namedIn: NamedIn): Outcome<MachineText> {
  const own = ownMachine(nameOrPath);
  if (own !== undefined) {
    return success({ name: nameOrPath, file: `posts/${nameOrPath}.yaml`, text: own });
  }
  if (!/[/\\.]/.test(nameOrPath)) {
    return noMachine(namedIn, ...strangeName(nameOrPath));
  }
  const path = isAbsolute(nameOrPath) ? nameOrPath : join(namedIn.folder, nameOrPath);
  const read = readText(path);
  if (!read.ok) {
    const why = read.problems[0]?.message ?? 'it cannot be found.';
    return noMachine(
      namedIn,
      `the machine file ${path} cannot be read: ${why}`,
      pathHint(nameOrPath, namedIn),
    );
  }
  return success({
    name: path.replace(/^.*[/\\]/, '').replace(/\.ya?ml$/, ''),
    file: path,
    text: read.value,
  });
}

export interface NamedIn {
  /** The job file, or what else names it. */
  readonly file: string;
  /** Paths count from here. */
  readonly folder: string;
}

function noMachine({ file }: NamedIn, message: string, hint: string): Outcome<never> {
  return failure([{ code: 'job.invalid', severity: 'error', message, hint, at: { kind: 'file', file } }]);
}

function strangeName(name: string): readonly [message: string, hint: string] {
  const names = ownMachineNames();
  const near = nearestWord(name, names);
  return [
    `there is no machine '${name}'${near === undefined ? '' : `; did you mean '${near}'?`}`,
    `Known: ${names.join(', ')}; or the path of your own file, with its ending.`,
  ];
}

/** A machine that came along is named, not pathed. */
function pathHint(path: string, { file, folder }: NamedIn): string {
  const word = path
    .replace(/^.*[/\\]/, '')
    .replace(/\.ya?ml$/i, '')
    .toLowerCase();
  return ownMachine(word) !== undefined
    ? `${word} is a machine that came along: write its name alone, without folder and ending: ${word}.`
    : isAbsolute(path)
      ? 'Look whether the path is right.'
      : `The path counts from ${folder === '.' ? 'the folder you are in' : `${folder}, the folder of ${file}`}; \`ogive machines\` lists the ones that came along.`;
}
