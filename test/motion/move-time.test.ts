import { describe, expect, it } from 'vitest';
import { openPlan, planMove, type MotionLimits } from '../../src/motion/move-plan.ts';
import { timeMoves, timePlan, trapezoid, type TimedMove } from '../../src/motion/move-time.ts';

const limits = (a: number, corner = 0.01): MotionLimits => ({
  acceleration: { x: a, y: a, z: a },
  rapid: { x: 60_000, y: 60_000, z: 60_000 },
  cornerAllowance: corner,
  blockSeconds: 0,
});

describe('trapezoid [kinematics of constant acceleration, closed form]', () => {
  it.each([
    [10, 600, 100, 0, 0, 1.1, 10],
    [1, 600, 100, 0, 0, 0.2, 10],
    [0.5, 300, 100, 0, 0, 0.15, 5],
    [0.5, 300, 500, 0, 0, 0.11, 5],
    [0.2, 300, 100, 0, 0, 0.08944, 4.4721],
    [0.1, 300, 100, 0, 0, 0.06325, 3.1623],
    [50, 1500, 300, 0, 0, 2.08333, 25],
    [0.5, 120, 10, 0, 0, 0.45, 2],
    [1, 600, 100, 2, 3, 0.1565, 10],
    [5, 600, 100, 2, 3, 0.5565, 10],
  ])('%d mm at %d mm/min, %d mm/s2, in %d out %d', (length, feed, a, v0, v1, seconds, peak) => {
    const result = trapezoid(length, feed / 60, v0, v1, a);
    near(result.seconds, seconds);
    near(result.peak, peak);
  });
});

/** Within a tenth of a hundredth. */
function near(value: number, expected: number): void {
  expect(Math.abs(value / expected - 1)).toBeLessThan(0.001);
}

const ORIGIN = { x: 0, y: 0, z: 0 };

describe('corner speed [of an arc that touches both moves and passes the corner at d: R / s - R = d, v = sqrt(a R)]', () => {
  it.each([
    [100, 0.01, [1.0, 1.5538, 2.5425, 3.4838, 5.3243, 16.18]],
    [200, 0.01, [Math.SQRT2, 2.1974, 3.5956, 4.9269, 7.5296, 22.882]],
    [500, 0.01, [2.2361, 3.4743, 5.6851, 7.7901, 11.905, 36.18]],
    [200, 0.02, [2.0, 3.1075, 5.0849, 6.9677, 10.649, 32.36]],
  ])('a %d, d %d, 60 to 170 degrees between the moves', (a, corner, speeds) => {
    [60, 90, 120, 135, 150, 170].forEach((angle, k) => {
      const turn = Math.PI - (angle * Math.PI) / 180;
      const at = { x: 1000, y: 0, z: 0 };
      const plan = openPlan(2, limits(a, corner));
      planMove(plan, ORIGIN, { kind: 'line', to: at, feed: 60_000 }, true);
      const to = { x: 1000 + 1000 * Math.cos(turn), y: 1000 * Math.sin(turn), z: 0 };
      planMove(plan, at, { kind: 'line', to, feed: 60_000 }, false);
      timePlan(plan);
      near(plan.entry[1]!, speeds[k]!);
    });
  });

  it('straight back is a stop, straight on is none, and no corner is faster than either feed', () => {
    const chain = (x: number, feed: number): number => {
      const plan = openPlan(2, limits(100));
      planMove(plan, ORIGIN, { kind: 'line', to: { x: 100, y: 0, z: 0 }, feed: 600 }, true);
      planMove(plan, { x: 100, y: 0, z: 0 }, { kind: 'line', to: { x, y: 0, z: 0 }, feed }, false);
      timePlan(plan);
      return plan.entry[1]!;
    };
    expect(chain(0, 600)).toBe(0);
    expect(chain(200, 600)).toBe(10);
    expect(chain(200, 300)).toBe(5);
  });
});

