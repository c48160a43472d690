/**
 * How far the cut flank lies from the exact curve, along the worst tooth from the middle of the space to the tip, magnified.
 * Up is metal left, down is metal cut away; the band is what is allowed. What the cutter cannot reach at the root goes off the
 * plate, with an arrow and its figure. mm along, micrometres up; mm of paper, Y down.
 */
import type { LengthUnit } from '../base/units.ts';
import { millimetresPer } from '../base/units.ts';
import type { DeviationPoint } from '../prove/proof.ts';
import { arrowHead, words } from './dimension.ts';
import { shortUnit, tinyLength, withMinus } from './lengths.ts';
import { LETTER, LIGHT } from './plate.ts';
import { linearScale, linePath, type Scale } from './plot.ts';
import { fixed, plain } from './words.ts';

export interface DeviationPlate {
  readonly points: readonly DeviationPoint[];
  /** The allowed deviation on the flank, mm. */
  readonly allowed: number;
  readonly leftAtRoot: number;
  /** Radius of the flank's foot, and of the pitch circle, mm: marked on the axis. */
  readonly footRadius: number;
  readonly pitchRadius: number;
  readonly unit: LengthUnit;
}

const WIDTH = 82;
const HEIGHT = 60;
const LEFT = 11;
const RIGHT = 79;
const TOP = 9;
const BOTTOM = 48;

export function drawDeviation(plate: DeviationPlate): string {
  const { points, allowed, unit } = plate;
  const first = points[0];
  const last = points.at(-1);
  if (first === undefined || last === undefined) {
    return '';
  }
  const per = millimetresPer(unit);
  const most =
    1000 * Math.max(allowed * 1.6, ...flank(plate).map(({ deviation }) => Math.abs(deviation) * 1.15));
  const x = linearScale([first.along / per, last.along / per], [LEFT, RIGHT], 6);
  const y = linearScale([-most, most], [BOTTOM, TOP], 5);
  const spots = points.map(({ along, deviation }): Spot => [x.at(along / per), y.at(deviation * 1000)]);
  const band = [y.at(allowed * 1000), y.at(-allowed * 1000)] as const;
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" class="plate" role="img" aria-label="Deviation of the cut flank from the exact curve" viewBox="0 0 ${WIDTH} ${HEIGHT}" width="${WIDTH}mm" height="${HEIGHT}mm" font-size="${LETTER}" stroke-width="${LIGHT}">` +
    `<rect class="band" data-figure="allowed" data-value="${fixed(allowed, 6)}" x="${LEFT}" width="${RIGHT - LEFT}" y="${plain(band[0], 3)}" height="${plain(band[1] - band[0], 3)}"/>` +
    axes(x, y, unit) +
    circles(plate, (along) => x.at(along / per)) +
    curve(plate, spots, { x, y }) +
    `</svg>`
  );
}

type Spot = readonly [number, number];

/** The points from the foot out: the flank proper. */
function flank({ points, footRadius }: DeviationPlate): readonly DeviationPoint[] {
  const above = points.filter(({ radius }) => radius >= footRadius);
  return above.length > 0 ? above : points;
}

function worst(plate: DeviationPlate): number {
  return flank(plate).reduce(
    (most, { deviation }) => (Math.abs(deviation) > Math.abs(most) ? deviation : most),
    0,
  );
}

/** Only what lies on the plate; the scales are said, so that the curve can be read back. */
function curve(plate: DeviationPlate, spots: readonly Spot[], { x, y }: { x: Scale; y: Scale }): string {
  const { runs, exits } = onPlate(spots);
  const per = millimetresPer(plate.unit);
  const scales = `data-mm-per-x="${plain(per * (x.value(1) - x.value(0)), 9)}" data-x-zero="${plain(x.at(0), 6)}" data-um-per-y="${plain(y.value(0) - y.value(1), 9)}" data-y-zero="${plain(y.at(0), 6)}"`;
  const arrows = exits.map(([ax, ay]) => {
    const up = ay <= (TOP + BOTTOM) / 2;
    return arrowHead({ x: ax, y: up ? TOP - 2.6 : BOTTOM + 2.6 }, { x: 0, y: up ? 1 : -1 }).replace(
      'class="arrow"',
      'class="arrow fine-arrow"',
    );
  });
  const [a, b] = [exits[0], exits.at(-1)];
  const label =
    a === undefined || b === undefined || a[1] > TOP + 1 || plate.leftAtRoot === 0
      ? ''
      : words(`to ${tinyLength(plate.leftAtRoot, plate.unit)} in the corner`, LEFT + 2, TOP - 4);
  return (
    `<path class="deviation" data-figure="deviation" data-worst="${fixed(worst(plate) * 1000, 3)}" ${scales} d="${runs.map(linePath).join('')}"/>` +
    arrows.join('') +
    label
  );
}

