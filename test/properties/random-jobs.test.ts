/**
 * Random jobs, as people would write them: most are written, none of those gouges or stays unread, and every refusal is borne out
 * by an independent test of fit. OGIVE_RUNS asks for more of them, OGIVE_SEED for others, OGIVE_SHRINK for the smallest that shows a fault.
 */
import * as fc from 'fast-check';
import { expect, it } from 'vitest';
import type { CutResult } from '../../src/cut.ts';
import { cutText } from '../support/cut-text.ts';
import { reasonsAgainst } from '../support/fits.ts';
import { lookAtProgram, type Look } from '../support/look-at-program.ts';
import { jobText, randomJob, type RandomJob } from '../support/random-job.ts';

const SEED = Number(process.env['OGIVE_SEED'] ?? 60);
const RUNS = Number(process.env['OGIVE_RUNS'] ?? 14);
/** Wheels of more teeth take seconds each: they are left to whoever asks for a number of runs. */
const TEETH = process.env['OGIVE_RUNS'] === undefined ? 96 : 400;
const SHARE = 0.7;
/** A thousandth of a mm, a unit of the last digit (five decimals of an inch), and the look's own sampling. */
const MOST = 0.001 + 0.000254 + 0.0001;

interface Fate {
  readonly written: boolean;
  readonly code: string;
  readonly wrong: readonly string[];
  readonly look?: Look;
}

function fateOf(job: RandomJob): Fate {
  let result: CutResult;
  try {
    result = cutText('random', jobText(job));
  } catch (fault) {
    return {
      written: false,
      code: 'crash',
      wrong: [`crash: ${String(fault instanceof Error ? fault.stack : fault)}`],
    };
  }
  return result.exit === 0 ? written(job, result) : refused(job, result);
}

function written(job: RandomJob, { facts, files }: CutResult): Fate {
  const figures = facts?.proof?.figures;
  if (figures === undefined || facts === undefined) {
    return { written: true, code: '', wrong: ['written without a proof'] };
  }
  const skin = job.holding === 'skin' ? job.skin : 0;
  const topZ = job.zero === 'plate' ? job.thickness + skin : 0;
  const look = lookAtProgram({
    wheel: job,
    texts: files.filter(({ runnable, name }) => runnable && !name.includes('-walk')).map(({ text }) => text),
    absoluteCentres: job.machine === 'din-66025',
    diameters: facts.programs
      .flatMap(({ cutters }) => cutters.map((number) => job.cutters[number - 1]))
      .map((cutter) => cutter?.cuts ?? cutter?.diameter ?? 0),
    finishing: facts.job.cuts.finishing.cutter.diameter,
    topZ,
    bottomZ: topZ - job.thickness - (skin > 0 ? 0 : (job.below ?? 0.1)),
    rim: job.module * (job.teeth / 2 - job.dedendum),
  });
  const wrong = [
    ...over('gouge by the proof', figures.flankGouge),
    ...over('left by the proof', figures.flankLeft),
    ...over('gouge by the look', look.gouge),
    ...over('left by the look', look.left),
    ...(look.samples === 0 ? ['the look saw no cut on the teeth'] : []),
  ];
  return { written: true, code: '', wrong, look };
}

function over(what: string, value: number): readonly string[] {
  return value <= MOST ? [] : [`${what}: ${value.toFixed(5)} mm`];
}

function refused(job: RandomJob, { problems, facts }: CutResult): Fate {
  const reasons = reasonsAgainst(job);
  const errors = problems.filter(({ severity }) => severity === 'error');
  const findings = facts?.proof?.findings.filter(({ severity }) => severity === 'error') ?? [];
  const unconfirmed = errors.filter(({ at }) => {
    const place = at.kind === 'value' ? at.path.join('.') : '';
    return !reasons.some(({ bears }) => bears.some((path) => place.startsWith(path)));
  });
  const wrong = [
    ...unconfirmed.map(
      ({ code, message, at }) =>
        `refused without reason: ${code} ${at.kind === 'value' ? at.path.join('.') : ''} ${message}`,
    ),
    ...findings
      .slice(0, 3)
      .map(
        ({ code, message, line }) =>
          `the proof refuses our own program: ${code} ${message} (line ${String(line)})`,
      ),
    ...(errors.length + findings.length === 0 ? ['refused without a word'] : []),
  ];
  return { written: false, code: errors[0]?.code ?? findings[0]?.code ?? 'none', wrong };
}

it(`random jobs are written true or refused for a reason (seed ${String(SEED)})`, () => {
  const fates: Fate[] = [];
  const faults: string[] = [];
  for (const job of fc.sample(randomJob(TEETH), { seed: SEED, numRuns: RUNS })) {
    const fate = fateOf(job);
    fates.push(fate);
    if (fate.wrong.length > 0) {
      faults.push(`${fate.wrong.join('\n')}\n${jobText(job)}`);
    }
  }
  report(fates, faults);
  if (faults.length > 0 && process.env['OGIVE_SHRINK'] !== undefined) {
    console.log(smallestFault());
  }
  expect(faults).toEqual([]);
  const share = fates.filter((fate) => fate.written).length / fates.length;
  expect(share).toBeGreaterThanOrEqual(SHARE);
}, 7_200_000);

/** The smallest job of those that shrinking finds in as many seconds as OGIVE_SHRINK says. */
function smallestFault(): string {
  const property = fc.property(randomJob(TEETH), (job) => fateOf(job).wrong.length === 0);
  const seconds = Number(process.env['OGIVE_SHRINK']);
  const { counterexample } = fc.check(property, {
    seed: SEED,
    numRuns: RUNS,
    interruptAfterTimeLimit: 1000 * seconds,
  });
  const job = counterexample?.[0];
  return job === undefined
    ? 'nothing smaller in this time'
    : `the smallest:\n${fateOf(job).wrong.join('\n')}\n${jobText(job)}`;
}

function report(fates: readonly Fate[], faults: readonly string[]): void {
  if (process.env['OGIVE_RUNS'] === undefined) {
    return;
  }
  const count = fates.filter((fate) => fate.written).length;
  const codes = new Map<string, number>();
  fates.filter((fate) => !fate.written).forEach(({ code }) => codes.set(code, (codes.get(code) ?? 0) + 1));
  const most = (figure: (look: Look) => number): string =>
    Math.max(0, ...fates.flatMap(({ look }) => (look === undefined ? [] : [figure(look)]))).toFixed(5);
  console.log(
    [
      `${String(count)} of ${String(fates.length)} written (${((100 * count) / fates.length).toFixed(1)} %)`,
      ...[...codes].map(([code, times]) => `  refused ${code}: ${String(times)}`),
      `worst gouge ${most(({ gouge }) => gouge)} mm, left ${most(({ left }) => left)} mm, by an independent look`,
      `faults: ${String(faults.length)}`,
      ...faults,
    ].join('\n'),
  );
}
