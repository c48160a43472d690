/**
 * Figures that a person measures on the part, read back from the sheet's SVG and table, against the metal that the moves leave
 * which the prover read back from the programs' text. The measuring is by hand geometry of the test, none of the report's.
 */
import { describe, expect, it } from 'vitest';
import { sheetHtml } from '../../src/report/sheet.ts';
import { boreOf, lowestPoints, overTipsOf, spanOf } from '../support/cut-metal.ts';
import { SAMPLES } from '../support/cut-text.ts';
import { factsOf } from '../support/sheets.ts';
import { attributeOf, elementOf, lengthOfRuns, readPath, textsOf } from '../support/svg-read.ts';

/** A flank's own error both sides, the last digit of the program, and the third decimal of the sheet. */
const AGREE = 0.003;

/** What a dimension says in words, and how long its line is to the plate's scale. */
function dimension(page: string, figure: string): { readonly said: number; readonly drawn: number } {
  const svg = page.slice(page.lastIndexOf('<svg', page.indexOf(`data-figure="${figure}"`)));
  const element = elementOf(svg, figure);
  const unit = page.includes('figures in inches') ? 25.4 : 1;
  const said = Number(/[\d.]+$/.exec(textsOf(`${element}</text>`)[0] ?? '')?.[0]) * unit;
  const path = /class="line measured" d="([^"]*)"/.exec(element)?.[1] ?? '';
  return { said, drawn: lengthOfRuns(readPath(path)) / Number(attributeOf(svg, 'data-scale')) };
}

describe.each(SAMPLES)('%s: the sheet against the metal', (sample) => {
  const facts = factsOf(sample);
  const page = sheetHtml(facts);
  const { job, form, proof } = facts;
  const { teeth } = form.proportions;
  const moves = proof?.moves ?? [];
  const cutter = job.cuts.finishing.cutter;
  const path = lowestPoints(moves, cutter.number, [form.rootRadius, form.outsideRadius + cutter.diameter]);
  const half = cutter.diameter / 2;

  // A disc comes turned to its tips: no cutter goes over them.
  it.runIf(job.setup.shape.kind === 'sheet')('the size over the tips', () => {
    const metal = overTipsOf(path, teeth, half);
    const { said, drawn } = dimension(page, 'tip-diameter');
    expect(Math.abs(said - metal)).toBeLessThan(AGREE);
    expect(Math.abs(drawn - metal)).toBeLessThan(AGREE);
    expect(Math.abs(Number(attributeOf(elementOf(page, 'tip'), 'data-value')) - metal)).toBeLessThan(AGREE);
  });

  it('has a path to measure', () => {
    expect(path.length).toBeGreaterThan(1000);
  });

  it('the span over teeth, between the jaws that are drawn and in the table', () => {
    const k = Number(/data-figure="span-(\d+)-drawn"/.exec(page)?.[1]);
    const metal = spanOf(path, teeth, k, form.pitchRadius, half);
    const { said, drawn } = dimension(page, `span-${k}-drawn`);
    expect(Math.abs(said - metal)).toBeLessThan(AGREE);
    expect(Math.abs(drawn - metal)).toBeLessThan(AGREE);
    const table = Number(attributeOf(elementOf(page, `span-${k}`), 'data-value'));
    expect(Math.abs(table - metal)).toBeLessThan(AGREE);
  });

  it.runIf(job.setup.bored < job.wheel.bore)('the bore', () => {
    const { number, diameter } = job.cuts.bore.cutter;
    const inside = lowestPoints(moves, number, [0, job.wheel.bore / 2]);
    const metal = boreOf(inside, diameter / 2);
    const { said, drawn } = dimension(page, 'bore');
    expect(Math.abs(said - metal)).toBeLessThan(AGREE);
    expect(Math.abs(drawn - metal)).toBeLessThan(AGREE);
  });

  it('the deviation: each figure of the scale stands where the curve would have that value', () => {
    const at = page.indexOf('aria-label="Deviation');
    const svg = page.slice(at, page.indexOf('</svg>', at));
    const curve = elementOf(svg, 'deviation');
    const number = (name: string): number => Number(attributeOf(curve, name));
    const ticks = [
      ...svg.matchAll(/<text text-anchor="end" x="[\d.]+" y="([\d.]+)">([+\u2212]?[\d.]+)<\/text>/g),
    ];
    expect(ticks.length).toBeGreaterThan(4);
    for (const [, y, text = ''] of ticks) {
      const value = Number(text.replace('\u2212', '-'));
      // The foot of a figure stands one mm of paper below its line.
      expect((number('data-y-zero') - (Number(y) - 1)) * number('data-um-per-y')).toBeCloseTo(value, 2);
    }
    expect(Number(attributeOf(elementOf(page, 'flank-gouge'), 'data-value'))).toBeCloseTo(
      proof?.figures?.flankGouge ?? NaN,
      6,
    );
  });
});

it('would be told by a cutter 10 um wider than the job says', () => {
  const facts = factsOf('third-wheel');
  const { form, job, proof } = facts;
  const half = job.cuts.finishing.cutter.diameter / 2;
  const path = lowestPoints(proof?.moves ?? [], job.cuts.finishing.cutter.number, [
    form.rootRadius,
    form.outsideRadius + 1,
  ]);
  const off =
    spanOf(path, 60, 11, form.pitchRadius, half) - spanOf(path, 60, 11, form.pitchRadius, half + 0.005);
  expect(off).toBeCloseTo(0.01, 6);
  expect(off).toBeGreaterThan(AGREE);
});
