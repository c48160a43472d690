/**
 * An independent test of fit: would a person with pencil and paper say too that this job cannot be made? From the job's numbers
 * alone, by formulas of its own, with nothing of `src/`. Each reason names the problem's place that it bears out. mm.
 *
 * Two flanks that part from the axis at angles +-s hold a disc of radius r between them at r / tan s from the axis; one that
 * rests on the root circle Rr and a flank touches the flank at sqrt(Rr^2 + 2 Rr r) (a right triangle, centre at Rr + r).
 */
import type { RandomCutter, RandomJob, RandomPass } from './random-job.ts';
import { roundWindow, straightOf } from './fits-windows.ts';
import { boreRoom, fitsSpace, fluteOf, goesThrough, spaceAngle, thirdOgive, width } from './fits-space.ts';
import { tipRadius } from './tooth-points.ts';

export interface Reason {
  /** Starts the place of the problem it bears out: `blank.size`, `cutters`, `machine` … */
  readonly bears: readonly string[];
  readonly why: string;
}

/** Spindle and travel of each machine of posts/, copied by hand from its page. */
const LIMITS: Readonly<
  Record<
    string,
    {
      readonly spindle: readonly [number, number];
      readonly x: number;
      readonly y: number;
      readonly z: number;
      readonly feed: number;
      readonly nut: number;
    }
  >
> = {
  'bench-mill': { spindle: [200, 24000], x: 300, y: 160, z: 200, feed: 3000, nut: 28 },
  'desk-four-axis': { spindle: [3000, 20000], x: 180, y: 120, z: 90, feed: 1000, nut: 22 },
  'desk-three-axis': { spindle: [5000, 24000], x: 200, y: 150, z: 60, feed: 800, nut: 19 },
  'din-66025': { spindle: [500, 18000], x: 320, y: 220, z: 180, feed: 3000, nut: 28 },
  'inch-bench-mill': { spindle: [200, 20000], x: 406, y: 203, z: 254, feed: 2540, nut: 28 },
  'lines-only': { spindle: [8000, 28000], x: 300, y: 180, z: 45, feed: 600, nut: 19 },
  'machining-centre': { spindle: [100, 15000], x: 500, y: 400, z: 400, feed: 5000, nut: 32 },
};

/** m/min at which a carbide edge is past any use, copied by hand: four times the speeds of shop charts, taken low. */
const BURNS: Readonly<Record<string, number>> = {
  'leaded-brass': 400,
  brass: 320,
  'free-cutting-steel': 320,
  'silver-steel': 180,
  aluminium: 800,
  acetal: 600,
};

export function reasonsAgainst(job: RandomJob): readonly Reason[] {
  const rootRadius = job.module * (job.teeth / 2 - job.dedendum);
  const tip = tipRadius(job);
  return [
    ...blank(job, tip),
    ...lengths(job),
    ...widths(job, rootRadius),
    ...flank(job, rootRadius),
    ...crossings(job, rootRadius),
    ...machine(job, tip),
    ...clamps(job, rootRadius, tip),
    ...smallest(job, tip),
  ];
}

/** The cutters that may do a pass: the named one, or all of them. */
function may(job: RandomJob, pass: RandomPass): readonly RandomCutter[] {
  const number = job.named[pass];
  return number === undefined ? job.cutters : job.cutters.slice(number - 1, number);
}

function deep(job: RandomJob): number {
  return job.thickness + (job.holding === 'skin' ? 0 : (job.below ?? 0.1));
}

/** True of every cutter that may do it: then the job cannot be done with what is there. */
function none(job: RandomJob, pass: RandomPass, would: (cutter: RandomCutter) => boolean): boolean {
  return may(job, pass).every((cutter) => !would(cutter));
}

function blank(job: RandomJob, tip: number): Reason[] {
  if (job.sheet !== undefined) {
    const least = Math.min(...may(job, 'roughing').map(width));
    const left = job.sheet[0] / 2 - tip - least;
    return left < 1.12
      ? [{ bears: ['blank.size'], why: `${left.toFixed(3)} mm of sheet outside the slot` }]
      : [];
  }
  const error = job.disc === undefined ? 0 : Math.abs(job.disc / 2 - tip);
  return error > 0.029
    ? [{ bears: ['blank.size'], why: `the disc is ${error.toFixed(3)} mm off on the radius` }]
    : [];
}

