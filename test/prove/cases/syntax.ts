/** Cases 1 to 23: lines, numbers, comments, the form of the file. */
import type { CaseRow } from '../../support/case-row.ts';
import { reportMill } from '../../support/report-mill.ts';

const mill = reportMill();
/** As long a line as the report allows. */
const wide = { ...mill, words: { ...mill.words, file: { ...mill.words.file, lineLongest: 256 } } };
const semicolons = {
  ...mill,
  words: { ...mill.words, file: { ...mill.words.file, commentForm: 'semicolon' } },
} as const;
const long = (length: number): string => `(${'x'.repeat(length - 2)})`;

export const SYNTAX: readonly CaseRow[] = [
  { n: 1, ref: '§3.3 p15', lines: ['g0x +0. 12 34y 7'], ends: ['0.1234 7 0'] },
  { n: 2, ref: '§3.3.2.1', lines: ['G0 X.5', 'X5.', 'X+.5', 'X-0'], ends: ['0.5 0 0', '5 0 0', '0.5 0 0', '0 0 0'] },
  { n: 3, ref: '§3.3.2.1, App. E', wrong: ['G0 X.', 'G0 X--5', 'G0 X1e-3', 'G0 X1.2.3'] },
  { n: 4, ref: '§3.3.1', lines: ['N00010 G1 X1'], ends: ['1 0 0'] },
  { n: 4, ref: '§3.3.1, six digits', wrong: ['N000009 X1'] },
  { n: 5, ref: '§3.3, §3.3.1', wrong: ['G1 N10 X1', 'N1.5 X1', 'N-1'] },
  { n: 6, ref: '§2.2.2, switch on', lines: ['/N10 G1 X1 F50', 'G0 X2', 'G1 X3'], start: { skipSwitch: 'on' }, ends: ['2 0 0', '3 0 0'], feeds: [null, 100] },
  { n: 6, ref: '§2.2.2, switch off', lines: ['/N10 G1 X1', 'X2'], start: { skipSwitch: 'off' }, ends: ['1 0 0', '2 0 0'] },
  { n: 6, ref: '§2.2.2, switch not said', wrong: ['/N10 G1 X1'], says: /switch/ },
  { n: 7, ref: '§3.3', wrong: ['N10 /G1 X1'] },
  { n: 8, ref: '§3.3.5', lines: ['G1 (a) X1 (b) Y2'], ends: ['1 2 0'] },
  { n: 9, ref: '§3.3.4', wrong: ['(a (b) c)', 'G1 X1 (open', 'G1 X1 )'] },
  { n: 10, ref: 'App. E.2', wrong: ['G0 X(note)1'] },
  { n: 11, ref: '§3.3.4', lines: ['( M sg , CHANGE TOOL)'], events: ['message CHANGE TOOL'] },
  { n: 12, ref: 'App. E', wrong: ['G1 X1 ; note'] },
  { n: 12, ref: 'App. E, by the machine file', machine: semicolons, lines: ['G1 X1 ; X9'], ends: ['1 0 0'] },
  { n: 13, ref: '§3.3.4', lines: ['(G1 X99)'], ends: [] },
  { n: 14, ref: '§3.3', machine: wide, lines: [long(256)], ends: [] },
  { n: 14, ref: '§3.3, one more', machine: wide, lines: [long(257)], ends: [], warns: 'prove.file' },
  { n: 17, ref: '§3.1, after M2', lines: ['M2', 'G0 X9'], ends: [], warns: 'prove.end' },
  { n: 17, ref: '§3.1, after the second %', lines: ['%', 'G0 X9', 'not a word'], ends: [], warns: 'prove.end' },
  { n: 18, ref: '§3.3.5', wrong: ['G0 X1 X2', 'G1 G0 X1', 'G17 G18'] },
  { n: 19, ref: '§3.3.5', wrong: ['M0 M3 M6 M7 M48', 'M3 M4', 'M7 M8'] },
  { n: 19, ref: '§3.6.4', lines: ['M7', 'M8'], leaves: { mist: true, flood: true } },
  { n: 20, ref: 'App. E.3', wrong: ['O1000', 'U1', 'E1'] },
  { n: 21, ref: '§3.3', lines: ['\tg1\tx1', '', '   ', 'Y2\r', 'x3\r\r'], ends: ['1 0 0', '1 2 0', '3 2 0'] },
  { n: 22, ref: '§3.3.2.1', lines: ['G43 H1.00005', 'G0 Z5'], ends: ['0 0 5'] },
  { n: 22, ref: '§3.3.2.1', wrong: ['G43 H1.001'] },
  { n: 23, ref: '§3.3', wrong: ['G5', 'M47'] },
]; // prettier-ignore
