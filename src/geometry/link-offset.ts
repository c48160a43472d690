/** What remains of an offset, put end to end: from a given start to a given end, or into closed loops. mm. */
import { SAME_POINT } from '../base/tolerances.ts';
import { partOf } from './change-piece.ts';
import { distance, type Point } from './point.ts';
import type { OffsetPiece } from './raw-offset.ts';
import type { Remaining } from './trim-offset.ts';

/** Meetings are found within SAME_POINT on each side. */
export function samePlace(a: Point, b: Point): boolean {
  return distance(a, b) <= 4 * SAME_POINT;
}

/** The parts from `first` on, until one ends where it should; undefined where the way is broken. */
export function linkUntil(
  parts: readonly Remaining[],
  first: Remaining,
  arrived: (end: Point) => boolean,
): Remaining[] | undefined {
  const way = [first];
  for (let at = first; !arrived(at.to);) {
    const next = successor(parts, at, way);
    if (next === undefined) {
      return undefined;
    }
    way.push(next);
    at = next;
  }
  return way;
}

/** Every closed way there is; `broken` counts the parts that belong to none. */
export function linkLoops(parts: readonly Remaining[]): { loops: Remaining[][]; broken: number } {
  const loops: Remaining[][] = [];
  let left = [...parts];
  let broken = 0;
  while (left.length > 0) {
    const first = left[0] as Remaining;
    const way = linkUntil(left, first, (end) => samePlace(end, first.from));
    if (way === undefined) {
      broken++;
      left = left.slice(1);
    } else {
      loops.push(way);
      left = left.filter((part) => !way.includes(part));
    }
  }
  return { loops, broken };
}

/** Of the parts that begin where this one ends, the longest by what it is part of; none is taken twice. */
function successor(
  parts: readonly Remaining[],
  at: Remaining,
  taken: readonly Remaining[],
): Remaining | undefined {
  let best: Remaining | undefined;
  for (const part of parts) {
    const joins = samePlace(at.to, part.from) && !taken.includes(part);
    if (joins && (best === undefined || reachOf(part) > reachOf(best))) {
      best = part;
    }
  }
  return best;
}

function reachOf(part: Remaining): number {
  return distance(part.from, part.to);
}

/** Neighbouring parts of one raw piece made one again. `closed`: the last may go on into the first. */
export function mergeParts(
  parts: readonly Remaining[],
  raw: readonly OffsetPiece[],
  closed: boolean,
): OffsetPiece[] {
  const merged: Remaining[] = [];
  for (const part of parts) {
    const before = merged.at(-1);
    if (before !== undefined && goesOn(before, part)) {
      merged[merged.length - 1] = joined(before, part, raw);
    } else {
      merged.push(part);
    }
  }
  const [first, last] = [merged[0], merged.at(-1)];
  if (closed && first !== undefined && last !== undefined && first !== last && goesOn(last, first)) {
    merged.splice(0, 1);
    merged[merged.length - 1] = joined(last, first, raw);
  }
  return merged.map(({ piece, source, between, part }) =>
    between === undefined ? { piece, source, part } : { piece, source, between, part },
  );
}

function goesOn(a: Remaining, b: Remaining): boolean {
  return a.raw === b.raw && a.at[1] === b.at[0];
}

function joined(a: Remaining, b: Remaining, raw: readonly OffsetPiece[]): Remaining {
  const at = [a.at[0], b.at[1]] as const;
  const whole = raw[a.raw] as OffsetPiece;
  return {
    ...a,
    piece: partOf(whole.piece, at[0], at[1]),
    part: [a.part[0], b.part[1]],
    at,
    to: b.to,
  };
}
