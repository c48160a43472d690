/**
 * A damaged program, kept as the edits that damage a good one. The first line of its file says what must refuse it:
 *
 *   # prove.spindle: small-wheel on bench-mill, the spindle is never switched on
 *
 * Below it, YAML. Each edit looks from the first line that matches `after` (of several: the first that matches the last of
 * them, each searched behind the one before; the file's first line, if absent) to the one that matches `before` for lines
 * that match `find`, and takes the first of them, or with `every: true` all.
 */
import { parse } from 'yaml';

export interface Edit {
  readonly after?: string | readonly string[];
  readonly before?: string;
  readonly find: string;
  readonly every?: boolean;
  /** What the matched part of the line becomes; $1 and so on as usual. A line that becomes empty is gone. */
  readonly put?: string;
  /** Lines that follow it. */
  readonly add?: readonly string[];
  /** Everything up to the first line after it that matches this is gone too. */
  readonly dropTo?: string;
  /** The same lines stand before the first line that matches this (searched after them) instead. */
  readonly moveTo?: string;
  /** Words by letter: this is added to their number, or their number is multiplied by it. */
  readonly shift?: Readonly<Record<string, number>>;
  readonly scale?: Readonly<Record<string, number>>;
}

export interface Recipe {
  readonly code: string;
  readonly job: string;
  readonly machine: string;
  readonly what: string;
  /** 1-based, of the programs that cut. */
  readonly program: number;
  readonly edits: readonly Edit[];
  /** How the line reads at which the finding must stand; if absent, it must be one of the edited lines. */
  readonly at?: string;
  /** What the finding's sentence must match. */
  readonly says?: string;
  /** Codes of errors that can't but come along. */
  readonly also: readonly string[];
  readonly severity: 'error' | 'warning';
}

const FIRST = /^# (prove\.[a-z-]+): ([a-z-]+) on ([a-z0-9-]+), (.+)$/;

export function readRecipe(text: string): Recipe {
  const first = FIRST.exec(text.split('\n')[0] ?? '');
  if (first === null) {
    throw new Error(`the first line must read like "# prove.left: small-wheel on bench-mill, why"`);
  }
  const [, code = '', job = '', machine = '', what = ''] = first;
  const body = parse(text) as Partial<Recipe> & Pick<Recipe, 'edits'>;
  return { program: 1, also: [], severity: 'error', ...body, code, job, machine, what };
}

export interface Damaged {
  readonly text: string;
  /** 0-based, of the lines that were edited, and where lines are gone the one that follows. */
  readonly first: number;
  readonly last: number;
}

export function damage(text: string, edits: readonly Edit[], decimals: number): Damaged {
  const ending = text.includes('\r\n') ? '\r\n' : '\n';
  let lines: readonly string[] = text.split(ending);
  let first = Infinity;
  let last = -1;
  for (const edit of edits) {
    for (const place of placesOf(lines, edit).toReversed()) {
      const changed = change(lines, place, edit, decimals);
      first = Math.min(first, place);
      last = Math.max(last, place) + Math.max(0, changed.length - lines.length);
      lines = changed;
    }
  }
  return { text: lines.join(ending), first, last };
}

function placesOf(lines: readonly string[], { after, before, find, every }: Edit): readonly number[] {
  const from = [after ?? []].flat().reduce((line, pattern) => lineAt(lines, pattern, line), 0);
  const to = before === undefined ? lines.length : lineAt(lines, before, from + 1);
  const pattern = new RegExp(find);
  const found = lines.flatMap((line, i) => (i >= from && i < to && pattern.test(line) ? [i] : []));
  if (found.length === 0) {
    throw new Error(`no line matches ${find}`);
  }
  return every === true ? found : found.slice(0, 1);
}

function lineAt(lines: readonly string[], pattern: string, from: number): number {
  const at = lines.findIndex((line, i) => i >= from && new RegExp(pattern).test(line));
  if (at < 0) {
    throw new Error(`no line from ${from + 1} on matches ${pattern}`);
  }
  return at;
}

function change(lines: readonly string[], at: number, edit: Edit, decimals: number): readonly string[] {
  const end = edit.dropTo === undefined ? at + 1 : lineAt(lines, edit.dropTo, at + 1);
  if (edit.moveTo !== undefined) {
    const to = lineAt(lines, edit.moveTo, end);
    return [...lines.slice(0, at), ...lines.slice(end, to), ...lines.slice(at, end), ...lines.slice(to)];
  }
  const line = lines[at] ?? '';
  const put = edit.put === undefined ? line : line.replace(new RegExp(edit.find), edit.put);
  const kept = edit.dropTo !== undefined || put.trim() === '' ? [] : [renumber(put, edit, decimals)];
  return lines.toSpliced(at, end - at, ...kept, ...(edit.add ?? []));
}

function renumber(line: string, { shift = {}, scale = {} }: Edit, decimals: number): string {
  return line.replace(/([A-Z])(-?(?:\d+\.?\d*|\.\d+))/g, (word: string, letter: string, number: string) =>
    letter in shift || letter in scale
      ? `${letter}${(Number(number) * (scale[letter] ?? 1) + (shift[letter] ?? 0)).toFixed(decimals)}`
      : word,
  );
}
