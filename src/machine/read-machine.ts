/**
 * A machine file's text to a Machine, or every reason why it is none, each with its line.
 * A file may be `like` another and give only what differs: groups are joined key by key, lists and values replaced.
 * In: the machine's name, the file and its text, and how to get the text of another machine file by its name.
 */
import type { ProblemCode } from '../base/problem-codes.ts';
import type { Outcome, Place, Problem } from '../base/problem.ts';
import { failure, success } from '../base/problem.ts';
import { nearestWord } from '../base/nearest-word.ts';
import { camelKeys } from './camel-keys.ts';
import { checkMachine } from './check-machine.ts';
import { followLike, type Layer } from './follow-like.ts';
import { joinTrees } from './join-trees.ts';
import type { Machine } from './machine.ts';
import { checkTree, knownKeys, type MachineTree, type SchemaIssue } from './machine-schema.ts';

export function readMachine(
  name: string,
  file: string,
  text: string,
  load: (name: string) => string | undefined,
): Outcome<Machine> {
  const layers = followLike({ name, file, text }, load);
  if (!layers.ok) {
    return layers;
  }
  const tree = joinTrees(layers.value.map(sayings).toReversed());
  const checked = checkTree(tree);
  if (!checked.ok) {
    const problems = causes(checked.issues).map((issue) => problemOf(issue, layers.value));
    return failure(inOrder(file, problems));
  }
  const machine = machineOf(name, checked.tree);
  // What is dangerous together is to be mended here, even where one half of it is inherited.
  const dangers = checkMachine(machine).map((danger) => ({
    code: 'machine.dangerous' as const,
    severity: danger.severity,
    message: danger.message,
    hint: danger.hint,
    at: placeOf(danger.path, layers.value.slice(0, 1)),
  }));
  return dangers.some((one) => one.severity === 'error')
    ? failure(inOrder(file, dangers))
    : success(machine, inOrder(file, dangers));
}

/** Another kind of file, or a mistyped `like`: the fields that are missing follow from it, and would bury it. */
function causes(issues: readonly SchemaIssue[]): readonly SchemaIssue[] {
  const format = issues.find((issue) => issue.path.join('.') === 'format' && issue.kind === 'invalid');
  const like = issues.find(
    ({ kind, path, key = '' }) =>
      kind === 'unknown-key' && path.length === 0 && nearestWord(key, knownKeys([])) === 'like',
  );
  return format !== undefined
    ? [format]
    : like !== undefined
      ? issues.filter((issue) => issue.kind !== 'missing')
      : issues;
}

/** What a file says; who proved it says nothing of a file that is like it. */
function sayings(layer: Layer, nth: number): unknown {
  const { proved, ...others } = layer.yaml.value as Readonly<Record<string, unknown>>;
  return nth === 0 && proved !== undefined ? { ...others, proved } : others;
}

function machineOf(name: string, tree: MachineTree): Machine {
  const { description, units, proved, words, limits } = camelKeys(tree);
  const { rotary, ...others } = words;
  return {
    name,
    description,
    units,
    words: rotary === undefined ? others : { ...others, rotary },
    limits,
    proved,
  };
}

function problemOf(issue: SchemaIssue, layers: readonly Layer[]): Problem {
  const at = placeOf(issue.path, layers);
  if (issue.kind === 'unknown-key') {
    return unknownKey(issue.path, issue.key ?? '', layers);
  }
  if (issue.kind === 'missing') {
    const guess = issue.path[0] === 'description' ? '' : ', and a wrong guess could be dangerous';
    return problem('machine.missing', at, `is not given${guess}.`, `Give ${issue.expected}.`);
  }
  return problem('machine.invalid', at, `${complaint(issue.path, layers)}.`, `Give ${issue.expected}.`);
}

function unknownKey(path: SchemaIssue['path'], key: string, layers: readonly Layer[]): Problem {
  const known = knownKeys(path);
  const near = nearestWord(key, known);
  const layer = layers.find((one) => has(one.yaml.value, [...path, key])) ?? layers[0];
  const spot = layer?.yaml.placeOfKey(path, key);
  return problem(
    'machine.unknown-key',
    { kind: 'value', file: layer?.file ?? '', path: [...path, key], ...spot },
    `A machine file has no ${key} here.`,
    near === undefined ? `Known here: ${known.join(', ')}.` : `Is ${near} meant?`,
  );
}

function problem(code: ProblemCode, at: Place, message: string, hint: string): Problem {
  return { code, severity: 'error', message, hint, at };
}

/** In the file that says it, the nearest one first; what no file says is missing from the first. */
function placeOf(path: SchemaIssue['path'], layers: readonly Layer[]): Place {
  const layer = layers.find((one) => has(one.yaml.value, path)) ?? layers[0];
  return { kind: 'value', file: layer?.file ?? '', path, ...layer?.yaml.placeOf(path) };
}

function complaint(path: SchemaIssue['path'], layers: readonly Layer[]): string {
  const layer = layers.find((one) => has(one.yaml.value, path));
  const value = layer?.yaml.writtenAt(path);
  if (value === '') {
    return 'nothing is given';
  }
  return `${value ?? 'what is given'} is not right here`;
}

function has(tree: unknown, path: SchemaIssue['path']): boolean {
  let here = tree;
  for (const key of path) {
    if (typeof here !== 'object' || here === null || !Object.hasOwn(here, key)) {
      return false;
    }
    here = (here as Record<string | number, unknown>)[key];
  }
  return true;
}

/** As a person reads: this file from the top; what it is like says comes after. */
function inOrder(file: string, problems: readonly Problem[]): readonly Problem[] {
  const rank = ({ at }: Problem): readonly number[] =>
    at.kind === 'value' ? [at.file === file ? 0 : 1, at.line ?? 0, at.column ?? 0] : [0, 0, 0];
  return problems.toSorted((a, b) => {
    const [one, other] = [rank(a), rank(b)];
    const differs = one.findIndex((value, i) => value !== other[i]);
    return (one[differs] ?? 0) - (other[differs] ?? 0);
  });
}
