/**
 * The edge of a small carbide cutter, and the thinnest chip it still cuts. mm.
 * hmin is 0.14 to 0.43 of the edge radius in conventional micro-cutting, 0.60 to 0.68 measured in cartridge brass
 * (Cheng et al., Int. J. Adv. Manuf. Technol. 97 (2018) 3119); edge radius of new micro carbide end mills 1 to 5 um,
 * from memory. Both figures below are judgement between these.
 */
export const EDGE_RADIUS = 0.003;
export const THINNEST_CHIP = 0.4 * EDGE_RADIUS;

/** Feed (mm/min) below which a cutter rubs instead of cutting, for a thickest chip of `share` of the feed a tooth. */
export function rubbingFeed(share: number, flutes: number, speed: number): number {
  return share <= 0 ? 0 : (THINNEST_CHIP / Math.min(share, 1)) * flutes * speed;
}
