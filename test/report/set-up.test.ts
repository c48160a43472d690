import { describe, expect, it } from 'vitest';
import { sheetHtml } from '../../src/report/sheet.ts';
import type { SheetFacts } from '../../src/report/facts.ts';
import { attributeOf, elementOf, textsOf } from '../support/svg-read.ts';
import { factsOf, runOf } from '../support/sheets.ts';

const facts = factsOf('third-wheel');

function wordsOf(html: string): string {
  return html
    .replace(/<[^>]*>/g, '')
    .replaceAll('\u00a0', ' ')
    .replaceAll('\u2212', '-')
    .replace(/\s+/g, ' ');
}

function setUpOf(page: string): string {
  return page.slice(page.indexOf('<h2>Set-up</h2>'), page.indexOf('<h2>Programs and passes</h2>'));
}

const page = sheetHtml(facts);
const setUp = wordsOf(setUpOf(page));

describe('the set-up', () => {
  it.each([
    ['the blank, its material and its hold', /Sheet 44 mm by 44 mm.*leaded brass.*Glued flat/],
    ['zero, and how it is touched off', /X0 and Y0 are the axis.*Z0 is the top of the blank, touched off/],
    ['where zero is found again', /edges of the sheet lie at X -22 mm and Y -22 mm/],
    ['where to park', /Park at X -22\.000 mm \(-0\.8661 in\), Y 22\.000 mm \(0\.8661 in\), height/],
    [
      'the walk round first, spindle still',
      /Walk round first: run third-wheel-walk\.nc with the spindle still/,
    ],
    [
      'how high to raise zero for a run in the air',
      /raise the zero of Z by 6\.600 mm \(0\.2598 in\), and parking with it, and run third-wheel-1\.nc/,
    ],
    ['each program in order', /Run third-wheel-1\.nc.*Run third-wheel-2\.nc.*Run third-wheel-3\.nc/],
    ['touching off anew after a change of cutter', /touch off its height/i],
  ])('says %s', (_, words) => {
    expect(setUp).toMatch(words);
  });

  it('lists the cutters in the order they are used, with how far they stick out', () => {
    const table = setUpOf(page).slice(setUpOf(page).indexOf('Cutters in the order'));
    const order = [...table.matchAll(/<td>cutter (\d+)<\/td>/g)].map(([, number]) => Number(number));
    expect(order).toEqual(facts.programs.flatMap(({ cutters }) => cutters));
    expect(wordsOf(table)).toContain('14.000 mm(0.5512 in)');
  });

  it('draws what must be kept clear, the place to park and the heights as the proof has them', () => {
    const extents = facts.proof?.extents;
    const scale = Number(/data-scale="([\d.]+)"/.exec(setUpOf(page))?.[1]);
    // By hand from the moves: ends of what goes below the clear height, arcs of the teeth lie within those of the bay and sides.
    const low = facts.proof?.moves.filter(({ to }) => (to.z ?? 0) < facts.job.setup.clearZ) ?? [];
    const thickest = Math.max(...facts.job.setup.cutters.map(({ shank }) => shank)) / 2;
    const xs = low.map(({ to }) => to.x ?? 0);
    const rect = elementOf(page, 'keep-clear');
    const [left, width] = ['x', 'width'].map((name) => Number(attributeOf(rect, name)) / scale);
    expect(left).toBeCloseTo(Math.min(...xs) - thickest, 1);
    expect((left ?? 0) + (width ?? 0)).toBeCloseTo(Math.max(...xs) + thickest, 1);
    // The bay beside tooth 1 reaches further than the ring of the finishing path.
    expect(Math.max(...xs)).toBeGreaterThan(facts.form.outsideRadius + 1);
    for (const [figure, z] of [
      ['z-park', facts.park?.z],
      ['z-clear', facts.job.setup.clearZ],
      ['z-top', facts.job.setup.topZ],
      ['z-plate', facts.job.setup.plateZ],
      ['z-deepest', extents?.z[0]],
    ] as const) {
      const element = elementOf(page, figure);
      expect(Number(attributeOf(element, 'data-value'))).toBeCloseTo(z ?? NaN, 5);
      const said = (textsOf(element)[0] ?? '').replace('Z ', '').replace('\u2212', '-');
      expect(Number(said)).toBeCloseTo(z ?? NaN, 3);
    }
  });
});

it('"a cutter 0.010 mm wider thins every tooth by 0.020": a flank gives half of it, a tooth of two flanks all of it', () => {
  const share = (0.01 / facts.form.toothThickness) * 100;
  expect(wordsOf(page)).toContain(
    `cuts 0.010 mm (0.0004 in) wider thins every tooth by as much, ${share.toFixed(1)} per cent`,
  );
});

it('"Cutter 1 is in the collet. Fit it", and the table of lengths twice: says once what hands do at a change', () => {
  const stepsOn = (machine: string): string => {
    const run = runOf('third-wheel', (text) => text.replace('desk-three-axis', machine));
    return wordsOf(setUpOf(sheetHtml(run.facts ?? facts)));
  };
  const byHand = stepsOn('desk-four-axis');
  expect(byHand).toContain('It stops at once for cutter 1. Fit it: it cuts 1.000 mm wide');
  expect(byHand).toContain('with the spindle still, for cutter 2. Fit it: it cuts');
  expect(byHand).not.toContain('in the collet. Fit');
  const changed =
    /changes to cutter 2 by itself\..*?(?=Then|Cutters in)/.exec(stepsOn('bench-mill'))?.[0] ?? '';
  expect(changed.match(/table/g)).toHaveLength(1);
});

