import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { curvatureOn, endOf, headingOn, pointOn, startOf } from '../../src/geometry/on-piece.ts';
import { cross, distance, norm, turnPoint } from '../../src/geometry/point.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import type { WheelForm } from '../../src/tooth/wheel.ts';
import { pinion, proportions, value } from './proportions.ts';
import { anyProportions } from './random-proportions.ts';

function roles(form: WheelForm): string {
  return form.sector.map(({ role }) => role).join(' ');
}

function problemOf(change: Parameters<typeof proportions>[0]) {
  const outcome = wheelForm(proportions(change));
  const [problem] = outcome.problems;
  return {
    ok: outcome.ok,
    code: problem?.code,
    path: problem?.at.kind === 'value' ? problem.at.path.join('.') : '',
    message: problem?.message ?? '',
  };
}

describe('the exact outline', () => {
  it('names its pieces in the order of travel', () => {
    expect(roles(value(wheelForm(proportions())))).toBe('root flank addendum land addendum flank root');
    expect(roles(value(wheelForm(proportions({ height: 1 }))))).toBe(
      'root flank addendum addendum flank root',
    );
    expect(roles(value(wheelForm(proportions({ addendumForm: 'arc' }))))).toBe(
      'root flank addendum addendum flank root',
    );
    expect(roles(value(wheelForm(proportions({ rootFillet: 0.15 }))))).toBe(
      'root fillet flank addendum land addendum flank fillet root',
    );
  });

  it('joins end to start within 1e-12, across the pitch too', () => {
    fc.assert(
      fc.property(anyProportions(), (p) => {
        const { sector } = value(wheelForm(p));
        const size = Math.max(1, p.module * p.teeth);
        sector.forEach(({ piece }, i) => {
          const next = sector[i + 1]?.piece;
          const start = next ? startOf(next) : turnPoint(startOf(sector[0]!.piece), (2 * Math.PI) / p.teeth);
          expect(distance(endOf(piece), start)).toBeLessThan(1e-12 * Math.max(1, size / 100));
        });
      }),
      { numRuns: 200, seed: 11 },
    );
  });

  it('is its own mirror image', () => {
    fc.assert(
      fc.property(anyProportions(), fc.double({ min: 0, max: 1, noNaN: true }), (p, u) => {
        const { sector } = value(wheelForm(p));
        sector.forEach(({ piece, role }, i) => {
          const twin = sector[sector.length - 1 - i]!;
          const here = pointOn(piece, u);
          const there = pointOn(twin.piece, 1 - u);
          expect(twin.role).toBe(role);
          expect(distance(here, { x: there.x, y: -there.y })).toBeLessThan(1e-12 * p.teeth * p.module);
        });
      }),
      { numRuns: 100, seed: 12 },
    );
  });

  it('grows with the module', () => {
    fc.assert(
      fc.property(anyProportions(), fc.double({ min: 0.2, max: 5, noNaN: true }), (p, k) => {
        const one = value(wheelForm(p));
        const other = value(
          wheelForm({ ...p, module: p.module * k, rootFillet: p.rootFillet * k, centres: p.centres * k }),
        );
        for (const key of [
          'outsideRadius',
          'rootRadius',
          'pointedAddendum',
          'toothThickness',
          'workingRadius',
        ] as const) {
          expect(other[key] / k / one[key]).toBeCloseTo(1, 9);
        }
        other.sector.forEach(({ piece }, i) => {
          const twin = pointOn(one.sector[i]!.piece, 0.4);
          const here = pointOn(piece, 0.4);
          expect(distance({ x: here.x / k, y: here.y / k }, twin)).toBeLessThan(1e-9 * p.teeth * p.module);
        });
      }),
      { numRuns: 100, seed: 13 },
    );
  });

  it('is tangent from fillet to flank and root, and from flank to the rolled addendum', () => {
    fc.assert(
      fc.property(anyProportions(), (p) => {
        const { sector } = value(wheelForm({ ...p, addendumForm: 'epicycloid' }));
        for (let i = 1; i < sector.length; i++) {
          const [before, after] = [sector[i - 1]!, sector[i]!];
          const pair = [before.role, after.role].toSorted().join(' ');
          if (['fillet root', 'fillet flank', 'addendum flank'].includes(pair)) {
            const bend = cross(headingOn(before.piece, 1), headingOn(after.piece, 0));
            expect(Math.abs(bend), pair).toBeLessThan(1e-6);
          }
        }
      }),
      { numRuns: 200, seed: 14 },
    );
  });

  it('runs round the wheel with the metal on its left, root to tip and back', () => {
    const { sector, rootRadius, outsideRadius, pitchRadius } = value(
      wheelForm(proportions({ rootFillet: 0.1 })),
    );
    expect(norm(startOf(sector[0]!.piece))).toBeCloseTo(rootRadius, 12);
    const addendum = sector.find(({ role }) => role === 'addendum')!.piece;
    expect(norm(startOf(addendum))).toBeCloseTo(pitchRadius, 12);
    expect(norm(endOf(addendum))).toBeCloseTo(outsideRadius, 12);
    expect(curvatureOn(addendum, 0.5)).toBeGreaterThan(0);
    expect(curvatureOn(sector.find(({ role }) => role === 'fillet')!.piece, 0.5)).toBeLessThan(0);
    const angles = sector.map(({ piece }) => Math.atan2(endOf(piece).y, endOf(piece).x));
    expect(angles.every((angle, i) => i === 0 || angle >= angles[i - 1]! - 1e-12)).toBe(true);
  });

  it('keeps the tooth thickness on the pitch circle and the flanks radial', () => {
    const form = value(wheelForm(proportions({ tooth: 0.45 })));
    const flank = form.sector.find(({ role }) => role === 'flank')!.piece;
    const at = endOf(flank);
    expect(2 * form.pitchRadius * Math.abs(Math.atan2(at.y, at.x))).toBeCloseTo(0.45 * Math.PI * 0.5, 12);
    expect(cross(startOf(flank), at)).toBeCloseTo(0, 12);
  });

  it('begins to work where the tip of the mate reaches on the line of centres', () => {
    const form = value(
      wheelForm(
        proportions({ centres: 17.05, mate: { ...pinion(8), tip: { height: 0.7, radius: 0.7 } } as never }),
      ),
    );
    expect(form.workingRadius).toBeCloseTo(17.05 - 2 - 0.35, 12);
  });
});

