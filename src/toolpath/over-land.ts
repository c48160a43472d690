/**
 * Paths that do not follow the lands: finishing a disc that is turned to its tip circle already, clear of them; and
 * roughing, round corner, land and corner in one arc.
 *
 * In  : the exact path of a pitch (its land runs at one cutter radius outside the tip circle). Out: the same with the arcs
 *       round the two tip corners left early, or left out, and one arc in place of the land's that touches what is beside
 *       it. mm, wheel frame.
 * Maths: tooth 1 lies on +X. The bridging arc's centre lies on +X and on the corner's normal at the angle beta where the
 *        corner c is left: centre = c + t e(beta), t = -c.y / sin(beta), radius = r - t. At the middle it runs
 *        R (cos g - 1 + sin g tan(beta / 2)) above the land's path, g being half the land's angle.
 */
import { turnPiece } from '../geometry/change-piece.ts';
import type { ArcPiece } from '../geometry/piece.ts';
import { norm } from '../geometry/point.ts';
import type { OffsetPiece } from './pitch-path.ts';

/** How much of a corner's sweep is not rolled, at most, in radians; and over the sweep. Judgement: some um of air over the land. */
const EARLY = 0.25;
const EARLY_SHARE = 0.3;

/**
 * The tip in one arc, from addendum to addendum, where that runs no more than `most` above the land's path: four blocks
 * become one, and a roughing cutter has no land to make.
 */
export function roundTip(path: TipPath, most: number): TipPath {
  const { corner, rest } = path;
  const isTip = (land?: OffsetPiece, other?: OffsetPiece): boolean =>
    land?.role === 'land' && other?.role === 'corner';
  const before = isTip(rest[0], rest[1]);
  if (!before && !isTip(rest.at(-1), rest.at(-2))) {
    return path;
  }
  const whole = before ? bridge(corner, -corner.start) : bridge(corner, corner.start + corner.turn);
  const above = whole.centre.x + whole.radius - norm(corner.centre) - corner.radius;
  return above <= most ? { corner: whole, rest: before ? rest.slice(2) : rest.slice(0, -2) } : path;
}

/** From -beta to beta about its centre, touching what the corner's arc, or its mirror image, touches at beta. */
function bridge({ centre, radius }: ArcPiece, beta: number): ArcPiece {
  const t = -Math.abs(centre.y / Math.sin(beta));
  return {
    kind: 'arc',
    centre: { x: centre.x + t * Math.cos(beta), y: 0 },
    radius: radius - t,
    start: -beta,
    turn: 2 * beta,
  };
}

export interface TipPath {
  readonly corner: ArcPiece;
  readonly rest: readonly OffsetPiece[];
}

export function overLand(path: TipPath, teeth: number, way: 1 | -1): TipPath {
  const { corner, rest } = path;
  const first = rest.at(-2);
  if (rest.at(-1)?.role !== 'land' || first?.role !== 'corner' || first.piece.kind !== 'arc') {
    return path;
  }
  const early = way * Math.min(EARLY, EARLY_SHARE * Math.abs(corner.turn));
  const beta = corner.start + early;
  const over = turnPiece(bridge(corner, beta), (way * 2 * Math.PI) / teeth);
  return {
    corner: { ...corner, start: beta, turn: corner.turn - early },
    rest: [
      ...rest.slice(0, -2),
      { ...first, piece: { ...first.piece, turn: first.piece.turn - early } },
      { role: 'land', piece: over, next: true },
    ],
  };
}
