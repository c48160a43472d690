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
  'prove.gouge': {
    guards: 'metal of the wheel cut away',
    blind: 'bending, runout beyond the stated cutting diameter, play of the slides',
  },
  'prove.left': { guards: 'metal left on the flanks', blind: 'bending and wear of the cutter' },
} as const satisfies Record<string, CheckText>;

export type CheckCode = keyof typeof CHECK_CODES;
