/**
 * A small set of motions that uses every word a machine file can give: what `ogive machines check` writes and reads back.
 * All of it in the air, in a square of 10 mm round zero and 0.5 mm deep below it; small enough for any travel.
 *
 * Out : motions with names, each a program of its own; mm, mm/min, 1/min.
 */
import type { Machine } from '../machine/machine.ts';
import type { Belongs, Motion, Position, Step } from '../motion/motion.ts';

export interface NamedMotion {
  /** A file name's end: `lines`. */
  readonly name: string;
  readonly what: string;
  readonly motion: Motion;
}

const CLEAR = 5;
const DEPTH = -0.5;

export function postMotions(machine: Machine): readonly NamedMotion[] {
  const { spindleLowest, spindleHighest, feedLowest, feedHighest } = machine.limits;
  const speed = Math.round((spindleLowest + spindleHighest) / 2);
  const feed = Math.min(Math.max(120, feedLowest), feedHighest);
  // Where nothing waits, a machine file may go without a word for it.
  const waits: readonly Step[] =
    machine.words.dwell.letter === 'none' ? [] : [{ kind: 'dwell', seconds: 0.25 }];
  const changes =
    machine.words.cutters.change === 'one-program'
      ? []
      : changeSteps(speed, feed, Math.min(2, machine.words.cutters.highest));
  return [
    {
      name: 'lines',
      what: `rapids, lines, ramps,${waits.length > 0 ? ' a wait,' : ''} a note`,
      motion: program(speed, lineSteps(feed, waits)),
    },
    { name: 'arcs', what: 'arcs of every size and turn, circles', motion: program(speed, arcSteps(feed)) },
    { name: 'helix', what: 'helices and ramps on arcs', motion: program(speed, helixSteps(feed)) },
    { name: 'tiny', what: 'arcs near the last digit', motion: program(speed, tinySteps(feed)) },
    ...(changes.length > 0
      ? [{ name: 'changes', what: 'cutter changes and stops', motion: program(speed, changes) }]
      : []),
  ];
}

function at(x: number, y: number, z: number): Position {
  return { x, y, z };
}

/** Spindle on and over to the start, the steps, spindle off and up. */
function program(speed: number, steps: readonly Step[]): Motion {
  return {
    steps: [
      { kind: 'top' },
      { kind: 'cutter', number: 1, say: ['fit cutter 1'] },
      { kind: 'spindle', speed },
      { kind: 'rapid', to: at(0, 0, CLEAR) },
      ...steps,
      { kind: 'spindle', speed: 0 },
      { kind: 'top' },
    ],
  };
}

const ROUGHING: Belongs = { pass: 'roughing', lap: 1, laps: 2, depth: DEPTH };
const FINISHING: Belongs = { pass: 'finishing', tooth: 1, depth: DEPTH };

function lineSteps(feed: number, waits: readonly Step[]): readonly Step[] {
  return [
    { kind: 'note', text: 'a square with a ramp' },
    { kind: 'rapid', to: at(-4, -5, CLEAR + 2), belongs: ROUGHING },
    { kind: 'rapid', to: at(-5, -5, CLEAR), belongs: ROUGHING },
    { kind: 'line', to: at(-5, -5, 0.1), feed: feed / 2, belongs: ROUGHING },
    { kind: 'line', to: at(5, -5, DEPTH), feed, belongs: ROUGHING },
    { kind: 'line', to: at(5, 5, DEPTH), feed, belongs: FINISHING },
    ...waits,
    { kind: 'line', to: at(-4.99995, 5.00005, DEPTH), feed: feed / 3, belongs: FINISHING },
    { kind: 'line', to: at(-5, -5, DEPTH), feed, belongs: FINISHING },
    { kind: 'rapid', to: at(-5, -5, CLEAR) },
  ];
}

/** Counter-clockwise and clockwise, from a few degrees to whole circles, and back to the start by a line. */
function arcSteps(feed: number): readonly Step[] {
  const steps: Step[] = [
    { kind: 'rapid', to: at(3, 0, CLEAR) },
    { kind: 'line', to: at(3, 0, DEPTH), feed },
  ];
  for (const degrees of [5, 45, 90, 120, 180, 200, 300, 355, 360]) {
    for (const way of [1, -1]) {
      const turn = (way * degrees * Math.PI) / 180;
      const to = degrees === 360 ? at(3, 0, DEPTH) : at(3 * Math.cos(turn), 3 * Math.sin(turn), DEPTH);
      steps.push({ kind: 'arc', to, centre: { x: 0, y: 0 }, turn, feed });
      steps.push({ kind: 'line', to: at(3, 0, DEPTH), feed });
    }
  }
  steps.push({ kind: 'rapid', to: at(3, 0, CLEAR) });
  return steps;
}

function helixSteps(feed: number): readonly Step[] {
  const turn = 2 * Math.PI;
  return [
    { kind: 'rapid', to: at(0, 2, CLEAR) },
    { kind: 'line', to: at(0, 2, 0), feed },
    { kind: 'arc', to: at(0, 2, -0.2), centre: { x: 0, y: 0 }, turn, feed },
    { kind: 'arc', to: at(0, -2, -0.4), centre: { x: 0, y: 0 }, turn: -turn / 2, feed },
    { kind: 'arc', to: at(0, -2, -0.4), centre: { x: 0, y: 0 }, turn: -turn, feed },
    { kind: 'rapid', to: at(0, -2, CLEAR) },
  ];
}

/** Chords of a few hundredths of the last digit up to a few tenths of a millimetre, end to end. */
function tinySteps(feed: number): readonly Step[] {
  const steps: Step[] = [
    { kind: 'rapid', to: at(1, 1, CLEAR) },
    { kind: 'line', to: at(1, 1, DEPTH), feed },
  ];
  let [x, y] = [1, 1];
  for (let size = 0.00001; size < 0.5; size *= 3) {
    const turn = size < 0.01 ? Math.PI / 2 : -Math.PI * 0.75;
    const centre = { x: x + size, y: y + size / 3 };
    const [dx, dy] = [x - centre.x, y - centre.y];
    x = centre.x + dx * Math.cos(turn) - dy * Math.sin(turn);
    y = centre.y + dx * Math.sin(turn) + dy * Math.cos(turn);
    steps.push({ kind: 'arc', to: at(x, y, DEPTH), centre, turn, feed });
  }
  steps.push({ kind: 'rapid', to: at(x, y, CLEAR) });
  return steps;
}

function changeSteps(speed: number, feed: number, second: number): readonly Step[] {
  return [
    { kind: 'line', to: at(0, 0, DEPTH), feed },
    { kind: 'rapid', to: at(0, 0, CLEAR) },
    { kind: 'top' },
    { kind: 'cutter', number: second, say: [`fit cutter ${second}, touch off on the plate`] },
    { kind: 'spindle', speed },
    { kind: 'rapid', to: at(1, 1, CLEAR) },
    { kind: 'line', to: at(1, 1, DEPTH), feed },
    { kind: 'rapid', to: at(1, 1, CLEAR) },
    { kind: 'spindle', speed: 0 },
    { kind: 'stop', say: ['measure over the teeth'] },
    { kind: 'spindle', speed },
    { kind: 'rapid', to: at(2, 2, CLEAR) },
    { kind: 'line', to: at(2, 2, DEPTH), feed },
    { kind: 'rapid', to: at(2, 2, CLEAR) },
  ];
}
