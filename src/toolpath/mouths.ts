/**
 * The mouths of the spaces of a disc, opened before the laps, so that no loose pillar is left between two slots.
 *
 * In  : the form, the roughing path's distance from the outline, cutter, depth a level. Wheel frame, mm.
 * Out : for each space a run of straight dips from the air outside the disc, all levels of one space before the next;
 *       none where the slots of two neighbouring teeth meet in the mouth anyway.
 * A slot at distance d from the outline reaches d + r. The pillar is what lies farther than that from both teeth: on the
 * tip circle its half width is R sin(pi/N - g) - (d + r), g half the land's angle; its foot lies on the space's middle line.
 */
import { FORM_ERROR } from '../base/tolerances.ts';
import { nearestOnChain } from '../geometry/nearest-on-piece.ts';
import { endOf } from '../geometry/on-piece.ts';
import type { Chain } from '../geometry/piece.ts';
import { angleOf, turnPoint, type Point } from '../geometry/point.ts';
import { turnChain } from '../geometry/change-piece.ts';
import type { Belongs, MoveStep } from '../motion/motion.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import type { Heights } from './heights.ts';
import { flat, lineLeg, vertical, type Run } from './leg.ts';
import { levelsFor, type Settings } from './settings.ts';

export interface MouthTask {
  readonly form: WheelForm;
  /** Of the roughing path from the outline. */
  readonly distance: number;
  readonly settings: Settings;
  readonly heights: Heights;
}

/** A straight dip of the cutter's centre, parallel to the middle line of a space on +X: from the air inward. */
interface Dip {
  readonly across: number;
  readonly from: number;
  readonly to: number;
}

/** Air between the disc and a cutter that comes down beside it. Judgement: more than a disc is out of true. */
const AIR = 0.3;
/** How far dips overlap pillar, slots and each other, over the cutter's radius. */
const OVERLAP = 0.2;

export function mouthRuns(task: MouthTask): readonly Run[] {
  const dips = dipsFor(task);
  const { teeth } = task.form.proportions;
  return dips.length === 0 ? [] : Array.from({ length: teeth }, (_, k) => spaceRun(task, dips, k));
}

export function dipsFor({ form, distance, settings }: Omit<MouthTask, 'heights'>): readonly Dip[] {
  const r = settings.radius;
  const band = distance + r;
  const mouth = form.outsideRadius * Math.sin(mouthAngle(form));
  const pillar = mouth - band;
  if (pillar <= 0) {
    return [];
  }
  const walls = wallsOfSpace(form);
  const clearance = (x: number, y: number): number => nearestOnChain(walls, { x, y })?.distance ?? 0;
  const foot = innermost(form, (x) => clearance(x, 0), band);
  const width = 2 * pillar + OVERLAP * r;
  // An odd number, so that one runs down the middle line to the foot.
  const more = 2 * Math.max(0, Math.ceil((width - 2 * r) / (2 * (2 - OVERLAP) * r)));
  return Array.from({ length: more + 1 }, (_, i) => {
    const across = more === 0 ? 0 : (width / 2 - r) * ((2 * i) / more - 1);
    const deep = innermost(form, (x) => clearance(x, across), distance);
    return { across, from: form.outsideRadius + r + AIR, to: Math.max(foot + PAST_FOOT * r, deep) };
  });
}

/** Half the angle of a mouth: from the middle of the space to the tip corner. */
function mouthAngle(form: WheelForm): number {
  const rising = form.sector.findLast(({ role }, i) => role === 'addendum' && i < form.sector.length / 2);
  const corner = rising === undefined ? 0 : angleOf(endOf(rising.piece));
  return Math.PI / form.proportions.teeth - Math.abs(corner);
}

/** The outline on both sides of the space whose middle line is +X. */
function wallsOfSpace(form: WheelForm): Chain {
  const half = Math.PI / form.proportions.teeth;
  const pieces = form.sector.map(({ piece }) => piece);
  return [...turnChain(pieces, half), ...turnChain(pieces, -half)];
}

/**
 * How far in a point may go from the tip circle along a line until only `keep` of clearance is left. Clearance can't shrink
 * faster than the point moves, so a step as long as what is to spare never jumps across a wall.
 */
function innermost(form: WheelForm, clearance: (x: number) => number, keep: number): number {
  let x = form.outsideRadius;
  for (let spare = clearance(x) - keep; spare > NEAR && x > form.rootRadius; spare = clearance(x) - keep) {
    x -= spare;
  }
  return Math.max(x, form.rootRadius);
}

/** How far short of the pillar's foot a dip ends, over the cutter's radius: where neighbouring round ends still meet below it. */
const PAST_FOOT = 0.35;

/** The march inward ends this near to the wall it keeps clear of. A micrometre is nothing beside the allowance. */
const NEAR = FORM_ERROR;

function spaceRun({ form, settings, heights }: MouthTask, dips: readonly Dip[], k: number): Run {
  const { teeth } = form.proportions;
  const angle = (Math.PI * (2 * k + 1)) / teeth;
  const at = (x: number, y: number): Point => turnPoint({ x, y }, angle);
  const laps = levelsFor(heights.top - heights.bottom, settings.step);
  const first = dips[0] as Dip;
  const begin = at(first.from, first.across);
  const steps: MoveStep[] = [];
  for (let lap = 1; lap <= laps; lap++) {
    const z = lap === laps ? heights.bottom : heights.top - ((heights.top - heights.bottom) * lap) / laps;
    const belongs: Belongs = { pass: 'mouths', tooth: k + 1, lap, laps, depth: z, together: true };
    steps.push(
      vertical(
        lap % 2 === 1 ? begin : at((dips.at(-1) as Dip).from, (dips.at(-1) as Dip).across),
        z,
        settings.data.plunge,
        belongs,
      ),
    );
    const order = lap % 2 === 1 ? dips : dips.toReversed();
    order.forEach(({ across, from, to }, i) => {
      const legs = [
        lineLeg(at(to, across), settings.data.feed),
        lineLeg(at(from, across), settings.data.feed),
      ];
      steps.push(
        ...flat(i === 0 ? legs : [lineLeg(at(from, across), settings.data.feed), ...legs], z, belongs),
      );
    });
  }
  return { at: begin, fastTo: heights.approach, steps };
}
