/**
 * Reads back what a plate draws: paths as points with their arcs followed, figures with what they say.
 * Arcs by the endpoint form of SVG 1.1, appendix F.6.5; circles only, which is all the plates draw.
 */
import type { Point } from '../../src/geometry/point.ts';

export interface ReadArc {
  readonly kind: 'arc' | 'line';
  readonly from: Point;
  readonly to: Point;
  readonly centre?: Point;
  readonly radius?: number;
  readonly turn?: number;
}

/** The runs of a path, absolute and relative letters, without curves. */
export function readPath(d: string): ReadArc[] {
  const found: ReadArc[] = [];
  let at: Point = { x: 0, y: 0 };
  let start = at;
  for (const [, letter = '', rest = ''] of d.matchAll(/([MLHVAZmlhvaz])([^MLHVAZmlhvaz]*)/g)) {
    const numbers = (rest.match(/-?(?:\d+\.?\d*|\.\d+)(?:e-?\d+)?/g) ?? []).map(Number);
    const relative = letter === letter.toLowerCase();
    const place = (x: number, y: number): Point => (relative ? { x: at.x + x, y: at.y + y } : { x, y });
    const line = (to: Point): void => {
      found.push({ kind: 'line', from: at, to });
      at = to;
    };
    switch (letter.toUpperCase()) {
      case 'M':
        at = place(numbers[0]!, numbers[1]!);
        start = at;
        for (let i = 2; i < numbers.length; i += 2) {
          line(place(numbers[i]!, numbers[i + 1]!));
        }
        break;
      case 'L':
        for (let i = 0; i < numbers.length; i += 2) {
          line(place(numbers[i]!, numbers[i + 1]!));
        }
        break;
      case 'H':
        line({ x: relative ? at.x + numbers[0]! : numbers[0]!, y: at.y });
        break;
      case 'V':
        line({ x: at.x, y: relative ? at.y + numbers[0]! : numbers[0]! });
        break;
      case 'A': {
        const to = place(numbers[5]!, numbers[6]!);
        found.push(arcBetween(at, to, numbers[0]!, numbers[3] === 1, numbers[4] === 1));
        at = to;
        break;
      }
      default:
        if (at.x !== start.x || at.y !== start.y) {
          line(start);
        }
    }
  }
  return found;
}

function arcBetween(from: Point, to: Point, radius: number, large: boolean, sweep: boolean): ReadArc {
  const half = { x: (to.x - from.x) / 2, y: (to.y - from.y) / 2 };
  const chord = Math.hypot(half.x, half.y);
  const r = Math.max(radius, chord);
  const height = Math.sqrt(Math.max(r * r - chord * chord, 0)) * (large === sweep ? -1 : 1);
  const centre = {
    x: (from.x + to.x) / 2 - (height * half.y) / chord,
    y: (from.y + to.y) / 2 + (height * half.x) / chord,
  };
  const a0 = Math.atan2(from.y - centre.y, from.x - centre.x);
  const a1 = Math.atan2(to.y - centre.y, to.x - centre.x);
  const ahead = (((a1 - a0) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
  return { kind: 'arc', from, to, centre, radius: r, turn: sweep ? ahead : ahead - 2 * Math.PI };
}

export function lengthOfRuns(runs: readonly ReadArc[]): number {
  return runs.reduce(
    (sum, run) =>
      sum +
      (run.kind === 'arc'
        ? run.radius! * Math.abs(run.turn!)
        : Math.hypot(run.to.x - run.from.x, run.to.y - run.from.y)),
    0,
  );
}

/** So many points on each run, its end among them. */
export function pointsOfRuns(runs: readonly ReadArc[], each: number): Point[] {
  return runs.flatMap((run) =>
    Array.from({ length: each }, (_, i) => {
      const u = (i + 1) / each;
      if (run.kind === 'line') {
        return { x: run.from.x + u * (run.to.x - run.from.x), y: run.from.y + u * (run.to.y - run.from.y) };
      }
      const start = Math.atan2(run.from.y - run.centre!.y, run.from.x - run.centre!.x);
      const angle = start + u * run.turn!;
      return {
        x: run.centre!.x + run.radius! * Math.cos(angle),
        y: run.centre!.y + run.radius! * Math.sin(angle),
      };
    }),
  );
}

/** The element that carries a figure's name, from its tag to the end of that tag, or of the group. */
export function elementOf(svg: string, figure: string): string {
  const at = svg.indexOf(`data-figure="${figure}"`);
  if (at < 0) {
    throw new Error(`no figure ${figure}`);
  }
  const start = svg.lastIndexOf('<', at);
  const group = svg.startsWith('<g', start);
  return svg.slice(start, group ? svg.indexOf('</g>', at) : svg.indexOf('>', at) + 1);
}

export function attributeOf(element: string, name: string): string {
  return new RegExp(`\\b${name}="([^"]*)"`).exec(element)?.[1] ?? '';
}

/** What stands in its text elements, as a person reads it. */
export function textsOf(svg: string): string[] {
  return [...svg.matchAll(/<text[^>]*>([^<]*)<\/text>/g)].map(([, text = '']) =>
    text
      .replaceAll('&lt;', '<')
      .replaceAll('&gt;', '>')
      .replaceAll('&quot;', '"')
      .replaceAll('&#39;', "'")
      .replaceAll('&amp;', '&'),
  );
}
