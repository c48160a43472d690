/**
 * What the programs of a job are to make, and what the first-off is held against: one answer for the proof, the sheet and
 * whoever reads a program back. mm, radians, the gear frame.
 */
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import type { Job } from './job.ts';

/** Fits the prover's target, which knows of no job. */
export interface JobTarget {
  readonly form: WheelForm;
  readonly crossings?: Crossings;
  readonly thickness: number;
  /** Diameter of the hole once the programs have run; 0 for none. */
  readonly bore: number;
  readonly finishingDiameter: number;
  readonly slugsHeld: boolean;
}

/** The exact shapes that the job's proportions lead to. */
interface Shapes {
  readonly form: WheelForm;
  readonly crossings?: Crossings;
}

export function targetOfJob(job: Job, { form, crossings }: Shapes): JobTarget {
  return {
    form,
    ...(crossings === undefined ? {} : { crossings }),
    thickness: job.wheel.thickness,
    bore: boreCut(job),
    finishingDiameter: job.cuts.finishing.cutter.diameter,
    slugsHeld: job.setup.holding.includes('skin'),
  };
}

/** Diameter that the bore is cut to: less than the wheel's where metal is left for broach or reamer, or what was there before. */
export function boreCut({ wheel, cuts, setup }: Job): number {
  return wheel.bore <= 0 ? 0 : Math.max(wheel.bore - cuts.bore.leave, setup.bored, 0);
}
