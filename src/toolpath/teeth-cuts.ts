/**
 * The teeth: the bay (or the mouths of a disc), roughing, finishing and spring passes.
 *
 * In  : the task. Out: the passes 'bay', 'mouths', 'roughing' for the roughing's turn, 'finishing' and 'spring' for the
 *       finishing's, or why they can't be cut. Wheel frame, mm.
 * Climb: with a right-hand cutter turning clockwise the edge moves against the travel on the cutter's right, so the wheel
 * lies on the right where the cutter climbs: clockwise round the outside.
 */
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { WRITTEN_LENGTH } from '../base/tolerances.ts';
import {
  FIT_ERROR,
  FIT_ERROR_MOST,
  FORM_ERROR,
  LINE_FIT_ERROR,
  LINE_FIT_INSIDE,
} from '../base/tolerances.ts';
import { showLength } from '../job/show-length.ts';
import { asCut } from '../tooth/as-cut.ts';
import { bayFor, joinCorner, type Bay } from './bay.ts';
import type { CutTask } from './cut-task.ts';
import { directionWhy, roughsClimbing } from './direction.ts';
import { finishingRun, type FinishTask } from './finishing.ts';
import { loopLegs } from './loop-legs.ts';
import { mouthRuns } from './mouths.ts';
import { downTheMiddle } from './thin-fins.ts';
import { passCuts, type PassCuts } from './pass-cuts.ts';
import { pitchPath, type PitchPath } from './pitch-path.ts';
import { roundHole } from './round-hole.ts';
import { descent } from './roughing.ts';
import { levelsFor, settingsFor, type Settings } from './settings.ts';

export interface TeethCuts {
  readonly roughing: readonly PassCuts[];
  readonly finishing: readonly PassCuts[];
}

interface Teeth {
  readonly task: CutTask;
  readonly rough: Settings;
  readonly fine: Settings;
  readonly allowance: number;
  readonly roughPath: PitchPath;
  /** Nearer and nearer to the outline; the last one makes it. */
  readonly finePaths: readonly PitchPath[];
  readonly bay: Bay;
  readonly turned: boolean;
  /** Whether the roughing loop goes down the middle of every space as well. */
  readonly fins: boolean;
}

/**
 * Metal in the root's corner, over the finishing cutter's diameter, above which its middle cuts too: a slot, no finishing. Its
 * middle reaches to a quarter; a little is kept from that for rounding.
 */
const THICK = 0.23;
/** How far the roughing path may stray outward, over the allowance: few blocks, and hardly more to finish. Judgement. */
const ROUGH_STRAYS = 0.25;
/**
 * How much further it may stray over a tip, which it goes round in one arc. Judgement: round the outside of a tip little of
 * the edge is engaged, so that finishing it bears twice the depth.
 */
const ROUGH_TIP = 1;
/** A disc at most this much over the tip circle is turned to it. */
const TURNED = 0.05;

export function teethCuts(task: CutTask): Outcome<TeethCuts> {
  const { job, machine } = task;
  const { allowance } = job.cuts.roughing;
  const radialDepth = Math.max(allowance, LEAST_BITE) / job.cuts.finishing.passes;
  const rough = settingsFor(job, machine, 'roughing', 'slot', allowance);
  const fine = settingsFor(job, machine, 'finishing', radialDepth, 0);
  const wider = tooWideFor(task);
  if (!rough.ok || !fine.ok || wider !== undefined) {
    return failure([...rough.problems, ...fine.problems, ...(wider === undefined ? [] : [wider])]);
  }
  const paths = pathsOf(task, rough.value.radius, fine.value.radius);
  if (!paths.ok) {
    return paths;
  }
  const bay = bayFor(
    paths.value.finePaths[0] as PitchPath,
    allowance,
    Math.max(rough.value.radius, fine.value.radius),
  );
  const teeth: Teeth = { task, rough: rough.value, fine: fine.value, allowance, bay, ...paths.value };
  const finishing = finishingCuts(teeth, radialDepth);
  if (!finishing.ok) {
    return finishing;
  }
  return success({ roughing: roughingCuts(teeth), finishing: finishing.value }, rubs(task, fine.value));
}

/** What a pass without any allowance is reckoned to take off: what bending has left. */
const LEAST_BITE = 0.005;

