/**
 * What the chips and dust of a material do to people. Materials are known by the words in their names, so that a name
 * this program has never met still gets what its words call for, and a request to find out what it is.
 *
 * Sources: 29 CFR 1910.1024 (0.2 ug/m3 over 8 hours; beryllium copper, not brass), 29 CFR 1910.1025 (lead).
 */
interface MaterialCaution {
  readonly when: RegExp;
  readonly say: string;
}

const CAUTIONS: readonly MaterialCaution[] = [
  {
    when: /beryllium|becu/,
    say: 'DANGER, BERYLLIUM COPPER: its dust and fume harm the lungs for good, and the limit in air is 0.2 micrograms a cubic metre over eight hours. Do not cut it dry, grind it or file it. Without wet cutting, extraction and people trained for it do not cut it at all',
  },
  {
    when: /brass|bronze|copper|nickel-silver/,
    say: 'Make sure of the alloy: beryllium copper looks alike and is NOT brass. Its dust harms the lungs for good. Where nobody can say what the sheet is, do not cut it',
  },
  {
    when: /(?<!un)leaded-(?!steel)|free-cutting-brass|cz120|engraving-brass/,
    say: 'This metal holds lead, commonly 2 to 4 per cent in brass: do not eat, drink or smoke here, wipe and do not blow, wash hands before anything else, keep the dust from home and children',
  },
  {
    when: /brass|bronze|copper|nickel-silver/,
    say: 'The chips are fine fast needles, and no magnet gathers them: a shield in front, brush or vacuum after, never fingers, never an air jet',
  },
  {
    when: /steel|iron/,
    say: 'Steel chips come hot and sharp, and a cutter this small breaks sooner than in brass: shield, brush, cutting oil kept clean and off the skin, nothing near that can catch fire',
  },
  {
    when: /free-cutting-steel|leaded-steel/,
    say: 'Free-cutting steel commonly holds some tenths of a per cent of lead: wash hands before eating, wipe and do not blow',
  },
  {
    when: /acetal|nylon/,
    say: 'Plastic melts when the cutter rubs and smokes when it burns, and the smoke harms: sharp cutter, chips cleared, stop at the first smell',
  },
  {
    when: /magnesium/,
    say: 'Magnesium chips burn and water makes it worse: dry sand or the right powder at hand, never water',
  },
  {
    when: /alumini?um/,
    say: 'Aluminium chips weld to small cutters: use fluid, and keep its fine dust away from sparks',
  },
];

/** Names whose hazards are covered above; any other is asked about. */
const KNOWN = /brass|bronze|copper|nickel-silver|steel|iron|magnesium|alumini?um|acetal|nylon|wood|wax|foam/;

export function materialCautions(material: string): readonly string[] {
  const name = material.toLowerCase().replace(/[ _]/g, '-');
  const beryllium = /beryllium|becu/.test(name);
  const said = CAUTIONS.filter(
    ({ when, say }) => when.test(name) && !(beryllium && say.startsWith('Make sure')),
  ).map(({ say }) => say);
  return KNOWN.test(name)
    ? said
    : [
        ...said,
        `Find out from its data sheet what dust and chips of ${material} do before cutting it, and look that it is not beryllium copper`,
      ];
}
