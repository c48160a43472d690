import { describe, expect, it } from 'vitest';
import { changedMachine, MACHINE_NAMES, postMachine, type WordChanges } from '../support/post-machines.ts';
import { textFaults } from '../support/text-faults.ts';
import { writeAll } from '../support/post-text.ts';

const bench = postMachine('bench-mill');

/** A change of one field, what the text then holds, and what it held before. */
type Case = readonly [string, WordChanges, RegExp | null, RegExp | null];

const cases: readonly Case[] = [
  ['percent lines', { file: { percentLines: 'none' } }, null, /^%$/m],
  [
    'O number',
    { file: { programLabel: 'o-number', labelDigits: 4, labelLowest: 1, labelHighest: 7999 } },
    /^O0012$/m,
    null,
  ],
  [
    'name after percent',
    { file: { programLabel: 'percent-name', labelDigits: 5, labelLowest: 1, labelHighest: 99999 } },
    /^%00012$/m,
    null,
  ],
  ['line end', { file: { lineEnd: 'crlf' } }, /\r\n/, null],
  ['line length', { file: { lineLongest: 60 } }, null, /^.{61}/m],
  ['letter case', { file: { letterCase: 'upper' } }, /^\(A SQUARE WITH A RAMP\)/m, /^\(a square/m],
  ['comment form', { file: { commentForm: 'semicolon' } }, /^;a square with a ramp$/m, /^\(/m],
  ['no comments', { file: { commentForm: 'none' } }, null, /^\(/m],
  ['comment letters', { file: { commentLetters: '.' } }, /^\(Title\. Third/m, /^\(Title: Third/m],
  [
    'operator note',
    { file: { operatorNote: null } },
    /^\(measure over the teeth\)$/m,
    /^\(MSG,measure over the teeth\)$/m,
  ],
  ['gap', { file: { gapBetweenWords: false } }, /^G1X/m, /^G1 X/m],
  ['numbered blocks', { blocks: { numbers: 'all' } }, /^N\d+ G1 /m, null],
  [
    'block numbers start again after the last',
    { blocks: { numbers: 'all', first: 5, step: 5, last: 20 } },
    /^N20 .*\nN5 /m,
    null,
  ],
  ['decimals', { numbers: { lengthDecimals: { mm: 3, inch: 4 } } }, /X-5\.000 /, /X-5\.0000 /],
  ['feed decimals', { numbers: { feedDecimals: 0 } }, /F120$/m, /F120\.00$/m],
  ['second decimals', { numbers: { secondsDecimals: 1 } }, /^G4 P0\.3$/m, /^G4 P0\.25$/m],
  ['speed decimals', { numbers: { speedDecimals: 1 } }, /^S12100\.0$/m, /^S12100$/m],
  ['point always', { numbers: { point: 'always', trailingZeros: 'drop' } }, /X-5\. /, null],
  ['trailing zeros', { numbers: { trailingZeros: 'drop' } }, /X-5 /, /X-5\.0000/],
  ['leading zero', { numbers: { leadingZero: 'drop' } }, /Z-\.5000/, /Z-0\.5000/],
  ['code width', { numbers: { codeWidth: 2 } }, /^G01 .*\n(.*\n)*M05$/m, /^G1 /m],
  ['millimetre word', { modes: { millimetreWord: 'G71' } }, /G71/, /G21/],
  ['opening', { modes: { opening: ['G90', 'UNIT'] } }, /G90 G21 G94 G54/, /G98/],
  ['one opening word a block', { modes: { openingOnePerBlock: true } }, /^G17\nG40$/m, /^N1 G21 G17/m],
  ['mode in every block', { modes: { modeRepeat: 'every-block' } }, /^G0 X0\.0000 Y0\.0000\nG0 Z5/m, /^Z5/m],
  [
    'axes in every block',
    { modes: { axisRepeat: 'every-block' } },
    /^G1 X-5\.0000 Y-5\.0000 Z0\.1000/m,
    /^G1 Z0\.1000/m,
  ],
  ['no arcs', { arcs: { planes: 'none' } }, null, /^G[23] /m],
  ['arcs from zero', { arcs: { centre: 'from-zero' } }, /^G3 X\S+ Y\S+ I0\.0000 J0\.0000/m, /I-3\.0000/],
  ['arcs by radius', { arcs: { centre: 'radius' } }, /^G3 X\S+ Y\S+ R3\.0000$/m, /I-3\.0000/],
  ['arc centre word', { arcs: { centreWord: 'G91.1' } }, /G91\.1/, null],
  ['zero words', { arcs: { zeroWords: 'write' } }, /I-3\.0000 J0\.0000/, null],
  ['arc end words', { arcs: { endWords: 'changed' } }, /^G3 X-3\.0000 I-3\.0000/m, /^G3 X-3\.0000 Y0\.0000/m],
  [
    'longest sweep',
    { arcs: { longestSweep: 90 } },
    /^G3 X0\.0000 Y3\.0000 I-3\.0000\nX-3\.0000 Y0\.0000 J-3\.0000$/m,
    null,
  ],
  [
    'quadrants',
    { arcs: { quadrants: true } },
    /^G3 X0\.0000 Y3\.0000 I-3\.0000\nX-1\.5000 Y2\.5981 J-3\.0000$/m,
    null,
  ],
  ['whole circle split', { arcs: { wholeCircle: 'split' } }, null, /^G3 X3\.0000 Y0\.0000 I-3\.0000$/m],
  ['no helix', { arcs: { helix: false } }, null, /^G3 X\S+ Y\S+ Z-0\.2000/m],
  ['shallowest helix', { arcs: { helixShallowest: 0.3 } }, null, /^G3 X\S+ Y\S+ Z-0\.2000/m],
  ['shortest chord', { arcs: { shortestChord: 0.1 } }, null, /^G2 X1\.0468/m],
  ['smallest radius', { arcs: { smallestRadius: 0.05 } }, null, /^G2 X1\.0468/m],
  ['largest radius', { arcs: { largestRadius: 2.5 } }, null, /^G3 X0\.0000 Y3\.0000/m],
  ['dwell letter', { dwell: { letter: 'X' } }, /^G4 X0\.25$/m, /^G4 P/m],
  ['dwell unit', { dwell: { unit: 'milliseconds' } }, /^G4 P250$/m, /^G4 P0\.25$/m],
  [
    'cutters by hand',
    { cutters: { change: 'by-hand', words: 'none' } },
    /^\(MSG,fit cutter 2 touch off|^\(MSG,fit cutter 2, touch off on the plate\)\nN?\d* ?M0$/m,
    /M6/,
  ],
  ['cutter word then change', { cutters: { words: 'T-then-M6' } }, /T2\nM6$/m, /T2 M6/],
  ['cutter word only', { cutters: { words: 'T-only' } }, /T2$/m, /M6/],
  ['no length offset', { cutters: { lengthOffset: 'none' } }, null, /G43/],
  ['length not given up', { cutters: { lengthCancel: 'none' } }, null, /^G49$/m],
  ['spindle by hand', { spindle: { run: 'by-hand' } }, /Set the spindle to 12100 turns a minute/, /^M3$/m],
  ['spindle word', { spindle: { forward: 'M4' } }, /^M4$/m, /^M3$/m],
  ['spin-up', { spindle: { spinUpSeconds: 9 } }, /^G4 P9\.00$/m, /^G4 P4\.00$/m],
  ['speed with the spindle word', { spindle: { speedWord: 'together' } }, /^S12100 M3$/m, /^S12100$/m],
  ['work offset', { positions: { workOffset: 'G55' }, modes: { opening: ['UNIT', 'G90'] } }, /G55/, null],
  ['no top', { positions: { top: 'none' } }, null, /G53/],
  ['top by G28, named axes', { positions: { top: 'G28-named' } }, /^G91 G28 Z0\.0000\nG90$/m, /G53/],
  ['top by G28, all axes', { positions: { top: 'G28-all' } }, /^G28 Z5\.0000$/m, /G53/],
  ['height of the top', { positions: { topMachineZ: -2.5 } }, /^G53 G0 Z-2\.5000$/m, /^G53 G0 Z0/m],
  [
    'dog-leg rapids',
    { positions: { rapidShape: 'dog-leg' } },
    /^Z7\.0000\nX-4\.0000 Y-5\.0000\nX-5\.0000\nZ5\.0000$/m,
    /^X-4\.0000 Y-5\.0000 Z7\.0000$/m,
  ],
  ['finishing path', { path: { finishing: 'G61.1' } }, /^G61\.1$/m, null],
  ['roughing path', { path: { roughing: 'G64 P0.01' } }, /^G64 P0\.01$/m, null],
  ['feed mode', { path: { feedMode: 'G95' } }, /G95/, null],
  ['feed along the circle', { path: { helixFeedAlong: 'circle' } }, /Z-0\.2000 J-2\.0000 F119\.98$/m, null],
  ['end word', { end: { end: 'M30' } }, /^M30$/m, /^M2$/m],
  ['restored modes', { end: { restore: ['G90'] } }, /^G49\nG90\nM2$/m, null],
];

describe('each word of a machine file shows in the text', () => {
  const before = writeAll(bench);
  it.each(cases)('%s', (_, words, holds, held) => {
    const machine = changedMachine(bench, words);
    const after = writeAll(machine);
    expect(after).not.toBe(before);
    if (holds !== null) {
      expect(after).toMatch(holds);
      expect(before).not.toMatch(holds);
    }
    if (held !== null) {
      expect(before).toMatch(held);
      expect(after).not.toMatch(held);
    }
    expect(textFaults(machine, after)).toEqual([]);
  });

  it('units', () => {
    const inch = writeAll(changedMachine(bench, {}, {}, 'inch'));
    expect(inch).toMatch(/G20/);
    expect(inch).not.toMatch(/G21/);
    expect(inch).toMatch(/X0\.19685 /);
    expect(inch).toMatch(/INCHES/);
  });
});

it('writes every motion in the words of every machine file, soundly', () => {
  for (const name of MACHINE_NAMES) {
    const machine = postMachine(name);
    expect(textFaults(machine, writeAll(machine))).toEqual([]);
  }
});
