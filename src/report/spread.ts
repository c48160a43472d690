/**
 * Labels along a line that would stand on one another, moved apart as little as it takes.
 *
 * In  : where each would like to stand, rising; the least distance between two; the first and the last place there is.
 * Out : where each stands, in the same order. Runs of labels that touch are centred on the mean of what they wished.
 */
export function spread(wished: readonly number[], gap: number, first = -Infinity, last = Infinity): number[] {
  interface Run {
    readonly count: number;
    readonly start: number;
  }
  const runs: Run[] = [];
  for (const place of wished) {
    let run: Run = { count: 1, start: place };
    let before = runs.at(-1);
    while (before !== undefined && before.start + before.count * gap > run.start) {
      runs.pop();
      const count = before.count + run.count;
      const sum = before.start * before.count + (run.start - before.count * gap) * run.count;
      run = { count, start: sum / count };
      before = runs.at(-1);
    }
    runs.push(run);
  }
  const places = runs.flatMap(({ count, start }) => Array.from({ length: count }, (_, i) => start + i * gap));
  return within(places, gap, first, last);
}

/** Pushed in from the ends, the last end first; where there is no room the first label keeps its place. */
function within(places: number[], gap: number, first: number, last: number): number[] {
  let limit = last;
  for (let i = places.length - 1; i >= 0; i--) {
    places[i] = Math.min(places[i] as number, limit);
    limit = (places[i] as number) - gap;
  }
  limit = first;
  for (let i = 0; i < places.length; i++) {
    places[i] = Math.max(places[i] as number, limit);
    limit = (places[i] as number) + gap;
  }
  return places;
}
