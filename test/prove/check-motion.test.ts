/** Fast moves, entries, what stands in the way, depth, spindle, feed, travel, end: each spoiled by one edit, for its own reason. */
import { describe, expect, it } from 'vitest';
import { goodLines, machine, SETUP } from '../support/good-program.ts';
import { edited, errorsOf, findingOf, GOOD, lineOf, prove, withSetup } from '../support/damage.ts';

const bore = lineOf('(BORE)');
const roughing = lineOf('(ROUGHING)');
const finishing = lineOf('(FINISHING)');
const [cutter] = SETUP.cutters;

describe('fast moves', () => {
  it('refuses one straight down into the blank', () => {
    const proof = prove(edited(bore + 2, 1, 'G0 Z-0.5'));
    expect(errorsOf(proof)).toContain('prove.fast-move');
    expect(findingOf(proof, 'prove.fast-move')).toMatchObject({ line: bore + 3 });
    expect(findingOf(proof, 'prove.fast-move').message).toMatch(/Z -0.5 mm.*Z 0 mm/);
  });

  it('refuses one sideways below the clear height, in cleared metal or not', () => {
    const proof = prove(edited(roughing - 1, 1, 'G0 X0.2 Y0', 'G0 Z5'));
    expect(errorsOf(proof)).toEqual(['prove.fast-move']);
    expect(findingOf(proof, 'prove.fast-move').message).toMatch(/-1.1 mm.*5 mm/);
  });

  it('lets one go straight down where the metal is gone', () => {
    const again = ['G0 X0.25 Y0', 'G0 Z-0.9', 'G1 Z-1.1 F100', 'G0 Z5'];
    expect(errorsOf(prove(edited(roughing, 0, ...again)))).toEqual([]);
  });

  it('refuses one straight down beside where the metal is gone', () => {
    const again = ['G0 X0.75 Y0', 'G0 Z-0.9', 'G0 Z5'];
    expect(errorsOf(prove(edited(roughing, 0, ...again)))).toContain('prove.fast-move');
  });

  it('refuses one sideways before the height is known', () => {
    const lines = GOOD.toSpliced(lineOf('G53 G0 Z0'), 1);
    expect(errorsOf(prove(lines))).toEqual(['prove.fast-move']);
  });
});

describe('an unknown place', () => {
  it('is refused as the beginning of a cut', () => {
    const lines = edited(bore + 1, 2, 'G1 Z0.2 F50');
    expect(errorsOf(prove(lines))).toContain('prove.unknown-place');
  });
});

describe('the way into metal', () => {
  const hole = ['G0 X8 Y8', 'G0 Z0.2', 'G1 Z-0.3 F50', 'G0 Z5'];

  it('refuses a plunge by a cutter that was not said to plunge', () => {
    const proof = prove(edited(roughing, 0, ...hole));
    expect(errorsOf(proof)).toEqual(['prove.plunge']);
    expect(findingOf(proof, 'prove.plunge').line).toBe(roughing + 3);
  });

  it('lets one plunge that was', () => {
    const plunging = withSetup({ cutters: [{ ...cutter!, plunges: true }] });
    expect(errorsOf(prove(edited(roughing, 0, ...hole), plunging))).toEqual([]);
  });

  it('holds the feed of a plunge to the limits of the machine', () => {
    const plunging = withSetup({ cutters: [{ ...cutter!, plunges: true }] });
    const { feedHighest } = machine().limits;
    const fast = hole.map((line) => line.replace('F50', `F${String(2 * feedHighest)}`));
    const proof = prove(edited(roughing, 0, ...fast), plunging);
    expect(errorsOf(proof)).toEqual(['prove.feed-limits', 'prove.chip']);
    expect(findingOf(proof, 'prove.feed-limits').line).toBe(roughing + 3);
  });

  it('refuses a ramp steeper than the material allows [brass 3 degrees; 0.3 in 2 mm is 14]', () => {
    const ramp = ['G0 X8 Y8', 'G0 Z0.2', 'G1 Z0 F50', 'G1 X10 Z-0.5 F50', 'G0 Z5'];
    const proof = prove(edited(roughing, 0, ...ramp));
    expect(errorsOf(proof)).toEqual(['prove.ramp']);
    expect(findingOf(proof, 'prove.ramp').message).toMatch(/14\.0 degrees.*3 degrees/);
  });
});

