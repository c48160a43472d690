/**
 * The sheet: one self-contained HTML page to read beside the machine, the same on screen and on A4. Works without scripts,
 * asks nothing of the network; its policy forbids both.
 */
import type { SheetFacts } from './facts.ts';
import { refusalSection, cautionsSection, derivedSection, findingsSection } from './sheet-words.ts';
import { heading } from './sheet-heading.ts';
import { measureSection } from './sheet-measure.ts';
import { passesSection } from './sheet-passes.ts';
import { deviationPlate, sizesPlate, spacePlate } from './sheet-plates.ts';
import { setUpSection } from './sheet-set-up.ts';
import { SHEET_STYLE } from './sheet-style.ts';
import { escapeText } from './words.ts';

const POLICY =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; base-uri 'none'; form-action 'none'";

export function sheetHtml(facts: SheetFacts): string {
  const title = escapeText(facts.job.title);
  return (
    '<!doctype html>\n<html lang="en">\n<head>\n<meta charset="utf-8">\n' +
    `<meta http-equiv="Content-Security-Policy" content="${POLICY}">\n` +
    '<meta name="viewport" content="width=device-width, initial-scale=1">\n' +
    `<title>${title} - Ogive</title>\n<style>${SHEET_STYLE}</style>\n</head>\n<body>\n` +
    [
      heading(facts),
      refusalSection(facts),
      sizesPlate(facts),
      setUpSection(facts),
      passesSection(facts),
      facts.verdict === 'pass' ? measureSection(facts) : '',
      `<div class="pair">\n${spacePlate(facts)}${deviationPlate(facts)}</div>`,
      findingsSection(facts),
      cautionsSection(facts),
      derivedSection(facts),
      `<footer class="soft">${title}, mark <span class="mark">${facts.mark}</span>.</footer>`,
    ]
      .filter((part) => part !== '')
      .join('\n') +
    '\n</body>\n</html>\n'
  );
}
