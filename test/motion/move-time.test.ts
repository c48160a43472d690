import { describe, expect, it } from 'vitest';
import type { MotionLimits } from '../../src/motion/move-plan.ts';
import { timeMoves, trapezoid, type TimedMove } from '../../src/motion/move-time.ts';

const limits = (a: number, corner = 0.01): MotionLimits => ({
  acceleration: { x: a, y: a, z: a },
  rapid: { x: 1500, y: 1500, z: 1500 },
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
    expect(result.seconds).toBeCloseTo(seconds, 4);
    expect(result.peak).toBeCloseTo(peak, 3);
  });
});

describe('corner speed [of an arc that touches both moves and passes the corner at d: R / s - R = d, v = sqrt(a R)]', () => {
  it.each([
    [100, 0.01, 60, 1.0],
    [100, 0.01, 90, 1.5538],
    [200, 0.01, 90, 2.1974],
    [200, 0.01, 120, 3.5956],
    [500, 0.01, 135, 7.7901],
    [200, 0.02, 150, 10.649],
  ])('a %d, d %d, %d degrees between the moves', (a, corner, angle, speed) => {
    const turn = Math.PI - (angle * Math.PI) / 180;
    const long = 1000;
    const at = { x: long, y: 0, z: 0 };
    const moves: TimedMove[] = [
      { kind: 'line', from: { x: 0, y: 0, z: 0 }, to: at, feed: 60_000 },
      {
        kind: 'line',
        from: at,
        to: { x: long + long * Math.cos(turn), y: long * Math.sin(turn), z: 0 },
        feed: 60_000,
      },
    ];
    // Two equal halves: each is a triangle or trapezoid that ends at the corner's speed.
    const slow = timeMoves(moves, limits(a, corner));
    const expected = 2 * trapezoid(long, 1000, 0, speed, accelerationAlong(a, turn)).seconds;
    const first = trapezoid(long, 1000, 0, speed, a).seconds;
    expect(slow.seconds[0]).toBeCloseTo(first, 2);
    expect(slow.total).toBeCloseTo(first + (expected - expected / 2), 1);
  });
});

/** Along a slanting line each axis may give its own: the move may accelerate more than one axis can. */
function accelerationAlong(a: number, angle: number): number {
  return a / Math.max(Math.abs(Math.cos(angle)), Math.abs(Math.sin(angle)));
}

describe('arcs [v <= sqrt(a R)]', () => {
  it.each([
    [50, 0.05, 94.9],
    [100, 1, 600],
    [200, 0.3, 464.8],
    [500, 5, 3000],
  ])('a %d, R %d: %d mm/min at most', (a, radius, most) => {
    const move: TimedMove = {
      kind: 'arc',
      from: { x: radius, y: 0, z: 0 },
      to: { x: radius, y: 0, z: 0 },
      centre: { x: 0, y: 0 },
      turn: 2 * Math.PI,
      feed: 60_000,
    };
    const reached = timeMoves(
      Array.from({ length: 400 }, () => move),
      limits(a),
    ).reached;
    expect(Math.max(...reached)).toBeCloseTo(most, 0);
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
