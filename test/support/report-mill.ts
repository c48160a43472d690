/** The bench mill with everything of NISTIR 6556 that this reader follows, whatever its file in posts/ says of it. */
import type { Machine } from '../../src/machine/machine.ts';
import { post } from './bench-program.ts';

export function reportMill(): Machine {
  const bench = post('bench-mill');
  const { words } = bench;
  const cycles = ['G81', 'G82', 'G83', 'G84', 'G85', 'G86', 'G88', 'G89'] as const;
  return {
    ...bench,
    words: {
      ...words,
      holes: { ...words.holes, cycles },
      language: { parameters: 'numbered', setZero: ['G10', 'G92'], inverseTime: true },
    },
  };
}
