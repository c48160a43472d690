/** Proportions that the tests of the tooth start from: 60 teeth for 8 leaves, module 0.5, everything usual. */
import type { Outcome } from '../../src/base/problem.ts';
import type { Mate, WheelProportions } from '../../src/tooth/wheel.ts';

export function pinion(leaves: number): Mate {
  return { kind: 'pinion', leaves, leaf: leaves > 10 ? 1.25 : 1.05, tip: 'third-ogive', dedendum: 1.87 };
}

export function proportions(change: Partial<WheelProportions> = {}): WheelProportions {
  const { teeth = 60, module = 0.5, mate = pinion(8) } = change;
  const leaves = mate.kind === 'pinion' ? mate.leaves : mate.trundles;
  return {
    teeth,
    module,
    mate,
    centres: (module * (teeth + leaves)) / 2,
    addendumForm: 'epicycloid',
    height: 0.95,
    tooth: 0.5,
    dedendum: Math.PI / 2,
    rootFillet: 0,
    ...change,
  };
}

export function value<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) {
    throw new Error(outcome.problems.map(({ message }) => message).join('; '));
  }
  return outcome.value;
}
