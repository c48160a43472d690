/**
 * What the cutters reach, before anything is cut.
 *
 * In  : the form, the finishing cutter, the job's list of cutters. Out: the figures of `Reach` with remarks for the sheet, or a
 *       refusal where the working flank is out of reach. mm.
 * A cutter that reaches the root between radial flanks: (Rr + r) sin(s) = r, s the half angle of the space at the root.
 * Roughing rule: root width 2 Rr sin(s) >= D + 2 allowance + 0.05, so that the cutter is not held on both sides.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { PROOF_RESOLUTION } from '../base/tolerances.ts';
import type { Cutter } from '../cutting/setup.ts';
import { startOf } from '../geometry/on-piece.ts';
import { angleOf } from '../geometry/point.ts';
import { figure, showLength } from '../job/show-length.ts';
import { asCut, type AsCut } from '../tooth/as-cut.ts';
import { largestCutterBelow } from '../tooth/largest-cutter.ts';
import { toothSide } from '../tooth/tooth-side.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import type { CutTask } from './cut-task.ts';
import type { Reach } from './plan.ts';
import { roughingSeconds } from './roughing-time.ts';

/** Room beside a roughing cutter in the root, beyond the allowances: 0.05 to 0.08 mm in a comparison of our own. */
const ROOM = 0.05;

export function reach(task: CutTask): Outcome<Reach> {
  const { job, form } = task;
  const { finishing, roughing } = job.cuts;
  const made = asCut(form, finishing.cutter.diameter);
  if (!made.ok) {
    return made;
  }
  const rough = asCut(form, roughing.cutter.diameter + 2 * roughing.allowance);
  if (!rough.ok) {
    return rough;
  }
  const flank = flankInReach(task, made.value);
  if (flank !== undefined) {
    return failure([flank]);
  }
  const best = largestForRoughing(task);
  return success({
    largestCutter: made.value.largestCutter,
    leftAtRoot: made.value.leftAtRoot,
    leftArea: made.value.areaLeft,
    roughingCutter: best?.diameter ?? null,
    remarks: remarksOf(task, made.value, best),
  });
}

function flankInReach({ job, form }: CutTask, made: AsCut): Problem | undefined {
  if (made.footRadius <= form.workingRadius + PROOF_RESOLUTION) {
    return undefined;
  }
  const { cutter } = job.cuts.finishing;
  const side = toothSide(form.proportions);
  const largest = side.ok ? 2 * largestCutterBelow(side.value, form.workingRadius) : 0;
  return {
    code: 'reach.flank',
    severity: 'error',
    message:
      `cutter ${cutter.number} of ${showLength(cutter.diameter, job.length)} leaves metal on the flank up to a radius of ${made.footRadius.toFixed(4)} mm, ` +
      `and the mate's tip works from ${form.workingRadius.toFixed(4)} mm`,
    hint: `the largest cutter that would do for the working flank is ${(Math.floor(largest * 1000) / 1000).toFixed(3)} mm`,
    at: { kind: 'value', file: job.file, path: ['cuts', 'finishing', 'cutter'] },
  };
}

/** Width of the space at the root circle. */
export function rootWidth(form: WheelForm): number {
  const half = Math.PI / form.proportions.teeth;
  const flank = form.sector.find(({ role }) => role === 'flank');
  const angle = flank === undefined ? 0 : half + angleOf(startOf(flank.piece));
  return 2 * form.rootRadius * Math.sin(angle);
}

/** The largest of the job's cutters that roughs the spaces by the rule and is long enough. */
function largestForRoughing({ job, form, heights }: CutTask): Cutter | undefined {
  const room = rootWidth(form) - 2 * job.cuts.roughing.allowance - ROOM;
  const depth = heights.top - heights.bottom;
  return job.setup.cutters
    .filter(({ diameter, reach: long }) => diameter <= room && long >= depth)
    .toSorted((a, b) => b.diameter - a.diameter)[0];
}

function remarksOf(task: CutTask, made: AsCut, best: Cutter | undefined): readonly string[] {
  const { job, form } = task;
  const { roughing, finishing } = job.cuts;
  const remarks = [
    made.reachesRoot
      ? `cutter ${finishing.cutter.number} reaches the root; in its corners it leaves at most ${made.leftAtRoot.toFixed(4)} mm (${made.areaLeft.toFixed(4)} mm2 a space), all of it below the working flank`
      : `cutter ${finishing.cutter.number} does not reach the root: it leaves at most ${made.leftAtRoot.toFixed(4)} mm there (${made.areaLeft.toFixed(4)} mm2 a space), all of it below the working flank; up to ${made.largestCutter.toFixed(3)} mm would reach it`,
  ];
  if (best !== undefined && best.diameter > roughing.cutter.diameter) {
    const now = roughingSeconds(task, roughing.cutter);
    const then = roughingSeconds(task, best);
    if (now !== undefined && then !== undefined && then < now) {
      const saved = ((100 * (now - then)) / now).toFixed(0);
      remarks.push(
        `cutter ${best.number} of ${figure(best.diameter, 4)} mm would rough the spaces in about ${(then / 60).toFixed(1)} minutes instead of ${(now / 60).toFixed(1)}, ${saved} % less`,
      );
    }
  } else if (roughing.cutter.diameter > rootWidth(form) - 2 * roughing.allowance - ROOM) {
    remarks.push(
      `the root is ${rootWidth(form).toFixed(3)} mm wide: cutter ${roughing.cutter.number} of ${figure(roughing.cutter.diameter, 4)} mm is held on both sides there, and leaves more for finishing`,
    );
  }
  return remarks;
}
