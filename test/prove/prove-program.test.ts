/** The whole proof over a small program made from the exact outline's own parallels, good and spoiled. */
import { describe, expect, it } from 'vitest';
import { MM_PER_INCH } from '../../src/base/units.ts';
import { CHECK_CODES } from '../../src/prove/check-codes.ts';
import { goodLines } from '../support/good-program.ts';
import { edited, errorsOf, findingOf, GOOD, lineOf, prove } from '../support/damage.ts';

describe('a good program', () => {
  const proof = prove(GOOD);

  it('passes, and raises nothing at all', () => {
    expect(proof.findings).toEqual([]);
    expect(proof.verdict).toBe('pass');
  });

  it('has figures within the form error and the last digit', () => {
    const figures = proof.figures!;
    expect(figures.flankGouge).toBeLessThan(0.0011);
    expect(figures.flankLeft).toBeLessThan(0.0011);
    expect(figures.boreError).toBeLessThan(0.0011);
    expect(figures.byDepth.length).toBeGreaterThanOrEqual(3);
  });

  it('still says what was not checked', () => {
    expect(proof.notChecked.join('\n')).toMatch(/runout/);
    expect(proof.notChecked.join('\n')).toMatch(/zero-at/);
  });

  it('says how far it reaches [by construction: tip radius + cutter radius + allowance]', () => {
    expect(proof.extents.z).toEqual([-1.1, 5]);
    expect(proof.extents.x[1]).toBeCloseTo(-proof.extents.x[0], 3);
  });
});

describe('a finishing path out of place', () => {
  const from = lineOf('(FINISHING)');

  it('fails when every block of it is shifted by 3 um along X in its text', () => {
    const shifted = GOOD.map((line, k) => (k > from ? shift(line, 'X', 0.003) : line));
    const proof = prove(shifted);
    expect(proof.verdict).toBe('refuse');
    expect(errorsOf(proof)).toContain('prove.gouge');
    expect(proof.figures!.flankGouge).toBeGreaterThan(0.0028);
    expect(proof.figures!.flankGouge).toBeLessThan(0.0033);
  });

  it('fails when every block of it is shifted by 3 um along Y in its text', () => {
    expect(errorsOf(prove(GOOD.map((line, k) => (k > from ? shift(line, 'Y', 0.003) : line))))).toContain(
      'prove.gouge',
    );
  });

  it('names the line where it cuts in deepest', () => {
    const flank = GOOD.findIndex((line, k) => k > from + 2 && line.startsWith('G1'));
    const proof = prove(edited(flank + 1, 0, 'G91 G1 Y0.01', 'G1 Y-0.01', 'G90'));
    expect(findingOf(proof, 'prove.gouge').line).toBe(flank + 2);
    expect(proof.figures!.flankGouge).toBeGreaterThan(0.009);
  });

  it('passes when shifted by less than the form error allows', () => {
    const shifted = GOOD.map((line, k) => (k > from ? shift(line, 'X', 0.0005) : line));
    expect(errorsOf(prove(shifted))).toEqual([]);
  });
});

describe('a cutter off its size', () => {
  it('leaves metal, where the path was made for a larger one [by construction: 4 um on the radius]', () => {
    const proof = prove(goodLines({ parts: 8, error: 0.004 }));
    expect(errorsOf(proof)).toEqual(['prove.left', 'prove.root']);
    expect(proof.figures!.flankLeft).toBeGreaterThan(0.0038);
    expect(proof.figures!.flankLeft).toBeLessThan(0.0043);
  });

  it('cuts in, where the path was made for a smaller one', () => {
    expect(errorsOf(prove(goodLines({ parts: 8, error: -0.004 })))).toEqual(['prove.gouge']);
  });
});

describe('a wheel in inches', () => {
  it('is held to the same curve', () => {
    const lines = GOOD.map((line) => (line.startsWith('G21') ? line.replace('G21', 'G20') : toInches(line)));
    const proof = prove(lines);
    expect(proof.figures!.flankGouge).toBeLessThan(0.0011);
    expect(proof.verdict).toBe('pass');
  });
});

describe('the list of checks', () => {
  it('says of each what it guards against and what it cannot see', () => {
    for (const [code, text] of Object.entries(CHECK_CODES)) {
      expect(code).toMatch(/^prove\.[a-z-]+$/);
      expect(text.guards.length).toBeGreaterThan(10);
      expect(text.blind.length).toBeGreaterThan(10);
    }
  });
});

function shift(line: string, letter: string, by: number): string {
  return line.startsWith('(')
    ? line
    : line.replace(
        new RegExp(`${letter}(-?[\\d.]+)`),
        (_, value: string) => `${letter}${(Number(value) + by).toFixed(4)}`,
      );
}

function toInches(line: string): string {
  return line.startsWith('(') || line.startsWith('G53')
    ? line
    : line.replace(
        /([XYZIJF])(-?[\d.]+)/g,
        (_, letter: string, value: string) => `${letter}${(Number(value) / MM_PER_INCH).toFixed(6)}`,
      );
}
