/**
 * Feeds and speeds no cutter bears, within what the machine runs: a chip thicker than any small cutter takes, an edge faster
 * than its material allows, and (warned of) both so slow that the cutter rubs. Bounds far outside good practice, not advice.
 *
 * Chip a tooth: fz = F / (S z). Edge speed: v = pi D S / 1000 in m/min. Judged are moves below the top of the blank.
 */
import { THINNEST_CHIP } from '../cutting/edge.ts';
import { chipLoad, materialNamed, type Material } from '../cutting/materials.ts';
import type { Cutter } from '../cutting/setup.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, micronText, type Said } from './finding-at.ts';
import type { Finding } from './proof.ts';

/** Thickest chip, as a share of the diameter. Judgement: catalogues give 0.13 to 0.6 %, our softest material 2 %. */
const THICKEST_SHARE = 0.05;
/** Thickest chip, in loads of the material's table. Judgement: a thin wall is given 1.5 of them already. */
const MOST_LOADS = 6;
/** Fastest edge, in cutting speeds of the material's table, which are taken low. Judgement. */
const MOST_SPEEDS = 4;
/** Slowest feed and speed, as shares of the table's (or the machine's highest). Judgement: a quarter is usual going down. */
const LEAST_LOAD = 1 / 20;
const LEAST_SPEED = 1 / 10;

/** What one cutter bears in this material; mm, 1/min. */
interface Bounds {
  readonly cutter: Cutter;
  readonly thickest: number;
  /** Thinner than this it only rubs. */
  readonly thinnest: number;
  readonly fastest: number;
  readonly slowest: number;
}

export function checkChip(evidence: Evidence): Finding[] {
  const { solids, input, lastDigit } = evidence;
  const material = materialNamed(input.setup.material);
  const { spindleHighest } = input.machine.limits;
  const top = input.setup.topZ - lastDigit;
  const found = new Map<string, Finding>();
  let bounds: Bounds | undefined;
  let [feed, spindle, number] = [Number.NaN, Number.NaN, Number.NaN];
  for (let i = 0; i < solids.count; i++) {
    if (solids.rapid[i] === 1 || (solids.z0[i]! >= top && solids.z1[i]! >= top)) {
      continue;
    }
    const move = solids.moves[i]!;
    // Most moves are made like the one before.
    if (move.feed === feed && move.spindle === spindle && move.cutter === number) {
      continue;
    }
    if (move.cutter !== number) {
      const cutter = evidence.cutterOf(move);
      bounds = cutter && boundsOf(cutter, material, spindleHighest);
    }
    [feed, spindle, number] = [move.feed ?? Number.NaN, move.spindle, move.cutter ?? Number.NaN];
    for (const said of bounds === undefined || spindle === 0 ? [] : judge(bounds, feed, Math.abs(spindle))) {
      if (!found.has(said.hint)) {
        found.set(said.hint, findingAt(move, said));
      }
    }
  }
  return [...found.values()];
}

function boundsOf(cutter: Cutter, material: Material | undefined, highest: number): Bounds {
  const share = THICKEST_SHARE * cutter.diameter;
  if (material === undefined) {
    return { cutter, thickest: share, thinnest: 0, fastest: Infinity, slowest: 0 };
  }
  const load = chipLoad(material, cutter.diameter);
  const turns = (1000 * material.cuttingSpeed) / (Math.PI * cutter.diameter);
  return {
    cutter,
    thickest: Math.min(share, MOST_LOADS * load),
    thinnest: Math.min(LEAST_LOAD * load, THINNEST_CHIP / 2),
    fastest: MOST_SPEEDS * turns,
    slowest: LEAST_SPEED * Math.min(turns, highest),
  };
}

const NONE: readonly Said[] = [];

function judge(
  { cutter, thickest, thinnest, fastest, slowest }: Bounds,
  feed: number,
  speed: number,
): readonly Said[] {
  const chip = feed / (speed * cutter.flutes);
  if (!(chip > thickest || chip < thinnest || speed > fastest || speed < slowest)) {
    return NONE;
  }
  const which = `cutter ${String(cutter.number)}`;
  const edge = (turns: number): string => `${((Math.PI * cutter.diameter * turns) / 1000).toFixed(1)} m/min`;
  const said = (message: string, hint: string, severity: Finding['severity']): Said[] => [
    { code: 'prove.chip', message, hint, severity },
  ];
  return [
    ...(chip > thickest
      ? said(
          `a chip of ${micronText(chip)} a tooth (${feed.toFixed(1)} mm/min); ${which} breaks above ${micronText(thickest)} at the latest`,
          'Lower F, or raise S.',
          'error',
        )
      : []),
    ...(speed > fastest
      ? said(
          `the edge of ${which} runs at ${edge(speed)} (${String(speed)} turns a minute); in this material it burns above ${edge(fastest)} at the latest`,
          'Lower S.',
          'error',
        )
      : []),
    ...(chip < thinnest
      ? said(
          `a chip of ${micronText(chip)} a tooth (${feed.toFixed(1)} mm/min): below ${micronText(thinnest)} ${which} rubs and does not cut`,
          'Raise F, or lower S.',
          'warning',
        )
      : []),
    ...(speed < slowest
      ? said(
          `the edge of ${which} runs at ${edge(speed)} (${String(speed)} turns a minute); ${edge(slowest)} would still be slow`,
          'Raise S.',
          'warning',
        )
      : []),
  ];
}
