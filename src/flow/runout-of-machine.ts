/**
 * A job with the machine's own runout in it: where a cutter says nothing of its runout, no less is taken than what the
 * machine file says of its spindle. Why: no collet runs truer than the spindle it sits in. mm.
 */
import type { Cutter } from '../cutting/setup.ts';
import type { CutSettings, Derived, Job } from '../job/job.ts';
import type { Machine } from '../machine/machine.ts';

export function withRunoutOfMachine(job: Job, machine: Machine): Job {
  const { runout } = machine.limits;
  const keyOf = ({ number }: Cutter): string => `cutters.${number}.runout`;
  const changed = job.setup.cutters.filter(
    (cutter) => Object.hasOwn(job.derived, keyOf(cutter)) && cutter.runout < runout,
  );
  if (changed.length === 0) {
    return job;
  }
  const cutterOf = (cutter: Cutter): Cutter =>
    changed.some(({ number }) => number === cutter.number) ? { ...cutter, runout } : cutter;
  const settings = <T extends CutSettings>(cut: T): T => ({ ...cut, cutter: cutterOf(cut.cutter) });
  const why = `of the spindle of ${machine.name}; measure it with a dial gauge`;
  const notes = changed.map((cutter): [string, Derived] => [keyOf(cutter), { value: runout, why }]);
  return {
    ...job,
    setup: { ...job.setup, cutters: job.setup.cutters.map(cutterOf) },
    cuts: {
      ...job.cuts,
      bore: settings(job.cuts.bore),
      crossings: settings(job.cuts.crossings),
      roughing: settings(job.cuts.roughing),
      finishing: settings(job.cuts.finishing),
    },
    derived: { ...job.derived, ...Object.fromEntries(notes) },
  };
}
