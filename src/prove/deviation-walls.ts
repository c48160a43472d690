/**
 * Bore and windows as stations: walls with the metal on the left of travel, like every outline. A bore runs clockwise,
 * a window the other way round than the loop it is given as.
 */
import { reverseChain } from '../geometry/change-piece.ts';
import { pointOn } from '../geometry/on-piece.ts';
import { add, angleOf, norm, ORIGIN, scale } from '../geometry/point.ts';
import type { Crossings } from '../tooth/wheel.ts';
import { placeStations, REGION, type Stations } from './deviation-stations.ts';
import type { Ring } from './metal-near.ts';

export interface Wall {
  readonly stations: Stations;
  readonly ring: Ring;
}

export function boreWall(bore: number, cutterRadius: number): Wall {
  const radius = bore / 2;
  // In eight parts, so that the stations of a large bore stay close.
  const eighth = Math.PI / 4;
  const pieces = Array.from({ length: 8 }, (_, k) => ({
    piece: { kind: 'arc' as const, centre: ORIGIN, radius, start: -k * eighth, turn: -eighth },
    region: REGION.wall,
    rolled: false,
  }));
  return {
    stations: placeStations(pieces, cutterRadius),
    ring: { copies: 1, inner: 0, outer: radius, middle: 0 },
  };
}

export function windowWall(crossings: Crossings, cutterRadius: number): Wall {
  const pieces = reverseChain(crossings.window).map((piece) => ({
    piece,
    region: REGION.wall,
    rolled: false,
  }));
  const middles = crossings.window.map((piece) => pointOn(piece, 0.5));
  return {
    stations: placeStations(pieces, cutterRadius),
    ring: {
      copies: crossings.count,
      inner: Math.min(crossings.windowInner, ...middles.map(norm)),
      outer: Math.max(crossings.windowOuter, ...middles.map(norm)),
      middle: angleOf(scale(middles.reduce(add, ORIGIN), 1 / middles.length)),
    },
  };
}
