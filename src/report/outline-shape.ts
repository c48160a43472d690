/** The whole part's outlines as closed loops of exact pieces: teeth, bore, windows. mm, the wheel's frame. */
import type { LengthUnit } from '../base/units.ts';
import { repeatRound, turnChain } from '../geometry/change-piece.ts';
import { ORIGIN } from '../geometry/point.ts';
import type { Loop } from '../geometry/piece.ts';
import type { AsCut } from '../tooth/as-cut.ts';
import type { Crossings, WheelForm, WheelPiece } from '../tooth/wheel.ts';

export interface OutlineShape {
  readonly title: string;
  readonly form: WheelForm;
  /** The pitch that is drawn: the exact one, or as it is cut. */
  readonly sector: readonly WheelPiece[];
  readonly crossings?: Crossings;
  /** Diameter, 0 for none. */
  readonly bore: number;
  /** Of the plate, 0 where only the outline matters. */
  readonly thickness?: number;
  /** Unit of the figures on the drawing. */
  readonly unit?: LengthUnit;
  /** Where the pitch is the one a cutter leaves. */
  readonly asCut?: AsCut;
  /** "exact outline", "as a 0.5 mm cutter leaves it". */
  readonly what: string;
}

export interface NamedLoop {
  readonly name: 'teeth' | 'bore' | 'crossing';
  readonly loop: Loop;
}

export function loopsOf(shape: OutlineShape): readonly NamedLoop[] {
  const { form, sector, crossings, bore } = shape;
  const teeth = repeatRound(
    sector.map(({ piece }) => piece),
    form.proportions.teeth,
  );
  const windows = Array.from({ length: crossings?.count ?? 0 }, (_, k) => ({
    name: 'crossing' as const,
    loop: turnChain(crossings?.window ?? [], (2 * Math.PI * k) / (crossings?.count ?? 1)),
  }));
  const hole = { name: 'bore' as const, loop: [circle(bore / 2)] };
  return [{ name: 'teeth', loop: teeth }, ...(bore > 0 ? [hole] : []), ...windows];
}

function circle(radius: number): Loop[number] {
  return { kind: 'arc', centre: ORIGIN, radius, start: 0, turn: 2 * Math.PI };
}
