/** `ogive draw`: the exact outline of a job's wheel, or the one its cutter leaves, as SVG or DXF. */
import { basename, dirname, join, resolve } from 'node:path';
import type { Outcome, Problem } from '../base/problem.ts';
import { failure, success } from '../base/problem.ts';
import { readJob } from '../job/read-job.ts';
import { outlineDxf } from '../report/draw-dxf.ts';
import { outlineSvg } from '../report/draw-outline.ts';
import { sizeOnly } from '../report/lengths.ts';
import type { OutlineShape } from '../report/outline-shape.ts';
import { asCut } from '../tooth/as-cut.ts';
import { crossings } from '../tooth/crossings.ts';
import { wheelForm } from '../tooth/wheel-form.ts';
import { changeFolder, folderOf, isStandardInput, isThere, noPlace, readText } from './files.ts';
import { keepInputs } from './keep-inputs.ts';
import type { Exit } from './program.ts';
import { terminalOf } from './terminal.ts';

export interface DrawOptions {
  readonly dxf?: boolean;
  readonly asCut?: boolean;
  readonly out?: string;
  readonly quiet?: boolean;
}

export function runDraw(jobFile: string, options: DrawOptions): Exit {
  const terminal = terminalOf(options.quiet === true);
  if (options.out === undefined && isStandardInput(jobFile)) {
    terminal.problems([noPlace(jobFile, 'FILE, or - for stdout')]);
    return 2;
  }
  const text = readText(jobFile);
  if (!text.ok) {
    terminal.problems(text.problems);
    return 2;
  }
  const job = readJob(jobFile, text.value, (path) => readText(resolve(folderOf(jobFile), path)));
  terminal.problems(job.problems);
  if (!job.ok) {
    return 2;
  }
  const shape = shapeOf(job.value, options.asCut === true);
  terminal.problems(shape.problems);
  if (!shape.ok) {
    return 1;
  }
  const drawing = options.dxf === true ? outlineDxf(shape.value) : outlineSvg(shape.value);
  if (options.out === '-') {
    process.stdout.write(drawing);
    return 0;
  }
  const ending = options.dxf === true ? 'dxf' : 'svg';
  const file = options.out ?? join(dirname(jobFile), `${job.value.name}-outline.${ending}`);
  if (!file.toLowerCase().endsWith(`.${ending}`)) {
    terminal.problems([isThere(file) ? notOurs(file, ending) : otherKind(file, ending)]);
    return 2;
  }
  const lost = keepInputs(dirname(file), [basename(file)], [jobFile], 'Give the drawing another name.');
  if (lost.length > 0) {
    terminal.problems(lost);
    return 2;
  }
  const done = changeFolder(dirname(file), {
    folder: 'there',
    write: [{ name: basename(file), text: drawing }],
    rename: [],
  });
  terminal.problems(done.problems);
  if (!done.ok) {
    return 2;
  }
  terminal.say(`${file} is written, in millimetres.`);
  return 0;
}

/** A job or a program named by mistake would be lost. */
function notOurs(file: string, ending: string): Problem {
  return {
    code: 'file.unwritable',
    severity: 'error',
    message: `is there already and its name does not end in .${ending}; it is kept as it is.`,
    hint: `Name a file that ends in .${ending}, or one that is not there yet.`,
    at: { kind: 'file', file },
  };
}

/** A picture of another kind would not open as what its name says. */
function otherKind(file: string, ending: string): Problem {
  const other = ending === 'svg' ? ', with --dxf as DXF' : '';
  return {
    code: 'file.unwritable',
    severity: 'error',
    message: `a drawing is written as ${ending.toUpperCase()}${other}, and this name does not end in .${ending}. Nothing was written.`,
    hint: `Name a file that ends in .${ending}.`,
    at: { kind: 'file', file },
  };
}

function shapeOf(
  job: ReturnType<typeof readJob> extends Outcome<infer T> ? T : never,
  cut: boolean,
): Outcome<OutlineShape> {
  const form = wheelForm(job.wheel);
  if (!form.ok) {
    return failure(form.problems);
  }
  const windows = job.wheel.crossings && crossings(job.wheel.crossings, form.value.rootRadius);
  if (windows !== undefined && !windows.ok) {
    return failure(windows.problems);
  }
  const diameter = job.cuts.finishing.cutter.diameter;
  const opened = cut ? asCut(form.value, diameter) : undefined;
  if (opened !== undefined && !opened.ok) {
    return failure(opened.problems);
  }
  return success({
    title: job.title,
    form: form.value,
    sector: opened?.value.sector ?? form.value.sector,
    ...(windows === undefined ? {} : { crossings: windows.value }),
    bore: job.wheel.bore,
    thickness: job.wheel.thickness,
    unit: job.length,
    ...(opened === undefined ? {} : { asCut: opened.value }),
    what:
      opened === undefined
        ? 'the exact outline'
        : `the outline that a cutter of ${sizeOnly(diameter, job.length)} leaves`,
  });
}
