/** The sheet's parts that are mostly words: set-up, findings, what was not checked, cautions, what was derived. */
import type { SheetFacts } from './facts.ts';
import { escapeText, plain } from './words.ts';

export function setUpSection(facts: SheetFacts): string {
  return facts.setUp.length === 0
    ? ''
    : `<section>\n<h2>Set-up</h2>\n<ol>${facts.setUp.map((line) => `<li>${escapeText(line)}</li>`).join('\n')}</ol>\n${remarks(facts)}</section>`;
}

function remarks(facts: SheetFacts): string {
  const lines = facts.reach?.remarks ?? [];
  return lines.map((line) => `<p class="soft">${escapeText(line)}</p>`).join('\n');
}

export function findingsSection(facts: SheetFacts): string {
  const warnings = facts.problems
    .filter((problem) => problem.severity === 'warning')
    .map(
      ({ message, hint }) =>
        `<li>${escapeText(message)}${hint === undefined ? '' : ` ${escapeText(hint)}`}</li>`,
    );
  const findings = (facts.proof?.findings ?? []).map(
    ({ code, severity, message, hint, file, line }) =>
      `<li${severity === 'error' ? ' class="danger"' : ''}><span class="mark">${escapeText(file)}:${line}</span> ${escapeText(message)}${hint === undefined ? '' : ` ${escapeText(hint)}`} <span class="soft mark">${code}</span></li>`,
  );
  const found = [...warnings, ...findings];
  const list = found.length === 0 ? '<p>Nothing was found.</p>' : `<ul>${found.join('\n')}</ul>`;
  const unseen = (facts.proof?.notChecked ?? ['No program was made, so nothing was proved.'])
    .map((line) => `<li>${escapeText(line)}</li>`)
    .join('\n');
  return `<section>\n<h2>What the proof found</h2>\n${list}\n<h2>What was not checked</h2>\n<ul>${unseen}</ul>\n</section>`;
}

export function cautionsSection(facts: SheetFacts): string {
  return facts.cautions.length === 0
    ? ''
    : `<section>\n<h2>Cautions</h2>\n<ol>${facts.cautions.map((line) => `<li>${escapeText(line)}</li>`).join('\n')}</ol>\n</section>`;
}

export function derivedSection(facts: SheetFacts): string {
  const entries = Object.entries(facts.job.derived);
  if (entries.length === 0) {
    return '';
  }
  const rows = entries.map(
    ([key, { value, why }]) =>
      `<tr><td class="mark">${escapeText(key)}</td><td class="n">${typeof value === 'number' ? plain(value, 5) : escapeText(value)}</td><td>${escapeText(why)}</td></tr>`,
  );
  return `<section>\n<h2>What the job left out</h2>\n<div class="scroll"><table><thead><tr><th>value</th><th class="n">taken</th><th>why</th></tr></thead><tbody>${rows.join('\n')}</tbody></table></div>\n</section>`;
}
