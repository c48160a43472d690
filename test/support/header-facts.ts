/** Facts of an invented program, for the head of any motion. */
import type { HeaderFacts } from '../../src/post/header-facts.ts';
import { motionFacts } from '../../src/post/motion-facts.ts';
import type { Motion } from '../../src/motion/motion.ts';

export function headerFacts(motion: Motion, changes: Partial<HeaderFacts> = {}): HeaderFacts {
  const { x, y, z, speeds } = motionFacts(motion);
  return {
    kind: 'cut',
    title: 'Third wheel of a bracket clock',
    mark: '0A1B2C3D',
    version: '0.1.0',
    part: ['Wheel, 60 teeth, module 0.5, 1.500 mm thick'],
    program: { number: 1, of: 1 },
    blank: 'sheet 44.000 by 44.000 mm, 1.500 mm thick',
    holding: 'glue',
    material: 'leaded-brass',
    cutters: [{ number: 1, diameter: 1, flutes: 2, stickOut: 12, shank: 3 }],
    speeds,
    extents: { x, y, z },
    clear: 5,
    topZ: 0,
    plateZ: -1.5,
    park: { x: 0, y: 0, z: 20 },
    zero: 'top',
    again: 'touch the edges of the sheet',
    check: { what: 'outside diameter', size: 31.471 },
    proved: ['read back from its own text'],
    notProved: ['bending of the cutter'],
    ...changes,
  };
}
