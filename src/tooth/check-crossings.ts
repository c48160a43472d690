/** What crossings must keep to: hub < window < rim, arms that stay apart at the rim, corners that fit. */
import type { Problem } from '../base/problem.ts';
import { largestWhere } from './largest-where.ts';
import { mm, toothProblem } from './tooth-problem.ts';
import type { CrossingProportions } from './wheel.ts';

export const LEAST_ARMS = 3;
export const MOST_ARMS = 8;

export function checkCrossings(p: CrossingProportions, rootRadius: number): readonly Problem[] {
  const problems: Problem[] = [];
  const no = (key: string, message: string, hint: string) =>
    problems.push(crossingsProblem(key, message, hint));
  if (!Number.isInteger(p.arms) || p.arms < LEAST_ARMS || p.arms > MOST_ARMS) {
    no('arms', `${p.arms} arms cannot be crossed out`, `Use ${LEAST_ARMS} to ${MOST_ARMS} arms.`);
  }
  for (const [key, value] of Object.entries({ arm: Math.min(p.armAtHub, p.armAtRim), ...plain(p) })) {
    if (!(value > 0 && Number.isFinite(value))) {
      no(key, `${key} is ${mm(value)}`, 'Give a length above 0 mm.');
    }
  }
  return problems.length > 0 ? problems : checkBounds(p, rootRadius);
}

function plain({ rim, hub, corner }: CrossingProportions) {
  return { rim, hub, corner };
}

function checkBounds(p: CrossingProportions, rootRadius: number): readonly Problem[] {
  const hub = p.hub / 2;
  const outer = rootRadius - p.rim;
  if (!(hub < outer)) {
    const message = `no window is left: the hub's radius is ${mm(hub)}, the rim's inside ${mm(outer)} (root circle ${mm(rootRadius)} less rim ${mm(p.rim)})`;
    return [crossingsProblem('hub', message, 'Make the hub smaller or the rim thinner.')];
  }
  if (p.armAtHub >= p.hub) {
    const message = `an arm ${mm(p.armAtHub)} wide does not stand on a hub of ${mm(p.hub)} diameter`;
    return [
      crossingsProblem(
        'arm',
        message,
        `Make the arm narrower than ${mm(p.hub)} at the hub, or the hub larger.`,
      ),
    ];
  }
  const widest = 2 * outer * Math.sin(Math.PI / p.arms);
  if (p.armAtRim >= widest) {
    const message = `${p.arms} arms ${mm(p.armAtRim)} wide close the windows at the rim: they meet at ${mm(widest)}`;
    return [crossingsProblem('arm', message, 'Make the arms narrower, or use fewer.')];
  }
  return [];
}

/** Says how large the corners may be. */
export function cornerTooLarge(corner: number, fits: (corner: number) => boolean): Problem {
  const largest = Math.floor(largestWhere(fits, 0, corner) * STEPS) / STEPS;
  return crossingsProblem(
    'corner',
    `corners of ${mm(corner)} radius do not fit the windows; the largest that do are ${mm(largest)}`,
    `Give corner: at most ${mm(largest)}.`,
  );
}

/** Rounded down to the last figure that is printed, so that the figure itself fits. */
const STEPS = 10_000;

function crossingsProblem(key: string, message: string, hint: string): Problem {
  return toothProblem({ code: 'tooth.crossings', key: ['crossings', key], message, hint });
}
