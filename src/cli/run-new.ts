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
  const refused = isThere(file)
    ? { message: 'is there already; it is kept as it is.', hint: 'Name a file that is not there yet.' }
    : /[/\\]$/.test(file)
      ? { message: 'is the name of a folder.', hint: `Name a file: ${file}my-wheel.yaml.` }
      : undefined;
  if (refused !== undefined) {
    terminal.problems([
      { code: 'file.unwritable', severity: 'error', ...refused, at: { kind: 'file', file } },
    ]);
    return 2;
  }
  const done = changeFolder(dirname(file), {
    folder: 'there',
    write: [{ name: basename(file), text }],
    rename: [],
  });
  terminal.problems(done.problems);
  if (done.ok && options.schema !== true) {
    terminal.say(`${file} is written. It runs as it is: ogive cut ${/\s/.test(file) ? `'${file}'` : file}`);
  }
  return done.ok ? 0 : 2;
}
