/** Cases 43 to 58: units, places, zeros, the rotary axis. */
import type { CaseRow } from '../../support/case-row.ts';
import { post } from '../../support/bench-program.ts';

const ROTARY = 'rotary words are not followed';

export const PLACES: readonly CaseRow[] = [
  { n: 43, ref: '§2.1.2.10', at: 'X25.4 Y0 Z0', lines: ['G20'], ends: [] },
  { n: 43, ref: '§2.1.2.10', at: 'X25.4 Y0 Z0', lines: ['G20', 'G91 G0 X1', 'G90 Y1'], ends: ['50.8 0 0', '50.8 25.4 0'] },
  { n: 44, ref: 'Table 8, §3.5.7', lines: ['G20 G0 X1'], ends: ['25.4 0 0'] },
  { n: 44, ref: 'Table 8: F counts before the unit changes', wrong: ['G20 G1 X1 F10'], says: /unit/ },
  { n: 44, ref: 'a feed of the old unit', before: ['G20'], wrong: ['G1 X1'], says: /unit/ },
  { n: 45, ref: '§2.1.2.9', beyond: ROTARY, before: ['G91'], wrong: ['G0 X1 A90'], says: /rotary/ },
  { n: 46, ref: '§3.5.17', lines: ['G91 G1 X1', 'X1', 'G90 X0'], ends: ['1 0 0', '2 0 0', '0 0 0'] },
  { n: 46, ref: '§3.5.17, ten steps', lines: ['G91 G1 X0.1', ...Array.from({ length: 9 }, () => 'X0.1')], ends: Array.from({ length: 10 }, (_, i) => `${String((i + 1) / 10)} 0 0`) },
  { n: 47, ref: '§3.5.17', lines: ['G91 G2 X0 Y10 J5'], ends: ['0 10 0'], turns: [-Math.PI] },
  { n: 48, ref: '§3.5.12', lines: ['G53 G0 Z0', 'Z10'], ends: ['0 0 ?', '0 0 10'] },
  { n: 49, ref: '§3.5.12', wrong: ['G53 G2 X1 Y0 I0.5', 'G53 X0 G80'] },
  { n: 49, ref: '§3.5.12', before: ['G80'], wrong: ['G53 X0'] },
  { n: 50, ref: 'the report is silent', before: ['G91'], wrong: ['G53 G0 Z0'] },
  { n: 51, ref: '§3.5.18', at: 'X4 Y0 Z0', lines: ['G92 X7', 'G0 X0'], ends: ['-3 0 0'], warns: 'prove.ambiguous' },
  { n: 51, ref: '§3.5.18', at: 'X4 Y0 Z0', lines: ['G92 X7', 'G92 X9', 'G0 X0 Y1'], ends: ['-5 1 0'], warns: 'prove.ambiguous' },
  { n: 51, ref: '§3.5.18, G91 does not matter', at: 'X4 Y0 Z0', lines: ['G91 G92 X7', 'G90 G0 X0'], ends: ['-3 0 0'], warns: 'prove.ambiguous' },
  { n: 52, ref: '§3.5.18', at: 'X4 Y0 Z0', lines: ['G92 X7', 'G92.2', 'G0 X0', 'G92.3', 'X0', 'G92.1', 'X0', 'G92.3', 'X0'], ends: ['0 0 0', '-3 0 0', '0 0 0', '0 0 0'] },
  { n: 52, ref: '§3.5.18, what an earlier program stored', wrong: ['G92.3'] },
  { n: 53, ref: '§3.5.18', wrong: ['G92'] },
  { n: 54, ref: '§3.5.8', lines: ['G91 G28 Z0'], ends: ['? ? ?'] },
  { n: 55, ref: '§3.5.8', lines: ['G28 Z50'], ends: ['0 0 50', '? ? ?'] },
  { n: 55, ref: '§3.5.8, by the machine file', machine: post('machining-centre'), modes: 'G21 G17 G40 G90 G94 G54', lines: ['G28 Z50.'], ends: ['0 0 50', '0 0 ?'], warns: 'prove.file' },
  { n: 56, ref: '§3.5.13', modes: 'G21 G17 G40 G61 G90 G94 G59.3', lines: ['G0 X1'], ends: ['1 0 0'], leaves: { work: 'G59.3' } },
  { n: 56, ref: '§3.5.13', wrong: ['G59.4'] },
  { n: 57, ref: '§3.6.1', lines: ['G43 H1', 'G64', 'G20'], leaves: { length: 1, path: 'G64', unit: 'inch' } },
  { n: 58, ref: '§2.1.2.2', beyond: ROTARY, wrong: ['A350'], says: /rotary/ },
]; // prettier-ignore
