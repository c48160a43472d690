/**
 * Points of a wheel's exact outline by formulas of the tests' own, with nothing of `src/`: half a tooth from the middle of a space
 * to the tooth's centre line. Frame: the tooth's centre line on +X, the space below it, so angles are negative. mm, radians.
 *
 * Epicycloid of a circle r on R, in the textbook's parameter: x = (R+r) cos t - r cos((R+r)/r t), y likewise with sines; the cusp
 * at t = 0 is the pitch point. Half the mate's pitch circle rolls, so that the mate's flanks are radial.
 */
import type { RandomJob } from './random-job.ts';

export type Wheel = Pick<
  RandomJob,
  'teeth' | 'leaves' | 'module' | 'form' | 'height' | 'tooth' | 'dedendum' | 'root'
>;

export interface OutlinePoint {
  readonly x: number;
  readonly y: number;
  /** Outward normal, out of the metal. */
  readonly nx: number;
  readonly ny: number;
  readonly role: 'root' | 'flank' | 'addendum' | 'land';
}

/** Polar angle and radius of the epicycloid, from the cusp on +X. */
function roll(R: number, r: number, t: number): { readonly x: number; readonly y: number } {
  const k = (R + r) / r;
  return { x: (R + r) * Math.cos(t) - r * Math.cos(k * t), y: (R + r) * Math.sin(t) - r * Math.sin(k * t) };
}

function bisect(low: number, high: number, below: (t: number) => boolean): number {
  let [a, b] = [low, high];
  for (let i = 0; i < 100; i++) {
    const middle = (a + b) / 2;
    [a, b] = below(middle) ? [middle, b] : [a, middle];
  }
  return (a + b) / 2;
}

interface Addendum {
  readonly R: number;
  readonly r: number;
  /** Half the tooth's angle. */
  readonly beta: number;
  readonly tip: number;
  readonly end: number;
}

function addendum({ teeth, leaves, module, height, tooth }: Wheel): Addendum {
  const R = (module * teeth) / 2;
  const r = (module * leaves) / 4;
  const beta = (tooth * Math.PI) / teeth;
  const angle = (t: number): number => Math.atan2(roll(R, r, t).y, roll(R, r, t).x);
  const radius = (t: number): number => Math.hypot(roll(R, r, t).x, roll(R, r, t).y);
  const pointed = bisect(0, (Math.PI * r) / R, (t) => angle(t) < beta);
  const tip = R + height * (radius(pointed) - R);
  return { R, r, beta, tip, end: bisect(0, pointed, (t) => radius(t) < tip) };
}

export function tipRadius(wheel: Wheel): number {
  return addendum(wheel).tip;
}

/** From the middle of the space to the tooth's centre line, about `step` apart. The root without its fillet. */
export function halfTooth(wheel: Wheel, step: number): readonly OutlinePoint[] {
  const { R, r, beta, tip, end } = addendum(wheel);
  const rootRadius = R - wheel.dedendum * wheel.module;
  const points: OutlinePoint[] = [];
  const along = (length: number, at: (share: number) => OutlinePoint): void => {
    const count = Math.max(2, Math.ceil(length / step));
    for (let i = 0; i <= count; i++) {
      points.push(at(i / count));
    }
  };
  const pitch = Math.PI / wheel.teeth;
  const circle = (radius: number, angle: number, role: OutlinePoint['role']): OutlinePoint => {
    const [nx, ny] = [Math.cos(angle), Math.sin(angle)];
    return { x: radius * nx, y: radius * ny, nx, ny, role };
  };
  along(rootRadius * (pitch - beta), (share) => circle(rootRadius, -pitch + share * (pitch - beta), 'root'));
  const [cos, sin] = [Math.cos(-beta), Math.sin(-beta)];
  along(R - rootRadius, (share) => {
    const radius = rootRadius + share * (R - rootRadius);
    return { x: radius * cos, y: radius * sin, nx: sin, ny: -cos, role: 'flank' };
  });
  if (wheel.form === 'arc') {
    arc(along, R, tip, cos, sin);
    return points;
  }
  const turned = (t: number): { x: number; y: number } => {
    const { x, y } = roll(R, r, t);
    return { x: x * cos - y * sin, y: x * sin + y * cos };
  };
  along(2 * (tip - R), (share) => {
    const t = end * share;
    // Tangent of the epicycloid: along (t + k t) / 2 from the x axis, turned by -beta; the normal a quarter turn to its right.
    const heading = (t * (2 * r + R)) / (2 * r) - beta;
    return { ...turned(t), nx: Math.sin(heading), ny: -Math.cos(heading), role: 'addendum' };
  });
  const last = turned(end);
  const from = Math.atan2(last.y, last.x);
  along(-from * tip, (share) => circle(tip, from * (1 - share), 'land'));
  return points;
}

/** One arc through the pitch point and the tip on the centre line, its radius 1.40 times the height between them. */
function arc(
  along: (length: number, at: (share: number) => OutlinePoint) => void,
  R: number,
  tip: number,
  cos: number,
  sin: number,
): void {
  const [px, py] = [R * cos, R * sin];
  const radius = 1.4 * (tip - R);
  const [mx, my] = [(px + tip) / 2, py / 2];
  const chord = Math.hypot(tip - px, py);
  const [ux, uy] = [(tip - px) / chord, -py / chord];
  const rise = Math.sqrt(Math.max(0, radius * radius - (chord * chord) / 4));
  // The centre lies to the left of the way outward, inside the tooth: the flank bulges out of it.
  const [cx, cy] = [mx - uy * rise, my + ux * rise];
  const from = Math.atan2(py - cy, px - cx);
  const turn = 2 * Math.asin(chord / (2 * radius));
  along(radius * turn, (share) => {
    const angle = from + share * turn;
    const [nx, ny] = [Math.cos(angle), Math.sin(angle)];
    return { x: cx + radius * nx, y: cy + radius * ny, nx, ny, role: 'addendum' };
  });
}
