/**
 * Feeds and speeds that no cutter bears, and those so slow that it rubs: bounds far outside good practice, not advice.
 *
 * Chip a tooth: fz = F / (S z). Edge speed: v = pi D S / 1000 in m/min. mm, 1/min.
 */
import { THINNEST_CHIP } from './edge.ts';
import { chipLoad, type Material } from './materials.ts';
import type { Cutter } from './setup.ts';

/** Thickest chip, as a share of the diameter. Judgement: catalogues give 0.13 to 0.6 %, our softest material 2 %. */
const THICKEST_SHARE = 0.05;
/** Thickest chip, in loads of the material's table. Judgement: a thin wall is given 1.5 of them already. */
const MOST_LOADS = 6;
/** Fastest edge, in cutting speeds of the material's table, which are taken low. Judgement. */
const MOST_SPEEDS = 4;
/** Slowest feed and speed, as shares of the table's (or the machine's highest). Judgement: a quarter is usual going down. */
const LEAST_LOAD = 1 / 20;
const LEAST_SPEED = 1 / 10;

/** What one cutter bears in a material. */
export interface Bounds {
  /** Chip a tooth above which it breaks, and below which it only rubs. */
  readonly thickest: number;
  readonly thinnest: number;
  /** Turns a minute above which the edge burns, and below which it hardly cuts. */
  readonly fastest: number;
  readonly slowest: number;
}

/** `highest`: of the spindle. Of a material nobody knows only the share of the diameter holds. */
export function boundsOf({ diameter }: Cutter, material: Material | undefined, highest: number): Bounds {
  const share = THICKEST_SHARE * diameter;
  if (material === undefined) {
    return { thickest: share, thinnest: 0, fastest: Infinity, slowest: 0 };
  }
  const load = chipLoad(material, diameter);
  const turns = (1000 * material.cuttingSpeed) / (Math.PI * diameter);
  return {
    thickest: Math.min(share, MOST_LOADS * load),
    thinnest: Math.min(LEAST_LOAD * load, THINNEST_CHIP / 2),
    fastest: MOST_SPEEDS * turns,
    slowest: LEAST_SPEED * Math.min(turns, highest),
  };
}

/** m/min. */
export function edgeSpeed({ diameter }: Cutter, turns: number): number {
  return (Math.PI * diameter * turns) / 1000;
}
