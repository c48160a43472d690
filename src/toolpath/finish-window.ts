/**
 * The wall of a window, finished in one loop at the cutter's radius, joined and left on tangent arcs from the cleared middle.
 *
 * In  : the exact loop (counter-clockwise), cutter, metal left on the wall. Wheel frame, mm.
 * Out : one run, or nothing where no free place for the arcs was found. All pieces of the wall have their parallel as the
 *       corners are not smaller than the cutter. Feed on inside arcs as `steppedArcFeed`; where a corner is hardly wider than
 *       the cutter, its engagement grows before the corner is reached, and the cutter slows there already.
 */
import { SAME_POINT, TANGENT } from '../base/tolerances.ts';
import { steppedArcFeed } from '../cutting/arc-feed.ts';
import { offsetPiece, partOf, reversePiece } from '../geometry/change-piece.ts';
import { nearestOnChain } from '../geometry/nearest-on-piece.ts';
import { endOf, headingOn, lengthOf, startOf } from '../geometry/on-piece.ts';
import type { Loop, Piece } from '../geometry/piece.ts';
import { addScaled, cross, leftOf, type Point } from '../geometry/point.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import { cornerFeed } from './finishing.ts';
import type { Heights } from './heights.ts';
import { arcLeg, flat, lineLeg, vertical, type Leg, type Run } from './leg.ts';
import { levelsFor, type Settings } from './settings.ts';

export interface WallTask {
  readonly window: Loop;
  readonly settings: Settings;
  readonly heights: Heights;
  readonly way: 1 | -1;
  readonly pass: string;
  /** Metal left on the wall. */
  readonly radialDepth: number;
  /** What is open: all of the window, or only the slot along its wall (a skin holds the slug). */
  readonly open: 'window' | 'slot';
}

/** An arc in and out: its radius and how far it turns. */
interface Lead {
  readonly radius: number;
  readonly sweep: number;
}

/** The cutter slows this far before a tight corner, over its diameter. */
const SLOW_BEFORE = 0.25;
/** Radius of the path over the cutter's below which a corner is tight. Judgement. */
const TIGHT = 0.3;
/** How far the loop runs past its start, mm. Judgement: no step shows where it was joined. */
const OVERLAP = 0.2;
/** The arcs in and out are tried from this share of the cutter's radius, each try this much smaller. */
const SMALLER = 0.8;
const TRIES = 12;

export function finishWindow(task: WallTask): Run | undefined {
  const { settings, heights, way, pass } = task;
  const path = wallPath(task);
  const join = startOf(path[0] as Piece);
  const heading = headingOn(path[0] as Piece, 0);
  const inward = way === 1 ? leftOf(heading) : leftOf({ x: -heading.x, y: -heading.y });
  // In a slot the straight is for the arcs in and out first.
  const overlap = Math.min(OVERLAP, lengthOf(path[0] as Piece) / (task.open === 'slot' ? 4 : 2));
  const room = lengthOf(path[0] as Piece) - overlap;
  const left = addScaled(join, heading, overlap);
  const lead = task.open === 'slot' ? slotLead(task, room) : windowLead(task, [join, left], heading, inward);
  if (lead === undefined) {
    return undefined;
  }
  const depth = heights.top - heights.bottom;
  const levels = levelsFor(depth, settings.cutter.flute);
  const { radius, sweep } = lead;
  const aside = radius * (1 - Math.cos(sweep));
  const along = radius * Math.sin(sweep);
  const begin = addScaled(addScaled(join, inward, aside), heading, -along);
  const end = addScaled(addScaled(left, inward, aside), heading, along);
  const { feed } = settings.data;
  const legs = [
    arcLeg(join, addScaled(join, inward, radius), way * sweep, feed),
    ...runPast(slowBeforeCorners(task, path), left, feed),
    arcLeg(end, addScaled(left, inward, radius), way * sweep, feed),
    lineLeg(begin, feed),
  ];
  const steps: MoveStep[] = [];
  for (let level = 1; level <= levels; level++) {
    const z = level === levels ? heights.bottom : heights.top - (depth * level) / levels;
    const belongs: Belongs = { pass, lap: level, laps: levels, depth: z };
    steps.push(vertical(begin, z, feed, belongs), ...flat(legs, z, belongs));
  }
  return { at: begin, fastTo: heights.approach, steps };
}