it('drops a land too short to be there', () => {
  // Two points of it would be one point; a path round it would have a block of no length.
  const form = value(wheelForm(proportions({ height: 0.999_999_999_9 })));
  expect(roles(form)).toBe('root flank addendum addendum flank root');
  expect(form.outsideRadius).toBeCloseTo(15 + form.pointedAddendum, 8);
});

describe('two fillets that do not fit beside each other', () => {
  it('become one disc between the flanks, whose lowest point is the floor, and a warning says so', () => {
    const outcome = wheelForm(proportions({ rootFillet: 0.39 }));
    const form = value(outcome);
    expect(roles(form)).toBe('fillet flank addendum land addendum flank fillet');
    const half = (0.5 * Math.PI) / 60;
    expect(form.rootRadius).toBeCloseTo(0.39 / Math.sin(half) - 0.39, 12);
    expect(form.dedendum).toBeCloseTo(form.pitchRadius - form.rootRadius, 12);
    expect(outcome.problems).toHaveLength(1);
    expect(outcome.problems[0]?.severity).toBe('warning');
  });

  it('are refused above the pitch circle with the largest that fits, and that one does', () => {
    const { ok, code, path, message } = problemOf({ rootFillet: 0.5 });
    expect({ ok, code, path }).toEqual({ ok: false, code: 'tooth.no-form', path: 'wheel.root' });
    expect(message).toContain('0.3928 mm');
    expect(wheelForm(proportions({ rootFillet: 0.3927 })).ok).toBe(true);
    expect(wheelForm(proportions({ rootFillet: 0.3929 })).ok).toBe(false);
  });
});

describe('what makes no form', () => {
  it.each([
    [{ height: 1.02 }, 'tooth.no-tip', 'wheel.height', '0.7744 mm'],
    [{ height: 0 }, 'tooth.no-form', 'wheel.height', '0.7744 mm'],
    [{ tooth: 1 }, 'tooth.no-form', 'wheel.tooth', '1.5708 mm'],
    [{ tooth: 0 }, 'tooth.no-form', 'wheel.tooth', '0 mm'],
    [{ dedendum: 31 }, 'tooth.no-form', 'wheel.dedendum', '15 mm'],
    [{ dedendum: -0.1 }, 'tooth.no-form', 'wheel.dedendum', '-0.05 mm'],
    [{ teeth: 2 }, 'tooth.no-form', 'wheel.teeth', '2 teeth'],
    [{ rootFillet: -1 }, 'tooth.no-form', 'wheel.root', '-1 mm'],
    [{ addendumForm: 'arc', height: 0.15 }, 'tooth.no-form', 'wheel.addendum', '0.1626 mm'],
    [{ mate: { kind: 'lantern', trundles: 8, trundle: 1.05 } }, 'tooth.no-form', 'wheel.mate', 'later'],
  ] as const)('%j', (change, code, path, words) => {
    const problem = problemOf(change as Parameters<typeof proportions>[0]);
    expect(problem).toMatchObject({ ok: false, code, path });
    expect(problem.message).toContain(words);
  });

  it('is told whole, not only the first', () => {
    expect(wheelForm(proportions({ tooth: 2, dedendum: 99, rootFillet: -1 })).problems).toHaveLength(3);
  });
});
