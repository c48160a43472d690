/**
 * What a person counts in the comments of the programs: how many laps each pass makes, and how much deeper one of them goes at
 * most. A hole cleared ring by ring has a count for each ring. mm.
 */
import type { Motion } from '../motion/motion.ts';
import { isMove } from '../motion/motion.ts';

export interface Laps {
  /** Least and most of its rings and windows. */
  readonly laps: readonly [number, number];
  /** Greatest fall from one lap to the next, or from the top to the first. */
  readonly step: number;
}

export function lapsOf(motions: readonly Motion[], topZ: number): ReadonlyMap<string, Laps> {
  // Depths of each lap, under the pass, and under its window, ring and tooth.
  const depths = new Map<string, Map<string, Map<number, number>>>();
  for (const step of motions.flatMap(({ steps }) => steps)) {
    const belongs = isMove(step) ? step.belongs : undefined;
    if (belongs?.lap === undefined || belongs.depth === undefined) {
      continue;
    }
    const { pass, ring = 0, lap, depth, together } = belongs;
    const name = mergedName(pass);
    const place = `${pass} ${ring} ${together === true ? (belongs.tooth ?? 0) : ''}`;
    const places = known(depths, name, () => new Map<string, Map<number, number>>());
    known(places, place, () => new Map<number, number>()).set(lap, depth);
  }
  return new Map([...depths].map(([name, places]) => [name, figures([...places.values()], topZ)]));
}

/** Every window is a pass of its own in the program; on the sheet they are one. */
export function mergedName(pass: string): string {
  return pass.replace(/^crossing \d+/, 'crossings');
}

function known<K, V>(map: Map<K, V>, key: K, make: () => V): V {
  const found = map.get(key) ?? make();
  map.set(key, found);
  return found;
}

function figures(places: readonly ReadonlyMap<number, number>[], topZ: number): Laps {
  const counts = places.map((laps) => laps.size);
  const falls = places.flatMap((laps) => {
    const inOrder = [...laps].toSorted(([a], [b]) => a - b).map(([, depth]) => depth);
    return inOrder.map((depth, i) => (inOrder[i - 1] ?? topZ) - depth);
  });
  return { laps: [Math.min(...counts), Math.max(...counts)], step: Math.max(...falls) };
}
