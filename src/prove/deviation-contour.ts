/**
 * The worst places of an outline that repeats round the axis: how deep any cutter goes inside it, and how much metal
 * stays beyond it in each region, over every copy and at two heights, refined between stations to the proof's resolution.
 *
 * Every copy is measured from its own moves; nothing is taken over from one tooth to the next.
 */
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import {
  decidingPath,
  deviationOn,
  measureCopy,
  narrowed,
  readingsFor,
  type Field,
  type Height,
  type Readings,
} from './deviation-measure.ts';
import { REGION, REGIONS, stationAt, type Stations } from './deviation-stations.ts';
import { nearLists, type Ring } from './metal-near.ts';
import type { PathSet } from './metal-paths.ts';
import { highestOf } from './highest-of.ts';

export interface Worst {
  /** mm, never negative. */
  readonly value: number;
  /** Which copy, from 0. */
  readonly copy: number;
  /** Where, in the program's frame. */
  readonly x: number;
  readonly y: number;
  /** The move that decides it, where there is one. */
  readonly move: TracedMove | undefined;
}

/** What is known so far at one height. */
export interface ContourFigures {
  gouge: Worst;
  /** By region. At the root: how far the metal's surface is from the exact outline. */
  readonly left: Worst[];
  /** At the root: how far the metal stands beyond what the cutter should leave. */
  rootMiss: Worst;
}

/** Called with every copy's readings, for what else is to be told from them. */
export type CopyReader = (copy: number, field: Field, readings: Readings) => void;

/** A peak that cannot beat the worst known by this is not looked into. */
const WORTH = PROOF_RESOLUTION / 5;

export function measureContour(
  set: PathSet,
  stations: Stations,
  ring: Ring,
  farthest: number,
  read?: CopyReader,
): Record<Height, ContourFigures> {
  const lists = nearLists(set, ring, farthest);
  const readings = readingsFor(stations.count);
  const figures = { low: noFigures(), high: noFigures() };
  for (let copy = 0; copy < ring.copies; copy++) {
    const angle = (2 * Math.PI * copy) / ring.copies;
    const field: Field = { set, near: lists[copy]!, cos: Math.cos(angle), sin: Math.sin(angle), farthest };
    measureCopy(field, stations, readings);
    const one = { field, stations, readings, copy };
    takeWorst({ ...one, height: 'low' }, { ...one, height: 'high' }, figures);
    read?.(copy, field, readings);
  }
  return figures;
}

export const NOWHERE: Worst = { value: 0, copy: 0, x: 0, y: 0, move: undefined };

function noFigures(): ContourFigures {
  return { gouge: NOWHERE, left: Array.from({ length: REGIONS }, () => NOWHERE), rootMiss: NOWHERE };
}

interface Copy {
  readonly field: Field;
  readonly stations: Stations;
  readonly readings: Readings;
  readonly copy: number;
  readonly height: Height;
}

/** What is wanted at its worst: metal cut away, metal left, or how far the metal's surface is from the exact outline. */
type Figure = 'gouge' | 'left' | 'thickness';

/** Both heights of one copy. Where they read the same and know the same, they are looked into once. */
function takeWorst(low: Copy, high: Copy, figures: Record<Height, ContourFigures>): void {
  const { stations, readings } = low;
  for (let i = 0; i < stations.count; i++) {
    if (!isWorth(low, figures.low, i) && !isWorth(high, figures.high, i)) {
      continue;
    }
    if (readsAlike(readings, i) && knowAlike(figures, stations.region[i]!)) {
      takeStation(low, figures.low, i);
      copyFigures(figures, stations.region[i]!);
    } else {
      takeStation(low, figures.low, i);
      takeStation(high, figures.high, i);
    }
  }
}

function readsAlike({ low, high }: Readings, i: number): boolean {
  const after = Math.min(i + 1, low.length - 1);
  const before = Math.max(i - 1, 0);
  return low[i] === high[i] && low[before] === high[before] && low[after] === high[after];
}

function knowAlike({ low, high }: Record<Height, ContourFigures>, region: number): boolean {
  return low.gouge === high.gouge && low.rootMiss === high.rootMiss && low.left[region] === high.left[region];
}

function copyFigures({ low, high }: Record<Height, ContourFigures>, region: number): void {
  high.gouge = low.gouge;
  high.rootMiss = low.rootMiss;
  high.left[region] = low.left[region]!;
}

