/**
 * Feeds and speeds no cutter bears, within what the machine runs: a chip thicker than any small cutter takes, an edge faster
 * than its material allows, and (warned of) both so slow that the cutter rubs. Judged are moves below the top of the blank.
 */
import { boundsOf, edgeSpeed, type Bounds } from '../cutting/bounds.ts';
import { materialNamed } from '../cutting/materials.ts';
import type { Cutter } from '../cutting/setup.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, micronText, type Said } from './finding-at.ts';
import type { Finding } from './proof.ts';

export function checkChip(evidence: Evidence): Finding[] {
  const { solids, input, lastDigit } = evidence;
  const material = materialNamed(input.setup.material);
  const { spindleHighest } = input.machine.limits;
  const top = input.setup.topZ - lastDigit;
  const found = new Map<string, Finding>();
  let cutter: Cutter | undefined;
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
      cutter = evidence.cutterOf(move);
      bounds = cutter && boundsOf(cutter, material, spindleHighest);
    }
    [feed, spindle, number] = [move.feed ?? Number.NaN, move.spindle, move.cutter ?? Number.NaN];
    if (cutter === undefined || bounds === undefined || spindle === 0) {
      continue;
    }
    for (const said of judge(cutter, bounds, feed, Math.abs(spindle))) {
      if (!found.has(said.hint)) {
        found.set(said.hint, findingAt(move, said));
      }
    }
  }
  return [...found.values()];
}

const NONE: readonly Said[] = [];

function judge(
  cutter: Cutter,
  { thickest, thinnest, fastest, slowest }: Bounds,
  feed: number,
  speed: number,
): readonly Said[] {
  const chip = feed / (speed * cutter.flutes);
  if (!(chip > thickest || chip < thinnest || speed > fastest || speed < slowest)) {
    return NONE;
  }
  const which = `cutter ${String(cutter.number)}`;
  const edge = (turns: number): string => `${edgeSpeed(cutter, turns).toFixed(1)} m/min`;
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
