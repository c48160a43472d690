/**
 * The runs of some passes, laid out as one program: starts, cutter changes, moves between runs at clear height, the end.
 *
 * In  : passes in order, heights, what stands in the way, where to park. Out: one motion in the program's frame.
 * Kept: cutter and spindle first, Z first and up; nothing fast below the clear height but straight up, or straight down
 *       to just above metal; over whatever stands higher than the clear height; parked high and aside at every end.
 */
import type { Cutter } from '../cutting/setup.ts';
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';
import type { Belongs, MoveStep, Position, Step } from '../motion/motion.ts';
import type { Heights } from './heights.ts';
import { inTheBox, inTheWay } from './in-the-way.ts';
import type { Run } from './leg.ts';
import type { PassCuts } from './pass-cuts.ts';

export interface LayTask {
  readonly job: Job;
  readonly machine: Machine;
  readonly heights: Heights;
  readonly park: Position;
  /** What is said where a cutter comes in, besides which. */
  readonly sayAtChange: (cutter: Cutter) => readonly string[];
  readonly notes: readonly string[];
}

export function layProgram(task: LayTask, passes: readonly PassCuts[]): readonly Step[] {
  const { park } = task;
  const steps: Step[] = task.notes.map((text): Step => ({ kind: 'note', text }));
  let at: Position = park;
  passes.forEach((pass, i) => {
    const before = passes[i - 1];
    if (pass.cutter.number !== before?.cutter.number) {
      if (before !== undefined) {
        steps.push(...rest(task, at));
      }
      steps.push(
        { kind: 'top' },
        { kind: 'cutter', number: pass.cutter.number, say: task.sayAtChange(pass.cutter) },
      );
      steps.push({ kind: 'rapid', to: park }, { kind: 'spindle', speed: pass.speed });
      at = park;
    } else if (pass.speed !== before.speed) {
      at = byHand(task) ? aside(steps, at, park) : rise(steps, at, task.heights.over);
      steps.push({ kind: 'spindle', speed: pass.speed });
    }
    for (const run of pass.runs) {
      at = layRun(steps, task, pass, run, at);
    }
  });
  return [...steps, ...rest(task, at)];
}

/** Straight up, aside, and from there to the top; the spindle off over the work, or aside where hands have to do it. */
function rest(task: LayTask, at: Position): readonly Step[] {
  const { park } = task;
  const off: Step = { kind: 'spindle', speed: 0 };
  const steps: Step[] = [];
  const up = rise(steps, at, park.z);
  steps.push(...(byHand(task) ? [] : [off]));
  aside(steps, up, park);
  return [...steps, { kind: 'top' }, ...(byHand(task) ? [off] : [])];
}

function byHand({ machine }: LayTask): boolean {
  return machine.words.spindle.run === 'by-hand';
}

/** To where hands can reach: up first, then across. */
function aside(steps: Step[], at: Position, park: Position): Position {
  rise(steps, at, park.z);
  steps.push({ kind: 'rapid', to: park });
  return park;
}

function rise(steps: Step[], at: Position, z: number): Position {
  const up = { ...at, z: Math.max(at.z, z) };
  if (up.z !== at.z) {
    steps.push({ kind: 'rapid', to: up });
  }
  return up;
}

/** Up, across, down, and the run itself. */
function layRun(steps: Step[], task: LayTask, pass: PassCuts, run: Run, from: Position): Position {
  const { heights } = task;
  const belongs = run.steps[0]?.belongs;
  if (from.x === run.at.x && from.y === run.at.y) {
    // Over the same spot there is nothing to clear: straight up (or down) to just above metal.
    const to = { ...run.at, z: run.fastTo };
    if (to.z !== from.z) {
      steps.push(rapid(to, belongs));
    }
    for (const step of run.steps) {
      steps.push(step);
    }
    return run.steps.at(-1)?.to ?? to;
  }
  const low: Position = { ...run.at, z: Math.max(heights.clear, Math.min(from.z, heights.over)) };
  const blocked = acrossBlocked(task, pass, from, low);
  const z = Math.max(blocked ? heights.over : heights.clear, Math.min(from.z, heights.park));
  const across: Position = { ...run.at, z };
  const moves = [{ ...from, z }, across, { ...run.at, z: Math.min(run.fastTo, z) }];
  let at = from;
  for (const to of moves) {
    if (to.x !== at.x || to.y !== at.y || to.z !== at.z) {
      steps.push(rapid(to, belongs));
      at = to;
    }
  }
  for (const step of run.steps) {
    steps.push(step);
  }
  return run.steps.at(-1)?.to ?? at;
}

/** A machine that crosses at its own angle may pass anywhere in the box between two places. */
function acrossBlocked(
  { job, machine }: LayTask,
  { cutter }: PassCuts,
  from: Position,
  to: Position,
): boolean {
  const start = { ...from, z: to.z };
  const straight = machine.words.positions.rapidShape === 'straight';
  return job.setup.obstacles.some((obstacle) =>
    straight
      ? inTheWay(start, { kind: 'rapid', to }, [obstacle], cutter, machine) !== undefined
      : inTheBox(start, to, obstacle, cutter, machine),
  );
}

function rapid(to: Position, belongs: Belongs | undefined): MoveStep {
  return belongs === undefined ? { kind: 'rapid', to } : { kind: 'rapid', to, belongs };
}