/** The curve cut off at the upper and lower edge, and where it leaves. */
function onPlate(spots: readonly Spot[]): { readonly runs: Spot[][]; readonly exits: Spot[] } {
  const runs: Spot[][] = [[]];
  const exits: Spot[] = [];
  spots.forEach((spot, i) => {
    const before = spots[i - 1];
    const [here, there] = [isOn(spot), before !== undefined && isOn(before)];
    if (before !== undefined && here !== there) {
      const edge = crossing(before, spot);
      exits.push(edge);
      if (here) {
        runs.push([edge]);
      } else {
        runs.at(-1)?.push(edge);
      }
    }
    if (here) {
      runs.at(-1)?.push(spot);
    }
  });
  return { runs: runs.filter((run) => run.length > 1), exits };
}

function isOn([, y]: Spot): boolean {
  return y >= TOP && y <= BOTTOM;
}

function crossing(a: Spot, b: Spot): Spot {
  const edge = Math.min(a[1], b[1]) < TOP ? TOP : BOTTOM;
  const share = (edge - a[1]) / (b[1] - a[1]);
  return [a[0] + share * (b[0] - a[0]), edge];
}

function axes(x: Scale, y: Scale, unit: LengthUnit): string {
  const ticksX = x.ticks.map((tick) => {
    const at = plain(x.at(tick), 3);
    return `<path class="line" d="M${at} ${BOTTOM}v1.2"/><text text-anchor="middle" x="${at}" y="${BOTTOM + 4.8}">${plain(tick, unit === 'mm' ? 2 : 4)}</text>`;
  });
  const ticksY = y.ticks.map((tick) => {
    const at = y.at(tick);
    return `<path class="line" d="M${LEFT} ${plain(at, 3)}h-1.2"/><text text-anchor="end" x="${LEFT - 2}" y="${plain(at + 1, 3)}">${tick > 0 ? '+' : ''}${withMinus(plain(tick, 2))}</text>`;
  });
  const zero = y.at(0);
  return (
    `<path class="line" d="M${LEFT} ${TOP}V${BOTTOM}H${RIGHT}"/><path class="line" d="M${LEFT} ${plain(zero, 3)}H${RIGHT}"/>${ticksX.join('')}${ticksY.join('')}` +
    `<text text-anchor="end" x="${LEFT - 2}" y="${TOP - 4}">µm</text>` +
    `<text class="halo" text-anchor="end" x="${RIGHT - 1}" y="${TOP + 3.4}">metal left</text><text class="halo" text-anchor="end" x="${RIGHT - 1}" y="${BOTTOM - 1.6}">cut away</text>` +
    `<text text-anchor="end" x="${RIGHT}" y="${BOTTOM + 10}">${shortUnit(unit)} along the outline, from mid-space to the tip</text>`
  );
}

/** The foot of the flank and the pitch circle, named above the plate. */
function circles({ points, footRadius, pitchRadius }: DeviationPlate, at: (along: number) => number): string {
  const mark = (radius: number, name: string): string => {
    const point = points.find((candidate) => candidate.radius >= radius);
    if (point === undefined) {
      return '';
    }
    const x = plain(at(point.along), 3);
    return `<path class="extension dashed" d="M${x} ${TOP - 1}V${BOTTOM}"/>${words(name, at(point.along), BOTTOM - 1.6, 'start').replace('<text', '<text dx="0.8"')}`;
  };
  return mark(footRadius, 'foot') + mark(pitchRadius, 'pitch circle');
}
