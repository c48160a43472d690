/** The sheet's parts that are mostly words: what was found, what was not checked, cautions, what was derived. */
import { displayed } from './derived-words.ts';
import type { LengthUnit } from '../base/units.ts';
import { jobText } from './job-text.ts';
import type { SheetFacts } from './facts.ts';
import { escapeText, sentence } from './words.ts';

export function findingsSection(facts: SheetFacts): string {
  const found = [...warnings(facts), ...findings(facts, 'warning')];
  const unseen = facts.proof?.notChecked ?? ['No program was made, so nothing was proved.'];
  return (
    `<section class="whole">\n<h2>What was found, and what was not checked</h2>\n${found.length === 0 ? `<p>Found: ${facts.verdict === 'pass' ? 'nothing that needs a word' : 'nothing besides why it was refused'}. Not checked:</p>` : `${list(found)}\n<p>Not checked:</p>`}\n` +
    `<ul class="columns">${[...new Set(unseen)].map((line) => `<li>${escapeText(sentence(line))}</li>`).join('\n')}</ul>\n</section>`
  );
}

/** Of the job: reasons where nothing was made, and what the proof holds against the program. */
export function refusalSection(facts: SheetFacts): string {
  const unit = facts.job.length;
  const reasons = facts.problems
    .filter(({ severity }) => severity === 'error')
    .map(
      ({ message, hint }) =>
        `<li><span class="danger">${escapeText(sentence(jobText(message, unit)))}</span>${after(hint, unit)}</li>`,
    );
  const found = findings(facts, 'error');
  if (reasons.length + found.length === 0) {
    return '';
  }
  const shown = [...reasons, ...found.slice(0, MOST_SHOWN)];
  const more =
    found.length > MOST_SHOWN
      ? `<p>And ${found.length - MOST_SHOWN} more of the kind; the summary has all.</p>\n`
      : '';
  return `<section>\n<h2>Why it was refused</h2>\n<ol>${shown.join('\n')}</ol>\n${more}</section>`;
}

const MOST_SHOWN = 20;

function warnings({ problems, job }: SheetFacts): readonly string[] {
  const unit = job.length;
  return problems
    .filter(({ severity }) => severity === 'warning')
    .map(
      ({ message, hint }) => `<li>${escapeText(sentence(jobText(message, unit)))}${after(hint, unit)}</li>`,
    );
}

function findings({ proof, job }: SheetFacts, wanted: 'error' | 'warning'): readonly string[] {
  const unit = job.length;
  return (proof?.findings ?? [])
    .filter(({ severity }) => severity === wanted)
    .map(
      ({ code, message, hint, file, line }) =>
        `<li><span class="mark">${escapeText(file)}, line ${line}:</span> <span${wanted === 'error' ? ' class="danger"' : ''}>${escapeText(sentence(jobText(message, unit)))}</span>${after(hint, unit)} <span class="soft mark">${code}</span></li>`,
    );
}

function after(hint: string | undefined, unit: LengthUnit): string {
  return hint === undefined ? '' : ` ${escapeText(sentence(jobText(hint, unit)))}`;
}

function list(items: readonly string[]): string {
  return `<ul>${items.join('\n')}</ul>`;
}

export function cautionsSection({ cautions }: SheetFacts): string {
  return cautions.length === 0
    ? ''
    : `<section class="whole">\n<h2>Cautions</h2>\n<ol class="columns">${cautions.map((line) => `<li>${escapeText(sentence(line))}</li>`).join('\n')}</ol>\n</section>`;
}

/** Values that share a reason stand together. */
export function derivedSection({ job }: SheetFacts): string {
  const byWhy = new Map<string, string[]>();
  for (const [key, derived] of Object.entries(job.derived)) {
    const value = displayed(key, derived.value, job.length);
    byWhy.set(derived.why, [
      ...(byWhy.get(derived.why) ?? []),
      `<span class="mark">${escapeText(key)}</span> ${escapeText(value)}`,
    ]);
  }
  const rows = [...byWhy].map(
    ([why, values]) =>
      `<div><dt>${values.join(', ')}:</dt> <dd>${escapeText(jobText(why, job.length))}.</dd></div>`,
  );
  return rows.length === 0
    ? ''
    : `<section>\n<h2>What the job left out, what was taken, and why</h2>\n<dl class="taken">${rows.join('\n')}</dl>\n</section>`;
}
