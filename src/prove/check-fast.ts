/**
 * Fast moves: below the clear height nothing moves fast but straight up, or straight down to just above metal that is there.
 * Above it anything may, once Z is known to be there.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import { fastMoves, type FastMove } from './fast-moves.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, gathered, lengthText } from './finding-at.ts';
import { isCleared } from './metal-cover.ts';
import type { Finding } from './proof.ts';

/** A fast move stops at least this far above metal. */
const GAP = 10 * FORM_ERROR;

export function checkFast(evidence: Evidence): Finding[] {
  const fast = fastMoves(evidence.traces, evidence.solids, evidence.input.machine);
  return gathered(
    fast.flatMap((each) => {
      const message = sideways(evidence, each) ?? downwards(evidence, each);
      return message === undefined ? [] : [fastFinding(each, message)];
    }),
  );
}

function fastFinding({ move }: FastMove, message: string): Finding {
  return findingAt(move, {
    code: 'prove.fast-move',
    message,
    hint: 'Go straight up to the clear height first, or move at a feed.',
    ...(move.to.x === null || move.to.y === null ? {} : { x: move.to.x, y: move.to.y }),
  });
}

/** Fast and not straight up or down. */
function sideways({ input, lastDigit }: Evidence, { move, atTop }: FastMove): string | undefined {
  const { from, to } = move;
  if (from.x === to.x && from.y === to.y) {
    return undefined;
  }
  const { clearZ } = input.setup;
  if (from.z === null || to.z === null) {
    return atTop ? undefined : 'a fast move in X and Y before the height of the cutter is known';
  }
  const low = Math.min(from.z, to.z);
  return low < clearZ - lastDigit
    ? `a fast move in X and Y at Z ${lengthText(low)}, below the clear height of ${lengthText(clearZ)}`
    : undefined;
}

function downwards(evidence: Evidence, { move, before, path }: FastMove): string | undefined {
  const { input, solids, lastDigit } = evidence;
  const { setup } = input;
  const { from, to } = move;
  if (to.z === null || to.z >= setup.clearZ - lastDigit || (from.z !== null && to.z >= from.z)) {
    return undefined;
  }
  if (path < 0) {
    return to.z >= setup.topZ + GAP
      ? undefined
      : `a fast move down to Z ${lengthText(to.z)} from a place that is not known`;
  }
  const stands = {
    x: solids.x1[path]!,
    y: solids.y1[path]!,
    z: to.z - GAP,
    radius: solids.radius[path]!,
  };
  if (to.z >= setup.topZ + GAP - lastDigit || isCleared(evidence, before, setup, stands, lastDigit)) {
    return undefined;
  }
  return `a fast move down to Z ${lengthText(to.z)}, where metal may stand up to Z ${lengthText(setup.topZ)}`;
}
