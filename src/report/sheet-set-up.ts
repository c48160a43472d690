/**
 * The set-up, in the order in which it is done: blank, cutters, zero and how to find it again, parking, the walk round first,
 * a run in the air, the programs with what to do between them and at their stops. Only of a job that passed.
 */
import { materialNamed } from '../cutting/materials.ts';
import { drawTable } from './draw-table.ts';
import type { SheetFacts } from './facts.ts';
import { keepClear } from './keep-clear.ts';
import { HOLDING_WORDS } from './holding-words.ts';
import { lengthBoth, lengthOnly, sizeOnly } from './lengths.ts';
import { scaleWords } from './plate.ts';
import { plateFigure } from './plate-numbers.ts';
import { handSteps } from './hand-steps.ts';
import { head, scroll } from './table-parts.ts';
import { capitalised, escapeText, plain } from './words.ts';

export function setUpSection(facts: SheetFacts): string {
  if (facts.verdict !== 'pass') {
    return '';
  }
  const steps = [
    ...blankSteps(facts),
    cutterStep(facts),
    ...zeroSteps(facts),
    parkStep(facts),
    walkStep(facts),
    airStep(facts),
    ...handSteps(facts),
  ];
  return (
    `<section>\n<h2>Set-up</h2>\n<ol class="steps">${steps.map((step) => `<li>${step}</li>`).join('\n')}</ol>\n` +
    `${cuttersTable(facts)}${tablePlate(facts)}</section>`
  );
}

function blankSteps({ job }: SheetFacts): readonly string[] {
  const { shape, topZ, plateZ, holding, material, obstacles } = job.setup;
  const size = (mm: number): string => sizeOnly(mm, job.length);
  const words = materialNamed(material)?.words ?? material;
  const form =
    shape.kind === 'sheet'
      ? `Sheet ${size(shape.width)} by ${size(shape.height)}, the wheel in its middle`
      : `Disc turned to ${lengthBoth(shape.diameter, job.length)}`;
  const things = obstacles.filter(({ name }) => name === 'keep-out').length;
  const clamps =
    things === 0
      ? ''
      : ` ${things === 1 ? 'The place kept out stands' : `The ${things} places kept out stand`} where the plate below shows.`;
  return [
    `<b>Blank.</b> ${escapeText(`${form}, ${size(topZ - plateZ)} thick, ${words}.`)} ` +
      `${holding.map((hold) => escapeText(HOLDING_WORDS[hold](job))).join(' ')}${clamps}`,
  ];
}

function cutterStep({ programs }: SheetFacts): string {
  const order = programs.flatMap(({ cutters }) => cutters);
  const count = new Set(order).size;
  const again =
    order.length > count ? `, fitted ${numberWord(order.length)} times in the order of the table below,` : '';
  const words =
    count === 1
      ? 'One, by the table below,'
      : `${capitalised(numberWord(count))}${again === '' ? ', by the table below in the order they are used,' : again}`;
  return `<b>Cutters.</b> ${words} clean in the collet, sticking out just so far. The paths are reckoned with the width each one <i>cuts</i>, not with the size on its box.`;
}

function numberWord(count: number): string {
  return ['none', 'one', 'two', 'three', 'four', 'five', 'six'][count] ?? String(count);
}

function zeroSteps({ job, again }: SheetFacts): readonly string[] {
  const { bored, topZ, plateZ } = job.setup;
  const level =
    job.zero === 'top'
      ? `the top of the blank, touched off with the cutter that is used first (a slip of paper, a feeler, or a setter of known height: take its thickness off)`
      : `the plate under the blank: touch it off beside the blank, which lies ${lengthBoth(topZ - plateZ, job.length)} above it`;
  const hole =
    bored > 0 && !job.setup.holding.includes('arbor')
      ? ` The hole of ${lengthBoth(bored, job.length)} is there already: run a dial gauge round it; a swing of the needle is twice the error.`
      : '';
  return [
    `<b>Zero.</b> X0 and Y0 are the axis of the wheel; Z0 is ${level}.${hole} ${escapeText(placesKept(`${again}.`))} Go to X0 Y0 at the clear height and look whether it is the place.`,
  ];
}

/** A coordinate stays in one line, its minus as wide as a figure. */
function placesKept(text: string): string {
  return capitalised(text).replace(
    /([XY]) (-?)([\d.]+) (mm|inch)/g,
    (_, axis: string, minus: string, digits: string, unit: string) =>
      `${axis}\u00a0${minus === '' ? '' : '\u2212'}${digits}\u00a0${unit === 'mm' ? 'mm' : 'in'}`,
  );
}