describe('what stands in the way', () => {
  const clamp = { name: 'keep-out', x: 8, y: 0, radius: 1, fromZ: -1, toZ: 12 } as const;

  it('refuses a cutter that passes through a keep-out', () => {
    const proof = prove(GOOD, withSetup({ obstacles: [{ ...clamp, x: 5, toZ: 1 }] }));
    expect(errorsOf(proof)).toContain('prove.obstacle');
    expect(findingOf(proof, 'prove.obstacle').message).toMatch(/the cutter/);
  });

  it('is passed by at the top of the machine, where Z is not known but nothing stands', () => {
    const tall = withSetup({ obstacles: [{ ...clamp, x: 30, toZ: 80 }] });
    const over = ['G53 G0 Z0', 'G0 X30 Y0', 'G0 X40', 'G0 X8 Y8', 'G0 Z5'];
    expect(errorsOf(prove(edited(roughing, 0, ...over), tall))).toEqual([]);
    const cut = edited(roughing, 0, 'G53 G0 Z0', 'G0 X30 Y0', 'G1 X40 F100', 'G0 X8 Y8', 'G0 Z5');
    expect(errorsOf(prove(cut, tall))).toEqual(['prove.unknown-place']);
    const coming = edited(
      roughing,
      0,
      'G53 G0 Z0',
      'G0 X30 Y0',
      'G0 Z5',
      'G0 X40',
      'G53 G0 Z0',
      'G0 X8 Y8',
      'G0 Z5',
    );
    expect(errorsOf(prove(coming, tall))).toEqual(['prove.obstacle']);
  });

  it('is not passed by where Z is not known for another reason', () => {
    const lost = edited(roughing, 0, 'G49', 'G0 X30 Y0', 'G43 H1', 'G0 Z5');
    expect(errorsOf(prove(lost))).toContain('prove.fast-move');
  });

  it('refuses a shank that does', () => {
    const proof = prove(GOOD, withSetup({ obstacles: [{ ...clamp, x: 7.5, toZ: 4 }] }));
    expect(errorsOf(proof)).toEqual(['prove.obstacle']);
    expect(findingOf(proof, 'prove.obstacle').message).toMatch(/shank \(radius 1.5 mm\)/);
  });

  it('refuses a collet nut that does', () => {
    const proof = prove(GOOD, withSetup({ obstacles: [{ ...clamp, x: 12, toZ: 14 }] }));
    expect(errorsOf(proof)).toEqual(['prove.obstacle']);
    expect(findingOf(proof, 'prove.obstacle').message).toMatch(/collet nut/);
  });

  it('lets everything pass a clamp that is far enough away', () => {
    expect(errorsOf(prove(GOOD, withSetup({ obstacles: [{ ...clamp, x: 40 }] })))).toEqual([]);
  });
});

describe('depth', () => {
  it('refuses cuts into the plate deeper than was allowed', () => {
    const proof = prove(goodLines({ parts: 8, deepest: -1.15 }));
    expect(errorsOf(proof)).toEqual(['prove.plate']);
    expect(findingOf(proof, 'prove.plate').message).toMatch(/-1.15 mm.*-1.1 mm/);
  });

  it('refuses cuts through the skin that holds the wheel', () => {
    const skin = { ...withSetup({ holding: ['skin'], skin: 0.08 }) };
    expect(errorsOf(prove(GOOD, skin))).toEqual(['prove.skin']);
  });

  it('refuses a shank that rubs on the walls above its reach', () => {
    const short = withSetup({ cutters: [{ ...cutter!, reach: 0.8 }] });
    const proof = prove(GOOD, short);
    expect(errorsOf(proof)).toEqual(['prove.shank']);
    expect(findingOf(proof, 'prove.shank').message).toMatch(/reach is 0.8 mm/);
  });

  it('minds no shank that is as narrow as its cutter', () => {
    const slim = withSetup({ cutters: [{ ...cutter!, reach: 0.8, shank: 0.6 }] });
    expect(errorsOf(prove(GOOD, slim))).toEqual([]);
  });

  it('refuses a collet nut that comes down on the blank', () => {
    const stub = withSetup({ cutters: [{ ...cutter!, stickOut: 1, reach: 3 }] });
    expect(errorsOf(prove(GOOD, stub))).toContain('prove.nut');
  });
});

