/**
 * Points on a piece, its ends among them, so close that no chord lies further than `sag` from the curve (mm).
 *
 * The sag of a chord that turns by a on a curve of radius rho is rho (1 - cos(a/2)), at most rho a^2 / 8. With the
 * heading turning by c a radian of roll, equal sag on a cycloid is equal steps of the integral of sqrt(rho) over the
 * heading; the points are spread so, on the larger radius of each step, which never makes the sag larger.
 */
import { cycloidCusps, cycloidRate } from './cycloid.ts';
import { pointOn, rollAt } from './on-piece.ts';
import type { Chain, CycloidPiece, Piece } from './piece.ts';
import type { Point } from './point.ts';

export function samplePiece(piece: Piece, sag: number): Point[] {
  return sampleParameters(piece, sag).map((u) => pointOn(piece, u));
}

/** The parameters of `samplePiece`, 0 first and 1 last. */
export function sampleParameters(piece: Piece, sag: number): number[] {
  switch (piece.kind) {
    case 'line':
      return [0, 1];
    case 'arc':
      return evenly(arcSteps(piece.radius, Math.abs(piece.turn), sag));
    case 'cycloid':
      return cycloidParameters(piece, sag);
  }
}

/** Closed: the last point is not the first again. */
export function sampleLoop(loop: Chain, sag: number): Point[] {
  const points: Point[] = [];
  for (const piece of loop) {
    const parameters = sampleParameters(piece, sag);
    for (let i = 0; i + 1 < parameters.length; i++) {
      points.push(pointOn(piece, parameters[i] as number));
    }
  }
  return points;
}

/** Open: both ends are there. */
export function sampleChain(chain: Chain, sag: number): Point[] {
  const points = sampleLoop(chain, sag);
  const last = chain.at(-1);
  if (last !== undefined) {
    points.push(pointOn(last, 1));
  }
  return points;
}

function evenly(steps: number): number[] {
  return Array.from({ length: steps + 1 }, (_, i) => i / steps);
}

function arcSteps(radius: number, turn: number, sag: number): number {
  // No chord spans more than a third of a circle, however coarse the sag.
  const most = 2 * Math.acos(Math.max(1 - sag / radius, 0.5));
  return radius > 0 ? Math.max(1, Math.ceil(turn / most)) : 1;
}

/** Cut at cusps, where a chord across would leave out the tip of the fold. */
function cycloidParameters(piece: CycloidPiece, sag: number): number[] {
  const bend = Math.abs(1 + piece.fixed / (2 * piece.rolling));
  const cusps = cycloidCusps(piece);
  if (cusps.length === 0) {
    return bend === 0 ? [0, 1] : smoothParameters(piece, sag, bend);
  }
  const span = piece.to - piece.from;
  const found = [0];
  let from = piece.from;
  for (const to of [...cusps, piece.to]) {
    const part = { ...piece, from, to };
    const inside = bend === 0 ? [1] : smoothParameters(part, sag, bend).slice(1);
    found.push(
      ...inside.map((u) => (u === 1 ? to - piece.from : from - piece.from + u * (to - from)) / span),
    );
    from = to;
  }
  found[found.length - 1] = 1;
  return found;
}

function smoothParameters(piece: CycloidPiece, sag: number, bend: number): number[] {
  // Weight of each cell: the number of chords it needs on the largest radius seen at its ends and middle.
  const cells = Math.max(8, Math.ceil((bend * Math.abs(piece.to - piece.from)) / 0.1));
  const total = [0];
  const turn = (bend * Math.abs(piece.to - piece.from)) / cells;
  let before = radiusAt(piece, 0, bend);
  for (let i = 0; i < cells; i++) {
    const middle = radiusAt(piece, (i + 0.5) / cells, bend);
    const after = radiusAt(piece, (i + 1) / cells, bend);
    total.push((total[i] as number) + turn * Math.sqrt(Math.max(before, middle, after) / (8 * sag)));
    before = after;
  }
  return spread(
    total,
    Math.max(Math.ceil(total[cells] as number), Math.ceil((turn * cells) / (Math.PI / 3)), 1),
  );
}

function radiusAt(piece: CycloidPiece, u: number, bend: number): number {
  return Math.abs(cycloidRate(piece, rollAt(piece, u))) / bend;
}

/** Parameters where the running total reaches each of `steps` equal shares. */
function spread(total: readonly number[], steps: number): number[] {
  const cells = total.length - 1;
  const whole = total[cells] as number;
  const found = [0];
  let cell = 0;
  for (let i = 1; i < steps; i++) {
    const share = (whole * i) / steps;
    while ((total[cell + 1] as number) < share) {
      cell++;
    }
    const from = total[cell] as number;
    found.push((cell + (share - from) / ((total[cell + 1] as number) - from)) / cells);
  }
  found.push(1);
  return found;
}
