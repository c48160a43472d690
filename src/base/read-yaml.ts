/**
 * Text of a job or machine file to plain values, each with its line and column. YAML 1.2 (JSON is a subset), kept
 * to what such a file needs: keys and values, lists, text, numbers, yes and no. Refused with a place: what YAML itself
 * forbids, a key said twice, anchors and aliases (a few lines of them can unfold to gigabytes), tags, merge keys,
 * several documents, numbers without an end, binary, too large, too deep, empty.
 * The only file that knows the yaml library; what it was given is walked here, never handed on.
 */
import { LineCounter, isAlias, isMap, isScalar, isSeq, parseDocument, type Node } from 'yaml';
import type { Outcome, Place, Problem } from './problem.ts';
import { failure, success } from './problem.ts';
import { tooTangled } from './yaml-tangle.ts';
import { oddBlank, yamlSentence } from './yaml-sentence.ts';

export type YamlPath = readonly (string | number)[];

/** 1-based. */
export interface Spot {
  readonly line: number;
  readonly column: number;
}

export interface YamlText {
  /** Maps as objects with string keys, lists as arrays; text, finite numbers, booleans, null. */
  readonly value: unknown;
  /** Where a value stands, or, where there is none, the nearest thing round it. */
  readonly placeOf: (path: YamlPath) => Spot;
  /** Where a key stands in the map at `path`. */
  readonly placeOfKey: (path: YamlPath, key: string) => Spot;
  /** A value as it is written (`1e-2`, `0.50`), where it is a plain one. */
  readonly writtenAt: (path: YamlPath) => string | undefined;
}

/** Bytes of the largest job or machine file that is read.
 *  Why: a thousand times what one needs, and still read in a second. */
export const YAML_LARGEST = 1_000_000;

type SyntaxCode = 'job.syntax' | 'machine.syntax';

/** Reads one file's text; the problems found carry `code` and their place in `file`. */
export function readYaml(
  file: string,
  text: string,
  limitBytes: number,
  code: SyntaxCode,
): Outcome<YamlText> {
  const refuse = (faults: readonly Fault[]): Outcome<YamlText> =>
    failure(faults.map((fault) => problemOf(fault, file, code)));
  const early = beforeParsing(text, limitBytes);
  if (early !== undefined) {
    return refuse([early]);
  }
  const lines = new LineCounter();
  const document = parseDocument(text, { lineCounter: lines, prettyErrors: false, uniqueKeys: false });
  const spotAt = (offset: number): Spot => {
    const { line, col } = lines.linePos(offset);
    return { line: Math.max(line, 1), column: Math.max(col, 1) };
  };
  const root = document.contents;
  // One fault makes the parser stumble on over the lines that follow: the first is the one to mend.
  const first = document.errors[0];
  const whole =
    first === undefined
      ? wholeFaults(document, code)
      : [
          {
            ...(oddBlank(text, first.pos[0]) ?? yamlSentence(first.code, first.message)),
            spot: spotAt(first.pos[0]),
          },
        ];
  if (whole.length > 0 || root === null) {
    return refuse(whole);
  }
  const faults: Fault[] = [];
  const value = unfold(root, [], (message, hint, node, path) => {
    faults.push({ message, hint, path, spot: spotAt(node.range?.[0] ?? 0) });
  });
  return faults.length > 0 ? refuse(faults.slice(0, MOST_FAULTS)) : success(withPlaces(root, value, spotAt));
}

/** Most faults of one file that are said. Why: a list that does not fit the screen is not read. */
const MOST_FAULTS = 12;

interface Fault {
  readonly message: string;
  readonly hint?: string | undefined;
  readonly path?: YamlPath;
  readonly spot: Spot;
}

function problemOf(fault: Fault, file: string, code: SyntaxCode): Problem {
  const at: Place = { kind: 'value', file, path: fault.path ?? [], ...fault.spot };
  const { message, hint } = fault;
  return { code, severity: 'error', message, at, ...(hint === undefined ? {} : { hint }) };
}

/** What is wrong with a text that is good YAML, but no file of ours. */
function wholeFaults(document: ReturnType<typeof parseDocument>, code: SyntaxCode): Fault[] {
  const spot = { line: 1, column: 1 };
  const version = document.directives?.yaml;
  if (version?.explicit === true && version.version !== '1.2') {
    const message = `YAML ${version.version} is asked for; this file is read as YAML 1.2.`;
    return [{ message, hint: 'Leave the %YAML line out.', spot }];
  }
  const root = document.contents;
  if (root === null || (isScalar(root) && root.value === null)) {
    return [{ message: 'The file is empty.', hint: EMPTY_HINT[code], spot }];
  }
  return isMap(root) || isAlias(root)
    ? []
    : [{ message: 'The file holds no keys and values.', hint: EMPTY_HINT[code], spot }];
}

const EMPTY_HINT = {
  'job.syntax': '`ogive new JOB.yaml` writes a commented job to begin with.',
  'machine.syntax': 'Begin with a copy of a file of posts/.',
} as const;

