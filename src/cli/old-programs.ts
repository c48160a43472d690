/**
 * What becomes of programs that lie in the folder already. One that was edited by hand since it was written stops the run
 * unless it is forced, and is then kept beside; one of an earlier run that this run does not write again is renamed, so
 * that nobody runs yesterday's.
 */
import { join } from 'node:path';
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import type { OutFile } from '../cut.ts';
import { namesIn, readText } from './files.ts';
import { sha256 } from './hash.ts';
import { ownMachineNames, ownMachine } from './own-machines.ts';

export interface Renaming {
  readonly from: string;
  readonly to: string;
}

export function keepOldPrograms(
  folder: string,
  name: string,
  ending: string,
  files: readonly OutFile[],
  force: boolean,
): Outcome<readonly Renaming[]> {
  const present = namesIn(folder);
  const records = recordsOf(folder, name);
  const old = programsAmong(present, name, ending);
  const written = new Map(files.map((file) => [file.name, file]));
  const edited: string[] = [];
  const renamings: Renaming[] = [];
  const taken = new Set(present);
  const rename = (from: string, mark: string): void => {
    const to = freeName(`${from}.${mark}`, taken);
    taken.add(to);
    renamings.push({ from, to });
  };
  for (const file of old) {
    const content = readText(join(folder, file));
    const sum = content.ok ? sha256(content.value) : '';
    const next = written.get(file);
    if (next !== undefined && content.ok && content.value === next.text) {
      continue;
    }
    const byHand = records.get(file) !== sum;
    if (next === undefined && byHand && isOfAnother(folder, name, file, sum)) {
      continue;
    }
    if (next === undefined) {
      rename(file, byHand ? 'edited' : 'old');
    } else if (byHand) {
      edited.push(file);
      rename(file, 'edited');
    }
  }
  const stale = `${name}.refused.txt`;
  if (present.includes(stale) && !written.has(stale)) {
    rename(stale, 'old');
  }
  return edited.length > 0 && !force
    ? failure(edited.map((file) => handEdited(join(folder, file))))
    : success(renamings);
}

/** Whether another job's summary knows it: the one program of a job NAME-1 is called as the first of a job NAME is. */
function isOfAnother(folder: string, name: string, file: string, sum: string): boolean {
  const other = file.replace(/\.[^.]*$/, '');
  return other !== name && recordsOf(folder, other).get(file) === sum;
}

function handEdited(file: string): Problem {
  return {
    code: 'file.hand-edited',
    severity: 'error',
    message: 'is not as Ogive wrote it (edited by hand, or its record is gone). Nothing was changed.',
    hint: 'Use --force to write it anew; the edited one is then kept beside it. Or name another folder with --out.',
    at: { kind: 'file', file },
  };
}

/** SHA-256 of each program as the earlier run's summary recorded it. */
function recordsOf(folder: string, name: string): ReadonlyMap<string, string> {
  const text = readText(join(folder, `${name}.json`));
  const records = new Map<string, string>();
  if (!text.ok) {
    return records;
  }
  try {
    const summary = JSON.parse(text.value) as { programs?: unknown; walk?: unknown };
    const listed = Array.isArray(summary.programs) ? summary.programs : [];
    for (const entry of [...listed, summary.walk] as { file?: unknown; sha256?: unknown }[]) {
      if (typeof entry?.file === 'string' && typeof entry.sha256 === 'string') {
        records.set(entry.file, entry.sha256);
      }
    }
  } catch {
    return records;
  }
  return records;
}

/** Programs of a job's name that lie in a folder, whatever machine they were written for. */
export function programsIn(folder: string, name: string): readonly string[] {
  return programsAmong(namesIn(folder), name);
}

/** What Ogive writes beside programs: common, and not worth reading every machine file for its ending. */
const BESIDE = /\.(?:html|svg|dxf|json|yaml|txt)$/;

function programsAmong(names: readonly string[], name: string, ending?: string): readonly string[] {
  const isBeside = (file: string): boolean =>
    BESIDE.test(file) && (ending === undefined || !file.endsWith(ending));
  const likely = names.filter((file) => file.startsWith(name) && !isBeside(file));
  if (likely.length === 0) {
    return [];
  }
  const own = ending === undefined ? [] : likely.filter((file) => isProgramOf(file, name, [ending]));
  if (own.length === likely.length) {
    return own;
  }
  const known = endings(ending ?? '.nc');
  return likely.filter((file) => isProgramOf(file, name, known));
}

/** NAME.nc, NAME-1.nc, NAME-walk.nc, with the ending of any machine file. */
function isProgramOf(file: string, name: string, known: readonly string[]): boolean {
  if (!file.startsWith(name)) {
    return false;
  }
  const rest = file.slice(name.length);
  return known.some(
    (ending) => rest.endsWith(ending) && /^(?:-\d+|-walk)?$/.test(rest.slice(0, -ending.length)),
  );
}

function endings(ending: string): readonly string[] {
  const own = ownMachineNames().flatMap(
    (machine) => /^\s*ending:\s*["']?(\.[A-Za-z0-9]+)/m.exec(ownMachine(machine) ?? '')?.[1] ?? [],
  );
  return [...new Set([ending, ...own])];
}

function freeName(wanted: string, taken: ReadonlySet<string>): string {
  for (let i = 1; ; i++) {
    const name = i === 1 ? `${wanted}.txt` : `${wanted}-${i}.txt`;
    if (!taken.has(name)) {
      return name;
    }
  }
}
