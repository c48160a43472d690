/** Closed polygons (the last corner joins the first): area, inside, and the distance from a point. mm. */
import type { Point } from './point.ts';
import { distanceToSegment } from './sleeve.ts';

/** Positive where the ring runs counter-clockwise. */
export function ringArea(ring: readonly Point[]): number {
  let sum = 0;
  let before = ring.at(-1);
  for (const point of ring) {
    sum += before === undefined ? 0 : before.x * point.y - before.y * point.x;
    before = point;
  }
  return sum / 2;
}

/** Whether the ring goes round the point, by counting crossings of the ray to +X. */
export function holdsPoint(ring: readonly Point[], point: Point): boolean {
  let inside = false;
  let a = ring.at(-1) as Point;
  for (const b of ring) {
    if (a.y > point.y !== b.y > point.y) {
      const x = a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x);
      inside = x > point.x ? !inside : inside;
    }
    a = b;
  }
  return inside;
}

/** Without a corner that repeats the one before it, the first after the last included. */
export function cleanRing(ring: readonly Point[]): Point[] {
  return ring.filter((point, i) => {
    const before = ring[(i + ring.length - 1) % ring.length] as Point;
    return point.x !== before.x || point.y !== before.y;
  });
}

/** The least distance from a point to the edges of a ring. */
export function distanceToRing(ring: readonly Point[], point: Point): number {
  let best = Infinity;
  let before = ring.at(-1) as Point;
  for (const corner of ring) {
    const off = distanceToSegment(point, before, corner);
    best = off < best ? off : best;
    before = corner;
  }
  return best;
}
