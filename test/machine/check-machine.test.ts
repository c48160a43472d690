/**
 * Each danger by the smallest change to a good file that makes it, and the field it is shown at. The list stands against
 * the source: a danger that no change here makes fails the last test.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { afterAll, expect, it } from 'vitest';
import { checkMachine } from '../../src/machine/check-machine.ts';
import { readMachine } from '../../src/machine/read-machine.ts';
import { changed, readTree, treeOf } from './machine-tree.ts';
import { POSTS, postText, readPost } from './read-posts.ts';

type Changes = Readonly<Record<string, unknown>>;
type Case = readonly [what: string, of: string, changes: Changes, at: string, 'error' | 'warning'];

// prettier-ignore
const CASES: readonly Case[] = [
  ['a label without % lines', 'machining-centre', { 'words.file.percent-lines': 'none' }, 'words.file.program-label', 'error'],
  ['a label range beyond its digits', 'machining-centre', { 'words.file.label-digits': 3 }, 'words.file.label-highest', 'error'],
  ['a label range turned round', 'machining-centre', { 'words.file.label-lowest': 8000 }, 'words.file.label-lowest', 'error'],
  ['programs that take the name of the sheet', 'desk-three-axis', { 'words.file.ending': '.html' }, 'words.file.ending', 'error'],
  ['programs that a computer would start', 'desk-three-axis', { 'words.file.ending': '.exe' }, 'words.file.ending', 'error'],
  ['a bracket inside bracket comments', 'desk-three-axis', { 'words.file.comment-letters': '.)' }, 'words.file.comment-letters', 'error'],
  ['a semicolon in comments', 'lines-only', { 'words.file.comment-letters': '.;' }, 'words.file.comment-letters', 'error'],
  ['a sign that acts at once in comments', 'desk-three-axis', { 'words.file.comment-letters': '.?' }, 'words.file.comment-letters', 'error'],
  ['notes that nobody sees', 'bench-mill', { 'words.file.comment-form': 'semicolon' }, 'words.file.operator-note', 'error'],
  ['stops without a word', 'din-66025', { 'words.file.comment-form': 'none' }, 'words.file.comment-form', 'warning'],
  ['the point banned', 'desk-three-axis', { 'words.file.banned-characters': '.', 'words.file.comment-letters': '-' }, 'words.file.banned-characters', 'error'],
  ['a letter banned that orders to hands are written with', 'lines-only', { 'words.file.banned-characters': 'E' }, 'words.file.banned-characters', 'error'],
  ['the comment mark banned', 'lines-only', { 'words.file.banned-characters': ';' }, 'words.file.banned-characters', 'error'],
  ['lines shorter than a block', 'desk-three-axis', { 'words.file.line-longest': 40 }, 'words.file.line-longest', 'error'],
  ['block numbers that end at once', 'machining-centre', { 'words.blocks.first': 9985 }, 'words.blocks.last', 'error'],
  ['unit words exchanged', 'bench-mill', { 'words.modes.millimetre-word': 'G20', 'words.modes.inch-word': 'G21' }, 'words.modes.millimetre-word', 'error'],
  ['unit words of two families', 'bench-mill', { 'words.modes.millimetre-word': 'G71' }, 'words.modes.millimetre-word', 'error'],
  ['no unit in the opening', 'lines-only', { 'words.modes.opening': ['G90'] }, 'words.modes.opening', 'error'],
  ['a literal unit beside UNIT', 'lines-only', { 'words.modes.opening': ['G90', 'UNIT', 'G20'], 'words.path.feed-mode': 'none' }, 'words.modes.opening', 'error'],
  ['homing in the opening', 'lines-only', { 'words.modes.opening': ['G90', 'UNIT', 'G28'] }, 'words.modes.opening', 'error'],
  ['a shifted zero in the opening', 'lines-only', { 'words.modes.opening': ['G90', 'UNIT', 'G92'] }, 'words.modes.opening', 'error'],
  ['steps instead of positions', 'lines-only', { 'words.modes.opening': ['G90', 'UNIT', 'G91'] }, 'words.modes.opening', 'error'],
  ['two modes of one group', 'lines-only', { 'words.modes.opening': ['G90', 'UNIT', 'G61', 'G64'] }, 'words.modes.opening', 'error'],
  ['positions not said', 'lines-only', { 'words.modes.opening': ['UNIT'] }, 'words.modes.opening', 'error'],
  ['the plane not said', 'desk-three-axis', { 'words.modes.opening': ['UNIT', 'G40', 'G54', 'G90', 'G94'] }, 'words.modes.opening', 'error'],
  ['the feed mode not said', 'desk-three-axis', { 'words.modes.opening': ['UNIT', 'G17', 'G40', 'G54', 'G90'] }, 'words.modes.opening', 'error'],
  ['the work offset not said', 'desk-three-axis', { 'words.modes.opening': ['UNIT', 'G17', 'G40', 'G90', 'G94'] }, 'words.modes.opening', 'error'],
  ['the centre word not said', 'desk-three-axis', { 'words.arcs.centre-word': 'G91.1' }, 'words.modes.opening', 'error'],
  ['compensation not put out', 'desk-three-axis', { 'words.modes.opening': ['UNIT', 'G17', 'G54', 'G90', 'G94'] }, 'words.modes.opening', 'warning'],
  ['steps left to the next job', 'bench-mill', { 'words.end.restore': ['G91'] }, 'words.end.restore', 'error'],
  ['homing at the end', 'bench-mill', { 'words.end.restore': ['G28'] }, 'words.end.restore', 'error'],
  ['a helix without arcs', 'lines-only', { 'words.arcs.helix': true }, 'words.arcs.helix', 'error'],
  ['chords that make facets', 'lines-only', { 'words.arcs.chord-tolerance': 0.0011 }, 'words.arcs.chord-tolerance', 'error'],
  ['a mismatch limit that rounding breaks', 'bench-mill', { 'words.arcs.miss-absolute.mm': 0.001, 'words.numbers.length-decimals.mm': 3 }, 'words.arcs.miss-absolute.mm', 'error'],
  ['a mismatch limit that some arcs break', 'bench-mill', { 'words.numbers.length-decimals.mm': 3 }, 'words.arcs.miss-absolute.mm', 'warning'],
  ['the same in inches', 'inch-bench-mill', { 'words.numbers.length-decimals.inch': 4, 'words.arcs.shortest-chord': 0.05 }, 'words.arcs.miss-absolute.inch', 'warning'],
  ['arcs that may close to circles', 'bench-mill', { 'words.arcs.shortest-chord': 0.009, 'words.numbers.length-decimals.mm': 3 }, 'words.arcs.shortest-chord', 'error'],
  ['a radius of a few units', 'bench-mill', { 'words.arcs.smallest-radius': 0.002, 'words.numbers.length-decimals.mm': 3 }, 'words.arcs.smallest-radius', 'error'],
  ['half a mismatch rule', 'desk-three-axis', { 'words.arcs.miss-share': 0.001 }, 'words.arcs.miss-share', 'error'],
  ['a centre word that says the opposite', 'desk-four-axis', { 'words.arcs.centre': 'from-zero' }, 'words.arcs.centre-word', 'error'],
  ['centres from zero with words left out', 'din-66025', { 'words.arcs.zero-words': 'omit' }, 'words.arcs.zero-words', 'error'],
  ['long arcs in radius form', 'din-66025', { 'words.arcs.centre': 'radius' }, 'words.arcs.longest-sweep', 'error'],
  ['whole circles in radius form', 'desk-three-axis', { 'words.arcs.centre': 'radius', 'words.arcs.longest-sweep': 120 }, 'words.arcs.whole-circle', 'error'],
  ['whole circles without end words', 'desk-three-axis', { 'words.arcs.end-words': 'changed' }, 'words.arcs.end-words', 'error'],
  ['whole circles beyond the longest arc', 'desk-three-axis', { 'words.arcs.longest-sweep': 180 }, 'words.arcs.whole-circle', 'error'],
  ['a changer that is told nothing', 'bench-mill', { 'words.cutters.words': 'none' }, 'words.cutters.words', 'error'],
  ['words for a change that is never made', 'desk-three-axis', { 'words.cutters.words': 'T-and-M6' }, 'words.cutters.words', 'error'],
  ['a changer and a spindle by hand', 'bench-mill', { 'words.spindle.run': 'by-hand' }, 'words.spindle.run', 'error'],
  ['a changer without a way to the top', 'bench-mill', { 'words.positions.top': 'none' }, 'words.positions.top', 'error'],
  ['a changer without lengths', 'bench-mill', { 'words.cutters.length-offset': 'none', 'words.cutters.length-cancel': 'none' }, 'words.cutters.length-offset', 'error'],
  ['lengths with a T that is never written', 'din-66025', { 'words.cutters.length-offset': 'with-T' }, 'words.cutters.length-offset', 'error'],
  ['a length left to the next job', 'bench-mill', { 'words.cutters.length-cancel': 'none' }, 'words.cutters.length-cancel', 'error'],
  ['G49 without G43', 'din-66025', { 'words.cutters.length-cancel': 'G49-at-end' }, 'words.cutters.length-cancel', 'error'],
  ['no wait for the spindle', 'desk-three-axis', { 'words.spindle.spin-up-seconds': 0 }, 'words.spindle.spin-up-seconds', 'warning'],
  ['no word to wait with', 'desk-three-axis', { 'words.dwell.letter': 'none' }, 'words.dwell.letter', 'error'],
  ['a spindle that may turn backwards', 'desk-three-axis', { 'words.spindle.forward': 'M4' }, 'words.spindle.forward', 'warning'],
  ['a wait that is a move', 'desk-three-axis', { 'words.dwell.letter': 'X' }, 'words.dwell.letter', 'error'],
  ['a wait that is a speed', 'desk-three-axis', { 'words.dwell.letter': 'S' }, 'words.dwell.letter', 'error'],
  ['thousandths of a millisecond', 'machining-centre', { 'words.numbers.seconds-decimals': 2 }, 'words.numbers.seconds-decimals', 'warning'],
  ['a path word that moves', 'bench-mill', { 'words.path.finishing': 'G28' }, 'words.path.finishing', 'error'],
  ['G61 where it means rounding', 'din-66025', { 'words.path.finishing': 'G61' }, 'words.path.finishing', 'error'],
  ['finishing with rounded corners', 'bench-mill', { 'words.path.finishing': 'G64' }, 'words.path.finishing', 'error'],
  ['roughing that strays no one knows how far', 'bench-mill', { 'words.path.roughing-strays': 'none' }, 'words.path.roughing-strays', 'error'],
  ['roughing that strays through the allowance', 'bench-mill', { 'words.path.roughing-strays': 0.03 }, 'words.path.roughing-strays', 'error'],
  ['rounding that nothing puts out', 'bench-mill', { 'words.path.finishing': 'none' }, 'words.path.finishing', 'error'],
  ['G53 without its height', 'bench-mill', { 'words.positions.top-machine-z': 'none' }, 'words.positions.top-machine-z', 'error'],
  ['a top above the travel', 'bench-mill', { 'words.positions.top-machine-z': 5 }, 'words.positions.top-machine-z', 'error'],
  ['a top at the bottom', 'bench-mill', { 'words.positions.top-machine-z': -190 }, 'words.positions.top-machine-z', 'error'],
  ['a home of all axes', 'machining-centre', { 'words.positions.top': 'G28-all' }, 'words.positions.top', 'error'],
  ['cycles that return anywhere', 'bench-mill', { 'words.holes.return-word': 'none' }, 'words.holes.return-word', 'error'],
  ['half turns by the shortest way', 'desk-four-axis', { 'words.rotary.count': 'shortest-way', 'words.rotary.most-per-block': 180 }, 'words.rotary.most-per-block', 'error'],
  ['travel in inches', 'desk-three-axis', { 'limits.travel.x': [0, 8] }, 'limits.travel.x', 'error'],
  ['numbers smaller than the travel', 'bench-mill', { 'words.numbers.value-largest': 99.9999 }, 'words.numbers.value-largest', 'error'],
  ['slides of coarse steps', 'desk-three-axis', { 'limits.smallest-step': 0.025 }, 'limits.smallest-step', 'warning'],
  ['feeds turned round', 'desk-three-axis', { 'limits.feed-lowest': 900 }, 'limits.feed-lowest', 'error'],
  ['feeds faster than rapids', 'desk-three-axis', { 'limits.feed-highest': 1001 }, 'limits.feed-highest', 'error'],
  ['feeds that round to nothing', 'machining-centre', { 'limits.feed-lowest': 0.4 }, 'words.numbers.feed-decimals', 'error'],
  ['speeds turned round', 'desk-three-axis', { 'limits.spindle-lowest': 24000 }, 'limits.spindle-lowest', 'error'],
];

const seen = new Set<string>();

/** Words without figures: what is left of a message when numbers and words of the file are put in. */
function skeleton(message: string): string {
  return message.replaceAll(/\s+/g, ' ').slice(-30);
}

