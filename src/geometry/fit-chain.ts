/** A chain in lines and arcs only: cycloids become tangent arcs within the tolerance, the rest stays as it is. mm. */
import { fitArcs } from './fit-arcs.ts';
import type { ArcPiece, Chain, LinePiece } from './piece.ts';

export function fitChain(chain: Chain, tolerance: number): readonly (ArcPiece | LinePiece)[] {
  return chain.flatMap((piece): readonly (ArcPiece | LinePiece)[] =>
    piece.kind === 'cycloid' ? fitArcs(piece, tolerance) : [piece],
  );
}
