/**
 * Polygons grown or shrunk by a disc: the one file that talks to clipper-lib, whose integer steps never leave it.
 *
 * In  : rings of points in mm, in any order, either way round (which are holes follows from what lies in what).
 * Out : rings grown by `distance` (shrunk where negative), outer ones counter-clockwise, holes clockwise, none at all where
 *       nothing is left. Round corners are chords no further than `sag` from their arc. mm.
 * Guards: clipper-lib 6.4.2 answers NaN with nothing, reports errors through a browser's `alert`, loses a hole that turns
 * like its outer ring, overshoots its arc tolerance up to 2.25 times, slows down past 47,453,132 steps, begins rings
 * anywhere and leaves spikes of a step or two.
 */
import ClipperLib, { type Path } from 'clipper-lib';
import { Bug } from '../base/bug.ts';
import { failure, success, type Outcome } from '../base/problem.ts';
import { CLIPPER_STEP } from '../base/tolerances.ts';
import { cleanRing, holdsPoint, ringArea } from './ring.ts';
import type { Point } from './point.ts';

export type Ring = readonly Point[];

/** ClipperBase.loRange of 6.4.2: past it slopes are compared with big integers, at half the speed. */
const MOST_STEPS = 47_453_132;

/** Clipper rounds the number of chords of an arc, which makes them up to 2.25 times as deep as was asked. */
const ARC_SHARE = 0.4;

/** Spikes are as long as the rounding: this many steps. */
const SPIKE_STEPS = 3;

export function offsetPolygon(rings: readonly Ring[], distance: number, sag: number): Outcome<Ring[]> {
  if (!Number.isFinite(distance) || !(sag > 0)) {
    throw new Bug(`cannot offset a polygon by ${distance} mm to ${sag} mm`);
  }
  const reach = furthest(rings) + Math.abs(distance);
  if (reach / CLIPPER_STEP >= MOST_STEPS) {
    return tooLarge(reach);
  }
  const solid = turnedByNesting(rings.map(cleanRing).filter((ring) => ring.length > 2));
  const grown = clip(
    solid.map((ring) => ring.map(toSteps)),
    distance / CLIPPER_STEP,
    (ARC_SHARE * sag) / CLIPPER_STEP,
  );
  const start = solid[0]?.[0];
  return success(grown.map((path) => toRing(withoutSpikes(path), start)).filter((ring) => ring.length > 2));
}

function furthest(rings: readonly Ring[]): number {
  let most = 0;
  for (const ring of rings) {
    for (const { x, y } of ring) {
      if (!Number.isFinite(x) || !Number.isFinite(y)) {
        throw new Bug('a polygon has a corner that is not a number');
      }
      most = Math.max(most, Math.abs(x), Math.abs(y));
    }
  }
  return most;
}

function tooLarge(reach: number): Outcome<Ring[]> {
  const limit = Math.floor(MOST_STEPS * CLIPPER_STEP);
  return failure([
    {
      code: 'reach.too-large',
      severity: 'error',
      message: `The cutter's path reaches ${Math.ceil(reach)} mm from the centre; offsets are held exact to ${limit} mm.`,
      at: { kind: 'part', x: reach, y: 0 },
    },
  ]);
}

/** Rings inside an even number of others are outer ones and turn counter-clockwise, the rest are holes. */
function turnedByNesting(rings: readonly Ring[]): readonly Ring[] {
  return rings.map((ring) => {
    const depth = rings.filter((other) => other !== ring && holdsPoint(other, ring[0] as Point)).length;
    const outer = depth % 2 === 0;
    return ringArea(ring) > 0 === outer ? ring : ring.toReversed();
  });
}

function clip(paths: Path[], delta: number, arcTolerance: number): Path[] {
  const grown: Path[] = [];
  try {
    const offset = new ClipperLib.ClipperOffset(2, arcTolerance);
    offset.AddPaths(paths, ClipperLib.JoinType.jtRound, ClipperLib.EndType.etClosedPolygon);
    offset.Execute(grown, delta);
  } catch (error) {
    throw new Bug(`clipper-lib gave up: ${error instanceof Error ? error.message : String(error)}`);
  }
  return grown;
}

function toSteps({ x, y }: Point): { X: number; Y: number } {
  return { X: Math.round(x / CLIPPER_STEP), Y: Math.round(y / CLIPPER_STEP) };
}

/** Without corners that turn back on a leg as short as the rounding: they say nothing of place and all of direction wrong. */
function withoutSpikes(path: Path): Path {
  const kept: Path = [];
  let before = path.at(-1);
  for (let i = 0; before !== undefined && i < path.length; i++) {
    const corner = path[i] as Path[number];
    const after = path[i + 1] ?? (path[0] as Path[number]);
    const ax = corner.X - before.X;
    const ay = corner.Y - before.Y;
    const bx = after.X - corner.X;
    const by = after.Y - corner.Y;
    const along = ax * bx + ay * by;
    if ((ax !== 0 || ay !== 0) && !(along < 0 && turnsBack(along, Math.hypot(ax, ay), Math.hypot(bx, by)))) {
      kept.push(corner);
      before = corner;
    }
  }
  return kept;
}

/** By more than 120 degrees, one leg a step or three long. */
function turnsBack(along: number, before: number, after: number): boolean {
  return along < -0.5 * before * after && Math.min(before, after) <= SPIKE_STEPS;
}

/** In mm. Clipper begins where it likes: begun again at the corner nearest to where the first ring was begun. */
function toRing(path: Path, start: Point | undefined): Ring {
  let nearest = 0;
  if (start !== undefined) {
    const { X, Y } = toSteps(start);
    let best = Infinity;
    path.forEach((corner, i) => {
      const square = (corner.X - X) ** 2 + (corner.Y - Y) ** 2;
      nearest = square < best ? i : nearest;
      best = Math.min(square, best);
    });
  }
  const ring: Point[] = [];
  for (let i = 0; i < path.length; i++) {
    const { X, Y } = path[(nearest + i) % path.length] as Path[number];
    ring.push({ x: X * CLIPPER_STEP, y: Y * CLIPPER_STEP });
  }
  return ring;
}
