/** Every sample on every machine file: written, proved, within the form error, in few tangent blocks, and read back as meant. */
import { describe, expect, it } from 'vitest';
import { FORM_ERROR, TANGENT } from '../src/base/tolerances.ts';
import { millimetresPer } from '../src/base/units.ts';
import type { CutResult } from '../src/cut.ts';
import { compareMotion } from '../src/flow/compare-motion.ts';
import type { Machine } from '../src/machine/machine.ts';
import type { SheetFacts } from '../src/report/facts.ts';
import { traceProgram } from '../src/prove/trace-program.ts';
import { cutText, MACHINES, onMachine, SAMPLES, sampleText } from './support/cut-text.ts';
import { blocksAPitch, breaksOf, isRootCorner } from './support/finishing-loop.ts';

/** Blocks a pitch of a finishing loop that a slow controller still reads in time: with arcs, and with lines only. */
const MOST_BLOCKS = { arcs: 16, lines: 40 };
/** A sample that a machine cannot make, with the code of the honest reason. None: all of them fit all machines. */
const REFUSED: Readonly<Record<string, string>> = {};

interface Study {
  readonly result: Pick<CutResult, 'exit' | 'problems'>;
  readonly verdict: string | undefined;
  readonly errors: readonly string[];
  readonly names: readonly string[];
  readonly machine: Machine;
  readonly figures: NonNullable<NonNullable<SheetFacts['proof']>['figures']>;
  readonly differences: readonly string[];
  readonly blocks: ReadonlyMap<string, number>;
  /** Breaks of the loop's heading that are no root corner, in words. */
  readonly strange: readonly string[];
  readonly corners: number;
  readonly teeth: number;
}

const studies = new Map<string, Study>();

/** What is asked of a pair, found once; the moves themselves are let go. */
function study(sample: string, machine: string): Study {
  const known = studies.get(`${sample} ${machine}`);
  if (known !== undefined) {
    return known;
  }
  const result = cutText(sample, onMachine(sampleText(sample), machine));
  const { facts } = result;
  if (facts?.proof?.figures === undefined) {
    throw new Error(result.problems.map(({ message }) => message).join('\n'));
  }
  const found = { ...studyPrograms(result, facts), ...studyLoop(facts) };
  studies.set(`${sample} ${machine}`, { ...found, figures: facts.proof.figures });
  return { ...found, figures: facts.proof.figures };
}

function studyPrograms(
  result: CutResult,
  facts: SheetFacts,
): Omit<Study, 'figures' | 'strange' | 'corners' | 'teeth'> {
  const { machine, proof } = facts;
  const runnable = result.files.filter(({ runnable: can }) => can);
  const programs = facts.programs.map(({ file }) => runnable.find(({ name }) => name === file));
  const traces = programs.map((program) => traceProgram(program?.name ?? '', program?.text ?? '', machine));
  const blocks = new Map<string, number>();
  traces.forEach((trace, i) => {
    for (const [place, count] of blocksAPitch(programs[i]?.text ?? '', trace.moves)) {
      blocks.set(`${trace.file}: ${place}`, count);
    }
  });
  return {
    result: { exit: result.exit, problems: result.problems },
    verdict: proof?.verdict,
    errors: errorsOf(result, facts),
    names: runnable.map(({ name }) => name),
    machine,
    differences: traces.flatMap((trace, i) =>
      compareMotion(facts.motions[i] ?? { steps: [] }, trace, machine).map(
        (line) => `${trace.file}: ${line}`,
      ),
    ),
    blocks,
  };
}

function errorsOf({ problems }: CutResult, { proof }: SheetFacts): readonly string[] {
  const said = [
    ...problems.map(({ code, severity, message }) => ({ code, severity, message, at: '' })),
    ...(proof?.findings ?? []).map((finding) => ({ ...finding, at: `${finding.file}:${finding.line} ` })),
  ];
  return said
    .filter(({ severity }) => severity === 'error')
    .map(({ at, code, message }) => `${at}${code} ${message}`);
}

function studyLoop({ motions, form, job }: SheetFacts): Pick<Study, 'strange' | 'corners' | 'teeth'> {
  const { teeth } = form.proportions;
  const breaks = motions.flatMap((motion) => breaksOf(motion, TANGENT));
  const radius = form.rootRadius + job.cuts.finishing.cutter.diameter / 2;
  const isCorner = (at: { x: number; y: number }): boolean => isRootCorner(at, radius, teeth);
  return {
    strange: breaks
      .filter((found) => !isCorner(found))
      .map(({ x, y, angle }) => `${((angle * 180) / Math.PI).toFixed(2)} degrees at ${x}, ${y}`),
    corners: breaks.filter(isCorner).length,
    teeth,
  };
}

const PAIRS = SAMPLES.flatMap((sample) => MACHINES.map((machine) => [sample, machine] as const));

describe.each(PAIRS)('%s on %s', { timeout: 60_000 }, (sample, machine) => {
  const reason = REFUSED[`${sample} ${machine}`];
  if (reason !== undefined) {
    it(`is refused: ${reason}`, () => {
      const result = cutText(sample, onMachine(sampleText(sample), machine));
      expect(result.exit).toBe(1);
      expect(result.problems.map(({ code }) => code)).toContain(reason);
      expect(result.files.filter(({ runnable }) => runnable)).toEqual([]);
    });
    return;
  }

  it('is written and proved', () => {
    const { result, verdict, errors, names } = study(sample, machine);
    expect(errors).toEqual([]);
    expect(verdict).toBe('pass');
    expect(result.exit).toBe(0);
    expect(names.filter((name) => name.includes('-walk'))).toHaveLength(1);
    expect(names.length).toBeGreaterThanOrEqual(2);
  });

  it('leaves flanks, bore and crossings within the form error and a unit of the last digit', () => {
    const { figures, machine: file } = study(sample, machine);
    const unit = millimetresPer(file.units) * 10 ** -file.words.numbers.lengthDecimals[file.units];
    const worst = Math.max(figures.flankGouge, figures.flankLeft, figures.boreError);
    expect(worst).toBeLessThanOrEqual(FORM_ERROR + unit);
    expect(Math.max(figures.crossingGouge, figures.crossingLeft)).toBeLessThanOrEqual(FORM_ERROR + unit);
    expect(figures.byDepth.length).toBeGreaterThan(1);
    for (const { flankGouge, flankLeft } of figures.byDepth) {
      expect(Math.max(flankGouge, flankLeft)).toBeLessThanOrEqual(FORM_ERROR + unit);
    }
  });

  it('takes few blocks a pitch in the finishing loop, counted in the text', () => {
    const { blocks, machine: file, teeth } = study(sample, machine);
    const most = file.words.arcs.planes === 'none' ? MOST_BLOCKS.lines : MOST_BLOCKS.arcs;
    expect(blocks.size).toBeGreaterThanOrEqual(teeth - 1);
    expect([...blocks].filter(([, count]) => count > most)).toEqual([]);
    expect(Math.min(...blocks.values())).toBeGreaterThan(3);
  });

  it('keeps the finishing loop tangent but at the corners of the root', () => {
    const { strange, corners, teeth, machine: file } = study(sample, machine);
    if (file.words.arcs.planes !== 'none') {
      expect(strange.slice(0, 5)).toEqual([]);
    }
    expect(corners).toBeGreaterThanOrEqual(teeth - 1);
  });

  it('is read back as it was meant', () => {
    expect(study(sample, machine).differences).toEqual([]);
  });
});
