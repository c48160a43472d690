/** Points of traced moves, and where along a meant line, arc or helix a point lies, and how far from it. mm, radians. */
import type { ArcStep, MoveStep, Position } from '../motion/motion.ts';
import type { TracedMove } from '../motion/traced-move.ts';

export function radiusOf(step: ArcStep, from: Position): number {
  return Math.hypot(from.x - step.centre.x, from.y - step.centre.y);
}

export function arcLength(step: ArcStep, from: Position): number {
  return Math.hypot(
    Math.hypot(from.x - step.centre.x, from.y - step.centre.y) * step.turn,
    step.to.z - from.z,
  );
}

export function pointOf(move: TracedMove, u: number): Position {
  const a = { x: move.from.x ?? 0, y: move.from.y ?? 0, z: move.from.z ?? 0 };
  const b = { x: move.to.x ?? 0, y: move.to.y ?? 0, z: move.to.z ?? 0 };
  const z = a.z + u * (b.z - a.z);
  if (move.kind !== 'arc' || move.centre === undefined) {
    return { x: a.x + u * (b.x - a.x), y: a.y + u * (b.y - a.y), z };
  }
  const r0 = Math.hypot(a.x - move.centre.x, a.y - move.centre.y);
  const r1 = Math.hypot(b.x - move.centre.x, b.y - move.centre.y);
  const angle = Math.atan2(a.y - move.centre.y, a.x - move.centre.x) + u * (move.turn ?? 0);
  const radius = r0 + u * (r1 - r0);
  return { x: move.centre.x + radius * Math.cos(angle), y: move.centre.y + radius * Math.sin(angle), z };
}

export function shareOfLine(from: Position, to: Position, p: Position): number {
  const d = { x: to.x - from.x, y: to.y - from.y, z: to.z - from.z };
  const length = d.x * d.x + d.y * d.y + d.z * d.z;
  return length === 0 ? 1 : ((p.x - from.x) * d.x + (p.y - from.y) * d.y + (p.z - from.z) * d.z) / length;
}

/** The share at which the helix is nearest to the point: from its angle, by steps along the heading there. */
export function shareOfArc(step: ArcStep, from: Position, p: Position, near: number): number {
  let share = shareByAngle(step, from, p, near);
  const radius = radiusOf(step, from);
  const start = Math.atan2(from.y - step.centre.y, from.x - step.centre.x);
  const rise = step.to.z - from.z;
  const steps = rise === 0 ? 0 : 4;
  for (let i = 0; i < steps; i++) {
    const angle = start + share * step.turn;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    const away = {
      x: p.x - step.centre.x - radius * c,
      y: p.y - step.centre.y - radius * s,
      z: p.z - from.z - share * rise,
    };
    const speed = radius * step.turn;
    share += (speed * (c * away.y - s * away.x) + rise * away.z) / (speed * speed + rise * rise);
  }
  return share;
}

/** The share of the turn whose angle is the point's, the nearest to where the path was. */
function shareByAngle(step: ArcStep, from: Position, p: Position, near: number): number {
  const start = Math.atan2(from.y - step.centre.y, from.x - step.centre.x);
  const angle = Math.atan2(p.y - step.centre.y, p.x - step.centre.x);
  const whole = (2 * Math.PI) / Math.abs(step.turn);
  const share = (angle - start) / step.turn;
  return share + whole * Math.round((near - share) / whole);
}

export function distanceTo(step: MoveStep, from: Position, p: Position, share: number): number {
  const z = from.z + share * (step.to.z - from.z);
  if (step.kind !== 'arc') {
    const x = from.x + share * (step.to.x - from.x);
    const y = from.y + share * (step.to.y - from.y);
    return Math.hypot(p.x - x, p.y - y, p.z - z);
  }
  const angle = Math.atan2(from.y - step.centre.y, from.x - step.centre.x) + share * step.turn;
  const radius = Math.hypot(from.x - step.centre.x, from.y - step.centre.y);
  return Math.hypot(
    p.x - step.centre.x - radius * Math.cos(angle),
    p.y - step.centre.y - radius * Math.sin(angle),
    p.z - z,
  );
}
