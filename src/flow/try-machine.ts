/**
 * Tries a machine file: writes a small set of motions in its words, reads each back from its text, and says every way in
 * which it did not come back as it was meant. What `ogive machines check` does after the file itself was checked.
 */
import type { Problem } from '../base/problem.ts';
import type { Machine } from '../machine/machine.ts';
import type { HeaderFacts } from '../post/header-facts.ts';
import { motionFacts } from '../post/motion-facts.ts';
import { postMotions, type NamedMotion } from '../post/post-motions.ts';
import { writeProgram } from '../post/write-program.ts';
import { traceProgram } from '../prove/trace-program.ts';
import { compareMotion } from './compare-motion.ts';

export interface Trial {
  /** A line for each motion: what it was, how many blocks it took. */
  readonly words: string;
  /** The text of the first, to be read by a person. */
  readonly example: string;
  readonly problems: readonly Problem[];
  readonly differences: readonly string[];
}

export function tryMachine(tried: Machine, version: string): Trial {
  const machine = ofAnySize(tried);
  const rows: string[] = [];
  const problems: Problem[] = [];
  const differences: string[] = [];
  let example = '';
  for (const named of postMotions(machine)) {
    const written = writeProgram({
      machine,
      name: 'trial',
      suffix: `-${named.name}`,
      label: machine.words.file.labelLowest,
      motion: named.motion,
      header: headerOf(named, version),
    });
    if (!written.ok) {
      problems.push(...written.problems);
      rows.push(`  ${named.what}: cannot be written`);
      continue;
    }
    const { file, text, blocks } = written.value;
    example ||= text;
    const trace = traceProgram(file, text, machine);
    const unread = trace.findings.map((finding) => `${file}:${finding.line}: ${finding.message}`);
    const strays = trace.complete ? compareMotion(named.motion, trace, machine) : [];
    differences.push(...unread, ...firstOf(strays).map((line) => `${file}: ${line}`));
    rows.push(`  ${named.what}: ${blocks} blocks`);
  }
  return { words: rows.join('\n'), example, problems, differences };
}

/** How much the controller holds is asked of real programs: the trial is longer than some of them. */
function ofAnySize(machine: Machine): Machine {
  const { words } = machine;
  return { ...machine, words: { ...words, file: { ...words.file, fileLargest: null } } };
}

/** The first way in which it strays; most of the others follow from it. */
function firstOf([first, ...others]: readonly string[]): readonly string[] {
  const more = others.length > 0 ? `; ${others.length} more, which may follow from it` : '';
  return first === undefined ? [] : [`${first}${more}`];
}

function headerOf({ what, motion }: NamedMotion, version: string): HeaderFacts {
  const { x, y, z, speeds, cutters } = motionFacts(motion);
  return {
    kind: 'check',
    title: `Trial of ${what}`,
    mark: 'TRIAL',
    version,
    part: ['none: motions in the air'],
    program: { number: 1, of: 1 },
    blank: 'none',
    holding: 'nothing',
    material: 'air',
    cutters: cutters.map((number) => ({ number, diameter: 1, flutes: 2, stickOut: 12, shank: 3 })),
    speeds,
    extents: { x, y, z },
    clear: z[1],
    topZ: 0,
    plateZ: -2,
    park: { x: 0, y: 0, z: z[1] },
    zero: 'top',
    again: 'any place with 50 mm free all round will do',
    check: { what: 'the square of the first motion', size: 10 },
    proved: ['read back from this text'],
    notProved: ['that the machine does what its file says'],
  };
}
