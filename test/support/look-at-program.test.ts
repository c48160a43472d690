/** The tests' own look at a program must itself be able to see what is wrong. */
import { expect, it } from 'vitest';
import { cutText } from './cut-text.ts';
import { lookAtProgram, type Looked } from './look-at-program.ts';
import { tipRadius, type Wheel } from './tooth-points.ts';

const WHEEL: Wheel = {
  teeth: 16,
  leaves: 8,
  module: 0.5,
  form: 'epicycloid',
  height: 0.95,
  tooth: 0.5,
  dedendum: 1.5708,
  root: 0,
};

const TEXT = `wheel: { teeth: 16, mate: { leaves: 8 }, module: 0.5, thickness: 0.3 }
blank: { material: leaded-brass, shape: sheet, size: [14, 14], holding: glue }
machine: bench-mill
cutters:
  1: { diameter: 0.4, reach: 1.2, flute: 1.2, helix: 30 }
`;

function looked(change: Partial<Looked>): ReturnType<typeof lookAtProgram> {
  const { files } = cutText('looked', TEXT);
  const texts = files
    .filter(({ runnable, name }) => runnable && !name.includes('-walk'))
    .map(({ text }) => text);
  return lookAtProgram({
    wheel: WHEEL,
    texts,
    absoluteCentres: false,
    diameters: [0.4],
    finishing: 0.4,
    topZ: 0,
    bottomZ: -0.4,
    rim: 0.5 * (8 - 1.5708),
    ...change,
  });
}

it('sees nothing wrong in a good program', () => {
  const look = looked({});
  expect(look.samples).toBeGreaterThan(1000);
  expect(look.gouge).toBeLessThan(0.00115);
  expect(look.left).toBeLessThan(0.00115);
});

it('sees a cutter 6 um larger gouge by 3, and one 6 um smaller leave 3', () => {
  expect(looked({ diameters: [0.406], finishing: 0.406 }).gouge).toBeGreaterThan(0.0029);
  expect(looked({ diameters: [0.394], finishing: 0.394 }).left).toBeGreaterThan(0.0029);
});

it('sees every X of the teeth shifted by 3 um', () => {
  const { files } = cutText('looked', TEXT);
  const shifted = files
    .filter(({ runnable, name }) => runnable && !name.includes('-walk'))
    .map(({ text }) =>
      text.replaceAll(/X(-?\d+\.\d+)/g, (_, x: string) => `X${(Number(x) + 0.003).toFixed(4)}`),
    );
  expect(looked({ texts: shifted }).gouge).toBeGreaterThan(0.002);
});

it.each([
  [18, 6, 1.325378],
  [24, 6, 1.347308],
  [30, 6, 1.361473],
  [42, 6, 1.3787],
])(
  'tip of %d teeth for %d leaves stands %f modules above the pitch circle when it is pointed [theoretical addendum of the cycloidal wheel, by the defining equations]',
  (teeth, leaves, addendum) => {
    const wheel = { ...WHEEL, teeth, leaves, module: 1, height: 1 };
    expect(tipRadius(wheel) - teeth / 2).toBeCloseTo(addendum, 5);
  },
);
