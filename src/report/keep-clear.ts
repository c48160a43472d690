/**
 * The box in which nothing may stand that the job does not name: as far as the real moves below the clear height go, the bay
 * and every way in and out included, and beyond them half the thickest of what turns down there. mm, the program's frame.
 */
import type { SheetFacts } from './facts.ts';
import { extentsOf } from '../prove/extents.ts';

export interface KeepClear {
  readonly x: readonly [number, number];
  readonly y: readonly [number, number];
  /** Half the thickest cutter or shank. */
  readonly beside: number;
  /** The collet nut never comes lower than this, and goes so much further than the box. */
  readonly nutZ: number;
  readonly nutFurther: number;
}

export function keepClear({ proof, programs, job, machine }: SheetFacts): KeepClear | undefined {
  if (proof === undefined) {
    return undefined;
  }
  const used = new Set(programs.flatMap(({ cutters }) => cutters));
  const cutters = job.setup.cutters.filter(({ number }) => used.has(number));
  const { x, y, z } = extentsOf(proof.moves, job.setup.clearZ);
  if (cutters.length === 0 || x[0] === x[1]) {
    return undefined;
  }
  const beside = Math.max(...cutters.map(({ diameter, shank }) => Math.max(diameter, shank))) / 2;
  return {
    x: [x[0] - beside, x[1] + beside],
    y: [y[0] - beside, y[1] + beside],
    beside,
    nutZ: z[0] + Math.min(...cutters.map(({ stickOut }) => stickOut)),
    nutFurther: Math.max(machine.limits.nut.diameter / 2 - beside, 0),
  };
}
