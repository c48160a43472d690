/**
 * The frame every plate shares: a picture of so many millimetres of paper, its scale bar, and the line beneath that says
 * what it shows. Drawn in the work's millimetres with Y up; `scale` says how many millimetres of paper one of them takes.
 */
import { escapeText, plain } from './words.ts';

export interface PlateFrame {
  /** Millimetres of the work, from left to right and from bottom to top. */
  readonly left: number;
  readonly right: number;
  readonly bottom: number;
  readonly top: number;
  /** Paper over work: 4 is drawn four times its size. */
  readonly scale: number;
}

/** Scales a draughtsman would use. */
const SCALES: readonly number[] = [
  1000, 500, 400, 300, 250, 200, 150, 100, 80, 60, 50, 40, 30, 25, 20, 15, 12, 10, 8, 6, 5, 4, 3, 2.5, 2, 1.5,
  1, 0.5, 0.25, 0.2, 0.1, 0.05,
];

/** The largest of them at which `extent` mm of work fit on `paper` mm. */
export function scaleToFit(extent: number, paper: number): number {
  return SCALES.find((scale) => scale * extent <= paper) ?? paper / extent;
}

/** "4 : 1", "1 : 2". */
export function scaleWords(scale: number): string {
  return scale >= 1 ? `${plain(scale, 2)} : 1` : `1 : ${plain(1 / scale, 2)}`;
}

/**
 * An SVG whose user unit is one millimetre of the work, Y down as SVG has it; `body` is drawn Y up within a turned group,
 * `labels` stand upright (give them with Y down, already negated).
 */
export function plateSvg(frame: PlateFrame, name: string, body: string, labels: string): string {
  const width = frame.right - frame.left;
  const height = frame.top - frame.bottom;
  const box = `${plain(frame.left, 4)} ${plain(-frame.top, 4)} ${plain(width, 4)} ${plain(height, 4)}`;
  const paper = (length: number): string => plain(length * frame.scale, 2);
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" role="img" aria-label="${escapeText(name)}" viewBox="${box}" ` +
    `width="${paper(width)}mm" height="${paper(height)}mm" font-size="${plain(3 / frame.scale, 4)}">` +
    `<g transform="scale(1 -1)" fill="none" stroke-linejoin="round">${body}</g>${labels}</svg>`
  );
}

/** A hairline's width in millimetres of the work: `paper` mm on the page. */
export function hair(frame: PlateFrame, paper: number): string {
  return plain(paper / frame.scale, 5);
}

/** A bar of a round length with its figure, its left end at (x, y), Y down. */
export function scaleBar(frame: PlateFrame, x: number, y: number): string {
  const length = SCALES.toReversed().find((candidate) => candidate * frame.scale >= 15) ?? 1;
  const thin = hair(frame, 0.18);
  const tick = 1.2 / frame.scale;
  return (
    `<path d="M${plain(x, 4)} ${plain(y - tick, 4)}v${plain(2 * tick, 4)}m0 ${plain(-tick, 4)}h${plain(length, 4)}` +
    `m0 ${plain(-tick, 4)}v${plain(2 * tick, 4)}" fill="none" stroke="currentColor" stroke-width="${thin}"/>` +
    `<text x="${plain(x + length + 1.5 / frame.scale, 4)}" y="${plain(y + 1 / frame.scale, 4)}">${plain(length, 2)} mm</text>`
  );
}
