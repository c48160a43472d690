/** Findings placed at a traced move, and numbers in words as every message shows them. */
import type { TracedMove } from '../motion/traced-move.ts';
import type { CheckCode } from './check-codes.ts';
import type { Finding } from './proof.ts';

export interface Said {
  readonly code: CheckCode;
  readonly message: string;
  readonly hint: string;
  readonly severity?: Finding['severity'];
  readonly x?: number;
  readonly y?: number;
}

/** An error at a move's line, unless said otherwise; line 1 where no move is to blame. */
export function findingAt(move: TracedMove | undefined, said: Said): Finding {
  const { code, message, hint, severity = 'error', x, y } = said;
  return {
    code,
    severity,
    message,
    hint,
    file: move?.file ?? '',
    line: move?.line ?? 1,
    ...(x === undefined ? {} : { x }),
    ...(y === undefined ? {} : { y }),
  };
}

/** One finding for each program: the first, which says how many more there are of its kind. */
export function gathered(findings: readonly Finding[]): Finding[] {
  const kinds = new Map<string, { readonly first: Finding; count: number }>();
  for (const finding of findings) {
    const kind = `${finding.code} ${finding.file}`;
    const known = kinds.get(kind);
    if (known === undefined) {
      kinds.set(kind, { first: finding, count: 1 });
    } else {
      known.count += 1;
    }
  }
  return [...kinds.values()].map(({ first, count }) =>
    count === 1
      ? first
      : {
          ...first,
          message: `${first.message} (and on ${String(count - 1)} more line${count === 2 ? '' : 's'})`,
        },
  );
}

export function lengthText(length: number): string {
  return `${String(Number(length.toFixed(3)))} mm`;
}

export function micronText(length: number): string {
  return length >= 0.1 ? lengthText(length) : `${(length * 1000).toFixed(1)} um`;
}
