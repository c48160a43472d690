import { describe, expect, it } from 'vitest';
import type { Machine } from '../../src/machine/machine.ts';
import type { Belongs, Step } from '../../src/motion/motion.ts';
import { postMotions } from '../../src/post/post-motions.ts';
import { writeProgram } from '../../src/post/write-program.ts';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { headerFacts } from '../support/header-facts.ts';
import { changedMachine, MACHINE_NAMES, postMachine } from '../support/post-machines.ts';
import { writeOne } from '../support/post-text.ts';

/** Less a tenth of the last digit of an inch: 5 mm is no whole number of them. */
const CLEAR = 5 - 0.0001;
const bench = postMachine('bench-mill');
const machines: readonly (readonly [string, Machine])[] = MACHINE_NAMES.map((name) => [
  name,
  postMachine(name),
]);

function blocks(text: string): string[] {
  return text.split(/\r?\n/).filter((line) => line !== '' && !/^[(;%O]/.test(line));
}

describe.each(machines)('%s', (_, machine) => {
  const programs = postMotions(machine).map(({ motion }) => writeOne(machine, motion).text);
  const traces = programs.map((text) => traceProgram('trial', text, machine, { cutter: 1 }));

  it('reads back whole', () => {
    for (const trace of traces) {
      expect(trace.findings.filter(({ severity }) => severity === 'error')).toEqual([]);
      expect(trace.complete).toBe(true);
    }
  });

  it('goes nowhere below the clear height between a change or stop and the first move across', () => {
    for (const trace of traces) {
      for (const event of trace.events.filter(({ kind }) => kind === 'cutter' || kind === 'stop')) {
        const after = trace.moves.slice(event.before);
        const across = after.findIndex(({ from, to }) => from.x !== to.x || from.y !== to.y);
        expect(after.slice(0, across + 1).every(({ to }) => to.z === null || to.z >= CLEAR)).toBe(true);
      }
    }
  });

  it('takes up the length of the new cutter before it moves, where it has length offsets', () => {
    for (const text of programs) {
      const lines = blocks(text);
      lines.forEach((line, i) => {
        if (/M0?6\b/.test(line) && machine.words.cutters.lengthOffset === 'G43-H') {
          const next = lines.slice(i + 1).findIndex((each) => /[XYZ]/.test(each) && !/G53|G28/.test(each));
          expect(lines.slice(i + 1, i + 1 + next).some((each) => /G43/.test(each))).toBe(true);
        }
      });
    }
  });

  it('cuts with the spindle on, moves fast below the clear height in Z only, and ends still and up', () => {
    for (const trace of traces) {
      for (const move of trace.moves) {
        const low = Math.min(move.from.z ?? Infinity, move.to.z ?? Infinity) < CLEAR;
        if (move.kind === 'rapid') {
          expect(low && (move.from.x !== move.to.x || move.from.y !== move.to.y)).toBe(false);
        } else {
          expect(low && move.spindle === 0).toBe(false);
        }
      }
      const last = trace.moves.at(-1);
      expect(last?.to.z === null || (last?.to.z ?? 0) >= CLEAR).toBe(true);
      expect(trace.events.filter(({ kind }) => kind === 'spindle').at(-1)).toMatchObject({ speed: 0 });
    }
  });
});

it('writes all modes again after hands were at the machine, units among them, so that a person can begin there', () => {
  for (const [, machine] of machines) {
    const stop = postMotions(machine).find(({ name }) => name === 'changes');
    if (stop === undefined) {
      continue;
    }
    const lines = blocks(writeOne(machine, stop.motion).text);
    const unit = machine.units === 'mm' ? machine.words.modes.millimetreWord : machine.words.modes.inchWord;
    lines.forEach((line, i) => {
      // After the last stop nothing moves: there is nothing to begin.
      if (/M0?0$/.test(line) && lines.slice(i + 1).some((each) => /[XYZ]-?[.\d]/.test(each))) {
        expect(lines.slice(i + 1, i + 12).join(' ')).toContain(unit);
      }
    });
  }
});

it('goes to the top before the spindle turns again, as hands may have left the cutter low', () => {
  const stop = postMotions(bench).find(({ name }) => name === 'changes');
  const lines = blocks(writeOne(bench, stop?.motion ?? { steps: [] }).text);
  const stopped = lines.findIndex((line) => line === 'M0');
  const after = lines.slice(stopped + 1);
  expect(stopped).toBeGreaterThan(0);
  expect(after.findIndex((line) => line.startsWith('G53 G0 Z'))).toBeLessThan(after.indexOf('M3'));
  expect(after.findIndex((line) => line.startsWith('G53 G0 Z'))).toBeGreaterThanOrEqual(0);
});

it('asks for the cutter to be raised where the machine has no top of its own', () => {
  const machine = postMachine('lines-only');
  const stop = postMotions(machine).find(({ name }) => name === 'changes');
  expect(writeOne(machine, stop?.motion ?? { steps: [] }).text).toMatch(
    /RAISE THE CUTTER TO HEIGHT 5\.000 MM OR\r\n;ABOVE, OVER A FREE PLACE\r\nM00/,
  );
});

it('divides the program where pass, lap or tooth change, and only there', () => {
  const at = (x: number, belongs: Belongs): Step => ({
    kind: 'line',
    to: { x, y: 0, z: -0.2 },
    feed: 100,
    belongs,
  });
  const lap = { pass: 'roughing', lap: 2, laps: 5, depth: -0.2 };
  const steps: Step[] = [
    { kind: 'rapid', to: { x: 0, y: 0, z: 5 } },
    at(1, lap),
    at(2, { ...lap }),
    at(3, { ...lap, tooth: 7 }),
    at(4, { pass: 'spring', tooth: 7 }),
  ];
  const text = writeOne(bench, { steps }).text;
  const from = text.indexOf('(End of the cautions)');
  expect(
    text
      .slice(from)
      .match(/^\(.*\)$/gm)
      ?.slice(1),
  ).toEqual([
    '(Roughing, lap 2 of 5, down to height -0.200 mm)',
    '(Roughing, lap 2 of 5, down to height -0.200 mm, tooth 7)',
    '(Spring, tooth 7)',
  ]);
});

describe('what the machine file has no words for is refused, not left out', () => {
  const up: Step = { kind: 'rapid', to: { x: 0, y: 0, z: 5 } };
  const cases: readonly (readonly [string, Machine, readonly Step[], RegExp])[] = [
    [
      'a second cutter on a machine of one program a cutter',
      postMachine('desk-three-axis'),
      [
        { kind: 'cutter', number: 1, say: [] },
        { kind: 'cutter', number: 2, say: [] },
      ],
      /one program a cutter/,
    ],
    [
      'a wait without a word',
      changedMachine(bench, { dwell: { letter: 'none' } }),
      [{ kind: 'dwell', seconds: 1 }],
      /no word for a wait/,
    ],
    ['a cutter number above the highest', bench, [{ kind: 'cutter', number: 21, say: [] }], /above 20/],
    [
      'a change without words',
      changedMachine(bench, { cutters: { words: 'none' } }),
      [{ kind: 'cutter', number: 1, say: [] }],
      /no words for it/,
    ],
    [
      'a length beyond the largest value',
      bench,
      [{ kind: 'rapid', to: { x: 200000, y: 0, z: 5 } }],
      /beyond the largest value/,
    ],
    [
      'a feed that rounds to nothing',
      bench,
      [up, { kind: 'line', to: { x: 1, y: 0, z: 5 }, feed: 0.001 }],
      /rounds to nothing/,
    ],
    [
      'a feed move after a stop',
      bench,
      [up, { kind: 'stop', say: [] }, { kind: 'line', to: { x: 1, y: 0, z: 5 }, feed: 100 }],
      /not known to stand/,
    ],
    [
      'a line longer than the controller holds',
      changedMachine(bench, { file: { lineLongest: 16 } }),
      [up, { kind: 'line', to: { x: 100, y: 100, z: 100 }, feed: 100 }],
      /characters/,
    ],
    [
      'more bytes than the controller holds',
      changedMachine(bench, { file: { fileLargest: 500 } }),
      [up],
      /holds 500/,
    ],
    [
      'a label that is reserved',
      changedMachine(bench, {
        file: { programLabel: 'o-number', labelDigits: 4, labelLowest: 1000, labelHighest: 7999 },
      }),
      [up],
      /between 1000 and 7999/,
    ],
    [
      'a banned character that the form itself needs',
      changedMachine(bench, { file: { bannedCharacters: '%' } }),
      [up],
      /bans/,
    ],
  ];
  it.each(cases)('%s', (_, machine, steps, message) => {
    const motion = { steps };
    const outcome = writeProgram({
      machine,
      name: 'a',
      suffix: '',
      label: 1,
      motion,
      header: headerFacts(motion),
    });
    expect(outcome.ok).toBe(false);
    expect(outcome.problems.map((problem) => problem.code)).toEqual(['post.cannot-say']);
    expect(outcome.problems[0]?.message).toMatch(message);
  });

  it('puts the feed in a block of its own before it gives up a line', () => {
    const machine = changedMachine(bench, { file: { lineLongest: 35 } });
    const motion: { steps: Step[] } = {
      steps: [up, { kind: 'line', to: { x: 10, y: 10, z: 4 }, feed: 100 }],
    };
    expect(writeOne(machine, motion).text).toMatch(/^F100\.00\nG1 X10\.0000 Y10\.0000 Z4\.0000$/m);
  });
});
