/** Machine files as plain trees that a test can change: JSON is YAML, so a changed tree is a machine file again. */
import type { Outcome } from '../../src/base/problem.ts';
import { readYaml, YAML_LARGEST } from '../../src/base/read-yaml.ts';
import { joinTrees } from '../../src/machine/join-trees.ts';
import type { Machine } from '../../src/machine/machine.ts';
import { readMachine } from '../../src/machine/read-machine.ts';
import { postText } from './read-posts.ts';

/** A file of posts/ with everything it inherits, as one tree without `like`. */
export function treeOf(name: string): Record<string, unknown> {
  const yaml = readYaml(name, postText(name) ?? '', YAML_LARGEST, 'machine.syntax');
  if (!yaml.ok) {
    throw new Error(`${name} is not YAML`);
  }
  const { like, ...own } = yaml.value.value as Record<string, unknown>;
  return typeof like === 'string' ? (joinTrees([treeOf(like), own]) as Record<string, unknown>) : own;
}

/** The tree with one value changed; undefined takes the key away. */
export function changed(tree: unknown, path: readonly string[], value: unknown): unknown {
  const [key, ...rest] = path;
  if (key === undefined) {
    return value;
  }
  const group = { ...(tree as Record<string, unknown>) };
  const inner = changed(group[key], rest, value);
  if (inner === undefined) {
    delete group[key];
  } else {
    group[key] = inner;
  }
  return group;
}

/** Paths of everything that is no group, with its value; lists are values. */
export function leavesOf(tree: unknown, path: readonly string[] = []): readonly (readonly string[])[] {
  return typeof tree === 'object' && tree !== null && !Array.isArray(tree)
    ? Object.entries(tree).flatMap(([key, value]) => leavesOf(value, [...path, key]))
    : [path];
}

export function readTree(tree: unknown): Outcome<Machine> {
  return readMachine('test', 'test.yaml', JSON.stringify(tree), postText);
}
