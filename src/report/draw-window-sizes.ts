/**
 * Width of an arm and of the rim on the plan, where the windows have room for the figures. mm of paper, Y down.
 * Arm 1 lies on +X and is measured across; the rim is measured from a window to the root of a tooth space.
 */
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import { pinchedDimension } from './dimension.ts';
import { floorOf, type SizesPlate } from './draw-sizes.ts';
import { bareLength } from './lengths.ts';
import type { PlateFrame } from './plate.ts';
import { plain } from './words.ts';

/** Below this the window has no room for a figure: the caption has it. */
const ROOM = 17;

export function drawWindowSizes(plate: SizesPlate, frame: PlateFrame): string {
  const { crossings } = plate;
  if (crossings === undefined || (crossings.windowOuter - crossings.windowInner) * frame.scale < ROOM) {
    return '';
  }
  return armSizes(plate, crossings, frame) + rimSize(plate, crossings, frame);
}

/** Once where its sides are parallel, else at the hub circle and at the rim. */
function armSizes({ unit }: SizesPlate, crossings: Crossings, frame: PlateFrame): string {
  const { armAtHub, armAtRim } = crossings.proportions;
  const across = (
    width: number,
    x: number,
    figure: string,
    text: string,
    anchor: 'start' | 'middle' | 'end',
  ): string => {
    const half = (width / 2) * frame.scale;
    const at = x * frame.scale;
    return pinchedDimension(
      {
        figure,
        value: width,
        text: `${text}${bareLength(width, unit)}`,
        from: { x: at, y: -half },
        to: { x: at, y: half },
      },
      4.5,
      anchor,
    );
  };
  if (armAtHub === armAtRim) {
    return across(armAtHub, (crossings.windowInner + crossings.windowOuter) / 2, 'arm', 'arm ', 'middle');
  }
  const hub = chordAt(crossings.hubRadius, armAtHub);
  const rim = chordAt(crossings.windowOuter, armAtRim);
  const sides = [-1, 1]
    .map((side) => {
      const [a, b] = [(side * armAtHub * frame.scale) / 2, (side * armAtRim * frame.scale) / 2];
      return `M${plain(hub * frame.scale, 3)} ${plain(a, 3)}L${plain(rim * frame.scale, 3)} ${plain(b, 3)}`;
    })
    .join('');
  return `<path class="extension" d="${sides}"/>${across(armAtHub, hub, 'arm-at-hub', '', 'start')}${across(armAtRim, rim, 'arm-at-rim', '', 'end')}`;
}

/** Where a chord of that length stands in a circle. */
function chordAt(radius: number, chord: number): number {
  return Math.sqrt(Math.max(radius * radius - (chord * chord) / 4, 0));
}

function rimSize(plate: SizesPlate, crossings: Crossings, frame: PlateFrame): string {
  const { form, unit } = plate;
  const floor = floorOf(plate);
  const angle = spaceNear(form, windowToTheLeft(crossings.count) + OFF_AXIS / crossings.count);
  const at = (radius: number) => ({
    x: radius * frame.scale * Math.cos(angle),
    y: -radius * frame.scale * Math.sin(angle),
  });
  const value = floor - crossings.windowOuter;
  return pinchedDimension(
    {
      figure: 'rim',
      value,
      text: `rim ${bareLength(value, unit)}`,
      from: at(crossings.windowOuter),
      to: at(floor),
    },
    4.5,
    'start',
  );
}

/** From the middle of a window, in turns by arms. Why: a figure on the centre line is not read. */
const OFF_AXIS = 0.65;

/** Middle of the window that lies most to the left. */
function windowToTheLeft(count: number): number {
  const k = Math.floor((count - 1) / 2);
  return ((2 * k + 1) * Math.PI) / count;
}

/** Middle of the tooth space nearest to an angle. */
function spaceNear({ proportions }: WheelForm, angle: number): number {
  const pitch = (2 * Math.PI) / proportions.teeth;
  return (Math.round(angle / pitch - 0.5) + 0.5) * pitch;
}
