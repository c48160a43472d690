/**
 * How a program begins and ends: per cent lines, label, opening words; at the end spindle off, tool up, modes restored, end word.
 */
import { stopSpindle } from './write-event.ts';
import { writeOpening, writeRestored } from './mode-words.ts';
import { writeFirstPath } from './path-words.ts';
import { complain, writeCodes, type Sink } from './program-sink.ts';
import { writeTop } from './write-top.ts';
import type { Writer } from './writer.ts';

/** The lines before the header. A label is digits only: a name could hold what reads as a word. */
export function writeLabel(sink: Sink, label: number): void {
  const { percentLines, programLabel, labelDigits, labelLowest, labelHighest } = sink.machine.words.file;
  const digits = String(label).padStart(labelDigits, '0');
  if (
    programLabel !== 'none' &&
    (label < labelLowest || label > labelHighest || digits.length > labelDigits)
  ) {
    complain(sink, 'post.cannot-say', 'label', {
      message: `program number ${label} is not between ${labelLowest} and ${labelHighest}, or has more than ${labelDigits} digits`,
      hint: 'give another number, or change label-lowest and label-highest in the machine file',
    });
  }
  if (programLabel === 'percent-name') {
    sink.lines.push(`%${digits}`);
  } else if (percentLines === 'both') {
    sink.lines.push('%');
  }
  if (programLabel === 'o-number') {
    sink.lines.push(`O${digits}`);
  }
}

export function writeBeginning(writer: Writer): void {
  writeOpening(writer.sink);
  writeFirstPath(writer);
}

/** The length of the cutter is given up only where the machine stands at its top: giving it up may move. */
export function writeEnding(writer: Writer): void {
  const { sink, machine } = writer;
  const { cutters, end, file } = machine.words;
  stopSpindle(writer);
  writeTop(writer);
  if (cutters.lengthCancel === 'G49-at-end') {
    writeCodes(sink, 'G49');
  }
  writeRestored(sink);
  writeCodes(sink, end.end);
  if (file.percentLines === 'both') {
    sink.lines.push('%');
  }
}
