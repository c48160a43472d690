/**
 * Height and arc radius of a leaf's tip, in modules.
 *
 * One arc a side through the pitch point, its centre ON the pinion's pitch circle, radius t/2 (semicircle), 2t/3
 * (third-ogive) or t (full-ogive) for a leaf t thick; the two meet on the leaf's axis. The rule reproduces remembered
 * proportions of BS 978-2 to about 0.02 module; the standard itself was not at hand.
 */
import type { Mate } from './wheel.ts';

export interface LeafTip {
  /** Above the pinion's pitch circle. */
  readonly height: number;
  readonly radius: number;
}

const SHARE = { semicircle: 1 / 2, 'third-ogive': 2 / 3, 'full-ogive': 1 } as const;

export function leafTip({ leaves, leaf, tip }: Mate & { kind: 'pinion' }): LeafTip {
  if (typeof tip !== 'string') {
    return tip;
  }
  const radius = SHARE[tip] * leaf;
  const pitchRadius = leaves / 2;
  const centreAngle = leaf / leaves - 2 * Math.asin(radius / (2 * pitchRadius));
  const across = pitchRadius * Math.sin(centreAngle);
  const height =
    pitchRadius * Math.cos(centreAngle) + Math.sqrt(radius * radius - across * across) - pitchRadius;
  return { height, radius };
}
