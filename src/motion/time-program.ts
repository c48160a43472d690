/**
 * How long a program takes, and each of its passes: the moves by `timeMoves`, spin-up and dwells as they are written.
 * Stops for hands and cutter changes count nothing: nobody knows how long a person takes. s.
 */
import { isMove, type Motion, type Position } from './motion.ts';
import { timeMoves, type MotionLimits, type TimedMove } from './move-time.ts';

export interface ProgramTime {
  readonly seconds: number;
  /** Seconds by `belongs.pass`; moves that belong to none (to and from, clear of the work) under ''. */
  readonly byPass: ReadonlyMap<string, number>;
}

export function timeProgram(motion: Motion, limits: MotionLimits, spinUpSeconds: number): ProgramTime {
  const moves: TimedMove[] = [];
  const passes: string[] = [];
  let waiting = 0;
  let stands = true;
  let at: Position | undefined;
  for (const step of motion.steps) {
    if (isMove(step)) {
      const from = at ?? step.to;
      moves.push({
        kind: step.kind,
        from,
        to: step.to,
        feed: step.kind === 'rapid' ? 0 : step.feed,
        standsBefore: stands,
        ...(step.kind === 'arc' ? { centre: step.centre, turn: step.turn } : {}),
      });
      passes.push(step.belongs?.pass ?? '');
      at = step.to;
      stands = false;
    } else {
      waiting +=
        step.kind === 'dwell' ? step.seconds : step.kind === 'spindle' && step.speed > 0 ? spinUpSeconds : 0;
      stands = stands || step.kind !== 'note';
    }
  }
  const times = timeMoves(moves, limits);
  const byPass = new Map<string, number>();
  for (const [i, seconds] of times.seconds.entries()) {
    const pass = passes[i] ?? '';
    byPass.set(pass, (byPass.get(pass) ?? 0) + seconds);
  }
  return { seconds: times.total + waiting, byPass };
}
