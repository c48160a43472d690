/**
 * An independent look at a program: its words are read by a small reader of its own, the moves of a few teeth sampled densely, and
 * each sample's distance from points of the exact outline taken by brute force. Nothing of `src/` is used. mm.
 */
import { halfTooth, type OutlinePoint, type Wheel } from './tooth-points.ts';

export interface Look {
  /** Deepest into the exact outline, anywhere on the teeth looked at. */
  readonly gouge: number;
  /** Thickest metal left on a flank or addendum that the cutter can touch. */
  readonly left: number;
  readonly samples: number;
}

interface Sample {
  readonly x: number;
  readonly y: number;
  readonly z: number;
  /** Which cutter of the program's order. */
  readonly cutter: number;
}

/** How much sampling may lengthen a distance: samples s apart on a curve a radius r away lengthen it by s^2/(8 r). */
const SAMPLING = 2e-5;

/** Reads every move of the text; hands out those that cut, sampled, where `wanted` says so of a chord's two ends. */
function readMoves(
  text: string,
  absoluteCentres: boolean,
  wanted: (x: number, y: number, z: number) => boolean,
  first: number,
  step: number,
  low: number,
): { readonly samples: Sample[]; readonly cutters: number } {
  const samples: Sample[] = [];
  let [x, y, z, mode, unit, cutter, stopped, fed, relative] = [0, 0, 1e9, 0, 1, first, false, false, false];
  // Hands that set the speed stop too: only where a comment names a cutter do they change it.
  let named = false;
  for (const line of text.split(/\r?\n/)) {
    named ||= /^\W*CUTTER \d+/i.test(line);
    const words = [
      ...line
        .replaceAll(/\([^)]*\)/g, '')
        .replace(/;.*/, '')
        .matchAll(/([A-Z])\s*([-+]?[\d.]+)/gi),
    ].map((match): readonly [string, number] => [(match[1] ?? '').toUpperCase(), Number(match[2])]);
    const at = new Map(words.filter(([letter]) => 'XYZIJ'.includes(letter)));
    let machine = false;
    for (const [letter, value] of words) {
      if (letter === 'G' && value <= 3) mode = value;
      if (letter === 'G' && (value === 20 || value === 70)) unit = 25.4;
      if (letter === 'G' && (value === 21 || value === 71)) unit = 1;
      if (letter === 'G' && (value === 90 || value === 91)) relative = value === 91;
      if (letter === 'G' && (value === 28 || value === 53 || value === 4)) machine = true;
      if (letter === 'M' && (value === 6 || (value === 0 && named))) stopped = true;
    }
    if (machine) {
      if (at.has('Z')) z = 1e9;
      continue;
    }
    if (relative || !['X', 'Y', 'Z'].some((letter) => at.has(letter))) continue;
    const to = {
      x: at.has('X') ? (at.get('X') ?? 0) * unit : x,
      y: at.has('Y') ? (at.get('Y') ?? 0) * unit : y,
      z: at.has('Z') ? (at.get('Z') ?? 0) * unit : z,
    };
    if (mode > 0) {
      if (stopped && fed) cutter += 1;
      [stopped, fed, named] = [false, true, false];
      if (wanted(to.x, to.y, Math.min(z, to.z))) {
        const centre = {
          x: (at.get('I') ?? 0) * unit + (absoluteCentres ? 0 : x),
          y: (at.get('J') ?? 0) * unit + (absoluteCentres ? 0 : y),
        };
        // Roughing laps run beside the outline as evenly as the last one does: a coarser look at them loses nothing.
        const apart = Math.max(z, to.z) < low ? step : 4 * step;
        sampleMove({ x, y, z }, to, mode, centre, cutter, apart, samples);
      }
    }
    ({ x, y, z } = to);
  }
  return { samples, cutters: fed ? cutter + 1 : cutter };
}

type Place = Omit<Sample, 'cutter'>;

function sampleMove(
  from: Place,
  to: Place,
  mode: number,
  centre: { x: number; y: number },
  cutter: number,
  step: number,
  into: Sample[],
): void {
  const radius = Math.hypot(from.x - centre.x, from.y - centre.y);
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  let turn = Math.atan2(to.y - centre.y, to.x - centre.x) - start;
  if (mode === 2) turn = turn >= -1e-9 ? turn - 2 * Math.PI : turn;
  if (mode === 3) turn = turn <= 1e-9 ? turn + 2 * Math.PI : turn;
  const long = mode === 1 ? Math.hypot(to.x - from.x, to.y - from.y) : Math.abs(turn) * radius;
  const count = Math.max(1, Math.ceil(long / step));
  for (let i = 0; i <= count; i++) {
    const share = i / count;
    const z = from.z + share * (to.z - from.z);
    const angle = start + share * turn;
    into.push(
      mode === 1
        ? { x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y), z, cutter }
        : { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle), z, cutter },
    );
  }
}

export interface Looked {
  readonly wheel: Wheel;
  readonly texts: readonly string[];
  readonly absoluteCentres: boolean;
  /** Diameters in the order the programs change them. */
  readonly diameters: readonly number[];
  readonly finishing: number;
  readonly topZ: number;
  readonly bottomZ: number;
  /** No cut lies on the teeth that does not come this far out. */
  readonly rim: number;
}

