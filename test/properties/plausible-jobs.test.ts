/** Jobs that random ones found refused, or written wrong, without a reason: each cut to the smallest that shows it. */
import { expect, it, vi } from 'vitest';
import { cutText, type Beside } from '../support/cut-text.ts';

vi.setConfig({ testTimeout: 60_000 });

interface Small {
  readonly wheel?: string;
  readonly blank?: string;
  readonly more?: readonly string[];
  readonly machine?: string;
  readonly cutters?: readonly string[];
  readonly cuts?: readonly string[];
}

/** A wheel of twelve teeth: as few blocks as a wheel can have. */
function small({ wheel, blank, more = [], machine = 'bench-mill', cutters, cuts = [] }: Small): string {
  return [
    `wheel: ${wheel ?? '{ teeth: 12, mate: { leaves: 8 }, module: 0.5, thickness: 0.3 }'}`,
    `blank: ${blank ?? '{ material: leaded-brass, shape: sheet, size: [12, 12], holding: glue }'}`,
    ...more,
    `machine: ${machine}`,
    'cutters:',
    ...(cutters ?? ['{ diameter: 0.4, reach: 1.2, flute: 1.2, helix: 30 }']).map(
      (cutter, i) => `  ${i + 1}: ${cutter}`,
    ),
    ...(cuts.length > 0 ? ['cuts:', ...cuts.map((cut) => `  ${cut}`)] : []),
    '',
  ].join('\n');
}

function complaints(text: string, machine?: Beside['machine']): readonly string[] {
  const { problems, facts } = cutText('small', text, 'golden', machine && { machine });
  return [...problems, ...(facts?.proof?.findings ?? [])]
    .filter(({ severity }) => severity === 'error')
    .map(({ code, message }) => `${code}: ${message}`);
}

it('metal left in the bore for broaching is on the diameter, for the proof too', () => {
  const wheel = '{ teeth: 12, mate: { leaves: 8 }, module: 0.5, thickness: 0.3, bore: 1.2 }';
  expect(complaints(small({ wheel, cuts: ['bore: { leave: 0.1 }'] }))).toEqual([]);
});

it('a cutter that reaches 0.3 goes through 0.2 and 0.1 below, whatever binary fractions make of their sum', () => {
  const wheel = '{ teeth: 12, mate: { leaves: 8 }, module: 0.5, thickness: 0.2 }';
  const cutters = ['{ diameter: 0.4, reach: 0.3, flute: 0.3, helix: 30 }'];
  expect(complaints(small({ wheel, cutters }))).toEqual([]);
});

it('a cutter that reaches 0.4 mm in inches goes through 0.3 mm and 0.1 mm in inches, each rounded by itself', () => {
  const wheel = '{ teeth: 12, mate: { leaves: 8 }, module: 0.5, thickness: 0.0118110 inch }';
  const cutters = ['{ diameter: 0.4, reach: 0.0157480 inch, flute: 0.0157480 inch, helix: 30 }'];
  expect(complaints(small({ wheel, cutters, cuts: ['below: 0.00393701 inch'] }))).toEqual([]);
});

it('a cutter too short for the plate is not taken instead of one that leaves some metal at the root', () => {
  const wheel = '{ teeth: 7, mate: { leaves: 7 }, module: 1, dedendum: 1.72, thickness: 0.5 }';
  const blank = '{ material: leaded-brass, shape: sheet, size: [18, 18], holding: glue }';
  const cutters = [
    '{ diameter: 1, reach: 3, flute: 3, helix: 25 }',
    '{ diameter: 0.3, reach: 0.5, flute: 0.5, helix: 25 }',
  ];
  expect(complaints(small({ wheel, blank, cutters }))).toEqual([]);
});

it('a clamp beyond the travel is walked to no further than the travel goes', () => {
  const blank =
    '{ material: leaded-brass, shape: sheet, size: [12, 12], holding: glue, keep-out: [{ x: 90, y: 100, radius: 5, height: 3 }, { x: -90, y: -100, radius: 5, height: 3 }] }';
  expect(complaints(small({ blank }))).toEqual([]);
});

it('the cutter is parked within the travel, beside a wheel that nearly fills it', () => {
  const wheel = '{ teeth: 56, mate: { leaves: 8 }, module: 2, thickness: 0.5 }';
  const blank = '{ material: leaded-brass, shape: sheet, size: [160, 160], holding: glue }';
  const cutters = ['{ diameter: 1.2, reach: 3, flute: 3, helix: 30 }'];
  expect(complaints(small({ wheel, blank, cutters, machine: 'desk-four-axis' }))).toEqual([]);
});

