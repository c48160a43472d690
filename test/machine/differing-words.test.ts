/** One and the same motion in the words of every machine file: any two texts differ in many words. */
import { expect, it } from 'vitest';
import { postMotions } from '../../src/post/post-motions.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { headerFacts } from '../support/header-facts.ts';
import { postMachine } from '../support/post-machines.ts';
import { POSTS } from './read-posts.ts';

const LEAST = 8;

/** Every motion of the trial that needs no change of cutters, so that all machines can write all of them. */
const motions = postMotions(postMachine('desk-three-axis')).map((one) => one.motion);

/** The words of a text, block numbers and comments left out; the comment's mark counts as a word. */
function wordsOf(name: string): ReadonlySet<string> {
  const machine = postMachine(name);
  const texts = motions.map((motion, i) => {
    const written = writeProgram({
      machine,
      name: 'trial',
      suffix: `-${i}`,
      label: 1,
      motion,
      header: headerFacts(motion),
    });
    return written.ok ? written.value.text : expect.fail(written.problems.map((one) => one.message).join());
  });
  const code = texts
    .join('\n')
    .replaceAll(/\([^)]*\)/g, '( ')
    .replaceAll(/;.*$/gm, '; ')
    .replaceAll(/\bN\d+/g, '');
  return new Set(code.match(/[A-Z][-+]?[\d.]+|[%(;]/g));
}

const pairs = POSTS.flatMap((one, i) => POSTS.slice(i + 1).map((other) => [one, other] as const));

it.each(pairs)('%s and %s', (one, other) => {
  const words = [wordsOf(one), wordsOf(other)] as const;
  const onlyIn = (a: ReadonlySet<string>, b: ReadonlySet<string>): readonly string[] =>
    [...a].filter((w) => !b.has(w));
  expect(onlyIn(words[0], words[1]).length).toBeGreaterThanOrEqual(LEAST);
  expect(onlyIn(words[1], words[0]).length).toBeGreaterThanOrEqual(LEAST);
});

/** Words that are no figures: codes, letters of time and length, marks. Different numbers are not a different language. */
it.each(pairs)('%s and %s, figures of moves left out', (one, other) => {
  const codes = (name: string): ReadonlySet<string> =>
    new Set([...wordsOf(name)].filter((word) => !/^[XYZIJF]/.test(word)));
  const [a, b] = [codes(one), codes(other)];
  const differing =
    [...a].filter((word) => !b.has(word)).length + [...b].filter((word) => !a.has(word)).length;
  expect(differing).toBeGreaterThanOrEqual(LEAST);
});
