/** What hands do while the programs run: which program next, and at each change of cutter what the program itself says there. */
import { jobText } from './job-text.ts';
import type { SheetFacts, SheetProgram } from './facts.ts';
import { duration, escapeText, numeral, numeralList, sentence } from './words.ts';
import { sheetName } from './pass-paths.ts';

export function handSteps(facts: SheetFacts): readonly string[] {
  return facts.programs.map((program, i) => {
    const steps = facts.motions[i]?.steps ?? [];
    let cutter = 0;
    const stops: string[] = [];
    const notes: string[] = [];
    for (const step of steps) {
      if (step.kind === 'note') {
        notes.push(sentence(step.text));
      } else if (step.kind === 'cutter') {
        const first = cutter === 0;
        stops.push(first ? fitted(facts, step.number) : changed(facts, step.number));
        stops.push(...step.say.map(sentence));
        cutter = step.number;
      } else if (step.kind === 'stop') {
        stops.push(`${AT_STOP} ${step.say.map(sentence).join(' ')}`);
      }
    }
    const words = [...stops, ...notes].map((text) => escapeText(jobText(text, facts.job.length)));
    return `<b>Run</b> <span class="mark">${escapeText(program.file)}</span>, ${passWords(facts, program)}, ${duration(program.seconds)}. ${words.join(' ').replaceAll(` ${STOPS}`, `<br>${STOPS}`).replaceAll(` ${AT_STOP}`, `<br>${AT_STOP}`)}`;
  });
}

/** Where hands come in a new line begins. */
const STOPS = 'It stops,';
const AT_STOP = 'At the stop:';

function fitted(facts: SheetFacts, number: number): string {
  const words = {
    automatic: `It calls cutter ${number} first.`,
    'by-hand': `It stops at once for cutter ${number}.`,
    'one-program': `Cutter ${number} is in the collet.`,
  };
  return words[facts.machine.words.cutters.change];
}

/** By the machine itself, or at a stop. */
function changed(facts: SheetFacts, number: number): string {
  return facts.machine.words.cutters.change === 'automatic'
    ? `Then it changes to cutter ${number} by itself.`
    : `${STOPS} parked high and aside with the spindle still, for cutter ${number}.`;
}

/** The numerals of the passes it holds. */
function passWords({ passes }: SheetFacts, program: SheetProgram): string {
  const own = new Set(program.passes.map(sheetName));
  const numbers = passes.flatMap(({ name }, i) => (own.has(name) ? [i + 1] : []));
  return numbers.length === 1 ? `pass ${numeral(numbers[0] ?? 1)}` : `passes ${numeralList(numbers)}`;
}
