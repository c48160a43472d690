/** A pass, planned: its runs in order, the cutter and speed they are cut with, and the figures the sheet shows. */
import type { Cutter } from '../cutting/setup.ts';
import type { Heights } from './heights.ts';
import type { Run } from './leg.ts';
import type { PassFacts } from './plan.ts';
import type { Settings } from './settings.ts';

export interface PassCuts {
  readonly facts: PassFacts;
  readonly cutter: Cutter;
  readonly speed: number;
  readonly runs: readonly Run[];
}

export interface PassFigures {
  readonly name: string;
  readonly settings: Settings;
  readonly heights: Heights;
  readonly laps: number;
  readonly step: number;
  /** Sentences beside those of the settings. */
  readonly why: readonly string[];
}

export function passCuts(figures: PassFigures, runs: readonly Run[]): PassCuts {
  const { name, settings, heights, laps, step, why } = figures;
  const { data, cutter } = settings;
  return {
    cutter,
    speed: data.speed,
    runs,
    facts: {
      name,
      cutter: cutter.number,
      speed: data.speed,
      feed: data.feed,
      plunge: data.plunge,
      step,
      laps,
      depth: heights.bottom,
      why: [...settings.why, ...why],
    },
  };
}
