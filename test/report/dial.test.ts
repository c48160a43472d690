import { describe, expect, it } from 'vitest';
import { drawDial } from '../../src/report/dial.ts';
import type { SheetPass } from '../../src/report/facts.ts';
import { attributeOf } from '../support/svg-read.ts';

function pass(name: string, seconds: number): SheetPass {
  return {
    name,
    seconds,
    cutter: 1,
    speed: 1,
    feed: 1,
    plunge: 1,
    step: 1,
    laps: [1, 1],
    depth: -1,
    why: [],
  };
}

/** Clockwise from twelve, in turns. */
function turnsAt(x: number, y: number): number {
  return (Math.atan2(x, -y) / (2 * Math.PI) + 1) % 1;
}

function chaptersOf(svg: string): { seconds: number; from: number; to: number }[] {
  return [...svg.matchAll(/<path class="chapter[^>]*>/g)].map(([tag]) => {
    const d = attributeOf(tag, 'd');
    const start = /^M(-?[\d.]+),(-?[\d.]+)/.exec(d);
    const end = /^M[^A]*A[^,]+,[^,]+,0,[01],1,(-?[\d.]+),(-?[\d.]+)/.exec(d);
    return {
      seconds: Number(attributeOf(tag, 'data-seconds')),
      from: turnsAt(Number(start?.[1]), Number(start?.[2])),
      to: turnsAt(Number(end?.[1]), Number(end?.[2])),
    };
  });
}

const PASSES = [
  pass('bore', 70),
  pass('bore finishing', 4),
  pass('bay', 30),
  pass('roughing', 1300),
  pass('finishing', 58),
  pass('spring', 58),
  pass('crossings', 1000),
  pass('crossings finishing', 3),
];

describe('the dial', () => {
  it('begins at twelve, runs clockwise, and gives each pass its share of the time', () => {
    const total = PASSES.reduce((sum, { seconds }) => sum + seconds, 0);
    let spent = 0;
    const chapters = chaptersOf(drawDial(PASSES, 50));
    expect(chapters.length).toBe(PASSES.length);
    chapters.forEach(({ seconds, from, to }, i) => {
      expect(seconds).toBeCloseTo(PASSES[i]?.seconds ?? 0, 3);
      expect(from).toBeCloseTo(spent / total, 4);
      spent += seconds;
      expect(Math.abs(to - spent / total) % 1).toBeLessThan(1e-4);
    });
  });

  it('sets no numeral on another, however small the chapters', () => {
    const small = Array.from({ length: 9 }, (_, i) => pass(`pass ${i}`, i === 4 ? 3000 : 1 + i));
    for (const passes of [PASSES, small]) {
      const places = [...drawDial(passes, 50).matchAll(/<text class="numeral"[^>]*>([IVX]+)<\/text>/g)].map(
        ([tag, text = '']) => {
          const moved = /translate\((-?[\d.]+) (-?[\d.]+)\)/.exec(tag);
          const x = Number(moved?.[1] ?? attributeOf(tag, 'x'));
          const y = Number(moved?.[2] ?? attributeOf(tag, 'y'));
          return { x, y, half: text.length * 0.75 };
        },
      );
      expect(places.length).toBe(passes.length);
      places.forEach((a, i) => {
        for (const b of places.slice(i + 1)) {
          const apart = Math.abs(a.x - b.x) > a.half + b.half || Math.abs(a.y - b.y) > 2.5;
          expect(apart).toBe(true);
        }
      });
    }
  });

  it('is nothing where no time is spent', () => {
    expect(drawDial([], 50)).toBe('');
  });

  it('escapes the names of passes', () => {
    expect(drawDial([pass('<b>', 5)], 50)).toContain('&lt;b&gt;');
  });
});
