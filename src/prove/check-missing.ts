/**
 * A wheel is whole only after all its programs: which of the set are not here, as the heads of the others tell, and what no
 * move has touched at all. Said first, so that nobody looks for a fault in a program that only waits for the next one.
 */
import type { Evidence } from './evidence.ts';
import type { Finding } from './proof.ts';
import type { Trace } from './trace-program.ts';
import { whatIsCut, type CutPlace } from './what-is-cut.ts';

export function checkMissing(evidence: Evidence): Finding[] {
  const { input, traces } = evidence;
  const first = traces[0];
  if (input.target === undefined || first === undefined) {
    return [];
  }
  const numbers = missingPrograms(traces);
  const uncut = untouched(evidence);
  if (numbers.length === 0 && uncut.length === 0) {
    return [];
  }
  const without = uncut.length === 0 ? '' : `nothing here cuts ${wordsOf(uncut)}`;
  const { of } = setOf(traces);
  const teller = traces.find(({ part }) => part?.of === of) ?? first;
  const message =
    numbers.length === 0
      ? without
      : `of the ${String(of)} programs of this job ${numbers.length === 1 ? 'number' : 'numbers'} ${wordsOf(numbers)} ${numbers.length === 1 ? 'is' : 'are'} not here${without === '' ? '' : `: ${without}`}`;
  return [
    {
      code: 'prove.missing',
      severity: 'error',
      message,
      hint: 'Prove all programs of the job together, in the order they are run.',
      file: teller.file,
      line: teller.part?.line ?? 1,
    },
  ];
}

/** Numbers that the heads of the others leave out. */
export function missingPrograms(traces: readonly Trace[]): number[] {
  const { of, here } = setOf(traces);
  return Array.from({ length: of }, (_, k) => k + 1).filter((number) => !here.has(number));
}

function setOf(traces: readonly Trace[]): { readonly of: number; readonly here: ReadonlySet<number> } {
  const parts = traces.flatMap(({ part }) => (part === undefined ? [] : [part]));
  return { of: Math.max(0, ...parts.map(({ of }) => of)), here: new Set(parts.map(({ number }) => number)) };
}

const NAMES: Readonly<Record<CutPlace, string>> = {
  bore: 'the bore',
  teeth: 'the teeth',
  crossing: 'the crossings',
};

/** Only where every cut is known: a cutter that nobody named may have cut it. */
function untouched(evidence: Evidence): string[] {
  const { figures, solids } = evidence;
  if (figures === undefined || hasLostCuts(evidence)) {
    return [];
  }
  const wanted = new Set<CutPlace>(['teeth']);
  if (figures.bore !== undefined) {
    wanted.add('bore');
  }
  if (figures.window !== undefined) {
    wanted.add('crossing');
  }
  const judge = whatIsCut(evidence);
  for (let i = 0; i < solids.count && wanted.size > 0; i++) {
    const place = judge(i);
    if (place !== undefined) {
      wanted.delete(place);
    }
  }
  return (['bore', 'teeth', 'crossing'] as const)
    .filter((place) => wanted.has(place))
    .map((place) => NAMES[place]);
}

function hasLostCuts({ moves, solids }: Evidence): boolean {
  if (solids.count === moves.length) {
    return false;
  }
  let n = 0;
  for (const move of moves) {
    if (solids.moves[n] === move) {
      n += 1;
    } else if (move.kind !== 'rapid') {
      return true;
    }
  }
  return false;
}

function wordsOf(items: readonly (string | number)[]): string {
  return items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} and ${String(items.at(-1))}`;
}
