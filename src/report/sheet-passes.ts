/** The plate of the work, the programs, the passes with speed, feed, depth and time, and where the figures come from. */
import { millimetresPer } from '../base/units.ts';
import { drawWork } from './draw-work.ts';
import { jobText } from './job-text.ts';
import type { SheetFacts, SheetPass } from './facts.ts';
import { bareLength, shortUnit, unitInWords } from './lengths.ts';
import { scaleWords } from './plate.ts';
import { plateFigure } from './plate-numbers.ts';
import { head, scroll } from './table-parts.ts';
import { capitalised, escapeText, fixed, inMinutes, numeral, numeralList, plain } from './words.ts';

export function passesSection(facts: SheetFacts): string {
  return facts.passes.length === 0
    ? ''
    : `<section>\n<h2>${facts.programs.length === 0 ? 'Passes that were planned' : 'Programs and passes'}</h2>\n${programsTable(facts)}${workPlate(facts)}${passesTable(facts)}${reasons(facts)}</section>`;
}

function programsTable(facts: SheetFacts): string {
  if (facts.programs.length === 0) {
    return '';
  }
  const rows = facts.programs.map(
    (program, i) =>
      `<tr><th scope="row" class="n">${i + 1}</th><td class="mark">${escapeText(program.file)}</td><td>${program.cutters.join(', ')}</td>` +
      `<td>${unitInWords(program.units)}</td><td class="n">${program.blocks}</td><td class="n">${inMinutes(program.seconds)}</td><td class="mark">${program.sha256.slice(0, 12)}</td></tr>`,
  );
  const walk =
    facts.walkFile === undefined
      ? ''
      : `<tr><td></td><td class="mark">${escapeText(facts.walkFile)}</td><td colspan="5">before all others: round the work and over what stands in the way, high up, spindle still</td></tr>`;
  return (
    scroll('programs', 'whole') +
    '<table>\n<caption>Programs, in the order they are run.</caption>\n<thead><tr>' +
    head(['', 'file', 'cutter', 'written in', 'blocks', 'time<br>min', 'SHA-256 begins'], [4, 5]) +
    `</tr></thead>\n<tbody>${walk}${rows.join('\n')}</tbody>\n</table></div>\n`
  );
}

function workPlate(facts: SheetFacts): string {
  const { svg, scale } = drawWork(facts, 'elsewhere');
  return plateFigure(
    facts,
    'work',
    svg,
    `The work, ${scaleWords(scale)} on A4: the wheel in its stock, the channels the cutters clear, and the paths of their centres in the last lap of each pass, ` +
      'grey where they rough, blue where they finish. Round it the minutes, clockwise from twelve; each pass is a chapter, as long as it takes. Tooth 1 is marked; teeth are counted counter-clockwise.',
  );
}

function passesTable(facts: SheetFacts): string {
  const unit = shortUnit(facts.job.length);
  const total = facts.passes.reduce((sum, pass) => sum + pass.seconds, 0);
  return (
    scroll('passes', 'whole') +
    '<table>\n<caption>Passes.</caption>\n<thead><tr>' +
    head(
      [
        '',
        'pass',
        'cutter',
        'spindle<br>1/min',
        `feed<br>${unit}/min`,
        `down<br>${unit}/min`,
        `a lap<br>${unit}`,
        'laps',
        `to Z<br>${unit}`,
        'time<br>min',
      ],
      [3, 4, 5, 6, 7, 8, 9],
    ) +
    `</tr></thead>\n<tbody>${facts.passes.map((pass, i) => passRow(facts, pass, i)).join('\n')}</tbody>\n` +
    `<tfoot><tr><td></td><td colspan="8">all passes</td><td class="n" data-figure="seconds" data-value="${fixed(total, 3)}">${inMinutes(total)}</td></tr></tfoot>\n</table></div>\n` +
    '<p class="soft note">Down: the feed on the way down. A lap: once round, and how much deeper at most; where a hole is cleared in rings, each ring makes its own count of laps. Times are reckoned with the acceleration in the machine file; what hands do comes on top.</p>\n'
  );
}

function passRow({ job }: SheetFacts, pass: SheetPass, i: number): string {
  const rate = (feed: number): string =>
    plain(feed / millimetresPer(job.length), job.length === 'mm' ? 0 : 2);
  const length = (mm: number): string => bareLength(mm, job.length);
  return (
    `<tr><th scope="row">${numeral(i + 1)}</th><td>${escapeText(capitalised(pass.name))}</td><td>${pass.cutter}</td>` +
    `<td class="n">${plain(pass.speed, 0)}</td><td class="n">${rate(pass.feed)}</td><td class="n">${rate(pass.plunge)}</td>` +
    `<td class="n">${length(pass.step)}</td><td class="n">${lapsWords(pass.laps)}</td><td class="n">${length(pass.depth)}</td><td class="n">${inMinutes(pass.seconds)}</td></tr>`
  );
}

function lapsWords([least, most]: SheetPass['laps']): string {
  return least === most ? String(most) : `${least}–${most}`;
}

/** Each sentence once, with the passes it holds for; sentences of the same passes together. */
function reasons({ passes, job }: SheetFacts): string {
  const holds = new Map<string, number[]>();
  passes.forEach((pass, i) => {
    for (const why of pass.why) {
      holds.set(why, [...(holds.get(why) ?? []), i + 1]);
    }
  });
  const together = new Map<string, string[]>();
  for (const [why, numbers] of holds) {
    const key = numeralList(numbers);
    together.set(key, [...(together.get(key) ?? []), why]);
  }
  const items = [...together].map(
    ([numbers, whys]) =>
      `<div><dt>${numbers}</dt> <dd>${escapeText(capitalised(jobText(whys.join('; '), job.length)))}.</dd></div>`,
  );
  return items.length === 0
    ? ''
    : `<h3>Where these figures come from</h3>\n<dl class="whys">${items.join('\n')}</dl>\n`;
}
