/** The words of the command line. Each command is loaded only when it is asked for, so that help comes at once. */
import { Command, CommanderError } from 'commander';
import { nearestWord } from '../base/nearest-word.ts';
import { usageWords, type AskedCommand } from './usage-words.ts';

declare const OGIVE_VERSION: string;

/** Exit codes: 0 done, 1 understood but cannot be made or proved, 2 unreadable or wrong, 70 a fault of ours. */
export type Exit = 0 | 1 | 2;

export function version(): string {
  return typeof OGIVE_VERSION === 'string' ? OGIVE_VERSION : 'unbuilt';
}

export async function runProgram(args: readonly string[]): Promise<Exit> {
  let exit: Exit = 0;
  const program = describe((code) => {
    exit = code;
  });
  if (args.length === 0) {
    program.outputHelp();
    return 0;
  }
  const stranger = unknownCommand(program, args) ?? emptyWord(program, args);
  if (stranger !== undefined) {
    process.stderr.write(`${stranger}\n`);
    return 2;
  }
  try {
    await program.parseAsync(args, { from: 'user' });
  } catch (error) {
    if (error instanceof CommanderError) {
      if (error.exitCode === 0) {
        return 0;
      }
      process.stderr.write(`${usageWords(error, askedOf(program, args))}\n`);
      return 2;
    }
    throw error;
  }
  return exit;
}

/** What to say where a word that should name a command names none. */
function unknownCommand(command: Command, [word = '-', ...rest]: readonly string[]): string | undefined {
  const names = [...command.commands.map((one) => one.name()), 'help'];
  if (names.length === 1 || word.startsWith('-')) {
    return undefined;
  }
  const known = command.commands.find((one) => one.name() === word);
  if (known !== undefined || word === 'help') {
    return unknownCommand(known ?? command, rest);
  }
  const near = nearestWord(word, names);
  const group = command.parent === null ? '' : `${command.name()} `;
  return `there is no command '${group}${word}'${near === undefined ? '' : `; did you mean '${group}${near}'?`} (ogive ${group}--help tells more)`;
}

/** A name that a script left empty: `--out "$FOLDER"` would write beside the job, which nobody asked for. */
function emptyWord(program: Command, args: readonly string[]): string | undefined {
  const at = args.findIndex((word) => word === '' || /^--[a-z-]+=$/.test(word));
  if (at < 0) {
    return undefined;
  }
  const before = args[at] === '' ? args[at - 1] : args[at]?.slice(0, -1);
  const where = before?.startsWith('--') === true ? `behind ${before}` : 'in place of a name';
  return `an empty text stands ${where}: was a name left out? (${askedOf(program, args).typed} --help tells more)`;
}

/** The command that the first words name. */
function askedOf(program: Command, args: readonly string[]): AskedCommand {
  let asked = program;
  let typed = program.name();
  for (const word of args) {
    const next = asked.commands.find((one) => one.name() === word);
    if (next === undefined) {
      break;
    }
    asked = next;
    typed = `${typed} ${word}`;
  }
  return {
    typed,
    options: [...asked.options.flatMap(({ long }) => long ?? []), '--help'],
    wants: asked.registeredArguments.map((argument) => argument.name()),
  };
}

type Done = (code: Exit) => void;

function describe(done: Done): Command {
  const program = new Command('ogive')
    .description('Clock wheels from measurements to a proved milling program.')
    .version(version())
    .option('--notices', 'print the notices of the libraries inside')
    .showSuggestionAfterError(false)
    .configureOutput({ outputError: () => undefined })
    .exitOverride()
    .helpCommand('help [command]', 'the help of a command')
    .addHelpText('after', EXAMPLES);
  program.action(async (options: { notices?: boolean }) => {
    if (options.notices === true) {
      const { printNotices } = await import('./run-notices.ts');
      done(printNotices());
    } else {
      program.outputHelp();
    }
  });
  addCut(program, done);
  addProve(program, done);
  addDraw(program, done);
  addMachines(program, done);
  addNew(program, done);
  return program;
}

const EXAMPLES = `
Examples:
  ogive new my-wheel.yaml            a commented job to start from
  ogive cut my-wheel.yaml            the program, proved, with a sheet to read at the machine
  ogive draw my-wheel.yaml --dxf     the exact outline as a drawing
  ogive machines                     the machines it can write for
  ogive machines check mine.yaml     what your own machine file lacks or gets wrong

The machine's own book, local rules and trained people come before anything printed here.`;

