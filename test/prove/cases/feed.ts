/** Cases 59 to 67: feed by the minute and by the move. */
import type { CaseRow } from '../../support/case-row.ts';
import { post } from '../../support/bench-program.ts';

const ROTARY = 'rotary words are not followed';

export const FEED: readonly CaseRow[] = [
  { n: 59, ref: '§3.5.2 names no error; published interface of a hobby controller does', feed: '', wrong: ['G1 X1'] },
  { n: 59, ref: '§2.1.2.5, in inches', machine: post('inch-bench-mill'), modes: 'G20 G17 G40 G61 G90 G94 G54', feed: 'F10', lines: ['G1 X1'], ends: ['25.4 0 0'], feeds: [254] },
  { n: 60, ref: 'from memory: the report is silent', wrong: ['F0 G1 X1', 'F-5'] },
  { n: 61, ref: '§3.5.19: 1 mm in half a minute', lines: ['G93 G1 X1 F2'], ends: ['1 0 0'], feeds: [2] },
  { n: 61, ref: '§3.5.19: half a circle of radius 5', lines: ['G93 G2 X10 Y0 I5 F4'], ends: ['10 0 0'], feeds: [20 * Math.PI] },
  { n: 62, ref: '§3.5.19', before: ['G93', 'G1 X1 F2'], wrong: ['X5'] },
  { n: 63, ref: '§3.5.19', lines: ['G93 G0 X1', 'F5'], ends: ['1 0 0'] },
  { n: 63, ref: '§3.5.19, that F is not kept', before: ['G93 F5'], wrong: ['G1 X1'] },
  { n: 64, ref: '§3.5.16', before: ['G98', 'G93'], wrong: ['G81 X1 Y1 Z-1 R2 F100'], says: /G93/ },
  { n: 65, ref: '§2.1.2.5', beyond: ROTARY, wrong: ['G94 G1 X0.1 A36 F100'], says: /rotary/ },
  { n: 66, ref: '§2.1.2.5 B', beyond: ROTARY, wrong: ['G1 A90 F360'], says: /rotary/ },
  { n: 67, ref: 'published reference of a NIST-descended controller', before: ['G93 G1 X1 F2', 'G94'], wrong: ['G1 X5'] },
]; // prettier-ignore
