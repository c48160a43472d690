/**
 * A move as the machine would make it, read back from text: the shape of a line of `ogive prove --moves`.
 * mm in the program's frame, mm/min, 1/min signed (clockwise positive), radians.
 */
export interface TracedMove {
  readonly file: string;
  /** 1-based line of the file. */
  readonly line: number;
  readonly kind: 'rapid' | 'line' | 'arc';
  /** null where the place is not known yet (nothing has said it since the start, or after a move in machine coordinates). */
  readonly from: { readonly x: number | null; readonly y: number | null; readonly z: number | null };
  readonly to: { readonly x: number | null; readonly y: number | null; readonly z: number | null };
  readonly centre?: { readonly x: number; readonly y: number };
  readonly turn?: number;
  /** mm/min; null for a rapid. */
  readonly feed: number | null;
  readonly cutter: number | null;
  readonly spindle: number;
}
