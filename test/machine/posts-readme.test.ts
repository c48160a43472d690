/** posts/README.md explains every key there is, none that is not, and says rightly which ones have no default. */
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { knownKeys } from '../../src/machine/machine-schema.ts';
import { readMachine } from '../../src/machine/read-machine.ts';
import { changed, readTree, treeOf } from './machine-tree.ts';
import { POSTS, postText } from './read-posts.ts';

const README = readFileSync(new URL('../../posts/README.md', import.meta.url), 'utf8');

/** Heading of each part that has a table of keys, and where its keys stand in a file. */
const PARTS: readonly (readonly [string, readonly string[]])[] = [
  ['The top of the file', []],
  ['words', ['words']],
  ...knownKeys(['words']).map((group) => [`words: ${group}`, ['words', group]] as const),
  ['limits', ['limits']],
];

/** Rows of the table under a heading: the key and what its values are. */
function rowsUnder(heading: string): readonly (readonly [string, string])[] {
  const part = README.split(/^#+ /m).find((text) => text.startsWith(`${heading}\n`)) ?? '';
  return [...part.matchAll(/^\| `([a-z0-9-]+)` \| ([^|]*) \| [^|]+ \| [^|]* \|$/gm)].map(
    (row) => [row[1] ?? '', row[2] ?? ''] as const,
  );
}

it.each(PARTS)('%s: each key once, in the order of the schema', (heading, path) => {
  expect(knownKeys(path).length).toBeGreaterThan(1);
  expect(rowsUnder(heading).map(([key]) => key)).toEqual(knownKeys(path));
});

it.each(PARTS)('%s: says which keys must be given', (heading, path) => {
  for (const [key, values] of rowsUnder(heading)) {
    const outcome = readTree(changed(treeOf('desk-four-axis'), [...path, key], undefined));
    const missing = outcome.problems.some((one) => one.code === 'machine.missing');
    expect([key, /must be given/.test(values)]).toEqual([key, missing]);
    expect([key, /must be given|default/.test(values)]).toEqual([key, true]);
  }
});

it('lists every machine file', () => {
  expect([...README.matchAll(/^\| `([a-z0-9-]+)` \| [^|]+ \|$/gm)].map((row) => row[1]).toSorted()).toEqual([
    ...POSTS,
  ]);
});

it("the example of a file of one's own is read, and changes what it says", () => {
  const yaml = /```yaml\n([\s\S]*?)```/.exec(README)?.[1] ?? '';
  const text = yaml.replaceAll(/^ {3}/gm, '');
  const outcome = readMachine('my-mill', 'my-mill.yaml', text, postText);
  expect(outcome.problems).toEqual([]);
  expect(outcome.ok && outcome.value.words.spindle.spinUpSeconds).toBe(8);
  expect(outcome.ok && outcome.value.limits.spindleHighest).toBe(12_000);
});
