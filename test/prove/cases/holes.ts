/** Cases 86 to 93: drilling cycles, as the moves that they are. Back-off of a peck: 0.254 mm (published reference of a NIST-descended controller). */
import type { CaseRow } from '../../support/case-row.ts';
import { reportMill } from '../../support/report-mill.ts';

const mill = reportMill();
const toR = { ...mill, words: { ...mill.words, holes: { ...mill.words.holes, peckReturn: 'R' } } } as const;
const hole = (x: number, y: number, ...heights: readonly number[]): string[] =>
  heights.map((z) => `${String(x)} ${String(y)} ${String(z)}`);

export const HOLES: readonly CaseRow[] = [
  { n: 86, ref: '§3.5.16.2, example 1', at: 'X1 Y2 Z3', lines: ['G90 G81 G98 X4 Y5 Z1.5 R2.8'], ends: hole(4, 5, 3, 2.8, 1.5, 3), feeds: [null, null, 100, null] },
  { n: 87, ref: '§3.5.16.2, example 2', at: 'X1 Y2 Z3', lines: ['G91 G81 G98 X4 Y5 Z-0.6 R1.8 L3'], ends: ['1 2 4.8', ...hole(5, 7, 4.8, 4.2, 4.8), ...hole(9, 12, 4.8, 4.2, 4.8), ...hole(13, 17, 4.8, 4.2, 4.8)] },
  { n: 88, ref: '§3.5.16', before: ['G98'], wrong: ['G81 X1 Y1 R2', 'G81 X1 Y1 Z2 R1', 'G81 X1 Y1 Z-1 R2 L0', 'G81 X1 Y1 Z-1 R2 A5', 'G81 X1 Y1 Z-1', 'G81 R2', 'G82 X1 Z-1 R2 P-1', 'G81 X1 Z-1 R2 P1', 'G81 X1 Z-1 R2 L1.5'] },
  { n: 89, ref: '§3.5.16', at: 'X0 Y0 Z5', lines: ['G98 G81 X1 Y1 Z-1 R2', 'X5 Y5'], ends: [...hole(1, 1, 5, 2, -1, 5), ...hole(5, 5, 5, 2, -1, 5)] },
  { n: 89, ref: '§3.5.16, §3.5.20: G99 stays at R', at: 'X0 Y0 Z5', lines: ['G99 G81 X1 Y1 Z-1 R2', 'X5 Y5'], ends: [...hole(1, 1, 5, 2, -1, 2), ...hole(5, 5, 2, -1, 2)] },
  { n: 90, ref: '§3.4', at: 'X0 Y0 Z5', lines: ['G98 G81 X1 Y1 Z-1 R2', 'G0 X9', 'X5'], ends: [...hole(1, 1, 5, 2, -1, 5), '9 1 5', '5 1 5'] },
  { n: 91, ref: '§3.5.16.4', before: ['G98'], wrong: ['G83 X1 Z-1 R2 Q0', 'G83 X1 Z-1 R2 Q-1', 'G83 X1 Z-1 R2'] },
  { n: 92, ref: '§3.5.16.4', at: 'X0 Y0 Z5', lines: ['G98 G83 X0 Y0 Z-3 R2 Q2'], ends: hole(0, 0, 2, 0, 5, 0.254, -2, 5, -1.746, -3, 5) },
  { n: 92, ref: 'published reference of a NIST-descended controller, by the machine file', machine: toR, at: 'X0 Y0 Z5', lines: ['G98 G83 X0 Y0 Z-3 R2 Q2'], ends: hole(0, 0, 2, 0, 2, 0.254, -2, 2, -1.746, -3, 5) },
  { n: 93, ref: '§3.5.16.3', at: 'X0 Y0 Z5', lines: ['G98 G82 X0 Y0 Z-1 R2 P0.5'], ends: hole(0, 0, 2, -1, 5), events: ['dwell 0.5'] },
  { n: 93, ref: 'whether P holds on: the report is silent', before: ['G98', 'G82 X0 Y0 Z-1 R2 P0.5'], wrong: ['X5'], says: /P/ },
]; // prettier-ignore
