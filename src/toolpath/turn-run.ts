/** A run turned about the wheel's axis, under another name: what is true of one window is planned once. */
import { turnPoint } from '../geometry/point.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import type { Run } from './leg.ts';

export function turnRun(run: Run, angle: number, pass: string): Run {
  const names = new Map<Belongs | undefined, Belongs>();
  const belongsOf = (belongs: Belongs | undefined): Belongs => {
    const known = names.get(belongs) ?? { ...belongs, pass };
    names.set(belongs, known);
    return known;
  };
  return {
    at: turnPoint(run.at, angle),
    fastTo: run.fastTo,
    steps: run.steps.map((step): MoveStep => {
      const to = { ...turnPoint(step.to, angle), z: step.to.z };
      const belongs = belongsOf(step.belongs);
      return step.kind === 'arc'
        ? { ...step, to, centre: turnPoint(step.centre, angle), belongs }
        : { ...step, to, belongs };
    }),
  };
}
