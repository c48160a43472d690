/**
 * The plate of the set-up: what stands on the table seen from above - the blank, what is in the way, zero, where to park, what
 * must be kept clear - and beside it the heights. mm of paper, Y down.
 */
import type { Setup } from '../cutting/setup.ts';
import { levelDimension, uprightDimension, words } from './dimension.ts';
import { SAME_METAL } from './draw-metal.ts';
import { drawHeights } from './draw-heights.ts';
import type { SheetFacts } from './facts.ts';
import { keepClear } from './keep-clear.ts';
import { bareLength } from './lengths.ts';
import { LIGHT, onWork, plateSvg, scaleBar, scaleToFit, type PlateFrame } from './plate.ts';
import { coordinate, plain } from './words.ts';

/** Room round the plan for its figures, and for the heights beside it, mm of paper. */
const LEFT = 12;
const ABOVE = 9;
const BELOW = 17;
const HEIGHTS = 58;
const PLAN = 62;
const BETWEEN = 12;

/** `undefined` where no program was planned. */
export function drawTable(facts: SheetFacts): { readonly svg: string; readonly scale: number } | undefined {
  const box = boxOf(facts);
  if (box === undefined) {
    return undefined;
  }
  const scale = scaleToFit(Math.max(box.right - box.left, box.top - box.bottom), PLAN);
  const frame: PlateFrame = {
    left: box.left * scale - LEFT,
    right: box.right * scale + BETWEEN + HEIGHTS,
    top: -box.top * scale - ABOVE,
    bottom: -box.bottom * scale + BELOW,
    scale,
  };
  const marks =
    obstacles(facts.job.setup, frame) +
    reaches(facts, box, frame) +
    zeroMarks(frame) +
    edges(facts, frame) +
    parking(facts, frame) +
    scaleBar(frame, frame.left + LEFT, frame.bottom - 2.5, facts.job.length) +
    drawHeights(facts, {
      left: frame.right - HEIGHTS,
      right: frame.right,
      top: frame.top + 4,
      bottom: frame.bottom - 5,
    });
  return {
    svg: plateSvg(frame, 'The blank on the table from above, and the heights', blank(facts, frame), marks),
    scale,
  };
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly bottom: number;
  readonly top: number;
}

/** Everything that is drawn, mm of the work. */
function boxOf(facts: SheetFacts): Box | undefined {
  const { job, park } = facts;
  const clear = keepClear(facts);
  if (park === undefined) {
    return undefined;
  }
  const { shape, obstacles: stands } = job.setup;
  const [w, h] = shape.kind === 'sheet' ? [shape.width, shape.height] : [shape.diameter, shape.diameter];
  const x = [
    -w / 2,
    w / 2,
    park.x,
    ...(clear?.x ?? []),
    ...stands.flatMap((one) => [one.x - one.radius, one.x + one.radius]),
  ];
  const y = [
    -h / 2,
    h / 2,
    park.y,
    ...(clear?.y ?? []),
    ...stands.flatMap((one) => [one.y - one.radius, one.y + one.radius]),
  ];
  return { left: Math.min(...x), right: Math.max(...x), bottom: Math.min(...y), top: Math.max(...y) };
}

function blank({ job }: SheetFacts, frame: PlateFrame): string {
  const { shape } = job.setup;
  const edge =
    shape.kind === 'sheet'
      ? `<rect data-figure="blank" x="${coordinate(-shape.width / 2)}" y="${coordinate(-shape.height / 2)}" width="${coordinate(shape.width)}" height="${coordinate(shape.height)}"/>`
      : `<circle data-figure="blank" r="${coordinate(shape.diameter / 2)}"/>`;
  return `<g class="stock edged">${edge}</g><g class="metal" stroke-width="${onWork(frame, LIGHT)}">${SAME_METAL}</g>`;
}

