/** The machine files of posts/, read, and copies of one with a few words changed. */
import { readFileSync, readdirSync } from 'node:fs';
import { readMachine } from '../../src/machine/read-machine.ts';
import type { Limits, Machine, Words } from '../../src/machine/machine.ts';

const FOLDER = new URL('../../posts/', import.meta.url);

export const MACHINE_NAMES: readonly string[] = readdirSync(FOLDER)
  .filter((file) => file.endsWith('.yaml'))
  .map((file) => file.slice(0, -'.yaml'.length))
  .sort();

export function postMachine(name: string): Machine {
  const text = (of: string): string => readFileSync(new URL(`${of}.yaml`, FOLDER), 'utf8');
  const read = readMachine(name, `posts/${name}.yaml`, text(name), (other) =>
    MACHINE_NAMES.includes(other) ? text(other) : undefined,
  );
  if (!read.ok) {
    throw new Error(read.problems.map((problem) => problem.message).join('\n'));
  }
  return read.value;
}

export type WordChanges = { readonly [Group in keyof Words]?: Partial<Words[Group]> };

export function changedMachine(
  machine: Machine,
  words: WordChanges,
  limits: Partial<Limits> = {},
  units = machine.units,
): Machine {
  const groups = Object.entries(machine.words).map(([name, group]) => [
    name,
    { ...group, ...words[name as keyof Words] },
  ]);
  return {
    ...machine,
    units,
    words: Object.fromEntries(groups) as Words,
    limits: { ...machine.limits, ...limits },
  };
}
