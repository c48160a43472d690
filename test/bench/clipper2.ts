/** clipper2-wasm as the bench uses it. Its package names types that are not there, so what is used is said here. */
import { createRequire } from 'node:module';
import type { Point } from '../../src/geometry/point.ts';

interface Freed {
  delete(): void;
}
interface Paths64 extends Freed {
  push_back(path: Freed): void;
  size(): number;
  get(index: number): Freed & { size(): number; view(): BigInt64Array };
}
interface Clipper2 {
  readonly Paths64: new () => Paths64;
  MakePath64(numbers: readonly number[]): Freed;
  InflatePaths64(
    paths: Paths64,
    delta: number,
    join: unknown,
    end: unknown,
    miter: number,
    arcTolerance: number,
  ): Paths64;
  readonly JoinType: { readonly Round: unknown };
  readonly EndType: { readonly Polygon: unknown };
}

export interface Grower {
  /** Points of the grown ring, copied out. */
  grow(ring: readonly Point[], delta: number, arcTolerance: number, stepsPerMm: number): number;
}

export async function clipper2(): Promise<Grower> {
  const make = createRequire(import.meta.url)('clipper2-wasm') as () => Promise<Clipper2>;
  const library = await make();
  return {
    grow(ring, delta, arcTolerance, stepsPerMm) {
      const path = library.MakePath64(
        ring.flatMap(({ x, y }) => [Math.round(x * stepsPerMm), Math.round(y * stepsPerMm)]),
      );
      const paths = new library.Paths64();
      paths.push_back(path);
      const grown = library.InflatePaths64(
        paths,
        delta,
        library.JoinType.Round,
        library.EndType.Polygon,
        2,
        arcTolerance,
      );
      let points = 0;
      for (let i = 0; i < grown.size(); i++) {
        const ringOut = grown.get(i);
        const numbers = ringOut.view();
        const copied = new Float64Array(ringOut.size() * 2);
        const width = numbers.length / ringOut.size();
        for (let k = 0; k < ringOut.size(); k++) {
          copied[2 * k] = Number(numbers[width * k]) / stepsPerMm;
          copied[2 * k + 1] = Number(numbers[width * k + 1]) / stepsPerMm;
        }
        points += copied.length / 2;
        ringOut.delete();
      }
      grown.delete();
      paths.delete();
      path.delete();
      return points;
    },
  };
}
