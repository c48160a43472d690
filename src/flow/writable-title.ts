/**
 * The title as a program of this machine can be headed with it: a controller's letters are few, and a title of which none
 * can be written would leave a program without a name.
 *
 * In  : job, machine. Out: the title, or what stands in its place, and then a warning at the title.
 */
import { success, type Outcome } from '../base/problem.ts';
import type { Job } from '../job/job.ts';
import { jobProblem } from '../job/job-problem.ts';
import { placeInJob } from '../job/place-problems.ts';
import type { Machine } from '../machine/machine.ts';
import { commentCleaner } from '../post/clean-comment.ts';

export function writableTitle(job: Job, machine: Machine): Outcome<string> {
  const { file } = machine.words;
  // Where comments are not read the header is a text of its own, in whatever letters.
  const clean = file.commentForm === 'none' ? (text: string) => text : commentCleaner(file);
  const canBeRead = (text: string): boolean => /[\p{L}\p{N}]/u.test(clean(text));
  if (canBeRead(job.title)) {
    return success(job.title);
  }
  const instead = canBeRead(job.name) ? job.name : `wheel of ${job.wheel.teeth} teeth`;
  const message = `none of its letters can be written for ${machine.name}: its programs are headed "${instead}" instead.`;
  const hint = 'Give a title in plain letters; the sheet keeps this one.';
  const problem = jobProblem({ code: 'job.invalid', severity: 'warning', path: ['title'], message, hint });
  return success(instead, [placeInJob(problem, job)]);
}
