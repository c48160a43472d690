/** The machine files of posts/, read as the command reads them. */
import { readdirSync, readFileSync, existsSync } from 'node:fs';
import type { Outcome } from '../../src/base/problem.ts';
import type { Machine } from '../../src/machine/machine.ts';
import { readMachine } from '../../src/machine/read-machine.ts';

const FOLDER = new URL('../../posts/', import.meta.url);

export const POSTS: readonly string[] = readdirSync(FOLDER)
  .filter((file) => file.endsWith('.yaml'))
  .map((file) => file.slice(0, -'.yaml'.length))
  .sort();

export function postText(name: string): string | undefined {
  const file = new URL(`${name}.yaml`, FOLDER);
  return existsSync(file) ? readFileSync(file, 'utf8') : undefined;
}

export function readPost(name: string): Outcome<Machine> {
  return readMachine(name, `posts/${name}.yaml`, postText(name) ?? '', postText);
}
