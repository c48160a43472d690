/** Words that the language or many controllers have and this reader does not follow: said as what they are, not as unknown. */

/** What a G code stands for, by ten times the code (NISTIR 6556 Table 5). */
const NOT_FOLLOWED: Readonly<Record<number, string>> = {
  382: 'probing is not followed',
  410: "radius compensation is not followed: write the path of the cutter's middle, under G40",
  420: "radius compensation is not followed: write the path of the cutter's middle, under G40",
  870: 'back boring hangs on how the stopped spindle stands, and is not followed',
};

/** Why a G code that this machine file does not hold, or no reader could, is refused. */
export function whyNoCode(code: number, value: number): string {
  const why = NOT_FOLLOWED[code];
  return why === undefined
    ? `G${String(value)} is no word of this machine file that can be read`
    : `G${String(value)}: ${why}`;
}
