/**
 * Property one: what is read back from a program's text is what was meant.
 *
 * In  : the motion that was written, the trace of the text, the machine it was written for. mm, mm/min, 1/min, radians.
 * Out : every difference, in words; none where each traced move lies on the meant one, in order and to its end, within a
 *       unit of the last digit (and the chord tolerance where an arc became lines), with its feed, cutter and spindle.
 *       Arcs may be split or become lines, rapids may go axis by axis; both are compared as paths.
 */
import { millimetresPer } from '../base/units.ts';
import type { Machine } from '../machine/machine.ts';
import type { ArcStep, Motion, MoveStep, Position } from '../motion/motion.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Trace } from '../prove/trace-program.ts';
import { compareEvents } from './compare-events.ts';
import { arcLength, distanceTo, pointOf, radiusOf, shareOfArc, shareOfLine } from './meant-path.ts';

type Maybe = TracedMove['to'];

interface Meant {
  readonly step: MoveStep;
  /** undefined where the machine was at its top, or hands were at it. */
  readonly from: Position | undefined;
  readonly cutter: number | null;
  readonly spindle: number;
  readonly index: number;
}

interface Walk {
  readonly machine: Machine;
  /** One unit of the last digit, mm. */
  readonly unit: number;
  readonly moves: readonly TracedMove[];
  /** Indices of the moves that go to a place of the machine. */
  readonly tops: ReadonlySet<number>;
  readonly differences: string[];
  next: number;
  place: Maybe;
}

const NOWHERE: Maybe = { x: null, y: null, z: null };
/** Double rounding of sums, in units of the last digit. */
const NOISE = 1e-4;

export function compareMotion(motion: Motion, trace: Trace, machine: Machine): readonly string[] {
  const unit = millimetresPer(machine.units) * 10 ** -machine.words.numbers.lengthDecimals[machine.units];
  const lines = new Set(trace.events.filter(({ kind }) => kind === 'machine-place').map(({ line }) => line));
  const tops = new Set(trace.moves.flatMap(({ line }, i) => (lines.has(line) ? [i] : [])));
  const walk: Walk = { machine, unit, moves: trace.moves, tops, differences: [], next: 0, place: NOWHERE };
  for (const meant of meantMoves(motion, machine)) {
    if (walk.differences.length > 5) {
      break;
    }
    follow(walk, meant);
  }
  passOver(walk, 'tops too');
  if (walk.differences.length === 0 && walk.next < trace.moves.length) {
    walk.differences.push(`line ${String(trace.moves[walk.next]?.line)}: a move that was never meant`);
  }
  return [...walk.differences, ...compareEvents(motion, trace, machine)];
}

function meantMoves(motion: Motion, machine: Machine): readonly Meant[] {
  const meant: Meant[] = [];
  const sign = machine.words.spindle.forward === 'M3' ? 1 : -1;
  let from: Position | undefined;
  let cutter: number | null = null;
  let spindle = 0;
  motion.steps.forEach((step, index) => {
    switch (step.kind) {
      case 'top':
        from = undefined;
        break;
      case 'cutter':
        from = undefined;
        cutter = step.number;
        spindle = 0;
        break;
      case 'stop':
        from = undefined;
        spindle = 0;
        break;
      case 'spindle':
        spindle = step.speed === 0 ? 0 : sign * step.speed;
        break;
      case 'rapid':
      case 'line':
      case 'arc':
        meant.push({ step, from, cutter, spindle, index });
        from = step.to;
        break;
    }
  });
  return meant;
}

/** Passes over rapids to where it stands already, and, where one may be, over ways to the machine's top. */
function passOver(walk: Walk, what: 'tops too' | 'still only'): void {
  for (;;) {
    const move = walk.moves[walk.next];
    const isTop = what === 'tops too' && walk.tops.has(walk.next);
    if (move === undefined || !(isTop || (move.kind === 'rapid' && isStill(move)))) {
      return;
    }
    walk.place = move.to;
    walk.next += 1;
  }
}

