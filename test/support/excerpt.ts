/**
 * The parts of a long program that a person reads before accepting it: everything before the first pass, one tooth of
 * roughing and one of finishing, and the end; each with the number of its first line. Below, the sum of the whole.
 */
const COMMENT = /^(?:N\d+ )?[(;]/;
/** Lines at the end: from the last pass's last blocks to the end word. */
const LAST = 12;

export function excerpt(file: string, text: string, sum: string): string {
  const lines = text.split('\n').map((line) => line.replace(/\r$/, ''));
  const first = Math.max(0, lines.findIndex(isPass));
  const parts = [
    part('head and set-up', lines, 0, first === 0 ? lines.length : first + 1),
    ...(first === 0 ? [] : [tooth('roughing', lines), tooth('finishing', lines)]),
    ...(first === 0 ? [] : [part('end', lines, Math.max(first + 1, lines.length - LAST), lines.length)]),
  ];
  const ends = text.includes('\r\n') ? 'carriage return and line feed' : 'line feed';
  return [
    `===== ${file}: ${lines.length} lines, each ended by ${ends}`,
    ...parts.filter((words) => words !== ''),
    `SHA-256 ${sum}`,
  ].join('\n\n');
}

/** The first comment that names a lap or a depth to go down to. */
function isPass(line: string): boolean {
  return COMMENT.test(line) && /\bDOWN TO HEIGHT\b/i.test(line);
}

/** The last lap's second tooth: all of it lies between two comments. */
function tooth(pass: string, lines: readonly string[]): string {
  const begins = lines.findLastIndex(
    (line) => COMMENT.test(line) && new RegExp(`\\b${pass}\\b.*\\bTOOTH 2\\b`, 'i').test(line),
  );
  if (begins < 0) {
    return '';
  }
  const next = lines.findIndex((line, i) => i > begins && COMMENT.test(line));
  return part(`one tooth of ${pass}`, lines, begins, next < 0 ? lines.length : next);
}

function part(what: string, lines: readonly string[], from: number, to: number): string {
  return [`----- ${what}, from line ${from + 1}`, ...lines.slice(from, to)].join('\n');
}