function pathsOf(
  task: CutTask,
  roughRadius: number,
  fineRadius: number,
): Outcome<Pick<Teeth, 'roughPath' | 'finePaths' | 'turned' | 'fins'>> {
  const { job, form } = task;
  const { allowance } = job.cuts.roughing;
  const way = job.cuts.climb ? -1 : 1;
  const roughWay = roughsClimbing(job) ? -1 : 1;
  const { shape } = job.setup;
  const turned = shape.kind === 'disc' && shape.diameter <= 2 * form.outsideRadius + TURNED;
  const made = task.machine.words.arcs.planes === 'none' ? 'lines' : 'arcs';
  const strays = Math.max(FORM_ERROR, ROUGH_STRAYS * allowance);
  const roughPath = pitchPath({
    form,
    // Arcs lie to either side of the curve: so far out that none takes more of the allowance than a close fit would.
    distance: roughRadius + allowance + (made === 'arcs' ? strays - FIT_ERROR / 2 : 0),
    way: roughWay,
    made,
    strays,
    arcError: { close: strays, most: strays },
    lands: ROUGH_TIP * allowance,
    begins: roughWay === way ? 'after-land' : 'before-land',
  });
  if (!roughPath.ok) {
    return roughPath;
  }
  // The mouths of a disc are opened anyway.
  const spur = turned ? undefined : downTheMiddle(form, roughPath.value, roughRadius);
  const finePaths: PitchPath[] = [];
  for (let pass = 1; pass <= job.cuts.finishing.passes; pass++) {
    const left = allowance * (1 - pass / job.cuts.finishing.passes);
    const path = pitchPath({
      form,
      // Lines stray outward only: from a path a little inside, the error is shared between both sides.
      distance: fineRadius + left - (made === 'lines' ? LINE_FIT_INSIDE : 0),
      way,
      made,
      strays: LINE_FIT_INSIDE + LINE_FIT_ERROR,
      arcError: { close: FIT_ERROR, most: FIT_ERROR_MOST },
      lands: turned ? 'clear' : 'cut',
      begins: 'after-land',
    });
    if (!path.ok) {
      return path;
    }
    finePaths.push(path.value);
  }
  return success({ roughPath: spur ?? roughPath.value, finePaths, turned, fins: spur !== undefined });
}

function roughingCuts({ task, rough, roughPath, bay, turned, fins, allowance }: Teeth): readonly PassCuts[] {
  const { heights, form, job } = task;
  const depth = heights.top - heights.bottom;
  const join = joinCorner(roughPath, bay, rough.radius, rough.data.feed);
  const loop = loopLegs(roughPath, form.proportions.teeth, join, () => rough.data.feed);
  const { run, laps, why } = descent({ loop, join, bay, settings: rough, heights });
  const levels = levelsFor(depth, rough.step);
  const figures = { settings: rough, heights, step: depth / levels } as const;
  const roughing = passCuts(
    {
      ...figures,
      name: 'roughing',
      laps,
      why: [
        why,
        `${allowance} mm left on the flanks`,
        directionWhy(job),
        ...(fins ? ['from every root out along the middle and back, so that no thin fin stands there'] : []),
      ],
    },
    [run],
  );
  if (turned) {
    const runs = mouthRuns({ form, distance: roughPath.distance, settings: rough, heights });
    const dips = 'a straight dip in every space first, so that no loose pillar is left in its mouth';
    return runs.length === 0
      ? [roughing]
      : [passCuts({ ...figures, name: 'mouths', laps: levels, why: [dips] }, runs), roughing];
  }
  const hole = {
    centre: bay.middle,
    radius: bay.radius,
    existing: 0,
    settings: rough,
    heights,
    way: roughsClimbing(job) ? 1 : -1,
    pass: 'bay',
  } as const;
  const beside = 'a hole in the waste beside tooth 1, in which every loop is entered and left';
  return [passCuts({ ...figures, name: 'bay', laps: levels, why: [beside] }, [roundHole(hole)]), roughing];
}

