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
    blind:
      'what both readers take wrongly; % lines and lines with parameters, loops or calls, which the second one cannot hold',
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
    guards:
      'what the controller cannot load: long lines, letters it does not hold, missing % or number lines',
    blind: 'how the file reaches the controller',
  },
  'prove.end': {
    guards: 'a program without an end, as a broken copy has none, or with words behind its end',
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
  'prove.missing': {
    guards: 'a set of programs from which one is missing, and parts of the wheel that none of them cuts',
    blind: 'programs of another job or of another day among them',
  },
  'prove.work-offset': {
    guards: 'programs of one job that count from different zeros',
    blind: 'whether each zero was set, and set at the same place for every cutter',
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
  'prove.fast-move': {
    guards: 'fast moves into metal, or sideways below the clear height',
    blind: 'what stands above the clear height and was not said to be there',
  },
  'prove.unknown-place': {
    guards: 'cutting from or to a place that the program has not named yet',
    blind: 'where the cutter was left by hand',
  },
  'prove.plunge': {
    guards: 'a cutter driven straight down into metal that was not said to plunge',
    blind: 'whether one that was said to plunge does',
  },
  'prove.ramp': {
    guards: 'ramps into metal steeper than the material allows',
    blind: 'chips that pack in the slot',
  },
  'prove.obstacle': {
    guards: 'cutter, shank or collet nut against keep-outs and screw heads',
    blind: 'clamps that were not said to be there; the spindle above the nut',
  },
  'prove.plate': {
    guards: 'cuts into the plate under the blank, deeper than was allowed',
    blind: 'a plate that is not flat or not where it was said to be',
  },
  'prove.skin': {
    guards: 'cuts through the skin that holds the wheel',
    blind: 'a blank thinner than was said',
  },
  'prove.shank': {
    guards: 'a shank wider than its cutter rubbing on walls above the reach',
    blind: 'the taper between neck and shank',
  },
  'prove.nut': {
    guards: 'the collet nut coming down on the blank',
    blind: 'a cutter that was put in shorter than was said',
  },
  'prove.spindle': {
    guards: 'cutting with the spindle still or turning backwards',
    blind: 'a spindle that is switched by hand',
  },
  'prove.stopped-low': {
    guards: 'a spindle stopped, a cutter changed or hands asked for while the cutter stands low',
    blind: 'a stop by hand, by a switch or by a broken cable',
  },
  'prove.spindle-limits': {
    guards: 'spindle speeds that this machine does not run',
    blind: 'speed lost under load',
  },
  'prove.spin-up': {
    guards: 'cutting before the spindle is up to speed',
    blind: 'a spindle slower to come up than its machine file says',
  },
  'prove.feed-limits': {
    guards: 'feeds that this machine does not run',
    blind: 'the override, and feeds that short blocks never reach',
  },
  'prove.cutter': {
    guards: 'cutting with a cutter that the set-up does not have, or that nobody named',
    blind: 'which cutter is really in the spindle',
  },
  'prove.travel': {
    guards: 'moves beyond the ends of the travel',
    blind: 'where the blank really stands, if zero-at is not given',
  },
  'prove.left-on': {
    guards: 'a program that ends with the spindle on, the cutter down or unusual modes',
    blind: 'what is switched by hand',
  },
  'prove.holding': {
    guards: 'a wheel that nothing holds once it is cut free',
    blind: 'how strongly glue, tape, arbor or skin hold',
  },
  'prove.order': {
    guards: 'bore, teeth and crossings cut in an order that loses the centre or weakens the rim',
    blind: 'what is done between two programs',
  },
  'prove.loose': {
    guards: 'slugs, cores and pillars cut free under a turning cutter',
    blind: 'pieces smaller than three squares of its grid, and glue that holds or fails',
  },
  'prove.load': {
    guards: 'a slot deeper than the cutter is wide, as when finishing runs before roughing',
    blind: 'wear, and the finer rules of load that the passes were planned by',
  },
  'prove.chip': {
    guards: 'feeds and spindle speeds far from what a cutter bears in this material, or so slow that it rubs',
    blind: 'what suits it best, runout, and a material that is not the one that was said',
  },
} as const satisfies Record<string, CheckText>;

export type CheckCode = keyof typeof CHECK_CODES;
