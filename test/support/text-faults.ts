/**
 * (c), (d) and (j) of the writer's properties, on the bare text: no block with two words of a letter or a group, no line too
 * long, no strange byte, no number that a controller could read otherwise. Groups: NISTIR 6556 table 4.
 */
import type { Machine } from '../../src/machine/machine.ts';

const GROUPS = [
  /^G0*[0-3]$|^G8[0-9]$/,
  /^G1[789]$/,
  /^G9[01]$/,
  /^G9[34]$/,
  /^G(2[01]|7[01])$/,
  /^G4[012]$/,
  /^G(43|49)$/,
  /^G5[4-9]$/,
  /^G6[014]$/,
];

export function textFaults(machine: Machine, text: string): string[] {
  const { lineEnd, bannedCharacters } = machine.words.file;
  const faults: string[] = [];
  if (!(lineEnd === 'crlf' ? /^([^\r\n]*\r\n)+$/ : /^([^\r\n]*\n)+$/).test(text)) {
    faults.push('wrong line ends');
  }
  if (!/^[\r\n -~]*$/.test(text) || [...bannedCharacters].some((letter) => text.includes(letter))) {
    faults.push('a byte that may not be there');
  }
  for (const line of text.split(/\r?\n/)) {
    const fault = lineFault(machine, line);
    if (fault !== '') {
      faults.push(`${line}: ${fault}`);
    }
  }
  return faults;
}

function lineFault(machine: Machine, line: string): string {
  if (line.length > machine.words.file.lineLongest) {
    return 'too long';
  }
  if (line === '' || line.startsWith('%') || /^O\d+$/.test(line)) {
    return '';
  }
  if (line.startsWith('(') || line.startsWith(';')) {
    const inside = line.startsWith('(') ? line.slice(1, -1) : line.slice(1);
    const closed = line.startsWith(';') || line.endsWith(')');
    return closed && !/[()[\];{}%]/.test(inside) ? '' : 'comment marks within a comment';
  }
  return wordsFault(line.replace(/ /g, ''));
}

function wordsFault(line: string): string {
  const words = line.match(/[A-Z][^A-Z]*/g) ?? [];
  if (words.join('') !== line || !words.every((word) => /^[A-Z]-?(\d+\.?\d*|\.\d+)$/.test(word))) {
    return 'a word that cannot be read';
  }
  if (words.some((word) => /^[A-Z]-0*\.?0*$/.test(word))) {
    return 'minus zero';
  }
  const letters = words.map((word) => word.charAt(0)).filter((letter) => letter !== 'G');
  if (new Set(letters).size !== letters.length) {
    return 'a letter twice';
  }
  if (GROUPS.some((group) => words.filter((word) => group.test(word)).length > 1)) {
    return 'two words of a group';
  }
  return letters.includes('M') && letters.some((letter) => 'XYZIJRF'.includes(letter))
    ? 'an M word on a block that moves'
    : '';
}
