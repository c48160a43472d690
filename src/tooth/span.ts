/**
 * The sizes to measure on the first part: over k teeth, over the tips, and one tooth's chord. All from the actual outline.
 *
 * Span: jaws parallel to the middle line of the block of k teeth touch the outer teeth where the outline's heading is that of the
 * jaws. On a cycloid whose cusp lies at `alpha` from the middle line that is at theta = alpha R/(R + 2r), and since the
 * normal there is square to the jaws the reading is 2 [R sin theta + 2 r sin theta].
 * A flank left `e` too thick everywhere reads 2 e more: both jaws rest on flanks square to them.
 */
import type { ArcPiece, CycloidPiece } from '../geometry/piece.ts';
import { turnPoint } from '../geometry/point.ts';
import type { WheelForm, WheelPiece } from './wheel.ts';

export interface SpanReading {
  /** Teeth between the jaws. */
  readonly teeth: number;
  /** mm. */
  readonly reading: number;
  /** Where the jaws touch, above the pitch circle. */
  readonly height: number;
}

/** How much the reading grows for each mm of metal left on every flank. */
export const SPAN_SENSITIVITY = 2;

/** `undefined` where the jaws would not rest on the two outer addenda. */
export function spanOver(form: WheelForm, teeth: number): SpanReading | undefined {
  const { teeth: count } = form.proportions;
  const falling = lastAddendum(form.sector);
  if (!falling || teeth < 2 || 2 * teeth > count + 1) {
    return undefined;
  }
  const block = ((teeth - 1) * Math.PI) / count;
  const touch = falling.kind === 'arc' ? touchOnArc(falling, block) : touchOnCycloid(falling, block);
  return touch && { teeth, reading: 2 * touch.half, height: touch.radius - form.pitchRadius };
}

/** The count whose jaws rest nearest to half-way up the addendum: clear of the pitch point and of the tip's burr. */
export function bestSpan(form: WheelForm): SpanReading | undefined {
  let best: SpanReading | undefined;
  const off = (span: SpanReading) => Math.abs(span.height - form.addendum / 2);
  for (let teeth = 2; 2 * teeth <= form.proportions.teeth + 1; teeth++) {
    const span = spanOver(form, teeth);
    if (span && (!best || off(span) < off(best))) {
      best = span;
    } else if (best) {
      break;
    }
  }
  return best;
}

/** The addendum on the counter-clockwise side of tooth 1, travelled from the tip down. */
function lastAddendum(sector: readonly WheelPiece[]): ArcPiece | CycloidPiece | undefined {
  const piece = sector.findLast(({ role }) => role === 'addendum')?.piece;
  return piece?.kind === 'line' ? undefined : piece;
}

interface JawTouch {
  /** Distance of the jaw from the middle line. */
  readonly half: number;
  readonly radius: number;
}

function touchOnCycloid({ fixed, rolling, cusp, from }: CycloidPiece, block: number): JawTouch | undefined {
  const theta = ((cusp + block) * fixed) / (fixed + 2 * rolling);
  const tip = (fixed * from) / (2 * rolling);
  if (theta > tip) {
    return undefined;
  }
  const s = Math.sin(theta);
  return {
    half: (fixed + 2 * rolling) * s,
    radius: Math.sqrt(fixed * fixed + 4 * rolling * (fixed + rolling) * s * s),
  };
}

function touchOnArc(arc: ArcPiece, block: number): JawTouch | undefined {
  const u = (Math.PI / 2 - (arc.start + block)) / arc.turn;
  if (u < 0 || u > 1) {
    return undefined;
  }
  const centre = turnPoint(arc.centre, block);
  const half = centre.y + arc.radius;
  return { half, radius: Math.hypot(centre.x, half) };
}

export interface TipReading {
  readonly diameter: number;
  /** What flat jaws read when they sit: less than the diameter where the count is odd. */
  readonly reading: number;
  /** The most they read while they are turned about the wheel. */
  readonly most: number;
}

/** With an odd count one jaw sits across two tips and the other on one; the corners of the lands carry it. `turned`: a disc's diameter, whose tips are not cut. */
export function overTips(form: WheelForm, turned?: number): TipReading {
  const { teeth } = form.proportions;
  const diameter = turned ?? 2 * form.outsideRadius;
  if (teeth % 2 === 0) {
    return { diameter, reading: diameter, most: diameter };
  }
  const land = landAngle(form.sector);
  return {
    diameter,
    reading: (diameter / 2) * (1 + Math.cos(Math.PI / teeth - land)),
    most: diameter * Math.cos(Math.max(0, Math.PI / (2 * teeth) - land)),
  };
}

function landAngle(sector: readonly WheelPiece[]): number {
  const land = sector.find(({ role }) => role === 'land')?.piece;
  return land?.kind === 'arc' ? land.turn / 2 : 0;
}

export interface ToothChord {
  readonly thickness: number;
  /** Of the tip above the chord: what the tooth caliper is set to. */
  readonly height: number;
}

/** Thickness of one tooth at the pitch circle, as a straight line. */
export function toothChord({ pitchRadius, outsideRadius, toothThickness }: WheelForm): ToothChord {
  const half = toothThickness / 2 / pitchRadius;
  return {
    thickness: 2 * pitchRadius * Math.sin(half),
    height: outsideRadius - pitchRadius * Math.cos(half),
  };
}
