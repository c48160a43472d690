/** What to measure on the first-off, with room to write the reading beside it. */
import { bestSpan, overTips, SPAN_SENSITIVITY, spanOver, toothChord } from '../tooth/span.ts';
import type { SheetFacts } from './facts.ts';
import { bothUnits, fixed, millimetres } from './words.ts';

export function measureSection(facts: SheetFacts): string {
  const rows = [...tipRows(facts), ...spanRows(facts), ...boreRows(facts), ...chordRows(facts)].join('\n');
  return (
    '<section>\n<h2>Measure on the first-off</h2>\n<p>Deburr first, and measure before the wheel leaves its holding if you can. ' +
    `A cutter that cuts wide or narrow shows twice in the span over teeth, whatever the tooth form: half the difference is the error of each flank.</p>\n` +
    '<div class="scroll"><table>\n<thead><tr><th>size</th><th class="n">should read</th><th>read</th><th>how</th></tr></thead>\n' +
    `<tbody>${rows}</tbody>\n</table></div>\n</section>`
  );
}

function row(name: string, value: number, figure: string, how: string): string {
  return `<tr><td>${name}</td><td class="n" data-figure="${figure}" data-value="${fixed(value, 6)}">${bothUnits(value)}</td><td class="blank"></td><td>${how}</td></tr>`;
}

function tipRows({ form }: SheetFacts): readonly string[] {
  const tips = overTips(form);
  const odd = form.proportions.teeth % 2 === 1;
  const how = odd
    ? `Flat jaws, the largest reading as they turn; an odd count reads less than the tip circle, ${millimetres(tips.diameter)}.`
    : 'Flat jaws over two opposite tips.';
  return [row('over the tips', tips.most, 'tip', how)];
}

function spanRows({ form }: SheetFacts): readonly string[] {
  const best = bestSpan(form);
  if (best === undefined) {
    return [];
  }
  const next = spanOver(form, best.teeth + 1);
  return [best, ...(next === undefined ? [] : [next])].map((span) =>
    row(
      `over ${span.teeth} teeth`,
      span.reading,
      `span-${span.teeth}`,
      `Flat jaws touch the flanks ${millimetres(span.height, 2)} above the pitch circle; ${SPAN_SENSITIVITY} times the error of one flank shows.`,
    ),
  );
}

function boreRows({ job }: SheetFacts): readonly string[] {
  const bore = job.wheel.bore - 2 * job.cuts.bore.leave;
  if (job.wheel.bore <= 0) {
    return [];
  }
  const left =
    job.cuts.bore.leave > 0
      ? `Pin gauge; ${millimetres(job.cuts.bore.leave)} a side is left for the broach, the finished bore is ${millimetres(job.wheel.bore)}.`
      : 'Pin gauge, entering from both faces.';
  return [row('bore', bore, 'bore', left)];
}

function chordRows({ form }: SheetFacts): readonly string[] {
  const chord = toothChord(form);
  return [
    row(
      'tooth thickness',
      chord.thickness,
      'chord',
      `Straight across at the pitch circle, ${millimetres(chord.height)} below the tip; for those with a projector.`,
    ),
  ];
}