it.each([undefined, 0.02])(
  'a cutter of 0.08 cuts no slot while it finishes, with an allowance of %s',
  (allowance) => {
    const wheel = '{ teeth: 12, mate: { leaves: 8 }, module: 0.15, thickness: 0.3 }';
    const cutters = ['{ diameter: 0.08, reach: 0.6, flute: 0.6, helix: 30, stick-out: 10 }'];
    const blank = '{ material: leaded-brass, shape: sheet, size: [6, 6], holding: glue }';
    const cuts = allowance === undefined ? [] : [`roughing: { allowance: ${allowance} }`];
    expect(complaints(small({ wheel, blank, cutters, cuts }))).toEqual([]);
  },
);

it('finishes with the cutter that leaves the working flank whole, though a larger one gets to the root', () => {
  const wheel =
    '{ teeth: 30, mate: { leaves: 19, tip: { height: 1.1, radius: 1 } }, module: 1, thickness: 0.5 }';
  const blank = '{ material: leaded-brass, shape: sheet, size: [46, 46], holding: glue }';
  const cutters = [
    '{ diameter: 1.2, reach: 3, flute: 3, helix: 30 }',
    '{ diameter: 0.8, reach: 3, flute: 3, helix: 30 }',
  ];
  expect(complaints(small({ wheel, blank, cutters }))).toEqual([]);
});

it('joins the wall of a window within its straight, where round corners leave little of that and a skin holds the slug', () => {
  const wheel =
    '{ teeth: 20, mate: { leaves: 15 }, module: 1, dedendum: 1.44, thickness: 0.3, crossings: { arms: 3, arm: 1.4, rim: 0.226, hub: 9.2, corner: 1.71 } }';
  const blank = '{ material: aluminium, shape: sheet, size: [34, 34], holding: skin, skin: 0.05 }';
  const cutters = [
    '{ diameter: 0.8, reach: 2, flute: 2, helix: 30 }',
    '{ diameter: 1.8, reach: 5, flute: 5, helix: 30 }',
  ];
  expect(
    complaints(small({ wheel, blank, cutters, more: ['zero: plate'], cuts: ['crossings: { cutter: 2 }'] })),
  ).toEqual([]);
});

it('a finishing cutter that goes on into the wedge of a space, beyond where the roughing one stopped, goes in levels', () => {
  const wheel = '{ teeth: 7, mate: { leaves: 19 }, module: 2, tooth: 0.52, thickness: 3 }';
  const blank = '{ material: silver-steel, shape: sheet, size: [28, 28], holding: glue }';
  const cutters = ['{ diameter: 2, reach: 6, flute: 6 }'];
  const cuts = ['roughing: { allowance: 0.126 }', 'finishing: { cutter: 1, spring: 0 }'];
  expect(complaints(small({ wheel, blank, cutters, cuts }))).toEqual([]);
});

it('a finishing cutter that finds metal in the corners of the root, where a wider one could not go, goes in levels', () => {
  const wheel = '{ teeth: 22, mate: { leaves: 19 }, module: 0.45, thickness: 1 }';
  const blank = '{ material: silver-steel, shape: sheet, size: [20, 20], holding: glue }';
  const cutters = [
    '{ diameter: 0.25, reach: 1.25, flute: 1.25, stick-out: 10, helix: 40 }',
    '{ diameter: 0.5, flutes: 3, reach: 1.5, flute: 0.75, shank: 3, stick-out: 12, helix: 40 }',
  ];
  const cuts = ['roughing: { cutter: 2 }', 'finishing: { cutter: 1 }'];
  expect(complaints(small({ wheel, blank, cutters, cuts }))).toEqual([]);
});

it('a machine that does not creep gets no feed below its lowest, on inside arcs and before corners either', () => {
  const text = small({ wheel: '{ teeth: 12, mate: { leaves: 8 }, module: 0.5, thickness: 0.3, bore: 1.2 }' });
  const brisk = (file: string): string => file.replace(/feed-lowest: .*/, 'feed-lowest: 100');
  expect(complaints(text, brisk)).toEqual([]);
});

it('a speed at which the edge burns is refused at the job, not by the proof of a program nobody can change', () => {
  const wheel = '{ teeth: 12, mate: { leaves: 8 }, module: 2, thickness: 1 }';
  const blank = '{ material: silver-steel, shape: sheet, size: [40, 40], holding: glue }';
  const cuts = ['roughing: { speed: 24000 }'];
  const text = small({ wheel, blank, cutters: ['{ diameter: 2.5, reach: 4, flute: 4 }'], cuts });
  expect(complaints(text)).toEqual([
    expect.stringMatching(/^toolpath\.load: roughing: at 24000 turns a minute/),
  ]);
});
