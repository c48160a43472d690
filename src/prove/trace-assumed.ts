/**
 * What a move hangs on and the program has not written before it: the controller then takes what was last on, of this
 * program's or another's. That a mode is in force when the machine is switched on helps nobody who ran something since.
 *
 * Asked of a mode are only controllers that have it: those whose machine file writes it in the opening, or lists it as in
 * force at power-on. Each mode is asked for once, at the first move that hangs on it.
 */
import type { Machine } from '../machine/machine.ts';
import { codeOf, G_GROUP, G_GROUPS, type Codes } from './modes-codes.ts';
import { remark, type Run } from './trace-run.ts';

/** Groups by their bits. */
function bits(...groups: readonly number[]): number {
  return groups.reduce((mask, group) => mask | (1 << group), 0);
}

/** A place in the machine's own frame is still counted in a unit, from nothing or from where the axis stands. */
const IN_MACHINE = bits(G_GROUP.unit, G_GROUP.distance);
const FAST = IN_MACHINE | bits(G_GROUP.motion, G_GROUP.work, G_GROUP.length, G_GROUP.compensation);
const CUT = FAST | bits(G_GROUP.feedMode, G_GROUP.path);
const ARC = CUT | bits(G_GROUP.plane, G_GROUP.centre);

const CYCLE = CUT | bits(G_GROUP.plane, G_GROUP.cycleReturn);

const HANGS = { machine: IN_MACHINE, G0: FAST, G1: CUT, G2: ARC, G3: ARC, cycle: CYCLE } as const;

/** The modes that this controller has, as bits. */
export function modesAsked({ words }: Machine, codes: Codes): number {
  const { modes, positions, path, arcs } = words;
  const named = [
    ...modes.opening.map((word) => (word === 'UNIT' ? modes.millimetreWord : word)),
    // That motion has been ended says nothing of which motion is on.
    ...modes.powerOn.filter((word) => codeOf(word) !== codeOf(words.holes.endWord)),
    positions.workOffset,
    path.feedMode ?? '',
    path.finishing ?? '',
    arcs.centreWord ?? '',
    words.holes.returnWord,
  ];
  const groups = named.flatMap((word) => {
    const group = (codes.g[codeOf(word.split(' ')[0] ?? '')] ?? 0) - 1;
    return group > 0 ? [group] : [];
  });
  return bits(...groups, G_GROUP.unit, G_GROUP.distance);
}

/** Called before every move; nearly always there is nothing left to ask. */
export function sayAssumed(run: Run, motion: keyof typeof HANGS): void {
  const asked = run.unasked & HANGS[motion];
  if (asked === 0) {
    return;
  }
  run.unasked &= ~asked;
  const lacking: string[] = [];
  for (let group = 0; group < G_GROUPS; group++) {
    if ((asked & (1 << group)) !== 0 && run.setAt[group] === 0) {
      lacking.push(nameOf(run.machine, group));
    }
  }
  if (lacking.length > 0) {
    const message = `nothing before this move says ${lacking.join(', ')}: the controller takes whatever was last on`;
    remark(run, 'prove.assumed', 'error', message, `assumed ${lacking.join()}`);
  }
}

function nameOf({ words, units }: Machine, group: number): string {
  const { modes, positions, path, arcs } = words;
  const names: Readonly<Record<number, readonly [string, string | null]>> = {
    [G_GROUP.motion]: ['the kind of motion', 'G0 or G1'],
    [G_GROUP.plane]: ['the plane', 'G17'],
    [G_GROUP.distance]: ['the distance mode', 'G90'],
    [G_GROUP.feedMode]: ['the feed mode', path.feedMode],
    [G_GROUP.unit]: ['the unit', units === 'inch' ? modes.inchWord : modes.millimetreWord],
    [G_GROUP.compensation]: ['that radius compensation is off', 'G40'],
    [G_GROUP.length]: ['that no length offset is on', 'G49'],
    [G_GROUP.cycleReturn]: ['how far cycles come out', words.holes.returnWord],
    [G_GROUP.work]: ['the work offset', positions.workOffset],
    [G_GROUP.path]: ['the path mode', path.finishing],
    [G_GROUP.centre]: ['how arc centres are counted', arcs.centreWord],
  };
  const [what, word] = names[group] ?? ['a mode', null];
  return word === null || word === 'none' ? what : `${what} (${word})`;
}
