/**
 * `ogive draw`: the outline alone, to scale, with its sizes and a scale bar: a drawing that can be printed, measured and laid
 * under a wheel. Arcs are arcs; cycloids are arcs within a fifth of a micrometre.
 */
import { unitInWords } from './lengths.ts';
import { drawSizes } from './draw-sizes.ts';
import type { OutlineShape } from './outline-shape.ts';
import { scaleWords, type PlateFrame } from './plate.ts';
import { standAlone } from './stand-alone.ts';
import { capitalised, escapeText, plain } from './words.ts';

const LINE = 5;

export function outlineSvg(shape: OutlineShape): string {
  const { title, form, what, asCut } = shape;
  const unit = shape.unit ?? 'mm';
  const { teeth, module } = form.proportions;
  const words = (frame: PlateFrame): readonly string[] => [
    title,
    `${capitalised(what)}, ${scaleWords(frame.scale)}; figures in ${unitInWords(unit)}`,
    `${teeth} teeth, module ${plain(module, 5)} mm${asCut === undefined ? '' : '; below its foot the flank is rounder than the exact one, all else is as drawn'}`,
  ];
  const marks = (frame: PlateFrame): string =>
    words(frame)
      .map(
        (line, i) =>
          `<text x="${plain(frame.left + 1, 2)}" y="${plain(frame.bottom - (2.4 - i) * LINE, 2)}">${escapeText(line)}</text>`,
      )
      .join('');
  const { svg } = drawSizes({ ...shape, thickness: shape.thickness ?? 0, unit }, title, {
    height: 3 * LINE + 2,
    marks,
  });
  return standAlone(svg, `${title}: ${what}; coordinates in millimetres`);
}
