/**
 * Which G and M codes a machine reads, and the modal group of each (NISTIR 6556 §3.4, Table 4, and the words that the
 * machine file adds: G70/G71, G60, G90.1/G91.1). Two codes of one group may not stand on one line.
 *
 * A code that is in no group here is refused: never passed over.
 */
import type { Machine } from '../machine/machine.ts';

/** Modal groups; the numbers are places in `Block.g`. */
export const G_GROUP = {
  other: 0,
  motion: 1,
  plane: 2,
  distance: 3,
  feedMode: 4,
  unit: 5,
  compensation: 6,
  length: 7,
  cycleReturn: 8,
  work: 9,
  path: 10,
  centre: 11,
} as const;
export const G_GROUPS = 12;

export const M_GROUP = { stop: 0, change: 1, spindle: 2, coolant: 3, overrides: 4, call: 5 } as const;
export const M_GROUPS = 6;

export interface Codes {
  /** By ten times the G code: group + 1, or 0 where this machine has no such code. */
  readonly g: Uint8Array;
  /** By the M code: group + 1, or 0. */
  readonly m: Uint8Array;
  /** Ten times the code of each unit's word. */
  readonly millimetre: number;
  readonly inch: number;
  /** A path word may be followed by P (a tolerance). */
  readonly pathTolerance: boolean;
  /** A length without a point would count thousandths. */
  readonly pointAlways: boolean;
  readonly valueLargest: number;
  /** What may not stand on a line with a comment: what is not plain text, and what the machine file bans. */
  readonly dangerous: RegExp;
}

/** Ten times the number of a word like 'G61.1'; -1 for anything else. */
export function codeOf(word: string, letter: 'G' | 'M' = 'G'): number {
  const match = /^([GM])(\d{1,2})(?:\.(\d))?$/.exec(word.trim());
  return match !== null && match[1] === letter ? Number(match[2]) * 10 + Number(match[3] ?? 0) : -1;
}

export function codesOf(machine: Machine): Codes {
  const { modes, arcs, path } = machine.words;
  const g = new Uint8Array(1000);
  const put = (group: number, ...codes: readonly number[]): void => {
    for (const code of codes) {
      if (code >= 0) {
        g[code] = group + 1;
      }
    }
  };
  const millimetre = codeOf(modes.millimetreWord);
  const inch = codeOf(modes.inchWord);
  put(G_GROUP.motion, 0, 10, 800);
  put(G_GROUP.other, 40);
  put(G_GROUP.distance, 900, 910);
  put(G_GROUP.compensation, 400);
  put(G_GROUP.length, 490);
  put(G_GROUP.unit, millimetre, inch);
  put(G_GROUP.feedMode, codeOf(path.feedMode ?? ''));
  put(G_GROUP.centre, codeOf(arcs.centreWord ?? ''));
  put(G_GROUP.plane, 170);
  putByWords(machine, put);
  const pathWords = pathWordsOf(machine);
  put(G_GROUP.path, ...pathCodes(pathWords));
  return {
    g,
    m: mCodes(machine),
    millimetre,
    inch,
    pathTolerance: pathWords.some((word) => word.includes('P')),
    pointAlways: machine.words.numbers.point === 'always',
    valueLargest: machine.words.numbers.valueLargest,
    dangerous: dangerousIn(machine.words.file.bannedCharacters),
  };
}

function dangerousIn(banned: string): RegExp {
  const escaped = Array.from(
    { length: banned.length },
    (_, i) => `\\u${banned.charCodeAt(i).toString(16).padStart(4, '0')}`,
  );
  return new RegExp(`[^\\t\\x20-\\x7e]${banned === '' ? '' : `|[${escaped.join('')}]`}`);
}

function putByWords(machine: Machine, put: (group: number, ...codes: readonly number[]) => void): void {
  const { arcs, cutters, positions, holes, language } = machine.words;
  if (arcs.planes !== 'none') {
    put(G_GROUP.motion, 20, 30);
  }
  if (arcs.planes === 'xy-xz-yz') {
    put(G_GROUP.plane, 180, 190);
  }
  if (cutters.lengthOffset === 'G43-H') {
    put(G_GROUP.length, 430);
  }
  if (holes.cycles.length > 0) {
    put(G_GROUP.motion, ...holes.cycles.map((word) => codeOf(word)));
    put(G_GROUP.cycleReturn, 980, 990);
  }
  if (language.setZero.includes('G10')) {
    put(G_GROUP.other, 100);
  }
  if (language.setZero.includes('G92')) {
    put(G_GROUP.other, 920, 921, 922, 923);
  }
  if (language.inverseTime) {
    put(G_GROUP.feedMode, 930);
  }
  if (positions.top !== 'none') {
    put(G_GROUP.other, 280, 300, 530);
  }
  if (positions.workOffset !== 'none') {
    put(G_GROUP.work, 540, 550, 560, 570, 580, 590, 591, 592, 593);
  }
}

function pathWordsOf(machine: Machine): readonly string[] {
  const { modes, path, end } = machine.words;
  return [path.finishing ?? '', path.roughing ?? '', ...modes.opening, ...end.restore];
}

/** RS274/NGC's three where the machine names one of them and no G60; else only what it names (§3.5.14; G61 is no exact path everywhere). */
function pathCodes(words: readonly string[]): readonly number[] {
  const named = words
    .map((word) => codeOf(word.split(' ')[0] ?? ''))
    .filter((code) => [600, 610, 611, 640].includes(code));
  return named.length > 0 && !named.includes(600) ? [610, 611, 640] : named;
}

function mCodes(machine: Machine): Uint8Array {
  const { cutters, spindle, language } = machine.words;
  const m = new Uint8Array(100);
  for (const code of [0, 1, 2, 30]) {
    m[code] = M_GROUP.stop + 1;
  }
  if (cutters.words === 'T-and-M6' || cutters.words === 'T-then-M6') {
    m[6] = M_GROUP.change + 1;
  }
  for (const code of spindle.run === 'program' ? [3, 4, 5] : []) {
    m[code] = M_GROUP.spindle + 1;
  }
  for (const code of language.subprograms === 'M98' ? [98, 99] : []) {
    m[code] = M_GROUP.call + 1;
  }
  for (const code of [7, 8, 9]) {
    m[code] = M_GROUP.coolant + 1;
  }
  for (const code of [48, 49]) {
    m[code] = M_GROUP.overrides + 1;
  }
  return m;
}
