/**
 * Cutting force by Kienzle, kc = kc1.1 h^(-mc), F = kc b h. mm, N, N/mm2.
 *
 * At the chips of a 0.5 mm cutter (1 to 25 um) this is extrapolated far below what the tables were measured at:
 * read every force with +-40 %. Sharp cutter; wear takes 1.3 to 2 times more.
 */
import type { Material } from './materials.ts';

export function specificForce(material: Material, chip: number): number {
  return material.kc11 * chip ** -material.mc;
}

/** Tangential force on one tooth with a chip of `chip` over a depth of `depth`. */
export function toothForce(material: Material, depth: number, chip: number): number {
  return chip <= 0 ? 0 : material.kc11 * depth * chip ** (1 - material.mc);
}

/** Radial over tangential force at ordinary chip thickness (from memory: 0.3 to 0.5). */
export const RADIAL_SHARE = 0.4;

/** Chip a tooth of the tooth that runs furthest out, and of the others, when radii differ by `runout` at worst. */
export function chipsWithRunout(
  feedPerTooth: number,
  flutes: number,
  runout: number,
): { readonly most: number; readonly least: number } {
  return {
    most: Math.min(feedPerTooth + runout, flutes * feedPerTooth),
    least: Math.max(feedPerTooth - runout, 0),
  };
}

/** Power at the cutter, W: specific force at the mean chip times removal rate. Feed mm/min, depths mm. */
export function cuttingPower(
  material: Material,
  depth: number,
  radialDepth: number,
  feed: number,
  meanChip: number,
): number {
  return (specificForce(material, meanChip) * depth * radialDepth * feed) / 60_000;
}
