import { describe, expect, it } from 'vitest';
import type { Motion } from '../../src/motion/motion.ts';
import { cautions } from '../../src/post/cautions.ts';
import { headerLines } from '../../src/post/header.ts';
import { headerFacts } from '../support/header-facts.ts';
import { changedMachine, MACHINE_NAMES, postMachine } from '../support/post-machines.ts';
import { writeOne } from '../support/post-text.ts';

const motion: Motion = {
  steps: [
    { kind: 'top' },
    { kind: 'cutter', number: 2, say: [] },
    { kind: 'spindle', speed: 18500 },
    { kind: 'rapid', to: { x: -16.25, y: 4, z: 6.5 } },
    { kind: 'line', to: { x: 16.25, y: -3, z: -1.6 }, feed: 100 },
    { kind: 'rapid', to: { x: 16.25, y: -3, z: 6.5 } },
    { kind: 'spindle', speed: 0 },
  ],
};
const changes = {
  cutters: [{ number: 2, diameter: 0.512, flutes: 2, stickOut: 14, shank: 3 }],
  clear: 6.5,
  park: { x: 0, y: 0, z: 25 },
  program: { number: 2, of: 3 },
};
const facts = headerFacts(motion, changes);
const desk = postMachine('desk-three-axis');

function joined(lines: readonly string[]): string {
  return lines.join('\n');
}

