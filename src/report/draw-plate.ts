/**
 * NAME.svg: Plate I as a file of its own, with its look inside it, so that any viewer shows it: the wheel, the paths and the
 * dial, the scale bar, and a line that says what it shows.
 */
import { drawWheel } from './draw-wheel.ts';
import type { SheetFacts } from './facts.ts';
import { SHEET_STYLE } from './sheet-style.ts';
import { escapeText } from './words.ts';

export function drawPlate(facts: SheetFacts): string {
  const { svg } = drawWheel(facts);
  const at = svg.indexOf('>') + 1;
  const title = `<title>${escapeText(facts.job.title)}: ${facts.form.proportions.teeth} teeth, paths of the cutters' centres; millimetres</title>`;
  return `${svg.slice(0, at)}${title}<style>svg{background:#fbf8f1}${SHEET_STYLE}</style>${svg.slice(at)}\n`;
}
