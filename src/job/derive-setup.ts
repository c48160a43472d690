/**
 * The blank as it stands on the machine: heights in the program's Z, what holds it, what is in the way. mm.
 */
import type { BlankShape, Cutter, Obstacle, Setup } from '../cutting/setup.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import type { JobText } from './job-schema.ts';
import type { WheelJob } from './job.ts';
import type { Notes } from './notes.ts';

export interface SetupGround {
  readonly text: JobText;
  readonly wheel: WheelJob;
  readonly form: WheelForm;
  readonly cutters: readonly Cutter[];
  readonly below: number;
}

export function deriveSetup({ text, wheel, form, cutters, below }: SetupGround, notes: Notes): Setup {
  const { blank } = text;
  const skin = skinOf(text);
  const thickness = blankThickness(text, wheel, notes);
  const zero = notes.fill(text.zero, 'zero', 'top', 'the top of the blank is touched off most easily');
  const topZ = zero === 'top' ? 0 : thickness;
  const plateZ = topZ - thickness;
  const clear = notes.fill(text.clear, 'clear', 5, 'above chips and the glue at the edge');
  const zeroAt = text['zero-at'];
  return {
    material: blank.material,
    shape: shapeOf(text, form, notes),
    topZ,
    plateZ,
    clearZ: topZ + clear,
    intoPlate: skin > 0 ? 0 : below,
    bored: notes.fill(blank.bored, 'blank.bored', 0, 'no hole is said to be there'),
    holding: holdingOf(text),
    skin,
    obstacles: [...keepOuts(text, plateZ), ...screwHeads(text, topZ)],
    cutters,
    ...(zeroAt === undefined ? {} : { zeroAt: { x: zeroAt[0] ?? 0, y: zeroAt[1] ?? 0, z: zeroAt[2] ?? 0 } }),
  };
}

export function holdingOf({ blank }: JobText): Setup['holding'] {
  return typeof blank.holding === 'string'
    ? [blank.holding]
    : blank.holding.map((one) => (typeof one === 'string' ? one : 'screw'));
}

export function skinOf(text: JobText): number {
  return holdingOf(text).includes('skin') ? (text.blank.skin ?? 0) : 0;
}

export function blankThickness(text: JobText, wheel: Pick<WheelJob, 'thickness'>, notes: Notes): number {
  const skin = skinOf(text);
  const why = skin > 0 ? 'that of the wheel and the skin under it' : 'that of the wheel';
  return notes.fill(text.blank.thickness, 'blank.thickness', wheel.thickness + skin, why);
}

function shapeOf({ blank }: JobText, form: WheelForm, notes: Notes): BlankShape {
  if (blank.shape === 'disc') {
    const given = typeof blank.size === 'number' ? blank.size : undefined;
    return {
      kind: 'disc',
      diameter: notes.fill(
        given,
        'blank.size',
        2 * form.outsideRadius,
        'the tip circle: turn the disc to it',
      ),
    };
  }
  const [width = 0, height = 0] = typeof blank.size === 'object' ? blank.size : [];
  return { kind: 'sheet', width, height };
}

function keepOuts({ blank }: JobText, plateZ: number): Obstacle[] {
  return (blank['keep-out'] ?? []).map(({ x, y, radius, height }) => ({
    name: 'keep-out',
    x,
    y,
    radius,
    fromZ: plateZ,
    toZ: plateZ + height,
  }));
}

function screwHeads({ blank }: JobText, topZ: number): Obstacle[] {
  const held = typeof blank.holding === 'string' ? [] : blank.holding;
  return held.flatMap((one) =>
    typeof one === 'string'
      ? []
      : [
          {
            name: 'screw head',
            x: 0,
            y: 0,
            radius: one.screw.head / 2,
            fromZ: topZ,
            toZ: topZ + one.screw.height,
          },
        ],
  );
}
