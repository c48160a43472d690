/**
 * Plate II: one tooth space magnified: the exact outline, what the cutter leaves at the root, the finishing cutter standing
 * where it goes deepest, and the paths. Drawn with the space upright.
 */
import { turnChain } from '../geometry/change-piece.ts';
import { isMove, type MoveStep } from '../motion/motion.ts';
import { lastLaps } from './draw-wheel.ts';
import type { SheetFacts } from './facts.ts';
import { hair, plateSvg, scaleBar, scaleToFit, type PlateFrame } from './plate.ts';
import { chainPath, movesPath } from './svg-path.ts';
import { plain } from './words.ts';

const PAPER = 110;

export function drawSpace(facts: SheetFacts): { readonly svg: string; readonly scale: number } {
  const { form } = facts;
  const pitch = (2 * Math.PI) / form.proportions.teeth;
  const cutter = facts.job.cuts.finishing.cutter;
  // The space after tooth 1 lies at angle pitch/2; turned so that it points up.
  const upright = Math.PI / 2 - pitch / 2;
  const halfWidth = form.outsideRadius * Math.sin(Math.min(0.85 * pitch, Math.PI / 2));
  const frame: PlateFrame = {
    left: -halfWidth,
    right: halfWidth,
    bottom:
      form.rootRadius * Math.cos(Math.min(0.85 * pitch, 1)) - 0.35 * (form.outsideRadius - form.rootRadius),
    top: form.outsideRadius + cutter.diameter * 0.75,
    scale: scaleToFit(2 * halfWidth, PAPER),
  };
  const exact = [-1, 0, 1, 2].flatMap((k) =>
    turnChain(
      form.sector.map(({ piece }) => piece),
      upright + k * pitch,
    ),
  );
  const cut = [-1, 0, 1, 2].flatMap((k) =>
    turnChain(
      (facts.asCut?.sector ?? []).map(({ piece }) => piece),
      upright + k * pitch,
    ),
  );
  const foot = `L${plain(halfWidth * 3, 3)} 0L${plain(-halfWidth * 3, 3)} 0Z`;
  const body =
    (cut.length > 0 ? `<path class="left" d="${chainPath(cut, false)}${foot}"/>` : '') +
    `<path class="metal" data-figure="tooth" stroke-width="${hair(frame, 0.25)}" d="${chainPath(exact, false)}${foot}"/>` +
    (cut.length > 0
      ? `<path class="cut" stroke-width="${hair(frame, 0.18)}" d="${chainPath(cut, false)}"/>`
      : '') +
    pitchArc(form.pitchRadius, frame) +
    nearbyPaths(facts, frame, upright) +
    cutterRing(facts, frame);
  const labels = scaleBar(frame, frame.left + 2 / frame.scale, -frame.top + 4 / frame.scale);
  return { svg: plateSvg(frame, 'One tooth space', body, labels), scale: frame.scale };
}

function pitchArc(radius: number, frame: PlateFrame): string {
  const dash = `${hair(frame, 3)} ${hair(frame, 0.8)} ${hair(frame, 0.4)} ${hair(frame, 0.8)}`;
  return `<circle class="construction" r="${plain(radius, 4)}" stroke-width="${hair(frame, 0.1)}" stroke-dasharray="${dash}"/>`;
}

/** The moves of roughing and finishing that pass through the picture. */
function nearbyPaths(facts: SheetFacts, frame: PlateFrame, upright: number): string {
  const near = (move: MoveStep): boolean => {
    const angle = Math.atan2(move.to.y, move.to.x) + upright - Math.PI / 2;
    const radius = Math.hypot(move.to.x, move.to.y);
    const wide = Math.atan2(frame.right, facts.form.rootRadius) * 1.3;
    return Math.abs(angle) < wide && radius > frame.bottom && radius < frame.top * 1.1;
  };
  return facts.motions
    .flatMap(lastLaps)
    .filter(({ pass }) => /rough|finish|mouth|spring/.test(pass))
    .map(({ pass, from, moves }) => {
      const kind = pass.includes('finish') || pass.includes('spring') ? 'path fine' : 'path rough';
      let at = from;
      const runs: string[] = [];
      for (const move of moves.filter(isMove)) {
        if (near(move)) {
          runs.push(movesPath(at, [move]));
        }
        at = move.to;
      }
      return `<g transform="rotate(${plain((upright * 180) / Math.PI, 6)})"><path class="${kind}" stroke-width="${hair(frame, 0.18)}" d="${runs.join('')}"/></g>`;
    })
    .join('');
}

/** The finishing cutter where it stands lowest in the space: tangent to the floor or wedged between the flanks. */
function cutterRing(facts: SheetFacts, frame: PlateFrame): string {
  const radius = facts.job.cuts.finishing.cutter.diameter / 2;
  const floor = facts.asCut?.floorRadius;
  if (floor === undefined) {
    return '';
  }
  return `<circle class="cutter" cy="${plain(floor + radius, 4)}" r="${plain(radius, 4)}" stroke-width="${hair(frame, 0.18)}"/>`;
}
