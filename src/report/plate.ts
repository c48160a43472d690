/**
 * The frame every plate shares: so many millimetres of paper, the work drawn to a scale on it, a scale bar.
 * The work stands in its own millimetres with Y up, in a group that is scaled and turned over; lines, figures and words beside
 * it are in millimetres of paper with Y down, the work's zero at (0, 0).
 */
import { millimetresPer, type LengthUnit } from '../base/units.ts';
import { shortUnit } from './lengths.ts';
import { escapeText, plain } from './words.ts';

export interface PlateFrame {
  /** Edges in millimetres of paper, Y down: top is less than bottom. */
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** Paper over work: 4 is drawn four times its size. */
  readonly scale: number;
}

/** Width of the page's text, mm. */
export const PAPER = 170;
/** The two weights of line, mm of paper. */
export const HEAVY = 0.25;
export const LIGHT = 0.12;
/** Height of the letters, mm of paper. */
export const LETTER = 3;

/** Scales a draughtsman would use. */
const SCALES: readonly number[] = [
  1000, 500, 400, 300, 250, 200, 150, 100, 80, 60, 50, 40, 30, 25, 20, 15, 12, 10, 8, 6, 5, 4, 3, 2.5, 2, 1.5,
  1.25, 1, 0.8, 0.6, 0.5, 0.4, 0.3, 0.25, 0.2, 0.15, 0.1, 0.05,
];

/** The largest of them at which `extent` mm of work fit on `paper` mm. */
export function scaleToFit(extent: number, paper: number): number {
  return SCALES.find((scale) => scale * extent <= paper) ?? paper / extent;
}

/** "4 : 1", "1 : 2". */
export function scaleWords(scale: number): string {
  return scale >= 1 ? `${plain(scale, 2)} : 1` : `1 : ${plain(1 / scale, 2)}`;
}

/** `body` in millimetres of the work, Y up; `marks` in millimetres of paper, Y down. */
export function plateSvg(frame: PlateFrame, name: string, body: string, marks: string): string {
  const width = plain(frame.right - frame.left, 2);
  const height = plain(frame.bottom - frame.top, 2);
  const scale = plain(frame.scale, 6);
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" class="plate" role="img" aria-label="${escapeText(name)}" ` +
    `viewBox="${plain(frame.left, 2)} ${plain(frame.top, 2)} ${width} ${height}" width="${width}mm" height="${height}mm" font-size="${LETTER}">` +
    `<g data-scale="${scale}" transform="scale(${scale} -${scale})" fill="none" stroke-linejoin="round" stroke-width="${onWork(frame, HEAVY)}">${body}</g>` +
    `<g stroke-width="${LIGHT}">${marks}</g></svg>`
  );
}

/** A length of paper in millimetres of the work, for widths of lines and dashes. */
export function onWork(frame: PlateFrame, paper: number): string {
  return plain(paper / frame.scale, 6);
}

/** A dash-dot line's dashes in millimetres of the work. */
export function axisDashes(frame: PlateFrame): string {
  return [3.2, 0.9, 0.5, 0.9].map((length) => onWork(frame, length)).join(' ');
}

/** A bar of a round length with its figure, its left end at (x, y) of the paper. */
export function scaleBar(frame: PlateFrame, x: number, y: number, unit: LengthUnit = 'mm'): string {
  const perUnit = millimetresPer(unit);
  const length = SCALES.toReversed().find((candidate) => candidate * perUnit * frame.scale >= 15) ?? 1;
  const paper = length * perUnit * frame.scale;
  return (
    `<path class="line" data-figure="scale-bar" data-value="${plain(length * perUnit, 6)}" d="M${plain(x, 2)} ${plain(y - 1, 2)}v2m0 -1h${plain(paper, 3)}m0 -1v2"/>` +
    `<text x="${plain(x + paper + 1.5, 2)}" y="${plain(y + 1, 2)}">${plain(length, 3)} ${shortUnit(unit)}</text>`
  );
}