/** Hatched in ink: solid for the cutter. */
function obstacles(setup: Setup, frame: PlateFrame): string {
  const hatch =
    '<defs><pattern id="solid" width="1.1" height="1.1" patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">' +
    `<path class="line" stroke-width="${LIGHT}" d="M0 0V1.1"/></pattern></defs>`;
  const found = setup.obstacles.map(
    ({ x, y, radius }) =>
      `<circle class="solid" cx="${plain(x * frame.scale, 3)}" cy="${plain(-y * frame.scale, 3)}" r="${plain(radius * frame.scale, 3)}"/>`,
  );
  return found.length === 0 ? '' : hatch + found.join('');
}

/** What must be kept clear, with the figures above and on the right. */
function reaches(facts: SheetFacts, box: Box, frame: PlateFrame): string {
  const clear = keepClear(facts);
  if (clear === undefined) {
    return '';
  }
  const [x0, x1] = clear.x.map((value) => value * frame.scale) as [number, number];
  const [y0, y1] = clear.y.map((value) => -value * frame.scale) as [number, number];
  const say = (value: number): string => bareLength(value, facts.job.length);
  const top = -box.top * frame.scale - 3;
  const right = box.right * frame.scale + 4;
  return (
    `<rect class="line dashed" data-figure="keep-clear" x="${plain(x0, 3)}" y="${plain(y1, 3)}" width="${plain(x1 - x0, 3)}" height="${plain(y0 - y1, 3)}"/>` +
    words(`X ${say(clear.x[0])} to ${say(clear.x[1])}`, (x0 + x1) / 2, top, 'middle') +
    `<text class="halo" text-anchor="middle" transform="translate(${plain(right, 2)} ${plain((y0 + y1) / 2, 2)}) rotate(-90)">Y ${say(clear.y[0])} to ${say(clear.y[1])}</text>`
  );
}

/** Two arrows from the axis of the wheel. */
function zeroMarks(frame: PlateFrame): string {
  const length = 11;
  return (
    `<path class="line" stroke-width=".3" d="M0 ${plain(-length, 2)}V0H${length}"/>` +
    `<path class="arrow" d="M${length + 2} 0l-2.4 .6v-1.2Z"/><path class="arrow" d="M0 ${-length - 2}l.6 2.4h-1.2Z"/>` +
    words('X', length + 3, 1, 'start') +
    words('Y', 0, -length - 3, 'middle') +
    `<circle class="zero" r="${plain(Math.min(0.9, 2 * frame.scale), 3)}"/>`
  );
}

/** From zero to two edges that stay, to find it again. */
function edges({ job }: SheetFacts, frame: PlateFrame): string {
  const { shape } = job.setup;
  if (shape.kind === 'disc') {
    return '';
  }
  const [x, y] = [(-shape.width / 2) * frame.scale, (shape.height / 2) * frame.scale];
  const under = y + 7;
  const beside = x - 5;
  return (
    `<path class="extension" d="M${plain(x, 3)} ${plain(y + 1, 3)}V${plain(under + 1.2, 3)}M0 1V${plain(under + 1.2, 3)}` +
    `M${plain(x - 1, 3)} ${plain(y, 3)}H${plain(beside - 1.2, 3)}M-1 0H${plain(beside - 1.2, 3)}"/>` +
    levelDimension({
      figure: 'edge-x',
      value: shape.width / 2,
      text: bareLength(shape.width / 2, job.length),
      from: { x, y: under },
      to: { x: 0, y: under },
    }) +
    uprightDimension({
      figure: 'edge-y',
      value: shape.height / 2,
      text: bareLength(shape.height / 2, job.length),
      from: { x: beside, y },
      to: { x: beside, y: 0 },
    })
  );
}

function parking({ park }: SheetFacts, frame: PlateFrame): string {
  if (park === undefined) {
    return '';
  }
  const [x, y] = [park.x * frame.scale, -park.y * frame.scale];
  const at = `${plain(x, 3)} ${plain(y, 3)}`;
  return (
    `<path class="line" data-figure="park" stroke-width=".3" d="M${at}m-1.6 -1.6l3.2 3.2m0 -3.2l-3.2 3.2"/>` +
    words('park', x + 2.6, y + 4, 'start')
  );
}
