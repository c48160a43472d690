/**
 * What zod found wrong, as plain issues with a path: unions opened to the branch that was meant, unknown keys with the
 * nearest known one, or the group they belong to. Split off `job-schema.ts`.
 */
import type * as z from 'zod';
import { nearestWord } from '../base/nearest-word.ts';
import type { Problem } from '../base/problem.ts';
import { showPath } from '../base/show-problem.ts';
import { showValue } from './read-number.ts';

export interface JobIssue {
  readonly code: 'job.unknown-key' | 'job.invalid';
  readonly path: readonly (string | number)[];
  readonly message: string;
  readonly hint: string | undefined;
}

/** As a problem, whose file and place are filled in by `place-problems.ts`. */
export function issueProblem({ code, path, message, hint }: JobIssue): Problem {
  const at = { kind: 'value', file: '', path } as const;
  return { code, severity: 'error', message, at, ...(hint === undefined ? {} : { hint }) };
}

type Path = readonly (string | number)[];
type Raw = z.core.$ZodIssue;

/** Reads a tree by a schema; every issue found, none thrown. */
export function readTree<T extends z.ZodType>(
  schema: T,
  tree: unknown,
): { readonly ok: true; readonly value: z.infer<T> } | { readonly ok: false; readonly issues: JobIssue[] } {
  // One job is read a run: compiling a reader for it would take longer than reading it.
  const result = schema.safeParse(tree, { jitless: true });
  return result.success
    ? { ok: true, value: result.data }
    : {
        ok: false,
        issues: causes(result.error.issues.flatMap((issue) => open(issue, [], { schema, tree }))),
      };
}

/** A file of another kind, or of a later version: what else is wrong with it follows from that. */
function causes(issues: readonly JobIssue[]): JobIssue[] {
  const format = issues.filter(({ path }) => path.join('.') === 'format');
  return format.length > 0 ? format : [...issues];
}

/** Keys that are known, but refused until a later version: not offered. */
const LATER = ['pinion', 'trundles', 'trundle'];

interface Ground {
  readonly schema: z.ZodType;
  readonly tree: unknown;
}

function open(issue: Raw, base: Path, ground: Ground): JobIssue[] {
  const path = [...base, ...issue.path.map((key) => (typeof key === 'number' ? key : String(key)))];
  const value = valueAt(ground.tree, path);
  switch (issue.code) {
    case 'invalid_union':
      return meantBranch(issue.errors).flatMap((inner) => open(inner, path, ground));
    case 'unrecognized_keys':
      return issue.keys.map((key) => unknownKey(key, path, ground));
    case 'custom':
      return [{ code: 'job.invalid', path, message: issue.message, hint: hintOf(issue) }];
    case 'invalid_key':
      return [
        {
          code: 'job.invalid',
          path,
          message: issue.issues[0]?.message ?? issue.message,
          hint: undefined,
        },
      ];
    case 'invalid_type':
      return [wrongType(issue.expected, path, value, ground)];
    default:
      return [
        { code: 'job.invalid', path, message: `${showValue(value)} cannot be used here.`, hint: undefined },
      ];
  }
}

/** The branch whose kind of value is there; of single values the first, which says what is possible. */
function meantBranch(branches: readonly (readonly Raw[])[]): readonly Raw[] {
  const fits = (branch: readonly Raw[]): boolean =>
    !branch.some((issue) => issue.path.length === 0 && issue.code === 'invalid_type');
  return branches.toReversed().find(fits) ?? branches[0] ?? [];
}

function hintOf(issue: Raw): string | undefined {
  const hint: unknown = issue.code === 'custom' ? issue.params?.['hint'] : undefined;
  return typeof hint === 'string' ? hint : undefined;
}

function wrongType(expected: string, path: Path, value: unknown, { schema }: Ground): JobIssue {
  const known = keysAt(schema, path);
  const wanted =
    expected === 'array'
      ? 'a list'
      : known.length > 0 || ['string', 'record'].includes(expected)
        ? 'a group of keys'
        : expected;
  const message =
    value === undefined
      ? 'is missing.'
      : value === null
        ? 'nothing stands under this key.'
        : `${showValue(value)} is not ${wanted}.`;
  const says = describedAt(schema, path);
  const hint =
    expected !== 'array' && known.length > 0
      ? `Keys here: ${known.filter((one) => !LATER.includes(one)).join(', ')}.`
      : says && `${says}.`;
  return { code: 'job.invalid', path, message, hint };
}

