import { describe, expect, it } from 'vitest';
import { drawPlate } from '../../src/report/draw-plate.ts';
import type { SheetFacts } from '../../src/report/facts.ts';
import { sheetHtml } from '../../src/report/sheet.ts';
import { SHEET_STYLE } from '../../src/report/sheet-style.ts';
import { summaryOf } from '../../src/report/summary.ts';
import { factsOf, fileOf, runOf, tooLargeCutter } from '../support/sheets.ts';

const facts = factsOf('third-wheel');
const html = sheetHtml(facts);

const HOSTILE = `</title><script>alert(1)</script><img src=x onerror=alert(2)> "'&lt; </svg></style><h1>`;

function hostile(): SheetFacts {
  return {
    ...facts,
    machine: { ...facts.machine, name: HOSTILE },
    version: HOSTILE,
    job: {
      ...facts.job,
      title: HOSTILE,
      name: HOSTILE,
      derived: { [HOSTILE]: { value: HOSTILE, why: HOSTILE } },
    },
    programs: facts.programs.map((program) => ({ ...program, file: HOSTILE })),
    walkFile: HOSTILE,
    again: HOSTILE,
    cautions: [HOSTILE],
    problems: [
      {
        code: 'job.conflict',
        severity: 'warning',
        message: HOSTILE,
        hint: HOSTILE,
        at: { kind: 'file', file: HOSTILE },
      },
    ],
    passes: facts.passes.map((pass) => ({ ...pass, name: HOSTILE, why: [HOSTILE] })),
    paths: facts.paths.map((path) => ({ ...path, pass: HOSTILE })),
    reach: facts.reach === undefined ? facts.reach : { ...facts.reach, remarks: [HOSTILE] },
  } as SheetFacts;
}

/** Names of the elements of a text, as a browser would see them, and its text and attributes. */
function elementsOf(text: string): string[] {
  return [...text.replace(/<style>[\s\S]*?<\/style>/g, '').matchAll(/<([a-zA-Z][a-zA-Z0-9]*)/g)].map(
    ([, name = '']) => name,
  );
}

