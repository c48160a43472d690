/** The built command as a process, and folders of its own for it to run in. */
import { spawnSync } from 'node:child_process';
import {
  copyFileSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';

export const ROOT = resolve(import.meta.dirname, '../..');
const MAIN = join(ROOT, 'dist/main.js');

export interface Ran {
  readonly exit: number | null;
  readonly out: string;
  readonly err: string;
}

export function ogive(args: readonly string[], cwd: string, env: NodeJS.ProcessEnv = {}): Ran {
  const done = spawnSync(process.execPath, [MAIN, ...args], {
    cwd,
    env: { ...process.env, ...env },
    encoding: 'utf8',
    timeout: 60_000,
  });
  return { exit: done.status, out: done.stdout, err: done.stderr };
}

const made: string[] = [];

/** An empty folder that is taken away by `removeFolders`. */
export function newFolder(name = 'empty'): string {
  const base = mkdtempSync(join(tmpdir(), 'ogive-test-'));
  made.push(base);
  const folder = join(base, name);
  mkdirSync(folder);
  return folder;
}

export function removeFolders(): void {
  for (const folder of made.splice(0)) {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** The small wheel's job, copied into a folder; its path there. */
export function smallJob(folder: string): string {
  copyFileSync(join(ROOT, 'test/golden/small-wheel.yaml'), join(folder, 'small-wheel.yaml'));
  return join(folder, 'small-wheel.yaml');
}

/** A folder with the small wheel's job, changed by `edit`. */
export function folderWith(edit: (text: string) => string = (text) => text): string {
  const folder = newFolder();
  const job = smallJob(folder);
  writeFileSync(job, edit(readFileSync(job, 'utf8')));
  return folder;
}

export function cutSmall(folder: string, ...options: string[]): Ran {
  return ogive(['cut', 'small-wheel.yaml', ...options], folder);
}

/** A job that is understood, planned and written, and then refused by its own proof: the bore comes last. */
export function boreLast(text: string): string {
  return text.replace('cuts:', 'cuts:\n  order: [roughing, finishing, bore]');
}

/** Every file of a folder by its name, with its bytes. */
export function filesIn(folder: string): ReadonlyMap<string, string> {
  const names = readdirSync(folder).filter((name) => statSync(join(folder, name)).isFile());
  return new Map(names.toSorted().map((name) => [name, readFileSync(join(folder, name), 'latin1')]));
}

export function namesIn(folder: string): readonly string[] {
  return [...filesIn(folder).keys()];
}
