/**
 * Form: the cut metal against the exact outline. Gouge, metal left on flank, tip and root, the rolling law, bore, crossings.
 * While programs of the set are missing, metal left is not held against those that are here.
 * Allowed is the form error plus one unit of the machine file's last digit.
 */
import { degrees } from '../base/units.ts';
import type { CheckCode } from './check-codes.ts';
import { REGION } from './deviation-stations.ts';
import type { Worst } from './deviation-contour.ts';
import type { Evidence } from './evidence.ts';
import { missingPrograms } from './check-missing.ts';
import { findingAt, lengthText, micronText } from './finding-at.ts';
import type { Finding } from './proof.ts';
import type { RollingReading } from './rolling-law.ts';
import type { WheelFigures } from './wheel-figures.ts';

export function checkForm(evidence: Evidence): Finding[] {
  const { figures, input } = evidence;
  if (figures === undefined) {
    return [];
  }
  const { teeth, bore, window, inside, allowed } = figures;
  const isSheet = input.setup.shape.kind === 'sheet';
  const left = teeth.atBottom.left;
  // Metal that a missing program would cut is no fault of those that are here: that one is missing has been said.
  const isWhole = missingPrograms(evidence.traces).length === 0;
  const over = (worst: Worst, code: CheckCode, what: string, hint: string, most = allowed): Finding[] =>
    worst.value > most && (isWhole || hint !== LEFT)
      ? [outOfForm(evidence, worst, code, what, most, hint)]
      : [];
  return [
    ...insideWheel(inside),
    ...over(teeth.atTop.gouge, 'prove.gouge', `tooth ${toothOf(teeth.atTop.gouge)} is cut into`, GOUGE),
    ...over(
      left[REGION.flank]!,
      'prove.left',
      `the flank of tooth ${toothOf(left[REGION.flank]!)} keeps metal`,
      LEFT,
    ),
    ...(isSheet
      ? over(
          left[REGION.land]!,
          'prove.left',
          `the tip of tooth ${toothOf(left[REGION.land]!)} keeps metal`,
          LEFT,
        )
      : []),
    ...over(
      teeth.atBottom.rootMiss,
      'prove.root',
      'the root keeps more metal than this cutter leaves',
      LEFT,
      allowed * teeth.rootFactor,
    ),
    ...rollingLaw(evidence, figures, teeth.rolling),
    ...(bore === undefined
      ? []
      : [
          ...over(bore.gouge, 'prove.bore', 'the bore is cut too large', GOUGE),
          ...over(bore.left, 'prove.bore', 'the bore keeps metal', LEFT),
        ]),
    ...(window === undefined
      ? []
      : [
          ...over(window.gouge, 'prove.crossing', `crossing ${toothOf(window.gouge)} is cut into`, GOUGE),
          ...over(window.left, 'prove.crossing', `crossing ${toothOf(window.left)} keeps metal`, LEFT),
        ]),
  ];
}

const GOUGE = 'Move this cut away from the outline, or check the diameter that its cutter cuts.';
const LEFT = 'Cut along the whole outline to the full depth, or check the diameter that the cutter cuts.';

function toothOf(worst: Worst): string {
  return String(worst.copy + 1);
}

function outOfForm(
  { moves }: Evidence,
  worst: Worst,
  code: CheckCode,
  what: string,
  allowed: number,
  hint: string,
): Finding {
  const message = `${what}: ${micronText(worst.value)}, where ${micronText(allowed)} is allowed`;
  return findingAt(worst.move ?? moves.at(-1), { code, message, hint, x: worst.x, y: worst.y });
}

function insideWheel(inside: Worst): Finding[] {
  return inside.value > 0
    ? [
        findingAt(inside.move, {
          code: 'prove.gouge',
          message: `the cutter's axis goes inside the wheel: ${lengthText(inside.value)} of metal is cut away, where none may be`,
          hint: GOUGE,
          x: inside.x,
          y: inside.y,
        }),
      ]
    : [];
}

function rollingLaw(evidence: Evidence, figures: WheelFigures, rolling: RollingReading): Finding[] {
  if (rolling.share <= 1) {
    return [];
  }
  const message =
    `the side of tooth ${String(rolling.copy + 1)} leans: its normal misses the point where the pitch circles touch by ` +
    `${degrees(rolling.shareAngle).toFixed(2)} degrees, where a form error of ${micronText(figures.allowed)} explains ` +
    `${degrees(rolling.shareAllowed).toFixed(2)}`;
  return [
    findingAt(rolling.move ?? evidence.moves.at(-1), {
      code: 'prove.rolling-law',
      message,
      hint: 'Look for a number that was changed here; else follow the addendum more closely, with smooth arcs in place of long straight moves.',
      x: rolling.x,
      y: rolling.y,
    }),
  ];
}
