/**
 * Metal that comes loose under a turning cutter, and cuts that bite deeper than a cutter bears, both told from the coarse
 * metal as the moves take it away in order. A piece is loose when it is cut round to the plate and is part of neither the
 * wheel nor the sheet's edge. Looked at each time the cutter leaves the metal after cutting through.
 */
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import { loosePiece, type Piece } from './loose-piece.ts';
import { blankRaster, cutRaster, type Raster } from './metal-raster.ts';
import type { Finding } from './proof.ts';
import type { PathSet } from './metal-paths.ts';
import { lowOf, type SolidMoves } from './metal-solids.ts';

/** Squares from the axis to the edge of what is looked at: what a wheel needs so that its spaces are seen. */
const SQUARES = 100;
/** mm; finer shows nothing that matters. */
const FINEST = 0.06;
/** A slot is at least this many squares wide. */
const ACROSS = 3;
/**
 * Fewer squares may be a ridge between two cuts, which goes as a chip; and where a slot is fewer squares wide than it should be,
 * what is left on a tooth before it is finished, told apart from the tooth.
 */
const FEWEST = 3;
const FEWEST_COARSE = 9;
/** A slot deeper than this share of the diameter breaks small cutters, whatever the material. */
const DEEPEST_BITE = 1.05;

export function checkLoose(evidence: Evidence): Finding[] {
  const { input, solids, lastDigit, body } = evidence;
  const { setup } = input;
  if (body === undefined) {
    return [];
  }
  const reach = cutReach(evidence, body.form.outsideRadius);
  const through = setup.plateZ + lastDigit;
  const narrowest = Math.min(...setup.cutters.map(({ diameter }) => diameter));
  const size = Math.max(FINEST, Math.min(reach / SQUARES, narrowest / ACROSS));
  const fewest = size * ACROSS > narrowest ? FEWEST_COARSE : FEWEST;
  const raster = blankRaster(setup, reach, size, through);
  const cutting: Cutting = {
    raster,
    height: new Float64Array(solids.count).fill(Number.NaN),
    waiting: [],
    waits: new Uint8Array(solids.count),
  };
  const worst: Bite = { bite: 0, share: DEEPEST_BITE };
  const loose: Finding[] = [];
  let cutThrough = false;
  let opened = 0;
  for (let i = 0; i < solids.count && loose.length === 0; i++) {
    const z1 = solids.z1[i]!;
    if (solids.rapid[i] === 0) {
      takeBite(cutting, evidence, i, worst);
      cutThrough ||= z1 <= through || solids.z0[i]! <= through;
    }
    if (cutThrough && (z1 > setup.topZ || i === solids.count - 1)) {
      cutThrough = false;
      drawWaiting(cutting, evidence.paths);
      // Nothing new comes loose where nothing more was cut through.
      const piece =
        raster.opened > opened ? loosePiece(raster, body, setup.shape.kind === 'sheet', fewest) : undefined;
      opened = raster.opened;
      loose.push(...(piece === undefined ? [] : [cameLoose(solids.moves[i]!, piece)]));
    }
  }
  return [...loose, ...(worst.path === undefined ? [] : [tooDeep(solids, worst.path, worst.bite)])];
}

/** How far from the axis anything is cut, and a little more, so that the sheet's edge is seen round it. */
function cutReach({ input, solids, paths, lastDigit }: Evidence, wheel: number): number {
  const { mx, my, bound } = paths;
  const top = input.setup.topZ - lastDigit;
  let reach = wheel;
  for (let i = 0; i < solids.count; i++) {
    const wide = bound[i]! + 2 * solids.radius[i]!;
    const room = reach - wide;
    const away = mx[i]! * mx[i]! + my[i]! * my[i]!;
    if ((room < 0 || away > room * room) && lowOf(solids, i) < top) {
      reach = Math.max(reach, Math.sqrt(away) + wide);
    }
  }
  return reach;
}

interface Bite {
  bite: number;
  share: number;
  path?: number;
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
  const z0 = solids.z0[i]!;
  const z1 = solids.z1[i]!;
  // A fall is taken at its upper end, so that what is left is never said to be less than it is; straight down it all goes.
  const z = paths.bound[i] === 0 ? Math.min(z0, z1) : Math.max(z0, z1);
  const width = 2 * solids.radius[i]!;
  const twin = solids.twin[i]!;
  const was = cutting.height[twin]!;
  const bite = was - z;
  if (bite <= worst.share * width) {
    // Cut here before, and not too deep in one go: nothing to look at until something may have come loose.
    if (bite > 0) {
      waitFor(cutting, twin, z);
    }
    return;
  }
  drawWaiting(cutting, paths);
  const bites = cutRaster(cutting.raster, paths, i, z);
  cutting.height[twin] = z;
  if (bites > worst.share * width) {
    worst.bite = bites;
    worst.share = bites / width;
    worst.path = i;
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

function cameLoose(move: TracedMove, { x, y, area }: Piece): Finding {
  return findingAt(move, {
    code: 'prove.loose',
    message: `a piece of ${String(Number(area.toFixed(2)))} mm2 at X ${lengthText(x)} Y ${lengthText(y)} is cut free of wheel and blank under the turning cutter; none may be`,
    hint: 'Turn all of it to chips before its last joint is cut, or leave a skin under it.',
    x,
    y,
  });
}

function tooDeep({ moves, radius, x1, y1 }: SolidMoves, i: number, bite: number): Finding {
  return findingAt(moves[i], {
    code: 'prove.load',
    message: `the cutter goes through solid metal ${lengthText(bite)} deep; a cutter of ${lengthText(2 * radius[i]!)} bears no slot deeper than its diameter`,
    hint: 'Rough this place in steps first, or run the programs in their order.',
    x: x1[i]!,
    y: y1[i]!,
  });
}
