/**
 * The outline as DXF for other drawing programs: closed polylines on a layer for each kind, arcs as arcs (bulges), the
 * cycloids as tangent arcs within a tenth of a micrometre. Units are said in the header ($INSUNITS, 4 = millimetres).
 */
import { DxfWriter, LWPolylineFlags, point2d, Units, type LWPolylineVertex } from '@tarikjabiri/dxf';
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import { fitChain } from '../geometry/fit-chain.ts';
import { pointOn, startOf } from '../geometry/on-piece.ts';
import type { Loop } from '../geometry/piece.ts';
import { loopsOf, type OutlineShape } from './outline-shape.ts';

/** Colour numbers of the DXF format: 7 is the pen's own colour. */
const PEN = 7;
const LAYERS = { teeth: 'TEETH', bore: 'BORE', crossing: 'CROSSINGS' } as const;

export function outlineDxf(shape: OutlineShape): string {
  const dxf = new DxfWriter();
  dxf.setUnits(Units.Millimeters);
  for (const layer of Object.values(LAYERS)) {
    dxf.addLayer(layer, PEN, 'Continuous');
  }
  for (const { name, loop } of loopsOf(shape)) {
    dxf.addLWPolyline(verticesOf(fitChain(loop, PROOF_RESOLUTION)), {
      flags: LWPolylineFlags.Closed,
      layerName: LAYERS[name],
    });
  }
  return dxf.stringify();
}

/** A vertex at the start of each piece; the bulge, tan of a quarter of the turn, bends the way to the next. */
function verticesOf(loop: Loop): LWPolylineVertex[] {
  return loop.flatMap((piece) => {
    if (piece.kind !== 'arc') {
      const { x, y } = startOf(piece);
      return [{ point: point2d(x, y) }];
    }
    const parts = Math.abs(piece.turn) > Math.PI ? 2 : 1;
    return Array.from({ length: parts }, (_, i) => {
      const { x, y } = pointOn(piece, i / parts);
      return { point: point2d(x, y), bulge: Math.tan(piece.turn / parts / 4) };
    });
  });
}
