/**
 * What is not a move: to the top, cutter changes in the machine's three ways, spindle, dwell, stops, notes.
 *
 * In  : the writer, an event. Out: blocks in the sink. M words stand alone in their blocks; the spindle is still at every
 * change and stop; after hands or a changer all modes are written again and the place counts as unknown.
 * Source: NISTIR 6556 sections 3.5.4 (dwell), 3.6.3 (a change may move axes), 3.8 (M words act before the move of their block).
 */
import type { EventStep } from '../motion/motion.ts';
import { lengthInWords } from './belongs-text.ts';
import { formatValue } from './format-word.ts';
import { writeOpeningAgain } from './mode-words.ts';
import { writeFirstPath } from './path-words.ts';
import { complain, writeCodes, writeComments, writeOperatorNotes } from './program-sink.ts';
import { writeTop } from './write-top.ts';
import { forgetModes, forgetPlace, type Writer } from './writer.ts';

export function writeEvent(writer: Writer, event: EventStep): void {
  switch (event.kind) {
    case 'top':
      writeTop(writer);
      break;
    case 'cutter':
      writeCutter(writer, event.number, event.say);
      break;
    case 'spindle':
      writeSpindle(writer, event.speed);
      break;
    case 'dwell':
      writeDwell(writer, event.seconds);
      break;
    case 'stop':
      waitForHands(writer, spindleDown(writer), event.say);
      break;
    case 'note':
      writeComments(writer.sink, [event.text]);
      break;
  }
}

function writeCutter(writer: Writer, number: number, say: readonly string[]): void {
  const { sink, machine } = writer;
  const { change, words, highest } = machine.words.cutters;
  if (change === 'one-program') {
    oneCutterOnly(writer, number);
    writer.cutter = number;
    writeComments(sink, [`Cutter ${number}`], 'own');
    writeComments(sink, say);
    return;
  }
  const first = spindleDown(writer);
  writeTop(writer);
  sink.cutterBegins = true;
  if (words !== 'none' && number > highest) {
    complain(sink, 'post.cannot-say', 'cutter-number', {
      message: `cutter ${number} is above ${highest}, the highest number the machine file allows`,
      hint: 'renumber the cutter in the job',
    });
  }
  writeComments(sink, [`Cutter ${number}`], 'own');
  writer.cutter = number;
  if (change === 'by-hand') {
    cutterWords(writer, number);
    waitForHands(writer, first, say);
    return;
  }
  if (first.length > 0) {
    waitForHands(writer, first, []);
  }
  writeComments(sink, say);
  automaticChange(writer);
}

function oneCutterOnly(writer: Writer, number: number): void {
  if (writer.cutter !== null && writer.cutter !== number) {
    complain(writer.sink, 'post.cannot-say', 'one-program', {
      message: `cutter ${number} follows cutter ${writer.cutter} in one program, and this machine takes one program a cutter`,
      hint: 'split the motion where the cutter changes',
    });
  }
}

/** A changer may leave the axes anywhere: up first, before anything moves aside. */
function automaticChange(writer: Writer): void {
  if (writer.machine.words.cutters.words === 'none') {
    complain(writer.sink, 'post.cannot-say', 'cutter-words', {
      message: 'the machine file says the cutter is changed automatically, and gives no words for it',
      hint: 'set cutters.words, or cutters.change: by-hand',
    });
  }
  cutterWords(writer, writer.cutter ?? 0);
  forgetPlace(writer);
  writer.atTop = false;
  beginAgain(writer);
  writeTop(writer);
}

/** Everything a person needs who starts from here: modes, path, the cutter's length, and soon the name of the pass. */
function beginAgain(writer: Writer): void {
  writeOpeningAgain(writer.sink);
  writer.path = null;
  writer.belongs = undefined;
  writeFirstPath(writer);
  if (writer.cutter !== null && writer.machine.words.cutters.lengthOffset === 'G43-H') {
    writeCodes(writer.sink, 'G43', `H${writer.cutter}`);
  }
}