/** Whether station i could show anything worse than what is known: few do, and it is asked of every one. */
function isWorth({ stations, readings, height }: Copy, figures: ContourFigures, i: number): boolean {
  const region = stations.region[i]!;
  const deviations = readings[height];
  const deviation = deviations[i]!;
  if (region === REGION.root) {
    return (
      isPeak(stations, deviations, i, 1, figures.rootMiss.value) ||
      stations.beyond[i]! + Math.max(0, deviation) > figures.left[region]!.value + WORTH
    );
  }
  if (deviation < 0) {
    return isPeak(stations, deviations, i, -1, figures.gouge.value);
  }
  return region !== REGION.bare && isPeak(stations, deviations, i, 1, figures.left[region]!.value);
}

/** Whether the deviation, times `sign`, is highest at station i of its neighbours, and may rise above `known` there. */
function isPeak(
  { piece }: Stations,
  deviations: Float64Array,
  i: number,
  sign: 1 | -1,
  known: number,
): boolean {
  const value = sign * deviations[i]!;
  const own = piece[i];
  const rise = piece[i - 1] === own ? value - sign * deviations[i - 1]! : 0;
  const fall = piece[i + 1] === own ? value - sign * deviations[i + 1]! : 0;
  // A crown, or a kink between two slopes, rises above its highest station by half the larger step at most.
  return rise >= 0 && fall >= 0 && value + (rise > fall ? rise : fall) / 2 > known + WORTH;
}

function takeStation(copy: Copy, figures: ContourFigures, i: number): void {
  const { stations } = copy;
  const region = stations.region[i]!;
  const deviation = copy.readings[copy.height][i]!;
  if (region === REGION.root) {
    figures.rootMiss = better(copy, figures.rootMiss, 'left', i);
    // The surface is no further from the outline than the station is, and what stands beyond it.
    if (stations.beyond[i]! + Math.max(0, deviation) > figures.left[region]!.value + WORTH) {
      figures.left[region] = better(copy, figures.left[region]!, 'thickness', i);
    }
  } else if (deviation < 0) {
    figures.gouge = better(copy, figures.gouge, 'gouge', i);
  } else if (region !== REGION.bare) {
    figures.left[region] = better(copy, figures.left[region]!, 'left', i);
  }
}

/** The figure that a deviation at u of a piece makes. */
function figureOf(stations: Stations, figure: Figure, piece: number, u: number, deviation: number): number {
  if (figure !== 'thickness') {
    return figure === 'gouge' ? -deviation : deviation;
  }
  const { piece: exact, beyond } = stations.pieces[piece]!;
  const at = stationAt(exact, u);
  return beyond?.(at.x + deviation * at.nx, at.y + deviation * at.ny) ?? deviation;
}

/** The worse of what is known and the peak at station i, found between its neighbours where it could be worse. */
function better(copy: Copy, known: Worst, figure: Figure, i: number): Worst {
  const { stations } = copy;
  const piece = stations.piece[i]!;
  const before = stations.piece[i - 1] === piece ? i - 1 : i;
  const after = stations.piece[i + 1] === piece ? i + 1 : i;
  const deviations = copy.readings[copy.height];
  const at = (k: number): number => figureOf(stations, figure, piece, stations.u[k]!, deviations[k]!);
  if (figure !== 'thickness') {
    const sign = figure === 'gouge' ? -1 : 1;
    if (!isPeak(stations, deviations, i, sign, known.value)) {
      return known;
    }
  }
  const value = at(i);
  const rise = value - at(before);
  const fall = value - at(after);
  if (rise < 0 || fall < 0 || value + Math.max(rise, fall) / 2 <= known.value + WORTH) {
    return known;
  }
  const between = peakReader(copy, figure, piece, before, after);
  const u = highestOf(between, stations.u[before]!, stations.u[after]!);
  const top = between(u);
  const isHigher = top > value;
  const most = isHigher ? top : value;
  return most <= known.value ? known : worstAt(copy, piece, isHigher ? u : stations.u[i]!, most);
}

/** The figure anywhere between two stations of a piece. */
function peakReader(
  { stations, field, height }: Copy,
  figure: Figure,
  piece: number,
  before: number,
  after: number,
): (u: number) => number {
  const few = narrowed(field, stations, before, after);
  return (u) => {
    const quick = deviationOn(few.field, stations, piece, u, height);
    const sure = quick > few.trusted ? deviationOn(field, stations, piece, u, height) : quick;
    return figureOf(stations, figure, piece, u, sure);
  };
}

function worstAt({ field, stations, copy, height }: Copy, piece: number, u: number, value: number): Worst {
  deviationOn(field, stations, piece, u, height);
  const path = decidingPath();
  const place = stationAt(stations.pieces[piece]!.piece, u);
  return {
    value,
    copy,
    x: place.x * field.cos - place.y * field.sin,
    y: place.x * field.sin + place.y * field.cos,
    move: path < 0 ? undefined : field.set.moves[path],
  };
}