/** What must be known before the parser sees the text, because it would take too long or fall over. */
function beforeParsing(text: string, limitBytes: number): Fault | undefined {
  if (text.length > limitBytes) {
    const size = (text.length / 1e6).toFixed(1);
    return {
      message: `The file is too large: ${size} MB, at most ${limitBytes / 1e6} MB is read.`,
      hint: 'Is it the right file?',
      spot: { line: 1, column: 1 },
    };
  }
  const binary = text.search(NOT_TEXT);
  if (binary >= 0) {
    return {
      message: 'The file is not text: it holds bytes that no letter has.',
      hint: 'Save it as plain text, UTF-8.',
      spot: spotOf(text, binary),
    };
  }
  if (/\r(?!\n)/.test(text) && !text.includes('\n')) {
    return {
      message: 'The lines end in a carriage return alone: the whole file is read as one line.',
      hint: 'Save it with line ends of this computer (LF, or CR and LF).',
      spot: { line: 1, column: 1 },
    };
  }
  const tangle = tooTangled(text);
  return tangle === undefined
    ? undefined
    : {
        message: 'Values are nested too deep, or so many braces and brackets open that they may be.',
        hint: 'Write groups on lines of their own instead of between braces.',
        spot: spotOf(text, tangle),
      };
}

/** Control characters other than tab and line ends, and what stands where bytes were no UTF-8. */
// oxlint-disable-next-line no-control-regex -- control characters are what is looked for
const NOT_TEXT = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f\ufffd]/;

function spotOf(text: string, offset: number): Spot {
  const before = text.slice(0, offset).split('\n');
  return { line: before.length, column: (before.at(-1) ?? '').length + 1 };
}

type Complain = (message: string, hint: string | undefined, node: Node, path: YamlPath) => void;

function unfold(node: Node, path: YamlPath, complain: Complain): unknown {
  if (isAlias(node)) {
    complain(
      `*${node.source} stands for a value from elsewhere; aliases are not read.`,
      'Write the value out.',
      node,
      path,
    );
    return null;
  }
  if (node.anchor !== undefined) {
    complain(
      `&${node.anchor} names a value for use elsewhere; anchors are not read.`,
      `Leave &${node.anchor} out.`,
      node,
      path,
    );
  }
  if (node.tag !== undefined) {
    complain(`The tag ${node.tag} is not read.`, 'Leave out the word that begins with "!".', node, path);
  }
  if (isMap(node)) {
    return unfoldMap(node.items as readonly Pair[], path, complain);
  }
  if (isSeq(node)) {
    return node.items.map((item, i) => unfold(item as Node, [...path, i], complain));
  }
  const value: unknown = isScalar(node) ? node.value : null;
  if (typeof value === 'number' && !Number.isFinite(value)) {
    complain(`${writtenOf(node)} is not a number that can be measured.`, 'Give a plain number.', node, path);
  }
  return value;
}

interface Pair {
  readonly key: Node;
  readonly value: Node | null;
}

function unfoldMap(pairs: readonly Pair[], path: YamlPath, complain: Complain): Record<string, unknown> {
  const result: Record<string, unknown> = {};
  const seen = new Set<string>();
  for (const { key, value } of pairs) {
    const name = keyName(key);
    if (name === undefined || name.trim() === '' || name === '__proto__' || name === '<<') {
      complain(
        name === '<<' ? 'Merge keys (<<) are not read.' : 'A key must be a word or a number.',
        name === '<<' ? 'Write the values out.' : undefined,
        key ?? value,
        path,
      );
      continue;
    }
    if (seen.has(name)) {
      complain(`${name} is said twice in the same place.`, 'Keep one of them.', key, [...path, name]);
      continue;
    }
    seen.add(name);
    result[name] = value === null ? null : unfold(value, [...path, name], complain);
  }
  return result;
}

function keyName(key: Node): string | undefined {
  const plain = isScalar(key) && key.anchor === undefined && key.tag === undefined ? key.value : undefined;
  return typeof plain === 'string' || typeof plain === 'number' ? String(plain) : undefined;
}

function writtenOf(node: Node): string {
  return isScalar(node) ? (node.source ?? String(node.value)) : '';
}

function withPlaces(root: Node, value: unknown, spotAt: (offset: number) => Spot): YamlText {
  const spot = (node: Node | null | undefined): Spot => spotAt(node?.range?.[0] ?? 0);
  return {
    value,
    placeOf: (path) => {
      const { node, key } = deepest(root, path);
      return spot(node ?? key ?? root);
    },
    placeOfKey: (path, key) => {
      const { node } = deepest(root, path);
      const pair = isMap(node) ? pairOf(node.items as readonly Pair[], key) : undefined;
      return spot(pair?.key ?? node ?? root);
    },
    writtenAt: (path) => {
      const { node, found } = deepest(root, path);
      return found && isScalar(node) ? node.source : undefined;
    },
  };
}

/** The node at the path, or the last one on the way to it; a missing one is shown by the key it is missing from. */
function deepest(root: Node, path: YamlPath): { node: Node | null; key: Node | undefined; found: boolean } {
  let node: Node | null = root;
  let key: Node | undefined;
  for (const segment of path) {
    const next = step(node, segment);
    if (next === undefined) {
      return { node: key ?? node, key, found: false };
    }
    node = next.value;
    key = next.key;
  }
  return { node, key, found: true };
}

function step(
  node: Node | null,
  segment: string | number,
): { key: Node | undefined; value: Node | null } | undefined {
  if (isMap(node)) {
    return pairOf(node.items as readonly Pair[], String(segment));
  }
  const item = isSeq(node) ? (node.items[Number(segment)] as Node | undefined) : undefined;
  return item === undefined ? undefined : { key: undefined, value: item };
}

function pairOf(pairs: readonly Pair[], name: string): Pair | undefined {
  return pairs.find((pair) => keyName(pair.key) === name);
}
