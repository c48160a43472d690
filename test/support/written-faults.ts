/**
 * What is wrong with a random motion as a machine's program, read back from its text alone: an empty list where nothing is.
 * Frame of all places: the program's; mm.
 */
import { millimetresPer } from '../../src/base/units.ts';
import type { Machine } from '../../src/machine/machine.ts';
import type { ArcStep, MoveStep, Position } from '../../src/motion/motion.ts';
import type { TracedMove } from '../../src/motion/traced-move.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { traceProgram, type Trace } from '../../src/prove/trace-program.ts';
import { headerFacts } from './header-facts.ts';
import type { NumberedMotion } from './numbered-motion.ts';

/** Above rounding of the doubles, below any digit. */
const NOISE = 1e-9;

export interface Written {
  readonly text: string;
  readonly trace: Trace;
  /** The traced moves of each numbered step. */
  readonly byStep: readonly (readonly TracedMove[])[];
}

export function writeRandom(machine: Machine, random: NumberedMotion): Written {
  const { motion, moves } = random;
  const header = headerFacts(motion);
  const outcome = writeProgram({ machine, name: 'random', suffix: '', label: 7, motion, header });
  if (!outcome.ok) {
    throw new Error(outcome.problems.map((problem) => problem.message).join('; '));
  }
  const text = outcome.value.text;
  const trace = traceProgram('random', text, machine, { cutter: 3 });
  const begins = new Map<number, number>();
  text.split(/\r?\n/).forEach((line, i) => {
    const step = /^[(;]step (\d+)\)?$/i.exec(line)?.[1];
    if (step !== undefined) {
      begins.set(Number(step), i + 1);
    }
  });
  const byStep: TracedMove[][] = moves.map(() => []);
  for (const move of trace.moves) {
    const step = moves.findLastIndex((_, i) => (begins.get(i) ?? Infinity) < move.line);
    if (step >= 0 && move.line < (begins.get(step + 1) ?? 0)) {
      byStep[step]?.push(move);
    }
  }
  return { text, trace, byStep };
}

export function lastDigit(machine: Machine): number {
  return millimetresPer(machine.units) * 10 ** -machine.words.numbers.lengthDecimals[machine.units];
}

/** (a) of the writer's properties: every step ends where it should, to half a unit, however many came before. */
export function placeFaults(machine: Machine, random: NumberedMotion, written: Written): string[] {
  const half = lastDigit(machine) / 2 + NOISE;
  const faults: string[] = [];
  let place: TracedMove['to'] = random.moves[0]?.from ?? { x: 0, y: 0, z: 0 };
  random.moves.forEach(({ step }, i) => {
    place = written.byStep[i]?.at(-1)?.to ?? place;
    for (const axis of ['x', 'y', 'z'] as const) {
      if (!(Math.abs((place[axis] ?? NaN) - step.to[axis]) <= half)) {
        faults.push(`step ${i} ends at ${axis} ${place[axis]} instead of ${step.to[axis]}`);
      }
    }
  });
  return faults;
}

export function stateFaults(machine: Machine, random: NumberedMotion, written: Written): string[] {
  const faults: string[] = [];
  const digit = millimetresPer(machine.units) * 10 ** -machine.words.numbers.feedDecimals;
  random.moves.forEach(({ from, step }, i) => {
    for (const move of written.byStep[i] ?? []) {
      if (move.cutter !== 3 || Math.abs(move.spindle) !== 12000) {
        faults.push(`step ${i} with cutter ${move.cutter} at ${move.spindle}`);
      }
      if ((move.kind === 'rapid') !== (step.kind === 'rapid')) {
        faults.push(`step ${i} is a ${move.kind} instead of a ${step.kind}`);
      }
      const slack = (digit / 2) * steepness(from, step) + NOISE;
      if (step.kind !== 'rapid' && !(Math.abs((move.feed ?? NaN) - step.feed) <= slack)) {
        faults.push(`step ${i} at feed ${move.feed} instead of ${step.feed}`);
      }
    }
  });
  return faults;
}

/** Length of a helix over that of the circle under it. */
function steepness(from: Position, step: MoveStep): number {
  if (step.kind !== 'arc') {
    return 1;
  }
  const circle = Math.hypot(from.x - step.centre.x, from.y - step.centre.y) * Math.abs(step.turn);
  return circle === 0 ? 1 : Math.hypot(circle, step.to.z - from.z) / circle;
}