function unknownKey(key: string, path: Path, ground: Ground): JobIssue {
  const known = keysAt(ground.schema, path);
  const group = valueAt(ground.tree, path);
  const decimals = /^\d+$/.test(key) && valueAt(group, [key]) === null;
  if (decimals) {
    const message = `a lone ${key} after a comma.`;
    const hint = `A decimal comma? Decimals follow a point: 0.${key}, not 0,${key}.`;
    return { code: 'job.unknown-key', path: [...path, key], message, hint };
  }
  const near = nearestWord(key, known);
  const elsewhere = near === undefined ? homeOf(ground.schema, key) : undefined;
  const hint =
    near !== undefined
      ? `Is ${near} meant?`
      : elsewhere !== undefined
        ? `${key} belongs to ${elsewhere}.`
        : `Keys here: ${known.filter((one) => !LATER.includes(one)).join(', ')}.`;
  const where = path.length > 0 ? showPath(path) : known.includes('wheel') ? 'a job' : 'a file of cutters';
  return { code: 'job.unknown-key', path: [...path, key], message: `${where} has no key ${key}.`, hint };
}

function valueAt(tree: unknown, path: Path): unknown {
  return path.reduce<unknown>(
    (here, key) =>
      typeof here === 'object' && here !== null && Object.hasOwn(here, key)
        ? (here as Record<string | number, unknown>)[key]
        : undefined,
    tree,
  );
}

/** Keys that a group may have. */
export function keysAt(schema: z.ZodType, path: Path): readonly string[] {
  return groupsOf(schema, path).flatMap((group) => Object.keys(group.shape));
}

/** What the schema says of a key. */
function describedAt(schema: z.ZodType, path: Path): string | undefined {
  const key = String(path.at(-1) ?? '');
  const [said] = groupsOf(schema, path.slice(0, -1)).flatMap(({ shape }) => {
    const child = shape[key] as z.ZodType | undefined;
    const inner = child?.def as { innerType?: z.ZodType } | undefined;
    return child?.description ?? inner?.innerType?.description ?? [];
  });
  return said;
}

type Group = z.ZodObject;

function groupsOf(schema: z.ZodType, path: Path): readonly Group[] {
  const groups = unwrap(schema);
  const [first, ...rest] = path;
  if (first === undefined) {
    return groups.filter((one) => one.def.type === 'object') as Group[];
  }
  return groups.flatMap((one) => {
    const next = childOf(one, first);
    return next === undefined ? [] : groupsOf(next, rest);
  });
}

/** Without optional; the branches of a union each. */
function unwrap(schema: z.ZodType): readonly z.ZodType[] {
  // zod types `def` by its own base only; `type` says which of these is there.
  const def = schema.def as unknown as { type: string; innerType?: z.ZodType; options?: z.ZodType[] };
  if (def.type === 'optional' && def.innerType !== undefined) {
    return unwrap(def.innerType);
  }
  return def.type === 'union' ? (def.options ?? []).flatMap(unwrap) : [schema];
}

function childOf(schema: z.ZodType, key: string | number): z.ZodType | undefined {
  // As above.
  const def = schema.def as unknown as {
    type: string;
    shape?: Record<string, z.ZodType>;
    element?: z.ZodType;
    valueType?: z.ZodType;
  };
  return def.type === 'object' ? def.shape?.[key] : (def.element ?? def.valueType);
}

/** Where a key that stands in the wrong group belongs. */
function homeOf(schema: z.ZodType, key: string, path: Path = []): string | undefined {
  for (const group of groupsOf(schema, [])) {
    if (path.length > 0 && Object.hasOwn(group.shape, key)) {
      return showPath(path);
    }
    for (const [name, child] of Object.entries(group.shape)) {
      const home = homeOf(child, key, [...path, name]);
      if (home !== undefined) {
        return home;
      }
    }
  }
  return undefined;
}
