/**
 * Dimension lines in the manner of a drawing office: extension lines, a line between two slim arrows, the figure on it.
 * All in millimetres of paper, Y down. Each carries `data-figure` and `data-value` (mm), and its line the same length to scale,
 * so that what is drawn can be held against what is said.
 */
import type { Point } from '../geometry/point.ts';
import { LETTER } from './plate.ts';
import { escapeText, fixed, plain } from './words.ts';

export interface Dimension {
  readonly figure: string;
  /** mm of the work. */
  readonly value: number;
  /** What stands on the line. */
  readonly text: string;
  readonly from: Point;
  readonly to: Point;
}

/** Mean width of a letter over its height, of a book face. */
const LETTER_WIDTH = 0.5;
const ARROW = 2.2;
const HALF = 0.38;

export function widthOf(text: string): number {
  return text.length * LETTER * LETTER_WIDTH;
}

/** Level, with the figure above the line; where it does not fit between the arrows, outside to the right, or over both at `over`. */
export function levelDimension(dimension: Dimension, over?: number): string {
  const { from, to, text } = dimension;
  const fits = widthOf(text) + 2 <= Math.abs(to.x - from.x);
  const middle = (from.x + to.x) / 2;
  const figure =
    fits || over !== undefined
      ? words(text, middle, fits ? from.y - 1.2 : (over ?? from.y), 'middle')
      : words(text, Math.max(from.x, to.x) + 6, from.y + 1, 'start');
  return wrap(dimension, line(dimension, fits), figure);
}

/** Upright, the figure read from the right, on the left of the line. */
export function uprightDimension(dimension: Dimension): string {
  const { from, to, text } = dimension;
  const roomy = Math.abs(to.y - from.y) > 4 * ARROW;
  const x = from.x - 1.2;
  const y = (from.y + to.y) / 2;
  return wrap(dimension, line(dimension, roomy), turned(text, x, y));
}

/** Between arrows that point at one another from outside, with the figure at the end of the tail behind `from`. */
export function pinchedDimension(
  dimension: Dimension,
  tail: number,
  anchor: 'start' | 'middle' | 'end',
): string {
  const { from, to, text } = dimension;
  const way = direction(to, from);
  const end = { x: from.x + way.x * (tail + 1.2), y: from.y + way.y * (tail + 1.2) };
  const y = end.y + (way.y < -0.5 ? -0.4 : way.y > 0.5 ? LETTER - 0.4 : 1);
  const beside = Math.abs(way.y) > 0.5 ? { start: 0.8, middle: 0, end: -0.8 }[anchor] : undefined;
  return wrap(dimension, line(dimension, false, tail), words(text, end.x + (beside ?? 0), y, anchor));
}

function wrap({ figure, value }: Dimension, path: string, text: string): string {
  return `<g data-figure="${figure}" data-value="${fixed(value, 6)}">${path}${text}</g>`;
}

/** The measuring line, and its arrows: inside pointing out where there is room, else outside pointing in. */
function line({ from, to }: Dimension, inside: boolean, tail = 5): string {
  const way = direction(from, to);
  const back = { x: -way.x, y: -way.y };
  const measured = `<path class="line measured" d="M${spot(from)}L${spot(to)}"/>`;
  const heads = inside
    ? arrowHead(from, way) + arrowHead(to, back)
    : arrowHead(from, back) +
      arrowHead(to, way) +
      `<path class="line" d="M${spot(from)}L${spot(along(from, back, tail))}M${spot(to)}L${spot(along(to, way, tail))}"/>`;
  return measured + heads;
}

/** Its point at `tip`, the shaft going `way`. */
export function arrowHead(tip: Point, way: Point): string {
  const end = along(tip, way, ARROW);
  const side = { x: -way.y * HALF, y: way.x * HALF };
  return `<path class="arrow" d="M${spot(tip)}L${spot({ x: end.x + side.x, y: end.y + side.y })}L${spot({ x: end.x - side.x, y: end.y - side.y })}Z"/>`;
}

export function words(text: string, x: number, y: number, anchor = 'start', kind = ''): string {
  const name = kind === '' ? 'halo' : `halo ${kind}`;
  return `<text class="${name}" text-anchor="${anchor}" x="${plain(x, 2)}" y="${plain(y, 2)}">${escapeText(text)}</text>`;
}

/** Read from the right, centred on (x, y). */
export function turned(text: string, x: number, y: number): string {
  return `<text class="halo" text-anchor="middle" transform="translate(${plain(x, 2)} ${plain(y, 2)}) rotate(-90)">${escapeText(text)}</text>`;
}

export function spot({ x, y }: Point): string {
  return `${plain(x, 3)} ${plain(y, 3)}`;
}

function along(from: Point, way: Point, length: number): Point {
  return { x: from.x + way.x * length, y: from.y + way.y * length };
}

function direction(from: Point, to: Point): Point {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  return length > 0 ? { x: (to.x - from.x) / length, y: (to.y - from.y) / length } : { x: 1, y: 0 };
}
