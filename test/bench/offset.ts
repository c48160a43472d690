/**
 * How long offsets take, warm: the path of the whole 60-tooth outline to 0.1 um, and one pitch against two general
 * libraries that are given the same pitch as a polygon, sampled as finely as 0.1 um asks for. Medians; the checksums are
 * taken outside the clock, so that nothing timed can be left out.
 *
 * Run: npm run --silent bench:offset
 */
import BufferOp from 'jsts/org/locationtech/jts/operation/buffer/BufferOp.js';
import BufferParameters from 'jsts/org/locationtech/jts/operation/buffer/BufferParameters.js';
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import { offsetSector } from '../../src/geometry/offset-chain.ts';
import type { Chain } from '../../src/geometry/piece.ts';
import type { Point } from '../../src/geometry/point.ts';
import { sampleChain } from '../../src/geometry/sample-piece.ts';
import { THIRD_WHEEL, toothSector } from '../geometry/sample-wheel.ts';
import { clipper2 } from './clipper2.ts';

const SAG = 0.0001;
const DISTANCE = 0.25;
const TEETH = 60;
const STEPS_PER_MM = 1e6;
/** JTS rounds a quarter circle with this many chords: 31 keep 0.1 um at 0.3 mm. */
const QUADRANT_SEGMENTS = 31;

const sector = toothSector(THIRD_WHEEL);
const ring: Point[] = [...sampleChain(sector, SAG), { x: 0, y: 0 }];

function ours(): Chain {
  const offset = offsetSector(sector, TEETH, DISTANCE);
  if (!offset.ok) {
    throw new Error(offset.problems[0]?.message);
  }
  return offset.value.chain.map(({ piece }) => piece);
}

/** x and y in turn, once round, chords within SAG of the exact path. */
function wholePath(): Float64Array {
  const pitch = sampleChain(ours(), SAG).slice(0, -1);
  const path = new Float64Array(2 * TEETH * pitch.length);
  let at = 0;
  for (let tooth = 0; tooth < TEETH; tooth++) {
    const c = Math.cos((2 * Math.PI * tooth) / TEETH);
    const s = Math.sin((2 * Math.PI * tooth) / TEETH);
    for (const { x, y } of pitch) {
      path[at++] = x * c - y * s;
      path[at++] = x * s + y * c;
    }
  }
  return path;
}

function jsts(): number {
  const factory = new GeometryFactory();
  const coordinates = [...ring, ring[0] as Point].map(({ x, y }) => new Coordinate(x, y));
  const grown = BufferOp.bufferOp(
    factory.createPolygon(coordinates),
    DISTANCE,
    new BufferParameters(QUADRANT_SEGMENTS),
  );
  return grown.getNumPoints();
}

const library = await clipper2();

function wasm(): number {
  return library.grow(ring, DISTANCE * STEPS_PER_MM, SAG * STEPS_PER_MM, STEPS_PER_MM);
}

const WARM_UP = 3000;
const BLOCKS = 20;
const RUNS = 50;

/** Milliseconds, the middle of many runs after many to warm up; contestants take turns, so that all see the same load. */
function medians(contestants: readonly (() => unknown)[]): number[] {
  const times: number[][] = contestants.map(() => []);
  contestants.forEach((run) => {
    for (let i = 0; i < WARM_UP; i++) {
      run();
    }
  });
  for (let block = 0; block < BLOCKS; block++) {
    contestants.forEach((run, i) => {
      for (let k = 0; k < RUNS; k++) {
        const start = performance.now();
        run();
        times[i]?.push(performance.now() - start);
      }
    });
  }
  return times.map((all) => all.toSorted((a, b) => a - b)[(BLOCKS * RUNS) / 2] as number);
}

const [whole, own, other, third] = medians([wholePath, ours, wasm, jsts]) as [number, number, number, number];
const path = wholePath();
const checksum = path.reduce((sum, value, i) => sum + Math.abs(value) * ((i % 7) + 1), 0);

console.log(`60 teeth, module 0.5, offset ${DISTANCE} mm to 0.1 um; medians of ${BLOCKS * RUNS}, warm`);
console.log(`whole outline   ours          ${whole.toFixed(3)} ms   ${path.length / 2} points (limit 1 ms)`);
console.log(`one pitch       ours          ${own.toFixed(3)} ms   ${ours().length} exact pieces`);
console.log(`                clipper2-wasm ${other.toFixed(3)} ms   ${wasm()} points from ${ring.length}`);
console.log(`                jsts          ${third.toFixed(3)} ms   ${jsts()} points from ${ring.length}`);
console.log(`checksum ${checksum.toFixed(6)}`);
const reached = whole < 1 && own < other && own < third;
console.log(reached ? 'reached' : 'NOT reached: under 1 ms, and faster than both');
process.exitCode = reached ? 0 : 1;