function parkStep({ job, park }: SheetFacts): string {
  const at = park ?? { x: 0, y: 0, z: 0 };
  return `<b>Park</b> at X ${lengthBoth(at.x, job.length)}, Y ${lengthBoth(at.y, job.length)}, height ${lengthBoth(at.z, job.length)} or above, before every program. Clear height is ${lengthBoth(job.setup.clearZ, job.length)}: above it the cutter may go anywhere where nothing stands.`;
}

function walkStep({ walkFile, proof, job }: SheetFacts): string {
  const span = ([low, high]: readonly [number, number]): string =>
    `${lengthOnly(low, job.length)} to ${lengthOnly(high, job.length)}`;
  const reach =
    proof === undefined
      ? ''
      : ` The cutters' middle reaches in X from ${span(proof.extents.x)}, in Y from ${span(proof.extents.y)}, in Z from ${span(proof.extents.z)}.`;
  return `<b>Walk round first:</b> run <span class="mark">${escapeText(walkFile ?? '')}</span> with the spindle still. It goes round the reaches and over what stands in the way, high up; watch it past every clamp and table edge.${reach}`;
}

/** So high that the deepest cut stays above the blank. */
function airStep({ job, proof, programs }: SheetFacts): string {
  const { topZ, clearZ } = job.setup;
  const raise = topZ - (proof?.extents.z[0] ?? 0) + clearZ - topZ;
  return `<b>In the air:</b> raise the zero of Z by ${lengthBoth(raise, job.length)}, and parking with it, and run <span class="mark">${escapeText(programs[0]?.file ?? '')}</span> so, rapid override low, a hand on feed hold. Put the zero back, and go block by block down to the first cut.`;
}

function cuttersTable(facts: SheetFacts): string {
  const { job, programs } = facts;
  const length = (mm: number): string =>
    lengthBoth(mm, job.length).replace(' (', '<br><span class="soft">(').concat('</span>');
  const order = programs.flatMap((program) =>
    program.cutters.map((number) => ({ number, file: program.file })),
  );
  const rows = order.map(({ number, file }, i) => {
    const cutter = job.setup.cutters.find((candidate) => candidate.number === number);
    return cutter === undefined
      ? ''
      : `<tr><th scope="row" class="n">${i + 1}</th><td>cutter ${number}</td><td class="n" data-figure="cutter-${number}" data-value="${plain(cutter.diameter, 6)}">${length(cutter.diameter)}</td><td class="n">${sizeOnly(cutter.nominal, job.length)}</td><td class="n">${cutter.flutes}</td>` +
          `<td class="n">${length(cutter.stickOut)}</td><td class="n">${sizeOnly(cutter.reach, job.length)}</td><td class="n">${sizeOnly(cutter.flute, job.length)}</td><td class="n">${sizeOnly(cutter.shank, job.length)}</td><td class="mark">${escapeText(file)}</td></tr>`;
  });
  return (
    scroll('cutters', 'whole') +
    '<table>\n<caption>Cutters in the order they are used.</caption>\n<thead><tr>' +
    head(
      ['', 'cutter', 'cuts', 'on the box', 'flutes', 'sticks out', 'reach', 'flute', 'shank', 'program'],
      [0, 2, 3, 4, 5, 6, 7, 8],
    ) +
    `</tr></thead>\n<tbody>${rows.join('\n')}</tbody>\n</table></div>\n` +
    '<p class="soft note">Sticks out: below the collet. Reach: how deep it goes beside a wall before neck or shank touches. Flute: the part that cuts.</p>\n'
  );
}

function tablePlate(facts: SheetFacts): string {
  const plate = drawTable(facts);
  if (plate === undefined) {
    return '';
  }
  return plateFigure(
    facts,
    'table',
    plate.svg,
    `The table from above, ${scaleWords(plate.scale)} on A4, and the heights from the side, to a scale of their own. ` +
      clearWords(facts),
  );
}

function clearWords(facts: SheetFacts): string {
  const clear = keepClear(facts);
  const unit = facts.job.length;
  const hatched =
    facts.job.setup.obstacles.length === 0 ? '' : ' Hatched: what the job says stands in the way.';
  return clear === undefined
    ? hatched.trim()
    : `Dashed: as far as cutters and shanks go below the clear height, ways in and out included; nothing may stand inside it but what the job names. ` +
        `What stands higher than Z ${lengthOnly(clear.nutZ, unit)} keeps ${lengthOnly(clear.nutFurther, unit)} further away, for the collet nut.${hatched}`;
}
