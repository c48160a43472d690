/**
 * The closed list of codes, `<stage>.<what>`, each with one sentence on what it guards against.
 * `ogive prove --explain` prints the ones of the prover.
 */
export const PROBLEM_CODES = {
  // file: reading and writing
  'file.unreadable': 'A file that was named cannot be read.',
  'file.unwritable': 'A file or folder cannot be written.',
  'file.hand-edited':
    'A program on disk was changed by hand since it was written; it is not overwritten without --force.',
  'usage.wrong': 'The command was not understood.',

  // job: the job file
  'job.syntax':
    'The job file is not valid YAML 1.2, or uses something that is refused (aliases, binary, too large).',
  'job.unknown-key': 'The job file has a key that means nothing.',
  'job.invalid': 'A value of the job file breaks its own rule.',
  'job.conflict': 'Two values of the job file contradict each other.',
  'job.does-not-fit':
    'The job is understood, but it does not fit the blank, the cutters, the machine or what stands in the way.',

  // machine: the machine file
  'machine.syntax': 'The machine file is not valid YAML 1.2.',
  'machine.unknown-key': 'The machine file has a key that means nothing.',
  'machine.missing': 'The machine file lacks a field that has no safe default.',
  'machine.invalid': 'A value of the machine file breaks its own rule.',
  'machine.dangerous': 'Two values of the machine file together would make a dangerous program.',

  // tooth: the form
  'tooth.no-tip': 'The tooth is thinner at its top than nothing: no tip is left.',
  'tooth.no-form': 'No tooth form follows from these proportions.',
  'tooth.crossings': 'The crossings do not fit between hub and rim.',

  // reach: can the cutter get there
  'reach.flank': 'The cutter does not reach the working flank.',
  'reach.space': 'The cutter does not enter the tooth spaces.',
  'reach.corner': 'The cutter is larger than a corner it has to make.',
  'reach.too-large': 'The part is larger than offsets can be held exact.',
  'reach.disagrees': 'The clipped polygon and the exact offset of its pieces disagree.',

  // toolpath: passes
  'toolpath.no-entry': 'No safe way into the metal was found.',
  'toolpath.load': 'No depth keeps the cutter from breaking.',
  'toolpath.rubs': 'The chip would be thinner than the edge can cut.',
  'toolpath.long': 'A program takes longer than anybody stays with it.',

  // post: writing words
  'post.cannot-say': 'This machine file has no words for what the program needs.',
  'post.arc': 'An arc cannot be written within the mismatch the controller allows.',
} as const;

export type ProblemCode = keyof typeof PROBLEM_CODES;
