/**
 * What to say of a command line that was not understood, in our words and with the command whose help tells more.
 *
 * In  : the parser's code and its sentence, of which only the names between quotes are taken; the options of the command that
 *       was asked for; the command as it is typed: `ogive cut`. Out: one line.
 */
import { nearestWord } from '../base/nearest-word.ts';

export interface UsageFault {
  readonly code: string;
  readonly message: string;
}

export interface AskedCommand {
  /** As it is typed: `ogive machines check`. */
  readonly typed: string;
  /** Its options, as `--out`. */
  readonly options: readonly string[];
  /** Its arguments, as `job`. */
  readonly wants: readonly string[];
}

export function usageWords({ code, message }: UsageFault, { typed, options, wants }: AskedCommand): string {
  const named = /'([^']*)'/.exec(message)?.[1] ?? '';
  const more = `(${typed} --help tells more)`;
  switch (code) {
    case 'commander.unknownOption': {
      const [option = named, value] = named.split('=');
      if (value !== undefined && options.includes(option)) {
        return `${option} takes no value: write ${option} alone ${more}`;
      }
      const near = nearestWord(option, options);
      return `there is no option '${option}'${near === undefined ? '' : `; did you mean '${near}'?`} ${more}`;
    }
    case 'commander.missingArgument':
      return `the ${named} is missing: ${typed} ${wants.map((want) => want.toUpperCase()).join(' ')} ${more}`;
    case 'commander.optionMissingArgument': {
      const [option = '', value = 'value'] = named.split(' ');
      return `nothing stands behind ${option}: write ${option} ${value.replaceAll(/[<>]/g, '').toUpperCase()} ${more}`;
    }
    case 'commander.excessArguments': {
      const taken = wants.length === 0 ? 'no argument' : `only one argument, the ${wants.join(' and the ')}`;
      return `${typed} takes ${taken}; a name with blanks in it goes between quotes ${more}`;
    }
    default:
      return `the command was not understood ${more}`;
  }
}
