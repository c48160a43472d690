/**
 * Which mode a G word sets (NISTIR 6556 §3.4, table 4, with G60 as exact stop and G70, G71 as units of ISO 6983-1), and which
 * words make a move or shift the zero instead of setting a mode.
 */
const GROUPS: Readonly<Record<string, readonly string[]>> = {
  plane: ['G17', 'G18', 'G19'],
  distance: ['G90', 'G91'],
  centre: ['G90.1', 'G91.1'],
  feed: ['G93', 'G94', 'G95'],
  unit: ['UNIT', 'G20', 'G21', 'G70', 'G71'],
  compensation: ['G40', 'G41', 'G42'],
  length: ['G43', 'G49'],
  'cycle return': ['G98', 'G99'],
  zero: ['G54', 'G55', 'G56', 'G57', 'G58', 'G59', 'G59.1', 'G59.2', 'G59.3'],
  path: ['G60', 'G61', 'G61.1', 'G64'],
};

export function modalGroup(word: string): string | undefined {
  return Object.keys(GROUPS).find((group) => GROUPS[group]?.includes(word));
}

/** Motion modes, homing, machine coordinates, stored and shifted zeros, probing, cycles; G80 cancels and is none of them. */
export function movesAtOnce(word: string): boolean {
  return /^G(0|1|2|3|00|01|02|03|4|04|10|28|30|38(\.\d)?|53|8[1-9]|92(\.\d)?)$/.test(word);
}
