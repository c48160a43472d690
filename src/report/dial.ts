/**
 * The dial round the wheel: the minutes of the whole work run clockwise from twelve; the passes are its chapters, as long as
 * they take. A chapter too small for its numeral has it outside, on a leader. mm of paper, Y down.
 */
import type { SheetPass } from './facts.ts';
import { ringBand } from './plot.ts';
import { spread } from './spread.ts';
import { duration, escapeText, numeral, plain } from './words.ts';

/** Outwards from the innermost: minute figures, minute track, chapters, leaders, numerals outside. */
const FIGURES = 4.6;
const TRACK = 2.2;
const CHAPTERS = 5.6;
const LEADER = 4.2;
const OUTSIDE = 5;
export const DIAL_WIDTH = FIGURES + TRACK + CHAPTERS + LEADER + OUTSIDE;

/** Least length of ring for a numeral inside it, for each letter; and between two outside. */
const LETTER_ROOM = 2.2;
const NUMERAL_ROOM = 8;

export function isRoughPass(pass: string): boolean {
  return !/finish|spring/.test(pass);
}

export function drawDial(passes: readonly SheetPass[], inside: number): string {
  const total = passes.reduce((sum, pass) => sum + pass.seconds, 0);
  if (total <= 0) {
    return '';
  }
  const track = inside + FIGURES;
  const inner = track + TRACK;
  const outer = inner + CHAPTERS;
  const chapters = chaptersOf(passes, total);
  const bands = chapters.map(
    ({ pass, number, from, to }) =>
      `<path class="chapter ${isRoughPass(pass.name) ? 'rough-tint' : 'fine-tint'}" data-chapter="${number}" data-seconds="${plain(pass.seconds, 3)}" ` +
      `d="${ringBand(inner, outer, from, to)}"><title>${numeral(number)} ${escapeText(pass.name)}, ${duration(pass.seconds)}</title></path>`,
  );
  return (
    `<g class="dial">${bands.join('')}${numeralsInside(chapters, (inner + outer) / 2)}${numeralsOutside(chapters, outer, inner)}` +
    `<circle class="line" r="${plain(track, 3)}"/><circle class="line" r="${plain(inner, 3)}"/><circle class="line" r="${plain(outer, 3)}"/>` +
    `${minutes(total, track, inner)}</g>`
  );
}

interface Chapter {
  readonly pass: SheetPass;
  readonly number: number;
  /** Clockwise from twelve. */
  readonly from: number;
  readonly to: number;
}

function chaptersOf(passes: readonly SheetPass[], total: number): readonly Chapter[] {
  let spent = 0;
  return passes.map((pass, i) => {
    const from = (2 * Math.PI * spent) / total;
    spent += pass.seconds;
    return { pass, number: i + 1, from, to: (2 * Math.PI * spent) / total };
  });
}

/** Letters a numeral has, and some air. */
function roomy({ number, from, to }: Chapter, radius: number): boolean {
  return (to - from) * radius >= numeral(number).length * LETTER_ROOM + 2;
}

function numeralsInside(chapters: readonly Chapter[], radius: number): string {
  return chapters
    .filter((chapter) => roomy(chapter, radius))
    .map(({ number, from, to }) => turnedNumeral(number, (from + to) / 2, radius))
    .join('');
}

/** Spread along the ring so that none stands on another; a bent leader says which chapter it belongs to. */
function numeralsOutside(chapters: readonly Chapter[], outer: number, inner: number): string {
  const small = chapters.filter((chapter) => !roomy(chapter, (inner + outer) / 2));
  const radius = outer + LEADER + 2;
  const gap = NUMERAL_ROOM / radius;
  const middles = small.map(({ from, to }) => (from + to) / 2);
  const places = spread(middles, gap, gap / 2, 2 * Math.PI - gap / 2);
  return small
    .map(({ number }, i) => {
      const [middle, place] = [middles[i] ?? 0, places[i] ?? 0];
      const leader = `M${spoke(outer, middle)}L${spoke(outer + 1.2, middle)}L${spoke(outer + LEADER - 0.4, place)}`;
      return `<path class="line" d="${leader}"/>${numeralAt(number, place, radius)}`;
    })
    .join('');
}

function numeralAt(number: number, angle: number, radius: number): string {
  const y = -radius * Math.cos(angle) + 1.05;
  return `<text class="numeral" text-anchor="middle" x="${plain(radius * Math.sin(angle), 2)}" y="${plain(y, 2)}">${numeral(number)}</text>`;
}

/** Along the ring, its foot towards the middle above and away from it below, as a dial that is read without turning one's head. */
function turnedNumeral(number: number, angle: number, radius: number): string {
  const below = Math.cos(angle) < 0;
  const turn = (angle * 180) / Math.PI + (below ? 180 : 0);
  const at = spoke(radius, angle);
  return `<text class="numeral" text-anchor="middle" transform="translate(${at}) rotate(${plain(turn, 2)})" y="1.05">${numeral(number)}</text>`;
}

function spoke(radius: number, angle: number): string {
  return `${plain(radius * Math.sin(angle), 3)} ${plain(-radius * Math.cos(angle), 3)}`;
}

/** A minute track: marks as close as the eye can count, figures as close as they can be read. */
function minutes(total: number, track: number, inner: number): string {
  const marks = STEPS.find((seconds) => total / seconds <= MOST_MARKS) ?? 3600;
  const figures = STEPS.find((seconds) => seconds >= marks && total / seconds <= MOST_FIGURES) ?? 7200;
  const paths = Array.from({ length: Math.ceil(total / marks) }, (_, i) => {
    const angle = (2 * Math.PI * i * marks) / total;
    const from = (i * marks) % figures === 0 ? track : track + TRACK / 2;
    return `M${spoke(from, angle)}L${spoke(inner, angle)}`;
  });
  // A last figure that would stand on the nought is left out.
  const count = Math.ceil((total - 0.4 * figures) / figures);
  const texts = Array.from({ length: Math.max(count, 1) }, (_, i) => {
    const angle = (2 * Math.PI * i * figures) / total;
    const radius = track - 2.4;
    return `<text class="minute" text-anchor="middle" x="${plain(radius * Math.sin(angle), 2)}" y="${plain(-radius * Math.cos(angle) + 0.9, 2)}">${plain((i * figures) / 60, 2)}</text>`;
  });
  return `<path class="line minutes" d="${paths.join('')}"/>${texts.join('')}`;
}

const STEPS = [10, 30, 60, 300, 600, 1800, 3600, 7200];
const MOST_MARKS = 130;
const MOST_FIGURES = 16;
