/**
 * Words behind the program's end. A controller that is sent its program line by line runs them; one that holds the file
 * does not. What moves there, or cannot be read, is refused; what only sets something is warned of.
 */
import { AXES, BIT, type Block } from './block.ts';
import { G_GROUP, M_GROUP } from './modes-codes.ts';
import type { ReadLine } from './read-lines.ts';
import type { Run } from './trace-run.ts';

/** `run.line` is the line that ended the program, 1-based; `wasPercent`: a closing % line. */
export function sayWhatFollows(run: Run, lines: readonly ReadLine[], wasPercent: boolean): void {
  let first = 0;
  let moves = 0;
  let count = 0;
  // Behind a closing % no controller that wants one reads on (NISTIR 6556 §3.1).
  let isClosed = wasPercent;
  // From O and its number to M99: run where it is called, and read there.
  const hasSubs = run.machine.words.language.subprograms === 'M98';
  let isSub = false;
  for (let k = run.line; k < lines.length; k++) {
    const { fault, block, formula, percent } = lines[k]!;
    isClosed ||= percent !== undefined;
    if (fault === undefined && block === undefined && formula === undefined) {
      continue;
    }
    isSub ||= hasSubs && typeof block === 'object' && (block.given & BIT.O) !== 0;
    if (isSub) {
      isSub = !(typeof block === 'object' && block.m[M_GROUP.call] === 99);
      continue;
    }
    count += 1;
    first = first === 0 ? k + 1 : first;
    moves = moves === 0 && !isClosed && (fault !== undefined || mayMove(block)) ? k + 1 : moves;
  }
  if (count === 0) {
    return;
  }
  const many = `${String(count)} line${count === 1 ? '' : 's'} of words behind the end of the program (line ${String(run.line)})`;
  run.findings.push({
    code: 'prove.end',
    severity: moves > 0 ? 'error' : 'warning',
    message:
      moves > 0
        ? `${many}; this one may move: a controller that is sent its lines one by one runs on, and nothing of it is proved`
        : `${many}; none of them is taken to move, and they are passed over here`,
    hint: 'End the file where the program ends.',
    file: run.file,
    line: moves > 0 ? moves : first,
  });
}

/** Whether a line moves an axis or sets the spindle turning, or cannot be understood. */
function mayMove(block: Block | string | undefined): boolean {
  if (typeof block !== 'object') {
    return true;
  }
  const turn = block.m[M_GROUP.spindle] ?? -1;
  return (
    (block.given & AXES) !== 0 ||
    (block.g[G_GROUP.other] ?? -1) > 40 ||
    turn === 3 ||
    turn === 4 ||
    (block.m[M_GROUP.change] ?? -1) >= 0
  );
}
