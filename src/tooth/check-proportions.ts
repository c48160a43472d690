/** What proportions must keep to before any form can follow from them; every problem, not only the first. */
import type { Problem } from '../base/problem.ts';
import { theoreticalAddendum } from './addendum.ts';
import { mm, toothProblem } from './tooth-problem.ts';
import type { WheelProportions } from './wheel.ts';

export function checkProportions(p: WheelProportions): readonly Problem[] {
  const problems = [...checkCounts(p), ...checkThickness(p), ...checkRoot(p)];
  return problems.length > 0 ? problems : checkHeight(p);
}

/** Fewer than three teeth make no wheel, fewer than two leaves no pinion. */
const LEAST_TEETH = 3;
const LEAST_LEAVES = 2;

function checkCounts(p: WheelProportions): readonly Problem[] {
  const problems: Problem[] = [];
  const no = (key: readonly string[], message: string, hint: string) =>
    problems.push(toothProblem({ code: 'tooth.no-form', key, message, hint }));
  if (!Number.isInteger(p.teeth) || p.teeth < LEAST_TEETH) {
    no(['teeth'], `${p.teeth} teeth make no wheel`, `Use a whole number from ${LEAST_TEETH} up.`);
  }
  if (!(p.module > 0 && Number.isFinite(p.module))) {
    no(['module'], `a module of ${p.module} mm gives no size`, 'Use a module above 0 mm.');
  }
  if (p.mate.kind === 'lantern') {
    no(
      ['mate'],
      'a tooth for a lantern pinion is a parallel curve that this version does not make yet; it comes later',
      'Give the leaves of a pinion, or wait for that version.',
    );
  } else if (!Number.isInteger(p.mate.leaves) || p.mate.leaves < LEAST_LEAVES) {
    no(
      ['mate', 'leaves'],
      `${p.mate.leaves} leaves make no pinion`,
      `Use a whole number from ${LEAST_LEAVES} up.`,
    );
  }
  return problems;
}

function checkThickness(p: WheelProportions): readonly Problem[] {
  if (p.tooth > 0 && p.tooth < 1) {
    return [];
  }
  const pitch = Math.PI * p.module;
  const problem =
    p.tooth >= 1
      ? `a tooth of ${mm(p.tooth * pitch)} is too thick: the circular pitch is ${mm(pitch)}, so no space is left`
      : `a tooth of ${mm(p.tooth * pitch)} has no thickness`;
  return [
    toothProblem({
      code: 'tooth.no-form',
      key: ['tooth'],
      message: problem,
      hint: 'Give tooth: a share of the pitch between 0 and 1; 0.5 is usual.',
    }),
  ];
}

function checkRoot(p: WheelProportions): readonly Problem[] {
  const pitchRadius = (p.module * p.teeth) / 2;
  const depth = p.dedendum * p.module;
  const problems: Problem[] = [];
  if (!(depth > 0 && depth < pitchRadius)) {
    problems.push(
      toothProblem({
        code: 'tooth.no-form',
        key: ['dedendum'],
        message:
          depth > 0
            ? `the root circle vanishes: the dedendum is ${mm(depth)}, the pitch radius only ${mm(pitchRadius)}`
            : `a dedendum of ${mm(depth)} leaves no flank below the pitch circle`,
        hint: `Give a dedendum between 0 and ${p.teeth / 2} modules; 1.5708 is usual.`,
      }),
    );
  }
  if (!(p.rootFillet >= 0 && Number.isFinite(p.rootFillet))) {
    problems.push(
      toothProblem({
        code: 'tooth.no-form',
        key: ['root'],
        message: `a root fillet of ${mm(p.rootFillet)} has no radius`,
        hint: 'Give 0 for a sharp corner, or a radius above 0 mm.',
      }),
    );
  }
  return problems;
}

function checkHeight(p: WheelProportions): readonly Problem[] {
  if (p.height > 0 && p.height <= 1) {
    return [];
  }
  const leaves = p.mate.kind === 'pinion' ? p.mate.leaves : p.mate.trundles;
  const pointed = theoreticalAddendum(p.teeth, leaves, p.tooth) * p.module;
  const high = p.height > 1;
  return [
    toothProblem({
      code: high ? 'tooth.no-tip' : 'tooth.no-form',
      key: ['height'],
      message: high
        ? `no tip is left at ${mm(p.height * pointed)} above the pitch circle: the tooth comes to a point at ${mm(pointed)}`
        : `${p.height} of the pointed height (${mm(pointed)}) leaves no addendum`,
      hint: 'Give height: a share above 0 and at most 1; 0.95 is usual.',
    }),
  ];
}
