/** The prover's part of the closed list: each check's code, what it guards against, and what it cannot see. */
export interface CheckText {
  readonly guards: string;
  readonly blind: string;
}

export const CHECK_CODES = {
  'prove.unread': {
    guards: 'a line that cannot be read, or that two readers read differently',
    blind: 'what the controller does beyond its manual',
  },
  'prove.readers-disagree': {
    guards: 'a line in which two readers of different making find different words',
    blind: 'what both readers take wrongly; % lines, which the second one cannot hold',
  },
  'prove.arc': {
    guards: 'an arc that this controller would refuse or run otherwise than written',
    blind: 'how finely the controller itself divides an arc',
  },
  'prove.length-offset': {
    guards: "cutting without a length offset, or with another cutter's",
    blind: 'the lengths in the controller’s own table',
  },
  'prove.file': {
    guards: 'what the controller cannot load: long lines, letters it does not hold, missing % or number lines',
    blind: 'how the file reaches the controller',
  },
  'prove.end': {
    guards: 'a program without an end, as a broken copy has none',
    blind: 'a copy that broke off and still ends well',
  },
  'prove.ambiguous': {
    guards: 'words that controllers read differently',
    blind: 'which way this controller goes, where its machine file does not say',
  },
  'prove.assumed': {
    guards: 'a mode that is left to what the controller remembers from the last program',
    blind: 'what it remembers',
  },
  'prove.gouge': {
    guards: 'metal of the wheel cut away',
    blind: 'bending, runout beyond the stated cutting diameter, play of the slides',
  },
  'prove.left': { guards: 'metal left on the flanks', blind: 'bending and wear of the cutter' },
  'prove.root': {
    guards: 'more metal in the root corners than this cutter should leave',
    blind: 'a cutter whose corners are worn round or chipped',
  },
  'prove.rolling-law': {
    guards: 'an addendum whose normals miss the point where the pitch circles touch',
    blind: 'the mate, and the distance the two are set at',
  },
  'prove.bore': {
    guards: 'a bore that is not round, or not of the size asked for',
    blind: 'a hole that was there before, and the fit of the arbor',
  },
  'prove.crossing': {
    guards: 'crossings cut too far or not far enough',
    blind: 'arms that bend while they are cut',
  },
} as const satisfies Record<string, CheckText>;

export type CheckCode = keyof typeof CHECK_CODES;
