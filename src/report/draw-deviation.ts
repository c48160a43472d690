/**
 * Plate III: how far the cut flank lies from the exact curve, along the worst tooth from the middle of the root to the tip,
 * magnified. Up is metal left, down is metal cut away; the band is what is allowed. mm along, micrometres up.
 */
import type { DeviationPoint } from '../prove/proof.ts';
import { linearScale, linePath, type Scale } from './plot.ts';
import { escapeText, fixed, plain } from './words.ts';

export interface DeviationPlate {
  readonly points: readonly DeviationPoint[];
  /** The allowed deviation on the flank, mm. */
  readonly allowed: number;
  /** Radius of the flank's foot, and of the pitch circle, mm: marked on the axis. */
  readonly footRadius: number;
  readonly pitchRadius: number;
}

const WIDTH = 170;
const HEIGHT = 62;
const LEFT = 16;
const RIGHT = 168;
const TOP = 6;
const BOTTOM = 50;

export function drawDeviation(plate: DeviationPlate): string {
  const { points, allowed } = plate;
  const first = points[0];
  const last = points.at(-1);
  if (first === undefined || last === undefined) {
    return '';
  }
  const most = Math.max(allowed * 1.6, ...flank(plate).map((point) => Math.abs(point.deviation) * 1.15));
  const x = linearScale([first.along, last.along], [LEFT, RIGHT], 8);
  const y = linearScale([-most * 1000, most * 1000], [BOTTOM, TOP], 5);
  const curve = points.map((point): [number, number] => [
    x.at(point.along),
    clamp(y.at(point.deviation * 1000)),
  ]);
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" role="img" aria-label="Deviation of the cut flank" viewBox="0 0 ${WIDTH} ${HEIGHT}" width="${WIDTH}mm" height="${HEIGHT}mm" font-size="3">` +
    `<rect class="band" x="${LEFT}" width="${RIGHT - LEFT}" y="${plain(y.at(allowed * 1000), 3)}" height="${plain(y.at(-allowed * 1000) - y.at(allowed * 1000), 3)}"/>` +
    axes(x, y) +
    circles(plate, x) +
    `<path class="deviation" data-figure="deviation" data-worst="${fixed(worst(plate) * 1000, 3)}" d="${linePath(curve)}"/>` +
    `</svg>`
  );
}

/** The points from the foot out: the flank proper. */
function flank(plate: DeviationPlate): readonly DeviationPoint[] {
  const above = plate.points.filter((point) => point.radius >= plate.footRadius);
  return above.length > 0 ? above : plate.points;
}

function worst(plate: DeviationPlate): number {
  return flank(plate).reduce(
    (most, point) => (Math.abs(point.deviation) > Math.abs(most) ? point.deviation : most),
    0,
  );
}

/** Metal left at the root goes off the paper: it is drawn at the edge. */
function clamp(y: number): number {
  return Math.min(Math.max(y, TOP), BOTTOM);
}

function axes(x: Scale, y: Scale): string {
  const zero = plain(y.at(0), 3);
  const marksX = x.ticks
    .map(
      (tick) =>
        `<path class="thin" d="M${plain(x.at(tick), 3)} ${BOTTOM}v1.2"/><text text-anchor="middle" x="${plain(x.at(tick), 3)}" y="${BOTTOM + 4.6}">${plain(tick, 2)}</text>`,
    )
    .join('');
  const marksY = y.ticks
    .map(
      (tick) =>
        `<path class="thin" d="M${LEFT} ${plain(y.at(tick), 3)}h-1.2"/><text text-anchor="end" x="${LEFT - 2}" y="${plain(y.at(tick) + 1, 3)}">${tick > 0 ? '+' : ''}${plain(tick, 2)}</text>`,
    )
    .join('');
  return (
    `<path class="thin" d="M${LEFT} ${TOP}V${BOTTOM}H${RIGHT}"/><path class="thin" d="M${LEFT} ${zero}H${RIGHT}"/>${marksX}${marksY}` +
    `<text x="1" y="${TOP - 1}">µm</text><text text-anchor="end" x="${RIGHT}" y="${BOTTOM + 9}">mm along the tooth, from the middle of the space to the tip</text>` +
    `<text x="${LEFT + 1.5}" y="${TOP + 2.5}" class="soft">metal left</text><text x="${LEFT + 1.5}" y="${BOTTOM - 1}" class="soft">cut away</text>`
  );
}

function circles(plate: DeviationPlate, x: Scale): string {
  const mark = (radius: number, name: string): string => {
    const point = plate.points.find((candidate) => candidate.radius >= radius);
    if (point === undefined) {
      return '';
    }
    const at = plain(x.at(point.along), 3);
    return `<path class="thin dashed" d="M${at} ${TOP}V${BOTTOM}"/><text x="${at}" dx="0.8" y="${TOP + 2.5}">${escapeText(name)}</text>`;
  };
  return mark(plate.footRadius, 'foot') + mark(plate.pitchRadius, 'pitch circle');
}
