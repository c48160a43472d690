/** The machine files: those that came with the program, found beside the bundle, and those a job names by path. */
import { dirname, isAbsolute, join } from 'node:path';
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

/** A machine by the name of a file of `posts/`, or by a path, relative to the file that names it. */
export function findMachine(nameOrPath: string, namedIn: string): Outcome<MachineText> {
  const own = ownMachine(nameOrPath);
  if (own !== undefined) {
    return success({ name: nameOrPath, file: `posts/${nameOrPath}.yaml`, text: own });
  }
  if (!/[/\\.]/.test(nameOrPath)) {
    const names = ownMachineNames();
    const near = nearestWord(nameOrPath, names);
    return failure([
      {
        code: 'job.invalid',
        severity: 'error',
        message: `there is no machine '${nameOrPath}'${near === undefined ? '' : `; did you mean '${near}'?`}`,
        hint: `Known: ${names.join(', ')}; or the path of your own file, with its ending.`,
        at: { kind: 'file', file: namedIn },
      },
    ]);
  }
  const path = isAbsolute(nameOrPath) ? nameOrPath : join(dirname(namedIn), nameOrPath);
  const read = readText(path);
  return read.ok
    ? success({ name: path.replace(/^.*[/\\]/, '').replace(/\.ya?ml$/, ''), file: path, text: read.value })
    : read;
}
