/** Drilling cycles beside those of the table of cases. The order of G84 to G89 is NISTIR 6556 §3.5.16.5 to .9, by memory. */
import { describe, expect, it } from 'vitest';
import { MOST_MADE, MOST_PECKS } from '../../src/prove/bounds.ts';
import { movesOf, post, traceLines } from '../support/bench-program.ts';
import { expectStop } from '../support/case-row.ts';
import { reportMill } from '../support/report-mill.ts';

const machine = reportMill();

/** Heights of the moves with F or R before them, and what happens between, in order. */
function story(lines: readonly string[], on = machine): string {
  const trace = traceLines({ machine: on, at: 'X0 Y0 Z5', lines: ['S500 M3', ...lines] });
  expect(trace.findings).toEqual([]);
  return trace.moves
    .flatMap((move, i) => [
      ...trace.events.filter(({ before, line }) => before === i && line > 6).map(tell),
      ...(move.line > 6 ? [`${move.kind === 'line' ? 'F' : 'R'}${String(move.to.z)}`] : []),
    ])
    .concat(trace.events.filter(({ before }) => before === trace.moves.length).map(tell))
    .filter((text) => text !== 'end')
    .join(' ');
}

function tell(event: ReturnType<typeof traceLines>['events'][number]): string {
  return event.kind === 'spindle' ? `S${String(event.speed)}` : event.kind;
}

describe('what a cycle does in its hole', () => {
  it.each([
    ['G98 G84 X0 Z-1 R2', 'R2 F-1 S-500 F5 S500'],
    ['G98 G85 X0 Z-1 R2', 'R2 F-1 F5'],
    ['G98 G86 X0 Z-1 R2 P1', 'R2 F-1 dwell S0 R5 S500'],
    ['G98 G88 X0 Z-1 R2 P1', 'R2 F-1 dwell S0 stop S500'],
    ['G98 G89 X0 Z-1 R2 P1', 'R2 F-1 dwell F5'],
    ['G99 G81 X0 Z-1 R2 L2', 'R2 F-1 R2 F-1 R2'],
    ['G98 G81 X0 Z6 R7', 'R7 F6 R7'],
  ])('%s: %s', (line, expected) => expect(story([line])).toBe(expected));

  it('breaks the chip in the hole where the machine has G73 [published reference of a NIST-descended controller]', () => {
    const holes = { ...machine.words.holes, cycles: ['G73'] } as const;
    const has = { ...machine, words: { ...machine.words, holes } };
    expect(story(['G98 G73 X0 Z-3 R2 Q2'], has)).toBe('R2 F0 R0.254 F-2 R-1.746 F-3 R5');
    expectStop({ n: 0, ref: '' }, 'G73 X0 Z-3 R2 Q2');
  });

  it('counts R from the level before where the machine file says so', () => {
    const holes = { ...machine.words.holes, clearMeaning: 'from-start-level' } as const;
    expect(story(['G98 G81 X0 Z-1 R-3'], { ...machine, words: { ...machine.words, holes } })).toBe(
      'R2 F-1 R5',
    );
  });

  it('takes thousandths of a second where the machine does', () => {
    const dwell = { ...machine.words.dwell, unit: 'milliseconds' } as const;
    const trace = traceLines({
      machine: { ...machine, words: { ...machine.words, dwell } },
      at: 'X0 Y0 Z5',
      lines: ['G98 G82 X0 Z-1 R2 P500'],
    });
    expect(trace.events).toContainEqual(expect.objectContaining({ kind: 'dwell', seconds: 0.5 }));
  });
});

it('comes out as far as is in force when the controller is switched on, and says that nothing has said so', () => {
  const modes = { ...machine.words.modes, powerOn: ['G99'] };
  const on = { ...machine, words: { ...machine.words, modes } };
  const trace = traceLines({ machine: on, at: 'X0 Y0 Z5', lines: ['G81 X0 Z-1 R2'] });
  expect(trace.moves.at(-1)?.to.z).toBe(2);
  expect(trace.findings.map(({ code }) => code)).toEqual(['prove.assumed']);
});

