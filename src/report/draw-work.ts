/**
 * The plate of the work: the wheel in its stock with the channels that the cutters clear and the paths of their centres, and
 * round it the dial of the time it takes. What the proof found at a place is ringed in red.
 */
import { DIAL_WIDTH, drawDial, isRoughPass } from './dial.ts';
import { drawMetal, SAME_METAL } from './draw-metal.ts';
import type { SheetFacts } from './facts.ts';
import { pathReach, type PassPath } from './pass-paths.ts';
import {
  axisDashes,
  LIGHT,
  onWork,
  PAPER,
  plateSvg,
  scaleBar,
  scaleToFit,
  type PlateFrame,
} from './plate.ts';
import { capitalised, coordinate, duration, escapeText, numeral, plain } from './words.ts';

/** Stock that is shown outside the paths, mm of paper. */
const STOCK = 2.5;
/** Width on the sheet, mm of paper. Why: programs, plate and passes stand on one page of A4. */
const ON_SHEET = 140;
const LEGEND_LINE = 4.4;
const COLUMNS = 3;

export interface WorkPlate {
  readonly svg: string;
  readonly scale: number;
}

/** `metal`: drawn here with a legend, or already drawn elsewhere in the page, whose table of passes is the legend. */
export function drawWork(facts: SheetFacts, metal: 'here' | 'elsewhere'): WorkPlate {
  const { paths } = facts;
  const widest = Math.max(0, ...facts.job.setup.cutters.map(({ diameter }) => diameter / 2));
  const reach = Math.max(facts.form.outsideRadius, pathReach(paths) + widest);
  const dialWidth = facts.passes.length > 0 ? DIAL_WIDTH : 0;
  const paper = metal === 'here' ? PAPER : ON_SHEET;
  const scale = scaleToFit(2 * reach, paper - 2 * (STOCK + dialWidth));
  const inside = reach * scale + STOCK;
  const half = inside + dialWidth + 0.5;
  const rows = metal === 'here' ? Math.ceil(facts.passes.length / COLUMNS) : 0;
  const frame: PlateFrame = {
    left: -paper / 2,
    right: paper / 2,
    top: -half,
    bottom: half + 2 + rows * LEGEND_LINE,
    scale,
  };
  const body =
    stock(facts, inside / scale) +
    channels(facts, paths, frame, metal) +
    axes(facts, frame) +
    places(facts, frame);
  const marks =
    drawDial(facts.passes, inside) +
    toothOne(facts, frame) +
    (metal === 'here' ? legend(facts, half + 4) : '') +
    scaleBar(frame, frame.left + 1, -half + 2, facts.job.length);
  return {
    svg: plateSvg(frame, 'The work: the paths of the cutters, and the minutes they take', body, marks),
    scale,
  };
}

/** The blank, as far as the dial leaves it to be seen. */
function stock({ job }: SheetFacts, radius: number): string {
  const { shape } = job.setup;
  const clip = `<defs><clipPath id="dial-inside"><circle r="${coordinate(radius)}"/></clipPath></defs>`;
  const d =
    shape.kind === 'sheet'
      ? `<rect x="${coordinate(-shape.width / 2)}" y="${coordinate(-shape.height / 2)}" width="${coordinate(shape.width)}" height="${coordinate(shape.height)}"/>`
      : `<circle r="${coordinate(shape.diameter / 2)}"/>`;
  return `${clip}<g class="stock" clip-path="url(#dial-inside)">${d}</g>`;
}

/** Channels of paper through the stock, as wide as the cutter; the wheel; the paths of the centres. A spring pass lies on finishing. */
function channels(
  facts: SheetFacts,
  paths: readonly PassPath[],
  frame: PlateFrame,
  metal: 'here' | 'elsewhere',
): string {
  const drawn = new Set<string>();
  const ways: string[] = [];
  const lines: string[] = [];
  for (const path of paths) {
    const { d } = path;
    if (d === '' || drawn.has(d)) {
      continue;
    }
    drawn.add(d);
    const id = `way-${drawn.size}`;
    const width = facts.job.setup.cutters.find(({ number }) => number === path.cutter)?.diameter ?? 0;
    const kind = isRoughPass(path.pass) ? 'rough' : 'fine';
    // The path itself has no width, so that whoever points at it gives it one.
    ways.push(
      `<g stroke-width="${coordinate(width)}"><path id="${id}" data-pass="${escapeText(path.pass)}" d="${d}"/></g>`,
    );
    lines.push(`<use class="${kind}" href="#${id}"/>`);
  }
  const { form, crossings, job } = facts;
  const wheel =
    metal === 'elsewhere'
      ? `<g class="metal">${SAME_METAL}</g>`
      : drawMetal({
          form,
          sector: form.sector,
          bore: job.wheel.bore,
          ...(crossings === undefined ? {} : { crossings }),
        });
  return `<g class="channel">${ways.join('')}</g>${wheel}<g class="way" stroke-width="${onWork(frame, LIGHT)}">${lines.join('')}</g>`;
}

function axes({ form }: SheetFacts, frame: PlateFrame): string {
  const arm = coordinate(form.outsideRadius + 2 / frame.scale);
  return `<path class="axis" stroke-width="${onWork(frame, LIGHT)}" stroke-dasharray="${axisDashes(frame)}" d="M-${arm} 0H${arm}M0 -${arm}V${arm}"/>`;
}

/** Where the proof found something. */
function places({ proof }: SheetFacts, frame: PlateFrame): string {
  const found = (proof?.findings ?? []).filter(
    ({ severity, x, y }) => severity === 'error' && x !== undefined && y !== undefined,
  );
  const radius = onWork(frame, 2);
  return found
    .slice(0, MOST_PLACES)
    .map(
      ({ x = 0, y = 0 }) =>
        `<circle class="danger-ring" stroke-width="${onWork(frame, 0.4)}" cx="${coordinate(x)}" cy="${coordinate(y)}" r="${radius}"/>`,
    )
    .join('');
}

const MOST_PLACES = 40;

function toothOne({ form }: SheetFacts, frame: PlateFrame): string {
  const x = (form.rootRadius - 0.6) * frame.scale;
  return `<text class="halo" text-anchor="end" x="${plain(x, 2)}" y="-1">1</text>`;
}

/** Numeral, name and time of each pass, in columns. */
function legend({ passes }: SheetFacts, top: number): string {
  const rows = Math.ceil(passes.length / COLUMNS);
  return passes
    .map((pass, i) => {
      const x = -PAPER / 2 + (Math.floor(i / rows) * PAPER) / COLUMNS;
      const y = top + (i % rows) * LEGEND_LINE;
      return (
        `<text class="legend numeral" text-anchor="end" x="${plain(x + 7, 2)}" y="${plain(y, 2)}">${numeral(i + 1)}</text>` +
        `<text class="legend" x="${plain(x + 9, 2)}" y="${plain(y, 2)}">${escapeText(capitalised(pass.name))}, ${duration(pass.seconds)}</text>`
      );
    })
    .join('');
}
