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
  const { solids, input, lastDigit, paths } = evidence;
  const { z0, z1, rapid } = solids;
  const top = input.setup.topZ - lastDigit;
  const ramp = materialNamed(input.setup.material)?.ramp ?? GENTLEST;
  const steepest = Math.tan(radians(ramp));
  const findings: Finding[] = [];
  for (let i = 0; i < solids.count; i++) {
    if (z1[i]! >= z0[i]! || z1[i]! >= top || rapid[i] === 1) {
      continue;
    }
    const flat = solids.turn[i] === 0 ? 2 * paths.bound[i]! : paths.arc[i]! * Math.abs(solids.turn[i]!);
    if (z0[i]! - z1[i]! > flat * steepest + 2 * lastDigit) {
      findings.push(...entryFinding(evidence, i, flat, ramp));
    }
  }
  return gathered(findings);
}

/** Of move i, that goes down below the top more steeply than its material allows. */
function entryFinding(evidence: Evidence, i: number, flat: number, ramp: number): Finding[] {
  const { solids, input, lastDigit } = evidence;
  const move = solids.moves[i]!;
  if (flat === 0 && evidence.cutterOf(move)?.plunges === true) {
    return [];
  }
  const z = solids.z1[i]!;
  const stands = { x: solids.x1[i]!, y: solids.y1[i]!, z, radius: solids.radius[i]! };
  if (isCleared(evidence, i, input.setup, stands, lastDigit)) {
    return [];
  }
  return [flat === 0 ? plunge(evidence, move, z) : steep(move, solids.z0[i]! - z, flat, ramp)];
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
