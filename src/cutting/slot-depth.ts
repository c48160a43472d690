/**
 * How deep a lap of a full slot may be: the smallest of what was asked for, a share of the diameter (chip packing), what
 * keeps the breakage margin, and what keeps the bending of roughing inside its allowance. mm.
 */
import { slotLoad, type SlotCut, type SlotLoad } from './slot-load.ts';

export interface SlotDepth {
  readonly depth: number;
  readonly limitedBy: 'asked' | 'diameter' | 'margin' | 'bending';
  readonly load: SlotLoad;
  /** For the sheet. */
  readonly why: string;
}

export interface SlotDepthRules {
  /** The job's own step, if it says one. */
  readonly asked?: number;
  readonly margin: number;
  /** Metal left for finishing: bending in roughing may take this share of it at most. */
  readonly allowance: number;
}

/** Share of the allowance that bending may take, so that roughing never marks the finished flank. Judgement: the rest is for runout and play. */
export const BENDING_SHARE = 0.4;
const QUARTER = 0.25;
/** Depths closer than this share of the diameter are one: a thousandth of it is far below what a machine repeats. */
const DEPTH_STEP = 0.001;
const MOST_STEPS = 24;

export function slotDepth(cut: SlotCut, rules: SlotDepthRules): SlotDepth {
  const { cutter, material } = cut;
  const share = Math.min(QUARTER, material.slotShare);
  const most = share * cutter.diameter;
  const asked = rules.asked !== undefined && rules.asked < most;
  const cap = asked ? rules.asked : most;
  const over = (load: SlotLoad): number => Math.max(overMargin(load, rules), overBending(load, rules));
  const { depth, load } = deepest(cut, cap, over);
  if (depth === cap) {
    const why = asked
      ? 'the job asks for it'
      : `${share} of the cutter's diameter, so that chips find their way out`;
    return { depth, limitedBy: asked ? 'asked' : 'diameter', load, why };
  }
  return overMargin(load, rules) >= overBending(load, rules)
    ? {
        depth,
        limitedBy: 'margin',
        load,
        why: `a breakage margin of ${rules.margin} with a sharp cutter (forces are known to about 40 %)`,
      }
    : {
        depth,
        limitedBy: 'bending',
        load,
        why: `bending of at most ${BENDING_SHARE} of the ${rules.allowance} mm allowance`,
      };
}

/** Above 1 the cutter is too near to breaking. */
function overMargin(load: SlotLoad, { margin }: SlotDepthRules): number {
  return margin / load.margin;
}

/** Above 1 it bends too much. */
function overBending(load: SlotLoad, { allowance }: SlotDepthRules): number {
  return load.bending / (BENDING_SHARE * allowance);
}

/**
 * The greatest depth up to `cap` at which `measure` stays at or below 1, and the load there. It grows with the depth, nearly
 * in proportion, so a few steps of false position (Illinois rule) find it; the answer is always a depth that was measured good.
 */
function deepest(
  cut: SlotCut,
  cap: number,
  measure: (load: SlotLoad) => number,
): { readonly depth: number; readonly load: SlotLoad } {
  const whole = slotLoad(cut, cap);
  let high = measure(whole) - 1;
  if (high <= 0) {
    return { depth: cap, load: whole };
  }
  let good: { readonly depth: number; readonly load?: SlotLoad } = { depth: 0 };
  let low = -1;
  let bad = cap;
  for (let i = 0; i < MOST_STEPS && bad - good.depth > DEPTH_STEP * cut.cutter.diameter; i++) {
    const gap = bad - good.depth;
    const crossing = good.depth + (gap * -low) / (high - low);
    const depth = Math.min(Math.max(crossing, good.depth + gap / 64), bad - gap / 64);
    const load = slotLoad(cut, depth);
    const over = measure(load) - 1;
    if (over <= 0) {
      good = { depth, load };
      low = over === 0 ? -Number.EPSILON : over;
      high /= 2;
    } else {
      bad = depth;
      high = over;
      low /= 2;
    }
  }
  return { depth: good.depth, load: good.load ?? slotLoad(cut, good.depth) };
}
