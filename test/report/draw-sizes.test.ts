import { describe, expect, it } from 'vitest';
import { lengthOfChain } from '../../src/geometry/on-piece.ts';
import { nearestOnPiece } from '../../src/geometry/nearest-on-piece.ts';
import { sampleChain } from '../../src/geometry/sample-piece.ts';
import { turnPoint } from '../../src/geometry/point.ts';
import { CHORD_SAG } from '../../src/base/tolerances.ts';
import { drawSizes, type SizesPlate } from '../../src/report/draw-sizes.ts';
import { LETTER } from '../../src/report/plate.ts';
import { asCut } from '../../src/tooth/as-cut.ts';
import { crossings } from '../../src/tooth/crossings.ts';
import type { WheelProportions } from '../../src/tooth/wheel.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import {
  attributeOf,
  elementOf,
  lengthOfRuns,
  pointsOfRuns,
  readPath,
  textsOf,
} from '../support/svg-read.ts';

function proportions(teeth: number, leaves: number, module: number): WheelProportions {
  const mate = { kind: 'pinion', leaves, leaf: 1.05, tip: 'third-ogive', dedendum: 1.9 } as const;
  const centres = (module * (teeth + leaves)) / 2;
  return {
    teeth,
    module,
    mate,
    centres,
    addendumForm: 'epicycloid',
    height: 0.95,
    tooth: 0.5,
    dedendum: 1.5708,
    rootFillet: 0,
  };
}

function plateOf(teeth: number, module: number, arms: number, unit: 'mm' | 'inch'): SizesPlate {
  const form = wheelForm(proportions(teeth, 8, module));
  if (!form.ok) {
    throw new Error('no form');
  }
  const root = form.value.rootRadius;
  const windows = crossings(
    {
      arms,
      armAtHub: root * 0.17,
      armAtRim: root * 0.13,
      rim: root * 0.13,
      hub: root * 0.6,
      corner: root * 0.06,
    },
    root,
  );
  if (!windows.ok) {
    throw new Error('no windows');
  }
  return {
    form: form.value,
    sector: form.value.sector,
    crossings: windows.value,
    bore: root * 0.25,
    thickness: 1.5,
    unit,
  };
}

const CASES = [
  { teeth: 60, module: 0.5, arms: 5, unit: 'mm' as const },
  { teeth: 64, module: 25.4 / 48, arms: 4, unit: 'inch' as const },
  { teeth: 97, module: 0.8, arms: 6, unit: 'mm' as const },
  { teeth: 24, module: 0.3, arms: 3, unit: 'mm' as const },
];

describe.each(CASES)(
  'the sizes of $teeth teeth, module $module, in $unit',
  ({ teeth, module, arms, unit }) => {
    const plate = plateOf(teeth, module, arms, unit);
    const { svg, scale } = drawSizes(plate, 'x');
    const { form, crossings: windows } = plate;
    const expected: Record<string, number> = {
      'tip-diameter': 2 * form.outsideRadius,
      'pitch-diameter': module * teeth,
      'root-diameter': 2 * form.rootRadius,
      bore: plate.bore,
      hub: windows?.proportions.hub ?? 0,
      'rim-inside': 2 * (form.rootRadius - (windows?.proportions.rim ?? 0)),
      thickness: 1.5,
    };

    it.each(Object.keys(expected))('%s is said, and drawn as long as it is said, to scale', (figure) => {
      const element = elementOf(svg, figure);
      const value = Number(attributeOf(element, 'data-value'));
      expect(value).toBeCloseTo(expected[figure] as number, 5);
      const said = (textsOf(`${element}</text>`)[0] ?? '').match(/[\d.]+$/)?.[0];
      expect(Number(said) * (unit === 'mm' ? 1 : 25.4)).toBeCloseTo(value, unit === 'mm' ? 2 : 2);
      const drawn = /<path class="line measured" d="([^"]*)"/.exec(element)?.[1] ?? '';
      expect(lengthOfRuns(readPath(drawn)) / scale).toBeCloseTo(value, 2);
    });

    it('rim and arms, where there is room for them', () => {
      for (const [figure, value] of [
        ['rim', windows?.proportions.rim],
        ['arm-at-hub', windows?.proportions.armAtHub],
        ['arm-at-rim', windows?.proportions.armAtRim],
      ] as const) {
        if (svg.includes(`data-figure="${figure}"`)) {
          expect(Number(attributeOf(elementOf(svg, figure), 'data-value'))).toBeCloseTo(value ?? 0, 5);
        }
      }
    });

    it('draws the outline within its sag of the exact pieces, and all of it', () => {
      const d = attributeOf(elementOf(svg, 'outline'), 'd');
      const [teethPath = ''] = d.split('Z');
      const runs = readPath(`${teethPath}Z`);
      const exact = form.sector.map(({ piece }) => piece);
      const off = Math.max(
        ...pointsOfRuns(runs, 3).map((point) => {
          const pitch = (2 * Math.PI) / teeth;
          const home = turnPoint(point, -Math.round(Math.atan2(point.y, point.x) / pitch) * pitch);
          return Math.min(...exact.map((piece) => nearestOnPiece(piece, home).distance));
        }),
      );
      // Sag, and the rounding of ends and radii to four decimals.
      expect(off).toBeLessThan(CHORD_SAG + 3e-4);
      expect(lengthOfRuns(runs) / (lengthOfChain(exact) * teeth)).toBeCloseTo(1, 3);
      expect(sampleChain(exact, 0.01).length).toBeGreaterThan(4);
    });

    it('keeps every figure on the paper', () => {
      const [x = 0, y = 0, w = 0, h = 0] = attributeOf(svg, 'viewBox').split(' ').map(Number);
      expect(w).toBeLessThanOrEqual(171);
      for (const [tag] of svg.matchAll(/<text[^>]*>[^<]*<\/text>/g)) {
        const moved = /translate\((-?[\d.]+) (-?[\d.]+)\)/.exec(tag);
        const at = {
          x: Number(moved?.[1] ?? attributeOf(tag, 'x')),
          y: Number(moved?.[2] ?? attributeOf(tag, 'y')),
        };
        expect(at.x).toBeGreaterThanOrEqual(x);
        expect(at.x).toBeLessThanOrEqual(x + w);
        expect(at.y).toBeGreaterThanOrEqual(y);
        expect(at.y).toBeLessThanOrEqual(y + h);
      }
    });
  },
);