describe('the page', () => {
  it('forbids scripts and every request, and makes none', () => {
    expect(html).toMatch(/http-equiv="Content-Security-Policy" content="default-src 'none';/);
    expect(html).not.toMatch(/<script|<link|<iframe|<object|<img|@import|\son[a-z]+=|javascript:/i);
    const addresses = html
      .replaceAll('xmlns="http://www.w3.org/2000/svg"', '')
      .match(/(?:https?:)?\/\/[a-z0-9]/gi);
    expect(addresses).toBeNull();
    expect([...html.matchAll(/(?:href|src)="([^"]*)"/g)].every(([, to]) => to?.startsWith('#'))).toBe(true);
    expect([...html.matchAll(/url\(([^)]*)\)/g)].every(([, to]) => to?.startsWith('#'))).toBe(true);
  });

  it('stays under 600 kB, its drawing too', () => {
    expect(Buffer.byteLength(html)).toBeLessThan(600_000);
    expect(Buffer.byteLength(drawPlate(facts))).toBeLessThan(600_000);
  });

  it('says its language, has one h1, named pictures and heads of columns with their scope', () => {
    expect(html).toContain('<html lang="en">');
    expect(html.match(/<h1>/g)?.length).toBe(1);
    const pictures = html.match(/<svg[^>]*>/g) ?? [];
    expect(pictures.length).toBe(5);
    expect(pictures.every((tag) => /role="img" aria-label="[^"]+"/.test(tag))).toBe(true);
    expect((html.match(/<th[ >][^>]*/g) ?? []).every((tag) => /scope="(?:col|row)"/.test(tag))).toBe(true);
    expect(html.match(/<figcaption>/g)?.length).toBe(pictures.length);
  });

  it('names nothing twice, and points at nothing that is not there', () => {
    const ids = [...html.matchAll(/\sid="([^"]*)"/g)].map(([, id]) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const [, id] of html
      .replace(/<style>[\s\S]*?<\/style>/, '')
      .matchAll(/(?:href="#|url\(#)([^")]*)/g)) {
      expect(ids).toContain(id);
    }
    const drawing = drawPlate(facts);
    for (const [, id] of drawing
      .replace(/<style>[\s\S]*?<\/style>/, '')
      .matchAll(/(?:href="#|url\(#)([^")]*)/g)) {
      expect(drawing).toContain(`id="${id}"`);
    }
  });

  it('closes every element it opens', () => {
    const VOID = ['meta', 'br'];
    const open: string[] = [];
    for (const [, slash, name = '', self] of html
      .replace(/<style>[\s\S]*?<\/style>|<!doctype html>/g, '')
      .matchAll(/<(\/?)([a-zA-Z0-9]+)[^>]*?(\/?)>/g)) {
      if (slash === '/') {
        expect(open.pop()).toBe(name);
      } else if (self !== '/' && !VOID.includes(name)) {
        open.push(name);
      }
    }
    expect(open).toEqual([]);
  });

  it('is the same for the same input, to the byte', () => {
    expect(sheetHtml(factsOf('third-wheel'))).toBe(html);
    expect(html).not.toMatch(/NaN|undefined|Infinity|\[object/);
  });

  it('keeps plates, figures of a row and short tables on one page of A4', () => {
    expect(SHEET_STYLE).toMatch(/@page\{size:A4/);
    expect(SHEET_STYLE).toMatch(/figure\{[^}]*break-inside:avoid/);
    expect(SHEET_STYLE).toMatch(/tr\{break-inside:avoid\}/);
    expect(SHEET_STYLE).toMatch(/\.pair\{[^}]*break-inside:avoid/);
  });

  it('"Two cutters" over a table of three rows: says how often they are fitted', () => {
    expect(html).toContain('Two, fitted three times in the order of the table below');
    expect((html.match(/<td>cutter \d+<\/td>/g) ?? []).length).toBe(3);
    expect(sheetHtml(factsOf('great-wheel'))).toContain('Two, by the table below in the order they are used');
  });

  it('lets whoever has only a keyboard scroll a wide table', () => {
    const frames = html.match(/<div class="scroll[^>]*>/g) ?? [];
    expect(frames.length).toBeGreaterThan(3);
    expect(frames.every((tag) => /tabindex="0" role="region" aria-label="[^"]+"/.test(tag))).toBe(true);
  });
});

/** Relative luminance and contrast [WCAG 2.2, definitions of "relative luminance" and "contrast ratio"]. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((i) => {
    const share = Number.parseInt(hex.slice(i, i + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

it.each(['ink', 'soft', 'danger'])(
  '%s can be read on paper: contrast of 4.5 or more [WCAG 2.2, 1.4.3]',
  (name) => {
    const colour = (key: string): string =>
      new RegExp(`--${key}:(#[0-9a-f]{6})`).exec(SHEET_STYLE)?.[1] ?? '';
    const [a, b] = [luminance(colour('paper')), luminance(colour(name))].toSorted((x, y) => y - x) as [
      number,
      number,
    ];
    expect((a + 0.05) / (b + 0.05)).toBeGreaterThanOrEqual(4.5);
  },
);

describe('a user text stays text', () => {
  it.each([
    ['the page', sheetHtml(hostile())],
    ['the drawing', drawPlate(hostile())],
  ])('in %s: no element more than before', (_, text) => {
    const plain = text.startsWith('<!doctype') ? html : drawPlate(facts);
    const known = new Set(elementsOf(plain));
    expect(elementsOf(text).filter((name) => !known.has(name) && name !== 'use')).toEqual([]);
    expect(text).not.toContain('<script');
    expect(text).not.toContain('onerror=alert(2)>');
    expect(text.match(/<h1>/g)?.length).toBe(plain.match(/<h1>/g)?.length);
    expect(text).toContain('&lt;script&gt;');
  });
});

describe('a refused job', () => {
  const refused = runOf('third-wheel', tooLargeCutter);
  const page = fileOf(refused, '.html');

  it('says why, names no program and gives no set-up', () => {
    expect(refused.exit).toBe(1);
    const reason = refused.problems.find(({ severity }) => severity === 'error')?.message ?? 'none';
    expect(page).toContain('Why it was refused');
    expect(page.replaceAll('&#39;', "'")).toContain(reason.slice(1));
    expect(page).toContain('class="verdict danger"');
    expect(page).not.toContain('third-wheel-1.nc');
    expect(page).not.toContain('third-wheel-walk.nc');
    expect(page).not.toContain('<h2>Set-up</h2>');
    expect(refused.files.some(({ runnable }) => runnable)).toBe(false);
  });

  it('has no figure in its summary that was never reckoned', () => {
    const summary = JSON.parse(fileOf(refused, '.json'));
    expect(summary.verdict).toBe('refuse');
    expect(summary.programs).toEqual([]);
    expect(summary.proof.passed).toBe(false);
    expect(summary.proof.flankGouge).toBeNull();
    expect(summary.proof.notChecked.length).toBeGreaterThan(0);
    expect(summary.proof.findings.some(({ severity }: { severity: string }) => severity === 'error')).toBe(
      true,
    );
  });
});

it('rings in red the place where a program failed its proof, and shows no program of it', () => {
  if (facts.proof === undefined) {
    throw new Error('no proof');
  }
  const failed: SheetFacts = {
    ...facts,
    verdict: 'refuse',
    programs: [],
    proof: {
      ...facts.proof,
      verdict: 'refuse',
      findings: [
        {
          code: 'prove.gouge',
          severity: 'error',
          message: 'too deep by 0.02 mm',
          file: 'a.nc',
          line: 12,
          x: 3,
          y: 4,
        },
      ],
    },
  };
  const page = sheetHtml(failed);
  expect(page).toMatch(/class="danger-ring"[^>]*cx="3" cy="4"/);
  expect(page).toContain('a.nc, line 12:');
  expect(page).toContain('Too deep by 0.02 mm.');
  expect(page).not.toContain('third-wheel-1.nc');
  expect(page).toContain('Passes that were planned');
});

describe('the summary', () => {
  const summary = summaryOf(facts) as {
    part: Record<string, number>;
    programs: { file: string; bytes: number; sha256: string; cutters: { diameter: number }[] }[];
    proof: Record<string, unknown>;
    reach: Record<string, number>;
  };

  it('has the figures of the wheel in millimetres [60 teeth, module 0.5: pitch radius 15, dedendum 1.5708 modules, thickness half the pitch]', () => {
    expect(summary.part).toMatchObject({
      kind: 'wheel',
      teeth: 60,
      module: 0.5,
      pitchRadius: 15,
      thickness: 1.5,
      bore: 4,
    });
    expect(summary.part['rootRadius']).toBeCloseTo(15 - 0.5 * 1.5708, 5);
    expect(summary.part['toothThickness']).toBeCloseTo((Math.PI * 0.5) / 2, 5);
    expect((summary.part['outsideRadius'] ?? 0) - 15).toBeCloseTo(summary.part['addendum'] ?? 0, 5);
  });

  it('gives each program as it was written', () => {
    const { files } = runOf('third-wheel');
    for (const program of summary.programs) {
      const text = files.find(({ name }) => name === program.file)?.text ?? '';
      expect(program.bytes).toBe(Buffer.byteLength(text));
      expect(program.cutters.every(({ diameter }) => diameter > 0)).toBe(true);
    }
    expect(summary.programs.length).toBeGreaterThan(0);
  });

  it('gives the figures of the proof', () => {
    const figures = facts.proof?.figures;
    expect(summary.proof['passed']).toBe(true);
    expect(summary.proof['flankGouge']).toBeCloseTo(figures?.flankGouge ?? -1, 6);
    expect(summary.proof['flankLeft']).toBeCloseTo(figures?.flankLeft ?? -1, 6);
    expect(summary.proof['leftAtRoot']).toBeCloseTo(figures?.leftAtRoot ?? -1, 6);
    expect(summary.reach['leftAtRoot']).toBeCloseTo(figures?.leftAtRoot ?? -1, 3);
  });
});
