/** The command's entry: runs it, and turns a fault of ours into exit 70 with nothing written. */
import { runProgram } from './program.ts';

/** Exit code for a fault of ours (sysexits.h, EX_SOFTWARE). */
const OUR_FAULT = 70;

// Who reads what is printed may stop reading (`ogive machines | head`): that is no fault.
process.on('uncaughtException', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') {
    ourFault(error);
  }
  process.exit();
});

/** Exit code where something cannot be written. */
const UNWRITABLE = 2;

runProgram(process.argv.slice(2)).then((exit) => {
  process.exitCode = exit;
}, ourFault);

function ourFault(error: unknown): void {
  if (isFullOutput(error)) {
    process.exitCode = UNWRITABLE;
    sayUnwritten(error.code);
    return;
  }
  const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
  process.stderr.write(
    `This is a fault of Ogive, not of your job; nothing was written.\n${text}\nPlease keep the job file and this text for whoever mends it.\n`,
  );
  process.exitCode = OUR_FAULT;
}

/** What is printed goes to a disk that is full, or to nothing that takes it: a file's own failure is told where it is written. */
function isFullOutput(error: unknown): error is { readonly code: string } {
  const { syscall, path, code } = error as { syscall?: string; path?: string; code?: string };
  return syscall === 'write' && path === undefined && typeof code === 'string';
}

function sayUnwritten(code: string): void {
  const why = code === 'ENOSPC' ? 'the disk is full' : `the system says ${code}`;
  try {
    process.stderr.write(`what is printed cannot be written: ${why}.\n`);
  } catch {
    // Standard error goes the same way: the exit code alone can tell.
  }
}