describe('arcs [v <= sqrt(a R)]', () => {
  const circle = (radius: number, rise = 0): TimedMove => ({
    kind: 'arc',
    from: { x: radius, y: 0, z: 0 },
    to: { x: radius, y: 0, z: rise },
    centre: { x: 0, y: 0 },
    turn: 2 * Math.PI,
    feed: 60_000,
  });
  const most = (move: TimedMove, own: MotionLimits): number =>
    Math.max(
      ...timeMoves(
        Array.from({ length: 400 }, () => move),
        own,
      ).reached,
    );

  it.each([
    [50, [94.9, 134.2, 189.7, 232.4, 300.0, 424.3, 600.0, 948.7]],
    [100, [134.2, 189.7, 268.3, 328.6, 424.3, 600.0, 848.5, 1341.6]],
    [200, [189.7, 268.3, 379.5, 464.8, 600.0, 848.5, 1200.0, 1897.4]],
    [500, [300.0, 424.3, 600.0, 734.8, 948.7, 1341.6, 1897.4, 3000.0]],
  ])('a %d, R 0.05 to 5 mm', (a, speeds) => {
    [0.05, 0.1, 0.2, 0.3, 0.5, 1, 2, 5].forEach((radius, k) =>
      near(most(circle(radius), limits(a)), speeds[k]!),
    );
  });

  it('a helix is as long as its line unrolled, and no faster than the circle below it', () => {
    const helix = circle(1, 2);
    const { total } = timeMoves([{ ...helix, feed: 60 }], limits(100));
    near(total, Math.hypot(2 * Math.PI, 2) / 1 + 1 / 100);
    expect(most(circle(1, 0.1), limits(100))).toBeLessThanOrEqual(600.001);
  });

  it('the axis that is slower to speed up limits it all round', () => {
    const own = { ...limits(400), acceleration: { x: 400, y: 100, z: 400 } };
    near(most(circle(1), own), 600);
  });
});

describe('per axis', () => {
  const own = {
    ...limits(100),
    acceleration: { x: 100, y: 100, z: 50 },
    rapid: { x: 1000, y: 1000, z: 500 },
  };
  const one = (move: Partial<TimedMove>): ReturnType<typeof timeMoves> =>
    timeMoves([{ kind: 'rapid', from: ORIGIN, to: ORIGIN, ...move }], own);

  it('a slanting rapid is as fast as the axis that limits it [v = min(rate / |u|)]', () => {
    near(one({ to: { x: 300, y: 400, z: 0 } }).reached[0]!, 1250);
    near(one({ to: { x: 30, y: 0, z: 40 } }).reached[0]!, 625);
    near(one({ to: { x: 0, y: 0, z: -40 } }).reached[0]!, 500);
  });

  it('Z speeds up by its own acceleration: 2 mm take 2 sqrt(L / a)', () => {
    near(one({ to: { x: 0, y: 0, z: 1 } }).total, 2 * Math.sqrt(1 / 50));
  });

  it('a feed drives no axis faster than a rapid does', () => {
    near(one({ kind: 'line', feed: 3000, to: { x: 0, y: 0, z: 40 } }).reached[0]!, 500);
    near(one({ kind: 'line', feed: 3000, to: { x: 300, y: 0, z: 0 } }).reached[0]!, 1000);
  });
});

describe('a move of no length', () => {
  const long = (from: number, to: number): TimedMove => ({
    kind: 'line',
    from: { x: from, y: 0, z: 0 },
    to: { x: to, y: 0, z: 0 },
    feed: 600,
  });
  const own = { ...limits(100), blockSeconds: 0.01 };

  it('takes no time and stops nothing', () => {
    expect(timeMoves([long(0, 10), long(10, 10), long(10, 10), long(10, 20)], own).total).toBeCloseTo(2.1, 9);
    expect(timeMoves([long(5, 5)], own)).toMatchObject({ total: 0 });
    expect(timeMoves([long(0, 0), long(0, 10), long(10, 10)], own).total).toBeCloseTo(1.1, 9);
  });

  it('does not straighten the corner it stands in', () => {
    const up: TimedMove = {
      kind: 'line',
      from: { x: 10, y: 0, z: 0 },
      to: { x: 10, y: 10, z: 0 },
      feed: 600,
    };
    expect(timeMoves([long(0, 10), long(10, 10), up], own).total).toBe(
      timeMoves([long(0, 10), up], own).total,
    );
  });

  it('before which the machine stands is a stop', () => {
    const still = { ...long(10, 10), standsBefore: true };
    expect(timeMoves([long(0, 10), still, long(10, 20)], own).total).toBeCloseTo(2.2, 9);
  });
});

it('a stop in between costs the ramps down and up', () => {
  const moves: TimedMove[] = [0, 1, 2].map((i) => ({
    kind: 'line',
    from: { x: 10 * i, y: 0, z: 0 },
    to: { x: 10 * (i + 1), y: 0, z: 0 },
    feed: 600,
    standsBefore: i === 1,
  }));
  const free = timeMoves(
    moves.map((move) => ({ ...move, standsBefore: false })),
    limits(100),
  ).total;
  expect(free).toBeCloseTo(3.1, 9);
  expect(timeMoves(moves, limits(100)).total).toBeCloseTo(3.2, 9);
});

it('a block never takes less than the controller needs to read it', () => {
  const moves: TimedMove[] = [
    { kind: 'line', from: { x: 0, y: 0, z: 0 }, to: { x: 0.001, y: 0, z: 0 }, feed: 600 },
  ];
  expect(timeMoves(moves, { ...limits(100), blockSeconds: 0.01 }).total).toBe(0.01);
});
