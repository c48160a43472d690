/** What every pass is planned from. */
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';
import type { Crossings, WheelForm } from '../tooth/wheel.ts';
import type { Heights } from './heights.ts';

export interface CutTask {
  readonly job: Job;
  readonly machine: Machine;
  readonly form: WheelForm;
  readonly crossings: Crossings | undefined;
  readonly heights: Heights;
}
