/** Cutters in themselves, and whether the passes name ones that are there. Needs no tooth form. */
import type { Problem } from '../base/problem.ts';
import type { Cutter } from '../cutting/setup.ts';
import { neededPasses } from './derive-cuts.ts';
import { jobProblem, type JobProblem } from './job-problem.ts';
import { PASS_KINDS, type JobText } from './job-schema.ts';
import type { Job, WheelJob } from './job.ts';
import { showLength } from './show-length.ts';

export function checkCutters(text: JobText, cutters: readonly Cutter[], derived: Job['derived']): Problem[] {
  if (cutters.length === 0) {
    const hint = 'Give at least one: 1: { diameter: 0.5, flutes: 2, reach: 2.0 }.';
    return [jobProblem({ path: ['cutters'], code: 'job.invalid', message: 'there is no cutter.', hint })];
  }
  return [...cutters.flatMap((cutter) => sizes(cutter, text, derived)), ...named(text, cutters)].map(
    jobProblem,
  );
}

/** How much wider or narrower than its box says a cutter may cut. Why: beyond a tenth one of the two is a slip of the pen. */
const CUTS_SHARE = 0.1;

function sizes(cutter: Cutter, text: JobText, derived: Job['derived']): JobProblem[] {
  const show = (mm: number): string => showLength(mm, text.length ?? 'mm');
  const at = (key: string): (string | number)[] => ['cutters', String(cutter.number), key];
  const problems: JobProblem[] = [];
  const saysReach = derived[`cutters.${cutter.number}.reach`] === undefined;
  const assumed = saysReach ? '' : ' (assumed, as the job does not say it)';
  if (Math.abs(cutter.diameter - cutter.nominal) > CUTS_SHARE * cutter.nominal) {
    const message = `${show(cutter.diameter)} is far from the diameter of ${show(cutter.nominal)}.`;
    problems.push({
      path: at('cuts'),
      message,
      hint: 'Measure the test slot again: they differ by a few hundredths of a mm.',
    });
  }
  if (cutter.flute > cutter.reach) {
    const message = `the flute of ${show(cutter.flute)} is longer than the reach of ${show(cutter.reach)}.`;
    problems.push({
      path: at('reach'),
      message,
      hint: 'The reach is the flute and, where there is one, the neck above it.',
    });
  }
  if (cutter.stickOut <= cutter.reach) {
    const message = `it sticks out ${show(cutter.stickOut)}, no more than its reach of ${show(cutter.reach)}${assumed}: the collet would strike the blank.`;
    problems.push({
      path: at('stick-out'),
      message,
      hint: `The stick-out is measured from the tip to the collet${saysReach ? '' : '; write the reach too'}.`,
    });
  }
  if (cutter.shank < cutter.nominal) {
    const message = `the shank of ${show(cutter.shank)} is thinner than the cutter of ${show(cutter.nominal)}.`;
    problems.push({ path: at('shank'), message, hint: 'Give the diameter that the collet holds.' });
  }
  return problems;
}

function named(text: JobText, cutters: readonly Cutter[]): JobProblem[] {
  const known = cutters.map((cutter) => cutter.number).join(', ');
  return PASS_KINDS.flatMap((pass) => {
    const number = text.cuts?.[pass]?.cutter;
    return number === undefined || cutters.some((cutter) => cutter.number === number)
      ? []
      : [
          {
            path: ['cuts', pass, 'cutter'],
            message: `there is no cutter ${number}.`,
            hint: `The cutters are ${known}.`,
          },
        ];
  });
}

/** The order names every pass that is needed, and roughs before it finishes. */
export function checkOrder(text: JobText, wheel: WheelJob): Problem[] {
  const order = text.cuts?.order;
  if (order === undefined) {
    return [];
  }
  const path = ['cuts', 'order'];
  const needed = neededPasses(text, wheel);
  const missing = needed.filter((pass) => !order.includes(pass));
  const idle = order.filter((pass) => !needed.includes(pass));
  const problems: JobProblem[] = [];
  if (missing.length > 0) {
    const message = `${missing.join(' and ')} ${missing.length > 1 ? 'are' : 'is'} missing from the order.`;
    problems.push({ path, message, hint: `This wheel needs ${needed.join(', ')}.` });
  }
  if (idle.length > 0) {
    const message = `there is nothing to cut for ${idle.join(' and ')}.`;
    problems.push({ path, message, hint: `This wheel needs ${needed.join(', ')}.` });
  }
  if (missing.length === 0 && order.indexOf('finishing') < order.indexOf('roughing')) {
    const message = 'finishing stands before roughing.';
    problems.push({ path, message, hint: 'Rough first: a finishing cutter takes only the allowance.' });
  }
  return problems.map(jobProblem);
}
