import { describe, expect, it } from 'vitest';
import { readYaml, YAML_LARGEST } from '../../src/base/read-yaml.ts';
import { Bug } from '../../src/base/bug.ts';

function read(text: string) {
  return readYaml('a.yaml', text, YAML_LARGEST, 'job.syntax');
}

function valueOf(text: string): unknown {
  const result = read(text);
  return result.ok ? result.value.value : result.problems.map((problem) => problem.message);
}

function firstProblem(text: string) {
  const problem = read(text).problems[0];
  if (problem === undefined || problem.at.kind !== 'value') {
    throw new Bug('nothing was found wrong');
  }
  return { code: problem.code, message: problem.message, line: problem.at.line, column: problem.at.column };
}

describe('what YAML 1.2 makes of plain values [YAML 1.2.2 §10.3.2, core schema]', () => {
  it.each([
    ['a: 0o14', 12],
    ['a: 0x1F', 31],
    ['a: 1e3', 1000],
    ['a: -0.50', -0.5],
    ['a: yes', 'yes'],
    ['a: no', 'no'],
    ['a: true', true],
    ['a: 1:30', '1:30'],
    ['a: 0,5', '0,5'],
    ['a: 1_000', '1_000'],
    ['a: "60"', '60'],
    ['a: ~', null],
    ['a:', null],
  ])('%s', (text, value) => {
    expect(valueOf(text)).toEqual({ a: value });
  });
  it('reads JSON, which is a subset', () => {
    expect(valueOf('{"a": [1, {"b": null}], "2": "x"}')).toEqual({ a: [1, { b: null }], 2: 'x' });
  });
});

describe('places', () => {
  const text =
    'wheel:\n  teeth: 60\n  mate: { leaves: 8 }\n  size:\n    - 44\n    - 45\ncutters:\n  1: { d: 2 }\n';
  const yaml = read(text);
  it.each([
    [['wheel', 'teeth'], 2, 10],
    [['wheel', 'mate', 'leaves'], 3, 19],
    [['wheel', 'size', 1], 6, 7],
    [['cutters', '1', 'd'], 8, 11],
  ])('finds %j at %i:%i (counted by hand)', (path, line, column) => {
    expect(yaml.ok && yaml.value.placeOf(path)).toEqual({ line, column });
  });
  it('shows what is missing at the key of its group', () => {
    expect(yaml.ok && yaml.value.placeOf(['wheel', 'bore'])).toEqual({ line: 1, column: 1 });
  });
  it('finds a key', () => {
    expect(yaml.ok && yaml.value.placeOfKey(['wheel'], 'mate')).toEqual({ line: 3, column: 3 });
  });
  it('keeps what was written', () => {
    const one = read('a: 0.50\n');
    expect(one.ok && one.value.writtenAt(['a'])).toBe('0.50');
  });
});

describe('refuses, with a place', () => {
  it.each([
    ['a key said twice', 'a: 1\nb: 2\na: 3\n', 3, 1],
    ['a key said twice, once as text', '1: a\n"1": b\n', 2, 1],
    ['a number without an end', 'a: [1, .inf]\n', 1, 8],
    ['no number at all', 'a: .NaN\n', 1, 4],
    ['a number too large for any machine', 'a: 1e999\n', 1, 4],
    ['an alias', 'a: 1\nb: *a\n', 2, 4],
    ['a merge key', 'a:\n  <<: { b: 1 }\n', 2, 3],
    ['a second document', 'a: 1\n---\nb: 1\n', 2, 1],
    ['a group as a key', '? { a: 1 }\n: 2\n', 1, 3],
    ['a key that is a way into the language', '__proto__: { a: 1 }\n', 1, 1],
    ['binary', 'a: 1\nb: \u0000\n', 2, 4],
    ['bytes that were no UTF-8', 'a: \ufffd\n', 1, 4],
    ['nothing', '', 1, 1],
    ['comments only', '# a\n', 1, 1],
    ['a list', '- 1\n', 1, 1],
    ['text', 'hello', 1, 1],
    ['another version of YAML', '%YAML 1.1\n---\na: yes\n', 1, 1],
  ])('%s', (_, text, line, column) => {
    expect(firstProblem(text)).toMatchObject({ code: 'job.syntax', line, column });
  });
  it('a tag, wherever it stands', () => {
    expect(firstProblem('a: !!python/object 1\n').code).toBe('job.syntax');
    expect(firstProblem('a: !!str 1\n').code).toBe('job.syntax');
  });
});

describe('what would take the parser hours or its stack', () => {
  it.each([
    ['brackets', '['.repeat(200_000)],
    ['brackets closed in quotes', '["]", '.repeat(20_000)],
    ['brackets closed in comments', '[ # ]\n'.repeat(600)],
    ['brackets closed inside a text of many lines', 'a: [[[[ "\n]]]] }}}}\n", {b: '.repeat(200)],
    ['dashes', '- '.repeat(200_000)],
    ['dashes and tabs', '-\t'.repeat(200_000)],
    ['question marks', '? '.repeat(200_000)],
    ['steps', Array.from({ length: 1000 }, (_, i) => `${' '.repeat(i)}a:`).join('\n')],
    ['ten million letters', 'a: 1\n'.repeat(2_000_000)],
  ])('is refused before it is parsed: %s', (_, text) => {
    const start = performance.now();
    expect(firstProblem(text).message).toMatch(/nested too deep|too large/);
    expect(performance.now() - start).toBeLessThan(200);
  });
  it('lets five hundred clamps be, each between its braces: they are not deep', () => {
    const clamp = '  - { x: -7, y: [1, 2], radius: 1, height: 3 } # one more\n';
    const outcome = read(`keep-out:\n${clamp.repeat(5000)}`);
    expect(outcome.problems).toEqual([]);
    expect(outcome.ok && (outcome.value.value as { 'keep-out': unknown[] })['keep-out'].length).toBe(5000);
  });
  it('says little of an alias bomb, and unfolds none of it', () => {
    const bomb = `a: &a [x, x]\n${Array.from({ length: 40 }, (_, i) => `b${i}: &b${i} [*a, *a]`).join('\n')}\n`;
    expect(read(bomb).problems.length).toBeLessThanOrEqual(12);
  });
});

it('carries the code it is given', () => {
  const result = readYaml('posts/x.yaml', '', YAML_LARGEST, 'machine.syntax');
  expect(result.problems[0]?.code).toBe('machine.syntax');
});
