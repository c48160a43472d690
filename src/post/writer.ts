/**
 * What the writer remembers between blocks: where the controller stands (in counts of the last digit), what is in force,
 * and the words made ready once a program. Local to one call of `writeProgram`.
 */
import type { Machine } from '../machine/machine.ts';
import type { Belongs, Position } from '../motion/motion.ts';
import { openArcMemory, type ArcMemory } from './arc-memory.ts';
import { formatCode, formatCount, type NumberStyle } from './format-word.ts';
import { programGrid, toGrid, type Grid } from './program-grid.ts';
import { complain, type Sink } from './program-sink.ts';

export interface Writer {
  readonly sink: Sink;
  readonly machine: Machine;
  readonly grid: Grid;
  readonly codes: {
    readonly rapid: string;
    readonly line: string;
    readonly cw: string;
    readonly ccw: string;
  };
  /** Where Z is highest in this program, in counts: at or above the clear height. */
  readonly highestZ: number;
  readonly largestCount: number;
  readonly decimals: number;
  /** Every axis, every motion word in every block. */
  readonly everyAxis: boolean;
  readonly everyMotion: boolean;
  readonly numbers: NumberStyle;
  readonly arcMemory: ArcMemory;
  /** Texts of lengths by their count: laps come back to the same places. */
  readonly lengthTexts: Map<number, string>;
  /** As written, in counts; NaN where not known. */
  x: number;
  y: number;
  z: number;
  /** As meant, mm; only used where the place is known. */
  exact: Position;
  /** The spindle stands at the machine's top. */
  atTop: boolean;
  /** Motion word in force, '' where not known. */
  motion: string;
  /** Feed word in force, '' where not known. */
  feedText: string;
  /** The feed last turned into a word: most moves share one. */
  lastFeed: { readonly value: number; readonly text: string };
  spindle: number;
  /** Hands are to switch the spindle off, at the next stop there is a reason for, or before anything moves. */
  offWanted: boolean;
  /** Number of the last step that moves, and of the step being written. */
  readonly lastMove: number;
  step: number;
  cutter: number | null;
  path: string | null;
  belongs: Belongs | undefined;
  readonly arcs: { written: number; lined: number; worstMiss: number; worstLine: number };
}

export function openWriter(machine: Machine, sink: Sink, highestZ: number, lastMove: number): Writer {
  const grid = programGrid(machine);
  const width = machine.words.numbers.codeWidth;
  return {
    sink,
    machine,
    grid,
    codes: {
      rapid: formatCode('G0', width),
      line: formatCode('G1', width),
      cw: formatCode('G2', width),
      ccw: formatCode('G3', width),
    },
    highestZ: toGrid(grid, highestZ),
    largestCount: machine.words.numbers.valueLargest * grid.perUnit,
    decimals: grid.decimals,
    everyAxis: machine.words.modes.axisRepeat === 'every-block',
    everyMotion: machine.words.modes.modeRepeat === 'every-block',
    numbers: machine.words.numbers,
    arcMemory: openArcMemory(),
    lengthTexts: new Map(),
    x: NaN,
    y: NaN,
    z: NaN,
    exact: { x: NaN, y: NaN, z: NaN },
    atTop: false,
    motion: '',
    feedText: '',
    lastFeed: { value: NaN, text: '' },
    spindle: 0,
    offWanted: false,
    lastMove,
    step: 0,
    cutter: null,
    path: null,
    belongs: undefined,
    arcs: { written: 0, lined: 0, worstMiss: 0, worstLine: 0 },
  };
}

/** After hands, a changer or a retract: nothing about the place, the motion or the feed is taken as known. */
export function forgetPlace(writer: Writer): void {
  writer.x = NaN;
  writer.y = NaN;
  writer.z = NaN;
  writer.atTop = false;
  forgetModes(writer);
}

export function forgetModes(writer: Writer): void {
  writer.motion = '';
  writer.feedText = '';
}

/** A length word's value. */
export function lengthText(writer: Writer, count: number): string {
  const known = writer.lengthTexts.get(count);
  if (known !== undefined) {
    return known;
  }
  if (count > writer.largestCount || count < -writer.largestCount) {
    complain(writer.sink, 'post.cannot-say', 'value', {
      message: `a length of ${count / writer.grid.perUnit} ${writer.grid.unit} is beyond the largest value the machine file allows (${writer.machine.words.numbers.valueLargest})`,
      hint: 'check the job for a wrong unit, or value-largest in the machine file',
    });
  }
  const text = formatCount(count, writer.decimals, writer.numbers);
  writer.lengthTexts.set(count, text);
  return text;
}
