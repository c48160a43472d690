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
      language: {
        parameters: 'numbered',
        setZero: ['G10', 'G92'],
        inverseTime: true,
        subprograms: 'none',
        loops: 'none',
      },
    },
  };
}

/** The same with loops and subprograms by O, comparisons and names. */
export function loopingMill(): Machine {
  return spoken({ parameters: 'numbered-and-named', subprograms: 'O-words', loops: 'O-words' });
}

/** The same with subprograms by M98, and nothing of O-words. */
export function callingMill(): Machine {
  return spoken({ subprograms: 'M98' });
}

function spoken(more: Partial<Machine['words']['language']>): Machine {
  const mill = reportMill();
  const words = { ...mill.words, file: { ...mill.words.file, programLabel: 'none' } } as const;
  return { ...mill, words: { ...words, language: { ...words.language, ...more } } };
}

/** The same with plain blocks alone. */
export function plainMill(): Machine {
  const mill = spoken({ parameters: 'none', setZero: [], inverseTime: false });
  return { ...mill, words: { ...mill.words, holes: { ...mill.words.holes, cycles: [] } } };
}
