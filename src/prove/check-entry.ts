/**
 * The way into metal: a cutter that was not said to plunge goes down on a ramp no steeper than its material allows, or where the metal
 * under its whole disc is gone already.
 */
import { degrees, radians } from '../base/units.ts';
import { materialNamed } from '../cutting/materials.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, gathered, lengthText } from './finding-at.ts';
import { isCleared } from './metal-cover.ts';
import type { Finding } from './proof.ts';

/** Degrees, where the material is not one of ours: what suits the hardest of them suits all. */
const GENTLEST = 1;

export function checkEntry(evidence: Evidence): Finding[] {
  const { solids, input, lastDigit } = evidence;
  const findings: Finding[] = [];
  for (let i = 0; i < solids.length; i++) {
    const { z0, z1, move } = solids[i]!;
    if (z1 < z0 && z1 < input.setup.topZ - lastDigit && move.kind !== 'rapid') {
      findings.push(...entryFinding(evidence, i));
    }
  }
  return gathered(findings);
}

/** Of move i, that goes down below the top. */
function entryFinding(evidence: Evidence, i: number): Finding[] {
  const { setup } = evidence.input;
  const { move, x0, y0, z0, x1, y1, z1, radius } = evidence.solids[i]!;
  const fall = z0 - z1;
  const flat = move.turn === undefined ? Math.hypot(x1 - x0, y1 - y0) : arcLength(evidence, i);
  const ramp = materialNamed(setup.material)?.ramp ?? GENTLEST;
  const allowed = flat * Math.tan(radians(ramp)) + 2 * evidence.lastDigit;
  if (fall <= allowed || (flat === 0 && evidence.cutterOf(move)?.plunges === true)) {
    return [];
  }
  const stands = { x: x1, y: y1, z: z1, radius };
  if (isCleared(evidence.paths, i, setup, stands, evidence.lastDigit)) {
    return [];
  }
  return [flat === 0 ? plunge(evidence, move, z1) : steep(move, fall, flat, ramp)];
}

function arcLength({ paths }: Evidence, i: number): number {
  return paths.arc[i]! * Math.abs(paths.turn[i]!);
}

function plunge(evidence: Evidence, move: TracedMove, z: number): Finding {
  const cutter = evidence.cutterOf(move);
  return findingAt(move, {
    code: 'prove.plunge',
    message: `cutter ${String(cutter?.number ?? 0)} goes straight down into metal to Z ${lengthText(z)}; it was not said to plunge`,
    hint: 'Enter on a ramp or a helix, or use a cutter that plunges.',
    ...(move.to.x === null || move.to.y === null ? {} : { x: move.to.x, y: move.to.y }),
  });
}

function steep(move: TracedMove, fall: number, flat: number, ramp: number): Finding {
  const angle = degrees(Math.atan2(fall, flat));
  return findingAt(move, {
    code: 'prove.ramp',
    message: `a ramp of ${angle.toFixed(1)} degrees into metal; this material allows ${String(ramp)} degrees`,
    hint: 'Fall by less on this move, or spread the fall over more of the path.',
    ...(move.to.x === null || move.to.y === null ? {} : { x: move.to.x, y: move.to.y }),
  });
}