it('rests the jaws where the span is read: their gap is the reading', () => {
  const { svg, scale } = drawSizes(plateOf(60, 0.5, 5, 'mm'), 'x');
  const blades = [...svg.matchAll(/<path class="jaw" d="M(-?[\d.]+) /g)].map(([, x]) => Number(x));
  const [left = 0, right = 0] = blades;
  const span = /data-figure="span-\d+-drawn" data-value="([\d.]+)"/.exec(svg)?.[1];
  expect((right - left) / scale).toBeCloseTo(Number(span), 2);
});

describe('"root circle" on the drawing of what a cutter leaves, where no metal ends at it', () => {
  const plate = plateOf(60, 0.5, 5, 'mm');
  const drawn = (diameter: number): string => {
    const cut = asCut(plate.form, diameter);
    if (!cut.ok) {
      throw new Error('does not enter');
    }
    return drawSizes({ ...plate, sector: cut.value.sector, asCut: cut.value }, 'x').svg;
  };
  const value = (svg: string, figure: string): number =>
    Number(attributeOf(elementOf(svg, figure), 'data-value'));

  it('is called exact, and the foot that is cut stands beside it', () => {
    const svg = drawn(0.5);
    expect(textsOf(svg).some((text) => text.startsWith('exact root circle'))).toBe(true);
    expect(textsOf(svg).some((text) => text.startsWith('root circle'))).toBe(false);
    expect(value(svg, 'foot-diameter')).toBeGreaterThan(value(svg, 'root-diameter'));
    expect(svg).not.toContain('floor-diameter');
    // What is not touched by the cutter's round is called what it is called on the exact drawing.
    const exact = drawSizes(plate, 'x').svg;
    for (const figure of ['tip-diameter', 'pitch-diameter', 'bore', 'rim']) {
      expect(value(svg, figure)).toBe(value(exact, figure));
    }
  });

  it('has the floor of a cutter that does not reach it, and the rim measured to that floor', () => {
    const svg = drawn(0.78);
    const short = value(svg, 'floor-diameter') - value(svg, 'root-diameter');
    expect(short).toBeGreaterThan(0);
    const rim = value(drawSizes(plate, 'x').svg, 'rim');
    expect(value(svg, 'rim')).toBeCloseTo(rim + short / 2, 5);
  });

  it('is the root circle of the exact wheel elsewhere', () => {
    expect(textsOf(drawSizes(plate, 'x').svg).some((text) => text.startsWith('root circle'))).toBe(true);
  });
});

it('"over 11 teeth 10.493ick 1.200": the figure between the jaws keeps clear of the figure of the thickness', () => {
  const svg = drawSizes(plateOf(72, 0.3268, 4, 'mm'), 'sizes').svg;
  const boxOf = (figure: RegExp): { readonly x: number; readonly half: number } => {
    const text = figure.exec(svg);
    return { x: Number(text?.[1]), half: ((text?.[2]?.length ?? NaN) * LETTER) / 4 };
  };
  const span = boxOf(/<text[^>]*text-anchor="middle"[^>]*x="([-\d.]+)"[^>]*>(over \d+ teeth [\d.]+)</);
  const thick = boxOf(/<text[^>]*x="([-\d.]+)"[^>]*>(thick [\d.]+)</);
  expect(span.x + span.half).toBeLessThan(thick.x - thick.half);
});
