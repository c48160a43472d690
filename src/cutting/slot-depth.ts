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
const HALVINGS = 30;

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
      depth: deepest(cutter.diameter, (depth) => slotLoad(cut, depth).margin >= rules.margin),
      why: `a breakage margin of ${rules.margin} with a sharp cutter (forces are known to about 40 %)`,
    },
    {
      by: 'bending',
      depth: deepest(
        cutter.diameter,
        (depth) => slotLoad(cut, depth).bending <= BENDING_SHARE * rules.allowance,
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

/** The greatest depth up to one diameter for which `holds`; it holds for shallower ones too. */
function deepest(diameter: number, holds: (depth: number) => boolean): number {
  if (holds(diameter)) {
    return diameter;
  }
  let good = 0;
  let bad = diameter;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (good + bad) / 2;
    if (holds(middle)) {
      good = middle;
    } else {
      bad = middle;
    }
  }
  return good;
}
