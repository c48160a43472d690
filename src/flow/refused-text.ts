/**
 * A program that failed its own proof, kept for whoever wants to see why: every line behind a comment mark, reasons on
 * top. Nothing in it can be run: each line begins with a word no controller reads as a move and is bracketed besides.
 */
import type { ProgramText } from '../post/write-program.ts';
import type { Proof } from '../prove/proof.ts';

export function refusedText(programs: readonly ProgramText[], proof: Pick<Proof, 'findings'>): string {
  const reasons = proof.findings
    .filter(({ severity }) => severity === 'error')
    .map(
      ({ code, file, line, message, hint }) =>
        `${file}:${line}: ${message}${hint === undefined ? '' : `. ${hint}`} [${code}]`,
    );
  const lines = [
    'REFUSED. This program failed its own proof. Do not run it, nor any part of it.',
    ...reasons,
    ...programs.flatMap(({ file, text }) => [`--- ${file} ---`, ...text.split(/\r\n|\n|\r/)]),
  ];
  return `${lines.map(bracketed).join('\n')}\n`;
}

/** One line as a comment: in brackets, with its own brackets and per cent signs made harmless. */
function bracketed(line: string): string {
  const harmless = line
    .replaceAll('(', '[')
    .replaceAll(')', ']')
    .replaceAll('%', 'per cent')
    .replaceAll(';', ',');
  return `; (${harmless})`;
}
