/** A problem as one prints it: place, path, what is wrong, and on a second line what to do. */
import type { Place, Problem } from './problem.ts';

export function showProblem(problem: Problem): string {
  const place = showPlace(problem.at);
  const warning = problem.severity === 'warning' ? 'warning: ' : '';
  const message = printable(problem.message);
  const first = place === '' ? `${warning}${message}` : `${printable(place)} ${warning}${message}`;
  return problem.hint === undefined ? first : `${first}\n  ${printable(problem.hint)}`;
}

/** A name or a value of a file that is shown must not clear the screen, colour it, or begin a line of its own. */
function printable(text: string): string {
  return text.replaceAll(/\p{Cc}+/gu, ' ');
}

function showPlace(at: Place): string {
  switch (at.kind) {
    case 'file':
      return `${at.file}:`;
    case 'value': {
      const spot = at.line === undefined ? '' : `:${at.line}:${at.column ?? 1}`;
      return at.path.length === 0 ? `${at.file}${spot}:` : `${at.file}${spot} ${showPath(at.path)}:`;
    }
    case 'program':
      return `${at.file}:${at.line}:`;
    case 'part':
      return `at X${at.x.toFixed(3)} Y${at.y.toFixed(3)}:`;
  }
}

/** Keys with points between them, places in a list in brackets, counted from 1: `blank.keep-out[2].x`. */
export function showPath(path: readonly (string | number)[]): string {
  return path.reduce<string>(
    (shown, key) =>
      typeof key === 'number' ? `${shown}[${key + 1}]` : shown === '' ? key : `${shown}.${key}`,
    '',
  );
}
