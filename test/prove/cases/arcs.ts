/** Cases 68 to 85: arcs. */
import type { CaseRow } from '../../support/case-row.ts';
import { post } from '../../support/bench-program.ts';

const HALF = Math.PI;
const INCH = { machine: post('inch-bench-mill'), modes: 'G20 G17 G40 G61 G90 G94 G54', feed: 'F10' };

export const ARCS: readonly CaseRow[] = [
  { n: 68, ref: '§3.5.3.2 p24', at: 'X7 Y7 Z0', lines: ['G17 G2 X10 Y16 I3 J4 Z9'], ends: ['10 16 9'], turns: [-(HALF / 2 + Math.asin(0.8))] },
  { n: 69, ref: '§3.5.3.2', lines: ['G2 X0 Y0 I5'], ends: ['0 0 0'], turns: [-2 * HALF] },
  { n: 70, ref: '§3.5.3.2, no axis words', wrong: ['G2 I5'] },
  { n: 70, ref: '§3.5.3.2, none of the plane', code: 'prove.arc', wrong: ['G2 Z1 I5'] },
  { n: 71, ref: 'App. C.1', at: 'X57.5 Y0 Z0', lines: ['G2 X57.5 J2.5'], ends: ['57.5 0 0'], turns: [-2 * HALF] },
  { n: 72, ref: '§3.5.3.2', code: 'prove.arc', wrong: ['G2 X10 Y0'] },
  { n: 73, ref: '§3.5.3.2', code: 'prove.arc', wrong: ['G2 X10 Y0 I0 J0'] },
  { n: 73, ref: 'zero radius: the report is silent', code: 'prove.arc', wrong: ['G2 X0 Y0 I0 J0'] },
  { n: 74, ref: '§3.5.3.2, 0.0019 mm', lines: ['G2 X10.0019 Y0 I5'], ends: ['10.0019 0 0'], turns: [-HALF] },
  { n: 74, ref: '§3.5.3.2, 0.0021 mm', code: 'prove.arc', wrong: ['G2 X10.0021 Y0 I5'] },
  { n: 75, ref: '§3.5.3.2, 0.00019 in', ...INCH, lines: ['G2 X1.00019 Y0 I0.5'], ends: ['25.404826 0 0'], turns: [-HALF] },
  { n: 75, ref: '§3.5.3.2, 0.00021 in', ...INCH, code: 'prove.arc', wrong: ['G2 X1.00021 Y0 I0.5'] },
  { n: 76, ref: '§3.5.3.1, half by R', lines: ['G2 X10 Y0 R5'], ends: ['10 0 0'], turns: [-HALF], warns: 'prove.ambiguous' },
  { n: 77, ref: 'from memory of the report', code: 'prove.arc', wrong: ['G2 X10 Y0 R4.999'] },
  { n: 78, ref: '§3.5.3.1, long way', lines: ['G2 X10 Y0 R-6'], ends: ['10 0 0'], turns: [-(2 * HALF - 2 * Math.asin(5 / 6))] },
  { n: 78, ref: '§3.5.3.1, short way', lines: ['G3 X10 Y0 R6'], ends: ['10 0 0'], turns: [2 * Math.asin(5 / 6)] },
  { n: 79, ref: '§3.5.3.1', code: 'prove.arc', wrong: ['G2 X0 Y0 R5'] },
  { n: 80, ref: 'published manual of an industrial controller', code: 'prove.arc', wrong: ['G2 X10 Y0 R6 I5'] },
  { n: 81, ref: 'from memory of the report', wrong: ['G2 X10 Y0 I5 K1'] },
  { n: 82, ref: '§3.5.3', before: ['G18'], wrong: ['G2 X1 Z1 J1', 'G2 X1 Y1 I1 J1'] },
  { n: 82, ref: '§3.5.3.2, none of the plane', code: 'prove.arc', before: ['G18'], wrong: ['G2 Y1 R5', 'G2 Y1 I1'] },
  // 83 to 85 bind the writer; what the reader takes of the same words.
  { n: 83, ref: 'an end that rounds to the start is a whole circle to a controller', code: 'prove.arc', wrong: ['G2 X0.000000001 Y0 I5'] },
  { n: 84, ref: '§3.5.3.2, by rounded words', code: 'prove.arc', at: 'X0.707 Y0.707 Z0', wrong: ['G3 X-0.707 Y0.71 I-0.707 J-0.707'] },
  { n: 85, ref: 'a line for a flat arc', lines: ['G1 X0.8727 Y0.0008'], ends: ['0.8727 0.0008 0'] },
]; // prettier-ignore
