/** What holds the blank: does it hold, does it go with zero, thickness and the holes that are there? Needs no tooth form. */
import type { Problem } from '../base/problem.ts';
import { WRITTEN_LENGTH } from '../base/tolerances.ts';
import { holdingOf, skinOf } from './derive-setup.ts';
import { jobProblem, type JobProblem } from './job-problem.ts';
import { SCREW_FORM } from './job-schema-blank.ts';
import type { JobText, WheelText } from './job-schema.ts';
import { showLength } from './show-length.ts';

export function checkHolding(text: JobText, wheel: WheelText): Problem[] {
  return [
    ...holds(text),
    ...arbor(text),
    ...skin(text),
    ...holes(text, wheel),
    ...thickness(text, wheel),
    ...shape(text),
  ].map(jobProblem);
}

function holds(text: JobText): JobProblem[] {
  const holding = holdingOf(text);
  const path = ['blank', 'holding'];
  const problems: JobProblem[] = [];
  if (holding.length === 0) {
    problems.push({
      path,
      message: 'nothing holds the blank.',
      hint: 'Say what does: glue, tape, arbor or skin.',
    });
  } else if (holding.every((one) => one === 'screw')) {
    const message = 'a screw alone does not hold: cutting turns the wheel off it.';
    const hint = `Add a second hold: ${SCREW_FORM}, with the sizes of yours; tape or arbor will do for glue.`;
    problems.push({ path, message, hint });
  }
  const twice = holding.find((one, i) => holding.indexOf(one) !== i);
  if (twice !== undefined) {
    problems.push({ path, message: `${twice} is said twice.`, hint: 'Say each hold once.' });
  }
  return problems;
}

/** An arbor mostly stands up under a nut, in the very middle of every way from window to window. */
function arbor(text: JobText): JobProblem[] {
  const named = (text.blank['keep-out'] ?? []).some(({ x, y, radius }) => Math.hypot(x, y) < radius);
  if (named || !holdingOf(text).includes('arbor')) {
    return [];
  }
  const message =
    'an arbor holds the blank, and nothing says how high it or its nut stands up in the middle.';
  const hint =
    'Name it: keep-out: [{ x: 0, y: 0, radius: 4 mm, height: 6 mm }] with your sizes, from the plate up; let it be where nothing stands above the blank.';
  return [{ path: ['blank', 'holding'], severity: 'warning', message, hint }];
}

function skin(text: JobText): JobProblem[] {
  const given = text.blank.skin;
  if (!holdingOf(text).includes('skin')) {
    return given === undefined
      ? []
      : [
          {
            path: ['blank', 'skin'],
            message: 'a skin is given, but holding does not say skin.',
            hint: 'Say holding: skin, or leave skin out.',
          },
        ];
  }
  const problems: JobProblem[] = [];
  if (given === undefined) {
    const hint = 'Give skin: 0.05 to 0.15 mm is usual.';
    problems.push({ path: ['blank', 'skin'], message: 'how thick the skin stays is not said.', hint });
  }
  if (text.zero !== 'plate') {
    const message = `with zero: ${text.zero ?? 'top'} the skin would be as uneven as the sheet.`;
    problems.push({
      path: ['zero'],
      message,
      hint: 'A thin skin is measured from below: say zero: plate and touch off there.',
    });
  }
  if ((text.cuts?.below ?? 0) > 0) {
    const message = `${showLength(text.cuts?.below ?? 0, text.length ?? 'mm')} under the wheel would cut through the skin.`;
    problems.push({ path: ['cuts', 'below'], message, hint: 'Leave below out: with a skin it is 0.' });
  }
  if (text.blank.shape === 'disc') {
    const message = 'a skin holds a wheel to the sheet round it; a disc has none.';
    problems.push({ path: ['blank', 'holding'], message, hint: 'Hold a disc with glue, tape or an arbor.' });
  }
  return problems;
}

