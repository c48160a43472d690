/**
 * Whether a place is inside the exact wheel: within the outline and outside bore and windows. Only asked of the cutter's
 * axis, so that a cut that never comes near an outline, deep inside a tooth or the rim, is still seen.
 *
 * The flank's half angle at each radius is read between points of the exact pieces, closer than anything this has to tell
 * apart: an axis near the outline itself has already been found by the deviation.
 */
import { pointOn } from '../geometry/on-piece.ts';
import type { Loop } from '../geometry/piece.ts';
import { add, angleOf, norm, ORIGIN, turnPoint, type Point } from '../geometry/point.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import type { Worst } from './deviation-contour.ts';
import type { SolidMoves } from './metal-solids.ts';

export interface WheelBody {
  readonly form: WheelForm;
  readonly boreRadius: number;
  readonly crossings: Crossings | undefined;
  /** Half angle of the tooth at radii evenly spread from root to tip. */
  readonly half: Float64Array;
  readonly window: readonly Point[];
  /** Polar angle of the window's middle. */
  readonly windowAngle: number;
  /** Points of one pitch of the outline. */
  readonly sector: readonly Point[];
}

const STEPS = 32;

export function wheelBody(form: WheelForm, bore: number, crossings: Crossings | undefined): WheelBody {
  const risen = form.sector.slice(0, Math.ceil(form.sector.length / 2));
  const side = risen
    .filter(({ role }) => role !== 'root' && role !== 'land')
    .flatMap(({ piece }) => pointsOn(piece));
  const window = crossings === undefined ? [] : loopPoints(crossings.window);
  return {
    form,
    boreRadius: bore / 2,
    crossings,
    half: halfAngles(form, side),
    window,
    windowAngle: angleOf(window.reduce(add, ORIGIN)),
    sector: loopPoints(form.sector.map(({ piece }) => piece)),
  };
}

export function loopPoints(loop: Loop): Point[] {
  return loop.flatMap((piece) => pointsOn(piece).slice(0, -1));
}

function pointsOn(piece: Loop[number]): Point[] {
  const steps = piece.kind === 'line' ? 1 : STEPS;
  return Array.from({ length: steps + 1 }, (_, k) => pointOn(piece, k / steps));
}

export function isInsideWheel(body: WheelBody, x: number, y: number): boolean {
  const rho = Math.sqrt(x * x + y * y);
  if (rho < body.boreRadius || rho >= body.form.outsideRadius) {
    return false;
  }
  if (rho > body.form.rootRadius) {
    const pitch = (2 * Math.PI) / body.form.proportions.teeth;
    const angle = Math.atan2(y, x);
    return Math.abs(angle - pitch * Math.round(angle / pitch)) < halfAngle(body, rho);
  }
  return !isInWindow(body, rho, x, y);
}

const TABLE = 256;

function halfAngles(form: WheelForm, side: readonly Point[]): Float64Array {
  const table = new Float64Array(TABLE + 1);
  let k = 1;
  for (let i = 0; i <= TABLE; i++) {
    const rho = form.rootRadius + (i / TABLE) * (form.outsideRadius - form.rootRadius);
    while (k < side.length - 1 && norm(side[k]!) < rho) {
      k++;
    }
    const [low, high] = [norm(side[k - 1]!), norm(side[k]!)];
    const share = high > low ? Math.min(1, Math.max(0, (rho - low) / (high - low))) : 0;
    const from = Math.abs(angleOf(side[k - 1]!));
    table[i] = from + share * (Math.abs(angleOf(side[k]!)) - from);
  }
  return table;
}

function halfAngle({ form, half }: WheelBody, rho: number): number {
  const at = (TABLE * (rho - form.rootRadius)) / (form.outsideRadius - form.rootRadius);
  return half[Math.min(TABLE, Math.max(0, Math.round(at)))]!;
}

function isInWindow(body: WheelBody, rho: number, x: number, y: number): boolean {
  const { crossings, window, windowAngle } = body;
  if (crossings === undefined || rho < crossings.windowInner || rho > crossings.windowOuter) {
    return false;
  }
  const pitch = (2 * Math.PI) / crossings.count;
  const angle = -pitch * Math.round((Math.atan2(y, x) - windowAngle) / pitch);
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  return isInPolygon(window, x * c - y * s, x * s + y * c);
}

export function isInWindowAt(body: WheelBody, x: number, y: number): boolean {
  return isInWindow(body, Math.hypot(x, y), x, y);
}

/** Crossings of a ray to +X, counted. */
export function isInPolygon(polygon: readonly Point[], x: number, y: number): boolean {
  let inside = false;
  let previous = polygon[polygon.length - 1]!;
  for (const point of polygon) {
    if (point.y > y !== previous.y > y) {
      const at = previous.x + ((y - previous.y) / (point.y - previous.y)) * (point.x - previous.x);
      inside = at > x ? !inside : inside;
    }
    previous = point;
  }
  return inside;
}

/**
 * The deepest cut whose axis is inside the wheel, if there is one. Moves are asked at both ends: one that crosses an
 * outline on its way is already found there. Places are asked once, however often a cutter comes by below `top`.
 */
export function deepestInside(body: WheelBody, solids: SolidMoves, top: number): Worst | undefined {
  const { count, x0, y0, z0, x1, y1, z1, radius, twin } = solids;
  // By place: 1 asked at its start, 2 at its end.
  const asked = new Uint8Array(count);
  let worst: Worst | undefined;
  const ask = (i: number, x: number, y: number): void => {
    if (isInsideWheel(body, x, y)) {
      const value = radius[i]! + depthInside(body, x, y);
      worst =
        worst === undefined || value > worst.value ? { value, copy: 0, x, y, move: solids.moves[i] } : worst;
    }
  };
  for (let i = 0; i < count; i++) {
    const k = twin[i]!;
    const was = asked[k]!;
    if (was === 3) {
      continue;
    }
    // The end of the move before is the start of this one, and has been asked already.
    const follows = i > 0 && x1[i - 1] === x0[i] && y1[i - 1] === y0[i] && z1[i - 1]! < top;
    if (z0[i]! < top && !follows && (was & 1) === 0) {
      asked[k] = was | 1;
      ask(i, x0[i]!, y0[i]!);
    }
    if (z1[i]! < top && (was & 2) === 0) {
      asked[k] = asked[k]! | 2;
      ask(i, x1[i]!, y1[i]!);
    }
  }
  return worst;
}

/** About how far inside: the distance to the nearest outline, from points along it. */
function depthInside(body: WheelBody, x: number, y: number): number {
  const rho = Math.hypot(x, y);
  const pitch = (2 * Math.PI) / body.form.proportions.teeth;
  const tooth = Math.round(Math.atan2(y, x) / pitch);
  let least = body.boreRadius > 0 ? rho - body.boreRadius : Infinity;
  const hold = (points: readonly Point[], turn: number): void => {
    for (const point of points) {
      const at = turnPoint(point, turn);
      least = Math.min(least, Math.hypot(at.x - x, at.y - y));
    }
  };
  for (let k = tooth - 1; k <= tooth + 1; k++) {
    hold(body.sector, k * pitch);
  }
  const count = body.crossings?.count ?? 0;
  for (let k = 0; k < count; k++) {
    hold(body.window, (2 * Math.PI * k) / count);
  }
  return Math.max(0, least);
}
