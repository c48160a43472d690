/** What is asked of a finishing loop: how many blocks a pitch its text takes, and where its heading breaks. mm, radians. */
import type { ArcStep, Motion, MoveStep, Position } from '../../src/motion/motion.ts';
import { isMove } from '../../src/motion/motion.ts';
import type { TracedMove } from '../../src/motion/traced-move.ts';

const COMMENT = /^(?:N\d+ )?[(;]/;
const LOOP = /^(?:N\d+ )?[(;]\s*(?:FINISHING|SPRING)\b.*\bTOOTH (\d+)\b/i;

/**
 * Moves between one tooth's comment and the next, in the loops at full depth: a pitch each. Tooth 1 is left out, as the
 * loop begins and ends on it.
 */
export function blocksAPitch(text: string, moves: readonly TracedMove[]): ReadonlyMap<string, number> {
  const lines = text.split('\n');
  const onLine = new Map<number, number>();
  for (const { line } of moves) {
    onLine.set(line, (onLine.get(line) ?? 0) + 1);
  }
  const counts = new Map<string, number>();
  let place: string | undefined;
  lines.forEach((line, i) => {
    if (COMMENT.test(line)) {
      const tooth = LOOP.exec(line)?.[1];
      place = tooth === undefined || tooth === '1' ? undefined : `tooth ${tooth} from line ${String(i + 1)}`;
    } else if (place !== undefined) {
      counts.set(place, (counts.get(place) ?? 0) + (onLine.get(i + 1) ?? 0));
    }
  });
  return counts;
}

export interface Break {
  readonly x: number;
  readonly y: number;
  readonly angle: number;
}

/** Places of the finishing and spring loops where the heading changes by more than `tangent` from one step to the next. */
export function breaksOf({ steps }: Motion, tangent: number): readonly Break[] {
  const breaks: Break[] = [];
  let from: Position | undefined;
  let before: { readonly heading: number; readonly inLoop: boolean } | undefined;
  for (const step of steps) {
    if (!isMove(step)) {
      [from, before] = [undefined, undefined];
      continue;
    }
    const inLoop =
      /^(?:finishing|spring)$/.test(step.belongs?.pass ?? '') && step.belongs?.tooth !== undefined;
    if (from !== undefined && step.kind !== 'rapid' && step.to !== from) {
      const [begins, ends] = headingsOf(step, from);
      const angle = before === undefined ? 0 : Math.abs(turned(begins - before.heading));
      if (inLoop && before?.inLoop === true && angle > tangent) {
        breaks.push({ x: from.x, y: from.y, angle });
      }
      before = { heading: ends, inLoop };
    }
    from = step.to;
  }
  return breaks;
}

function headingsOf(step: MoveStep, from: Position): readonly [number, number] {
  if (step.kind !== 'arc') {
    const heading = Math.atan2(step.to.y - from.y, step.to.x - from.x);
    return [heading, heading];
  }
  return [headingAt(step, from), headingAt(step, step.to)];
}

function headingAt({ centre, turn }: ArcStep, at: Position): number {
  return Math.atan2(at.y - centre.y, at.x - centre.x) + (Math.sign(turn) * Math.PI) / 2;
}

/** An angle as the nearest turn, within half a turn either way. */
function turned(angle: number): number {
  return Math.atan2(Math.sin(angle), Math.cos(angle));
}

/** Slack for where a corner lies: the fit's own micrometre. */
const NEAR = 0.001;

/**
 * Whether a place of the path is the one real corner of the tooth's offset: where the path along a flank meets the path
 * along the root circle, or, where the space is too narrow for that, the one along the other flank.
 */
export function isRootCorner(
  at: { readonly x: number; readonly y: number },
  radius: number,
  teeth: number,
): boolean {
  const out = Math.hypot(at.x, at.y);
  const half = Math.PI / teeth;
  const angle = Math.atan2(at.y, at.x);
  const spaces = angle / (2 * half) - 0.5;
  const aside = Math.abs(spaces - Math.round(spaces)) * 2 * half * out;
  return Math.abs(out - radius) < NEAR || (out > radius && aside < NEAR);
}
