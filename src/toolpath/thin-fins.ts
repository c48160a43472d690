/**
 * A space little wider than two slots of the roughing cutter would keep a thin fin between them, in a sheet a foil that
 * stands alone up to the mouth. There the loop goes from the root out along the middle of the space and back.
 *
 * In  : the form, the roughing path, cutter radius. Out: the path with that stretch in it, nothing where no thin fin stands.
 * On the middle line, at radius x, the fin is 2 (clearance(x) - distance - r) thick. Wheel frame, mm.
 */
import { partOf, turnChain } from '../geometry/change-piece.ts';
import { nearestOnChain } from '../geometry/nearest-on-piece.ts';
import { endOf, startOf } from '../geometry/on-piece.ts';
import type { ArcPiece, LinePiece } from '../geometry/piece.ts';
import { norm, scale, type Point } from '../geometry/point.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import type { PathPiece, PitchPath } from './pitch-path.ts';

/** Thinner than this share of the cutter's diameter a fin bends and sings; longer than so many times that it is no stump. Judgement. */
const THIN = 0.5;
const SLENDER = 2;
/** The middle line is looked at in steps of this share of the cutter's radius. */
const LOOK = 0.2;

export function downTheMiddle(form: WheelForm, path: PitchPath, radius: number): PitchPath | undefined {
  const out = endOfFin(form, path.distance, radius);
  const first = path.rest.findIndex(({ role }) => role === 'root');
  const last = path.rest.findLastIndex(({ role }) => role === 'root');
  if (out === undefined || first < 0) {
    return undefined;
  }
  const roots = path.rest.slice(first, last + 1);
  const half = Math.floor(roots.length / 2);
  const split = roots.length % 2 === 1 ? roots[half] : undefined;
  const before = [...roots.slice(0, half), ...(split ? [partly(split, 0, 0.5)] : [])];
  const after = [...(split ? [partly(split, 0.5, 1)] : []), ...roots.slice(roots.length - half)];
  const middle = startOf((after[0] as PathPiece).piece);
  const end = scale(middle, out / norm(middle));
  if (norm(middle) >= out) {
    return undefined;
  }
  const next = (roots[half] as PathPiece).next;
  const spur = [line(middle, end, next), line(end, endOf((before.at(-1) as PathPiece).piece), next)];
  const rest = [...path.rest.slice(0, first), ...before, ...spur, ...after, ...path.rest.slice(last + 1)];
  return { ...path, rest };
}

function partly(part: PathPiece, from: number, to: number): PathPiece {
  return { ...part, piece: partOf(part.piece, from, to) as LinePiece | ArcPiece };
}

function line(from: Point, to: Point, next: boolean): PathPiece {
  return { role: 'root', piece: { kind: 'line', from, to }, next };
}

/** The radius at which the fin is thick enough to stand, or the tip circle; nothing where it is a stump, or none. */
function endOfFin(form: WheelForm, distance: number, radius: number): number | undefined {
  // Both sides of a space are alike: the tooth after it will do.
  const wall = turnChain(
    form.sector.slice(0, Math.ceil(form.sector.length / 2)).map(({ piece }) => piece),
    Math.PI / form.proportions.teeth,
  );
  const thin = THIN * 2 * radius;
  let begins: number | undefined;
  let x = form.rootRadius + distance;
  for (; x < form.outsideRadius; x += LOOK * radius) {
    const thick = 2 * ((nearestOnChain(wall, { x, y: 0 })?.distance ?? 0) - distance - radius);
    begins ??= thick > 0 ? x : undefined;
    if (thick >= thin) {
      break;
    }
  }
  return begins !== undefined && x - begins > SLENDER * thin ? x : undefined;
}
