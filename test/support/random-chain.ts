/** Chains of moves as programs have them, at random by a seed: cuts that run on smoothly or turn sharply, arcs, helices, rapids, stops. */
import type { ChainLimits, ChainMove, Place } from './step-along.ts';

export interface Chain {
  readonly moves: readonly ChainMove[];
  readonly limits: ChainLimits;
}

/** Numbers from 0 to 1, the same for the same seed (a 32-bit multiply-and-shift generator). */
export function randomNumbers(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x9e3779b9) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 16), 0x21f0aaad);
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97);
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 2 ** 32;
  };
}

export function randomChain(random: () => number): Chain {
  const between = (low: number, high: number): number => low * (high / low) ** random();
  const one = <T>(...these: readonly T[]): T => these[Math.floor(random() * these.length)]!;
  const [ax, rx] = [between(10, 800), between(300, 8000)];
  const limits: ChainLimits = {
    acceleration: { x: ax, y: one(ax, between(10, 800)), z: between(10, 400) },
    rapid: { x: rx, y: one(rx, between(300, 8000)), z: between(200, 4000) },
    cornerAllowance: between(0.002, 0.05),
    blockSeconds: one(0, 0.001, 0.01),
  };
  const moves: ChainMove[] = [];
  const count = 1 + Math.floor(random() * 30);
  let at: Place = { x: 0, y: 0, z: 0 };
  let heading = random() * 2 * Math.PI;
  let feed = between(20, 1500);
  for (let i = 0; i < count; i++) {
    heading += one(
      0,
      0,
      0.02 * (random() - 0.5),
      2 * Math.PI * random(),
      Math.PI * (random() - 0.5),
      Math.PI,
    );
    feed = random() < 0.2 ? between(20, 1500) : feed;
    const long = between(0.005, 20);
    const shared = { from: at, ...(random() < 0.05 ? { standsBefore: true } : {}) };
    const pick = random();
    if (pick < 0.35) {
      const turn = one(-1, 1) * between(0.02, 2 * Math.PI);
      const radius = between(0.05, 8);
      const side = Math.sign(turn);
      const centre = {
        x: at.x - side * radius * Math.sin(heading),
        y: at.y + side * radius * Math.cos(heading),
      };
      heading += turn;
      const to = {
        x: centre.x + side * radius * Math.sin(heading),
        y: centre.y - side * radius * Math.cos(heading),
        z: at.z + (random() < 0.3 ? (random() - 0.6) * radius : 0),
      };
      moves.push({ ...shared, kind: 'arc', to, centre, turn, feed });
    } else if (pick < 0.38) {
      moves.push({ ...shared, kind: 'line', to: at, feed });
    } else {
      const rise = pick < 0.5 ? long * (random() - 0.5) : pick < 0.55 ? (random() - 0.5) * 1000 * long : 0;
      const share = Math.min(1, long / Math.hypot(long, rise));
      const to = {
        x: at.x + share * long * Math.cos(heading),
        y: at.y + share * long * Math.sin(heading),
        z: at.z + share * rise,
      };
      moves.push(pick > 0.9 ? { ...shared, kind: 'rapid', to } : { ...shared, kind: 'line', to, feed });
    }
    at = moves.at(-1)!.to;
  }
  return { moves, limits };
}
