/**
 * The sheet: one self-contained HTML page to read beside the machine, the same on screen and on A4. Works without scripts,
 * asks nothing of the network; its policy forbids both.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import { drawDeviation } from './draw-deviation.ts';
import { drawSpace } from './draw-space.ts';
import { drawWheel } from './draw-wheel.ts';
import type { SheetFacts } from './facts.ts';
import { scaleWords } from './plate.ts';
import { measureSection } from './sheet-measure.ts';
import { passesSection } from './sheet-passes.ts';
import { SHEET_STYLE } from './sheet-style.ts';
import { cautionsSection, derivedSection, findingsSection, setUpSection } from './sheet-words.ts';
import { escapeText, fixed, micrometres, millimetres, plain } from './words.ts';

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
      heading(facts, title),
      refusal(facts),
      wheelPlate(facts),
      setUpSection(facts),
      passesSection(facts),
      measureSection(facts),
      spacePlate(facts),
      deviationPlate(facts),
      findingsSection(facts),
      cautionsSection(facts),
      derivedSection(facts),
    ]
      .filter((part) => part !== '')
      .join('\n') +
    '\n</body>\n</html>\n'
  );
}

function heading(facts: SheetFacts, title: string): string {
  const { form, job } = facts;
  const { teeth, module, mate, centres } = form.proportions;
  const mateWords =
    mate.kind === 'pinion' ? `a pinion of ${mate.leaves} leaves` : `a lantern of ${mate.trundles} trundles`;
  return (
    `<header>\n<h1>${title}</h1>\n` +
    `<p>${teeth} teeth, module ${plain(module, 5)}, for ${mateWords} at ${fixed(centres, 3)} mm centres. ` +
    `${escapeText(job.setup.material)}, ${plain(job.wheel.thickness, 3)} mm. Machine: ${escapeText(facts.machine.name)}.</p>\n` +
    `<p class="soft">Job <span class="mark">${escapeText(job.name)}</span>, mark <span class="mark">${facts.mark}</span> ` +
    `(the programs carry the same), Ogive ${escapeText(facts.version)}.</p>\n${verdict(facts)}</header>`
  );
}

/** The one thing that matters, first. */
function verdict(facts: SheetFacts): string {
  if (facts.verdict !== 'pass') {
    const what =
      facts.proof === undefined ? 'It cannot be made as it stands.' : 'The program failed its own proof.';
    return `<p class="verdict danger">Refused. ${what} No program was written.</p>\n`;
  }
  const figures = facts.proof?.figures;
  if (figures === undefined) {
    return '';
  }
  return (
    '<p class="verdict">Proved from its own text: the cut flank lies ' +
    `<span data-figure="flank-gouge" data-value="${fixed(figures.flankGouge, 6)}">${micrometres(figures.flankGouge)}</span> inside and ` +
    `<span data-figure="flank-left" data-value="${fixed(figures.flankLeft, 6)}">${micrometres(figures.flankLeft)}</span> outside the exact curve at worst ` +
    `(${micrometres(allowedError(facts), 1)} are allowed).</p>\n` +
    '<p class="soft">That is the program alone. What the cutter and the slides add is larger: a cutter that cuts 0.01 mm wider thins every tooth by 0.02 mm; ' +
    `runout of this spindle is taken as ${millimetres(facts.machine.limits.runout)}, play of the slides as ` +
    `${millimetres(facts.job.cuts.play.x)} in X and ${millimetres(facts.job.cuts.play.y)} in Y.</p>\n`
  );
}

/** The form error of the program: the budget and one unit of the last digit. */
export function allowedError(facts: Pick<SheetFacts, 'machine'>): number {
  const { units, words } = facts.machine;
  const digit = 10 ** -words.numbers.lengthDecimals[units] * (units === 'mm' ? 1 : 25.4);
  return FORM_ERROR + digit;
}

function refusal(facts: SheetFacts): string {
  const errors = facts.problems.filter((problem) => problem.severity === 'error');
  if (errors.length === 0) {
    return '';
  }
  const items = errors.map(
    ({ message, hint }) =>
      `<li><span class="danger">${escapeText(message)}</span>${hint === undefined ? '' : ` ${escapeText(hint)}`}</li>`,
  );
  return `<section>\n<h2>Why it was refused</h2>\n<ol>${items.join('')}</ol>\n</section>`;
}

function wheelPlate(facts: SheetFacts): string {
  const { svg, scale } = drawWheel(facts);
  const dial =
    facts.passes.length > 0
      ? ' Round it the work, clockwise from twelve: each pass is a chapter, as long as it takes; a mark inside the ring is a minute, or five or ten where there are many.'
      : '';
  return `<figure>\n${svg}\n<figcaption><b>Plate I.</b> The wheel with the paths of the cutters' centres, ${scaleWords(scale)} on A4; grey for roughing, slate for the rest.${dial}</figcaption>\n</figure>`;
}

function spacePlate(facts: SheetFacts): string {
  const { svg, scale } = drawSpace(facts);
  const cutter = facts.job.cuts.finishing.cutter;
  const left = facts.reach;
  const words =
    left === undefined
      ? ''
      : ` The darker metal at the root is what a ${plain(cutter.diameter, 3)} mm cutter cannot reach: ${millimetres(left.leftAtRoot)} at its thickest, ${fixed(left.leftArea, 4)} mm² a space.`;
  return `<figure>\n${svg}\n<figcaption><b>Plate II.</b> One tooth space, ${scaleWords(scale)} on A4, with the finishing cutter where it goes deepest.${words}</figcaption>\n</figure>`;
}

function deviationPlate(facts: SheetFacts): string {
  const figures = facts.proof?.figures;
  if (figures === undefined || figures.deviation.length === 0) {
    return '';
  }
  const allowed = allowedError(facts);
  const svg = drawDeviation({
    points: figures.deviation,
    allowed,
    footRadius: facts.asCut?.footRadius ?? facts.form.rootRadius,
    pitchRadius: facts.form.pitchRadius,
  });
  return `<figure>\n${svg}\n<figcaption><b>Plate III.</b> The cut flank against the exact curve along tooth ${figures.worstTooth}, the worst of all, read back from the program; the band is what is allowed, ${micrometres(allowed, 1)} either way. Metal that the cutter cannot reach at the root runs off the plate.</figcaption>\n</figure>`;
}
