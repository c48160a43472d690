/** Length, headings and bending radius of a move in space, for the tests and figures: written apart from the time model. mm; unit vectors in XYZ. */
import type { Position } from '../../src/motion/motion.ts';

export interface Vector {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export interface MoveShape {
  readonly length: number;
  readonly headingIn: Vector;
  readonly headingOut: Vector;
  /** Radius of the centre's path in plan; Infinity where straight. */
  readonly radius: number;
}

export interface ShapedMove {
  readonly kind: 'rapid' | 'line' | 'arc';
  readonly from: Position;
  readonly to: Position;
  readonly centre?: { readonly x: number; readonly y: number } | undefined;
  readonly turn?: number | undefined;
}

export function shapeOf(move: ShapedMove): MoveShape {
  const rise = move.to.z - move.from.z;
  if (move.kind === 'arc' && move.centre !== undefined && move.turn !== undefined) {
    return arcShape(move.from, move.to, move.centre, move.turn, rise);
  }
  const dx = move.to.x - move.from.x;
  const dy = move.to.y - move.from.y;
  const length = Math.hypot(dx, dy, rise);
  const heading = length > 0 ? { x: dx / length, y: dy / length, z: rise / length } : { x: 0, y: 0, z: 0 };
  return { length, headingIn: heading, headingOut: heading, radius: Infinity };
}

function arcShape(
  from: Position,
  to: Position,
  centre: { readonly x: number; readonly y: number },
  turn: number,
  rise: number,
): MoveShape {
  const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const flat = radius * Math.abs(turn);
  const length = Math.hypot(flat, rise);
  const way = (turn < 0 ? -1 : 1) * (length > 0 ? flat / length : 0);
  const tangent = (at: Position): Vector => {
    const spoke = Math.hypot(at.x - centre.x, at.y - centre.y) || 1;
    return {
      x: (-way * (at.y - centre.y)) / spoke,
      y: (way * (at.x - centre.x)) / spoke,
      z: length > 0 ? rise / length : 0,
    };
  };
  return { length, headingIn: tangent(from), headingOut: tangent(to), radius };
}
