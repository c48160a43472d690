/**
 * A program's text from any motion, in the words a machine file gives.
 *
 * In  : machine, motion (mm, program frame), the facts its header tells. Out: the file's name and text, or what this
 *       machine has no words for. Same input, same bytes.
 * Kept in every program: header before anything moves, all modes written, no M word on a block that moves,
 *       arcs safe after rounding, nothing of a user's text outside a comment.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import type { Machine } from '../machine/machine.ts';
import { isMove, type Belongs, type Motion } from '../motion/motion.ts';
import { belongsElsewhere, belongsText } from './belongs-text.ts';
import type { HeaderFacts } from './header-facts.ts';
import { headerLines } from './header.ts';
import { writePathFor } from './path-words.ts';
import { writeBeginning, writeEnding, writeLabel } from './program-ends.ts';
import { complain, openSink, writeComments, type Sink } from './program-sink.ts';
import { stopSpindle, writeEvent } from './write-event.ts';
import { writeMove } from './write-move.ts';
import { openWriter, type Writer } from './writer.ts';

export interface ProgramInput {
  readonly machine: Machine;
  /** The job's name and what is put after it: `third-wheel`, `-1`, `-walk`. */
  readonly name: string;
  readonly suffix: string;
  /** Program number, where the machine's programs have one. */
  readonly label: number;
  readonly motion: Motion;
  readonly header: HeaderFacts;
}

export interface ProgramText {
  readonly file: string;
  readonly text: string;
  /** Lines that are neither comments nor per cent or label lines. */
  readonly blocks: number;
  /** Arcs as they came out: written as arcs, turned into lines (or dropped as no move), the worst miss and its line. */
  readonly arcs: {
    readonly written: number;
    readonly lined: number;
    readonly worstMiss: number;
    readonly worstLine: number;
  };
  /** The header, where the machine reads no comments. */
  readonly headerFile?: { readonly file: string; readonly text: string };
}

export function writeProgram(input: ProgramInput): Outcome<ProgramText> {
  const { machine, motion } = input;
  const file = input.name + input.suffix + machine.words.file.ending;
  const sink = openSink(machine, file);
  const header = headerLines(input.header, machine);
  writeLabel(sink, input.label);
  writeComments(sink, header);
  const writer = openWriter(machine, sink, highestOf(motion), motion.steps.findLastIndex(isMove));
  writeBeginning(writer);
  writeSteps(writer, motion);
  writeEnding(writer);
  const lineEnd = machine.words.file.lineEnd === 'crlf' ? '\r\n' : '\n';
  const text = sink.lines.join(lineEnd) + lineEnd;
  checkText(sink, text);
  const problems: readonly Problem[] = [...sink.problems.values()];
  if (problems.length > 0) {
    return failure(problems);
  }
  const program: ProgramText = { file, text, blocks: sink.blocks, arcs: writer.arcs };
  return success(
    machine.words.file.commentForm === 'none'
      ? { ...program, headerFile: headerFile(input, header) }
      : program,
  );
}

function writeSteps(writer: Writer, motion: Motion): void {
  writer.step = -1;
  for (const step of inOrder(writer, motion.steps)) {
    writer.step++;
    if (isMove(step)) {
      if (writer.offWanted) {
        stopSpindle(writer);
      }
      if (step.belongs !== undefined && step.belongs !== writer.belongs) {
        divide(writer, step.belongs);
      }
      writeMove(writer, step);
    } else {
      writeEvent(writer, step);
    }
  }
}

/**
 * Where one program runs for one cutter it is in the spindle before the start, and is named before anything moves: the way to
 * the top is made with it already.
 */
function inOrder(writer: Writer, steps: Motion['steps']): Motion['steps'] {
  const cutter = steps.findIndex(({ kind }) => kind === 'cutter');
  const top = steps.findIndex(({ kind }) => kind === 'top');
  const named = steps[cutter];
  const early = writer.machine.words.cutters.change === 'one-program' && top >= 0 && top < cutter;
  return early && named !== undefined && !steps.slice(0, cutter).some(isMove)
    ? [...steps.slice(0, top), named, ...steps.slice(top, cutter), ...steps.slice(cutter + 1)]
    : steps;
}

function highestOf(motion: Motion): number {
  return motion.steps.reduce((z, step) => (isMove(step) && step.to.z > z ? step.to.z : z), -Infinity);
}

/** A comment and the pass's path words, where something new begins. */
function divide(writer: Writer, belongs: Belongs): void {
  if (belongsElsewhere(writer.belongs, belongs)) {
    writeComments(writer.sink, [belongsText(belongs, writer.grid.unit)]);
    writePathFor(writer, belongs.pass);
  }
  writer.belongs = belongs;
}

/** What only the whole text shows: its size, and characters that act at once wherever they stand. */
function checkText(sink: Sink, text: string): void {
  const { fileLargest, bannedCharacters } = sink.machine.words.file;
  if (fileLargest !== null && text.length > fileLargest) {
    complain(sink, 'post.cannot-say', 'size', {
      message: `the program takes ${text.length} bytes and the controller holds ${fileLargest}`,
      hint: 'cut in fewer passes, or send it in parts from a machine that streams',
    });
  }
  const banned = [...bannedCharacters].find((letter) => text.includes(letter));
  if (banned !== undefined) {
    complain(sink, 'post.cannot-say', 'banned', {
      message: `the program would hold the character ${JSON.stringify(banned)}, which the machine file bans`,
      hint: 'percent lines, semicolons or brackets that the controller needs cannot be banned characters',
    });
  }
}

function headerFile(input: ProgramInput, header: readonly string[]): { file: string; text: string } {
  const lines = header.map((line) => line.replace(/[\p{C}\p{Z}]+/gu, ' ').trim());
  return { file: `${input.name}${input.suffix}.txt`, text: `${lines.join('\n')}\n` };
}
