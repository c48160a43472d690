/**
 * How much of the cutter is in the metal, and how thick the chip is. mm, radians.
 *
 * Straight wall: cos(phi) = 1 - 2 ae/D, chip thickness h = fz sin(angle) (H. El-Hofy, Fundamentals of Machining
 * Processes). On a curved wall ae acts as ae_eff, from the area swept a unit of path: inside a wall of radius R,
 * ae (2R - ae) / (2 (R - r)); round a boss of radius R, ae (2R + ae) / (2 (R + r)).
 */

/** Engagement angle for a radial depth; pi in a full slot. */
export function engagementAngle(radialDepth: number, diameter: number): number {
  return Math.acos(1 - 2 * Math.min(Math.max(radialDepth / diameter, 0), 1));
}

/** Thickest chip over the feed a tooth. */
export function thickestChip(radialDepth: number, diameter: number): number {
  const angle = engagementAngle(radialDepth, diameter);
  return angle >= Math.PI / 2 ? 1 : Math.sin(angle);
}

/** Mean chip thickness over the feed a tooth: (1 - cos phi) / phi. */
export function meanChip(radialDepth: number, diameter: number): number {
  const angle = engagementAngle(radialDepth, diameter);
  return angle === 0 ? 0 : (1 - Math.cos(angle)) / angle;
}

/** The straight wall's radial depth that loads the cutter as `radialDepth` does inside a wall of `wallRadius` (after the cut). */
export function radialDepthInside(radialDepth: number, wallRadius: number, cutterRadius: number): number {
  const path = wallRadius - cutterRadius;
  const full = 2 * cutterRadius;
  return path <= 0 ? full : Math.min((radialDepth * (2 * wallRadius - radialDepth)) / (2 * path), full);
}

/** The same round a boss of `wallRadius` (after the cut). */
export function radialDepthOutside(radialDepth: number, wallRadius: number, cutterRadius: number): number {
  return Math.min(
    (radialDepth * (2 * wallRadius + radialDepth)) / (2 * (wallRadius + cutterRadius)),
    2 * cutterRadius,
  );
}
