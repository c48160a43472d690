/**
 * One tooth space magnified: the exact outline, what the finishing cutter leaves, the cutter where it stands deepest, the paths
 * of the last laps, and beside them the radii that matter. A space far from tooth 1, where entries and exits are, is turned upright. mm of paper, Y down.
 */
import { turnChain } from '../geometry/change-piece.ts';
import { turnPoint, type Point } from '../geometry/point.ts';
import type { WheelPiece } from '../tooth/wheel.ts';
import { isRoughPass } from './dial.ts';
import { words } from './dimension.ts';
import type { SheetFacts } from './facts.ts';
import { bareLength } from './lengths.ts';
import { nearbyPaths } from './nearby-paths.ts';
import {
  axisDashes,
  HEAVY,
  LIGHT,
  onWork,
  plateSvg,
  scaleBar,
  scaleToFit,
  type PlateFrame,
} from './plate.ts';
import { spread } from './spread.ts';
import { chainPath, drawable } from './svg-path.ts';
import { coordinate, escapeText, fixed, plain } from './words.ts';

const PICTURE = 57;
const LABELS = 39;
const LABEL_GAP = 5.2;
/** Pitches that are seen: a little more than a tooth on each side of the space. */
const SEEN = 0.85;

export function drawSpace(facts: SheetFacts): { readonly svg: string; readonly scale: number } {
  const { form } = facts;
  const pitch = (2 * Math.PI) / form.proportions.teeth;
  const cutter = facts.job.cuts.finishing.cutter;
  const middle = (Math.floor(form.proportions.teeth / 2) + 0.5) * pitch;
  const upright = Math.PI / 2 - pitch / 2;
  const wide = form.outsideRadius * Math.sin(Math.min(SEEN * pitch, Math.PI / 2));
  const scale = scaleToFit(2 * wide, PICTURE);
  const low =
    form.rootRadius * Math.cos(Math.min(SEEN * pitch, 1)) - 0.35 * (form.outsideRadius - form.rootRadius);
  const frame: PlateFrame = {
    left: -wide * scale,
    right: wide * scale + LABELS,
    top: -(form.outsideRadius + cutter.diameter * 0.75) * scale,
    bottom: -low * scale,
    scale,
  };
  const body =
    `<defs><clipPath id="space"><rect x="${coordinate(-wide)}" y="${coordinate(low)}" width="${coordinate(2 * wide)}" height="${coordinate(-frame.top / scale - low)}"/></clipPath></defs>` +
    `<g clip-path="url(#space)">${metal(facts, wide, upright, pitch)}${circles(facts, frame)}${paths(facts, frame, middle, wide)}${cutterRing(facts, upright, frame)}</g>`;
  const marks =
    radii(facts, frame, wide * scale) + scaleBar(frame, wide * scale + 8, frame.top + 4, facts.job.length);
  return { svg: plateSvg(frame, 'One tooth space, magnified', body, marks), scale };
}

/** Under the exact metal what the cutter leaves, so that only the rest of it shows. */
function metal(facts: SheetFacts, wide: number, upright: number, pitch: number): string {
  const around = (sector: readonly WheelPiece[]): string => {
    const one = drawable(sector);
    return chainPath(
      [-1, 0, 1, 2].flatMap((k) => turnChain(one, upright + k * pitch)),
      false,
    );
  };
  const foot = `L${coordinate(-3 * wide)} 0L${coordinate(3 * wide)} 0Z`;
  const exact = around(facts.form.sector);
  const cut = facts.asCut === undefined ? '' : around(facts.asCut.sector);
  return (
    (cut === '' ? '' : `<path class="left-metal" d="${cut}${foot}"/>`) +
    `<g class="metal"><path data-figure="tooth" d="${exact}${foot}"/></g>` +
    (cut === '' ? '' : `<path class="cut" data-figure="as-cut" d="${cut}"/>`)
  );
}

function circles({ form }: SheetFacts, frame: PlateFrame): string {
  return `<circle class="axis" r="${coordinate(form.pitchRadius)}" stroke-width="${onWork(frame, LIGHT)}" stroke-dasharray="${axisDashes(frame)}"/>`;
}