it('"the hole is there already: run a dial gauge round it" with the arbor in it: says so only where the hole is free', () => {
  const setUpText = (result: { readonly facts?: SheetFacts | undefined }): string =>
    wordsOf(setUpOf(sheetHtml(result.facts ?? facts)));
  expect(setUpText(runOf('disc-wheel'))).not.toContain('is there already');
  const free = runOf('third-wheel', (text) => text.replace(/shape: sheet/, 'shape: sheet\n  bored: 3.0'));
  expect(setUpText(free)).toContain('The hole of 3.000 mm (0.1181 in) is there already: run a dial gauge');
});

it('"over the tips 19.552" of a disc turned to 19.500: says that the tips are not cut', () => {
  const { facts: disc } = runOf('disc-wheel');
  expect(wordsOf(sheetHtml(disc ?? facts))).toContain('what the disc was turned to, 29.860 mm by the job');
  expect(wordsOf(page)).not.toContain('what the disc was turned to');
});

describe('a job in inches', () => {
  it('"wide at the root 0.864 mm", "a 0.0468750 in cutter": reasons are in inches, with no more decimals than the tables', () => {
    const { facts: inchFacts } = runOf('inch-wheel', (text) => text.replace(/\ncuts:[\s\S]*/, '\n'));
    const words = wordsOf(sheetHtml(inchFacts ?? facts));
    expect(words).not.toMatch(/\.\d{6,} (?:in|mm)\b/);
    expect(words).toMatch(/the largest that roughs a space [\d.]+ in \([\d.]+ mm\) wide/);
    expect(words).toMatch(/from 0\.0008 in \(0\.02 mm\) to 0\.0039 in \(0\.1 mm\)/);
  });

  const inches: SheetFacts = { ...facts, job: { ...facts.job, length: 'inch' } };
  const text = sheetHtml(inches);

  it('says inches first, millimetres beside them', () => {
    const words = wordsOf(text);
    expect(words).toContain('1.2390 in (31.471 mm)');
    expect(words).toContain('Park at X -0.8661 in (-22.000 mm)');
    expect(words).not.toMatch(/\d mm \([\d.-]+ in\)/);
    expect(text).toContain('figures in inches');
  });

  it('keeps what is measured the same, whatever unit it is said in', () => {
    const value = (page_: string, figure: string): string =>
      attributeOf(elementOf(page_, figure), 'data-value');
    for (const figure of ['tip', 'bore', 'chord', 'tip-diameter', 'rim']) {
      expect(value(text, figure)).toBe(value(page, figure));
    }
  });
});

describe('what is measured', () => {
  it('is what the form gives, in the table and on the plate', () => {
    const value = (figure: string): number => Number(attributeOf(elementOf(page, figure), 'data-value'));
    expect(value('tip')).toBeCloseTo(2 * facts.form.outsideRadius, 5);
    expect(value('bore')).toBe(4);
    const drawn = /data-figure="(span-\d+)-drawn" data-value="([\d.]+)"/.exec(page);
    expect(value(drawn?.[1] ?? '')).toBe(Number(drawn?.[2]));
  });

  it('says the passes once each, in order, with the time the dial shows', () => {
    const chapters = [...page.matchAll(/data-chapter="(\d+)" data-seconds="([\d.]+)"/g)];
    expect(chapters.map(([, number]) => Number(number))).toEqual(facts.passes.map((_, i) => i + 1));
    const total = chapters.reduce((sum, [, , seconds]) => sum + Number(seconds), 0);
    expect(Number(attributeOf(elementOf(page, 'seconds'), 'data-value'))).toBeCloseTo(total, 1);
  });

  it('"4 laps of 0.229 mm" of a bore whose program counts to 12: says laps as the comments of the programs count them', () => {
    const { files } = runOf('third-wheel');
    const text = files.map(({ name, text: one }) => (/-\d\.nc$/.test(name) ? one : '')).join('\n');
    for (const pass of facts.passes) {
      const name = pass.name.replace(/^crossings/, 'CROSSING \\d+').toUpperCase();
      const counts = [
        ...text.matchAll(new RegExp(`\\(${name.replace('D+', 'd+')},[^)]*LAP \\d+ OF (\\d+)`, 'g')),
      ].map(([, count]) => Number(count));
      expect([Math.min(...counts), Math.max(...counts)]).toEqual(pass.laps);
    }
    const bore = facts.passes.find(({ name }) => name === 'bore');
    expect(page).toContain(`<td class="n">${bore?.laps.join('\u2013')}</td>`);
  });

  it('says each reason once, with the passes it holds for', () => {
    const whys = page.slice(page.indexOf('class="whys"'), page.indexOf('</dl>'));
    const sentences = [...whys.matchAll(/<dd>([^<]*)<\/dd>/g)].flatMap(([, text = '']) =>
      text.toLowerCase().replace(/\.$/, '').split('; '),
    );
    expect(new Set(sentences).size).toBe(sentences.length);
  });
});
