/**
 * Time by pass, where the program's comments head them, else by cutter. s.
 *
 * A comment alone on its line heads the cutting that follows it, up to its first comma and without what it counts:
 * "Roughing, lap 3 of 12" and "Tooth 5 of 60" are lines of the passes "Roughing" and "Tooth".
 */
import type { Trace } from './trace-program.ts';

export interface PassTime {
  readonly name: string;
  /** null where no cutter was ever named. */
  readonly cutter: number | null;
  /** Where it is first met. */
  readonly file: string;
  readonly line: number;
  /** With the way to it and the waits on it. */
  readonly seconds: number;
  /** Of that in metal, or where metal may be. */
  readonly cutting: number;
}

export interface CutterTime {
  readonly cutter: number | null;
  readonly seconds: number;
  readonly cutting: number;
}

type Sums = { -readonly [K in keyof PassTime]: PassTime[K] };

export interface PassSums {
  readonly byName: Map<string, Sums>;
  /** The pass of the last cut, and what it was found by. */
  last: Sums | undefined;
  trace: Trace | undefined;
  cutter: number | null;
  /** Titles of the trace that stand before the last cut. */
  titles: number;
}

/** More headings than this divide nothing: the time is told by cutter. Judgement: what fits a page. */
const MOST_PASSES = 40;

/** Letters of a heading that are shown. */
const LONGEST_NAME = 40;

export function openPasses(): PassSums {
  return { byName: new Map(), last: undefined, trace: undefined, cutter: null, titles: 0 };
}

/** The pass to which the cut of move `i` belongs; after the last move the one that was last cut. */
export function spendOnPass(sums: PassSums, trace: Trace, i: number, cutter: number | null): Sums {
  const { titles, moves } = trace;
  if (i === moves.length && sums.trace === trace && sums.last !== undefined) {
    return sums.last;
  }
  let passed = sums.trace === trace ? sums.titles : 0;
  while (passed < titles.length && titles[passed]!.before <= i) {
    passed += 1;
  }
  if (sums.last === undefined || sums.trace !== trace || sums.titles !== passed || sums.cutter !== cutter) {
    const title = i === moves.length ? undefined : titles[passed - 1];
    sums.last = passOf(
      sums,
      trace,
      title?.line ?? moves[i]?.line ?? 1,
      i === moves.length,
      title?.text,
      cutter,
    );
    sums.trace = trace;
    sums.titles = passed;
    sums.cutter = cutter;
  }
  return sums.last;
}

function passOf(
  sums: PassSums,
  { file }: Trace,
  line: number,
  cutsNothing: boolean,
  title: string | undefined,
  cutter: number | null,
): Sums {
  const name = cutsNothing ? 'ways without a cut' : (headingOf(title ?? '') ?? cutterName(cutter));
  const key = `${String(cutter)} ${name}`;
  const known = sums.byName.get(key);
  if (known !== undefined) {
    return known;
  }
  const fresh = { name, cutter, file, line, seconds: 0, cutting: 0 };
  sums.byName.set(key, fresh);
  return fresh;
}

export function cutterName(cutter: number | null): string {
  return cutter === null ? 'no cutter named' : `cutter ${String(cutter)}`;
}

/** "5", "#5", "5 of 60", "5/60"; no size with a point. */
const COUNT = /(?<![\w.])#?\d+(?:\s*(?:of|\/)\s*\d+)?(?![\w.])/gi;

/** What a comment heads, undefined where it holds nothing that reads as a name. */
export function headingOf(comment: string): string | undefined {
  const name = comment
    .replaceAll(/[\p{Cc}\p{Cf}\p{Cs}]+/gu, ' ')
    .replace(/^\s*MSG\s*,/i, '')
    .replace(/,.*$/, '')
    .replaceAll(COUNT, ' ')
    .replaceAll(/\s+/g, ' ')
    .replace(/[\s#:.-]+$/, '')
    .trim()
    .slice(0, LONGEST_NAME);
  return /\p{L}/u.test(name) ? name : undefined;
}

export function passTimes({ byName }: PassSums): readonly PassTime[] {
  const passes = [...byName.values()];
  if (passes.length <= MOST_PASSES) {
    return passes;
  }
  return byCutter(passes).map((own) => ({
    name: cutterName(own[0]!.cutter),
    file: own[0]!.file,
    line: own[0]!.line,
    ...summed(own),
  }));
}

export function cutterTimes({ byName }: PassSums): readonly CutterTime[] {
  return byCutter([...byName.values()]).map(summed);
}

/** In the order in which they are first met. */
function byCutter(passes: readonly PassTime[]): readonly (readonly PassTime[])[] {
  const cutters = new Set(passes.map(({ cutter }) => cutter));
  return [...cutters].map((wanted) => passes.filter(({ cutter }) => cutter === wanted));
}

function summed(own: readonly PassTime[]): CutterTime {
  return {
    cutter: own[0]!.cutter,
    seconds: own.reduce((sum, { seconds }) => sum + seconds, 0),
    cutting: own.reduce((sum, { cutting }) => sum + cutting, 0),
  };
}
