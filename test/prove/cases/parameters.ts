/** Cases 100 to 112: parameters, expressions, and what the report does not have. */
import type { CaseRow } from '../../support/case-row.ts';

export const PARAMETERS: readonly CaseRow[] = [
  { n: 100, ref: '§3.3.3', lines: ['#3=15', '#3=6 G1 X#3', 'X#3'], ends: ['15 0 0', '6 0 0'] },
  { n: 101, ref: '§3.3.5', lines: ['#3=15 #3=6', 'G0 X#3'], ends: ['6 0 0'] },
  { n: 102, ref: '§3.3.2.3', lines: ['G0 X[2.0/3*1.5-5.5/11.0]'], ends: ['0.5 0 0'] },
  { n: 103, ref: '§3.3.2.2', lines: ['#1=2', '#3=7', 'G0 X[#1+2] Y#[1+2]'], ends: ['4 7 0'] },
  { n: 104, ref: '§3.3.2.2', lines: ['#2=5', '#5=8', 'G0 X##2'], ends: ['8 0 0'] },
  { n: 105, ref: '§3.3.2.2', wrong: ['#0=1', '#5400=1', 'G0 X#0', 'G0 X#5400', '#1.5=1', '#-1=1'] },
  { n: 106, ref: '§3.3.2.4', lines: ['G0 X FIX[-2.8] Y FUP[-2.8]'], ends: ['-3 -2 0'] },
  { n: 107, ref: 'App. C.2', lines: ['G0 X ROUND[-0.499] Y ROUND[-0.5001]'], ends: ['0 -1 0'] },
  { n: 108, ref: 'App. C.2', lines: ['G0 X ROUND[ATAN[1.7321]/[1.0]] Y[15 MOD 4.0]', 'X[2 OR 2] Y[2 XOR 2]'], ends: ['60 3 0', '1 0 0'] },
  { n: 109, ref: 'App. C.2', lines: ['G0 X[1 --3]'], ends: ['4 0 0'] },
  { n: 110, ref: '§3.5', lines: ['G[2*5] L[1+1] P1 X5'], ends: [], warns: 'prove.work-offset' },
  { n: 111, ref: '§3.3.2.3', wrong: ['G0 X[1+2', 'G0 X[1+2]]', 'G0 X[]', 'G0 X[1+]', 'G0 X#'] },
  { n: 112, ref: 'App. E.3', wrong: ['O100 sub', 'o<bore> call [1]', 'o100 if [1]', 'M98 P100', 'M99'] },
]; // prettier-ignore
