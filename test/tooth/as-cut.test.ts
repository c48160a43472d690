import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { endOf, headingOn, pointOn, startOf } from '../../src/geometry/on-piece.ts';
import { addScaled, distance, leftOf, norm, polar, type Point } from '../../src/geometry/point.ts';
import { asCut, type AsCut } from '../../src/tooth/as-cut.ts';
import { largestCutterBelow } from '../../src/tooth/largest-cutter.ts';
import { toothSide } from '../../src/tooth/tooth-side.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import type { WheelForm, WheelPiece, WheelProportions } from '../../src/tooth/wheel.ts';
import { distanceTo, inMetal, pointsOf, risingHalf, spaceOf } from './outline-samples.ts';
import { pinion, proportions, value } from './proportions.ts';
import { anyProportions } from './random-proportions.ts';

interface Cut {
  readonly p: WheelProportions;
  readonly form: WheelForm;
  readonly cut: AsCut;
}

/** Any wheel with any cutter that enters its spaces. */
function anyCut(): fc.Arbitrary<Cut> {
  return fc
    .tuple(anyProportions(), fc.double({ min: 0.05, max: 2, noNaN: true }))
    .map(([p, share]) => {
      const form = value(wheelForm(p));
      return { p, form, made: asCut(form, share * p.module * Math.PI * 0.5) };
    })
    .filter(({ made }) => made.ok)
    .map(({ p, form, made }) => ({ p, form, cut: value(made) }));
}

/** Chords of 1/200 of a piece leave out less than this of a curve of one module or so. */
function sag(p: WheelProportions): number {
  return 1.5e-5 * p.module;
}

const EACH = 200;

describe('the sixty-tooth wheel and a 0.5 mm cutter', () => {
  const form = value(wheelForm(proportions()));
  const cut = value(asCut(form, 0.5));

  it('has its foot where a disc on the root circle touches a radial flank [Pythagoras]', () => {
    expect(cut.footRadius).toBeCloseTo(Math.sqrt((form.rootRadius + 0.25) ** 2 - 0.25 ** 2), 12);
    expect(cut.reachesRoot).toBe(true);
    expect(cut.floorRadius).toBe(form.rootRadius);
  });

  it('leaves nearly what it would in a square corner [limit of a square corner]', () => {
    // In a square corner the point of the arc that is equally far from both walls lies r (1 - 1/sqrt 2) from them.
    expect(cut.leftAtRoot).toBeCloseTo(0.25 * (1 - Math.SQRT1_2), 2);
    expect(cut.areaLeft).toBeCloseTo(2 * 0.25 ** 2 * (1 - Math.PI / 4), 2);
  });

  it('lets a cutter to the root that touches both flanks there [similar triangles]', () => {
    const sine = Math.sin(Math.PI / 120);
    expect(cut.largestCutter / 2).toBeCloseTo((form.rootRadius * sine) / (1 - sine), 12);
    expect(value(asCut(form, cut.largestCutter * 0.999_999)).reachesRoot).toBe(true);
    expect(value(asCut(form, cut.largestCutter * 1.000_001)).reachesRoot).toBe(false);
  });

  it('is refused when the cutter hangs on the tips, with the mouth', () => {
    const outcome = asCut(form, 2.2);
    expect(outcome.ok).toBe(false);
    expect(outcome.problems[0]?.code).toBe('reach.space');
    expect(outcome.problems[0]?.message).toContain('1.581 mm');
  });

  it('with a fillet larger than the cutter is the exact outline', () => {
    const filleted = value(wheelForm(proportions({ rootFillet: 0.3 })));
    const made = value(asCut(filleted, 0.5));
    expect(made.sector).toEqual(filleted.sector);
    expect(made.leftAtRoot).toBe(0);
    expect(made.areaLeft).toBe(0);
  });

  it('with a smaller fillet leaves what the sharp corner would have had, less the fillet', () => {
    const filleted = value(asCut(value(wheelForm(proportions({ rootFillet: 0.1 }))), 0.5));
    const sharp = value(asCut(form, 0.5));
    const small = value(asCut(form, 0.2));
    expect(filleted.sector).toEqual(sharp.sector);
    expect(filleted.areaLeft).toBeCloseTo(sharp.areaLeft - small.areaLeft, 12);
  });
});

