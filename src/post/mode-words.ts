/**
 * The modes a program is written in: all of them at the start and again wherever hands or a changer were at the machine,
 * so that a person can begin there; and those restored before the end. Nothing is taken as the controller's default.
 *
 * In  : the machine file's words. Out: blocks in the sink.
 */
import type { Machine } from '../machine/machine.ts';
import { codeWords, writeCodes, type Sink } from './program-sink.ts';

/** Unit, plane, offset, ... in the machine file's order; what it forgot to list is added. */
export function writeOpening(sink: Sink): void {
  writeModes(sink, openingWords(sink.machine));
}

/** The same after hands or a changer, but for giving up the cutter's length: with the cutter low that may move it down. */
export function writeOpeningAgain(sink: Sink): void {
  const keeps = sink.machine.words.cutters.lengthOffset === 'G43-H';
  writeModes(
    sink,
    openingWords(sink.machine).filter((word) => !(keeps && word === 'G49')),
  );
}

export function writeRestored(sink: Sink): void {
  writeModes(
    sink,
    sink.machine.words.end.restore.map((word) => unitFor(sink.machine, word)),
  );
}

function openingWords(machine: Machine): readonly string[] {
  const { modes, positions, path, arcs } = machine.words;
  const listed = modes.opening.map((word) => unitFor(machine, word));
  const needed = [
    unitFor(machine, 'UNIT'),
    path.feedMode,
    positions.workOffset === 'none' ? null : positions.workOffset,
    arcs.planes === 'none' || arcs.centre === 'radius' ? null : arcs.centreWord,
  ];
  const added = needed.filter(
    (word): word is string => word !== null && word !== 'none' && !listed.includes(word),
  );
  return [...listed, ...added];
}

function unitFor(machine: Machine, word: string): string {
  const { millimetreWord, inchWord } = machine.words.modes;
  return word === 'UNIT' ? (machine.units === 'mm' ? millimetreWord : inchWord) : word;
}

/** As few blocks as the line allows, or one a word; a word with a value of its own, and an M word, stand alone. */
function writeModes(sink: Sink, words: readonly string[]): void {
  const single = sink.machine.words.modes.openingOnePerBlock;
  const room = sink.machine.words.file.lineLongest - String(sink.machine.words.blocks.last).length - 2;
  let block: string[] = [];
  const flush = (): void => {
    if (block.length > 0) {
      writeCodes(sink, ...block);
    }
    block = [];
  };
  for (const word of words) {
    const alone = single || word.includes(' ') || word.startsWith('M');
    if (alone || codeWords(sink, [...block, word]).join(sink.gap).length > room) {
      flush();
    }
    block.push(word);
    if (alone) {
      flush();
    }
  }
  flush();
}