/** Arbor and screw go through a hole that is there before the program starts. */
function holes(text: JobText, wheel: WheelText): JobProblem[] {
  const bored = text.blank.bored ?? 0;
  const bore = wheel.bore ?? 0;
  const show = (mm: number): string => showLength(mm, text.length ?? 'mm');
  const through = holdingOf(text).filter((one) => one === 'arbor' || one === 'screw');
  const problems: JobProblem[] = [];
  if (through.length > 0 && bored === 0) {
    const message = `${through.join(' and ')}: there is no hole that it could go through.`;
    const hint = `Bore the blank first and say bored: ${bore > 0 ? show(bore) : 'its diameter'}.`;
    problems.push({ path: ['blank', 'bored'], message, hint });
  } else if (through.length > 0 && bore > bored) {
    const message = `the bore of ${show(bore)} cannot be cut: ${through.join(' and ')} fills the hole of ${show(bored)}.`;
    const hint = 'Bore the blank to size first, or hold it with glue.';
    problems.push({ path: ['wheel', 'bore'], message, hint });
  }
  if (bored > bore && bore > 0) {
    const message = `the hole that is there, ${show(bored)}, is larger than the bore, ${show(bore)}.`;
    problems.push({ path: ['blank', 'bored'], message, hint: 'Measure both again; a bore can only grow.' });
  }
  return [...problems, ...screws(text, Math.max(bored, bore), show)];
}

/** A screw goes through the hole, its head does not. */
function screws({ blank }: JobText, hole: number, show: (mm: number) => string): JobProblem[] {
  const held = typeof blank.holding === 'string' ? [] : blank.holding;
  return held.flatMap((one, i) => {
    if (typeof one === 'string' || hole === 0) {
      return [];
    }
    const { thread, head } = one.screw;
    const path = ['blank', 'holding', i, 'screw'];
    const problems: JobProblem[] = [];
    if (thread > hole) {
      const message = `a thread of ${show(thread)} does not go through the hole of ${show(hole)}.`;
      problems.push({ path: [...path, 'thread'], message, hint: 'Take a thinner screw.' });
    }
    if (head <= hole) {
      const message = `a head of ${show(head)} goes through the hole of ${show(hole)}.`;
      const hint = 'Put a washer under it and give its diameter.';
      problems.push({ path: [...path, 'head'], message, hint });
    }
    return problems;
  });
}

function thickness(text: JobText, wheel: WheelText): JobProblem[] {
  const given = text.blank.thickness;
  const unit = text.length ?? 'mm';
  const kept = skinOf(text);
  const wanted = wheel.thickness + kept;
  if (given === undefined || Math.abs(given - wanted) < WRITTEN_LENGTH) {
    return [];
  }
  const sum = kept > 0 ? ` and its skin of ${showLength(kept, unit)}` : '';
  const message = `the blank is ${showLength(given, unit)} thick, the wheel ${showLength(wheel.thickness, unit)}${sum}.`;
  const hint =
    given < wanted
      ? 'Take a thicker blank, or give the thickness of the wheel as that of the blank.'
      : kept > 0
        ? `Bring the blank to ${showLength(wanted, unit)}: its underside is not cut.`
        : 'Faces are not cut: take a blank of the thickness of the wheel, or hold it by a skin.';
  return [{ path: ['blank', 'thickness'], message, hint }];
}

function shape({ blank }: JobText): JobProblem[] {
  const path = ['blank', 'size'];
  if (blank.shape === 'sheet' && !Array.isArray(blank.size)) {
    const message =
      blank.size === undefined ? 'the size of the sheet is not given.' : 'a sheet has two sizes.';
    return [{ path, message, hint: 'Give size: [width, height], centred on the wheel.' }];
  }
  return blank.shape === 'disc' && Array.isArray(blank.size)
    ? [{ path, message: 'a disc has one size.', hint: 'Give its diameter, size: 31.5, or leave size out.' }]
    : [];
}
