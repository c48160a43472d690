/** Plates with their captions: the sizes, one tooth space, the deviation of the flank. */
import { allowedError } from './allowed-error.ts';
import { drawDeviation } from './draw-deviation.ts';
import { drawSizes } from './draw-sizes.ts';
import { drawSpace } from './draw-space.ts';
import { jobText } from './job-text.ts';
import type { SheetFacts } from './facts.ts';
import { lengthOnly, sizeOnly, tinyLength, unitInWords } from './lengths.ts';
import { scaleWords } from './plate.ts';
import { plateFigure } from './plate-numbers.ts';
import { escapeText, fixed } from './words.ts';

export function sizesPlate(facts: SheetFacts): string {
  const { form, job, crossings } = facts;
  const { svg, scale } = drawSizes(
    {
      form,
      sector: form.sector,
      bore: job.wheel.bore,
      thickness: job.wheel.thickness,
      unit: job.length,
      ...(crossings === undefined ? {} : { crossings }),
    },
    `The wheel with its sizes, in plan and cut through the axis`,
    undefined,
    TALLEST,
  );
  return plateFigure(
    facts,
    'sizes',
    svg,
    `The exact wheel, in plan and cut through its axis, ${scaleWords(scale)} on A4; figures in ${unitInWords(job.length)}.${windowWords(facts)}`,
  );
}

/** Of the wheel in plan, mm of paper. Why: the set-up begins on the same page of A4. */
const TALLEST = 82;

function windowWords({ crossings, job }: SheetFacts): string {
  if (crossings === undefined) {
    return '';
  }
  const { armAtHub, armAtRim, corner, arms } = crossings.proportions;
  const size = (mm: number): string => sizeOnly(mm, job.length);
  const width =
    armAtHub === armAtRim
      ? `${size(armAtHub)} wide`
      : `${size(armAtHub)} wide at the hub and ${size(armAtRim)} at the rim`;
  return ` ${arms} arms, ${width}; corners of ${size(corner)} radius.`;
}

export function spacePlate(facts: SheetFacts): string {
  const { job, reach, asCut } = facts;
  const { svg, scale } = drawSpace(facts);
  const cutter = job.cuts.finishing.cutter;
  const size = (mm: number): string => sizeOnly(mm, job.length);
  const left =
    asCut === undefined
      ? ` A cutter of ${size(cutter.diameter)} does not enter it.`
      : ` The cutter of ${size(cutter.diameter)} where it stands deepest${asCut.reachesRoot ? '' : ', short of the root'}; the darker metal is what it cannot reach, ${lengthOnly(asCut.leftAtRoot, job.length)} at its thickest, ${fixed(asCut.areaLeft, 4)} mm² a space. From the foot up the flank is cut as drawn.`;
  const largest =
    asCut === undefined
      ? ''
      : ` The largest cutter that would reach the root is ${lengthOnly(asCut.largestCutter, job.length)}.`;
  const remarks = (reach?.remarks ?? [])
    .filter((remark) => !SAID.test(remark))
    .map((remark) => ` ${escapeText(capital(jobText(remark, job.length)))}.`)
    .join('');
  return plateFigure(
    facts,
    'space',
    svg,
    `One tooth space, ${scaleWords(scale)} on A4.${left}${largest}${remarks}`,
  );
}

/** What the caption says itself, in the job's unit. */
const SAID = /^cutter \d+ (?:reaches|does not reach) the root/;

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1).replace(/\.$/, '');
}

export function deviationPlate(facts: SheetFacts): string {
  const figures = facts.proof?.figures;
  if (figures === undefined || figures.deviation.length === 0) {
    return '';
  }
  const allowed = allowedError(facts.machine);
  const svg = drawDeviation({
    points: figures.deviation,
    allowed,
    leftAtRoot: figures.leftAtRoot,
    footRadius: facts.asCut?.footRadius ?? facts.form.rootRadius,
    pitchRadius: facts.form.pitchRadius,
    unit: facts.job.length,
  });
  return plateFigure(
    facts,
    'deviation',
    svg,
    `The cut flank against the exact curve along tooth ${figures.worstTooth}, the worst of all, read back from the program. The line through 0 is the exact curve; the band is what is allowed, ${tinyLength(allowed, facts.job.length, 1)} either way.`,
  );
}