function isStill({ from, to }: TracedMove): boolean {
  return (
    from.x !== null &&
    from.y !== null &&
    from.z !== null &&
    from.x === to.x &&
    from.y === to.y &&
    from.z === to.z
  );
}

/** An arc of so few units is a handful of places: only where they lie and where it ends can be told. */
const TINY_UNITS = 20;

/** Takes the traced moves that make up one meant move. */
function follow(walk: Walk, meant: Meant): void {
  passOver(walk, meant.from === undefined ? 'tops too' : 'still only');
  if (meant.from === undefined) {
    walk.place = walk.moves[walk.next]?.from ?? walk.place;
  }
  if (meant.step.kind === 'arc' && meant.from !== undefined) {
    const radius = radiusOf(meant.step, meant.from);
    if (
      radius < TINY_UNITS * walk.unit &&
      Math.abs(meant.step.to.z - meant.from.z) < TINY_UNITS * walk.unit
    ) {
      followTiny(walk, meant, meant.step, radius);
      return;
    }
  }
  let share = 0;
  const room =
    meant.step.kind === 'arc' && meant.from !== undefined
      ? (3 * walk.unit) / arcLength(meant.step, meant.from)
      : 1;
  while (!(isAt(walk, meant.step.to) && (share >= 1 - room || meant.step.kind !== 'arc'))) {
    const move = walk.moves[walk.next];
    if (move === undefined || walk.tops.has(walk.next)) {
      walk.differences.push(
        `step ${String(meant.index)}: the program ends before its ${meant.step.kind} is made`,
      );
      return;
    }
    const wrong = settingsDiffer(walk, meant, move);
    const along = wrong === undefined ? alongPath(walk, meant, move, share) : wrong;
    if (typeof along === 'string') {
      walk.differences.push(`step ${String(meant.index)}, line ${String(move.line)}: ${along}`);
      return;
    }
    share = along;
    walk.place = move.to;
    walk.next += 1;
  }
}

/** As many moves as stay round the centre and come to the end. */
function followTiny(walk: Walk, meant: Meant, step: ArcStep, radius: number): void {
  const begin = walk.next;
  let done = isAt(walk, step.to) ? begin : -1;
  let place = walk.place;
  for (let i = begin; i < walk.moves.length && !walk.tops.has(i); i++) {
    const move = walk.moves[i];
    if (move === undefined || settingsDiffer(walk, meant, move) !== undefined) {
      break;
    }
    const away = [0.5, 1].map((u) =>
      Math.hypot(pointOf(move, u).x - step.centre.x, pointOf(move, u).y - step.centre.y),
    );
    if (move.kind === 'rapid' || Math.max(...away) > radius + 2 * walk.unit) {
      break;
    }
    walk.place = move.to;
    if (isAt(walk, step.to)) {
      done = i + 1;
      place = move.to;
    }
  }
  walk.place = place;
  walk.next = Math.max(begin, done);
  if (done < 0) {
    walk.differences.push(`step ${String(meant.index)}: a tiny arc does not come to its end`);
  }
}

/** Rounded to the last digit, the machine stands at the end of the step. */
function isAt(walk: Walk, to: Position): boolean {
  const near = (a: number | null, b: number): boolean =>
    a !== null && Math.abs(a - b) <= walk.unit * (0.5 + NOISE);
  return near(walk.place.x, to.x) && near(walk.place.y, to.y) && near(walk.place.z, to.z);
}

const A = { rapid: 'a fast move', line: 'a line', arc: 'an arc' } as const;

