/** `ogive new`: a commented starter job, or the JSON Schema of job files. */
import { changeFolder, isThere } from './files.ts';
import { basename, dirname } from 'node:path';
import { jobJsonSchema, newJob } from '../job/new-job.ts';
import type { Exit } from './program.ts';
import { terminalOf } from './terminal.ts';

export function runNew(file: string | undefined, options: { readonly schema?: boolean }): Exit {
  const terminal = terminalOf(false);
  const text = options.schema === true ? `${JSON.stringify(jobJsonSchema(), null, 2)}\n` : newJob();
  if (file === undefined || file === '-') {
    process.stdout.write(text);
    return 0;
  }
  if (isThere(file)) {
    terminal.problems([
      {
        code: 'file.unwritable',
        severity: 'error',
        message: 'is there already; it is kept as it is.',
        hint: 'Name a file that is not there yet.',
        at: { kind: 'file', file },
      },
    ]);
    return 2;
  }
  const done = changeFolder(dirname(file), { write: [{ name: basename(file), text }], rename: [] });
  terminal.problems(done.problems);
  if (done.ok && options.schema !== true) {
    terminal.say(`${file} is written. It runs as it is: ogive cut ${/\s/.test(file) ? `'${file}'` : file}`);
  }
  return done.ok ? 0 : 2;
}