/** Long enough for the plate, and the flute for finishing in one go where no step is given. */
function lengths(job: RandomJob): Reason[] {
  const need = deep(job) - 1e-5;
  const passes: RandomPass[] = ['roughing', 'finishing'];
  if (job.bore > job.bored) {
    passes.push('bore');
  }
  if (job.crossings !== undefined) {
    passes.push('crossings');
  }
  // A longer cutter that is too wide for what it is to make is no help.
  const slots = may(job, 'roughing').filter((cutter) => cutter.reach >= need && fitsSpace(job, cutter));
  const enters = (pass: RandomPass, cutter: RandomCutter): boolean =>
    ({
      bore: width(cutter) <= boreRoom(job),
      crossings: width(cutter) <= 2 * (job.crossings?.corner ?? 0),
      roughing: slots.includes(cutter),
      finishing: slots.some((slot) => goesThrough(job, slot, cutter)),
    })[pass];
  const short = passes.filter((pass) =>
    none(job, pass, (cutter) => cutter.reach >= need && enters(pass, cutter)),
  );
  const once = job.finishingStep ?? need;
  const noFlute = none(
    job,
    'finishing',
    (cutter) => cutter.reach >= need && fluteOf(cutter) >= once && enters('finishing', cutter),
  );
  return [
    ...short.map((pass) => ({
      bears: ['cutters'],
      why: `no cutter that fits reaches ${need.toFixed(3)} mm in ${pass}`,
    })),
    ...(noFlute
      ? [
          {
            bears: ['cutters', 'cuts.finishing'],
            why: `no flute that fits cuts ${once.toFixed(3)} mm at a time for finishing`,
          },
        ]
      : []),
  ];
}

function widths(job: RandomJob, rootRadius: number): Reason[] {
  const reasons: Reason[] = [];
  if (none(job, 'roughing', (cutter) => fitsSpace(job, cutter))) {
    reasons.push({
      bears: ['cuts.roughing', 'cuts.finishing', 'cutters'],
      why: 'no cutter enters the spaces',
    });
  }
  if (job.bore > job.bored && none(job, 'bore', (cutter) => width(cutter) <= boreRoom(job))) {
    reasons.push({ bears: ['cuts.bore', 'wheel.bore'], why: 'no cutter has room in the bore' });
  }
  if (job.bore / 2 >= rootRadius || (job.crossings !== undefined && job.bore >= job.crossings.hub)) {
    reasons.push({ bears: ['wheel'], why: 'the bore is larger than what it is in' });
  }
  return reasons;
}

/** Where the lowest touched point of a flank lies, against where the mate's tip works. */
function flank(job: RandomJob, rootRadius: number): Reason[] {
  const works = job.centres - job.module * (job.leaves / 2 + thirdOgive(job));
  const s = spaceAngle(job);
  const foot = (cutter: RandomCutter): number => {
    const r = Math.max(width(cutter) / 2, job.root);
    return Math.max(r / Math.tan(s), Math.sqrt(rootRadius * rootRadius + 2 * rootRadius * r));
  };
  const would = (cutter: RandomCutter): boolean => foot(cutter) <= works;
  const low = Math.max(...may(job, 'finishing').map(foot));
  return none(job, 'finishing', would)
    ? [
        {
          bears: ['cuts.finishing', 'wheel'],
          why: `the flank begins at ${low.toFixed(4)} mm, the mate works from ${works.toFixed(4)} mm`,
        },
      ]
    : [];
}

function crossings(job: RandomJob, rootRadius: number): Reason[] {
  const w = job.crossings;
  if (w === undefined) {
    return [];
  }
  const reasons: Reason[] = [];
  const outer = rootRadius - w.rim;
  const room = outer - w.hub / 2;
  const largest = Math.min(room / 2, roundWindow(w, outer));
  if (room <= 0 || w.corner > largest - 1e-6) {
    reasons.push({
      bears: ['wheel.crossings'],
      why: `corners of at most ${largest.toFixed(3)} mm fit the window`,
    });
  }
  if (none(job, 'crossings', (cutter) => width(cutter) <= 2 * w.corner)) {
    reasons.push({ bears: ['cuts.crossings'], why: 'no cutter goes round the corners' });
  }
  if (none(job, 'crossings', (cutter) => width(cutter) / 2 < 0.9 * largest)) {
    reasons.push({ bears: ['cuts.crossings'], why: 'no cutter has room in a window' });
  }
  const straight = straightOf(w, outer);
  if (job.holding === 'skin' && none(job, 'crossings', (cutter) => straight > 0.15 * width(cutter))) {
    reasons.push({
      bears: ['cuts.crossings'],
      why: `${straight.toFixed(3)} mm of straight wall: no cutter comes up to it in the slot round the slug`,
    });
  }
  return reasons;
}