/** Every case of the closed form must come up in the random wheels, or the properties prove less than they say. */
it('meets feet on flanks and addenda, on the root and wedged, and hollows at the pitch point', () => {
  const seen = new Set<string>();
  fc.assert(
    fc.property(anyCut(), ({ cut }) => {
      const roles = cut.sector.map(({ role }) => role).join(' ');
      seen.add(`${cut.reachesRoot ? 'root' : 'wedged'} ${roles.includes('flank') ? 'flank' : 'addendum'}`);
      seen.add(roles.includes('flank fillet addendum') ? 'hollow' : 'plain');
    }),
    { numRuns: 1000, seed: 20 },
  );
  expect([...seen].toSorted()).toEqual(
    ['hollow', 'plain', 'root addendum', 'root flank', 'wedged addendum', 'wedged flank'].toSorted(),
  );
});

describe('any wheel, any cutter', () => {
  it('joins end to start within 1e-12', () => {
    fc.assert(
      fc.property(anyCut(), ({ p, cut }) => {
        const size = Math.max(1, (p.module * p.teeth) / 100);
        for (let i = 1; i < cut.sector.length; i++) {
          expect(distance(endOf(cut.sector[i - 1]!.piece), startOf(cut.sector[i]!.piece))).toBeLessThan(
            1e-12 * size,
          );
        }
      }),
      { numRuns: 300, seed: 21 },
    );
  });

  it('never lies inside the exact outline', () => {
    fc.assert(
      fc.property(anyCut(), ({ p, form, cut }) => {
        const exact = spaceOf(form.sector, p.teeth, EACH);
        for (const point of pointsOf(risingHalf(cut.sector), 12)) {
          expect(!inMetal(exact, point) || distanceTo(exact, point) < sag(p)).toBe(true);
        }
      }),
      { numRuns: 40, seed: 22 },
    );
  });

  it('is reached everywhere by the cutter, which touches no exact metal', () => {
    fc.assert(
      fc.property(anyCut(), ({ p, form, cut }) => {
        const exact = spaceOf(form.sector, p.teeth, EACH);
        const radius = cut.diameter / 2;
        for (const centre of centresOf(risingHalf(cut.sector), radius)) {
          expect(distanceTo(exact, centre)).toBeGreaterThan(radius - sag(p));
          expect(inMetal(exact, centre)).toBe(false);
        }
      }),
      { numRuns: 40, seed: 23 },
    );
  });

  it('leaves nothing that a cutter free of the exact metal could take', () => {
    fc.assert(
      fc.property(
        anyCut(),
        fc.infiniteStream(fc.double({ min: 0, max: 1, noNaN: true })),
        ({ p, form, cut }, stream) => {
          const exact = spaceOf(form.sector, p.teeth, EACH);
          const left = spaceOf(cut.sector, p.teeth, EACH);
          const radius = cut.diameter / 2;
          const depth = form.outsideRadius - form.rootRadius;
          for (let i = 0; i < 40; i++) {
            const [a, b] = [stream.next().value as number, stream.next().value as number];
            const centre = polar(form.rootRadius + a * (depth + radius), (-Math.PI * b) / p.teeth);
            if (!inMetal(exact, centre) && distanceTo(exact, centre) >= radius) {
              expect(distanceTo(left, centre)).toBeGreaterThan(radius - sag(p));
            }
          }
        },
      ),
      { numRuns: 60, seed: 24 },
    );
  });

  it('leaves the thickness and the area that it says', () => {
    fc.assert(
      fc.property(anyCut(), ({ p, form, cut }) => {
        const exact = spaceOf(form.sector, p.teeth, EACH);
        const root = pointsOf(belowFoot(cut), 200);
        const thickest = Math.max(...root.map((point) => distanceTo(exact, point)));
        expect(Math.abs(thickest - cut.leftAtRoot)).toBeLessThan(0.01 * cut.leftAtRoot + 2 * sag(p));
        expect(thickest).toBeLessThan(cut.leftAtRoot + sag(p));
        if (cut.leftAtRoot > 0) {
          expect(distanceTo(exact, cut.leftAt)).toBeCloseTo(cut.leftAtRoot, 4);
          expect(distanceTo(spaceOf(cut.sector, p.teeth, EACH), cut.leftAt)).toBeLessThan(sag(p));
        }
        const area = polygonArea(pointsOf(cut.sector, EACH)) - polygonArea(pointsOf(form.sector, EACH));
        expect(Math.abs(area - cut.areaLeft)).toBeLessThan(10 * sag(p) * p.module);
      }),
      { numRuns: 40, seed: 25 },
    );
  });

  it('gets to the root up to the largest cutter and no further', () => {
    fc.assert(
      fc.property(anyProportions(), (p) => {
        const form = value(wheelForm({ ...p, rootFillet: 0 }));
        const { largestCutter } = value(asCut(form, p.module * 0.01));
        expect(value(asCut(form, largestCutter * (1 - 1e-9))).reachesRoot).toBe(true);
        const beyond = asCut(form, largestCutter * (1 + 1e-9));
        expect(beyond.ok && beyond.value.reachesRoot).toBe(false);
      }),
      { numRuns: 200, seed: 26 },
    );
  });
});

