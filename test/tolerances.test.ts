import { expect, it } from 'vitest';
import * as tolerances from '../src/base/tolerances.ts';

it('tolerances of one budget stand coarsest first', () => {
  const { FORM_ERROR, FIT_ERROR, CHORD_SAG, PROOF_RESOLUTION, CLIPPER_STEP, SAME_POINT } = tolerances;
  const order = [FORM_ERROR, FIT_ERROR, CHORD_SAG, PROOF_RESOLUTION, CLIPPER_STEP, SAME_POINT];
  expect(order).toEqual(order.toSorted((a, b) => b - a));
});

it('every tolerance is a positive number', () => {
  for (const [name, value] of Object.entries(tolerances)) {
    expect(Number.isFinite(value) && value > 0, name).toBe(true);
  }
});
