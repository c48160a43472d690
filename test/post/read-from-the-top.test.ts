/** Whole programs read from the top by the person who runs them: what they are told, and in which order things happen. */
import { describe, expect, it } from 'vitest';
import { refusedText } from '../../src/flow/refused-text.ts';
import { traceProgram } from '../../src/prove/trace-program.ts';
import { cutText, MACHINES, onMachine, sampleText } from '../support/cut-text.ts';
import { postMachine } from '../support/post-machines.ts';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';

const SMALL = readFileSync(join(import.meta.dirname, '../golden/small-wheel.yaml'), 'utf8');

interface Written {
  readonly name: string;
  readonly text: string;
  /** Comments run together, their marks gone. */
  readonly said: string;
  readonly lines: readonly string[];
}

const THIRD: Written[] = [];
const KNOWN = new Map<string, readonly Written[]>();

function programs(machine: string): readonly Written[] {
  const known = KNOWN.get(machine) ?? written('small-wheel', onMachine(SMALL, machine));
  KNOWN.set(machine, known);
  return known;
}

function written(name: string, job: string): readonly Written[] {
  return cutText(name, job)
    .files.filter(({ runnable }) => runnable)
    .map(({ name: file, text }) => {
      const lines = text.trim().split(/\r?\n/);
      const said = lines
        .filter((line) => /^[(;]/.test(line))
        .map((line) => line.replace(/^[(;](MSG,)?|\)$/g, ''))
        .join(' ');
      return { name: file, text, said, lines };
    });
}

function cutting(machine: string): readonly Written[] {
  return programs(machine).filter(({ name }) => !name.includes('-walk'));
}

function walk(machine: string): Written {
  return programs(machine).find(({ name }) => name.includes('-walk')) as Written;
}

const moves = (line: string): boolean => /^[^(;%]*[XYZ]-?[.\d]/.test(line);
const stops = (line: string): boolean => /^(N\d+ ?)?M0?0$/.test(line);

describe('stops for hands over the work, with the spindle turning', () => {
  it.each(MACHINES)('%s: each stop stands high and aside', (name) => {
    const machine = postMachine(name);
    for (const { name: file, text } of programs(name)) {
      const trace = traceProgram(file, text, machine, { cutter: 1 });
      for (const event of trace.events.filter(({ kind }) => kind === 'stop')) {
        const before = trace.moves[event.before - 1];
        // Before the first move the head of the program says where the cutter is parked.
        expect(before?.to.z ?? 20).toBeGreaterThan(19.9);
        expect(before?.to.x ?? -8).toBeCloseTo(-8, 3);
        expect(before?.to.y ?? 7).toBeCloseTo(7, 3);
      }
    }
  });

  it('lines-only: one stop asks for all of a change: off, fit, touch off', () => {
    const [program] = cutting('lines-only');
    expect(program?.said).toMatch(
      /CUTTER 2 SWITCH THE SPINDLE OFF FIT IT - IT CUTS 0\.800 MM WIDE.*?TOUCH OFF ITS HEIGHT/,
    );
    // Cutter 1, speed, cutter 2, speed, off.
    expect(program?.lines.filter(stops)).toHaveLength(5);
  });

  it.each(MACHINES)('%s: nothing moves after a last stop for the spindle', (name) => {
    for (const { lines } of cutting(name)) {
      const off = lines.findLastIndex((line) => /SWITCH THE SPINDLE OFF/i.test(line));
      expect(off < 0 ? [] : lines.slice(off).filter(moves)).toEqual([]);
    }
  });
});

describe('words that are not true of this machine', () => {
  it.each(MACHINES)('%s: height is touched off only where something stops for it', (name) => {
    const { change, lengthOffset } = postMachine(name).words.cutters;
    for (const { said } of cutting(name)) {
      if (change === 'automatic') {
        expect(said).not.toMatch(/touch off/i);
        expect(said).toMatch(lengthOffset === 'none' ? /length must be known/i : /under number 2/i);
      } else if (change === 'by-hand') {
        expect(said).toMatch(/cutter 1 (touch|fit it).*sticks out 15\.000 mm|sticks out 0\.5906 inch/i);
      }
    }
  });

  it.each(MACHINES)('%s: the walk claims no flank, and says how high it goes', (name) => {
    const { said } = walk(name);
    expect(said).not.toMatch(/flanks/i);
    expect(said).not.toMatch(/stays at the clear height/i);
    expect(said).toMatch(/goes round at height (5\.000 mm|0\.1969 inch), never below it/i);
  });

  it.each(MACHINES)('%s: nothing lies 0.00 behind the axis, and no alloy reads as a word', (name) => {
    for (const { said } of programs(name)) {
      expect(said).not.toMatch(/\b0\.0+ (mm|inch) (behind|in front|right|left)/i);
      expect(said).not.toMatch(/C=\d/);
    }
  });

  it('a wheel on its arbor: no pin into a hole that the arbor fills', () => {
    for (const { said } of written('disc-wheel', sampleText('disc-wheel'))) {
      expect(said).not.toMatch(/gauge or pin|round the hole/i);
      expect(said).toMatch(/dial gauge round the (rim|arbor)/i);
    }
  });

  it('an inch program names inches first', () => {
    expect(cutting('inch-bench-mill')[0]?.said).toMatch(/ANYTHING BUT 0\.3591 INCH/i);
  });
});

describe('needless moves', () => {
  it.each(MACHINES)('%s: no move down from the top only to go up to it again', (name) => {
    for (const { lines } of programs(name)) {
      const blocks = lines.filter((line) => !/^[(;]/.test(line));
      blocks.forEach((line, i) => {
        if (/G53 .*Z|G28 .*Z/.test(line)) {
          const before = blocks.slice(0, i).findLastIndex((each) => /Z/.test(each));
          const down = /^(N\d+ )?(G0?0 )?Z/.test(blocks[before] ?? '');
          const top = blocks.slice(0, before).findLastIndex((each) => /Z/.test(each));
          expect(down && /G53|G28/.test(blocks[top] ?? '')).toBe(false);
        }
      });
    }
  });

  it.each(MACHINES)('%s: the walk never changes height and place at once', (name) => {
    const trace = traceProgram('walk', walk(name).text, postMachine(name), { cutter: 1 });
    for (const { from, to } of trace.moves) {
      const across = (from.x ?? to.x) !== to.x || (from.y ?? to.y) !== to.y;
      expect(across && from.z !== null && from.z !== to.z).toBe(false);
    }
  });

  it.each(MACHINES)('%s: no two fast moves end to end straight down or up over one spot', (name) => {
    for (const { name: file, text } of cutting(name)) {
      const trace = traceProgram(file, text, postMachine(name), { cutter: 1 });
      const still = ({ from, to }: (typeof trace.moves)[number]): boolean =>
        from.x !== null && from.x === to.x && from.y === to.y && from.z !== null && to.z !== null;
      trace.moves.forEach((move, i) => {
        const before = trace.moves[i - 1];
        const both = move.kind === 'rapid' && before?.kind === 'rapid' && still(move) && still(before);
        const cut = trace.events.some(({ before: at }) => at === i);
        expect(both && !cut && move.from.z !== move.to.z && before.from.z !== before.to.z).toBe(false);
      });
    }
  });
});

describe('comments by which a person finds their place', () => {
  const third = (): readonly Written[] => (
    THIRD.length === 0 ? THIRD.push(...written('third-wheel', sampleText('third-wheel'))) : 0,
    THIRD
  );
  const comments = ({ lines }: Written): string[] => lines.filter((line) => line.startsWith('('));

  it('rings of a hole: none of two comments is the same, and none is bare', () => {
    for (const program of third()) {
      const rings = comments(program).filter(
        (line) => /^\((BORE|BAY)\b/.test(line) && !/FINISHING/.test(line),
      );
      expect(new Set(rings).size).toBe(rings.length);
      expect(
        rings.filter((line) => !/LAP \d+ OF \d+, DOWN TO HEIGHT/.test(line) && !/^\(BORE \d/.test(line)),
      ).toEqual([]);
    }
    expect(third().some(({ said }) => said.includes('BORE, RING 2 OF'))).toBe(true);
  });

  it('tooth 1 is announced once a lap, and once more where the lap closes', () => {
    for (const program of third()) {
      const teeth = comments(program).filter((line) =>
        /^\((ROUGHING|FINISHING).*TOOTH 1( AGAIN)?\)$/.test(line),
      );
      expect(new Set(teeth).size).toBe(teeth.length);
    }
    expect(third().some(({ said }) => said.includes('TOOTH 1 AGAIN'))).toBe(true);
  });

  it('mouths of a disc: one comment a tooth, with its levels', () => {
    const [program] = written('disc-wheel', sampleText('disc-wheel'));
    const mouths = comments(program as Written).filter((line) => line.startsWith('(MOUTHS'));
    expect(mouths).toHaveLength(72);
    expect(mouths[4]).toMatch(/^\(MOUTHS, TOOTH 5, IN \d+ LEVELS\)$/);
  });

  it('a level of a crossing: no way to the middle of the helix and straight back', () => {
    for (const { name, text } of third()) {
      const lines = traceProgram(name, text, postMachine('desk-three-axis'), { cutter: 1 }).moves;
      const back = lines.filter((move, i) => {
        const before = lines[i - 1];
        if (move.kind !== 'line' || before?.kind !== 'line') {
          return false;
        }
        const [a, b] = [before, move].map(({ from, to }) => ({
          x: (to.x ?? 0) - (from.x ?? 0),
          y: (to.y ?? 0) - (from.y ?? 0),
        })) as [{ x: number; y: number }, { x: number; y: number }];
        const long = Math.hypot(a.x, a.y) * Math.hypot(b.x, b.y);
        return long > 0 && (a.x * b.x + a.y * b.y) / long < -0.999;
      });
      expect(back).toEqual([]);
    }
  });
});

describe('figures nobody can set or tell apart', () => {
  // Where F counts along the circle under a helix, it has to follow the slope.
  const alongHelix = MACHINES.filter((name) => postMachine(name).words.path.helixFeedAlong === 'helix');
  it.each(alongHelix)('%s: no feed follows another that lies within a hundredth of it', (name) => {
    for (const { text, lines } of cutting(name)) {
      expect(text).toMatch(/F\d/);
      const feeds = lines
        .filter((line) => !/^[(;]/.test(line))
        .flatMap((line) => /F([\d.]+)/.exec(line)?.[1] ?? []);
      const close = feeds.map(Number).filter((feed, i, all) => {
        const before = all[i - 1] ?? 0;
        return feed !== before && Math.abs(feed - before) < 0.01 * feed;
      });
      expect(close).toEqual([]);
    }
  });

  it('a spindle run by hand is set to whole hundreds, and the head says the same', () => {
    const job = onMachine(SMALL, 'lines-only').replace(
      'bore: { cutter: 1 }',
      'bore: { cutter: 1, speed: 20050 }',
    );
    const [program] = written('small-wheel', job).filter(({ name }) => !name.includes('-walk'));
    expect(program?.said).toMatch(/SET THE SPINDLE TO 20000 TURNS A MINUTE/);
    expect(program?.said).not.toMatch(/20050/);
  });
});

it('a refused program parts what is wrong from what to do', () => {
  const text = refusedText([], {
    findings: [
      {
        code: 'prove.gouge',
        severity: 'error',
        file: 'a.nc',
        line: 3,
        message: 'tooth 4 is cut into',
        hint: 'Go out.',
      },
    ],
  });
  expect(text).toContain('a.nc:3: tooth 4 is cut into. Go out. [prove.gouge]');
});
