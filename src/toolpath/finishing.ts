/**
 * Finishing the teeth: the loop at the cutter's radius, at full depth where the flute allows, in passes and spring passes.
 *
 * In  : paths of the passes (each nearer to the outline), the bay, speed and feed, levels. Wheel frame, mm, mm/min.
 * Out : one run for the passes, one for the spring passes: each loop is joined and left on the arc round a tip corner.
 */
import { rubbingFeed } from '../cutting/edge.ts';
import { engagementAngle } from '../cutting/engagement.ts';
import { steppedArcFeed } from '../cutting/arc-feed.ts';
import { partOf } from '../geometry/change-piece.ts';
import { lengthOf } from '../geometry/on-piece.ts';
import type { LinePiece } from '../geometry/piece.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import { joinCorner, type Bay } from './bay.ts';
import type { Heights } from './heights.ts';
import { flat, vertical, type Run } from './leg.ts';
import { loopLegs, type FeedOf } from './loop-legs.ts';
import type { PathPiece, PitchPath } from './pitch-path.ts';
import { pushLap } from './roughing.ts';
import type { Settings } from './settings.ts';

export interface FinishTask {
  readonly teeth: number;
  readonly bay: Bay;
  readonly settings: Settings;
  readonly heights: Heights;
  readonly levels: number;
  /** Metal that a pass takes off the flank. */
  readonly radialDepth: number;
}

/** The cutter slows this far before an inside corner, over its diameter: there the engagement grows. */
const SLOW_BEFORE = 0.25;

export function finishingRun(task: FinishTask, pass: string, paths: readonly PitchPath[]): Run {
  const { bay, settings, heights, levels } = task;
  const steps: MoveStep[] = [];
  const laps = paths.length * levels;
  let lap = 0;
  for (let level = 1; level <= levels; level++) {
    const z =
      level === levels ? heights.bottom : heights.top - ((heights.top - heights.bottom) * level) / levels;
    for (const path of paths) {
      const join = joinCorner(path, bay, settings.radius, settings.data.feed);
      const loop = loopLegs(
        slowBeforeRoot(path, SLOW_BEFORE * settings.cutter.diameter),
        task.teeth,
        join,
        feedsOf(task),
      );
      lap += 1;
      const belongs: Belongs = { pass, lap, laps, depth: z };
      const standing = steps.at(-1)?.to.z === z;
      if (!standing) {
        steps.push(vertical(bay.middle, z, settings.data.feed, belongs));
      }
      steps.push(...flat(join.joining, z, belongs));
      pushLap(steps, loop.round, belongs, () => z);
      steps.push(...flat([...loop.past, ...join.leaving], z, belongs));
    }
  }
  return { at: bay.middle, fastTo: heights.approach, steps };
}

/**
 * The last bit of a flank before the root is a piece of its own, so that it can have its own feed; all of the flank where
 * one more arc or line would be more than a slow controller keeps up with.
 */
export function slowBeforeRoot(path: PitchPath, length: number): PitchPath {
  const full = path.made === 'arcs' && path.rest.length + 1 >= MOST_BLOCKS;
  const rest = path.rest.flatMap((part, i): readonly PathPiece[] => {
    const into = path.rest[i + 1]?.role;
    const whole = lengthOf(part.piece);
    if (part.role !== 'flank' || part.piece.kind !== 'line' || (into !== 'root' && into !== 'flank')) {
      return [part];
    }
    if (full || whole <= length) {
      return [{ ...part, role: 'root' }];
    }
    const cut = 1 - length / whole;
    return [
      { ...part, piece: partOf(part.piece, 0, cut) as LinePiece },
      { ...part, role: 'root', piece: partOf(part.piece, cut, 1) as LinePiece },
    ];
  });
  return { ...path, rest };
}

/** Blocks a pitch that a slow controller keeps up with. Judgement. */
const MOST_BLOCKS = 16;

/** Full feed on flanks, addenda and tips; in fillets by their radius; slow at the root, whose corners hold the cutter most. */
function feedsOf({ settings, radialDepth }: FinishTask): FeedOf {
  const { data, cutter } = settings;
  const slow = cornerFeed(settings, radialDepth);
  return (role, piece) => {
    if (role === 'fillet' && piece.kind === 'arc') {
      return steppedArcFeed({
        feed: data.feed,
        pathRadius: piece.radius,
        cutterDiameter: cutter.diameter,
        radialDepth,
        flutes: cutter.flutes,
        speed: data.speed,
        lowest: data.lowest,
      });
    }
    return role === 'root' ? slow : data.feed;
  };
}

/**
 * In a sharp inside corner the engaged angle grows from phi to 3 phi, at most by a quarter turn; the thickest chip is kept
 * what it is on the straight, down to the feed at which the cutter rubs or the lowest of the machine.
 */
export function cornerFeed({ data, cutter }: Settings, radialDepth: number): number {
  const straight = engagementAngle(radialDepth, cutter.diameter);
  const corner = Math.min(3 * straight, straight + Math.PI / 2);
  const sine = (angle: number): number => (angle >= Math.PI / 2 ? 1 : Math.sin(angle));
  const wanted = (data.feed * sine(straight)) / sine(corner);
  const floor = Math.max(rubbingFeed(sine(corner), cutter.flutes, data.speed), data.lowest);
  return Math.max(wanted, Math.min(floor, data.feed));
}
