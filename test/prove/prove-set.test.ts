/** Several programs at once, as somebody names them: what is missing, what only walks round, what was not checked. */
import { describe, expect, it } from 'vitest';
import { proveSet } from '../../src/prove/prove-set.ts';
import { proveProgram } from '../../src/prove/prove-program.ts';
import { goodInput } from '../support/good-program.ts';
import { errorsOf, findingOf, GOOD, lineOf } from '../support/damage.ts';

const roughing = lineOf('(ROUGHING)');
const end = lineOf('M5');
const head = GOOD.slice(0, lineOf('(BORE)'));
const tail = GOOD.slice(end);
const named = (number: number): string[] =>
  head.toSpliced(1, 0, `(Cutting program, number ${String(number)} of 2)`);
/** The good program in two: the bore, and the teeth. */
const one = [...named(1), ...GOOD.slice(lineOf('(BORE)'), roughing), ...tail];
const two = [...named(2), ...GOOD.slice(roughing, end), ...tail];
const walk = [...head.filter((line) => !/^(S12000|M3|G4 )/.test(line)), 'G0 X9 Y9', 'Z5', 'X-9', ...tail];

const set = (...programs: readonly (readonly string[])[]) => ({
  ...goodInput(GOOD),
  programs: programs.map((lines, k) => ({ file: `${String(k + 1)}.ngc`, text: lines.join('\n') })),
});

describe('programs of one job', () => {
  it('pass together', () => {
    const { proof, cutting, walks } = proveSet(set(one, two));
    expect(proof.findings).toEqual([]);
    expect([proof.verdict, cutting, walks]).toEqual(['pass', 2, 0]);
  });

  it('blame what is missing first, and no flank or bore that it would have cut', () => {
    const { proof } = proveSet(set(two));
    expect(proof.findings[0]).toMatchObject({ code: 'prove.missing', line: 2 });
    expect(proof.findings[0]?.message).toBe(
      'of the 2 programs of this job number 1 is not here: nothing here cuts the bore',
    );
    expect(errorsOf(proof)).toEqual(['prove.missing']);
    expect(errorsOf(proveSet(set(one)).proof)).toEqual(['prove.missing']);
  });

  it('are still held to what they cut into while one is missing', () => {
    const shifted = two.map((line, k) =>
      k > two.indexOf('(FINISHING)')
        ? line.replace(/X(-?[\d.]+)/, (_, x: string) => `X${(Number(x) + 0.003).toFixed(4)}`)
        : line,
    );
    expect(errorsOf(proveSet(set(shifted)).proof)).toContain('prove.gouge');
  });

  it('say by the metal alone what none of them cuts', () => {
    const bare = two.filter((line) => !line.startsWith('(Cutting'));
    expect(findingOf(proveSet(set(bare)).proof, 'prove.missing').message).toBe('nothing here cuts the bore');
  });
});

describe('a walk-round among them', () => {
  it('is no part of the wheel, and counted once, by itself', () => {
    const { proof, cutting, walks } = proveSet(set(walk, one, two));
    expect(proof.findings).toEqual([]);
    expect([proof.verdict, cutting, walks]).toEqual(['pass', 2, 1]);
    expect(proof.figures).toBeDefined();
    expect(proof.extents.x[1]).toBe(9);
    const alone = proveSet(set(walk));
    expect([alone.proof.verdict, alone.cutting, alone.walks]).toEqual(['pass', 0, 1]);
    expect(alone.proof.figures).toBeUndefined();
    expect(proof.blocks).toBe(alone.proof.blocks + proveSet(set(one, two)).proof.blocks);
  });

  it("is refused where it names a height without its cutter's length, and goes sideways there", () => {
    const lost = walk.filter((line) => line !== 'G43 H1');
    expect(errorsOf(proveSet(set(lost)).proof)).toEqual(['prove.length-offset']);
  });

  it('is refused where it counts from another zero than the cuts', () => {
    const other = walk.map((line) => line.replace('G54', 'G55'));
    const { proof } = proveSet(set(other, one, two));
    expect([proof.verdict, ...errorsOf(proof)]).toEqual(['refuse', 'prove.work-offset']);
  });

  it('is refused for its own faults', () => {
    const low = walk.toSpliced(walk.indexOf('Z5'), 1, 'Z2');
    expect(proveSet(set(low, one, two)).proof.verdict).toBe('refuse');
  });

  it('is not what a program is that was to cut: one without any cut passes for none', () => {
    const proof = proveProgram(set(walk));
    expect(errorsOf(proof)).toContain('prove.missing');
  });
});

describe('what was not checked', () => {
  it('is said once for all of them', () => {
    const { notChecked } = proveSet(set(walk, one, two)).proof;
    const percent = notChecked.filter((line) => line.includes('second reader'));
    expect(percent).toHaveLength(1);
    expect(new Set(notChecked).size).toBe(notChecked.length);
  });
});