export function arcFaults(machine: Machine, random: NumberedMotion, written: Written): string[] {
  return random.moves.flatMap(({ from, step }, i) =>
    step.kind === 'arc'
      ? offArc(machine, written.byStep[i] ?? [], from, step).map((fault) => `step ${i} ${fault}`)
      : [],
  );
}

/** On the circle to a unit in X and one in Y (chords: and their tolerance, inside), and turned as far as was meant. */
function offArc(machine: Machine, moves: readonly TracedMove[], from: Position, step: ArcStep): string[] {
  const unit = lastDigit(machine);
  const radius = Math.hypot(from.x - step.centre.x, from.y - step.centre.y);
  const slack = 1.5 * unit + NOISE;
  const faults: string[] = [];
  let turned = 0;
  for (const move of moves) {
    const offs = pointsOn(move).map(
      (point) => Math.hypot(point.x - step.centre.x, point.y - step.centre.y) - radius,
    );
    if (Math.max(...offs) > slack || Math.min(...offs) < -slack - machine.words.arcs.chordTolerance) {
      faults.push(`leaves its circle of ${radius} by ${offs.join(' ')}`);
    }
    turned += move.kind === 'arc' ? (move.turn ?? 0) : angleSeen(move, step.centre);
  }
  if (radius > 20 * unit && Math.abs(turned - step.turn) * radius > 6 * unit) {
    faults.push(`turns ${turned} instead of ${step.turn} on a radius of ${radius}`);
  }
  return faults;
}

function pointsOn(move: TracedMove): readonly { x: number; y: number }[] {
  const [x0, y0] = [move.from.x ?? NaN, move.from.y ?? NaN];
  const [x1, y1] = [move.to.x ?? NaN, move.to.y ?? NaN];
  return [0, 0.25, 0.5, 0.75, 1].map((u) => {
    if (move.kind !== 'arc' || move.centre === undefined) {
      return { x: x0 + u * (x1 - x0), y: y0 + u * (y1 - y0) };
    }
    const { centre } = move;
    const r0 = Math.hypot(x0 - centre.x, y0 - centre.y);
    const r1 = Math.hypot(x1 - centre.x, y1 - centre.y);
    const angle = Math.atan2(y0 - centre.y, x0 - centre.x) + u * (move.turn ?? 0);
    const r = r0 + u * (r1 - r0);
    return { x: centre.x + r * Math.cos(angle), y: centre.y + r * Math.sin(angle) };
  });
}

function angleSeen(move: TracedMove, centre: { readonly x: number; readonly y: number }): number {
  const a = Math.atan2((move.from.y ?? 0) - centre.y, (move.from.x ?? 0) - centre.x);
  const b = Math.atan2((move.to.y ?? 0) - centre.y, (move.to.x ?? 0) - centre.x);
  const turn = b - a;
  return turn > Math.PI ? turn - 2 * Math.PI : turn < -Math.PI ? turn + 2 * Math.PI : turn;
}

/** (b): each arc of the text, from its rounded words, against the controller's own limits. */
export function limitFaults(machine: Machine, written: Written): string[] {
  const { arcs } = machine.words;
  const most = arcs.missAbsolute[machine.units] * millimetresPer(machine.units);
  return written.trace.moves.flatMap((move) => {
    if (move.kind !== 'arc' || move.centre === undefined) {
      return [];
    }
    const r1 = Math.hypot((move.from.x ?? 0) - move.centre.x, (move.from.y ?? 0) - move.centre.y);
    const r2 = Math.hypot((move.to.x ?? 0) - move.centre.x, (move.to.y ?? 0) - move.centre.y);
    const share = arcs.missShare === null ? 0 : Math.min(arcs.missShare * r1, arcs.missAtMost ?? Infinity);
    const chord = Math.hypot((move.from.x ?? 0) - (move.to.x ?? 0), (move.from.y ?? 0) - (move.to.y ?? 0));
    const whole = Math.abs(move.turn ?? 0) > 2 * Math.PI - NOISE;
    const faults: string[] = [];
    if (!(Math.abs(r1 - r2) <= Math.max(most, share) + NOISE)) {
      faults.push(`line ${move.line} misses by ${Math.abs(r1 - r2)}`);
    }
    if (!whole && !(chord >= Math.max(arcs.shortestChord, 3 * lastDigit(machine)) - NOISE)) {
      faults.push(`line ${move.line} has a chord of ${chord}`);
    }
    return faults;
  });
}
