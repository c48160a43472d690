import { describe, expect, it } from 'vitest';
import { commentCleaner } from '../../src/post/clean-comment.ts';
import { changedMachine, postMachine } from '../support/post-machines.ts';
import { writeOne } from '../support/post-text.ts';

describe('cautions whose colon vanished and turned them round', () => {
  it.each([
    ['machining-centre', 'at each stop: do what it says', 'AT EACH STOP - DO WHAT IT SAYS'],
    ['lines-only', 'badly set: stop', 'BADLY SET - STOP'],
    ['lines-only', 'Not proved: bending', 'NOT PROVED - BENDING'],
    ['lines-only', 'Height: -0.5 mm', 'HEIGHT, -0.5 MM'],
    ['lines-only', 'To check: 9.1 mm', 'TO CHECK, 9.1 MM'],
    ['lines-only', 'it moves: X -5', 'IT MOVES - X=-5'],
    ['desk-three-axis', 'badly set: stop', 'BADLY SET: STOP'],
  ])('%s: %s', (name, text, expected) => {
    expect(commentCleaner(postMachine(name).words.file)(text)).toBe(expected);
  });

  it('are parted by whatever mark the machine has', () => {
    const cleaned = (commentLetters: string): string =>
      commentCleaner(changedMachine(postMachine('lines-only'), { file: { commentLetters } }).words.file)(
        'not proved: bending',
      );
    expect(cleaned(',.')).toBe('NOT PROVED, BENDING');
    expect(cleaned('.')).toBe('NOT PROVED. BENDING');
    expect(cleaned('')).toBe('NOT PROVED BENDING');
  });

  it('"NOT PROVED BENDING" stands in no program of any machine file', () => {
    for (const name of ['lines-only', 'machining-centre']) {
      const program = writeOne(postMachine(name), { steps: [{ kind: 'rapid', to: { x: 0, y: 0, z: 5 } }] });
      expect(program.text).toMatch(/NOT PROVED - BENDING/);
      expect(program.text).toMatch(/BADLY SET - STOP/);
    }
  });
});
