/** Any wheel that has a form: counts, modules, both addenda, sharp and filleted roots. */
import * as fc from 'fast-check';
import { toothSide } from '../../src/tooth/tooth-side.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import type { WheelProportions } from '../../src/tooth/wheel.ts';
import { pinion, proportions } from './proportions.ts';

export function anyProportions(): fc.Arbitrary<WheelProportions> {
  const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  return fc
    .record({
      teeth: fc.integer({ min: 6, max: 400 }),
      leaves: fc.integer({ min: 6, max: 20 }),
      module: between(0.1, 2),
      addendumForm: fc.constantFrom('epicycloid' as const, 'arc' as const),
      height: fc.oneof(fc.constant(1), between(0.6, 1)),
      tooth: between(0.35, 0.6),
      dedendum: between(1, 2),
      fillet: fc.oneof(fc.constant(0), between(0.02, 0.7)),
    })
    .map(({ leaves, fillet, ...rest }) =>
      proportions({ ...rest, mate: pinion(leaves), rootFillet: fillet * rest.module }),
    )
    .filter((p) => toothSide(p).ok && wheelForm(p).ok);
}
