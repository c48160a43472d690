/**
 * The part cut through its axis, beside the plan: hub and rim hatched, teeth and arms behind plain, and to the right of it
 * the diameters one outside the other. mm of paper, Y down.
 */
import { arrowHead, uprightDimension } from './dimension.ts';
import { floorOf, type SizesPlate } from './draw-sizes.ts';
import { bareLength } from './lengths.ts';
import { HEAVY, LIGHT, type PlateFrame } from './plate.ts';
import { plain } from './words.ts';

/** From the wheel's edge to the section, and between one diameter's line and the next. */
export const SECTION_GAP = 12;
const FIRST = 7;
const STEP = 7.2;

export interface Diameter {
  readonly figure: string;
  readonly name: string;
  readonly value: number;
}

/** Rising. */
export function diametersOf({ form, crossings, bore, asCut }: SizesPlate): readonly Diameter[] {
  const found: Diameter[] = [
    ...(bore > 0 ? [{ figure: 'bore', name: 'bore', value: bore }] : []),
    ...(crossings === undefined
      ? []
      : [
          { figure: 'hub', name: 'hub', value: 2 * crossings.hubRadius },
          { figure: 'rim-inside', name: 'in the rim', value: 2 * crossings.windowOuter },
        ]),
    {
      figure: 'root-diameter',
      name: asCut === undefined ? 'root circle' : 'exact root circle',
      value: 2 * form.rootRadius,
    },
    ...(asCut === undefined
      ? []
      : [{ figure: 'foot-diameter', name: 'foot, as cut', value: 2 * asCut.footRadius }]),
    ...(asCut === undefined || asCut.reachesRoot
      ? []
      : [{ figure: 'floor-diameter', name: 'floor, as cut', value: 2 * asCut.floorRadius }]),
    { figure: 'pitch-diameter', name: 'pitch circle', value: 2 * form.pitchRadius },
    { figure: 'tip-diameter', name: 'tip circle', value: 2 * form.outsideRadius },
  ];
  return found.toSorted((a, b) => a.value - b.value);
}

export function stackWidth(count: number): number {
  return FIRST + STEP * (count - 1) + 1;
}

export function drawSection(plate: SizesPlate, frame: PlateFrame): string {
  const { form, unit, thickness } = plate;
  const left = form.outsideRadius * frame.scale + SECTION_GAP;
  const right = left + thickness * frame.scale;
  const lines = diametersOf(plate).map(({ figure, name, value }, i) => {
    const x = right + FIRST + i * STEP;
    const half = (value / 2) * frame.scale;
    const ends = [half, -half]
      .map((y) => `M${plain(right + 0.8, 3)} ${plain(y, 3)}H${plain(x + 1.2, 3)}`)
      .join('');
    const text = `${name} Ø ${bareLength(value, unit)}`;
    return `<path class="extension" d="${ends}"/>${uprightDimension({ figure, value, text, from: { x, y: half }, to: { x, y: -half } })}`;
  });
  return `${HATCH}${metal(plate, frame, left, right)}${thicknessOf(plate, frame, left, right)}${lines.join('')}`;
}

const HATCH =
  '<defs><pattern id="hatch" width="1.3" height="1.3" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">' +
  `<path class="hatching" stroke-width="${LIGHT}" d="M0 0V1.3"/></pattern></defs>`;

/** Everything in brass first, then the hatching over what the cut goes through, then the edges. */
function metal(plate: SizesPlate, frame: PlateFrame, left: number, right: number): string {
  const { form, crossings, bore } = plate;
  const floor = floorOf(plate);
  const band = (inner: number, outer: number, kind: string): string =>
    [-1, 1]
      .map((side) => {
        const y = Math.min(side * inner, side * outer) * frame.scale;
        return `<rect class="${kind}" x="${plain(left, 3)}" y="${plain(y, 3)}" width="${plain(right - left, 3)}" height="${plain((outer - inner) * frame.scale, 3)}"/>`;
      })
      .join('');
  const cut: [number, number][] =
    crossings === undefined
      ? [[bore / 2, floor]]
      : [
          [bore / 2, crossings.hubRadius],
          [crossings.windowOuter, floor],
        ];
  const arm = crossings === undefined ? '' : band(crossings.hubRadius, crossings.windowOuter, 'brass far');
  const teeth = band(floor, form.outsideRadius, 'brass');
  const parts = cut
    .map(([inner, outer]) => band(inner, outer, 'brass') + band(inner, outer, 'hatched'))
    .join('');
  return (
    `${arm}${teeth}${parts}${band(0, form.outsideRadius, 'edge').replaceAll('<rect', `<rect stroke-width="${HEAVY}"`)}` +
    `<path class="axis" stroke-dasharray="3.2 .9 .5 .9" d="M${plain(left - 3, 3)} 0H${plain(right + 4, 3)}"/>`
  );
}

/** Over the section, between arrows that point inwards. */
function thicknessOf(
  { form, thickness, unit }: SizesPlate,
  frame: PlateFrame,
  left: number,
  right: number,
): string {
  const top = -form.outsideRadius * frame.scale;
  const y = top - 3.4;
  const ends = [left, right]
    .map((x) => `M${plain(x, 3)} ${plain(top - 0.8, 3)}V${plain(y - 1.2, 3)}`)
    .join('');
  const tail = 4;
  const heads = thicknessLine(left, right, y, tail);
  return (
    `<path class="extension" d="${ends}"/><g data-figure="thickness" data-value="${thickness.toFixed(6)}">${heads}` +
    `<text class="halo" text-anchor="middle" x="${plain((left + right) / 2, 2)}" y="${plain(y - 2.2, 2)}">thick ${bareLength(thickness, unit)}</text></g>`
  );
}

function thicknessLine(left: number, right: number, y: number, tail: number): string {
  const at = plain(y, 3);
  return (
    `<path class="line measured" d="M${plain(left, 3)} ${at}L${plain(right, 3)} ${at}"/>` +
    `<path class="line" d="M${plain(left - tail, 3)} ${at}H${plain(left, 3)}M${plain(right, 3)} ${at}H${plain(right + tail, 3)}"/>` +
    arrowHead({ x: left, y }, { x: -1, y: 0 }) +
    arrowHead({ x: right, y }, { x: 1, y: 0 })
  );
}