/** Travel for the wheel, the slot round it and a bay on the right; the spindle's speed. */
function machine(job: RandomJob, tip: number): Reason[] {
  const limits = LIMITS[job.machine];
  if (limits === undefined) {
    return [];
  }
  const widest = Math.max(...may(job, 'roughing').map(width));
  const x = 2 * tip + 2.6 * widest + 0.3;
  const y = 2 * tip + widest + 0.3;
  const reasons: Reason[] = [];
  if (x > limits.x || y > limits.y) {
    reasons.push({
      bears: ['machine'],
      why: `the work is ${x.toFixed(1)} by ${y.toFixed(1)} mm, the travel ${String(limits.x)} by ${String(limits.y)}`,
    });
  }
  if (job.speed !== undefined && (job.speed < limits.spindle[0] || job.speed > limits.spindle[1])) {
    reasons.push({
      bears: ['cuts.roughing.speed'],
      why: `the spindle does not turn at ${String(job.speed)}`,
    });
  }
  const edge = (Math.PI * widest * (job.speed ?? 0)) / 1000;
  const burns = BURNS[job.material] ?? Infinity;
  if (edge > burns) {
    reasons.push({
      bears: ['cuts.roughing.speed'],
      why: `the edge would run at ${edge.toFixed(0)} m/min, which burns it in ${job.material}`,
    });
  }
  return reasons;
}

/** Clamps against a cutter that goes round the wheel, its shank, and the nut above; a screw's head against the windows. */
function clamps(job: RandomJob, rootRadius: number, tip: number): Reason[] {
  const nut = LIMITS[job.machine]?.nut ?? 28;
  const reasons: Reason[] = [];
  const hits = (
    away: number,
    radius: number,
    top: number,
    path: readonly [number, number],
    cutter: RandomCutter,
  ): boolean => {
    const parts: readonly (readonly [number, number])[] = [
      [width(cutter) / 2, 0],
      [(cutter.shank ?? 3.175) / 2, cutter.reach],
      [nut / 2, cutter.stickOut ?? cutter.reach + 12],
    ];
    const gap = Math.max(away - path[1], path[0] - away) - radius;
    return parts.some(([half, above]) => above < top && gap < half + 0.5);
  };
  for (const { x, y, radius, height } of job.clamps) {
    const away = Math.hypot(x, y);
    if (
      may(job, 'roughing').some((cutter) =>
        hits(away, radius, height + 0.2, [rootRadius, tip + 2.6 * width(cutter)], cutter),
      )
    ) {
      reasons.push({ bears: ['blank.keep-out'], why: 'a clamp stands in the way' });
    }
  }
  if (job.holding === 'glue-and-screw') {
    const top = deep(job) + job.screw.height;
    const inner = job.crossings === undefined ? rootRadius : job.crossings.hub / 2;
    if (job.cutters.some((cutter) => hits(0, job.screw.head / 2, top, [inner, tip], cutter))) {
      reasons.push({ bears: ['blank.holding'], why: 'the screw stands in the way' });
    }
    if (job.screw.head <= job.bored || job.screw.thread > job.bored) {
      reasons.push({ bears: ['blank.holding'], why: 'the screw does not go with the hole' });
    }
  }
  return reasons;
}

/** Values below what a job file takes at all. */
function smallest(job: RandomJob, _tip: number): Reason[] {
  const reasons: Reason[] = [];
  if (job.says.includes('centres') && job.centres < 1) {
    reasons.push({ bears: ['wheel.centres'], why: 'pivots less than 1 mm apart' });
  }
  // A tooth is some three modules deep and works over less than two of them.
  if (Math.abs(job.centres - (job.module * (job.teeth + job.leaves)) / 2) > 0.99 * job.module) {
    reasons.push({ bears: ['wheel.centres'], why: 'the pivots are a module off: the teeth jam or let go' });
  }
  if (
    job.cutters.some(({ diameter, reach, flute }) => diameter < 0.051 || reach < 0.1 || (flute ?? 1) < 0.1)
  ) {
    reasons.push({ bears: ['cutters'], why: 'smaller than a cutter can be' });
  }
  return reasons;
}