it('steps anew for the next hole under G91, and says that others do not [NISTIR 6556 §3.5.16, by memory]', () => {
  const trace = traceLines({ machine, at: 'X0 Y0 Z5', lines: ['G91 G98 G81 X1 Z-3 R1', 'X1', 'G90'] });
  expect(movesOf(trace).map(({ to }) => `${String(to.x)} ${String(to.z)}`)).toEqual([
    '0 6',
    '1 6',
    '1 3',
    '1 6',
    '1 7',
    '2 7',
    '2 4',
    '2 7',
  ]);
  expect(trace.findings.map(({ code }) => code)).toEqual(['prove.ambiguous']);
});

describe('cycles that are not run', () => {
  it.each([
    ['before G98 or G99 is said', [], 'G81 X0 Z-1 R2', /G98/],
    ['in another plane', ['G98 G18'], 'G81 X0 Z-1 R2', /XZ/],
    ['tapping without the spindle', ['G98'], 'G84 X0 Z-1 R2', /clockwise/],
    ['boring without the spindle', ['G98'], 'G86 X0 Z-1 R2 P1', /turn/],
    ['from a height that is not known', ['G98', 'G53 G0 Z0'], 'G81 X0 Z-1 R2', /height/],
    ['back boring', ['G98'], 'G87 X0 Z-1 R2', /back boring/],
    ['after another cycle, without its own Z', ['G98', 'G81 X0 Z-1 R2'], 'G85 X5', /without/],
    ['after G80, without R and Z', ['G98', 'G81 X0 Z-1 R2', 'G80'], 'G81 X5', /without/],
    ['where controllers come out to different heights', ['G0 Z5', 'G99 G81 X0 Z-1 R2'], 'G98 X5', /differ/],
    ['with a height that was a place and would be a step', ['G0 Z5', 'G98 G81 X0 Z-1 R2'], 'G91 X5', /G91/],
    ['more pecks than anybody drills', ['G98'], `G83 X0 Z-3 R2 Q${String(4 / MOST_PECKS)}`, /times/],
    ['a peck of nothing', ['G98'], 'G83 X0 Z-3 R2 Q0.00000000000000000001', /times/],
    ['without end', ['G98'], 'G81 X0 Z-1 R2 L99999999', /times/],
  ])('%s', (_, before, line, says) => expectStop({ n: 0, ref: '', before, says }, line));

  it('a program of them that would fill the memory', () => {
    const pecks = MOST_PECKS / 2;
    const line = `G83 X0 Z-3 R2 Q${String(5 / pecks)}`;
    const trace = traceLines({ machine, lines: ['G98', ...Array.from({ length: 100 }, () => line)] });
    expect(trace.complete).toBe(false);
    expect(trace.moves.length).toBeLessThanOrEqual(MOST_MADE);
  });

  it('on a machine that has none [the file of the desk mill]', () => {
    const desk = post('desk-three-axis');
    const lines = ['(CUTTER 1)', 'G21 G90 G94 G17 G54', 'G0 X0 Y0 Z5', 'G81 X0 Z-1 R2 F100', 'M2'];
    expect(desk.words.holes.cycles).toEqual([]);
    const trace = traceLines({ machine: desk, lines });
    expect(trace.complete).toBe(false);
  });
});

it('a hole of a cycle is drilled as the same moves written out', () => {
  const cycle = ['G98 G81 X1 Y1 Z-1 R2', 'X3', 'G0 X0'];
  const moves = ['G0 X1 Y1', 'Z2', 'G1 Z-1', 'G0 Z5', 'X3', 'Z2', 'G1 Z-1', 'G0 Z5', 'X0'];
  const made = (lines: readonly string[]): unknown =>
    movesOf(traceLines({ machine, at: 'X0 Y0 Z5', lines })).map((move) => ({ ...move, line: 0 }));
  expect(made(cycle)).toEqual(made(moves));
});
