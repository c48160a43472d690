/**
 * One pitch of the exact outline as stations: flanks with their addenda from the foot out, the tip land, what lies below
 * the foot (which may not be entered), and beside it what a round cutter should leave there (the as-cut outline).
 * Frame of the form: tooth 1 on +X.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { partOf } from '../geometry/change-piece.ts';
import { pointOn } from '../geometry/on-piece.ts';
import type { Piece } from '../geometry/piece.ts';
import { norm } from '../geometry/point.ts';
import { asCut, type AsCut } from '../tooth/as-cut.ts';
import type { WheelForm, WheelPiece } from '../tooth/wheel.ts';
import { distanceToPiece } from './distance-to-piece.ts';
import { placeStations, REGION, type StationPiece, type Stations } from './deviation-stations.ts';
import type { Ring } from './metal-near.ts';

export function toothStations(form: WheelForm, cutterDiameter: number): Stations {
  const made = asCut(form, cutterDiameter);
  const cut = made.ok ? made.value : undefined;
  const foot = cut?.footRadius ?? form.rootRadius;
  const pieces = form.sector.flatMap((entry) => splitAtFoot(entry, foot));
  return placeStations([...pieces, ...rootPieces(cut, pieces)], cutterDiameter / 2);
}

export function toothRing(form: WheelForm): Ring {
  return {
    copies: form.proportions.teeth,
    inner: form.rootRadius,
    outer: form.outsideRadius,
    middle: 0,
  };
}

/**
 * A cutter that stands off both sides of a corner by e stands off along its middle by e / sin(half the corner): root circle and
 * flank meet at a right angle; a cutter wedged between two flanks sits in the angle of the space.
 */
export function rootFactor(form: WheelForm, cutterDiameter: number): number {
  const made = asCut(form, cutterDiameter);
  if (!made.ok || made.value.reachesRoot) {
    return Math.SQRT2;
  }
  const { teeth, tooth } = form.proportions;
  return 1 / Math.sin(((1 - tooth) * Math.PI) / teeth);
}

/** What the cutter leaves below the foot, each piece knowing how far it is from the exact outline. */
function rootPieces(cut: AsCut | undefined, exact: readonly StationPiece[]): StationPiece[] {
  if (cut === undefined) {
    return [];
  }
  const below = exact.filter(({ region }) => region === REGION.bare).map(({ piece }) => piece);
  const beyond = (x: number, y: number): number =>
    below.reduce((least, piece) => Math.min(least, distanceToPiece(piece, x, y)), Infinity);
  return cut.sector
    .filter(({ role, piece }) => role === 'root' || (role === 'fillet' && isBelow(piece, cut.footRadius)))
    .map(({ piece }) => ({ piece, region: REGION.root, rolled: false, beyond }));
}

function isBelow(piece: Piece, radius: number): boolean {
  return norm(pointOn(piece, 0.5)) < radius;
}

function splitAtFoot({ piece, role }: WheelPiece, foot: number): StationPiece[] {
  if (role === 'land') {
    return [{ piece, region: REGION.land, rolled: false }];
  }
  const rolled = role === 'addendum' && piece.kind === 'cycloid';
  const station = (part: Piece, above: boolean): StationPiece => ({
    piece: part,
    region: above ? REGION.flank : REGION.bare,
    rolled,
  });
  const low = norm(pointOn(piece, 0));
  const high = norm(pointOn(piece, 1));
  const above = (rho: number): boolean => rho >= foot - SAME_POINT;
  if (role === 'root' || role === 'fillet') {
    return [station(piece, false)];
  }
  if (above(low) === above(high)) {
    return [station(piece, above(low))];
  }
  const u = whereRadius(piece, foot);
  return [station(partOf(piece, 0, u), above(low)), station(partOf(piece, u, 1), above(high))];
}

/** u at which a piece that runs steadily outward or inward is at this radius. */
function whereRadius(piece: Piece, radius: number): number {
  const rising = norm(pointOn(piece, 1)) > norm(pointOn(piece, 0));
  let [a, b] = [0, 1];
  for (let k = 0; k < 60; k++) {
    const u = (a + b) / 2;
    const below = norm(pointOn(piece, u)) < radius;
    [a, b] = below === rising ? [u, b] : [a, u];
  }
  return (a + b) / 2;
}
