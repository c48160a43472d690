/**
 * The span over k teeth on the plan, between the jaws of a caliper: blades that rest on the outer flanks where the reading is
 * taken, and the figure between them. The block of teeth that stands most upright is chosen. mm of paper, Y down.
 */
import { bestSpan, spanOver, type SpanReading } from '../tooth/span.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import { levelDimension } from './dimension.ts';
import type { SizesPlate } from './draw-sizes.ts';
import { bareLength } from './lengths.ts';
import type { PlateFrame } from './plate.ts';
import { plain } from './words.ts';

/** What the jaws and their figure take above the wheel. */
export const JAWS_HEIGHT = 14;
const LINE = 6.5;
const BLADE = 9.5;

/** The spans worth measuring: the best count, and the next. */
export function spansOf(form: WheelForm): readonly SpanReading[] {
  const best = bestSpan(form);
  const next = best && spanOver(form, best.teeth + 1);
  return [best, next].filter((span) => span !== undefined);
}

export function drawJaws({ form, unit }: SizesPlate, frame: PlateFrame): string {
  const { teeth } = form.proportions;
  const [first, second] = spansOf(form);
  if (first === undefined) {
    return '';
  }
  const leaner =
    second !== undefined && Math.abs(lean(second.teeth, teeth)) < Math.abs(lean(first.teeth, teeth));
  const span = leaner ? second : first;
  const half = (span.reading / 2) * frame.scale;
  const touch =
    Math.sqrt(Math.max((form.pitchRadius + span.height) ** 2 - (span.reading / 2) ** 2, 0)) * frame.scale;
  const top = form.outsideRadius * frame.scale;
  const width = Math.min(1.1, ((0.3 * 2 * Math.PI * form.pitchRadius) / teeth) * frame.scale);
  const blade = (side: number): string => {
    const inner = plain(side * half, 3);
    const outer = plain(side * (half + width), 3);
    return `<path class="jaw" d="M${inner} ${plain(-touch + 0.5, 3)}V${plain(-top - BLADE, 3)}H${outer}V${plain(-touch, 3)}Z"/>`;
  };
  const y = -top - LINE;
  const measured = {
    figure: `span-${span.teeth}-drawn`,
    value: span.reading,
    text: `over ${span.teeth} teeth ${bareLength(span.reading, unit)}`,
    from: { x: -half, y },
    to: { x: half, y },
  };
  // Over the blades where they stand close: beside them it would run into the figure of the thickness.
  const dimension = levelDimension(measured, -top - BLADE - 1);
  const angle = (lean(span.teeth, teeth) * 180) / Math.PI;
  return `<g transform="rotate(${plain(-angle, 4)})">${blade(-1)}${blade(1)}${dimension}</g>`;
}

/** How far the middle of the most upright block of k teeth is from twelve o'clock, counter-clockwise. */
function lean(k: number, teeth: number): number {
  const pitch = (2 * Math.PI) / teeth;
  const start = k % 2 === 1 ? 0 : pitch / 2;
  const off = Math.PI / 2 - start;
  return Math.round(off / pitch) * pitch - off;
}