/** Past the start on the straight that the loop ends on: one line where both have one feed. */
function runPast(round: readonly Leg[], left: Point, feed: number): readonly Leg[] {
  const last = round.at(-1);
  const straight = last?.centre === undefined && last?.feed === feed;
  return [...(straight ? round.slice(0, -1) : round), lineLeg(left, feed)];
}

/** The wall's parallel in travel order, from the middle of its longest straight side. */
function wallPath({ window, settings, way }: WallTask): Loop {
  const parallel = window
    .map((piece) => offsetPiece(piece, -settings.radius))
    .filter((piece) => piece !== undefined)
    .filter((piece) => lengthOf(piece) > SAME_POINT);
  const travelled = way === 1 ? parallel : parallel.toReversed().map(reversePiece);
  const straight = travelled.map((piece) => (piece.kind === 'line' ? lengthOf(piece) : 0));
  const index = straight.indexOf(Math.max(...straight));
  const first = travelled[index] as Piece;
  return [
    partOf(first, 0.5, 1),
    ...travelled.slice(index + 1),
    ...travelled.slice(0, index),
    partOf(first, 0, 0.5),
  ];
}

function slowBeforeCorners(task: WallTask, path: Loop): Leg[] {
  const { settings, radialDepth } = task;
  const slow = cornerFeed(settings, radialDepth);
  return path.flatMap((piece, i) => {
    const leg = wallLeg(task, piece);
    const next = path[(i + 1) % path.length] as Piece;
    if (!isTight(task, piece, next) || slow >= leg.feed) {
      return [leg];
    }
    const cut = 1 - (SLOW_BEFORE * settings.cutter.diameter) / lengthOf(piece);
    return cut > 0
      ? [wallLeg(task, partOf(piece, 0, cut)), { ...wallLeg(task, partOf(piece, cut, 1)), feed: slow }]
      : [{ ...leg, feed: slow }];
  });
}

/** Whether the path turns inward between two pieces, or on an arc much smaller than the cutter. */
function isTight({ settings, way }: WallTask, piece: Piece, next: Piece): boolean {
  if (next.kind === 'arc' && way * next.turn > 0 && next.radius < TIGHT * settings.radius) {
    return true;
  }
  return way * cross(headingOn(piece, 1), headingOn(next, 0)) > TANGENT;
}

function wallLeg({ settings, way, radialDepth }: WallTask, piece: Piece): Leg {
  const { data, cutter } = settings;
  if (piece.kind !== 'arc') {
    return lineLeg(endOf(piece), data.feed);
  }
  const feed =
    way * piece.turn > 0
      ? steppedArcFeed({
          feed: data.feed,
          pathRadius: piece.radius,
          cutterDiameter: cutter.diameter,
          radialDepth,
          flutes: cutter.flutes,
          speed: data.speed,
          lowest: data.lowest,
        })
      : data.feed;
  return arcLeg(endOf(piece), piece.centre, piece.turn, feed);
}

/**
 * From the middle of the slot, which lies as far aside as the metal left on the wall: a short arc of one diameter, or less where
 * the straight of the wall is short, lest it begin beyond the slot. None where even a quarter circle is longer than that.
 */
function slotLead({ settings, radialDepth }: WallTask, room: number): Lead | undefined {
  const radius = Math.min(2 * settings.radius, (room * room + radialDepth * radialDepth) / (2 * radialDepth));
  return room < radialDepth ? undefined : { radius, sweep: Math.acos(1 - radialDepth / radius) };
}

/** The largest quarter circle in and out that stays free of the wall. */
function windowLead(task: WallTask, ends: readonly Point[], heading: Point, inward: Point): Lead | undefined {
  let radius = task.settings.radius;
  for (let i = 0; i < TRIES; i++, radius *= SMALLER) {
    const lead = radius;
    const free = ends.every((on, k) => {
      const at = addScaled(addScaled(on, inward, lead), heading, k === 0 ? -lead : lead);
      return (nearestOnChain(task.window, at)?.distance ?? 0) >= task.settings.radius + lead / 2;
    });
    if (free) {
      return { radius, sweep: Math.PI / 2 };
    }
  }
  return undefined;
}
