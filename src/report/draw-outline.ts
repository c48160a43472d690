/**
 * `ogive draw`: the outline alone, to scale, with its circles, the sizes beside it and a scale bar: a drawing that can be
 * printed, measured and laid under a wheel. Arcs are arcs; cycloids are chords within a fifth of a micrometre.
 */
import { hair, plateSvg, scaleBar, scaleToFit, scaleWords, type PlateFrame } from './plate.ts';
import { loopsOf, type OutlineShape } from './outline-shape.ts';
import { SHEET_STYLE } from './sheet-style.ts';
import { chainPath } from './svg-path.ts';
import { bothUnits, escapeText, plain } from './words.ts';

const PAPER = 170;
const LINE = 5;

export function outlineSvg(shape: OutlineShape): string {
  const outside = shape.form.outsideRadius;
  const half = outside * 1.08;
  const scale = scaleToFit(2 * half, PAPER);
  const lines = sizeLines(shape, scale);
  const foot = ((lines.length + 3) * LINE) / scale;
  const frame: PlateFrame = { left: -half, right: half, bottom: -half - foot, top: half, scale };
  const d = loopsOf(shape).map(({ loop }) => chainPath(loop, true));
  const body = `<path class="metal" data-figure="outline" fill-rule="evenodd" stroke-width="${hair(frame, 0.18)}" d="${d.join('')}"/>${circles(shape, frame)}`;
  const labels = lines
    .map((line, i) => {
      const y = half + ((i + 1.4) * LINE) / scale;
      return `<text x="${plain(-half, 4)}" y="${plain(y, 4)}">${escapeText(line)}</text>`;
    })
    .join('');
  const bar = scaleBar(frame, -half, half + ((lines.length + 1.8) * LINE) / scale);
  const svg = plateSvg(frame, shape.title, body, labels + bar);
  const at = svg.indexOf('>') + 1;
  return `${svg.slice(0, at)}<title>${escapeText(shape.title)}</title><style>svg{background:#fbf8f1}${SHEET_STYLE}</style>${svg.slice(at)}\n`;
}

function sizeLines({ form, title, what, bore, crossings }: OutlineShape, scale: number): readonly string[] {
  const { teeth, module } = form.proportions;
  return [
    `${title}: ${what}, ${scaleWords(scale)}, millimetres`,
    `${teeth} teeth, module ${plain(module, 5)}; tip circle ${bothUnits(2 * form.outsideRadius)}, pitch circle ${bothUnits(2 * form.pitchRadius)}`,
    `root circle ${bothUnits(2 * form.rootRadius)}, tooth ${bothUnits(form.toothThickness)} thick along the pitch circle`,
    `${bore > 0 ? `bore ${bothUnits(bore)}` : 'no bore'}${crossings === undefined ? '' : `; ${crossings.count} crossings between ${bothUnits(2 * crossings.windowInner)} and ${bothUnits(2 * crossings.windowOuter)}`}`,
  ];
}

function circles({ form }: OutlineShape, frame: PlateFrame): string {
  const dash = `${hair(frame, 3)} ${hair(frame, 0.8)} ${hair(frame, 0.4)} ${hair(frame, 0.8)}`;
  const arm = plain(form.outsideRadius * 1.05, 4);
  return (
    `<circle class="construction" data-figure="pitch" r="${plain(form.pitchRadius, 4)}" stroke-width="${hair(frame, 0.1)}" stroke-dasharray="${dash}"/>` +
    `<path class="construction" stroke-width="${hair(frame, 0.1)}" d="M-${arm} 0H${arm}M0 -${arm}V${arm}"/>`
  );
}
