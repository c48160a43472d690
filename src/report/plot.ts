/** Scales, lines and rings for the plates: the only file that knows the plotting libraries. */
import { scaleLinear } from 'd3-scale';
import { arc, line } from 'd3-shape';

export interface Scale {
  readonly at: (value: number) => number;
  /** What stands at a place. */
  readonly value: (at: number) => number;
  readonly ticks: readonly number[];
}

export function linearScale(
  domain: readonly [number, number],
  range: readonly [number, number],
  ticks: number,
): Scale {
  const scale = scaleLinear().domain(domain).range(range);
  return { at: (value) => scale(value), value: (at) => scale.invert(at), ticks: scale.ticks(ticks) };
}

/** Path data through points that are already in the picture's units. */
export function linePath(points: readonly (readonly [number, number])[]): string {
  return line().digits(3)(points.map(([x, y]): [number, number] => [x, y])) ?? '';
}

/** A band of a ring, angles clockwise from twelve o'clock, Y down. */
export function ringBand(inner: number, outer: number, from: number, to: number): string {
  return arc().digits(3)({ innerRadius: inner, outerRadius: outer, startAngle: from, endAngle: to }) ?? '';
}