/** Of passes that lie on one another only the first. */
function paths(facts: SheetFacts, frame: PlateFrame, middle: number, wide: number): string {
  const near = nearbyPaths(facts, middle, wide);
  const seen = new Set<string>();
  return near
    .filter(({ d }) => d !== '' && !seen.has(d) && seen.add(d))
    .map(
      ({ pass, d }) =>
        `<g class="way" transform="rotate(${plain(90 - (middle * 180) / Math.PI, 6)})"><path class="${isRoughPass(pass) ? 'rough' : 'fine'}" data-pass="${escapeText(pass)}" stroke-width="${onWork(frame, HEAVY)}" d="${d}"/></g>`,
    )
    .join('');
}

/** Where it lies against floor and flank, or between the flanks: the arc it leaves at the root is its own. */
function cutterRing({ asCut, job }: SheetFacts, upright: number, frame: PlateFrame): string {
  const radius = job.cuts.finishing.cutter.diameter / 2;
  const centre = restingPlace(asCut?.sector ?? [], radius, upright);
  if (centre === undefined) {
    return '';
  }
  const [x, y] = [coordinate(centre.x), coordinate(centre.y)];
  return `<g stroke-width="${onWork(frame, LIGHT)}"><circle class="cutter" data-figure="cutter" cx="${x}" cy="${y}" r="${coordinate(radius)}"/><path class="cutter" d="M${x} ${y}m${onWork(frame, -1.2)} 0h${onWork(frame, 2.4)}m${onWork(frame, -1.2)} ${onWork(frame, -1.2)}v${onWork(frame, 2.4)}"/></g>`;
}

/** The last of the sector's arcs that the cutter leaves is on the far side of tooth 1, which is in the space drawn. */
function restingPlace(sector: readonly WheelPiece[], radius: number, upright: number): Point | undefined {
  const found = sector.findLast(
    ({ role, piece }) =>
      (role === 'root' || role === 'fillet') &&
      piece.kind === 'arc' &&
      piece.turn < 0 &&
      Math.abs(piece.radius - radius) < radius * OWN_ARC,
  )?.piece;
  return found?.kind === 'arc' ? turnPoint(found.centre, upright) : undefined;
}

/** Share of its radius by which the cutter's own arc may seem off. Why: doubles, turned and mirrored. */
const OWN_ARC = 1e-9;

/** The radii from the axis, spread beside the picture, each with a leader to its height on the right edge. */
function radii({ form, asCut, job }: SheetFacts, frame: PlateFrame, edge: number): string {
  const rows = [
    { figure: 'tip-radius', name: 'tip', radius: form.outsideRadius },
    { figure: 'pitch-radius', name: 'pitch circle', radius: form.pitchRadius },
    { figure: 'working-radius', name: 'working flank', radius: form.workingRadius },
    ...(asCut === undefined ? [] : [{ figure: 'foot-radius', name: 'foot', radius: asCut.footRadius }]),
    { figure: 'root-radius', name: 'root', radius: form.rootRadius },
  ].toSorted((a, b) => b.radius - a.radius);
  const heights = rows.map(
    ({ radius }) => -Math.sqrt(Math.max(radius ** 2 - (edge / frame.scale) ** 2, 0)) * frame.scale,
  );
  const places = spread(heights, LABEL_GAP, frame.top + 14, frame.bottom - 2);
  const lines = rows.map(({ figure, name, radius }, i) => {
    const [y, label] = [heights[i] ?? 0, places[i] ?? 0];
    return (
      `<g data-figure="${figure}" data-value="${fixed(radius, 6)}"><path class="line" d="M${plain(edge, 3)} ${plain(y, 3)}h2L${plain(edge + 6, 3)} ${plain(label, 3)}"/>` +
      `${words(`r ${bareLength(radius, job.length)}`, edge + 7, label + 1)}${words(name, edge + 20.5, label + 1)}</g>`
    );
  });
  return lines.join('');
}
