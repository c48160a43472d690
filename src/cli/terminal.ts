/** What is said on the terminal: messages on stderr, red for danger only, progress only where it is waited for. */
import { showProblem } from '../base/show-problem.ts';
import type { Problem } from '../base/problem.ts';

/** Seconds before anything is said of progress. */
const PATIENCE = 1;

export interface Terminal {
  readonly say: (text: string) => void;
  readonly problems: (problems: readonly Problem[]) => void;
  readonly danger: (text: string) => string;
  /** Names what is being done, if it has taken long by now and somebody is watching. */
  readonly progress: (stage: string) => void;
  readonly progressDone: () => void;
}

export function terminalOf(quiet: boolean): Terminal {
  const watched = process.stderr.isTTY === true;
  const coloured = watched && (process.env['NO_COLOR'] ?? '') === '' && process.env['TERM'] !== 'dumb';
  const danger = (text: string): string => (coloured ? `\u001b[31m${text}\u001b[0m` : text);
  const started = performance.now();
  let shown = false;
  return {
    danger,
    say: (text) => {
      if (!quiet) {
        process.stderr.write(`${text}\n`);
      }
    },
    problems: (problems) => {
      for (const problem of problems) {
        const text = showProblem(problem);
        if (problem.severity === 'error') {
          process.stderr.write(`${danger(text)}\n`);
        } else if (!quiet) {
          process.stderr.write(`${text}\n`);
        }
      }
    },
    progress: (stage) => {
      if (watched && !quiet && performance.now() - started > PATIENCE * 1000) {
        process.stderr.write(`\r\u001b[2K${stage} ...`);
        shown = true;
      }
    },
    progressDone: () => {
      if (shown) {
        process.stderr.write('\r\u001b[2K');
      }
    },
  };
}
