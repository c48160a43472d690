/**
 * Exact path for what makes the flank, the machine file's roughing words for the rest, written where the kind of pass changes.
 */
import type { Machine } from '../machine/machine.ts';
import { writeCodes } from './program-sink.ts';
import type { Writer } from './writer.ts';

const FINISHING = /finishing|spring/;

/** At the start of a program, before any pass is known: the stricter of the two. */
export function writeFirstPath(writer: Writer): void {
  const { path, modes } = writer.machine.words;
  const words = path.finishing ?? path.roughing;
  if (words !== null && modes.opening.includes(words)) {
    writer.path = words;
  }
  takePath(writer, words);
}

export function writePathFor(writer: Writer, pass: string): void {
  takePath(writer, pathWordsFor(writer.machine, pass));
}

/** The words under which a pass is cut, null where there are none for it. */
export function pathWordsFor({ words }: Machine, pass: string): string | null {
  const { finishing, roughing } = words.path;
  return FINISHING.test(pass) ? finishing : roughing;
}

/** The words of one block, `G64 P0.002`, as the machine file has them. */
function takePath(writer: Writer, words: string | null): void {
  if (words === null || words === writer.path) {
    return;
  }
  writer.path = words;
  writeCodes(writer.sink, ...words.split(' '));
}
