/**
 * Speed, feed and depth of a pass: what the job says, else what follows from cutter and material, each with its why.
 *
 * In  : the job, the machine, which pass, the radial depth it cuts with once its metal is open.
 * Out : figures of a full slot (for entries, bays, first rings, contour slots) with the depth a level may have, or the
 *       refusal that no depth keeps the cutter from breaking.
 */
import { Bug } from '../base/bug.ts';
import { failure, success, type Outcome, type Problem } from '../base/problem.ts';
import { SAME_POINT } from '../base/tolerances.ts';
import { boundsOf, edgeSpeed, type Bounds } from '../cutting/bounds.ts';
import { cutData, type CutData } from '../cutting/cut-data.ts';
import { materialNamed, type Material } from '../cutting/materials.ts';
import type { Cutter } from '../cutting/setup.ts';
import { slotDepth } from '../cutting/slot-depth.ts';
import type { CutSettings, Job, PassKind } from '../job/job.ts';
import { showLength } from '../job/show-length.ts';
import type { Machine } from '../machine/machine.ts';

export interface Settings {
  readonly cutter: Cutter;
  readonly radius: number;
  readonly data: CutData;
  /** Deepest level: of a full slot as its load allows, of a wall what the flute covers. */
  readonly step: number;
  readonly why: readonly string[];
}

/** Breakage margin a slot keeps, with a sharp cutter. Judgement: wear takes 1.3 to 2 of it, the forces are known to 40 %. */
const MARGIN = 3;
/** Shallower than this share of the diameter a level only rubs its floor and a wheel takes hours. Judgement. */
const SHALLOWEST = 0.015;
/** Bending is weighed against this share of the diameter where no allowance is left for another pass. Judgement. */
const BENDING_ALLOWANCE = 0.05;

export function materialOf(job: Job): Material {
  const material = materialNamed(job.setup.material);
  if (material === undefined) {
    throw new Bug(`no material ${job.setup.material}`);
  }
  return material;
}

export function settingsFor(
  job: Job,
  machine: Machine,
  kind: PassKind,
  radialDepth: 'slot' | number,
  allowance: number,
): Outcome<Settings> {
  const asked: CutSettings = job.cuts[kind];
  const { cutter } = asked;
  const material = materialOf(job);
  const request = { material, cutter, radialDepth, limits: machine.limits };
  const chosen = cutData({ ...request, asked });
  const dial = dialSpeed(machine, chosen.speed);
  const data =
    dial === chosen.speed
      ? chosen
      : onTheDial(cutData({ ...request, asked: { ...asked, speed: dial } }), chosen);
  const unbearable = tooMuch(job, kind, data, boundsOf(cutter, material, machine.limits.spindleHighest));
  if (unbearable !== undefined) {
    return failure([unbearable]);
  }
  const settings: Settings = { cutter, radius: cutter.diameter / 2, data, step: cutter.flute, why: data.why };
  if (radialDepth !== 'slot') {
    return success(settings);
  }
  const slot = slotDepth(
    { material, cutter, speed: data.speed, feed: data.feed, runout: cutter.runout },
    {
      ...(asked.step === undefined ? {} : { asked: asked.step }),
      margin: MARGIN,
      allowance: allowance > 0 ? allowance : BENDING_ALLOWANCE * cutter.diameter,
    },
  );
  if (!(slot.depth >= SHALLOWEST * cutter.diameter) && slot.limitedBy !== 'asked') {
    return failure([
      {
        code: 'toolpath.load',
        severity: 'error',
        message:
          `${kind}: cutter ${cutter.number} (${showLength(cutter.diameter, job.length)}, ${showLength(cutter.stickOut, job.length)} out) could cut ` +
          `${slot.depth < LEAST_SAID ? `less than ${LEAST_SAID}` : `only ${slot.depth.toFixed(4)}`} mm deep a lap: ${slot.why}`,
        hint: 'use a stouter cutter, let it stand out less, or lower the feed',
        at: { kind: 'value', file: job.file, path: ['cuts', kind, 'cutter'] },
      },
    ]);
  }
  const why = `at most ${slot.depth.toFixed(3)} mm a lap: ${slot.why}`;
  return success({ ...settings, step: slot.depth, why: [...data.why, why] });
}

/** mm; a depth that would be said as 0.0000. */
const LEAST_SAID = 0.0001;

/** A speed or a feed that no cutter bears: what the job asks for, or the least that the machine runs. */
function tooMuch(job: Job, kind: PassKind, data: CutData, bounds: Bounds): Problem | undefined {
  const { cutter, ...asked } = job.cuts[kind];
  const said = (key: 'speed' | 'feed', message: string): Problem => ({
    code: 'toolpath.load',
    severity: 'error',
    message: `${kind}: ${message}`,
    hint:
      asked[key] === undefined
        ? 'take another cutter: the machine runs no lower'
        : `lower the ${key}, or leave it out: it then follows from cutter, material and machine`,
    at: { kind: 'value', file: job.file, path: ['cuts', kind, asked[key] === undefined ? 'cutter' : key] },
  });
  if (data.speed > bounds.fastest) {
    const edge = (turns: number): string => `${edgeSpeed(cutter, turns).toFixed(0)} m/min`;
    return said(
      'speed',
      `at ${data.speed} turns a minute the edge of cutter ${cutter.number} runs at ${edge(data.speed)}; in ${job.setup.material} it burns above ${edge(bounds.fastest)} at the latest`,
    );
  }
  if (data.feedPerTooth > bounds.thickest) {
    return said(
      'feed',
      `${data.feed} mm/min makes a chip of ${data.feedPerTooth.toFixed(4)} mm a tooth; cutter ${cutter.number} breaks above ${bounds.thickest.toFixed(4)} mm at the latest`,
    );
  }
  return undefined;
}

/** What a dial set by hand can be set to. Judgement: its marks stand a thousand apart and are read to a tenth. */
const DIAL = 100;

/** The speed a person is asked to set: rounded down to what a dial shows, where hands set it. */
function dialSpeed({ words, limits }: Machine, speed: number): number {
  return words.spindle.run === 'by-hand'
    ? Math.max(Math.floor(speed / DIAL) * DIAL, Math.min(limits.spindleLowest, speed))
    : speed;
}

/** The reason for the speed is that of the speed chosen first. */
function onTheDial(data: CutData, chosen: CutData): CutData {
  const [first, ...rest] = data.why;
  const why = `${chosen.why[0] ?? first ?? ''}, set to ${data.speed} on the dial`;
  return { ...data, why: [why, ...rest] };
}

/** The same depth for every level, none deeper than `step`. */
export function levelsFor(depth: number, step: number): number {
  return Math.max(1, Math.ceil(depth / step - SAME_POINT));
}
