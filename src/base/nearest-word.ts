/**
 * The word of a list that was probably meant by a mistyped one.
 * Maths: edit distance with neighbours swapped counted once (optimal string alignment; Damerau 1964, Levenshtein 1966).
 */
export function nearestWord(word: string, known: readonly string[]): string | undefined {
  let best: string | undefined;
  let least = Infinity;
  for (const candidate of known) {
    const distance = editDistance(plain(word), plain(candidate));
    if (distance < least) {
      least = distance;
      best = candidate;
    }
  }
  return least <= Math.max(1, Math.floor(word.length * FURTHEST)) ? best : undefined;
}

/** Share of the letters that may be wrong. Why: beyond it another word is as near by chance. */
const FURTHEST = 0.4;

function plain(word: string): string {
  return word.toLowerCase().replaceAll(/[ _-]/g, '');
}

function editDistance(a: string, b: string): number {
  let before: number[] = [];
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1];
      let cost = Math.min((row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1, (row[j - 1] ?? 0) + (same ? 0 : 1));
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) {
        cost = Math.min(cost, (before[j - 2] ?? 0) + 1);
      }
      next.push(cost);
    }
    before = row;
    row = next;
  }
  return row[b.length] ?? 0;
}
