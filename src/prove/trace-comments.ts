/**
 * What comments say that no word can: which cutter hands put in, and the speed they set, on machines whose programs have
 * no words for it. Everything else in a comment means nothing to the machine.
 *
 * In: "Cutter 2", "Set the spindle to 12000 turns a minute …", "Switch the spindle off", each at a comment's beginning.
 * They hold from the next stop for hands, if nothing moves before it; where one program runs for one cutter, its number
 * holds at once, before anything has moved. Also which program of a set this is, as its head says.
 */
import { spindleOf } from './modes.ts';
import { loadCutter } from './trace-settings.ts';
import { happen, type Run } from './trace-run.ts';

/** What hands will do at the next stop. */
export interface ByHand {
  cutter: number | undefined;
  speed: number | undefined;
}

const CUTTER = /^cutter (\d{1,4})$/i;
const SPEED = /^set the spindle to (\d{1,6}(?:\.\d*)?) turns a minute/i;
const STILL = /^switch the spindle off/i;
/** At the head of a program that is one of several. */
const PART = /^cutting program\W+number (\d{1,3}) of (\d{1,3})$/i;
const MESSAGE = /^\s*m\s*s\s*g\s*,/i;

export function readComments(run: Run, comments: readonly string[], byHand: ByHand): void {
  const { cutters, spindle } = run.machine.words;
  for (const comment of comments) {
    const isMessage = MESSAGE.test(comment);
    const text = (isMessage ? comment.replace(MESSAGE, '') : comment).trim();
    if (isMessage) {
      happen(run, { kind: 'message', text });
    }
    if (run.part === undefined && run.moves.length === 0) {
      readPart(run, text);
    }
    if (cutters.change !== 'automatic' && cutters.words === 'none') {
      readCutter(run, text, byHand);
    }
    if (spindle.run === 'by-hand') {
      readSpeed(text, byHand);
    }
  }
}

/** A comment alone on its line may head what follows; the last one before a move does. */
export function readTitle(run: Run, comments: readonly string[]): void {
  const title = { line: run.line, before: run.moves.length, text: comments.join(' ') };
  if (run.titles.at(-1)?.before === title.before) {
    run.titles.pop();
  }
  run.titles.push(title);
}

function readPart(run: Run, text: string): void {
  const [, number, of] = PART.exec(text) ?? [];
  if (number !== undefined && of !== undefined) {
    run.part = { number: Number(number), of: Number(of), line: run.line };
  }
}

function readCutter(run: Run, text: string, byHand: ByHand): void {
  const number = CUTTER.exec(text)?.[1];
  if (number === undefined) {
    return;
  }
  if (run.machine.words.cutters.change === 'by-hand') {
    byHand.cutter = Number(number);
  } else if (run.moves.length === 0 && run.modes.cutter !== Number(number)) {
    loadCutter(run, Number(number));
  }
}

function readSpeed(text: string, byHand: ByHand): void {
  const speed = SPEED.exec(text)?.[1];
  if (speed !== undefined) {
    byHand.speed = Number(speed);
  } else if (STILL.test(text)) {
    byHand.speed = 0;
  }
}

/** A stop for hands: they have done what the comments before it say. */
export function handsDone(run: Run, byHand: ByHand): void {
  if (byHand.cutter !== undefined) {
    loadCutter(run, byHand.cutter);
  }
  if (byHand.speed !== undefined) {
    run.modes.speed = byHand.speed;
    run.modes.turning = byHand.speed === 0 ? 0 : run.machine.words.spindle.forward === 'M3' ? 1 : -1;
    happen(run, { kind: 'spindle', speed: spindleOf(run.modes) });
  }
  byHand.cutter = undefined;
  byHand.speed = undefined;
}
