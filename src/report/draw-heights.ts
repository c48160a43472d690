/**
 * The heights, seen from the side: the plate, the blank on it, and the levels the program keeps to, each with its Z.
 * To a scale of its own; labels that would stand on one another are spread on leaders. mm of paper, Y down.
 */
import { words } from './dimension.ts';
import type { SheetFacts } from './facts.ts';
import { bareLength } from './lengths.ts';
import { spread } from './spread.ts';
import { fixed, plain } from './words.ts';

export interface HeightsBox {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

interface Level {
  readonly figure: string;
  readonly z: number;
  readonly name: string;
}

const COLUMN = 15;
const LABEL_GAP = 5.6;

export function drawHeights(facts: SheetFacts, box: HeightsBox): string {
  const levels = levelsOf(facts).toSorted((a, b) => b.z - a.z);
  const highest = levels[0]?.z ?? 0;
  const lowest = Math.min(levels.at(-1)?.z ?? 0, facts.job.setup.plateZ);
  const perMm = (box.bottom - box.top - 4) / Math.max(highest - lowest, 1e-3);
  const at = (z: number): number => box.top + (highest - z) * perMm;
  const wished = levels.map(({ z }) => at(z));
  const places = spread(wished, LABEL_GAP, box.top, box.bottom);
  const column = box.left + COLUMN;
  const lines = levels.map(({ figure, z, name }, i) => {
    const [y, label] = [plain(at(z), 3), places[i] ?? 0];
    const strong = z === 0 ? ' stroke-width=".3"' : '';
    return (
      `<g data-figure="${figure}" data-value="${fixed(z, 6)}"><path class="line"${strong} d="M${plain(box.left, 2)} ${y}H${plain(column + 2, 2)}L${plain(column + 5, 2)} ${plain(label, 3)}"/>` +
      `${words(`Z ${bareLength(z, facts.job.length)}`, column + 6, label + 1)}${words(name, column + 20, label + 1)}</g>`
    );
  });
  return metal(facts, box, at) + lines.join('');
}

/** Plate, blank, and what stands higher. */
function metal({ job }: SheetFacts, box: HeightsBox, at: (z: number) => number): string {
  const { topZ, plateZ, obstacles } = job.setup;
  const plate = at(plateZ);
  const rect = (kind: string, x: number, width: number, top: number, bottom: number): string =>
    `<rect class="${kind}" x="${plain(x, 3)}" y="${plain(top, 3)}" width="${plain(width, 3)}" height="${plain(bottom - top, 3)}"/>`;
  const highest = Math.max(-Infinity, ...obstacles.map(({ toZ }) => toZ));
  const from = Math.min(...obstacles.map(({ fromZ }) => fromZ), topZ);
  const stands = obstacles.length === 0 ? '' : rect('solid', box.left + 1.5, 3, at(highest), at(from));
  return (
    rect('plate-metal', box.left, COLUMN, plate, Math.max(plate + 3.5, box.bottom)) +
    rect('brass', box.left + 5.5, COLUMN - 6, at(topZ), plate) +
    stands
  );
}

/** Levels worth knowing, each once. */
function levelsOf({ job, park, proof }: SheetFacts): readonly Level[] {
  const { topZ, plateZ, clearZ, obstacles } = job.setup;
  const highest = Math.max(-Infinity, ...obstacles.map(({ toZ }) => toZ));
  const zero = (z: number, name: string): string => (z === 0 ? `zero: ${name}` : name);
  return [
    ...(park === undefined ? [] : [{ figure: 'z-park', z: park.z, name: 'parking' }]),
    ...(obstacles.length === 0 ? [] : [{ figure: 'z-obstacle', z: highest, name: 'in the way' }]),
    { figure: 'z-clear', z: clearZ, name: 'clear' },
    { figure: 'z-top', z: topZ, name: zero(topZ, 'top of blank') },
    { figure: 'z-plate', z: plateZ, name: zero(plateZ, 'plate') },
    ...(proof === undefined ? [] : [{ figure: 'z-deepest', z: proof.extents.z[0], name: 'deepest' }]),
  ];
}
