/** Points and vectors of the plane, in mm. Frame: whatever the caller's; angles grow counter-clockwise from +X. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export const ORIGIN: Point = { x: 0, y: 0 };

export function polar(radius: number, angle: number): Point {
  return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
}

export function add(a: Point, b: Point): Point {
  return { x: a.x + b.x, y: a.y + b.y };
}

export function subtract(a: Point, b: Point): Point {
  return { x: a.x - b.x, y: a.y - b.y };
}

export function scale(a: Point, factor: number): Point {
  return { x: a.x * factor, y: a.y * factor };
}

/** `a + factor * b`. */
export function addScaled(a: Point, b: Point, factor: number): Point {
  return { x: a.x + factor * b.x, y: a.y + factor * b.y };
}

export function dot(a: Point, b: Point): number {
  return a.x * b.x + a.y * b.y;
}

/** Positive where `b` lies counter-clockwise of `a`. */
export function cross(a: Point, b: Point): number {
  return a.x * b.y - a.y * b.x;
}

/** A plain root: the guards of `Math.hypot` against overflow cost ten times as much, and nothing here is so large. */
export function distance(a: Point, b: Point): number {
  const x = a.x - b.x;
  const y = a.y - b.y;
  return Math.sqrt(x * x + y * y);
}

export function norm(a: Point): number {
  return Math.sqrt(a.x * a.x + a.y * a.y);
}

export function unit(a: Point): Point {
  const length = norm(a);
  return { x: a.x / length, y: a.y / length };
}

/** A quarter turn counter-clockwise: the left normal of a heading. */
export function leftOf(a: Point): Point {
  return { x: -a.y, y: a.x };
}

export function angleOf(a: Point): number {
  return Math.atan2(a.y, a.x);
}

/** Turned about the origin. */
export function turnPoint(a: Point, angle: number): Point {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  return { x: a.x * c - a.y * s, y: a.x * s + a.y * c };
}

/** The same angle in (-pi, pi]. */
export function wrapAngle(angle: number): number {
  const turn = 2 * Math.PI;
  const wrapped = angle - turn * Math.floor((angle + Math.PI) / turn);
  return wrapped === -Math.PI ? Math.PI : wrapped;
}

/** The same angle in [0, 2 pi). */
export function wholeAngle(angle: number): number {
  const turn = 2 * Math.PI;
  const wrapped = angle - turn * Math.floor(angle / turn);
  return wrapped >= turn ? 0 : wrapped;
}
