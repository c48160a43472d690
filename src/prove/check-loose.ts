/**
 * Metal that comes loose under a turning cutter, and cuts that bite deeper than a cutter bears, both told from the coarse
 * metal as the moves take it away in order. A piece is loose when it is cut round to the plate and is part of neither the
 * wheel nor the sheet's edge. Looked at each time the cutter leaves the metal after cutting through.
 */
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import { loosePiece, type Piece } from './loose-piece.ts';
import { wheelBody } from './metal-inside.ts';
import { blankRaster, cutRaster, type Raster } from './metal-raster.ts';
import type { Finding } from './proof.ts';
import type { PathSet, SolidMove } from './metal-paths.ts';

/** Squares from the axis to the edge of what is looked at: what a wheel needs so that its spaces are seen. */
const SQUARES = 150;
/** mm; finer shows nothing that matters. */
const FINEST = 0.06;
/** A slot is at least this many squares wide. */
const ACROSS = 3;
/** A slot deeper than this share of the diameter breaks small cutters, whatever the material. */
const DEEPEST_BITE = 1.05;

export function checkLoose(evidence: Evidence): Finding[] {
  const { input, solids, lastDigit } = evidence;
  const { target, setup } = input;
  if (target === undefined) {
    return [];
  }
  const reach = cutReach(evidence, target.form.outsideRadius);
  const raster = blankRaster(setup, reach, squareSize(evidence, reach));
  const cutting: Cutting = {
    raster,
    height: new Float64Array(solids.length).fill(Number.NaN),
    waiting: [],
    waits: new Uint8Array(solids.length),
  };
  const body = wheelBody(target.form, target.bore, target.crossings);
  const through = setup.plateZ + lastDigit;
  const worst: Bite = { bite: 0, share: DEEPEST_BITE };
  const loose: Finding[] = [];
  let cutThrough = false;
  for (let i = 0; i < solids.length && loose.length === 0; i++) {
    const solid = solids[i]!;
    if (solid.move.kind !== 'rapid') {
      takeBite(cutting, evidence, i, worst);
      cutThrough ||= Math.min(solid.z0, solid.z1) <= through;
    }
    const lifts = solid.z1 > setup.topZ || i === solids.length - 1;
    if (cutThrough && lifts) {
      cutThrough = false;
      drawWaiting(cutting, evidence.paths);
      const piece = loosePiece(raster, body, through, setup.shape.kind === 'sheet');
      loose.push(...(piece === undefined ? [] : [cameLoose(solid, piece)]));
    }
  }
  return [...loose, ...(worst.solid === undefined ? [] : [tooDeep(worst.solid, worst.bite)])];
}

function squareSize({ input }: Evidence, reach: number): number {
  const narrowest = Math.min(...input.setup.cutters.map(({ diameter }) => diameter));
  return Math.max(FINEST, Math.min(reach / SQUARES, narrowest / ACROSS));
}

/** How far from the axis anything is cut, and a little more, so that the sheet's edge is seen round it. */
function cutReach({ input, solids, paths, lastDigit }: Evidence, wheel: number): number {
  let reach = wheel;
  solids.forEach((solid, i) => {
    if (Math.min(solid.z0, solid.z1) < input.setup.topZ - lastDigit) {
      const away = Math.hypot(paths.mx[i]!, paths.my[i]!) + paths.bound[i]! + 2 * solid.radius;
      reach = Math.max(reach, away);
    }
  });
  return reach;
}

interface Bite {
  bite: number;
  share: number;
  solid?: SolidMove;
}

/** What has been run, so that a lap that repeats another need not be drawn again at once. */
interface Cutting {
  readonly raster: Raster;
  /** Height each path has been cut down to; NaN before. */
  readonly height: Float64Array;
  /** Paths whose height the raster does not show yet, and a mark for each of them. */
  readonly waiting: number[];
  readonly waits: Uint8Array;
}

function takeBite(cutting: Cutting, { paths, solids }: Evidence, i: number, worst: Bite): void {
  const solid = solids[i]!;
  // A fall is taken at its upper end, so that what is left is never said to be less than it is; straight down it all goes.
  const straight = solid.x0 === solid.x1 && solid.y0 === solid.y1 && solid.move.turn === undefined;
  const z = straight ? Math.min(solid.z0, solid.z1) : Math.max(solid.z0, solid.z1);
  const twin = paths.twin[i]!;
  const was = cutting.height[twin]!;
  let bite: number;
  if (Number.isNaN(was)) {
    drawWaiting(cutting, paths);
    bite = cutRaster(cutting.raster, paths, i, z);
    cutting.height[twin] = z;
  } else {
    bite = was - z;
    if (bite / (2 * solid.radius) > worst.share) {
      drawWaiting(cutting, paths);
      bite = cutRaster(cutting.raster, paths, i, z);
      cutting.height[twin] = z;
    } else {
      waitFor(cutting, twin, Math.min(z, was));
    }
  }
  const share = bite / (2 * solid.radius);
  if (share > worst.share) {
    worst.bite = bite;
    worst.share = share;
    worst.solid = solid;
  }
}

function waitFor({ height, waiting, waits }: Cutting, path: number, z: number): void {
  height[path] = z;
  if (waits[path] === 0) {
    waits[path] = 1;
    waiting.push(path);
  }
}

function drawWaiting({ raster, height, waiting, waits }: Cutting, paths: PathSet): void {
  for (const path of waiting) {
    cutRaster(raster, paths, path, height[path]!);
    waits[path] = 0;
  }
  waiting.length = 0;
}

function cameLoose(solid: SolidMove, { x, y, area }: Piece): Finding {
  return findingAt(solid.move, {
    code: 'prove.loose',
    message: `a piece of ${String(Number(area.toFixed(2)))} mm2 at X ${lengthText(x)} Y ${lengthText(y)} is cut free of wheel and blank under the turning cutter; none may be`,
    hint: 'Turn all of it to chips before its last joint is cut, or leave a skin under it.',
    x,
    y,
  });
}

function tooDeep(solid: SolidMove, bite: number): Finding {
  return findingAt(solid.move, {
    code: 'prove.load',
    message: `the cutter goes through solid metal ${lengthText(bite)} deep; a cutter of ${lengthText(2 * solid.radius)} bears no slot deeper than its diameter`,
    hint: 'Rough this place in steps first, or run the programs in their order.',
    x: solid.x1,
    y: solid.y1,
  });
}