function settingsDiffer(walk: Walk, meant: Meant, move: TracedMove): string | undefined {
  const { step } = meant;
  if ((step.kind === 'rapid') !== (move.kind === 'rapid')) {
    return `${A[move.kind]} where ${A[step.kind]} was meant`;
  }
  if (move.spindle !== meant.spindle) {
    return `spindle ${String(move.spindle)} where ${String(meant.spindle)} was meant`;
  }
  if (move.cutter !== meant.cutter && !(move.cutter === null && cannotSayCutter(walk.machine))) {
    const found = move.cutter === null ? 'no cutter is named' : `cutter ${String(move.cutter)}`;
    return `${found} where ${meant.cutter === null ? 'none' : `cutter ${String(meant.cutter)}`} was meant`;
  }
  if (step.kind !== 'rapid') {
    const last = millimetresPer(walk.machine.units) * 10 ** -walk.machine.words.numbers.feedDecimals;
    const wrong = Math.abs((move.feed ?? 0) - step.feed);
    if (wrong > last * (0.5 + NOISE) * steepness(meant) + roundedSlope(walk, meant)) {
      return `feed ${String(move.feed)} where ${String(step.feed)} was meant`;
    }
  }
  return undefined;
}

/** Length of a helix over the circle below it: where F counts along the circle, its rounding grows by as much. */
function steepness({ step, from }: Meant): number {
  if (step.kind !== 'arc' || from === undefined) {
    return 1;
  }
  const circle = arcLength({ ...step, to: { ...step.to, z: from.z } }, from);
  return Math.hypot(circle, step.to.z - from.z) / circle;
}

/** Where F counts along the circle, the rounding of a short helix changes its slope, and the feed along it by as much. */
function roundedSlope(walk: Walk, { step, from }: Meant): number {
  return step.kind === 'arc' && from !== undefined && step.to.z !== from.z
    ? (3 * walk.unit * step.feed) / arcLength(step, from)
    : 0;
}

function cannotSayCutter(machine: Machine): boolean {
  return machine.words.cutters.words === 'none' && machine.words.file.commentForm === 'none';
}

/** How far along the meant move the traced one ends (0 to 1), or how it strays. */
function alongPath(walk: Walk, meant: Meant, move: TracedMove, share: number): number | string {
  const { step, from } = meant;
  if (step.kind === 'rapid') {
    return rapidStrays(walk, meant, move) ?? 1;
  }
  if (from === undefined || move.from.x === null || move.from.y === null || move.from.z === null) {
    return 'a cutting move from an unknown place';
  }
  const samples = move.kind === 'arc' ? Math.max(8, Math.ceil(Math.abs(move.turn ?? 0) / 0.2)) : 4;
  const chord = move.kind === 'line' && step.kind === 'arc' ? walk.machine.words.arcs.chordTolerance : 0;
  const allowed = walk.unit * (1 + NOISE) + chord;
  let at = share;
  for (let i = 0; i <= samples; i++) {
    const point = pointOf(move, i / samples);
    const next = step.kind === 'line' ? shareOfLine(from, step.to, point) : shareOfArc(step, from, point, at);
    const off = distanceTo(step, from, point, Math.min(1, Math.max(0, next)));
    if (off > allowed) {
      return `${off.toFixed(6)} mm off the path that was meant, ${allowed.toFixed(6)} mm are allowed`;
    }
    const length =
      step.kind === 'arc'
        ? arcLength(step, from)
        : Math.hypot(step.to.x - from.x, step.to.y - from.y, step.to.z - from.z);
    if ((at - next) * length > 2 * walk.unit) {
      return 'runs back along the path';
    }
    at = Math.max(at, next);
  }
  return at;
}

/** Each axis at its old place, its new one, or unknown; straight where nothing says otherwise. */
function rapidStrays(walk: Walk, { step, from }: Meant, move: TracedMove): string | undefined {
  for (const axis of ['x', 'y', 'z'] as const) {
    const value = move.to[axis];
    const near = (b: number | undefined): boolean =>
      b !== undefined && Math.abs((value ?? 0) - b) <= walk.unit * (0.5 + NOISE);
    if (value !== null && value !== move.from[axis] && !near(step.to[axis]) && !near(from?.[axis])) {
      return `a rapid by way of ${axis.toUpperCase()} ${String(value)}`;
    }
  }
  return undefined;
}
