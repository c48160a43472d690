/**
 * The way the cutter's centre goes in each pass: its last lap, since the laps above lie on the same line. Windows of the
 * crossings are one pass, as on the sheet. mm of the work, Y up.
 */
import { isMove, type Motion, type MoveStep, type Position } from '../motion/motion.ts';
import { movesPath } from './svg-path.ts';

export interface PassPath {
  /** As in the table of passes: 'crossing 3' and its sisters are 'crossings'. */
  readonly pass: string;
  readonly runs: readonly { readonly from: Position; readonly moves: readonly MoveStep[] }[];
  /** The same as SVG path data. */
  readonly d: string;
  readonly cutter: number;
}

/** In the order of the work. */
export function passPaths(motions: readonly Motion[]): readonly PassPath[] {
  return motions.flatMap(lastLaps);
}

interface Found {
  readonly name: string;
  readonly cutter: number;
  lap: number;
  from: Position;
  moves: MoveStep[];
}

function lastLaps(motion: Motion): readonly PassPath[] {
  const found = new Map<string, Found>();
  let at: Position | undefined;
  let cutter = 0;
  let known: Found | undefined;
  for (const step of motion.steps) {
    if (!isMove(step)) {
      cutter = step.kind === 'cutter' ? step.number : cutter;
      continue;
    }
    const from = at ?? step.to;
    at = step.to;
    if (step.belongs === undefined) {
      continue;
    }
    const { pass, lap = 0 } = step.belongs;
    if (known?.name !== pass) {
      known = found.get(pass);
    }
    if (known === undefined) {
      known = { name: pass, cutter, lap, from, moves: [step] };
      found.set(pass, known);
    } else if (lap > known.lap) {
      known.lap = lap;
      known.from = from;
      known.moves = [step];
    } else if (lap === known.lap) {
      known.moves.push(step);
    }
  }
  return gathered([...found.values()]);
}

export function sheetName(pass: string): string {
  return pass.replace(/^crossing \d+/, 'crossings');
}

function gathered(found: readonly Found[]): readonly PassPath[] {
  const byName = new Map<string, { pass: string; cutter: number; runs: PassPath['runs'][number][] }>();
  for (const { name, cutter, from, moves } of found) {
    const pass = sheetName(name);
    const known = byName.get(pass) ?? { pass, cutter, runs: [] };
    known.runs.push({ from, moves });
    byName.set(pass, known);
  }
  return [...byName.values()].map((path) => ({
    ...path,
    d: path.runs.map(({ from, moves }) => movesPath(from, moves)).join(''),
  }));
}

/** How far from the axis the paths of the work reach. */
export function pathReach(paths: readonly PassPath[]): number {
  let reach = 0;
  for (const { runs } of paths) {
    for (const { moves } of runs) {
      for (const { kind, to } of moves) {
        reach = kind === 'rapid' ? reach : Math.max(reach, to.x * to.x + to.y * to.y);
      }
    }
  }
  return Math.sqrt(reach);
}
