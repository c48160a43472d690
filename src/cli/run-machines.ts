/** `ogive machines`: the machine files that came along, one of them explained, or the user's own checked. */
import { showProblem } from '../base/show-problem.ts';
import { tryMachine } from '../flow/try-machine.ts';
import { describeMachine } from '../machine/describe-machine.ts';
import { listFields } from '../machine/list-fields.ts';
import { readMachine } from '../machine/read-machine.ts';
import { readText } from './files.ts';
import { findMachine, ownMachine, ownMachineNames } from './own-machines.ts';
import { version, type Exit } from './program.ts';
import { terminalOf } from './terminal.ts';

export function listMachines(): Exit {
  const blocks = ownMachineNames().map((name) => {
    const machine = readMachine(name, `posts/${name}.yaml`, ownMachine(name) ?? '', ownMachine);
    return machine.ok ? describeMachine(machine.value).join('\n') : `${name}: cannot be read`;
  });
  process.stdout.write(
    `${blocks.join('\n\n')}\n\nFind yours by the words in your controller's manual; posts/README.md tells how to write your own.\n`,
  );
  return 0;
}

export function explainMachine(name: string): Exit {
  const terminal = terminalOf(false);
  const found = findMachine(name, { file: 'command line', folder: '.' });
  if (!found.ok) {
    terminal.problems(found.problems);
    return 2;
  }
  const machine = readMachine(found.value.name, found.value.file, found.value.text, ownMachine);
  terminal.problems(machine.problems);
  if (!machine.ok) {
    return 2;
  }
  process.stdout.write(
    `${describeMachine(machine.value).join('\n')}\n\n${listFields(machine.value).join('\n')}\n`,
  );
  return 0;
}

/** "1 thing", "2 things". */
function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? '' : 's'}`;
}

export function checkMachineFile(file: string): Exit {
  const terminal = terminalOf(false);
  const own = ownMachine(file);
  const text = own === undefined ? readText(file) : { ok: true as const, value: own, problems: [] };
  if (!text.ok) {
    terminal.problems(text.problems);
    return 2;
  }
  const name = file.replace(/^.*[/\\]/, '').replace(/\.ya?ml$/, '');
  const machine = readMachine(name, file, text.value, ownMachine);
  terminal.problems(machine.problems);
  if (!machine.ok) {
    process.stderr.write(
      `${file} cannot be used as it is: ${counted(machine.problems.length, 'thing')} to mend.\n`,
    );
    return 2;
  }
  const trial = tryMachine(machine.value, version());
  process.stdout.write(`${describeMachine(machine.value).join('\n')}\n\n${trial.words}\n`);
  terminal.problems(trial.problems);
  for (const line of trial.differences) {
    process.stderr.write(`${terminal.danger(line)}\n`);
  }
  if (trial.problems.length > 0 || trial.differences.length > 0) {
    process.stderr.write('It was read, but a program in its words does not come back as it was meant.\n');
    return 1;
  }
  const warnings = machine.problems.map(showProblem).length;
  process.stdout.write(
    `The motions above were written in these words and came back as they were meant${warnings > 0 ? `; ${counted(warnings, 'warning')} above` : ''}.\n` +
      'Prove it on the machine, in the air, with hand on the stop, before it cuts anything; then say so under `proved:`.\n',
  );
  return 0;
}
