import { readdirSync, readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { showProblem } from '../../src/base/show-problem.ts';
import { readMachine } from '../../src/machine/read-machine.ts';
import { POSTS, postText, readPost } from './read-posts.ts';

const BAD = new URL('../bad-machines/', import.meta.url);
const badFiles = readdirSync(BAD).filter((file) => file.endsWith('.yaml'));

it.each(POSTS)('%s is read without an error or a warning', (name) => {
  const outcome = readPost(name);
  expect(outcome.problems.map(showProblem)).toEqual([]);
  expect(outcome.ok && outcome.value.name).toBe(name);
});

it('has the seven machines that every program is tried on', () => {
  expect(POSTS).toEqual([
    'bench-mill',
    'desk-four-axis',
    'desk-three-axis',
    'din-66025',
    'inch-bench-mill',
    'lines-only',
    'machining-centre',
  ]);
});

it.each(badFiles)('%s is refused with exactly what is wrong in it', (file) => {
  const load = (name: string): string | undefined =>
    badFiles.includes(`${name}.yaml`) ? readFileSync(new URL(`${name}.yaml`, BAD), 'utf8') : postText(name);
  const outcome = readMachine(
    file.replace('.yaml', ''),
    file,
    readFileSync(new URL(file, BAD), 'utf8'),
    load,
  );
  expect(outcome.ok).toBe(false);
  const said = `${outcome.problems.map(showProblem).join('\n')}\n`;
  expect(said).toBe(readFileSync(new URL(file.replace('.yaml', '.txt'), BAD), 'utf8'));
});

it('keeps no text of a bad machine file that is gone', () => {
  const texts = readdirSync(BAD).filter((file) => file.endsWith('.txt'));
  expect(texts.filter((file) => !badFiles.includes(file.replace('.txt', '.yaml')))).toEqual([]);
});

it('takes from the file it is like whatever is not said, and joins groups key by key', () => {
  const mine = readMachine('mine', 'mine.yaml', 'like: desk-three-axis\nlimits: { power: 90 }\n', postText);
  const base = readPost('desk-three-axis');
  expect(mine.ok && base.ok && mine.value).toEqual({
    ...(base.ok ? base.value : undefined),
    name: 'mine',
    limits: { ...(base.ok ? base.value.limits : undefined), power: 90 },
  });
});

it('replaces a list whole', () => {
  const text = 'like: bench-mill\nwords: { holes: { cycles: [G81] } }\n';
  const mine = readMachine('mine', 'mine.yaml', text, postText);
  expect(mine.ok && mine.value.words.holes.cycles).toEqual(['G81']);
});

it('does not take over who proved the file it is like', () => {
  const base = `${postText('bench-mill')}`.replace(
    'proved: unproved',
    'proved: the clockroom, the mill, 2031',
  );
  const load = (): string => base;
  expect(readMachine('base', 'base.yaml', base, load)).toMatchObject({
    value: { proved: 'the clockroom, the mill, 2031' },
  });
  expect(readMachine('mine', 'mine.yaml', 'like: base\n', load)).toMatchObject({
    value: { proved: 'unproved' },
  });
});

it('takes an inherited rotary axis away where none is said', () => {
  const text = 'like: desk-four-axis\nwords: { rotary: none }\n';
  const mine = readMachine('mine', 'mine.yaml', text, postText);
  expect(mine.ok && mine.value.words.rotary).toBeUndefined();
  const four = readPost('desk-four-axis');
  expect(four.ok && four.value.words.rotary?.letter).toBe('A');
});

it('places a problem of an inherited value in the file that says it', () => {
  const base = `${postText('bench-mill')}`.replace('line-longest: 120', 'line-longest: 900');
  const outcome = readMachine('mine', 'mine.yaml', 'like: base\n', () => base);
  const line = base.split('\n').findIndex((text) => text.includes('900')) + 1;
  expect(outcome.problems.map((one) => one.at)).toMatchObject([{ file: 'base.yaml', line }]);
});

it('follows a chain of five files and no longer one', () => {
  const load = (name: string): string | undefined =>
    name === 'm5' ? postText('bench-mill') : `like: m${Number(name.slice(1)) + 1}\n`;
  expect(readMachine('m1', 'm1.yaml', 'like: m2\n', load).ok).toBe(true);
  const long = readMachine('m0', 'm0.yaml', 'like: m1\n', load);
  expect(long.problems.map((one) => one.code)).toEqual(['machine.invalid']);
});
