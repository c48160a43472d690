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
  const limits: { by: SlotDepth['limitedBy']; depth: number; why: string }[] = [
    {
      by: 'diameter',
      depth: share * cutter.diameter,
      why: `${share} of the cutter's diameter, so that chips find their way out`,
    },
    {
      by: 'margin',
      depth: deepest(cutter.diameter, (depth) => rules.margin / slotLoad(cut, depth).margin),
      why: `a breakage margin of ${rules.margin} with a sharp cutter (forces are known to about 40 %)`,
    },
    {
      by: 'bending',
      depth: deepest(
        cutter.diameter,
        (depth) => slotLoad(cut, depth).bending / (BENDING_SHARE * rules.allowance),
      ),
      why: `bending of at most ${BENDING_SHARE} of the ${rules.allowance} mm allowance`,
    },
  ];
  if (rules.asked !== undefined) {
    limits.unshift({ by: 'asked', depth: rules.asked, why: 'the job asks for it' });
  }
  const least = limits.reduce((a, b) => (b.depth < a.depth ? b : a));
  return { depth: least.depth, limitedBy: least.by, load: slotLoad(cut, least.depth), why: least.why };
}

/**
 * The greatest depth up to one diameter at which `measure` stays at or below 1. It grows with the depth, nearly in
 * proportion, so a few steps of false position (Illinois rule) find it; the answer is always a depth that was measured good.
 */
function deepest(diameter: number, measure: (depth: number) => number): number {
  let good = 0;
  let low = -1;
  let bad = diameter;
  let high = measure(diameter) - 1;
  if (high <= 0) {
    return diameter;
  }
  for (let i = 0; i < MOST_STEPS && bad - good > DEPTH_STEP * diameter; i++) {
    const crossing = good + ((bad - good) * -low) / (high - low);
    const depth = Math.min(Math.max(crossing, good + (bad - good) / 64), bad - (bad - good) / 64);
    const over = measure(depth) - 1;
    if (over <= 0) {
      good = depth;
      low = over === 0 ? -Number.EPSILON : over;
      high /= 2;
    } else {
      bad = depth;
      high = over;
      low /= 2;
    }
  }
  return good;
}
