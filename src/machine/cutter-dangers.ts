/** Dangers of cutters, spindle and waiting: a wrong length, a spindle that stands still, a wait that is a move. */
import { caution, danger, those, type Danger } from './danger.ts';
import type { Machine } from './machine.ts';

export function cutterDangers(machine: Machine): readonly Danger[] {
  return [
    ...changeDangers(machine),
    ...lengthDangers(machine),
    ...spindleDangers(machine),
    ...dwellDangers(machine),
  ];
}

function changeDangers(machine: Machine): readonly Danger[] {
  const { cutters, spindle, positions } = machine.words;
  const automatic = cutters.change === 'automatic';
  return those(
    cutters.change === 'one-program' &&
      cutters.words !== 'none' &&
      danger(
        'words.cutters.words',
        `With one program for each cutter no word for a change is ever written, so ${cutters.words} would say what no program does.`,
        'Say words: none, or change: automatic or by-hand.',
      ),
    automatic &&
      cutters.words === 'none' &&
      danger(
        'words.cutters.words',
        'An automatic changer that is told nothing changes nothing: the machine cuts on with the old cutter.',
        'Say T-and-M6, T-then-M6 or T-only.',
      ),
    automatic &&
      spindle.run === 'by-hand' &&
      danger(
        'words.spindle.run',
        'With a changer nobody stands by to start a spindle that is switched by hand: the next cutter would go into the metal standing still.',
        'Say run: program, or change: by-hand.',
      ),
    automatic &&
      positions.top === 'none' &&
      danger(
        'words.positions.top',
        'A change may move every axis, and a longer cutter hangs lower; without a way to the top first it may go through the part or a clamp.',
        'Say G53-Z or G28-named, or change: by-hand.',
      ),
  );
}

function lengthDangers(machine: Machine): readonly Danger[] {
  const { change, words, lengthOffset, lengthCancel } = machine.words.cutters;
  return those(
    change === 'automatic' &&
      lengthOffset === 'none' &&
      danger(
        'words.cutters.length-offset',
        'After an automatic change nobody touches off again: without a length offset the next cutter is wrong by the whole difference in length, tens of millimetres, down into the table.',
        'Say G43-H, or with-T where the controller takes the length with T.',
      ),
    lengthOffset === 'with-T' &&
      words === 'none' &&
      danger(
        'words.cutters.length-offset',
        'The length comes with T, but no T is written: the length of the cutter before stays in force.',
        'Say which words change the cutter.',
      ),
    lengthOffset === 'G43-H' &&
      lengthCancel === 'none' &&
      danger(
        'words.cutters.length-cancel',
        "G43 outlives the end of the program: the next job would start with this cutter's length, and may run a whole cutter too low.",
        'Say G49-at-end.',
      ),
    lengthOffset !== 'G43-H' &&
      lengthCancel === 'G49-at-end' &&
      danger(
        'words.cutters.length-cancel',
        'G49 without G43 before: some machines move Z at once by the length that is still stored.',
        'Say length-cancel: none.',
      ),
  );
}

function spindleDangers(machine: Machine): readonly Danger[] {
  const { spindle, dwell } = machine.words;
  const byProgram = spindle.run === 'program';
  return those(
    byProgram &&
      spindle.spinUpSeconds === 0 &&
      caution(
        'words.spindle.spin-up-seconds',
        'No wait for the spindle is written: unless the controller itself waits until it is at speed, the cutter goes into the metal before, and breaks.',
        'Watch it start with a move after M3. If it moves at once, give the seconds from standstill to full speed, and one more.',
      ),
    byProgram &&
      spindle.spinUpSeconds > 0 &&
      dwell.letter === 'none' &&
      danger(
        'words.dwell.letter',
        'Without a dwell word the program cannot wait for the spindle: the cutter goes into the metal before it is at speed.',
        'Look up the word after G4; or say spin-up-seconds: 0 if the controller waits by itself, or run: by-hand.',
      ),
    spindle.forward === 'M4' &&
      caution(
        'words.spindle.forward',
        'M4 turns counter-clockwise on nearly every machine: right-hand cutters would rub, glow and unscrew their collet.',
        'Start the spindle with M3 and M4 by hand, cutter out, and look.',
      ),
  );
}

function dwellDangers(machine: Machine): readonly Danger[] {
  const { dwell, numbers } = machine.words;
  return those(
    dwell.letter === 'X' &&
      danger(
        'words.dwell.letter',
        'X is an axis word too: a controller that does not take it as a wait moves to that X, with the cutter where it is.',
        'Nearly every controller that reads X after G4 reads P as well: look up its unit.',
      ),
    dwell.letter === 'S' &&
      danger(
        'words.dwell.letter',
        'S after G4 counts turns of the spindle on the controllers that read it, and sets the speed on the others: a wait of unknown length at a wrong speed.',
        'Use P or F.',
      ),
    dwell.unit === 'milliseconds' &&
      numbers.secondsDecimals > 0 &&
      caution(
        'words.numbers.seconds-decimals',
        'A dwell in milliseconds with a point: some controllers drop what stands after it, some the whole word.',
        'Say seconds-decimals: 0.',
      ),
  );
}
