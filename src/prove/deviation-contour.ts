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
const WORTH = PROOF_RESOLUTION / 10;

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
    takeWorst({ field, stations, readings, copy, height: 'low' }, figures.low);
    takeWorst({ field, stations, readings, copy, height: 'high' }, figures.high);
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

/** What is read at a station: from the deviation to the figure that is wanted at its worst. */
type Figure = (deviation: number, piece: number, u: number) => number;

function takeWorst(copy: Copy, figures: ContourFigures): void {
  const { stations } = copy;
  const deviations = copy.readings[copy.height];
  const asThick: Figure = (deviation, piece, u) => thicknessAt(stations, piece, u, deviation);
  for (let i = 0; i < stations.count; i++) {
    const region = stations.region[i]!;
    if (region === REGION.root) {
      figures.rootMiss = better(copy, figures.rootMiss, asLeft, i);
      // The surface is no further from the outline than the station is, and what stands beyond it.
      const most = stations.beyond[i]! + Math.max(0, deviations[i]!);
      if (most > figures.left[region]!.value + WORTH) {
        figures.left[region] = better(copy, figures.left[region]!, asThick, i);
      }
    } else if (deviations[i]! < 0) {
      figures.gouge = better(copy, figures.gouge, asGouge, i);
    } else if (region !== REGION.bare) {
      figures.left[region] = better(copy, figures.left[region]!, asLeft, i);
    }
  }
}

const asLeft: Figure = (deviation) => deviation;
const asGouge: Figure = (deviation) => -deviation;

/** How far the metal's surface is from the exact outline, where the station is on what the cutter should leave. */
function thicknessAt(stations: Stations, piece: number, u: number, deviation: number): number {
  const { piece: exact, beyond } = stations.pieces[piece]!;
  const at = stationAt(exact, u);
  return beyond?.(at.x + deviation * at.nx, at.y + deviation * at.ny) ?? deviation;
}

/** The worse of what is known and the peak at station i, found between its neighbours where it could be worse. */
function better(copy: Copy, known: Worst, figure: Figure, i: number): Worst {
  const { stations, readings, height, field } = copy;
  const piece = stations.piece[i]!;
  const read = (k: number): number => figure(readings[height][k]!, piece, stations.u[k]!);
  const before = i > 0 && stations.piece[i - 1] === piece ? i - 1 : i;
  const after = i + 1 < stations.count && stations.piece[i + 1] === piece ? i + 1 : i;
  const value = read(i);
  const rise = value - read(before);
  const fall = value - read(after);
  if (rise < 0 || fall < 0 || value + Math.max(rise, fall) <= known.value + WORTH) {
    return known;
  }
  const between = (u: number): number => figure(deviationOn(field, stations, piece, u, height), piece, u);
  const u = highestOf(between, stations.u[before]!, stations.u[after]!);
  const top = between(u);
  const [at, most] = top > value ? [u, top] : [stations.u[i]!, value];
  return most <= known.value ? known : worstAt(copy, piece, at, most);
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
    move: path < 0 ? undefined : field.set.solids[path]!.move,
  };
}
