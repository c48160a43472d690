/** What README says is tried: its examples are cut, and what it shows is what is printed. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse, stringify } from 'yaml';
import { afterAll, describe, expect, it } from 'vitest';
import { newJob } from '../src/job/new-job.ts';
import { cutText } from './support/cut-text.ts';
import { newFolder, ogive, removeFolders, ROOT } from './support/run-command.ts';

const README = readFileSync(join(ROOT, 'README.md'), 'utf8');
const EXAMPLES = [...README.matchAll(/```yaml\n([\s\S]*?)```/g)].map(([, text = '']) => text);
const CUTTERS = EXAMPLES.find((text) => text.startsWith('format: ogive-cutters/1')) ?? '';

afterAll(removeFolders);

/** The starter with groups of its own replaced, as README tells a person to. */
function starterWith(example: string): string {
  return stringify({ ...(parse(newJob()) as object), ...(parse(example) as object) });
}

function cut(job: string): ReturnType<typeof cutText> {
  return cutText('my-wheel', job, 'golden', { cutters: CUTTERS });
}

describe('the examples of README', () => {
  it('are four jobs and a file of cutters', () => {
    expect(EXAMPLES.length).toBe(4);
    expect(CUTTERS).not.toBe('');
  });

  it.each(EXAMPLES.filter((text) => text !== CUTTERS).map((text) => [text.split('\n')[0], text]))(
    'the starter with %s is cut and proved',
    (_, example = '') => {
      const result = cut(starterWith(example));
      expect(result.problems.filter(({ severity }) => severity === 'error')).toEqual([]);
      expect(result.exit).toBe(0);
    },
  );

  it('centres alone give the module that it says', () => {
    expect(README).toContain('it follows, here 0.5 mm');
    const example = EXAMPLES.find((text) => text.includes('centres: 17.0')) ?? '';
    expect(cut(starterWith(example)).facts?.form.proportions.module).toBeCloseTo(0.5, 9);
  });

  it('what the slot taught is what is run, and the file of cutters says the same width', () => {
    const example = EXAMPLES.find((text) => text.startsWith('cutters:')) ?? '';
    const { facts } = cut(starterWith(example));
    const finishing = facts?.passes.find(({ name }) => name === 'finishing');
    expect(finishing).toMatchObject({ speed: 20000, feed: 200 });
    expect(facts?.job.cuts.finishing.cutter.diameter).toBe(0.512);
    const shared = cut(starterWith('cutters: my-cutters.yaml'));
    expect(shared.exit).toBe(0);
    expect(shared.facts?.job.cuts.finishing.cutter.diameter).toBe(0.512);
  });
});

describe('what README shows', { timeout: 60_000 }, () => {
  it('is what `npm start` prints, to the letter', () => {
    const folder = newFolder();
    const done = ogive(['cut', join(ROOT, 'samples/third-wheel.yaml'), '--out', 'out'], folder);
    expect(done.exit).toBe(0);
    const shown = /cuts `samples\/third-wheel\.yaml` into `out\/`:\n\n```\n([\s\S]*?)```/.exec(README)?.[1];
    expect(shown).toBe(done.out + done.err);
  });

  it('names commands that there are', () => {
    const named = [...README.matchAll(/ogive (--[a-z]+|[a-z]+)(?= |`|\n)/g)].map(([, name = '']) => name);
    const help = ogive(['--help'], ROOT).out;
    expect(named.length).toBeGreaterThan(5);
    expect(named.filter((name) => !help.includes(name))).toEqual([]);
  });

  it('has a row for every word of our own that the page and the programs use', () => {
    for (const word of [
      'reach',
      'flute',
      'skin',
      'spring pass',
      'climb',
      'lap',
      'bay',
      'mouth',
      'keep-out',
    ]) {
      expect(README).toContain(`\n| ${word} | `);
    }
  });
});
