/** A title without a letter that the controller has left programs without a name. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { showProblem } from '../../src/base/show-problem.ts';
import { cutText } from '../support/cut-text.ts';

const TEXT = readFileSync(join(import.meta.dirname, '../golden/small-wheel.yaml'), 'utf8');

function titled(title: string, name = 'small-wheel') {
  const made = cutText(name, TEXT.replace(/^title: .*$/m, `title: ${title}`));
  const head = made.files.find(({ runnable }) => runnable)?.text.split('\n')[0];
  return { exit: made.exit, words: made.problems.map(showProblem), head };
}

describe('a title that no program can be headed with', () => {
  it.each(['"\u6642\u8a08"', '"()"', '"\\u200b"', '"   "'])(
    '%s: the name of the file stands there',
    (title) => {
      const { exit, words, head } = titled(title);
      expect([exit, head]).toEqual([0, '(TITLE: SMALL-WHEEL)']);
      expect(words).toEqual([
        'small-wheel.yaml:3:8 title: warning: none of its letters can be written for desk-three-axis: its programs are headed "small-wheel" instead.\n' +
          '  Give a title in plain letters; the sheet keeps this one.',
      ]);
    },
  );
  it('nor the name of the file: then what it is', () => {
    expect(titled('"\u6642\u8a08"', '\u8f2a').head).toBe('(TITLE: WHEEL OF 7 TEETH)');
  });
  it('what can be written of a title is', () => {
    expect(titled('"\u6642 R\u00e4der"')).toEqual({ exit: 0, words: [], head: '(TITLE: RAEDER)' });
  });
});
