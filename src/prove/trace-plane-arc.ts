/**
 * G2 and G3 in the XZ and YZ planes (G18, G19): as the straight chords that stand for them, none of which leaves the arc by
 * more than PROOF_RESOLUTION. Frame: the program's; mm, radians.
 *
 * Clockwise is as seen from the plus end of the axis that stands on the plane (NISTIR 6556 §3.5.3): of Y for XZ, of X for YZ.
 * So the first axis of the plane is Z and the second X, or Y and Z; with these two for X and Y an arc is read like any other.
 */
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import { bitOf, type Block, type Letter } from './block.ts';
import { MOST_CHORDS, MOST_MADE } from './bounds.ts';
import { feedAlong } from './inverse-time.ts';
import type { Here } from './modes.ts';
import { readArc, type ReadArc } from './trace-arc.ts';
import { helixFeed } from './trace-move.ts';
import { makeMove, unread, type Refusal, type Run } from './trace-run.ts';

/** Which letters stand for X Y Z I J of an arc in the XY plane. */
const TURNED = { XZ: 'ZXYKI', YZ: 'YZXJK' } as const;
const PLAIN = 'XYZIJ';

export function runPlaneArc(
  run: Run,
  block: Block,
  to: Here,
  sense: 1 | -1,
  plane: 'XZ' | 'YZ',
): Refusal | undefined {
  const { here } = run;
  if ([here.x, here.y, here.z, to.x, to.y, to.z].includes(null)) {
    return unread('an arc starts or ends where the place is not known');
  }
  const flat: Run = { ...run, here: turned(here, plane), shift: turnedShift(run, plane), modes: { ...run.modes, plane: 'XY' } }; // prettier-ignore
  const end = turned(to, plane);
  const words = turnedWords(block, plane);
  const arc = readArc(flat, words, end, sense);
  if ('code' in arc) {
    return arc;
  }
  const along = feedAlong(flat, block, end, arc);
  if (typeof along === 'object' && along !== null) {
    return along;
  }
  const chords = chordsOf(flat.here, end, arc);
  run.made += chords.count;
  if (chords.count > MOST_CHORDS || run.made > MOST_MADE) {
    return unread(
      `an arc in the ${plane} plane stands for ${String(chords.count)} chords; ${String(MOST_CHORDS)} of one arc and ${String(MOST_MADE)} of a program are followed`,
    );
  }
  const feed = helixFeed(flat, end, arc, along);
  for (let k = 1; k < chords.count; k++) {
    makeMove(run, 'line', straight(chords.at(k / chords.count), plane), feed);
  }
  makeMove(run, 'line', to, feed);
  return undefined;
}

interface Chords {
  readonly count: number;
  /** The place after a share of the arc. */
  readonly at: (share: number) => Here;
}

/** A chord over the angle a leaves its arc by r (1 - cos(a/2)). */
function chordsOf(from: Here, to: Here, { centre, turn }: ReadArc): Chords {
  const start = { x: from.x! - centre.x, y: from.y! - centre.y };
  const begin = Math.hypot(start.x, start.y);
  const end = Math.hypot(to.x! - centre.x, to.y! - centre.y);
  const angle = Math.atan2(start.y, start.x);
  const step = 2 * Math.acos(Math.max(0, 1 - PROOF_RESOLUTION / Math.max(begin, end)));
  return {
    count: Math.ceil(Math.abs(turn) / step),
    at: (share) => {
      const radius = begin + share * (end - begin);
      return {
        x: centre.x + radius * Math.cos(angle + share * turn),
        y: centre.y + radius * Math.sin(angle + share * turn),
        z: from.z! + share * (to.z! - from.z!),
      };
    },
  };
}

function turned({ x, y, z }: Here, plane: 'XZ' | 'YZ'): Here {
  return plane === 'XZ' ? { x: z, y: x, z: y } : { x: y, y: z, z: x };
}

function straight({ x, y, z }: Here, plane: 'XZ' | 'YZ'): Here {
  return plane === 'XZ' ? { x: y, y: z, z: x } : { x: z, y: x, z: y };
}

function turnedShift({ shift: { x, y, z } }: Run, plane: 'XZ' | 'YZ'): Run['shift'] {
  return plane === 'XZ' ? { x: z, y: x, z: y } : { x: y, y: z, z: x };
}

/** The same words under the letters of an arc in the XY plane. */
function turnedWords(block: Block, plane: 'XZ' | 'YZ'): Block {
  const values = block.values.slice();
  let given = block.given;
  for (let k = 0; k < PLAIN.length; k++) {
    const to = PLAIN.charAt(k) as Letter;
    const from = TURNED[plane].charAt(k) as Letter;
    const isGiven = (block.given & bitOf(from)) !== 0;
    given = isGiven ? given | bitOf(to) : given & ~bitOf(to);
    values[to.charCodeAt(0) - 65] = block.values[from.charCodeAt(0) - 65]!;
  }
  return { ...block, given, values, arc: undefined };
}
