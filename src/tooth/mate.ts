/**
 * What is taken for the mate's proportions where the job says nothing, in modules, each with the sentence that the sheet
 * prints beside it. All three are remembered from BS 978-2, which was not at hand; the sentences say so.
 */

export interface MateDefault<T> {
  readonly value: T;
  readonly why: string;
}

/** Up to this many leaves a pinion has thin ones. */
const MOST_THIN_LEAVES = 10;
const THIN = 1.05;
const THICK = 1.25;

/** Leaf thickness along the pinion's pitch circle. */
export function defaultLeaf(leaves: number): MateDefault<number> {
  const thin = leaves <= MOST_THIN_LEAVES;
  const counts = thin ? `up to ${MOST_THIN_LEAVES}` : `above ${MOST_THIN_LEAVES}`;
  return {
    value: thin ? THIN : THICK,
    why: `usual for ${counts} leaves by BS 978-2, from memory: the standard was not at hand; measure the old pinion`,
  };
}

export function defaultTip(): MateDefault<'third-ogive'> {
  return {
    value: 'third-ogive',
    why: 'usual tip of a leaf by BS 978-2, from memory: the standard was not at hand; look at the old pinion',
  };
}

const CLEARANCE = 0.4;

/** Depth of the pinion's spaces, from the wheel's addendum in modules. */
export function defaultDedendum(wheelAddendum: number): MateDefault<number> {
  return {
    value: wheelAddendum + CLEARANCE,
    why: `the wheel's addendum and ${CLEARANCE} module of clearance by BS 978-2, from memory: the standard was not at hand`,
  };
}

/** The trundle of a lantern, its diameter. */
export function defaultTrundle(): MateDefault<number> {
  return {
    value: THIN,
    why: 'about a thin leaf, by common practice from memory: no printed proportion was at hand; measure the old pinion',
  };
}