export function lookAtProgram(looked: Looked): Look {
  const { wheel, diameters, finishing, topZ, bottomZ } = looked;
  const pitch = (2 * Math.PI) / wheel.teeth;
  const step = Math.sqrt(8 * SAMPLING * (finishing / 2));
  const outline = halfTooth(wheel, Math.min(step, wheel.module / 50));
  const teeth = new Set([0, Math.floor(wheel.teeth / 2)]);
  const near = (x: number, y: number): boolean =>
    teeth.has((Math.round(Math.atan2(y, x) / pitch) + wheel.teeth) % wheel.teeth);
  const samples: Sample[] = [];
  let cutters = 0;
  for (const text of looked.texts) {
    const read = readMoves(
      text,
      looked.absoluteCentres,
      (x, y, z) => z < topZ - 1e-6 && Math.hypot(x, y) > looked.rim && near(x, y),
      cutters,
      step,
      bottomZ + 1e-3,
    );
    cutters = read.cutters;
    for (const sample of read.samples) {
      if (sample.z < topZ - 1e-6) {
        samples.push(sample);
      }
    }
  }
  let gouge = 0;
  const low: Sample[] = [];
  for (const sample of samples) {
    const folded = fold(sample, pitch);
    const radius = (diameters[sample.cutter] ?? 0) / 2;
    gouge = Math.max(gouge, radius - nearest(outline, folded.x, folded.y));
    if (sample.z < bottomZ + 1e-3) {
      low.push({ ...sample, ...folded });
    }
  }
  return { gouge, left: leftOn(outline, samples, finishing / 2, bottomZ, wheel), samples: samples.length };
}

/** Into the half tooth below +X: the outline's pattern repeats and mirrors. */
function fold(
  { x, y }: { readonly x: number; readonly y: number },
  pitch: number,
): { readonly x: number; readonly y: number } {
  const angle = Math.atan2(y, x);
  const within = angle - pitch * Math.round(angle / pitch);
  const radius = Math.hypot(x, y);
  return { x: radius * Math.cos(within), y: -radius * Math.abs(Math.sin(within)) };
}

/** Distance from the outline taken as chords, negative inside the metal (told by the nearest point's normal). */
function nearest(outline: readonly OutlinePoint[], x: number, y: number): number {
  let best = Infinity;
  let side = 1;
  const look = (i: number): number => {
    const point = outline[i];
    if (point === undefined) {
      return Infinity;
    }
    const [dx, dy] = [x - point.x, y - point.y];
    const square = dx * dx + dy * dy;
    if (square < best) {
      best = square;
      side = dx * point.nx + dy * point.ny;
    }
    return square;
  };
  const rough: number[] = [];
  for (let i = 0; i < outline.length; i += STRIDE) {
    rough.push(look(i));
  }
  // No point between two looked at is nearer than the nearer of them by more than the way along the outline to it.
  const most = (Math.sqrt(best) + (STRIDE / 2) * longestChord(outline)) ** 2;
  for (const [k, square] of rough.entries()) {
    if (square <= most) {
      for (let i = k * STRIDE - STRIDE / 2; i <= k * STRIDE + STRIDE / 2; i++) {
        look(i);
      }
    }
  }
  const distance = Math.sqrt(best);
  return side < 0 && distance > 1e-3 ? -distance : distance;
}

/** Points are first looked at this far apart. */
const STRIDE = 16;

const CHORDS = new WeakMap<readonly OutlinePoint[], number>();

function longestChord(outline: readonly OutlinePoint[]): number {
  const known = CHORDS.get(outline);
  if (known !== undefined) {
    return known;
  }
  const longest = outline.reduce((most, point, i) => {
    const before = outline[i - 1] ?? point;
    return Math.max(most, Math.hypot(point.x - before.x, point.y - before.y));
  }, 0);
  CHORDS.set(outline, longest);
  return longest;
}

/** For points of both sides of tooth 0 that a disc can touch: how far the lowest laps stay away beyond the cutter's radius. */
function leftOn(
  outline: readonly OutlinePoint[],
  samples: readonly Sample[],
  radius: number,
  bottomZ: number,
  wheel: Wheel,
): number {
  const pitch = (2 * Math.PI) / wheel.teeth;
  const low = samples.filter(({ x, y, z }) => z < bottomZ + 1e-3 && Math.abs(Math.atan2(y, x)) < 1.6 * pitch);
  let left = 0;
  for (const [i, point] of outline.entries()) {
    if (i % 3 !== 0 || (point.role !== 'flank' && point.role !== 'addendum')) continue;
    const disc = Math.max(radius, wheel.root);
    const centre = fold({ x: point.x + disc * point.nx, y: point.y + disc * point.ny }, pitch);
    // A disc that touches here must touch nothing before.
    if (nearest(outline, centre.x, centre.y) < disc - SAMPLING) continue;
    for (const mirror of [1, -1]) {
      let best = Infinity;
      for (const sample of low) {
        best = Math.min(best, (sample.x - point.x) ** 2 + (sample.y - mirror * point.y) ** 2);
      }
      left = Math.max(left, Math.sqrt(best) - radius);
    }
  }
  return left;
}
