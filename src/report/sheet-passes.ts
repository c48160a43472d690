/** The passes in the order of the work, and the programs that hold them. */
import type { SheetFacts, SheetPass } from './facts.ts';
import { capitalised, duration, escapeText, fixed, numeral, plain } from './words.ts';

export function passesSection(facts: SheetFacts): string {
  if (facts.passes.length === 0) {
    return '';
  }
  const total = facts.passes.reduce((sum, pass) => sum + pass.seconds, 0);
  return (
    `<section>\n<h2>Programs and passes</h2>\n${programsTable(facts)}` +
    '<div class="scroll"><table>\n<caption>Passes. Times are reckoned with the acceleration in the machine file; stops for hands come on top.</caption>\n' +
    '<thead><tr><th></th><th>pass</th><th>cutter</th><th class="n">spindle<br>1/min</th><th class="n">feed<br>mm/min</th><th class="n">down<br>mm/min</th><th class="n">step<br>mm</th><th class="n">laps</th><th class="n">to Z<br>mm</th><th class="n">time</th></tr></thead>\n' +
    `<tbody>${facts.passes.map((pass, i) => passRow(facts, pass, i)).join('\n')}</tbody>\n` +
    `<tfoot><tr><td></td><td colspan="8">all passes</td><td class="n">${duration(total)}</td></tr></tfoot>\n</table></div>\n` +
    `${reasons(facts.passes)}</section>`
  );
}

function programsTable(facts: SheetFacts): string {
  const rows = facts.programs.map(
    (program) =>
      `<tr><td class="mark">${escapeText(program.file)}</td><td>${program.cutters.map((number) => cutterWords(facts, number)).join('; ')}</td>` +
      `<td>${program.units === 'mm' ? 'millimetres' : 'inches'}</td><td class="n">${program.blocks}</td><td class="n">${duration(program.seconds)}</td><td class="mark">${program.sha256.slice(0, 12)}</td></tr>`,
  );
  const walk =
    facts.walkFile === undefined
      ? ''
      : `<tr><td class="mark">${escapeText(facts.walkFile)}</td><td colspan="5">run this first: round the work and over what stands in the way, high up, spindle still</td></tr>`;
  return (
    '<div class="scroll"><table>\n<caption>Programs, in the order they are run.</caption>\n' +
    '<thead><tr><th>file</th><th>cutters</th><th>written in</th><th class="n">blocks</th><th class="n">time</th><th>SHA-256 begins</th></tr></thead>\n' +
    `<tbody>${walk}${rows.join('\n')}</tbody>\n</table></div>\n`
  );
}

function cutterWords(facts: SheetFacts, number: number): string {
  const cutter = facts.job.setup.cutters.find((candidate) => candidate.number === number);
  return cutter === undefined
    ? `cutter ${number}`
    : `${number}: ${plain(cutter.diameter, 4)} mm, ${cutter.flutes} flutes`;
}

function passRow(facts: SheetFacts, pass: SheetPass, i: number): string {
  return (
    `<tr><td>${numeral(i + 1)}</td><td>${escapeText(capitalised(pass.name))}</td><td>${cutterWords(facts, pass.cutter)}</td>` +
    `<td class="n">${plain(pass.speed, 0)}</td><td class="n">${plain(pass.feed, 1)}</td><td class="n">${plain(pass.plunge, 1)}</td>` +
    `<td class="n">${fixed(pass.step, 3)}</td><td class="n">${pass.laps}</td><td class="n">${fixed(pass.depth, 3)}</td><td class="n">${duration(pass.seconds)}</td></tr>`
  );
}

function reasons(passes: readonly SheetPass[]): string {
  const items = passes
    .filter((pass) => pass.why.length > 0)
    .map(
      (pass) =>
        `<dt>${escapeText(capitalised(pass.name))}</dt><dd>${pass.why.map(escapeText).join('; ')}.</dd>`,
    );
  return items.length === 0
    ? ''
    : `<details open><summary>Where these figures come from</summary><dl>${items.join('')}</dl></details>\n`;
}
