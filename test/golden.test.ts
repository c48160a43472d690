/**
 * Golden files: what is promised to the byte, read by a person before it was accepted (`npm run golden`, then `git diff`).
 * Whole programs of small wheels (jobs in `golden/`) on every machine file; of each sample the head, a tooth, the end and the sum.
 */
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { CutResult } from '../src/cut.ts';
import { outlineSvg } from '../src/report/draw-outline.ts';
import { cutText, machineOf, MACHINES, onMachine, SAMPLES, sampleText, sumOf } from './support/cut-text.ts';
import { excerpt } from './support/excerpt.ts';

const FOLDER = join(import.meta.dirname, 'golden');
const JOBS = stored()
  .filter((name) => name.endsWith('.yaml'))
  .map((name) => name.slice(0, -'.yaml'.length));
/** The sample of README and of `npm start`. */
const SHOWN = 'third-wheel';

const written = new Set<string>(JOBS.map((name) => `${name}.yaml`));

function stored(): readonly string[] {
  return readdirSync(FOLDER)
    .filter((name) => !name.startsWith('.'))
    .toSorted();
}

/** All names are noted first, so that a difference in one file does not make the next look forgotten. */
async function expectGolden(files: Readonly<Record<string, string>>): Promise<void> {
  Object.keys(files).forEach((name) => written.add(name));
  for (const [name, text] of Object.entries(files)) {
    await expect(text).toMatchFileSnapshot(join(FOLDER, name));
  }
}

function programsOf({ files }: CutResult): CutResult['files'] {
  return files.filter(({ runnable }) => runnable);
}

describe.each(JOBS)('%s, whole', { timeout: 60_000 }, (job) => {
  const text = readFileSync(join(FOLDER, `${job}.yaml`), 'utf8');
  it.each(MACHINES)('as %s reads it', async (machine) => {
    const result = cutText(job, onMachine(text, machine));
    expect(result.problems.filter(({ severity }) => severity === 'error')).toEqual([]);
    expect(result.exit).toBe(0);
    await expectGolden(
      Object.fromEntries(
        programsOf(result).map(({ name, text: program }) => [
          `${job}.${machine}${name.slice(job.length)}`,
          program,
        ]),
      ),
    );
  });
});

describe('the samples', { timeout: 60_000 }, () => {
  it.each(SAMPLES)('%s: head, one tooth, end and sum of each program', async (sample) => {
    const text = sampleText(sample);
    const result = cutText(sample, text);
    expect(result.exit).toBe(0);
    const programs = programsOf(result).map((file) => excerpt(file.name, file.text, sumOf(file.text)));
    const verdict = `${sample} on ${machineOf(text)}: ${result.facts?.proof?.verdict ?? 'not proved'}`;
    await expectGolden({ [`${sample}.txt`]: [verdict, ...programs].join('\n\n') });
  });

  it(`${SHOWN}: the sums of what \`npm start\` writes, as sha256sum checks them`, async () => {
    const about = JSON.parse(readFileSync(join(import.meta.dirname, '../package.json'), 'utf8')) as {
      version: string;
    };
    const programs = programsOf(cutText(SHOWN, sampleText(SHOWN), about.version));
    expect(programs.length).toBeGreaterThan(1);
    const sums = programs.map(({ name, text }) => `${sumOf(text)}  ${name}\n`);
    await expectGolden({ [`${SHOWN}.sha256`]: sums.join('') });
  });

  it(`${SHOWN}: the picture of the sheet, and the drawing`, async () => {
    const { files, facts } = cutText(SHOWN, sampleText(SHOWN));
    const sheet = files.find(({ name }) => name === `${SHOWN}.svg`);
    if (facts === undefined) {
      throw new Error('the sample was not understood');
    }
    const { form, crossings, job } = facts;
    const drawing = outlineSvg({
      title: job.title,
      form,
      sector: form.sector,
      ...(crossings === undefined ? {} : { crossings }),
      bore: job.wheel.bore,
      thickness: job.wheel.thickness,
      unit: job.length,
      what: 'the exact outline',
    });
    await expectGolden({ [`${SHOWN}.svg`]: sheet?.text ?? '', [`${SHOWN}-outline.svg`]: drawing });
  });
});

it('keeps no golden file that nothing writes any more', () => {
  expect(stored().filter((name) => !written.has(name))).toEqual([]);
});
