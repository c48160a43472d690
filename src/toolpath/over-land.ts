/**
 * The finishing path of a disc that is turned to its tip circle already: clear of the lands, which are not cut.
 *
 * In  : the exact path of a pitch (its land runs at one cutter radius outside the tip circle). Out: the same with the arcs
 *       round the two tip corners left early, and one arc in place of the land's that touches both. mm, wheel frame.
 * Maths: tooth 1 lies on +X. The bridging arc's centre lies on +X and on the corner's normal at the angle beta where the
 *        corner c is left: centre = c + t e(beta), t = -c.y / sin(beta), radius = r - t. At the middle it runs
 *        R (cos g - 1 + sin g tan(beta / 2)) above the land's path, g being half the land's angle.
 */
import { turnPiece } from '../geometry/change-piece.ts';
import type { ArcPiece } from '../geometry/piece.ts';
import type { OffsetPiece } from './pitch-path.ts';

/** How much of a corner's sweep is not rolled, at most, in radians; and over the sweep. Judgement: some um of air over the land. */
const EARLY = 0.25;
const EARLY_SHARE = 0.3;

interface TipPath {
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
  const t = -corner.centre.y / Math.sin(beta);
  const bridge: ArcPiece = {
    kind: 'arc',
    centre: { x: corner.centre.x + t * Math.cos(beta), y: 0 },
    radius: corner.radius - t,
    start: -beta,
    turn: 2 * beta,
  };
  const over = turnPiece(bridge, (way * 2 * Math.PI) / teeth);
  return {
    corner: { ...corner, start: beta, turn: corner.turn - early },
    rest: [
      ...rest.slice(0, -2),
      { ...first, piece: { ...first.piece, turn: first.piece.turn - early } },
      { role: 'land', piece: over, next: true },
    ],
  };
}
