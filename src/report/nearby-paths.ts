/** The parts of the passes' last laps that run through one tooth space. mm of the work, Y up. */
import type { SheetFacts } from './facts.ts';
import { movesPath } from './svg-path.ts';
import type { MoveStep, Position } from '../motion/motion.ts';

export interface NearbyPath {
  readonly pass: string;
  readonly d: string;
}

/** Passes at the teeth only; `middle` is the angle of the space, `wide` half the width of what is seen. */
export function nearbyPaths(facts: SheetFacts, middle: number, wide: number): readonly NearbyPath[] {
  const { form, job } = facts;
  const spoke = { x: Math.cos(middle), y: Math.sin(middle) };
  const most = wide * 1.4 + job.cuts.finishing.cutter.diameter;
  const near = ({ x, y }: Position): boolean => {
    const out = x * spoke.x + y * spoke.y;
    return out > form.rootRadius * 0.8 && Math.abs(y * spoke.x - x * spoke.y) < most;
  };
  return facts.paths
    .filter(({ pass }) => /rough|finish|mouth|spring/.test(pass) && !/bore|crossing/.test(pass))
    .map(({ pass, runs }) => ({
      pass,
      d: runs.map(({ from, moves }) => nearRuns(from, moves, near)).join(''),
    }));
}

function nearRuns(from: Position, moves: readonly MoveStep[], near: (at: Position) => boolean): string {
  const parts: string[] = [];
  let start = from;
  let at = from;
  let run: MoveStep[] = [];
  const finish = (): void => {
    if (run.length > 0) {
      parts.push(movesPath(start, run));
      run = [];
    }
  };
  for (const move of moves) {
    if (near(move.to) || near(at)) {
      start = run.length === 0 ? at : start;
      run.push(move);
    } else {
      finish();
    }
    at = move.to;
  }
  finish();
  return parts.join('');
}
