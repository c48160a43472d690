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

runProgram(process.argv.slice(2)).then((exit) => {
  process.exitCode = exit;
}, ourFault);

function ourFault(error: unknown): void {
  const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
  process.stderr.write(
    `This is a fault of Ogive, not of your job; nothing was written.\n${text}\nPlease keep the job file and this text for whoever mends it.\n`,
  );
  process.exitCode = OUR_FAULT;
}
