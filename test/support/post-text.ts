/** Programs of the motions that use every word, and of single moves, as one text. */
import type { Machine } from '../../src/machine/machine.ts';
import type { Motion, Step } from '../../src/motion/motion.ts';
import type { HeaderFacts } from '../../src/post/header-facts.ts';
import { postMotions } from '../../src/post/post-motions.ts';
import { writeProgram, type ProgramText } from '../../src/post/write-program.ts';
import { headerFacts } from './header-facts.ts';

export function writeOne(machine: Machine, motion: Motion, changes: Partial<HeaderFacts> = {}): ProgramText {
  const header = headerFacts(motion, changes);
  const outcome = writeProgram({ machine, name: 'trial', suffix: '', label: 12, motion, header });
  if (!outcome.ok) {
    throw new Error(outcome.problems.map((problem) => problem.message).join('; '));
  }
  return outcome.value;
}

export function writeAll(machine: Machine): string {
  return postMotions(machine)
    .map(({ motion }) => writeOne(machine, motion).text)
    .join('');
}

/** The blocks of some steps that follow a rapid to the start; no header, no beginning, no end. */
export function blocksOf(
  machine: Machine,
  start: { x: number; y: number; z: number },
  steps: readonly Step[],
): string[] {
  const marked: Step[] = [
    { kind: 'top' },
    { kind: 'rapid', to: start },
    { kind: 'note', text: 'begin here' },
    ...steps,
    { kind: 'note', text: 'finish here' },
  ];
  const lines = writeOne(machine, { steps: marked }).text.split(/\r?\n/);
  const at = (mark: string): number => lines.findIndex((line) => line.toLowerCase().includes(mark));
  return lines.slice(at('begin here') + 1, at('finish here'));
}