function cutterWords(writer: Writer, number: number): void {
  const { sink } = writer;
  switch (writer.machine.words.cutters.words) {
    case 'T-and-M6':
      writeCodes(sink, `T${number}`, 'M6');
      break;
    case 'T-then-M6':
      writeCodes(sink, `T${number}`);
      writeCodes(sink, 'M6');
      break;
    case 'T-only':
      writeCodes(sink, `T${number}`);
      break;
    case 'none':
      break;
  }
}

/**
 * M0, with what to do said before it. What the person leaves behind is not known: where the machine has a top it goes
 * there before the spindle turns; elsewhere the person is asked to raise the cutter.
 */
function waitForHands(writer: Writer, orders: readonly string[], say: readonly string[]): void {
  const { sink, machine, grid } = writer;
  writeOperatorNotes(sink, orders, 'own');
  writeOperatorNotes(sink, say);
  if (writer.step > writer.lastMove) {
    // Nothing moves after the last stop: there is nothing to make ready for.
    writeCodes(sink, 'M0');
    return;
  }
  if (machine.words.positions.top === 'none') {
    const height = lengthInWords(writer.highestZ / grid.perMm, grid.unit);
    writeComments(sink, [`Before going on raise the cutter to height ${height} or above, over a free place`]);
  }
  writeCodes(sink, 'M0');
  forgetPlace(writer);
  sink.cutterBegins = true;
  beginAgain(writer);
  writeTop(writer);
}

function writeSpindle(writer: Writer, speed: number): void {
  const { sink, machine } = writer;
  const { run, forward, speedWord, spinUpSeconds } = machine.words.spindle;
  if (speed === 0) {
    if (run === 'by-hand') {
      // A change of cutter that follows stops for both.
      writer.offWanted = writer.spindle > 0;
    } else {
      stopSpindle(writer);
    }
    return;
  }
  writer.offWanted = false;
  writer.spindle = speed;
  const text = speedText(writer, speed);
  if (run === 'by-hand') {
    waitForHands(writer, [`Set the spindle to ${text} turns a minute`], ['Let it reach that speed']);
    return;
  }
  if (speedWord === 'together') {
    writeCodes(sink, `S${text}`, forward);
  } else {
    writeCodes(sink, `S${text}`);
    writeCodes(sink, forward);
  }
  if (spinUpSeconds > 0) {
    writeDwell(writer, spinUpSeconds);
  }
}

function speedText(writer: Writer, speed: number): string {
  const { numbers } = writer.machine.words;
  return formatValue(speed, numbers.speedDecimals, { ...numbers, point: 'as-needed' });
}

export function stopSpindle(writer: Writer): void {
  const first = spindleDown(writer);
  if (first.length > 0) {
    waitForHands(writer, first, []);
  }
}

/** Stops it by its word, or says what the person has to do first at the stop that follows. */
function spindleDown(writer: Writer): readonly string[] {
  if (writer.spindle === 0) {
    return [];
  }
  writer.spindle = 0;
  writer.offWanted = false;
  if (writer.machine.words.spindle.run === 'by-hand') {
    return ['Switch the spindle off'];
  }
  writeCodes(writer.sink, 'M5');
  return [];
}

/** Some controllers take the letter for what it means elsewhere: feed (or speed) is written again after it. Rounded up: a wait may be longer than asked, never shorter. Milliseconds are whole, as a point there is dropped by some. */
function writeDwell(writer: Writer, seconds: number): void {
  const { sink, machine } = writer;
  const { letter, unit } = machine.words.dwell;
  if (letter === 'none') {
    complain(sink, 'post.cannot-say', 'dwell', {
      message: `the machine file has no word for a wait, and one of ${seconds} s is needed`,
      hint: 'set dwell.letter, or spin-up-seconds: 0 where the controller waits by itself',
    });
    return;
  }
  const { numbers } = machine.words;
  const scale = 10 ** numbers.secondsDecimals;
  const text =
    unit === 'milliseconds'
      ? formatValue(Math.ceil(seconds * 1000), 0, { ...numbers, point: 'as-needed' })
      : formatValue(Math.ceil(seconds * scale) / scale, numbers.secondsDecimals, numbers);
  writeCodes(sink, 'G4', letter + text);
  forgetModes(writer);
  if (letter === 'S' && writer.spindle > 0 && machine.words.spindle.run === 'program') {
    writeCodes(sink, `S${speedText(writer, writer.spindle)}`);
  }
}
