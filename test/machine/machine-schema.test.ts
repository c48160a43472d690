import { expect, it } from 'vitest';
import { checkTree } from '../../src/machine/machine-schema.ts';
import { changed, leavesOf, readTree, treeOf } from './machine-tree.ts';

/** The fields that make a crash where they are guessed: a wrong word, unit, length or zero. */
const SAFETY = `
  description units words limits
  words.file.program-label words.file.line-longest words.file.comment-form words.file.comment-letters
  words.file.file-largest words.file.banned-characters
  words.blocks.skip-mark
  words.numbers.point words.numbers.value-largest
  words.modes.millimetre-word words.modes.inch-word words.modes.opening
  words.arcs.planes words.arcs.centre words.arcs.whole-circle words.arcs.helix words.arcs.shortest-chord
  words.holes.cycles words.holes.return-word words.holes.clear-meaning words.holes.end-word
  words.dwell.letter words.dwell.unit
  words.cutters.change words.cutters.length-offset words.cutters.length-cancel
  words.spindle.run words.spindle.forward words.spindle.spin-up-seconds
  words.positions.work-offset words.positions.top words.positions.top-machine-z words.positions.rapid-shape
  words.path.finishing words.path.roughing
  words.rotary.letter words.rotary.about words.rotary.sense words.rotary.count
  words.end.end
  limits.travel limits.spindle-lowest limits.spindle-highest limits.nut`
  .trim()
  .split(/\s+/);

const whole = treeOf('desk-four-axis');

it.each(SAFETY)('refuses a file that does not give %s', (where) => {
  const outcome = readTree(changed(whole, where.split('.'), undefined));
  expect(outcome.ok).toBe(false);
  expect(new Set(outcome.problems.map((one) => one.code))).toEqual(new Set(['machine.missing']));
  const paths = outcome.problems.map((one) => (one.at.kind === 'value' ? one.at.path.join('.') : ''));
  expect(paths.filter((path) => !path.startsWith(where))).toEqual([]);
});

it('asks for every safety field of an empty file by its name', () => {
  const outcome = readTree({ format: 'ogive-machine/1' });
  const paths = outcome.problems.map((one) => (one.at.kind === 'value' ? one.at.path.join('.') : ''));
  const groups = ['words', 'limits', 'limits.travel', 'limits.nut'];
  const wanted = SAFETY.filter((path) => !path.includes('rotary') && !groups.includes(path));
  expect(paths.toSorted()).toEqual(
    [
      ...wanted,
      'limits.travel.x',
      'limits.travel.y',
      'limits.travel.z',
      'limits.nut.diameter',
      'limits.nut.length',
    ].toSorted(),
  );
});

it.each(leavesOf(whole).map((path) => path.join('.')))('refuses nonsense at %s', (where) => {
  for (const nonsense of [null, -1e12, 1e12, 'non\tsense \u00fc', {}, [[]], ['X1 Y1 ']]) {
    const checked = checkTree(changed(whole, where.split('.'), nonsense));
    expect({ nonsense, ok: checked.ok }).toEqual({ nonsense, ok: false });
    const paths = checked.ok ? [] : checked.issues.map((issue) => issue.path.join('.'));
    expect(paths.every((path) => path.startsWith(where))).toBe(true);
  }
});

/** Ends of ranges, and what lies just outside. */
const RANGES: readonly (readonly [string, readonly unknown[], readonly unknown[]])[] = [
  ['words.file.line-longest', [80, 256], [19, 257, 80.5, '80']],
  ['words.numbers.length-decimals.mm', [4, 6], [2, 7, 3.5]],
  ['words.numbers.length-decimals.inch', [4, 7], [3, 8]],
  ['words.numbers.code-width', [1, 2], [0, 3]],
  ['words.numbers.value-largest', [9999, 999_999], [9, 1e7]],
  ['words.spindle.spin-up-seconds', [1, 120], [-1, 121]],
  ['words.arcs.longest-sweep', [30, 360], [29, 361]],
  ['words.positions.work-offset', ['G54', 'G59', 'G59.3'], ['G53', 'G60', 'G54 X1', 54]],
  ['words.path.finishing', ['G61', 'G61 P0.002', 'none'], ['g61', 'G61;', 'G61 (x)', 61]],
  ['words.blocks.last', [9999], [9, 1e8]],
  [
    'limits.travel.x',
    [
      [0, 180],
      [-180, 0],
    ],
    [[180, 0], [0, 0], [0], [0, 1, 2], [0, 1e6], 'none'],
  ],
  ['limits.runout', [0, 0.2], [-0.001, 0.3]],
  ['limits.nut.diameter', [5, 100], [4, 101, '19 mm']],
];

it.each(RANGES)('keeps %s to its range', (where, right, wrong) => {
  const path = where.split('.');
  const read = (value: unknown): boolean =>
    readTree(changed(whole, path, value)).problems.every((one) => one.code !== 'machine.invalid');
  expect(right.filter((value) => !read(value))).toEqual([]);
  expect(wrong.filter(read)).toEqual([]);
});

it('names the nearest key to one that is not known', () => {
  const outcome = readTree(changed(whole, ['words', 'spindle', 'spinup-seconds'], 3));
  expect(outcome.problems).toMatchObject([
    { code: 'machine.unknown-key', hint: 'Is spin-up-seconds meant?' },
  ]);
});
