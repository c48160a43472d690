/** What to measure on the first-off, with room to write the reading beside it, and what a difference means. */
import { boreCut } from '../job/target-of-job.ts';
import { overTips, SPAN_SENSITIVITY, toothChord } from '../tooth/span.ts';
import { spansOf } from './draw-jaws.ts';
import type { SheetFacts } from './facts.ts';
import { lengthBoth, lengthOnly } from './lengths.ts';
import { head, scroll } from './table-parts.ts';
import { fixed } from './words.ts';

export function measureSection(facts: SheetFacts): string {
  const rows = [
    ...tipRows(facts),
    ...spanRows(facts),
    ...boreRows(facts),
    ...chordRows(facts),
    thicknessRow(facts),
  ].join('\n');
  const example = lengthBoth(0.01, facts.job.length);
  return (
    '<section class="whole">\n<h2>Measure on the first-off</h2>\n<p>Take the burr off first, and measure while the wheel is still held if you can, spindle still. ' +
    `The span over teeth tells what the cutter really cuts, whatever the form of the teeth: ${example} more than it should read is half of that left on every flank, and a cutter that cuts ${example} narrower than the job says.</p>\n` +
    `${scroll('sizes to measure')}<table class="measures">\n<thead><tr>${head(['size', 'should read', 'read', 'how'], [1])}</tr></thead>\n` +
    `<tbody>${rows}</tbody>\n</table></div>\n` +
    '<p class="soft record">Cut on <span class="rule"></span> by <span class="rule"></span> in the plates it runs <span class="rule"></span></p>\n</section>'
  );
}

function row({ job }: SheetFacts, name: string, value: number, figure: string, how: string): string {
  return `<tr><th scope="row">${name}</th><td class="n" data-figure="${figure}" data-value="${fixed(value, 6)}">${lengthBoth(value, job.length)}</td><td class="blank"></td><td>${how}</td></tr>`;
}

function tipRows(facts: SheetFacts): readonly string[] {
  const { shape } = facts.job.setup;
  const tips = overTips(facts.form, shape.kind === 'disc' ? shape.diameter : undefined);
  const how =
    facts.form.proportions.teeth % 2 === 1
      ? `Flat jaws, the largest reading as they turn; an odd count reads less than the tip circle, ${lengthOnly(tips.diameter, facts.job.length)}.`
      : 'Flat jaws over two opposite tips.';
  const turned =
    shape.kind === 'disc'
      ? ` The tips are not cut: what they read is what the disc was turned to, ${lengthOnly(shape.diameter, facts.job.length)} by the job, where the form has ${lengthOnly(2 * facts.form.outsideRadius, facts.job.length)}.`
      : '';
  return [row(facts, 'over the tips', tips.most, 'tip', how + turned)];
}

function spanRows(facts: SheetFacts): readonly string[] {
  return spansOf(facts.form).map((span) =>
    row(
      facts,
      `over ${span.teeth} teeth`,
      span.reading,
      `span-${span.teeth}`,
      `Flat jaws; they touch ${lengthOnly(span.height, facts.job.length)} above the pitch circle. Reads ${SPAN_SENSITIVITY} times the error of a flank.`,
    ),
  );
}

function boreRows(facts: SheetFacts): readonly string[] {
  const { wheel, setup, length } = facts.job;
  if (wheel.bore <= 0) {
    return [];
  }
  const bore = boreCut(facts.job);
  const how =
    setup.bored >= bore
      ? 'Pin gauge; the hole was there before and is not cut.'
      : bore < wheel.bore
        ? `Pin gauge; ${lengthOnly(wheel.bore - bore, length)} on the diameter is left for broach or reamer, the finished bore is ${lengthOnly(wheel.bore, length)}.`
        : 'Pin gauge, from both faces.';
  return [row(facts, 'bore', bore, 'bore', how)];
}

function chordRows(facts: SheetFacts): readonly string[] {
  const chord = toothChord(facts.form);
  return [
    row(
      facts,
      'one tooth',
      chord.thickness,
      'chord',
      `Straight across at the pitch circle, ${lengthOnly(chord.height, facts.job.length)} below the tip; for those with a projector.`,
    ),
  ];
}

function thicknessRow(facts: SheetFacts): string {
  return row(
    facts,
    'plate',
    facts.job.wheel.thickness,
    'thickness-read',
    'Thickness, clear of burr and glue.',
  );
}
