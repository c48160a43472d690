/** The head of the sheet: what is made, and the one thing that matters first: proved or refused, with the figures. */
import { allowedError } from './allowed-error.ts';
import type { SheetFacts } from './facts.ts';
import { lengthBoth, sizeOnly, tinyLength } from './lengths.ts';
import { duration, escapeText, fixed, plain } from './words.ts';

export function heading(facts: SheetFacts): string {
  const { job, machine } = facts;
  const seconds = facts.programs.reduce((sum, program) => sum + program.seconds, 0);
  const time = seconds > 0 ? `, ${duration(seconds)} of cutting` : '';
  return (
    `<header>\n<h1>${escapeText(job.title)}</h1>\n<p class="what">${partWords(facts)}</p>\n` +
    `<p class="soft">For the machine <span class="mark">${escapeText(machine.name)}</span>${time}. Job <span class="mark">${escapeText(job.name)}</span>, ` +
    `mark <span class="mark">${facts.mark}</span>${facts.verdict === 'pass' ? ', which the programs carry too' : ''}. Ogive ${escapeText(facts.version)}.</p>\n${verdict(facts)}</header>`
  );
}

function partWords({ form, job }: SheetFacts): string {
  const { teeth, module, mate, centres } = form.proportions;
  const mateWords =
    mate.kind === 'pinion' ? `a pinion of ${mate.leaves} leaves` : `a lantern of ${mate.trundles} trundles`;
  const pitch = job.length === 'inch' ? ` (diametral pitch ${plain(25.4 / module, 3)})` : '';
  return (
    `A wheel of ${teeth} teeth, module ${plain(module, 5)} mm${pitch}, to run with ${mateWords} at centres of ${lengthBoth(centres, job.length)}; ` +
    `${sizeOnly(job.wheel.thickness, job.length)} of ${escapeText(job.setup.material.replaceAll('-', ' '))}.`
  );
}

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
  const { play } = facts.job.cuts;
  const unit = facts.job.length;
  const figure = (name: string, value: number): string =>
    `<span data-figure="${name}" data-value="${fixed(value, 6)}">${tinyLength(value, unit)}</span>`;
  const slides =
    play.x === 0 && play.y === 0
      ? 'play of the slides was not given, so none was reckoned with'
      : `play of the slides was given as ${lengthBoth(play.x, unit)} in X and ${lengthBoth(play.y, unit)} in Y`;
  return (
    `<p class="verdict">Proved from its own text. At worst the cut flank lies ${figure('flank-gouge', figures.flankGouge)} inside and ` +
    `${figure('flank-left', figures.flankLeft)} outside the exact curve; ${tinyLength(allowedError(facts.machine), unit, 1)} is allowed. ` +
    `${figure('left-at-root', figures.leftAtRoot)} stays in the corners of the root, below where the pinion works.</p>\n` +
    `<p class="soft">That is the program alone; cutter and slides add more. A cutter that cuts ${lengthBoth(0.01, unit)} wider thins every tooth by as much, ` +
    `${plain((0.01 / facts.form.toothThickness) * 100, 1)} per cent of it here. The cutters' runout is taken as ${lengthBoth(facts.job.cuts.finishing.cutter.runout, unit)}; ${slides}.</p>\n`
  );
}
