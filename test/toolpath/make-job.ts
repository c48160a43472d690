/** Jobs for the tests of the cuts: a third wheel in sheet, and whatever a test changes in it. */
import type { Problem } from '../../src/base/problem.ts';
import type { Cutter, Setup } from '../../src/cutting/setup.ts';
import type { Cuts, Job } from '../../src/job/job.ts';
import type { Machine } from '../../src/machine/machine.ts';
import { isMove, type Belongs, type MoveStep, type Position } from '../../src/motion/motion.ts';
import { planCuts } from '../../src/toolpath/plan-cuts.ts';
import type { CutPlan } from '../../src/toolpath/plan.ts';
import { crossings } from '../../src/tooth/crossings.ts';
import type { CrossingProportions, Crossings, WheelForm, WheelProportions } from '../../src/tooth/wheel.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';
import { postMachine } from '../support/post-machines.ts';
import { proportions, value } from '../tooth/proportions.ts';

export function cutter(number: number, diameter: number, change: Partial<Cutter> = {}): Cutter {
  return {
    number,
    diameter,
    nominal: diameter,
    flutes: 2,
    reach: 3 * diameter + 0.5,
    flute: 3 * diameter + 0.5,
    shank: 3,
    stickOut: 14,
    helix: 30,
    runout: 0.005,
    plunges: false,
    ...change,
  };
}

export interface Wanted {
  readonly length?: Job['length'];
  readonly wheel?: Partial<WheelProportions>;
  readonly thickness?: number;
  readonly bore?: number;
  readonly crossings?: CrossingProportions | null;
  readonly setup?: Partial<Setup>;
  readonly cuts?: {
    readonly [Key in keyof Cuts]?: Cuts[Key] extends object ? Partial<Cuts[Key]> : Cuts[Key];
  };
  readonly order?: Cuts['order'];
  readonly machine?: string;
}

export interface Case {
  readonly job: Job;
  readonly machine: Machine;
  readonly form: WheelForm;
  readonly crossings: Crossings | undefined;
}

const WINDOWS: CrossingProportions = { arms: 5, armAtHub: 2.4, armAtRim: 2.4, rim: 1.8, hub: 9, corner: 1.2 };

export function makeCase(wanted: Wanted = {}): Case {
  const wheel = proportions(wanted.wheel);
  const form = value(wheelForm(wheel));
  const windows = wanted.crossings === undefined ? WINDOWS : (wanted.crossings ?? undefined);
  const thickness = wanted.thickness ?? 1.5;
  const large = cutter(1, 1);
  const small = cutter(2, 0.5, { flute: 1.7 });
  const cuts = wanted.cuts ?? {};
  const job: Job = {
    name: 'test',
    file: 'test.yaml',
    title: 'A wheel for a test',
    length: wanted.length ?? 'mm',
    wheel: {
      ...wheel,
      thickness,
      bore: wanted.bore ?? 4,
      ...(windows === undefined ? {} : { crossings: windows }),
    },
    setup: {
      material: 'leaded-brass',
      shape: { kind: 'sheet', width: 44, height: 44 },
      topZ: 0,
      plateZ: -thickness,
      clearZ: 5,
      intoPlate: 0.1,
      bored: 0,
      holding: ['glue'],
      skin: 0,
      obstacles: [],
      cutters: [large, small],
      ...wanted.setup,
    },
    zero: 'top',
    machine: wanted.machine ?? 'desk-three-axis',
    cuts: {
      order: wanted.order ?? ['bore', 'roughing', 'finishing', 'crossings'],
      bore: { cutter: large, leave: 0, ...cuts.bore },
      crossings: { cutter: large, ...cuts.crossings },
      roughing: { cutter: small, allowance: 0.03, ...cuts.roughing },
      finishing: { cutter: small, passes: 1, spring: 1, ...cuts.finishing },
      below: cuts.below ?? 0.1,
      climb: cuts.climb ?? true,
      play: { x: 0, y: 0, ...cuts.play },
    },
    derived: {},
  };
  return {
    job,
    machine: postMachine(job.machine),
    form,
    crossings: windows === undefined ? undefined : value(crossings(windows, form.rootRadius)),
  };
}

export function disc(wheel: Partial<WheelProportions> = {}): Partial<Setup> {
  const form = value(wheelForm(proportions(wheel)));
  return { shape: { kind: 'disc', diameter: 2 * form.outsideRadius } };
}

export function planOf(wanted: Wanted | Case): CutPlan {
  return value(planCuts('job' in wanted ? wanted : makeCase(wanted)));
}

export function problemsOf(wanted: Wanted): readonly Problem[] {
  const planned = planCuts(makeCase(wanted));
  return planned.problems;
}

export interface PlannedMove {
  readonly from: Position;
  readonly step: MoveStep;
  readonly belongs: Belongs | undefined;
  readonly cutter: number;
  readonly spindle: number;
}

/** Every move with where it begins, over all programs; the first of a program begins nowhere and is left out. */
export function movesOf(plan: CutPlan): readonly PlannedMove[] {
  const moves: PlannedMove[] = [];
  for (const { motion } of plan.programs) {
    let from: Position | undefined;
    let cutterNow = 0;
    let spindle = 0;
    for (const step of motion.steps) {
      if (step.kind === 'cutter') {
        cutterNow = step.number;
      } else if (step.kind === 'spindle') {
        spindle = step.speed;
      } else if (isMove(step)) {
        if (from !== undefined) {
          moves.push({ from, step, belongs: step.belongs, cutter: cutterNow, spindle });
        }
        from = step.to;
      }
    }
  }
  return moves;
}

export function inPass(moves: readonly PlannedMove[], pass: string): readonly PlannedMove[] {
  return moves.filter(({ belongs, step }) => belongs?.pass === pass && step.kind !== 'rapid');
}

/** Points along a move in plan, ends included, at most `apart` from each other. */
export function pointsAlong({ from, step }: PlannedMove, apart: number): readonly Position[] {
  if (step.kind !== 'arc') {
    const length = Math.hypot(step.to.x - from.x, step.to.y - from.y, step.to.z - from.z);
    const parts = Math.max(1, Math.ceil(length / apart));
    return Array.from({ length: parts + 1 }, (_, i) => ({
      x: from.x + ((step.to.x - from.x) * i) / parts,
      y: from.y + ((step.to.y - from.y) * i) / parts,
      z: from.z + ((step.to.z - from.z) * i) / parts,
    }));
  }
  const { centre, turn, to } = step;
  const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  const parts = Math.max(1, Math.ceil((radius * Math.abs(turn)) / apart));
  return Array.from({ length: parts + 1 }, (_, i) => ({
    x: centre.x + radius * Math.cos(start + (turn * i) / parts),
    y: centre.y + radius * Math.sin(start + (turn * i) / parts),
    z: from.z + ((to.z - from.z) * i) / parts,
  }));
}
