/**
 * The only file that touches the disk. Reading is bounded; writing is whole or not at all: every file of a run is first
 * written beside its place under a name of its own, then all are renamed.
 */
import {
  closeSync,
  existsSync,
  fstatSync,
  mkdirSync,
  openSync,
  readdirSync,
  readFileSync,
  readSync,
  renameSync,
  statSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import type { Outcome, Problem } from '../base/problem.ts';
import { failure, success } from '../base/problem.ts';

/** Bytes of the largest input that is read. Why: a program of a million lines has some 30 MB; an input file far less. */
const LARGEST = 64_000_000;

/** A text file as UTF-8. Not there, not a file, too large or not text: a problem. */
export function readText(path: string, largest = LARGEST): Outcome<string> {
  try {
    const about = statSync(path);
    if (!about.isFile() && !about.isDirectory() && !isStandardInput(path)) {
      return unreadable(path, 'it is no file but a pipe or a device');
    }
    // Opened by its name, a socket that stands for standard input would not answer.
    const handle = isStandardInput(path) ? STANDARD_INPUT : openSync(path, 'r');
    try {
      const stat = fstatSync(handle);
      if (stat.isDirectory()) {
        return unreadable(path, 'it is a folder, not a file');
      }
      if (stat.size > largest) {
        return unreadable(path, `it holds ${stat.size} bytes; at most ${largest} are read`);
      }
      const bytes = readBounded(handle, largest);
      return bytes === undefined
        ? unreadable(path, `it holds more than ${largest} bytes`)
        : success(bytes.toString('utf8'));
    } finally {
      if (handle !== STANDARD_INPUT) {
        closeSync(handle);
      }
    }
  } catch (error) {
    return unreadable(path, reasonOf(error));
  }
}

const STANDARD_INPUT = 0;

/** A pipe that is named waits for ever for somebody to write; only the one we were started with is read. */
export function isStandardInput(path: string): boolean {
  return path === '/dev/stdin' || path === '/dev/fd/0';
}

/** Where a job's own paths count from; one that comes through a pipe has only the folder we were started in. */
export function folderOf(jobFile: string): string {
  return isStandardInput(jobFile) ? '.' : dirname(jobFile);
}

/** A job that comes through a pipe lies in no folder that its files could be put beside. */
export function noPlace(path: string, wanted: string): Problem {
  return {
    code: 'file.unwritable',
    severity: 'error',
    message:
      'a job that is read from here lies in no folder: where its files go is not known. Nothing was written.',
    hint: `Say where: --out ${wanted}.`,
    at: { kind: 'file', file: path },
  };
}

/** Standard input says no size: read until the end or the bound. */
function readBounded(handle: number, largest: number): Buffer | undefined {
  const chunks: Buffer[] = [];
  let total = 0;
  for (;;) {
    const chunk = Buffer.alloc(65_536);
    const count = readSync(handle, chunk, 0, chunk.length, null);
    if (count === 0) {
      return Buffer.concat(chunks);
    }
    total += count;
    if (total > largest) {
      return undefined;
    }
    chunks.push(chunk.subarray(0, count));
  }
}

export interface NewFile {
  readonly name: string;
  readonly text: string;
}

export interface Change {
  /** 'there': the folder is not made; a name that was mistyped would make one. */
  readonly folder?: 'made' | 'there';
  readonly write: readonly NewFile[];
  /** Renamed within the folder before the new files take their places. */
  readonly rename: readonly { readonly from: string; readonly to: string }[];
}

/** All of it or nothing. */
export function changeFolder(folder: string, change: Change): Outcome<null> {
  const temporary = (name: string): string => join(folder, `.${name}.part`);
  const written: string[] = [];
  const renamed: { from: string; to: string }[] = [];
  if (change.folder === 'there' && !existsSync(folder)) {
    return failure([noFolder(folder)]);
  }
  try {
    makeFolder(folder);
    for (const file of change.write) {
      refuseOddTarget(join(folder, file.name));
      const path = temporary(file.name);
      written.push(path);
      writeFileSync(path, file.text);
    }
    for (const { from, to } of change.rename) {
      renameSync(join(folder, from), join(folder, to));
      renamed.push({ from, to });
    }
    for (const file of change.write) {
      renameSync(temporary(file.name), join(folder, file.name));
    }
    return success(null);
  } catch (error) {
    undo(folder, written, renamed);
    return failure([
      {
        code: 'file.unwritable',
        severity: 'error',
        message: `cannot be written: ${reasonOf(error)}. Nothing was changed.`,
        hint:
          (error as { code?: string }).code === 'ENAMETOOLONG'
            ? 'Give the job a shorter name, or name another folder with --out.'
            : 'Name a folder you may write to with --out.',
        at: { kind: 'file', file: folder },
      },
    ]);
  }
}

function noFolder(folder: string): Problem {
  return {
    code: 'file.unwritable',
    severity: 'error',
    message: 'there is no such folder. Nothing was written.',
    hint: 'Make it first, or look whether its name is right.',
    at: { kind: 'file', file: folder },
  };
}

/** With the folders above it. Not by Node's own `recursive`: where a folder is there and takes none (/proc), that never ends. */
function makeFolder(folder: string): void {
  if (existsSync(folder)) {
    return;
  }
  const above = dirname(resolve(folder));
  if (above !== resolve(folder)) {
    makeFolder(above);
  }
  mkdirSync(folder);
}

function undo(
  folder: string,
  written: readonly string[],
  renamed: readonly { from: string; to: string }[],
): void {
  for (const path of written) {
    try {
      rmSync(path, { force: true });
    } catch {
      // It never came to be: what stands in place of the folder takes no file.
    }
  }
  for (const { from, to } of renamed.toReversed()) {
    if (!existsSync(join(folder, from))) {
      renameSync(join(folder, to), join(folder, from));
    }
  }
}

/** Whether something of this name is there. */
export function isThere(path: string): boolean {
  return existsSync(path);
}

/** Whether two paths lead to one file, by whatever links and in whatever capitals. */
export function isSameFile(a: string, b: string): boolean {
  try {
    const [one, other] = [a, b].map((path) => statSync(path, { bigint: true }));
    return one !== undefined && one.ino === other?.ino && one.dev === other.dev;
  } catch {
    return false;
  }
}

/** A device, a pipe or a folder is never replaced by a file of ours. */
function refuseOddTarget(path: string): void {
  const about = statSync(path, { throwIfNoEntry: false });
  if (about !== undefined && !about.isFile()) {
    throw Object.assign(new Error(path), { code: about.isDirectory() ? 'EISDIR' : 'ENODEV' });
  }
}

/** Names in a folder, sorted; none where it is not there. */
export function namesIn(folder: string): readonly string[] {
  try {
    return readdirSync(folder).toSorted();
  } catch {
    return [];
  }
}

/** A file that came with the program, by its place beside the bundle. */
export function readOwn(url: URL): string | undefined {
  try {
    return readFileSync(url, 'utf8');
  } catch {
    return undefined;
  }
}

/** The same as bytes, by its path. */
export function readOwnBytes(path: string): Buffer | undefined {
  try {
    return readFileSync(path);
  } catch {
    return undefined;
  }
}

export function namesInOwn(url: URL): readonly string[] {
  try {
    return readdirSync(url).toSorted();
  } catch {
    return [];
  }
}

function unreadable(path: string, why: string): Outcome<never> {
  return failure([
    {
      code: 'file.unreadable',
      severity: 'error',
      message: `${why}.`,
      at: { kind: 'file', file: path },
    },
  ]);
}

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file or folder',
  EACCES: 'permission is denied',
  EPERM: 'permission is denied',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  ENOTDIR: 'a part of the path is a file, not a folder',
  EISDIR: 'it is a folder',
  ENODEV: 'something that is no regular file stands there',
  ENAMETOOLONG: 'the name is too long',
  ELOOP: 'links in the path lead round in a ring',
  EIO: 'what stands there gives nothing that can be read',
  ENXIO: 'nothing answers there',
  EEXIST: 'a link that leads nowhere stands there',
  EAGAIN: 'nothing was there to be read',
  EBUSY: 'another program holds it',
  EMFILE: 'too many files are open',
  // What Node itself says of a name with a NUL in it.
  ERR_INVALID_ARG_VALUE: 'no file can have such a name',
};

function reasonOf(error: unknown): string {
  const code = (error as { code?: string }).code ?? '';
  return REASONS[code] ?? (code === '' ? String(error) : `the system says ${code}`);
}
