/**
 * The numbers of the form, for every sample on every machine file: how far the cut flank lies from the exact curve at every
 * depth (read back from the text), the form's own share of it (the finishing loop before rounding), blocks a pitch of the
 * finishing loop, and the largest break of heading that is no real corner.
 *
 * Run: npm run figures
 */
import { FORM_ERROR, SAME_POINT } from '../../src/base/tolerances.ts';
import { nearestOnChain } from '../../src/geometry/nearest-on-piece.ts';
import { turnPoint } from '../../src/geometry/point.ts';
import { isMove, type MoveStep, type Position } from '../../src/motion/motion.ts';
import { shapeOf } from '../support/move-shape.ts';
import type { SheetFacts } from '../../src/report/facts.ts';
import { cutText, MACHINES, onMachine, sampleText, SAMPLES } from '../support/cut-text.ts';

const um = (mm: number): string => (mm * 1000).toFixed(2).padStart(7);

console.log(
  'sample        machine           gouge    left  allowed | form alone: gouge  left | blocks/pitch  break deg',
);
for (const sample of SAMPLES) {
  for (const machine of MACHINES) {
    const { facts } = cutText(sample, onMachine(sampleText(sample), machine));
    const figures = facts?.proof?.figures;
    if (facts === undefined || figures === undefined) {
      console.log(`${sample.padEnd(13)} ${machine.padEnd(16)} not made`);
      continue;
    }
    const loop = finishingLoop(facts);
    const { gouge, left } = formAlone(facts, loop);
    const { units, words } = facts.machine;
    const digit = 10 ** -words.numbers.lengthDecimals[units] * (units === 'mm' ? 1 : 25.4);
    console.log(
      `${sample.padEnd(13)} ${machine.padEnd(16)} ${um(figures.flankGouge)} ${um(figures.flankLeft)} ${um(FORM_ERROR + digit)} | ` +
        `           ${um(gouge)} ${um(left)} | ${String(blocksAPitch(facts, loop)).padStart(12)}  ${breaks(loop).toFixed(3).padStart(9)}`,
    );
    for (const depth of figures.byDepth) {
      console.log(
        `    at Z ${depth.z.toFixed(3).padStart(7)}       ${um(depth.flankGouge)} ${um(depth.flankLeft)}`,
      );
    }
  }
}

interface Travelled {
  readonly from: Position;
  readonly move: MoveStep;
}

/** The moves of the first finishing lap that belong to a tooth. */
function finishingLoop(facts: SheetFacts): readonly Travelled[] {
  const loop: Travelled[] = [];
  for (const motion of facts.motions) {
    let from: Position | undefined;
    for (const step of motion.steps) {
      if (!isMove(step)) {
        continue;
      }
      if (
        from !== undefined &&
        step.belongs?.pass === 'finishing' &&
        step.belongs.tooth !== undefined &&
        (step.belongs.lap ?? 1) === 1
      ) {
        loop.push({ from, move: step });
      }
      from = step.to;
    }
  }
  return loop;
}

/** Distance of the path to the exact outline less the cutter's radius: most negative is gouge, most positive is left. */
function formAlone(facts: SheetFacts, loop: readonly Travelled[]): { gouge: number; left: number } {
  const { form, job } = facts;
  const chain = form.sector.map(({ piece }) => piece);
  const pitch = (2 * Math.PI) / form.proportions.teeth;
  const radius = job.cuts.finishing.cutter.diameter / 2;
  const foot = facts.asCut?.footRadius ?? form.rootRadius;
  let gouge = 0;
  let left = 0;
  for (const { from, move } of loop.filter(({ move: { belongs } }) => belongs?.tooth === 2)) {
    for (let i = 0; i <= 40; i++) {
      const point = pointOf(from, move, i / 40);
      const folded = turnPoint(point, -pitch * Math.round(Math.atan2(point.y, point.x) / pitch));
      const nearest = nearestOnChain(chain, folded);
      if (nearest === undefined) {
        continue;
      }
      const off = nearest.distance - radius;
      const reached = Math.hypot(nearest.point.x, nearest.point.y);
      gouge = Math.max(gouge, -off);
      // A disc's lands are not cut: the path stays clear of them and of the corner itself.
      const flank = reached > foot && reached < form.outsideRadius - SAME_POINT;
      left = flank ? Math.max(left, off) : left;
    }
  }
  return { gouge, left };
}

function pointOf(from: Position, move: MoveStep, u: number): { x: number; y: number } {
  if (move.kind !== 'arc') {
    return { x: from.x + u * (move.to.x - from.x), y: from.y + u * (move.to.y - from.y) };
  }
  const { centre, turn } = move;
  const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const angle = Math.atan2(from.y - centre.y, from.x - centre.x) + u * turn;
  return { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle) };
}

/** Most moves that any one tooth of the loop takes, the joined one left out. */
function blocksAPitch(_: SheetFacts, loop: readonly Travelled[]): number {
  const counts = new Map<number, number>();
  for (const { move } of loop) {
    const tooth = move.belongs?.tooth ?? 0;
    counts.set(tooth, (counts.get(tooth) ?? 0) + 1);
  }
  counts.delete(1);
  return Math.max(...counts.values());
}

/** Largest change of heading between two moves of the loop that is not a real corner (over 5 degrees), in degrees. */
function breaks(loop: readonly Travelled[]): number {
  const CORNER = (5 * Math.PI) / 180;
  let most = 0;
  for (let i = 1; i < loop.length; i++) {
    const a = loop[i - 1];
    const b = loop[i];
    if (a === undefined || b === undefined || a.move.to !== b.from) {
      continue;
    }
    const out = shapeOf({ ...a.move, from: a.from }).headingOut;
    const into = shapeOf({ ...b.move, from: b.from }).headingIn;
    const angle = Math.atan2(Math.abs(out.x * into.y - out.y * into.x), out.x * into.x + out.y * into.y);
    if (angle < CORNER) {
      most = Math.max(most, angle);
    }
  }
  return (most * 180) / Math.PI;
}
