/**
 * The metal of a wheel as one shape with holes: outline, bore, windows. mm of the work, Y up.
 * In a page it is drawn once, under the name `wheel`; other plates point at it.
 */
import { turnChain } from '../geometry/change-piece.ts';
import type { Crossings, WheelForm, WheelPiece } from '../tooth/wheel.ts';
import { chainPath, circlePath, teethPath } from './svg-path.ts';

export interface Metal {
  readonly form: WheelForm;
  /** The pitch that is drawn. */
  readonly sector: readonly WheelPiece[];
  readonly crossings?: Crossings;
  /** Diameter, 0 for none. */
  readonly bore: number;
}

export function drawMetal({ form, sector, crossings, bore }: Metal): string {
  const windows = Array.from({ length: crossings?.count ?? 0 }, (_, k) =>
    chainPath(turnChain(crossings?.window ?? [], (2 * Math.PI * k) / (crossings?.count ?? 1)), true),
  );
  const hole = bore > 0 ? circlePath(bore / 2) : '';
  const teeth = teethPath(sector, form.proportions.teeth);
  return `<g class="metal"><path id="wheel" data-figure="outline" fill-rule="evenodd" d="${teeth}${windows.join('')}${hole}"/></g>`;
}

/** The same shape again, in the look of the group round it. */
export const SAME_METAL = '<use href="#wheel"/>';
