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
  const most = rings.flat().reduce((far, { x, y }) => Math.max(far, finite(x), finite(y)), 0);
  const reach = (most + Math.abs(distance)) / CLIPPER_STEP;
  if (reach >= MOST_STEPS) {
    return tooLarge(most + Math.abs(distance));
  }
  const solid = turnedByNesting(rings.map(cleanRing).filter((ring) => ring.length > 2));
  const grown = clip(
    solid.map((ring) => ring.map(toSteps)),
    distance / CLIPPER_STEP,
    (ARC_SHARE * sag) / CLIPPER_STEP,
  );
  const start = solid[0]?.[0];
  return success(
    grown
      .map((path) => withoutSpikes(path).map(fromSteps))
      .filter((ring) => ring.length > 2)
      .map((ring) => startedNear(ring, start)),
  );
}

function finite(coordinate: number): number {
  if (!Number.isFinite(coordinate)) {
    throw new Bug('a polygon has a corner that is not a number');
  }
  return Math.abs(coordinate);
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
function turnedByNesting(rings: readonly Ring[]): Ring[] {
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

function fromSteps({ X, Y }: { X: number; Y: number }): Point {
  return { x: X * CLIPPER_STEP, y: Y * CLIPPER_STEP };
}

/** Without corners that turn back on a leg as short as the rounding: they say nothing of place and all of direction wrong. */
function withoutSpikes(path: Path): Path {
  const kept: Path = [];
  path.forEach((corner, i) => {
    const before = kept.at(-1) ?? (path.at(-1) as Path[number]);
    const after = path[(i + 1) % path.length] as Path[number];
    const [ax, ay] = [corner.X - before.X, corner.Y - before.Y];
    const [bx, by] = [after.X - corner.X, after.Y - corner.Y];
    const [a, b] = [Math.hypot(ax, ay), Math.hypot(bx, by)];
    const back = ax * bx + ay * by < -0.5 * a * b;
    if (a > 0 && !(back && Math.min(a, b) <= SPIKE_STEPS)) {
      kept.push(corner);
    }
  });
  return kept;
}

/** Clipper begins where it likes: begun again at the corner nearest to where the first ring was begun. */
function startedNear(ring: Ring, start: Point | undefined): Ring {
  if (start === undefined) {
    return ring;
  }
  let nearest = 0;
  let best = Infinity;
  ring.forEach(({ x, y }, i) => {
    const square = (x - start.x) ** 2 + (y - start.y) ** 2;
    if (square < best) {
      best = square;
      nearest = i;
    }
  });
  return [...ring.slice(nearest), ...ring.slice(0, nearest)];
}
