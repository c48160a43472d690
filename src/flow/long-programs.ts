/**
 * Programs that take longer than a working day: who starts one has to stay with it, and hardly means to.
 *
 * In  : what was planned and how long it takes (s). Out: a warning for each such program, with the pass that takes most of it
 *       and what would shorten it.
 */
import type { Problem } from '../base/problem.ts';
import type { CutSettings, Job, PassKind } from '../job/job.ts';
import { jobProblem } from '../job/job-problem.ts';
import { placeInJob } from '../job/place-problems.ts';
import { showLength } from '../job/show-length.ts';
import type { SheetPass, SheetProgram } from '../report/facts.ts';

/** Why: nobody stays beside a mill for longer, and no program may run alone (common practice, no source). */
const WORKING_DAY = 8 * 3600;

type Timed = Pick<SheetProgram, 'file' | 'seconds' | 'passes'>;

export function longPrograms(
  job: Job,
  programs: readonly Timed[],
  passes: readonly SheetPass[],
): readonly Problem[] {
  return programs
    .filter(({ seconds }) => seconds > WORKING_DAY)
    .map((program) => {
      const own = passes.filter(({ name }) => program.passes.includes(name));
      const longest = own.toSorted((a, b) => b.seconds - a.seconds)[0];
      const kind = kindOf(longest?.name);
      const message =
        `${program.file} takes ${inHours(program.seconds)}, longer than a working day of ${WORKING_DAY / 3600} h: ` +
        `somebody has to stay with it all the time.`;
      const hint = longest === undefined ? 'Take a thicker cutter.' : hintFor(job, longest, kind);
      const path = kind === undefined ? ['cuts'] : ['cuts', kind];
      return placeInJob(jobProblem({ code: 'toolpath.long', severity: 'warning', path, message, hint }), job);
    });
}

function inHours(seconds: number): string {
  return `${(seconds / 3600).toFixed(1)} h`;
}

/** The pass of the job that a pass of the plan belongs to. */
function kindOf(name: string | undefined): PassKind | undefined {
  const kinds: readonly PassKind[] = ['bore', 'crossings', 'roughing', 'finishing'];
  return kinds.find((kind) => name?.includes(kind) === true);
}

function hintFor({ cuts, length }: Job, pass: SheetPass, kind: PassKind | undefined): string {
  const said: CutSettings | undefined = kind === undefined ? undefined : cuts[kind];
  const given = (['step', 'speed', 'feed', 'plunge'] as const).filter((key) => said?.[key] !== undefined);
  const laps = pass.laps[1] > 1 ? `${pass.laps[1]} laps of ${showLength(pass.step, length)}, ` : '';
  const most =
    `Most of it is ${pass.name} with cutter ${pass.cutter}, ${inHours(pass.seconds)}: ${laps}` +
    `${showLength(pass.feed, length)} a minute.`;
  return given.length > 0
    ? `${most} Leave ${given.join(' and ')} of ${kind} out: they then follow from cutter, material and machine.`
    : `${most} A thicker cutter, or one that sticks out less, takes deeper laps.`;
}