describe('head of a program [29 CFR 1910.212; ISO 12100; what a set-up needs to be checked against]', () => {
  it('comes before anything but per cent and label lines', () => {
    for (const name of MACHINE_NAMES) {
      const lines = writeOne(postMachine(name), motion, changes).text.split(/\r?\n/);
      const first = lines.findIndex((line) => !/^(%|O\d+$)/.test(line));
      expect(lines[first]).toMatch(/^[(;]title/i);
      const end = lines.findIndex((line) => /end of the cautions/i.test(line));
      expect(lines.slice(first, end).every((line) => /^[(;]/.test(line))).toBe(true);
    }
  });

  it('has some ten lines of set-up, with this program in numbers', () => {
    const lines = headerLines(facts, desk);
    const setUp = lines.slice(
      0,
      lines.findIndex((line) => line.startsWith('CAUTION')),
    );
    expect(setUp.length).toBeLessThanOrEqual(14);
    for (const fact of [
      '0A1B2C3D',
      'number 2 of 3',
      '0.512 mm',
      '14.000 mm',
      '18500',
      '-16.250 mm',
      '16.250 mm',
      '-1.600 mm',
      '6.500 mm',
      '25.000 mm',
      '31.471 mm or 1.2390 inch',
      'MILLIMETRES',
      'leaded-brass',
      'glue',
    ]) {
      expect(joined(setUp)).toContain(fact);
    }
  });

  it('names the work offset where there is one, in words that no controller acts on', () => {
    expect(joined(headerLines(facts, desk))).toContain('kept in the first work offset');
    const third = changedMachine(desk, { positions: { workOffset: 'G56' } });
    expect(joined(headerLines(facts, third))).toContain('kept in the third work offset');
    expect(joined(headerLines(facts, postMachine('lines-only')))).toContain(
      'The controller has this one zero',
    );
    expect(joined(headerLines(facts, third))).not.toMatch(/G5[4-9]/);
  });

  it('is in inches on a machine that works in inches, with millimetres beside the size to check', () => {
    const lines = joined(headerLines(facts, postMachine('inch-bench-mill')));
    expect(lines).toContain('INCHES');
    expect(lines).toContain('-0.0630 inch');
    expect(lines).toContain('diameter is 1.2390 inch or 31.471 mm');
    expect(lines).toContain('measures anything but 1.2390 inch or 31.471 mm');
    expect(lines).not.toContain('-1.600 mm');
  });

  it('tells what a person of an inch job measures in both units on a machine that works in millimetres', () => {
    const sixteenth = { number: 2, diameter: 1.5875, flutes: 2, stickOut: 12.7, shank: 3 };
    const lines = joined(headerLines({ ...facts, jobUnit: 'inch', cutters: [sixteenth] }, desk));
    expect(lines).toContain(
      'cuts 1.588 mm or 0.0625 inch wide, 2 flutes, sticking out 12.700 mm or 0.5000 inch',
    );
    expect(lines).toContain('must be the one of 1.588 mm or 0.0625 inch');
    expect(joined(headerLines({ ...facts, jobUnit: 'mm' }, desk))).toContain('cuts 0.512 mm wide');
  });

  it('is a text of its own where the machine reads no comments', () => {
    const silent = changedMachine(desk, { file: { commentForm: 'none' } });
    const program = writeOne(silent, motion, { ...changes, title: 'two\nlines' });
    expect(program.text).not.toMatch(/[(;]/);
    expect(program.headerFile?.file).toBe('trial.txt');
    expect(program.headerFile?.text).toContain('Title: two lines\n');
    expect(program.headerFile?.text).toContain('CAUTION');
  });

  it('is shorter for the walk-round, which turns no spindle', () => {
    const walk = headerFacts(
      { steps: [{ kind: 'rapid', to: { x: 1, y: 1, z: 5 } }] },
      { kind: 'walk', cutters: [] },
    );
    const lines = joined(headerLines(walk, desk));
    expect(lines).toContain('Walk-round');
    expect(lines).toContain('Spindle: stays still');
    expect(lines).not.toContain('glasses');
    expect(lines).not.toContain('First run');
  });
});

describe('cautions', () => {
  const said = joined(cautions(facts, desk));

  it.each([
    [
      'local rules, the machine book and training first',
      /trained person.*rules of the place.*book of the machine/,
    ],
    ['responsibility', /answers for it/],
    ['dry run with the height to raise by [1.6 + 6.5 mm by hand]', /raise the zero of height by 8\.100 mm/],
    ['single block', /block by block/],
    ['zero and left-over shifts', /shifts, turns, scales and mirrors/],
    ['deepest point and what lies under', /height -1\.600 mm, which is 0\.100 mm into what lies under/],
    ['check dimension', /31\.471 mm/],
    ['stick-out', /sticking out 14\.000 mm/],
    ['spindle speed', /18500 turns a minute/],
    ['guards, gloves, hair', /Guards shut.*No gloves, loose cuffs, long hair/],
    ['power off before hands come near', /power off the spindle before hands go near/],
    [
      'what goes beyond the middle of the cutter [shank 3, nut 19 of the desk machine: half of each; -1.6 + 14]',
      /shank go 1\.500 mm further.*above height 12\.400 mm the collet nut goes 9\.500 mm further/,
    ],
    ['the way it turns', /turns the way the cutter cuts/],
    ['fluid', /fluid.*off the skin/],
    ['eyes and ears', /glasses.*ear protection/],
    ['emergency stop and lost place', /emergency stop.*lost/],
    ['unattended', /Stay with it/],
    ['restart', /Do not start in the middle of a program/],
    ['park', /park the cutter at X 0\.000 mm, Y 0\.000 mm, at height 25\.000 mm/],
    ['an unproved machine file', /not been proved/],
  ])('%s', (_, pattern) => {
    expect(said).toMatch(pattern);
  });

  it.each([
    ['leaded-brass', [/lead/, /needles/, /NOT brass/], [/Steel/, /DANGER/]],
    ['brass', [/needles/, /NOT brass/], [/holds lead/, /Steel/]],
    ['silver-steel', [/Steel chips/], [/beryllium/i, /needles/, /holds lead/]],
    ['beryllium-copper', [/DANGER, BERYLLIUM COPPER/, /0\.2 micrograms/], [/Make sure of the alloy/]],
    [
      'free-cutting-steel',
      [/Steel chips/, /tenths of a per cent of lead/],
      [/beryllium/i, /2 to 4 per cent/],
    ],
    ['acetal', [/Plastic melts/], [/beryllium/i, /lead/]],
    ['aluminium', [/Aluminium/], [/beryllium/i]],
    ['unobtainium', [/data sheet/, /beryllium/], [/needles/]],
  ])('for %s [29 CFR 1910.1024: beryllium copper, not brass]', (material, holds, lacks) => {
    const lines = joined(cautions({ ...facts, material }, desk));
    for (const pattern of holds) {
      expect(lines).toMatch(pattern);
    }
    for (const pattern of lacks) {
      expect(lines).not.toMatch(pattern);
    }
  });
});