function addCut(program: Command, done: Done): void {
  program
    .command('cut')
    .description(
      'job file to program, sheet, drawing and summary; nothing runnable is written unless it is proved',
    )
    .argument('<job>', 'the job file')
    .option('--out <dir>', 'folder to write to (default: beside the job)')
    .option('--json', 'the summary on stdout, and nothing else there')
    .option('--quiet', 'say nothing but what is wrong')
    .option('--force', 'overwrite a program that was edited by hand; the edited one is kept beside')
    .addHelpText(
      'after',
      `
Examples:
  ogive cut samples/third-wheel.yaml --out out
  ogive cut my-wheel.yaml --json > summary.json

Exit 0: done. 1: understood, but it can't be made or proved; the sheet says why. 2: the job can't be read, or a file can't be written.`,
    )
    .action(
      async (job: string, options: { out?: string; json?: boolean; quiet?: boolean; force?: boolean }) => {
        const { runCut } = await import('./run-cut.ts');
        done(runCut(job, options, version()));
      },
    );
}

function addProve(program: Command, done: Done): void {
  program
    .command('prove')
    .description('read programs back and say what the machine would do')
    .argument('[programs...]', 'program files, in the order they are run')
    .option('--job <job>', 'hold what they cut against this job')
    .option('--moves <file>', 'write each traced move as a line of JSON')
    .option('--sarif <file>', 'write the findings as SARIF, which editors show at the line')
    .option('--json', 'the verdict on stdout, and nothing else there')
    .option('--quiet', 'say nothing but what is wrong')
    .option('--explain', 'list the checks: what each guards against and what it cannot see')
    .addHelpText(
      'after',
      `
Examples:
  ogive prove out/third-wheel-1.nc out/third-wheel-2.nc --job samples/third-wheel.yaml
  ogive prove --explain`,
    )
    .action(
      async (
        programs: string[],
        options: {
          job?: string;
          moves?: string;
          sarif?: string;
          json?: boolean;
          quiet?: boolean;
          explain?: boolean;
        },
      ) => {
        const { runProve } = await import('./run-prove.ts');
        done(runProve(programs, options, version()));
      },
    );
}

function addDraw(program: Command, done: Done): void {
  program
    .command('draw')
    .description('the exact outline as SVG, or as DXF with arcs as arcs')
    .argument('<job>', 'the job file')
    .option('--dxf', 'DXF instead of SVG')
    .option('--as-cut', 'the outline as the finishing cutter leaves it')
    .option('--out <file>', "file to write, '-' for stdout (default: beside the job)")
    .option('--quiet', 'say nothing but what is wrong')
    .addHelpText(
      'after',
      `
Examples:
  ogive draw my-wheel.yaml
  ogive draw my-wheel.yaml --dxf --out wheel.dxf`,
    )
    .action(
      async (job: string, options: { dxf?: boolean; asCut?: boolean; out?: string; quiet?: boolean }) => {
        const { runDraw } = await import('./run-draw.ts');
        done(runDraw(job, options));
      },
    );
}

function addMachines(program: Command, done: Done): void {
  const machines = program
    .command('machines')
    .description('list the machine files, explain one, or check your own')
    .addHelpText(
      'after',
      `
Examples:
  ogive machines                        all of them, with what each can do
  ogive machines explain bench-mill     every field of one
  ogive machines check my-mill.yaml     what is missing or dangerous in your own, and a small program in its words`,
    );
  machines
    .command('list', { isDefault: true })
    .description('every machine file, with what it can do')
    .action(async () => {
      const { listMachines } = await import('./run-machines.ts');
      done(listMachines());
    });
  machines
    .command('explain')
    .argument('<name>', 'a machine of the list, or the path of a file')
    .description('one machine, field by field')
    .action(async (name: string) => {
      const { explainMachine } = await import('./run-machines.ts');
      done(explainMachine(name));
    });
  machines
    .command('check')
    .argument('<file>', 'a machine file')
    .description(
      'what is missing or dangerous in a machine file; writes a small set of motions in its words and reads them back',
    )
    .action(async (file: string) => {
      const { checkMachineFile } = await import('./run-machines.ts');
      done(checkMachineFile(file));
    });
}

function addNew(program: Command, done: Done): void {
  program
    .command('new')
    .description('write a commented starter job that runs as it is')
    .argument('[file]', 'file to write (default: stdout); an existing file is kept')
    .option('--schema', 'print the JSON Schema of job files, for editors')
    .addHelpText(
      'after',
      `
Examples:
  ogive new my-wheel.yaml
  ogive new --schema > ogive-job.schema.json`,
    )
    .action(async (file: string | undefined, options: { schema?: boolean }) => {
      const { runNew } = await import('./run-new.ts');
      done(runNew(file, options));
    });
}
