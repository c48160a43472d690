/** From what was found to one whole pitch: a mirrored half unfolded, indexes of neighbours brought back to their own. */
import { mirrorPiece, reversePiece } from './change-piece.ts';
import { endOf, startOf } from './on-piece.ts';
import type { Piece } from './piece.ts';
import type { OffsetPiece } from './raw-offset.ts';

/** The half up to the X axis and its mirror image; a piece across the axis is one piece. `count`: pieces of the outline. */
export function unfolded(half: readonly OffsetPiece[], count: number): OffsetPiece[] {
  const images = half.toReversed().map((offset) => image(offset, count));
  const last = half.at(-1);
  const first = images[0];
  const whole = last && first && acrossAxis(last, first);
  return whole === undefined ? [...half, ...images] : [...half.slice(0, -1), whole, ...images.slice(1)];
}

function image({ piece, source, between, part }: OffsetPiece, count: number): OffsetPiece {
  const mirrored = reversePiece(mirrorPiece(piece));
  const back = [1 - part[1], 1 - part[0]] as const;
  const index = (at: number): number => count - 1 - at;
  return between === undefined || source !== 'corner'
    ? { piece: mirrored, source: source === 'corner' ? source : index(source), part: back }
    : { piece: mirrored, source, between: [index(between[1]), index(between[0])], part: back };
}

/** One piece where both are halves of the same. */
function acrossAxis(last: OffsetPiece, first: OffsetPiece): OffsetPiece | undefined {
  const sameCorner =
    last.between !== undefined &&
    last.between[0] === first.between?.[0] &&
    last.between[1] === first.between[1];
  const same = last.source === 'corner' ? sameCorner : last.source === first.source;
  const piece = same ? doubled(last.piece, first.piece) : undefined;
  return piece && { ...last, piece, part: [last.part[0], first.part[1]] };
}

function doubled(half: Piece, mirrored: Piece): Piece | undefined {
  switch (half.kind) {
    case 'line':
      return { ...half, to: endOf(mirrored) };
    case 'arc': {
      const start = startOf(half);
      const seen = Math.atan2(start.y - half.centre.y, start.x - half.centre.x);
      // Its centre lies on the axis; the sweep is twice the way to it, free of the rounding of the cut.
      return { ...half, centre: { x: half.centre.x, y: 0 }, start: seen, turn: 2 * half.turn };
    }
    case 'cycloid':
      return undefined;
  }
}

/** Indexes counted within one pitch. */
export function withinPitch(found: readonly OffsetPiece[], count: number): OffsetPiece[] {
  return found.map((offset) => {
    const { source, between } = offset;
    if (source !== 'corner') {
      return { ...offset, source: source % count };
    }
    return between === undefined
      ? offset
      : { ...offset, between: [between[0] % count, between[1] % count] as const };
  });
}
