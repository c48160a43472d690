/** The one arc that leaves a point in a given heading and goes through another, and how far it lies from a curve. mm. */
import { pointOn } from './on-piece.ts';
import type { ArcPiece, Piece } from './piece.ts';
import { addScaled, angleOf, cross, dot, leftOf, norm, subtract, type Point } from './point.ts';
import { leastOn } from './roots.ts';

/** Nearly straight arcs have a far centre: past this many chord lengths rounding would spoil the arc's ends. */
const FLATTEST = 1e7;

export function arcThrough(from: Point, heading: Point, to: Point): ArcPiece {
  const chord = subtract(to, from);
  const length = norm(chord);
  // The chord lies half the arc's turn away from the heading.
  const half = Math.atan2(cross(heading, chord), dot(heading, chord));
  const least = 1 / (2 * FLATTEST);
  const bent = Math.abs(half) < least ? (half < 0 ? -least : least) : half;
  const signed = length / (2 * Math.sin(bent));
  // The centre from the chord's middle, square to it, so that both ends lie on the arc.
  const centre = addScaled(
    addScaled(from, chord, 0.5),
    leftOf(chord),
    (signed * Math.cos(bent)) / (length || 1),
  );
  return {
    kind: 'arc',
    centre,
    radius: Math.abs(signed),
    start: angleOf(subtract(from, centre)),
    turn: 2 * bent,
  };
}

/** Looks a span this often for its two greatest errors, one to each side, and then closes in on each. */
const CELLS = 16;

/** The greatest distance from the curve between u0 and u1 to the arc's circle. */
export function arcDeviation(arc: ArcPiece, curve: Piece, u0: number, u1: number): number {
  const width = (u1 - u0) * 1e-4;
  const signed = (u: number): number => norm(subtract(pointOn(curve, u), arc.centre)) - arc.radius;
  const outermost = leastOn((u) => -signed(u), u0, u1, CELLS, width).value;
  const innermost = leastOn(signed, u0, u1, CELLS, width).value;
  return Math.max(-outermost, -innermost);
}