function finishingCuts(teeth: Teeth, radialDepth: number): Outcome<readonly PassCuts[]> {
  const { task, fine, finePaths, bay } = teeth;
  const { job, heights, form } = task;
  const depth = heights.top - heights.bottom;
  const levels = finishingLevels(teeth);
  if (!levels.ok) {
    return levels;
  }
  const { count, why } = levels.value;
  const shared = { teeth: form.proportions.teeth, bay, settings: fine, heights, levels: count };
  const figures = { settings: fine, heights, step: depth / count } as const;
  const cuts = (
    name: string,
    paths: readonly PitchPath[],
    bite: number,
    say: readonly string[],
  ): PassCuts => {
    const finish: FinishTask = { ...shared, radialDepth: bite };
    return passCuts({ ...figures, name, laps: paths.length * count, why: say }, [
      finishingRun(finish, name, paths),
    ]);
  };
  const joined = 'every loop is joined and left on the arc round a tip corner of tooth 1, never on a flank';
  const finishing = cuts('finishing', finePaths, radialDepth, [
    why,
    joined,
    'slower just before the root, where the cutter is held most',
  ]);
  const last = finePaths.at(-1) as PitchPath;
  const springs = Array.from({ length: job.cuts.finishing.spring }, () => last);
  const spring = 'the same loop again: it takes off what bending left';
  return success(
    springs.length === 0 ? [finishing] : [finishing, cuts('spring', springs, radialDepth, [spring])],
  );
}

/** Full depth where the flute allows and the root holds no thick metal, else levels. */
function finishingLevels({
  task,
  fine,
  rough,
  roughPath,
}: Teeth): Outcome<{ readonly count: number; readonly why: string }> {
  const { job, machine, heights, form } = task;
  const depth = heights.top - heights.bottom;
  const roughed = asCut(form, 2 * roughPath.distance);
  const finished = asCut(form, fine.cutter.diameter);
  if (!roughed.ok || !finished.ok) {
    return failure([...roughed.problems, ...finished.problems]);
  }
  const left = roughPath.distance - rough.radius;
  // In the root's corners; and how much further in it goes where both wedge between the flanks, several times what is left on these.
  const corner = roughed.value.leftAtRoot - finished.value.leftAtRoot + left;
  const wedge = roughed.value.floorRadius + left - finished.value.floorRadius;
  const thick = Math.max(corner, wedge);
  if (thick > THICK * fine.cutter.diameter) {
    const slot = settingsFor(job, machine, 'finishing', 'slot', 0);
    if (!slot.ok) {
      return slot;
    }
    const count = levelsFor(depth, Math.min(slot.value.step, fine.cutter.flute));
    return success({
      count,
      why: `in ${count} levels, as the roughing cutter leaves ${thick.toFixed(3)} mm at the root: ${slot.value.why.at(-1) ?? ''}`,
    });
  }
  if (fine.cutter.flute >= depth - WRITTEN_LENGTH) {
    return success({ count: 1, why: `at full depth: the flute of ${fine.cutter.flute} mm is long enough` });
  }
  const count = levelsFor(depth, Math.min(fine.cutter.flute, job.cuts.finishing.step ?? fine.cutter.flute));
  return success({
    count,
    why: `in ${count} levels: the flute is ${fine.cutter.flute} mm long, the cut ${depth.toFixed(3)} mm deep`,
  });
}

function tooWideFor({ job }: CutTask): Problem | undefined {
  const { roughing, finishing } = job.cuts;
  const slot = roughing.cutter.diameter + roughing.allowance;
  if (finishing.cutter.diameter <= slot) {
    return undefined;
  }
  return {
    code: 'toolpath.no-entry',
    severity: 'error',
    message:
      `the finishing cutter ${finishing.cutter.number} of ${showLength(finishing.cutter.diameter, job.length)} is wider than the slot that cutter ` +
      `${roughing.cutter.number} of ${showLength(roughing.cutter.diameter, job.length)} leaves for it`,
    hint: 'rough with a cutter at least as wide as the finishing one',
    at: { kind: 'value', file: job.file, path: ['cuts', 'finishing', 'cutter'] },
  };
}

function rubs({ job }: CutTask, { data, cutter }: Settings): readonly Problem[] {
  if (data.feed >= data.floor) {
    return [];
  }
  return [
    {
      code: 'toolpath.rubs',
      severity: 'warning',
      message: `finishing at ${data.feed} mm/min makes a chip thinner than cutter ${cutter.number} can cut; it would take ${data.floor.toFixed(0)} mm/min`,
      hint: 'raise the feed, lower the speed, or leave a larger allowance',
      at: { kind: 'value', file: job.file, path: ['cuts', 'finishing'] },
    },
  ];
}