it.each(CASES)('%s (%s)', (_, of, changes, at, severity) => {
  const tree = Object.entries(changes).reduce<unknown>(
    (whole, [path, value]) => changed(whole, path.split('.'), value),
    treeOf(of),
  );
  const outcome = readTree(tree);
  const found = outcome.problems.find(
    (one) => one.severity === severity && one.at.kind === 'value' && one.at.path.join('.') === at,
  );
  expect(outcome.problems.map((one) => one.code).filter((code) => code !== 'machine.dangerous')).toEqual([]);
  expect(found?.message.length).toBeGreaterThan(40);
  expect(found?.hint?.length).toBeGreaterThan(5);
  expect(outcome.ok).toBe(!outcome.problems.some((one) => one.severity === 'error'));
  outcome.problems.forEach((one) => seen.add(skeleton(one.message)));
});

it.each(POSTS)('finds nothing dangerous in %s', (name) => {
  const outcome = readPost(name);
  expect(outcome.ok && checkMachine(outcome.value)).toEqual([]);
});

it('shows a danger at the line that says the value', () => {
  const text = 'like: bench-mill\n\nwords:\n  dwell:\n    letter: X\n';
  const outcome = readMachine('mine', 'mine.yaml', text, postText);
  expect(outcome.problems[0]?.at).toMatchObject({ file: 'mine.yaml', line: 5, column: 13 });
});

afterAll(() => {
  const folder = new URL('../../src/machine/', import.meta.url);
  const sources = readdirSync(folder).filter((file) => file.endsWith('-dangers.ts'));
  const calls = sources
    .map((file) => readFileSync(new URL(file, folder), 'utf8'))
    .flatMap((text) => text.match(/\b(danger|caution|missing)\(\s*['"`]/g) ?? []);
  expect(seen.size).toBeGreaterThanOrEqual(calls.length);
});
