/** What `machines check` writes and reads back: every machine file that is safe comes through, one that is not as it says does not. */
import { describe, expect, it } from 'vitest';
import { tryMachine } from '../../src/flow/try-machine.ts';
import { changedMachine, MACHINE_NAMES, postMachine } from '../support/post-machines.ts';

describe('the trial of a machine file', () => {
  it.each(MACHINE_NAMES)('%s comes back as it was meant', (name) => {
    const trial = tryMachine(postMachine(name), '0');
    expect([trial.problems, trial.differences]).toEqual([[], []]);
    expect(trial.words.split('\n').length).toBeGreaterThanOrEqual(4);
  });

  it.each([
    ['the spindle is switched on by hand', { spindle: { run: 'by-hand' }, cutters: { change: 'by-hand' } }],
    ['the controller waits for the spindle by itself', { spindle: { spinUpSeconds: 0 } }],
  ] as const)('a machine without a word for a wait comes through where %s', (_, words) => {
    const machine = changedMachine(postMachine('lines-only'), { ...words, dwell: { letter: 'none' } });
    const trial = tryMachine(machine, '0');
    expect([trial.problems, trial.differences]).toEqual([[], []]);
    expect(trial.words).not.toContain('wait');
  });

  it.each(['G53-Z', 'G28-named'] as const)(
    'a machine that takes one program for each cutter and goes to its top by %s knows its cutter',
    (top) => {
      const machine = changedMachine(postMachine('desk-three-axis'), { positions: { top, topMachineZ: 0 } });
      const trial = tryMachine(machine, '0');
      expect([trial.problems, trial.differences]).toEqual([[], []]);
    },
  );

  it.each([
    ['holds less than the trial takes', { file: { fileLargest: 1000 } }],
    ['has one cutter', { cutters: { highest: 1 } }],
  ] as const)('a machine that %s is none the worse for it', (_, words) => {
    const trial = tryMachine(changedMachine(postMachine('lines-only'), words), '0');
    expect([trial.problems, trial.differences]).toEqual([[], []]);
  });

  it('says in words, once for each motion, that no cutter was named', () => {
    // Such a file is refused before it is tried: words for a change that are never written.
    const machine = changedMachine(postMachine('desk-three-axis'), { cutters: { words: 'T-only' } });
    const { differences } = tryMachine(machine, '0');
    expect(differences.length).toBe(4);
    expect(differences[0]).toMatch(/no cutter is named where cutter 1 was meant; \d more/);
    expect(differences.join()).not.toContain('null');
  });

  it('and does not where the spindle needs a wait', () => {
    const machine = changedMachine(postMachine('lines-only'), {
      dwell: { letter: 'none' },
      spindle: { run: 'program', spinUpSeconds: 5 },
    });
    const { problems } = tryMachine(machine, '0');
    expect(problems.map(({ code }) => code)).toContain('post.cannot-say');
  });
});
