/**
 * Plate I: the part as a drawing office would have it: in plan with the span over teeth between jaws, arm and rim; beside it
 * cut through the axis, with thickness and diameters. Figures in the job's unit, which the caption says.
 */
import type { LengthUnit } from '../base/units.ts';
import type { AsCut } from '../tooth/as-cut.ts';
import { drawJaws, JAWS_HEIGHT } from './draw-jaws.ts';
import { drawMetal, type Metal } from './draw-metal.ts';
import { diametersOf, drawSection, SECTION_GAP, stackWidth } from './draw-section.ts';
import { drawWindowSizes } from './draw-window-sizes.ts';
import {
  axisDashes,
  LIGHT,
  onWork,
  PAPER,
  plateSvg,
  scaleBar,
  scaleToFit,
  type PlateFrame,
} from './plate.ts';
import { coordinate } from './words.ts';

export interface SizesPlate extends Metal {
  readonly thickness: number;
  readonly unit: LengthUnit;
  /** Where the outline drawn is the one a cutter leaves: its foot and its floor, which are not the exact ones. */
  readonly asCut?: Pick<AsCut, 'footRadius' | 'floorRadius' | 'reachesRoot'>;
}

/** Of the outline that is drawn. */
export function floorOf({ form, asCut }: Pick<SizesPlate, 'form' | 'asCut'>): number {
  return asCut?.floorRadius ?? form.rootRadius;
}

/** Room to the left of the wheel and to the right of the last figure, mm of paper. */
const MARGIN = 3;
const FOOT = 10;

/** `foot` is drawn under the plate; `tallest` is the most paper the wheel may take, mm. */
export function drawSizes(
  plate: SizesPlate,
  name: string,
  foot: { readonly height: number; readonly marks: (frame: PlateFrame) => string } = NOTHING,
  tallest = Infinity,
): { readonly svg: string; readonly scale: number } {
  const { form, thickness } = plate;
  const stack = stackWidth(diametersOf(plate).length);
  const room = PAPER - 2 * MARGIN - SECTION_GAP - stack;
  const scale = Math.min(
    scaleToFit(2 * form.outsideRadius + thickness, room),
    scaleToFit(2 * form.outsideRadius, tallest),
  );
  const radius = form.outsideRadius * scale;
  const frame: PlateFrame = {
    left: -radius - MARGIN,
    right: radius + SECTION_GAP + thickness * scale + stack + MARGIN,
    top: -radius - JAWS_HEIGHT,
    bottom: radius + FOOT + foot.height,
    scale,
  };
  const body = drawMetal(plate) + circles(plate, frame);
  const marks =
    drawSection(plate, frame) +
    drawJaws(plate, frame) +
    drawWindowSizes(plate, frame) +
    scaleBar(frame, frame.left + 1, radius + FOOT - 3, plate.unit) +
    foot.marks(frame);
  return { svg: plateSvg(frame, name, body, marks), scale };
}

const NOTHING = { height: 0, marks: (): string => '' };

function circles({ form }: Metal, frame: PlateFrame): string {
  const arm = coordinate(form.outsideRadius + 2.5 / frame.scale);
  return (
    `<g class="axis" stroke-width="${onWork(frame, LIGHT)}" stroke-dasharray="${axisDashes(frame)}">` +
    `<circle data-figure="pitch-circle" data-value="${coordinate(2 * form.pitchRadius)}" r="${coordinate(form.pitchRadius)}"/>` +
    `<path d="M-${arm} 0H${arm}M0 -${arm}V${arm}"/></g>`
  );
}
