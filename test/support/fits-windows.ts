/**
 * Windows between arms, by formulas of the tests' own, with nothing of `src/`. An arm lies on +X, the middle of the window at
 * pi/arms; the arm's side is the line through its two widths, taken as chords of hub and rim circle. mm.
 */
import type { RandomCrossings } from './random-job.ts';

interface Side {
  /** Normal into the window, and the line's distance from the axis along it. */
  readonly nx: number;
  readonly ny: number;
  readonly away: number;
}

function sideOf({ atHub, atRim, hub }: RandomCrossings, outer: number): Side {
  const [hx, hy] = [Math.sqrt(Math.max(0, (hub / 2) ** 2 - (atHub / 2) ** 2)), atHub / 2];
  const [rx, ry] = [Math.sqrt(Math.max(0, outer ** 2 - (atRim / 2) ** 2)), atRim / 2];
  const long = Math.hypot(rx - hx, ry - hy);
  const [nx, ny] = [-(ry - hy) / long, (rx - hx) / long];
  return { nx, ny, away: nx * hx + ny * hy };
}

/** Radius of the disc that touches the rim and both arms: its centre lies outer - c out on the middle line, c from the side. */
export function roundWindow(w: RandomCrossings, outer: number): number {
  const { nx, ny, away } = sideOf(w, outer);
  const along = nx * Math.cos(Math.PI / w.arms) + ny * Math.sin(Math.PI / w.arms);
  return (outer * along - away) / (1 + along);
}

/** How much of an arm's side is straight, between corners that touch hub and rim: by Pythagoras from the line's foot. */
export function straightOf(w: RandomCrossings, outer: number): number {
  const off = sideOf(w, outer).away + w.corner;
  const foot = (reach: number): number => Math.sqrt(Math.max(0, reach * reach - off * off));
  return foot(outer - w.corner) - foot(w.hub / 2 + w.corner);
}
