/** Cases 24 to 42: modes, and the order of execution within a line. */
import type { CaseRow } from '../../support/case-row.ts';

export const MODES: readonly CaseRow[] = [
  { n: 24, ref: '§3.3.7', lines: ['G1 X1 F100', 'Y2'], ends: ['1 0 0', '1 2 0'], feeds: [100, 100] },
  { n: 25, ref: '§3.5.15', before: ['G80'], wrong: ['X5'] },
  { n: 26, ref: '§3.5.15', lines: ['G80', 'G28 X0'], ends: ['? ? ?'] },
  { n: 26, ref: '§3.5.15', lines: ['G80', 'G92 X0'], ends: [] },
  { n: 27, ref: '§3.5.2', wrong: ['G1'] },
  { n: 28, ref: '§3.6.1', beyond: 'one file is read by itself: what ran before it is not known', modes: 'G21 G17 G40 G61 G90 G94 G54 G80', before: ['G80'], wrong: ['X5'] },
  { n: 29, ref: 'Table 8 p41', lines: ['S500 M3', 'G1 X10 M5'], ends: ['10 0 0'], events: ['spindle 500', 'spindle 0'], warns: 'prove.ambiguous' },
  { n: 30, ref: 'Table 8 p41', lines: ['G1 X10 M0', 'G0 Z50 M2'], ends: ['10 0 0', '10 0 50'], events: ['stop'], warns: 'prove.end' },
  { n: 31, ref: 'Table 8 p41', lines: ['T2 M6 G43 H2 S900 M3 M8 G0 Z5'], ends: ['0 0 5'], events: ['cutter 2', 'spindle 900'], leaves: { flood: true, length: 2, cutter: 2 } },
  { n: 32, ref: '§3.7.3', lines: ['T1', 'T3', 'M6'], events: ['cutter 3'] },
  { n: 33, ref: '§3.3.5', wrong: ['T1 T2 M6'] },
  { n: 34, ref: '§3.6.3', lines: ['M6'], events: ['cutter 1'] },
  { n: 35, ref: '§3.6.3', lines: ['S900 M3 M8', 'T2 M6', 'G0 Y1'], ends: ['0 1 ?'], events: ['spindle 900', 'spindle 0', 'cutter 2'], leaves: { turning: 0, flood: true } },
  { n: 36, ref: '§3.6.2', lines: ['M3 S0', 'S500'], events: ['spindle 0', 'spindle 500'] },
  { n: 37, ref: '§3.7.2, §3.7.3, §3.5.4', wrong: ['S-1', 'T-1', 'G4 P-1', 'T99999'] },
  { n: 38, ref: '§3.5', wrong: ['G4'] },
  { n: 39, ref: 'Table 8, §3.4', lines: ['G1 X1', 'G4 P1 X5'], ends: ['1 0 0', '5 0 0'], events: ['dwell 1'], warns: 'prove.ambiguous' },
  { n: 40, ref: '§3.5.4', lines: ['G4 P0.5'], events: ['dwell 0.5'] },
  { n: 41, ref: '§3.4, §3.5.5', lines: ['G1 Y1', 'G10 L2 P1 X5', 'Y2'], ends: ['0 1 0', '0 2 0'], warns: 'prove.work-offset' },
  { n: 41, ref: '§3.5.5, where that zero lies is not known', before: ['G10 L2 P1 X5'], wrong: ['G0 X5'], says: /G10/ },
  { n: 42, ref: '§3.4', wrong: ['G1 G92 X5', 'G1 G10 L2 P1 X5', 'G1 G28 X5'] },
]; // prettier-ignore
