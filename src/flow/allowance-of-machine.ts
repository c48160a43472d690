/**
 * A job whose roughing leaves enough for what the machine strays from the path while it roughs: where the job itself says no
 * allowance, half again the straying that its machine file tells. Why: a corner that is rounded off by more than is left there
 * marks the finished tooth, and no proof of a program's words sees it. mm.
 */
import type { Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';

const HALF_AGAIN = 1.5;
const KEY = 'cuts.roughing.allowance';

export function withAllowanceOfMachine(job: Job, { name, words }: Machine): Job {
  const least = HALF_AGAIN * (words.path.roughingStrays ?? 0);
  const { roughing } = job.cuts;
  if (!Object.hasOwn(job.derived, KEY) || roughing.allowance >= least) {
    return job;
  }
  const why = `half again what ${name} strays from the path while it roughs`;
  return {
    ...job,
    cuts: { ...job.cuts, roughing: { ...roughing, allowance: least } },
    derived: { ...job.derived, [KEY]: { value: least, why } },
  };
}
