/**
 * Plate I: the wheel to scale as it will be, the paths of the cutters by pass, and round it the dial: the minutes of the
 * whole work run clockwise from twelve, each pass a chapter of the ring, to scale.
 */
import { repeatRound } from '../geometry/change-piece.ts';
import { isMove, type Motion, type MoveStep, type Position } from '../motion/motion.ts';
import type { SheetFacts, SheetPass } from './facts.ts';
import { ringBand } from './plot.ts';
import { hair, plateSvg, scaleBar, scaleToFit, type PlateFrame } from './plate.ts';
import { chainPath, movesPath } from './svg-path.ts';
import { duration, numeral, plain } from './words.ts';

/** Width of the page's text, mm of paper. */
const PAPER = 170;
/** Ring and figures outside it, as shares of the wheel's outside radius. */
const RING_INNER = 1.3;
const RING_OUTER = 1.36;
const EDGE = 1.56;

export function drawWheel(facts: SheetFacts): { readonly svg: string; readonly scale: number } {
  const outside = Math.max(facts.form.outsideRadius, pathReach(facts.motions) / 1.1);
  const half = outside * EDGE;
  const frame: PlateFrame = {
    left: -half,
    right: half,
    bottom: -half,
    top: half,
    scale: scaleToFit(2 * half, PAPER),
  };
  const body = wheelBody(facts, frame) + pathsBody(facts, frame) + axesBody(facts, frame);
  const labels =
    dial(facts.passes, frame, outside) + scaleBar(frame, -half + 2 / frame.scale, half - 3 / frame.scale);
  return { svg: plateSvg(frame, `The wheel and the cutters' paths`, body, labels), scale: frame.scale };
}

/** The metal: outline, bore and windows as one shape with holes. */
export function wheelBody(facts: Pick<SheetFacts, 'form' | 'crossings' | 'job'>, frame: PlateFrame): string {
  const { form, crossings, job } = facts;
  const outline = repeatRound(
    form.sector.map(({ piece }) => piece),
    form.proportions.teeth,
  );
  const windows =
    crossings === undefined
      ? []
      : Array.from({ length: crossings.count }, (_, k) =>
          chainPath(
            repeatRound(crossings.window, crossings.count).slice(
              k * crossings.window.length,
              (k + 1) * crossings.window.length,
            ),
            true,
          ),
        );
  const bore = job.wheel.bore > 0 ? circlePath(job.wheel.bore / 2) : '';
  return (
    `<path class="metal" data-figure="outline" fill-rule="evenodd" stroke-width="${hair(frame, 0.18)}" ` +
    `d="${chainPath(outline, true)}${windows.join('')}${bore}"/>`
  );
}

export function circlePath(radius: number): string {
  const r = plain(radius, 4);
  return `M${r} 0A${r} ${r} 0 0 1 -${r} 0A${r} ${r} 0 0 1 ${r} 0Z`;
}

/** One lap of each pass, the last: laps above it lie on the same line. */
function pathsBody(facts: SheetFacts, frame: PlateFrame): string {
  return facts.motions
    .flatMap(lastLaps)
    .map(({ pass, from, moves }) => {
      const kind = pass.includes('rough') || pass.includes('mouth') ? 'path rough' : 'path fine';
      return `<path class="${kind}" data-pass="${pass}" stroke-width="${hair(frame, 0.1)}" d="${movesPath(from, moves)}"/>`;
    })
    .join('');
}

export interface PassPath {
  readonly pass: string;
  readonly from: Position;
  readonly moves: readonly MoveStep[];
}

/** For each pass the moves of its last lap, in the order of the work. */
export function lastLaps(motion: Motion): readonly PassPath[] {
  const found = new Map<string, { lap: number; from: Position; moves: MoveStep[] }>();
  let at: Position | undefined;
  for (const step of motion.steps) {
    if (!isMove(step)) {
      continue;
    }
    const from = at ?? step.to;
    at = step.to;
    const pass = step.belongs?.pass;
    if (pass === undefined) {
      continue;
    }
    const lap = step.belongs?.lap ?? 0;
    const known = found.get(pass);
    if (known === undefined || lap > known.lap) {
      found.set(pass, { lap, from, moves: [step] });
    } else if (lap === known.lap) {
      known.moves.push(step);
    }
  }
  return [...found].map(([pass, { from, moves }]) => ({ pass, from, moves }));
}

function pathReach(motions: readonly Motion[]): number {
  let reach = 0;
  for (const path of motions.flatMap(lastLaps)) {
    for (const move of path.moves) {
      reach = Math.max(reach, Math.hypot(move.to.x, move.to.y));
    }
  }
  return reach;
}

function axesBody(facts: SheetFacts, frame: PlateFrame): string {
  const pitch = plain(facts.form.pitchRadius, 4);
  const arm = plain(facts.form.outsideRadius * 1.12, 4);
  return (
    `<circle class="construction" r="${pitch}" stroke-width="${hair(frame, 0.1)}" stroke-dasharray="${hair(frame, 3)} ${hair(frame, 0.8)} ${hair(frame, 0.4)} ${hair(frame, 0.8)}"/>` +
    `<path class="construction" stroke-width="${hair(frame, 0.1)}" d="M-${arm} 0H${arm}M0 -${arm}V${arm}"/>`
  );
}

/** The ring of minutes. Angles clockwise from twelve, Y down. */
function dial(passes: readonly SheetPass[], frame: PlateFrame, outside: number): string {
  const total = passes.reduce((sum, pass) => sum + pass.seconds, 0);
  if (total <= 0) {
    return '';
  }
  const inner = outside * RING_INNER;
  const outer = outside * RING_OUTER;
  let spent = 0;
  const chapters = passes.map((pass, i) => {
    const from = (2 * Math.PI * spent) / total;
    spent += pass.seconds;
    const to = (2 * Math.PI * spent) / total;
    const middle = (from + to) / 2;
    const shade = i % 2 === 0 ? 'chapter' : 'chapter other';
    const radius = outer + (4.2 / frame.scale) * (to - from < 0.12 && i % 2 === 1 ? 1.9 : 1);
    return (
      `<path class="${shade}" d="${ringBand(inner, outer, from, to)}"><title>${numeral(i + 1)} ${pass.name}, ${duration(pass.seconds)}</title></path>` +
      `<text class="numeral" text-anchor="middle" x="${plain(radius * Math.sin(middle), 3)}" y="${plain(-radius * Math.cos(middle) + 1 / frame.scale, 3)}">${numeral(i + 1)}</text>`
    );
  });
  return `<g class="dial" stroke-width="${hair(frame, 0.1)}">${chapters.join('')}${minuteMarks(total, inner, outer)}</g>`;
}

/** A mark each minute, each five or each ten: as many as the eye can count. */
function minuteMarks(total: number, inner: number, outer: number): string {
  const step = [60, 300, 600, 1800, 3600].find((seconds) => total / seconds <= 120) ?? 3600;
  const marks: string[] = [];
  for (let i = 0; i * step < total; i++) {
    const angle = (2 * Math.PI * i * step) / total;
    const long = i % 5 === 0;
    const from = inner - (outer - inner) * (long ? 0.6 : 0.3);
    const [s, c] = [Math.sin(angle), Math.cos(angle)];
    marks.push(
      `M${plain(from * s, 3)} ${plain(-from * c, 3)}L${plain(inner * s, 3)} ${plain(-inner * c, 3)}`,
    );
  }
  return `<path class="minutes" d="${marks.join('')}"/>`;
}
