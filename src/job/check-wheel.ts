/** Sizes of the wheel against each other: bore, hub, windows, rim, root circle; centres; tooth and leaf in one pitch. */
import type { Problem } from '../base/problem.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import { jobProblem, type JobProblem } from './job-problem.ts';
import type { JobText } from './job-schema.ts';
import type { WheelJob } from './job.ts';
import { showLength } from './show-length.ts';

export function checkWheel(text: JobText, wheel: WheelJob, form: WheelForm): Problem[] {
  const show = (mm: number): string => showLength(mm, text.length ?? 'mm');
  return [
    ...circles(text, wheel, form, show),
    ...thin(text, wheel, show),
    ...pitch(wheel),
    ...centres(wheel, show),
  ].map(jobProblem);
}

type Show = (mm: number) => string;

function circles(text: JobText, wheel: WheelJob, form: WheelForm, show: Show): JobProblem[] {
  const problems: JobProblem[] = [];
  const root = 2 * form.rootRadius;
  const hole = Math.max(wheel.bore, text.blank.bored ?? 0);
  const which = hole > wheel.bore ? ['blank', 'bored'] : ['wheel', 'bore'];
  if (wheel.crossings !== undefined && hole >= wheel.crossings.hub) {
    const message = `the bore, ${show(hole)}, is not smaller than the hub, ${show(wheel.crossings.hub)}.`;
    problems.push({ path: which, message, hint: 'Make the hub larger, or the bore smaller.' });
  } else if (hole >= root) {
    const message = `the bore, ${show(hole)}, is not smaller than the root circle, ${show(root)}.`;
    problems.push({ path: which, message, hint: 'Are the bore and the module right? Both are diameters.' });
  }
  const leave = text.cuts?.bore?.leave ?? 0;
  if (leave > 0 && leave >= wheel.bore) {
    const message = `${show(leave)} left leaves nothing of a bore of ${show(wheel.bore)}.`;
    problems.push({
      path: ['cuts', 'bore', 'leave'],
      message,
      hint: 'A few hundredths of a millimetre are left for a broach.',
    });
  }
  return problems;
}

/** Modules below which what is left between windows, bore and teeth is told as thin. Why: three is usual for a rim (from memory);
 *  under one it bends away from the cutter, and a wheel that is cut right is bent when it is taken off. */
const THIN = 1;

function thin(text: JobText, { module, bore, crossings }: WheelJob, show: Show): JobProblem[] {
  if (crossings === undefined) {
    return [];
  }
  const wall = (crossings.hub - Math.max(bore, text.blank.bored ?? 0)) / 2;
  const left: readonly (readonly [string, string, number])[] = [
    ['arm', 'an arm', Math.min(crossings.armAtHub, crossings.armAtRim)],
    ['rim', 'the rim', crossings.rim],
    ['hub', 'the hub round the bore', wall],
  ];
  return left
    .filter(([, , width]) => width > 0 && width < THIN * module)
    .map(([key, what, width]) => ({
      path: ['wheel', 'crossings', key],
      severity: 'warning',
      message: `${what} is ${show(width)} wide, less than a module (${show(module)}): it bends under the cutter.`,
      hint: 'Is it meant so? A rim of about three modules is usual.',
    }));
}

/** Tooth and leaf (or trundle) share one circular pitch; what is over is the play at the pitch line. */
function pitch({ tooth, mate }: WheelJob): JobProblem[] {
  const other = mate.kind === 'pinion' ? mate.leaf : mate.trundle;
  const play = Math.PI * (1 - tooth) - other;
  if (play > 0) {
    return [];
  }
  const key = mate.kind === 'pinion' ? 'leaf' : 'trundle';
  const message = `a tooth of ${(Math.PI * tooth).toFixed(3)} and a ${key} of ${other} modules do not go into a pitch of 3.142: the pair jams.`;
  return [{ path: ['wheel', 'mate', key], message, hint: `Make the tooth or the ${key} thinner.` }];
}

/** Modules by which centres may differ from the nominal: noticed, and refused. Why: 0.1 is ordinary wear of pivot holes;
 *  a whole one is most of a tooth's depth, so that the teeth either jam or let go. */
const NOTICED = 0.1;
const REFUSED = 1;

function centres({ centres: at, module, teeth, mate }: WheelJob, show: Show): JobProblem[] {
  const leaves = mate.kind === 'pinion' ? mate.leaves : mate.trundles;
  const nominal = (module * (teeth + leaves)) / 2;
  const off = (at - nominal) / module;
  if (Math.abs(off) <= NOTICED) {
    return [];
  }
  const fitting = (2 * at) / (teeth + leaves);
  const message =
    `centres of ${show(at)} are ${Math.abs(off).toFixed(2)} modules ${off > 0 ? 'more' : 'less'} than the nominal ` +
    `${show(nominal)} of ${teeth} teeth, ${leaves} leaves and module ${Number(module.toFixed(4))} mm.`;
  const hint = `A module of ${fitting.toFixed(4)} mm would have these centres; leave module out to get it.`;
  return [
    { path: ['wheel', 'centres'], message, hint, severity: Math.abs(off) > REFUSED ? 'error' : 'warning' },
  ];
}