describe('spindle and feed', () => {
  it('refuses cutting with the spindle still', () => {
    const proof = prove(GOOD.filter((line) => line !== 'M3'));
    expect(errorsOf(proof)).toEqual(['prove.spindle']);
  });

  it('refuses cutting with the spindle turning backwards', () => {
    expect(errorsOf(prove(edited(lineOf('M3'), 1, 'M4')))).toEqual(['prove.spindle']);
  });

  it('refuses cutting before the spindle is up [this mill needs 4 s]', () => {
    const proof = prove(edited(lineOf('G4 P4'), 1, 'G4 P1'));
    expect(errorsOf(proof)).toEqual(['prove.spin-up']);
    expect(findingOf(proof, 'prove.spin-up').message).toMatch(/1 s.*4 s/);
  });

  it('refuses speeds and feeds this machine does not run', () => {
    expect(errorsOf(prove(edited(lineOf('S12000'), 1, 'S30000')))).toEqual(['prove.spindle-limits']);
    const fast = GOOD.map((line, k) => (k === finishing + 9 ? line.replace('F150', 'F5000') : line));
    expect(errorsOf(prove(fast))).toEqual(['prove.feed-limits', 'prove.chip']);
  });

  it('refuses an edge faster than the material bears [leaded brass: 100 m/min in the table, four times that at most]', () => {
    const { limits } = machine();
    const wild = { machine: { ...machine(), limits: { ...limits, spindleHighest: 300000 } } };
    const proof = prove(edited(lineOf('S12000'), 1, 'S220000'), wild);
    expect(errorsOf(proof)).toEqual(['prove.chip']);
    // pi * 0.6 mm * 220000 / 1000
    expect(findingOf(proof, 'prove.chip').message).toMatch(/414\.7 m\/min.*400\.0 m\/min/);
  });

  it('warns of a spindle that hardly turns the edge', () => {
    const proof = prove(GOOD.map((line) => line.replace('S12000', 'S800').replace('F150', 'F10')));
    expect(errorsOf(proof)).toEqual([]);
    expect(findingOf(proof, 'prove.chip')).toMatchObject({ severity: 'warning' });
  });

  it('refuses a cutter that the set-up does not have', () => {
    const proof = prove(GOOD, withSetup({ cutters: [{ ...cutter!, number: 4 }] }));
    expect(errorsOf(proof)).toContain('prove.cutter');
  });
});

describe('travel', () => {
  const limits = { ...machine().limits, travel: { x: [0, 8], y: [0, 100], z: [-60, 0] } as const };

  it('refuses more than the machine has, by size', () => {
    const proof = prove(GOOD, { machine: { ...machine(), limits } });
    expect(errorsOf(proof)).toEqual(['prove.travel']);
    expect(findingOf(proof, 'prove.travel').message).toMatch(/^X runs over .* mm; .* 8 mm/);
  });

  it('refuses what lies beyond its ends, where zero is known', () => {
    const wide = { ...limits, travel: { ...limits.travel, x: [0, 100] as const } };
    const at = { ...machine(), limits: wide };
    const inside = withSetup({ zeroAt: { x: 50, y: 50, z: -35 } });
    expect(errorsOf(prove(GOOD, { machine: at, ...inside }))).toEqual([]);
    const outside = withSetup({ zeroAt: { x: 97, y: 50, z: -35 } });
    expect(errorsOf(prove(GOOD, { machine: at, ...outside }))).toEqual(['prove.travel']);
  });
});

describe('arcs by size', () => {
  const { words } = machine();
  const arcs = (changes: Partial<typeof words.arcs>) => ({
    machine: { ...machine(), words: { ...words, arcs: { ...words.arcs, ...changes } } },
  });

  it('refuses a radius this machine does not run [the bore has rings of 0.25 mm]', () => {
    const proof = prove(GOOD, arcs({ smallestRadius: 0.27 }));
    expect(errorsOf(proof)).toEqual(['prove.arc']);
    expect(findingOf(proof, 'prove.arc').message).toMatch(/0.25 mm.*0.27 mm/);
  });

  it('refuses a chord shorter than this machine wants', () => {
    expect(errorsOf(prove(GOOD, arcs({ shortestChord: 0.3 })))).toEqual(['prove.arc']);
  });
});

describe('the end', () => {
  it('refuses a program that leaves the spindle on', () => {
    const proof = prove(GOOD.filter((line) => line !== 'M5'));
    expect(errorsOf(proof)).toEqual(['prove.left-on']);
    expect(findingOf(proof, 'prove.left-on').message).toMatch(/spindle/);
  });

  it('refuses one that leaves the cutter down', () => {
    const end = lineOf('M5');
    const proof = prove(GOOD.toSpliced(end - 1, 3, 'G0 Z2', 'M5'));
    expect(errorsOf(proof)).toEqual(['prove.stopped-low', 'prove.left-on']);
    expect(findingOf(proof, 'prove.left-on').message).toMatch(/Z 2 mm.*5 mm/);
  });

  it('refuses one whose height nobody knows', () => {
    const end = lineOf('M5');
    const proof = prove(GOOD.toSpliced(end + 1, 1, 'G53 G0 Z-80'));
    expect(errorsOf(proof)).toEqual(['prove.left-on']);
    expect(findingOf(proof, 'prove.left-on').line).toBe(end + 2);
  });
});

describe('stops', () => {
  it('refuses hands asked for, even perhaps, while the cutter is down', () => {
    const proof = prove(edited(finishing, 0, 'M1'));
    expect(errorsOf(proof)).toEqual(['prove.stopped-low']);
    expect(findingOf(proof, 'prove.stopped-low').line).toBe(finishing + 1);
  });

  it('lets the spindle change its speed there, and stop above', () => {
    expect(errorsOf(prove(edited(finishing, 0, 'S13000', 'G4 P4')))).toEqual([]);
    expect(errorsOf(prove(edited(roughing, 0, 'M5', 'M1', 'M3', 'G4 P4')))).toEqual([]);
  });
});
