/**
 * What a cycle does in its hole, from the height R down and out to the clear height (NISTIR 6556 §3.5.16.2 to .9; G84 to G89
 * by memory of it). mm, mm/min, s.
 *
 * | cycle | down | at the bottom | out |
 * | G81, G82 | feed | G82 waits | fast |
 * | G83 | feed by Q, each time fast out and back | | fast |
 * | G73 | feed by Q, each time a little back | | fast |
 * | G84 | feed | spindle turned round | feed |
 * | G85, G89 | feed | G89 waits | feed |
 * | G86 | feed | waits, spindle stopped | fast |
 * | G88 | feed | waits, spindle stopped, stop for hands | by hand |
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { BIT } from './block.ts';
import { spindleOf, type CycleMode } from './modes.ts';
import { stepFrom } from './trace-place.ts';
import { happen, makeMove, type Run } from './trace-run.ts';

export interface Hole {
  readonly cycle: CycleMode;
  readonly top: number;
  readonly bottom: number;
  readonly clear: number;
  readonly seconds: number;
  /** 0 where the cycle goes down at once. */
  readonly peck: number;
}

/** How far above the last bottom a peck ends its fast way back, mm. The report says "a bit".
 *  Why this: the published reference of a controller that descends from it (0.010 inch); gcode.md 3.1. */
const BACK_OFF = 0.254;

/** Letters that the cycle must be given beside X Y Z R. */
export function lettersOfCycle(cycle: CycleMode): number {
  switch (cycle) {
    case 'G82':
    case 'G86':
    case 'G88':
    case 'G89':
      return BIT.P;
    case 'G73':
    case 'G83':
      return BIT.Q;
    default:
      return 0;
  }
}

/** How often it goes down. */
export function peckCount({ top, bottom, peck }: Hole): number {
  return peck === 0 ? 1 : Math.max(1, Math.ceil((top - bottom - SAME_POINT) / peck));
}

export function drill(run: Run, hole: Hole): void {
  const { cycle, bottom, clear, seconds } = hole;
  const { turning } = run.modes;
  if (hole.peck > 0) {
    peckDown(run, hole);
  } else {
    feedTo(run, bottom);
  }
  if (seconds > 0) {
    happen(run, { kind: 'dwell', seconds });
  }
  switch (cycle) {
    case 'G84':
      turn(run, -1);
      feedTo(run, clear);
      turn(run, turning);
      break;
    case 'G85':
    case 'G89':
      feedTo(run, clear);
      break;
    case 'G86':
      turn(run, 0);
      fastTo(run, clear);
      turn(run, turning);
      break;
    case 'G88':
      turn(run, 0);
      happen(run, { kind: 'stop', optional: false });
      run.here = { ...run.here, z: null };
      turn(run, turning);
      break;
    default:
      fastTo(run, clear);
  }
}

function peckDown(run: Run, hole: Hole): void {
  const { cycle, top, bottom, clear, peck } = hole;
  const out = run.machine.words.holes.peckReturn === 'R' ? top : clear;
  const pecks = peckCount(hole);
  for (let k = 1; k < pecks; k++) {
    const depth = stepFrom(run, top, -k * peck);
    feedTo(run, depth);
    if (cycle === 'G83') {
      fastTo(run, out);
    }
    fastTo(run, Math.min(depth + BACK_OFF, top));
  }
  feedTo(run, bottom);
}

function turn(run: Run, way: 1 | -1 | 0 | undefined): void {
  run.modes.turning = way;
  happen(run, { kind: 'spindle', speed: spindleOf(run.modes) });
}

function feedTo(run: Run, z: number): void {
  makeMove(run, 'line', { ...run.here, z }, run.modes.feed ?? null);
}

function fastTo(run: Run, z: number): void {
  if (run.here.z !== z) {
    makeMove(run, 'rapid', { ...run.here, z }, null);
  }
}
