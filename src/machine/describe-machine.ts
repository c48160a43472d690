/**
 * What a machine can do and which words its controller reads, as plain aligned lines: with them a user holds a machine
 * file against the manual of their own controller. Limits are in mm whatever the unit of the programs.
 */
import type { Machine, Words } from './machine.ts';

export function describeMachine(machine: Machine): readonly string[] {
  const rows: readonly (readonly [string, string])[] = [
    ['programs in', `${machine.units}, ${numbersOf(machine)}`],
    ['file', fileOf(machine.words)],
    ['lines', linesOf(machine.words)],
    ['comments', commentsOf(machine.words)],
    ['opening', openingOf(machine)],
    ['arcs', arcsOf(machine.words)],
    ['holes', holesOf(machine.words)],
    ['cutters', cuttersOf(machine.words)],
    ['spindle', spindleOf(machine)],
    ['waiting', waitingOf(machine.words)],
    ['zero', zeroOf(machine.words)],
    ['top', topOf(machine.words)],
    ['path', pathOf(machine.words)],
    ['rotary', rotaryOf(machine.words)],
    ['end', [...machine.words.end.restore, machine.words.end.end].join(' ')],
    ['reads too', languageOf(machine.words)],
    ['travel', travelOf(machine)],
    ['feeds', `${machine.limits.feedLowest} to ${machine.limits.feedHighest} mm/min`],
    ['proved', machine.proved],
  ];
  const width = Math.max(...rows.map(([label]) => label.length));
  return [
    `${machine.name}: ${machine.description}`,
    ...rows.map(([label, text]) => `  ${label.padEnd(width)}  ${text}`),
  ];
}

function numbersOf({ units, words: { numbers } }: Machine): string {
  const point = numbers.point === 'always' ? 'a point in every length' : 'a point where needed';
  return `${numbers.lengthDecimals[units]} decimals, ${point}, ${numbers.codeWidth === 2 ? 'G01' : 'G1'}`;
}

function fileOf({ file }: Words): string {
  const label = {
    none: 'no program number',
    'o-number': `O and ${file.labelDigits} digits`,
    'percent-name': 'name after %',
  }[file.programLabel];
  const percent = file.percentLines === 'both' ? '% first and last' : 'no %';
  return [file.ending, percent, label].join(', ');
}

function linesOf({ file, blocks }: Words): string {
  const numbers = {
    none: 'no block numbers',
    all: `every block numbered N${blocks.first}, N${blocks.first + blocks.step}, ...`,
    'cutter-changes': 'block numbers at cutter changes',
  }[blocks.numbers];
  const gap = file.gapBetweenWords ? 'blanks between words' : 'no blanks between words';
  return `${file.lineLongest} characters, ${numbers}, ${gap}`;
}

function commentsOf({ file }: Words): string {
  const form = { brackets: 'in brackets ( )', semicolon: 'after ;', none: 'none' }[file.commentForm];
  const note = file.operatorNote === null ? '' : `, ${file.operatorNote} shows one to the operator`;
  const banned = file.bannedCharacters === '' ? '' : `, never ${[...file.bannedCharacters].join(' ')}`;
  return `${form}${note}${banned}`;
}

function openingOf({ units, words: { modes } }: Machine): string {
  const unit = units === 'mm' ? modes.millimetreWord : modes.inchWord;
  const opening = modes.opening.map((word) => (word === 'UNIT' ? unit : word)).join(' ');
  return modes.openingOnePerBlock ? `${opening}, one a block` : opening;
}

function arcsOf({ arcs }: Words): string {
  if (arcs.planes === 'none') {
    return `none: chords within ${arcs.chordTolerance} mm`;
  }
  const centre = {
    'from-start': 'I J from the start point',
    'from-zero': 'I J from zero',
    radius: 'R',
  }[arcs.centre];
  const split = arcs.quadrants ? ', split at the quadrants' : `, up to ${arcs.longestSweep} degrees`;
  const circle = arcs.wholeCircle === 'one-block' ? ', whole circles' : '';
  return `${centre}${split}${circle}${arcs.helix ? ', helix' : ', no helix'}`;
}

function holesOf({ holes }: Words): string {
  return holes.cycles.length === 0
    ? 'no cycles'
    : `${holes.cycles.join(' ')}, ${holes.returnWord}, ended by ${holes.endWord}`;
}

function cuttersOf({ cutters }: Words): string {
  const change = {
    automatic: 'changed by the machine',
    'by-hand': 'changed by hand at a stop',
    'one-program': 'one program for each cutter',
  }[cutters.change];
  const words = cutters.words === 'none' ? '' : `, ${cutters.words.replaceAll('-', ' ')}`;
  const length = { none: 'no length offset', 'G43-H': 'length by G43 H', 'with-T': 'length with T' }[
    cutters.lengthOffset
  ];
  return `${change}${words}, ${length}`;
}

function spindleOf({ words: { spindle }, limits }: Machine): string {
  const run =
    spindle.run === 'by-hand' ? 'by hand' : `${spindle.forward}, ${spindle.spinUpSeconds} s to get to speed`;
  return `${run}, ${limits.spindleLowest} to ${limits.spindleHighest} 1/min`;
}

/** What programs of other makers may hold. */
function languageOf({ language }: Words): string {
  const said = [
    ...(language.parameters === 'none' ? [] : [`parameters ${language.parameters.replaceAll('-', ' ')}`]),
    ...language.setZero,
    ...(language.inverseTime ? ['G93'] : []),
    ...(language.subprograms === 'none' ? [] : [`subprograms by ${language.subprograms}`]),
    ...(language.loops === 'none' ? [] : [`loops by ${language.loops}`]),
  ];
  return said.length === 0 ? 'nothing more' : said.join(', ');
}

function waitingOf({ dwell, numbers }: Words): string {
  return dwell.letter === 'none'
    ? 'no dwell'
    : `${numbers.codeWidth === 2 ? 'G04' : 'G4'} ${dwell.letter} in ${dwell.unit}`;
}

function zeroOf({ positions }: Words): string {
  return positions.workOffset === 'none' ? 'one zero only' : `work offset ${positions.workOffset}`;
}

function topOf({ positions }: Words): string {
  return {
    none: 'no way to the top: parked by hand before the start',
    'G53-Z': `G53 Z${positions.topMachineZ}`,
    'G28-named': 'G91 G28 Z0, Z alone',
    'G28-all': 'G28, every axis',
  }[positions.top];
}

function pathOf({ path, positions }: Words): string {
  const rapid = positions.rapidShape === 'straight' ? 'rapids straight' : 'rapids not straight';
  return `finishing ${path.finishing ?? 'no word'}, roughing ${path.roughing ?? 'no word'}, ${rapid}`;
}

function rotaryOf({ rotary }: Words): string {
  return rotary === undefined
    ? 'none'
    : `${rotary.letter} about ${rotary.about}, counts ${rotary.count.replaceAll('-', ' ')}`;
}

function travelOf({ limits: { travel } }: Machine): string {
  const axes = (['x', 'y', 'z'] as const).map((axis) => travel[axis][1] - travel[axis][0]);
  return `${axes.join(' x ')} mm`;
}