it('names the largest cutter whose foot stays below the working flank', () => {
  fc.assert(
    fc.property(anyProportions(), fc.double({ min: 0.05, max: 0.95, noNaN: true }), (p, share) => {
      const form = value(wheelForm({ ...p, rootFillet: 0 }));
      const working = form.rootRadius + share * (form.outsideRadius - form.rootRadius);
      const largest = 2 * largestCutterBelow(value(toothSide(form.proportions)), working);
      expect(value(asCut(form, largest * (1 - 1e-9))).footRadius).toBeLessThanOrEqual(working);
      const beyond = asCut(form, largest * (1 + 1e-9));
      expect(!beyond.ok || beyond.value.footRadius > working).toBe(true);
    }),
    { numRuns: 200, seed: 27 },
  );
});

it('fills the hollow of an arc that leans outward, and only that', () => {
  const form = value(wheelForm(proportions({ addendumForm: 'arc', mate: pinion(24) })));
  const { sector } = value(asCut(form, 0.5));
  expect(sector.map(({ role }) => role).join(' ')).toBe(
    'root fillet flank fillet addendum addendum fillet flank fillet root',
  );
  const hollow = sector[3]!.piece;
  expect(norm(startOf(hollow))).toBeLessThan(form.pitchRadius);
  expect(norm(endOf(hollow))).toBeGreaterThan(form.pitchRadius);
});

/** Where the cutter's centre stands for points all along an outline: half its breadth to the right of travel. */
function centresOf(sector: readonly WheelPiece[], radius: number): Point[] {
  return sector.flatMap(({ role, piece }) =>
    role === 'fillet' && piece.kind === 'arc' && piece.radius === radius
      ? [piece.centre]
      : [0.01, 0.3, 0.5, 0.8, 0.99].map((u) =>
          addScaled(pointOn(piece, u), leftOf(headingOn(piece, u)), -radius),
        ),
  );
}

/** The root and its corner before tooth 1. */
function belowFoot(cut: AsCut): readonly WheelPiece[] {
  const end = cut.sector.findIndex(({ role }) => role === 'flank' || role === 'addendum');
  return cut.sector.slice(0, end);
}

function polygonArea(points: readonly Point[]): number {
  return points.reduce((sum, a, i) => {
    const b = points[(i + 1) % points.length]!;
    return i + 1 < points.length ? sum + (a.x * b.y - a.y * b.x) / 2 : sum;
  }, 0);
}
