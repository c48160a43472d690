/**
 * Is a YAML text nested deeper than anything a job or machine file needs? Asked before the text is parsed: a parser
 * that calls itself for every level runs out of stack. Counts what could open a level and never what closes one
 * where a quote or a comment may stand, so that it may refuse a strange file but never lets a deep one through.
 * In: the text. Out: the offset of the place that is too deep, or undefined.
 */

/** Deepest nesting of lines and list dashes. Why: a machine file needs 4 levels. */
const DEEPEST = 24;

/**
 * Most brackets and braces of one file that open and may stay open. Why: even were none closed, so many levels still fit the
 * stack.
 */
const MOST_BRACKETS = 500;

export function tooTangled(text: string): number | undefined {
  const indents: number[] = [];
  let brackets = 0;
  let offset = 0;
  for (const line of text.split('\n')) {
    const lead = /^[ \t\-?:]*/.exec(line)?.[0] ?? '';
    const indent = lead.search(/[-?:\t]|$/);
    if (!line.startsWith('#', lead.length) && line.trim() !== '') {
      while ((indents.at(-1) ?? -1) > indent) {
        indents.pop();
      }
      if ((indents.at(-1) ?? -1) < indent) {
        indents.push(indent);
      }
      const opened = bracketsOf(line);
      brackets += opened.open;
      if (
        indents.length + markersOf(lead) > DEEPEST ||
        opened.deepest > DEEPEST ||
        brackets > MOST_BRACKETS
      ) {
        return offset;
      }
    }
    offset += line.length + 1;
  }
  return undefined;
}

function markersOf(lead: string): number {
  return lead.replaceAll(/\s/g, '').length;
}

/**
 * How many of a line may stay open after it, and how deep they stand if every closing one counts. Up to the first quote or
 * comment mark brackets are what they look like (or a text, which opens nothing): what opens and closes there is done with.
 * Behind it only what opens is counted.
 */
function bracketsOf(line: string): { open: number; deepest: number } {
  const sure = line.search(/["'#]|$/);
  let open = 0;
  let depth = 0;
  let deepest = 0;
  for (let i = 0; i < line.length; i++) {
    const letter = line[i];
    if (letter === '[' || letter === '{') {
      open += 1;
      depth += 1;
      deepest = Math.max(deepest, depth);
    } else if (letter === ']' || letter === '}') {
      depth = Math.max(0, depth - 1);
      open = i < sure ? Math.max(0, open - 1) : open;
    }
  }
  return { open, deepest };
}
