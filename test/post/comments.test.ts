import { describe, expect, it } from 'vitest';
import * as fc from 'fast-check';
import type { Motion } from '../../src/motion/motion.ts';
import { commentCleaner, foldText } from '../../src/post/clean-comment.ts';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { changedMachine, MACHINE_NAMES, postMachine } from '../support/post-machines.ts';
import { writeOne } from '../support/post-text.ts';
import { textFaults } from '../support/text-faults.ts';

const desk = postMachine('desk-three-axis');
const clean = commentCleaner(desk.words.file);

const HOSTILE = [
  ')G0 Z-50(',
  'a)\nG0 Z-50\n(b',
  'a\r\nG0 Z-50',
  '%\nO0666',
  '!',
  'stop? now~ $X \u0018',
  ';G1 X99',
  '/G0 Z-5',
  'MSG, G0 Z-50',
  'print,G0Z-50',
  'wheel \u{1F570}\u{FE0F} G0 Z-50',
  'x'.repeat(500) + ' G0 Z-50 '.repeat(50),
  '((((',
  '\u0000\u0007\u009b\u2028G0 Z-50',
  'G0\tZ-50',
  'G 0 Z - 50',
  '#1=5 [G0]',
];

describe('text from anywhere never becomes a word', () => {
  const motion = (text: string): Motion => ({
    steps: [
      { kind: 'top' },
      { kind: 'cutter', number: 1, say: [text] },
      { kind: 'note', text },
      { kind: 'spindle', speed: 12000 },
      { kind: 'rapid', to: { x: 0, y: 0, z: 5 } },
      { kind: 'line', to: { x: 1, y: 0, z: 5 }, feed: 100, belongs: { pass: text, tooth: 1 } },
      { kind: 'spindle', speed: 0 },
      ...(text.length < 100 ? [{ kind: 'stop', say: [text] } as const] : []),
    ],
  });

  it.each(MACHINE_NAMES)('%s', (name) => {
    const machine = postMachine(name);
    for (const text of HOSTILE) {
      const facts = { title: text, part: [text], holding: text, blank: text, again: text, material: text };
      const program = writeOne(machine, motion(text), facts);
      const plain = writeOne(machine, motion('plain'));
      expect(textFaults(machine, program.text)).toEqual([]);
      const blocks = (of: string): string[] => of.split(/\r?\n/).filter((line) => !/^[(;]/.test(line));
      const expected =
        text.length < 100
          ? blocks(plain.text)
          : blocks(writeOne(machine, { steps: motion('plain').steps.slice(0, -1) }).text);
      expect(blocks(program.text)).toEqual(expected);
      const trace = traceProgram('hostile', program.text, machine, { cutter: 1 });
      expect(trace.complete).toBe(true);
      expect(trace.moves.every((move) => Math.abs((move.to.z ?? 5) - 5) < 0.0002)).toBe(true);
    }
  });

  it.each(['Cutter 5', 'cutter 07', 'Set the spindle to 99 turns a minute', 'Switch the spindle off'])(
    'a text reading %s is no order to whoever changes cutters and speeds by hand',
    (text) => {
      const byHand = { run: 'by-hand' } as const;
      for (const change of ['by-hand', 'one-program'] as const) {
        const cutters = { change, words: 'none' } as const;
        const machine = changedMachine(desk, { cutters, spindle: byHand });
        // A long title is folded, and a line of it may begin anywhere.
        const title = `${'wheel '.repeat(200)}${text}`;
        const traced = (said: string): unknown => {
          const facts = { title: said === 'plain' ? said : title, part: [said], again: said };
          const { steps } = motion(said);
          const notes = [...steps.slice(0, 4), { kind: 'note', text: said } as const, ...steps.slice(4)];
          const program = writeOne(machine, { steps: notes }, facts);
          const { moves } = traceProgram('hands', program.text, machine);
          return moves.map(({ kind, to, cutter, spindle }) => ({ kind, to, cutter, spindle }));
        };
        expect(traced(text)).toEqual(traced('plain'));
        expect(traced('plain')).toContainEqual(expect.objectContaining({ cutter: 1, spindle: 12000 }));
      }
    },
  );

  it('even with the comment marks gone, no letter stands alone before a number', () => {
    const files = MACHINE_NAMES.map((name) => postMachine(name).words.file);
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 60 }), fc.constantFrom(...files), (text, file) => {
        const line = commentCleaner(file)(text);
        expect(line).not.toMatch(/(?<![A-Za-z])[A-Za-z][-+ .]*\d/);
        expect(line).toMatch(/^[ -~]*$/);
        expect(line).not.toMatch(/[()[\]{};%\\"#]/);
        expect([...file.bannedCharacters].some((letter) => line.includes(letter))).toBe(false);
      }),
      { seed: 7, numRuns: 300 },
    );
  });

  it('goes where there is no letter to break it with', () => {
    const { file } = changedMachine(desk, { file: { commentLetters: '' } }).words;
    expect(commentCleaner(file)('go G0 Z-50.5 now')).toBe('GO NOW');
  });
});

describe('what a person wrote stays readable', () => {
  it.each([
    ['Räderuhr, Größe 5', 'RAEDERUHR, GROESSE 5'],
    ['roue d’échappement', 'ROUE DECHAPPEMENT'],
    ['Łódź – 60 zębów', 'LODZ - 60 ZEBOW'],
    ['Wheel “no. 3” 45° ±0.02', 'WHEEL NO. 3 45 DEG PLUS OR MINUS 0.02'],
    ["the owner's 50% share & more", 'THE OWNERS 50 PERCENT SHARE AND MORE'],
    ['Mark 0A1B2C3D, made', 'MARK 0A1B2C3D, MADE'],
    ['M0.5', 'M=0.5'],
    ['stays there; touch it (twice).', 'STAYS THERE, TOUCH IT TWICE.'],
  ])('%s', (text, expected) => {
    expect(clean(text)).toBe(expected);
  });

  it('says points and signs in words where the letters lack them', () => {
    const { file } = changedMachine(desk, { file: { commentLetters: '' } }).words;
    expect(commentCleaner(file)('height -0.5 mm')).toBe('HEIGHT MINUS 0 POINT 5 MM');
  });

  it('folds at blanks, cuts a word longer than the line, and never begins with a word that acts', () => {
    expect(foldText('one two three four', 9)).toEqual(['one two', 'three', 'four']);
    expect(foldText('abcdefghijkl mno', 5)).toEqual(['abcde', 'mno']);
    expect(foldText('PROBE it', 20)).toEqual(['NOTE PROBE it']);
    expect(foldText('', 20)).toEqual([]);
  });
});
